package hemline.reader;

import java.util.Optional;

/**
 * Named attributes. Writers store numbers as scalars, as arrays of one, even as text, and text padded with blanks or
 * nulls; here a number is a number and text is stripped.
 */
interface Attributes {
    /** Nothing named. */
    Attributes NONE = name -> Optional.empty();

    /** A {@code String}, or a {@code double[]} of at least one element; empty when absent. */
    Optional<Object> value(String name) throws UnreadableFileException;

    default Optional<String> text(String name) throws UnreadableFileException {
        return value(name).map(v -> v instanceof double[] d ? trimNumber(d[0]) : clean((String) v));
    }

    /** The first number, also out of text; empty when absent or not a number. */
    default Optional<Double> number(String name) throws UnreadableFileException {
        return value(name).flatMap(v -> v instanceof double[] d ? Optional.of(d[0]) : parse((String) v));
    }

    default Optional<double[]> numbers(String name) throws UnreadableFileException {
        return value(name).flatMap(v -> v instanceof double[] d ? Optional.of(d)
                : parse((String) v).map(one -> new double[] {one}));
    }

    private static Optional<Double> parse(String text) {
        try {
            return Optional.of(Double.parseDouble(clean(text)));
        } catch (NumberFormatException e) {
            return Optional.empty();
        }
    }

    private static String trimNumber(double number) {
        return number == Math.rint(number) && Math.abs(number) < 1e15 ? Long.toString((long) number)
                : Double.toString(number);
    }

    /** Cut at the first null character, blanks at the ends removed. */
    static String clean(String text) {
        int end = text.indexOf('\0');
        return (end < 0 ? text : text.substring(0, end)).strip();
    }
}
