package hemline.casefile.edit;

import hemline.boundary.Meeting;
import hemline.boundary.Track;
import hemline.geometry.Point;
import java.util.List;
import java.util.Optional;

/**
 * What a case holds once its edits are applied: geometry and rulings. Speeds, arcs and meetings of touched tracks are
 * not here; they are measured anew from it. Lists are in order of id, or of the edit that put the thing there.
 *
 * @param sweeps   where and when each sweep looked
 * @param tracks   the boundaries that count; a touched one carries no measured values
 * @param asides   what was set aside; never lost
 * @param centres  arcs whose centre is held by hand, at most one a track
 * @param rulings  what was said of found meetings
 * @param added    meetings added by hand
 * @param notes    notes
 * @param reviews  tracks a person has looked at, at most one mark a track
 */
public record CaseState(Sweeps sweeps, List<Track> tracks, List<Aside> asides, List<FixedCentre> centres,
                        List<Ruling> rulings, List<AddedMeeting> added, List<PlacedNote> notes,
                        List<ReviewMark> reviews) {
    public CaseState {
        tracks = List.copyOf(tracks);
        asides = List.copyOf(asides);
        centres = List.copyOf(centres);
        rulings = List.copyOf(rulings);
        added = List.copyOf(added);
        notes = List.copyOf(notes);
        reviews = List.copyOf(reviews);
    }

    /** The state before any edit. */
    public static CaseState of(Found found) {
        List<Track> tracks = found.tracks().stream()
                .sorted((a, b) -> TrackOrder.BY_ID.compare(a.id(), b.id())).toList();
        return new CaseState(new Sweeps(found.frames()), tracks, List.of(), List.of(), List.of(), List.of(), List.of(),
                List.of());
    }

    /**
     * The state after one more change; this one stays as it is.
     *
     * @param sequence number of the edit in the log; a new track is named after it
     * @throws CannotApplyException if the change does not fit this state
     */
    public Applied apply(int sequence, Edit.Change change) throws CannotApplyException {
        Board board = Board.of(this);
        Step step = Planner.plan(board, sequence, change);
        String before = step.words(board);
        step.commit(board);
        return new Applied(board.freeze(), before, step.words(board));
    }

    public Optional<Track> track(String id) {
        return tracks.stream().filter(track -> track.id().equals(id)).findFirst();
    }

    /**
     * A state and what led to it in words.
     *
     * @param before the touched things as they were
     * @param after  and as they are
     */
    public record Applied(CaseState state, String before, String after) {
    }

    /**
     * Something set aside.
     *
     * @param track    the whole track, or those of its stretches that were set aside, as they were
     * @param sequence the edit that did it
     */
    public record Aside(Track track, AsideReason why, String words, int sequence) {
    }

    /**
     * An arc's centre held by hand.
     *
     * @param centre km east and north of the radar
     * @param timeMs when it is there, ms since 1970-01-01T00:00Z
     */
    public record FixedCentre(String trackId, Point centre, long timeMs, int sequence) {
    }

    /** What was said of a found meeting. */
    public record Ruling(Meeting meeting, MeetingVerdict verdict, int sequence) {
    }

    /** A meeting added by hand; uncertainties that no one measured are NaN. */
    public record AddedMeeting(Meeting meeting, int sequence) {
    }

    /** A note, and what it is about; empty for the whole case. */
    public record PlacedNote(Optional<Anchor> at, String words, int sequence) {
    }

    /** That a person looked at a track. */
    public record ReviewMark(String trackId, ReviewOutcome outcome, int sequence) {
    }
}
