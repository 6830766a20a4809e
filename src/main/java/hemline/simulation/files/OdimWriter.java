package hemline.simulation.files;

import hemline.geodesy.GeoPoint;
import hemline.simulation.radar.Packing;
import hemline.sweep.Field;
import hemline.sweep.Sweep;
import io.jhdf.api.WritableDataset;
import io.jhdf.api.WritableGroup;
import java.io.IOException;
import java.nio.file.Path;
import java.time.Instant;
import java.time.ZoneOffset;
import java.time.format.DateTimeFormatter;
import java.util.Locale;

/**
 * ODIM_H5 2.2 (Michelson et al. 2014, OPERA data information model for HDF5), object SCAN, rays by rising azimuth with
 * {@code a1gate} the one taken first. Data are 16-bit integers, since jHDF writes no unsigned bytes.
 */
public final class OdimWriter implements SweepWriter {
    private static final DateTimeFormatter DATE =
            DateTimeFormatter.ofPattern("yyyyMMdd", Locale.ROOT).withZone(ZoneOffset.UTC);
    private static final DateTimeFormatter TIME =
            DateTimeFormatter.ofPattern("HHmmss", Locale.ROOT).withZone(ZoneOffset.UTC);

    @Override
    public void write(Path file, Sweep sweep, Packing reflectivity, Packing velocity) throws IOException {
        GeoPoint place = sweep.site().position().orElseThrow(
                () -> new IOException("an ODIM_H5 file needs the radar's position"));
        Hdf5Out file5 = new Hdf5Out();
        WritableGroup out = file5.root();
        out.putAttribute("Conventions", "ODIM_H5/V2_2");
        WritableGroup what = out.putGroup("what");
        what.putAttribute("object", "SCAN");
        what.putAttribute("version", "H5rad 2.2");
        what.putAttribute("date", DATE.format(Instant.ofEpochMilli(sweep.startMs())));
        what.putAttribute("time", TIME.format(Instant.ofEpochMilli(sweep.startMs())));
        what.putAttribute("source", "PLC:" + sweep.site().name() + ",CMT:invented");
        WritableGroup where = out.putGroup("where");
        where.putAttribute("lat", place.latitudeDeg());
        where.putAttribute("lon", place.longitudeDeg());
        where.putAttribute("height", sweep.site().altitudeM());
        WritableGroup how = out.putGroup("how");
        how.putAttribute("task", sweep.source());
        how.putAttribute("comment", CfText.INVENTED);
        dataset(out.putGroup("dataset1"), sweep, reflectivity, velocity);
        file5.writeTo(file);
    }

    private static void dataset(WritableGroup group, Sweep sweep, Packing reflectivity, Packing velocity) {
        WritableGroup what = group.putGroup("what");
        what.putAttribute("product", "SCAN");
        what.putAttribute("startdate", DATE.format(Instant.ofEpochMilli(sweep.startMs())));
        what.putAttribute("starttime", TIME.format(Instant.ofEpochMilli(sweep.startMs())));
        what.putAttribute("enddate", DATE.format(Instant.ofEpochMilli(sweep.endMs())));
        what.putAttribute("endtime", TIME.format(Instant.ofEpochMilli(sweep.endMs())));
        WritableGroup where = group.putGroup("where");
        where.putAttribute("elangle", sweep.elevationDeg());
        where.putAttribute("nbins", (long) sweep.gateCount());
        where.putAttribute("rstart", (sweep.firstGateCentreM() - sweep.gateSpacingM() / 2) / 1000);
        where.putAttribute("rscale", sweep.gateSpacingM());
        where.putAttribute("nrays", (long) sweep.rayCount());
        where.putAttribute("a1gate", (long) new ScanOrder(sweep).rank(0));
        rays(group.putGroup("how"), sweep);
        data(group.putGroup("data1"), sweep.reflectivity(), reflectivity);
        sweep.velocity().ifPresent(field -> data(group.putGroup("data2"), field, velocity));
    }

    private static void rays(WritableGroup how, Sweep sweep) {
        int n = sweep.rayCount();
        // Half a ray as a sum of powers of two, so that the middle of start and stop is the stored azimuth exactly.
        double half = Math.rint(1024 * 180.0 / n) / 1024;
        double[] startAzimuth = new double[n];
        double[] stopAzimuth = new double[n];
        double[] elevation = new double[n];
        double[] time = new double[n];
        for (int r = 0; r < n; r++) {
            startAzimuth[r] = (sweep.rays().azimuthDeg(r) - half + 360) % 360;
            stopAzimuth[r] = (sweep.rays().azimuthDeg(r) + half) % 360;
            elevation[r] = sweep.rays().elevationDeg(r);
            time[r] = sweep.rays().timeMs(r) / 1000.0;
        }
        how.putAttribute("beamwidth", sweep.beamWidthDeg());
        how.putAttribute("startazA", startAzimuth);
        how.putAttribute("stopazA", stopAzimuth);
        how.putAttribute("startelA", elevation);
        how.putAttribute("stopelA", elevation);
        how.putAttribute("startazT", time);
        how.putAttribute("stopazT", time);
        if (sweep.velocity().isPresent()) {
            how.putAttribute("NI", sweep.nyquistMs());
        }
    }

    private static void data(WritableGroup group, Field field, Packing packing) {
        WritableGroup what = group.putGroup("what");
        what.putAttribute("quantity", field.name());
        what.putAttribute("gain", packing.scale());
        what.putAttribute("offset", packing.offset());
        what.putAttribute("nodata", (double) packing.noData());
        what.putAttribute("undetect", (double) packing.undetect());
        short[][] numbers = new short[field.rays()][field.gates()];
        for (int r = 0; r < field.rays(); r++) {
            for (int g = 0; g < field.gates(); g++) {
                numbers[r][g] = (short) packing.pack(field.at(r, g));
            }
        }
        WritableDataset data = group.putDataset("data", numbers);
        data.putAttribute("CLASS", "IMAGE");
        data.putAttribute("IMAGE_VERSION", "1.2");
    }
}
