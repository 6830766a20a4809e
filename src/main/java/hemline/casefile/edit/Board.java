package hemline.casefile.edit;

import hemline.boundary.Track;
import hemline.boundary.TrackPiece;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.TreeSet;

/**
 * A state laid out for change: tracks by id and by sweep. A replay works on one board from first edit to last, so
 * that ten thousand edits do not copy the case ten thousand times.
 */
final class Board {
    final Sweeps sweeps;
    final List<CaseState.Aside> asides;
    final TreeMap<String, CaseState.FixedCentre> centres = new TreeMap<>(TrackOrder.BY_ID);
    final List<CaseState.Ruling> rulings;
    final List<CaseState.AddedMeeting> added;
    final List<CaseState.PlacedNote> notes;
    final TreeMap<String, CaseState.ReviewMark> reviews = new TreeMap<>(TrackOrder.BY_ID);
    private final TreeMap<String, Track> tracks = new TreeMap<>(TrackOrder.BY_ID);
    private final Map<Integer, TreeSet<String>> idsBySweep = new HashMap<>();

    private Board(CaseState state) {
        sweeps = state.sweeps();
        asides = new ArrayList<>(state.asides());
        rulings = new ArrayList<>(state.rulings());
        added = new ArrayList<>(state.added());
        notes = new ArrayList<>(state.notes());
        state.tracks().forEach(this::put);
        state.centres().forEach(centre -> centres.put(centre.trackId(), centre));
        state.reviews().forEach(mark -> reviews.put(mark.trackId(), mark));
    }

    static Board of(CaseState state) {
        return new Board(state);
    }

    CaseState freeze() {
        return new CaseState(sweeps, List.copyOf(tracks.values()), asides, List.copyOf(centres.values()), rulings,
                added, notes, List.copyOf(reviews.values()));
    }

    /** The track of that id, or null. */
    Track track(String id) {
        return tracks.get(id);
    }

    void put(Track track) {
        drop(track.id());
        tracks.put(track.id(), track);
        for (TrackPiece piece : track.pieces()) {
            idsBySweep.computeIfAbsent(piece.sweep(), sweep -> new TreeSet<>(TrackOrder.BY_ID)).add(track.id());
        }
    }

    void drop(String id) {
        Track old = tracks.remove(id);
        if (old != null) {
            for (TrackPiece piece : old.pieces()) {
                idsBySweep.get(piece.sweep()).remove(id);
            }
        }
    }

    /** Tracks present on a sweep, by id. */
    List<Track> on(int sweep) {
        TreeSet<String> ids = idsBySweep.get(sweep);
        return ids == null ? List.of() : ids.stream().map(tracks::get).toList();
    }

    /** A name for a track made by edit {@code sequence}. */
    String newId(int sequence) {
        String id = "H" + sequence;
        while (taken(id)) {
            id += "x";
        }
        return id;
    }

    private boolean taken(String id) {
        return tracks.containsKey(id) || asides.stream().anyMatch(aside -> aside.track().id().equals(id));
    }

    /** The stretch that an anchor names. */
    Spot locate(Anchor anchor) throws CannotApplyException {
        int sweep = sweeps.at(anchor.timeMs());
        return Spot.nearest(on(sweep), sweep, anchor).orElseThrow(() -> new CannotApplyException(
                "no boundary within " + Spot.WITHIN_KM + " km of " + Words.place(anchor.place()) + " at "
                        + Words.time(anchor.timeMs())));
    }

    /** What was set aside where an anchor points; the latest of equals. */
    CaseState.Aside locateAside(Anchor anchor) throws CannotApplyException {
        int sweep = sweeps.at(anchor.timeMs());
        CaseState.Aside best = null;
        double bestRank = Double.POSITIVE_INFINITY;
        for (CaseState.Aside aside : asides) {
            Spot spot = Spot.nearest(List.of(aside.track()), sweep, anchor).orElse(null);
            if (spot != null && spot.rank() <= bestRank) {
                best = aside;
                bestRank = spot.rank();
            }
        }
        if (best == null) {
            throw new CannotApplyException("nothing was set aside within " + Spot.WITHIN_KM + " km of "
                    + Words.place(anchor.place()) + " at " + Words.time(anchor.timeMs()));
        }
        return best;
    }
}
