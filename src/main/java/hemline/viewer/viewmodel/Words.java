package hemline.viewer.viewmodel;

import hemline.boundary.Speed;
import java.time.Instant;
import java.time.ZoneId;
import java.time.ZoneOffset;
import java.time.format.DateTimeFormatter;
import java.util.Locale;

/** Numbers and times as the viewer writes them; the same on every machine. */
public final class Words {
    /** What stands for a value that is not available. */
    public static final String NONE = "\u2013";
    public static final String METRES_PER_SECOND = "m s\u207b\u00b9";
    private static final DateTimeFormatter CLOCK = DateTimeFormatter.ofPattern("HH:mm:ss", Locale.ROOT);
    private static final DateTimeFormatter DATE = DateTimeFormatter.ofPattern("uuuu-MM-dd", Locale.ROOT);
    private static final DateTimeFormatter SHORT = DateTimeFormatter.ofPattern("HH:mm", Locale.ROOT);

    private Words() {
    }

    /** A number with so many decimals and a true minus sign; {@link #NONE} when not finite. */
    public static String number(double value, int decimals) {
        if (!Double.isFinite(value)) {
            return NONE;
        }
        String text = String.format(Locale.ROOT, "%." + decimals + "f", value);
        boolean zero = text.chars().noneMatch(c -> c >= '1' && c <= '9');
        return zero ? text.replace("-", "") : text.replace('-', '\u2212');
    }

    /** A whole compass bearing with three digits, for example 045\u00b0. */
    public static String bearing(double degrees) {
        if (!Double.isFinite(degrees)) {
            return NONE;
        }
        return String.format(Locale.ROOT, "%03d\u00b0", Math.floorMod(Math.round(degrees), 360L));
    }

    /** For example {@code 12.3 ± 1.2 m s⁻¹}, the second number two standard deviations. */
    public static String speed(Speed speed) {
        if (!speed.isKnown()) {
            return NONE;
        }
        return number(speed.speedMs(), 1) + " \u00b1 " + number(2 * speed.sdMs(), 1) + " " + METRES_PER_SECOND;
    }

    public static String clock(long timeMs) {
        return CLOCK.format(Instant.ofEpochMilli(timeMs).atOffset(ZoneOffset.UTC));
    }

    public static String shortClock(long timeMs) {
        return SHORT.format(Instant.ofEpochMilli(timeMs).atOffset(ZoneOffset.UTC));
    }

    public static String date(long timeMs) {
        return DATE.format(Instant.ofEpochMilli(timeMs).atOffset(ZoneOffset.UTC));
    }

    /** The time of day in a zone, with the zone's name. */
    public static String localClock(long timeMs, ZoneId zone) {
        return CLOCK.format(Instant.ofEpochMilli(timeMs).atZone(zone)) + " " + zone.getId();
    }

    /** A span in its largest two units, for example {@code 2 h 05 min}; the sign is dropped. */
    public static String span(long spanMs) {
        long seconds = Math.abs(spanMs) / 1000;
        if (seconds < 60) {
            return seconds + " s";
        }
        long minutes = seconds / 60;
        if (minutes < 60) {
            return minutes + " min";
        }
        long hours = minutes / 60;
        if (hours < 48) {
            return String.format(Locale.ROOT, "%d h %02d min", hours, minutes % 60);
        }
        return String.format(Locale.ROOT, "%,d days", hours / 24);
    }

    /** For example {@code 38.8794° N}. */
    public static String latitude(double degrees) {
        return number(Math.abs(degrees), 4) + "\u00b0 " + (degrees < 0 ? "S" : "N");
    }

    /** For example {@code 101.2280° W}. */
    public static String longitude(double degrees) {
        return number(Math.abs(degrees), 4) + "\u00b0 " + (degrees < 0 ? "W" : "E");
    }
}
