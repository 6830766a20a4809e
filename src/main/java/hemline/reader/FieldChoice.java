package hemline.reader;

import java.util.Objects;
import java.util.Optional;

/**
 * Which fields to take.
 *
 * @param reflectivity name of the reflectivity field; empty to choose by standard name, quantity and known names
 * @param withVelocity whether to carry the radial velocity along where present
 */
public record FieldChoice(Optional<String> reflectivity, boolean withVelocity) {
    public FieldChoice {
        Objects.requireNonNull(reflectivity);
    }

    /** The best reflectivity, and the velocity where present. */
    public static FieldChoice automatic() {
        return new FieldChoice(Optional.empty(), true);
    }

    /** The named reflectivity, and the velocity where present. */
    public static FieldChoice named(String reflectivity) {
        return new FieldChoice(Optional.of(reflectivity), true);
    }
}
