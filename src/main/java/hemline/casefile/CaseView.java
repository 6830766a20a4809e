package hemline.casefile;

import hemline.boundary.Track;
import hemline.casefile.edit.CaseState;
import hemline.casefile.edit.NotApplied;
import java.util.List;

/**
 * A case at one moment, for tables and windows.
 *
 * @param state      geometry and rulings
 * @param tracks     the boundaries that count, measured, by id
 * @param meetings   with what was said of them; denied ones too
 * @param notApplied entries of the log that do not fit this result, and why
 */
public record CaseView(CaseState state, List<Track> tracks, List<CaseMeeting> meetings, List<NotApplied> notApplied) {
    public CaseView {
        tracks = List.copyOf(tracks);
        meetings = List.copyOf(meetings);
        notApplied = List.copyOf(notApplied);
    }
}
