package treadwork.solver.run;

import java.util.List;
import java.util.Optional;
import treadwork.fixtures.walker.Walk;
import treadwork.io.c3d.C3dEncoding;
import treadwork.io.c3d.C3dReader;
import treadwork.io.c3d.C3dWriter;
import treadwork.io.c3d.ReadOptions;
import treadwork.io.inertia.InertiaTables;
import treadwork.model.capture.Capture;
import treadwork.model.study.FilterSettings;
import treadwork.model.study.InertiaTable;
import treadwork.model.study.LabSettings;
import treadwork.model.study.PlateZero;
import treadwork.model.study.Processing;
import treadwork.model.study.ResultSettings;
import treadwork.model.study.Subject;
import treadwork.model.study.Trial;

/** An invented walk as a trial that can be computed. */
record Walked(Walk walk, Subject subject, Trial trial) {

    /**
     * No filter, since there is no noise; and the contact threshold so low that what it cuts off is nothing, for with the
     * usual 20 N it is part of the result, not of the error.
     */
    static final Processing UNFILTERED =
            new Processing(FilterSettings.NONE, FilterSettings.NONE, 0.1, 0.5, new PlateZero.Auto());

    static Walked of(Walk walk, Processing processing) {
        return of(walk, processing, ResultSettings.DEFAULT);
    }

    static Walked of(Walk walk, Processing processing, ResultSettings results) {
        Trial trial = new Trial(
                "walking.c3d",
                "",
                walk.markerSet(),
                LabSettings.DEFAULT,
                walk.body(),
                processing,
                results,
                Optional.empty(),
                Optional.empty(),
                List.of());
        Subject subject = new Subject(
                "walker",
                walk.massKg(),
                Optional.empty(),
                Optional.empty(),
                "standing.c3d",
                walk.markerSet(),
                List.of(trial));
        return new Walked(walk, subject, trial);
    }

    /** Computed from the captures as they are. */
    ComputedTrial computed() {
        return computed(walk.standing(), walk.walking());
    }

    /** Computed from what a file of that encoding holds of the captures. */
    ComputedTrial computedFrom(C3dEncoding encoding) {
        return computed(filed(walk.standing(), encoding), filed(walk.walking(), encoding));
    }

    private ComputedTrial computed(Capture standing, Capture walking) {
        return TrialComputation.compute(
                new TrialInput(standing, walking, subject, trial, InertiaTables.load(InertiaTable.DE_LEVA_1996)));
    }

    private static Capture filed(Capture capture, C3dEncoding encoding) {
        return C3dReader.read(capture.name(), C3dWriter.bytes(capture, encoding), ReadOptions.DEFAULT);
    }
}
