package hemline.reader;

import io.jhdf.api.Dataset;
import io.jhdf.api.dataset.ChunkedDataset;
import io.jhdf.api.dataset.ContiguousDataset;
import io.jhdf.dataset.CompactDataset;
import io.jhdf.exceptions.HdfException;
import io.jhdf.exceptions.HdfFilterException;
import io.jhdf.filter.PipelineFilterWithData;
import java.nio.ByteBuffer;
import java.nio.ByteOrder;
import java.util.Arrays;
import java.util.List;
import java.util.zip.DataFormatException;
import java.util.zip.Inflater;

/**
 * The bytes of some rows of an HDF5 dataset. Only chunks that hold wanted rows are unpacked, into no more bytes than
 * a chunk has. Chunks are unpacked here since jHDF 0.9.4 neither bounds the unpacked size, nor heeds the mask by which
 * a writer marks a chunk that deflate did not shrink, nor puts the fill value where a chunk was never written.
 */
final class Hdf5Bytes {
    private static final int DEFLATE = 1;
    private static final int SHUFFLE = 2;
    private static final int FLETCHER32 = 3;

    private Hdf5Bytes() {
    }

    /** @param order byte order of the stored numbers, for fill values */
    static ByteBuffer rows(InputFile file, String path, Dataset dataset, int[] shape, int elementBytes,
                           ByteOrder order, int from, int count) throws UnreadableFileException {
        if (dataset instanceof ChunkedDataset chunked && shape.length > 0) {
            return new Chunks(file, path, chunked, shape, elementBytes, order).rows(from, count);
        }
        int rowBytes = elementBytes;
        for (int i = 1; i < shape.length; i++) {
            rowBytes = Math.multiplyExact(rowBytes, shape[i]);
        }
        int offset = Math.multiplyExact(from, rowBytes);
        int length = Math.multiplyExact(count, rowBytes);
        if (dataset instanceof ContiguousDataset plain && !plain.isEmpty()) {
            return plain.getBuffer().duplicate().position(offset).limit(offset + length).slice();
        }
        byte[] filled = new byte[length];
        if (dataset instanceof CompactDataset compact) {
            return compact.getDataBuffer().duplicate()
                    .position(offset).limit(offset + length).slice();
        }
        fill(filled, dataset.getFillValue(), elementBytes, order);
        return ByteBuffer.wrap(filled);
    }

    private static void fill(byte[] into, Object value, int elementBytes, ByteOrder order) {
        if (!(value instanceof Number number) || into.length == 0) {
            return;
        }
        ByteBuffer one = ByteBuffer.allocate(8).order(order);
        if (value instanceof Double) {
            one.putDouble(number.doubleValue());
        } else if (value instanceof Float) {
            one.putFloat(number.floatValue());
        } else {
            long bits = number.longValue();
            for (int i = 0; i < elementBytes; i++) {
                int shift = order == ByteOrder.LITTLE_ENDIAN ? i : elementBytes - 1 - i;
                one.put((byte) (bits >> 8 * shift));
            }
        }
        for (int i = 0; i < into.length; i++) {
            into[i] = one.get(i % elementBytes);
        }
    }

    private static final class Chunks {
        private final InputFile file;
        private final String path;
        private final ChunkedDataset dataset;
        private final int[] shape;
        private final int[] chunk;
        private final int elementBytes;
        private final ByteOrder order;
        private final int chunkBytes;
        private final List<PipelineFilterWithData> filters;
        private byte[] unfilled;

        Chunks(InputFile file, String path, ChunkedDataset dataset, int[] shape, int elementBytes,
               ByteOrder order) throws UnreadableFileException {
            this.file = file;
            this.path = path;
            this.dataset = dataset;
            this.shape = shape;
            this.elementBytes = elementBytes;
            this.order = order;
            chunk = dataset.getChunkDimensions();
            if (chunk.length != shape.length) {
                throw file.broken(path, "chunks have " + chunk.length + " dimensions, the array " + shape.length);
            }
            for (int size : chunk) {
                if (size < 1) {
                    throw file.broken(path, "a chunk has size " + size);
                }
            }
            chunkBytes = Math.multiplyExact(Limits.elements(file, path, chunk), elementBytes);
            filters = filters(file, path, dataset);
            for (PipelineFilterWithData filter : filters) {
                if (filter.getId() != DEFLATE && filter.getId() != SHUFFLE && filter.getId() != FLETCHER32) {
                    throw unsupported(file, path, filter.getName() + " id=" + filter.getId());
                }
            }
        }

        private static List<PipelineFilterWithData> filters(InputFile file, String path, ChunkedDataset dataset)
                throws UnreadableFileException {
            try {
                return dataset.getFilters();
            } catch (HdfFilterException e) {
                throw unsupported(file, path, String.valueOf(e.getMessage()));
            }
        }

        private static UnreadableFileException unsupported(InputFile file, String path, String filter) {
            return file.fault(path, "is packed with an HDF5 filter that is not supported (" + filter + ")",
                    "repack it with deflate, for example: h5repack -f GZIP=4 IN OUT");
        }

