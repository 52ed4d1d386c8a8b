package treadwork.io.c3d;

import java.util.List;

/**
 * What was computed from a capture, to be written into a C3D file beside it. A group TREADWORK of the file lists it, since points of the
 * format are nothing but three numbers a frame.
 *
 * @param version  of the program that computed
 * @param points   in the order in which they are written, behind the measured ones
 * @param settings in force, a line each
 */
public record ComputedPoints(String version, List<ComputedPoint> points, List<String> settings) {

    static final String GROUP = "TREADWORK";
    static final String LABELS = "LABELS";

    public ComputedPoints {
        points = List.copyOf(points);
        settings = List.copyOf(settings);
    }
}
