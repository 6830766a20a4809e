package hemline.casefile.store;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.InputStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.LocalDateTime;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.regex.Pattern;
import java.util.zip.ZipEntry;
import java.util.zip.ZipException;
import java.util.zip.ZipInputStream;
import java.util.zip.ZipOutputStream;

/** A case as one file to send, and back. The same case gives the same bytes. */
public final class CaseZip {
    private static final LocalDateTime NO_TIME = LocalDateTime.of(1980, 1, 1, 0, 0);
    private static final Pattern OURS = Pattern.compile("case\\.json|edits\\.jsonl|edits\\.(torn|damaged)-\\d{1,4}\\.txt"
            + "|\\.gitattributes|\\.gitignore|found/[a-z]{1,20}\\.jsonl");
    private static final long MOST_BYTES = 1L << 30;

    private CaseZip() {
    }

    /** Writes a case into a new zip file. */
    public static void pack(Path caseFolder, Path zip) throws IOException {
        CaseFiles files = new DiskFiles();
        new CaseFolder(files, caseFolder).requireCase();
        List<String> names = new ArrayList<>(files.list(caseFolder));
        files.list(caseFolder.resolve("found")).forEach(name -> names.add("found/" + name));
        Path beside = zip.resolveSibling(zip.getFileName() + ".new");
        try (ZipOutputStream out = new ZipOutputStream(Files.newOutputStream(beside))) {
            for (String name : names.stream().filter(n -> OURS.matcher(n).matches()).sorted().toList()) {
                ZipEntry entry = new ZipEntry(name);
                entry.setTimeLocal(NO_TIME);
                out.putNextEntry(entry);
                out.write(files.read(caseFolder.resolve(name)));
                out.closeEntry();
            }
        }
        files.moveOver(beside, zip);
    }

    /**
     * Makes a case folder of a zip file. Anything that is no part of a case is refused, so nothing lands elsewhere.
     *
     * @param caseFolder new or empty
     */
    public static void unpack(Path zip, Path caseFolder) throws IOException {
        Map<String, byte[]> contents = contents(zip);
        byte[] head = contents.remove(CaseFolder.HEAD);
        byte[] log = contents.remove(CaseFolder.LOG);
        if (head == null || log == null) {
            throw new CaseFileException(zip, 0, "it holds no case: " + CaseFolder.HEAD + " and " + CaseFolder.LOG
                    + " are due", "Name the zip file of a case");
        }
        DiskFiles files = new DiskFiles();
        new CaseFolder(files, caseFolder).prepare();
        for (Map.Entry<String, byte[]> file : contents.entrySet()) {
            files.write(caseFolder.resolve(file.getKey()), file.getValue());
        }
        files.write(caseFolder.resolve(CaseFolder.LOG), log);
        files.forceFolder(caseFolder.resolve("found"));
        // Last, since a folder counts as a case from here on.
        files.write(caseFolder.resolve(CaseFolder.HEAD), head);
        files.forceFolder(caseFolder);
    }

    private static Map<String, byte[]> contents(Path zip) throws IOException {
        Map<String, byte[]> contents = new TreeMap<>();
        long total = 0;
        try (ZipInputStream in = new ZipInputStream(Files.newInputStream(zip))) {
            for (ZipEntry entry = in.getNextEntry(); entry != null; entry = in.getNextEntry()) {
                if (entry.isDirectory() && entry.getName().equals("found/")) {
                    continue;
                }
                if (!OURS.matcher(entry.getName()).matches()) {
                    throw new CaseFileException(zip, 0, "it holds something that is no part of a case: "
                            + entry.getName(), "Zip the content of a case folder only");
                }
                byte[] bytes = read(in, MOST_BYTES - total, zip);
                total += bytes.length;
                if (contents.put(entry.getName(), bytes) != null) {
                    throw new CaseFileException(zip, 0, "it holds " + entry.getName() + " twice", "Zip the case again");
                }
            }
        } catch (ZipException e) {
            throw new CaseFileException(zip, 0, "it is no sound zip file: " + e.getMessage(), "Send the case again", e);
        }
        return contents;
    }

    private static byte[] read(InputStream in, long most, Path zip) throws IOException {
        ByteArrayOutputStream bytes = new ByteArrayOutputStream();
        byte[] buffer = new byte[1 << 16];
        for (int read = in.read(buffer); read >= 0; read = in.read(buffer)) {
            if (bytes.size() + (long) read > most) {
                throw new CaseFileException(zip, 0, "unpacked it has more than " + MOST_BYTES + " bytes",
                        "Name the zip file of a case");
            }
            bytes.write(buffer, 0, read);
        }
        return bytes.toByteArray();
    }
}
