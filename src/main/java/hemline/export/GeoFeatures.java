package hemline.export;

import com.fasterxml.jackson.core.JsonGenerator;
import java.io.IOException;
import java.io.OutputStream;

/** A GeoJSON feature collection written one feature after the other, a line each. */
final class GeoFeatures implements AutoCloseable {
    private final JsonGenerator json;

    GeoFeatures(OutputStream out) throws IOException {
        json = Json.compact(out);
        json.writeStartObject();
        json.writeStringField("type", "FeatureCollection");
        json.writeArrayFieldStart("features");
    }

    /** Writes what belongs to one feature. */
    @FunctionalInterface
    interface Part {
        void write(JsonGenerator json) throws IOException;
    }

    void add(String id, Part geometry, Part properties) throws IOException {
        json.writeRaw('\n');
        json.writeStartObject();
        json.writeStringField("type", "Feature");
        json.writeStringField("id", id);
        geometry.write(json);
        json.writeObjectFieldStart("properties");
        properties.write(json);
        json.writeEndObject();
        json.writeEndObject();
    }

    static void number(JsonGenerator json, String name, double value, int decimals) throws IOException {
        json.writeFieldName(name);
        if (Double.isFinite(value)) {
            json.writeRawValue(Numbers.fixed(value, decimals));
        } else {
            json.writeNull();
        }
    }

    @Override
    public void close() throws IOException {
        json.writeRaw('\n');
        json.writeEndArray();
        json.writeEndObject();
        json.writeRaw('\n');
        json.close();
    }
}
