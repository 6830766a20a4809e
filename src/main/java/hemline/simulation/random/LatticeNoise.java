package hemline.simulation.random;

import org.apache.commons.math3.random.RandomGenerator;
import org.apache.commons.math3.util.FastMath;

/**
 * Smooth noise over the plane: Gaussian numbers on a square lattice of unit spacing, joined by cubic steps, with mean 0
 * and variance close to 1. It repeats after {@value #SIDE} units. A third coordinate turns one pattern into another.
 */
public final class LatticeNoise {
    static final int SIDE = 128;
    private static final int MASK = SIDE - 1;
    /** Mean over a cell of the sum of squared weights is (26/35)²; this restores unit variance. */
    private static final double UNIT_VARIANCE = 35.0 / 26.0;
    private final float[] lattice = new float[SIDE * SIDE];

    public LatticeNoise(RandomGenerator random) {
        for (int i = 0; i < lattice.length; i++) {
            lattice[i] = (float) random.nextGaussian();
        }
    }

    public double at(double x, double y) {
        return plane(x, y, 0, 0);
    }

    /** As {@link #at(double, double)}, changing wholly while {@code age} grows by 1; the variance stays 1. */
    public Still still(double age) {
        return new Still(age);
    }

    /** The noise at one age: two patterns, the older giving way to the younger. */
    public final class Still {
        private final double older;
        private final double younger;
        private final int olderShift;
        private final int youngerShift;

        private Still(double age) {
            double whole = FastMath.floor(age);
            double turn = 0.5 * Math.PI * (age - whole);
            older = FastMath.cos(turn);
            younger = FastMath.sin(turn);
            olderShift = (int) Streams.mix((long) whole);
            youngerShift = (int) Streams.mix((long) whole + 1);
        }

        public double at(double x, double y) {
            return older * plane(x, y, olderShift & MASK, (olderShift >>> 8) & MASK)
                    + younger * plane(x, y, youngerShift & MASK, (youngerShift >>> 8) & MASK);
        }
    }

    private double plane(double x, double y, int shiftX, int shiftY) {
        double floorX = FastMath.floor(x);
        double floorY = FastMath.floor(y);
        double sx = step(x - floorX);
        double sy = step(y - floorY);
        int left = ((int) floorX + shiftX) & MASK;
        int right = (left + 1) & MASK;
        int low = (((int) floorY + shiftY) & MASK) * SIDE;
        int high = (low + SIDE) & (SIDE * SIDE - 1);
        double bottom = lattice[low + left] + sx * (lattice[low + right] - lattice[low + left]);
        double top = lattice[high + left] + sx * (lattice[high + right] - lattice[high + left]);
        return UNIT_VARIANCE * (bottom + sy * (top - bottom));
    }

    private static double step(double t) {
        return t * t * (3 - 2 * t);
    }
}
