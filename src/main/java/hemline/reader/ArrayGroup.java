package hemline.reader;

import java.util.List;
import java.util.Optional;

/** A group of arrays and groups; netCDF-3 has one. */
interface ArrayGroup {
    /** Path from the root, {@code /} for the root itself. */
    String path();

    Attributes attributes();

    List<String> groupNames() throws UnreadableFileException;

    Optional<ArrayGroup> group(String name) throws UnreadableFileException;

    /** Names of the arrays in the order of the file. */
    List<String> variableNames() throws UnreadableFileException;

    Optional<ArrayVariable> variable(String name) throws UnreadableFileException;
}
