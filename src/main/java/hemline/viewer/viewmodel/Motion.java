package hemline.viewer.viewmodel;

/** How the loop plays. */
public enum Motion {
    STILL("Stopped"),
    FORWARD("Playing"),
    BACK("Playing backward"),
    ROCK("Rocking to and fro");

    private final String words;

    Motion(String words) {
        this.words = words;
    }

    public String words() {
        return words;
    }
}
