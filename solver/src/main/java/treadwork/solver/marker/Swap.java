package treadwork.solver.marker;

import java.util.BitSet;
import java.util.List;
import java.util.Locale;
import java.util.stream.Collectors;
import treadwork.model.capture.FrameRange;
import treadwork.model.finding.Finding;
import treadwork.model.finding.Proposal;
import treadwork.model.finding.Severity;
import treadwork.model.study.Exchange;

/**
 * Two labels that stand for each other's marker.
 *
 * @param frames counted from 0
 * @param misfit root mean square distance of the worse cluster from its standing shape as labelled, mean over the frames, m
 * @param mended the same with the labels exchanged
 */
record Swap(
        MarkerScreen.MarkerPlace first, MarkerScreen.MarkerPlace second, BitSet frames, double misfit, double mended) {

    /** As the study file would state it, a run of frames each. */
    List<Exchange> exchanges(int firstFrame) {
        return Frames.runs(frames, firstFrame).stream()
                .map(run -> new Exchange(first.label(), second.label(), run))
                .toList();
    }

    /** @param all the exchanges that the study file should state, this one and every other */
    Finding finding(MarkerScreen.Recording record, List<Exchange> all) {
        List<FrameRange> runs = Frames.runs(frames, record.firstFrame());
        String entries = all.stream()
                .map(exchange -> "{ \"labels\": [" + Proposal.quoted(exchange.first()) + ", "
                        + Proposal.quoted(exchange.second()) + "], \"frames\": ["
                        + exchange.frames().first() + ", " + exchange.frames().last() + "] }")
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
