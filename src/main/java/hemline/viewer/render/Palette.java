package hemline.viewer.render;

import hemline.sweep.Field;
import hemline.sweep.MaskReason;
import hemline.sweep.ReflectivityScale;
import hemline.viewer.viewmodel.PlaneField;

/** The 256 colours a field is drawn in, and which of them a value gets. */
final class Palette {
    /** Level of a gate that shows nothing: not measured, or taken away. */
    static final int NOTHING = 0;
    /** Level of a gate below detection. */
    static final int BELOW = 1;
    /** Reasons for which a screened sweep lacks a gate; deep convection and height stay in view as context. */
    static final int REMOVING_BITS = MaskReason.CLUTTER.bit() | MaskReason.SPIKE.bit() | MaskReason.SPECKLE.bit()
            | MaskReason.SECOND_TRIP.bit() | MaskReason.BLOCKED.bit();
    private static final double LOWEST_DBZ = -32;
    private static final double STEPS_PER_DB = 2;
    private static final int FIRST = 2;
    private static final int FIRST_REASON = 2;
    private static final int FIRST_DIM = FIRST_REASON + 8;

    private final int[] argb;

    private Palette(int[] argb) {
        this.argb = argb;
    }

    /** Opaque or fully transparent, so premultiplied and plain are the same. */
    int[] argb() {
        return argb;
    }

    static Palette of(PlaneField field) {
        int[] colours = new int[256];
        ReflectivityScale scale = ReflectivityScale.standard();
        colours[BELOW] = ReflectivityScale.BELOW_DETECTION_ARGB;
        for (int level = FIRST; level < 256; level++) {
            colours[level] = switch (field) {
                case VELOCITY -> VelocityScale.argb((level - 129) * VelocityScale.LARGEST_MS / 126);
                case REMOVED -> removedColour(level);
                default -> scale.argb((float) (LOWEST_DBZ + (level - FIRST) / STEPS_PER_DB));
            };
        }
        return new Palette(colours);
    }

    private static int removedColour(int level) {
        if (level < FIRST_DIM) {
            int reason = level - FIRST_REASON;
            return reason < MaskReason.values().length ? ReasonColours.argb(MaskReason.values()[reason]) : 0;
        }
        int grey = Math.min(0x70, 0x16 + (level - FIRST_DIM));
        return 0xff000000 | grey << 16 | grey << 8 | grey + 4;
    }

    static int reflectivityLevel(float dbz) {
        if (!Field.isMeasured(dbz)) {
            return NOTHING;
        }
        if (!Field.isEcho(dbz)) {
            return BELOW;
        }
        return clamp(FIRST + Math.round((dbz - LOWEST_DBZ) * STEPS_PER_DB));
    }

    static int velocityLevel(float velocityMs) {
        if (Float.isNaN(velocityMs)) {
            return NOTHING;
        }
        if (Float.isInfinite(velocityMs)) {
            return BELOW;
        }
        return clamp(129 + Math.round(velocityMs / VelocityScale.LARGEST_MS * 126));
    }

    /** The first of a gate's reasons in the order of {@link MaskReason}; the rest of the sweep dimmed. */
    static int removedLevel(float dbz, int maskBits) {
        if (maskBits != 0) {
            return FIRST_REASON + Integer.numberOfTrailingZeros(maskBits);
        }
        if (!Field.isEcho(dbz)) {
            return Field.isMeasured(dbz) ? BELOW : NOTHING;
        }
        return clamp(FIRST_DIM + Math.max(0, Math.round(dbz - LOWEST_DBZ)));
    }

    private static int clamp(long level) {
        return (int) Math.max(FIRST, Math.min(255, level));
    }
}
