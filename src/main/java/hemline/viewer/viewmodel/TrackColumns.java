package hemline.viewer.viewmodel;

import hemline.boundary.ArcHistory;
import hemline.boundary.BoundaryKind;
import hemline.boundary.Origin;
import hemline.boundary.Track;
import java.util.List;
import java.util.function.ToDoubleFunction;

/** The columns of the ledger's tracks. */
public final class TrackColumns {
    private TrackColumns() {
    }

    public static List<LedgerColumn<Track>> all() {
        String ms = Words.METRES_PER_SECOND;
        return List.of(
                LedgerColumn.text("Track", "Its name, short and stable within a run", Track::id),
                LedgerColumn.number("Speed", ms, "Speed of the whole track along its bearing", 1,
                        t -> t.speed().speedMs()),
                LedgerColumn.number("\u00b1 sd", ms, "One standard deviation of the speed", 2, t -> t.speed().sdMs()),
                LedgerColumn.of("Toward", "", "Compass bearing it moves toward", Track::bearingDeg,
                        t -> Words.bearing(t.bearingDeg())),
                LedgerColumn.number("Length", "km", "Length in its longest sweep", 0, Track::maxLengthKm),
                LedgerColumn.of("From", "UTC", "Time of its first ray", Track::firstMs,
                        t -> Words.shortClock(t.firstMs())),
                LedgerColumn.of("To", "UTC", "Time of its last ray", Track::lastMs, t -> Words.shortClock(t.lastMs())),
                LedgerColumn.number("Sweeps", "", "Number of sweeps it is present in", 0, Track::sweepCount),
                LedgerColumn.number("Expansion", ms, "Growth of the radius of the arc fitted through time", 1,
                        arc(a -> a.expansion().speedMs())),
                LedgerColumn.number("\u00b1 sd exp.", ms, "One standard deviation of the expansion", 2,
                        arc(a -> a.expansion().sdMs())),
                LedgerColumn.number("Radius", "km", "Radius of the fitted arc at its last sweep", 1,
                        arc(a -> a.radii().get(a.radii().size() - 1).radiusKm())),
                LedgerColumn.text("Kind", "Thin line, or step at the rim of a clear-air arc", TrackColumns::kindWords),
                LedgerColumn.text("Origin", "Found by the program, or drawn by hand", TrackColumns::originWords),
                LedgerColumn.number("Score", "", "What the decision to keep it rested on; larger is surer", 1,
                        Track::score));
    }

    private static ToDoubleFunction<Track> arc(ToDoubleFunction<ArcHistory> value) {
        return track -> track.arc().isPresent() ? value.applyAsDouble(track.arc().get()) : Double.NaN;
    }

    static String kindWords(Track track) {
        boolean line = track.pieces().stream().anyMatch(p -> p.kind() == BoundaryKind.THIN_LINE);
        boolean arc = track.pieces().stream().anyMatch(p -> p.kind() == BoundaryKind.ARC);
        return line && arc ? "both" : line ? BoundaryKind.THIN_LINE.label() : BoundaryKind.ARC.label();
    }

    static String originWords(Track track) {
        boolean hand = track.pieces().stream().anyMatch(p -> p.origin() == Origin.HAND);
        boolean auto = track.pieces().stream().anyMatch(p -> p.origin() == Origin.AUTO);
        return hand && auto ? "found, corrected" : hand ? "hand" : "found";
    }
}
