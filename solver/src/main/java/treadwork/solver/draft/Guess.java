package treadwork.solver.draft;

import treadwork.model.body.Landmark;

/**
 * A landmark and the marker that it may be.
 *
 * @param confidence from 0 to 1: the share of all assignments, weighted by their likelihood, that say the same
 * @param isSure     whether it is to be used unless a person objects
 * @param why        for a person, without a full stop
 */
public record Guess(Landmark landmark, String label, double confidence, boolean isSure, String why) {}
