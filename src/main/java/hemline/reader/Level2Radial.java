package hemline.reader;

import java.nio.ByteBuffer;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;

/**
 * One radial of a Level II archive: message 31 (ICD 2620002, tables XVII-A to XVII-I) or message 1 (tables III-A to
 * III-E of earlier issues).
 *
 * @param elevationNumber which cut of the volume it belongs to
 * @param starts          true if it opens a cut
 * @param timeMs          collection time, ms since 1970-01-01T00:00Z
 * @param nyquistMs       unambiguous velocity, m s⁻¹; NaN when not stated
 * @param moments         its moments
 * @param volumeAt        offset of the volume block in the body, −1 when there is none
 */
record Level2Radial(double azimuthDeg, double elevationDeg, int elevationNumber, boolean starts, long timeMs,
                    double nyquistMs, List<Moment> moments, int volumeAt) {
    private static final long DAY_MS = 86_400_000;
    private static final int MOST_BLOCKS = 16;
    /** Message 1 codes angles in 180/4096 degrees in the upper 13 bits of 16. */
    private static final double ANGLE_DEG = 180.0 / 4096 / 8;

    /**
     * A moment of a radial: value = (code − offset) / scale, code 0 below threshold, code 1 range folded.
     *
     * @param at offset of its first gate in the message's body
     */
    record Moment(String name, Ranges ranges, int bits, double scale, double offset, int at) {
    }

    /** The radial of a message's body; null when its numbers cannot be those of a radial. */
    static Level2Radial of(int type, ByteBuffer body) {
        return type == Level2Messages.DIGITAL_RADAR_DATA ? legacy(body) : generic(body);
    }

    private static Level2Radial generic(ByteBuffer body) {
        if (body.limit() < 32) {
            return null;
        }
        double azimuth = body.getFloat(12);
        double elevation = body.getFloat(24);
        int status = body.get(21) & 0x0f;
        int blocks = body.getShort(30) & 0xffff;
        if (!(azimuth >= 0 && azimuth <= 360) || !(Math.abs(elevation) <= 360) || blocks > MOST_BLOCKS
                || body.limit() < 32 + 4 * blocks) {
            return null;
        }
        List<Moment> moments = new ArrayList<>();
        double nyquist = Double.NaN;
        int volumeAt = -1;
        for (int i = 0; i < blocks; i++) {
            int at = body.getInt(32 + 4 * i);
            if (at < 32 || at > body.limit() - 28) {
                continue;
            }
            String name = text(body, at + 1, 3);
            if (body.get(at) == 'D') {
                Moment moment = moment(body, at, name.strip());
                if (moment != null) {
                    moments.add(moment);
                }
            } else if (name.equals("RAD")) {
                nyquist = (body.getShort(at + 16) & 0xffff) / 100.0;
            } else if (name.equals("VOL") && at <= body.limit() - 44) {
                volumeAt = at;
            }
        }
        return new Level2Radial(azimuth, elevation > 180 ? elevation - 360 : elevation, body.get(22) & 0xff,
                isStart(status), timeMs(body.getShort(8), body.getInt(4)), nyquist, moments, volumeAt);
    }

    private static Moment moment(ByteBuffer body, int at, String name) {
        int gates = body.getShort(at + 8) & 0xffff;
        double first = body.getShort(at + 10);
        int spacing = body.getShort(at + 12) & 0xffff;
        int bits = body.get(at + 19) & 0xff;
        double scale = body.getFloat(at + 20);
        double offset = body.getFloat(at + 24);
        boolean sound = gates > 0 && gates <= Limits.MAX_GATES && spacing > 0 && (bits == 8 || bits == 16)
                && Double.isFinite(scale) && scale != 0 && Double.isFinite(offset)
                && (long) gates * bits / 8 <= body.limit() - at - 28L;
        return sound ? new Moment(name, new Ranges(first, spacing, gates), bits, scale, offset, at + 28) : null;
    }

    private static Level2Radial legacy(ByteBuffer body) {
        if (body.limit() < 100) {
            return null;
        }
        double azimuth = (body.getShort(8) & 0xffff) * ANGLE_DEG;
        double elevation = (body.getShort(14) & 0xffff) * ANGLE_DEG;
        int number = body.getShort(16) & 0xffff;
        int resolution = body.getShort(42);
        if (number > 255 || azimuth > 360) {
            return null;
        }
        Ranges surveillance = new Ranges(body.getShort(18), body.getShort(22) & 0xffff, body.getShort(26) & 0xffff);
        Ranges doppler = new Ranges(body.getShort(20), body.getShort(24) & 0xffff, body.getShort(28) & 0xffff);
        List<Moment> moments = new ArrayList<>();
        // dBZ = code / 2 - 33; velocity = code / 2 - 64.5 or, at the coarse resolution, code - 129.
        addLegacy(moments, body, "REF", surveillance, body.getShort(36) & 0xffff, 2, 66);
        addLegacy(moments, body, "VEL", doppler, body.getShort(38) & 0xffff, resolution == 4 ? 1 : 2, 129);
        addLegacy(moments, body, "SW", doppler, body.getShort(40) & 0xffff, 2, 129);
        return new Level2Radial(azimuth, elevation > 180 ? elevation - 360 : elevation, number,
                isStart(body.getShort(12)), timeMs(body.getShort(4), body.getInt(0)),
                (body.getShort(60) & 0xffff) / 100.0, moments, -1);
    }

    private static void addLegacy(List<Moment> moments, ByteBuffer body, String name, Ranges ranges, int at,
                                  double scale, double offset) {
        if (at >= 100 && ranges.gates() > 0 && ranges.spacingM() > 0 && at + ranges.gates() <= body.limit()) {
            moments.add(new Moment(name, ranges, 8, scale, offset, at));
        }
    }

    /** Status words: 0 start of an elevation, 3 start of a volume, 5 start of the last elevation. */
    private static boolean isStart(int status) {
        return status == 0 || status == 3 || status == 5;
    }

    /** Days are counted from 1970-01-01 as day 1. */
    private static long timeMs(short day, int millisecond) {
        return ((day & 0xffffL) - 1) * DAY_MS + (millisecond & 0xffffffffL);
    }

    static String text(ByteBuffer body, int at, int length) {
        byte[] bytes = new byte[length];
        for (int i = 0; i < length; i++) {
            bytes[i] = body.get(at + i);
        }
        return new String(bytes, StandardCharsets.ISO_8859_1);
    }

    Moment moment(String name) {
        for (Moment moment : moments) {
            if (moment.name().equals(name)) {
                return moment;
            }
        }
        return null;
    }
}
