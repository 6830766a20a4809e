package hemline.simulation.echo;

import hemline.geometry.Point;
import hemline.simulation.front.Foot;
import hemline.simulation.front.FrontCurve;
import hemline.simulation.front.RingCurve;
import hemline.simulation.random.LatticeNoise;
import hemline.simulation.random.Streams;
import hemline.simulation.random.Texture;
import hemline.simulation.scene.Front;
import hemline.simulation.scene.LineLook;
import hemline.simulation.scene.Steps;
import java.util.ArrayList;
import java.util.List;
import org.apache.commons.math3.util.FastMath;

/**
 * The fronts of a scene together: how strong each is along its length, where it breaks, and how it dies away once it has
 * run into the pool behind another.
 */
public final class FrontField {
    /** Distance behind another front at which a front begins to die, and over which it does, km. */
    private static final double ENGULFED_FROM_KM = 0.3;
    private static final double ENGULFED_OVER_KM = 3;
    /** Along-line textures of a ring are laid out on a circle of this radius, km. */
    private static final double RING_LAYOUT_KM = 20;
    private static final double BREAK_SCALE_KM = 9;
    private static final double BREAK_LIFETIME_S = 2400;
    private static final double FARTHEST_SD = 6;
    /** Standard deviation of the logarithm of a line's width along it, and the scale of its change. */
    private static final double WIDTH_VARIATION = 0.25;
    private static final double WIDTH_SCALE_KM = 6;
    private final List<Front> fronts;
    private final LatticeNoise widths;
    private final Texture[] strength;
    private final Texture[] breaks;
    private final double[] breakLevel;
    private final boolean[][] spared;

    public FrontField(List<Front> fronts, Streams streams) {
        this.fronts = List.copyOf(fronts);
        widths = new LatticeNoise(streams.stream("widths"));
        int n = fronts.size();
        strength = new Texture[n];
        breaks = new Texture[n];
        breakLevel = new double[n];
        spared = new boolean[n][n];
        for (int i = 0; i < n; i++) {
            LineLook look = fronts.get(i).look();
            List<Texture.Octave> octaves = new ArrayList<>();
            octaves.add(new Texture.Octave(11, look.variationDb(), 1800));
            octaves.add(new Texture.Octave(2.6, look.patchDb(), 700));
            strength[i] = new Texture(octaves, streams.part("strength", i));
            breaks[i] = new Texture(List.of(new Texture.Octave(BREAK_SCALE_KM, 1, BREAK_LIFETIME_S)),
                    streams.part("breaks", i));
            breakLevel[i] = new org.apache.commons.math3.distribution.NormalDistribution(null, 0, 1)
                    .inverseCumulativeProbability(Math.max(1e-4, look.brokenShare()));
        }
        for (int i = 0; i < n; i++) {
            for (int j = 0; j < n; j++) {
                spared[i][j] = i == j || bornWithin(fronts.get(i), fronts.get(j));
            }
        }
    }

    public List<Front> fronts() {
        return fronts;
    }

    /** A front born in the pool behind another lives on there. */
    private static boolean bornWithin(Front young, Front old) {
        double birthS = Math.max(young.life().fromS(), 0);
        FrontCurve curve = young.curve();
        Point seed = curve instanceof RingCurve ring ? ring.centreKm(birthS) : curve.at(0, birthS).place();
        Foot foot = new Foot();
        old.curve().still(birthS).locate(seed.xKm(), seed.yKm(), foot);
        return foot.aheadKm < 0 && old.share(foot.station, birthS) > 0.1;
    }

    /** All fronts at one time. */
    public Now at(double timeS) {
        return new Now(timeS);
    }

    /** The fronts at one time, asked about one place after another. Not for several threads. */
    public final class Now {
        private final double timeS;
        private final FrontCurve.Still[] still;
        private final Texture.Still[] strengths;
        private final Texture.Still[] gaps;
        private final double[] growthFade;
        private final double[] aheadKm;
        private final double[] station;
        private final double[] share;
        private final Foot foot = new Foot();

