package treadwork.io.result;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import treadwork.io.file.JsonText;
import treadwork.model.finding.Finding;
import treadwork.model.finding.Proposal;

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
        finding.proposal().ifPresent(proposal -> tree.put("proposal", of(proposal)));
        return tree;
    }

    private static Map<String, Object> of(Proposal proposal) {
        Map<String, Object> tree = new LinkedHashMap<>();
        tree.put("in", proposal.scope().name().toLowerCase(Locale.ROOT));
        tree.put("change", JsonText.parse(proposal.json()));
        return tree;
    }
}
