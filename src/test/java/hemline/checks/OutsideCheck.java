package hemline.checks;

import java.util.Locale;
import java.util.function.DoubleSupplier;

/**
 * One value from outside the project that a calculation here has to reproduce.
 *
 * @param part      heading it is listed under
 * @param quantity  what is compared, with its unit
 * @param inputs    in words
 * @param expected  as the source prints it
 * @param tolerance greatest difference allowed, absolute, in the unit of the quantity
 * @param source    where the expected value is from
 * @param basis     how far that has been looked at
 * @param got       the value here
 */
public record OutsideCheck(String part, String quantity, String inputs, String expected, double tolerance,
                           String source, Basis basis, DoubleSupplier got) {

    /** How the expected value came here. */
    public enum Basis {
        READ("read in the source or in a public copy of it"),
        CALCULATED("calculated apart from this code, from the published formula or definition"),
        FROM_MEMORY("from memory"),
        PRACTICE("common practice, no source");

        private final String words;

        Basis(String words) {
            this.words = words;
        }

        String words() {
            return words;
        }
    }

    double expectedValue() {
        return Double.parseDouble(expected);
    }

    double difference() {
        return Math.abs(got.getAsDouble() - expectedValue());
    }

    /** The value here with one digit more than the tolerance resolves. */
    String gotText() {
        double value = got.getAsDouble();
        int leading = value == 0 ? 0 : (int) Math.floor(Math.log10(Math.abs(value)));
        int last = (int) Math.floor(Math.log10(tolerance)) - 1;
        if (leading >= 7 || leading < -4) {
            return String.format(Locale.ROOT, "%." + Math.min(15, Math.max(1, leading - last)) + "e", value);
        }
        return String.format(Locale.ROOT, "%." + Math.min(10, Math.max(0, -last)) + "f", value);
    }

    String toleranceText() {
        return tolerance >= 1e-3 ? String.format(Locale.ROOT, "%s", tolerance).replaceAll("\\.0$", "")
                : String.format(Locale.ROOT, "%.1e", tolerance).replace(".0e", "e");
    }

    @Override
    public String toString() {
        return quantity + ", " + inputs;
    }
}
