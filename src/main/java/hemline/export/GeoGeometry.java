package hemline.export;

import com.fasterxml.jackson.core.JsonGenerator;
import hemline.geodesy.GeoPoint;
import java.io.IOException;
import java.util.List;
import java.util.Optional;

/** Bounding boxes and geometries of GeoJSON features, RFC 7946 sections 3.1 and 5. */
final class GeoGeometry {
    private GeoGeometry() {
    }

    /** The {@code geometry} member: a point, or none. */
    static void point(JsonGenerator json, Optional<GeoPoint> place) throws IOException {
        if (place.isEmpty()) {
            json.writeNullField("geometry");
            return;
        }
        json.writeObjectFieldStart("geometry");
        json.writeStringField("type", "Point");
        json.writeArrayFieldStart("coordinates");
        degrees(json, place.get().longitudeDeg());
        degrees(json, place.get().latitudeDeg());
        json.writeEndArray();
        json.writeEndObject();
    }

    /** The {@code bbox} and {@code geometry} members: a line, several lines, or none. */
    static void lines(JsonGenerator json, GeoLines lines) throws IOException {
        if (lines.isEmpty()) {
            json.writeNullField("geometry");
            return;
        }
        json.writeArrayFieldStart("bbox");
        for (double side : lines.box()) {
            degrees(json, side);
        }
        json.writeEndArray();
        boolean single = lines.parts().size() == 1;
        json.writeObjectFieldStart("geometry");
        json.writeStringField("type", single ? "LineString" : "MultiLineString");
        json.writeFieldName("coordinates");
        if (single) {
            path(json, lines.parts().get(0));
        } else {
            json.writeStartArray();
            for (List<double[]> part : lines.parts()) {
                path(json, part);
            }
            json.writeEndArray();
        }
        json.writeEndObject();
    }

    private static void path(JsonGenerator json, List<double[]> places) throws IOException {
        json.writeStartArray();
        for (double[] place : places) {
            json.writeStartArray();
            degrees(json, place[0]);
            degrees(json, place[1]);
            json.writeEndArray();
        }
        json.writeEndArray();
    }

    private static void degrees(JsonGenerator json, double value) throws IOException {
        json.writeRawValue(Numbers.fixed(value, 6));
    }
}
