package hemline.reader;

import java.time.DateTimeException;
import java.time.LocalDateTime;
import java.time.ZoneOffset;
import java.util.Locale;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * Time units of the CF conventions, "seconds since 2018-10-28 14:14:23 0:00" and its many spellings. A missing zone
 * is UTC (CF conventions 1.8, section 4.4).
 *
 * @param unitMs   ms in one unit
 * @param originMs the origin, ms since 1970-01-01T00:00Z
 */
record CfTime(double unitMs, long originMs) {
    private static final Pattern UNITS = Pattern.compile("\\s*([a-z]+)\\s+since\\s+(.*)", Pattern.CASE_INSENSITIVE);
    private static final Pattern STAMP = Pattern.compile("\\s*(\\d{1,4})-(\\d{1,2})-(\\d{1,2})"
            + "(?:[T\\s]+(\\d{1,2}):(\\d{1,2})(?::(\\d{1,2})(\\.\\d+)?)?)?\\s*(Z|UTC|GMT|[+-]?\\d{1,2}(?::?\\d{2})?)?\\s*",
            Pattern.CASE_INSENSITIVE);

    static Optional<CfTime> parse(String units) {
        Matcher parts = UNITS.matcher(units);
        if (!parts.matches()) {
            return Optional.empty();
        }
        double unit = switch (parts.group(1).toLowerCase(Locale.ROOT)) {
            case "second", "seconds", "sec", "secs", "s" -> 1000;
            case "millisecond", "milliseconds", "msec", "msecs", "ms" -> 1;
            case "microsecond", "microseconds" -> 1e-3;
            case "nanosecond", "nanoseconds", "ns" -> 1e-6;
            case "minute", "minutes", "min", "mins" -> 60_000;
            case "hour", "hours", "hr", "hrs", "h" -> 3_600_000;
            case "day", "days", "d" -> 86_400_000;
            default -> Double.NaN;
        };
        return Double.isNaN(unit) ? Optional.empty()
                : instant(parts.group(2)).map(origin -> new CfTime(unit, origin));
    }

    /** A time stamp such as 2011-05-20T10:54:16Z, ms since 1970-01-01T00:00Z; UTC where it names no zone. */
    static Optional<Long> instant(String text) {
        Matcher m = STAMP.matcher(text);
        if (!m.matches()) {
            return Optional.empty();
        }
        try {
            LocalDateTime local = LocalDateTime.of(number(m.group(1)), number(m.group(2)), number(m.group(3)),
                    number(m.group(4)), number(m.group(5)), Math.min(59, number(m.group(6))));
            long fraction = m.group(7) == null ? 0 : Math.round(1000 * Double.parseDouble("0" + m.group(7)));
            return Optional.of(local.toInstant(ZoneOffset.UTC).toEpochMilli() + fraction - zoneMs(m.group(8)));
        } catch (DateTimeException e) {
            return Optional.empty();
        }
    }

    private static int number(String digits) {
        return digits == null ? 0 : Integer.parseInt(digits);
    }

    private static long zoneMs(String zone) {
        if (zone == null || Character.isLetter(zone.charAt(0))) {
            return 0;
        }
        boolean west = zone.startsWith("-");
        String digits = zone.replaceAll("[+-]", "");
        int colon = digits.indexOf(':');
        int split = colon >= 0 ? colon : digits.length() > 2 ? digits.length() - 2 : digits.length();
        int hours = Integer.parseInt(digits.substring(0, split));
        String rest = digits.substring(split).replace(":", "");
        int minutes = rest.isEmpty() ? 0 : Integer.parseInt(rest);
        return (west ? -1 : 1) * (hours * 60L + minutes) * 60_000;
    }

    long toMs(double value) {
        return originMs + Math.round(value * unitMs);
    }
}
