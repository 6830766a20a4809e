package hemline.casefile.edit;

/** What came of looking at a track. */
public enum ReviewOutcome {
    /** It is right as it is. */
    ACCEPTED("accepted"),
    /** It is right now, after edits. */
    CORRECTED("corrected"),
    /** It needs another look. */
    LATER("later");

    private final String label;

    ReviewOutcome(String label) {
        this.label = label;
    }

    /** The word for it in the log and in tables. */
    public String label() {
        return label;
    }
}
