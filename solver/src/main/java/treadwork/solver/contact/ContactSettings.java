package treadwork.solver.contact;

import java.util.List;
import java.util.Optional;
import treadwork.model.study.ContactRule;
import treadwork.model.study.LabAxis;

/**
 * How contacts are found.
 *
 * @param thresholdN push at which a contact begins, N; it ends at half of it
 * @param rules      empty: from the data; else these alone hold, and a plate they do not name carries nobody
 */
public record ContactSettings(LabAxis up, double thresholdN, Optional<List<ContactRule>> rules) {

    public ContactSettings {
        if (!(thresholdN > 0)) {
            throw new IllegalArgumentException("contact threshold must be above 0 N, is " + thresholdN + " N");
        }
        rules = rules.map(List::copyOf);
    }
}
