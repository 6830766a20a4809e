package hemline.reader;

import java.io.IOException;
import java.nio.file.FileVisitOption;
import java.nio.file.FileVisitResult;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.SimpleFileVisitor;
import java.nio.file.attribute.BasicFileAttributes;
import java.util.ArrayList;
import java.util.EnumSet;
import java.util.HashSet;
import java.util.List;
import java.util.Set;

/** Files named and files found in named folders, each once. */
final class InputPaths {
    private static final int DEEPEST = 32;

    private InputPaths() {
    }

    /**
     * A file to look at.
     *
     * @param found true if it was found in a folder rather than named
     */
    record Candidate(Path path, boolean found) {
    }

    /** Named files in the order given; those of a folder, and of its folders, in the order of their paths. */
    static List<Candidate> expand(List<Path> paths) {
        List<Candidate> all = new ArrayList<>();
        Set<Path> seen = new HashSet<>();
        for (Path path : paths) {
            if (!Files.isDirectory(path)) {
                add(all, seen, new Candidate(path, false));
                continue;
            }
            List<Path> inside = new ArrayList<>();
            List<Path> unreadable = new ArrayList<>();
            walk(path, inside, unreadable);
            inside.stream().sorted().forEach(file -> add(all, seen, new Candidate(file, true)));
            unreadable.stream().sorted().forEach(file -> add(all, seen, new Candidate(file, false)));
        }
        return all;
    }

    private static void add(List<Candidate> all, Set<Path> seen, Candidate candidate) {
        if (seen.add(candidate.path().toAbsolutePath().normalize())) {
            all.add(candidate);
        }
    }

    private static void walk(Path folder, List<Path> files, List<Path> unreadable) {
        try {
            Files.walkFileTree(folder, EnumSet.of(FileVisitOption.FOLLOW_LINKS), DEEPEST, new SimpleFileVisitor<>() {
                @Override
                public FileVisitResult preVisitDirectory(Path dir, BasicFileAttributes attributes) {
                    return !dir.equals(folder) && isHidden(dir) ? FileVisitResult.SKIP_SUBTREE
                            : FileVisitResult.CONTINUE;
                }

                @Override
                public FileVisitResult visitFile(Path file, BasicFileAttributes attributes) {
                    if (attributes.isRegularFile() && !isHidden(file)) {
                        files.add(file);
                    }
                    return FileVisitResult.CONTINUE;
                }

                @Override
                public FileVisitResult visitFileFailed(Path file, IOException e) {
                    unreadable.add(file);
                    return FileVisitResult.CONTINUE;
                }
            });
        } catch (IOException e) {
            unreadable.add(folder);
        }
    }

    private static boolean isHidden(Path path) {
        Path name = path.getFileName();
        return name != null && name.toString().startsWith(".");
    }
}
