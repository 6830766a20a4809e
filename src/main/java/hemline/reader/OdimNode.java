package hemline.reader;

import java.util.List;
import java.util.Optional;

/**
 * Attributes as ODIM_H5 inherits them: those of {@code dataN} stand before those of {@code datasetN} and of the root
 * (OPERA Data Information Model for HDF5, section on hierarchical structure).
 *
 * @param levels groups from the innermost outwards
 */
record OdimNode(List<ArrayGroup> levels) {
    static OdimNode of(ArrayGroup... innermostFirst) {
        return new OdimNode(List.of(innermostFirst));
    }

    String path() {
        return levels.get(0).path();
    }

    Optional<Double> number(String group, String name) throws UnreadableFileException {
        for (ArrayGroup level : levels) {
            Optional<ArrayGroup> inner = level.group(group);
            if (inner.isPresent()) {
                Optional<Double> found = inner.get().attributes().number(name);
                if (found.isPresent()) {
                    return found;
                }
            }
        }
        return Optional.empty();
    }

    Optional<double[]> numbers(String group, String name) throws UnreadableFileException {
        for (ArrayGroup level : levels) {
            Optional<ArrayGroup> inner = level.group(group);
            if (inner.isPresent()) {
                Optional<double[]> found = inner.get().attributes().numbers(name);
                if (found.isPresent()) {
                    return found;
                }
            }
        }
        return Optional.empty();
    }

    Optional<String> text(String group, String name) throws UnreadableFileException {
        for (ArrayGroup level : levels) {
            Optional<ArrayGroup> inner = level.group(group);
            if (inner.isPresent()) {
                Optional<String> found = inner.get().attributes().text(name).filter(t -> !t.isEmpty());
                if (found.isPresent()) {
                    return found;
                }
            }
        }
        return Optional.empty();
    }
}
