package hemline.reader;

/**
 * What a sweep may be at most. Sizes in a file are claims; they are held against these before anything is allocated.
 * The finest operational sweeps have about 1500 rays and 4000 gates.
 */
final class Limits {
    static final int MAX_RAYS = 20_000;
    static final int MAX_GATES = 20_000;
    static final long MAX_CELLS = 50_000_000;
    static final int MAX_SWEEPS = 2_000;
    /** Rays of all sweeps of a file together. */
    static final int MAX_FILE_RAYS = 2_000_000;
    /** The largest file opened, bytes; a Java array holds no more. */
    static final long MAX_FILE_BYTES = Integer.MAX_VALUE - 64L;
    /** Plain files up to this size are loaded, larger ones mapped; bytes. */
    static final long MAX_LOADED_BYTES = 64L << 20;

    private Limits() {
    }

    static void checkSweep(InputFile file, String place, long rays, long gates) throws UnreadableFileException {
        if (rays < 1 || gates < 1) {
            throw file.broken(place, "the sweep is empty: " + rays + " rays, " + gates + " gates");
        }
        if (rays > MAX_RAYS || gates > MAX_GATES || rays * gates > MAX_CELLS) {
            throw file.broken(place, "claims " + rays + " rays x " + gates + " gates, at most " + MAX_RAYS + " x "
                    + MAX_GATES + " and " + MAX_CELLS + " in all are read");
        }
    }

    /** The number of elements of an array, refused when absurd. */
    static int elements(InputFile file, String place, int[] shape) throws UnreadableFileException {
        long count = 1;
        for (int size : shape) {
            if (size < 0) {
                throw file.broken(place, "a dimension has size " + size);
            }
            count *= size;
            if (count > MAX_CELLS) {
                throw file.broken(place, "the array claims more than " + MAX_CELLS + " elements");
            }
        }
        return (int) count;
    }
}
