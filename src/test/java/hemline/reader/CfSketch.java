package hemline.reader;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Path;
import java.util.LinkedHashMap;
import java.util.Map;
import ucar.ma2.Array;
import ucar.ma2.DataType;
import ucar.ma2.InvalidRangeException;
import ucar.nc2.NetcdfFileWriteable;

/**
 * Writes a small CfRadial 1 file in netCDF-3 for a test. It starts out complete and sound, one sweep of twelve rays
 * of 30 degrees and eight gates of 500 m; a test then changes the one thing that it is about.
 */
final class CfSketch {
    static final int RAYS = 12;
    static final int GATES = 8;
    private static final float FILL = -9999;

    private final Map<String, Integer> dimensions = new LinkedHashMap<>();
    private final Map<String, String> dimensionsOf = new LinkedHashMap<>();
    private final Map<String, Object> data = new LinkedHashMap<>();
    private final Map<String, Map<String, Object>> attributes = new LinkedHashMap<>();

    CfSketch() {
        this(RAYS, GATES);
    }

    CfSketch(int rays, int gates) {
        dimensions.put("time", rays);
        dimensions.put("range", gates);
        dimensions.put("sweep", 1);
        dimensions.put("text", 32);
        attributes.put("", new LinkedHashMap<>(Map.of("Conventions", "CF/Radial", "version", "1.3",
                "instrument_name", "abc")));
        double[] time = new double[rays];
        float[] azimuth = new float[rays];
        float[] elevation = new float[rays];
        float[][] dbz = new float[rays][gates];
        for (int ray = 0; ray < rays; ray++) {
            time[ray] = ray;
            azimuth[ray] = (ray + 0.5f) * 360 / rays;
            elevation[ray] = 0.5f;
            for (int gate = 0; gate < gates; gate++) {
                dbz[ray][gate] = gate == 0 ? ray : FILL;
            }
        }
        float[] range = new float[gates];
        for (int gate = 0; gate < gates; gate++) {
            range[gate] = 250 + 500 * gate;
        }
        variable("time", "time", time).attribute("time", "units", "seconds since 2020-06-11T12:00:00Z");
        variable("range", "range", range).attribute("range", "units", "meters");
        variable("azimuth", "time", azimuth).variable("elevation", "time", elevation);
        variable("DBZ", "time range", flat(dbz)).attribute("DBZ", "_FillValue", FILL)
                .attribute("DBZ", "standard_name", "equivalent_reflectivity_factor").attribute("DBZ", "units", "dBZ");
        variable("sweep_start_ray_index", "sweep", new int[] {0});
        variable("sweep_end_ray_index", "sweep", new int[] {rays - 1});
        variable("fixed_angle", "sweep", new float[] {0.5f});
        text("sweep_mode", "azimuth_surveillance");
        variable("latitude", "", new double[] {52.5}).variable("longitude", "", new double[] {13.4})
                .variable("altitude", "", new double[] {80});
    }

    static float[] flat(float[][] rows) {
        float[] all = new float[rows.length * rows[0].length];
        for (int i = 0; i < rows.length; i++) {
            System.arraycopy(rows[i], 0, all, i * rows[0].length, rows[0].length);
        }
        return all;
    }

    CfSketch dimension(String name, int size) {
        dimensions.put(name, size);
        return this;
    }

    /** @param over names of dimensions, slowest first; values is a flat primitive array */
    CfSketch variable(String name, String over, Object values) {
        dimensionsOf.put(name, over);
        data.put(name, values);
        return this;
    }

    /** A character array {@code (sweep, text)}, all sweeps with the same text. */
    CfSketch text(String name, String value) {
        int sweeps = dimensions.get("sweep");
        char[] all = new char[32 * sweeps];
        for (int i = 0; i < all.length; i++) {
            all[i] = i % 32 < value.length() ? value.charAt(i % 32) : ' ';
        }
        return variable(name, "sweep text", all);
    }

    CfSketch attribute(String variable, String name, Object value) {
        attributes.computeIfAbsent(variable, v -> new LinkedHashMap<>()).put(name, value);
        return this;
    }

    CfSketch without(String variable) {
        dimensionsOf.remove(variable);
        data.remove(variable);
        attributes.remove(variable);
        return this;
    }

    Path write(Path folder) {
        return write(folder, "sketch.nc");
    }

    Path write(Path folder, String name) {
        Path file = folder.resolve(name);
        try {
            NetcdfFileWriteable out = NetcdfFileWriteable.createNew(file.toString(), false);
            dimensions.forEach(out::addDimension);
            dimensionsOf.forEach((variable, over) -> out.addVariable(variable, type(data.get(variable)), over));
            attributes.forEach((variable, values) -> values.forEach((key, value) -> {
                if (variable.isEmpty()) {
                    out.addGlobalAttribute(key, (String) value);
                } else if (value instanceof Number number) {
                    out.addVariableAttribute(variable, key, number);
                } else if (value instanceof String text) {
                    out.addVariableAttribute(variable, key, text);
                } else {
                    out.addVariableAttribute(variable, key, Array.factory(value));
                }
            }));
            out.create();
            for (Map.Entry<String, Object> entry : data.entrySet()) {
                out.write(entry.getKey(), shaped(entry.getKey(), entry.getValue()));
            }
            out.close();
        } catch (IOException | InvalidRangeException e) {
            throw new UncheckedIOException(new IOException(e));
        }
        return file;
    }

    private Array shaped(String name, Object values) {
        String over = dimensionsOf.get(name);
        int[] shape = over.isEmpty() ? new int[0]
                : java.util.Arrays.stream(over.split(" ")).mapToInt(dimensions::get).toArray();
        return Array.factory(type(values), shape, values);
    }

    private static DataType type(Object values) {
        return values instanceof double[] ? DataType.DOUBLE : values instanceof float[] ? DataType.FLOAT
                : values instanceof int[] ? DataType.INT : values instanceof short[] ? DataType.SHORT
                : values instanceof byte[] ? DataType.BYTE : DataType.CHAR;
    }
}
