package hemline.simulation.making;

import hemline.boundary.truth.Truth.TruthLine;
import hemline.boundary.truth.Truth.TruthVertex;
import hemline.geometry.Point;
import hemline.simulation.echo.FrontField;
import hemline.simulation.front.CurvePoint;
import hemline.simulation.front.FrontCurve;
import hemline.simulation.radar.RadarSpec;
import hemline.simulation.scene.Front;
import java.util.ArrayList;
import java.util.List;

/** Reads off, for one sweep, where each front was at its rays' times and how well it could be seen. */
final class TruthMaker {
    private static final double SPACING_KM = 0.8;
    /** A front weaker than this share of itself is not there. */
    private static final double LEAST_SHARE = 0.1;
    private static final double LEAST_LENGTH_KM = 1.5;
    private static final int TIME_STEPS = 4;
    private final FrontField fronts;
    private final long sceneStartMs;
    private final AlongLine alongLine;

    TruthMaker(FrontField fronts, RadarSpec radar, long sceneStartMs) {
        alongLine = new AlongLine(radar);
        this.fronts = fronts;
        this.sceneStartMs = sceneStartMs;
    }

    /** The stretches of one front in a sweep. */
    List<TruthLine> lines(int front, int sweep, CleanSweep clean) {
        FrontCurve curve = fronts.fronts().get(front).curve();
        double middleS = clean.plan.timeOfS(180);
        if (fronts.fronts().get(front).life().share(middleS) < LEAST_SHARE) {
            return List.of();
        }
        double span = curve.lastStation() - curve.firstStation();
        int steps = Math.max(8, (int) Math.ceil(span * curve.kmPerStation(middleS) * 1.1 / SPACING_KM));
        Contrast contrast = new Contrast(clean);
        List<List<TruthVertex>> runs = new ArrayList<>();
        boolean open = false;
        boolean fromStart = false;
        for (int i = 0; i <= steps; i++) {
            TruthVertex vertex = vertex(front, curve.firstStation() + span * i / steps, clean, contrast);
            if (vertex != null && !open) {
                runs.add(new ArrayList<>());
                fromStart |= i == 0;
            }
            open = vertex != null;
            if (open) {
                runs.get(runs.size() - 1).add(vertex);
            }
        }
        if (curve.closed() && open && fromStart && runs.size() > 1) {
            // On a ring the last stretch runs on into the first; they share one vertex.
            List<TruthVertex> first = runs.remove(0);
            runs.get(runs.size() - 1).addAll(first.subList(1, first.size()));
        }
        return runs.stream().filter(run -> AlongLine.lengthKm(run, 0, run.size() - 1) >= LEAST_LENGTH_KM)
                .map(run -> new TruthLine(sweep, alongLine.smoothed(run))).toList();
    }

    /** The vertex of a station at the time its own ray passed over it, or null where the front is not there. */
    private TruthVertex vertex(int front, double station, CleanSweep clean, Contrast contrast) {
        Front spec = fronts.fronts().get(front);
        double timeS = clean.plan.timeOfS(180);
        for (int i = 0; i < TIME_STEPS; i++) {
            timeS = rayTimeS(clean, spec.curve().at(station, timeS).place());
        }
        CurvePoint point = spec.curve().at(station, timeS);
        FrontField.Now now = fronts.at(timeS);
        now.look(point.place().xKm(), point.place().yKm());
        if (spec.share(station, timeS) * now.survival(front) < LEAST_SHARE
                || !contrast.read(point.place(), point.normal())) {
            return null;
        }
        Point toward = point.normalMs() >= 0 ? point.normal() : point.normal().times(-1);
        return new TruthVertex(rounded(point.place().xKm(), 4), rounded(point.place().yKm(), 4),
                sceneStartMs + Math.round(1000 * timeS), seen(clean, point, contrast), rounded(contrast.crestDbz, 2),
                rounded(toward.bearingDeg(), 2) % 360, rounded(Math.abs(point.normalMs()), 3));
    }

    private static double rayTimeS(CleanSweep clean, Point place) {
        int scanned = clean.plan.scannedAt(clean.nearestRay(place.bearingDeg()));
        return clean.plan.timeOfS(clean.plan.turnedDeg(scanned));
    }

    private static double seen(CleanSweep clean, CurvePoint point, Contrast contrast) {
        double rangeKm = point.place().lengthKm();
        double rayKm = rangeKm * Math.toRadians(clean.radar.dish().stepDeg());
        double noise = Detectability.noiseDb(clean.radar.receiver().samples(),
                clean.radar.gates().spacingM() / 1000, rayKm, contrast.textureDb);
        double heightM = clean.radar.beam().heightAboveAntennaM(clean.radar.beam().slantRangeM(1000 * rangeKm));
        double c = Detectability.contrastDb(contrast.lineDb, contrast.prominenceDb, contrast.stepDb,
                contrast.clearingDb);
        return Detectability.of(c, noise, heightM, contrast.lost);
    }

    static double rounded(double value, int digits) {
        double scale = 1;
        for (int i = 0; i < digits; i++) {
            scale *= 10;
        }
        return Math.rint(value * scale) / scale;
    }
}
