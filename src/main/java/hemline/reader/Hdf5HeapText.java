package hemline.reader;

import io.jhdf.storage.HdfBackingStorage;
import java.nio.ByteBuffer;
import java.nio.ByteOrder;
import java.nio.charset.CharacterCodingException;
import java.nio.charset.StandardCharsets;

/**
 * Variable-length text out of an HDF5 global heap (HDF5 File Format Specification 3.0, section III.E). The HDF5
 * library aligns the heads of the heap and of its objects to 8 bytes, which matters in files with 4-byte lengths;
 * jHDF 0.9.4 does not, and fails on them.
 */
final class Hdf5HeapText {
    private static final int OBJECT_HEAD_BYTES = 8;
    private static final int MAX_TEXT_BYTES = 1 << 20;

    private Hdf5HeapText() {
    }

    /**
     * @param reference a string's entry: its length, the heap's address, its index in the heap
     * @throws RuntimeException if the entry or the heap is broken, to be caught by the shield
     */
    static String read(HdfBackingStorage storage, ByteBuffer reference) {
        ByteBuffer in = reference.duplicate().order(ByteOrder.LITTLE_ENDIAN);
        int length = in.getInt();
        long address = number(in, storage.getSizeOfOffsets());
        int wanted = in.getInt();
        if (length == 0 || address == 0) {
            return "";
        }
        if (length < 0 || length > MAX_TEXT_BYTES) {
            throw new IllegalStateException("a text claims " + (length & 0xffffffffL) + " bytes");
        }
        int sizeBytes = storage.getSizeOfLengths();
        int headBytes = aligned(OBJECT_HEAD_BYTES + sizeBytes);
        ByteBuffer head = storage.map(address, headBytes);
        if (head.getInt() != 0x4c4f4347) {
            throw new IllegalStateException("no text heap at byte " + address);
        }
        head.getInt();
        ByteBuffer heap = storage.map(address, number(head, sizeBytes));
        heap.position(headBytes);
        while (heap.remaining() >= headBytes) {
            int start = heap.position();
            int index = heap.getShort() & 0xffff;
            heap.position(start + OBJECT_HEAD_BYTES);
            long size = number(heap, sizeBytes);
            heap.position(start + headBytes);
            if (index == 0 || size < 0) {
                break;
            }
            if (index == wanted) {
                byte[] bytes = new byte[(int) Math.min(length, Math.min(size, heap.remaining()))];
                heap.get(bytes);
                return decode(bytes);
            }
            heap.position(Math.toIntExact(heap.position() + (size + 7) / 8 * 8));
        }
        throw new IllegalStateException("the text heap has no object " + wanted);
    }

    private static int aligned(int bytes) {
        return (bytes + 7) / 8 * 8;
    }

    private static long number(ByteBuffer in, int bytes) {
        return bytes == 8 ? in.getLong() : in.getInt() & 0xffffffffL;
    }

    /** UTF-8 where the bytes are valid as such, else ISO 8859-1. */
    static String decode(byte[] bytes) {
        try {
            return StandardCharsets.UTF_8.newDecoder().decode(ByteBuffer.wrap(bytes)).toString();
        } catch (CharacterCodingException e) {
            return new String(bytes, StandardCharsets.ISO_8859_1);
        }
    }
}
