package treadwork.io.study;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import treadwork.model.capture.LengthUnit;

/**
 * A study as it was guessed, for a person to complete.
 *
 * @param unit of the positions, where a person stated it
 */
public record StudyDraft(String title, Optional<LengthUnit> unit, List<Person> subjects) {

    public StudyDraft {
        subjects = List.copyOf(subjects);
    }

    /**
     * One subject.
     *
     * @param massKg       empty: for a person to fill in
     * @param massRemark   where it is from, or why it is missing
     * @param staticFile   relative to the study, with /
     * @param staticRemark why this one
     */
    public record Person(
            String id,
            OptionalDouble massKg,
            String massRemark,
            String staticFile,
            String staticRemark,
            List<Recording> trials,
            MarkersDraft markers) {

        public Person {
            trials = List.copyOf(trials);
        }
    }

    /**
     * One movement.
     *
     * @param file   relative to the study, with /
     * @param isUsed else written commented out
     */
    public record Recording(String file, boolean isUsed, String remark) {}
}
