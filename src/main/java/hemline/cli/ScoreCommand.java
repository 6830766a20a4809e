package hemline.cli;

import hemline.workflow.ScoreOutcome;
import hemline.workflow.ScoreRequest;
import hemline.workflow.ScoreResults;
import hemline.workflow.UserProblem;
import java.io.PrintWriter;
import java.nio.file.Path;
import java.util.List;
import java.util.OptionalDouble;
import java.util.concurrent.Callable;
import picocli.CommandLine.ArgGroup;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;

/** {@code hemline score}: tables against a truth or against other tables. */
@Command(name = "score", mixinStandardHelpOptions = true, versionProvider = VersionProvider.class,
        description = "Measures the tables of a run, or of a case, against a truth or against those of another.",
        footer = {"", "Several folders are scored each against its own truth, in the same order, and pooled:",
            "  hemline score A B --truth A/truth.json --truth B/truth.json"})
final class ScoreCommand implements Callable<Integer> {
    @Spec
    private CommandSpec spec;

    @Parameters(arity = "1..*", paramLabel = "DIR", description = "Folders with boundaries.csv, tracks.csv, meetings.csv.")
    private List<Path> results;

    @ArgGroup(exclusive = true, multiplicity = "1")
    private Against against;

    @Option(names = "--tolerance", paramLabel = "KM", description = "Greatest distance of a match (default: 2 km).")
    private Double toleranceKm;

    @Option(names = "--json", description = "Print JSON instead of a table.")
    private boolean json;

    /** One of the two things to measure against. */
    static final class Against {
        @Option(names = "--truth", required = true, paramLabel = "FILE", description = "The truth.json of a simulated loop.")
        private List<Path> truth;

        @Option(names = "--reference", required = true, paramLabel = "DIR",
                description = "A folder of tables taken as the truth.")
        private List<Path> reference;
    }

    @Override
    public Integer call() throws UserProblem {
        List<Path> references = against.truth != null ? against.truth : against.reference;
        if (references.size() != results.size()) {
            throw new ParameterException(spec.commandLine(), "each folder needs its own truth or reference: "
                    + results.size() + " and " + references.size() + " were given");
        }
        if (toleranceKm != null && !(toleranceKm > 0 && toleranceKm <= 100)) {
            throw new ParameterException(spec.commandLine(), "--tolerance must lie within 0..100 km, got " + toleranceKm);
        }
        ScoreOutcome outcome = new ScoreResults().score(new ScoreRequest(results, references,
                toleranceKm == null ? OptionalDouble.empty() : OptionalDouble.of(toleranceKm)));
        PrintWriter out = spec.commandLine().getOut();
        out.print(json ? outcome.json() : outcome.text());
        out.flush();
        return ExitCodes.DONE;
    }
}
