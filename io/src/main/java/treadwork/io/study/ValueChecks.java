package treadwork.io.study;

import com.fasterxml.jackson.databind.JsonNode;
import treadwork.model.capture.PlateType;
import treadwork.model.finding.UnusableInputException;
import treadwork.model.study.NamedPlate;

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
        if (node.path("plates").isArray()) {
            nameAll(document, node.get("plates"), LocatedJson.child(pointer, "plates"));
        }
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

    private static void originAndAxes(LocatedJson document, JsonNode plate, String pointer, PlateType type) {
        boolean lab = SettingsReader.inLabAxes(plate);
        if (lab && type != PlateType.FORCE_AND_CENTRE_OF_PRESSURE) {
            throw document.at(pointer + "/axes")
                    .unusable(
                            "study-value",
                            "a plate of type " + type.code() + " cannot be stated in lab axes",
                            "Only forces with a centre of pressure, type 1, are exported so",
                            "Set the type to 1, or the axes to plate");
        }
        if (!lab && !plate.has("originM")) {
            throw document.at(pointer)
                    .unusable(
                            "study-key-missing",
                            "the key \"originM\" is missing here",
                            "Moments are about the plate's sensor origin",
                            "Add \"originM\" from the maker's sheet; of type 1 it is [0, 0, 0]");
        }
    }

    /** Numbers count the channels of one order, names need none: mixed, it would not be clear what they count. */
    private static void nameAll(LocatedJson document, JsonNode plates, String pointer) {
        for (int i = 0; SettingsReader.areNamed(plates) && i < plates.size(); i++) {
            for (int j = 0; j < plates.get(i).get("channels").size(); j++) {
                if (!plates.get(i).get("channels").get(j).isTextual()) {
                    throw document.at(pointer + "/" + i + "/channels/" + j)
                            .unusable(
                                    "study-value",
                                    "this channel is given by its number where others, or a plate in lab axes, need names",
                                    "It is not clear what the number counts",
                                    "Name the channels of all plates, or number them all");
                }
            }
        }
    }

    private static void plate(LocatedJson document, JsonNode plate, String pointer) {
        PlateType type = PlateType.ofCode(plate.get("type").asInt()).orElseThrow();
        int channels = plate.get("channels").size();
        boolean lab = SettingsReader.inLabAxes(plate);
        originAndAxes(document, plate, pointer, type);
        int needed = lab ? NamedPlate.LAB_CHANNELS : type.channels();
        if (channels != needed) {
            throw document.at(pointer + "/channels")
                    .unusable(
                            "study-value",
                            "a plate of type " + type.code() + (lab ? " in lab axes has " : " has ") + needed
                                    + " channels, not " + channels,
                            "Its forces and moments are made of just these",
                            "List the " + needed + " channels in the order of the type");
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
