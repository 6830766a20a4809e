package hemline.simulation.making;

import hemline.boundary.truth.Truth.TruthVertex;
import hemline.geometry.Point;
import hemline.simulation.radar.RadarSpec;
import java.util.ArrayList;
import java.util.List;

/**
 * An eye follows a line: detectability is averaged along it over some 3 km (so a lost ray or a gap of a kilometre is
 * bridged), a stretch that would be seen over less than 4 km is not recognised as one, and above the height ceiling
 * nothing is.
 */
final class AlongLine {
    private static final double REACH_KM = 1.7;
    private static final double SHORTEST_KM = 4;
    private static final double SEEN = 0.5;
    private static final double NOT_RECOGNISED = 0.45;
    private final RadarSpec radar;

    AlongLine(RadarSpec radar) {
        this.radar = radar;
    }

    List<TruthVertex> smoothed(List<TruthVertex> line) {
        double[] mean = new double[line.size()];
        for (int i = 0; i < mean.length; i++) {
            mean[i] = aboveCeiling(line.get(i)) ? 0 : meanNear(line, i);
        }
        for (int from = 0; from < mean.length; from++) {
            if (mean[from] >= SEEN) {
                int to = from;
                while (to + 1 < mean.length && mean[to + 1] >= SEEN) {
                    to++;
                }
                if (lengthKm(line, from, to) < SHORTEST_KM) {
                    for (int i = from; i <= to; i++) {
                        mean[i] = NOT_RECOGNISED;
                    }
                }
                from = to;
            }
        }
        List<TruthVertex> result = new ArrayList<>(line.size());
        for (int i = 0; i < mean.length; i++) {
            TruthVertex v = line.get(i);
            result.add(new TruthVertex(v.xKm(), v.yKm(), v.timeMs(), TruthMaker.rounded(mean[i], 3), v.peakDbz(),
                    v.normalBearingDeg(), v.speedMs()));
        }
        return result;
    }

    private static double meanNear(List<TruthVertex> line, int at) {
        double sum = 0;
        int count = 0;
        for (int step = -1; step <= 1; step += 2) {
            for (int i = step < 0 ? at : at + 1; i >= 0 && i < line.size(); i += step) {
                if (distanceKm(line.get(i), line.get(at)) > REACH_KM) {
                    break;
                }
                sum += line.get(i).detectability();
                count++;
            }
        }
        return sum / count;
    }

    private boolean aboveCeiling(TruthVertex vertex) {
        double groundM = 1000 * new Point(vertex.xKm(), vertex.yKm()).lengthKm();
        return radar.beam().heightAboveAntennaM(radar.beam().slantRangeM(groundM)) >= Detectability.CEILING_M;
    }

    static double lengthKm(List<TruthVertex> line, int from, int to) {
        double length = 0;
        for (int i = from + 1; i <= to; i++) {
            length += distanceKm(line.get(i - 1), line.get(i));
        }
        return length;
    }

    private static double distanceKm(TruthVertex a, TruthVertex b) {
        return new Point(a.xKm(), a.yKm()).distanceKm(new Point(b.xKm(), b.yKm()));
    }
}
