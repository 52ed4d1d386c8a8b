package treadwork.solver.run;

import treadwork.model.load.TrialResult;

/** What came of a trial, and its figures in short. */
public record ComputedTrial(TrialResult result, TrialSummary summary) {}
