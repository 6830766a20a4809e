package hemline.viewer.viewmodel;

import javafx.beans.property.ReadOnlyStringProperty;
import javafx.beans.property.ReadOnlyStringWrapper;

/** The one track or the one meeting that plane, rail, ledger and traces point at; empty for none. */
public final class SelectionModel {
    private final ReadOnlyStringWrapper track = new ReadOnlyStringWrapper(this, "track", "");
    private final ReadOnlyStringWrapper meeting = new ReadOnlyStringWrapper(this, "meeting", "");

    public void selectTrack(String id) {
        meeting.set("");
        track.set(id);
    }

    public void selectMeeting(String id) {
        track.set("");
        meeting.set(id);
    }

    public void clear() {
        track.set("");
        meeting.set("");
    }

    public ReadOnlyStringProperty trackProperty() {
        return track.getReadOnlyProperty();
    }

    public ReadOnlyStringProperty meetingProperty() {
        return meeting.getReadOnlyProperty();
    }

    public String track() {
        return track.get();
    }

    public String meeting() {
        return meeting.get();
    }
}
