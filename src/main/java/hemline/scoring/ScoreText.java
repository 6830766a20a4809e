package hemline.scoring;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.SortedMap;

/** A score as aligned text: all pooled measures with their intervals, then a line for each kind of scene. */
public final class ScoreText {
    private static final List<Measure> PER_SCENE = List.of(Measure.RECALL, Measure.PRECISION,
            Measure.FALSE_KM_PER_SWEEP, Measure.POSITION_MEDIAN, Measure.SPEED_RMSE, Measure.SPEED_WITHIN_2,
            Measure.CONTINUITY, Measure.MEETING_HITS, Measure.MEETING_MISSES, Measure.MEETING_FALSE);
    private static final List<String> PER_SCENE_HEADS = List.of("recall", "precision", "false km", "position km",
            "speed m/s", "within 2 SD", "main track", "met", "missed", "false met");
    private static final String NONE = "-";

    private ScoreText() {
    }

    /** Lines end in a line feed. Measures without a value show as {@code -}. */
    public static String table(Score score) {
        List<List<String>> rows = new ArrayList<>();
        rows.add(List.of("measure", "value", "95 % interval", "unit"));
        for (Measure measure : Measure.values()) {
            Interval interval = score.interval(measure);
            rows.add(List.of(measure.label(), cell(score.value(measure), measure),
                    Double.isNaN(interval.low()) ? NONE
                            : cell(interval.low(), measure) + " to " + cell(interval.high(), measure),
                    measure.unit().equals("count") ? "" : measure.unit()));
        }
        score.falseKmPerSweepByCause().forEach((cause, km) -> rows.add(List.of("false length a sweep, " + cause,
                cell(km, Measure.FALSE_KM_PER_SWEEP), NONE, "km")));
        StringBuilder text = new StringBuilder(aligned(rows));
        SortedMap<String, Score> scenes = Scores.byScene(List.of(score));
        if (score.scenes().size() > 1) {
            text.append('\n').append(aligned(sceneRows(scenes)));
        }
        score.cautions().forEach(caution -> text.append("caution: ").append(caution).append('\n'));
        return text.toString();
    }

    private static List<List<String>> sceneRows(Map<String, Score> scenes) {
        List<List<String>> rows = new ArrayList<>();
        List<String> head = new ArrayList<>(List.of("scene", "n"));
        head.addAll(PER_SCENE_HEADS);
        rows.add(head);
        scenes.forEach((name, scene) -> {
            List<String> row = new ArrayList<>(List.of(name, Integer.toString(scene.scenes().size())));
            PER_SCENE.forEach(measure -> row.add(cell(scene.value(measure), measure)));
            rows.add(row);
        });
        return rows;
    }

    private static String cell(double value, Measure measure) {
        if (Double.isNaN(value)) {
            return NONE;
        }
        int digits = switch (measure.unit()) {
            case "count" -> 0;
            case "" -> 3;
            default -> 2;
        };
        String text = String.format(Locale.ROOT, "%." + digits + "f", value);
        return text.matches("-0\\.?0*") ? text.substring(1) : text;
    }

    /** First column to the left, the others to the right. */
    private static String aligned(List<List<String>> rows) {
        int[] width = new int[rows.get(0).size()];
        for (List<String> row : rows) {
            for (int c = 0; c < width.length; c++) {
                width[c] = Math.max(width[c], row.get(c).length());
            }
        }
        StringBuilder text = new StringBuilder();
        for (List<String> row : rows) {
            StringBuilder line = new StringBuilder();
            for (int c = 0; c < width.length; c++) {
                String pad = " ".repeat(width[c] - row.get(c).length());
                line.append(c == 0 ? row.get(c) + pad : "  " + pad + row.get(c));
            }
            text.append(line.toString().stripTrailing()).append('\n');
        }
        return text.toString();
    }
}
