package hemline.viewer.viewmodel;

import hemline.boundary.Meeting;
import hemline.boundary.Track;
import hemline.sweep.SweepFrame;
import hemline.workflow.LoopSession;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;

/**
 * Where everything of the rail lies: one tick a sweep at true time spacing, one bar a track, one mark a meeting.
 *
 * @param scale    time along it
 * @param sweepX   x of each sweep's tick, pixels
 * @param bars     one a track
 * @param meetings one a meeting
 * @param barsTop  y where the bars begin, pixels
 */
public record RailLayout(TimeScale scale, List<Double> sweepX, List<Bar> bars, List<Mark> meetings, double barsTop) {
    /** Room above the bars for times and ticks, pixels. */
    public static final double HEAD_PX = 34;
    private static final double SIDE_PX = 26;
    private static final double ROW_PX = 15;
    private static final double LEAST_ROW_PX = 3;

    public RailLayout {
        sweepX = List.copyOf(sweepX);
        bars = List.copyOf(bars);
        meetings = List.copyOf(meetings);
    }

    /** A track's bar, pixels. */
    public record Bar(Track track, double fromX, double toX, double y, double height) {
    }

    /** A meeting's mark, pixels. */
    public record Mark(Meeting meeting, double x, double y) {
    }

    public static RailLayout of(LoopSession session, double width, double height) {
        List<SweepFrame> frames = session.frames();
        long from = frames.get(0).meanTimeMs();
        long to = frames.get(frames.size() - 1).meanTimeMs();
        long span = Math.max(60_000, to - from);
        for (Meeting meeting : session.meetings()) {
            // An expected meeting may lie after the loop; a far one must not squeeze the sweeps.
            to = Math.max(to, Math.min(meeting.timeMs(), frames.get(frames.size() - 1).meanTimeMs() + span / 4));
        }
        TimeScale scale = new TimeScale(from, Math.max(from + 60_000, to), SIDE_PX, Math.max(SIDE_PX + 1,
                width - SIDE_PX));
        List<Double> ticks = frames.stream().map(f -> scale.x(f.meanTimeMs())).toList();
        List<Bar> bars = bars(session, scale, height);
        List<Mark> marks = session.meetings().stream()
                .filter(m -> m.timeMs() <= scale.toMs() && m.timeMs() >= scale.fromMs())
                .map(m -> new Mark(m, scale.x(m.timeMs()), HEAD_PX - 9)).toList();
        return new RailLayout(scale, ticks, bars, marks, HEAD_PX);
    }

    /** Bars go into the first row that is free; rows shrink until all fit. */
    private static List<Bar> bars(LoopSession session, TimeScale scale, double height) {
        List<Track> order = new ArrayList<>(session.tracks());
        order.sort(Comparator.comparingLong(Track::firstMs));
        List<Double> rowEnds = new ArrayList<>();
        List<Integer> rows = new ArrayList<>();
        for (Track track : order) {
            double start = scale.x(track.firstMs());
            int row = 0;
            while (row < rowEnds.size() && rowEnds.get(row) > start - 6) {
                row++;
            }
            double end = Math.max(start + 4, scale.x(track.lastMs()));
            if (row == rowEnds.size()) {
                rowEnds.add(end);
            } else {
                rowEnds.set(row, end);
            }
            rows.add(row);
        }
        double pitch = Math.max(LEAST_ROW_PX, Math.min(ROW_PX, (height - HEAD_PX - 4) / Math.max(1, rowEnds.size())));
        List<Bar> bars = new ArrayList<>();
        for (int i = 0; i < order.size(); i++) {
            double start = scale.x(order.get(i).firstMs());
            double end = Math.max(start + 4, scale.x(order.get(i).lastMs()));
            bars.add(new Bar(order.get(i), start, end, HEAD_PX + rows.get(i) * pitch, pitch - (pitch > 6 ? 2 : 1)));
        }
        return bars;
    }

    /** The sweep whose tick is nearest to an x. */
    public int sweepAt(double x) {
        int best = 0;
        for (int i = 1; i < sweepX.size(); i++) {
            if (Math.abs(sweepX.get(i) - x) < Math.abs(sweepX.get(best) - x)) {
                best = i;
            }
        }
        return best;
    }

    public Optional<Track> trackAt(double x, double y) {
        return bars.stream().filter(b -> x >= b.fromX() - 3 && x <= b.toX() + 3 && y >= b.y()
                && y <= b.y() + b.height() + 1).map(Bar::track).findFirst();
    }

    public Optional<Meeting> meetingAt(double x, double y) {
        return meetings.stream().filter(m -> Math.abs(m.x() - x) <= 8 && Math.abs(m.y() - y) <= 8).map(Mark::meeting)
                .findFirst();
    }
}
