package hemline.cli;

import picocli.CommandLine.ITypeConverter;
import picocli.CommandLine.TypeConversionException;

/**
 * Elevations written {@code MIN..MAX}.
 *
 * @param minDeg degrees
 * @param maxDeg degrees
 */
record ElevationRange(double minDeg, double maxDeg) {

    static final class Converter implements ITypeConverter<ElevationRange> {
        @Override
        public ElevationRange convert(String text) {
            String[] ends = text.split("\\.\\.", -1);
            if (ends.length != 2) {
                throw new TypeConversionException("'" + text + "' is not of the form MIN..MAX, for example 0..1.5");
            }
            double min = DecimalNumber.parse(ends[0], "elevation");
            double max = DecimalNumber.parse(ends[1], "elevation");
            if (!(min >= -90 && min <= max && max <= 90)) {
                throw new TypeConversionException("elevations must rise within -90..90 degrees, got " + text);
            }
            return new ElevationRange(min, max);
        }
    }
}
