package hemline.casefile;

import hemline.boundary.BoundaryKind;
import hemline.boundary.Meeting;
import hemline.boundary.Speed;
import hemline.boundary.Track;
import hemline.boundary.TrackPiece;
import hemline.casefile.edit.Anchor;
import hemline.casefile.edit.AsideReason;
import hemline.casefile.edit.CaseState;
import hemline.casefile.edit.Edit;
import hemline.casefile.edit.Extent;
import hemline.casefile.edit.MeetingVerdict;
import hemline.casefile.edit.ReviewOutcome;
import hemline.geometry.Point;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Random;

/** Any edit an analyst might make in a state; some of them do not fit. */
public final class SomeEdit {
    private final CaseState state;
    private final Random random;

    private SomeEdit(CaseState state, long seed) {
        this.state = state;
        this.random = new Random(seed);
    }

    public static Edit.Change in(CaseState state, long seed) {
        return new SomeEdit(state, seed).make();
    }

    private Edit.Change make() {
        return switch (random.nextInt(17)) {
            case 0 -> new Edit.Draw(state.sweeps().meanMs(sweep()), kind(), line(), Optional.empty());
            case 1 -> new Edit.Draw(state.sweeps().meanMs(sweep()), kind(), line(), Optional.of(anchor()));
            case 2 -> new Edit.Trim(anchor(), place(), place());
            case 3 -> new Edit.Cut(anchor(), place(), place());
            case 4 -> new Edit.Join(anchor(), anchor());
            case 5 -> new Edit.Relink(anchor(), random.nextBoolean() ? Optional.of(anchor()) : Optional.empty());
            case 6 -> new Edit.SplitTrack(anchor());
            case 7 -> new Edit.MergeTracks(anchor(), anchor());
            case 8 -> new Edit.ChangeKind(anchor(), extent(), kind());
            case 9 -> new Edit.SetAside(anchor(), extent(), AsideReason.values()[random.nextInt(5)], "“dust” \\ \n \u2028");
            case 10 -> new Edit.Restore(asideAnchor());
            case 11 -> new Edit.FixCentre(anchor(), random.nextBoolean() ? Optional.of(place()) : Optional.empty());
            case 12 -> new Edit.RuleMeeting(meeting(), MeetingVerdict.values()[random.nextInt(3)]);
            case 13 -> new Edit.AddMeeting(anchor(), anchor(), state.sweeps().meanMs(sweep()), place());
            case 14 -> new Edit.Review(anchor(), ReviewOutcome.values()[random.nextInt(3)]);
            case 15 -> new Edit.Note(random.nextBoolean() ? Optional.of(anchor()) : Optional.empty(), "a note");
            default -> nudge();
        };
    }

    private Edit.Change nudge() {
        Anchor at = anchor();
        Point shift = new Point(random.nextGaussian() * 2, random.nextGaussian() * 2);
        return new Edit.Nudge(at, at.place().plus(shift), 0.5 + 20 * random.nextDouble());
    }

    private Meeting meeting() {
        return new Meeting("M" + random.nextInt(3), "T1", "T2", CaseExamples.START_MS + random.nextInt(1_500_000),
                random.nextBoolean() ? Double.NaN : 60, place(), new Meeting.Ellipse(2, 1, random.nextDouble()),
                90 * random.nextDouble(), Speed.UNKNOWN, Meeting.Status.OBSERVED, 1);
    }

    private int sweep() {
        return random.nextInt(state.sweeps().frames().size());
    }

    private BoundaryKind kind() {
        return BoundaryKind.values()[random.nextInt(2)];
    }

    private Extent extent() {
        return Extent.values()[random.nextInt(2)];
    }

    private Point place() {
        return new Point(100 * random.nextDouble() - 60, 80 * random.nextDouble() - 40);
    }

    private List<Point> line() {
        List<Point> line = new ArrayList<>(List.of(place()));
        for (int i = random.nextInt(5); i >= 0; i--) {
            line.add(line.get(line.size() - 1).plus(new Point(1 + random.nextInt(8), random.nextGaussian() * 3)));
        }
        return line;
    }

    private Anchor anchor() {
        return on(state.tracks());
    }

    private Anchor asideAnchor() {
        return on(state.asides().stream().map(CaseState.Aside::track).toList());
    }

    private Anchor on(List<Track> tracks) {
        if (tracks.isEmpty()) {
            return new Anchor("none", state.sweeps().meanMs(sweep()), place());
        }
        Track track = tracks.get(random.nextInt(tracks.size()));
        TrackPiece piece = track.pieces().get(random.nextInt(track.pieces().size()));
        Point vertex = piece.points().get(random.nextInt(piece.points().size()));
        return new Anchor(track.id(), state.sweeps().meanMs(piece.sweep()), vertex);
    }
}
