package hemline.casefile.store;

import com.fasterxml.jackson.databind.node.ObjectNode;
import hemline.casefile.edit.Edit;
import hemline.casefile.edit.Entry;
import hemline.casefile.edit.Found;
import java.io.Closeable;
import java.io.IOException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * An open case folder.
 *
 * <p>After {@link #append} returns, the edit survives a crash of the program, the machine and the power. One process
 * holds a case for edits; others look. Not safe for use by several threads.
 */
public final class CaseStore implements Closeable {
    private final CaseFolder folder;
    private final List<Entry> entries;
    private final List<String> notes;
    private final Closeable held;
    private final String readOnlyReason;
    private Manifest manifest;
    private Found found;
    private CaseFiles.Appending log;
    private String lastSum;
    private boolean broken;

    private CaseStore(CaseFolder folder, Closeable held, String readOnlyReason, OpenMode mode) throws IOException {
        this.folder = folder;
        this.held = held;
        this.readOnlyReason = readOnlyReason;
        notes = new ArrayList<>();
        manifest = folder.readManifest();
        found = folder.readFound(manifest, held != null);
        LogText text = folder.readLog(mode == OpenMode.SALVAGE);
        entries = new ArrayList<>(text.entries());
        lastSum = text.lastSum();
        if (held != null) {
            mend(text);
        } else if (text.torn().length > 0) {
            notes.add("The last line of the edit log is incomplete and was left out; whoever next opens the case "
                    + "for edits mends it.");
        }
    }

    /**
     * Makes a case in a folder that is new, empty, or holds no more than a creation that was cut short.
     *
     * @param settings of the run, as a JSON tree
     * @param who      holds the case from now on, in words for whoever else opens it
     */
    public static CaseStore create(CaseFiles files, Path path, String program, ObjectNode settings,
                                   List<SourceFile> sources, Found found, String who) throws IOException {
        CaseFolder folder = new CaseFolder(files, path);
        folder.prepare();
        Closeable held = folder.hold(who).orElse(null);
        if (held == null) {
            throw new CaseFileException(path, 0, folder.heldBy(), "Close it there first");
        }
        try {
            folder.publish(program, settings, sources, found);
            return new CaseStore(folder, held, "", OpenMode.WRITE);
        } catch (IOException | RuntimeException e) {
            held.close();
            throw e;
        }
    }

    /**
     * Opens a case. Where it is open elsewhere or its folder cannot be written, it opens to look only, and
     * {@link #readOnlyReason} says why.
     *
     * @param who holds the case from now on, in words for whoever else opens it
     * @throws CaseFileException if a file is missing or damaged
     */
    public static CaseStore open(CaseFiles files, Path path, OpenMode mode, String who) throws IOException {
        CaseFolder folder = new CaseFolder(files, path);
        folder.requireCase();
        if (mode == OpenMode.LOOK) {
            return new CaseStore(folder, null, "The case was opened to look only.", mode);
        }
        Optional<Closeable> held;
        String reason;
        try {
            held = folder.hold(who);
            reason = held.isPresent() ? "" : folder.heldBy();
        } catch (IOException e) {
            held = Optional.empty();
            reason = "The case folder cannot be written (" + e.getMessage() + "), so the case is open to look only.";
        }
        try {
            return new CaseStore(folder, held.orElse(null), reason, mode);
        } catch (IOException | RuntimeException e) {
            if (held.isPresent()) {
                held.get().close();
            }
            throw e;
        }
    }

    private void mend(LogText text) throws IOException {
        List<String> done = new ArrayList<>();
        if (text.torn().length > 0) {
            done.add("The last line of the edit log was incomplete, as after a crash or a full disk; it is kept in "
                    + folder.keepAside("torn", List.of(text.torn())) + ", and the case goes on without it.");
        }
        if (text.patched()) {
            if (!text.damaged().isEmpty()) {
                notes.add("Damaged lines of the edit log are kept in " + folder.keepAside("damaged", text.damaged())
                        + "; the rest is used.");
            }
            lastSum = folder.replaceLog(entries);
        }
        log = folder.appendToLog();
        if (!text.patched()) {
            // Also forces what a killed program wrote but did not live to force.
            log.truncate(text.goodBytes());
            if (text.unended()) {
                log.append(new byte[] {'\n'});
            }
        }
        for (String words : done) {
            notes.add(words);
            append(new Entry(entries.size() + 1, lastTimeMs(), LogText.PROGRAM, "", new Edit.Mended(words), "", ""));
        }
    }

    private long lastTimeMs() {
        return entries.isEmpty() ? 0 : entries.get(entries.size() - 1).timeMs();
    }

    /**
     * Adds an entry to the log and forces it to disk.
     *
     * @param entry numbered one above the last
     * @throws CaseFileException if it could not be saved; the log is then as it was
     */
    public void append(Entry entry) throws IOException {
        requireWritable();
        if (entry.sequence() != entries.size() + 1) {
            throw new IllegalArgumentException("entry " + (entries.size() + 1) + " is due, got " + entry.sequence());
        }
        LogLine.Encoded line = LogLine.encode(entry, lastSum);
        long before = log.length();
        try {
            log.append(line.bytes());
        } catch (IOException e) {
            takeBack(before, e);
            throw new CaseFileException(folder.log(), entry.sequence(), "the edit could not be saved: "
                    + e.getMessage(), "Free some space or mend the connection, then do the edit again", e);
        }
        entries.add(entry);
        lastSum = line.sum();
    }

    private void takeBack(long length, IOException why) {
        try {
            log.truncate(length);
        } catch (IOException e) {
            // The next opening finds a torn line and mends it; until then nothing may be put behind it.
            broken = true;
            why.addSuppressed(e);
        }
    }

    /** Puts a new result, made from these sources with these settings, in the place of the old; the log stays. */
    public void publish(String program, ObjectNode settings, List<SourceFile> sources, Found newFound)
            throws IOException {
        requireWritable();
        try {
            manifest = folder.publish(program, settings, sources, newFound);
        } catch (IOException e) {
            // Old or new result: both are whole, and the next opening says which one it is.
            broken = true;
            throw e;
        }
        found = newFound;
    }

    private void requireWritable() throws CaseFileException {
        if (!readOnlyReason.isEmpty()) {
            throw new CaseFileException(folder.path(), 0, readOnlyReason, "Close it where it is open for edits, then "
                    + "open it again");
        }
        if (broken) {
            throw new CaseFileException(folder.path(), 0, "an earlier write failed half way", "Open the case again; "
                    + "it mends itself");
        }
    }

    public Path path() {
        return folder.path();
    }

    public Found found() {
        return found;
    }

    /** Settings of the run that made the result, as a JSON tree. */
    public ObjectNode settings() {
        return manifest.settings();
    }

    public List<SourceFile> sources() {
        return manifest.sources();
    }

    /** Version of the program that made the result. */
    public String program() {
        return manifest.program();
    }

    /** The log so far. */
    public List<Entry> entries() {
        return List.copyOf(entries);
    }

    /** What was mended on opening, each one sentence. */
    public List<String> notes() {
        return List.copyOf(notes);
    }

    /** Why the case can only be looked at, one sentence; empty when it is open for edits. */
    public String readOnlyReason() {
        return readOnlyReason;
    }

    @Override
    public void close() throws IOException {
        try {
            if (log != null) {
                log.close();
            }
        } finally {
            if (held != null) {
                held.close();
            }
        }
    }
}
