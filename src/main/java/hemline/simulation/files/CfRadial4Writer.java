package hemline.simulation.files;

import hemline.geodesy.GeoPoint;
import hemline.simulation.radar.Packing;
import hemline.sweep.Sweep;
import io.jhdf.api.WritableDataset;
import io.jhdf.api.WritableGroup;
import java.io.IOException;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.Map;

/**
 * CfRadial 1.4 as netCDF-4, that is HDF5, one sweep, rays in the order of scanning.
 *
 * <p>Dimensions are dimension scales ({@code CLASS}, {@code NAME}) and every variable names its dimensions by
 * {@code _Netcdf4Coordinates}, which the netCDF C library reads as named dimensions; jHDF writes no object references, so
 * there is no {@code DIMENSION_LIST}, and readers that know only that one see dimensions without names. Texts are
 * fixed-length HDF5 strings, which netCDF shows as {@code string}.
 */
public final class CfRadial4Writer implements SweepWriter {
    private static final int TIME = 0;
    private static final int RANGE = 1;
    private static final int SWEEP = 2;

    @Override
    public void write(Path file, Sweep sweep, Packing reflectivity, Packing velocity) throws IOException {
        ScanOrder order = new ScanOrder(sweep);
        Hdf5Out file5 = new Hdf5Out();
        WritableGroup out = file5.root();
        CfText.globals(sweep).forEach(out::putAttribute);
        coordinates(out, sweep, order);
        facts(out, sweep, order);
        for (CfField field : CfField.of(sweep, reflectivity, velocity)) {
            field(out, order, field);
        }
        file5.writeTo(file);
    }

    private static void coordinates(WritableGroup out, Sweep sweep, ScanOrder order) {
        scale(put(out, "time", order.secondsAfterOrigin(), CfText.timeAttributes(order.originMs()), TIME), "time", TIME);
        WritableDataset range = put(out, "range", order.ranges(), CfText.rangeAttributes(), RANGE);
        range.putAttribute("meters_to_center_of_first_gate", (float) sweep.firstGateCentreM());
        range.putAttribute("meters_between_gates", (float) sweep.gateSpacingM());
        scale(range, "range", RANGE);
        // A dimension without a coordinate variable is a scale that says so in this exact wording.
        scale(put(out, "sweep", new float[1], Map.of(), SWEEP), "This is a netCDF dimension but not a netCDF variable."
                + "         1", SWEEP);
        put(out, "azimuth", order.azimuths(), CfText.plain("azimuth of the ray's centre", "degrees"), TIME);
        put(out, "elevation", order.elevations(), CfText.plain("elevation of the ray's centre", "degrees"), TIME);
    }

    private static void facts(WritableGroup out, Sweep sweep, ScanOrder order) throws IOException {
        GeoPoint place = sweep.site().position().orElseThrow(
                () -> new IOException("a CfRadial file needs the radar's position"));
        put(out, "volume_number", 0, CfText.plain("data volume index", "unitless"));
        put(out, "time_coverage_start", ScanOrder.iso(sweep.startMs()), Map.of());
        put(out, "time_coverage_end", ScanOrder.iso(sweep.endMs()), Map.of());
        put(out, "latitude", place.latitudeDeg(), CfText.plain("latitude", "degrees_north"));
        put(out, "longitude", place.longitudeDeg(), CfText.plain("longitude", "degrees_east"));
        put(out, "altitude", sweep.site().altitudeM(), CfText.plain("altitude of the antenna", "meters"));
        put(out, "sweep_number", new int[] {0}, Map.of(), SWEEP);
        put(out, "sweep_mode", new String[] {CfText.MODE}, Map.of(), SWEEP);
        put(out, "fixed_angle", new float[] {(float) sweep.elevationDeg()}, CfText.plain("target elevation", "degrees"),
                SWEEP);
        put(out, "sweep_start_ray_index", new int[] {0}, Map.of(), SWEEP);
        put(out, "sweep_end_ray_index", new int[] {order.rays() - 1}, Map.of(), SWEEP);
        put(out, "radar_beam_width_h", (float) sweep.beamWidthDeg(), CfText.plain("half-power beam width", "degrees"));
        put(out, "radar_beam_width_v", (float) sweep.beamWidthDeg(), CfText.plain("half-power beam width", "degrees"));
        if (sweep.velocity().isPresent()) {
            float[] nyquist = new float[order.rays()];
            Arrays.fill(nyquist, (float) sweep.nyquistMs());
            put(out, "nyquist_velocity", nyquist, CfText.plain("unambiguous velocity", "meters per second"), TIME);
        }
    }

    private static void field(WritableGroup out, ScanOrder order, CfField field) {
        Object numbers = field.packing().isByte() ? order.signedBytes(field.field(), field.packing())
                : order.shorts(field.field(), field.packing());
        WritableDataset data = put(out, field.name(), numbers, CfText.plain(field.longName(), field.field().units()),
                TIME, RANGE);
        data.putAttribute("standard_name", field.standardName());
        data.putAttribute("_FillValue", field.stored(field.packing().noData()));
        data.putAttribute("_Undetect", field.stored(field.packing().undetect()));
        data.putAttribute("scale_factor", field.scale());
        data.putAttribute("add_offset", field.offset());
        data.putAttribute("coordinates", "elevation azimuth range");
    }

    private static WritableDataset put(WritableGroup out, String name, Object data, Map<String, String> attributes,
                                       int... dimensions) {
        WritableDataset dataset = out.putDataset(name, data);
        attributes.forEach(dataset::putAttribute);
        if (dimensions.length > 0) {
            dataset.putAttribute("_Netcdf4Coordinates", dimensions);
            dataset.putAttribute("_Netcdf4Dimid", dimensions[0]);
        }
        return dataset;
    }

    private static void scale(WritableDataset dataset, String name, int dimension) {
        dataset.putAttribute("CLASS", "DIMENSION_SCALE");
        dataset.putAttribute("NAME", name);
        dataset.putAttribute("_Netcdf4Dimid", dimension);
    }
}
