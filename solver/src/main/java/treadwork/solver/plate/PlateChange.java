package treadwork.solver.plate;

import java.util.ArrayList;
import java.util.List;
import treadwork.model.capture.Plate;
import treadwork.model.finding.Proposal;

/** The change of the study file that puts another description in a plate's place. */
final class PlateChange {

    private PlateChange() {}

    static Proposal of(MeasuredPlate plate, Plate instead) {
        List<Plate> plates = new ArrayList<>(plate.bench().plates());
        plates.set(plate.bench().number() - 1, instead);
        return new Proposal(Proposal.Scope.STUDY, PlatesAsJson.change(plates));
    }
}
