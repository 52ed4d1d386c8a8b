package treadwork.solver.contact;

import java.util.ArrayList;
import java.util.BitSet;
import java.util.Collections;
import java.util.Comparator;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import treadwork.model.body.Side;
import treadwork.model.capture.Capture;
import treadwork.model.finding.Finding;
import treadwork.model.load.Contact;
import treadwork.model.load.ContactSeries;
import treadwork.model.load.Support;
import treadwork.model.space.WrenchSeries;
import treadwork.solver.plate.PlateLoad;

/**
 * The contacts of a trial and what each foot is given to stand on.
 *
 * @param contacts in the order of their beginning
 * @param support  a frame, for each foot that was asked for
 * @param loads    what the ground does to each foot, smoothed, at the frames, about the lab's origin: zero in the air, a gap
 *                 where the foot is {@link Support#UNMEASURED}
 */
public record Contacts(
        List<ContactSeries> contacts,
        Map<Side, List<Support>> support,
        Map<Side, WrenchSeries> loads,
        List<Finding> findings) {

    public Contacts {
        contacts = List.copyOf(contacts);
        support = Collections.unmodifiableMap(new EnumMap<>(support));
        loads = Collections.unmodifiableMap(new EnumMap<>(loads));
        findings = List.copyOf(findings);
    }

    /**
     * Finds contacts in the plates' unfiltered push, gives each to a foot, and says for every frame whether all that a foot
     * stands on is measured.
     *
     * @param plates from this capture
     * @param feet   one or both, in frames of this capture
     * @throws IllegalArgumentException if plates or feet are as long as another capture
     */
    public static Contacts find(
            Capture capture, List<PlateLoad> plates, List<FootOutline> feet, ContactSettings settings) {
        Clock clock = Clock.of(capture);
        requireLengths(clock, plates, feet);
        Map<Side, FootPlanting> planting =
                FootPlanting.of(feet, plates, settings.up().direction(), clock);
        Attribution.Finder finder = new Attribution.Finder(clock, settings.thresholdN());
        Ownership ownership = settings.rules()
                .map(rules -> RuledOwnership.stated(plates, rules, finder))
                .orElseGet(() -> Ownership.found(plates, feet, planting, finder));
        List<Finding> findings = new ArrayList<>(ownership.findings());
        Map<Side, List<Support>> support = new EnumMap<>(Side.class);
        Map<Side, WrenchSeries> loads = new EnumMap<>(Side.class);
        for (FootOutline foot : feet) {
            SupportCourse course = SupportCourse.of(planting.get(foot.side()), ownership, finder);
            support.put(foot.side(), course.support());
            loads.put(foot.side(), course.load());
            findings.addAll(course.findings());
        }
        return new Contacts(series(ownership.owned(), finder), support, loads, findings);
    }

    private static void requireLengths(Clock clock, List<PlateLoad> plates, List<FootOutline> feet) {
        for (FootOutline foot : feet) {
            if (foot.heel().size() != clock.frames()) {
                throw new IllegalArgumentException(
                        foot.heel().size() + " frames of a foot beside " + clock.frames() + " of the capture");
            }
        }
        for (PlateLoad plate : plates) {
            if (plate.raw().size() != clock.sample(clock.frames())) {
                throw new IllegalArgumentException(plate.raw().size() + " samples of a plate beside "
                        + clock.sample(clock.frames()) + " of the capture");
            }
        }
    }

    private static List<ContactSeries> series(List<OwnedSpell> owned, Attribution.Finder finder) {
        return owned.stream()
                .filter(spell -> !spell.frames(finder.clock()).isEmpty())
                .map(spell -> series(spell, finder))
                .sorted(Comparator.comparingInt(
                        series -> series.contact().frames().first()))
                .toList();
    }

    private static ContactSeries series(OwnedSpell spell, Attribution.Finder finder) {
        Clock clock = finder.clock();
        BitSet frames = spell.frames(clock);
        int first = frames.nextSetBit(0);
        int count = frames.cardinality();
        Contact contact = new Contact(
                spell.plate().number(), spell.side(), clock.ownNumbers(first, first + count - 1), spell.assigned());
        return DisplayedLoad.of(
                contact,
                spell.plate(),
                spell.plate().raw().every(clock.sample(first), clock.samplesPerFrame(), count),
                finder.threshold());
    }
}
