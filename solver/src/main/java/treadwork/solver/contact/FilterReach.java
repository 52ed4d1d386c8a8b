package treadwork.solver.contact;

import treadwork.solver.plate.PlateLoad;

/** How far beside a contact its load, once filtered, and the feet's motion may still belong to it. */
final class FilterReach {

    /**
     * The feet's own motion tells when they bear load to this, s: a careful foot is low and slow up to 40 ms before it
     * touches, and takes 40 ms more to press harder than a threshold of 20 N.
     */
    private static final double MOTION_S = 0.08;

    /** (√2 - 1)^¼: the two passes' corner over their common one. */
    private static final double TWO_PASSES = Math.pow(Math.sqrt(2) - 1, 0.25);

    /** 20 N of 1000 N. */
    private static final double LEFT_OVER = 1.0 / 50;

    private FilterReach() {}

    /**
     * The poles of each pass of a Butterworth filter of second order with its corner at f/C, C = (√2 - 1)^¼, have the real
     * part -√2 π f/C. What lies beyond a load's beginning or end so decays as exp(-√2 π f t/C) and is down to the share s
     * after t = C ln(1/s)/(√2 π f): with s = 1/50, 0.71/f, that is 0.12 s at 6 Hz.
     */
    static int frames(PlateLoad plate, Clock clock) {
        double f = plate.cutoffHz();
        double filter = Double.isNaN(f) ? 0 : TWO_PASSES * Math.log(1 / LEFT_OVER) / (Math.sqrt(2) * Math.PI * f);
        return clock.framesIn(Math.max(MOTION_S, filter));
    }
}
