package treadwork.solver.run;

import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import treadwork.model.body.Side;
import treadwork.model.capture.FrameRange;
import treadwork.model.finding.Finding;
import treadwork.model.finding.Severity;
import treadwork.model.finding.UnusableInputException;
import treadwork.model.load.Contact;
import treadwork.model.load.ContactSeries;
import treadwork.model.load.JointLoads;
import treadwork.model.load.Support;
import treadwork.model.load.TrialResult;

/** Leaves out what the study file does not ask for. Everything is computed first, so that filters see the whole capture. */
final class Cropping {

    private Cropping() {}

    /**
     * The result in the frames asked for.
     *
     * @param capture its name, for the message
     * @throws UnusableInputException {@code frames-outside} where none of them is in the capture
     */
    static TrialResult to(Optional<FrameRange> asked, TrialResult result, String capture) {
        if (asked.isEmpty()) {
            return result;
        }
        FrameRange range = asked.orElseThrow();
        int last = result.firstFrame() + result.frames() - 1;
        if (range.first() < result.firstFrame() || range.last() > last) {
            throw new UnusableInputException(new Finding(
                    "frames-outside",
                    Severity.REFUSES,
                    capture,
                    "frames " + range.first() + " to " + range.last() + " are asked for, it has " + result.firstFrame()
                            + " to " + last,
                    "Frames that were not recorded have no loads",
                    "Correct \"frames\" of the trial in the study file; frame numbers are the file's own"));
        }
        int from = range.first() - result.firstFrame();
        int count = range.count();
        Map<Side, List<Support>> support = new EnumMap<>(Side.class);
        result.support().forEach((side, frames) -> support.put(side, frames.subList(from, from + count)));
        return new TrialResult(
                range.first(),
                count,
                result.pointRate(),
                result.up(),
                result.joints().stream().map(joint -> cut(joint, from, count)).toList(),
                support,
                result.contacts().stream()
                        .filter(contact -> overlaps(contact.contact().frames(), range))
                        .map(contact -> cut(contact, range))
                        .toList(),
                result.segments(),
                result.findings());
    }

    private static JointLoads cut(JointLoads joint, int from, int count) {
        return new JointLoads(
                joint.joint(),
                joint.angles().every(from, 1, count),
                joint.moment().every(from, 1, count),
                joint.force().every(from, 1, count),
                joint.power().every(from, 1, count));
    }

    private static ContactSeries cut(ContactSeries series, FrameRange range) {
        Contact contact = series.contact();
        int first = Math.max(range.first(), contact.frames().first());
        int last = Math.min(range.last(), contact.frames().last());
        int from = first - contact.frames().first();
        int count = last - first + 1;
        return new ContactSeries(
                new Contact(contact.plate(), contact.foot(), new FrameRange(first, last), contact.assigned()),
                series.force().every(from, 1, count),
                series.centreOfPressure().every(from, 1, count),
                series.freeMoment().every(from, 1, count));
    }

    private static boolean overlaps(FrameRange one, FrameRange other) {
        return one.first() <= other.last() && other.first() <= one.last();
    }
}
