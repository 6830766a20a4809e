package hemline.workflow;

import java.nio.file.Path;
import java.util.List;
import java.util.OptionalDouble;

/**
 * What to score against what.
 *
 * @param results     folders with the tables of a run or a case
 * @param references  what each is measured against, in the same order: truth files, or folders taken as the truth
 * @param toleranceKm greatest distance at which two lines match, km; empty for the usual one
 */
public record ScoreRequest(List<Path> results, List<Path> references, OptionalDouble toleranceKm) {
    public ScoreRequest {
        results = List.copyOf(results);
        references = List.copyOf(references);
        if (results.isEmpty() || results.size() != references.size()) {
            throw new IllegalArgumentException("each of the results needs one reference, got " + results.size()
                    + " results and " + references.size() + " references");
        }
    }
}
