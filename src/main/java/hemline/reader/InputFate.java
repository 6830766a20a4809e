package hemline.reader;

import java.nio.file.Path;
import java.util.Objects;

/**
 * What became of one input file.
 *
 * @param path        the file as given, or as found in a given folder
 * @param sha256      SHA-256 of its bytes, lower-case hexadecimal; empty when it could not be read at all
 * @param fate        what became of it
 * @param reason      why it was not taken, or what had to be assumed; may be empty for a file that was read
 * @param sweepsTaken sweeps of it in the loop
 */
public record InputFate(Path path, String sha256, Fate fate, String reason, int sweepsTaken) {
    /** What can become of an input. */
    public enum Fate {
        /** Its sweeps, or its velocities, are in the loop. */
        READ,
        /** It cannot be read or not be used: reported as a fault of the input. */
        REFUSED,
        /** All its sweeps are in the loop from another file. */
        DUPLICATE,
        /** Text or a picture found beside radar files in a folder: no fault. */
        SKIPPED
    }

    public InputFate {
        Objects.requireNonNull(path);
        Objects.requireNonNull(sha256);
        Objects.requireNonNull(fate);
        Objects.requireNonNull(reason);
    }
}
