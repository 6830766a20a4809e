package hemline.simulation.catalogue;

import hemline.geometry.Point;
import hemline.simulation.front.BowCurve;
import hemline.simulation.scene.Air;
import hemline.simulation.scene.Clearing;
import hemline.simulation.scene.EchoSpec;
import hemline.simulation.scene.FaultSpec;
import hemline.simulation.scene.Front;
import hemline.simulation.scene.Front.Window;
import hemline.simulation.scene.Ground;
import hemline.simulation.scene.Life;
import hemline.simulation.scene.LineLook;
import hemline.simulation.scene.SceneSpec;
import java.util.ArrayList;
import java.util.List;

/** Scenes with boundaries that something hides, weakens or disguises. */
final class HardScenes {
    private static final double NO_LINE = -99;

    private HardScenes() {
    }

    private static BowCurve crossing(SceneKit kit, double heading, double speed, double besideKm) {
        double path = speed * kit.spanS / 1000;
        Point start = Point.towards(heading).times(-0.5 * path + kit.between(-8, 8))
                .plus(Point.towards(heading + 90).times(besideKm));
        return new BowCurve(new BowCurve.Motion(start, heading, speed, 0, 0), kit.between(0.55, 0.85) * kit.reachKm,
                kit.between(-3, 7), kit.between(-0.3, 0.8), kit.bowLobes());
    }

    /** A line that passes over the radar and through hills, masts and a blocked sector. */
    static SceneSpec clutteredLine(SceneKit kit) {
        double heading = kit.between(0, 360);
        BowCurve curve = crossing(kit, heading, kit.between(7, 12), kit.between(-8, 8));
        Front line = Fronts.line(kit, "line", curve, kit.look(kit.between(9, 15)), kit.clearing(2, 6));
        List<EchoSpec> echoes = kit.nearGround();
        echoes.add(new Ground(new Point(0, 0), kit.between(20, 30), 44, kit.between(0.3, 0.5), 0.6, 1.2, kit.number()));
        List<FaultSpec> faults = new ArrayList<>();
        for (int i = 0; i < 4; i++) {
            double bearing = heading + kit.between(-60, 60) + 180 * (i % 2);
            double range = kit.between(0.3, 0.8) * kit.reachKm;
            echoes.add(new Ground(Point.towards(bearing).times(range), kit.between(8, 16), kit.between(38, 52),
                    kit.between(0.3, 0.55), 0.8, 1.2, kit.number()));
            faults.add(new FaultSpec.Obstacle((bearing + 360) % 360, kit.between(4, 12), range, kit.between(4, 30), true));
        }
        echoes.add(Decoys.windFarm(kit, kit.velocity(20, 0.6 * kit.reachKm)));
        return kit.scene(kit.between(14, 18), kit.air(kit.between(-3, 4)), List.of(line), echoes, faults, false);
    }

    /** A line partly under moving rain, both widespread and convective. */
    static SceneSpec rainHidden(SceneKit kit) {
        double heading = kit.between(0, 360);
        BowCurve curve = crossing(kit, heading, kit.between(8, 14), kit.between(-15, 15));
        Front line = Fronts.line(kit, "line", curve, kit.look(kit.between(10, 17)), kit.clearing(2, 6));
        List<EchoSpec> echoes = kit.nearGround();
        Point steering = kit.velocity(8, 14);
        for (int i = 0; i < 2; i++) {
            echoes.add(Decoys.sheet(kit, kit.velocity(15, 0.8 * kit.reachKm), steering, kit.between(18, 26)));
        }
        echoes.addAll(Storms.scattered(kit, 12, steering, 38, 54));
        return kit.scene(kit.between(13, 18), kit.air(kit.between(-2, 4)), List.of(line), echoes, List.of(), false);
    }

    /** A pool seen only as a step to clear air, without any line; sometimes two that meet. */
    static SceneSpec clearAirArc(SceneKit kit) {
        List<EchoSpec> echoes = kit.nearGround();
        List<Front> fronts = new ArrayList<>();
        int pools = kit.chance(0.4) ? 2 : 1;
        for (int i = 0; i < pools; i++) {
            Point centre = Point.towards(kit.between(0, 180) + 180 * i).times(kit.between(0.15, 0.4) * kit.reachKm);
            Clearing clearing = new Clearing(kit.between(6, 12), kit.between(0.8, 2.2), Double.POSITIVE_INFINITY);
            fronts.add(Fronts.pool(kit, "pool-" + (char) ('a' + i), centre, kit.velocity(0, 2), -kit.between(200, 900),
                    kit.between(6, 11), 1, NO_LINE, clearing, echoes));
        }
        return kit.afternoon(kit.air(kit.between(3, 9)), fronts, echoes, kit.chance(0.3));
    }

