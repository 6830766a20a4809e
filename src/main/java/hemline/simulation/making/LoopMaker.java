package hemline.simulation.making;

import hemline.boundary.truth.Truth;
import hemline.boundary.truth.Truth.TruthArc;
import hemline.boundary.truth.Truth.TruthBoundary;
import hemline.boundary.truth.Truth.TruthLine;
import hemline.boundary.truth.Truth.TruthMeeting;
import hemline.boundary.truth.Truth.TruthSweep;
import hemline.boundary.truth.Truth.TruthVertex;
import hemline.geometry.Point;
import hemline.simulation.front.RingCurve;
import hemline.simulation.radar.RadarSpec;
import hemline.simulation.random.Streams;
import hemline.simulation.scene.Front;
import hemline.simulation.scene.SceneSpec;
import hemline.sweep.Sweep;
import java.util.ArrayList;
import java.util.List;

/** Makes the sweeps of one loop and their truth, one sweep at a time and in any order. */
public final class LoopMaker {
    private static final double NEAR_MEETING_KM = 10;
    private static final double SEEN = 0.5;
    private static final long BEFORE_MEETING_MS = 25 * 60_000L;
    private final SceneSpec scene;
    private final RadarSpec radar;
    private final long seed;
    private final double[] startS;
    private final SweepMaker sweeps;
    private final Reception reception;
    private final TruthMaker truth;

    /** @param startS start of each sweep, s after the scene's start, rising */
    public LoopMaker(SceneSpec scene, RadarSpec radar, double[] startS, long seed) {
        this.scene = scene;
        this.radar = radar;
        this.seed = seed;
        this.startS = startS.clone();
        Streams streams = new Streams(seed).part(scene.name(), 0).part(radar.site().name(), 0);
        sweeps = new SweepMaker(scene, radar, streams);
        reception = new Reception(radar, streams);
        truth = new TruthMaker(sweeps.fronts(), radar, scene.startMs());
    }

    public int size() {
        return startS.length;
    }

    /**
     * A sweep and the truth of it.
     *
     * @param fronts the stretches of each front, in the order of the scene's fronts
     */
    public record Made(Sweep sweep, List<List<TruthLine>> fronts) {
    }

    public Made make(int index) {
        CleanSweep clean = sweeps.clean(index, startS[index]);
        List<List<TruthLine>> lines = new ArrayList<>();
        for (int f = 0; f < scene.fronts().size(); f++) {
            lines.add(truth.lines(f, index, clean));
        }
        String source = scene.name() + " seed " + seed + " sweep " + index;
        return new Made(reception.receive(clean, scene.startMs(), index, source), List.copyOf(lines));
    }

    /** The truth of the whole loop, from all its sweeps in order. */
    public Truth truth(List<Made> made) {
        List<TruthSweep> times = new ArrayList<>();
        for (int i = 0; i < made.size(); i++) {
            times.add(new TruthSweep(i, made.get(i).sweep().startMs(), made.get(i).sweep().endMs()));
        }
        List<TruthBoundary> boundaries = new ArrayList<>();
        for (int f = 0; f < scene.fronts().size(); f++) {
            int front = f;
            List<TruthLine> lines = made.stream().flatMap(m -> m.fronts().get(front).stream()).toList();
            if (!lines.isEmpty()) {
                Front spec = scene.fronts().get(f);
                boundaries.add(new TruthBoundary(spec.id(), spec.form(), spec.outflow(), lines, arcs(spec, lines, times)));
            }
        }
        List<Sweep> sweepsMade = made.stream().map(Made::sweep).toList();
        return new Truth(scene.name(), seed, times, boundaries, new DecoyMaker(scene, radar).decoys(sweepsMade),
                meetings(boundaries, times));
    }

    private List<TruthArc> arcs(Front front, List<TruthLine> lines, List<TruthSweep> times) {
        List<TruthArc> found = new ArrayList<>();
        if (front.curve() instanceof RingCurve ring) {
            lines.stream().mapToInt(TruthLine::sweep).distinct().forEach(sweep -> {
                long middle = (times.get(sweep).startMs() + times.get(sweep).endMs()) / 2;
                double timeS = (middle - scene.startMs()) / 1000.0;
                Point centre = ring.centreKm(timeS);
                found.add(new TruthArc(sweep, middle, TruthMaker.rounded(centre.xKm(), 4),
                        TruthMaker.rounded(centre.yKm(), 4), TruthMaker.rounded(ring.growth().radiusKm(timeS), 4),
                        TruthMaker.rounded(ring.growth().growthMs(timeS), 4)));
            });
        }
        return found;
    }

    private List<TruthMeeting> meetings(List<TruthBoundary> boundaries, List<TruthSweep> times) {
        Contacts contacts = new Contacts(sweeps.fronts());
        double fromS = (times.get(0).startMs() - scene.startMs()) / 1000.0;
        double toS = (times.get(times.size() - 1).endMs() - scene.startMs()) / 1000.0;
        List<TruthMeeting> found = new ArrayList<>();
        for (int a = 0; a < scene.fronts().size(); a++) {
            for (int b = a + 1; b < scene.fronts().size(); b++) {
                String idA = scene.fronts().get(a).id();
                String idB = scene.fronts().get(b).id();
                contacts.first(a, b, fromS, toS).filter(contact -> withinRange(contact.place())).ifPresent(contact -> {
                    long timeMs = scene.startMs() + Math.round(1000 * contact.timeS());
                    boolean seen = seenBefore(boundaries, idA, contact.place(), timeMs)
                            && seenBefore(boundaries, idB, contact.place(), timeMs);
                    found.add(new TruthMeeting(idA, idB, timeMs, TruthMaker.rounded(contact.place().xKm(), 3),
                            TruthMaker.rounded(contact.place().yKm(), 3),
                            TruthMaker.rounded(contact.crossingAngleDeg(), 2),
                            TruthMaker.rounded(contact.closingMs(), 2), seen));
                });
            }
        }
        return found;
    }

    private boolean withinRange(Point place) {
        return 1000 * place.lengthKm() < radar.slantRangeM(radar.gates().count() - 1);
    }

    /** Whether some stretch near a place was to be seen in the time before a meeting. */
    private static boolean seenBefore(List<TruthBoundary> boundaries, String id, Point place, long timeMs) {
        return boundaries.stream().filter(boundary -> boundary.id().equals(id))
                .flatMap(boundary -> boundary.lines().stream()).flatMap(line -> line.vertices().stream())
                .anyMatch(vertex -> near(vertex, place, timeMs));
    }

    private static boolean near(TruthVertex vertex, Point place, long timeMs) {
        return vertex.detectability() >= SEEN && vertex.timeMs() <= timeMs
                && vertex.timeMs() >= timeMs - BEFORE_MEETING_MS
                && place.distanceKm(new Point(vertex.xKm(), vertex.yKm())) <= NEAR_MEETING_KM;
    }
}
