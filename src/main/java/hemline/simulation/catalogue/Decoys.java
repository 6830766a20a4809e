package hemline.simulation.catalogue;

import hemline.geometry.Point;
import hemline.simulation.front.BowCurve;
import hemline.simulation.front.GrowthLaw;
import hemline.simulation.front.RingCurve;
import hemline.simulation.scene.Air;
import hemline.simulation.scene.Band;
import hemline.simulation.scene.FaultSpec;
import hemline.simulation.scene.Life;
import hemline.simulation.scene.Masts;
import hemline.simulation.scene.Roost;
import hemline.simulation.scene.Sheet;
import java.util.ArrayList;
import java.util.List;

/** Things that look like boundaries and are none. */
final class Decoys {
    private Decoys() {
    }

    /** Bands of insects along the wind that stand or drift slowly across it. */
    static Air.Rolls rolls(SceneKit kit, Point windMs) {
        return new Air.Rolls(windMs.bearingDeg() + kit.between(-12, 12), kit.between(3.2, 8), kit.between(3, 6),
                kit.between(-0.6, 0.6), kit.velocity(0, 30), kit.between(0.6, 1.1) * kit.reachKm);
    }

    static Masts windFarm(SceneKit kit, Point centre) {
        List<Point> places = new ArrayList<>();
        double row = kit.between(0, 180);
        int rows = 2 + (int) kit.between(0, 3);
        for (int i = 0; i < rows; i++) {
            for (int k = 0; k < 9; k++) {
                places.add(centre.plus(Point.towards(row).times(0.6 * (k - 4) + kit.between(-0.1, 0.1)))
                        .plus(Point.towards(row + 90).times(0.9 * i)));
            }
        }
        return new Masts(places, kit.between(22, 38), kit.between(4, 8), kit.number());
    }

    static Sheet sheet(SceneKit kit, Point at, Point driftMs, double dbz) {
        return new Sheet(at.minus(driftMs.times(0.5 * kit.spanS / 1000)), driftMs, Life.ALWAYS, dbz, kit.between(3, 5),
                kit.between(28, 50), kit.between(1.2, 2.4), kit.between(0, 180), Double.POSITIVE_INFINITY, 0, kit.number());
    }

    /** Rain over the whole area with a melting level low enough for the beam to meet within range. */
    static Sheet meltingSheet(SceneKit kit) {
        double far = 0.85 * Math.min(110, kit.radar.slantRangeM(kit.radar.gates().count() - 1) / 1000);
        double highest = kit.radar.beam().heightAboveAntennaM(1000 * far) / 1000;
        double melting = kit.between(0.45, 0.9) * highest + 0.25;
        return new Sheet(kit.velocity(0, 20), kit.velocity(6, 12), Life.ALWAYS, kit.between(15, 22), kit.between(1.2, 2.6), 260,
                1.2, kit.between(0, 180), melting, kit.between(10, 15), kit.number());
    }

    /** @param aheadKm how far ahead of the middle of the area it lies half way through the loop, km */
    static Band rainBand(SceneKit kit, Point windMs, double aheadKm) {
        double heading = windMs.bearingDeg() + kit.between(-15, 15);
        double speed = windMs.dot(Point.towards(heading));
        Point start = Point.towards(heading).times(aheadKm - 0.5 * speed * kit.spanS / 1000)
                .plus(Point.towards(heading + 90).times(kit.between(-30, 30)));
        BowCurve curve = new BowCurve(new BowCurve.Motion(start, heading, speed, 0, 0), kit.between(25, 60),
                kit.between(-3, 3), 0, kit.bowLobes());
        return new Band(curve, kit.between(27, 38), kit.between(1.2, 2.4), kit.between(3, 5), Life.ALWAYS, kit.number());
    }

    static Roost roost(SceneKit kit, Point at, double onsetS) {
        RingCurve curve = new RingCurve(at, kit.velocity(0, 4), new GrowthLaw(onsetS, kit.between(2, 4), kit.between(8, 14), 1),
                kit.ringLobes());
        double goneS = onsetS + kit.between(2400, 4200);
        return new Roost(curve, kit.between(18, 28), kit.between(1.2, 2.2), kit.between(0.4, 1.0), kit.between(0, 0.8),
                kit.between(0, 360), new Life(onsetS, 300, goneS, 900), kit.number());
    }

    static FaultSpec.SecondTrip secondTrip(SceneKit kit) {
        return new FaultSpec.SecondTrip(kit.velocity(25, 0.9 * kit.reachKm), kit.velocity(2, 9), kit.between(6, 14),
                kit.between(0.8, 2.2), kit.between(6, 18), kit.number());
    }

    /** Everything that a tired receiver does. */
    static List<FaultSpec> faults(SceneKit kit) {
        List<FaultSpec> faults = new ArrayList<>();
        faults.add(new FaultSpec.RainLoss(0.0025, 1.05));
        for (int i = 0; i < 3; i++) {
            faults.add(secondTrip(kit));
        }
        faults.add(new FaultSpec.Spikes(kit.between(1, 5), kit.between(6, 16)));
        faults.add(new FaultSpec.RangeRings(List.of(kit.between(20, 45), kit.between(50, 80)), kit.between(-2, 5)));
        faults.add(new FaultSpec.SectorGain(kit.between(0, 360), kit.between(20, 60), kit.between(-3, 3)));
        faults.add(new FaultSpec.RepeatedRays(kit.between(0, 0.03)));
        faults.add(new FaultSpec.Speckles(kit.between(0.0003, 0.002), kit.between(4, 14)));
        faults.add(new FaultSpec.LostRays(kit.between(0.002, 0.02)));
        return faults;
    }
}
