package hemline.export;

import com.fasterxml.jackson.databind.JsonNode;
import hemline.pipeline.Analysis;
import java.util.List;

/**
 * All that the results of one run are written from.
 *
 * @param version        of the program
 * @param analysis       what was found
 * @param heightCeilingM height of the beam above the radar beyond which nothing is claimed, m
 * @param settings       all settings as JSON
 * @param inputs         every file looked at, in the order of the loop, then the others
 * @param notes          what was decided while reading, in words
 */
public record RunRecord(String version, Analysis analysis, double heightCeilingM, JsonNode settings,
                        List<RunInput> inputs, List<String> notes) {
    public RunRecord {
        inputs = List.copyOf(inputs);
        notes = List.copyOf(notes);
    }
}
