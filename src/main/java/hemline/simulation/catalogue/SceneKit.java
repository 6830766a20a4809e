package hemline.simulation.catalogue;

import hemline.geometry.Point;
import hemline.simulation.front.Lobe;
import hemline.simulation.radar.RadarSpec;
import hemline.simulation.random.Streams;
import hemline.simulation.random.Texture.Octave;
import hemline.simulation.scene.Air;
import hemline.simulation.scene.Clearing;
import hemline.simulation.scene.EchoSpec;
import hemline.simulation.scene.FaultSpec;
import hemline.simulation.scene.Front;
import hemline.simulation.scene.Ground;
import hemline.simulation.scene.LineLook;
import hemline.simulation.scene.SceneSpec;
import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;
import org.apache.commons.math3.random.RandomGenerator;

/**
 * What scenes are put together from. All draws come from one stream in a fixed order, so a kind, a radar and a seed
 * always give the same scene.
 */
public final class SceneKit {
    private static final double CEILING_M = 1500;
    final String name;
    final RadarSpec radar;
    /** Time from the first to the last sweep, s. */
    final double spanS;
    /** Ground range at which the beam passes 1.5 km above the radar, or the last gate, km. */
    final double reachKm;
    final Streams streams;
    private final RandomGenerator random;

    public SceneKit(String name, RadarSpec radar, double spanS, long seed) {
        this.name = name;
        this.radar = radar;
        this.spanS = spanS;
        streams = new Streams(seed).part("scene " + name, 0).part(radar.site().name(), 0);
        random = streams.stream("layout");
        double last = radar.slantRangeM(radar.gates().count() - 1);
        double reach = 0;
        for (double m = 0; m < last && radar.beam().heightAboveAntennaM(m) < CEILING_M; m += 500) {
            reach = m / 1000;
        }
        reachKm = reach;
    }

    double between(double from, double to) {
        return Streams.between(random, from, to);
    }

    boolean chance(double share) {
        return random.nextDouble() < share;
    }

    long number() {
        return random.nextInt(1 << 30);
    }

    /** A velocity of a random direction, m s⁻¹. */
    Point velocity(double fromMs, double toMs) {
        return Point.towards(between(0, 360)).times(between(fromMs, toMs));
    }

    /** Insects in the lowest air, lumpy at several scales. */
    Air air(double baseDbz) {
        return air(baseDbz, between(0.9, 1.5), List.of());
    }

    Air air(double baseDbz, double depthKm, List<Air.Rolls> rolls) {
        List<Octave> octaves = List.of(new Octave(between(14, 24), between(1.2, 2.2), 6000),
                new Octave(between(4, 7), between(1.0, 1.8), 2400), new Octave(1.3, between(0.8, 1.6), 800));
        return new Air(baseDbz, depthKm, octaves, rolls, between(0, 4), between(0, 360), between(-1.5, 1));
    }

    LineLook look(double peakDbz) {
        double ahead = between(0.34, 0.8);
        return new LineLook(peakDbz, ahead, ahead * between(1.0, 1.9), between(1.5, 2.8), between(1.0, 2.0),
                between(0.0, 0.16), between(-2, 1));
    }

    Clearing clearing(double fromDb, double toDb) {
        return new Clearing(between(fromDb, toDb), between(0.8, 2), chance(0.5) ? Double.POSITIVE_INFINITY : between(20, 50));
    }

    /** Lobes and clefts of a ring. */
    List<Lobe> ringLobes() {
        List<Lobe> lobes = new ArrayList<>();
        for (int m = 2; m <= 5; m++) {
            lobes.add(new Lobe(m, between(0.02, 0.12) / m, between(0, 2 * Math.PI)));
        }
        for (int i = 0; i < 4; i++) {
            lobes.add(new Lobe(Math.rint(between(6, 22)), between(0.003, 0.011), between(0, 2 * Math.PI)));
        }
        return lobes;
    }

    /** Waves along a bow. */
    List<Lobe> bowLobes() {
        return List.of(new Lobe(between(45, 80), between(0.8, 2.5), between(0, 6.28)),
                new Lobe(between(15, 28), between(0.3, 0.9), between(0, 6.28)),
                new Lobe(between(6, 11), between(0.1, 0.25), between(0, 6.28)));
    }

    /** Ground echo about the radar, as much as a filter leaves. */
    List<EchoSpec> nearGround() {
        List<EchoSpec> ground = new ArrayList<>();
        ground.add(new Ground(new Point(0, 0), between(10, 22), between(26, 42), between(0.06, 0.22), between(0.4, 0.9),
                1.5, number()));
        int patches = (int) between(1, 4);
        for (int i = 0; i < patches; i++) {
            Point centre = Point.towards(between(0, 360)).times(between(15, 0.8 * reachKm));
            ground.add(new Ground(centre, between(2, 6), between(22, 40), between(0.1, 0.4), between(0.4, 0.9), 1.5, number()));
        }
        return ground;
    }

    /** Faults that any loop has. */
    List<FaultSpec> everydayFaults() {
        return List.of(new FaultSpec.LostRays(between(0, 0.004)), new FaultSpec.Spikes(between(0, 0.4), between(6, 16)));
    }

    /** A fair scene of an afternoon. */
    SceneSpec afternoon(Air air, List<Front> fronts, List<EchoSpec> echoes, boolean velocity) {
        return scene(between(14, 18.5), air, fronts, echoes, List.of(), velocity);
    }

    SceneSpec scene(double localHour, Air air, List<Front> fronts, List<EchoSpec> echoes, List<FaultSpec> faults,
                    boolean velocity) {
        return sceneInWind(localHour, velocity(1, 7), air, fronts, echoes, faults, velocity);
    }

    SceneSpec sceneInWind(double localHour, Point windMs, Air air, List<Front> fronts, List<EchoSpec> echoes,
                          List<FaultSpec> faults, boolean velocity) {
        List<FaultSpec> all = new ArrayList<>(faults);
        all.addAll(everydayFaults());
        return on(startMs(localHour), windMs, air, fronts, echoes, all, velocity);
    }

    SceneSpec on(long startMs, Point windMs, Air air, List<Front> fronts, List<EchoSpec> echoes, List<FaultSpec> faults,
                 boolean velocity) {
        return new SceneSpec(name, startMs, windMs, air, fronts, echoes, faults, velocity);
    }

    /** Start of the scene at a local solar hour of a summer's day, ms since 1970-01-01T00:00Z. */
    long startMs(double localHour) {
        return startMs(summerDay(), localHour);
    }

    long startMs(LocalDate day, double localHour) {
        double longitude = radar.site().position().orElseThrow().longitudeDeg();
        return day.toEpochDay() * 86_400_000L + 60_000L * Math.round(60 * (localHour - longitude / 15));
    }

    LocalDate summerDay() {
        boolean north = radar.site().position().orElseThrow().latitudeDeg() >= 0;
        return LocalDate.of(2031, north ? 6 : 12, 1).plusDays((long) between(0, 80));
    }

    SunTime sun(LocalDate day) {
        return new SunTime(radar.site().position().orElseThrow().latitudeDeg(), day.getDayOfYear());
    }
}
