package hemline.scoring;

import hemline.boundary.truth.Truth;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;

/** Scores the folder of a run, or of an exported hand case, against a truth or against another folder. */
public final class RunScoring {

    private RunScoring() {
    }

    /** @throws InputFileException when a table or the truth cannot be used */
    public static Score againstTruth(Path folder, Path truthFile, ScoreSettings settings) throws InputFileException {
        RunTables run = RunTables.read(folder);
        Truth truth = TruthFile.read(truthFile);
        try {
            return score(truth, run, settings, run.notes());
        } catch (IllegalArgumentException e) {
            throw new InputFileException(truthFile, "", e.getMessage(), "use the truth that belongs to the loop", e);
        }
    }

    /**
     * Takes one folder as the truth for the other. Recall is then the share of the reference's length that the other
     * has too, precision the share of the other's length that the reference has.
     *
     * @throws InputFileException when a table cannot be used, or neither folder has a line
     */
    public static Score againstReference(Path folder, Path reference, ScoreSettings settings)
            throws InputFileException {
        RunTables run = RunTables.read(folder);
        RunTables taken = RunTables.read(reference);
        if (run.tracks().isEmpty() && taken.tracks().isEmpty()) {
            throw new InputFileException(reference, "", "neither this nor " + folder + " has a line",
                    "compare runs of which one found something", null);
        }
        return score(Reference.of(taken, run), run, settings,
                Stream.concat(run.notes().stream(), taken.notes().stream()).toList());
    }

    private static Score score(Truth truth, RunTables run, ScoreSettings settings, List<String> notes) {
        SceneTally tally = new SceneScorer(truth, run.tracks(), settings).tally(run.meetings());
        return new Score(List.of(tally.withCautions(notes)), settings, java.util.Map.of());
    }
}
