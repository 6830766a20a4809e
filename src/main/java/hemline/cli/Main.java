package hemline.cli;

import picocli.CommandLine;
import picocli.CommandLine.Command;

/** The command line's front door. */
@Command(name = "hemline", mixinStandardHelpOptions = true, versionProvider = VersionProvider.class,
        description = "Finds, tracks and measures convective outflow boundaries in loops of low radar sweeps.",
        footer = {"", "Guidance, not a warning: the national weather service, local procedures and licensed",
            "forecasters decide."})
public final class Main {

    private Main() {
    }

    public static void main(String[] args) {
        System.exit(new CommandLine(new Main()).execute(args));
    }
}
