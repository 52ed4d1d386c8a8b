package treadwork.solver.agreement;

import java.util.List;
import java.util.Map;
import java.util.function.Function;
import treadwork.model.body.MassProperties;
import treadwork.model.body.Segment;
import treadwork.model.capture.Capture;
import treadwork.model.capture.Plate;
import treadwork.model.space.Vector3;
import treadwork.solver.contact.Contacts;
import treadwork.solver.contact.FootOutline;
import treadwork.solver.plate.PlateLoads;
import treadwork.solver.pose.SegmentMotion;
import treadwork.solver.pose.StandingBody;

/**
 * What a trial has come to before its joint loads: the evidence of all checks of plates against markers.
 *
 * @param up        lab axes
 * @param described the plates as file or study describe them
 * @param plates    their loads
 * @param resolve   the loads of plates described otherwise, with the same capture and settings
 * @param body      standing
 * @param motions   of its segments
 * @param masses    of the legs' segments, with what is worn
 * @param massKg    of the body with all that it wears, as stated
 * @param wornKg    of what it wears
 * @param plateDelayS what the study file takes out of the plates' clock already, s
 * @param endFrames next to a gap or an end of the record in which accelerations are not sound
 */
public record Scene(
        Capture capture,
        Vector3 up,
        List<Plate> described,
        PlateLoads plates,
        Function<List<Plate>, PlateLoads> resolve,
        Contacts contacts,
        List<FootOutline> feet,
        StandingBody body,
        Map<Segment, SegmentMotion> motions,
        Map<Segment, MassProperties> masses,
        double massKg,
        double wornKg,
        double plateDelayS,
        int endFrames) {

    public Scene {
        described = List.copyOf(described);
        feet = List.copyOf(feet);
        motions = Map.copyOf(motions);
        masses = Map.copyOf(masses);
    }

    /** The analog sample of a frame's beginning. */
    int sample(int frame) {
        return frame * capture.samplesPerFrame();
    }
}
