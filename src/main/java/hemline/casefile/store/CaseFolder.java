package hemline.casefile.store;

import com.fasterxml.jackson.databind.node.ObjectNode;
import hemline.casefile.edit.Entry;
import hemline.casefile.edit.Found;
import java.io.ByteArrayOutputStream;
import java.io.Closeable;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;

/** Which files a case folder holds and in which order they are written. */
final class CaseFolder {
    static final String HEAD = "case.json";
    static final String LOG = "edits.jsonl";
    static final String LOCK = "case.lock";
    static final String HOLDER = "case.holder";
    private static final String RESULT_FOLDER = "found";
    private static final String BESIDE = ".new";
    /** Keeps line ends as they are under version control, so that the hashes hold. */
    private static final Map<String, String> FOR_VERSION_CONTROL = Map.of(
            ".gitattributes", "* -text\n", ".gitignore", LOCK + "\n" + HOLDER + "\n*" + BESIDE + "\n");
    private static final Set<String> OURS = Set.of(LOG, LOCK, HOLDER, RESULT_FOLDER, HEAD + BESIDE,
            ".gitattributes", ".gitignore");
    private static final long LARGEST_FILE_BYTES = 1L << 30;
    private static final int LONGEST_HOLDER_BYTES = 1000;

    private final CaseFiles files;
    private final Path path;

    CaseFolder(CaseFiles files, Path path) {
        this.files = files;
        this.path = path;
    }

    Path path() {
        return path;
    }

    Path log() {
        return path.resolve(LOG);
    }

    void requireCase() throws IOException {
        if (!files.exists(path.resolve(HEAD))) {
            throw new CaseFileException(path, 0, "this is no case: it has no " + HEAD,
                    "Name the folder of a case, or make one with a run");
        }
    }

    /** Makes the folder ready for a new case; refuses to mix one with anything else. */
    void prepare() throws IOException {
        files.createFolders(path.resolve(RESULT_FOLDER));
        if (files.exists(path.resolve(HEAD))) {
            throw new CaseFileException(path, 0, "there is a case here already", "Open it, or name another folder");
        }
        for (String name : files.list(path)) {
            if (!OURS.contains(name)) {
                throw new CaseFileException(path.resolve(name), 0, "the folder for a new case holds other things",
                        "Name a folder that is new or empty");
            }
        }
        if (files.exists(log()) && files.size(log()) > 0) {
            throw new CaseFileException(log(), 0, "there are edits here, but no " + HEAD,
                    "Restore " + HEAD + " from a copy, or name another folder");
        }
    }

    Optional<Closeable> hold(String who) throws IOException {
        Optional<Closeable> held = files.hold(path.resolve(LOCK));
        if (held.isPresent()) {
            try {
                files.write(path.resolve(HOLDER), (who + "\n").getBytes(StandardCharsets.UTF_8));
            } catch (IOException e) {
                held.get().close();
                throw e;
            }
        }
        return held;
    }

    /** Who holds the case, one sentence. */
    String heldBy() throws IOException {
        Path file = path.resolve(HOLDER);
        String who = "";
        if (files.exists(file) && files.size(file) <= LONGEST_HOLDER_BYTES) {
            who = new String(files.read(file), StandardCharsets.UTF_8).strip();
        }
        return "The case is open for edits elsewhere" + (who.isEmpty() ? "" : " (" + who + ")")
                + ", so here it is open to look only.";
    }

    Manifest readManifest() throws IOException {
        return Manifest.of(path.resolve(HEAD), read(path.resolve(HEAD)));
    }

    /**
     * Reads the result that the head names. A run that was cut short after the head was renamed has left files beside
     * those they replace; they are the ones.
     *
     * @param mayWrite finish such a run, and clear away what one cut short earlier has left
     */
    Found readFound(Manifest manifest, boolean mayWrite) throws IOException {
        Map<String, byte[]> contents = new LinkedHashMap<>();
        for (SourceFile named : manifest.found()) {
            contents.put(named.path(), readFound(named, mayWrite));
        }
        if (mayWrite) {
            clear(path);
            clear(path.resolve(RESULT_FOLDER));
        }
        return FoundText.read(path, contents);
    }

