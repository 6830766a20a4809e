package hemline.bench;

import hemline.boundary.Evidence;
import hemline.boundary.ObservedBoundary;
import hemline.boundary.ObservedVertex;
import hemline.boundary.truth.Truth;
import java.io.PrintStream;
import java.util.List;
import java.util.Locale;

/** One row a found boundary: how much of it is true, and what its evidence says; to study what parts the two. */
final class CurveList {
    private static final double NEAR_KM = 2;

    private final PrintStream out;

    CurveList(PrintStream out) {
        this.out = out;
        out.println("scene,sweep,kind,vertices,plain_share,hidden_share,log_false,strength,line_db,step_db,rough_db,"
                + "undetect,near_rain,speed_ms,x_km,y_km");
    }

    void add(String scene, List<ObservedBoundary> found, Truth truth) {
        for (ObservedBoundary one : found) {
            int plain = 0;
            int hidden = 0;
            double speed = 0;
            for (ObservedVertex v : one.vertices()) {
                double best = -1;
                for (Truth.TruthBoundary boundary : truth.boundaries()) {
                    for (Truth.TruthLine line : boundary.lines()) {
                        if (line.sweep() == one.sweep()) {
                            for (Truth.TruthVertex t : line.vertices()) {
                                if (Math.hypot(t.xKm() - v.position().xKm(), t.yKm() - v.position().yKm()) < NEAR_KM) {
                                    best = Math.max(best, t.detectability());
                                }
                            }
                        }
                    }
                }
                plain += best >= 0.5 ? 1 : 0;
                hidden += best >= 0 && best < 0.5 ? 1 : 0;
                speed += v.motionMs() / one.vertices().size();
            }
            double n = one.vertices().size();
            Evidence e = one.evidence();
            ObservedVertex middle = one.vertices().get(one.vertices().size() / 2);
            out.printf(Locale.ROOT, "%s,%d,%s,%d,%.2f,%.2f,%.2f,%.3f,%.2f,%.2f,%.2f,%.2f,%.2f,%.1f,%.1f,%.1f%n", scene,
                    one.sweep(), one.kind().label(), one.vertices().size(), plain / n, hidden / n, e.logExpectedFalse(),
                    e.strength(), e.lineDb(), e.stepDb(), e.roughnessDb(), e.undetectShare(), e.nearRainShare(), speed,
                    middle.position().xKm(), middle.position().yKm());
        }
    }
}
