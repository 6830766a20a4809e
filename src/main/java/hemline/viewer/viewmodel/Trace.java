package hemline.viewer.viewmodel;

import java.util.List;
import java.util.Optional;

/**
 * One quantity of a track against time.
 *
 * @param name    what it is
 * @param unit    its unit
 * @param about   what the value and its band are, in a sentence
 * @param samples by rising time; may be empty
 * @param none    why there are no samples, in words; empty when there are
 */
public record Trace(String name, String unit, String about, List<Sample> samples, String none) {
    public Trace {
        samples = List.copyOf(samples);
    }

    /**
     * @param sweep  index of the sweep in the loop
     * @param timeMs ms since 1970-01-01T00:00Z
     * @param value  in the trace's unit
     * @param sd     standard deviation; NaN where there is none
     */
    public record Sample(int sweep, long timeMs, double value, double sd) {
        public double low() {
            return Double.isNaN(sd) ? value : value - 2 * sd;
        }

        public double high() {
            return Double.isNaN(sd) ? value : value + 2 * sd;
        }
    }

    /** The sample nearest in time. */
    public Optional<Sample> nearest(double timeMs) {
        return samples.stream().min((a, b) -> Double.compare(Math.abs(a.timeMs() - timeMs),
                Math.abs(b.timeMs() - timeMs)));
    }

    /** A sample in words, for a hover read-out. */
    public String words(Sample sample) {
        String band = Double.isNaN(sample.sd()) ? "" : " \u00b1 " + Words.number(2 * sample.sd(), 1);
        return Words.shortClock(sample.timeMs()) + "  " + Words.number(sample.value(), 1) + band + " " + unit;
    }
}
