package hemline.simulation.catalogue;

import hemline.geometry.Point;
import hemline.simulation.front.BowCurve;
import hemline.simulation.front.GrowthLaw;
import hemline.simulation.front.RingCurve;
import hemline.simulation.scene.Clearing;
import hemline.simulation.scene.EchoSpec;
import hemline.simulation.scene.Front;
import hemline.simulation.scene.Front.Window;
import hemline.simulation.scene.Life;
import hemline.simulation.scene.LineLook;
import java.util.List;

/** The common fronts. */
final class Fronts {
    private static final double FOLLOWING_WIND = 1.1;

    private Fronts() {
    }

    /** A line that is there from the start to the end. */
    static Front line(SceneKit kit, String id, BowCurve curve, LineLook look, Clearing clearing) {
        return new Front(id, curve, look, clearing, Life.ALWAYS, Window.ALL, kit.between(1.0, 1.5), true, FOLLOWING_WIND);
    }

    /** A ring about a storm that was born half an hour before it (common practice, no source). */
    static Front pool(SceneKit kit, String id, Point centre, Point driftMs, double onsetS, double speedMs, double exponent,
                      double peakDbz, Clearing clearing, List<EchoSpec> echoes) {
        double radius = kit.between(3, 6);
        RingCurve curve = new RingCurve(centre, driftMs, new GrowthLaw(onsetS, radius, speedMs, exponent), kit.ringLobes());
        LineLook look = peakDbz > -50 ? kit.look(peakDbz) : LineLook.NONE;
        Life life = new Life(onsetS, 600, 1e9, 600);
        double parentBirth = onsetS - kit.between(1500, 2100);
        echoes.addAll(Storms.cluster(kit, centre, driftMs, parentBirth, onsetS + kit.between(600, 2400)));
        double open = kit.between(0, 2 * Math.PI);
        Window window = kit.chance(0.4) ? new Window(open, open + kit.between(3.6, 5.4), 0.5) : Window.ALL;
        return new Front(id, curve, look, clearing, life, window, kit.between(0.9, 1.4), true, FOLLOWING_WIND);
    }
}