        ByteBuffer rows(int from, int count) throws UnreadableFileException {
            int[] wanted = shape.clone();
            wanted[0] = count;
            byte[] into = new byte[Math.multiplyExact(Limits.elements(file, path, wanted), elementBytes)];
            if (into.length == 0) {
                return ByteBuffer.wrap(into);
            }
            boolean written = !dataset.isEmpty();
            int[] offset = new int[shape.length];
            offset[0] = from / chunk[0] * chunk[0];
            do {
                copy(written ? unpacked(offset) : unfilled(), offset, into, from, count);
            } while (next(offset, from, count));
            return ByteBuffer.wrap(into);
        }

        private boolean next(int[] offset, int from, int count) {
            for (int d = shape.length - 1; d >= 0; d--) {
                offset[d] += chunk[d];
                if (offset[d] < (d == 0 ? from + count : shape[d])) {
                    return true;
                }
                offset[d] = d == 0 ? offset[d] : 0;
            }
            return false;
        }

        /** Copies the part of a chunk that lies inside the wanted rows, one run of the fastest dimension at a time. */
        private void copy(byte[] source, int[] offset, byte[] into, int from, int count) {
            int last = shape.length - 1;
            int[] lowest = new int[shape.length];
            int[] highest = new int[shape.length];
            for (int d = 0; d <= last; d++) {
                lowest[d] = d == 0 ? Math.max(offset[0], from) : offset[d];
                highest[d] = Math.min(offset[d] + chunk[d], d == 0 ? from + count : shape[d]);
            }
            int[] at = lowest.clone();
            int run = (highest[last] - lowest[last]) * elementBytes;
            while (true) {
                int inChunk = 0;
                int inArray = 0;
                for (int d = 0; d <= last; d++) {
                    inChunk = inChunk * chunk[d] + at[d] - offset[d];
                    inArray = inArray * (d == 0 ? count : shape[d]) + at[d] - (d == 0 ? from : 0);
                }
                System.arraycopy(source, inChunk * elementBytes, into, inArray * elementBytes, run);
                int d = last - 1;
                while (d >= 0 && ++at[d] == highest[d]) {
                    at[d] = lowest[d];
                    d--;
                }
                if (d < 0) {
                    return;
                }
            }
        }

        private byte[] unfilled() {
            if (unfilled == null) {
                unfilled = new byte[chunkBytes];
                fill(unfilled, dataset.getFillValue(), elementBytes, order);
            }
            return unfilled;
        }

        private byte[] unpacked(int[] offset) throws UnreadableFileException {
            ByteBuffer raw;
            try {
                raw = dataset.getRawChunkBuffer(offset.clone());
            } catch (HdfException e) {
                String message = String.valueOf(e.getMessage());
                // A chunk that was never written is missing from the index, or in it without an address.
                if (message.startsWith("No chunk with offset") || message.endsWith("at address -1")) {
                    return unfilled();
                }
                throw e;
            }
            byte[] bytes = new byte[raw.remaining()];
            raw.get(bytes);
            for (int i = filters.size() - 1; i >= 0; i--) {
                int id = filters.get(i).getId();
                if (id == FLETCHER32) {
                    bytes = bytes.length >= 4 ? Arrays.copyOf(bytes, bytes.length - 4) : bytes;
                } else if (id == DEFLATE) {
                    bytes = inflated(bytes);
                } else if (elementBytes > 1) {
                    bytes = unshuffled(bytes);
                }
            }
            if (bytes.length < chunkBytes) {
                throw file.broken(path, "a chunk unpacks to " + bytes.length + " bytes, " + chunkBytes + " are needed");
            }
            return bytes;
        }

        /** A chunk that deflate would not have shrunk is stored as it is. */
        private byte[] inflated(byte[] packed) throws UnreadableFileException {
            Inflater inflater = new Inflater();
            try {
                inflater.setInput(packed);
                byte[] out = new byte[chunkBytes];
                int length = 0;
                while (length < chunkBytes) {
                    int got = inflater.inflate(out, length, chunkBytes - length);
                    if (got == 0) {
                        break;
                    }
                    length += got;
                }
                if (length == chunkBytes) {
                    return out;
                }
            } catch (DataFormatException e) {
                if (packed.length != chunkBytes) {
                    throw file.broken(path, "a packed chunk is damaged (" + e.getMessage() + ")");
                }
            } finally {
                inflater.end();
            }
            if (packed.length == chunkBytes) {
                return packed;
            }
            throw file.broken(path, "a packed chunk ends early");
        }

        private byte[] unshuffled(byte[] shuffled) {
            int n = shuffled.length / elementBytes;
            byte[] out = new byte[shuffled.length];
            for (int b = 0; b < elementBytes; b++) {
                for (int i = 0, to = b, at = b * n; i < n; i++, to += elementBytes) {
                    out[to] = shuffled[at++];
                }
            }
            System.arraycopy(shuffled, n * elementBytes, out, n * elementBytes, shuffled.length - n * elementBytes);
            return out;
        }
    }
}
