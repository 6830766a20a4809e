package hemline.simulation.files;

import io.jhdf.Superblock.SuperblockV2V3;
import io.jhdf.WritableGroupImpl;
import io.jhdf.api.WritableGroup;
import io.jhdf.exceptions.HdfException;
import io.jhdf.storage.HdfFileChannel;
import java.io.IOException;
import java.nio.channels.FileChannel;
import java.nio.file.Path;
import java.nio.file.StandardOpenOption;

/**
 * An HDF5 file built in memory and written at once. jHDF's own writable file would add a note of operating system and
 * processor, so that bytes differ between machines, and would lay it over the groups that follow the last data set.
 */
final class Hdf5Out {
    private static final long ROOT_ADDRESS = 64;
    private final WritableGroupImpl root = new WritableGroupImpl(null, "/");

    WritableGroup root() {
        return root;
    }

    void writeTo(Path file) throws IOException {
        try (FileChannel channel = FileChannel.open(file, StandardOpenOption.READ, StandardOpenOption.WRITE,
                StandardOpenOption.CREATE, StandardOpenOption.TRUNCATE_EXISTING)) {
            SuperblockV2V3 superblock = new SuperblockV2V3();
            HdfFileChannel out = new HdfFileChannel(channel, superblock);
            long end = root.write(out, ROOT_ADDRESS);
            out.write(superblock.toBuffer(end), 0);
            if (channel.size() != end) {
                throw new IOException(file + ": " + channel.size() + " bytes written, expected " + end);
            }
        } catch (HdfException e) {
            throw new IOException(file + ": cannot be written: " + e.getMessage(), e);
        }
    }
}
