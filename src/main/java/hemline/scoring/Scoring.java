package hemline.scoring;

import hemline.boundary.Meeting;
import hemline.boundary.Track;
import hemline.boundary.truth.Truth;
import java.util.List;
import java.util.Map;

/**
 * Scores found tracks and meetings against a truth.
 *
 * <p>Lines are cut into short elements. An element of truth that is plain to see (detectability from
 * {@link ScoreSettings#plainFrom()}) counts as recalled when the same sweep has a found element within
 * {@link ScoreSettings#toleranceKm()} whose line runs within {@link ScoreSettings#maxAngleDeg()} of it. A found element
 * is right when such an element of truth is that near; it is neither right nor wrong when only hidden truth is; else it
 * is false. The tolerance holds on both sides and around the ends: a found line that runs past the end of the truth is
 * right for that much more. Lines shorter than 1 km have no direction and match at any angle. Found lines belong to the
 * sweep of the truth whose rays are nearest in time to the mean of their own.
 *
 * <p>Where an element is near several boundaries it is paired with the one its track mostly follows. Position errors
 * are taken beside the truth only, not past its ends. Speed errors are the found velocity along the true normal less
 * the true normal speed. All are weighted by length.
 */
public final class Scoring {

    private Scoring() {
    }

    /**
     * @param tracks   found in the loop the truth is of
     * @param meetings found; only observed ones are scored
     * @throws IllegalArgumentException when the truth has no sweep or a line in a sweep it does not have
     */
    public static Score score(Truth truth, List<Track> tracks, List<Meeting> meetings, ScoreSettings settings) {
        return new Score(List.of(new SceneScorer(truth, tracks, settings).tally(meetings)), settings, Map.of());
    }
}
