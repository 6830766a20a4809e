package hemline.export;

import java.util.Locale;
import java.util.Objects;

/**
 * One input of a run and what became of it.
 *
 * @param path   as given, with {@code /} between parts
 * @param sha256 of its bytes, in hexadecimal; empty when it could not be read at all
 * @param fate   what became of it
 * @param sweeps sweeps of the loop taken from it
 * @param reason why it was not used, or what had to be assumed; empty when all is well
 */
public record RunInput(String path, String sha256, Fate fate, int sweeps, String reason) {
    public RunInput {
        Objects.requireNonNull(path);
        Objects.requireNonNull(sha256);
        Objects.requireNonNull(fate);
        Objects.requireNonNull(reason);
    }

    /** What became of an input. */
    public enum Fate {
        /** Something of it is in the loop. */
        READ,
        /** It cannot be read or not be used. */
        REFUSED,
        /** All it holds is in the loop from another file. */
        DUPLICATE,
        /** It is no radar file and stood beside some. */
        SKIPPED;

        /** The word for this fate in {@code run.json}. */
        public String label() {
            return name().toLowerCase(Locale.ROOT);
        }
    }
}
