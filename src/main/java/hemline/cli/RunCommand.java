package hemline.cli;

import hemline.workflow.RunLoop;
import hemline.workflow.RunOutcome;
import hemline.workflow.RunRequest;
import hemline.workflow.RunRequest.Pictures;
import hemline.workflow.UserProblem;
import java.io.PrintWriter;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.concurrent.Callable;
import java.util.concurrent.CancellationException;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;

/** {@code hemline run}: the main job. */
@Command(name = "run", mixinStandardHelpOptions = true, versionProvider = VersionProvider.class,
        description = "Reads a loop, finds, tracks and measures the boundaries in it and writes the tables.")
final class RunCommand implements Callable<Integer> {
    @Spec
    private CommandSpec spec;

    @Parameters(arity = "1..*", paramLabel = "PATH", description = "Files and folders of sweeps of one radar.")
    private List<Path> paths;

    @Option(names = "--out", required = true, paramLabel = "DIR", description = "Folder for the results.")
    private Path out;

    @Mixin
    private LoopOptions loop;

    @Option(names = "--settings", paramLabel = "FILE.json",
            description = "Settings that differ from the defaults, of the form found in run.json.")
    private Path settings;

    @Option(names = "--ceiling", paramLabel = "METRES",
            description = "Height of the beam above the radar beyond which nothing is claimed (default: 1500).")
    private Double ceilingM;

    @Option(names = "--threads", paramLabel = "N", description = "Threads to use (default: one per processor).")
    private Integer threads;

    @Option(names = "--pictures", arity = "0..1", paramLabel = "WHICH", fallbackValue = "all",
            defaultValue = "overview",
            description = "Pictures to draw: none, overview (default) or all; all when WHICH is left out.")
    private Pictures pictures;

    @Option(names = "--stations", paramLabel = "FILE.csv",
            description = "Station observations; passages of boundaries over them go to passages.csv.")
    private Path stations;

    @Override
    public Integer call() throws UserProblem {
        if (threads != null && threads < 1) {
            throw new ParameterException(spec.commandLine(), "--threads must be at least 1, got " + threads);
        }
        PrintWriter err = spec.commandLine().getErr();
        RunOutcome outcome;
        try (Interrupts interrupts = new Interrupts()) {
            try (TerminalProgress progress = new TerminalProgress(interrupts::asked)) {
                outcome = new RunLoop().run(request(), progress);
            } catch (CancellationException stopped) {
                // Said before the interrupt is let go on: after that the program may end at any moment.
                return new FailureLine().handleExecutionException(stopped, spec.commandLine(), null);
            }
        }
        outcome.refused().forEach(refused -> err.println("hemline: " + refused.path() + ": " + refused.reason()));
        outcome.notes().forEach(note -> err.println("note: " + note));
        new Summary(spec.commandLine().getOut()).print(outcome);
        return outcome.refused().isEmpty() ? ExitCodes.DONE : ExitCodes.SOME_UNREADABLE;
    }

    private RunRequest request() {
        return new RunRequest(paths, out, loop.choices(), Optional.ofNullable(settings),
                ceilingM == null ? OptionalDouble.empty() : OptionalDouble.of(ceilingM),
                threads == null ? Runtime.getRuntime().availableProcessors() : threads, pictures,
                Optional.ofNullable(stations));
    }
}
