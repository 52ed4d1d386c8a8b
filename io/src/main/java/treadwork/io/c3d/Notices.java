package treadwork.io.c3d;

import static treadwork.model.finding.Severity.NOTE;
import static treadwork.model.finding.Severity.REFUSES;
import static treadwork.model.finding.Severity.WARNING;

import java.util.List;
import java.util.Locale;
import treadwork.model.capture.FrameRange;
import treadwork.model.finding.Finding;

/** What is odd about a file that can be read all the same: every such message stands here. */
final class Notices {

    private static final String NOTHING = "Nothing needs mending";
    private static final int LISTED = 5;

    private Notices() {}

    static Finding parameterSection(String file, int at) {
        return new Finding(
                "parameter-section",
                WARNING,
                file + ", byte " + at + " of the parameter section",
                "a record there is damaged or reaches beyond the section",
                "Names, scales, plates or events stated from there on may be missing",
                "Compare labels, plates and events with the recording, or export the file again");
    }

    static Finding parameterRepeated(String file, List<String> names) {
        return new Finding(
                "parameter-repeated",
                NOTE,
                file + ", parameters " + listed(names),
                names.size() + " are stated twice with different content",
                "The first of each is used",
                "Check these values if the results surprise");
    }

    static Finding headerOnly(String file, List<String> names) {
        return new Finding(
                "point-parameters-missing",
                NOTE,
                file + ", parameters " + listed(names),
                "not stated",
                "The header's own figures are used",
                NOTHING);
    }

    static Finding dataStart(String file, int header, int used) {
        return new Finding(
                "data-start",
                WARNING,
                file + ", header word 9",
                "block " + header + " cannot be where the frames begin, block " + used + " of POINT:DATA_START is used",
                "If that is wrong too, every value is",
                "Look at the courses, or export the file again");
    }

    static Finding framesMissing(String file, long stated, int held) {
        return new Finding(
                "frames-missing",
                WARNING,
                file,
                stated + " frames are stated, the file holds " + held,
                "The recording ends early",
                "Export or copy the file again if the missing frames matter");
    }

    static Finding frameCount(String file, String stated, int used) {
        return new Finding(
                "frame-count",
                NOTE,
                file,
                "the counts of frames disagree (" + stated + "), " + used + " are read",
                "The size of the file decides between them",
                NOTHING);
    }

    static Finding pointCount(String file, int used, int header) {
        return new Finding(
                "point-count",
                WARNING,
                file + ", parameter POINT:USED",
                used + " points, in the header " + header,
                "The header's count is used, since the frames are laid out by it",
                "Look at the courses, or export the file again");
    }

    static Finding pointScale(String file, double parameter, double header) {
        return new Finding(
                "point-scale",
                WARNING,
                file + ", parameter POINT:SCALE",
                "it is " + number(parameter) + ", in the header " + number(header),
                "The header's scale is used; if it is wrong, all lengths are",
                "Compare a known distance between two markers");
    }

    static Finding rate(String file, String parameter, double stated, double used) {
        return new Finding(
                parameter.equals("POINT:RATE") ? "point-rate" : "analog-rate",
                WARNING,
                file + ", parameter " + parameter,
                "it is " + number(stated) + " Hz, the header's figures give " + number(used) + " Hz",
                parameter.equals("POINT:RATE")
                        ? "The parameter is used; if it is wrong, all velocities are"
                        : "The header's samples per frame are used",
                "Check the rates with the recording");
    }

    static Finding analogCount(String file, int used, int channels) {
        return new Finding(
                "analog-count",
                WARNING,
                file + ", parameter ANALOG:USED",
                used + " channels, by the header " + channels,
                "By size, " + channels + " channels are laid out in the frames and these are read",
                "Check the plates' channels, or export the file again");
    }

    static Finding analogScaling(String file, String parameter, int stated, int channels) {
        return new Finding(
                "analog-scaling",
                WARNING,
                file + ", parameter ANALOG:" + parameter,
                stated + " are stated for " + channels + " channels",
                parameter.equals("OFFSET")
                        ? "The missing ones are taken as 0"
                        : "The missing ones are taken as 1, so forces may be off by a factor",
                "Compare a known load, such as the standing weight");
    }

