package hemline.reader;

import java.util.List;

/** An array of numbers or of text, read only when asked for. */
interface ArrayVariable {
    String name();

    /** Path from the root. */
    String path();

    /** Sizes of the dimensions, slowest first; empty for a scalar. */
    int[] shape();

    boolean isText();

    Attributes attributes();

    /** All elements. */
    RawArray read() throws UnreadableFileException;

    /** Elements of rows {@code from} to {@code from + count − 1} along the first dimension. */
    RawArray rows(int from, int count) throws UnreadableFileException;

    /** The text elements; the characters of a character array are joined along its last dimension. */
    List<String> texts() throws UnreadableFileException;
}
