package hemline.simulation.random;

import java.util.List;
import org.apache.commons.math3.random.RandomGenerator;
import org.apache.commons.math3.util.FastMath;

/**
 * A lumpy field of several scales that drifts and changes, in decibels (or any unit of its own). Each octave has its
 * own lattice, turned by its own angle so that no lattice direction shows.
 */
public final class Texture {
    private final List<Octave> octaves;
    private final LatticeNoise[] noises;
    private final double[] cos;
    private final double[] sin;
    private final double[] shift;
    private final double[] perKm;
    private final double[] sd;

    /**
     * @param scaleKm   distance between lattice points, km: lumps are about as large
     * @param sd        standard deviation, in the texture's unit
     * @param lifetimeS time in which the pattern becomes another, s; infinite for a lasting one
     */
    public record Octave(double scaleKm, double sd, double lifetimeS) {
        public Octave {
            if (!(scaleKm > 0) || !(sd >= 0) || !(lifetimeS > 0)) {
                throw new IllegalArgumentException("an octave needs a scale and a lifetime above 0 and no negative sd, got "
                        + scaleKm + " km, " + lifetimeS + " s, " + sd);
            }
        }
    }

    public Texture(List<Octave> octaves, Streams streams) {
        this.octaves = List.copyOf(octaves);
        int n = octaves.size();
        noises = new LatticeNoise[n];
        cos = new double[n];
        sin = new double[n];
        shift = new double[n];
        perKm = new double[n];
        sd = new double[n];
        for (int i = 0; i < n; i++) {
            RandomGenerator random = streams.stream("octave", i, 0);
            double turn = 2 * Math.PI * random.nextDouble();
            cos[i] = FastMath.cos(turn);
            sin[i] = FastMath.sin(turn);
            shift[i] = 100 * random.nextDouble();
            perKm[i] = 1 / octaves.get(i).scaleKm();
            sd[i] = octaves.get(i).sd();
            noises[i] = new LatticeNoise(random);
        }
    }

    /** The field at a time, s, for many questions about places. */
    public Still still(double timeS) {
        return new Still(timeS);
    }

    /** The field at one time. */
    public final class Still {
        private final LatticeNoise.Still[] changing = new LatticeNoise.Still[noises.length];

        private Still(double timeS) {
            for (int i = 0; i < changing.length; i++) {
                if (!Double.isInfinite(octaves.get(i).lifetimeS())) {
                    changing[i] = noises[i].still(timeS / octaves.get(i).lifetimeS() + shift[i]);
                }
            }
        }

        /** The value at a place that already moves with the field, km. */
        public double at(double xKm, double yKm) {
            double sum = 0;
            for (int i = 0; i < changing.length; i++) {
                double u = (cos[i] * xKm + sin[i] * yKm) * perKm[i] + shift[i];
                double v = (cos[i] * yKm - sin[i] * xKm) * perKm[i] + shift[i];
                sum += sd[i] * (changing[i] == null ? noises[i].at(u, v) : changing[i].at(u, v));
            }
            return sum;
        }
    }
}
