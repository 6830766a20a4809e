package hemline.simulation.making;

import hemline.simulation.random.Speckle;
import hemline.simulation.scene.Steps;
import org.apache.commons.math3.util.FastMath;

/**
 * How well a careful eye could see a stretch of front: 0 hidden, 0.5 just seen, 1 plain.
 *
 * <p>Contrast c = max(min(line, prominence), 0.8 min(step, clearing)), all in dB of the clean sweep with its noise floor
 * (see {@link Contrast}): what the front itself adds, as far as it also stands out from its surroundings. So rain, ground,
 * a blocked sector and noise all lower it by themselves. Noise s² = s₁² (1/n₁ + 1/n₂) + ½ t², with s₁ the speckle of one
 * gate, n₁ the gates in a patch of 3 km along the front and 1 km across, n₂ twice that for its surroundings, and t the
 * roughness of the background beside it. Then
 *
 * <pre>p = smooth((c − 0.5)/1.5) / (1 + exp(−1.5 (c/s − 3)))</pre>
 *
 * and 0 on a lost ray or where the beam centre is 1.5 km or more above the radar; {@link AlongLine} then averages along
 * the line. The constants are our own choice, set by
 * looking at pictures of sweeps; they have no other source.
 */
final class Detectability {
    static final double CEILING_M = 1500;
    private static final double PATCH_ALONG_KM = 3;
    private static final double PATCH_ACROSS_KM = 1;
    private static final double HALF_SEEN_RATIO = 3;

    private Detectability() {
    }

    /** dB. */
    static double contrastDb(double lineDb, double prominenceDb, double stepDb, double clearingDb) {
        double ridge = Math.min(lineDb, prominenceDb);
        double step = 0.8 * Math.min(stepDb, clearingDb);
        return Math.max(0, Math.max(ridge, step));
    }

    /**
     * dB.
     *
     * @param samples   independent samples of a gate
     * @param gateKm    length of a gate, km
     * @param rayKm     distance between rays there, km
     * @param textureDb roughness of the background, dB
     */
    static double noiseDb(int samples, double gateKm, double rayKm, double textureDb) {
        double gates = Math.max(1, PATCH_ALONG_KM * PATCH_ACROSS_KM / (gateKm * rayKm));
        double one = Speckle.ONE_SAMPLE_SD_DB / Math.sqrt(samples);
        return Math.sqrt(one * one * 1.5 / gates + 0.5 * textureDb * textureDb);
    }

    /**
     * Share from 0 to 1; never falls with the contrast.
     *
     * @param heightM beam centre above the radar, m
     */
    static double of(double contrastDb, double noiseDb, double heightM, boolean lost) {
        if (lost || heightM >= CEILING_M) {
            return 0;
        }
        double clear = 1 / (1 + FastMath.exp(-1.5 * (contrastDb / noiseDb - HALF_SEEN_RATIO)));
        return clear * Steps.smooth((contrastDb - 0.5) / 1.5);
    }
}
