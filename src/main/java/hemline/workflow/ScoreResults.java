package hemline.workflow;

import hemline.scoring.InputFileException;
import hemline.scoring.RunScoring;
import hemline.scoring.Score;
import hemline.scoring.ScoreJson;
import hemline.scoring.ScoreSettings;
import hemline.scoring.ScoreText;
import hemline.scoring.Scores;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;

/** Scores the tables of runs or cases against a truth or against each other, pooled where there are several. */
public final class ScoreResults {

    /**
     * @throws UserProblem if a table or a truth cannot be used
     */
    public ScoreOutcome score(ScoreRequest request) throws UserProblem {
        ScoreSettings settings = ScoreSettings.defaults();
        if (request.toleranceKm().isPresent()) {
            settings = settings.withToleranceKm(request.toleranceKm().getAsDouble());
        }
        List<Score> scores = new ArrayList<>();
        for (int i = 0; i < request.results().size(); i++) {
            Path results = request.results().get(i);
            Path reference = request.references().get(i);
            try {
                scores.add(Files.isDirectory(reference) ? RunScoring.againstReference(results, reference, settings)
                        : RunScoring.againstTruth(results, reference, settings));
            } catch (InputFileException e) {
                throw new UserProblem(UserProblem.Kind.USAGE, e.getMessage(), e);
            }
        }
        Score pooled = Scores.pool(scores);
        return new ScoreOutcome(ScoreText.table(pooled), ScoreJson.text(pooled));
    }
}
