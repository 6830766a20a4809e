package hemline.reader;

import hemline.geodesy.GeoPoint;
import hemline.sweep.RadarSite;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;

/** The radar of a CfRadial file. */
final class CfSite {
    /** A fixed radar whose position wanders farther than this, degrees, stands on something that moves. */
    private static final double MOVED_DEG = 0.005;

    private CfSite() {
    }

    static RadarSite of(InputFile file, ArrayGroup root) throws UnreadableFileException {
        double latitude = scalar(file, root, "latitude", "lat");
        double longitude = scalar(file, root, "longitude", "lon");
        double altitude = scalar(file, root, "altitude", "alt");
        Optional<GeoPoint> position = Positions.of(file, "/latitude", latitude, longitude);
        String name = "";
        for (String attribute : List.of("instrument_name", "site_name", "instrument", "radar_name")) {
            name = name.isEmpty() ? root.attributes().text(attribute).orElse("") : name;
        }
        if (name.isEmpty()) {
            Optional<ArrayVariable> variable = root.variable("instrument_name");
            name = variable.isPresent() && variable.get().isText()
                    ? variable.get().texts().stream().findFirst().orElse("") : "";
        }
        return new RadarSite(name.isEmpty() ? "unknown" : name, position, Positions.altitude(altitude));
    }

    /** A number stated once, or for each ray of a radar that must then stand still. */
    private static double scalar(InputFile file, ArrayGroup root, String... names) throws UnreadableFileException {
        for (String name : names) {
            Optional<ArrayVariable> variable = root.variable(name);
            if (variable.isPresent() && !variable.get().isText()) {
                double[] values = CfNumbers.of(file, variable.get());
                double[] known = Arrays.stream(values).filter(v -> Double.isFinite(v) && v > -900 && v < 1e5)
                        .sorted().toArray();
                if (known.length > 0) {
                    boolean angle = !name.startsWith("alt");
                    if (angle && known[known.length - 1] - known[0] > MOVED_DEG) {
                        throw file.fault("/" + name, "the radar moves by " + (known[known.length - 1] - known[0])
                                + " degrees during the file", "give files of a fixed radar");
                    }
                    return known[known.length / 2];
                }
            }
        }
        return Double.NaN;
    }
}
