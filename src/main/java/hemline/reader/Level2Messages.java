package hemline.reader;

import java.nio.ByteBuffer;
import java.util.List;

/**
 * The messages of a Level II archive, one after the other: ICD 2620010 (Archive II) for the volume header and the
 * packed records, ICD 2620002 (RDA/RPG), table II, for the message header.
 */
interface Level2Messages {
    int VOLUME_HEADER_BYTES = 24;
    /** Channel words before each message, of no use in an archive. */
    int CHANNEL_BYTES = 12;
    int HEADER_BYTES = 16;
    /** Every message but 31 takes a frame of this size, channel words included. */
    int FRAME_BYTES = 2432;
    int DIGITAL_RADAR_DATA = 1;
    int DIGITAL_RADAR_DATA_GENERIC = 31;

    /** Told of the messages that matter here. */
    @FunctionalInterface
    interface Visitor {
        /** A volume coverage pattern, message 5 or 7, before the radials. */
        default void pattern(ByteBuffer body) {
        }

        /**
         * @param type 1 or 31
         * @param body the message after its header, big endian
         * @return false to stop
         */
        boolean radial(int type, ByteBuffer body, Level2Position at) throws UnreadableFileException;
    }

    /** Visits the radials from one position up to, not including, another. */
    void visit(Level2Position from, Level2Position to, Visitor visitor) throws UnreadableFileException;

    /** What was found wrong on the way, for people. */
    List<String> notes();

    /** "bzip2 records" or empty, for the words that describe the format. */
    String packing();

    /** Bytes of a whole message with channel words and header, from its first 28 bytes; 0 when they are no header. */
    static int frameBytes(ByteBuffer head, int at) {
        int halfwords = head.getShort(at + CHANNEL_BYTES) & 0xffff;
        int type = type(head, at);
        if (type != DIGITAL_RADAR_DATA_GENERIC) {
            return FRAME_BYTES;
        }
        long bytes = 2L * halfwords;
        if (halfwords == 0xffff) {
            // A longer message keeps its size in the segment words.
            bytes = head.getInt(at + CHANNEL_BYTES + 12) & 0xffffffffL;
        }
        return bytes < HEADER_BYTES + 32 || bytes > 1 << 20 ? 0 : (int) bytes + CHANNEL_BYTES;
    }

    static boolean isRadial(int type) {
        return type == DIGITAL_RADAR_DATA || type == DIGITAL_RADAR_DATA_GENERIC;
    }

    static boolean isPattern(int type) {
        return type == 5 || type == 7;
    }

    static int type(ByteBuffer head, int at) {
        return head.get(at + CHANNEL_BYTES + 3) & 0x7f;
    }
}
