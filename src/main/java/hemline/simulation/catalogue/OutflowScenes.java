package hemline.simulation.catalogue;

import hemline.geometry.Point;
import hemline.simulation.front.BowCurve;
import hemline.simulation.front.GrowthLaw;
import hemline.simulation.front.RingCurve;
import hemline.simulation.scene.Air;
import hemline.simulation.scene.Clearing;
import hemline.simulation.scene.EchoSpec;
import hemline.simulation.scene.Front;
import hemline.simulation.scene.Front.Window;
import hemline.simulation.scene.Life;
import hemline.simulation.scene.LineLook;
import hemline.simulation.scene.SceneSpec;
import java.util.ArrayList;
import java.util.List;

/** Scenes with outflow boundaries in fair view. */
final class OutflowScenes {
    private OutflowScenes() {
    }

    /** One long, nearly straight line that crosses the area. */
    static SceneSpec straightLine(SceneKit kit) {
        double heading = kit.between(0, 360);
        double speed = kit.between(7, 15);
        double path = speed * kit.spanS / 1000;
        Point start = Point.towards(heading).times(-0.55 * path + kit.between(-15, 15))
                .plus(Point.towards(heading + 90).times(kit.between(-20, 20)));
        BowCurve curve = new BowCurve(new BowCurve.Motion(start, heading, speed, kit.between(-0.0004, 0.0002), 0),
                kit.between(0.6, 0.95) * kit.reachKm, kit.between(-4, 8), kit.between(-0.5, 1), kit.bowLobes());
        Front front = new Front("line", curve, kit.look(kit.between(10, 19)), kit.clearing(2, 7), Life.ALWAYS, Window.ALL,
                kit.between(1.0, 1.5), true, 1.1);
        List<EchoSpec> echoes = kit.nearGround();
        if (kit.chance(0.6)) {
            Point behind = start.plus(Point.towards(heading).times(-kit.between(22, 40)));
            echoes.addAll(Storms.line(kit, behind, heading + 90, kit.between(40, 90),
                    Point.towards(heading).times(0.9 * speed), 0, kit.spanS));
        }
        return scene(kit, kit.between(14.5, 18), kit.air(kit.between(-2, 5)), List.of(front), echoes);
    }

    /** A fast bowed front a few kilometres ahead of the rain that drives it. */
    static SceneSpec fastBow(SceneKit kit) {
        double heading = kit.between(0, 360);
        double speed = kit.between(17, 25);
        double path = speed * kit.spanS / 1000;
        double fromCentre = Math.min(0.75 * kit.reachKm, 0.5 * path);
        Point start = Point.towards(heading).times(-fromCentre)
                .plus(Point.towards(heading + 90).times(kit.between(-25, 25)));
        double half = kit.between(0.55, 0.85) * kit.reachKm;
        BowCurve curve = new BowCurve(new BowCurve.Motion(start, heading, speed, 0, 0), half, kit.between(8, 18),
                kit.between(1, 3), kit.bowLobes());
        Front front = new Front("bow", curve, kit.look(kit.between(11, 20)), kit.clearing(2, 6), Life.ALWAYS, Window.ALL,
                kit.between(1.2, 1.6), true, 1.15);
        List<EchoSpec> echoes = kit.nearGround();
        double gap = kit.between(9, 15);
        for (int i = -3; i <= 3; i++) {
            double u = i * half / 4.5;
            Point place = curve.at(u, 0).place().minus(Point.towards(heading).times(gap + kit.between(0, 5)));
            Point follows = curve.at(u, kit.spanS).place().minus(curve.at(u, 0).place()).times(1000 / kit.spanS);
            echoes.addAll(Storms.line(kit, place, heading + 90, half / 4.5, follows, 0, kit.spanS));
        }
        return scene(kit, kit.between(15, 19), kit.air(kit.between(-3, 4)), List.of(front), echoes);
    }

