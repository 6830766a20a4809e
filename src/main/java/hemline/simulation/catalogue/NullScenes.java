package hemline.simulation.catalogue;

import hemline.geometry.Point;
import hemline.simulation.scene.Air;
import hemline.simulation.scene.EchoSpec;
import hemline.simulation.scene.FaultSpec;
import hemline.simulation.scene.SceneSpec;
import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;

/** Scenes without any boundary. */
final class NullScenes {
    private static final double NO_AIR_DBZ = -60;

    private NullScenes() {
    }

    /** Nothing but the receiver's noise. */
    static SceneSpec noise(SceneKit kit) {
        return kit.scene(kit.between(0, 24), kit.air(NO_AIR_DBZ), List.of(), List.of(), List.of(), false);
    }

    /** Lumpy clear air and ground. */
    static SceneSpec clearAir(SceneKit kit) {
        return kit.scene(kit.between(11, 20), kit.air(kit.between(0, 10)), List.of(), kit.nearGround(), List.of(),
                kit.chance(0.3));
    }

    /** Rolls along the wind, two sets, standing or drifting slowly. */
    static SceneSpec rolls(SceneKit kit) {
        Point wind = kit.velocity(4, 9);
        Air air = kit.air(kit.between(0, 6), kit.between(1.0, 1.5),
                List.of(Decoys.rolls(kit, wind), Decoys.rolls(kit, wind)));
        return kit.sceneInWind(kit.between(12, 17), wind, air, List.of(), kit.nearGround(), List.of(), kit.chance(0.3));
    }

    /** Widespread rain with a bright band. */
    static SceneSpec brightBand(SceneKit kit) {
        List<EchoSpec> echoes = kit.nearGround();
        echoes.add(Decoys.meltingSheet(kit));
        return kit.scene(kit.between(6, 20), kit.air(kit.between(-12, -4)), List.of(), echoes, List.of(), false);
    }

    /** Narrow bands of rain moving with the wind. */
    static SceneSpec rainBands(SceneKit kit) {
        Point steering = kit.velocity(9, 17);
        List<EchoSpec> echoes = kit.nearGround();
        for (int i = 0; i < 3; i++) {
            echoes.add(Decoys.rainBand(kit, steering, 26 * (i - 1) + kit.between(-6, 6)));
        }
        return kit.scene(kit.between(6, 20), kit.air(kit.between(-6, 3)), List.of(), echoes, List.of(), false);
    }

    /** Ragged showers and sheets that move with the wind and change as they go. */
    static SceneSpec raggedRain(SceneKit kit) {
        Point steering = kit.velocity(8, 16);
        List<EchoSpec> echoes = kit.nearGround();
        for (int i = 0; i < 3; i++) {
            echoes.add(Decoys.sheet(kit, kit.velocity(0, kit.reachKm), steering, kit.between(14, 24)));
        }
        echoes.addAll(Storms.scattered(kit, 26, steering, 24, 46));
        List<FaultSpec> faults = kit.chance(0.5) ? List.of(new FaultSpec.RainLoss(0.0025, 1.05)) : List.of();
        return kit.scene(kit.between(6, 20), kit.air(kit.between(-6, 3)), List.of(), echoes, faults, false);
    }

    /** A tired receiver in lumpy air, with the sun low over the horizon. */
    static SceneSpec receiverFaults(SceneKit kit) {
        LocalDate day = kit.summerDay();
        double hour = kit.sun(day).hourAt(0.5, false);
        double setS = kit.between(0.3, 0.6) * kit.spanS;
        List<FaultSpec> faults = new ArrayList<>(Decoys.faults(kit));
        faults.add(new FaultSpec.SunStrobe(kit.sun(day).azimuthDegAt(0.5, false), 12, kit.between(5, 9), setS - 900,
                setS + 600));
        List<EchoSpec> echoes = kit.nearGround();
        echoes.add(Decoys.windFarm(kit, kit.velocity(15, 0.6 * kit.reachKm)));
        return kit.on(kit.startMs(day, hour - setS / 3600), kit.velocity(1, 6), kit.air(kit.between(-2, 6)), List.of(),
                echoes, faults, false);
    }

    /** Every decoy at once, but for roosts. */
    static SceneSpec everything(SceneKit kit) {
        Point wind = kit.velocity(5, 9);
        List<EchoSpec> echoes = kit.nearGround();
        echoes.add(Decoys.rainBand(kit, kit.velocity(9, 15), kit.between(-20, 20)));
        echoes.add(Decoys.sheet(kit, kit.velocity(20, kit.reachKm), kit.velocity(8, 14), kit.between(16, 24)));
        echoes.addAll(Storms.scattered(kit, 10, kit.velocity(8, 14), 30, 50));
        echoes.add(Decoys.windFarm(kit, kit.velocity(15, 0.6 * kit.reachKm)));
        Air air = kit.air(kit.between(0, 5), kit.between(1.0, 1.4), List.of(Decoys.rolls(kit, wind)));
        List<FaultSpec> faults = new ArrayList<>(Decoys.faults(kit));
        faults.add(new FaultSpec.Obstacle(kit.between(0, 360), kit.between(5, 25), kit.between(10, 40), kit.between(4, 30),
                true));
        return kit.sceneInWind(kit.between(12, 18), wind, air, List.of(), echoes, faults, false);
    }

    /** Roosts at dawn. */
    static SceneSpec dawnRoosts(SceneKit kit) {
        return roosts(kit, true, 1 + (int) kit.between(0, 2.5));
    }

    /** Roosts at dusk. */
    static SceneSpec duskRoosts(SceneKit kit) {
        return roosts(kit, false, 1 + (int) kit.between(0, 2.5));
    }

    /** Many roosts at dawn; their rings grow into each other. */
    static SceneSpec manyRoosts(SceneKit kit) {
        return roosts(kit, true, 4);
    }

    private static SceneSpec roosts(SceneKit kit, boolean dawn, int count) {
        LocalDate day = kit.summerDay();
        double leaveS = kit.between(0.08, 0.2) * kit.spanS;
        double hour = kit.sun(day).hourAt(kit.between(-5, -1), dawn);
        List<EchoSpec> echoes = kit.nearGround();
        double turn = kit.between(0, 360);
        for (int i = 0; i < count; i++) {
            Point at = Point.towards(turn + 360.0 * i / count + kit.between(-25, 25)).times(kit.between(0.2, 0.65) * kit.reachKm);
            echoes.add(Decoys.roost(kit, at, leaveS + kit.between(-300, 900)));
        }
        return kit.on(kit.startMs(day, hour - leaveS / 3600), kit.velocity(1, 5), kit.air(kit.between(-10, 0)), List.of(),
                echoes, kit.everydayFaults(), kit.chance(0.3));
    }
}
