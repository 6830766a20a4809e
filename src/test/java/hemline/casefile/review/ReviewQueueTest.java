package hemline.casefile.review;

import static org.assertj.core.api.Assertions.assertThat;

import hemline.boundary.Speed;
import hemline.boundary.Track;
import hemline.boundary.TrackPiece;
import hemline.boundary.TrackVertex;
import hemline.casefile.CaseExamples;
import hemline.casefile.edit.Anchor;
import hemline.casefile.edit.CannotApplyException;
import hemline.casefile.edit.CaseState;
import hemline.casefile.edit.Edit;
import hemline.casefile.edit.ReviewOutcome;
import hemline.geometry.Point;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.IntFunction;
import org.junit.jupiter.api.Test;

class ReviewQueueTest {
    private final CaseState state = CaseState.of(CaseExamples.found());
    private final Track whole = even(state.track("T1").orElseThrow(), sweep -> 10);

    /** The track with one speed a sweep, all of it seen. */
    private static Track even(Track track, IntFunction<Integer> speedMs) {
        return track.withPieces(track.pieces().stream().map(piece -> new TrackPiece(piece.sweep(), piece.kind(),
                piece.origin(), piece.vertices().stream().map(v -> new TrackVertex(v.position(), v.timeMs(),
                        v.reflectivityDbz(), v.beamHeightM(), 90, new Speed(speedMs.apply(piece.sweep()), 0.7), true))
                        .toList())).toList());
    }

    private static Track named(String id, Track track, List<TrackPiece> pieces) {
        return new Track(id, pieces, track.speed(), track.bearingDeg(), track.arc(), track.arcRefusal(),
                track.score());
    }

    private List<ReviewReason> reasons(Track... tracks) {
        return ReviewQueue.of(state, List.of(tracks), List.of()).open().stream()
                .filter(item -> item.trackId().equals(tracks[0].id()))
                .flatMap(item -> item.concerns().stream()).map(Concern::reason).toList();
    }

    @Test
    void soundTrackNeedsNoReview() {
        ReviewQueue queue = ReviewQueue.of(state, List.of(whole), List.of());
        assertThat(queue.open()).isEmpty();
        assertThat(queue.calm()).containsExactly("T1");
    }

    @Test
    void jumpOfSpeedIsAKinkOnlyBeyondItsUncertainty() {
        assertThat(reasons(even(whole, sweep -> sweep < 3 ? 8 : 16))).containsExactly(ReviewReason.SPEED_KINK);
        assertThat(reasons(even(whole, sweep -> sweep < 3 ? 10 : 12))).isEmpty();
    }

    @Test
    void shortGappyAndFilledTracksAreNamed() {
        assertThat(reasons(named("T1", whole, whole.pieces().subList(0, 2)))).containsExactly(ReviewReason.FEW_SWEEPS);
        List<TrackPiece> gappy = new ArrayList<>(whole.pieces());
        gappy.remove(2);
        assertThat(reasons(named("T1", whole, gappy))).containsExactly(ReviewReason.GAP);
        Track filled = whole.withPieces(whole.pieces().stream().map(piece -> new TrackPiece(piece.sweep(),
                piece.kind(), piece.origin(), piece.vertices().stream().map(v -> new TrackVertex(v.position(),
                v.timeMs(), v.reflectivityDbz(), v.beamHeightM(), 90, v.speed(), v.position().yKm() < -5)).toList()))
                .toList());
        assertThat(reasons(filled)).containsExactly(ReviewReason.MOSTLY_FILLED);
    }

    @Test
    void trackThatGoesOnWhereAnotherEndsIsSaidToBeBroken() {
        Track first = named("T1", whole, whole.pieces().subList(0, 4));
        Track second = named("T2", whole, whole.pieces().subList(4, 6));
        assertThat(reasons(first, second)).containsExactly(ReviewReason.BROKEN);
        assertThat(reasons(second, first)).contains(ReviewReason.BROKEN);
    }

    @Test
    void tracksSideBySideAreSaidToBeDoubled() {
        Track beside = named("T2", whole, whole.pieces().stream().map(piece -> new TrackPiece(piece.sweep(),
                piece.kind(), piece.origin(), piece.vertices().stream().map(v -> new TrackVertex(
                v.position().plus(new Point(2.5, 0)), v.timeMs(), v.reflectivityDbz(), v.beamHeightM(), 90, v.speed(),
                true)).toList())).toList());
        assertThat(reasons(whole, beside)).containsExactly(ReviewReason.DOUBLED);
    }

    @Test
    void poorSpeedIsNamed() {
        Track unsure = new Track("T1", whole.pieces(), new Speed(4, 3), 90, Optional.empty(), "", 1);
        assertThat(reasons(unsure)).containsExactly(ReviewReason.UNSURE_SPEED);
        Track none = new Track("T1", whole.pieces(), Speed.UNKNOWN, Double.NaN, Optional.empty(), "", 1);
        assertThat(reasons(none)).containsExactly(ReviewReason.NO_SPEED);
    }

    @Test
    void weakestOfManyComesFirstAndConcernsFromElsewhereCount() {
        List<Track> tracks = new ArrayList<>();
        for (int i = 1; i <= 5; i++) {
            Point away = new Point(0, 60 * i);
            tracks.add(new Track("T" + i, whole.pieces().stream().map(piece -> new TrackPiece(piece.sweep(),
                    piece.kind(), piece.origin(), piece.vertices().stream().map(v -> new TrackVertex(
                    v.position().plus(away), v.timeMs(), 1, 1, 90, v.speed(), true)).toList())).toList(),
                    whole.speed(), 90, Optional.empty(), "", i == 3 ? 0.5 : 5 + i));
        }
        Concern theory = new Concern("T5", ReviewReason.THEORY, 2, 0.9, "twice as fast as theory allows");
        ReviewQueue queue = ReviewQueue.of(state, tracks, List.of(theory));
        assertThat(queue.open()).extracting(ReviewItem::trackId).containsExactly("T5", "T3", "T1");
        assertThat(queue.open().get(0).sweep()).isEqualTo(2);
        assertThat(queue.calm()).containsExactly("T2", "T4");
    }

    @Test
    void whatAPersonAcceptedIsDoneAndWhatWasPutOffComesLast() throws CannotApplyException {
        Track short1 = named("T1", whole, whole.pieces().subList(0, 1));
        Track short2 = named("T2", state.track("T2").orElseThrow(), state.track("T2").orElseThrow().pieces()
                .subList(0, 3));
        Anchor first = Anchor.of(state.track("T1").orElseThrow(), state.sweeps().frames());
        Anchor third = Anchor.of(state.track("T3").orElseThrow(), state.sweeps().frames());
        CaseState marked = state.apply(1, new Edit.Review(first, ReviewOutcome.LATER)).state()
                .apply(2, new Edit.Review(third, ReviewOutcome.ACCEPTED)).state();
        ReviewQueue queue =
                ReviewQueue.of(marked, List.of(short1, short2, state.track("T3").orElseThrow()), List.of());
        assertThat(queue.open()).extracting(ReviewItem::trackId).containsExactly("T2", "T1");
        assertThat(queue.done()).containsExactly("T3");
        assertThat(queue.total()).isEqualTo(3);
    }
}
