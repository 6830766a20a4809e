package hemline.simulation.files;

import hemline.geodesy.GeoPoint;
import hemline.simulation.radar.Packing;
import hemline.sweep.Sweep;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Map;
import ucar.ma2.Array;
import ucar.ma2.ArrayChar;
import ucar.ma2.DataType;
import ucar.ma2.InvalidRangeException;
import ucar.nc2.Attribute;
import ucar.nc2.NetcdfFileWriteable;

/** CfRadial 1.4 as netCDF-3 classic, one sweep, rays in the order of scanning. */
public final class CfRadial3Writer implements SweepWriter {
    private static final int TEXT = 32;

    @Override
    public void write(Path file, Sweep sweep, Packing reflectivity, Packing velocity) throws IOException {
        Files.deleteIfExists(file);
        ScanOrder order = new ScanOrder(sweep);
        NetcdfFileWriteable out = NetcdfFileWriteable.createNew(file.toString(), false);
        try {
            define(out, sweep, order, reflectivity, velocity);
            out.create();
            fill(out, sweep, order, reflectivity, velocity);
        } catch (InvalidRangeException e) {
            throw new IOException(file + ": an array does not fit its dimensions", e);
        } finally {
            out.close();
        }
    }

    private static void define(NetcdfFileWriteable out, Sweep sweep, ScanOrder order, Packing reflectivity,
                               Packing velocity) {
        out.addDimension("time", order.rays());
        out.addDimension("range", sweep.gateCount());
        out.addDimension("sweep", 1);
        out.addDimension("string_length", TEXT);
        CfText.globals(sweep).forEach(out::addGlobalAttribute);
        variable(out, "volume_number", DataType.INT, "", CfText.plain("data volume index", "unitless"));
        variable(out, "time_coverage_start", DataType.CHAR, "string_length", Map.of());
        variable(out, "time_coverage_end", DataType.CHAR, "string_length", Map.of());
        variable(out, "latitude", DataType.DOUBLE, "", CfText.plain("latitude", "degrees_north"));
        variable(out, "longitude", DataType.DOUBLE, "", CfText.plain("longitude", "degrees_east"));
        variable(out, "altitude", DataType.DOUBLE, "", CfText.plain("altitude of the antenna", "meters"));
        variable(out, "sweep_number", DataType.INT, "sweep", Map.of());
        variable(out, "sweep_mode", DataType.CHAR, "sweep string_length", Map.of());
        variable(out, "fixed_angle", DataType.FLOAT, "sweep", CfText.plain("target elevation", "degrees"));
        variable(out, "sweep_start_ray_index", DataType.INT, "sweep", Map.of());
        variable(out, "sweep_end_ray_index", DataType.INT, "sweep", Map.of());
        variable(out, "time", DataType.DOUBLE, "time", CfText.timeAttributes(order.originMs()));
        variable(out, "range", DataType.FLOAT, "range", CfText.rangeAttributes());
        out.addVariableAttribute("range", "meters_to_center_of_first_gate", (float) sweep.firstGateCentreM());
        out.addVariableAttribute("range", "meters_between_gates", (float) sweep.gateSpacingM());
        variable(out, "azimuth", DataType.FLOAT, "time", CfText.plain("azimuth of the ray's centre", "degrees"));
        variable(out, "elevation", DataType.FLOAT, "time", CfText.plain("elevation of the ray's centre", "degrees"));
        variable(out, "radar_beam_width_h", DataType.FLOAT, "", CfText.plain("half-power beam width", "degrees"));
        variable(out, "radar_beam_width_v", DataType.FLOAT, "", CfText.plain("half-power beam width", "degrees"));
        if (sweep.velocity().isPresent()) {
            variable(out, "nyquist_velocity", DataType.FLOAT, "time",
                    CfText.plain("unambiguous velocity", "meters per second"));
        }
        for (CfField field : CfField.of(sweep, reflectivity, velocity)) {
            variable(out, field.name(), field.packing().isByte() ? DataType.BYTE : DataType.SHORT, "time range",
                    CfText.plain(field.longName(), field.field().units()));
            out.addVariableAttribute(field.name(), "standard_name", field.standardName());
            out.addVariableAttribute(field.name(), "_FillValue", field.stored(field.packing().noData()));
            out.addVariableAttribute(field.name(), "_Undetect", field.stored(field.packing().undetect()));
            out.addVariableAttribute(field.name(), "scale_factor", field.scale());
            out.addVariableAttribute(field.name(), "add_offset", field.offset());
            out.addVariableAttribute(field.name(), "coordinates", "elevation azimuth range");
        }
    }

    private static void variable(NetcdfFileWriteable out, String name, DataType type, String dimensions,
                                 Map<String, String> attributes) {
        out.addVariable(name, type, dimensions);
        attributes.forEach((key, value) -> out.addVariableAttribute(name, new Attribute(key, value)));
    }

    private static void fill(NetcdfFileWriteable out, Sweep sweep, ScanOrder order, Packing reflectivity,
                             Packing velocity) throws IOException, InvalidRangeException {
        out.write("volume_number", scalar(0));
        out.write("time_coverage_start", ArrayChar.makeFromString(ScanOrder.iso(sweep.startMs()), TEXT));
        out.write("time_coverage_end", ArrayChar.makeFromString(ScanOrder.iso(sweep.endMs()), TEXT));
        GeoPoint place = sweep.site().position().orElseThrow(
                () -> new IOException("a CfRadial file needs the radar's position"));
        out.write("latitude", scalar(place.latitudeDeg()));
        out.write("longitude", scalar(place.longitudeDeg()));
        out.write("altitude", scalar(sweep.site().altitudeM()));
        out.write("sweep_number", Array.factory(new int[] {0}));
        ArrayChar mode = new ArrayChar.D2(1, TEXT);
        mode.setString(0, CfText.MODE);
        out.write("sweep_mode", mode);
        out.write("fixed_angle", Array.factory(new float[] {(float) sweep.elevationDeg()}));
        out.write("sweep_start_ray_index", Array.factory(new int[] {0}));
        out.write("sweep_end_ray_index", Array.factory(new int[] {order.rays() - 1}));
        out.write("time", Array.factory(order.secondsAfterOrigin()));
        out.write("range", Array.factory(order.ranges()));
        out.write("azimuth", Array.factory(order.azimuths()));
        out.write("elevation", Array.factory(order.elevations()));
        out.write("radar_beam_width_h", scalar((float) sweep.beamWidthDeg()));
        out.write("radar_beam_width_v", scalar((float) sweep.beamWidthDeg()));
        if (sweep.velocity().isPresent()) {
            float[] nyquist = new float[order.rays()];
            java.util.Arrays.fill(nyquist, (float) sweep.nyquistMs());
            out.write("nyquist_velocity", Array.factory(nyquist));
        }
        for (CfField field : CfField.of(sweep, reflectivity, velocity)) {
            out.write(field.name(), field.packing().isByte()
                    ? Array.factory(order.signedBytes(field.field(), field.packing()))
                    : Array.factory(order.shorts(field.field(), field.packing())));
        }
    }

    private static Array scalar(Number value) {
        Array array = Array.factory(value.getClass() == Integer.class ? int.class
                : value.getClass() == Float.class ? float.class : double.class, new int[0]);
        array.setObject(array.getIndex(), value);
        return array;
    }
}
