package hemline.reader;

import hemline.geodesy.GeoPoint;
import hemline.sweep.Field;
import hemline.sweep.RadarSite;
import java.nio.ByteBuffer;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/**
 * WSR-88D Level II (Archive II) volumes, also of terminal radars, decoded from the open interface documents 2620010
 * and 2620002 of the Radar Operations Center. Cuts that end early are kept as far as they go.
 */
final class Level2File implements FormatFile {
    private final InputFile file;
    private final int firstIndex;
    private final Level2Messages messages;
    private final String format;
    private final RadarSite site;
    private final double antennaAboveSiteM;
    private final List<Level2Sweep> sweeps;
    private final List<SweepHead> heads;
    private int decodedSweep = -1;
    private Map<String, float[]> decoded = Map.of();

    private Level2File(InputFile file, Level2Messages messages, Survey survey, String version) {
        this.file = file;
        this.messages = messages;
        firstIndex = survey.firstIndex;
        sweeps = survey.sweeps;
        heads = new ArrayList<>();
        for (int i = 0; i < sweeps.size(); i++) {
            heads.add(sweeps.get(i).head(survey.firstIndex + i));
        }
        format = "WSR-88D Level II " + version + " message " + survey.messageType
                + (survey.pattern > 0 ? " VCP " + survey.pattern : "")
                + (messages.packing().isEmpty() ? "" : ", " + messages.packing());
        site = new RadarSite(survey.name, survey.position, survey.groundM);
        antennaAboveSiteM = survey.antennaAboveGroundM;
    }

    /** Opens all cuts. */
    static Level2File open(InputFile file, Content content) throws UnreadableFileException {
        return open(file, content, new SweepSpan(Level2Position.START, Level2Position.END, 0), Optional.empty());
    }

    /** Opens the cuts up to the last planned one at the lowest elevation that the options take. */
    static Level2File openLow(InputFile file, Content content, ReadOptions options) throws UnreadableFileException {
        Level2File low = open(file, content, new SweepSpan(Level2Position.START, Level2Position.END, 0),
                Optional.of(options));
        boolean asPlanned = low.heads.stream().anyMatch(head -> options.takes(head.elevationDeg()));
        return asPlanned ? low : open(file, content);
    }

    /** Opens some cuts again. */
    static Level2File openSpan(InputFile file, Content content, SweepSpan span) throws UnreadableFileException {
        return open(file, content, span, Optional.empty());
    }

    private static Level2File open(InputFile file, Content content, SweepSpan span, Optional<ReadOptions> lowOnly)
            throws UnreadableFileException {
        byte[] head = file.shield("volume header", () -> {
            try (var in = content.stream()) {
                return in.readNBytes(Level2Messages.VOLUME_HEADER_BYTES + 8);
            }
        });
        if (head.length < Level2Messages.VOLUME_HEADER_BYTES + 8) {
            throw file.broken("volume header", "the file ends after " + head.length + " bytes");
        }
        boolean packed = head[28] == 'B' && head[29] == 'Z' && head[30] == 'h';
        Level2Messages messages = packed ? new Level2Packed(content.bytes()) : new Level2Plain(file, content);
        String version = Level2Radial.text(ByteBuffer.wrap(head), 0, 8);
        String name = Level2Radial.text(ByteBuffer.wrap(head), 20, 4).replaceAll("[^A-Z0-9]", "");
        Survey survey = new Survey(name.isEmpty() ? "unknown" : name, span.firstIndex(), lowOnly);
        messages.visit(span.from(), span.to(), survey);
        if (survey.sweeps.isEmpty()) {
            throw file.broken("", "holds no radial: the volume is cut off after its metadata, or damaged"
                    + (messages.notes().isEmpty() ? "" : " (" + messages.notes().get(0) + ")"));
        }
        return new Level2File(file, messages, survey, version.startsWith("ARCHIVE2") ? "ARCHIVE2" : version);
    }

    /** What a first walk over the radials finds. */
    private static final class Survey implements Level2Messages.Visitor {
        private final List<Level2Sweep> sweeps = new ArrayList<>();
        private final int firstIndex;
        private final Optional<ReadOptions> lowOnly;
        private int lastCut;
        private String name;
        private int messageType;
        private int pattern;
        private Optional<GeoPoint> position = Optional.empty();
        private double groundM = Double.NaN;
        private double antennaAboveGroundM;

        Survey(String name, int firstIndex, Optional<ReadOptions> lowOnly) {
            this.name = name;
            this.firstIndex = firstIndex;
            this.lowOnly = lowOnly;
        }

        @Override
        public void pattern(ByteBuffer body) {
            lowOnly.ifPresent(options -> lastCut = Math.max(lastCut, Level2Pattern.lastLowCut(body, options)));
        }

