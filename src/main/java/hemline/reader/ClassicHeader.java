package hemline.reader;

import java.nio.ByteBuffer;
import java.nio.ByteOrder;

/**
 * Walks the header of a netCDF classic file (NetCDF Classic Format Specification, Unidata: CDF-1 and CDF-2) before a
 * library allocates by its claims: every count must fit into the bytes that are there, every variable into the file.
 */
final class ClassicHeader {
    private static final int DIMENSION = 10;
    private static final int VARIABLE = 11;
    private static final int ATTRIBUTE = 12;
    private static final int[] TYPE_BYTES = {0, 1, 1, 2, 4, 4, 8};

    private final InputFile file;
    private final ByteBuffer in;
    private final boolean wideOffsets;

    private ClassicHeader(InputFile file, ByteBuffer in, boolean wideOffsets) {
        this.file = file;
        this.in = in;
        this.wideOffsets = wideOffsets;
    }

    /** @throws UnreadableFileException if the header's claims do not fit the file */
    static void check(InputFile file, byte[] bytes) throws UnreadableFileException {
        if (bytes.length < 32) {
            throw file.broken("header", "the netCDF-3 file ends after " + bytes.length + " bytes");
        }
        if (bytes[3] != 1 && bytes[3] != 2) {
            throw file.fault("header", "netCDF-3 variant CDF-" + bytes[3] + " is not supported",
                    "convert it with: nccopy -k nc4 IN OUT");
        }
        ByteBuffer in = ByteBuffer.wrap(bytes).order(ByteOrder.BIG_ENDIAN).position(4);
        new ClassicHeader(file, in, bytes[3] == 2).walk();
    }

    private void walk() throws UnreadableFileException {
        long records = count("number of records", false);
        if (records == 0xffffffffL) {
            throw file.broken("header", "the number of records was never written");
        }
        long[] dimensions = dimensions();
        attributes();
        int variables = list(VARIABLE, 28);
        long recordBytes = 0;
        long lastRecordByte = 0;
        int recordVariables = 0;
        long onlyRecordBytes = 0;
        for (int i = 0; i < variables; i++) {
            String name = name();
            int rank = (int) count("dimensions of " + name, true);
            boolean record = false;
            long elements = 1;
            for (int d = 0; d < rank; d++) {
                long id = count("a dimension of " + name, false);
                if (id >= dimensions.length) {
                    throw file.broken("header", "variable " + name + " names dimension " + id + " of "
                            + dimensions.length);
                }
                if (dimensions[(int) id] == 0 && d == 0) {
                    record = true;
                } else {
                    elements *= dimensions[(int) id];
                }
                if (elements > Integer.MAX_VALUE) {
                    throw file.broken("header", "variable " + name + " claims more than " + Integer.MAX_VALUE
                            + " elements");
                }
            }
            attributes();
            long bytes = elements * typeBytes();
            need(4);
            in.getInt();
            need(wideOffsets ? 8 : 4);
            long begin = wideOffsets ? in.getLong() : in.getInt() & 0xffffffffL;
            if (record) {
                recordVariables++;
                onlyRecordBytes = bytes;
                recordBytes += (bytes + 3) / 4 * 4;
                requireInside(name, begin, records == 0 ? 0 : bytes);
                lastRecordByte = Math.max(lastRecordByte, begin + bytes);
            } else {
                requireInside(name, begin, bytes);
            }
        }
        if (records > 0 && recordVariables > 0) {
            // A lone record variable is not padded to four bytes.
            requireInside("the record variables", lastRecordByte,
                    (records - 1) * (recordVariables == 1 ? onlyRecordBytes : recordBytes));
        }
    }

    private void requireInside(String what, long begin, long bytes) throws UnreadableFileException {
        if (begin < 0 || begin + bytes > in.capacity()) {
            throw file.broken(what, "its data would end at byte " + (begin + bytes) + ", the file has "
                    + in.capacity());
        }
    }

    private long[] dimensions() throws UnreadableFileException {
        long[] sizes = new long[list(DIMENSION, 8)];
        for (int i = 0; i < sizes.length; i++) {
            name();
            sizes[i] = count("size of a dimension", false);
        }
        return sizes;
    }

    private void attributes() throws UnreadableFileException {
        int attributes = list(ATTRIBUTE, 12);
        for (int i = 0; i < attributes; i++) {
            name();
            int size = typeBytes();
            skip(count("values of an attribute", true) * size);
        }
    }

    /** The number of entries of a list, each of which takes at least {@code leastBytes}. */
    private int list(int expectedTag, int leastBytes) throws UnreadableFileException {
        long tag = count("list tag", false);
        long entries = count("list length", true);
        if (tag != expectedTag && !(tag == 0 && entries == 0)) {
            throw file.broken("header", "a list is tagged " + tag + ", expected " + expectedTag);
        }
        if (entries * leastBytes > in.remaining()) {
            throw file.broken("header", "claims " + entries + " entries, the file has no room for them");
        }
        return (int) entries;
    }

    private int typeBytes() throws UnreadableFileException {
        long type = count("type", false);
        if (type < 1 || type >= TYPE_BYTES.length) {
            throw file.broken("header", "unknown type " + type);
        }
        return TYPE_BYTES[(int) type];
    }

    private String name() throws UnreadableFileException {
        int length = (int) count("length of a name", true);
        int at = in.position();
        skip(length);
        return new String(in.array(), at, Math.min(length, 80), java.nio.charset.StandardCharsets.UTF_8);
    }

    private long count(String what, boolean limitedByFile) throws UnreadableFileException {
        need(4);
        long value = in.getInt() & 0xffffffffL;
        if (limitedByFile && value > in.remaining()) {
            throw file.broken("header", what + " is " + value + ", the file has " + in.remaining() + " bytes left");
        }
        return value;
    }

    private void skip(long bytes) throws UnreadableFileException {
        long padded = (bytes + 3) / 4 * 4;
        need(padded);
        in.position(in.position() + (int) padded);
    }

    private void need(long bytes) throws UnreadableFileException {
        if (bytes > in.remaining()) {
            throw file.broken("header", "the file ends inside its header");
        }
    }
}