    private byte[] readFound(SourceFile named, boolean mayWrite) throws IOException {
        Path file = path.resolve(named.path());
        Path beside = path.resolve(named.path() + BESIDE);
        byte[] standing = files.exists(file) ? read(file) : null;
        if (standing != null && Sha256.of(standing).equals(named.sha256())) {
            return standing;
        }
        byte[] waiting = files.exists(beside) ? read(beside) : null;
        if (waiting != null && Sha256.of(waiting).equals(named.sha256())) {
            if (mayWrite) {
                files.moveOver(beside, file);
            }
            return waiting;
        }
        throw new CaseFileException(file, 0, standing == null ? "the file is missing"
                : "its content is not what " + HEAD + " says (SHA-256)", "Restore it from a copy of the case, or run the "
                + "case again");
    }

    private void clear(Path folder) throws IOException {
        for (String name : files.list(folder)) {
            if (name.endsWith(BESIDE)) {
                files.delete(folder.resolve(name));
            }
        }
        files.forceFolder(folder);
    }

    LogText readLog(boolean salvage) throws IOException {
        return LogText.read(log(), read(log()), salvage);
    }

    CaseFiles.Appending appendToLog() throws IOException {
        return files.append(log());
    }

    /** Puts a whole log in the place of the old one; gives the sum of its last line. */
    String replaceLog(List<Entry> entries) throws IOException {
        LogText.Written text = LogText.write(entries);
        replace(log(), text.bytes());
        return text.lastSum();
    }

    /** Keeps text that is no entry in a file of its own, or in the one that already holds the same; gives its name. */
    String keepAside(String what, List<byte[]> lines) throws IOException {
        ByteArrayOutputStream text = new ByteArrayOutputStream();
        for (byte[] line : lines) {
            text.writeBytes(line);
            text.write('\n');
        }
        for (int i = 1; ; i++) {
            String name = "edits." + what + "-" + i + ".txt";
            Path file = path.resolve(name);
            if (!files.exists(file)) {
                replace(file, text.toByteArray());
                return name;
            }
            if (Arrays.equals(files.read(file), text.toByteArray())) {
                return name;
            }
        }
    }

    private void replace(Path file, byte[] bytes) throws IOException {
        Path beside = file.resolveSibling(file.getFileName() + BESIDE);
        files.write(beside, bytes);
        files.moveOver(beside, file);
        files.forceFolder(file.getParent());
    }

    /**
     * Writes a result and its head. Until the head is renamed the old result counts, after that the new one, whatever
     * moment a crash picks.
     */
    Manifest publish(String program, ObjectNode settings, List<SourceFile> sources, Found found) throws IOException {
        boolean fresh = !files.exists(path.resolve(HEAD));
        if (fresh) {
            for (Map.Entry<String, String> file : FOR_VERSION_CONTROL.entrySet().stream()
                    .sorted(Map.Entry.comparingByKey()).toList()) {
                files.write(path.resolve(file.getKey()), file.getValue().getBytes(StandardCharsets.UTF_8));
            }
            files.write(log(), new byte[0]);
        }
        Map<String, byte[]> contents = FoundText.write(found);
        List<SourceFile> named = new ArrayList<>();
        for (Map.Entry<String, byte[]> file : contents.entrySet()) {
            files.write(path.resolve(file.getKey() + BESIDE), file.getValue());
            named.add(new SourceFile(file.getKey(), Sha256.of(file.getValue()), file.getValue().length));
        }
        files.forceFolder(path.resolve(RESULT_FOLDER));
        if (fresh) {
            files.forceFolder(path);
            files.forceFolder(path.toAbsolutePath().getParent());
        }
        Manifest manifest = new Manifest(program, settings, sources, named);
        replace(path.resolve(HEAD), manifest.toBytes());
        for (String name : contents.keySet()) {
            files.moveOver(path.resolve(name + BESIDE), path.resolve(name));
        }
        files.forceFolder(path.resolve(RESULT_FOLDER));
        return manifest;
    }

    private byte[] read(Path file) throws IOException {
        if (!files.exists(file)) {
            throw new CaseFileException(file, 0, "the file is missing", "Restore it from a copy of the case");
        }
        if (files.size(file) > LARGEST_FILE_BYTES) {
            throw new CaseFileException(file, 0, "it has " + files.size(file) + " bytes; a case holds files of at most "
                    + LARGEST_FILE_BYTES, "Restore it from a copy of the case");
        }
        return files.read(file);
    }
}
