package hemline.simulation.catalogue;

import hemline.geometry.Point;
import hemline.simulation.front.BowCurve;
import hemline.simulation.front.GrowthLaw;
import hemline.simulation.front.RingCurve;
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

/**
 * The sample loop: two storms send out cold pools that meet north of the radar, new cells grow where they met, and a third
 * line comes up from the south through hills and masts.
 */
final class SampleScene {
    static final int SWEEPS = 16;
    private static final Point WEST = new Point(-37, 22);
    private static final Point EAST = new Point(34, 29);
    private static final Point HILLS = new Point(16, -62);
    private static final double MEETING_S = 3200;

    private SampleScene() {
    }

    static SceneSpec build(SceneKit kit) {
        Point steering = new Point(2.4, 0.8);
        List<EchoSpec> echoes = new ArrayList<>();
        Front west = new Front("west-pool", new RingCurve(WEST, new Point(0.6, -0.3), new GrowthLaw(-1500, 4.5, 7.6, 1),
                kit.ringLobes()), new LineLook(15, 0.5, 0.8, 1.8, 1.4, 0.06, -0.5), new Clearing(6, 1.4, 45),
                new Life(-1500, 600, 1e9, 1), Window.ALL, 1.2, true, 1.1);
        Front east = new Front("east-pool", new RingCurve(EAST, new Point(0.4, 0.2), new GrowthLaw(-900, 4, 6.9, 1),
                kit.ringLobes()), new LineLook(13, 0.45, 0.7, 1.8, 1.4, 0.08, 0), new Clearing(5, 1.2, 40),
                new Life(-900, 600, 1e9, 1), Window.ALL, 1.1, true, 1.1);
        BowCurve.Motion motion = new BowCurve.Motion(new Point(14, -92), 356, 10.5, 0, 0);
        Front south = new Front("south-line", new BowCurve(motion, 56, 5, 0.4, kit.bowLobes()),
                new LineLook(16, 0.55, 1.0, 1.6, 1.3, 0.05, 0), new Clearing(4, 1.6, 60), Life.ALWAYS, Window.ALL, 1.4, true,
                1.1);
        echoes.addAll(Storms.cluster(kit, WEST, steering, -3500, 2600));
        echoes.addAll(Storms.cluster(kit, EAST, steering, -2800, 3200));
        for (int i = 0; i < 3; i++) {
            echoes.add(Storms.cell(kit, new Point(-3 + 4 * i, 24 + 5 * i).plus(kit.velocity(0, 3)), steering,
                    MEETING_S + 300 + 350 * i));
        }
        echoes.addAll(Storms.line(kit, new Point(10, -122), 86, 80, new Point(0, 10), 0, kit.spanS));
        echoes.add(new Ground(new Point(0, 0), 14, 34, 0.14, 0.5, 1.5, kit.number()));
        echoes.add(new Ground(HILLS, 15, 42, 0.45, 0.8, 1.2, kit.number()));
        echoes.add(new Ground(new Point(-52, -30), 4, 30, 0.35, 0.4, 4, kit.number()));
        List<FaultSpec> faults = List.of(new FaultSpec.Obstacle(163, 7, 60, 9, true), new FaultSpec.LostRays(0.002),
                new FaultSpec.Spikes(0.3, 12));
        return new SceneSpec(kit.name, kit.startMs(16.2), steering, kit.air(2.5), List.of(west, east, south), echoes,
                faults, true);
    }
}
