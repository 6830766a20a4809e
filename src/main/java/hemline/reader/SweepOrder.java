package hemline.reader;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;

/** Sweeps of one radar in order of time, each look at the sky once, with velocities found in sister files. */
final class SweepOrder {
    private static final long SAME_START_MS = 2000;
    private static final long DONOR_WITHIN_MS = 90_000;

    private SweepOrder() {
    }

    /** @param sameAs for a sweep that was dropped, the sweep that stands for it */
    record Dropped(SweepTicket dropped, SweepTicket sameAs) {
    }

    /** Orders by start; puts what is dropped into {@code dropped}. */
    static List<SweepTicket> ordered(List<SweepTicket> tickets, List<Dropped> dropped) {
        List<SweepTicket> best = new ArrayList<>(tickets);
        // Of two recordings of one sweep the better field stands, then the one with velocity, then the earlier input.
        best.sort(Comparator.comparingInt(SweepTicket::fieldRank).thenComparing(t -> !t.hasVelocity()));
        List<SweepTicket> kept = new ArrayList<>();
        for (SweepTicket ticket : best) {
            Optional<SweepTicket> same = kept.stream().filter(k -> sameLook(k, ticket)).findFirst();
            if (same.isPresent()) {
                dropped.add(new Dropped(ticket, same.get()));
            } else {
                kept.add(ticket);
            }
        }
        kept.sort(Comparator.comparingLong(SweepTicket::startMs).thenComparingLong(SweepTicket::endMs)
                .thenComparing(t -> t.file().toString()).thenComparingInt(t -> t.cut().reflectivity()));
        return kept;
    }

    /** One antenna cannot make two sweeps at once: same elevation and overlapping by half is the same sweep. */
    static boolean sameLook(SweepTicket a, SweepTicket b) {
        if (Math.abs(a.elevationDeg() - b.elevationDeg()) > LowSweeps.SAME_ELEVATION_DEG) {
            return false;
        }
        long overlap = Math.min(a.endMs(), b.endMs()) - Math.max(a.startMs(), b.startMs());
        long shorter = Math.min(a.endMs() - a.startMs(), b.endMs() - b.startMs());
        return Math.abs(a.startMs() - b.startMs()) <= SAME_START_MS || shorter > 0 && 2 * overlap > shorter;
    }

    /** Gives each sweep without velocity that of the sister sweep nearest in time, where there is one. */
    static List<SweepTicket> withDonors(List<SweepTicket> tickets, List<SweepTicket.Donor> donors) {
        return tickets.stream().map(ticket -> ticket.hasVelocity() ? ticket : donors.stream()
                .filter(d -> Radars.same(d.site(), ticket.site())
                        && Math.abs(d.elevationDeg() - ticket.elevationDeg()) <= LowSweeps.SAME_ELEVATION_DEG
                        && Math.abs(d.startMs() - ticket.startMs()) <= DONOR_WITHIN_MS)
                .min(Comparator.comparingLong(d -> Math.abs(d.startMs() - ticket.startMs())))
                .map(ticket::withDonor).orElse(ticket)).toList();
    }
}
