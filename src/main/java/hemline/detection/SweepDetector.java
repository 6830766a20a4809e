package hemline.detection;

import hemline.boundary.BoundaryKind;
import hemline.boundary.Evidence;
import hemline.boundary.ObservedBoundary;
import hemline.boundary.ObservedVertex;
import hemline.geometry.Point;
import hemline.numerics.Robust;
import hemline.sweep.SweepFrame;
import java.util.ArrayList;
import java.util.List;

/** From the stacked evidence of one sweep to its observed boundaries. */
final class SweepDetector {
    private static final double LEAST_MEAN = 1.35;
    private static final double SHARP_ALONG_KM = 1.5;
    private static final double NEAR_RAIN_KM = 8;
    /** A line weaker than this beside a step stronger than this is an arc, dB. */
    private static final double ARC_LINE_DB = 1.5;

    private final DetectionSettings settings;

    SweepDetector(DetectionSettings settings) {
        this.settings = settings;
    }

    List<ObservedBoundary> detect(EvidenceStack stack, SweepRaster raster, RainMap rain, SweepFrame frame) {
        int fewest = (int) Math.max(2, Math.round(settings.minLengthKm()));
        Significance significance = new Significance(stack);
        List<TracedCurve> parts = new ArrayList<>();
        for (TracedCurve rough : CurveTracer.trace(stack, fewest, LEAST_MEAN)) {
            TracedCurve smooth = rough.smoothed();
            TracedCurve curve = CurveCentre.refined(smooth,
                    CurveProfiles.of(raster, smooth, CurveProfiles.ALONG_KM));
            CurveMeasures measures = CurveMeasures.of(curve,
                    CurveProfiles.of(raster, curve, CurveProfiles.ALONG_KM), rain);
            for (int[] run : CurveCuts.runs(measures, fewest)) {
                parts.add(curve.part(run[0], run[1]));
            }
        }
        List<ObservedBoundary> found = new ArrayList<>();
        for (TracedCurve part : SideBySide.strongest(parts, fewest)) {
            CurveMeasures sharp = CurveMeasures.of(part, CurveProfiles.of(raster, part, SHARP_ALONG_KM), rain);
            int[] kept = CurveCuts.trimmed(sharp);
            if (kept[1] - kept[0] < fewest) {
                continue;
            }
            TracedCurve curve = part.part(kept[0], kept[1]);
            double logFalse = significance.logExpectedFalse(curve.meanEvidence(), curve.size() - 1);
            if (logFalse <= Math.log10(settings.expectedFalse())) {
                CurveMeasures measures = CurveMeasures.of(curve,
                        CurveProfiles.of(raster, curve, CurveProfiles.ALONG_KM), rain);
                found.add(observed(curve, measures, logFalse, frame));
            }
        }
        return found;
    }

    private static ObservedBoundary observed(TracedCurve curve, CurveMeasures m, double logFalse, SweepFrame frame) {
        List<ObservedVertex> vertices = new ArrayList<>(curve.size());
        int nearRain = 0;
        double undetect = 0;
        double rough = 0;
        for (int i = 0; i < curve.size(); i++) {
            Point place = new Point(curve.x()[i], curve.y()[i]);
            vertices.add(new ObservedVertex(place, frame.timeAtMs(place), m.crestDbz()[i],
                    new Point(curve.normalX()[i], curve.normalY()[i]), curve.speedMs()[i], curve.evidence()[i],
                    m.lineDb()[i], m.stepDb()[i]));
            nearRain += m.rainKm()[i] < NEAR_RAIN_KM ? 1 : 0;
            undetect += m.undetect()[i];
            rough += m.roughDb()[i] * m.roughDb()[i];
        }
        double line = Robust.median(m.lineDb());
        double step = Robust.median(m.stepDb());
        BoundaryKind kind = line < ARC_LINE_DB && step > line ? BoundaryKind.ARC : BoundaryKind.THIN_LINE;
        int n = curve.size();
        Evidence evidence = new Evidence(logFalse, curve.meanEvidence(), line, step, Math.sqrt(rough / n),
                undetect / n, (double) nearRain / n);
        return new ObservedBoundary(frame.index(), kind, vertices, evidence);
    }
}
