package hemline.casefile;

import static org.assertj.core.api.Assertions.assertThat;

import hemline.casefile.edit.AsideReason;
import hemline.casefile.edit.Edit;
import hemline.casefile.edit.Extent;
import hemline.casefile.edit.ReviewOutcome;
import hemline.casefile.store.CaseStore;
import hemline.casefile.store.DiskFiles;
import hemline.geometry.Point;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Clock;
import java.time.Instant;
import java.time.ZoneOffset;
import java.util.List;
import java.util.OptionalLong;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class CaseSummaryTest {
    private static final Clock CLOCK = Clock.fixed(Instant.parse("2026-03-01T12:00:00Z"), ZoneOffset.UTC);

    @TempDir
    Path folder;

    @Test
    void casesOfAFolderAreToldEvenWhileOneIsOpenAndOneIsBroken() throws Exception {
        Files.createDirectories(folder.resolve("not-a-case"));
        Files.createDirectories(folder.resolve("broken"));
        Files.writeString(folder.resolve("broken/case.json"), "{");
        CaseStore store = CaseStore.create(new DiskFiles(), folder.resolve("a"), "1", CaseExamples.settings(),
                List.of(), CaseExamples.found(), "ada");
        try (CaseSession session = new CaseSession(store, CaseExamples::measure, "Ada", CLOCK)) {
            var state = session.view().state();
            session.edit(new Edit.Nudge(CaseExamples.at(state, "T1", 1, 13, 0), new Point(14, 0), 9), "");
            session.edit(new Edit.SetAside(CaseExamples.at(state, "T3", 2, -40, -2), Extent.TRACK, AsideReason.ROLL,
                    ""), "");
            session.edit(new Edit.Review(CaseExamples.at(state, "T2", 0, 42, 0), ReviewOutcome.ACCEPTED), "");
            session.edit(new Edit.SplitTrack(CaseExamples.at(state, "T2", 3, 33, 0)), "");
            session.undo();
            List<CaseSummary> cases = CaseSummary.list(new DiskFiles(), folder);
            assertThat(cases).extracting(summary -> summary.path().getFileName().toString())
                    .containsExactly("a", "broken");
            assertThat(cases.get(1).facts()).isEmpty();
            assertThat(cases.get(1).problem()).contains("case.json");
            CaseSummary.Facts facts = cases.get(0).facts().orElseThrow();
            assertThat(facts.radar()).isEqualTo("invented");
            assertThat(facts.sweeps()).isEqualTo(6);
            assertThat(facts.foundTracks()).isEqualTo(3);
            assertThat(facts.tracks()).isEqualTo(2);
            assertThat(facts.handTracks()).isEqualTo(1);
            assertThat(facts.setAside()).isEqualTo(1);
            assertThat(facts.edits()).isEqualTo(3);
            assertThat(facts.undone()).isEqualTo(1);
            assertThat(facts.reviewed()).isEqualTo(1);
            assertThat(facts.authors()).containsExactly("Ada");
            assertThat(facts.lastEditMs()).isEqualTo(OptionalLong.of(CLOCK.millis()));
            assertThat(facts.notApplied()).isZero();
        }
    }
}
