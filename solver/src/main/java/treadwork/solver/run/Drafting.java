package treadwork.solver.run;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.TreeMap;
import java.util.stream.Stream;
import treadwork.io.capture.CaptureFiles;
import treadwork.io.study.DraftWriter;
import treadwork.io.study.MarkersDraft;
import treadwork.io.study.StudyDraft;
import treadwork.model.capture.Capture;
import treadwork.model.capture.LengthUnit;
import treadwork.model.finding.Finding;
import treadwork.model.finding.Severity;
import treadwork.model.finding.UnusableInputException;
import treadwork.solver.draft.ClusterGuess;
import treadwork.solver.draft.Guess;
import treadwork.solver.draft.MarkerDraft;
import treadwork.solver.draft.StandingMass;
import treadwork.solver.draft.Stillness;

/**
 * A study drafted from a folder of captures.
 *
 * @param passedOver files that are not part of it, and why
 * @param written    the files
 */
public record Drafting(StudyDraft draft, List<String> passedOver, List<Path> written) {

    private static final int DEPTH = 6;
    private static final int MOST_FILES = 2000;

    /** A movement whose markers are named otherwise than the standing capture's belongs to another map. */
    private static final double LEAST_SHARED = 0.5;

    public Drafting {
        passedOver = List.copyOf(passedOver);
        written = List.copyOf(written);
    }

    /**
     * Looks through the folder and writes the draft into it. A subject is the folder itself, or each folder in it.
     *
     * @param unit of the positions, in place of what the files say
     * @throws UnusableInputException if a draft stands there already, or no subject has a standing capture
     */
    public static Drafting of(Path folder, Optional<LengthUnit> unit) {
        DraftWriter.requireNoStudy(folder);
        List<String> passedOver = new ArrayList<>();
        Map<String, Map<Capture, String>> groups = read(folder, unit, passedOver);
        List<StudyDraft.Person> people = new ArrayList<>();
        groups.forEach((name, captures) -> person(name, captures, passedOver).ifPresent(people::add));
        if (people.isEmpty()) {
            throw new UnusableInputException(new Finding(
                    "draft-standing",
                    Severity.REFUSES,
                    folder.toString(),
                    String.format(Locale.ROOT, "no capture keeps still to %.0f mm", 1000 * Stillness.LIMIT)
                            + (passedOver.isEmpty() ? "" : "; " + String.join("; ", passedOver)),
                    "Landmarks are read from a person who stands",
                    "Put the standing capture into the folder"));
        }
        String title = String.valueOf(folder.toAbsolutePath().normalize().getFileName());
        StudyDraft draft = new StudyDraft(title, unit, people);
        return new Drafting(draft, passedOver, DraftWriter.write(draft, folder));
    }

    private static Map<String, Map<Capture, String>> read(
            Path folder, Optional<LengthUnit> unit, List<String> passedOver) {
        Map<String, Map<Capture, String>> groups = new TreeMap<>();
        for (Path file : files(folder)) {
            Path path = folder.relativize(file);
            String name = path.toString().replace('\\', '/');
            Path group = path.getNameCount() > 1
                    ? path.getName(0)
                    : folder.toAbsolutePath().normalize().getFileName();
            try {
                Capture capture = CaptureFiles.read(file, unit);
                groups.computeIfAbsent(id(String.valueOf(group)), key -> new LinkedHashMap<>())
                        .put(capture, name);
            } catch (UnusableInputException e) {
                passedOver.add(name + ": " + e.finding().line());
            }
        }
        return groups;
    }

    private static List<Path> files(Path folder) {
        try (Stream<Path> walk = Files.walk(folder, DEPTH)) {
            return walk.filter(Files::isRegularFile)
                    .filter(file -> file.getFileName()
                            .toString()
                            .toLowerCase(Locale.ROOT)
                            .matches(".*\\.(c3d|txt|tsv|csv)"))
                    .limit(MOST_FILES)
                    .sorted()
                    .toList();
        } catch (IOException | java.io.UncheckedIOException e) {
            throw new UnusableInputException(
                    new Finding(
                            "draft-folder",
                            Severity.REFUSES,
                            folder.toString(),
                            "the folder cannot be read (" + e.getMessage() + ")",
                            "The captures are looked for in it",
                            "Check the name, and that you may read it"),
                    e);
        }
    }

    private static String id(String name) {
        return name.replaceAll("[^A-Za-z0-9_-]", "-");
    }

    private static Optional<StudyDraft.Person> person(
            String id, Map<Capture, String> captures, List<String> passedOver) {
        Optional<Capture> found = Stillness.standing(List.copyOf(captures.keySet()));
        if (found.isEmpty()) {
            captures.values().forEach(name -> passedOver.add(name + ": no standing capture is beside it"));
            return Optional.empty();
        }
        Capture standing = found.orElseThrow();
        List<Capture> movements = new ArrayList<>();
        List<StudyDraft.Recording> trials = new ArrayList<>();
        captures.forEach((capture, name) -> {
            if (!capture.equals(standing) && Stillness.isStanding(capture)) {
                passedOver.add(name + ": it keeps still too, with fewer markers");
            } else if (!capture.equals(standing)) {
                double shared = Stillness.shared(capture, standing);
                boolean isUsed = shared >= LEAST_SHARED;
                String remark =
                        String.format(Locale.ROOT, "%.0f %% of its markers are in the standing capture.", 100 * shared);
                trials.add(new StudyDraft.Recording(
                        name, isUsed, isUsed ? remark : remark + " Give the trial a markerSet of its own to use it."));
                if (isUsed) {
                    movements.add(capture);
                }
            }
        });
        MarkerDraft draft = MarkerDraft.of(standing, movements);
        OptionalDouble mass = StandingMass.of(standing, draft.up(), feet(draft));
        return Optional.of(new StudyDraft.Person(
                id, mass, remark(mass), captures.get(standing), remark(standing), trials, markers(draft)));
    }

    private static List<String> feet(MarkerDraft draft) {
        return draft.landmarks().stream()
                .filter(guess -> guess.landmark().name().matches(".*(HEEL|METATARSAL_HEAD|TOE_TIP)"))
                .map(Guess::label)
                .toList();
    }

    private static String remark(OptionalDouble mass) {
        return mass.isPresent()
                ? "Mass from the plates' vertical force over 9.81 m/s² as the person stands; the plates' zero cannot be"
                        + " checked there. Weigh the person if you can."
                : "TO FILL IN: mass in kg. Both feet do not stand on plates that were recorded, so it cannot be guessed.";
    }

    private static String remark(Capture standing) {
        return String.format(
                Locale.ROOT,
                "The capture that keeps still (its markers sway by %.0f mm) with the most markers (%d).",
                1000 * Stillness.motion(standing),
                Stillness.markers(standing));
    }

    private static MarkersDraft markers(MarkerDraft draft) {
        return new MarkersDraft(
                draft.remarks(),
                draft.landmarks().stream().map(Drafting::line).toList(),
                draft.clusters().stream().map(Drafting::line).toList(),
                draft.unmapped());
    }

    private static MarkersDraft.Line line(Guess guess) {
        String sure = String.format(Locale.ROOT, "%.0f %% sure, ", Math.floor(100 * guess.confidence()));
        return new MarkersDraft.Line(
                guess.landmark().key(), List.of(guess.label()), guess.isSure(), sure + guess.why() + ".");
    }

    private static MarkersDraft.Line line(ClusterGuess guess) {
        return new MarkersDraft.Line(
                guess.segment().key(), guess.labels(), guess.isSure(), "Between its joints; " + guess.why() + ".");
    }
}
