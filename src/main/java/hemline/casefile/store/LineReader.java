package hemline.casefile.store;

import com.fasterxml.jackson.core.JsonProcessingException;
import java.io.IOException;
import java.nio.file.Path;
import java.util.function.Function;

/** Reads a file of one JSON object a line, and names file and line of whatever is wrong. */
final class LineReader {
    private final Path file;
    private final byte[] bytes;
    private int position;
    private int line;

    LineReader(Path file, byte[] bytes) {
        this.file = file;
        this.bytes = bytes;
    }

    boolean more() {
        return position < bytes.length;
    }

    <T> T next(Class<T> type) throws CaseFileException {
        line++;
        if (!more()) {
            throw fault("another line is due, but the file ends", null);
        }
        int end = position;
        while (end < bytes.length && bytes[end] != '\n') {
            end++;
        }
        int start = position;
        position = end + 1;
        if (end - start > CaseJson.LONGEST_LINE_BYTES) {
            throw fault("the line is too long: " + (end - start) + " bytes", null);
        }
        try {
            T value = CaseJson.MAPPER.readValue(bytes, start, end - start, type);
            if (value == null) {
                throw fault("an object is due, but the line says null", null);
            }
            return value;
        } catch (JsonProcessingException e) {
            throw fault(e.getOriginalMessage(), e);
        } catch (CaseFileException e) {
            throw e;
        } catch (IOException e) {
            throw fault(e.getMessage(), e);
        }
    }

    /** Makes a noun of what the last line said; a refusal of the noun is a fault of that line. */
    <A, B> B make(A from, Function<A, B> maker) throws CaseFileException {
        try {
            return maker.apply(from);
        } catch (IllegalArgumentException | NullPointerException | ArithmeticException e) {
            throw fault(String.valueOf(e.getMessage()), e);
        }
    }

    private CaseFileException fault(String what, Exception cause) {
        String first = what.lines().findFirst().orElse(what);
        return new CaseFileException(file, line, first, "Run the case again, or restore the file from a copy", cause);
    }
}
