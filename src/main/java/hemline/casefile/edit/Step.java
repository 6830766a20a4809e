package hemline.casefile.edit;

import hemline.boundary.Speed;
import hemline.boundary.Track;
import hemline.boundary.TrackPiece;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.TreeMap;
import java.util.TreeSet;
import java.util.function.Consumer;
import java.util.function.Function;
import java.util.stream.Collectors;

/** A planned change: everything that can fail has been decided, so committing it is all or nothing. */
final class Step {
    static final String NOT_MEASURED = "changed by hand, not measured anew";

    private final TreeMap<String, List<TrackPiece>> pieces = new TreeMap<>(TrackOrder.BY_ID);
    private final TreeMap<String, Track> wholes = new TreeMap<>(TrackOrder.BY_ID);
    private final List<Consumer<Board>> more = new ArrayList<>();
    private Function<Board, String> told;

    /** The stretches of a track as they shall be, to be altered by the planner. */
    List<TrackPiece> pieces(Track track) {
        return pieces.computeIfAbsent(track.id(), id -> new ArrayList<>(track.pieces()));
    }

    /** The stretches of a track that does not yet exist. */
    List<TrackPiece> pieces(String newId) {
        return pieces.computeIfAbsent(newId, id -> new ArrayList<>());
    }

    /** Puts a track back exactly as it is. */
    Step whole(Track track) {
        wholes.put(track.id(), track);
        return this;
    }

    Step then(Consumer<Board> action) {
        more.add(action);
        return this;
    }

    /** How the touched things are told, where they are not tracks. */
    Step telling(Function<Board, String> words) {
        told = words;
        return this;
    }

    String words(Board board) {
        if (told != null) {
            return told.apply(board);
        }
        TreeSet<String> touched = new TreeSet<>(TrackOrder.BY_ID);
        touched.addAll(pieces.keySet());
        touched.addAll(wholes.keySet());
        return touched.stream().map(id -> Words.track(id, board.track(id))).collect(Collectors.joining("; "));
    }

    void commit(Board board) {
        pieces.forEach((id, kept) -> {
            Track old = board.track(id);
            if (kept.isEmpty()) {
                board.drop(id);
            } else {
                board.put(old == null ? unmeasured(id, kept, Double.NaN) : changed(old, kept));
            }
        });
        wholes.values().forEach(board::put);
        more.forEach(action -> action.accept(board));
    }

    private static Track changed(Track old, List<TrackPiece> kept) {
        boolean clean = old.arcRefusal().equals(NOT_MEASURED);
        return unmeasured(old.id(), clean ? kept : kept.stream().map(Strokes::still).toList(), old.score());
    }

    private static Track unmeasured(String id, List<TrackPiece> pieces, double score) {
        return new Track(id, pieces, Speed.UNKNOWN, Double.NaN, Optional.empty(), NOT_MEASURED, score);
    }
}
