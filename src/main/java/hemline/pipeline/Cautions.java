package hemline.pipeline;

import hemline.sweep.RadarSite;
import hemline.sweep.SweepFrame;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Locale;

/** What a user must know before trusting a result, from the loop itself. */
final class Cautions {
    /** A gap between sweeps counts as a hole when it is this many times the usual interval. */
    private static final double HOLE = 1.8;

    private Cautions() {
    }

    static List<String> of(RadarSite site, List<SweepFrame> frames, Settings settings) {
        List<String> cautions = new ArrayList<>();
        if (site.position().isEmpty()) {
            cautions.add("The files do not say where the radar stands: places are given in km from the radar only; "
                    + "give --position to have latitude and longitude.");
        }
        if (Double.isNaN(site.altitudeM())) {
            cautions.add("The files do not say how high the radar stands: beam heights are above the antenna.");
        }
        if (frames.size() < settings.tracking().minSweeps()) {
            cautions.add("The loop has " + frames.size() + " of the " + settings.tracking().minSweeps()
                    + " sweeps that a boundary must be seen in: none can be followed.");
        }
        holes(frames, cautions);
        return cautions;
    }

    private static void holes(List<SweepFrame> frames, List<String> cautions) {
        if (frames.size() < 3) {
            return;
        }
        double[] steps = new double[frames.size() - 1];
        for (int i = 0; i < steps.length; i++) {
            steps[i] = (frames.get(i + 1).meanTimeMs() - frames.get(i).meanTimeMs()) / 60_000.0;
        }
        double[] sorted = steps.clone();
        Arrays.sort(sorted);
        double usual = sorted[sorted.length / 2];
        double longest = sorted[sorted.length - 1];
        long holes = Arrays.stream(steps).filter(step -> step > HOLE * usual).count();
        if (holes > 0) {
            cautions.add(String.format(Locale.ROOT, "The loop has %s of up to %.0f min between sweeps that usually "
                    + "follow each other after %.0f min.", holes == 1 ? "a gap" : holes + " gaps", longest, usual));
        }
    }
}
