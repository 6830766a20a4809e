package hemline.kinematics;

import hemline.geometry.PointGrid;
import java.util.Map;
import java.util.TreeMap;

/**
 * Where another track's line, moving the other way, is so near that the two cannot be told apart: a wrong match there
 * would cost the sum of both speeds.
 */
final class OpposedLines {
    private final TrackPoints[] tracks;
    private final Map<Integer, int[]>[] ranges;
    private final double withinKm;

    @SuppressWarnings({"unchecked", "rawtypes"})
    OpposedLines(TrackPoints[] tracks, double withinKm) {
        this.tracks = tracks;
        this.withinKm = withinKm;
        ranges = new Map[tracks.length];
        for (int a = 0; a < tracks.length; a++) {
            ranges[a] = new TreeMap<>();
            for (int g = 0; g < tracks[a].gridCount(); g++) {
                ranges[a].put(tracks[a].sweepsHeld[g], new int[] {g});
            }
        }
    }

    /** Whether another track's opposed line passes near a vertex in its own sweep. */
    boolean near(int track, int i) {
        TrackPoints own = tracks[track];
        boolean[] found = new boolean[1];
        for (int other = 0; other < tracks.length && !found[0]; other++) {
            if (other == track) {
                continue;
            }
            int[] g = ranges[other].get(own.sweep[i]);
            if (g == null) {
                continue;
            }
            TrackPoints theirs = tracks[other];
            PointGrid grid = theirs.grid(g[0]);
            grid.within(own.x[i], own.y[i], withinKm, j -> {
                double dot = own.normalX[i] * theirs.normalX[j] + own.normalY[i] * theirs.normalY[j];
                if (dot < 0.3) {
                    found[0] = true;
                }
            });
        }
        return found[0];
    }
}
