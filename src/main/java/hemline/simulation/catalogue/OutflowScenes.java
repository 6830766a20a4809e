package hemline.simulation.catalogue;

import hemline.geometry.Point;
import hemline.simulation.front.BowCurve;
import hemline.simulation.scene.Clearing;
import hemline.simulation.scene.EchoSpec;
import hemline.simulation.scene.Front;
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
        Front front = Fronts.line(kit, "line", curve, kit.look(kit.between(10, 19)), kit.clearing(2, 7));
        List<EchoSpec> echoes = kit.nearGround();
        if (kit.chance(0.6)) {
            Point behind = start.plus(Point.towards(heading).times(-kit.between(22, 40)));
            echoes.addAll(Storms.line(kit, behind, heading + 90, kit.between(40, 90),
                    Point.towards(heading).times(0.9 * speed), 0, kit.spanS));
        }
        return kit.afternoon(kit.air(kit.between(-2, 5)), List.of(front), echoes, kit.chance(0.3));
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
        Front front = Fronts.line(kit, "bow", curve, kit.look(kit.between(11, 20)), kit.clearing(2, 6));
        List<EchoSpec> echoes = kit.nearGround();
        double gap = kit.between(9, 15);
        for (int i = -3; i <= 3; i++) {
            double u = i * half / 4.5;
            Point place = curve.at(u, 0).place().minus(Point.towards(heading).times(gap + kit.between(0, 5)));
            Point follows = curve.at(u, kit.spanS).place().minus(curve.at(u, 0).place()).times(1000 / kit.spanS);
            echoes.addAll(Storms.line(kit, place, heading + 90, half / 4.5, follows, 0, kit.spanS));
        }
        return kit.afternoon(kit.air(kit.between(-3, 4)), List.of(front), echoes, kit.chance(0.3));
    }

    /** One cold pool that spreads steadily from a storm. */
    static SceneSpec singleRing(SceneKit kit) {
        return ring(kit, 1, kit.between(7, 12), kit.velocity(0, 3));
    }

    /** A pool that slows down as the square root of time. */
    static SceneSpec slowingRing(SceneKit kit) {
        return ring(kit, 0.5, kit.between(14, 20), kit.velocity(0, 2));
    }

    /** A pool that slows down as time to the power of two thirds. */
    static SceneSpec twoThirdsRing(SceneKit kit) {
        return ring(kit, 2.0 / 3, kit.between(12, 17), kit.velocity(0, 2));
    }

    /** A pool carried off by a strong wind: one side runs, the other hardly moves. */
    static SceneSpec windRing(SceneKit kit) {
        return ring(kit, 1, kit.between(6, 9), kit.velocity(5, 8));
    }

    private static SceneSpec ring(SceneKit kit, double exponent, double speedMs, Point driftMs) {
        Point way = driftMs.times(-0.5 * kit.spanS / 1000);
        Point centre = Point.towards(kit.between(0, 360)).times(kit.between(0.15, 0.45) * kit.reachKm).plus(way);
        List<EchoSpec> echoes = kit.nearGround();
        Front ring = Fronts.pool(kit, "pool", centre, driftMs, -kit.between(200, 1500), speedMs, exponent,
                kit.between(11, 19), kit.clearing(3, 9), echoes);
        return kit.afternoon(kit.air(kit.between(-2, 6)), List.of(ring), echoes, kit.chance(0.3));
    }

    /** Two pools that meet about two thirds through the loop. */
    static SceneSpec collidingRings(SceneKit kit) {
        double axis = kit.between(0, 360);
        double apart = kit.between(0.75, 0.95) * kit.reachKm;
        Point middle = kit.velocity(5, 25);
        double speed = 0.5 * apart * 1000 / (0.62 * kit.spanS + 700);
        List<EchoSpec> echoes = kit.nearGround();
        Front a = Fronts.pool(kit, "pool-a", middle.plus(Point.towards(axis).times(0.5 * apart)), kit.velocity(0, 1.5),
                -500, Math.max(6, speed * kit.between(0.9, 1.15)), 1, kit.between(11, 18), kit.clearing(3, 8), echoes);
        Front b = Fronts.pool(kit, "pool-b", middle.minus(Point.towards(axis).times(0.5 * apart)), kit.velocity(0, 1.5),
                -300, Math.max(6, speed * kit.between(0.85, 1.1)), 1, kit.between(10, 17), kit.clearing(3, 8), echoes);
        return kit.afternoon(kit.air(kit.between(-2, 5)), List.of(a, b), echoes, kit.chance(0.3));
    }

    /** Several pools born one after another from one multi-cell storm; they run into each other. */
    static SceneSpec mergingPools(SceneKit kit) {
        List<EchoSpec> echoes = kit.nearGround();
        List<Front> fronts = new ArrayList<>();
        Point at = Point.towards(kit.between(0, 360)).times(kit.between(0.2, 0.4) * kit.reachKm);
        double axis = kit.between(0, 360);
        for (int i = 0; i < 3; i++) {
            Point centre = at.plus(Point.towards(axis).times((i - 1) * kit.between(22, 32))).plus(kit.velocity(0, 6));
            fronts.add(Fronts.pool(kit, "pool-" + (char) ('a' + i), centre, kit.velocity(0, 2),
                    -900 + i * kit.between(400, 800), kit.between(5, 8), kit.chance(0.5) ? 1 : 0.67, kit.between(10, 17),
                    kit.clearing(2, 7), echoes));
        }
        return kit.afternoon(kit.air(kit.between(-2, 5)), fronts, echoes, false);
    }

    /** Cells grow in the loop, and half an hour after each birth a pool comes from under it. */
    static SceneSpec births(SceneKit kit) {
        List<EchoSpec> echoes = kit.nearGround();
        List<Front> fronts = new ArrayList<>();
        double turn = kit.between(0, 360);
        for (int i = 0; i < 3; i++) {
            Point centre = Point.towards(turn + 120 * i + kit.between(-25, 25)).times(kit.between(0.3, 0.6) * kit.reachKm);
            double onset = kit.between(0, 0.3) * kit.spanS;
            fronts.add(Fronts.pool(kit, "pool-" + (char) ('a' + i), centre, kit.velocity(0, 2.5), onset,
                    kit.between(8, 14), kit.chance(0.6) ? 1 : 0.5, kit.between(11, 18), kit.clearing(3, 8), echoes));
        }
        return kit.afternoon(kit.air(kit.between(-2, 5)), fronts, echoes, kit.chance(0.3));
    }

    /** A line runs into a spreading pool at a large angle. */
    static SceneSpec lineAndRing(SceneKit kit) {
        double heading = kit.between(0, 360);
        double speed = kit.between(9, 14);
        double growth = kit.between(6, 9);
        Point centre = kit.velocity(5, 25);
        double closes = (speed + growth) * 0.6 * kit.spanS / 1000 + 8;
        Point start = centre.minus(Point.towards(heading).times(closes))
                .plus(Point.towards(heading + 90).times(kit.between(-25, 25)));
        List<EchoSpec> echoes = kit.nearGround();
        Front ring = Fronts.pool(kit, "pool", centre, kit.velocity(0, 1.5), -400, growth, 1, kit.between(11, 17),
                kit.clearing(3, 8), echoes);
        BowCurve curve = new BowCurve(new BowCurve.Motion(start, heading, speed, 0, 0), kit.between(0.5, 0.7) * kit.reachKm,
                kit.between(0, 8), 0, kit.bowLobes());
        Front line = Fronts.line(kit, "line", curve, kit.look(kit.between(11, 18)), kit.clearing(2, 6));
        return kit.afternoon(kit.air(kit.between(-2, 4)), List.of(ring, line), echoes, kit.chance(0.3));
    }

    /** Four weak rings of 4 to 8 dBZ over air with hardly an insect. */
    static SceneSpec weakRings(SceneKit kit) {
        List<Front> fronts = new ArrayList<>();
        List<EchoSpec> echoes = kit.nearGround();
        double turn = kit.between(0, 90);
        for (int i = 0; i < 4; i++) {
            Point centre = Point.towards(turn + 90 * i + kit.between(-15, 15)).times(kit.between(0.42, 0.6) * kit.reachKm);
            fronts.add(Fronts.pool(kit, "pool-" + (char) ('a' + i), centre, kit.velocity(0, 2),
                    kit.between(-1500, 0), kit.between(5, 8), 1, kit.between(5, 8), Clearing.NONE, echoes));
        }
        return kit.scene(kit.between(11, 16), kit.air(kit.between(-14, -8)), fronts, echoes, List.of(), false);
    }
}
