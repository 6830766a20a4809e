package hemline.reader;

import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import ucar.ma2.Array;
import ucar.ma2.DataType;
import ucar.ma2.InvalidRangeException;
import ucar.nc2.Attribute;
import ucar.nc2.NetcdfFile;
import ucar.nc2.Variable;

/**
 * netCDF classic through NetCDF-Java, over bytes in memory and with its one classic reader named, so that it neither
 * guesses by the file's name nor writes beside it.
 */
final class ClassicFile implements ArrayFile {
    private static final String CLASSIC_READER = "ucar.nc2.iosp.netcdf3.N3raf";

    private final InputFile file;
    private final NetcdfFile netcdf;

    private ClassicFile(InputFile file, NetcdfFile netcdf) {
        this.file = file;
        this.netcdf = netcdf;
    }

    static ClassicFile open(InputFile file, byte[] bytes) throws UnreadableFileException {
        ClassicHeader.check(file, bytes);
        return new ClassicFile(file, file.shield("", () -> {
            try {
                return NetcdfFile.openInMemory("radar", bytes, CLASSIC_READER);
            } catch (ReflectiveOperationException e) {
                throw new IllegalStateException("the netCDF-3 reader is not on the class path", e);
            }
        }));
    }

    @Override
    public String container() {
        return "netCDF-3";
    }

    @Override
    public ArrayGroup root() {
        return new Root();
    }

    @Override
    public void close() {
        try {
            netcdf.close();
        } catch (IOException e) {
            throw new java.io.UncheckedIOException(e);
        }
    }

    private static Optional<Object> plain(Attribute attribute) {
        if (attribute == null || attribute.getLength() == 0) {
            return Optional.empty();
        }
        if (attribute.isString()) {
            return Optional.ofNullable(attribute.getStringValue());
        }
        double[] values = new double[attribute.getLength()];
        for (int i = 0; i < values.length; i++) {
            values[i] = attribute.getNumericValue(i).doubleValue();
        }
        return Optional.of(values);
    }

    private final class Root implements ArrayGroup {
        @Override
        public String path() {
            return "/";
        }

        @Override
        public Attributes attributes() {
            return name -> file.shield("/@" + name, () -> plain(netcdf.findGlobalAttribute(name)));
        }

        @Override
        public List<String> groupNames() {
            return List.of();
        }

        @Override
        public Optional<ArrayGroup> group(String name) {
            return Optional.empty();
        }

        @Override
        public List<String> variableNames() throws UnreadableFileException {
            return file.shield("/", () -> netcdf.getVariables().stream().map(Variable::getShortName).toList());
        }

        @Override
        public Optional<ArrayVariable> variable(String name) throws UnreadableFileException {
            return file.shield("/", () -> netcdf.getVariables().stream().filter(v -> v.getShortName().equals(name))
                    .findFirst().map(v -> new ClassicVariable(file, v)));
        }
    }

    private record ClassicVariable(InputFile file, Variable variable) implements ArrayVariable {
        @Override
        public String name() {
            return variable.getShortName();
        }

        @Override
        public String path() {
            return "/" + name();
        }

        @Override
        public int[] shape() {
            return variable.getShape();
        }

        @Override
        public boolean isText() {
            return variable.getDataType() == DataType.CHAR;
        }

        @Override
        public Attributes attributes() {
            return name -> file.shield(path() + "@" + name, () -> plain(variable.findAttribute(name)));
        }

        @Override
        public RawArray read() throws UnreadableFileException {
            Limits.elements(file, path(), shape());
            return file.shield(path(), () -> raw(variable.read()));
        }

        @Override
        public RawArray rows(int from, int count) throws UnreadableFileException {
            int[] shape = shape();
            if (shape.length == 0) {
                return read();
            }
            if (from < 0 || count < 0 || from + (long) count > shape[0]) {
                throw file.broken(path(), "rows " + from + " to " + (from + count - 1L) + " are asked for, it has "
                        + shape[0]);
            }
            int[] origin = new int[shape.length];
            origin[0] = from;
            shape[0] = count;
            Limits.elements(file, path(), shape);
            return file.shield(path(), () -> {
                try {
                    return raw(variable.read(origin, shape));
                } catch (InvalidRangeException e) {
                    throw new IOException(e);
                }
            });
        }

        private RawArray raw(Array array) {
            return new RawArray(array.copyTo1DJavaArray(), variable.isUnsigned());
        }

        @Override
        public List<String> texts() throws UnreadableFileException {
            int elements = Limits.elements(file, path(), shape());
            if (!isText() || elements > Limits.MAX_FILE_RAYS) {
                throw file.broken(path(), "is no short text");
            }
            return file.shield(path(), () -> {
                char[] all = (char[]) variable.read().copyTo1DJavaArray();
                int[] shape = shape();
                int perText = shape.length == 0 ? 1 : Math.max(1, shape[shape.length - 1]);
                List<String> texts = new ArrayList<>();
                for (int i = 0; i + perText <= all.length; i += perText) {
                    texts.add(Attributes.clean(new String(all, i, perText)));
                }
                return texts;
            });
        }
    }
}
