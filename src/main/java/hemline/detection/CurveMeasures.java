package hemline.detection;

/**
 * What one sweep shows at each vertex of a curve.
 *
 * @param lineDb    on the line over the brighter side, dB
 * @param stepDb    ahead less behind, dB
 * @param crestDbz  on the line, dBZ; NaN not measured
 * @param roughDb   root mean square of the crest about its smooth course nearby, dB
 * @param rainKm    distance from rain, km
 * @param rainAhead whether rain is nearer ahead than behind
 * @param undetect  share below detection, 0 to 1
 */
record CurveMeasures(double[] lineDb, double[] stepDb, double[] crestDbz, double[] roughDb, double[] rainKm,
                     boolean[] rainAhead, double[] undetect) {
    private static final double PEAK_KM = 0.75;
    private static final double SIDE_FROM_KM = 2.25;
    private static final double SIDE_TO_KM = 4;
    private static final int ROUGH_REACH = 6;

    static CurveMeasures of(TracedCurve curve, CurveProfiles profiles, RainMap rain) {
        int n = curve.size();
        CurveMeasures found = new CurveMeasures(new double[n], new double[n], new double[n], new double[n],
                new double[n], new boolean[n], profiles.undetect);
        for (int i = 0; i < n; i++) {
            double ahead = profiles.mean(i, SIDE_FROM_KM, SIDE_TO_KM);
            double behind = profiles.mean(i, -SIDE_TO_KM, -SIDE_FROM_KM);
            found.crestDbz[i] = profiles.peak(i, PEAK_KM);
            found.lineDb[i] = found.crestDbz[i] - Math.max(ahead, behind);
            found.stepDb[i] = ahead - behind;
            double x = curve.x()[i];
            double y = curve.y()[i];
            double nx = 4 * curve.normalX()[i];
            double ny = 4 * curve.normalY()[i];
            found.rainKm[i] = rain.distanceKm(x, y);
            found.rainAhead[i] = rain.distanceKm(x + nx, y + ny) < rain.distanceKm(x - nx, y - ny);
        }
        found.roughen(profiles);
        return found;
    }

    private void roughen(CurveProfiles profiles) {
        int n = lineDb.length;
        double[] off = new double[n];
        for (int i = 0; i < n; i++) {
            double deviation = profiles.crest[i] - profiles.mean(i, -0.5, 0.5);
            off[i] = Double.isNaN(deviation) ? 0 : deviation * deviation;
        }
        for (int i = 0; i < n; i++) {
            double sum = 0;
            int from = Math.max(0, i - ROUGH_REACH);
            int to = Math.min(n - 1, i + ROUGH_REACH);
            for (int j = from; j <= to; j++) {
                sum += off[j];
            }
            roughDb[i] = Math.sqrt(sum / (to - from + 1));
        }
    }
}