    /** A sea-breeze-like front that hardly moves, no outflow; an outflow may run into it. */
    static SceneSpec seaBreeze(SceneKit kit) {
        double inland = kit.between(0, 360);
        double speed = kit.between(0.3, 1.8);
        Point start = Point.towards(inland + kit.between(-90, 90)).times(kit.between(10, 35));
        BowCurve coast = new BowCurve(new BowCurve.Motion(start, inland, speed, 0, 0), kit.between(0.6, 0.9) * kit.reachKm,
                kit.between(-6, 6), 0, kit.bowLobes());
        List<Front> fronts = new ArrayList<>();
        fronts.add(new Front("sea-breeze", coast, kit.look(kit.between(10, 16)), kit.clearing(2, 6), Life.ALWAYS, Window.ALL,
                kit.between(0.8, 1.2), false, 0));
        List<EchoSpec> echoes = kit.nearGround();
        if (kit.chance(0.5)) {
            Point centre = start.plus(Point.towards(inland).times(kit.between(40, 55)));
            fronts.add(Fronts.pool(kit, "pool", centre, kit.velocity(0, 1), -600, kit.between(7, 11), 1,
                    kit.between(11, 17), kit.clearing(3, 7), echoes));
        }
        return kit.scene(kit.between(12, 16), kit.air(kit.between(-2, 5)), fronts, echoes, List.of(), kit.chance(0.3));
    }

    /** One line of 4 to 8 dBZ in thin air. */
    static SceneSpec weakLine(SceneKit kit) {
        BowCurve curve = crossing(kit, kit.between(0, 360), kit.between(6, 13), kit.between(-15, 15));
        Front line = Fronts.line(kit, "line", curve, kit.look(kit.between(4.5, 7.5)), Clearing.NONE);
        return kit.scene(kit.between(10, 17), kit.air(kit.between(-10, 0)), List.of(line), kit.nearGround(), List.of(),
                kit.chance(0.3));
    }

    /** A line near the farthest range at which the beam still meets it; it fades as it goes out or comes in. */
    static SceneSpec farLine(SceneKit kit) {
        double side = kit.between(0, 360);
        boolean outward = kit.chance(0.5);
        double speed = kit.between(6, 11);
        double from = (outward ? 0.5 : 1.15) * kit.reachKm;
        Point start = Point.towards(side).times(from);
        BowCurve curve = new BowCurve(new BowCurve.Motion(start, outward ? side : side + 180, speed, 0, 0),
                kit.between(40, 60), kit.between(0, 8), 0, kit.bowLobes());
        Front line = Fronts.line(kit, "line", curve, kit.look(kit.between(13, 20)), kit.clearing(1, 4));
        return kit.scene(kit.between(13, 18), kit.air(kit.between(-4, 3)), List.of(line), kit.nearGround(), List.of(), false);
    }

    /** Two lines and a pool among rolls, rain, ground, wind farms and faults. */
    static SceneSpec busy(SceneKit kit) {
        Point wind = kit.velocity(4, 8);
        List<EchoSpec> echoes = kit.nearGround();
        double heading = kit.between(0, 360);
        Front line = Fronts.line(kit, "line", crossing(kit, heading, kit.between(8, 13), kit.between(-10, 10)),
                kit.look(kit.between(11, 17)), kit.clearing(2, 5));
        Point centre = Point.towards(heading).times(kit.between(0.35, 0.6) * kit.reachKm);
        Front ring = Fronts.pool(kit, "pool", centre, kit.velocity(0, 2), -kit.between(0, 600), kit.between(6, 10), 0.67,
                kit.between(11, 16), kit.clearing(2, 7), echoes);
        echoes.add(Decoys.sheet(kit, kit.velocity(30, 0.9 * kit.reachKm), kit.velocity(8, 13), kit.between(18, 24)));
        echoes.add(Decoys.windFarm(kit, kit.velocity(20, 0.6 * kit.reachKm)));
        echoes.addAll(Storms.scattered(kit, 6, kit.velocity(7, 12), 36, 52));
        Air air = kit.air(kit.between(-1, 4), kit.between(1.0, 1.4), List.of(Decoys.rolls(kit, wind)));
        return kit.sceneInWind(kit.between(13, 17), wind, air, List.of(line, ring), echoes, Decoys.faults(kit), false);
    }

    /** Dense insects with lumps as strong as the line. */
    static SceneSpec denseInsects(SceneKit kit) {
        BowCurve curve = crossing(kit, kit.between(0, 360), kit.between(7, 13), kit.between(-15, 15));
        LineLook look = kit.look(kit.between(17, 22));
        Front line = Fronts.line(kit, "line", curve, look, kit.clearing(3, 6));
        return kit.scene(kit.between(17, 20), kit.air(kit.between(10, 14)), List.of(line), kit.nearGround(), List.of(), false);
    }
}
