package treadwork.io.text;

import treadwork.model.finding.Finding;
import treadwork.model.finding.Severity;
import treadwork.model.finding.UnusableInputException;

/** Why a text capture cannot be used. */
final class Refusal {

    private Refusal() {}

    static UnusableInputException of(String code, String where, String figure, String mend) {
        return new UnusableInputException(finding(code, where, figure, mend));
    }

    static UnusableInputException of(String code, String where, String figure, String mend, Throwable cause) {
        return new UnusableInputException(finding(code, where, figure, mend), cause);
    }

    private static Finding finding(String code, String where, String figure, String mend) {
        return new Finding(code, Severity.REFUSES, where, figure, "The capture cannot be read", mend);
    }
}
