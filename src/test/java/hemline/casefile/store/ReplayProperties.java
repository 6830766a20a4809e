package hemline.casefile.store;

import static org.assertj.core.api.Assertions.assertThat;

import hemline.boundary.Track;
import hemline.boundary.TrackPiece;
import hemline.casefile.CaseExamples;
import hemline.casefile.CaseSession;
import hemline.casefile.SomeEdit;
import hemline.casefile.edit.CannotApplyException;
import hemline.casefile.edit.CaseState;
import hemline.casefile.edit.Edit;
import hemline.casefile.edit.Entry;
import hemline.casefile.edit.Replay;
import java.io.IOException;
import java.nio.file.Path;
import java.time.Clock;
import java.time.Instant;
import java.time.ZoneOffset;
import java.util.ArrayList;
import java.util.List;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.Size;

class ReplayProperties {
    private static final Path CASE = Path.of("/cases/one").toAbsolutePath();
    private static final Clock CLOCK = Clock.fixed(Instant.parse("2026-03-01T12:00:00Z"), ZoneOffset.UTC);

    private static CaseSession create(CaseFiles files) throws IOException {
        return new CaseSession(CaseStore.create(files, CASE, "1", CaseExamples.settings(), List.of(),
                CaseExamples.found(), "ada"), CaseExamples::measure, "Ada", CLOCK);
    }

    private static void tryEdit(CaseSession session, long seed) throws IOException {
        try {
            session.edit(SomeEdit.in(session.view().state(), seed), "");
        } catch (CannotApplyException e) {
            assertThat(e.getMessage()).isNotBlank();
        }
    }

    @Property(tries = 20)
    void replayOfTheLogIsTheLiveState(@ForAll @Size(max = 30) List<Long> seeds) throws IOException {
        FragileFiles files = new FragileFiles(0);
        String live;
        try (CaseSession session = create(files)) {
            for (long seed : seeds) {
                tryEdit(session, seed);
            }
            assertThat(session.view().notApplied()).isEmpty();
            live = StateBytes.of(session.view().state());
        }
        try (CaseSession again = new CaseSession(CaseStore.open(files, CASE, OpenMode.WRITE, "bob"),
                CaseExamples::measure, "Bob", CLOCK)) {
            assertThat(StateBytes.of(again.view().state())).isEqualTo(live);
            assertThat(StateBytes.of(Replay.of(CaseExamples.found(), again.log()).state())).isEqualTo(live);
        }
    }

    /** At each step back and forth the bytes are those of the first time there. */
    @Property(tries = 12)
    void undoneAndRedoneEditsGiveTheSameBytes(@ForAll @Size(max = 15) List<Long> seeds) throws IOException {
        try (CaseSession session = create(new FragileFiles(0))) {
            List<String> states = new ArrayList<>(List.of(StateBytes.of(session.view().state())));
            for (long seed : seeds) {
                int before = session.log().size();
                tryEdit(session, seed);
                if (session.log().size() > before) {
                    states.add(StateBytes.of(session.view().state()));
                }
            }
            for (int i = states.size() - 2; i >= 0; i--) {
                session.undo();
                assertThat(StateBytes.of(session.view().state())).isEqualTo(states.get(i));
            }
            assertThat(session.nextUndo()).isEmpty();
            for (int i = 1; i < states.size(); i++) {
                session.redo();
                assertThat(StateBytes.of(session.view().state())).isEqualTo(states.get(i));
            }
            assertThat(session.nextRedo()).isEmpty();
        }
    }

    /** Edits, undos and redos in any order: what is left equals the standing edits made one by one. */
    @Property(tries = 20)
    void onlyStandingEditsCount(@ForAll @Size(max = 25) List<Long> seeds) throws IOException {
        try (CaseSession session = create(new FragileFiles(0))) {
            List<Entry> standing = new ArrayList<>();
            List<Entry> taken = new ArrayList<>();
            for (long seed : seeds) {
                if (seed % 3 == 0) {
                    session.undo();
                    if (!standing.isEmpty()) {
                        taken.add(standing.remove(standing.size() - 1));
                    }
                } else if (seed % 5 == 0) {
                    session.redo();
                    if (!taken.isEmpty()) {
                        standing.add(taken.remove(taken.size() - 1));
                    }
                } else {
                    int before = session.log().size();
                    tryEdit(session, seed);
                    if (session.log().size() > before) {
                        standing.add(session.log().get(before));
                        taken.clear();
                    }
                }
            }
            CaseState state = CaseState.of(CaseExamples.found());
            for (Entry entry : standing) {
                state = applied(state, entry);
            }
            assertThat(StateBytes.of(session.view().state())).isEqualTo(StateBytes.of(state));
        }
    }

    private static CaseState applied(CaseState state, Entry entry) {
        try {
            return state.apply(entry.sequence(), (Edit.Change) entry.edit()).state();
        } catch (CannotApplyException e) {
            throw new AssertionError(e);
        }
    }

    /** An edit changes no state it was given. */
    @Property(tries = 8)
    void editsArePure(@ForAll @Size(max = 12) List<Long> seeds) {
        CaseState state = CaseState.of(CaseExamples.found());
        for (long seed : seeds) {
            String before = StateBytes.of(state);
            Edit.Change change = SomeEdit.in(state, seed);
            try {
                CaseState after = state.apply(7, change).state();
                assertThat(StateBytes.of(state.apply(7, change).state())).isEqualTo(StateBytes.of(after));
                assertThat(StateBytes.of(state)).isEqualTo(before);
                state = after;
            } catch (CannotApplyException e) {
                assertThat(StateBytes.of(state)).isEqualTo(before);
            }
        }
    }

    @Property(tries = 20)
    void everyStateIsSound(@ForAll @Size(max = 40) List<Long> seeds) throws IOException {
        try (CaseSession session = create(new FragileFiles(0))) {
            for (long seed : seeds) {
                tryEdit(session, seed);
            }
            CaseState state = session.view().state();
            assertThat(state.tracks()).extracting(Track::id).doesNotHaveDuplicates();
            for (Track track : state.tracks()) {
                for (TrackPiece piece : track.pieces()) {
                    for (int i = 1; i < piece.points().size(); i++) {
                        double gap = piece.points().get(i).distanceKm(piece.points().get(i - 1));
                        assertThat(gap).isLessThanOrEqualTo(1.001);
                    }
                }
            }
        }
    }

    @Property(tries = 100)
    void entryReadBackFromItsLineIsTheSame(@ForAll long seed) throws Exception {
        Edit edit = SomeEdit.in(CaseState.of(CaseExamples.found()), seed);
        Entry entry = new Entry(12, 1_700_000_000_123L + seed % 1000, "Zoë\u0007", "be\"cause\\\n", edit, "á", "→");
        byte[] line = LogLine.encode(entry, "0123456789abcdef").bytes();
        assertThat(line[line.length - 1]).isEqualTo((byte) '\n');
        LogLine back = LogLine.decode(java.util.Arrays.copyOf(line, line.length - 1));
        assertThat(back.entry()).isEqualTo(entry);
        assertThat(back.prev()).isEqualTo("0123456789abcdef");
    }
}
