package hemline.casefile.review;

/** Why a track should be looked at. */
public enum ReviewReason {
    WEAK("weak", "the evidence for it is among the weakest of the loop"),
    FEW_SWEEPS("few-sweeps", "it is seen in few sweeps"),
    MOSTLY_FILLED("mostly-filled", "much of it is filled in rather than seen"),
    GAP("gap", "it is missing from sweeps between its first and its last"),
    SPEED_KINK("speed-kink", "its speed jumps from one sweep to the next"),
    LENGTH_JUMP("length-jump", "its length jumps from one sweep to the next"),
    NO_SPEED("no-speed", "it has no speed though it is seen in several sweeps"),
    UNSURE_SPEED("unsure-speed", "its speed is poorly known"),
    BROKEN("broken", "another track goes on where it ends"),
    DOUBLED("doubled", "another track runs along it"),
    THEORY("theory", "it disagrees with theory"),
    LATER("later", "it was put off");

    private final String label;
    private final String words;

    ReviewReason(String label, String words) {
        this.label = label;
        this.words = words;
    }

    /** The word for it in tables. */
    public String label() {
        return label;
    }

    /** A clause that follows the track's id. */
    public String words() {
        return words;
    }
}
