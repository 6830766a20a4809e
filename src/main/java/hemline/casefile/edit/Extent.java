package hemline.casefile.edit;

/** How much of a track an edit takes. */
public enum Extent {
    /** The one stretch that the anchor lies on. */
    STRETCH("stretch"),
    /** The whole track. */
    TRACK("track");

    private final String label;

    Extent(String label) {
        this.label = label;
    }

    /** The word for it in the log and in tables. */
    public String label() {
        return label;
    }
}
