package hemline.casefile.review;

import hemline.casefile.edit.Anchor;
import java.util.List;

/**
 * A track to look at.
 *
 * @param trackId  the track
 * @param where    the place its weightiest concern points to
 * @param sweep    and the sweep, index in the loop
 * @param urgency  0 to 1: how likely something is wrong, taking the concerns as independent
 * @param concerns weightiest first; never empty
 */
public record ReviewItem(String trackId, Anchor where, int sweep, double urgency, List<Concern> concerns) {
    public ReviewItem {
        concerns = List.copyOf(concerns);
        if (concerns.isEmpty()) {
            throw new IllegalArgumentException("a track without concerns needs no review: " + trackId);
        }
    }
}
