package hemline.export;

import java.math.BigDecimal;
import java.math.RoundingMode;

/** Numbers as text, the same on every machine and in every locale. */
final class Numbers {
    private Numbers() {
    }

    /** With a fixed number of decimals; empty when not finite; never a negative zero. */
    static String fixed(double value, int decimals) {
        if (!Double.isFinite(value)) {
            return "";
        }
        String text = BigDecimal.valueOf(value).setScale(decimals, RoundingMode.HALF_EVEN).toPlainString();
        return text.startsWith("-") && text.chars().noneMatch(c -> c >= '1' && c <= '9') ? text.substring(1) : text;
    }

    /** Rounded to a number of decimals, for formats that hold numbers; not finite stays as it is. */
    static double rounded(double value, int decimals) {
        return Double.isFinite(value) ? Double.parseDouble(fixed(value, decimals)) : value;
    }
}
