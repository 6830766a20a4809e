package hemline.casefile.store;

import java.io.IOException;
import java.nio.file.Path;
import java.util.OptionalInt;

/** A file of a case is missing, damaged or not what it should be. The message names file, line, fault and mend. */
public final class CaseFileException extends IOException {
    private static final long serialVersionUID = 1L;

    private final String file;
    private final int line;
    private final String mend;

    /**
     * @param line  counted from 1; 0 when the file as a whole is meant
     * @param fault what was expected and what is there
     * @param mend  what the user can do
     */
    public CaseFileException(Path file, int line, String fault, String mend) {
        this(file, line, fault, mend, null);
    }

    public CaseFileException(Path file, int line, String fault, String mend, Throwable cause) {
        super(file + (line > 0 ? ", line " + line : "") + ": " + fault + ". " + mend, cause);
        this.file = file.toString();
        this.line = line;
        this.mend = mend;
    }

    public Path file() {
        return Path.of(file);
    }

    /** Counted from 1; empty when the file as a whole is meant. */
    public OptionalInt line() {
        return line > 0 ? OptionalInt.of(line) : OptionalInt.empty();
    }

    /** What the user can do about it. */
    public String mend() {
        return mend;
    }
}
