package hemline.reader;

import io.jhdf.HdfFile;
import io.jhdf.api.Attribute;
import io.jhdf.api.Dataset;
import io.jhdf.api.Group;
import io.jhdf.api.Node;
import io.jhdf.object.datatype.DataType;
import io.jhdf.object.datatype.StringData;
import io.jhdf.object.datatype.VariableLength;
import java.nio.ByteBuffer;
import java.nio.ByteOrder;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/**
 * HDF5 through jHDF, over bytes in memory: a corrupt address then fails at the end of the buffer, nothing is mapped
 * and no handle stays open. Links out of the file are not followed.
 */
final class Hdf5File implements ArrayFile {
    private static final long SIGNATURE = 0x0a1a0a0d46444889L;

    private final InputFile file;
    private final HdfFile hdf;

    private Hdf5File(InputFile file, HdfFile hdf) {
        this.file = file;
        this.hdf = hdf;
    }

    static Hdf5File open(InputFile file, ByteBuffer bytes) throws UnreadableFileException {
        return new Hdf5File(file, file.shield("", () -> {
            requireWhole(file, bytes.duplicate().order(ByteOrder.LITTLE_ENDIAN));
            return HdfFile.fromByteBuffer(bytes);
        }));
    }

    /** The superblock (HDF5 File Format Specification 3.0, section II.A) says where the file ends. */
    private static void requireWhole(InputFile file, ByteBuffer in) throws UnreadableFileException {
        int at = 0;
        while (in.getLong(at) != SIGNATURE) {
            at = at == 0 ? 512 : 2 * at;
        }
        int version = in.get(at + 8);
        int offsetBytes = in.get(at + (version < 2 ? 13 : 9));
        if (version < 0 || version > 3 || offsetBytes != 4 && offsetBytes != 8) {
            throw file.broken("superblock", "has version " + version + " and addresses of " + offsetBytes + " bytes");
        }
        int endAt = at + (version == 0 ? 24 : version == 1 ? 28 : 12) + 2 * offsetBytes;
        long end = offsetBytes == 8 ? in.getLong(endAt) : in.getInt(endAt) & 0xffffffffL;
        if (end > in.capacity()) {
            throw file.broken("", "is cut off: it has " + in.capacity() + " bytes, its header says " + end);
        }
    }

    @Override
    public String container() {
        return "HDF5";
    }

    @Override
    public ArrayGroup root() {
        return new HdfGroup(file, "/", hdf);
    }

    @Override
    public void close() {
        hdf.close();
    }

    private record HdfGroup(InputFile file, String path, Group group) implements ArrayGroup {
        @Override
        public Attributes attributes() {
            return new HdfAttributes(file, path, group);
        }

        @Override
        public List<String> groupNames() throws UnreadableFileException {
            return names(true);
        }

        @Override
        public List<String> variableNames() throws UnreadableFileException {
            return names(false);
        }

        private List<String> names(boolean groups) throws UnreadableFileException {
            return file.shield(path, () -> {
                List<String> found = new ArrayList<>();
                for (Map.Entry<String, Node> child : group.getChildren().entrySet()) {
                    Node node = child.getValue();
                    if (!node.isLink() && (groups ? node instanceof Group : node instanceof Dataset)) {
                        found.add(child.getKey());
                    }
                }
                return found;
            });
        }

        private Optional<Node> child(String name) throws UnreadableFileException {
            return file.shield(path, () -> Optional.ofNullable(group.getChildren().get(name))
                    .filter(node -> !node.isLink()));
        }

        @Override
        public Optional<ArrayGroup> group(String name) throws UnreadableFileException {
            return child(name).filter(Group.class::isInstance).map(g -> new HdfGroup(file, join(name), (Group) g));
        }

        @Override
        public Optional<ArrayVariable> variable(String name) throws UnreadableFileException {
            Optional<Node> node = child(name).filter(Dataset.class::isInstance);
            return node.isEmpty() ? Optional.empty()
                    : Optional.of(Hdf5Variable.of(file, name, join(name), (Dataset) node.get()));
        }

        private String join(String name) {
            return path.equals("/") ? "/" + name : path + "/" + name;
        }
    }

    /** Attributes of a node, each decoded when asked for. */
    record HdfAttributes(InputFile file, String path, Node node) implements Attributes {
        @Override
        public Optional<Object> value(String name) throws UnreadableFileException {
            return file.shield(path + "@" + name, () -> {
                Attribute attribute = node.getAttribute(name);
                if (attribute == null || attribute.isEmpty()) {
                    return Optional.empty();
                }
                long size = attribute.getSizeInBytes();
                if (size < 0 || size > 8L * Limits.MAX_FILE_RAYS) {
                    throw file.broken(path + "@" + name, "the attribute claims " + size + " bytes");
                }
                DataType type = attribute.getDataType();
                if (type instanceof StringData) {
                    byte[] bytes = new byte[Math.min(type.getSize(), attribute.getBuffer().remaining())];
                    attribute.getBuffer().duplicate().get(bytes);
                    return Optional.of(Hdf5HeapText.decode(bytes));
                }
                if (type instanceof VariableLength vary && vary.isVariableLengthString()) {
                    return Optional.of(Hdf5HeapText.read(node.getHdfFile().getHdfBackingStorage(),
                            attribute.getBuffer()));
                }
                return toPlain(attribute.getData());
            });
        }

        private static Optional<Object> toPlain(Object data) {
            Object first = data;
            while (first instanceof Object[] nested) {
                if (nested.length == 0) {
                    return Optional.empty();
                }
                if (nested[0] instanceof Number) {
                    double[] all = new double[nested.length];
                    for (int i = 0; i < all.length; i++) {
                        all[i] = ((Number) nested[i]).doubleValue();
                    }
                    return Optional.of(all);
                }
                first = nested[0];
            }
            if (first instanceof String text) {
                return Optional.of(text);
            }
            if (first instanceof Number number) {
                return Optional.of(new double[] {number.doubleValue()});
            }
            if (first instanceof Boolean flag) {
                return Optional.of(new double[] {flag ? 1 : 0});
            }
            if (first != null && first.getClass().isArray() && first.getClass().getComponentType().isPrimitive()
                    && !(first instanceof boolean[]) && !(first instanceof char[])) {
                double[] all = new RawArray(first, false).toDoubles();
                return all.length == 0 ? Optional.empty() : Optional.of(all);
            }
            return Optional.empty();
        }
    }
}
