package hemline.casefile.edit;

import hemline.boundary.Meeting;
import hemline.boundary.Speed;
import hemline.geometry.Point;
import java.util.Optional;
import java.util.function.Function;

/** Plans what is said about boundaries and meetings without moving a line. */
final class RecordPlans {
    private final Board board;
    private final int sequence;

    RecordPlans(Board board, int sequence) {
        this.board = board;
        this.sequence = sequence;
    }

    Step fixCentre(Edit.FixCentre edit) throws CannotApplyException {
        String id = board.locate(edit.at()).track().id();
        Function<Board, String> words = now -> {
            CaseState.FixedCentre held = now.centres.get(id);
            return id + (held == null ? ": centre fitted" : ": centre held at " + Words.place(held.centre()));
        };
        if (edit.centre().isEmpty()) {
            if (!board.centres.containsKey(id)) {
                throw new CannotApplyException("the centre of " + id + " is not held");
            }
            return new Step().then(changed -> changed.centres.remove(id)).telling(words);
        }
        CaseState.FixedCentre held =
                new CaseState.FixedCentre(id, edit.centre().get(), edit.at().timeMs(), sequence);
        return new Step().then(changed -> changed.centres.put(id, held)).telling(words);
    }

    Step rule(Edit.RuleMeeting edit) throws CannotApplyException {
        Optional<CaseState.Ruling> earlier = board.rulings.stream()
                .filter(ruling -> SameMeeting.is(ruling.meeting(), edit.meeting())).findFirst();
        if (edit.verdict() == MeetingVerdict.OPEN && earlier.isEmpty()) {
            throw new CannotApplyException("nothing was ruled on the meeting of " + pair(edit.meeting()));
        }
        Step step = new Step().then(changed -> earlier.ifPresent(changed.rulings::remove));
        if (edit.verdict() != MeetingVerdict.OPEN) {
            CaseState.Ruling ruling = new CaseState.Ruling(edit.meeting(), edit.verdict(), sequence);
            step.then(changed -> changed.rulings.add(ruling));
        }
        return step.telling(now -> "meeting of " + pair(edit.meeting()) + ": " + now.rulings.stream()
                .filter(ruling -> SameMeeting.is(ruling.meeting(), edit.meeting())).findFirst()
                .map(CaseState.Ruling::verdict).orElse(MeetingVerdict.OPEN).label());
    }

    Step addMeeting(Edit.AddMeeting edit) throws CannotApplyException {
        Spot first = board.locate(edit.first());
        Spot second = board.locate(edit.second());
        if (first.track().id().equals(second.track().id())) {
            throw new CannotApplyException("a boundary does not meet itself: both places belong to "
                    + first.track().id());
        }
        Point a = first.course().heading(first.alongKm());
        Point b = second.course().heading(second.alongKm());
        double crossingDeg = Math.toDegrees(Math.atan2(Math.abs(a.cross(b)), Math.abs(a.dot(b))));
        boolean seen = edit.timeMs() <= board.sweeps.lastMs();
        Meeting unnamed = new Meeting(board.newId(sequence), "", "", edit.timeMs(), Double.NaN, edit.place(),
                new Meeting.Ellipse(Double.NaN, Double.NaN, Double.NaN), crossingDeg, Speed.UNKNOWN,
                seen ? Meeting.Status.OBSERVED : Meeting.Status.EXPECTED, seen ? 1 : Double.NaN);
        Meeting meeting = between(unnamed, first.track().id(), second.track().id());
        CaseState.AddedMeeting added = new CaseState.AddedMeeting(meeting, sequence);
        return new Step().then(changed -> changed.added.add(added)).telling(now -> now.added.contains(added)
                ? "meeting of " + pair(meeting) + " at " + Words.time(meeting.timeMs()) : "no meeting by hand there");
    }

    Step note(Edit.Note edit) {
        CaseState.PlacedNote note = new CaseState.PlacedNote(edit.at(), edit.words(), sequence);
        String about = edit.at().map(Anchor::id).filter(id -> !id.isEmpty()).orElse("case");
        return new Step().then(changed -> changed.notes.add(note))
                .telling(now -> about + ": " + now.notes.size() + " notes in the case");
    }

    Step review(Edit.Review edit) throws CannotApplyException {
        String id = board.locate(edit.at()).track().id();
        CaseState.ReviewMark mark = new CaseState.ReviewMark(id, edit.outcome(), sequence);
        return new Step().then(changed -> changed.reviews.put(id, mark)).telling(now -> id + ": "
                + Optional.ofNullable(now.reviews.get(id)).map(m -> m.outcome().label()).orElse("not looked at"));
    }

    /** The same meeting between two tracks named in order of id. */
    static Meeting between(Meeting meeting, String one, String other) {
        boolean inOrder = TrackOrder.BY_ID.compare(one, other) <= 0;
        return new Meeting(meeting.id(), inOrder ? one : other, inOrder ? other : one, meeting.timeMs(),
                meeting.timeSdS(), meeting.place(), meeting.ellipse(), meeting.crossingAngleDeg(), meeting.closing(),
                meeting.status(), meeting.probability());
    }

    private static String pair(Meeting meeting) {
        return meeting.trackA() + " and " + meeting.trackB();
    }
}
