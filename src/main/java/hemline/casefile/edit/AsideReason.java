package hemline.casefile.edit;

/** Why something is no boundary. */
public enum AsideReason {
    /** Echo from the ground or from what stands on it. */
    CLUTTER("clutter"),
    /** A band of rain. */
    RAIN_BAND("rain-band"),
    /** A horizontal convective roll. */
    ROLL("roll"),
    /** Birds, bats or insects on their own way. */
    ANIMALS("animals"),
    /** Something else, said in words. */
    OTHER("other"),
    /** A boundary it is, but a hand-drawn line took its place. */
    REPLACED("replaced");

    private final String label;

    AsideReason(String label) {
        this.label = label;
    }

    /** The word for it in the log and in tables. */
    public String label() {
        return label;
    }
}
