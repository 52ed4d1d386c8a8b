package treadwork.io.study;

import com.fasterxml.jackson.databind.JsonNode;
import java.nio.file.Path;
import java.util.HashMap;
import java.util.Map;

/** The marker sets that a study names: in the study file itself, or in files of their own, each read once. */
final class MarkerFiles {

    private final LocatedJson study;
    private final StudyPaths paths;
    private final Map<Path, LocatedJson> read = new HashMap<>();

    MarkerFiles(LocatedJson study, StudyPaths paths) {
        this.study = study;
        this.paths = paths;
    }

    /**
     * The set that holds where {@code markerSet} may stand: a path names a whole set, an object is laid over {@code
     * inherited}, nothing leaves that as it is.
     *
     * @param pointer of the object that may carry the key
     */
    MarkerSource resolve(String pointer, MarkerSource inherited) {
        String here = pointer + "/markerSet";
        JsonNode node = study.node(here);
        if (node.isTextual()) {
            Path path = paths.existing(study.at(here), node.textValue());
            LocatedJson file = read.computeIfAbsent(path, MarkerFiles::load);
            return MarkerSource.NONE.under(new MarkerLayer(file, ""));
        }
        return node.isObject() ? inherited.under(new MarkerLayer(study, here)) : inherited;
    }

    private static LocatedJson load(Path path) {
        LocatedJson file = LocatedJson.parse(path.toString(), JsonFile.bytes(path));
        SchemaCheck.markerSet(file);
        return file;
    }
}
