package hemline.export;

import hemline.boundary.Meeting;
import hemline.boundary.Track;
import hemline.boundary.TrackPiece;
import hemline.geometry.Point;
import hemline.pipeline.Analysis;
import hemline.sweep.Sweep;
import hemline.sweep.SweepFrame;
import java.awt.Color;
import java.awt.Graphics2D;
import java.awt.image.BufferedImage;
import java.util.List;
import java.util.SortedMap;

/** Draws pictures of a run: each sweep with what was found in it, and one map of all boundaries through time. */
public final class Pictures {
    private static final int PLANE_PX = 960;
    private static final int TOP_PX = 52;
    private static final int LEFT_PX = 16;
    private static final int RIGHT_PX = 84;
    private static final int BOTTOM_PX = 34;
    private static final double OVERVIEW_OPACITY = 0.55;

    private final Analysis analysis;
    private final double ceilingM;
    private final PlaneView view;

    /** @param ceilingM height ceiling above the radar, m */
    public Pictures(Analysis analysis, double ceilingM) {
        this.analysis = analysis;
        this.ceilingM = ceilingM;
        this.view = new PlaneView(new Point(0, 0), PlaneExtent.halfKm(analysis, ceilingM), LEFT_PX, TOP_PX, PLANE_PX);
    }

    /** One sweep of the loop with its boundaries, their motion, and the meetings up to its end. */
    public BufferedImage sweep(int index, Sweep sweep) {
        BufferedImage picture = blank();
        Graphics2D graphics = picture.createGraphics();
        Ink ink = new Ink(graphics);
        SweepLayer.paint(picture, view, sweep, 1);
        PlaneLayer.paint(ink, view, PlaneExtent.ceilingRangeKm(sweep.beam(), ceilingM));
        graphics.clipRect(view.leftPx(), view.topPx(), view.sizePx(), view.sizePx());
        TrackLayer layer = new TrackLayer(ink, view);
        for (int i = 0; i < analysis.tracks().size(); i++) {
            Track track = analysis.tracks().get(i);
            List<TrackPiece> pieces = track.bySweep().get(index);
            if (pieces != null) {
                layer.stretches(pieces, Ink.track(i), 2);
                layer.arrows(pieces, Ink.track(i));
                layer.label(track, pieces, Ink.track(i));
            }
        }
        for (Meeting meeting : analysis.meetings()) {
            if (meeting.timeMs() <= sweep.endMs()) {
                layer.meeting(meeting);
            }
        }
        graphics.setClip(null);
        frame(picture, ink, "Sweep " + index + " of 0–" + (analysis.frames().size() - 1) + ", "
                + Numbers.fixed(sweep.elevationDeg(), 2) + "°, " + Times.toMinute(sweep.middleMs()));
        graphics.dispose();
        return picture;
    }

    /** All boundaries at all sweeps, the later the brighter, over one sweep. */
    public BufferedImage overview(Sweep under) {
        BufferedImage picture = blank();
        Graphics2D graphics = picture.createGraphics();
        Ink ink = new Ink(graphics);
        SweepLayer.paint(picture, view, under, OVERVIEW_OPACITY);
        PlaneLayer.paint(ink, view, PlaneExtent.ceilingRangeKm(under.beam(), ceilingM));
        graphics.clipRect(view.leftPx(), view.topPx(), view.sizePx(), view.sizePx());
        TrackLayer layer = new TrackLayer(ink, view);
        for (int i = 0; i < analysis.tracks().size(); i++) {
            isochrones(layer, analysis.tracks().get(i), Ink.track(i));
        }
        analysis.meetings().forEach(layer::meeting);
        graphics.setClip(null);
        List<SweepFrame> frames = analysis.frames();
        frame(picture, ink, "Boundaries at " + frames.size() + " sweeps, "
                + Times.toMinute(frames.get(0).meanTimeMs()) + " to "
                + Times.toMinute(frames.get(frames.size() - 1).meanTimeMs()));
        graphics.dispose();
        return picture;
    }

    private static void isochrones(TrackLayer layer, Track track, Color color) {
        SortedMap<Integer, List<TrackPiece>> sweeps = track.bySweep();
        int first = sweeps.firstKey();
        int last = sweeps.lastKey();
        sweeps.forEach((sweep, pieces) -> {
            double age = last == first ? 0 : (double) (last - sweep) / (last - first);
            layer.stretches(pieces, Ink.faded(color, 1 - 0.7 * age), sweep == last ? 2.4 : 1.2);
        });
        layer.arrows(sweeps.get(last), color);
        layer.label(track, sweeps.get(last), color);
    }

    private void frame(BufferedImage picture, Ink ink, String title) {
        ink.words(analysis.site().name() + " · " + title, LEFT_PX, 24, 13, Ink.WORDS);
        ink.words("Arrows: way of ten minutes. Diamonds: meetings, filled when observed.", LEFT_PX, 43, 9,
                Ink.FAINT_WORDS);
        ScaleLegend.paint(picture, ink, LEFT_PX + PLANE_PX + 16, TOP_PX + 24, PLANE_PX - 48);
        ink.words("Guidance, not a warning. Nothing is claimed where the beam is more than "
                + Numbers.fixed(ceilingM, 0) + " m above the radar.", LEFT_PX, TOP_PX + PLANE_PX + 21, 10,
                Ink.FAINT_WORDS);
    }

    private static BufferedImage blank() {
        BufferedImage picture = new BufferedImage(LEFT_PX + PLANE_PX + RIGHT_PX, TOP_PX + PLANE_PX + BOTTOM_PX,
                BufferedImage.TYPE_INT_RGB);
        Graphics2D graphics = picture.createGraphics();
        graphics.setColor(Ink.PAPER);
        graphics.fillRect(0, 0, picture.getWidth(), picture.getHeight());
        graphics.dispose();
        return picture;
    }
}
