package treadwork.model.finding;

/** Input that cannot be used at all; the finding says what, where, and what mends it. */
public final class UnusableInputException extends RuntimeException {

    private final transient Finding finding;

    public UnusableInputException(Finding finding) {
        super(finding.line());
        this.finding = finding;
    }

    /** Keeps the cause, for the log. */
    public UnusableInputException(Finding finding, Throwable cause) {
        super(finding.line(), cause);
        this.finding = finding;
    }

    public Finding finding() {
        return finding;
    }
}
