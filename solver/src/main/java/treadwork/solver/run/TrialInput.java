package treadwork.solver.run;

import treadwork.model.body.InertiaSource;
import treadwork.model.capture.Capture;
import treadwork.model.study.Subject;
import treadwork.model.study.Trial;

/**
 * All that the loads of one trial are computed from.
 *
 * @param standing the subject's standing capture
 * @param movement the trial's own
 * @param table    the inertia table that the trial's settings name
 */
public record TrialInput(Capture standing, Capture movement, Subject subject, Trial trial, InertiaSource table) {}
