package hemline.export;

import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import hemline.pipeline.Analysis;
import hemline.pipeline.Counts;
import hemline.sweep.RadarSite;
import hemline.sweep.SweepFrame;
import java.util.List;

/** {@code run.json}: how the results came about, and a check sum of each. No time of the run itself. */
final class RunJson {
    private RunJson() {
    }

    static ObjectNode of(RunRecord run, List<ResultSum> results) {
        Analysis analysis = run.analysis();
        ObjectNode root = Json.object();
        root.put("program", "hemline").put("version", run.version());
        root.put("caution", Cautions.GUIDANCE);
        radar(root.putObject("radar"), analysis.site());
        sweeps(root.putArray("sweeps"), analysis.frames());
        counts(root.putObject("counts"), analysis.counts());
        ArrayNode cautions = root.putArray("cautions");
        analysis.cautions().forEach(cautions::add);
        ArrayNode notes = root.putArray("notes");
        run.notes().forEach(notes::add);
        root.set("settings", run.settings());
        ArrayNode inputs = root.putArray("inputs");
        run.inputs().forEach(input -> input(inputs.addObject(), input));
        ArrayNode written = root.putArray("results");
        results.forEach(r -> written.addObject().put("name", r.name()).put("bytes", r.bytes()).put("sha256", r.sha256()));
        return root;
    }

    private static void radar(ObjectNode node, RadarSite site) {
        node.put("name", site.name());
        Json.putNumber(node, "latitude", site.position().map(p -> p.latitudeDeg()).orElse(Double.NaN), 6);
        Json.putNumber(node, "longitude", site.position().map(p -> p.longitudeDeg()).orElse(Double.NaN), 6);
        Json.putNumber(node, "altitude_m", site.altitudeM(), 1);
    }

    private static void sweeps(ArrayNode array, List<SweepFrame> frames) {
        for (SweepFrame frame : frames) {
            FrameSpan span = FrameSpan.of(frame);
            ObjectNode node = array.addObject().put("sweep", frame.index())
                    .put("first_utc", Times.iso(span.firstMs())).put("last_utc", Times.iso(span.lastMs())).put("rays", frame.rays().rays());
            Json.putNumber(node, "elevation_deg", frame.beam().elevationDeg(), 3);
        }
    }

    private static void counts(ObjectNode node, Counts counts) {
        node.put("sweeps", counts.sweeps()).put("observed_boundaries", counts.observed())
                .put("tracks", counts.tracks()).put("arcs", counts.arcs())
                .put("meetings_observed", counts.meetingsObserved())
                .put("meetings_expected", counts.meetingsExpected());
    }

    private static void input(ObjectNode node, RunInput input) {
        node.put("path", input.path()).put("sha256", input.sha256()).put("fate", input.fate().label())
                .put("sweeps", input.sweeps());
        if (!input.reason().isEmpty()) {
            node.put("reason", input.reason());
        }
    }
}
