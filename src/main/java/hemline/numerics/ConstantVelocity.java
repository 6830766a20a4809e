package hemline.numerics;

import java.util.ArrayList;
import java.util.List;

/**
 * Position and speed along one axis, followed and smoothed under nearly constant velocity: white acceleration of
 * spectral density {@code q}, {@code F = [[1, T], [0, 1]]}, {@code Q = q [[T³/3, T²/2], [T²/2, T]]}
 * (Bar-Shalom, Li and Kirubarajan 2001, Estimation with Applications to Tracking and Navigation, section 6.2).
 * Units are the caller's.
 */
public final class ConstantVelocity {
    private static final double[][] POSITION = {{1, 0}};

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
     * @return state (position, speed) at each time, and the filter's mean normalised innovation squared
     */
    public static Smoothed smooth(double[] time, double[] position, double[] positionSd, double density,
                                  double speed, double speedSd) {
        if (time.length == 0 || position.length != time.length || positionSd.length != time.length) {
            throw new IllegalArgumentException("times, positions and deviations must be as many and some: "
                    + time.length + ", " + position.length + ", " + positionSd.length);
        }
        int first = 0;
        while (first < time.length && Double.isNaN(position[first])) {
            first++;
        }
        if (first == time.length) {
            throw new IllegalArgumentException("no position was observed at any of " + time.length + " times");
        }
        double lead = time[0] - time[first];
        double wide = 1e3 * positionSd[first] + speedSd * Math.abs(lead);
        Gaussian state = new Gaussian(new double[] {position[first] + speed * lead, speed},
                new double[][] {{wide * wide, 0}, {0, speedSd * speedSd}});
        List<RtsSmoother.Step> steps = new ArrayList<>(time.length);
        double nis = 0;
        int seen = 0;
        for (int k = 0; k < time.length; k++) {
            double span = k == 0 ? 0 : time[k] - time[k - 1];
            double[][] f = {{1, span}, {0, 1}};
            Gaussian predicted = k == 0 ? state : KalmanFilter.predict(state, f, noise(density, span));
            state = predicted;
            if (!Double.isNaN(position[k])) {
                KalmanFilter.Update update = KalmanFilter.update(predicted, POSITION,
                        new double[][] {{positionSd[k] * positionSd[k]}}, new double[] {position[k]});
                state = update.state();
                if (seen++ > 0) {
                    nis += update.nis();
                }
            }
            steps.add(new RtsSmoother.Step(predicted, state, f));
        }
        return new Smoothed(RtsSmoother.smooth(steps), seen > 1 ? nis / (seen - 1) : Double.NaN);
    }

    private static double[][] noise(double q, double t) {
        return new double[][] {{q * t * t * t / 3, q * t * t / 2}, {q * t * t / 2, q * t}};
    }

    /**
     * @param states  position and speed at each time
     * @param meanNis mean normalised innovation squared of all observations but the first, about 1 when the model
     *                holds; NaN with fewer than two observations
     */
    public record Smoothed(List<Gaussian> states, double meanNis) {
    }
}
