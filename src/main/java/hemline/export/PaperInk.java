package hemline.export;

/** Colours on white paper; tracks also differ by label. Dark enough for print, apart for colour-blind readers. */
final class PaperInk {
    static final String WORDS = "#1b1f24";
    static final String FAINT = "#6b7280";
    static final String GRID = "#d5d8dd";
    private static final String[] TRACKS = {"#b4540a", "#1f5fa8", "#7a2d8f", "#0f766e", "#a3123f", "#5b5b12"};

    private PaperInk() {
    }

    static String track(int index) {
        return TRACKS[Math.floorMod(index, TRACKS.length)];
    }
}
