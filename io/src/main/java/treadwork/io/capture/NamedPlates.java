package treadwork.io.capture;

import java.util.ArrayList;
import java.util.List;
import treadwork.model.capture.AnalogChannel;
import treadwork.model.capture.Capture;
import treadwork.model.capture.Plate;
import treadwork.model.finding.Finding;
import treadwork.model.finding.NearestName;
import treadwork.model.finding.Severity;
import treadwork.model.finding.UnusableInputException;
import treadwork.model.study.LabSettings;
import treadwork.model.study.NamedPlate;

/** Finds the channels of plates by their names, and brings what is stated in lab axes into plate axes. */
final class NamedPlates {

    private final Capture capture;
    private final List<String> labels;
    private final List<AnalogChannel> analog;

    private NamedPlates(Capture capture) {
        this.capture = capture;
        this.labels = capture.analog().stream().map(AnalogChannel::label).toList();
        this.analog = new ArrayList<>(capture.analog());
    }

    /** The capture with the plates that the study names, or as it is where it names none. */
    static Capture in(Capture capture, LabSettings lab) {
        return lab.namedPlates().isEmpty() ? capture : new NamedPlates(capture).with(lab.namedPlates());
    }

    private Capture with(List<NamedPlate> named) {
        List<Plate> plates = new ArrayList<>();
        for (NamedPlate plate : named) {
            List<Integer> places = new ArrayList<>();
            for (String name : plate.channels()) {
                places.add(place(name, plates.size() + 1));
            }
            plates.add(new Plate(
                    plate.type(),
                    plate.corners(),
                    plate.origin(),
                    plate.labAxes() ? turned(plate, places) : places,
                    plate.calibration(),
                    plate.channelUnit()));
        }
        return new Capture(
                capture.name(),
                capture.firstFrame(),
                capture.frames(),
                capture.pointRate(),
                capture.points(),
                capture.samplesPerFrame(),
                analog,
                plates,
                capture.plateZero(),
                capture.events(),
                capture.pointUnit(),
                capture.storage(),
                capture.findings());
    }

    /** Six further channels at the end, so that the numbers of the file's own stay. */
    private List<Integer> turned(NamedPlate plate, List<Integer> places) {
        List<AnalogChannel> stated = places.stream().map(analog::get).toList();
        List<Integer> made = new ArrayList<>();
        for (AnalogChannel channel : LabPlate.of(plate, stated).channels()) {
            made.add(analog.size());
            analog.add(channel);
        }
        return made;
    }

    private int place(String name, int number) {
        int place = labels.indexOf(name);
        if (place < 0) {
            throw refusal(
                    number,
                    "no channel is named \"" + name + "\"" + NearestName.hint(name, labels),
                    "Correct the name");
        }
        if (labels.lastIndexOf(name) != place) {
            throw refusal(number, "several channels are named \"" + name + "\"", "Give all plates by channel numbers");
        }
        return place;
    }

    private UnusableInputException refusal(int number, String figure, String mend) {
        return new UnusableInputException(new Finding(
                "plate-channel-unknown",
                Severity.REFUSES,
                capture.name() + ", plate " + number,
                figure,
                "What this plate measures is not known",
                mend + " in lab.plates of the study file"));
    }
}
