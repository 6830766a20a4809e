package hemline.workflow;

import hemline.boundary.station.StationObservation;
import hemline.boundary.station.StationSeries;
import hemline.geodesy.GeoPoint;
import hemline.outflow.MoistAir;
import hemline.outflow.StandardAtmosphere;
import hemline.scoring.InputFileException;
import hemline.scoring.TableFile;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;

/**
 * Reads {@code --stations FILE.csv}: one row an observation, its station's name and place in each.
 *
 * <p>Columns: {@code station, time_utc, latitude, longitude}; then any of {@code altitude_m},
 * {@code temperature_c|_k|_f}, {@code dew_point_c|_k|_f} or {@code humidity_percent}, {@code pressure_hpa|_pa} (at the
 * station, not reduced to sea level), {@code wind_speed_ms|_kmh|_kt} and {@code wind_from_deg}. Empty cells are not
 * known. Rows may come in any order. A quantity without its unit in the name is refused, and so is a value that its
 * unit makes impossible: both are errors with line, column and what to do, not guesses.
 */
public final class StationTable {
    private static final List<String> NEEDED = List.of("station", "time_utc", "latitude", "longitude");
    private static final double KELVIN = MoistAir.ZERO_CELSIUS_K;
    private static final double KNOT_MS = 1852.0 / 3600;
    private static final double SAME_PLACE_DEG = 0.001;
    /** Farther from the standard atmosphere than any weather takes it: reduced to sea level, or another unit. */
    private static final double PRESSURE_OFF_HPA = 70;

    private static final Map<String, Quantity> QUANTITIES = quantities();

    private final Map<String, TreeMap<Long, StationObservation>> observations = new LinkedHashMap<>();
    private final Map<String, GeoPoint> places = new LinkedHashMap<>();
    private final Map<String, Double> altitudes = new LinkedHashMap<>();

    private StationTable() {
    }

    private static Map<String, Quantity> quantities() {
        Map<String, Quantity> known = new LinkedHashMap<>();
        for (String name : List.of("temperature", "dew_point")) {
            known.put(name + "_c", new Quantity(name, 1, 0, -90, 60));
            known.put(name + "_k", new Quantity(name, 1, -KELVIN, -90, 60));
            known.put(name + "_f", new Quantity(name, 5.0 / 9, -160.0 / 9, -90, 60));
        }
        known.put("humidity_percent", new Quantity("humidity", 1, 0, 0, 105));
        known.put("pressure_hpa", new Quantity("pressure", 1, 0, 500, 1090));
        known.put("pressure_pa", new Quantity("pressure", 0.01, 0, 500, 1090));
        known.put("wind_speed_ms", new Quantity("wind_speed", 1, 0, 0, 90));
        known.put("wind_speed_kmh", new Quantity("wind_speed", 1 / 3.6, 0, 0, 90));
        known.put("wind_speed_kt", new Quantity("wind_speed", KNOT_MS, 0, 0, 90));
        known.put("wind_from_deg", new Quantity("wind_from", 1, 0, 0, 360));
        return known;
    }

    /**
     * The stations in order of their first row.
     *
     * @throws UserProblem naming file, line, column, what was found and what to do
     */
    public static List<StationSeries> read(Path file) throws UserProblem {
        try {
            TableFile table = TableFile.read(file);
            table.require(NEEDED);
            Map<String, String> columns = columns(table, file);
            StationTable stations = new StationTable();
            for (TableFile.Row row : table.rows()) {
                stations.accept(row, columns);
            }
            return stations.series();
        } catch (InputFileException e) {
            throw new UserProblem(UserProblem.Kind.USAGE, e.getMessage(), e);
        }
    }

    /** Column of each quantity the table has. */
    private static Map<String, String> columns(TableFile table, Path file) throws InputFileException {
        Map<String, String> columns = new LinkedHashMap<>();
        for (String column : table.columnNames()) {
            Quantity quantity = QUANTITIES.get(column);
            if (quantity != null) {
                String other = columns.put(quantity.name, column);
                if (other != null) {
                    throw new InputFileException(file, "line 1", "columns " + other + " and " + column
                            + " give the same quantity", "keep one of them", null);
                }
            } else if (!NEEDED.contains(column) && !column.equals("altitude_m")) {
                refuseBare(column, file);
            }
        }
        if (columns.containsKey("dew_point") && columns.containsKey("humidity")) {
            columns.remove("humidity");
        }
        if (!columns.containsKey("temperature") && !columns.containsKey("pressure") && !columns.containsKey("wind_speed")) {
            throw new InputFileException(file, "line 1", "expected a column of temperature, pressure or wind, found "
                    + String.join(", ", table.columnNames()), "name one with its unit, such as temperature_c", null);
        }
        return columns;
    }

    /** A column this table does not know is let be, unless it seems to be a quantity whose unit is missing. */
    private static void refuseBare(String column, Path file) throws InputFileException {
        for (Map.Entry<String, Quantity> known : QUANTITIES.entrySet()) {
            String bare = known.getValue().name;
            if (column.equals(bare) || column.startsWith(bare + "_") || column.replace("_", "").equals(bare.replace("_", ""))
                    || column.startsWith("wind_dir") && bare.equals("wind_from")) {
                List<String> names = QUANTITIES.entrySet().stream().filter(e -> e.getValue().name.equals(bare))
                        .map(Map.Entry::getKey).toList();
                throw new InputFileException(file, "line 1, column " + column, "its unit is not known",
                        "name it " + String.join(" or ", names), null);
            }
        }
    }

