package hemline.cli;

import picocli.CommandLine.ITypeConverter;
import picocli.CommandLine.TypeConversionException;

/**
 * One quantity on both sides of a boundary, written {@code AHEAD,BEHIND}, or {@code AHEAD} alone.
 *
 * @param ahead  ahead of it
 * @param behind behind it; NaN when not given
 */
record AheadBehind(double ahead, double behind) {

    static final class Converter implements ITypeConverter<AheadBehind> {
        @Override
        public AheadBehind convert(String text) {
            String[] parts = text.split(",", -1);
            if (parts.length > 2) {
                throw new TypeConversionException("'" + text + "' is not of the form AHEAD or AHEAD,BEHIND");
            }
            return new AheadBehind(DecimalNumber.parse(parts[0], "ahead"),
                    parts.length == 1 ? Double.NaN : DecimalNumber.parse(parts[1], "behind"));
        }
    }
}
