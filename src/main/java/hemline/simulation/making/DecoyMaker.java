package hemline.simulation.making;

import hemline.boundary.truth.Truth.TruthDecoy;
import hemline.boundary.truth.Truth.TruthLine;
import hemline.boundary.truth.Truth.TruthVertex;
import hemline.geometry.Point;
import hemline.simulation.front.CurvePoint;
import hemline.simulation.front.FrontCurve;
import hemline.simulation.radar.RadarSpec;
import hemline.simulation.scene.Air;
import hemline.simulation.scene.Band;
import hemline.simulation.scene.EchoSpec;
import hemline.simulation.scene.FaultSpec;
import hemline.simulation.scene.Life;
import hemline.simulation.scene.Masts;
import hemline.simulation.scene.Roost;
import hemline.simulation.scene.SceneSpec;
import hemline.simulation.scene.Sheet;
import hemline.sweep.RayGeometry;
import hemline.sweep.Sweep;
import java.util.ArrayList;
import java.util.List;
import java.util.function.DoubleFunction;

/** Where the things were that look like boundaries and are none. Their vertices have detectability and peak 0. */
final class DecoyMaker {
    private static final double SPACING_KM = 2;
    private static final double LEAST_SHARE = 0.2;
    private final SceneSpec scene;
    private final RadarSpec radar;

    DecoyMaker(SceneSpec scene, RadarSpec radar) {
        this.scene = scene;
        this.radar = radar;
    }

    List<TruthDecoy> decoys(List<Sweep> sweeps) {
        List<TruthDecoy> found = new ArrayList<>();
        for (EchoSpec echo : scene.echoes()) {
            if (echo instanceof Band band) {
                found.add(moving("rain-band", band.curve(), band.life(), sweeps));
            } else if (echo instanceof Roost roost) {
                found.add(moving("roost", roost.curve(), roost.life(), sweeps));
            } else if (echo instanceof Sheet sheet && Double.isFinite(sheet.meltingKm())) {
                found.add(brightBand(sheet, sweeps));
            } else if (echo instanceof Masts masts && masts.places().size() > 1) {
                found.add(still("wind-farm", masts.places(), sweeps));
            }
        }
        for (Air.Rolls rolls : scene.air().rolls()) {
            found.add(rolls(rolls, sweeps));
        }
        for (FaultSpec fault : scene.faults()) {
            if (fault instanceof FaultSpec.RangeRings rings) {
                rings.rangesKm().forEach(range -> found.add(still("range-ring",
                        circle(radar.beam().groundRangeM(1000 * range) / 1000), sweeps)));
            }
        }
        return found;
    }

    private TruthDecoy moving(String cause, FrontCurve curve, Life life, List<Sweep> sweeps) {
        List<TruthLine> lines = new ArrayList<>();
        for (int i = 0; i < sweeps.size(); i++) {
            double timeS = (sweeps.get(i).middleMs() - scene.startMs()) / 1000.0;
            if (life.share(timeS) >= LEAST_SHARE) {
                double span = curve.lastStation() - curve.firstStation();
                int steps = Math.max(8, (int) Math.ceil(span * curve.kmPerStation(timeS) / SPACING_KM));
                addLine(lines, i, sweeps.get(i), steps, curve, curve.firstStation(), span / steps);
            }
        }
        return new TruthDecoy(cause, lines);
    }

    private void addLine(List<TruthLine> lines, int index, Sweep sweep, int steps, FrontCurve curve, double first,
                         double step) {
        List<TruthVertex> run = new ArrayList<>();
        for (int k = 0; k <= steps; k++) {
            double station = first + k * step;
            double middleS = (sweep.middleMs() - scene.startMs()) / 1000.0;
            long timeMs = timeMs(sweep.rays(), curve.at(station, middleS).place());
            CurvePoint point = curve.at(station, (timeMs - scene.startMs()) / 1000.0);
            if (withinReach(point.place())) {
                run.add(vertex(point, timeMs));
            } else {
                close(lines, index, run);
                run = new ArrayList<>();
            }
        }
        close(lines, index, run);
    }

