package hemline.casefile.store;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import hemline.casefile.CaseExamples;
import hemline.casefile.edit.Edit;
import hemline.casefile.edit.Entry;
import java.io.IOException;
import java.io.OutputStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.zip.ZipEntry;
import java.util.zip.ZipOutputStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class SourcesAndZipTest {
    @TempDir
    Path folder;

    private Path file(String name, String content) throws IOException {
        Path file = folder.resolve(name);
        Files.createDirectories(file.getParent());
        return Files.writeString(file, content);
    }

    /** The digest of "abc" is worked out in FIPS 180-4, example SHA-256, one-block message. */
    @Test
    void hashIsThatOfTheStandard() throws IOException {
        String expected = "ba7816bf8f01cfea414140de5dae2223b00361a396177a9cb410ff61f20015ad";
        assertThat(Sha256.of(new byte[] {'a', 'b', 'c'})).isEqualTo(expected);
        assertThat(Sha256.of(file("abc", "abc"))).isEqualTo(expected);
    }

    @Test
    void sourceIsToldFromTheCaseFolderAndFoundThere() throws IOException {
        Path sweep = file("sweeps/a.nc", "first");
        SourceFile source = SourceFinder.describe(folder.resolve("cases/one"), sweep);
        assertThat(source.path()).isEqualTo("../../sweeps/a.nc");
        assertThat(source.bytes()).isEqualTo(5);
        Files.createDirectories(folder.resolve("cases/one"));
        SourceFinder finder = SourceFinder.find(folder.resolve("cases/one"), List.of(source), List.of());
        assertThat(finder.found().get(source)).hasSameTextualContentAs(sweep);
    }

    @Test
    void movedAndRenamedSourceIsFoundByContentAndAnotherOfThatNameIsNot() throws IOException {
        SourceFile source = SourceFinder.describe(folder.resolve("case"), file("sweeps/a.nc", "first"));
        file("sweeps/a.nc", "other");
        file("archive/deep/er/b.nc", "first");
        file("archive/c.nc", "trash");
        SourceFinder finder =
                SourceFinder.find(folder.resolve("case"), List.of(source), List.of(folder.resolve("archive")));
        assertThat(finder.found().get(source)).isEqualTo(folder.resolve("archive/deep/er/b.nc"));
        assertThat(finder.missing()).isEmpty();
        SourceFinder elsewhere =
                SourceFinder.find(folder.resolve("case"), List.of(source), List.of(folder.resolve("none")));
        assertThat(elsewhere.missing()).containsExactly(source);
    }

    private Path aCase(String name) throws IOException {
        Path path = folder.resolve(name);
        try (CaseStore store = CaseStore.create(new DiskFiles(), path, "1", CaseExamples.settings(),
                CaseExamples.sources(), CaseExamples.found(), "ada")) {
            store.append(new Entry(1, 0, "Ada", "", new Edit.Note(Optional.empty(), "note"), "", ""));
        }
        return path;
    }

    @Test
    void zippedCaseOpensElsewhereAndZipsToTheSameBytes() throws IOException {
        Path zip = folder.resolve("case.zip");
        CaseZip.pack(aCase("case"), zip);
        CaseZip.unpack(zip, folder.resolve("there"));
        try (CaseStore store = CaseStore.open(new DiskFiles(), folder.resolve("there"), OpenMode.WRITE, "bob")) {
            assertThat(store.entries()).hasSize(1);
            assertThat(store.found().tracks()).isEqualTo(CaseExamples.found().tracks());
        }
        CaseZip.pack(folder.resolve("there"), folder.resolve("again.zip"));
        assertThat(folder.resolve("again.zip")).hasSameBinaryContentAs(zip);
    }

    @Test
    void zipThatReachesOutOfItsFolderIsRefused() throws IOException {
        Path zip = folder.resolve("evil.zip");
        try (OutputStream file = Files.newOutputStream(zip); ZipOutputStream out = new ZipOutputStream(file)) {
            out.putNextEntry(new ZipEntry("../evil.txt"));
            out.write(1);
        }
        assertThatThrownBy(() -> CaseZip.unpack(zip, folder.resolve("there"))).isInstanceOf(CaseFileException.class)
                .hasMessageContaining("../evil.txt");
        assertThat(folder.resolve("evil.txt")).doesNotExist();
    }

    @Test
    void zipOfSomethingElseIsRefused() throws IOException {
        Path notZip = file("some.zip", "no zip at all");
        assertThatThrownBy(() -> CaseZip.unpack(notZip, folder.resolve("there"))).isInstanceOf(CaseFileException.class)
                .hasMessageContaining("holds no case");
    }

    @Test
    void newCaseIsNotMixedWithOtherThings() throws IOException {
        file("busy/thesis.txt", "mine");
        assertThatThrownBy(() -> aCase("busy")).isInstanceOf(CaseFileException.class)
                .hasMessageContaining("holds other things");
        aCase("case");
        assertThatThrownBy(() -> aCase("case")).isInstanceOf(CaseFileException.class)
                .hasMessageContaining("a case here already");
    }

    @Test
    void folderThatIsNoCaseIsNamed() {
        assertThatThrownBy(() -> CaseStore.open(new DiskFiles(), folder, OpenMode.WRITE, "bob"))
                .isInstanceOf(CaseFileException.class).hasMessageContaining("no case.json");
    }

    @Test
    void tamperedOrNewerCaseIsRefused() throws IOException {
        Path path = aCase("case");
        Path tracks = path.resolve("found/tracks.jsonl");
        String whole = Files.readString(tracks);
        Files.writeString(tracks, whole.replaceFirst("too straight", "too-straight"));
        assertThatThrownBy(() -> CaseStore.open(new DiskFiles(), path, OpenMode.LOOK, ""))
                .isInstanceOf(CaseFileException.class).hasMessageContaining("tracks.jsonl");
        Files.writeString(tracks, whole);
        Path head = path.resolve("case.json");
        String json = Files.readString(head);
        Files.writeString(head, json.replace("\"version\" : 1", "\"version\" : 2"));
        assertThatThrownBy(() -> CaseStore.open(new DiskFiles(), path, OpenMode.LOOK, ""))
                .isInstanceOf(CaseFileException.class).hasMessageContaining("newer program");
        for (String broken : List.of("", "{", "[]", "null", json.replace("hemline-case", "other"),
                json.replace("found/run.jsonl", "../run.jsonl"), json.replace("1500.5", "NaN"))) {
            Files.writeString(head, broken);
            assertThatThrownBy(() -> CaseStore.open(new DiskFiles(), path, OpenMode.LOOK, ""))
                    .as(broken).isInstanceOf(CaseFileException.class);
        }
    }
}
