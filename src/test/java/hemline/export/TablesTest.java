package hemline.export;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import hemline.geodesy.GeoPoint;
import hemline.geodesy.LocalPlane;
import hemline.geometry.Point;
import hemline.pipeline.Analysis;
import java.io.IOException;
import java.io.StringReader;
import java.io.StringWriter;
import java.util.List;
import org.apache.commons.csv.CSVFormat;
import org.apache.commons.csv.CSVRecord;
import org.junit.jupiter.api.Test;

class TablesTest {
    private static <R> String text(Table<R> table, List<R> rows) {
        StringWriter out = new StringWriter();
        try {
            table.write(out, rows);
        } catch (IOException e) {
            throw new AssertionError(e);
        }
        return out.toString();
    }

    private static List<CSVRecord> parse(String text) throws IOException {
        return CSVFormat.RFC4180.builder().setHeader().setSkipHeaderRecord(true).build()
                .parse(new StringReader(text)).getRecords();
    }

    private static String boundaries(Analysis analysis) {
        return text(BoundariesTable.TABLE, BoundariesTable.rows(analysis.tracks(), new Geolocation(analysis.site())));
    }

    @Test
    void headersBeginWithTheAgreedColumns() {
        assertThat(String.join(",", BoundariesTable.TABLE.columns().stream().map(Column::name).toList())).startsWith(
                "track_id,time_utc,vertex,x_km,y_km,latitude,longitude,beam_height_m,reflectivity_dbz,"
                + "normal_bearing_deg,speed_ms,speed_sd_ms,kind,origin");
        assertThat(String.join(",", TracksTable.TABLE.columns().stream().map(Column::name).toList())).startsWith(
                "track_id,first_utc,last_utc,sweeps,max_length_km,speed_ms,speed_sd_ms,bearing_deg,centre_x_km,"
                + "centre_y_km,first_radius_km,last_radius_km,expansion_ms,expansion_sd_ms");
        assertThat(String.join(",", MeetingsTable.TABLE.columns().stream().map(Column::name).toList())).startsWith(
                "meeting_id,track_a,track_b,time_utc,x_km,y_km,latitude,longitude,crossing_angle_deg,"
                + "closing_speed_ms,status");
    }

    @Test
    void aRowOfEachTableIsAsWritten() {
        Analysis analysis = InventedAnalysis.at(InventedAnalysis.PLACED);
        assertThat(boundaries(analysis).lines().toList().get(1)).isEqualTo(
                "T01,2026-06-01T10:00:13.950Z,0,-26.580,4.397,48.038991,8.643554,698,12.3,20.0,10.00,0.50,arc,auto,"
                + "0,0,true");
        assertThat(text(TracksTable.TABLE, analysis.tracks()).lines().toList().get(1)).isEqualTo(
                "T01,2026-06-01T10:00:12.050Z,2026-06-01T10:10:14.600Z,3,33.50,10.00,0.50,80.0,-30.00,-5.00,10.00,"
                + "16.00,10.00,0.45,2026-06-01T10:05:00.000Z,0.50,0.30,0.30,1.20,-0.30,0.40,120,0.21,,1.00,auto,8.50");
        assertThat(text(TracksTable.TABLE, analysis.tracks()).lines().toList().get(2)).endsWith(
                ",,,,,,,,,,,,,,,,too straight to tell,0.00,hand,4.25");
        assertThat(text(MeetingsTable.TABLE,
                MeetingsTable.rows(analysis.meetings(), new Geolocation(analysis.site()))).lines().toList().get(1))
                .isEqualTo("M1,T01,T02,2026-06-01T10:09:00.250Z,-12.34,6.50,48.05834,8.83439,72.2,14.20,observed,61,"
                        + "0.90,1.50,0.40,35,1.00");
    }

    @Test
    void vertexZeroBeginsEachStretch() throws IOException {
        List<CSVRecord> rows = parse(boundaries(InventedAnalysis.at(InventedAnalysis.PLACED)));
        String stretch = "";
        for (CSVRecord row : rows) {
            String now = row.get("track_id") + "/" + row.get("sweep") + "/" + row.get("stretch");
            assertThat(row.get("vertex").equals("0")).isEqualTo(!now.equals(stretch));
            stretch = now;
        }
        assertThat(rows.stream().filter(r -> r.get("vertex").equals("0"))).hasSize(3 + 4);
    }

    @Test
    void latitudeAndLongitudeLeadBackToThePlane() throws IOException {
        LocalPlane plane = new LocalPlane(InventedAnalysis.PLACED.position().orElseThrow());
        for (CSVRecord row : parse(boundaries(InventedAnalysis.at(InventedAnalysis.PLACED)))) {
            Point back = plane.toPlane(new GeoPoint(Double.parseDouble(row.get("latitude")),
                    Double.parseDouble(row.get("longitude"))));
            assertThat(back.xKm()).isCloseTo(Double.parseDouble(row.get("x_km")), within(0.001));
            assertThat(back.yKm()).isCloseTo(Double.parseDouble(row.get("y_km")), within(0.001));
        }
    }

    @Test
    void withoutAPositionLatitudeAndLongitudeStayEmpty() throws IOException {
        for (CSVRecord row : parse(boundaries(InventedAnalysis.at(InventedAnalysis.UNPLACED)))) {
            assertThat(row.get("latitude")).isEmpty();
            assertThat(row.get("longitude")).isEmpty();
            assertThat(row.get("x_km")).isNotEmpty();
        }
    }

    @Test
    void whatIsNotMeasuredStaysEmpty() throws IOException {
        List<CSVRecord> rows = parse(boundaries(InventedAnalysis.at(InventedAnalysis.PLACED)));
        assertThat(rows.stream().filter(r -> r.get("track_id").equals("T02") && r.get("vertex").equals("3")))
                .hasSize(4).allMatch(r -> r.get("reflectivity_dbz").isEmpty());
    }

    @Test
    void linesEndWithABareLineFeed() {
        String text = boundaries(InventedAnalysis.at(InventedAnalysis.PLACED));
        assertThat(text).doesNotContain("\r").endsWith("\n");
    }

    @Test
    void everyColumnIsExplained() {
        for (Table<?> table : List.of(BoundariesTable.TABLE, TracksTable.TABLE, MeetingsTable.TABLE)) {
            assertThat(table.columns()).allMatch(c -> c.meaning().endsWith("."));
            assertThat(table.columns().stream().map(Column::name)).doesNotHaveDuplicates();
        }
    }
}
