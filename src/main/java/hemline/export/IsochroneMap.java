package hemline.export;

import hemline.boundary.Meeting;
import hemline.boundary.Origin;
import hemline.boundary.Track;
import hemline.boundary.TrackPiece;
import hemline.geometry.Point;
import hemline.pipeline.Analysis;
import java.util.List;
import java.util.SortedMap;

/** All boundaries at all sweeps on white paper, as SVG: later lines stronger, the last one labelled. */
final class IsochroneMap {
    private static final int SIZE = 640;

    private final PlaneView view;
    private final Svg svg = new Svg(SIZE, SIZE);

    private IsochroneMap(double halfKm) {
        view = new PlaneView(new Point(0, 0), halfKm, 0, 0, SIZE);
    }

    static String draw(Analysis analysis, double ceilingM) {
        IsochroneMap map = new IsochroneMap(PlaneExtent.halfKm(analysis, ceilingM));
        map.rings();
        for (int i = 0; i < analysis.tracks().size(); i++) {
            map.track(analysis.tracks().get(i), PaperInk.track(i));
        }
        analysis.meetings().forEach(map::meeting);
        return map.svg.drawing("Map of the boundaries at each sweep, north up");
    }

    private void rings() {
        double step = PlaneExtent.ringStepKm(view.halfKm());
        Point radar = new Point(0, 0);
        for (double km = step; km < view.halfKm() * 1.42; km += step) {
            svg.circle(view.x(radar), view.y(radar), km * view.pxPerKm(), PaperInk.GRID, 1, "");
            Point at = Point.towards(45).times(km);
            svg.words(Numbers.fixed(km, 0) + " km", view.x(at) + 3, view.y(at) - 3, 11, PaperInk.FAINT, "start");
        }
        svg.circle(view.x(radar), view.y(radar), 3, PaperInk.WORDS, 1.5, "");
    }

    private void track(Track track, String colour) {
        SortedMap<Integer, List<TrackPiece>> sweeps = track.bySweep();
        int first = sweeps.firstKey();
        int last = sweeps.lastKey();
        sweeps.forEach((sweep, pieces) -> {
            double age = last == first ? 0 : (double) (last - sweep) / (last - first);
            for (TrackPiece piece : pieces) {
                svg.line(pixels(piece.points()), colour, sweep == last ? 2.4 : 1.2, 1 - 0.65 * age,
                        piece.origin() == Origin.HAND ? "7 4" : "");
            }
        });
        TrackPiece shown = sweeps.get(last).get(0);
        Point at = shown.vertices().get(shown.vertices().size() / 2).position();
        svg.words(track.id(), view.x(at) + 6, view.y(at) - 6, 13, colour, "start");
    }

    private void meeting(Meeting meeting) {
        double x = view.x(meeting.place());
        double y = view.y(meeting.place());
        double[][] diamond = {{x, y - 7}, {x + 7, y}, {x, y + 7}, {x - 7, y}, {x, y - 7}};
        if (meeting.status() == Meeting.Status.OBSERVED) {
            svg.area(diamond, PaperInk.WORDS, 1);
        }
        svg.line(diamond, PaperInk.WORDS, 1.6, 1, "");
        svg.words(meeting.id(), x + 10, y + 4, 12, PaperInk.WORDS, "start");
    }

    private double[][] pixels(List<Point> points) {
        return points.stream().map(p -> new double[] {view.x(p), view.y(p)}).toArray(double[][]::new);
    }
}
