package hemline.casefile;

import hemline.boundary.Meeting;
import hemline.boundary.Origin;
import hemline.casefile.edit.MeetingVerdict;

/**
 * A meeting with what an analyst said of it.
 *
 * @param meeting  the measured one; where a confirmed meeting is no longer found, the one that was confirmed
 * @param origin   hand when it was added by hand, or confirmed and no longer found
 * @param verdict  open when nothing was said
 * @param sequence the edit that added it or ruled on it; 0 when none did
 */
public record CaseMeeting(Meeting meeting, Origin origin, MeetingVerdict verdict, int sequence) {

    /** Whether it belongs in the record. */
    public boolean counts() {
        return verdict != MeetingVerdict.DENIED;
    }
}
