package hemline.cli;

import hemline.workflow.FileSessions;
import hemline.workflow.UserProblem;
import hemline.workflow.ViewerRequest;
import hemline.workflow.ViewerStart;
import java.nio.file.Path;
import java.util.List;
import java.util.ServiceLoader;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

/** {@code hemline view}: the viewer. */
@Command(name = "view", mixinStandardHelpOptions = true, versionProvider = VersionProvider.class,
        description = "Opens the viewer on a loop and analyses it.")
final class ViewCommand implements Callable<Integer> {
    @Parameters(arity = "0..*", paramLabel = "PATH", description = "Files and folders of sweeps of one radar.")
    private List<Path> paths = List.of();

    @Mixin
    private LoopOptions loop;

    @Option(names = "--settings", paramLabel = "FILE.json",
            description = "Settings that differ from the defaults, of the form found in run.json.")
    private Path settings;

    @Override
    public Integer call() throws UserProblem {
        int threads = Runtime.getRuntime().availableProcessors();
        FileSessions sessions = settings == null ? FileSessions.usual(loop.choices(), threads)
                : FileSessions.with(loop.choices(), settings, threads);
        ViewerStart viewer = ServiceLoader.load(ViewerStart.class).findFirst().orElseThrow(() -> new UserProblem(
                UserProblem.Kind.USAGE, "this installation has no viewer; use hemline run instead"));
        return viewer.start(new ViewerRequest(paths, sessions));
    }
}
