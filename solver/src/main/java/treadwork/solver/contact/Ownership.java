package treadwork.solver.contact;

import java.util.ArrayList;
import java.util.BitSet;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import treadwork.model.body.Side;
import treadwork.model.capture.FrameRange;
import treadwork.model.finding.Finding;
import treadwork.model.finding.Severity;
import treadwork.solver.plate.PlateLoad;

/**
 * Whose the spells of load are.
 *
 * @param owned  in the order of plates, then of time
 * @param shared frames in which both feet stand on one plate
 * @param stated whether a person says so, whose word holds against the markers
 */
record Ownership(List<OwnedSpell> owned, BitSet shared, List<Finding> findings, boolean stated) {

    static Ownership found(
            List<PlateLoad> plates,
            List<FootOutline> feet,
            Map<Side, FootPlanting> planting,
            Attribution.Finder finder) {
        Ownership result = new Ownership(new ArrayList<>(), new BitSet(), new ArrayList<>(), false);
        SharedFrames sharing = new SharedFrames(feet, planting, finder);
        for (PlateLoad plate : plates) {
            for (BoundedSpell spell : BoundedSpell.of(plate, finder)) {
                result.share(spell, sharing, finder.clock());
                result.attribute(spell, feet, finder);
            }
        }
        return result;
    }

    private void share(BoundedSpell spell, SharedFrames sharing, Clock clock) {
        BitSet both = sharing.in(spell.frames(clock), spell.plate, FilterReach.frames(spell.plate, clock));
        if (!both.isEmpty()) {
            shared.or(both);
            findings.add(sharedPlate(spell.plate, both, clock));
        }
    }

    private void attribute(BoundedSpell spell, List<FootOutline> feet, Attribution.Finder finder) {
        Clock clock = finder.clock();
        BitSet alone = spell.frames(clock);
        alone.andNot(shared);
        for (FrameRange run : FrameRuns.of(alone)) {
            boolean cut = run.first() == 0 || run.last() == clock.frames() - 1;
            if (!cut && run.count() < clock.framesIn(LoadedSpell.SHORTEST_S)) {
                continue;
            }
            BitSet frames = new BitSet();
            frames.set(run.first(), run.last() + 1);
            Attribution attribution = Attribution.of(frames, spell.plate, feet, finder);
            BoundedSpell part = spell.within(run, clock);
            attribution
                    .foot()
                    .ifPresentOrElse(
                            foot -> owned.add(part.ownedBy(foot.side(), attribution.words())),
                            () -> findings.add(nobodys(spell.plate, frames, attribution, clock)));
        }
    }

    /**
     * A spell with the samples around it that no other spell of the plate can claim: halfway to its neighbours.
     */
    record BoundedSpell(PlateLoad plate, LoadedSpell spell, int reachFrom, int reachEnd) {

        static List<BoundedSpell> of(PlateLoad plate, Attribution.Finder finder) {
            double rate = finder.clock().rate() * finder.clock().samplesPerFrame();
            List<LoadedSpell> spells = LoadedSpell.find(plate.rawPush(), finder.threshold(), rate);
            List<BoundedSpell> bounded = new ArrayList<>();
            for (int i = 0; i < spells.size(); i++) {
                LoadedSpell spell = spells.get(i);
                int from = i == 0 ? 0 : (spells.get(i - 1).end() + spell.from()) / 2;
                int end = i == spells.size() - 1
                        ? plate.raw().size()
                        : (spell.end() + spells.get(i + 1).from()) / 2;
                bounded.add(new BoundedSpell(plate, spell, from, end));
            }
            return bounded;
        }

        BitSet frames(Clock clock) {
            return clock.framesOf(spell.from(), spell.end());
        }

        /** The part in these frames; where it is cut, nothing beyond the cut can be claimed either. */
        BoundedSpell within(FrameRange run, Clock clock) {
            int from = clock.sample(run.first());
            int end = clock.sample(run.last() + 1);
            boolean whole = from < spell.from() + clock.samplesPerFrame();
            boolean wholeEnd = end >= spell.end();
            LoadedSpell part = new LoadedSpell(whole ? spell.from() : from, wholeEnd ? spell.end() : end);
            return new BoundedSpell(plate, part, whole ? reachFrom : from, wholeEnd ? reachEnd : end);
        }

        OwnedSpell ownedBy(Side side, String words) {
            return new OwnedSpell(plate, side, spell, reachFrom, reachEnd, words);
        }
    }

    static Finding sharedPlate(PlateLoad plate, BitSet frames, Clock clock) {
        return new Finding(
                "shared-plate",
                Severity.REFUSES,
                clock.name() + ", plate " + plate.number() + ", " + FrameRuns.inWords(frames, clock.firstFrame()),
                "both feet stand on this plate",
                "One plate cannot tell two feet apart, so neither foot has joint loads in these frames",
                "Use a plate for each foot, or leave these frames out");
    }

    private static Finding nobodys(PlateLoad plate, BitSet frames, Attribution attribution, Clock clock) {
        return new Finding(
                "contact-nobody",
                Severity.WARNING,
                clock.name() + ", plate " + plate.number() + ", " + FrameRuns.inWords(frames, clock.firstFrame()),
                String.format(Locale.ROOT, "%s; limit %.0f mm", attribution.words(), 1e3 * Attribution.FARTHEST),
                "The load is given to neither foot",
                "Check the plate's corners and channels, or state its contacts in the study file");
    }
}
