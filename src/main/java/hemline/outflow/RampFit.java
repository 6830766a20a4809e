package hemline.outflow;

import hemline.numerics.Estimate;
import hemline.numerics.Robust;
import java.util.Arrays;
import java.util.Optional;

/**
 * A change point in one series: a level, a ramp of any length down to a step, another level.
 *
 * <p>Least squares over a grid of starts and lengths after outliers are set aside (Hampel's rule: three robust standard
 * deviations from the median of five). The change has to beat a straight line by Bayes' information criterion (Schwarz
 * 1978, Ann. Stat. 6:461), so that a slow trend is none. The start is the mean over the grid, each start weighted by
 * its likelihood, and its standard deviation that of the same weights, with the residual variance inflated for what
 * neighbouring residuals have in common.
 *
 * @param startS   when the ramp begins, s
 * @param startSdS standard deviation of that, s
 * @param endS     when it ends, s
 * @param change   later level less the earlier
 */
record RampFit(double startS, double startSdS, double endS, Estimate change) {
    private static final int LEAST_EACH_SIDE = 3;
    private static final double BIC_MARGIN = 10;
    private static final double OUTLIER_SDS = 3;

    /**
     * @param timeS      rising, s
     * @param value      NaN where missing
     * @param earliestS  first start to try
     * @param latestS    last start to try
     * @param leastChange smallest size of change that counts
     * @param sign       +1 for a rise, −1 for a fall
     * @param longestS   longest ramp to try, s; 0 for steps only
     * @return empty when there is no such change or too few values to tell
     */
    static Optional<RampFit> of(double[] timeS, double[] value, double earliestS, double latestS, double leastChange,
                                int sign, double longestS) {
        boolean[] keep = withoutOutliers(value);
        int n = 0;
        double[] t = new double[value.length];
        double[] y = new double[value.length];
        for (int i = 0; i < value.length; i++) {
            if (keep[i]) {
                t[n] = timeS[i];
                y[n++] = value[i];
            }
        }
        if (n < 2 * LEAST_EACH_SIDE + 2) {
            return Optional.empty();
        }
        return new Search(Arrays.copyOf(t, n), Arrays.copyOf(y, n)).best(earliestS, latestS, leastChange, sign,
                longestS);
    }

    private static boolean[] withoutOutliers(double[] value) {
        boolean[] keep = new boolean[value.length];
        int[] index = new int[value.length];
        int n = 0;
        for (int i = 0; i < value.length; i++) {
            if (!Double.isNaN(value[i])) {
                index[n++] = i;
            }
        }
        double[] off = new double[n];
        for (int i = 0; i < n; i++) {
            int from = Math.max(0, Math.min(i - 2, n - 5));
            double[] five = new double[Math.min(5, n)];
            for (int k = 0; k < five.length; k++) {
                five[k] = value[index[from + k]];
            }
            off[i] = value[index[i]] - Robust.median(five);
        }
        double spread = Robust.spread(off);
        // Most readings can equal their neighbours to the last printed digit; then only the mean square tells scatter.
        double scale = spread > 0 ? spread : Math.sqrt(Arrays.stream(off).map(v -> v * v).average().orElse(0));
        for (int i = 0; i < n; i++) {
            keep[index[i]] = Math.abs(off[i]) <= OUTLIER_SDS * scale + 1e-9;
        }
        return keep;
    }

    /** The grid search over one series without gaps. */
    private static final class Search {
        private final double[] t;
        private final double[] y;
        private double before;
        private double after;

        Search(double[] t, double[] y) {
            this.t = t;
            this.y = y;
        }

        Optional<RampFit> best(double earliestS, double latestS, double leastChange, int sign, double longestS) {
            double step = Math.max(10, medianStep() / 4);
            int starts = Math.max(0, (int) Math.floor((latestS - earliestS) / step) + 1);
            double[] steps = new double[starts];
            double[] ramps = new double[starts];
            double[] ends = new double[starts];
            for (int i = 0; i < starts; i++) {
                double start = earliestS + i * step;
                steps[i] = signed(start, start, sign);
                ramps[i] = steps[i];
                ends[i] = start;
                // Lengths grow by a tenth: a long ramp's end need not be known to the step.
                for (int k = 1; k * step <= longestS; k = Math.max(k + 1, k * 11 / 10)) {
                    double rss = signed(start, start + k * step, sign);
                    if (rss < ramps[i]) {
                        ramps[i] = rss;
                        ends[i] = start + k * step;
                    }
                }
            }
            return chosen(steps, ramps, ends, earliestS, step).flatMap(c -> judged(c.profile, earliestS, step, c.start, c.end,
                    c.least, leastChange));
        }

        private double signed(double start, double end, int sign) {
            double rss = fit(start, end);
            return sign * (after - before) > 0 ? rss : Double.POSITIVE_INFINITY;
        }

