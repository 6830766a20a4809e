package hemline.reader;

import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.nio.ByteBuffer;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.IntStream;
import org.apache.commons.compress.compressors.bzip2.BZip2CompressorInputStream;

/** An archive of records, each packed by bzip2 on its own; only the records asked for are unpacked. */
final class Level2Packed implements Level2Messages {
    /** Unpacked, a record of 120 radials has about 1 MB; bytes. */
    private static final int MOST_RECORD_BYTES = 32 << 20;
    private static final int BATCH = 8;
    /** Unpacked records kept, so that looking at a cut and reading it unpack it once; bytes. */
    private static final long KEPT_BYTES = 48 << 20;

    private final byte[] file;
    private final int[] start;
    private final int[] length;
    private final List<String> notes = new ArrayList<>();
    private final Map<Integer, Unpacked> kept = new HashMap<>();
    private long keptBytes;

    Level2Packed(byte[] file) {
        this.file = file;
        List<int[]> records = new ArrayList<>();
        ByteBuffer in = ByteBuffer.wrap(file);
        int at = VOLUME_HEADER_BYTES;
        while (at + 4 < file.length) {
            // The last record's size is negative.
            long size = Math.abs((long) in.getInt(at));
            at += 4;
            if (size == 0) {
                continue;
            }
            if (size > file.length - at) {
                notes.add("the file ends inside a packed record");
                size = file.length - at;
            }
            records.add(new int[] {at, (int) size});
            at += (int) size;
        }
        start = records.stream().mapToInt(r -> r[0]).toArray();
        length = records.stream().mapToInt(r -> r[1]).toArray();
    }

    @Override
    public String packing() {
        return "bzip2 records";
    }

    @Override
    public List<String> notes() {
        return List.copyOf(notes);
    }

    @Override
    public void visit(Level2Position from, Level2Position to, Visitor visitor) throws UnreadableFileException {
        int past = to.offset() > 0 ? (int) Math.min(start.length, to.record() + 1L) : Math.min(start.length, to.record());
        for (int batch = from.record(); batch < past; batch += BATCH) {
            int end = Math.min(past, batch + BATCH);
            List<Unpacked> unpacked = unpacked(batch, end);
            for (int i = 0; i < unpacked.size(); i++) {
                int record = batch + i;
                if (!unpacked.get(i).complete && !notes.contains(damage(record))) {
                    notes.add(damage(record));
                }
                int first = record == from.record() ? (int) from.offset() : 0;
                long last = record == to.record() ? to.offset() : Long.MAX_VALUE;
                if (!visit(unpacked.get(i).bytes, record, first, last, visitor)) {
                    return;
                }
            }
        }
    }

    private List<Unpacked> unpacked(int from, int past) {
        List<Unpacked> batch = IntStream.range(from, past).parallel()
                .mapToObj(record -> kept.containsKey(record) ? kept.get(record) : unpack(record)).toList();
        for (int i = 0; i < batch.size(); i++) {
            int size = batch.get(i).bytes.length;
            if (keptBytes + size <= KEPT_BYTES && kept.putIfAbsent(from + i, batch.get(i)) == null) {
                keptBytes += size;
            }
        }
        return batch;
    }

    private static String damage(int record) {
        return "record " + record + " is damaged or cut off; what could be unpacked of it is used";
    }

    private static boolean visit(byte[] bytes, int record, int first, long last, Visitor visitor)
            throws UnreadableFileException {
        ByteBuffer in = ByteBuffer.wrap(bytes);
        int at = first;
        while (at < last && at + CHANNEL_BYTES + HEADER_BYTES <= bytes.length) {
            int frame = Level2Messages.frameBytes(in, at);
            if (frame == 0) {
                at += FRAME_BYTES;
                continue;
            }
            int type = Level2Messages.type(in, at);
            int body = at + CHANNEL_BYTES + HEADER_BYTES;
            int end = Math.min(bytes.length, at + frame);
            boolean whole = type != DIGITAL_RADAR_DATA_GENERIC || end == at + frame;
            if (Level2Messages.isPattern(type)) {
                visitor.pattern(in.slice(body, end - body));
            } else if (Level2Messages.isRadial(type) && whole
                    && !visitor.radial(type, in.slice(body, end - body), new Level2Position(record, at))) {
                return false;
            }
            at += frame;
        }
        return true;
    }

    private record Unpacked(byte[] bytes, boolean complete) {
    }

    private Unpacked unpack(int record) {
        byte[] out = new byte[1 << 20];
        int n = 0;
        try (BZip2CompressorInputStream in = new BZip2CompressorInputStream(
                new ByteArrayInputStream(file, start[record], length[record]))) {
            while (true) {
                int got = in.read(out, n, out.length - n);
                if (got < 0) {
                    return new Unpacked(Arrays.copyOf(out, n), true);
                }
                n += got;
                if (n == MOST_RECORD_BYTES) {
                    return new Unpacked(out, false);
                }
                if (n == out.length) {
                    out = Arrays.copyOf(out, Math.min(MOST_RECORD_BYTES, 2 * out.length));
                }
            }
        } catch (IOException | RuntimeException e) {
            return new Unpacked(Arrays.copyOf(out, n), false);
        }
    }
}
