package hemline.cli;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.PrintWriter;
import java.nio.file.Path;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import picocli.CommandLine;

class MainTest {
    private static Map<String, CommandLine> commands() {
        return Main.commandLine(new PrintWriter(System.out), new PrintWriter(System.err)).getSubcommands();
    }

    @Test
    void helpListsEveryCommandAndTheExitCodes() {
        Invocation help = Invocation.of("--help");
        assertThat(help.exitCode()).isZero();
        assertThat(help.err()).isEmpty();
        assertThat(commands()).isNotEmpty();
        commands().keySet().forEach(name -> assertThat(help.out()).contains("  " + name + " "));
        assertThat(help.out()).contains("3   done, but some inputs could not be read").contains("Guidance, not a warning");
    }

    @Test
    void everyCommandHasHelpAndVersion() {
        for (String name : commands().keySet()) {
            assertThat(Invocation.of(name, "--help").exitCode()).as(name).isZero();
            assertThat(Invocation.of(name, "--help").out()).startsWith("Usage: hemline " + name);
            assertThat(Invocation.of(name, "--version").out()).as(name).startsWith("hemline ");
        }
    }

    @Test
    void theVersionIsThatOfTheBuild() {
        assertThat(Invocation.of("--version").out().strip()).matches("hemline \\d+\\.\\d+\\.\\d+(-SNAPSHOT)?");
    }

    @ParameterizedTest
    @ValueSource(strings = {"", "nonsense", "--nonsense", "score", "score x", "score x --truth a --truth b",
        "score x --truth a --reference b", "score x --truth a --tolerance -1", "score x --truth a --tolerance near"})
    void wrongUsageIsOneLineAndExitCodeTwo(String line) {
        Invocation wrong = Invocation.of(line.isEmpty() ? new String[0] : line.split(" "));
        assertThat(wrong.exitCode()).isEqualTo(2);
        assertThat(wrong.out()).isEmpty();
        assertThat(wrong.err().lines()).hasSize(1);
        assertThat(wrong.err()).startsWith("hemline: ").contains("--help");
    }

    @Test
    void aFolderWithoutTablesIsNamedWithTheMend(@TempDir Path temp) {
        Invocation wrong = Invocation.of("score", temp.toString(), "--truth", temp.resolve("truth.json").toString());
        assertThat(wrong.exitCode()).isEqualTo(2);
        assertThat(wrong.err().lines()).hasSize(1);
        assertThat(wrong.err()).contains(temp.resolve("boundaries.csv").toString());
    }
}
