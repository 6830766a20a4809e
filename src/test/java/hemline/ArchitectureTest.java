package hemline;

import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.classes;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noClasses;
import static com.tngtech.archunit.library.dependencies.SlicesRuleDefinition.slices;
import static org.assertj.core.api.Assertions.assertThat;

import com.tngtech.archunit.core.domain.JavaClasses;
import com.tngtech.archunit.core.importer.ClassFileImporter;
import com.tngtech.archunit.core.importer.ImportOption;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;

/** A whitelist of every package and all that it may use, libraries too. */
class ArchitectureTest {
    private static final String[] BASE = {"geodesy", "geometry", "numerics"};
    private static final String[] NOUNS = {"boundary", "sweep", "geodesy", "geometry", "numerics"};
    private static final String[] STAGES = {"screening", "detection", "tracking", "kinematics", "outflow", "meeting"};

    private static final Map<String, List<String>> MAY_USE = new LinkedHashMap<>();
    private static final Map<String, List<String>> LIBRARIES = new LinkedHashMap<>();

    static {
        allow("numerics", List.of(), "org.apache.commons.math3..", "org.ejml..");
        allow("geometry", List.of("numerics"), "org.locationtech.jts..");
        allow("geodesy", List.of("geometry", "numerics"), "net.sf.geographiclib..");
        allow("sweep", List.of(BASE));
        allow("boundary", join(BASE, "sweep"));
        allow("reader", join(BASE, "sweep"), "ucar..", "io.jhdf..", "org.apache.commons.compress..");
        allow("screening", join(BASE, "sweep"));
        for (String stage : List.of("detection", "tracking", "kinematics", "outflow", "meeting")) {
            allow(stage, List.of(NOUNS));
        }
        allow("pipeline", join(NOUNS, STAGES));
        allow("casefile", join(NOUNS, "pipeline"), "com.fasterxml.jackson..");
        allow("export", join(NOUNS, "casefile", "pipeline"), "com.fasterxml.jackson..", "org.apache.commons.csv..",
                "ucar..");
        allow("simulation", List.of(NOUNS), "com.fasterxml.jackson..", "ucar..", "io.jhdf..",
                "org.apache.commons.math3..");
        allow("scoring", List.of(NOUNS), "com.fasterxml.jackson..", "org.apache.commons.csv..");
        List<String> engine = join(join(NOUNS, STAGES).toArray(String[]::new),
                "reader", "pipeline", "casefile", "export", "simulation", "scoring");
        allow("workflow", engine, "com.fasterxml.jackson..", "org.apache.commons.csv..");
        allow("cli", join(NOUNS, "workflow", "casefile"), "picocli..", "me.tongfei.progressbar..");
        allow("viewer", join(NOUNS, "workflow", "casefile"), "javafx..", "atlantafx..", "org.controlsfx..",
                "org.kordamp.ikonli..");
    }

    private static final JavaClasses CLASSES = new ClassFileImporter()
            .withImportOption(ImportOption.Predefined.DO_NOT_INCLUDE_TESTS).importPackages("hemline");

    private static List<String> join(String[] some, String... more) {
        return Stream.concat(Stream.of(some), Stream.of(more)).toList();
    }

    private static void allow(String name, List<String> packages, String... libraries) {
        MAY_USE.put(name, packages);
        LIBRARIES.put(name, List.of(libraries));
    }

    @Test
    void everyPackageUsesOnlyWhatItMay() {
        MAY_USE.forEach((name, uses) -> {
            List<String> allowed = new ArrayList<>(List.of("java..", "javax.imageio..", "javax.xml..",
                    "hemline." + name + ".."));
            uses.forEach(used -> allowed.add("hemline." + used + ".."));
            allowed.addAll(LIBRARIES.get(name));
            classes().that().resideInAPackage("hemline." + name + "..")
                    .should().onlyDependOnClassesThat().resideInAnyPackage(allowed.toArray(String[]::new))
                    .allowEmptyShould(true).check(CLASSES);
        });
    }

    @Test
    void everyPackageIsListed() {
        classes().should().resideInAnyPackage(
                MAY_USE.keySet().stream().map(name -> "hemline." + name + "..").toArray(String[]::new)).check(CLASSES);
    }

    @Test
    void packagesAreFreeOfCycles() {
        slices().matching("hemline.(*)..").should().beFreeOfCycles().check(CLASSES);
    }

    @Test
    void viewModelsKnowNoScene() {
        noClasses().that().resideInAPackage("hemline.viewer.viewmodel..")
                .should().dependOnClassesThat().resideInAnyPackage("javafx.scene..", "javafx.stage..")
                .allowEmptyShould(true).check(CLASSES);
    }

    @Test
    void onlyTheCommandLineTouchesStandardStreams() {
        noClasses().that().resideOutsideOfPackage("hemline.cli..")
                .should().accessField(System.class, "out").orShould().accessField(System.class, "err")
                .orShould().callMethod(Throwable.class, "printStackTrace").check(CLASSES);
    }

    /** Bytecode forgets imports used only in comments and inlined constants; the sources do not. */
    @Test
    void sourcesNameNoPackageTheyMayNotUse() throws IOException {
        Pattern name = Pattern.compile("hemline\\.([a-z]+)\\.");
        List<String> breaches = new ArrayList<>();
        for (Path file : sources()) {
            String own = ownPackage(file);
            Matcher found = name.matcher(Files.readString(file));
            while (found.find()) {
                String used = found.group(1);
                if (!used.equals(own) && MAY_USE.containsKey(used) && !MAY_USE.get(own).contains(used)) {
                    breaches.add(file.getFileName() + " (" + own + ") names hemline." + used);
                }
            }
        }
        assertThat(breaches).isEmpty();
    }

    @Test
    void everyPackageHasItsSign() throws IOException {
        for (Path file : sources()) {
            assertThat(file.resolveSibling("package-info.java")).exists();
        }
    }

    @Test
    void noFileIsOverFiveHundredLines() throws IOException {
        for (Path file : sources()) {
            assertThat(Files.readAllLines(file)).as(file.toString()).hasSizeLessThanOrEqualTo(500);
        }
    }

    private static String ownPackage(Path file) {
        Path inRoot = Path.of("src/main/java/hemline").toAbsolutePath().relativize(file.toAbsolutePath());
        return inRoot.getName(0).toString();
    }

    private static List<Path> sources() throws IOException {
        try (Stream<Path> tree = Files.walk(Path.of("src/main/java/hemline"))) {
            return tree.filter(path -> path.toString().endsWith(".java")).toList();
        }
    }
}
