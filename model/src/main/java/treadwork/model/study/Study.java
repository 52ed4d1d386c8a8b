package treadwork.model.study;

import java.util.List;

/**
 * @param title    for people
 * @param subjects in the file's order
 */
public record Study(String title, List<Subject> subjects) {

    public Study {
        subjects = List.copyOf(subjects);
    }
}
