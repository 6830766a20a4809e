package hemline.casefile;

import static hemline.casefile.CaseExamples.at;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import hemline.boundary.BoundaryKind;
import hemline.boundary.Origin;
import hemline.casefile.edit.Anchor;
import hemline.casefile.edit.AsideReason;
import hemline.casefile.edit.CannotApplyException;
import hemline.casefile.edit.CaseState;
import hemline.casefile.edit.Edit;
import hemline.casefile.edit.Entry;
import hemline.casefile.edit.Extent;
import hemline.casefile.edit.Found;
import hemline.casefile.edit.MeetingVerdict;
import hemline.casefile.store.CaseFileException;
import hemline.casefile.store.CaseStore;
import hemline.casefile.store.DiskFiles;
import hemline.casefile.store.OpenMode;
import hemline.geometry.Point;
import java.io.IOException;
import java.nio.file.Path;
import java.time.Clock;
import java.time.Instant;
import java.time.ZoneOffset;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class CaseSessionTest {
    private static final Clock CLOCK = Clock.fixed(Instant.parse("2026-03-01T12:00:00Z"), ZoneOffset.UTC);

    @TempDir
    Path folder;

    private CaseSession create() throws IOException {
        return new CaseSession(CaseStore.create(new DiskFiles(), folder.resolve("case"), "0.1.0",
                CaseExamples.settings(), CaseExamples.sources(), CaseExamples.found(), "ada on one"),
                CaseExamples::measure, "Ada", CLOCK);
    }

    private CaseSession open() throws IOException {
        return new CaseSession(CaseStore.open(new DiskFiles(), folder.resolve("case"), OpenMode.WRITE, "bob on two"),
                CaseExamples::measure, "Bob", CLOCK);
    }

    private static Edit.Change draw(CaseView view) {
        return new Edit.Draw(view.state().sweeps().meanMs(1), BoundaryKind.ARC,
                List.of(new Point(-20, 30), new Point(-5, 33)), Optional.empty());
    }

    private static Edit.Change setAside(CaseView view) {
        return new Edit.SetAside(at(view.state(), "T3", 2, -40, -2), Extent.TRACK, AsideReason.ANIMALS, "a roost");
    }

    @Test
    void caseReopenedIsTheCaseThatWasClosed() throws Exception {
        CaseView left;
        List<Entry> log;
        try (CaseSession session = create()) {
            session.edit(draw(session.view()), "clear in the velocity");
            session.edit(setAside(session.view()), "");
            session.edit(new Edit.Nudge(at(session.view().state(), "T1", 1, 13, 0), new Point(14.1, 0.1), 9), "");
            left = session.view();
            log = session.log();
        }
        try (CaseSession again = open()) {
            assertThat(again.log()).isEqualTo(log);
            assertThat(again.view().tracks()).isEqualTo(left.tracks());
            assertThat(again.view().meetings()).isEqualTo(left.meetings());
            assertThat(again.view().state().asides()).isEqualTo(left.state().asides());
            assertThat(again.store().settings()).isEqualTo(CaseExamples.settings());
            assertThat(again.store().sources()).isEqualTo(CaseExamples.sources());
            assertThat(again.store().notes()).isEmpty();
            assertThat(again.store().readOnlyReason()).isEmpty();
        }
    }

    @Test
    void logSaysWhoWhenWhyAndWhatBecameDifferent() throws Exception {
        try (CaseSession session = create()) {
            session.edit(setAside(session.view()), "seen at dawn");
            assertThat(session.log()).singleElement().satisfies(entry -> {
                assertThat(entry.author()).isEqualTo("Ada");
                assertThat(entry.timeMs()).isEqualTo(CLOCK.millis());
                assertThat(entry.reason()).isEqualTo("seen at dawn");
                assertThat(entry.before()).startsWith("T3: 6 sweeps, 6 stretches,");
                assertThat(entry.after()).isEqualTo("T3: none");
            });
        }
    }

    @Test
    void undoAndRedoReachAcrossReopening() throws Exception {
        try (CaseSession session = create()) {
            session.edit(draw(session.view()), "");
            session.edit(setAside(session.view()), "");
            session.undo();
        }
        try (CaseSession again = open()) {
            assertThat(again.view().state().track("T3")).isPresent();
            again.undo();
            assertThat(again.view().tracks()).extracting("id").containsExactly("T1", "T2", "T3");
            assertThat(again.nextUndo()).isEmpty();
            again.redo();
            again.redo();
            assertThat(again.view().tracks()).extracting("id").containsExactly("H1", "T1", "T2");
            assertThat(again.redo().isEmpty()).isTrue();
        }
    }

    @Test
    void newEditEndsWhatCouldBeRedone() throws Exception {
        try (CaseSession session = create()) {
            session.edit(draw(session.view()), "");
            session.undo();
            session.edit(setAside(session.view()), "");
            assertThat(session.nextRedo()).isEmpty();
            session.redo(1);
            assertThat(session.view().tracks()).extracting("id").containsExactly("H1", "T1", "T2");
        }
    }

    @Test
    void undoOfAnEarlierEditListsTheLaterOnesThatLeanedOnIt() throws Exception {
        try (CaseSession session = create()) {
            session.edit(draw(session.view()), "");
            session.edit(new Edit.Trim(at(session.view().state(), "H1", 1, -12, 31), new Point(-18, 30),
                    new Point(-10, 32)), "");
            session.undo(1);
            assertThat(session.view().notApplied()).singleElement()
                    .satisfies(misfit -> assertThat(misfit.entry().sequence()).isEqualTo(2));
            session.redo(1);
            assertThat(session.view().notApplied()).isEmpty();
        }
    }

    @Test
    void editThatDoesNotFitLeavesNoTrace() throws Exception {
        try (CaseSession session = create()) {
            Edit.Change misfit = new Edit.Restore(at(session.view().state(), "T1", 0, 10, 0));
            assertThatThrownBy(() -> session.edit(misfit, "")).isInstanceOf(CannotApplyException.class);
            assertThat(session.log()).isEmpty();
        }
    }

    @Test
    void onlyTouchedTracksAreSaidToHaveChanged() throws Exception {
        List<Remeasure.Request> asked = new java.util.ArrayList<>();
        CaseStore store = CaseStore.create(new DiskFiles(), folder.resolve("case"), "0.1.0", CaseExamples.settings(),
                CaseExamples.sources(), CaseExamples.found(), "ada");
        try (CaseSession session = new CaseSession(store, request -> {
            asked.add(request);
            return CaseExamples.measure(request);
        }, "Ada", CLOCK)) {
            assertThat(asked).isEmpty();
            session.edit(new Edit.Nudge(at(session.view().state(), "T1", 1, 13, 0), new Point(15, 0), 9), "");
            assertThat(asked).singleElement()
                    .satisfies(request -> assertThat(request.changed()).containsExactly("T1"));
            session.edit(new Edit.Note(Optional.empty(), "a good loop"), "");
            assertThat(asked).hasSize(1);
            session.edit(new Edit.FixCentre(at(session.view().state(), "T3", 2, -40, -2),
                    Optional.of(new Point(-50, -10))), "");
            assertThat(asked.get(1).changed()).containsExactly("T3");
            assertThat(asked.get(1).centres()).containsOnlyKeys("T3");
            Differences undone = session.undo(1);
            assertThat(asked.get(2).changed()).containsExactly("T1");
            assertThat(undone.tracks()).anySatisfy(track -> assertThat(track.words()).startsWith("T1: "));
        }
    }

    @Test
    void secondOpenerMayOnlyLookAndIsToldWhoHasTheCase() throws Exception {
        try (CaseSession first = create(); CaseSession second = open()) {
            assertThat(second.store().readOnlyReason()).contains("open for edits elsewhere").contains("ada on one");
            assertThatThrownBy(() -> second.edit(draw(second.view()), "")).isInstanceOf(CaseFileException.class)
                    .hasMessageContaining("ada on one");
            first.edit(draw(first.view()), "");
        }
        try (CaseSession later = open()) {
            assertThat(later.store().readOnlyReason()).isEmpty();
            assertThat(later.log()).hasSize(1);
        }
    }

    @Test
    void handBeatsFoundWhenTheCaseIsRunAgain() throws Exception {
        try (CaseSession session = create()) {
            session.edit(draw(session.view()), "");
            session.edit(setAside(session.view()), "");
            session.edit(new Edit.Nudge(at(session.view().state(), "T1", 1, 13, 0), new Point(15, 0), 9), "");
            session.edit(new Edit.RuleMeeting(session.view().meetings().get(0).meeting(), MeetingVerdict.CONFIRMED),
                    "");
            Found rerun = CaseExamples.found(CaseExamples.frames(7), List.of("T9", "T4", "T1"), 0.8);
            Reapplied reapplied = session.rerun("0.2.0", CaseExamples.settings(), CaseExamples.sources(), rerun);
            assertThat(reapplied.notApplied()).isEmpty();
            assertThat(reapplied.applied()).isEqualTo(4);
            CaseState state = session.view().state();
            assertThat(session.view().tracks()).extracting("id").containsExactly("H1", "T4", "T9");
            assertThat(state.track("T9").orElseThrow().bySweep().get(1).get(0).points()).contains(new Point(15, 0));
            assertThat(session.view().meetings()).singleElement()
                    .satisfies(meeting -> assertThat(meeting.verdict()).isEqualTo(MeetingVerdict.CONFIRMED));
            assertThat(reapplied.differences().words()).anyMatch(words -> words.startsWith("T4 (was T2): 6 sweeps"));
        }
        try (CaseSession again = open()) {
            assertThat(again.view().tracks()).extracting("id").containsExactly("H1", "T4", "T9");
            assertThat(again.store().program()).isEqualTo("0.2.0");
        }
    }

    @Test
    void editsThatNoLongerFitAreListedAndTriedAgainNextTime() throws Exception {
        try (CaseSession session = create()) {
            session.edit(new Edit.SplitTrack(at(session.view().state(), "T3", 2, -40, -2)), "");
            session.edit(new Edit.RuleMeeting(session.view().meetings().get(0).meeting(), MeetingVerdict.CONFIRMED),
                    "");
            Found all = CaseExamples.found();
            Found fewer = new Found(all.site(), all.frames(), all.tracks().subList(0, 2), List.of(), List.of());
            Reapplied reapplied =
                    session.rerun("0.2.0", CaseExamples.settings(), CaseExamples.sources(), fewer);
            assertThat(reapplied.applied()).isEqualTo(1);
            assertThat(reapplied.notApplied()).singleElement()
                    .satisfies(misfit -> assertThat(misfit.why()).contains("no boundary within"));
            assertThat(session.view().meetings()).singleElement()
                    .satisfies(meeting -> assertThat(meeting.origin()).isEqualTo(Origin.HAND));
            session.rerun("0.3.0", CaseExamples.settings(), CaseExamples.sources(), all);
            assertThat(session.view().notApplied()).isEmpty();
            assertThat(session.view().state().track("H1")).isPresent();
        }
    }

    @Test
    void deniedMeetingStaysListedButDoesNotCount() throws Exception {
        try (CaseSession session = create()) {
            session.edit(new Edit.RuleMeeting(session.view().meetings().get(0).meeting(), MeetingVerdict.DENIED), "");
            assertThat(session.view().meetings()).singleElement()
                    .satisfies(meeting -> assertThat(meeting.counts()).isFalse());
        }
    }

    @Test
    void anchorOfAWholeTrackLiesOnIt() {
        CaseState state = CaseState.of(CaseExamples.found());
        Anchor anchor = Anchor.of(state.track("T2").orElseThrow(), state.sweeps().frames());
        assertThat(anchor.timeMs()).isEqualTo(state.sweeps().meanMs(0));
        assertThat(anchor.place().xKm()).isEqualTo(42);
    }
}
