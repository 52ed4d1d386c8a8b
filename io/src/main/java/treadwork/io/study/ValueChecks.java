package treadwork.io.study;

import com.fasterxml.jackson.databind.JsonNode;
import treadwork.model.capture.PlateType;
import treadwork.model.finding.UnusableInputException;

/** What the schema cannot say of single values, wherever in a study file they stand. */
final class ValueChecks {

    private ValueChecks() {}

    /** @throws UnusableInputException with code {@code study-value} or {@code study-key-missing} */
    static void check(LocatedJson document) {
        below(document, document.root(), "");
    }

    private static void below(LocatedJson document, JsonNode node, String pointer) {
        if (node.isArray()) {
            for (int i = 0; i < node.size(); i++) {
                below(document, node.get(i), pointer + "/" + i);
            }
        }
        node.fieldNames().forEachRemaining(key -> {
            JsonNode value = node.get(key);
            String member = LocatedJson.child(pointer, key);
            if (value.isArray() && !value.isEmpty()) {
                list(document.at(member), key, value);
            }
            below(document, value, member);
        });
        if (node.has("cornersM")) {
            plate(document, node, pointer);
        }
    }

    private static void list(Place place, String key, JsonNode value) {
        boolean frames = key.equals("frames") || key.equals("plateZero");
        if (frames && value.get(1).asLong() < value.get(0).asLong()) {
            throw place.unusable(
                    "study-value",
                    "the last frame, " + value.get(1) + ", is before the first, " + value.get(0),
                    "Such a range holds no frame",
                    "Give the first frame and then the last");
        }
        if (key.equals("inertiaKgm2") && !SettingsReader.inertia(value).isPhysical()) {
            throw place.unusable(
                    "study-value",
                    "the inertia tensor " + value + " kg·m² is that of no body",
                    "Principal moments are positive and none exceeds the sum of the other two",
                    "Check the order [Ixx, Iyy, Izz, Ixy, Ixz, Iyz], the signs and the unit");
        }
    }

    private static void plate(LocatedJson document, JsonNode plate, String pointer) {
        PlateType type = PlateType.ofCode(plate.get("type").asInt()).orElseThrow();
        int channels = plate.get("channels").size();
        if (channels != type.channels()) {
            throw document.at(pointer + "/channels")
                    .unusable(
                            "study-value",
                            "a plate of type " + type.code() + " has " + type.channels() + " channels, not " + channels,
                            "Its forces and moments are made of just these",
                            "List the " + type.channels() + " channels in the order of the type");
        }
        boolean calibrated = type == PlateType.CALIBRATED;
        if (calibrated && !plate.has("calibration")) {
            throw document.at(pointer)
                    .unusable(
                            "study-key-missing",
                            "the key \"calibration\" is missing here",
                            "The channels of a plate of type 4 mean nothing without its matrix",
                            "Add the 6×6 matrix by rows");
        }
        if (!calibrated && plate.has("calibration")) {
            throw document.at(pointer + "/calibration")
                    .unusable(
                            "study-value",
                            "a plate of type " + type.code() + " has no calibration matrix",
                            "Only type 4 applies one",
                            "Take the matrix out, or set the type to 4");
        }
    }
}
