package treadwork.model.finding;

/**
 * A change of the study file that would mend what was found.
 *
 * @param scope whose entry it changes
 * @param json  an object to lay over that entry, key by key, as it would stand in the study file
 */
public record Proposal(Scope scope, String json) {

    /** Whose entry of the study file a change belongs to. */
    public enum Scope {
        TRIAL("the trial's entry"),
        SUBJECT("the subject's entry"),
        STUDY("the study file");

        private final String place;

        Scope(String place) {
            this.place = place;
        }

        /** In words, to follow "in". */
        public String place() {
            return place;
        }
    }

    /** A text as JSON writes it, quotes included. */
    public static String quoted(String text) {
        StringBuilder quoted = new StringBuilder("\"");
        for (int i = 0; i < text.length(); i++) {
            char c = text.charAt(i);
            if (c == '"' || c == '\\') {
                quoted.append('\\').append(c);
            } else if (c < ' ') {
                quoted.append("\\u00").append(Character.forDigit(c >> 4, 16)).append(Character.forDigit(c & 15, 16));
            } else {
                quoted.append(c);
            }
        }
        return quoted.append('"').toString();
    }
}
