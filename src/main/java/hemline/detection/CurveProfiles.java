package hemline.detection;

/**
 * What one sweep shows across a curve: reflectivity at even offsets along each vertex's normal, averaged along the curve
 * (standard deviation {@link #ALONG_KM}), so that curved lines do not blur.
 */
final class CurveProfiles {
    /** Farthest offset, km. */
    static final double REACH_KM = 9;
    /** Offset between samples, km. */
    static final double STEP_KM = 0.25;
    /** Index of offset 0. */
    static final int MIDDLE = (int) (REACH_KM / STEP_KM);
    static final int SAMPLES = 2 * MIDDLE + 1;
    /** Usual standard deviation of the mean along the curve, km. */
    static final double ALONG_KM = 3;

    /** {@code [vertex][sample]} dBZ, offsets rising toward where the normal points; NaN not measured. */
    final double[][] dbz;
    /** Share of gates below detection within 1 km of each vertex, averaged likewise. */
    final double[] undetect;
    /** Reflectivity on the vertex itself, hardly averaged, dBZ; NaN not measured. */
    final double[] crest;

    private CurveProfiles(double[][] dbz, double[] undetect, double[] crest) {
        this.dbz = dbz;
        this.undetect = undetect;
        this.crest = crest;
    }

    static CurveProfiles of(SweepRaster raster, TracedCurve curve, double alongKm) {
        int n = curve.size();
        double[][] raw = new double[n][SAMPLES];
        double[][] weight = new double[n][SAMPLES];
        double[] silent = new double[n];
        double[] crest = new double[n];
        for (int i = 0; i < n; i++) {
            for (int q = 0; q < SAMPLES; q++) {
                double off = (q - MIDDLE) * STEP_KM;
                sample(raster, curve.x()[i] + off * curve.normalX()[i], curve.y()[i] + off * curve.normalY()[i],
                        raw[i], weight[i], q);
            }
            silent[i] = undetect(raster, curve.x()[i], curve.y()[i]);
            crest[i] = crest(raw[i], weight[i]);
        }
        int reach = (int) Math.ceil(2.5 * alongKm);
        double[][] smooth = new double[n][SAMPLES];
        double[] smoothSilent = new double[n];
        double[] sum = new double[SAMPLES];
        for (int i = 0; i < n; i++) {
            java.util.Arrays.fill(sum, 0);
            double silentSum = 0;
            double gSum = 0;
            for (int j = Math.max(0, i - reach); j <= Math.min(n - 1, i + reach); j++) {
                double g = Math.exp(-0.5 * (i - j) * (i - j) / (alongKm * alongKm));
                for (int q = 0; q < SAMPLES; q++) {
                    smooth[i][q] += g * raw[j][q];
                    sum[q] += g * weight[j][q];
                }
                silentSum += g * silent[j];
                gSum += g;
            }
            for (int q = 0; q < SAMPLES; q++) {
                smooth[i][q] = sum[q] > 0.3 * gSum ? smooth[i][q] / sum[q] : Double.NaN;
            }
            smoothSilent[i] = silentSum / gSum;
        }
        return new CurveProfiles(smooth, smoothSilent, crest);
    }

    private static void sample(SweepRaster raster, double x, double y, double[] value, double[] weight, int q) {
        PlaneGrid grid = raster.grid();
        double column = grid.index(x);
        double row = grid.index(y);
        int c = (int) Math.floor(column);
        int r = (int) Math.floor(row);
        if (c < 0 || r < 0 || c + 1 >= grid.width() || r + 1 >= grid.width()) {
            return;
        }
        double fx = column - c;
        double fy = row - r;
        int i = r * grid.width() + c;
        int w = grid.width();
        float[] dbz = raster.dbz();
        float[] certain = raster.weight();
        double w0 = (1 - fy) * (1 - fx) * certain[i];
        double w1 = (1 - fy) * fx * certain[i + 1];
        double w2 = fy * (1 - fx) * certain[i + w];
        double w3 = fy * fx * certain[i + w + 1];
        weight[q] = w0 + w1 + w2 + w3;
        value[q] = w0 * dbz[i] + w1 * dbz[i + 1] + w2 * dbz[i + w] + w3 * dbz[i + w + 1];
    }

    private static double undetect(SweepRaster raster, double x, double y) {
        PlaneGrid grid = raster.grid();
        int c = (int) Math.rint(grid.index(x));
        int r = (int) Math.rint(grid.index(y));
        double sum = 0;
        double weight = 0;
        for (int j = Math.max(0, r - 1); j <= Math.min(grid.width() - 1, r + 1); j++) {
            for (int k = Math.max(0, c - 1); k <= Math.min(grid.width() - 1, c + 1); k++) {
                int p = j * grid.width() + k;
                sum += raster.weight()[p] * raster.undetect()[p];
                weight += raster.weight()[p];
            }
        }
        return weight > 0 ? sum / weight : 1;
    }

    private static double crest(double[] value, double[] weight) {
        double sum = 0;
        double total = 0;
        for (int q = MIDDLE - 2; q <= MIDDLE + 2; q++) {
            sum += value[q];
            total += weight[q];
        }
        return total > 0.5 ? sum / total : Double.NaN;
    }

    /** Mean of the profile between two offsets, km; NaN when under half of it is known. */
    double mean(int vertex, double fromKm, double toKm) {
        int from = index(fromKm);
        int to = index(toKm);
        double sum = 0;
        int known = 0;
        for (int q = from; q <= to; q++) {
            if (!Double.isNaN(dbz[vertex][q])) {
                sum += dbz[vertex][q];
                known++;
            }
        }
        return known * 2 > to - from + 1 ? sum / known : Double.NaN;
    }

    /** Highest value of the profile within a distance of the curve, dBZ; NaN when nothing is known there. */
    double peak(int vertex, double withinKm) {
        double best = Double.NaN;
        for (int q = index(-withinKm); q <= index(withinKm); q++) {
            double value = dbz[vertex][q];
            best = Double.isNaN(best) || value > best ? value : best;
        }
        return best;
    }

    static int index(double offsetKm) {
        return (int) Math.max(0, Math.min(SAMPLES - 1, Math.rint(offsetKm / STEP_KM) + MIDDLE));
    }

    int vertices() {
        return dbz.length;
    }
}
