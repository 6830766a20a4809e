package hemline.viewer.viewmodel;

/** What the plane shows of a sweep. */
public enum PlaneField {
    /** Reflectivity as measured. */
    MEASURED("Measured", "Reflectivity as the radar measured it, dBZ"),
    /** Reflectivity without the gates that are not weather or insects. */
    SCREENED("Screened", "Reflectivity without clutter, spikes, speckle, second trip and blocked sectors, dBZ"),
    /** The difference of the two: the gates taken away, by reason. */
    REMOVED("Removed", "What screening marked, by reason; the rest dimmed"),
    /** Radial velocity. */
    VELOCITY("Velocity", "Radial velocity, m s\u207b\u00b9, positive away from the radar");

    private final String words;
    private final String explained;

    PlaneField(String words, String explained) {
        this.words = words;
        this.explained = explained;
    }

    public String words() {
        return words;
    }

    /** A sentence for a tooltip, with units. */
    public String explained() {
        return explained;
    }
}