    static Finding unitReplaced(String file, String stated, String used) {
        return new Finding(
                "point-unit-replaced",
                NOTE,
                file + ", parameter POINT:UNITS",
                "the file states \"" + stated + "\", the study " + used,
                "The study's unit is used",
                "Set lab.pointUnit to auto if the file is right");
    }

    static Finding markerZero(String file, long samples, int markers) {
        return new Finding(
                "marker-zero",
                NOTE,
                file,
                samples + " samples of " + markers + " markers are exactly (0, 0, 0), though flagged valid",
                "They are taken as missing",
                NOTHING,
                true);
    }

    static Finding noPoint(String file, int points, int frames) {
        return new Finding(
                "points-missing",
                REFUSES,
                file,
                "none of " + points + " points has a valid sample in " + frames + " frames",
                "There is no position to compute from",
                "Export the file again with the positions marked as valid");
    }

    static Finding computedPoints(String file, int points) {
        return new Finding(
                "points-computed",
                NOTE,
                file + ", group " + ComputedPoints.GROUP,
                points + " points are results of an earlier computation",
                "They are no markers and are left out",
                NOTHING);
    }

    static Finding labelCollapsed(String file, List<String> labels) {
        return new Finding(
                "label-same-twice",
                NOTE,
                file + ", points " + listed(labels),
                "they are stored more than once with the same positions",
                "One of each is kept",
                NOTHING);
    }

    static Finding labelAmbiguous(String file, List<String> labels) {
        return new Finding(
                "label-ambiguous",
                NOTE,
                file + ", points " + listed(labels),
                "more than one point bears the name, with different positions",
                "None of them can be used as a marker, since the name does not say which is meant",
                "Give them different names in the file if they are needed; their descriptions may tell them apart");
    }

    static Finding subjects(String file, List<String> subjects) {
        return new Finding(
                "subjects-several",
                NOTE,
                file + ", parameter POINT:LABELS",
                "the points belong to " + subjects.size() + " subjects or objects: " + listed(subjects),
                "Labels keep their subject, as in \"" + subjects.get(0) + ":NAME\"",
                "Name markers with their subject in the marker set");
    }

    static Finding plateGroup(String file, String similar) {
        return new Finding(
                "plate-group-name",
                WARNING,
                file + ", group " + similar,
                "there is no group FORCE_PLATFORM; a similar name was found",
                "The file's plates are not read",
                "Describe the plates in lab.plates of the study file");
    }

    static Finding noPlates(String file, String figure) {
        return new Finding(
                "plates-none",
                NOTE,
                file + ", group FORCE_PLATFORM",
                figure,
                "The file gives no plate",
                "Describe the plates in lab.plates of the study file if there are any");
    }

    static Finding plateOrigin(String file, int plate) {
        return new Finding(
                "plate-origin-missing",
                WARNING,
                file + ", plate " + plate + ", parameter FORCE_PLATFORM:ORIGIN",
                "not stated; (0, 0, 0) is taken",
                "The centre of pressure is off wherever the shear force is large",
                "Describe the plates in lab.plates of the study file");
    }

    static Finding plateZero(String file, FrameRange zero, FrameRange capture) {
        return new Finding(
                "plate-zero-outside",
                NOTE,
                file + ", parameter FORCE_PLATFORM:ZERO",
                "unloaded in frames " + words(zero) + ", the file holds " + words(capture),
                "The range is left aside",
                "Give a range in plateZero, or leave it at auto");
    }

    static Finding eventsOutside(String file, int outside, int events) {
        return new Finding(
                "event-outside",
                NOTE,
                file + ", events",
                outside + " of " + events + " lie outside the recording",
                "They are left out",
                NOTHING);
    }

    /** A figure for a message, the same in every country. */
    static String number(double value) {
        return String.format(Locale.ROOT, "%.6g", value)
                .replaceFirst("(\\.\\d*?)0+(?=e|$)", "$1")
                .replaceFirst("\\.(?=e|$)", "");
    }

    private static String words(FrameRange range) {
        return range.first() + " to " + range.last();
    }

    private static String listed(List<String> names) {
        String first = String.join(", ", names.subList(0, Math.min(LISTED, names.size())));
        return names.size() > LISTED ? first + " and " + (names.size() - LISTED) + " more" : first;
    }
}
