package hemline.reader;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.ByteBuffer;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Instant;
import java.util.ArrayList;
import java.util.List;
import org.apache.commons.compress.compressors.bzip2.BZip2CompressorOutputStream;

/**
 * Writes a small Level II archive for a test, from the same interface documents as the reader: cuts of twelve rays of
 * 30 degrees. Code of ray r, gate g: 0 (below threshold) at gate 1, 1 (range folded) at gate 2, else 66 + 2 r + g.
 */
final class Level2Sketch {
    static final int RAYS = 12;
    private final List<byte[]> messages = new ArrayList<>();
    private final String version;
    private long clockMs = Instant.parse("2020-06-11T12:00:00Z").toEpochMilli();
    private int cut;

    Level2Sketch(String version) {
        this.version = version;
    }

    /** The plan of cuts, message 5. */
    Level2Sketch pattern(double... elevationsDeg) {
        ByteBuffer body = ByteBuffer.allocate(2404);
        int bytes = 22 + 46 * elevationsDeg.length;
        body.putShort(0, (short) (bytes / 2)).putShort(4, (short) 212).putShort(6, (short) elevationsDeg.length);
        for (int i = 0; i < elevationsDeg.length; i++) {
            body.putShort(22 + 46 * i, (short) Math.round(elevationsDeg[i] * 32768 / 180));
        }
        messages.add(frame(5, body.array()));
        return this;
    }

    /** A cut of message 31, one ray a second. */
    Level2Sketch cut(double elevationDeg, int rays, String... moments) {
        cut++;
        for (int ray = 0; ray < rays; ray++) {
            int bytes = 32 + 4 * (moments.length + 2) + 48 + 20;
            int[] at = new int[moments.length];
            for (int i = 0; i < moments.length; i++) {
                at[i] = bytes;
                bytes += 28 + 2 * gates(moments[i]);
            }
            ByteBuffer body = ByteBuffer.allocate(bytes);
            body.put(0, version.equals("AR2V0008") ? bytes("TJUA") : bytes("KXXX"));
            body.putInt(4, (int) (clockMs % 86_400_000)).putShort(8, (short) (clockMs / 86_400_000 + 1));
            body.putShort(10, (short) (ray + 1)).putFloat(12, 15 + 30 * ray);
            body.put(21, (byte) (ray > 0 ? 1 : cut == 1 ? 3 : 0)).put(22, (byte) cut).putFloat(24, (float) elevationDeg);
            body.putShort(30, (short) (moments.length + 2));
            int volume = 32 + 4 * (moments.length + 2);
            body.putInt(32, volume).putInt(36, volume + 48);
            body.put(volume, bytes("RVOL")).putFloat(volume + 8, 41.5f).putFloat(volume + 12, -93.7f);
            body.putShort(volume + 16, (short) 299).putShort(volume + 18, (short) 30).putShort(volume + 40, (short) 212);
            body.put(volume + 48, bytes("RRAD")).putShort(volume + 64, (short) 2650);
            for (int i = 0; i < moments.length; i++) {
                body.putInt(40 + 4 * i, at[i]);
                moment(body, at[i], moments[i], ray);
            }
            messages.add(frame(31, body.array()));
            clockMs += 1000;
        }
        return this;
    }

    private static int gates(String moment) {
        return moment.equals("REF") ? 6 : 24;
    }

    /** Reflectivity on 1 km gates from 500 m, in bytes; the others on 250 m gates from 125 m, in 16 bits. */
    private static void moment(ByteBuffer body, int at, String name, int ray) {
        boolean wide = !name.equals("REF");
        body.put(at, bytes("D" + name)).putShort(at + 8, (short) gates(name));
        body.putShort(at + 10, (short) (wide ? 125 : 500)).putShort(at + 12, (short) (wide ? 250 : 1000));
        body.put(at + 19, (byte) (wide ? 16 : 8)).putFloat(at + 20, 2).putFloat(at + 24, wide ? 129 : 66);
        for (int gate = 0; gate < gates(name); gate++) {
            int code = gate == 1 ? 0 : gate == 2 ? 1 : (wide ? 129 : 66) + 2 * ray + gate;
            if (wide) {
                body.putShort(at + 28 + 2 * gate, (short) code);
            } else {
                body.put(at + 28 + gate, (byte) code);
            }
        }
    }

