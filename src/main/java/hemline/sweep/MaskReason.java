package hemline.sweep;

/** Why a gate is not taken at face value. */
public enum MaskReason {
    /** Echo of the ground, masts or wind farms: it stays while weather moves. */
    CLUTTER("static clutter"),
    /** A narrow radial streak: interference, the sun, another transmitter. */
    SPIKE("interference spike or strobe"),
    /** An isolated gate or a few, without neighbours. */
    SPECKLE("speckle"),
    /** Echo from beyond the unambiguous range. */
    SECOND_TRIP("second-trip echo"),
    /** The beam is partly or wholly blocked in this sector. */
    BLOCKED("blocked sector"),
    /** Rain or hail of a convective cell: context for boundaries, never a boundary itself. */
    DEEP_CONVECTION("deep convection"),
    /** The beam is above the height ceiling. */
    ABOVE_CEILING("above the height ceiling");

    private final String words;

    MaskReason(String words) {
        this.words = words;
    }

    /** The reason in words for a read-out. */
    public String words() {
        return words;
    }

    /** The bit of this reason in a gate's mask. */
    public int bit() {
        return 1 << ordinal();
    }
}
