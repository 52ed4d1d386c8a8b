package treadwork.solver.cli;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.function.UnaryOperator;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.IntStream;
import treadwork.fixtures.walker.Gait;
import treadwork.fixtures.walker.Walk;
import treadwork.fixtures.walker.WalkerSettings;
import treadwork.io.c3d.C3dEncoding;
import treadwork.io.c3d.C3dWriter;
import treadwork.io.study.StudyWriter;
import treadwork.model.body.Sex;
import treadwork.model.capture.Capture;
import treadwork.model.study.LabSettings;
import treadwork.model.study.Processing;
import treadwork.model.study.ResultSettings;
import treadwork.model.study.Study;
import treadwork.model.study.Subject;
import treadwork.model.study.Trial;

/** A study of one invented subject with short walks, written into a folder, to be spoilt by tests. */
record SmallStudy(Path folder) {

    private static final Walk WALK = Walk.of(WalkerSettings.DEFAULT.with(Gait.DEFAULT.withDurationS(1.3)));

    Path file() {
        return folder.resolve("study.json");
    }

    Path standing() {
        return folder.resolve("S01/standing.c3d");
    }

    Path walking(int number) {
        return folder.resolve("S01/walk-" + number + ".c3d");
    }

    Path results() {
        return folder.resolve("results");
    }

    static Capture movement() {
        return WALK.walking();
    }

    /** Writes the study with that many trials. */
    static SmallStudy write(Path folder, int trials) {
        SmallStudy study = new SmallStudy(folder);
        try {
            Files.createDirectories(folder.resolve("S01"));
            C3dWriter.write(WALK.standing(), C3dEncoding.DEFAULT, study.standing());
            for (int number = 1; number <= trials; number++) {
                C3dWriter.write(WALK.walking(), C3dEncoding.DEFAULT, study.walking(number));
            }
        } catch (IOException unwritable) {
            throw new UncheckedIOException(unwritable);
        }
        StudyWriter.write(new Study("Small", List.of(subject(trials))), study.file());
        return study;
    }

    private static Subject subject(int trials) {
        return new Subject(
                "S01",
                WALK.massKg(),
                Optional.of(1.75),
                Optional.of(Sex.FEMALE),
                "S01/standing.c3d",
                WALK.markerSet(),
                IntStream.rangeClosed(1, trials).mapToObj(SmallStudy::trial).toList());
    }

    private static Trial trial(int number) {
        return new Trial(
                "S01/walk-" + number + ".c3d",
                "plain",
                WALK.markerSet(),
                LabSettings.DEFAULT,
                WALK.body(),
                Processing.DEFAULT,
                ResultSettings.DEFAULT,
                Optional.empty(),
                Optional.empty(),
                List.of());
    }

    /** Rewrites the text of one file of the study. */
    SmallStudy edit(Path file, UnaryOperator<String> change) {
        try {
            Files.writeString(file, change.apply(Files.readString(file)));
        } catch (IOException unwritable) {
            throw new UncheckedIOException(unwritable);
        }
        return this;
    }

    /** Replaces the first {@code old} in the study file, which must be there. */
    SmallStudy replace(String old, String other) {
        return edit(file(), text -> {
            if (!text.contains(old)) {
                throw new IllegalArgumentException("the study file has no " + old);
            }
            return text.replaceFirst(Pattern.quote(old), Matcher.quoteReplacement(other));
        });
    }
}
