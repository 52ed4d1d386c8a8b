package treadwork.solver.cli;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;
import treadwork.io.file.JsonText;
import treadwork.model.capture.Capture;
import treadwork.solver.proof.KnownMass;
import treadwork.solver.proof.WeightsResult;
import treadwork.solver.proof.WeightsTest;

/** {@code treadwork plates weights}: what a plate shows for known masses. */
@Command(
        name = "weights",
        description = {
            "Find a plate's gain, and the error of its centre of pressure, from known masses.",
            "",
            "Put each mass on the plate and leave it alone for 3 s, the plate empty before, between and after; all in one capture,"
                    + " or one capture a mass. Long lists of arguments may stand in a file that is given as @FILE."
        },
        mixinStandardHelpOptions = true)
final class PlatesWeightsCommand implements Callable<Integer> {

    @Parameters(arity = "1..*", paramLabel = "FILE", description = "Capture files (C3D), in the order of the masses.")
    List<Path> files;

    @Option(
            names = "--masses",
            required = true,
            split = ",",
            paramLabel = "KG",
            description = "The masses in the order in which they were put on.")
    List<Double> masses;

    @Option(names = "--marker", paramLabel = "LABEL", description = "Label of the marker on top of each mass.")
    String marker;

    @Option(
            names = "--at",
            paramLabel = "X,Y",
            description =
                    "Place of a mass, mm, plate axes from the middle of the surface; once for each mass, in their order.")
    List<String> places = List.of();

    @Mixin
    ProvedPlateArguments proved;

    @Spec
    CommandSpec spec;

    @Override
    public Integer call() {
        List<KnownMass> known = known();
        List<Capture> captures = files.stream().map(proved::read).toList();
        WeightsResult result = WeightsTest.of(captures, proved.plate, proved.up(captures.get(0)), known);
        spec.commandLine()
                .getOut()
                .println(
                        proved.json
                                ? JsonText.of(ProofJson.of(files, result)).stripTrailing()
                                : ProofText.of(files, result).stripTrailing());
        return ExitCode.DONE;
    }

    private List<KnownMass> known() {
        if (!places.isEmpty() && (marker != null || places.size() != masses.size())) {
            throw new ParameterException(
                    spec.commandLine(),
                    "--at is given once for each of the " + masses.size() + " masses, and not beside --marker");
        }
        List<KnownMass> known = new ArrayList<>();
        for (int i = 0; i < masses.size(); i++) {
            try {
                known.add(new KnownMass(masses.get(i), place(i)));
            } catch (IllegalArgumentException refused) {
                throw new ParameterException(spec.commandLine(), refused.getMessage(), refused);
            }
        }
        return known;
    }

    private Optional<KnownMass.Place> place(int i) {
        if (marker != null) {
            return Optional.of(new KnownMass.BelowMarker(marker));
        }
        if (places.isEmpty()) {
            return Optional.empty();
        }
        String[] numbers = places.get(i).split(",", -1);
        if (numbers.length != 2) {
            throw new IllegalArgumentException("--at takes two numbers, X,Y in mm, not \"" + places.get(i) + "\"");
        }
        return Optional.of(new KnownMass.OnPlate(mm(numbers[0]), mm(numbers[1])));
    }

    private static double mm(String text) {
        try {
            return Double.parseDouble(text.strip()) / 1e3;
        } catch (NumberFormatException none) {
            throw new IllegalArgumentException("--at takes two numbers, X,Y in mm; \"" + text + "\" is none", none);
        }
    }
}
