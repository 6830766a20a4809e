package hemline.casefile.review;

import hemline.boundary.Track;
import hemline.boundary.TrackPiece;
import hemline.casefile.edit.Anchor;
import hemline.casefile.edit.CaseState;
import hemline.casefile.edit.ReviewOutcome;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.Collectors;

/**
 * The tracks of a case in the order in which they most need a person. The weights are common practice without a
 * source: they order, they are no probabilities.
 *
 * @param open tracks to look at, most urgent first; those put off last
 * @param done tracks accepted or corrected
 * @param calm tracks that nothing speaks against and no one has looked at
 */
public record ReviewQueue(List<ReviewItem> open, List<String> done, List<String> calm) {
    public ReviewQueue {
        open = List.copyOf(open);
        done = List.copyOf(done);
        calm = List.copyOf(calm);
    }

    /**
     * Orders the tracks of a case.
     *
     * @param state    of the case, for its sweeps and what was reviewed
     * @param measured its tracks, measured
     * @param more     concerns found elsewhere, for example against theory
     */
    public static ReviewQueue of(CaseState state, List<Track> measured, List<Concern> more) {
        List<Concern> concerns = new ArrayList<>(more);
        concerns.addAll(TrackConcerns.of(measured, state.sweeps()));
        concerns.addAll(PairConcerns.of(measured, state.sweeps()));
        Map<String, List<Concern>> byTrack = concerns.stream().collect(Collectors.groupingBy(Concern::trackId));
        Map<String, ReviewOutcome> outcomes = new HashMap<>();
        state.reviews().forEach(mark -> outcomes.put(mark.trackId(), mark.outcome()));
        List<ReviewItem> open = new ArrayList<>();
        List<ReviewItem> later = new ArrayList<>();
        List<String> done = new ArrayList<>();
        List<String> calm = new ArrayList<>();
        for (Track track : measured) {
            ReviewOutcome outcome = outcomes.get(track.id());
            List<Concern> own = new ArrayList<>(byTrack.getOrDefault(track.id(), List.of()));
            if (outcome == ReviewOutcome.ACCEPTED || outcome == ReviewOutcome.CORRECTED) {
                done.add(track.id());
            } else if (outcome == ReviewOutcome.LATER) {
                own.add(new Concern(track.id(), ReviewReason.LATER, track.pieces().get(0).sweep(), 0,
                        "put off by a person"));
                later.add(item(track, own, state));
            } else if (own.isEmpty()) {
                calm.add(track.id());
            } else {
                open.add(item(track, own, state));
            }
        }
        // The order of the tracks decides between equals, and sorting keeps it.
        Comparator<ReviewItem> mostUrgent = Comparator.comparingDouble(ReviewItem::urgency).reversed();
        open.sort(mostUrgent);
        later.sort(mostUrgent);
        open.addAll(later);
        return new ReviewQueue(open, done, calm);
    }

    private static ReviewItem item(Track track, List<Concern> concerns, CaseState state) {
        concerns.sort(Comparator.comparingDouble(Concern::weight).reversed()
                .thenComparing(Concern::reason).thenComparingInt(Concern::sweep));
        double nothing = 1;
        for (Concern concern : concerns) {
            nothing *= 1 - concern.weight();
        }
        int sweep = concerns.get(0).sweep();
        TrackPiece piece = track.pieces().stream()
                .min(Comparator.comparingInt((TrackPiece p) -> Math.abs(p.sweep() - sweep))).orElseThrow();
        Anchor where = Anchor.of(track.id(), piece, state.sweeps().frames(),
                piece.line().at(piece.line().lengthKm() / 2));
        return new ReviewItem(track.id(), where, piece.sweep(), 1 - nothing, concerns);
    }

    /** How far the review has come: tracks done, of all. */
    public int total() {
        return open.size() + done.size() + calm.size();
    }
}
