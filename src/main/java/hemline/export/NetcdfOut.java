package hemline.export;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import ucar.ma2.Array;
import ucar.ma2.DataType;
import ucar.ma2.InvalidRangeException;
import ucar.nc2.NetcdfFileWriteable;

/** A netCDF-3 classic file whose variables are declared with their values and written in one go. */
final class NetcdfOut {
    private static final int NAME_LENGTH = 64;

    private final Map<String, Integer> dimensions = new LinkedHashMap<>();
    private final Map<String, String> globals = new LinkedHashMap<>();
    private final Map<String, Declared> variables = new LinkedHashMap<>();

    private record Declared(DataType type, String dimensions, Object values, int[] shape, Map<String, Object> attributes) {
    }

    NetcdfOut dimension(String name, int length) {
        dimensions.put(name, length);
        return this;
    }

    NetcdfOut global(String name, String value) {
        globals.put(name, value);
        return this;
    }

    /** @param attributes names and values in turn; values are words, or {@code int}, {@code double} or arrays of them */
    NetcdfOut doubles(String name, String dimension, double[] values, Object... attributes) {
        return put(name, DataType.DOUBLE, dimension, values, new int[] {values.length}, attributes);
    }

    NetcdfOut ints(String name, String dimension, int[] values, Object... attributes) {
        return put(name, DataType.INT, dimension, values, new int[] {values.length}, attributes);
    }

    NetcdfOut bytes(String name, String dimension, byte[] values, Object... attributes) {
        return put(name, DataType.BYTE, dimension, values, new int[] {values.length}, attributes);
    }

    /** A variable without dimension that only carries attributes, such as a grid mapping. */
    NetcdfOut container(String name, Object... attributes) {
        return put(name, DataType.INT, "", new int[] {0}, new int[0], attributes);
    }

    NetcdfOut words(String name, String dimension, List<String> values, Object... attributes) {
        dimensions.put("name_length", NAME_LENGTH);
        char[] all = new char[values.size() * NAME_LENGTH];
        for (int i = 0; i < values.size(); i++) {
            byte[] text = values.get(i).getBytes(StandardCharsets.UTF_8);
            for (int c = 0; c < Math.min(text.length, NAME_LENGTH); c++) {
                all[i * NAME_LENGTH + c] = (char) (text[c] & 0xff);
            }
        }
        return put(name, DataType.CHAR, dimension + " name_length", all, new int[] {values.size(), NAME_LENGTH},
                attributes);
    }

    private NetcdfOut put(String name, DataType type, String dimension, Object values, int[] shape,
                          Object... attributes) {
        Map<String, Object> named = new LinkedHashMap<>();
        for (int i = 0; i < attributes.length; i += 2) {
            named.put((String) attributes[i], attributes[i + 1]);
        }
        variables.put(name, new Declared(type, dimension, values, shape, named));
        return this;
    }

    void writeTo(Path file) throws IOException {
        NetcdfFileWriteable out = NetcdfFileWriteable.createNew(file.toString(), false);
        try {
            dimensions.forEach(out::addDimension);
            globals.forEach(out::addGlobalAttribute);
            variables.forEach((name, variable) -> {
                out.addVariable(name, variable.type, variable.dimensions);
                variable.attributes.forEach((key, value) -> attribute(out, name, key, value));
            });
            out.create();
            for (Map.Entry<String, Declared> entry : variables.entrySet()) {
                Declared variable = entry.getValue();
                out.write(entry.getKey(), Array.factory(variable.type.getPrimitiveClassType(), variable.shape,
                        variable.values));
            }
        } catch (InvalidRangeException e) {
            throw new IOException(file + ": an array does not fit its dimensions", e);
        } finally {
            out.close();
        }
    }

    private static void attribute(NetcdfFileWriteable out, String variable, String key, Object value) {
        if (value instanceof String words) {
            out.addVariableAttribute(variable, key, words);
        } else if (value instanceof Number number) {
            out.addVariableAttribute(variable, key, number);
        } else {
            out.addVariableAttribute(variable, key, Array.factory(value));
        }
    }
}
