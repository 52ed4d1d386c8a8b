package treadwork.io.study;

import com.networknt.schema.Error;
import java.util.Comparator;
import java.util.List;
import treadwork.model.finding.UnusableInputException;

/**
 * Holds a document against the schema and reports the first fault in the order of the text; that a key is missing only
 * when nothing else is wrong, since it may be there under a mistyped name.
 */
final class SchemaCheck {

    private SchemaCheck() {}

    /** @throws UnusableInputException if the document is not a study file */
    static void study(LocatedJson document) {
        refuseFirst(document, StudySchema.studyErrors(document.root()));
    }

    /** @throws UnusableInputException if the document is not a file with a marker set */
    static void markerSet(LocatedJson document) {
        refuseFirst(document, StudySchema.markerSetErrors(document.root()));
    }

    private static void refuseFirst(LocatedJson document, List<Error> errors) {
        errors.stream()
                .map(error -> new SchemaFault(document, error))
                .min(Comparator.comparing(SchemaFault::isMissingKey)
                        .thenComparing(SchemaFault::place, Comparator.comparingInt(Place::line))
                        .thenComparing(SchemaFault::place, Comparator.comparingInt(Place::column)))
                .ifPresent(first -> {
                    throw first.exception();
                });
    }
}
