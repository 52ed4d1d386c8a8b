package treadwork.solver.run;

import java.util.Map;
import treadwork.model.body.Joint;
import treadwork.model.load.TrialResult;
import treadwork.model.space.VectorSeries;

/**
 * What came of a trial, and its figures in short.
 *
 * @param centres of the solved joints, in every frame of the capture, lab axes, m
 */
public record ComputedTrial(TrialResult result, Map<Joint, VectorSeries> centres, TrialSummary summary) {}
