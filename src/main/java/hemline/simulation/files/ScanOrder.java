package hemline.simulation.files;

import hemline.simulation.radar.Packing;
import hemline.sweep.Field;
import hemline.sweep.Sweep;
import java.time.Instant;
import java.time.ZoneOffset;
import java.time.format.DateTimeFormatter;
import java.util.Comparator;
import java.util.Locale;
import java.util.stream.IntStream;

/** A sweep's rays in the order in which they were taken, as CfRadial stores them, and its values as packed numbers. */
final class ScanOrder {
    private static final DateTimeFormatter SECOND =
            DateTimeFormatter.ofPattern("yyyy-MM-dd'T'HH:mm:ss'Z'", Locale.ROOT).withZone(ZoneOffset.UTC);
    private final Sweep sweep;
    private final int[] ranks;

    ScanOrder(Sweep sweep) {
        this.sweep = sweep;
        ranks = IntStream.range(0, sweep.rayCount()).boxed().sorted(Comparator.comparingLong(r -> sweep.rays().timeMs(r)))
                .mapToInt(Integer::intValue).toArray();
    }

    int rays() {
        return ranks.length;
    }

    /** Place by azimuth of the ray taken {@code i}-th. */
    int rank(int i) {
        return ranks[i];
    }

    /** The whole second at or before the first ray, ms since 1970-01-01T00:00Z. */
    long originMs() {
        return Math.floorDiv(sweep.startMs(), 1000) * 1000;
    }

    /** ISO 8601, whole seconds. */
    static String iso(long ms) {
        return SECOND.format(Instant.ofEpochMilli(ms));
    }

    double[] secondsAfterOrigin() {
        double[] seconds = new double[ranks.length];
        for (int i = 0; i < seconds.length; i++) {
            seconds[i] = (sweep.rays().timeMs(ranks[i]) - originMs()) / 1000.0;
        }
        return seconds;
    }

    float[] azimuths() {
        float[] azimuth = new float[ranks.length];
        for (int i = 0; i < azimuth.length; i++) {
            azimuth[i] = (float) sweep.rays().azimuthDeg(ranks[i]);
        }
        return azimuth;
    }

    float[] elevations() {
        float[] elevation = new float[ranks.length];
        for (int i = 0; i < elevation.length; i++) {
            elevation[i] = (float) sweep.rays().elevationDeg(ranks[i]);
        }
        return elevation;
    }

    float[] ranges() {
        float[] range = new float[sweep.gateCount()];
        for (int g = 0; g < range.length; g++) {
            range[g] = (float) sweep.slantRangeM(g);
        }
        return range;
    }

    /** Numbers {@code [ray as taken][gate]}. */
    short[][] shorts(Field field, Packing packing) {
        short[][] numbers = new short[ranks.length][field.gates()];
        for (int i = 0; i < ranks.length; i++) {
            for (int g = 0; g < field.gates(); g++) {
                numbers[i][g] = (short) packing.pack(field.at(ranks[i], g));
            }
        }
        return numbers;
    }

    /** The same in one byte; packings of one byte are shifted by 128 into the signed bytes of netCDF. */
    byte[][] signedBytes(Field field, Packing packing) {
        byte[][] numbers = new byte[ranks.length][field.gates()];
        for (int i = 0; i < ranks.length; i++) {
            for (int g = 0; g < field.gates(); g++) {
                numbers[i][g] = (byte) (packing.pack(field.at(ranks[i], g)) - CfField.BYTE_SHIFT);
            }
        }
        return numbers;
    }
}
