package hemline.cli;

import picocli.CommandLine.TypeConversionException;

/** Numbers in arguments: finite, with a decimal point. */
final class DecimalNumber {
    private DecimalNumber() {
    }

    static double parse(String text, String what) {
        try {
            double value = Double.parseDouble(text.strip());
            if (Double.isFinite(value)) {
                return value;
            }
        } catch (NumberFormatException e) {
            throw new TypeConversionException("'" + text + "' is not a number (" + what + ")");
        }
        throw new TypeConversionException("'" + text + "' is not a finite number (" + what + ")");
    }
}
