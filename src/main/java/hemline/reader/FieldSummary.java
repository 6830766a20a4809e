package hemline.reader;

/**
 * What values a field has in one sweep, over the rays and gates as stored.
 *
 * @param valid          gates with a detected value
 * @param belowDetection gates measured, below detection
 * @param notMeasured    gates not measured
 * @param min            smallest valid value; NaN when there is none
 * @param max            largest valid value; NaN when there is none
 * @param mean           mean of the valid values; NaN when there is none
 * @param maxRay         stored ray of the first maximum; −1 when there is none
 * @param maxGate        gate of the first maximum; −1 when there is none
 */
public record FieldSummary(int valid, int belowDetection, int notMeasured, double min, double max, double mean,
                           int maxRay, int maxGate) {

    static FieldSummary of(float[] values, int gates) {
        int valid = 0;
        int below = 0;
        int at = -1;
        double min = Double.NaN;
        double max = Double.NaN;
        double sum = 0;
        for (int i = 0; i < values.length; i++) {
            float value = values[i];
            if (value > Float.NEGATIVE_INFINITY) {
                valid++;
                sum += value;
                min = value < min || at < 0 ? value : min;
                if (at < 0 || value > max) {
                    max = value;
                    at = i;
                }
            } else if (value == Float.NEGATIVE_INFINITY) {
                below++;
            }
        }
        return new FieldSummary(valid, below, values.length - valid - below, min, max,
                valid == 0 ? Double.NaN : sum / valid, at < 0 ? -1 : at / gates, at < 0 ? -1 : at % gates);
    }
}
