package treadwork.model.finding;

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
 */
public record Finding(
        String code, Severity severity, String where, String figure, String meaning, String mend, boolean mended) {

    public Finding(String code, Severity severity, String where, String figure, String meaning, String mend) {
        this(code, severity, where, figure, meaning, mend, false);
    }

    /** The finding as one line of plain text. */
    public String line() {
        return where + ": " + figure + ". " + meaning + ". " + mend + ".";
    }
}
