package treadwork.io.text;

import java.util.ArrayList;
import java.util.List;
import treadwork.model.finding.Finding;
import treadwork.model.finding.Severity;

/** What was noticed while a text was read. */
final class Notes {

    /** Names shown before the rest is only counted. */
    private static final int SHOWN = 12;

    private final String file;
    private final List<Finding> findings = new ArrayList<>();

    Notes(String file) {
        this.file = file;
    }

    List<Finding> findings() {
        return findings;
    }

    void mended(String code, String figure, String meaning) {
        add(code, figure, meaning, true);
    }

    void guessed(String code, String figure, String meaning) {
        add(code, figure, meaning, false);
    }

    private void add(String code, String figure, String meaning, boolean mended) {
        findings.add(new Finding(
                code,
                Severity.NOTE,
                file,
                figure,
                meaning,
                mended ? "Nothing to do if that is right" : "State it in lab of the study file if that is wrong",
                mended));
    }

    /** Names in one line. */
    static String listed(List<String> names) {
        String shown = String.join(", ", names.subList(0, Math.min(SHOWN, names.size())));
        return names.size() > SHOWN ? shown + " and " + (names.size() - SHOWN) + " more" : shown;
    }
}
