package hemline.export;

import java.util.Locale;
import java.util.Objects;

/**
 * One input of a run and what became of it.
 *
 * @param path    as given, with {@code /} between parts
 * @param sha256  of its bytes, in hexadecimal; empty when it could not be read at all
 * @param bytes   its size; −1 when unknown
 * @param format  what it turned out to be; empty when not recognised
 * @param fate    what became of it
 * @param sweeps  sweeps of the loop taken from it
 * @param reason  why it was not used, or not all of it, and how to mend that; empty when all is well
 */
public record RunInput(String path, String sha256, long bytes, String format, Fate fate, int sweeps, String reason) {
    public RunInput {
        Objects.requireNonNull(path);
        Objects.requireNonNull(fate);
    }

    /** What became of an input. */
    public enum Fate {
        /** At least one of its sweeps is in the loop. */
        USED,
        /** It can be read and holds nothing for this loop: another radar, a duplicate, no low sweep. */
        LEFT_OUT,
        /** It cannot be read. */
        UNREADABLE;

        /** The word for this fate in {@code run.json}. */
        public String label() {
            return name().toLowerCase(Locale.ROOT).replace('_', '-');
        }
    }
}
