package hemline.checks;

import static org.assertj.core.api.Assertions.assertThat;

import hemline.geodesy.GeodesyChecks;
import hemline.geometry.GeometryChecks;
import hemline.numerics.NumericsChecks;
import hemline.outflow.OutflowChecks;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/**
 * Runs every outside check and keeps docs/checks.md true. To write the page anew after a change:
 * {@code mvn test -Dtest=OutsideChecksTest -Dhemline.writeChecks=true}.
 */
class OutsideChecksTest {
    private static final Path PAGE = Path.of(System.getProperty("hemline.basedir", "."), "docs", "checks.md");

    /** One entry a package that has checks. */
    static List<OutsideCheck> all() {
        return Stream.of(NumericsChecks.list(), GeometryChecks.list(), GeodesyChecks.list(), OutflowChecks.list())
                .flatMap(List::stream).toList();
    }

    @ParameterizedTest
    @MethodSource("all")
    void theValueOfTheSourceIsReproduced(OutsideCheck check) {
        assertThat(check.got().getAsDouble()).as("%s; %s", check, check.source()).isNotNaN();
        assertThat(check.difference()).as("%s: expected %s, got %s; %s", check, check.expected(),
                check.got().getAsDouble(), check.source()).isLessThanOrEqualTo(check.tolerance());
    }

    @Test
    void thePageListsWhatIsCheckedHere() throws IOException {
        String page = ChecksPage.of(all());
        if (Boolean.getBoolean("hemline.writeChecks")) {
            Files.createDirectories(PAGE.getParent());
            Files.writeString(PAGE, page);
        }
        assertThat(Files.readString(PAGE)).as("docs/checks.md is not what the checks say; write it anew")
                .isEqualTo(page);
    }

    @Test
    void noCheckIsListedTwice() {
        assertThat(all()).extracting(check -> check.part() + check + check.source()).doesNotHaveDuplicates();
    }
}
