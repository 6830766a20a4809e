package hemline.viewer.viewmodel;

import hemline.sweep.GateMask;
import hemline.sweep.Sweep;
import java.util.Optional;

/**
 * A sweep in memory.
 *
 * @param index its place in the loop, 0 the earliest
 * @param raw   as measured
 * @param mask  reasons per gate; empty before the loop is screened
 */
public record HeldSweep(int index, Sweep raw, Optional<GateMask> mask) {

    /** Roughly what it takes of the heap, bytes. */
    long bytes() {
        long gates = (long) raw.rayCount() * raw.gateCount();
        return gates * (4 + (raw.velocity().isPresent() ? 4 : 0) + (mask.isPresent() ? 1 : 0));
    }
}
