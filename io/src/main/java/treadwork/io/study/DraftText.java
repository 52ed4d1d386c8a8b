package treadwork.io.study;

import com.fasterxml.jackson.core.io.JsonStringEncoder;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Map;

/** The text of drafted files: JSON with a comment above each guess. */
final class DraftText {

    private DraftText() {}

    static String markers(MarkersDraft draft) {
        StringBuilder text = new StringBuilder();
        comment(
                text,
                "",
                "Guessed from geometry; check every line. Lines behind // are not used: take the // away to use them.");
        draft.remarks().forEach(remark -> comment(text, "", remark));
        text.append("{\n  \"landmarks\": {\n");
        lines(text, draft.landmarks(), false);
        text.append("  },\n  \"clusters\": {\n");
        lines(text, draft.clusters(), true);
        text.append("  }\n}\n");
        comment(
                text,
                "",
                "Neither landmark nor cluster: "
                        + (draft.unmapped().isEmpty() ? "none" : String.join(", ", draft.unmapped())));
        return text.toString();
    }

    private static void lines(StringBuilder text, List<MarkersDraft.Line> lines, boolean isList) {
        long left = lines.stream().filter(MarkersDraft.Line::isUsed).count();
        for (MarkersDraft.Line line : lines) {
            comment(text, "    ", line.comment());
            List<String> labels = line.labels().stream().map(DraftText::quoted).toList();
            String value = isList ? "[" + String.join(", ", labels) + "]" : labels.get(0);
            left -= line.isUsed() ? 1 : 0;
            String comma = line.isUsed() && left == 0 ? "" : ",";
            text.append(line.isUsed() ? "    " : "    // ")
                    .append(quoted(line.key()))
                    .append(": ")
                    .append(value)
                    .append(comma)
                    .append('\n');
        }
    }

    static String study(StudyDraft draft, Map<MarkersDraft, String> names) {
        StringBuilder text = new StringBuilder();
        comment(text, "", "A draft: check every line, and fill in what stands behind //.");
        text.append("{\n  \"treadwork\": 1,\n  \"title\": ")
                .append(quoted(draft.title()))
                .append(",\n");
        draft.unit()
                .ifPresent(unit -> text.append("  \"lab\": { \"pointUnit\": ")
                        .append(quoted(unit.symbol()))
                        .append(" },\n"));
        text.append("  \"subjects\": [\n");
        List<String> people = new ArrayList<>();
        draft.subjects().forEach(person -> people.add(person(person, names.get(person.markers()))));
        return text.append(String.join(",\n", people)).append("\n  ]\n}\n").toString();
    }

    private static String person(StudyDraft.Person person, String markers) {
        StringBuilder text = new StringBuilder("    {\n      \"id\": " + quoted(person.id()) + ",\n");
        comment(text, "      ", person.massRemark());
        String mass = person.massKg().isPresent()
                ? String.format(
                        Locale.ROOT, "\"massKg\": %.1f,", person.massKg().orElseThrow())
                : "// \"massKg\": 70,";
        text.append("      ").append(mass).append('\n');
        comment(
                text,
                "      ",
                "TO FILL IN: height in metres and sex (\"female\" or \"male\"); some tables of segment masses need them.");
        text.append("      // \"heightM\": 1.75,\n      // \"sex\": \"female\",\n");
        comment(text, "      ", person.staticRemark());
        text.append("      \"static\": ").append(quoted(person.staticFile())).append(",\n");
        text.append("      \"markerSet\": ").append(quoted(markers)).append(",\n      \"trials\": [\n");
        long left =
                person.trials().stream().filter(StudyDraft.Recording::isUsed).count();
        for (StudyDraft.Recording trial : person.trials()) {
            comment(text, "        ", trial.remark());
            left -= trial.isUsed() ? 1 : 0;
            text.append(trial.isUsed() ? "        " : "        // ")
                    .append("{ \"file\": ")
                    .append(quoted(trial.file()))
                    .append(trial.isUsed() && left == 0 ? " }\n" : " },\n");
        }
        return text.append("      ]\n    }").toString();
    }

    /** A comment ends where its line does, so whatever else would end a line in it becomes a blank. */
    private static void comment(StringBuilder text, String indent, String words) {
        text.append(indent)
                .append("// ")
                .append(words.replaceAll("[\\p{Cntrl}\\u2028\\u2029\\u0085]", " "))
                .append('\n');
    }

    private static String quoted(String text) {
        return "\"" + new String(JsonStringEncoder.getInstance().quoteAsString(text)) + "\"";
    }
}
