package hemline.sweep;

import java.util.EnumSet;
import java.util.Set;

/** The reasons, per gate {@code [ray][gate]}, why it is masked; no reason means taken at face value. */
public final class GateMask {
    private final int gates;
    private final byte[] bits;

    /** @param bits one byte a gate, ray by ray, the reasons' bits joined; handed over, not copied */
    public GateMask(int rays, int gates, byte[] bits) {
        if (bits.length != (long) rays * gates) {
            throw new IllegalArgumentException(rays + " rays x " + gates + " gates do not match " + bits.length + " masks");
        }
        this.gates = gates;
        this.bits = bits;
    }

    /** A mask in which every gate is taken at face value. */
    public static GateMask clear(int rays, int gates) {
        return new GateMask(rays, gates, new byte[Math.multiplyExact(rays, gates)]);
    }

    /** The joined bits of a gate's reasons, 0 for none. */
    public int bitsAt(int ray, int gate) {
        return bits[ray * gates + gate] & 0xff;
    }

    public boolean is(int ray, int gate, MaskReason reason) {
        return (bits[ray * gates + gate] & reason.bit()) != 0;
    }

    public Set<MaskReason> reasonsAt(int ray, int gate) {
        Set<MaskReason> reasons = EnumSet.noneOf(MaskReason.class);
        for (MaskReason reason : MaskReason.values()) {
            if (is(ray, gate, reason)) {
                reasons.add(reason);
            }
        }
        return reasons;
    }
}
