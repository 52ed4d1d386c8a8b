package treadwork.solver.contact;

import java.util.Optional;
import treadwork.model.load.Contact;
import treadwork.model.load.ContactSeries;
import treadwork.model.space.ScalarSeries;
import treadwork.model.space.Vector3;
import treadwork.model.space.VectorSeries;
import treadwork.model.space.WrenchSeries;
import treadwork.solver.plate.CentreOfPressure;
import treadwork.solver.plate.PlateLoad;

/** The course of one contact for display. */
final class DisplayedLoad {

    private DisplayedLoad() {}

    /**
     * @param raw       unfiltered, at the contact's frames
     * @param threshold N, below which no centre of pressure is given
     */
    static ContactSeries of(Contact contact, PlateLoad plate, WrenchSeries raw, double threshold) {
        VectorSeries.Builder places = new VectorSeries.Builder(raw.size());
        ScalarSeries.Builder freeMoments = new ScalarSeries.Builder(raw.size());
        for (int i = 0; i < raw.size(); i++) {
            Optional<CentreOfPressure> found = CentreOfPressure.of(raw.at(i), plate.surface(), threshold);
            places.set(i, found.map(CentreOfPressure::point).orElse(Vector3.GAP));
            freeMoments.set(i, found.map(CentreOfPressure::freeMoment).orElse(Double.NaN));
        }
        return new ContactSeries(contact, raw.force(), places.build(), freeMoments.build());
    }
}
