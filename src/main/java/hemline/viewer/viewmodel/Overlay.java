package hemline.viewer.viewmodel;

/** What can be drawn over the sweep; each can be shown or hidden. */
public enum Overlay {
    BOUNDARIES("Boundaries", "Lines found in this sweep: solid found, dashed drawn by hand, dotted set aside", "B",
            true),
    LABELS("Labels", "Track name and speed, m s\u207b\u00b9", "L", true),
    ARROWS("Motion, 10 min", "Arrow to where the line will be in 10 minutes; the bar at its tip spans two standard"
            + " deviations either way", "V", true),
    EARLIER("Earlier positions", "The track in earlier sweeps, fading with age", "E", true),
    ARCS("Arc fit", "The circle fitted through time and the path of its centre", "C", true),
    MEETINGS("Meetings", "Diamond filled: observed. Diamond open: expected. Ellipse: one standard deviation", "M",
            true),
    RINGS("Range rings", "Distance from the radar, km", "G", true),
    AZIMUTHS("Azimuth ticks", "Degrees clockwise from north", "Z", true),
    CEILING("Height ceiling", "Beyond this range the beam is too high: nothing is claimed", "H", true),
    MAP("Coasts and borders", BaseMap.ATTRIBUTION + "; and your own map layers", "P", true),
    GRATICULE("Latitude and longitude", "Graticule on WGS 84, degrees", "T", false);

    private final String words;
    private final String explained;
    private final String key;
    private final boolean shownAtFirst;

    Overlay(String words, String explained, String key, boolean shownAtFirst) {
        this.words = words;
        this.explained = explained;
        this.key = key;
        this.shownAtFirst = shownAtFirst;
    }

    public String words() {
        return words;
    }

    /** A sentence for a tooltip, with units. */
    public String explained() {
        return explained;
    }

    /** The key that shows or hides it. */
    public String key() {
        return key;
    }

    public boolean shownAtFirst() {
        return shownAtFirst;
    }
}
