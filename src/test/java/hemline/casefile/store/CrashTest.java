package hemline.casefile.store;

import static org.assertj.core.api.Assertions.assertThat;

import hemline.casefile.CaseExamples;
import hemline.casefile.edit.Edit;
import hemline.casefile.edit.Entry;
import hemline.casefile.edit.Found;
import java.io.IOException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;

/** The program is stopped at every step of its work with files; what it then finds must be whole. */
class CrashTest {
    private static final Path CASE = Path.of("/cases/one").toAbsolutePath();
    /** Ways in which unforced writes may survive a power loss, tried for each step. */
    private static final int DISKS = 4;

    private final Found first = CaseExamples.tiny(0);
    private final Found second = CaseExamples.tiny(1);

    /** What was promised before the crash. */
    private static final class Promised {
        private boolean created;
        private final List<Entry> saved = new ArrayList<>();
        private Entry inProgress;
        private boolean publishing;
        private boolean published;
    }

    private static Entry entry(int sequence, String words) {
        return new Entry(sequence, CaseExamples.START_MS + sequence, "Ada", "", new Edit.Note(Optional.empty(), words),
                "", "");
    }

    private void work(CaseFiles files, Promised promised) throws IOException {
        try (CaseStore store = CaseStore.create(files, CASE, "1", CaseExamples.settings(), CaseExamples.sources(),
                first, "ada")) {
            promised.created = true;
            append(store, promised, 1);
            append(store, promised, 2);
            promised.publishing = true;
            store.publish("2", CaseExamples.settings(), List.of(), second);
            promised.published = true;
            append(store, promised, 3);
        }
    }

    private static void append(CaseStore store, Promised promised, int sequence) throws IOException {
        promised.inProgress = entry(sequence, "note " + sequence + " of some length, so that it can be torn");
        store.append(promised.inProgress);
        promised.saved.add(promised.inProgress);
        promised.inProgress = null;
    }

    @Test
    void nothingSavedIsLostWhicheverStepTheProgramOrThePowerStopsAt() throws IOException {
        FragileFiles whole = new FragileFiles(1);
        work(whole, new Promised());
        int steps = whole.steps();
        assertThat(steps).isGreaterThan(50);
        for (int step = 0; step < steps; step++) {
            for (int disk = 0; disk < DISKS; disk++) {
                FragileFiles files = new FragileFiles(1000L * step + disk).crashAfter(step);
                Promised promised = new Promised();
                boolean crashed = false;
                try {
                    work(files, promised);
                } catch (FragileFiles.Crash e) {
                    crashed = true;
                }
                assertThat(crashed).isTrue();
                check(disk == 0 ? files.afterKill() : files.afterPowerLoss(), promised, "step " + step + " disk " + disk);
            }
        }
    }

    /** A second crash, while what the first left is being mended, loses no more. */
    @Test
    void nothingIsLostWhenMendingIsCutShortToo() throws IOException {
        FragileFiles torn = new FragileFiles(5);
        Promised promised = new Promised();
        work(torn, promised);
        CaseFiles.Appending log = torn.append(CASE.resolve("edits.jsonl"));
        log.append("{\"seq\":4,\"time\":\"20".getBytes(java.nio.charset.StandardCharsets.US_ASCII));
        for (int step = 0; step < 40; step++) {
            for (int disk = 0; disk < DISKS; disk++) {
                FragileFiles again = torn.afterPowerLoss().crashAfter(step);
                try (CaseStore store = CaseStore.open(again, CASE, OpenMode.WRITE, "bob")) {
                    assertThat(store.notes()).hasSize(1);
                } catch (FragileFiles.Crash e) {
                    assertThat(e).hasMessage("crash");
                }
                check(again.afterPowerLoss(), promised, "mending, step " + step + " disk " + disk);
            }
        }
    }

    private void check(FragileFiles files, Promised promised, String when) throws IOException {
        if (!promised.created && !files.exists(CASE.resolve("case.json"))) {
            work(files, new Promised());
            return;
        }
        List<Entry> seen;
        try (CaseStore store = CaseStore.open(files, CASE, OpenMode.WRITE, "bob")) {
            List<Entry> byHand = byHand(store.entries());
            int saved = promised.saved.size();
            assertThat(byHand.size()).as(when).isBetween(saved, saved + 1);
            assertThat(byHand.subList(0, saved)).as(when).isEqualTo(promised.saved);
            if (byHand.size() > saved) {
                assertThat(byHand.get(saved)).as(when).isEqualTo(promised.inProgress);
            }
            boolean isNew = store.program().equals("2");
            assertThat(isNew).as(when).isIn(promised.published, promised.publishing);
            assertThat(store.found().tracks()).as(when).isEqualTo((isNew ? second : first).tracks());
            assertThat(store.readOnlyReason()).isEmpty();
            store.append(entry(store.entries().size() + 1, "after"));
            seen = store.entries();
        }
        try (CaseStore store = CaseStore.open(files.afterPowerLoss(), CASE, OpenMode.WRITE, "cy")) {
            assertThat(store.entries()).as(when).isEqualTo(seen);
            assertThat(store.notes()).as(when).isEmpty();
        }
    }

    private static List<Entry> byHand(List<Entry> entries) {
        return entries.stream().filter(entry -> !(entry.edit() instanceof Edit.Mended)).toList();
    }

    @Test
    void failedWriteIsReportedAndLeavesTheCaseAsItWas() throws IOException {
        FragileFiles whole = new FragileFiles(1);
        work(whole, new Promised());
        for (int step = 0; step < whole.steps(); step++) {
            FragileFiles files = new FragileFiles(step).failAfter(step);
            Promised promised = new Promised();
            boolean failed = false;
            try {
                work(files, promised);
            } catch (IOException e) {
                failed = true;
                assertThat(e).hasMessageContaining("No space left on device");
            }
            assertThat(failed).isTrue();
            check(files.afterKill(), promised, "failure at step " + step);
        }
    }

    @Test
    void editCanBeTriedAgainAfterAFailedWrite() throws IOException {
        FragileFiles files = new FragileFiles(3);
        try (CaseStore store = CaseStore.create(files, CASE, "1", CaseExamples.settings(), List.of(), first, "ada")) {
            files.failAfter(0);
            try {
                store.append(entry(1, "lost"));
            } catch (CaseFileException e) {
                assertThat(e).hasMessageContaining("No space left").hasMessageContaining("could not be saved");
                assertThat(e.mend()).contains("Free some space");
            }
            assertThat(store.entries()).isEmpty();
            store.append(entry(1, "kept"));
        }
        try (CaseStore store = CaseStore.open(files.afterPowerLoss(), CASE, OpenMode.LOOK, "bob")) {
            assertThat(store.entries()).containsExactly(entry(1, "kept"));
        }
    }
}