    private static void close(List<TruthLine> lines, int index, List<TruthVertex> run) {
        if (run.size() >= 2) {
            lines.add(new TruthLine(index, run));
        }
    }

    private static TruthVertex vertex(CurvePoint point, long timeMs) {
        Point toward = point.normalMs() >= 0 ? point.normal() : point.normal().times(-1);
        return new TruthVertex(TruthMaker.rounded(point.place().xKm(), 3), TruthMaker.rounded(point.place().yKm(), 3),
                timeMs, 0, 0, TruthMaker.rounded(toward.bearingDeg(), 2) % 360,
                TruthMaker.rounded(Math.abs(point.normalMs()), 3));
    }

    private static long timeMs(RayGeometry rays, Point place) {
        return rays.timeMs(rays.nearestRay(place.bearingDeg()));
    }

    private boolean withinReach(Point place) {
        return 1000 * place.lengthKm() < radar.beam().groundRangeM(radar.slantRangeM(radar.gates().count() - 1));
    }

    /** The ring on which the beam centre passes the middle of the bright band. */
    private TruthDecoy brightBand(Sheet sheet, List<Sweep> sweeps) {
        double wantedM = 1000 * (sheet.meltingKm() - Sheet.BRIGHT_DEPTH_KM / 2) - radar.dish().aboveGroundM();
        double last = radar.slantRangeM(radar.gates().count() - 1);
        double slantM = 0;
        while (slantM < last && radar.beam().heightAboveAntennaM(slantM) < wantedM) {
            slantM += 100;
        }
        List<Point> ring = slantM >= last ? List.of() : circle(radar.beam().groundRangeM(slantM) / 1000);
        return still("bright-band", ring, sweeps);
    }

    private static List<Point> circle(double radiusKm) {
        List<Point> points = new ArrayList<>();
        for (int deg = 0; deg <= 360; deg += 3) {
            points.add(Point.towards(deg).times(radiusKm));
        }
        return points;
    }

    private TruthDecoy still(String cause, List<Point> line, List<Sweep> sweeps) {
        return each(cause, sweeps, timeS -> List.of(line));
    }

    /** Crests of the bands as they drift across themselves; their meanders are left out. */
    private TruthDecoy rolls(Air.Rolls rolls, List<Sweep> sweeps) {
        Point along = Point.towards(rolls.alongDeg());
        Point across = new Point(along.yKm(), -along.xKm());
        return each("roll", sweeps, timeS -> {
            List<List<Point>> crests = new ArrayList<>();
            double reach = 0.8 * rolls.radiusKm();
            double middle = rolls.centreKm().dot(across) - rolls.driftMs() * timeS / 1000;
            for (long k = (long) Math.ceil((middle - reach) / rolls.spacingKm());
                    k <= (middle + reach) / rolls.spacingKm(); k++) {
                double off = k * rolls.spacingKm() - middle;
                double half = Math.sqrt(reach * reach - off * off);
                Point centre = rolls.centreKm().plus(across.times(off));
                crests.add(List.of(centre.minus(along.times(half)), centre, centre.plus(along.times(half))));
            }
            return crests;
        });
    }

    private TruthDecoy each(String cause, List<Sweep> sweeps, DoubleFunction<List<List<Point>>> lines) {
        List<TruthLine> found = new ArrayList<>();
        for (int i = 0; i < sweeps.size(); i++) {
            Sweep sweep = sweeps.get(i);
            int index = i;
            for (List<Point> line : lines.apply((sweep.middleMs() - scene.startMs()) / 1000.0)) {
                close(found, index, line.stream().filter(this::withinReach).map(place -> vertex(
                        new CurvePoint(place, Point.towards(place.bearingDeg()), 0), timeMs(sweep.rays(), place))).toList());
            }
        }
        return new TruthDecoy(cause, found);
    }
}
