package treadwork.io.study;

import java.nio.file.Path;
import java.util.List;
import treadwork.model.finding.Finding;
import treadwork.model.study.Study;

/**
 * A study file as read.
 *
 * @param study    with every default filled in
 * @param file     the study file
 * @param folder   that paths in the study are relative to
 * @param findings what was noticed that does not keep the study from being computed
 */
public record StudyDocument(Study study, Path file, Path folder, List<Finding> findings) {

    public StudyDocument {
        findings = List.copyOf(findings);
    }

    /** Where a capture lies that the study names. */
    public Path pathOf(String relative) {
        return folder.resolve(relative);
    }
}
