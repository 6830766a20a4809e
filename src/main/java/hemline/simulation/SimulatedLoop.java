package hemline.simulation;

import hemline.boundary.truth.Truth;
import hemline.numerics.Workers;
import hemline.simulation.making.LoopMaker;
import hemline.simulation.radar.RadarSpec;
import hemline.simulation.scene.SceneSpec;
import hemline.sweep.Loop;
import hemline.sweep.Progress;
import hemline.sweep.Sweep;
import java.util.ArrayList;
import java.util.List;

/**
 * An invented loop and its truth. Sweeps are made when first asked for and kept (about a megabyte each); the truth needs
 * them all. Safe for several threads; what comes out does not depend on who asks first.
 */
public final class SimulatedLoop implements Loop {
    private final SceneSpec scene;
    private final RadarSpec radar;
    private final LoopMaker maker;
    private final List<Kept> kept;
    private Truth truth;

    SimulatedLoop(SceneSpec scene, RadarSpec radar, LoopMaker maker) {
        this.scene = scene;
        this.radar = radar;
        this.maker = maker;
        List<Kept> places = new ArrayList<>();
        for (int i = 0; i < maker.size(); i++) {
            places.add(new Kept());
        }
        kept = List.copyOf(places);
    }

    private static final class Kept {
        private LoopMaker.Made made;
    }

    private LoopMaker.Made made(int index) {
        Kept place = kept.get(index);
        synchronized (place) {
            if (place.made == null) {
                place.made = maker.make(index);
            }
            return place.made;
        }
    }

    public SceneSpec scene() {
        return scene;
    }

    public RadarSpec radar() {
        return radar;
    }

    @Override
    public int size() {
        return kept.size();
    }

    @Override
    public Sweep sweep(int index) {
        return made(index).sweep();
    }

    /** Makes all sweeps, several at a time. */
    public SimulatedLoop prepare(Workers workers, Progress progress) {
        java.util.concurrent.atomic.AtomicInteger done = new java.util.concurrent.atomic.AtomicInteger();
        workers.map(size(), progress::cancelled, index -> {
            LoopMaker.Made one = made(index);
            progress.step("simulating", done.incrementAndGet(), size());
            return one;
        });
        return this;
    }

    public synchronized Truth truth() {
        if (truth == null) {
            List<LoopMaker.Made> all = new ArrayList<>();
            for (int i = 0; i < size(); i++) {
                all.add(made(i));
            }
            truth = maker.truth(all);
        }
        return truth;
    }
}