        /** A ramp has one more free number than a step and must earn it (Schwarz 1978). */
        private Optional<Choice> chosen(double[] steps, double[] ramps, double[] ends, double earliestS, double step) {
            double least = Arrays.stream(ramps).min().orElse(Double.POSITIVE_INFINITY);
            if (Double.isInfinite(least)) {
                return Optional.empty();
            }
            double price = least / (y.length - 4) * Math.log(y.length);
            double[] profile = new double[ramps.length];
            int best = 0;
            for (int i = 0; i < profile.length; i++) {
                profile[i] = Math.min(steps[i], ramps[i] + price);
                best = profile[i] < profile[best] ? i : best;
            }
            double start = earliestS + best * step;
            boolean isStep = steps[best] <= ramps[best] + price;
            return Optional.of(new Choice(profile, start, isStep ? start : ends[best], profile[best]));
        }

        private record Choice(double[] profile, double start, double end, double least) {
        }

        private Optional<RampFit> judged(double[] profile, double earliestS, double step, double bestStart,
                                         double bestEnd, double least, double leastChange) {
            int n = y.length;
            fit(bestStart, bestEnd);
            double change = after - before;
            double inflation = inflation(bestStart, bestEnd);
            double floor = 1e-6 * (1 + change * change);
            double variance = Math.max(floor, least / (n - 4)) * inflation;
            double effective = n / inflation;
            // Four free numbers against the straight line's two.
            double gain = effective * Math.log(Math.max(floor * n, lineRss()) / Math.max(floor * n, least))
                    - 2 * Math.log(n);
            if (gain < BIC_MARGIN || Math.abs(change) < leastChange) {
                return Optional.empty();
            }
            double sum = 0;
            double mean = 0;
            double square = 0;
            for (int i = 0; i < profile.length; i++) {
                double weight = Math.exp(-(profile[i] - least) / (2 * variance));
                double start = earliestS + i * step;
                sum += weight;
                mean += weight * start;
                square += weight * start * start;
            }
            mean /= sum;
            double sd = Math.sqrt(Math.max(0, square / sum - mean * mean) + step * step / 12);
            int early = (int) Arrays.stream(t).filter(v -> v <= bestStart).count();
            int late = (int) Arrays.stream(t).filter(v -> v >= bestEnd).count();
            double changeSd = Math.sqrt(variance * (1.0 / Math.max(1, early) + 1.0 / Math.max(1, late)));
            return Optional.of(new RampFit(mean, sd, Math.max(mean, bestEnd), new Estimate(change, changeSd)));
        }

        /** Sets the levels that fit best and gives the sum of squares; infinite where a level has too few values. */
        private double fit(double start, double end) {
            double s1 = 0;
            double sr = 0;
            double srr = 0;
            double sy = 0;
            double sry = 0;
            int early = 0;
            int late = 0;
            for (int i = 0; i < t.length; i++) {
                double r = share(t[i], start, end);
                s1++;
                sr += r;
                srr += r * r;
                sy += y[i];
                sry += r * y[i];
                early += r == 0 ? 1 : 0;
                late += r == 1 ? 1 : 0;
            }
            if (early < LEAST_EACH_SIDE || late < LEAST_EACH_SIDE) {
                before = Double.NaN;
                after = Double.NaN;
                return Double.POSITIVE_INFINITY;
            }
            double slope = (s1 * sry - sr * sy) / (s1 * srr - sr * sr);
            before = (sy - slope * sr) / s1;
            after = before + slope;
            double rss = 0;
            for (int i = 0; i < t.length; i++) {
                rss += Math.pow(y[i] - before - slope * share(t[i], start, end), 2);
            }
            return rss;
        }

        private static double share(double time, double start, double end) {
            if (time <= start) {
                return 0;
            }
            return time >= end ? 1 : (time - start) / (end - start);
        }

        private double lineRss() {
            double meanT = Arrays.stream(t).average().orElseThrow();
            double meanY = Arrays.stream(y).average().orElseThrow();
            double sxx = 0;
            double sxy = 0;
            for (int i = 0; i < t.length; i++) {
                sxx += (t[i] - meanT) * (t[i] - meanT);
                sxy += (t[i] - meanT) * (y[i] - meanY);
            }
            double rss = 0;
            for (int i = 0; i < t.length; i++) {
                rss += Math.pow(y[i] - meanY - sxy / sxx * (t[i] - meanT), 2);
            }
            return rss;
        }

        /** (1 + ρ)/(1 − ρ) of the residuals' correlation ρ with their neighbours, from 1 to 4. */
        private double inflation(double start, double end) {
            double products = 0;
            double squares = 0;
            double last = Double.NaN;
            for (int i = 0; i < t.length; i++) {
                double residual = y[i] - before - (after - before) * share(t[i], start, end);
                squares += residual * residual;
                products += Double.isNaN(last) ? 0 : residual * last;
                last = residual;
            }
            double rho = squares > 0 ? Math.max(0, Math.min(0.6, products / squares)) : 0;
            return (1 + rho) / (1 - rho);
        }

        private double medianStep() {
            double[] steps = new double[t.length - 1];
            for (int i = 0; i < steps.length; i++) {
                steps[i] = t[i + 1] - t[i];
            }
            return Robust.median(steps);
        }
    }
}
