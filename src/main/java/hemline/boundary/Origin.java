package hemline.boundary;

/** Who put a boundary there. */
public enum Origin {
    AUTO("auto"),
    HAND("hand");

    private final String label;

    Origin(String label) {
        this.label = label;
    }

    /** The word for this origin in tables. */
    public String label() {
        return label;
    }
}
