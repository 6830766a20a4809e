package hemline.workflow;

import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import hemline.geodesy.GeoPoint;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;

/**
 * Lines of a user's map: the lines and outlines of a GeoJSON file (RFC 7946). Points and properties are left out.
 *
 * @param name  of the file
 * @param lines each of two or more places
 */
public record MapLayer(String name, List<List<GeoPoint>> lines) {
    private static final long MOST_BYTES = 100L << 20;

    public MapLayer {
        lines = lines.stream().map(List::copyOf).toList();
    }

    /**
     * Reads a GeoJSON file.
     *
     * @throws IOException if it cannot be read or is not GeoJSON; the message says what was found where, and what to do
     */
    public static MapLayer read(Path file) throws IOException {
        if (Files.size(file) > MOST_BYTES) {
            throw new IOException(file + ": larger than 100 MiB; cut the map to the radar's surroundings first");
        }
        List<List<GeoPoint>> lines = new ArrayList<>();
        try {
            collect(file, new ObjectMapper().readTree(file.toFile()), lines);
        } catch (JsonProcessingException e) {
            throw new IOException(file + ": not JSON at line " + (e.getLocation() == null ? 1
                    : e.getLocation().getLineNr())
                    + ": " + e.getOriginalMessage() + "; export the map as GeoJSON", e);
        }
        if (lines.isEmpty()) {
            throw new IOException(file + ": no line or outline was found; Hemline draws LineString, MultiLineString,"
                    + " Polygon and MultiPolygon");
        }
        return new MapLayer(file.getFileName().toString(), lines);
    }

    private static void collect(Path file, JsonNode node, List<List<GeoPoint>> lines) throws IOException {
        JsonNode coordinates = node.path("coordinates");
        switch (node.path("type").asText("")) {
            case "FeatureCollection" -> each(file, node.path("features"), lines);
            case "GeometryCollection" -> each(file, node.path("geometries"), lines);
            case "Feature" -> {
                if (!node.path("geometry").isNull()) {
                    collect(file, node.path("geometry"), lines);
                }
            }
            case "LineString" -> line(file, coordinates, lines);
            case "MultiLineString", "Polygon" -> {
                for (JsonNode part : coordinates) {
                    line(file, part, lines);
                }
            }
            case "MultiPolygon" -> {
                for (JsonNode polygon : coordinates) {
                    for (JsonNode ring : polygon) {
                        line(file, ring, lines);
                    }
                }
            }
            case "Point", "MultiPoint" -> {
                // Places without extent have no line to draw.
            }
            default -> throw new IOException(file + ": expected a GeoJSON type, found \"" + node.path("type").asText("")
                    + "\"; export the map as GeoJSON");
        }
    }

    private static void each(Path file, JsonNode members, List<List<GeoPoint>> lines) throws IOException {
        for (JsonNode member : members) {
            collect(file, member, lines);
        }
    }

    private static void line(Path file, JsonNode places, List<List<GeoPoint>> lines) throws IOException {
        List<GeoPoint> line = new ArrayList<>(places.size());
        for (JsonNode place : places) {
            double longitude = place.path(0).asDouble(Double.NaN);
            double latitude = place.path(1).asDouble(Double.NaN);
            if (!(Math.abs(latitude) <= 90 && Math.abs(longitude) <= 180)) {
                throw new IOException(file + ": expected longitude and latitude in degrees, found " + place
                        + "; export the map in WGS 84 longitude and latitude");
            }
            line.add(new GeoPoint(latitude, longitude));
        }
        if (line.size() > 1) {
            lines.add(line);
        }
    }
}
