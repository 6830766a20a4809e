package hemline.viewer.viewmodel;

import hemline.boundary.Meeting;
import hemline.boundary.Track;
import hemline.workflow.LoopSession;
import java.util.List;
import java.util.Locale;
import java.util.function.Predicate;
import javafx.beans.property.SimpleStringProperty;
import javafx.beans.property.StringProperty;
import javafx.collections.FXCollections;
import javafx.collections.ObservableList;
import javafx.collections.transformation.FilteredList;

/** The tables of tracks and meetings, narrowed by what the user types. */
public final class LedgerModel {
    private final ObservableList<Track> allTracks = FXCollections.observableArrayList();
    private final ObservableList<Meeting> allMeetings = FXCollections.observableArrayList();
    private final FilteredList<Track> tracks = new FilteredList<>(allTracks);
    private final FilteredList<Meeting> meetings = new FilteredList<>(allMeetings);
    private final List<LedgerColumn<Track>> trackColumns = TrackColumns.all();
    private final List<LedgerColumn<Meeting>> meetingColumns = MeetingColumns.all();
    private final StringProperty filter = new SimpleStringProperty(this, "filter", "");

    public LedgerModel() {
        filter.addListener((o, was, now) -> {
            tracks.setPredicate(matching(trackColumns, now));
            meetings.setPredicate(matching(meetingColumns, now));
        });
    }

    public void open(LoopSession session) {
        allTracks.setAll(session.tracks());
        allMeetings.setAll(session.meetings());
    }

    /** A row matches when each word typed occurs in one of its cells. */
    private static <R> Predicate<R> matching(List<LedgerColumn<R>> columns, String typed) {
        List<String> words = List.of(typed.toLowerCase(Locale.ROOT).strip().split("\\s+"));
        return row -> words.stream().allMatch(word ->
                columns.stream().anyMatch(c -> c.text().apply(row).toLowerCase(Locale.ROOT).contains(word)));
    }

    /** Rows as tab-separated text with a heading, ready for a spreadsheet. */
    public static <R> String asText(List<LedgerColumn<R>> columns, List<? extends R> rows) {
        StringBuilder text = new StringBuilder();
        text.append(String.join("\t", columns.stream().map(LedgerColumn::heading).toList())).append('\n');
        for (R row : rows) {
            text.append(String.join("\t", columns.stream().map(c -> plain(c.text().apply(row))).toList())).append('\n');
        }
        return text.toString();
    }

    /** Spreadsheets want an ASCII minus and an empty cell. */
    private static String plain(String cell) {
        return cell.equals(Words.NONE) ? "" : cell.replace('\u2212', '-');
    }

    public ObservableList<Track> tracks() {
        return tracks;
    }

    public ObservableList<Meeting> meetings() {
        return meetings;
    }

    public List<LedgerColumn<Track>> trackColumns() {
        return trackColumns;
    }

    public List<LedgerColumn<Meeting>> meetingColumns() {
        return meetingColumns;
    }

    public StringProperty filterProperty() {
        return filter;
    }
}
