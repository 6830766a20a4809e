package hemline.casefile.store;

import static org.assertj.core.api.Assertions.assertThat;

import hemline.casefile.CaseExamples;
import hemline.casefile.edit.Edit;
import hemline.casefile.edit.Entry;
import java.io.BufferedReader;
import java.io.IOException;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.Timeout;
import org.junit.jupiter.api.io.TempDir;

/** A real process, killed while it writes. */
class KillTest {
    @TempDir
    Path folder;

    /** Makes a case and adds notes to it until it is killed; says each number once it is saved. */
    static final class Editor {
        private Editor() {
        }

        public static void main(String[] args) throws IOException {
            CaseStore store = CaseStore.create(new DiskFiles(), Path.of(args[0]), "1", CaseExamples.settings(),
                    List.of(), CaseExamples.tiny(0), "the editor");
            for (int i = 1; ; i++) {
                store.append(entry(i));
                System.out.println(i);
            }
        }
    }

    private static Entry entry(int i) {
        return new Entry(i, CaseExamples.START_MS, "Ada", "", new Edit.Note(Optional.empty(), "x".repeat(i % 4000)), "",
                "");
    }

    @Test
    @Timeout(240)
    void killedProgramLosesNothingThatItSaidWasSavedAndLetsGoOfTheCase() throws Exception {
        Path path = folder.resolve("case");
        Process editor = new ProcessBuilder(Path.of(System.getProperty("java.home"), "bin", "java").toString(),
                "-XX:TieredStopAtLevel=1", "-cp", System.getProperty("java.class.path"), Editor.class.getName(),
                path.toString()).redirectError(ProcessBuilder.Redirect.INHERIT).start();
        int saved = 0;
        try (BufferedReader said = editor.inputReader()) {
            while (saved < 50) {
                saved = Integer.parseInt(said.readLine());
            }
            try (CaseStore second = CaseStore.open(new DiskFiles(), path, OpenMode.WRITE, "bob")) {
                assertThat(second.readOnlyReason()).contains("open for edits elsewhere (the editor)");
                assertThat(second.entries()).hasSizeGreaterThanOrEqualTo(50);
            }
            // Through the handle: the process's own method would close the stream with the last numbers in it.
            assertThat(editor.toHandle().destroyForcibly()).isTrue();
            editor.waitFor();
            for (String line = said.readLine(); line != null && !line.isEmpty(); line = said.readLine()) {
                saved = Integer.parseInt(line);
            }
        }
        try (CaseStore store = CaseStore.open(new DiskFiles(), path, OpenMode.WRITE, "bob")) {
            assertThat(store.readOnlyReason()).isEmpty();
            List<Entry> kept = store.entries().stream().filter(e -> !(e.edit() instanceof Edit.Mended)).toList();
            assertThat(kept.size()).isBetween(saved, saved + 1);
            for (int i = 0; i < kept.size(); i++) {
                assertThat(kept.get(i)).isEqualTo(entry(i + 1));
            }
        }
    }
}
