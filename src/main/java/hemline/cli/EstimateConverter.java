package hemline.cli;

import hemline.numerics.Estimate;
import picocli.CommandLine.ITypeConverter;
import picocli.CommandLine.TypeConversionException;

/** A number with or without its standard deviation, written {@code 8.6} or {@code 8.6+-0.5} or {@code 8.6±0.5}. */
final class EstimateConverter implements ITypeConverter<Estimate> {
    @Override
    public Estimate convert(String text) {
        String[] parts = text.split("\\+-|±", -1);
        if (parts.length > 2) {
            throw new TypeConversionException("'" + text + "' is not of the form VALUE or VALUE+-SD");
        }
        double value = DecimalNumber.parse(parts[0], "value");
        double sd = parts.length == 1 ? 0 : DecimalNumber.parse(parts[1], "standard deviation");
        if (sd < 0) {
            throw new TypeConversionException("a standard deviation must be at least 0, got " + parts[1]);
        }
        return new Estimate(value, sd);
    }
}
