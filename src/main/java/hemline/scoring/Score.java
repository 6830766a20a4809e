package hemline.scoring;

import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.SortedMap;
import java.util.TreeMap;
import java.util.TreeSet;

/**
 * The measures of one scene or of several pooled. Lengths, pairs and errors are added over the scenes before any share
 * is taken, so a scene counts by how much is in it.
 */
public final class Score {
    private final List<SceneTally> scenes;
    private final ScoreSettings settings;
    private final Map<Measure, Double> values = new EnumMap<>(Measure.class);
    private final Map<Measure, Interval> intervals;
    private final SortedMap<String, Double> falseKmPerSweepByCause = new TreeMap<>();

    Score(List<SceneTally> scenes, ScoreSettings settings, Map<Measure, Interval> intervals) {
        this.scenes = List.copyOf(scenes);
        this.settings = settings;
        this.intervals = Map.copyOf(intervals);
        Totals totals = new Totals(this.scenes);
        for (Measure measure : Measure.values()) {
            values.put(measure, measure.of(totals));
        }
        TreeSet<String> causes = new TreeSet<>();
        this.scenes.forEach(scene -> causes.addAll(scene.decoyCauses()));
        for (String cause : causes) {
            falseKmPerSweepByCause.put(cause,
                    totals.sumWhere(s -> s.decoyCauses().contains(cause), s -> s.falseKmByCause().getOrDefault(cause, 0.0))
                    / totals.sumWhere(s -> s.decoyCauses().contains(cause), SceneTally::sweeps));
        }
        falseKmPerSweepByCause.put(DecoyMap.OTHER,
                totals.sum(s -> s.falseKmByCause().getOrDefault(DecoyMap.OTHER, 0.0)) / totals.sum(SceneTally::sweeps));
    }

    /** NaN when there was nothing to measure. */
    public double value(Measure measure) {
        return values.get(measure);
    }

    /** Bootstrap interval over scenes; unknown for a single scene. */
    public Interval interval(Measure measure) {
        return intervals.getOrDefault(measure, Interval.UNKNOWN);
    }

    /**
     * False length a sweep by what it lies on, km, over the scenes that have such a decoy; {@code other}, over all
     * scenes, for false length near no decoy.
     */
    public SortedMap<String, Double> falseKmPerSweepByCause() {
        return new TreeMap<>(falseKmPerSweepByCause);
    }

    /** Kinds of the scenes, one an entry. */
    public List<String> sceneNames() {
        return scenes.stream().map(SceneTally::scene).toList();
    }

    /** What a reader of the figures must know, without repeats. */
    public List<String> cautions() {
        return scenes.stream().flatMap(scene -> scene.cautions().stream()).distinct().toList();
    }

    public ScoreSettings settings() {
        return settings;
    }

    List<SceneTally> scenes() {
        return scenes;
    }
}
