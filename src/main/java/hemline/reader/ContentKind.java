package hemline.reader;

import java.nio.charset.StandardCharsets;
import java.util.Arrays;

/** What bytes are, told by their first ones and never by a file's name. */
enum ContentKind {
    HDF5, NETCDF_CLASSIC, LEVEL_II, GZIP, BZIP2, COMPRESS, EMPTY, TEXT, PICTURE, OTHER;

    /** So many leading bytes settle it; HDF5 may start at 512, 1024, 2048 or 4096 after a user block. */
    static final int HEAD_BYTES = 4096 + 8;

    private static final byte[] HDF5_SIGNATURE = {(byte) 0x89, 'H', 'D', 'F', '\r', '\n', 0x1a, '\n'};

    static ContentKind of(byte[] head) {
        if (head.length == 0) {
            return EMPTY;
        }
        for (int at = 0; at <= 4096; at = at == 0 ? 512 : at * 2) {
            if (startsWith(head, at, HDF5_SIGNATURE)) {
                return HDF5;
            }
        }
        if (startsWith(head, 0, "CDF") && head.length > 3 && head[3] >= 1 && head[3] <= 9) {
            return NETCDF_CLASSIC;
        }
        if (startsWith(head, 0, "AR2V") || startsWith(head, 0, "ARCHIVE2")) {
            return LEVEL_II;
        }
        if (startsWith(head, 0, new byte[] {0x1f, (byte) 0x8b, 8})) {
            return GZIP;
        }
        if (startsWith(head, 0, new byte[] {0x1f, (byte) 0x9d})) {
            return COMPRESS;
        }
        if (startsWith(head, 0, "BZh")) {
            return BZIP2;
        }
        if (startsWith(head, 0, new byte[] {(byte) 0x89, 'P', 'N', 'G'}) || startsWith(head, 0, "GIF8")
                || startsWith(head, 0, new byte[] {(byte) 0xff, (byte) 0xd8, (byte) 0xff})) {
            return PICTURE;
        }
        return isText(head) ? TEXT : OTHER;
    }

    boolean isWrapper() {
        return this == GZIP || this == BZIP2 || this == COMPRESS;
    }

    /** Text and pictures lie beside radar files in many a folder. */
    boolean isBystander() {
        return this == TEXT || this == PICTURE;
    }

    private static boolean startsWith(byte[] head, int at, String text) {
        return startsWith(head, at, text.getBytes(StandardCharsets.US_ASCII));
    }

    private static boolean startsWith(byte[] head, int at, byte[] sign) {
        return head.length >= at + sign.length && Arrays.equals(head, at, at + sign.length, sign, 0, sign.length);
    }

    private static boolean isText(byte[] head) {
        for (byte b : head) {
            if (b >= 0 && b < 0x20 && b != '\n' && b != '\r' && b != '\t' && b != '\f') {
                return false;
            }
        }
        return true;
    }
}
