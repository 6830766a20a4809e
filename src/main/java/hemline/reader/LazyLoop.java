package hemline.reader;

import hemline.sweep.Loop;
import hemline.sweep.RadarSite;
import hemline.sweep.Sweep;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.util.List;

/** A loop that reads its sweeps from their files when asked for, keeping those used last. */
final class LazyLoop implements Loop {
    private final List<SweepTicket> tickets;
    private final Object[] locks;
    private final RadarSite site;
    private final FieldChoice choice;
    private final SweepCache cache;

    LazyLoop(List<SweepTicket> tickets, RadarSite site, FieldChoice choice, SweepCache cache) {
        this.tickets = List.copyOf(tickets);
        this.site = site;
        this.choice = choice;
        this.cache = cache;
        locks = new Object[tickets.size()];
        java.util.Arrays.setAll(locks, i -> new Object());
    }

    @Override
    public int size() {
        return tickets.size();
    }

    /** @throws UncheckedIOException if the file, sound when the loop was opened, can no longer be read */
    @Override
    public Sweep sweep(int index) {
        SweepTicket ticket = tickets.get(index);
        synchronized (locks[index]) {
            Sweep sweep = cache.get(ticket);
            if (sweep == null) {
                sweep = load(ticket);
                cache.put(ticket, sweep);
            }
            return new Sweep(site, sweep.source(), sweep.elevationDeg(), sweep.beamWidthDeg(),
                    sweep.firstGateCentreM(), sweep.gateSpacingM(), sweep.rays(), sweep.reflectivity(),
                    sweep.velocity(), sweep.nyquistMs());
        }
    }

    private Sweep load(SweepTicket ticket) {
        try {
            return ticket.load(choice);
        } catch (UnreadableFileException e) {
            throw new UncheckedIOException(new IOException(e.getMessage() + " (it could be read when the loop was "
                    + "opened)", e));
        }
    }
}
