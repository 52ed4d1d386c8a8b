package treadwork.solver.contact;

import java.util.ArrayList;
import java.util.BitSet;
import java.util.List;
import java.util.Optional;
import treadwork.model.capture.FrameRange;
import treadwork.model.finding.Finding;
import treadwork.model.finding.Severity;
import treadwork.model.study.ContactRule;
import treadwork.solver.plate.PlateLoad;

/** Whose the spells of load are, as a person says it: their word alone holds, and other spells carry nobody. */
final class RuledOwnership {

    private RuledOwnership() {}

    static Ownership stated(List<PlateLoad> plates, List<ContactRule> rules, Attribution.Finder finder) {
        Ownership result = new Ownership(new ArrayList<>(), new BitSet(), new ArrayList<>(), true);
        for (ContactRule rule : rules) {
            int before = result.owned().size();
            plates.stream()
                    .filter(plate -> plate.number() == rule.plate())
                    .flatMap(plate -> Ownership.BoundedSpell.of(plate, finder).stream())
                    .forEach(spell -> own(spell, rule, result, finder.clock()));
            if (result.owned().size() == before) {
                result.findings().add(nothingThere(rule, finder.clock()));
            }
        }
        return result;
    }

    private static void own(Ownership.BoundedSpell spell, ContactRule rule, Ownership result, Clock clock) {
        BitSet frames = spell.frames(clock);
        rule.frames().ifPresent(stated -> frames.and(inside(stated, clock)));
        for (FrameRange run : FrameRuns.of(frames)) {
            OwnedSpell stated = spell.within(run, clock).ownedBy(rule.foot(), "stated in the study file");
            share(stated, result, clock);
            result.owned().add(stated);
        }
    }

    /** Two rules that give the same frames of a plate to either foot say that it is shared. */
    private static void share(OwnedSpell stated, Ownership result, Clock clock) {
        for (OwnedSpell other : result.owned()) {
            if (other.plate().number() == stated.plate().number() && other.side() != stated.side()) {
                BitSet both = stated.frames(clock);
                both.and(other.frames(clock));
                if (!both.isEmpty()) {
                    result.shared().or(both);
                    result.findings().add(Ownership.sharedPlate(stated.plate(), both, clock));
                }
            }
        }
    }

    private static BitSet inside(FrameRange stated, Clock clock) {
        BitSet frames = new BitSet();
        int from = Math.max(0, stated.first() - clock.firstFrame());
        int end = Math.min(clock.frames(), stated.last() + 1 - clock.firstFrame());
        if (from < end) {
            frames.set(from, end);
        }
        return frames;
    }

    private static Finding nothingThere(ContactRule rule, Clock clock) {
        Optional<FrameRange> frames = rule.frames();
        return new Finding(
                "contact-rule",
                Severity.WARNING,
                clock.name() + ", plate " + rule.plate()
                        + frames.map(range -> ", frames " + range.first() + " to " + range.last())
                                .orElse(""),
                "the study file puts the " + rule.foot().key()
                        + " foot here, but no usable plate of that number is loaded then",
                "This rule gives the foot nothing to stand on",
                "Check the plate's number, counted from 1, and the frames of the rule");
    }
}