    private void accept(TableFile.Row row, Map<String, String> columns) throws InputFileException {
        String name = row.text("station");
        if (name.isEmpty()) {
            throw row.problem("station", "expected a name, found an empty cell", "name the station");
        }
        place(row, name);
        double temperature = value(row, columns, "temperature");
        double dewPoint = dewPoint(row, columns, temperature);
        double pressure = value(row, columns, "pressure");
        double altitude = altitudes.get(name);
        if (!Double.isNaN(altitude) && Math.abs(pressure - StandardAtmosphere.pressureHpa(altitude)) > PRESSURE_OFF_HPA) {
            throw row.problem(columns.get("pressure"), "expected about "
                    + Math.round(StandardAtmosphere.pressureHpa(altitude)) + " hPa at " + Math.round(altitude)
                    + " m, found " + row.text(columns.get("pressure")),
                    "give the pressure at the station, not reduced to sea level");
        }
        double speed = value(row, columns, "wind_speed");
        double from = value(row, columns, "wind_from");
        boolean calm = speed == 0;
        if (!calm && Double.isNaN(speed) != Double.isNaN(from)) {
            // One without the other is no wind.
            speed = Double.NaN;
            from = Double.NaN;
        }
        StationObservation observation = new StationObservation(row.timeMs("time_utc"), temperature, dewPoint, pressure,
                speed, calm ? Double.NaN : from);
        if (observations.get(name).put(observation.timeMs(), observation) != null) {
            throw row.problem("time_utc", "station " + name + " has two observations at " + row.text("time_utc"),
                    "keep one of them");
        }
    }

    private void place(TableFile.Row row, String name) throws InputFileException {
        double latitude = row.needed("latitude");
        double longitude = row.needed("longitude");
        if (Math.abs(latitude) > 90) {
            throw row.problem("latitude", "expected -90 to 90 degrees, found " + latitude, "write degrees north");
        }
        if (Math.abs(longitude) > 180) {
            throw row.problem("longitude", "expected -180 to 180 degrees, found " + longitude, "write degrees east");
        }
        double altitude = row.number("altitude_m");
        if (altitude < -450 || altitude > 9000) {
            throw row.problem("altitude_m", "expected -450 to 9000 m, found " + altitude, "write metres above the sea");
        }
        GeoPoint before = places.putIfAbsent(name, new GeoPoint(latitude, longitude));
        altitudes.putIfAbsent(name, altitude);
        observations.computeIfAbsent(name, key -> new TreeMap<>());
        if (before != null && (Math.abs(before.latitudeDeg() - latitude) > SAME_PLACE_DEG
                || Math.abs(before.longitudeDeg() - longitude) > SAME_PLACE_DEG)) {
            throw row.problem("latitude", "station " + name + " stood at " + before.latitudeDeg() + ", "
                    + before.longitudeDeg() + " before, found " + latitude + ", " + longitude,
                    "give each station one place, and two stations two names");
        }
    }

    private static double dewPoint(TableFile.Row row, Map<String, String> columns, double temperature)
            throws InputFileException {
        double humidity = value(row, columns, "humidity");
        if (!Double.isNaN(humidity)) {
            return humidity == 0 ? Double.NaN : Math.min(temperature,
                    MoistAir.dewPointC(humidity / 100 * MoistAir.saturationPressureHpa(temperature)));
        }
        double dewPoint = value(row, columns, "dew_point");
        if (dewPoint > temperature + 1) {
            throw row.problem(columns.get("dew_point"), "expected a dew point of at most the temperature, found "
                    + row.text(columns.get("dew_point")), "check both columns and their units");
        }
        return Double.isNaN(temperature) ? dewPoint : Math.min(dewPoint, temperature);
    }

    private static double value(TableFile.Row row, Map<String, String> columns, String name) throws InputFileException {
        String column = columns.get(name);
        if (column == null) {
            return Double.NaN;
        }
        Quantity quantity = QUANTITIES.get(column);
        double value = quantity.factor * row.number(column) + quantity.offset;
        if (value < quantity.low || value > quantity.high) {
            throw row.problem(column, "expected " + quantity.bounds() + ", found " + row.text(column),
                    "check the unit in the column's name, or leave the cell empty if it is not known");
        }
        return value;
    }

    private List<StationSeries> series() {
        List<StationSeries> series = new ArrayList<>();
        observations.forEach((name, byTime) -> series.add(new StationSeries(name, places.get(name), altitudes.get(name),
                List.copyOf(byTime.values()))));
        return series;
    }

    /**
     * A quantity in the unit of its column: factor and offset to the unit used here, and the bounds there.
     */
    private record Quantity(String name, double factor, double offset, double low, double high) {
        String bounds() {
            return Math.round((low - offset) / factor) + " to " + Math.round((high - offset) / factor);
        }
    }
}
