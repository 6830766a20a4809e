package hemline.cli;

import java.io.FileDescriptor;
import java.io.FileOutputStream;
import java.io.OutputStreamWriter;
import java.io.PrintWriter;
import java.nio.charset.StandardCharsets;
import picocli.CommandLine;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.Spec;

/** The command line's front door. */
@Command(name = "hemline", mixinStandardHelpOptions = true, versionProvider = VersionProvider.class,
        subcommands = {RunCommand.class, ViewCommand.class, InspectCommand.class, SimulateCommand.class,
            ScoreCommand.class, OutflowCommand.class},
        description = "Finds, tracks and measures convective outflow boundaries in loops of low radar sweeps.",
        exitCodeListHeading = "%nExit codes:%n",
        exitCodeList = {"0:done", "1:internal failure", "2:wrong usage",
            "3:done, but some inputs could not be read", "4:nothing could be read"},
        footer = {"", "Guidance, not a warning: the national weather service, local procedures and",
            "licensed forecasters decide."})
public final class Main implements Runnable {
    @Spec
    private CommandSpec spec;

    private Main() {
    }

    public static void main(String[] args) {
        System.exit(commandLine(utf8(FileDescriptor.out), utf8(FileDescriptor.err)).execute(args));
    }

    /** The whole command line, writing to the given streams. */
    static CommandLine commandLine(PrintWriter out, PrintWriter err) {
        return new CommandLine(new Main()).setOut(out).setErr(err)
                .setCaseInsensitiveEnumValuesAllowed(true)
                .setParameterExceptionHandler(new UsageLine())
                .setExecutionExceptionHandler(new FailureLine());
    }

    @Override
    public void run() {
        throw new ParameterException(spec.commandLine(), "a command is needed");
    }

    private static PrintWriter utf8(FileDescriptor stream) {
        return new PrintWriter(new OutputStreamWriter(new FileOutputStream(stream), StandardCharsets.UTF_8), true);
    }
}
