package hemline.reader;

import io.jhdf.Superblock;
import io.jhdf.WritableGroupImpl;
import io.jhdf.api.WritableGroup;
import io.jhdf.storage.HdfFileChannel;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.channels.FileChannel;
import java.nio.file.Path;
import java.nio.file.StandardOpenOption;
import java.util.LinkedHashMap;
import java.util.Map;

/**
 * Writes a small ODIM_H5 file for a test. It starts out complete and sound; a test then changes the one thing that it
 * is about. Codes: gate g of ray r holds {@code 10 + r} at gate 0 and 0 (undetect) or 255 (nodata) elsewhere.
 */
final class OdimSketch {
    static final int RAYS = 12;
    static final int GATES = 8;

    private final Map<String, Map<String, Object>> attributes = new LinkedHashMap<>();
    private final Map<String, Object> arrays = new LinkedHashMap<>();

    OdimSketch(String conventions, String object) {
        if (!conventions.isEmpty()) {
            set("/", "Conventions", conventions);
        }
        set("/what", "object", object).set("/what", "version", "H5rad 2.3").set("/what", "date", "20200611")
                .set("/what", "time", "115959").set("/what", "source", "NOD:xxabc,PLC:Nowhere");
        set("/where", "lat", 52.5).set("/where", "lon", 13.4).set("/where", "height", 80.0);
        set("/how", "beamwidth", 0.95);
    }

    static OdimSketch volume() {
        return new OdimSketch("ODIM_H5/V2_3", "PVOL");
    }

    /** A sound dataset of twelve rays of 30 degrees and eight gates of 500 m, with DBZH. */
    OdimSketch dataset(int number, double elevationDeg) {
        return dataset(number, elevationDeg, RAYS, GATES);
    }

    OdimSketch dataset(int number, double elevationDeg, int rays, int gates) {
        String at = "/dataset" + number;
        set(at + "/what", "product", "SCAN").set(at + "/what", "startdate", "20200611")
                .set(at + "/what", "starttime", "120000").set(at + "/what", "enddate", "20200611")
                .set(at + "/what", "endtime", "120012");
        set(at + "/where", "elangle", elevationDeg).set(at + "/where", "nrays", rays).set(at + "/where", "nbins", gates)
                .set(at + "/where", "rstart", 0.0).set(at + "/where", "rscale", 500.0).set(at + "/where", "a1gate", 0);
        return field(number, 1, "DBZH", codes(rays, gates));
    }

    OdimSketch field(int dataset, int data, String quantity, Object codes) {
        String at = "/dataset" + dataset + "/data" + data;
        set(at + "/what", "quantity", quantity).set(at + "/what", "gain", 0.5).set(at + "/what", "offset", -32.0)
                .set(at + "/what", "nodata", 255.0).set(at + "/what", "undetect", 0.0);
        arrays.put(at + "/data", codes);
        return this;
    }

    static int[][] codes(int rays, int gates) {
        int[][] codes = new int[rays][gates];
        for (int ray = 0; ray < rays; ray++) {
            for (int gate = 0; gate < gates; gate++) {
                codes[ray][gate] = gate == 0 ? 10 + ray % 200 : gate % 2 == 0 ? 255 : 0;
            }
        }
        return codes;
    }

    OdimSketch array(String path, Object data) {
        arrays.put(path, data);
        return this;
    }

    OdimSketch set(String group, String name, Object value) {
        attributes.computeIfAbsent(group, g -> new LinkedHashMap<>()).put(name, value);
        return this;
    }

    OdimSketch without(String group, String name) {
        attributes.get(group).remove(name);
        return this;
    }

    Path write(Path folder) {
        return write(folder, "sketch.h5");
    }

    Path write(Path folder, String name) {
        Path file = folder.resolve(name);
        WritableGroupImpl root = new WritableGroupImpl(null, "/");
        Map<String, WritableGroup> groups = new LinkedHashMap<>(Map.of("", root, "/", root));
        attributes.forEach((path, values) -> values.forEach(group(groups, path)::putAttribute));
        arrays.forEach((path, data) -> {
            int slash = path.lastIndexOf('/');
            group(groups, path.substring(0, slash)).putDataset(path.substring(slash + 1), data);
        });
        // jHDF's own writable file lays a note over the groups that follow the last data set.
        try (FileChannel channel = FileChannel.open(file, StandardOpenOption.READ, StandardOpenOption.WRITE,
                StandardOpenOption.CREATE, StandardOpenOption.TRUNCATE_EXISTING)) {
            Superblock.SuperblockV2V3 superblock = new Superblock.SuperblockV2V3();
            HdfFileChannel out = new HdfFileChannel(channel, superblock);
            out.write(superblock.toBuffer(root.write(out, 64)), 0);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
        return file;
    }

    private static WritableGroup group(Map<String, WritableGroup> groups, String path) {
        WritableGroup known = groups.get(path);
        if (known == null) {
            int slash = path.lastIndexOf('/');
            known = group(groups, path.substring(0, slash)).putGroup(path.substring(slash + 1));
            groups.put(path, known);
        }
        return known;
    }
}
