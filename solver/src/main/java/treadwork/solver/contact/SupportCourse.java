package treadwork.solver.contact;

import java.util.ArrayList;
import java.util.BitSet;
import java.util.List;
import treadwork.model.body.Side;
import treadwork.model.finding.Finding;
import treadwork.model.finding.Severity;
import treadwork.model.load.Support;
import treadwork.model.space.WrenchSeries;

/**
 * What one foot stands on, a frame.
 *
 * <p>It is on a plate while one of its contacts is on, and while its motion says that it bears load beside one, as far as
 * the filter reaches. It is unmeasured while its motion says so elsewhere, or tells nothing; while the other foot shares
 * the plate; while most of it is beyond the plate's edge; and where the plate's load is not known. Else it is in the air.
 *
 * @param load a gap where unmeasured
 */
record SupportCourse(List<Support> support, WrenchSeries load, List<Finding> findings) {

    static SupportCourse of(FootPlanting foot, Ownership ownership, Attribution.Finder finder) {
        Clock clock = finder.clock();
        FootLoad measured = FootLoad.of(foot.side(), ownership.owned(), finder.threshold(), clock);
        EdgeCheck edge = EdgeCheck.of(foot.side(), ownership, foot, clock);
        BitSet elsewhere = without(foot.bearing(), measured.beside());
        elsewhere.andNot(ownership.shared());
        BitSet unmeasured = without(foot.unknown(), measured.touching());
        unmeasured.or(elsewhere);
        unmeasured.or(ownership.shared());
        unmeasured.or(edge.mostlyOff());
        unmeasured.or(gaps(measured.load(), clock.frames()));
        List<Finding> findings = new ArrayList<>();
        edge.finding().ifPresent(findings::add);
        if (!elsewhere.isEmpty()) {
            findings.add(unmeasured(foot.side(), elsewhere, clock));
        }
        BitSet onPlate = (BitSet) foot.bearing().clone();
        onPlate.and(measured.beside());
        onPlate.or(measured.touching());
        return new SupportCourse(
                support(unmeasured, onPlate, clock.frames()), measured.blankedIn(unmeasured), findings);
    }

    private static List<Support> support(BitSet unmeasured, BitSet onPlate, int frames) {
        List<Support> support = new ArrayList<>(frames);
        for (int i = 0; i < frames; i++) {
            support.add(unmeasured.get(i) ? Support.UNMEASURED : onPlate.get(i) ? Support.PLATE : Support.AIR);
        }
        return support;
    }

    private static BitSet without(BitSet frames, BitSet others) {
        BitSet rest = (BitSet) frames.clone();
        rest.andNot(others);
        return rest;
    }

    private static BitSet gaps(WrenchSeries load, int frames) {
        BitSet gaps = new BitSet();
        for (int i = 0; i < frames; i++) {
            gaps.set(i, load.force().isGap(i) || load.moment().isGap(i));
        }
        return gaps;
    }

    private static Finding unmeasured(Side side, BitSet frames, Clock clock) {
        return new Finding(
                "unmeasured-support",
                Severity.REFUSES,
                clock.name() + ", " + side.key() + " foot, " + FrameRuns.inWords(frames, clock.firstFrame()),
                "the foot moves as if it bore load for " + frames.cardinality()
                        + " frames in which no plate measures it",
                "Its reaction is not known, so this leg has no joint loads in these frames",
                "Nothing mends it afterwards; have the foot step on a plate, or state its contacts if it did");
    }
}
