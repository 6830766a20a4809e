package hemline.reader;

import java.nio.file.Path;

/**
 * A file that cannot be read, or not used: which one, where inside it, what is wrong, and what its owner can do.
 * The message is one line.
 */
public final class UnreadableFileException extends Exception {
    private static final long serialVersionUID = 1L;
    private final transient Path file;
    private final String place;
    private final String problem;
    private final String mend;

    /**
     * @param place   where inside the file, for example {@code /dataset1/where}; empty for the file as a whole
     * @param problem what is wrong: what was expected and what was found
     * @param mend    what to do about it
     */
    public UnreadableFileException(Path file, String place, String problem, String mend, Throwable cause) {
        super(oneLine(file.getFileName() + (place.isEmpty() ? "" : ", " + place) + ": " + problem + "; " + mend), cause);
        this.file = file;
        this.place = place;
        this.problem = oneLine(problem);
        this.mend = oneLine(mend);
    }

    public Path file() {
        return file;
    }

    public String place() {
        return place;
    }

    /** What is wrong, without the file's name. */
    public String problem() {
        return problem;
    }

    public String mend() {
        return mend;
    }

    /** Place, problem and mend on one line, without the file's name. */
    public String reason() {
        return oneLine((place.isEmpty() ? "" : place + ": ") + problem + "; " + mend);
    }

    private static String oneLine(String text) {
        return text.replaceAll("\\s+", " ").strip();
    }
}
