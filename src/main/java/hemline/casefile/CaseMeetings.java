package hemline.casefile;

import hemline.boundary.Meeting;
import hemline.boundary.Origin;
import hemline.casefile.edit.CaseState;
import hemline.casefile.edit.MeetingVerdict;
import hemline.casefile.edit.SameMeeting;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalInt;
import java.util.TreeMap;

/** Puts found meetings, rulings on them and meetings added by hand together. */
final class CaseMeetings {
    private CaseMeetings() {
    }

    /**
     * Found meetings in their order, then confirmed ones that are no longer found, then added ones. A denial of a
     * meeting that is no longer found has nothing left to deny and adds nothing. An added meeting stays only while
     * both its tracks do.
     */
    static List<CaseMeeting> of(CaseState state, List<Meeting> found) {
        TreeMap<Integer, CaseState.Ruling> ruled = new TreeMap<>();
        List<CaseMeeting> lost = new ArrayList<>();
        for (CaseState.Ruling ruling : state.rulings()) {
            OptionalInt at = SameMeeting.in(found, ruling.meeting());
            if (at.isPresent()) {
                ruled.put(at.getAsInt(), ruling);
            } else if (ruling.verdict() == MeetingVerdict.CONFIRMED) {
                lost.add(new CaseMeeting(ruling.meeting(), Origin.HAND, ruling.verdict(), ruling.sequence()));
            }
        }
        List<CaseMeeting> all = new ArrayList<>();
        for (int i = 0; i < found.size(); i++) {
            CaseState.Ruling ruling = ruled.get(i);
            all.add(ruling == null ? new CaseMeeting(found.get(i), Origin.AUTO, MeetingVerdict.OPEN, 0)
                    : new CaseMeeting(found.get(i), Origin.AUTO, ruling.verdict(), ruling.sequence()));
        }
        all.addAll(lost);
        for (CaseState.AddedMeeting added : state.added()) {
            Meeting meeting = added.meeting();
            boolean standing = state.track(meeting.trackA()).isPresent() && state.track(meeting.trackB()).isPresent();
            if (standing && !meeting.trackA().equals(meeting.trackB())) {
                all.add(new CaseMeeting(meeting, Origin.HAND, MeetingVerdict.CONFIRMED, added.sequence()));
            }
        }
        return List.copyOf(all);
    }
}
