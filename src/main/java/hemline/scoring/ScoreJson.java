package hemline.scoring;

import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.databind.node.JsonNodeFactory;
import com.fasterxml.jackson.databind.node.ObjectNode;
import com.fasterxml.jackson.databind.json.JsonMapper;
import com.fasterxml.jackson.databind.node.ArrayNode;
import java.io.UncheckedIOException;
import java.util.List;
import java.util.Map;

/** A score as JSON: settings, pooled measures with intervals, then each scene with its boundaries and tracks. */
public final class ScoreJson {
    private static final JsonNodeFactory NODES = JsonNodeFactory.instance;

    private ScoreJson() {
    }

    /** Indented text ending in a line feed; measures without a value are null. */
    public static String text(Score score) {
        ObjectNode root = NODES.objectNode();
        root.set("settings", settings(score.settings()));
        ObjectNode pooled = root.putObject("pooled");
        pooled.put("scenes", score.scenes().size());
        ObjectNode measures = pooled.putObject("measures");
        for (Measure measure : Measure.values()) {
            ObjectNode node = measures.putObject(measure.key());
            put(node, "value", score.value(measure));
            put(node, "low", score.interval(measure).low());
            put(node, "high", score.interval(measure).high());
            node.put("unit", measure.unit().isEmpty() ? "1" : measure.unit());
        }
        causes(pooled, score);
        ArrayNode scenes = root.putArray("scenes");
        score.scenes().forEach(scene -> scenes.add(scene(scene, score.settings())));
        ArrayNode cautions = root.putArray("cautions");
        score.cautions().forEach(cautions::add);
        try {
            return JsonMapper.builder().build().writerWithDefaultPrettyPrinter().writeValueAsString(root)
                    .replace("\r\n", "\n") + "\n";
        } catch (JsonProcessingException e) {
            throw new UncheckedIOException(e);
        }
    }

    private static ObjectNode settings(ScoreSettings settings) {
        ObjectNode node = NODES.objectNode();
        node.put("tolerance_km", settings.toleranceKm());
        node.put("max_angle_deg", settings.maxAngleDeg());
        node.put("detectability_from", settings.plainFrom());
        node.put("sample_km", settings.sampleKm());
        node.put("decoy_km", settings.decoyKm());
        node.put("meeting_km", settings.meetingKm());
        node.put("meeting_minutes", settings.meetingMinutes());
        node.put("bootstrap_replicates", settings.replicates());
        node.put("bootstrap_seed", settings.seed());
        return node;
    }

    private static ObjectNode scene(SceneTally scene, ScoreSettings settings) {
        Score alone = new Score(List.of(scene), settings, Map.of());
        ObjectNode node = NODES.objectNode();
        node.put("scene", scene.scene());
        node.put("seed", scene.seed());
        node.put("sweeps", scene.sweeps());
        ObjectNode measures = node.putObject("measures");
        for (Measure measure : Measure.values()) {
            put(measures, measure.key(), alone.value(measure));
        }
        causes(node, alone);
        ArrayNode boundaries = node.putArray("boundaries");
        for (SceneTally.BoundaryTally boundary : scene.boundaries()) {
            ObjectNode entry = boundaries.addObject();
            entry.put("id", boundary.id());
            entry.put("detectable_km", boundary.detectableKm());
            entry.put("recalled_km", boundary.recalledKm());
            entry.put("main_track", boundary.dominantTrack());
            entry.put("main_track_km", boundary.dominantKm());
            entry.put("identity_switches", boundary.switches());
        }
        ArrayNode tracks = node.putArray("tracks");
        for (SceneTally.TrackTally track : scene.tracks()) {
            ObjectNode entry = tracks.addObject();
            entry.put("id", track.id());
            entry.put("length_km", track.lengthKm());
            entry.put("right_km", track.rightKm());
            entry.put("neither_km", track.neitherKm());
            entry.put("main_boundary", track.dominantTruth());
            entry.put("main_boundary_km", track.dominantKm());
        }
        return node;
    }

    private static void causes(ObjectNode into, Score score) {
        ObjectNode node = into.putObject("false_km_per_sweep_by_cause");
        score.falseKmPerSweepByCause().forEach((cause, km) -> put(node, cause, km));
    }

    private static void put(ObjectNode node, String key, double value) {
        if (Double.isNaN(value)) {
            node.putNull(key);
        } else {
            node.put(key, value);
        }
    }
}
