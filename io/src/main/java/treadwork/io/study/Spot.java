package treadwork.io.study;

import com.fasterxml.jackson.core.JsonLocation;
import java.util.HashMap;
import java.util.Map;

/**
 * Where a key or value stands in a text, with those inside it: a tree beside the tree of values.
 *
 * @param inside by key, or by place in a list
 */
record Spot(JsonLocation at, Map<String, Spot> inside) {

    static Spot at(JsonLocation location) {
        return new Spot(location, new HashMap<>(4));
    }

    /** The spot at a JSON pointer, or of the nearest thing around it where none stands there. */
    Spot nearest(String pointer) {
        Spot spot = this;
        for (String token : pointer.split("/", -1)) {
            if (token.isEmpty()) {
                continue;
            }
            Spot next = spot.inside.get(Place.unescaped(token));
            if (next == null) {
                return spot;
            }
            spot = next;
        }
        return spot;
    }
}
