package hemline.reader;

import hemline.geodesy.GeoPoint;
import hemline.sweep.RadarSite;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/** The radar of an ODIM_H5 file: {@code /what@source} and {@code /where}. */
final class OdimSite {
    /** The most specific and stable identifiers first (ODIM_H5, table of source type identifiers). */
    private static final List<String> IDENTIFIERS = List.of("NOD", "RAD", "WIGOS", "WMO", "PLC", "CMT");

    private OdimSite() {
    }

    static RadarSite of(InputFile file, ArrayGroup root) throws UnreadableFileException {
        OdimNode top = OdimNode.of(root);
        Optional<Double> lat = top.number("where", "lat");
        Optional<Double> lon = top.number("where", "lon");
        Optional<GeoPoint> position = Positions.of(file, "/where", lat.orElse(Double.NaN), lon.orElse(Double.NaN));
        double height = top.number("where", "height").orElse(Double.NaN);
        return new RadarSite(name(top.text("what", "source").orElse("")), position, Positions.altitude(height));
    }

    static String name(String source) {
        Map<String, String> parts = new HashMap<>();
        for (String part : source.split("[,;]")) {
            int colon = part.indexOf(':');
            if (colon > 0 && colon < part.length() - 1) {
                parts.putIfAbsent(part.substring(0, colon).strip(), part.substring(colon + 1).strip());
            }
        }
        for (String identifier : IDENTIFIERS) {
            String value = parts.getOrDefault(identifier, "");
            // WMO number 0 means that the radar has none.
            if (!value.isEmpty() && !value.matches("0+")) {
                return identifier.equals("WMO") ? "WMO " + value : value;
            }
        }
        return "unknown";
    }
}
