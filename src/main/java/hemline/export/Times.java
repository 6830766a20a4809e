package hemline.export;

import java.time.Instant;
import java.time.ZoneOffset;
import java.time.format.DateTimeFormatter;
import java.util.Locale;

/** Times as text, ISO 8601 in UTC. */
final class Times {
    private static final DateTimeFormatter ISO =
            DateTimeFormatter.ofPattern("uuuu-MM-dd'T'HH:mm:ss.SSS'Z'", Locale.ROOT).withZone(ZoneOffset.UTC);
    private static final DateTimeFormatter MINUTE =
            DateTimeFormatter.ofPattern("uuuu-MM-dd HH:mm 'UTC'", Locale.ROOT).withZone(ZoneOffset.UTC);
    private static final DateTimeFormatter CLOCK =
            DateTimeFormatter.ofPattern("HH:mm:ss", Locale.ROOT).withZone(ZoneOffset.UTC);

    private Times() {
    }

    /** For example {@code 2026-06-01T12:00:03.250Z}. */
    static String iso(long timeMs) {
        return ISO.format(Instant.ofEpochMilli(timeMs));
    }

    /** For example {@code 2026-06-01 12:00 UTC}. */
    static String toMinute(long timeMs) {
        return MINUTE.format(Instant.ofEpochMilli(timeMs));
    }

    /** For example {@code 12:00:03}. */
    static String clock(long timeMs) {
        return CLOCK.format(Instant.ofEpochMilli(timeMs));
    }
}
