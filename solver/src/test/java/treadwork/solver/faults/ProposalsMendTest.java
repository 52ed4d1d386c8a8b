package treadwork.solver.faults;

import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Named;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import treadwork.io.c3d.C3dEncoding;
import treadwork.io.c3d.C3dWriter;
import treadwork.io.study.StudyReader;
import treadwork.io.study.StudyWriter;
import treadwork.model.finding.Finding;
import treadwork.model.finding.Proposal;
import treadwork.model.finding.Severity;
import treadwork.model.study.Study;
import treadwork.solver.run.StudyInspection;

/** What a finding proposes, laid over the study file as a person would, mends what was found. */
class ProposalsMendTest {

    private static final ObjectMapper JSON = new ObjectMapper();

    @TempDir
    Path folder;

    /** One size of each mistake for which a change of the study file is known. */
    static Stream<Named<PlantedFault>> mendable() {
        List<String> codes =
                List.of("clock-shift", "plate-place", "mass-mismatch", "plate-turned", "plate-swapped", "marker-swap");
        return FaultCatalogue.all().stream()
                .filter(fault -> fault.matters() && codes.contains(fault.code()))
                .map(fault -> Named.of(fault.code() + ": " + fault.what(), fault));
    }

    @ParameterizedTest
    @MethodSource("mendable")
    void theChangeThatIsProposedMends(PlantedFault fault) throws IOException {
        write(fault.in(5));
        List<Finding> found = inspected();
        Proposal proposal = found.stream()
                .filter(finding -> finding.code().equals(fault.code()))
                .findFirst()
                .flatMap(Finding::proposal)
                .orElseThrow();

        layOver(proposal);

        List<Finding> left = inspected().stream()
                .filter(finding -> finding.severity() != Severity.NOTE)
                .toList();
        assertTrue(left.isEmpty(), left.toString());
        assertFalse(found.isEmpty());
    }

    private void write(NoisyWalk walk) throws IOException {
        C3dWriter.write(walk.standing(), C3dEncoding.DEFAULT, folder.resolve("standing.c3d"));
        C3dWriter.write(walk.walking(), C3dEncoding.DEFAULT, folder.resolve("walking.c3d"));
        StudyWriter.write(new Study("", List.of(walk.input().subject())), folder.resolve("study.json"));
    }

    private List<Finding> inspected() {
        List<Finding> findings = new ArrayList<>();
        StudyInspection.each(
                StudyReader.read(folder.resolve("study.json")),
                trial -> findings.addAll(trial.inspection().orElseThrow().findings()));
        return findings;
    }

    private void layOver(Proposal proposal) throws IOException {
        Path file = folder.resolve("study.json");
        JsonNode study = JSON.readTree(Files.readString(file));
        JsonNode subject = study.path("subjects").get(0);
        JsonNode entry = switch (proposal.scope()) {
            case STUDY -> study;
            case SUBJECT -> subject;
            case TRIAL -> subject.path("trials").get(0);
        };
        lay((ObjectNode) entry, change(proposal));
        Files.writeString(file, study.toPrettyString());
    }

    private static JsonNode change(Proposal proposal) throws JsonProcessingException {
        return JSON.readTree(proposal.json());
    }

    private static void lay(ObjectNode under, JsonNode over) {
        over.fieldNames().forEachRemaining(key -> {
            if (over.get(key).isObject() && under.get(key) instanceof ObjectNode there) {
                lay(there, over.get(key));
            } else {
                under.set(key, over.get(key));
            }
        });
    }
}
