package hemline.reader;

import java.io.IOException;
import java.nio.file.Path;

/** The file being read, for its faults; and the shield that lets nothing but typed faults out of a library. */
record InputFile(Path path) {
    private static final String FETCH_AGAIN = "fetch or copy the file again";
    private static final int LONGEST_DETAIL = 160;

    /** Work inside a format library. */
    @FunctionalInterface
    interface LibraryCall<T> {
        T run() throws IOException, UnreadableFileException;
    }

    UnreadableFileException fault(String place, String problem, String mend) {
        return new UnreadableFileException(path, place, problem, mend, null);
    }

    /** A fault of a file whose structure does not hold together. */
    UnreadableFileException broken(String place, String problem) {
        return fault(place, problem, FETCH_AGAIN);
    }

    /**
     * Runs a library on bytes that may be hostile. Whatever it throws, exhausted stack and heap included, becomes
     * one typed fault: sizes are checked before, so that an exhausted heap stays the exception.
     */
    <T> T shield(String place, LibraryCall<T> call) throws UnreadableFileException {
        try {
            return call.run();
        } catch (IOException | RuntimeException | StackOverflowError | OutOfMemoryError | InternalError
                 | AssertionError | ExceptionInInitializerError e) {
            throw new UnreadableFileException(path, place, "its structure cannot be followed (" + detail(e) + ")",
                    FETCH_AGAIN, e);
        }
    }

    private static String detail(Throwable e) {
        Throwable root = e;
        for (int depth = 0; root.getCause() != null && depth < 10; depth++) {
            root = root.getCause();
        }
        String text = root.getMessage() == null ? root.getClass().getSimpleName() : root.getMessage();
        return text.length() > LONGEST_DETAIL ? text.substring(0, LONGEST_DETAIL) + "..." : text;
    }
}
