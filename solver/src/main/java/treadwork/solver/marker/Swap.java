package treadwork.solver.marker;

import java.util.BitSet;
import java.util.List;
import java.util.Locale;
import java.util.stream.Collectors;
import treadwork.model.capture.FrameRange;
import treadwork.model.finding.Finding;
import treadwork.model.finding.Proposal;
import treadwork.model.finding.Severity;

/**
 * Two labels that stand for each other's marker.
 *
 * @param frames counted from 0
 * @param misfit root mean square distance of the worse cluster from its standing shape as labelled, mean over the frames, m
 * @param mended the same with the labels exchanged
 */
record Swap(
        MarkerScreen.MarkerPlace first, MarkerScreen.MarkerPlace second, BitSet frames, double misfit, double mended) {

    Finding finding(MarkerScreen.Recording record) {
        List<FrameRange> runs = Frames.runs(frames, record.firstFrame());
        String entries = runs.stream()
                .map(run -> "{ \"labels\": [" + Proposal.quoted(first.label()) + ", " + Proposal.quoted(second.label())
                        + "], \"frames\": [" + run.first() + ", " + run.last() + "] }")
                .collect(Collectors.joining(", "));
        return new Finding(
                        "marker-swap",
                        Severity.REFUSES,
                        record.name() + ", markers \"" + first.label() + "\" and \"" + second.label() + "\", "
                                + Frames.inWords(runs),
                        String.format(
                                Locale.ROOT,
                                "as labelled they miss the standing shape by %.0f mm, exchanged by %.0f mm; limit %.0f mm",
                                1e3 * misfit,
                                1e3 * mended,
                                1e3 * SwapSearch.FITS),
                        "In these frames the two labels stand for each other's marker, so both are taken as missing there",
                        "Exchange the two labels in these frames, in the capture or with exchanged in the study file")
                .proposing(new Proposal(Proposal.Scope.TRIAL, "{ \"exchanged\": [" + entries + "] }"));
    }
}
