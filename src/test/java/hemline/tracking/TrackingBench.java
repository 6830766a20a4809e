package hemline.tracking;

import hemline.boundary.Meeting;
import hemline.boundary.ObservedBoundary;
import hemline.boundary.Track;
import hemline.boundary.truth.Truth;
import hemline.detection.Detection;
import hemline.detection.DetectionSettings;
import hemline.kinematics.Kinematics;
import hemline.kinematics.KinematicsSettings;
import hemline.meeting.MeetingSettings;
import hemline.meeting.Meetings;
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
import java.io.IOException;
import java.io.PrintStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;

/**
 * Scores linking and measuring on invented loops, given what a good but imperfect detector would find or what
 * detection does find. Run by hand: {@code TrackingBench seen|found CACHE-DIR [scene...]}. Loops and what was found in
 * them are kept in the cache, which can be deleted.
 */
public final class TrackingBench {
    private static final Measure[] SHOWN = {Measure.RECALL, Measure.PRECISION, Measure.POSITION_MEDIAN,
        Measure.SPEED_BIAS, Measure.SPEED_RMSE, Measure.SPEED_WITHIN_2, Measure.SPEED_GIVEN, Measure.EXPANSION_RMSE,
        Measure.EXPANSION_BIAS, Measure.EXPANSION_WITHIN_2, Measure.EXPANSION_GIVEN, Measure.PURITY, Measure.CONTINUITY,
        Measure.MEETING_HITS, Measure.MEETING_MISSES, Measure.MEETING_FALSE, Measure.MEETING_PLACE,
        Measure.MEETING_TIME, Measure.MEETING_TIME_BIAS, Measure.MEETING_WITHIN_2};

    private TrackingBench() {
    }

    public static void main(String[] args) throws IOException {
        boolean detected = args[0].equals("found");
        Path cache = Path.of(args[1]);
        List<String> scenes = args.length > 2 ? List.of(args).subList(2, args.length) : Scenes.names();
        PrintStream out = System.out;
        out.printf("%-34s", "scene");
        for (Measure measure : SHOWN) {
            String key = measure.name().replace("MEETING_", "M.").replace("EXPANSION", "EXP").replace("SPEED", "SP")
                    .replace("WITHIN", "W").toLowerCase(Locale.ROOT);
            out.printf(" %7s", key.substring(0, Math.min(7, key.length())));
        }
        out.printf(" %7s %7s%n", "tracks", "ms/swp");
        List<Score> all = new ArrayList<>();
        try (Workers workers = new Workers(1)) {
            for (String scene : scenes) {
                List<Score> kind = new ArrayList<>();
                for (String radar : Radars.names()) {
                    for (long seed = 1; seed <= Long.getLong("seeds", 2); seed++) {
                        kind.add(one(cache, scene, radar, seed, detected, workers, out));
                    }
                }
                row(out, "= " + scene, Scores.pool(kind), 0, 0);
                all.addAll(kind);
            }
        }
        row(out, "ALL", Scores.pool(all), 0, 0);
    }

    private static Score one(Path cache, String scene, String radar, long seed, boolean detected,
                             Workers workers, PrintStream out)
            throws IOException {
        Path kept = cache.resolve(scene + "-" + radar + "-" + seed + ".loop");
        BenchLoop loop;
        if (Files.exists(kept)) {
            loop = BenchLoop.read(kept);
        } else {
            SimulatedLoop made = Simulation.of(scene, radar, seed).prepare(workers, Progress.NONE);
            loop = BenchLoop.of(made);
            loop.write(kept);
        }
        Truth truth = loop.truth();
        List<SweepFrame> frames = loop.frames();
        List<ObservedBoundary> found = detected
                ? detected(kept.resolveSibling(kept.getFileName() + ".found"), scene, radar, seed, workers)
                : new SeenTruth(seed, 0.3, 0.12, 4).of(truth, frames);
        long start = System.nanoTime();
        List<Track> tracks = Tracking.link(found, frames, TrackingSettings.defaults(), Progress.NONE);
        tracks = Kinematics.measure(tracks, frames, KinematicsSettings.defaults());
        List<Meeting> meetings = Meetings.find(tracks, frames, MeetingSettings.defaults());
        double ms = (System.nanoTime() - start) / 1e6 / frames.size();
        Score score = Scoring.score(truth, tracks, meetings, ScoreSettings.defaults().withBootstrap(0, 1));
        row(out, scene + " " + radar + " " + seed, score, tracks.size(), ms);
        return score;
    }

    private static List<ObservedBoundary> detected(Path kept, String scene, String radar, long seed, Workers workers)
            throws IOException {
        if (!Files.exists(kept)) {
            SimulatedLoop made = Simulation.of(scene, radar, seed).prepare(workers, Progress.NONE);
            ScreenedLoop screened = Screening.learn(made, ScreeningSettings.defaults(), workers, Progress.NONE);
            BenchLoop.writeFound(Detection.detect(screened, DetectionSettings.defaults(), workers, Progress.NONE), kept);
        }
        return BenchLoop.readFound(kept);
    }

    private static void row(PrintStream out, String name, Score score, int tracks, double ms) {
        out.printf("%-34s", name);
        for (Measure measure : SHOWN) {
            out.printf(Locale.ROOT, " %7.2f", score.value(measure));
        }
        out.printf(Locale.ROOT, " %7d %7.1f%n", tracks, ms);
    }
}
