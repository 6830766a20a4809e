package hemline.simulation.making;

import hemline.simulation.echo.FrontField;
import hemline.simulation.echo.RayEcho;
import hemline.simulation.echo.SceneEchoes;
import hemline.simulation.radar.RadarSpec;
import hemline.simulation.radar.RangeGrid;
import hemline.simulation.radar.ScanPlan;
import hemline.simulation.random.Streams;
import hemline.simulation.scene.SceneSpec;
import org.apache.commons.math3.util.FastMath;

/**
 * Looks at a scene through a beam. The scene is evaluated in many fine directions, each at the time at which the antenna
 * pointed there, and summed into rays with the two-way Gaussian beam, widened by the turn during a ray's dwell.
 */
public final class SweepMaker {
    /** The beam is cut off at this many standard deviations. */
    private static final double BEAM_REACH = 3.0;
    private final SceneSpec scene;
    private final RadarSpec radar;
    private final Streams streams;
    private final RangeGrid grid;
    private final FrontField fronts;
    private final SceneEchoes echoes;
    private final Faults faults;

    public SweepMaker(SceneSpec scene, RadarSpec radar, Streams streams) {
        this.scene = scene;
        this.radar = radar;
        this.streams = streams;
        grid = new RangeGrid(radar);
        fronts = new FrontField(scene.fronts(), streams.part("fronts", 0));
        echoes = new SceneEchoes(scene, fronts, streams.part("echoes", 0));
        faults = new Faults(scene, radar, streams.part("faults", 0));
    }

    FrontField fronts() {
        return fronts;
    }

    CleanSweep clean(int sweep, double startS) {
        ScanPlan plan = new ScanPlan(radar, startS, sweep, streams);
        CleanSweep clean = new CleanSweep(radar, plan, scene.velocity());
        throughBeam(plan, clean);
        faults.apply(clean, sweep);
        return clean;
    }

    private void throughBeam(ScanPlan plan, CleanSweep clean) {
        double stepDeg = radar.dish().stepDeg();
        double beamSd = RangeGrid.twoWaySdDeg(radar.dish().beamWidthDeg());
        // A box of one ray's turn has a variance of step²/12.
        double sdDeg = Math.sqrt(beamSd * beamSd + stepDeg * stepDeg / 12);
        double reachDeg = BEAM_REACH * sdDeg;
        int perRay = (int) Math.ceil(stepDeg / (0.9 * sdDeg));
        double fineDeg = stepDeg / Math.max(2, perRay);
        int n = clean.rays * clean.gates;
        Sums sums = new Sums(n, scene.velocity());
        double[] weights = new double[clean.rays];
        RayEcho ray = new RayEcho(grid);
        int[] rankOf = ranks(plan);
        int first = 0;
        for (double turned = -reachDeg; turned <= 360 + reachDeg; turned += fineDeg) {
            echoes.look(ray, plan.azimuthOfDeg(turned), plan.timeOfS(turned));
            while (first < clean.rays && plan.turnedDeg(first) < turned - reachDeg - 2 * stepDeg) {
                first++;
            }
            for (int i = first; i < clean.rays && plan.turnedDeg(i) < turned + reachDeg + 2 * stepDeg; i++) {
                double off = (turned - plan.turnedDeg(i)) / sdDeg;
                if (Math.abs(off) <= BEAM_REACH) {
                    double weight = FastMath.exp(-0.5 * off * off);
                    weights[rankOf[i]] += weight;
                    sums.add(ray, weight, rankOf[i] * clean.gates, clean.gates, grid.partsPerGate());
                }
            }
        }
        sums.into(clean, weights, grid.partsPerGate());
    }

    private static int[] ranks(ScanPlan plan) {
        int[] rank = new int[plan.rays()];
        for (int r = 0; r < rank.length; r++) {
            rank[plan.scannedAt(r)] = r;
        }
        return rank;
    }

    /** Weighted sums of echo over the beam and over the parts of each gate. */
    private static final class Sums {
        private final double[] total;
        private final double[] withoutLines;
        private final double[] withoutClearing;
        private final double[] moment;

        Sums(int n, boolean velocity) {
            total = new double[n];
            withoutLines = new double[n];
            withoutClearing = new double[n];
            moment = new double[velocity ? n : 0];
        }

        void add(RayEcho ray, double weight, int at, int gates, int parts) {
            int bin = 0;
            for (int g = at; g < at + gates; g++) {
                for (int p = 0; p < parts; p++, bin++) {
                    total[g] += weight * ray.total(bin);
                    withoutLines[g] += weight * ray.withoutLines(bin);
                    withoutClearing[g] += weight * ray.withoutClearing(bin);
                    if (moment.length > 0) {
                        moment[g] += weight * ray.moment(bin);
                    }
                }
            }
        }

        void into(CleanSweep clean, double[] weights, int parts) {
            for (int i = 0; i < total.length; i++) {
                double norm = weights[i / clean.gates] * parts;
                clean.total[i] = (float) (total[i] / norm);
                clean.withoutLines[i] = (float) (withoutLines[i] / norm);
                clean.withoutClearing[i] = (float) (withoutClearing[i] / norm);
                if (moment.length > 0) {
                    clean.velocity[i] = total[i] > 0 ? (float) (moment[i] / total[i]) : 0;
                }
            }
        }
    }
}
