package hemline.casefile.store;

import java.io.IOException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;

/** Tells case folders from other folders. */
public final class CaseFolders {
    private CaseFolders() {
    }

    public static boolean isCase(CaseFiles files, Path folder) {
        return files.exists(folder.resolve(CaseFolder.HEAD));
    }

    /** The folder itself if it is a case, else those of its folders that are, by name. */
    public static List<Path> in(CaseFiles files, Path folder) throws IOException {
        if (isCase(files, folder)) {
            return List.of(folder);
        }
        List<Path> cases = new ArrayList<>();
        for (String name : files.list(folder)) {
            if (isCase(files, folder.resolve(name))) {
                cases.add(folder.resolve(name));
            }
        }
        return cases;
    }
}