    /** One cold pool that spreads from a storm. */
    static SceneSpec singleRing(SceneKit kit) {
        Point centre = Point.towards(kit.between(0, 360)).times(kit.between(0.2, 0.5) * kit.reachKm);
        List<EchoSpec> echoes = kit.nearGround();
        Front ring = pool(kit, "pool", centre, kit.velocity(0, 3), -kit.between(200, 1500), kit.between(7, 12), 1,
                kit.between(11, 19), kit.clearing(3, 9), echoes);
        return scene(kit, kit.between(14, 18), kit.air(kit.between(-2, 6)), List.of(ring), echoes);
    }

    /** Two pools that meet about two thirds through the loop. */
    static SceneSpec collidingRings(SceneKit kit) {
        double axis = kit.between(0, 360);
        double apart = kit.between(0.75, 0.95) * kit.reachKm;
        Point middle = kit.velocity(5, 25);
        double speed = 0.5 * apart * 1000 / (0.62 * kit.spanS + 700);
        List<EchoSpec> echoes = kit.nearGround();
        Front a = pool(kit, "pool-a", middle.plus(Point.towards(axis).times(0.5 * apart)), kit.velocity(0, 1.5), -500,
                Math.max(6, speed * kit.between(0.9, 1.15)), 1, kit.between(11, 18), kit.clearing(3, 8), echoes);
        Front b = pool(kit, "pool-b", middle.minus(Point.towards(axis).times(0.5 * apart)), kit.velocity(0, 1.5), -300,
                Math.max(6, speed * kit.between(0.85, 1.1)), 1, kit.between(10, 17), kit.clearing(3, 8), echoes);
        return scene(kit, kit.between(14, 18), kit.air(kit.between(-2, 5)), List.of(a, b), echoes);
    }

    /** Four weak rings of 4 to 8 dBZ over air with hardly an insect. */
    static SceneSpec weakRings(SceneKit kit) {
        List<Front> fronts = new ArrayList<>();
        List<EchoSpec> echoes = kit.nearGround();
        double turn = kit.between(0, 90);
        for (int i = 0; i < 4; i++) {
            Point centre = Point.towards(turn + 90 * i + kit.between(-15, 15)).times(kit.between(0.42, 0.6) * kit.reachKm);
            fronts.add(pool(kit, "pool-" + (char) ('a' + i), centre, kit.velocity(0, 2), kit.between(-900, 0.15 * kit.spanS),
                    kit.between(4, 7), 1, kit.between(5, 8), Clearing.NONE, echoes));
        }
        return scene(kit, kit.between(11, 16), kit.air(kit.between(-14, -8)), fronts, echoes);
    }

    /** A ring about a storm that was born half an hour before it. */
    static Front pool(SceneKit kit, String id, Point centre, Point driftMs, double onsetS, double speedMs, double exponent,
                      double peakDbz, Clearing clearing, List<EchoSpec> echoes) {
        double radius = kit.between(3, 6);
        RingCurve curve = new RingCurve(centre, driftMs, new GrowthLaw(onsetS, radius, speedMs, exponent), kit.ringLobes());
        LineLook look = kit.look(peakDbz);
        Life life = new Life(onsetS, 600, 1e9, 600);
        double parentBirth = onsetS - kit.between(1500, 2100);
        echoes.addAll(Storms.cluster(kit, centre, driftMs, parentBirth, onsetS + kit.between(600, 2400)));
        double open = kit.between(0, 2 * Math.PI);
        Window window = kit.chance(0.4) ? new Window(open, open + kit.between(3.6, 5.4), 0.5) : Window.ALL;
        return new Front(id, curve, look, clearing, life, window, kit.between(0.9, 1.4), true, 1.1);
    }

    static SceneSpec scene(SceneKit kit, double localHour, Air air, List<Front> fronts, List<EchoSpec> echoes) {
        return new SceneSpec(kit.name, kit.startMs(localHour), kit.velocity(1, 7), air, fronts, echoes,
                kit.everydayFaults(), false);
    }
}
