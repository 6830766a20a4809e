package hemline.scoring;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.SortedMap;
import java.util.SplittableRandom;
import java.util.TreeMap;

/** Pools the scores of scenes. */
public final class Scores {
    private static final double LOW = 0.025;
    private static final double HIGH = 0.975;

    private Scores() {
    }

    /**
     * All scenes as one, with bootstrap intervals over scenes (percentile intervals; Efron and Tibshirani 1993, An
     * Introduction to the Bootstrap, ch. 13), drawn with the seed and the number of replicates of the first score.
     *
     * @throws IllegalArgumentException when there is no score, or when they were not made with the same settings
     */
    public static Score pool(List<Score> scores) {
        if (scores.isEmpty()) {
            throw new IllegalArgumentException("pooling needs at least one score, got 0");
        }
        ScoreSettings settings = scores.get(0).settings();
        List<SceneTally> scenes = new ArrayList<>();
        for (Score score : scores) {
            if (!score.settings().equals(settings)) {
                throw new IllegalArgumentException("scores to pool must share their settings: " + settings + " and "
                        + score.settings());
            }
            scenes.addAll(score.scenes());
        }
        return new Score(scenes, settings, scenes.size() < 2 ? Map.of() : intervals(scenes, settings));
    }

    /** Pooled by kind of scene, in order of name. */
    public static SortedMap<String, Score> byScene(List<Score> scores) {
        SortedMap<String, List<Score>> groups = new TreeMap<>();
        for (Score score : scores) {
            for (SceneTally scene : score.scenes()) {
                groups.computeIfAbsent(scene.scene(), name -> new ArrayList<>())
                        .add(new Score(List.of(scene), score.settings(), Map.of()));
            }
        }
        SortedMap<String, Score> pooled = new TreeMap<>();
        groups.forEach((name, group) -> pooled.put(name, pool(group)));
        return pooled;
    }

    private static Map<Measure, Interval> intervals(List<SceneTally> scenes, ScoreSettings settings) {
        Totals totals = new Totals(scenes);
        Measure[] measures = Measure.values();
        double[][] drawn = new double[measures.length][settings.replicates()];
        SplittableRandom random = new SplittableRandom(settings.seed());
        for (int r = 0; r < settings.replicates(); r++) {
            int[] times = new int[scenes.size()];
            for (int i = 0; i < times.length; i++) {
                times[random.nextInt(times.length)]++;
            }
            Totals replicate = totals.taken(times);
            for (int m = 0; m < measures.length; m++) {
                drawn[m][r] = measures[m].of(replicate);
            }
        }
        Map<Measure, Interval> intervals = new EnumMap<>(Measure.class);
        for (int m = 0; m < measures.length; m++) {
            intervals.put(measures[m], interval(drawn[m]));
        }
        return intervals;
    }

    /** Replicates without a value are left out; an interval needs half of them. */
    private static Interval interval(double[] drawn) {
        double[] valid = Arrays.stream(drawn).filter(v -> !Double.isNaN(v)).sorted().toArray();
        if (valid.length == 0 || valid.length < drawn.length / 2) {
            return Interval.UNKNOWN;
        }
        return new Interval(quantile(valid, LOW), quantile(valid, HIGH));
    }

    private static double quantile(double[] sorted, double p) {
        double at = p * (sorted.length - 1);
        int below = (int) at;
        int above = Math.min(sorted.length - 1, below + 1);
        return sorted[below] + (at - below) * (sorted[above] - sorted[below]);
    }
}
