package treadwork.model.finding;

import java.util.Optional;

/**
 * One thing noticed about the data or the set-up.
 *
 * @param code     stable name, for example {@code plate-sign}
 * @param severity how much it matters
 * @param where    file, plate, marker, segment, frames: as exact as is known
 * @param figure   what was found, against which limit, with units
 * @param meaning  one sentence: what it means for the loads
 * @param mend     one sentence: what mends it
 * @param mended   whether the computation already goes on with the mended value
 * @param proposal a change of the study file that would mend it, where one is known
 */
public record Finding(
        String code,
        Severity severity,
        String where,
        String figure,
        String meaning,
        String mend,
        boolean mended,
        Optional<Proposal> proposal) {

    public Finding(
            String code, Severity severity, String where, String figure, String meaning, String mend, boolean mended) {
        this(code, severity, where, figure, meaning, mend, mended, Optional.empty());
    }

    public Finding(String code, Severity severity, String where, String figure, String meaning, String mend) {
        this(code, severity, where, figure, meaning, mend, false);
    }

    /** The same with a change of the study file that would mend it. */
    public Finding proposing(Proposal change) {
        return new Finding(code, severity, where, figure, meaning, mend, mended, Optional.of(change));
    }

    /** The finding as one line of plain text. */
    public String line() {
        return where + ": " + figure + ". " + meaning + ". " + mend + ".";
    }
}
