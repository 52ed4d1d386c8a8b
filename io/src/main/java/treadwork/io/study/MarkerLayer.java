package treadwork.io.study;

import com.fasterxml.jackson.databind.JsonNode;

/**
 * A marker set, or a part of one, as it stands in a file.
 *
 * @param pointer of the object in {@code document}
 */
record MarkerLayer(LocatedJson document, String pointer) {

    boolean has(String key) {
        return !document.node(pointer + key).isMissingNode();
    }

    Place at(String key) {
        return document.at(pointer + key);
    }

    JsonNode part(String name) {
        return document.node(pointer + "/" + name);
    }
}
