package hemline.scoring;

import java.nio.file.Path;

/** A table or truth that cannot be used: which file, where in it, what is wrong and what to do. One line. */
public final class InputFileException extends Exception {
    private static final long serialVersionUID = 1L;

    /**
     * @param place   where inside the file, for example {@code line 12, column x_km}; empty for the file as a whole
     * @param problem what was expected and what was found
     * @param mend    what to do about it
     * @param cause   null when there is none
     */
    public InputFileException(Path file, String place, String problem, String mend, Throwable cause) {
        super((file + (place.isEmpty() ? "" : ", " + place) + ": " + problem + "; " + mend).replaceAll("\\s+", " "),
                cause);
    }
}
