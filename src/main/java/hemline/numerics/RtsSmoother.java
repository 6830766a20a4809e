package hemline.numerics;

import java.util.ArrayList;
import java.util.List;
import org.ejml.simple.SimpleMatrix;

/**
 * The fixed-interval smoother of Rauch, Tung and Striebel (1965), AIAA J. 3:1445–1450: from what the filter knew at
 * each step to what is known at each step once the whole record is.
 */
public final class RtsSmoother {
    private RtsSmoother() {
    }

    /**
     * One step of the forward pass.
     *
     * @param predicted  state before the step's observation
     * @param filtered   state after it; the same as {@code predicted} when there was none
     * @param transition {@code F} that led from the step before to {@code predicted}; ignored at the first step
     */
    public record Step(Gaussian predicted, Gaussian filtered, double[][] transition) {
    }

    /** Smoothed states, one a step. An empty record gives an empty list. */
    public static List<Gaussian> smooth(List<Step> forward) {
        List<Gaussian> smoothed = new ArrayList<>(forward.size());
        if (forward.isEmpty()) {
            return smoothed;
        }
        Gaussian later = forward.get(forward.size() - 1).filtered();
        smoothed.add(later);
        for (int k = forward.size() - 2; k >= 0; k--) {
            Step next = forward.get(k + 1);
            later = back(forward.get(k).filtered(), next, later);
            smoothed.add(later);
        }
        java.util.Collections.reverse(smoothed);
        return smoothed;
    }

    private static Gaussian back(Gaussian filtered, Step next, Gaussian smoothedNext) {
        SimpleMatrix p = new SimpleMatrix(filtered.covariance());
        SimpleMatrix predicted = new SimpleMatrix(next.predicted().covariance());
        SimpleMatrix f = new SimpleMatrix(next.transition());
        // C = P Fᵀ P⁻¹pred
        SimpleMatrix c = p.mult(f.transpose()).mult(predicted.invert());
        SimpleMatrix x = KalmanFilter.column(filtered.mean()).plus(c.mult(
                KalmanFilter.column(smoothedNext.mean()).minus(KalmanFilter.column(next.predicted().mean()))));
        SimpleMatrix ps = p.plus(c.mult(
                new SimpleMatrix(smoothedNext.covariance()).minus(predicted)).mult(c.transpose()));
        return KalmanFilter.gaussian(x, ps);
    }
}
