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
            radar("tolvane", -33.41, 141.87, 88, new Dish(0.9, 0.5, 22, 360, 21, 0.08), gates(500, 140),
                    new Receiver(-40, 2.0, 24, Packing.BYTE, 13.3), new Timing(360, 8, 0)),
            radar("sennick", 44.93, 102.18, 1320, new Dish(1.5, 0.8, 18, 360, 15, 0.12), gates(1000, 120),
                    new Receiver(-38, 1.0, 30, Packing.BYTE, 16.0), new Timing(600, 15, 0.05)));

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