        @Override
        public boolean radial(int type, ByteBuffer body, Level2Position at) {
            Level2Radial radial = Level2Radial.of(type, body);
            if (radial == null) {
                return true;
            }
            messageType = type;
            describe(type, body, radial);
            Level2Sweep last = sweeps.isEmpty() ? null : sweeps.get(sweeps.size() - 1);
            if (last == null || !last.continuesWith(radial)) {
                if (last != null) {
                    last.endAt(at);
                }
                if (sweeps.size() == Limits.MAX_SWEEPS || lastCut > 0 && radial.elevationNumber() > lastCut) {
                    return false;
                }
                last = new Level2Sweep(radial.elevationNumber(), at);
                sweeps.add(last);
            }
            last.add(radial);
            return true;
        }

        private void describe(int type, ByteBuffer body, Level2Radial radial) {
            if (type == Level2Messages.DIGITAL_RADAR_DATA) {
                pattern = pattern > 0 ? pattern : body.getShort(44);
                return;
            }
            String own = Level2Radial.text(body, 0, 4).replaceAll("[^A-Z0-9]", "");
            name = name.equals("unknown") && !own.isEmpty() ? own : name;
            int at = radial.volumeAt();
            if (at < 0 || position.isPresent()) {
                return;
            }
            double latitude = body.getFloat(at + 8);
            double longitude = body.getFloat(at + 12);
            if (Math.abs(latitude) <= 90 && Math.abs(longitude) <= 180 && (latitude != 0 || longitude != 0)) {
                position = Optional.of(new GeoPoint(latitude, longitude));
                groundM = Positions.altitude(body.getShort(at + 16));
                antennaAboveGroundM = Math.min(200, body.getShort(at + 18) & 0xffff);
                pattern = body.getShort(at + 40) & 0xffff;
            }
        }
    }

    @Override
    public String format() {
        return format;
    }

    @Override
    public RadarSite site() {
        return site;
    }

    @Override
    public double antennaAboveSiteM() {
        return antennaAboveSiteM;
    }

    @Override
    public int firstIndex() {
        return firstIndex;
    }

    @Override
    public Optional<SweepSpan> span(int first, int last) {
        return Optional.of(new SweepSpan(sweeps.get(first).from(), sweeps.get(last).to(), firstIndex + first));
    }

    @Override
    public List<SweepHead> sweeps() {
        return heads;
    }

    @Override
    public List<String> notes() {
        return messages.notes();
    }

    @Override
    public float[] values(int sweep, FieldHead field) throws UnreadableFileException {
        if (decodedSweep != sweep || !decoded.containsKey(field.name())) {
            decoded = decode(sweep, field);
            decodedSweep = sweep;
        }
        return decoded.get(field.name()).clone();
    }

    /** Reflectivity and velocity are wanted together mostly, and come from the same radials. */
    private Map<String, float[]> decode(int sweep, FieldHead wanted) throws UnreadableFileException {
        SweepHead head = heads.get(sweep);
        int rays = head.rays().rays();
        Map<String, float[]> values = new HashMap<>();
        for (FieldHead field : head.fields()) {
            if (field.name().equals(wanted.name()) || field.name().equals("REF") || field.name().equals("VEL")) {
                Limits.checkSweep(file, head.place(), rays, field.ranges().gates());
                float[] all = new float[rays * field.ranges().gates()];
                Arrays.fill(all, Field.NOT_MEASURED);
                values.put(field.name(), all);
            }
        }
        int[] ray = {0};
        messages.visit(sweeps.get(sweep).from(), sweeps.get(sweep).to(), (type, body, at) -> {
            Level2Radial radial = Level2Radial.of(type, body);
            if (radial != null && ray[0] < rays) {
                for (FieldHead field : head.fields()) {
                    float[] into = values.get(field.name());
                    Level2Radial.Moment moment = into == null ? null : radial.moment(field.name());
                    if (moment != null && moment.ranges().spacingM() == field.ranges().spacingM()
                            && moment.ranges().firstCentreM() == field.ranges().firstCentreM()) {
                        decode(body, moment, into, ray[0] * field.ranges().gates());
                    }
                }
                ray[0]++;
            }
            return true;
        });
        if (ray[0] != rays) {
            throw file.broken(head.place(), "had " + rays + " radials when it was opened and has " + ray[0] + " now");
        }
        return values;
    }

    private static void decode(ByteBuffer body, Level2Radial.Moment moment, float[] into, int to) {
        int gates = moment.ranges().gates();
        boolean wide = moment.bits() == 16;
        for (int gate = 0; gate < gates; gate++) {
            int code = wide ? body.getShort(moment.at() + 2 * gate) & 0xffff : body.get(moment.at() + gate) & 0xff;
            into[to + gate] = code == 0 ? Field.BELOW_DETECTION : code == 1 ? Field.NOT_MEASURED
                    : (float) ((code - moment.offset()) / moment.scale());
        }
    }

    @Override
    public void close() {
        decoded = Map.of();
    }
}
