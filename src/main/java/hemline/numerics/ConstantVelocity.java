package hemline.numerics;

/**
 * Position and speed along one axis, followed and smoothed under nearly constant velocity: white acceleration of
 * spectral density {@code q}, {@code F = [[1, T], [0, 1]]}, {@code Q = q [[T³/3, T²/2], [T²/2, T]]}
 * (Bar-Shalom, Li and Kirubarajan 2001, Estimation with Applications to Tracking and Navigation, section 6.2).
 * The same as {@link KalmanFilter} and {@link RtsSmoother} with these matrices, written out for inner loops.
 * Units are the caller's.
 */
public final class ConstantVelocity {
    private ConstantVelocity() {
    }

    /**
     * Smooths positions observed at given times.
     *
     * @param time       rising; steps may be irregular
     * @param position   observed position at each time; NaN where there is none
     * @param positionSd of each observation, above 0
     * @param density    {@code q}, speed² per time
     * @param speed      mean speed expected before anything is seen
     * @param speedSd    its standard deviation
     * @throws IllegalArgumentException when nothing is observed or the arrays differ in length
     */
    public static Smoothed smooth(double[] time, double[] position, double[] positionSd, double density,
                                  double speed, double speedSd) {
        int n = time.length;
        if (n == 0 || position.length != n || positionSd.length != n) {
            throw new IllegalArgumentException("times, positions and deviations must be as many and some: "
                    + n + ", " + position.length + ", " + positionSd.length);
        }
        int first = 0;
        while (first < n && Double.isNaN(position[first])) {
            first++;
        }
        if (first == n) {
            throw new IllegalArgumentException("no position was observed at any of " + n + " times");
        }
        double lead = time[0] - time[first];
        double wide = 1e3 * positionSd[first] + speedSd * Math.abs(lead);
        double[][] predicted = new double[n][];
        double[][] filtered = new double[n][];
        double[] state = {position[first] + speed * lead, speed, wide * wide, 0, speedSd * speedSd};
        double nis = 0;
        int seen = 0;
        for (int k = 0; k < n; k++) {
            state = k == 0 ? state : predict(state, time[k] - time[k - 1], density);
            predicted[k] = state;
            if (!Double.isNaN(position[k])) {
                double r = positionSd[k] * positionSd[k];
                double innovation = position[k] - state[0];
                double s = state[2] + r;
                if (seen++ > 0) {
                    nis += innovation * innovation / s;
                }
                state = update(state, innovation, s, r);
            }
            filtered[k] = state;
        }
        back(time, predicted, filtered);
        return new Smoothed(filtered, seen > 1 ? nis / (seen - 1) : Double.NaN);
    }

    /** State: position, speed, var position, covariance, var speed. */
    private static double[] predict(double[] x, double t, double q) {
        return new double[] {x[0] + t * x[1], x[1],
            x[2] + 2 * t * x[3] + t * t * x[4] + q * t * t * t / 3,
            x[3] + t * x[4] + q * t * t / 2, x[4] + q * t};
    }

    private static double[] update(double[] x, double innovation, double s, double r) {
        double gain = x[2] / s;
        double speedGain = x[3] / s;
        double keep = 1 - gain;
        // Joseph's form with I − K H = [[1 − k, 0], [−l, 1]].
        return new double[] {x[0] + gain * innovation, x[1] + speedGain * innovation,
            keep * keep * x[2] + gain * gain * r,
            keep * (x[3] - speedGain * x[2]) + gain * speedGain * r,
            x[4] - 2 * speedGain * x[3] + speedGain * speedGain * (x[2] + r)};
    }

    /** Turns filtered states into smoothed ones in place. */
    private static void back(double[] time, double[][] predicted, double[][] filtered) {
        for (int k = filtered.length - 2; k >= 0; k--) {
            double t = time[k + 1] - time[k];
            double[] p = filtered[k];
            double[] ahead = predicted[k + 1];
            double[] later = filtered[k + 1];
            double determinant = ahead[2] * ahead[4] - ahead[3] * ahead[3];
            if (!(determinant > 0)) {
                continue;
            }
            // C = P Fᵀ P⁻¹pred, with P Fᵀ = [[p + t c, c], [c + t v, v]].
            double a = p[2] + t * p[3];
            double b = p[3] + t * p[4];
            double c00 = (a * ahead[4] - p[3] * ahead[3]) / determinant;
            double c01 = (p[3] * ahead[2] - a * ahead[3]) / determinant;
            double c10 = (b * ahead[4] - p[4] * ahead[3]) / determinant;
            double c11 = (p[4] * ahead[2] - b * ahead[3]) / determinant;
            double dx = later[0] - ahead[0];
            double dv = later[1] - ahead[1];
            double d00 = later[2] - ahead[2];
            double d01 = later[3] - ahead[3];
            double d11 = later[4] - ahead[4];
            filtered[k] = new double[] {p[0] + c00 * dx + c01 * dv, p[1] + c10 * dx + c11 * dv,
                p[2] + c00 * c00 * d00 + 2 * c00 * c01 * d01 + c01 * c01 * d11,
                p[3] + c00 * c10 * d00 + (c00 * c11 + c01 * c10) * d01 + c01 * c11 * d11,
                p[4] + c10 * c10 * d00 + 2 * c10 * c11 * d01 + c11 * c11 * d11};
        }
    }

    /** Smoothed states at the times given. */
    public static final class Smoothed {
        private final double[][] states;
        private final double meanNis;

        private Smoothed(double[][] states, double meanNis) {
            this.states = states;
            this.meanNis = meanNis;
        }

        public double position(int k) {
            return states[k][0];
        }

        public double positionSd(int k) {
            return Math.sqrt(Math.max(0, states[k][2]));
        }

        public double speed(int k) {
            return states[k][1];
        }

        public double speedSd(int k) {
            return Math.sqrt(Math.max(0, states[k][4]));
        }

        /**
         * Mean normalised innovation squared of all observations but the first: about 1 when the model holds; NaN with
         * fewer than two observations.
         */
        public double meanNis() {
            return meanNis;
        }
    }
}
