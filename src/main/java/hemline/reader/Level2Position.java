package hemline.reader;

/**
 * Where a message starts.
 *
 * @param record index of the packed record that holds it; 0 in a file without packed records
 * @param offset bytes from the start of the unpacked record; from the end of the volume header where none is packed
 */
record Level2Position(int record, long offset) implements Comparable<Level2Position> {
    static final Level2Position START = new Level2Position(0, 0);
    static final Level2Position END = new Level2Position(Integer.MAX_VALUE, 0);

    @Override
    public int compareTo(Level2Position other) {
        return record != other.record ? Integer.compare(record, other.record) : Long.compare(offset, other.offset);
    }
}
