package treadwork.io.c3d;

import java.util.ArrayList;
import java.util.List;
import treadwork.model.finding.Finding;

/** One reading of one file: its name for messages, and what has been noticed so far. */
final class Reading {

    private final String file;
    private final List<Finding> findings = new ArrayList<>();

    Reading(String file) {
        this.file = file;
    }

    String file() {
        return file;
    }

    void note(Finding finding) {
        findings.add(finding);
    }

    List<Finding> findings() {
        return List.copyOf(findings);
    }
}
