package hemline.reader;

import hemline.sweep.Sweep;
import java.util.LinkedHashMap;
import java.util.Map;

/** The sweeps used last, up to a number of bytes; safe for several threads. */
final class SweepCache {
    private static final long MOST_BYTES = 512L << 20;
    private static final int HEAP_PART = 8;

    private final long capacityBytes;
    private final Map<SweepTicket, Sweep> held = new LinkedHashMap<>(16, 0.75f, true);
    private long heldBytes;

    SweepCache(long capacityBytes) {
        this.capacityBytes = capacityBytes;
    }

    /** A cache of an eighth of the heap, at most 512 MB. */
    static SweepCache ofHeap() {
        return new SweepCache(Math.min(MOST_BYTES, Runtime.getRuntime().maxMemory() / HEAP_PART));
    }

    synchronized Sweep get(SweepTicket ticket) {
        return held.get(ticket);
    }

    synchronized void put(SweepTicket ticket, Sweep sweep) {
        if (bytes(sweep) > capacityBytes || held.put(ticket, sweep) != null) {
            return;
        }
        heldBytes += bytes(sweep);
        var oldest = held.entrySet().iterator();
        while (heldBytes > capacityBytes) {
            heldBytes -= bytes(oldest.next().getValue());
            oldest.remove();
        }
    }

    private static long bytes(Sweep sweep) {
        long gates = (long) sweep.rayCount() * sweep.gateCount();
        return 4 * gates * (sweep.velocity().isPresent() ? 2 : 1) + 24L * sweep.rayCount();
    }
}
