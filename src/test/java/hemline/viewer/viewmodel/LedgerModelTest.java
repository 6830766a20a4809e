package hemline.viewer.viewmodel;

import static org.assertj.core.api.Assertions.assertThat;

import hemline.boundary.Track;
import hemline.viewer.FakeLoop;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;

class LedgerModelTest {
    private final LedgerModel ledger = new LedgerModel();

    LedgerModelTest() {
        ledger.open(FakeLoop.small(true));
    }

    private LedgerColumn<Track> column(String title) {
        return ledger.trackColumns().stream().filter(c -> c.title().equals(title)).findFirst().orElseThrow();
    }

    @Test
    void rowsStayInWhichEveryWordOccurs() {
        ledger.filterProperty().set("hand");
        assertThat(ledger.tracks()).extracting(Track::id).containsExactly("T03");
        ledger.filterProperty().set("thin found");
        assertThat(ledger.tracks()).extracting(Track::id).containsExactly("T01");
        ledger.filterProperty().set("EXPECTED");
        assertThat(ledger.meetings()).extracting(m -> m.id()).containsExactly("M2");
        ledger.filterProperty().set(" ");
        assertThat(ledger.tracks()).hasSize(3);
    }

    @Test
    void rowsWithoutAValueComeLastBothWays() {
        List<Track> rows = new ArrayList<>(ledger.tracks());
        rows.sort(column("Expansion").order(false));
        assertThat(rows).extracting(Track::id).containsExactly("T02", "T01", "T03");
        rows.sort(column("Expansion").order(true));
        assertThat(rows).extracting(Track::id).containsExactly("T01", "T02", "T03");
    }

    @Test
    void everyColumnHasAnOrderAndATooltip() {
        for (LedgerColumn<Track> column : ledger.trackColumns()) {
            List<Track> rows = new ArrayList<>(ledger.tracks());
            rows.sort(column.order(false));
            assertThat(rows).hasSize(3);
            assertThat(column.tooltip()).isNotBlank();
        }
        assertThat(ledger.meetingColumns()).allSatisfy(c -> assertThat(c.tooltip()).isNotBlank());
    }

    @Test
    void textIsTabSeparatedWithUnitsAndPlainMinus() {
        String text = LedgerModel.asText(ledger.meetingColumns(), ledger.meetings());
        String[] lines = text.split("\n");
        assertThat(lines).hasSize(3);
        assertThat(lines[0]).startsWith("Meeting\tTracks\tTime (UTC)");
        assertThat(lines[2]).contains("M2\tT01 \u00d7 T03").contains("\t-12.0\t").doesNotContain("\u2212");
    }

    @Test
    void anUnknownCellIsEmptyInText() {
        String text = LedgerModel.asText(List.of(column("Track"), column("Radius")), ledger.tracks());
        assertThat(text).contains("T03\t\n");
    }
}
