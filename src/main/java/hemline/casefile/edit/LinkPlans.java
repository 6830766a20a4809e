package hemline.casefile.edit;

import hemline.boundary.Meeting;
import hemline.boundary.Track;
import hemline.boundary.TrackPiece;
import java.util.List;

/** Plans what changes which track a stretch belongs to, or whether it counts at all. */
final class LinkPlans {
    private final Board board;
    private final int sequence;

    LinkPlans(Board board, int sequence) {
        this.board = board;
        this.sequence = sequence;
    }

    Step relink(Edit.Relink edit) throws CannotApplyException {
        Spot spot = board.locate(edit.at());
        Step step = new Step();
        if (edit.track().isPresent()) {
            Track target = board.locate(edit.track().get()).track();
            if (target.id().equals(spot.track().id())) {
                throw new CannotApplyException("the stretch already belongs to " + target.id());
            }
            step.pieces(target).add(Strokes.byHand(spot.piece()));
        } else {
            if (spot.track().pieces().size() == 1) {
                throw new CannotApplyException("the stretch is already a track of its own, " + spot.track().id());
            }
            step.pieces(board.newId(sequence)).add(Strokes.byHand(spot.piece()));
        }
        step.pieces(spot.track()).remove(spot.index());
        return step;
    }

    Step split(Edit.SplitTrack edit) throws CannotApplyException {
        Spot spot = board.locate(edit.at());
        int from = spot.piece().sweep();
        if (spot.track().pieces().get(0).sweep() >= from) {
            throw new CannotApplyException(spot.track().id() + " has nothing before that sweep, so there is nothing "
                    + "to split");
        }
        Step step = new Step();
        List<TrackPiece> later = spot.track().pieces().stream().filter(piece -> piece.sweep() >= from).toList();
        step.pieces(spot.track()).removeIf(piece -> piece.sweep() >= from);
        later.forEach(piece -> step.pieces(board.newId(sequence)).add(Strokes.byHand(piece)));
        return step;
    }

    Step merge(Edit.MergeTracks edit) throws CannotApplyException {
        Track kept = board.locate(edit.kept()).track();
        Track absorbed = board.locate(edit.absorbed()).track();
        if (kept.id().equals(absorbed.id())) {
            throw new CannotApplyException("both places belong to " + kept.id());
        }
        Step step = new Step();
        absorbed.pieces().forEach(piece -> step.pieces(kept).add(Strokes.byHand(piece)));
        step.pieces(absorbed).clear();
        return step.then(changed -> changed.added.replaceAll(
                added -> new CaseState.AddedMeeting(renamed(added.meeting(), absorbed.id(), kept.id()),
                        added.sequence())));
    }

    private static Meeting renamed(Meeting meeting, String from, String to) {
        String a = meeting.trackA().equals(from) ? to : meeting.trackA();
        String b = meeting.trackB().equals(from) ? to : meeting.trackB();
        return RecordPlans.between(meeting, a, b);
    }

    Step setAside(Edit.SetAside edit) throws CannotApplyException {
        Spot spot = board.locate(edit.at());
        Step step = new Step();
        Track taken = spot.track();
        if (edit.extent() == Extent.TRACK) {
            step.pieces(spot.track()).clear();
        } else {
            step.pieces(spot.track()).remove(spot.index());
            taken = spot.track().withPieces(List.of(spot.piece()));
        }
        CaseState.Aside aside = new CaseState.Aside(taken, edit.why(), edit.words(), sequence);
        return step.then(changed -> changed.asides.add(aside));
    }

    Step restore(Edit.Restore edit) throws CannotApplyException {
        CaseState.Aside aside = board.locateAside(edit.at());
        Track standing = board.track(aside.track().id());
        Step step = new Step();
        if (standing == null) {
            step.whole(aside.track());
        } else {
            aside.track().pieces().forEach(piece -> step.pieces(standing).add(Strokes.still(piece)));
        }
        return step.then(changed -> changed.asides.remove(aside));
    }
}
