package hemline.reader;

import java.util.Arrays;
import java.util.Locale;

/** How the antenna moved during a sweep. */
public enum ScanMode {
    /** Round in azimuth at a fixed elevation, a full turn or a sector. */
    PPI("ppi"),
    /** Up and down in elevation at a fixed azimuth. */
    RHI("rhi"),
    /** Straight up. */
    VERTICAL("vertical"),
    /** Anything else: pointing, idle, calibration. */
    OTHER("other");

    private static final double VERTICAL_FROM_DEG = 80;
    private static final double WIDE_DEG = 5;

    private final String word;

    ScanMode(String word) {
        this.word = word;
    }

    public String word() {
        return word;
    }

    /**
     * The mode a file declares (CfRadial's {@code sweep_mode} words), unless the angles show otherwise; from the
     * angles alone where it declares none.
     */
    static ScanMode of(String declared, double[] azimuthDeg, double[] elevationDeg) {
        String mode = declared.strip().toLowerCase(Locale.ROOT);
        if (mode.contains("rhi") || mode.contains("elevation_surveillance")) {
            return RHI;
        }
        if (mode.contains("vert")) {
            return VERTICAL;
        }
        if (mode.contains("pointing") || mode.contains("idle") || mode.contains("calibration")
                || mode.contains("sunscan")) {
            return OTHER;
        }
        double[] sorted = Arrays.stream(elevationDeg).filter(Double::isFinite).sorted().toArray();
        if (sorted.length == 0) {
            return OTHER;
        }
        if (sorted[sorted.length / 2] >= VERTICAL_FROM_DEG) {
            return VERTICAL;
        }
        // The middle nine tenths, since antennas overshoot at the ends.
        int margin = sorted.length / 20;
        double rise = sorted[sorted.length - 1 - margin] - sorted[margin];
        return rise > WIDE_DEG && rise > turnedDeg(azimuthDeg) ? RHI : PPI;
    }

    /** The sum of the absolute steps in azimuth, degrees. */
    private static double turnedDeg(double[] azimuthDeg) {
        double turned = 0;
        for (int i = 1; i < azimuthDeg.length; i++) {
            double step = Math.abs(azimuthDeg[i] - azimuthDeg[i - 1]) % 360;
            turned += Math.min(step, 360 - step);
        }
        return turned;
    }
}
