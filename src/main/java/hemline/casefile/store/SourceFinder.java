package hemline.casefile.store;

import java.io.IOException;
import java.nio.file.FileVisitResult;
import java.nio.file.Files;
import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.nio.file.SimpleFileVisitor;
import java.nio.file.attribute.BasicFileAttributes;
import java.util.ArrayList;
import java.util.EnumSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.TreeSet;

/**
 * Finds the files that a case was made from on whatever machine it is opened, by their content.
 *
 * @param found   where each source is
 * @param missing those that are nowhere
 */
public record SourceFinder(Map<SourceFile, Path> found, List<SourceFile> missing) {
    private static final int DEEPEST = 12;
    private static final int MOST_FILES = 200_000;

    public SourceFinder {
        found = java.util.Collections.unmodifiableMap(new LinkedHashMap<>(found));
        missing = List.copyOf(missing);
    }

    /** The source that a file is, with its path told from the case folder. */
    public static SourceFile describe(Path caseFolder, Path file) throws IOException {
        Path from = caseFolder.toAbsolutePath().normalize();
        Path to = file.toAbsolutePath().normalize();
        // On Windows another drive has no relative path.
        boolean related = from.getRoot() != null && from.getRoot().equals(to.getRoot());
        Path told = related ? from.relativize(to) : to;
        return new SourceFile(told.toString().replace('\\', '/'), Sha256.of(file), Files.size(file));
    }

    /**
     * Looks where each source was, seen from the case folder, then through other folders. A file is a source only if
     * its length and SHA-256 are right; its name does not matter. Links to folders are not followed.
     *
     * @param searchIn folders or files to look through, in this order; at most {@value #MOST_FILES} files are looked at
     */
    public static SourceFinder find(Path caseFolder, List<SourceFile> sources, List<Path> searchIn)
            throws IOException {
        Map<SourceFile, Path> found = new LinkedHashMap<>();
        List<SourceFile> lost = new ArrayList<>();
        for (SourceFile source : sources) {
            Path there = there(caseFolder, source);
            if (there != null && is(there, source)) {
                found.put(source, there);
            } else if (!lost.contains(source)) {
                lost.add(source);
            }
        }
        for (Path place : searchIn) {
            if (!lost.isEmpty() && Files.exists(place)) {
                for (Path candidate : ofSameLength(place, lost)) {
                    lost.removeIf(source -> taken(candidate, source, found));
                }
            }
        }
        Map<SourceFile, Path> inOrder = new LinkedHashMap<>();
        sources.stream().filter(found::containsKey).forEach(source -> inOrder.put(source, found.get(source)));
        return new SourceFinder(inOrder, lost);
    }

    private static boolean taken(Path candidate, SourceFile source, Map<SourceFile, Path> found) {
        try {
            if (is(candidate, source)) {
                found.put(source, candidate);
                return true;
            }
            return false;
        } catch (IOException e) {
            // A file that cannot be read is not the one that is sought; the source stays among the missing.
            return false;
        }
    }

    private static Path there(Path caseFolder, SourceFile source) {
        try {
            return caseFolder.resolve(source.path()).normalize();
        } catch (InvalidPathException e) {
            // A path from another system may be none here; content still finds the file.
            return null;
        }
    }

    private static boolean is(Path file, SourceFile source) throws IOException {
        return Files.isRegularFile(file) && Files.size(file) == source.bytes()
                && Sha256.of(file).equals(source.sha256());
    }

    private static TreeSet<Path> ofSameLength(Path place, List<SourceFile> lost) throws IOException {
        TreeSet<Path> candidates = new TreeSet<>();
        Files.walkFileTree(place, EnumSet.noneOf(java.nio.file.FileVisitOption.class), DEEPEST,
                new SimpleFileVisitor<>() {
                    private int looked;

                    @Override
                    public FileVisitResult visitFile(Path file, BasicFileAttributes attributes) {
                        boolean fits = attributes.isRegularFile()
                                && lost.stream().anyMatch(source -> source.bytes() == attributes.size());
                        if (fits) {
                            candidates.add(file);
                        }
                        return ++looked < MOST_FILES ? FileVisitResult.CONTINUE : FileVisitResult.TERMINATE;
                    }

                    @Override
                    public FileVisitResult visitFileFailed(Path file, IOException e) {
                        // A folder that may not be read holds nothing that can be used.
                        return FileVisitResult.CONTINUE;
                    }
                });
        return candidates;
    }
}
