package hemline.casefile.review;

/**
 * One thing that speaks for looking at a track.
 *
 * @param trackId the track
 * @param reason  of what sort
 * @param sweep   where to look, index in the loop
 * @param weight  how much it speaks for a fault, 0 to 1
 * @param words   what was measured, one clause
 */
public record Concern(String trackId, ReviewReason reason, int sweep, double weight, String words) {
    public Concern {
        if (!(weight >= 0 && weight <= 1)) {
            throw new IllegalArgumentException("a weight lies within 0..1, got " + weight);
        }
    }
}
