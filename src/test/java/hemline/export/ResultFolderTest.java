package hemline.export;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class ResultFolderTest {
    @TempDir
    private Path temp;

    private static ResultFolder.Body words(String words) {
        return out -> out.write(words.getBytes(StandardCharsets.UTF_8));
    }

    private static List<String> names(Path folder) throws IOException {
        try (Stream<Path> list = Files.walk(folder)) {
            return list.filter(Files::isRegularFile).map(p -> folder.relativize(p).toString()).sorted().toList();
        }
    }

    @Test
    void nothingAppearsBeforePublishing() throws IOException {
        Path out = temp.resolve("new/results");
        try (ResultFolder folder = ResultFolder.open(out)) {
            folder.stage("a.csv", words("a"));
            folder.stage("pictures/p.png", words("p"));
            assertThat(out.resolve("a.csv")).doesNotExist();
            folder.publish();
        }
        assertThat(names(out)).containsExactly("a.csv", "pictures/p.png");
    }

    @Test
    void aFailureLeavesEarlierResultsAndNoLeftOvers() throws IOException {
        try (ResultFolder folder = ResultFolder.open(temp)) {
            folder.stage("a.csv", words("first"));
            folder.publish();
        }
        try (ResultFolder folder = ResultFolder.open(temp)) {
            folder.stage("a.csv", words("second"));
            assertThatThrownBy(() -> folder.stage("b.csv", out -> {
                out.write(1);
                throw new IOException("no space left on device");
            })).hasMessage("no space left on device");
        }
        assertThat(names(temp)).containsExactly("a.csv");
        assertThat(temp.resolve("a.csv")).hasContent("first");
    }

    @Test
    void aSecondRunIsRefusedUntilTheFirstLetsGo() throws IOException {
        try (ResultFolder first = ResultFolder.open(temp)) {
            assertThatThrownBy(() -> ResultFolder.open(temp)).isInstanceOf(FolderInUseException.class)
                    .hasMessageContaining(first.path().toString()).hasMessageContaining("choose another folder");
        }
        ResultFolder.open(temp).close();
        assertThat(names(temp)).isEmpty();
    }

    @Test
    void stagingLeftByAKilledRunIsCleared() throws IOException {
        Files.createDirectories(temp.resolve(".hemline-staging/pictures"));
        Files.writeString(temp.resolve(".hemline-staging/pictures/old.png"), "torn");
        Files.writeString(temp.resolve(".hemline-lock"), "left behind");
        try (ResultFolder folder = ResultFolder.open(temp)) {
            folder.stage("a.csv", words("a"));
            folder.publish();
        }
        assertThat(names(temp)).containsExactly("a.csv");
    }

    @Test
    void otherFilesInTheFolderAreLeftAlone() throws IOException {
        Files.writeString(temp.resolve("notes.txt"), "mine");
        try (ResultFolder folder = ResultFolder.open(temp)) {
            folder.stage("a.csv", words("a"));
            folder.publish();
        }
        assertThat(temp.resolve("notes.txt")).hasContent("mine");
    }

    @Test
    void aFileInPlaceOfTheFolderIsAnError() throws IOException {
        Path file = Files.writeString(temp.resolve("taken"), "x");
        assertThatThrownBy(() -> ResultFolder.open(file)).isInstanceOf(IOException.class);
        assertThat(file).hasContent("x");
    }
}
