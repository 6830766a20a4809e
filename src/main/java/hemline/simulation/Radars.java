package hemline.simulation;

import hemline.geodesy.GeoPoint;
import hemline.simulation.radar.Packing;
import hemline.simulation.radar.RadarSpec;
import hemline.simulation.radar.RadarSpec.Dish;
import hemline.simulation.radar.RadarSpec.Gates;
import hemline.simulation.radar.RadarSpec.Receiver;
import hemline.simulation.radar.RadarSpec.Timing;
import hemline.sweep.RadarSite;
import java.util.List;
import java.util.Optional;

/**
 * The catalogue of invented radars. None of them exists: names, places and heights are made up. Beam widths, gates,
 * elevations, sensitivities and repeat times span what weather services run.
 */
public final class Radars {
    private static final List<RadarSpec> CATALOGUE = List.of(
            radar("lornfield", 48.27, 66.84, 176, new Dish(1.0, 0.5, 20, 360, 18, 0.06), gates(250, 112),
                    new Receiver(-41, 1.5, 18, Packing.BYTE, 26.5), new Timing(300, 5, 0)),
            radar("harrowmere", 47.62, 61.35, 214, new Dish(1.0, 0.5, 25, 360, 18, 0.05), gates(250, 130),
                    new Receiver(-42, 1.5, 16, Packing.SHORT, 26.4), new Timing(300, 4, 0)),
            radar("tolvane", -33.41, 141.87, 88, new Dish(0.9, 0.5, 22, 400, 21, 0.08), gates(500, 140),
                    new Receiver(-40, 2.0, 24, Packing.BYTE, 13.3), new Timing(360, 8, 0)),
            radar("sennick", 44.93, 102.18, 1320, new Dish(1.5, 0.8, 18, 360, 15, 0.12), gates(1000, 120),
                    new Receiver(-38, 1.0, 30, Packing.BYTE, 16.0), new Timing(600, 15, 0.05)),
            radar("quillmar", 41.18, -101.94, 990, new Dish(1.0, 0.3, 30, 360, 20, 0.04), gates(250, 120),
                    new Receiver(-45, 1.5, 12, Packing.SHORT, 32.0), new Timing(240, 6, 0.03)),
            radar("brackfold", 50.77, 34.42, 131, new Dish(1.2, 1.0, 28, 360, 18, 0.06), gates(500, 115),
                    new Receiver(-41, 2.5, 20, Packing.BYTE, 24.0), new Timing(300, 10, 0.08)),
            radar("pellow", -27.36, -59.71, 74, new Dish(1.0, 0.6, 20, 360, 12, 0.10), gates(500, 125),
                    new Receiver(-36.5, 1.0, 40, Packing.BYTE, 16.0), new Timing(480, 12, 0.04)),
            radar("velmark", 38.24, -99.53, 645, new Dish(0.95, 0.5, 24, 360, 20, 0.05), gates(250, 125),
                    new Receiver(-43.5, 1.5, 18, Packing.SHORT, 28.0), new Timing(270, 5, 0.02)),
            radar("cawdrie", 46.05, 21.33, 96, new Dish(1.0, 0.7, 26, 360, 16, 0.09), gates(1000, 125),
                    new Receiver(-37, 1.5, 36, Packing.BYTE, 16.0), new Timing(600, 10, 0)),
            radar("istrel", -23.58, 133.06, 560, new Dish(1.3, 0.4, 15, 360, 18, 0.07), gates(500, 130),
                    new Receiver(-41.5, 2.0, 14, Packing.SHORT, 26.0), new Timing(300, 14, 0.10)),
            radar("gannevar", 53.12, 49.88, 118, new Dish(1.5, 1.2, 20, 360, 18, 0.05), gates(500, 110),
                    new Receiver(-39.2, 1.5, 28, Packing.BYTE, 24.0), new Timing(450, 9, 0.05)),
            radar("fenhythe", 35.71, 113.94, 72, new Dish(1.1, 0.6, 32, 360, 22, 0.06), gates(500, 130),
                    new Receiver(-42.7, 2.0, 22, Packing.BYTE, 20.0), new Timing(360, 6, 0)),
            radar("marlby", -30.92, 24.17, 1240, new Dish(0.9, 0.5, 18, 400, 10, 0.11), gates(250, 115),
                    new Receiver(-44.2, 1.0, 13, Packing.SHORT, 30.0), new Timing(330, 20, 0.06)));

    private Radars() {
    }

    private static RadarSpec radar(String name, double latitudeDeg, double longitudeDeg, double altitudeM, Dish dish,
                                   Gates gates, Receiver receiver, Timing timing) {
        RadarSite site = new RadarSite(name, Optional.of(new GeoPoint(latitudeDeg, longitudeDeg)), altitudeM);
        return new RadarSpec(site, dish, gates, receiver, timing);
    }

    private static Gates gates(double spacingM, double reachKm) {
        return new Gates(spacingM / 2, spacingM, (int) Math.round(1000 * reachKm / spacingM));
    }

    public static List<String> names() {
        return CATALOGUE.stream().map(radar -> radar.site().name()).toList();
    }

    /** @throws IllegalArgumentException when there is none of that name */
    public static RadarSpec named(String name) {
        return CATALOGUE.stream().filter(radar -> radar.site().name().equals(name)).findFirst()
                .orElseThrow(() -> new IllegalArgumentException("no radar is named " + name + "; there are "
                        + String.join(", ", names())));
    }
}
