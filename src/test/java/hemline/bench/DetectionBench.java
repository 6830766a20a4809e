package hemline.bench;

import hemline.boundary.ObservedBoundary;
import hemline.boundary.ObservedVertex;
import hemline.boundary.Origin;
import hemline.boundary.Speed;
import hemline.boundary.Track;
import hemline.boundary.TrackPiece;
import hemline.boundary.TrackVertex;
import hemline.boundary.truth.Truth;
import hemline.detection.Detection;
import hemline.detection.DetectionSettings;
import hemline.numerics.Workers;
import hemline.scoring.Measure;
import hemline.scoring.Score;
import hemline.scoring.ScoreSettings;
import hemline.scoring.Scores;
import hemline.scoring.Scoring;
import hemline.screening.Screening;
import hemline.screening.ScreeningSettings;
import hemline.simulation.Radars;
import hemline.simulation.Scenes;
import hemline.simulation.SimulatedLoop;
import hemline.simulation.Simulation;
import hemline.sweep.Progress;
import hemline.sweep.ScreenedLoop;
import hemline.sweep.SweepFrame;
import hemline.tracking.Tracking;
import hemline.tracking.TrackingSettings;
import java.io.PrintStream;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;

/**
 * Runs invented loops through screening, detection and linking and prints how much of the truth each finds.
 * Arguments: {@code --scenes a,b} {@code --radars a,b} {@code --seeds 1,2} {@code --pictures DIR} {@code --threads N} {@code --curves FILE}.
 */
public final class DetectionBench {
    private final List<String> scenes;
    private final List<String> radars;
    private final List<Long> seeds;
    private final Path pictures;
    private final int threads;
    private final CurveList curves;
    private final List<Score> detected = new ArrayList<>();
    private final List<Score> linked = new ArrayList<>();

    private DetectionBench(String[] args) throws Exception {
        scenes = names(args, "--scenes", Scenes.names());
        radars = names(args, "--radars", Radars.names());
        seeds = names(args, "--seeds", List.of("1")).stream().map(Long::valueOf).toList();
        String dir = value(args, "--pictures");
        pictures = dir == null ? null : Path.of(dir);
        String list = value(args, "--curves");
        curves = list == null ? null : new CurveList(new PrintStream(list));
        String number = value(args, "--threads");
        threads = number == null ? 1 : Integer.parseInt(number);
    }

    private static String value(String[] args, String option) {
        for (int i = 0; i + 1 < args.length; i++) {
            if (args[i].equals(option)) {
                return args[i + 1];
            }
        }
        return null;
    }

    private static List<String> names(String[] args, String option, List<String> otherwise) {
        String given = value(args, option);
        return given == null ? otherwise : List.of(given.split(","));
    }

    public static void main(String[] args) throws Exception {
        new DetectionBench(args).run();
    }

    private void run() throws Exception {
        System.out.printf("%-34s | %5s %5s %6s %5s | %5s %5s %6s %5s %5s | ms/sweep%n", "scene", "rec", "prec", "falsek",
                "pos", "rec", "prec", "falsek", "pos", "share");
        try (Workers workers = new Workers(threads)) {
            for (String scene : scenes) {
                for (String radar : radars) {
                    for (long seed : seeds) {
                        one(scene, radar, seed, workers);
                    }
                }
            }
        }
        if (detected.size() > 1) {
            Scores.byScene(detected).forEach((name, score) -> line(name, score, Scores.byScene(linked).get(name), 0, 0));
            line("ALL", Scores.pool(detected), Scores.pool(linked), 0, 0);
        }
    }

    private void one(String scene, String radar, long seed, Workers workers) throws Exception {
        SimulatedLoop loop = Simulation.of(scene, radar, seed).prepare(workers, Progress.NONE);
        Truth truth = loop.truth();
        long start = System.nanoTime();
        ScreenedLoop screened = Screening.learn(loop, ScreeningSettings.defaults(), workers, Progress.NONE);
        long learned = System.nanoTime();
        List<ObservedBoundary> found = Detection.detect(screened, DetectionSettings.defaults(), workers, Progress.NONE);
        long end = System.nanoTime();
        List<SweepFrame> frames = new ArrayList<>();
        for (int i = 0; i < loop.size(); i++) {
            frames.add(SweepFrame.of(i, loop.sweep(i)));
        }
        ScoreSettings settings = ScoreSettings.defaults().withBootstrap(0, 1);
        Score alone = Scoring.score(truth, asTracks(found), List.of(), settings);
        List<Track> tracks = Tracking.link(found, frames, TrackingSettings.defaults(), Progress.NONE);
        Score whole = Scoring.score(truth, tracks, List.of(), settings);
        detected.add(alone);
        linked.add(whole);
        line(scene + " " + radar + " " + seed, alone, whole, (learned - start) / 1e6 / loop.size(),
                (end - learned) / 1e6 / loop.size());
        if (curves != null) {
            curves.add(scene + "/" + radar + "/" + seed, found, truth);
        }
        if (pictures != null) {
            DetectionPictures.write(pictures, scene + "-" + radar + "-" + seed, screened, found, truth);
        }
    }

    private static void line(String name, Score alone, Score whole, double screenMs, double detectMs) {
        System.out.printf(Locale.ROOT, "%-34s | %5.2f %5.2f %6.1f %5.2f | %5.2f %5.2f %6.1f %5.2f %5.2f | %4.0f %4.0f%n",
                name, alone.value(Measure.RECALL), alone.value(Measure.PRECISION), falseKm(alone),
                alone.value(Measure.POSITION_MEDIAN), whole.value(Measure.RECALL), whole.value(Measure.PRECISION),
                falseKm(whole), whole.value(Measure.POSITION_MEDIAN), whole.value(Measure.CONTINUITY),
                screenMs, detectMs);
    }

    private static double falseKm(Score score) {
        return score.value(Measure.FALSE_KM_PER_SWEEP);
    }

    /** Each boundary as a track of its own, so that what was found can be scored before linking. */
    private static List<Track> asTracks(List<ObservedBoundary> found) {
        List<Track> tracks = new ArrayList<>();
        for (ObservedBoundary one : found) {
            List<TrackVertex> vertices = new ArrayList<>();
            for (ObservedVertex v : one.vertices()) {
                vertices.add(new TrackVertex(v.position(), v.timeMs(), v.reflectivityDbz(), 0, v.normal().bearingDeg(),
                        new Speed(v.motionMs(), 1), true));
            }
            tracks.add(Track.linked("B" + tracks.size(),
                    List.of(new TrackPiece(one.sweep(), one.kind(), Origin.AUTO, vertices)), 0));
        }
        return tracks;
    }
}
