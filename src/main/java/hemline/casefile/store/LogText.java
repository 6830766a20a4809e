package hemline.casefile.store;

import hemline.casefile.edit.Edit;
import hemline.casefile.edit.Entry;
import hemline.casefile.store.LogLine.DamagedLine;
import java.io.ByteArrayOutputStream;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/**
 * What a log says.
 *
 * @param entries   in order, numbered from 1 without gaps
 * @param lastSum   sum of the last line; empty for an empty log
 * @param goodBytes length of the part that is sound
 * @param torn      what follows it: the trace of an edit that was being written when the program was stopped
 * @param unended   true when the last sound line lacks its newline
 * @param damaged   lines that are no entries; only when salvaging
 * @param patched   true when entries stand in for damaged or missing lines; only when salvaging
 */
record LogText(List<Entry> entries, String lastSum, int goodBytes, byte[] torn, boolean unended,
               List<byte[]> damaged, boolean patched) {
    /** Who signs what the program itself does. */
    static final String PROGRAM = "hemline";
    private static final int MOST_MISSING = 100_000;

    /**
     * Reads a log.
     *
     * @param salvage put an entry that says so in the place of each damaged or missing line, and go on
     * @throws CaseFileException for a damaged line before the last, unless salvaging
     */
    static LogText read(Path file, byte[] bytes, boolean salvage) throws CaseFileException {
        return new Reading(file, bytes, salvage).read();
    }

    private static final class Reading {
        private final Path file;
        private final byte[] bytes;
        private final boolean salvage;
        private final List<Entry> entries = new ArrayList<>();
        private final List<byte[]> damaged = new ArrayList<>();
        private String lastSum = "";
        private boolean patched;

        Reading(Path file, byte[] bytes, boolean salvage) {
            this.file = file;
            this.bytes = bytes;
            this.salvage = salvage;
        }

        LogText read() throws CaseFileException {
            int start = 0;
            int number = 1;
            while (start < bytes.length) {
                int end = start;
                while (end < bytes.length && bytes[end] != '\n') {
                    end++;
                }
                boolean last = end >= bytes.length - 1;
                try {
                    take(Arrays.copyOfRange(bytes, start, end));
                } catch (DamagedLine e) {
                    if (last) {
                        return end(start, false);
                    }
                    if (!salvage) {
                        throw new CaseFileException(file, number, e.getMessage(), "Restore the file from a copy, or "
                                + "open the case with salvage: damaged lines are then kept aside and the rest is used",
                                e);
                    }
                    damaged.add(Arrays.copyOfRange(bytes, start, end));
                    standIn("line " + number + " was damaged and is kept aside: " + e.getMessage());
                }
                if (end == bytes.length) {
                    return end(end, true);
                }
                start = end + 1;
                number++;
            }
            return end(start, false);
        }

        private LogText end(int good, boolean unended) {
            return new LogText(List.copyOf(entries), lastSum, good, Arrays.copyOfRange(bytes, good, bytes.length),
                    unended, List.copyOf(damaged), patched);
        }

        private void take(byte[] text) throws DamagedLine {
            LogLine line = LogLine.decode(text);
            int expected = entries.size() + 1;
            int sequence = line.entry().sequence();
            boolean follows = sequence == expected && line.prev().equals(lastSum);
            // While salvaging, a line that is sound in itself is kept wherever it stands.
            if (!follows && !(salvage && sequence >= expected && sequence - expected <= MOST_MISSING)) {
                throw new DamagedLine(sequence == expected
                        ? "it does not follow the line before: lines were changed, moved or taken out"
                        : "its number is " + sequence + " where " + expected + " is due");
            }
            while (entries.size() + 1 < sequence) {
                standIn("entry " + (entries.size() + 1) + " is missing from the log");
            }
            patched |= !line.prev().equals(lastSum);
            entries.add(line.entry());
            lastSum = line.sum();
        }

        private void standIn(String words) {
            patched = true;
            long timeMs = entries.isEmpty() ? 0 : entries.get(entries.size() - 1).timeMs();
            entries.add(new Entry(entries.size() + 1, timeMs, PROGRAM, "", new Edit.Mended(words), "", ""));
        }
    }

    /** A log of these entries, every line linked to the one before. */
    static Written write(List<Entry> entries) {
        ByteArrayOutputStream bytes = new ByteArrayOutputStream();
        String prev = "";
        for (Entry entry : entries) {
            LogLine.Encoded line = LogLine.encode(entry, prev);
            bytes.writeBytes(line.bytes());
            prev = line.sum();
        }
        return new Written(bytes.toByteArray(), prev);
    }

    /** A whole log and the sum of its last line. */
    record Written(byte[] bytes, String lastSum) {
    }
}
