package treadwork.solver.cli;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.stream.Collectors;
import treadwork.model.finding.Finding;
import treadwork.solver.proof.RodResult;
import treadwork.solver.proof.WeightsResult;

/** Proofs of plates as text for a person. */
final class ProofText {

    private static final String UNKNOWN = "not determined";

    private ProofText() {}

    static String of(Path file, RodResult result, String change) {
        TextTable off = new TextTable().words().numbers(3);
        off.row("  lab axes", "x", "y", "z");
        off.row(row("  place, mm", result.moved(), 1e3, "%.1f ± %.1f"));
        off.row(row("  turn about, deg", result.turned(), Math.toDegrees(1), "%.2f ± %.2f"));
        RodResult.Miss before = result.asFound();
        RodResult.Miss after = result.corrected();
        TextTable miss = new TextTable().words().numbers(3);
        miss.row("  root mean square", "as described", "corrected", "accepted");
        miss.row("  centre of pressure from tip, mm", mm(before), mm(after), "5.0");
        miss.row("  force from rod, deg", degrees(before), degrees(after), "2.00");
        List<String> blocks = new ArrayList<>();
        blocks.add(line(
                "%s, plate %d: a rod pressed at %d places, %d frames; its tip is %.1f mm before the first marker, %s",
                file,
                result.plate(),
                result.places(),
                result.frames(),
                1e3 * result.tip(),
                result.tipError() > 0 ? line("found to ± %.2f mm", 1e3 * result.tipError()) : "as stated"));
        blocks.add("The plate is off its description by (± one standard error)" + nl() + off);
        blocks.add("The plate's load misses the rod" + nl() + miss
                + (before.isAccepted()
                        ? "As described the plate passes."
                        : after.isAccepted()
                                ? "As described the plate does not pass; corrected it does."
                                : "The plate does not pass, and moving it does not mend that.")
                + " Limits: common practice, from memory.");
        blocks.add("Corrected, in the study file:" + nl() + "  " + change);
        blocks.add(
                "This is a proposal. Measure the plate's corners before you take it over, and prove it again after. Errors assume"
                        + " that those of frames are independent; a rod that is held rather than pushed at a point adds its own."
                        + (isWhole(result)
                                ? ""
                                : " What is not determined was left as described: tilt the rod more, at more places."));
        blocks.addAll(findings(result.findings()));
        return String.join(nl() + nl(), stripped(blocks));
    }

    private static boolean isWhole(RodResult result) {
        return result.moved().stream().allMatch(component -> component.value().isPresent())
                && result.turned().stream()
                        .allMatch(component -> component.value().isPresent());
    }

    private static String[] row(String name, List<RodResult.Component> components, double unit, String format) {
        List<String> cells = new ArrayList<>(List.of(name));
        for (RodResult.Component component : components) {
            String known = line(format, unit * component.value().orElse(Double.NaN), unit * component.error());
            cells.add(component.value().isPresent() ? known.replaceFirst("^-(0\\.0+ )", "$1") : UNKNOWN);
        }
        return cells.toArray(String[]::new);
    }

    private static String mm(RodResult.Miss miss) {
        return line("%.1f", 1e3 * miss.distance());
    }

    private static String degrees(RodResult.Miss miss) {
        return line("%.2f", Math.toDegrees(miss.angle()));
    }

    static String of(List<Path> files, WeightsResult result) {
        TextTable table = new TextTable().numbers(8);
        table.row("kg", "weight N", "shown N", "error %", "noise N", "shear N", "off x mm", "off y mm");
        for (WeightsResult.Row row : result.masses()) {
            table.row(
                    line("%.3f", row.mass().massKg()),
                    line("%.2f", row.expected()),
                    line("%.2f", row.shown()),
                    line("%+.2f", 100 * row.error()),
                    line("%.2f", row.scatter()),
                    line("%.2f", row.shear()),
                    row.offX().isPresent() ? line("%+.1f", 1e3 * row.offX().getAsDouble()) : "",
                    row.offY().isPresent() ? line("%+.1f", 1e3 * row.offY().getAsDouble()) : "");
        }
        List<String> blocks = new ArrayList<>();
        blocks.add(line(
                "%s, plate %d: %d masses",
                files.stream().map(Path::toString).collect(Collectors.joining(", ")),
                result.plate(),
                result.masses().size()));
        blocks.add(table.toString());
        blocks.add(line(
                "Gain %.4f: %s. Accepted are 1 %% of each weight, and 3 mm of the centre of pressure (common acceptance, from memory).",
                result.gain(), result.isAccepted() ? "the plate passes" : "the plate does not pass"));
        blocks.add(
                "A gain that is off is mended in the plate's amplifier or its scale, by its maker's procedure, not here; a centre of"
                        + " pressure that is off by the same way everywhere is a matter of the plate's place: see plates rod.");
        blocks.addAll(findings(result.findings()));
        return String.join(nl() + nl(), stripped(blocks));
    }

    private static List<String> findings(List<Finding> findings) {
        return findings.isEmpty()
                ? List.of()
                : List.of(findings.stream().map(FindingLines::line).collect(Collectors.joining(nl())));
    }

    private static List<String> stripped(List<String> blocks) {
        return blocks.stream().map(String::stripTrailing).toList();
    }

    private static String line(String format, Object... values) {
        return String.format(Locale.ROOT, format, values);
    }

    private static String nl() {
        return System.lineSeparator();
    }
}
