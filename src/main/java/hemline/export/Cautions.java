package hemline.export;

/** Words that go with every result. */
final class Cautions {
    static final String GUIDANCE = "Guidance, not a warning: the national weather service, local procedures and "
            + "licensed forecasters decide.";

    private Cautions() {
    }
}