        private Now(double timeS) {
            this.timeS = timeS;
            int n = fronts.size();
            still = new FrontCurve.Still[n];
            strengths = new Texture.Still[n];
            gaps = new Texture.Still[n];
            growthFade = new double[n];
            aheadKm = new double[n];
            station = new double[n];
            share = new double[n];
            for (int i = 0; i < n; i++) {
                if (fronts.get(i).life().share(timeS) > 0) {
                    still[i] = fronts.get(i).curve().still(timeS);
                    strengths[i] = strength[i].still(timeS);
                    gaps[i] = breaks[i].still(timeS);
                }
                growthFade[i] = fronts.get(i).look().trendDbPerH() * timeS / 3600;
            }
        }

        /** Looks at a place; the other questions are about it. */
        public void look(double xKm, double yKm) {
            for (int i = 0; i < still.length; i++) {
                if (still[i] == null) {
                    aheadKm[i] = 1e9;
                    share[i] = 0;
                    continue;
                }
                still[i].locate(xKm, yKm, foot);
                aheadKm[i] = foot.aheadKm;
                station[i] = foot.station;
                share[i] = fronts.get(i).share(foot.station, timeS);
            }
        }

        public double aheadKm(int front) {
            return aheadKm[front];
        }

        public double station(int front) {
            return station[front];
        }

        /** Share of a front that is there at its station nearest the place, apart from breaks. */
        public double share(int front) {
            return share[front];
        }

        /** What running into other pools has left of a front at the place, 0 to 1. */
        public double survival(int front) {
            double left = 1;
            for (int j = 0; j < still.length; j++) {
                if (!spared[front][j] && aheadKm[j] < 0) {
                    left *= 1 - share[j] * Steps.smooth((-aheadKm[j] - ENGULFED_FROM_KM) / ENGULFED_OVER_KM);
                }
            }
            return left;
        }

        /** Loss of insects at the place behind all fronts, dB. */
        public double clearingDb() {
            double most = 0;
            for (int i = 0; i < still.length; i++) {
                var clearing = fronts.get(i).clearing();
                if (aheadKm[i] < 0 && share[i] > 0 && clearing.depthDb() > 0) {
                    double loss = clearing.depthDb() * fronts.get(i).clearingShare(station[i], timeS)
                            * Steps.smooth(-aheadKm[i] / clearing.transitionKm());
                    if (!Double.isInfinite(clearing.recoveryKm())) {
                        loss *= FastMath.exp(aheadKm[i] / clearing.recoveryKm());
                    }
                    most = Math.max(most, loss);
                }
            }
            return most;
        }

        /** Echo of a front's line at the place, linear, as it would fill the beam. */
        public double line(int front) {
            LineLook look = fronts.get(front).look();
            if (!look.present() || share[front] <= 0) {
                return 0;
            }
            double across = aheadKm[front] / (aheadKm[front] > 0 ? look.aheadSdKm() : look.behindSdKm());
            if (Math.abs(across) > FARTHEST_SD) {
                return 0;
            }
            double u = station[front];
            double v = 0;
            if (fronts.get(front).curve().closed()) {
                v = RING_LAYOUT_KM * FastMath.cos(u);
                u = RING_LAYOUT_KM * FastMath.sin(u);
            }
            across *= FastMath.exp(-WIDTH_VARIATION * widths.at(u / WIDTH_SCALE_KM + 31 * front, v / WIDTH_SCALE_KM));
            double gap = gaps[front].at(u, v) - breakLevel[front];
            double unbroken = look.brokenShare() > 0 ? Steps.smooth(0.5 + gap / 0.5) : 1;
            double dbz = look.peakDbz() + growthFade[front] + strengths[front].at(u, v);
            return share[front] * survival(front) * unbroken * Decibels.toLinear(dbz)
                    * FastMath.exp(-0.5 * across * across);
        }

        /** Radial velocity of the air at the place along a unit vector, m s⁻¹, given the wind far from fronts. */
        public double radialMs(double xKm, double yKm, double sin, double cos, Point windMs) {
            double radial = windMs.xKm() * sin + windMs.yKm() * cos;
            for (int i = 0; i < still.length; i++) {
                double flow = fronts.get(i).flow();
                if (flow > 0 && share[i] > 0 && aheadKm[i] < 1) {
                    Point follow = still[i].followingMs(xKm, yKm);
                    double weight = share[i] * Steps.smooth(0.5 - aheadKm[i]) * FastMath.exp(Math.min(0, aheadKm[i]) / 30);
                    radial += weight * (flow * (follow.xKm() * sin + follow.yKm() * cos) - radial);
                }
            }
            return radial;
        }
    }
}
