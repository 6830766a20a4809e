package hemline.reader;

import hemline.sweep.Field;
import java.util.Optional;

/**
 * From stored numbers to values: {@code offset + gain · stored}, with {@code nodata} (not measured) and
 * {@code undetect} (below detection) told apart on the stored numbers, before any scaling.
 */
final class OdimScaling {
    private OdimScaling() {
    }

    /** @param nodata,undetect the codes; empty where the file names none, and then NaN stands for not measured */
    static float[] decode(RawArray raw, double gain, double offset, Optional<Double> nodata,
                          Optional<Double> undetect) {
        int n = raw.length();
        Code none = Code.of(nodata, raw);
        Code below = Code.of(undetect, raw);
        float[] values = new float[n];
        if (raw.array() instanceof byte[] codes) {
            float[] table = new float[256];
            for (int code = 0; code < 256; code++) {
                table[code] = value(raw.unsigned() ? code : (byte) code, gain, offset, none, below);
            }
            for (int i = 0; i < n; i++) {
                values[i] = table[codes[i] & 0xff];
            }
            return values;
        }
        for (int i = 0; i < n; i++) {
            values[i] = value(raw.at(i), gain, offset, none, below);
        }
        return values;
    }

    private static float value(double stored, double gain, double offset, Code none, Code below) {
        if (below.is(stored)) {
            return Field.BELOW_DETECTION;
        }
        if (none.is(stored) || !Double.isFinite(stored)) {
            return Field.NOT_MEASURED;
        }
        double value = offset + gain * stored;
        return Math.abs(value) < Float.MAX_VALUE ? (float) value : Field.NOT_MEASURED;
    }

    /** A stored number with a meaning of its own. */
    private record Code(boolean named, double number) {
        /** A float array cannot hold a double's code exactly: 1.797e308 is stored as infinity. */
        static Code of(Optional<Double> code, RawArray raw) {
            double number = code.orElse(0.0);
            return new Code(code.isPresent(), raw.array() instanceof float[] ? (float) number : number);
        }

        boolean is(double stored) {
            return named && (stored == number || stored != stored && number != number);
        }
    }
}
