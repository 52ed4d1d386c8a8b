package treadwork.io.result;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import treadwork.model.finding.Finding;

/** Findings as every JSON document of the program says them. */
public final class FindingTree {

    private FindingTree() {}

    public static List<Map<String, Object>> of(List<Finding> findings) {
        return findings.stream().map(FindingTree::of).toList();
    }

    private static Map<String, Object> of(Finding finding) {
        Map<String, Object> tree = new LinkedHashMap<>();
        tree.put("code", finding.code());
        tree.put("severity", finding.severity().name().toLowerCase(Locale.ROOT));
        tree.put("where", finding.where());
        tree.put("figure", finding.figure());
        tree.put("meaning", finding.meaning());
        tree.put("mend", finding.mend());
        tree.put("mended", finding.mended());
        return tree;
    }
}
