package hemline.casefile.edit;

/** What an analyst says of a meeting. */
public enum MeetingVerdict {
    /** They met. */
    CONFIRMED("confirmed"),
    /** They did not meet. */
    DENIED("denied"),
    /** Nothing; an earlier ruling is withdrawn. */
    OPEN("open");

    private final String label;

    MeetingVerdict(String label) {
        this.label = label;
    }

    /** The word for it in the log and in tables. */
    public String label() {
        return label;
    }
}
