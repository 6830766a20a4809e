package hemline.casefile.store;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import hemline.casefile.CaseExamples;
import hemline.casefile.SomeEdit;
import hemline.casefile.edit.CannotApplyException;
import hemline.casefile.edit.CaseState;
import hemline.casefile.edit.Edit;
import hemline.casefile.edit.Entry;
import hemline.casefile.store.LogLine.DamagedLine;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.OptionalInt;
import java.util.Random;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class HostileLogTest {
    private static final Path CASE = Path.of("/cases/one").toAbsolutePath();
    private static final Path LOG = CASE.resolve("edits.jsonl");

    /** A line as a forger who knows the checksum would write it. */
    private static byte[] line(String edit, String kind) {
        return sealed("{\"seq\":1,\"time\":\"2026-01-01T00:00:00Z\",\"author\":\"a\",\"reason\":\"\",\"kind\":\"" + kind
                + "\",\"edit\":" + edit + ",\"before\":\"\",\"after\":\"\",\"prev\":\"\"");
    }

    private static byte[] sealed(String head) {
        String sum = Sha256.of(head.getBytes(StandardCharsets.UTF_8)).substring(0, 16);
        return (head + ",\"sum\":\"" + sum + "\"}").getBytes(StandardCharsets.UTF_8);
    }

    @Test
    void forgersLineIsOtherwiseSound() throws DamagedLine {
        assertThat(LogLine.decode(line("{\"sequence\":3}", "undo")).entry().edit()).isEqualTo(new Edit.Undo(3));
    }

    @ParameterizedTest
    @ValueSource(strings = {
        "{}", "null", "[]", "3", "\"text\"", "{\"sequence\":\"3\"}", "{\"sequence\":3.5}", "{\"sequence\":null}",
        "{\"sequence\":0}", "{\"sequence\":-1}", "{\"sequence\":99999999999}", "{\"sequence\":1e400}",
        "{\"sequence\":NaN}", "{\"sequence\":3,\"sequence\":4}", "{\"sequence\":3,\"more\":1}", "{\"sequence\":true}"})
    void undoOfAnotherShapeIsRefused(String edit) {
        assertThatThrownBy(() -> LogLine.decode(line(edit, "undo"))).isInstanceOf(DamagedLine.class);
    }

    @ParameterizedTest
    @ValueSource(strings = {
        "[[0,0]]", "[]", "[[0,0],[0,0]]", "[[0,0],[null,1]]", "[[0,0],[1]]", "[[0,0],[1,2,3]]", "[[0,0],[1e5,0]]",
        "[[0,0],[\"1\",0]]", "[[0,0],[\"-Infinity\",0]]", "[[0,0],[1e999,0]]", "[[0,0],null]", "null", "[[[0,0]]]",
        "{\"0\":[0,0]}", "[[0,0],[true,0]]"})
    void drawnLineOfAnotherShapeIsRefused(String points) {
        String edit = "{\"sweepMs\":1750000000000,\"kind\":\"arc\",\"line\":" + points + ",\"continues\":null}";
        assertThatThrownBy(() -> LogLine.decode(line(edit, "draw"))).isInstanceOf(DamagedLine.class);
    }

    @Test
    void absurdSizesAndDepthsAreRefused() {
        String deep = "[".repeat(100_000) + "]".repeat(100_000);
        assertThatThrownBy(() -> LogLine.decode(line(deep, "note"))).isInstanceOf(DamagedLine.class);
        String many = "[" + "[0,1],".repeat(30_000) + "[2,2]]";
        String drawn = "{\"sweepMs\":1750000000000,\"kind\":\"arc\",\"line\":" + many + ",\"continues\":null}";
        assertThatThrownBy(() -> LogLine.decode(line(drawn, "draw"))).isInstanceOf(DamagedLine.class)
                .hasMessageContaining("30001");
        String wordy = "{\"at\":null,\"words\":\"" + "x".repeat(2_000_000) + "\"}";
        assertThatThrownBy(() -> LogLine.decode(line(wordy, "note"))).isInstanceOf(DamagedLine.class);
        assertThatThrownBy(() -> LogLine.decode(new byte[CaseJson.LONGEST_LINE_BYTES + 1]))
                .isInstanceOf(DamagedLine.class).hasMessageContaining("too long");
    }

    @Test
    void otherFaultsOfALineAreRefused() {
        assertThatThrownBy(() -> LogLine.decode(line("{}", "erase"))).hasMessageContaining("erase");
        assertThatThrownBy(() -> LogLine.decode(new byte[0])).isInstanceOf(DamagedLine.class);
        assertThatThrownBy(() -> LogLine.decode("{\"seq\":1}".repeat(9).getBytes(StandardCharsets.UTF_8)))
                .hasMessageContaining("checksum");
        assertThatThrownBy(() -> LogLine.decode(sealed("{\"seq\":1"))).isInstanceOf(DamagedLine.class);
        assertThatThrownBy(() -> LogLine.decode(sealed("not json"))).isInstanceOf(DamagedLine.class);
        byte[] good = line("{\"sequence\":3}", "undo");
        byte[] changed = good.clone();
        changed[60] ^= 1;
        assertThatThrownBy(() -> LogLine.decode(changed)).hasMessageContaining("its checksum is");
        String far = "{\"seq\":1,\"time\":\"+999999999-01-01T00:00:00Z\",\"author\":\"a\",\"reason\":\"\",\"kind\":"
                + "\"undo\",\"edit\":{\"sequence\":1},\"before\":\"\",\"after\":\"\",\"prev\":\"\"";
        assertThatThrownBy(() -> LogLine.decode(sealed(far))).isInstanceOf(DamagedLine.class);
    }

    private static List<Entry> entries(int count) {
        List<Entry> entries = new ArrayList<>();
        for (int i = 1; i <= count; i++) {
            entries.add(new Entry(i, CaseExamples.START_MS + i, "Ada", "", new Edit.Note(Optional.empty(), "n" + i),
                    "", ""));
        }
        return entries;
    }

    private static FragileFiles withLog(byte[] log) throws IOException {
        FragileFiles files = new FragileFiles(0);
        CaseStore.create(files, CASE, "1", CaseExamples.settings(), List.of(), CaseExamples.tiny(0), "ada").close();
        files.write(LOG, log);
        return files;
    }

    private static String log(int count) {
        return new String(LogText.write(entries(count)).bytes(), StandardCharsets.UTF_8);
    }

    @Test
    void damageBeforeTheEndIsRefusedWithFileLineAndMend() throws IOException {
        FragileFiles files = withLog(log(5).replace("\"n2\"", "\"N2\"").getBytes(StandardCharsets.UTF_8));
        assertThatThrownBy(() -> CaseStore.open(files, CASE, OpenMode.WRITE, "bob"))
                .isInstanceOfSatisfying(CaseFileException.class, e -> {
                    assertThat(e.file()).isEqualTo(LOG);
                    assertThat(e.line()).isEqualTo(OptionalInt.of(2));
                    assertThat(e).hasMessageContaining("its checksum is");
                    assertThat(e.mend()).contains("salvage");
                });
    }

    @Test
    void salvageKeepsDamagedLinesAsideAndGoesOnWithTheRest() throws IOException {
        FragileFiles files = withLog(log(5).replace("\"n2\"", "\"N2\"").getBytes(StandardCharsets.UTF_8));
        List<Entry> seen;
        try (CaseStore store = CaseStore.open(files, CASE, OpenMode.SALVAGE, "bob")) {
            assertThat(store.notes()).singleElement().asString().contains("edits.damaged-1.txt");
            assertThat(store.entries()).hasSize(5);
            assertThat(store.entries().get(1).edit()).isInstanceOf(Edit.Mended.class);
            assertThat(store.entries().get(4)).isEqualTo(entries(5).get(4));
            seen = store.entries();
        }
        assertThat(new String(files.read(CASE.resolve("edits.damaged-1.txt")), StandardCharsets.UTF_8))
                .contains("\"N2\"");
        try (CaseStore store = CaseStore.open(files, CASE, OpenMode.WRITE, "cy")) {
            assertThat(store.entries()).isEqualTo(seen);
            assertThat(store.notes()).isEmpty();
        }
    }

    @Test
    void linesTakenOutAreNoticedAndSalvaged() throws IOException {
        List<String> lines = new ArrayList<>(log(6).lines().toList());
        lines.remove(2);
        lines.remove(2);
        FragileFiles files = withLog((String.join("\n", lines) + "\n").getBytes(StandardCharsets.UTF_8));
        assertThatThrownBy(() -> CaseStore.open(files, CASE, OpenMode.WRITE, "bob"))
                .isInstanceOf(CaseFileException.class).hasMessageContaining("line 3")
                .hasMessageContaining("its number is 5 where 3 is due");
        try (CaseStore store = CaseStore.open(files, CASE, OpenMode.SALVAGE, "bob")) {
            assertThat(store.entries()).hasSize(6);
            assertThat(store.entries().get(2).edit()).isInstanceOf(Edit.Mended.class);
            assertThat(store.entries().get(5)).isEqualTo(entries(6).get(5));
        }
    }

    @Test
    void lineOfAnotherLogIsNoticed() throws IOException {
        List<String> lines = new ArrayList<>(log(3).lines().toList());
        Entry other = new Entry(2, CaseExamples.START_MS, "Eve", "", new Edit.Undo(1), "", "");
        lines.set(1, new String(LogLine.encode(other, "").bytes(), StandardCharsets.UTF_8).strip());
        FragileFiles files = withLog((String.join("\n", lines) + "\n").getBytes(StandardCharsets.UTF_8));
        assertThatThrownBy(() -> CaseStore.open(files, CASE, OpenMode.WRITE, "bob"))
                .hasMessageContaining("does not follow the line before");
    }

    @Test
    void lookingAtATornLogTouchesNothing() throws IOException {
        byte[] torn = (log(3) + "{\"seq\":4,").getBytes(StandardCharsets.UTF_8);
        FragileFiles files = withLog(torn);
        try (CaseStore store = CaseStore.open(files, CASE, OpenMode.LOOK, "bob")) {
            assertThat(store.entries()).isEqualTo(entries(3));
            assertThat(store.notes()).singleElement().asString().contains("incomplete");
        }
        assertThat(files.read(LOG)).isEqualTo(torn);
    }

    @Test
    void tornLastLineIsKeptAsideAndTheLogSaysSo() throws IOException {
        FragileFiles files = withLog((log(3) + "{\"seq\":4,").getBytes(StandardCharsets.UTF_8));
        try (CaseStore store = CaseStore.open(files, CASE, OpenMode.WRITE, "bob")) {
            assertThat(store.entries().subList(0, 3)).isEqualTo(entries(3));
            assertThat(store.entries().get(3).edit()).isInstanceOfSatisfying(Edit.Mended.class,
                    mended -> assertThat(mended.words()).contains("edits.torn-1.txt"));
        }
        assertThat(files.read(CASE.resolve("edits.torn-1.txt"))).asString().isEqualTo("{\"seq\":4,\n");
    }

    @Test
    void lastLineThatOnlyLacksItsNewlineCounts() throws IOException {
        String log = log(3);
        FragileFiles files = withLog(log.substring(0, log.length() - 1).getBytes(StandardCharsets.UTF_8));
        try (CaseStore store = CaseStore.open(files, CASE, OpenMode.WRITE, "bob")) {
            assertThat(store.entries()).isEqualTo(entries(3));
            assertThat(store.notes()).isEmpty();
        }
        assertThat(files.read(LOG)).asString().isEqualTo(log);
    }

    /** Whatever bytes are changed, put in or taken out: a typed refusal, or a case that opens; salvage always opens. */
    @Property(tries = 100)
    void noDamageGetsPastOrBreaksTheReader(@ForAll long seed) throws IOException {
        Random random = new Random(seed);
        byte[] whole = log(6).getBytes(StandardCharsets.UTF_8);
        byte[] bytes = damaged(whole, random);
        FragileFiles files = withLog(bytes);
        try (CaseStore store = CaseStore.open(files, CASE, OpenMode.LOOK, "bob")) {
            assertThat(entries(6)).startsWith(store.entries().toArray(Entry[]::new));
        } catch (CaseFileException e) {
            assertThat(e.line()).isPresent();
        }
        try (CaseStore store = CaseStore.open(files, CASE, OpenMode.SALVAGE, "bob")) {
            for (Entry entry : store.entries()) {
                boolean ours = entry.edit() instanceof Edit.Mended;
                assertThat(ours || entries(6).contains(entry)).isTrue();
            }
        }
        CaseStore.open(files, CASE, OpenMode.WRITE, "bob").close();
    }

    private static byte[] damaged(byte[] whole, Random random) {
        int at = random.nextInt(whole.length);
        int length = 1 + random.nextInt(Math.min(400, whole.length - at));
        byte[] head = Arrays.copyOf(whole, at);
        byte[] tail = Arrays.copyOfRange(whole, at + length, whole.length);
        byte[] middle = new byte[random.nextInt(300)];
        switch (random.nextInt(4)) {
            case 0 -> random.nextBytes(middle);
            case 1 -> Arrays.fill(middle, (byte) '\n');
            case 2 -> middle = Arrays.copyOfRange(whole, at, at + length / 2);
            default -> middle = new byte[0];
        }
        byte[] joined = Arrays.copyOf(head, head.length + middle.length + tail.length);
        System.arraycopy(middle, 0, joined, head.length, middle.length);
        System.arraycopy(tail, 0, joined, head.length + middle.length, tail.length);
        return joined;
    }

    @Test
    void editOfEveryKindIsAmongThoseTried() {
        CaseState state = CaseState.of(CaseExamples.found());
        List<String> applied = new ArrayList<>();
        for (long seed = 0; seed < 600; seed++) {
            Edit.Change change = SomeEdit.in(state, seed);
            try {
                CaseState after = state.apply(7, change).state();
                if (!after.asides().isEmpty() && state.asides().isEmpty()) {
                    state = after;
                }
                applied.add(change.getClass().getSimpleName());
            } catch (CannotApplyException e) {
                assertThat(e.getMessage()).isNotBlank();
            }
        }
        assertThat(applied).hasSizeGreaterThan(300);
        assertThat(List.of(Edit.Change.class.getPermittedSubclasses()))
                .allSatisfy(type -> assertThat(applied).contains(type.getSimpleName()));
    }
}
