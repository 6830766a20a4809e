package hemline.reader;

import io.jhdf.api.Dataset;
import io.jhdf.object.datatype.DataType;
import io.jhdf.object.datatype.EnumDataType;
import io.jhdf.object.datatype.FixedPoint;
import io.jhdf.object.datatype.FloatingPoint;
import io.jhdf.object.datatype.OrderedDataType;
import io.jhdf.object.datatype.StringData;
import io.jhdf.object.datatype.VariableLength;
import java.nio.ByteBuffer;
import java.nio.ByteOrder;
import java.util.ArrayList;
import java.util.List;

/** An HDF5 dataset of plain numbers or text. */
final class Hdf5Variable implements ArrayVariable {
    private final InputFile file;
    private final String name;
    private final String path;
    private final Dataset dataset;
    private final DataType type;
    private final int[] shape;

    private Hdf5Variable(InputFile file, String name, String path, Dataset dataset, DataType type, int[] shape) {
        this.file = file;
        this.name = name;
        this.path = path;
        this.dataset = dataset;
        this.type = type;
        this.shape = shape;
    }

    static Hdf5Variable of(InputFile file, String name, String path, Dataset dataset) throws UnreadableFileException {
        return file.shield(path, () -> {
            DataType type = dataset.getDataType();
            DataType plain = type instanceof EnumDataType named ? named.getBaseType() : type;
            int[] shape = dataset.getDimensions();
            return new Hdf5Variable(file, name, path, dataset, plain, shape == null ? new int[0] : shape);
        });
    }

    @Override
    public String name() {
        return name;
    }

    @Override
    public String path() {
        return path;
    }

    @Override
    public int[] shape() {
        return shape.clone();
    }

    @Override
    public boolean isText() {
        return type instanceof StringData || type instanceof VariableLength vary && vary.isVariableLengthString();
    }

    @Override
    public Attributes attributes() {
        return new Hdf5File.HdfAttributes(file, path, dataset);
    }

    @Override
    public RawArray read() throws UnreadableFileException {
        return rows(0, shape.length == 0 ? 1 : shape[0]);
    }

    @Override
    public RawArray rows(int from, int count) throws UnreadableFileException {
        int[] wanted = shape.clone();
        if (wanted.length > 0) {
            if (from < 0 || count < 0 || from + (long) count > wanted[0]) {
                throw file.broken(path, "rows " + from + " to " + (from + count - 1L) + " are asked for, it has "
                        + wanted[0]);
            }
            wanted[0] = count;
        }
        int elements = Limits.elements(file, path, wanted);
        int size = elementBytes();
        if ((long) elements * size > Limits.MAX_CELLS * 8) {
            throw file.broken(path, "the array claims " + (long) elements * size + " bytes");
        }
        return file.shield(path, () -> typed(Hdf5Bytes.rows(file, path, dataset, shape, size, order(), from,
                count), elements));
    }

    private int elementBytes() throws UnreadableFileException {
        int size = type.getSize();
        boolean plain = type instanceof FixedPoint && (size == 1 || size == 2 || size == 4 || size == 8)
                || type instanceof FloatingPoint && (size == 4 || size == 8);
        if (!plain) {
            throw file.fault(path, "its numbers are stored as " + type.getClass().getSimpleName() + " of " + size
                    + " bytes, which is not supported", "convert the file to plain integers or floats");
        }
        return size;
    }

    private ByteOrder order() {
        return type instanceof OrderedDataType ordered ? ordered.getByteOrder() : ByteOrder.LITTLE_ENDIAN;
    }

    private RawArray typed(ByteBuffer bytes, int elements) {
        bytes.order(order());
        if (type instanceof FloatingPoint) {
            if (type.getSize() == 4) {
                float[] values = new float[elements];
                bytes.asFloatBuffer().get(values);
                return new RawArray(values, false);
            }
            double[] values = new double[elements];
            bytes.asDoubleBuffer().get(values);
            return new RawArray(values, false);
        }
        boolean unsigned = !((FixedPoint) type).isSigned();
        switch (type.getSize()) {
            case 1:
                byte[] b = new byte[elements];
                bytes.get(b);
                return new RawArray(b, unsigned);
            case 2:
                short[] s = new short[elements];
                bytes.asShortBuffer().get(s);
                return new RawArray(s, unsigned);
            case 4:
                int[] n = new int[elements];
                bytes.asIntBuffer().get(n);
                return new RawArray(n, unsigned);
            default:
                long[] l = new long[elements];
                bytes.asLongBuffer().get(l);
                return new RawArray(l, unsigned);
        }
    }

    @Override
    public List<String> texts() throws UnreadableFileException {
        int elements = Limits.elements(file, path, shape);
        if (!isText() || elements > Limits.MAX_FILE_RAYS) {
            throw file.broken(path, "is no short text");
        }
        boolean fixed = type instanceof StringData;
        int size = type.getSize();
        // netCDF stores a character array as strings of one byte.
        int textBytes = fixed && size == 1 && shape.length > 0 ? Math.max(1, shape[shape.length - 1]) : size;
        return file.shield(path, () -> {
            ByteBuffer all = Hdf5Bytes.rows(file, path, dataset, shape, size, ByteOrder.LITTLE_ENDIAN, 0,
                    shape.length == 0 ? 1 : shape[0]);
            List<String> texts = new ArrayList<>();
            while (all.remaining() >= textBytes && textBytes > 0) {
                ByteBuffer one = all.slice().limit(textBytes);
                byte[] bytes = new byte[textBytes];
                one.duplicate().get(bytes);
                texts.add(Attributes.clean(fixed ? Hdf5HeapText.decode(bytes)
                        : Hdf5HeapText.read(dataset.getHdfFile().getHdfBackingStorage(), one)));
                all.position(all.position() + textBytes);
            }
            return texts;
        });
    }
}