    /** A cut of message 1. */
    Level2Sketch legacyCut(double elevationDeg, int rays, boolean reflectivity, boolean velocity) {
        cut++;
        for (int ray = 0; ray < rays; ray++) {
            ByteBuffer body = ByteBuffer.allocate(2404);
            body.putInt(0, (int) (clockMs % 86_400_000)).putShort(4, (short) (clockMs / 86_400_000 + 1));
            body.putShort(8, (short) Math.round((15 + 30 * ray) * 32768 / 180.0)).putShort(10, (short) (ray + 1));
            body.putShort(12, (short) (ray > 0 ? 1 : cut == 1 ? 3 : 0));
            body.putShort(14, (short) Math.round(elevationDeg * 32768 / 180)).putShort(16, (short) cut);
            body.putShort(18, (short) 0).putShort(20, (short) -375).putShort(22, (short) 1000).putShort(24, (short) 250);
            body.putShort(26, (short) (reflectivity ? 6 : 0)).putShort(28, (short) (velocity ? 24 : 0));
            body.putShort(36, (short) (reflectivity ? 100 : 0)).putShort(38, (short) (velocity ? 560 : 0));
            body.putShort(42, (short) 4).putShort(44, (short) 21).putShort(60, (short) 2650);
            for (int gate = 0; gate < 24; gate++) {
                int code = gate == 1 ? 0 : gate == 2 ? 1 : 66 + 2 * ray + gate;
                if (gate < 6) {
                    body.put(100 + gate, (byte) code);
                }
                body.put(560 + gate, (byte) code);
            }
            messages.add(frame(1, body.array()));
            clockMs += 1000;
        }
        return this;
    }

    Level2Sketch pause(long ms) {
        clockMs += ms;
        return this;
    }

    private static byte[] frame(int type, byte[] body) {
        int bytes = 28 + body.length + body.length % 2;
        ByteBuffer out = ByteBuffer.allocate(type == 31 ? bytes : 2432);
        out.putShort(12, (short) ((bytes - 12) / 2)).put(15, (byte) type).putShort(24, (short) 1).putShort(26, (short) 1);
        out.position(28).put(body, 0, Math.min(body.length, out.remaining()));
        return out.array();
    }

    private static byte[] bytes(String text) {
        return text.getBytes(StandardCharsets.US_ASCII);
    }

    private byte[] header() {
        ByteBuffer head = ByteBuffer.allocate(24);
        head.put(bytes(version + ".001")).putInt(12, 18_425).putInt(16, 43_200_000);
        head.put(20, bytes(version.equals("AR2V0008") ? "TJUA" : "KXXX"));
        return head.array();
    }

    /** Messages one after the other. */
    byte[] plain() {
        ByteArrayOutputStream out = new ByteArrayOutputStream();
        out.writeBytes(header());
        messages.forEach(out::writeBytes);
        return out.toByteArray();
    }

    /** Messages in bzip2 records of so many each. */
    byte[] packed(int perRecord) {
        ByteArrayOutputStream out = new ByteArrayOutputStream();
        out.writeBytes(header());
        for (int from = 0; from < messages.size(); from += perRecord) {
            ByteArrayOutputStream record = new ByteArrayOutputStream();
            try (BZip2CompressorOutputStream bzip2 = new BZip2CompressorOutputStream(record, 1)) {
                for (byte[] message : messages.subList(from, Math.min(messages.size(), from + perRecord))) {
                    bzip2.write(message);
                }
            } catch (IOException e) {
                throw new UncheckedIOException(e);
            }
            int size = from + perRecord >= messages.size() ? -record.size() : record.size();
            out.writeBytes(ByteBuffer.allocate(4).putInt(0, size).array());
            out.writeBytes(record.toByteArray());
        }
        return out.toByteArray();
    }

    static Path write(Path folder, String name, byte[] bytes) {
        try {
            return Files.write(folder.resolve(name), bytes);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }
}
