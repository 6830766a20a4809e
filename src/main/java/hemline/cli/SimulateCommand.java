package hemline.cli;

import hemline.workflow.Simulate;
import hemline.workflow.SimulateOutcome;
import hemline.workflow.SimulateRequest;
import hemline.workflow.UserProblem;
import java.io.PrintWriter;
import java.nio.file.Path;
import java.util.Iterator;
import java.util.List;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;

/** {@code hemline simulate}: an invented loop with its truth. */
@Command(name = "simulate", mixinStandardHelpOptions = true, versionProvider = VersionProvider.class,
        sortOptions = false,
        description = "Invents a loop with known truth and writes it in the open formats. The same scene, radar and "
                + "seed give the same bytes.")
final class SimulateCommand implements Callable<Integer> {
    @Spec
    private CommandSpec spec;

    @Parameters(paramLabel = "DIR", description = "Folder for the sweeps and their truth.json.")
    private Path folder;

    @Option(names = "--scene", paramLabel = "NAME", defaultValue = "sample", completionCandidates = SceneNames.class,
            description = "Kind of scene (default: ${DEFAULT-VALUE}): ${COMPLETION-CANDIDATES}.")
    private String scene;

    @Option(names = "--radar", paramLabel = "NAME", defaultValue = "lornfield",
            completionCandidates = RadarNames.class,
            description = "Invented radar (default: ${DEFAULT-VALUE}): ${COMPLETION-CANDIDATES}.")
    private String radar;

    @Option(names = "--seed", paramLabel = "N", defaultValue = "7",
            description = "Seed of everything random (default: ${DEFAULT-VALUE}).")
    private long seed;

    @Option(names = "--format", paramLabel = "NAME", split = ",", completionCandidates = FormatNames.class,
            description = "Formats of the files, in turn (default: all of them): ${COMPLETION-CANDIDATES}.")
    private List<String> formats = List.of();

    @Option(names = "--threads", paramLabel = "N", description = "Threads to use (default: one per processor).")
    private Integer threads;

    @Override
    public Integer call() throws UserProblem {
        if (threads != null && threads < 1) {
            throw new ParameterException(spec.commandLine(), "--threads must be at least 1, got " + threads);
        }
        SimulateOutcome made;
        try (Interrupts interrupts = new Interrupts();
                TerminalProgress progress = new TerminalProgress(interrupts::asked)) {
            made = new Simulate().write(new SimulateRequest(folder, scene, radar, seed, formats,
                    threads == null ? Runtime.getRuntime().availableProcessors() : threads), progress);
        }
        PrintWriter out = spec.commandLine().getOut();
        out.println("Invented, never measured: " + made.files().size() + " sweeps in " + folder + ", truth in "
                + made.truth() + " (" + made.boundaries() + " boundaries, " + made.meetings() + " meetings)");
        return ExitCodes.DONE;
    }

    /** Asked only when help is printed, so that starting up need not know the catalogue. */
    static final class SceneNames implements Iterable<String> {
        @Override
        public Iterator<String> iterator() {
            return Simulate.scenes().iterator();
        }
    }

    static final class RadarNames implements Iterable<String> {
        @Override
        public Iterator<String> iterator() {
            return Simulate.radars().iterator();
        }
    }

    static final class FormatNames implements Iterable<String> {
        @Override
        public Iterator<String> iterator() {
            return Simulate.formats().iterator();
        }
    }
}
