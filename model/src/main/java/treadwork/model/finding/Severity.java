package treadwork.model.finding;

/** How much a finding matters. */
public enum Severity {
    /** Worth knowing; the loads stand. */
    NOTE,
    /** The loads may be wrong. */
    WARNING,
    /** What is concerned cannot be known and is left blank. */
    REFUSES
}
