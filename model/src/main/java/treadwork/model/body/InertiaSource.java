package treadwork.model.body;

import java.util.List;
import java.util.Optional;

/**
 * A published table of segment masses, centres and moments of inertia, as published.
 *
 * @param name     short, for example "de Leva 1996"
 * @param title    of the publication
 * @param citation in full
 * @param status   which of its numbers were read where, and which are from memory
 * @param axes     in words, the table's own axes and ends
 */
public record InertiaSource(
        String name, String title, String citation, String status, String axes, List<InertiaRow> rows) {

    public InertiaSource {
        rows = List.copyOf(rows);
    }

    /** Whether women and men have a column each, so that the subject's sex must be known. */
    public boolean isBySex() {
        return rows.stream().anyMatch(row -> row.sex().isPresent());
    }

    /** The row of a segment that holds for a subject of that sex, or, where it is not known, for both. */
    public Optional<InertiaRow> row(SegmentKind segment, Optional<Sex> sex) {
        return rows.stream()
                .filter(row -> row.segment() == segment)
                .filter(row -> row.sex().isEmpty() || row.sex().equals(sex))
                .findFirst();
    }
}
