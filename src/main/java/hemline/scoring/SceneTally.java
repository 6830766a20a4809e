package hemline.scoring;

import java.util.List;
import java.util.SortedMap;

/**
 * What was counted in one scene: sums that pool by adding, and the errors behind the quantiles.
 *
 * @param scene           name of the kind of scene
 * @param seed            of the scene
 * @param sweeps          in the truth
 * @param detectable      true length that has to be found and the part found, by strength
 * @param rightKm         found length near truth that is plain to see, km
 * @param neitherKm       found length near truth that is hidden, km
 * @param falseKm         found length near no truth, km
 * @param falseKmByCause  the same by what it lies on; {@code other} for nothing known
 * @param decoyCauses     causes present in the scene, whether they misled or not
 * @param boundaries      one entry a true boundary
 * @param tracks          one entry a found track
 * @param meetings        what became of the meetings
 * @param positionKm      distance of right elements from the truth, km
 * @param speedMs         normal speed less the true one, right elements, m s⁻¹
 * @param speedLongMs     the same for tracks seen in at least four sweeps
 * @param expansionMs     expansion less the true one, one a track, m s⁻¹
 * @param cautions        what a reader of the figures must know
 */
record SceneTally(String scene, long seed, int sweeps, Recalled detectable, double rightKm, double neitherKm,
                  double falseKm, SortedMap<String, Double> falseKmByCause, List<String> decoyCauses,
                  List<BoundaryTally> boundaries, List<TrackTally> tracks, MeetingTally meetings,
                  ErrorSamples positionKm, ErrorSamples speedMs, ErrorSamples speedLongMs, ErrorSamples expansionMs,
                  List<String> cautions) {
    static final int STRENGTH_CLASSES = 5;

    /** The same with more to know about it. */
    SceneTally withCautions(List<String> more) {
        return new SceneTally(scene, seed, sweeps, detectable, rightKm, neitherKm, falseKm, falseKmByCause, decoyCauses,
                boundaries, tracks, meetings, positionKm, speedMs, speedLongMs, expansionMs,
                java.util.stream.Stream.concat(cautions.stream(), more.stream()).toList());
    }

    /** Index of a strength class: below 4, 4 to 8, 8 to 14, 14 dBZ and more, unknown. */
    static int strengthClass(double peakDbz) {
        if (Double.isNaN(peakDbz)) {
            return STRENGTH_CLASSES - 1;
        }
        if (peakDbz < 4) {
            return 0;
        }
        return peakDbz < 8 ? 1 : peakDbz < 14 ? 2 : 3;
    }

    /**
     * @param totalKm true length that has to be found, by strength class, km
     * @param foundKm the part of it that was found, km
     */
    record Recalled(double[] totalKm, double[] foundKm) {
        double totalKm(int strength) {
            return totalKm[strength];
        }

        double foundKm(int strength) {
            return foundKm[strength];
        }

        double allKm() {
            return java.util.Arrays.stream(totalKm).sum();
        }

        double allFoundKm() {
            return java.util.Arrays.stream(foundKm).sum();
        }
    }

    /**
     * @param detectableKm  length that has to be found, all sweeps, km
     * @param recalledKm    the part found, km
     * @param dominantTrack the track that found most of it; empty for none
     * @param dominantKm    how much that track found, km
     * @param switches      times that the track that sees most of it changed from one sweep to the next seen
     * @param links         pairs of successive sweeps in which it was seen
     */
    record BoundaryTally(String id, double detectableKm, double recalledKm, String dominantTrack, double dominantKm,
                         int switches, int links) {
    }

    /**
     * @param lengthKm       all sweeps, km
     * @param rightKm        near plain truth, km
     * @param neitherKm      near hidden truth, km
     * @param dominantTruth  the true boundary it mostly follows; empty for none
     * @param dominantKm     right length along that boundary, km
     * @param expansionAsked whether that boundary is an arc whose radius is known while the track follows it
     * @param expansionGiven whether the track states an expansion there
     * @param speedGivenKm   right length that states a speed, km
     */
    record TrackTally(String id, double lengthKm, double rightKm, double neitherKm, String dominantTruth,
                      double dominantKm, boolean expansionAsked, boolean expansionGiven, double speedGivenKm) {
    }
}
