package treadwork.solver.cli;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
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
import treadwork.model.capture.Plate;
import treadwork.solver.plate.PlatesAsJson;
import treadwork.solver.proof.Rod;
import treadwork.solver.proof.RodResult;
import treadwork.solver.proof.RodTest;

/** {@code treadwork plates rod}: where a plate stands and how it lies. */
@Command(
        name = "rod",
        description = {
            "Find where a plate stands and how it lies, from a rod with pointed ends.",
            "",
            "Stand the rod on the plate, hand on its other end, and press with 100 to 300 N while tilting it by 20 degrees and more"
                    + " to all sides, its tip held in place: for some seconds each in the middle and near the corners. Begin"
                    + " and end with the plate empty. The rod carries two markers or more on its axis."
        },
        mixinStandardHelpOptions = true)
final class PlatesRodCommand implements Callable<Integer> {

    @Parameters(paramLabel = "FILE", description = "Capture file (C3D).")
    Path file;

    @Option(
            names = "--markers",
            required = true,
            split = ",",
            paramLabel = "LABEL",
            description = "Labels of the rod's markers, from the tip towards the hand: two or more.")
    List<String> markers;

    @Option(
            names = "--tip-mm",
            paramLabel = "MM",
            description = "From the tip to the first marker along the rod; else it is found from the rod's turning.")
    Double tipMm;

    @Option(
            names = "--rod-kg",
            paramLabel = "KG",
            defaultValue = "0",
            description = "Mass of the rod (default: neglected).")
    double rodKg;

    @Option(
            names = "--rod-centre",
            paramLabel = "SHARE",
            defaultValue = "0.5",
            description =
                    "Its centre of mass, as a share of the way from the tip to the hand (default: ${DEFAULT-VALUE}).")
    double rodCentre;

    @Mixin
    ProvedPlateArguments proved;

    @Spec
    CommandSpec spec;

    @Override
    public Integer call() {
        Rod rod = rod();
        Capture capture = proved.read(file);
        RodResult result = RodTest.of(capture, capture.plates(), proved.plate, proved.up(capture), rod);
        List<Plate> plates = new ArrayList<>(capture.plates());
        plates.set(proved.plate - 1, result.proposed());
        String change = PlatesAsJson.change(plates);
        spec.commandLine()
                .getOut()
                .println(
                        proved.json
                                ? JsonText.of(ProofJson.of(file, result, change))
                                        .stripTrailing()
                                : ProofText.of(file, result, change).stripTrailing());
        return ExitCode.DONE;
    }

    private Rod rod() {
        try {
            return new Rod(
                    markers,
                    tipMm == null ? OptionalDouble.empty() : OptionalDouble.of(tipMm / 1e3),
                    rodKg,
                    Rod.MIDDLE);
        } catch (IllegalArgumentException refused) {
            throw new ParameterException(spec.commandLine(), refused.getMessage(), refused);
        }
    }
}
