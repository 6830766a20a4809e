package hemline.simulation.making;

import hemline.geodesy.GeoPoint;
import hemline.geometry.Point;
import hemline.simulation.front.GrowthLaw;
import hemline.simulation.front.Lobe;
import hemline.simulation.front.RingCurve;
import hemline.simulation.radar.Packing;
import hemline.simulation.radar.RadarSpec;
import hemline.simulation.random.Streams;
import hemline.simulation.scene.Air;
import hemline.simulation.scene.Clearing;
import hemline.simulation.scene.EchoSpec;
import hemline.simulation.scene.FaultSpec;
import hemline.simulation.scene.Front;
import hemline.simulation.scene.Life;
import hemline.simulation.scene.LineLook;
import hemline.simulation.scene.SceneSpec;
import hemline.sweep.RadarSite;
import hemline.sweep.Sweep;
import java.util.List;
import java.util.Optional;

/** Small radars and plain scenes with known answers. */
final class SmallScenes {
    static final double NO_AIR = -90;

    private SmallScenes() {
    }

    static RadarSpec radar(int samples, int gates) {
        return radar(samples, gates, 180);
    }

    static RadarSpec radar(int samples, int gates, int rays) {
        return new RadarSpec(new RadarSite("small", Optional.of(new GeoPoint(45, 60)), 100),
                new RadarSpec.Dish(1.0, 0.5, 20, rays, 20, 0), new RadarSpec.Gates(250, 500, gates),
                new RadarSpec.Receiver(-42, 1.5, samples, Packing.SHORT, 20), new RadarSpec.Timing(300, 0, 0));
    }

    static Air air(double dbz, double depthKm) {
        return new Air(dbz, depthKm, List.of(), List.of(), 0, 0, 0);
    }

    static SceneSpec scene(Air air, List<Front> fronts, List<EchoSpec> echoes, List<FaultSpec> faults) {
        return new SceneSpec("small", 1_900_000_000_000L, new Point(3, -2), air, fronts, echoes, faults, false);
    }

    /** A circle without lobes, with an even line. */
    static Front circle(String id, Point centre, double radiusKm, double growthMs, double peakDbz) {
        RingCurve curve = new RingCurve(centre, new Point(0, 0), new GrowthLaw(0, radiusKm, growthMs, 1),
                List.<Lobe>of());
        return new Front(id, curve, new LineLook(peakDbz, 0.6, 0.6, 0, 0, 0, 0), Clearing.NONE, Life.ALWAYS,
                Front.Window.ALL, 1.5, true, 0);
    }

    static CleanSweep clean(SceneSpec scene, RadarSpec radar) {
        return new SweepMaker(scene, radar, new Streams(3)).clean(0, 0);
    }

    static Sweep received(SceneSpec scene, RadarSpec radar) {
        return new LoopMaker(scene, radar, new double[] {0}, 3).make(0).sweep();
    }
}
