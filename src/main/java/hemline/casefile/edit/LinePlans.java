package hemline.casefile.edit;

import hemline.boundary.Origin;
import hemline.boundary.Track;
import hemline.boundary.TrackPiece;
import hemline.sweep.SweepFrame;
import java.util.List;
import java.util.Optional;

/** Plans what changes the course of lines. */
final class LinePlans {
    private final Board board;
    private final int sequence;

    LinePlans(Board board, int sequence) {
        this.board = board;
        this.sequence = sequence;
    }

    Step draw(Edit.Draw edit) throws CannotApplyException {
        SweepFrame frame = board.sweeps.frame(board.sweeps.at(edit.sweepMs()));
        TrackPiece drawn = Strokes.drawn(frame, edit.kind(), edit.line());
        Step step = new Step();
        if (edit.continues().isPresent()) {
            step.pieces(board.locate(edit.continues().get()).track()).add(drawn);
        } else {
            step.pieces(board.newId(sequence)).add(drawn);
        }
        for (Track track : board.on(frame.index())) {
            for (TrackPiece piece : track.pieces()) {
                if (piece.sweep() == frame.index() && piece.origin() == Origin.AUTO) {
                    GivingWay.of(piece, drawn, frame).ifPresent(way -> giveWay(step, track, piece, way));
                }
            }
        }
        return step;
    }

    private void giveWay(Step step, Track track, TrackPiece piece, GivingWay way) {
        List<TrackPiece> pieces = step.pieces(track);
        int at = pieces.indexOf(piece);
        pieces.remove(at);
        pieces.addAll(at, way.left());
        CaseState.Aside aside =
                new CaseState.Aside(track.withPieces(way.covered()), AsideReason.REPLACED, "", sequence);
        step.then(changed -> changed.asides.add(aside));
    }

    Step nudge(Edit.Nudge edit) throws CannotApplyException {
        Spot spot = board.locate(edit.at());
        return replacing(spot, List.of(
                Strokes.nudged(spot.piece(), frame(spot), spot.alongKm(), edit.to(), edit.reachKm())));
    }

    Step trim(Edit.Trim edit) throws CannotApplyException {
        Spot spot = board.locate(edit.at());
        double from = spot.course().nearest(edit.from()).alongKm();
        double to = spot.course().nearest(edit.to()).alongKm();
        TrackPiece kept = Strokes.between(spot.piece(), frame(spot), Math.min(from, to), Math.max(from, to))
                .orElseThrow(() -> new CannotApplyException("less than " + Strokes.SHORTEST_KM
                        + " km of the stretch would be left; set it aside instead"));
        return replacing(spot, List.of(kept));
    }

    Step cut(Edit.Cut edit) throws CannotApplyException {
        Spot spot = board.locate(edit.at());
        double a = spot.course().nearest(edit.from()).alongKm();
        double b = spot.course().nearest(edit.to()).alongKm();
        Optional<TrackPiece> before = Strokes.between(spot.piece(), frame(spot), 0, Math.min(a, b));
        Optional<TrackPiece> after =
                Strokes.between(spot.piece(), frame(spot), Math.max(a, b), spot.course().lengthKm());
        if (before.isEmpty() && after.isEmpty()) {
            throw new CannotApplyException("the cut would take the whole stretch; set it aside instead");
        }
        if (Math.abs(a - b) < Strokes.SHORTEST_KM && (before.isEmpty() || after.isEmpty())) {
            throw new CannotApplyException("the cut lies at the end of the stretch, so there is nothing to part");
        }
        return replacing(spot, java.util.stream.Stream.of(before, after).flatMap(Optional::stream).toList());
    }

    Step join(Edit.Join edit) throws CannotApplyException {
        Spot first = board.locate(edit.first());
        Spot second = board.locate(edit.second());
        if (first.piece() == second.piece()) {
            throw new CannotApplyException("both places lie on the same stretch of " + first.track().id());
        }
        if (first.piece().sweep() != second.piece().sweep()) {
            throw new CannotApplyException("the two stretches lie on different sweeps");
        }
        Step step = new Step();
        List<TrackPiece> firsts = step.pieces(first.track());
        firsts.set(firsts.indexOf(first.piece()), Strokes.joined(first.piece(), second.piece(), frame(first)));
        step.pieces(second.track()).remove(second.piece());
        return step;
    }

    Step changeKind(Edit.ChangeKind edit) throws CannotApplyException {
        Spot spot = board.locate(edit.at());
        Step step = new Step();
        List<TrackPiece> pieces = step.pieces(spot.track());
        boolean any = false;
        for (int i = 0; i < pieces.size(); i++) {
            TrackPiece piece = pieces.get(i);
            boolean meant = edit.extent() == Extent.TRACK || i == spot.index();
            if (meant && piece.kind() != edit.kind()) {
                pieces.set(i, Strokes.ofKind(piece, edit.kind()));
                any = true;
            }
        }
        if (!any) {
            throw new CannotApplyException(spot.track().id() + " is already of kind " + edit.kind().label());
        }
        return step.telling(now -> spot.track().id() + ": kind " + kindOf(now.track(spot.track().id())));
    }

    private static String kindOf(Track track) {
        List<String> kinds = track.pieces().stream().map(piece -> piece.kind().label()).distinct().sorted().toList();
        return String.join(" and ", kinds);
    }

    private static Step replacing(Spot spot, List<TrackPiece> by) {
        Step step = new Step();
        List<TrackPiece> pieces = step.pieces(spot.track());
        pieces.remove(spot.index());
        pieces.addAll(spot.index(), by);
        return step;
    }

    private SweepFrame frame(Spot spot) {
        return board.sweeps.frame(spot.piece().sweep());
    }
}
