package hemline.casefile.store;

import com.fasterxml.jackson.annotation.JsonFormat;
import com.fasterxml.jackson.annotation.JsonIgnoreProperties;
import com.fasterxml.jackson.annotation.JsonValue;
import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonGenerator;
import com.fasterxml.jackson.core.JsonParser;
import com.fasterxml.jackson.core.JsonToken;
import com.fasterxml.jackson.core.StreamReadConstraints;
import com.fasterxml.jackson.core.StreamReadFeature;
import com.fasterxml.jackson.core.StreamWriteFeature;
import com.fasterxml.jackson.databind.DeserializationContext;
import com.fasterxml.jackson.databind.DeserializationFeature;
import com.fasterxml.jackson.databind.MapperFeature;
import com.fasterxml.jackson.databind.SerializerProvider;
import com.fasterxml.jackson.databind.deser.std.StdScalarDeserializer;
import com.fasterxml.jackson.databind.json.JsonMapper;
import com.fasterxml.jackson.databind.module.SimpleModule;
import com.fasterxml.jackson.databind.ser.std.StdScalarSerializer;
import com.fasterxml.jackson.datatype.jdk8.Jdk8Module;
import hemline.boundary.BoundaryKind;
import hemline.boundary.Meeting;
import hemline.boundary.Origin;
import hemline.boundary.Speed;
import hemline.boundary.TrackVertex;
import hemline.casefile.edit.AsideReason;
import hemline.casefile.edit.Extent;
import hemline.casefile.edit.MeetingVerdict;
import hemline.casefile.edit.ReviewOutcome;
import hemline.geometry.Point;
import java.io.IOException;
import java.util.List;

/**
 * How a case is put into JSON: members in fixed order; numbers in the shortest form that reads back as the same
 * double, on any Java version; NaN as null; anything unexpected refused.
 */
final class CaseJson {
    /** A drawn line of the most points allowed takes under 1 MB. */
    static final int LONGEST_LINE_BYTES = 32 << 20;

    private static final int DEEPEST_NESTING = 64;

    static final JsonMapper MAPPER = mapper();

    private CaseJson() {
    }

    private static JsonMapper mapper() {
        JsonFactory factory = JsonFactory.builder()
                .streamReadConstraints(StreamReadConstraints.builder().maxNestingDepth(DEEPEST_NESTING)
                        .maxNumberLength(64).maxStringLength(1 << 20).maxNameLength(1000)
                        .maxDocumentLength(LONGEST_LINE_BYTES).build())
                .enable(StreamReadFeature.STRICT_DUPLICATE_DETECTION)
                .enable(StreamReadFeature.USE_FAST_DOUBLE_PARSER)
                .enable(StreamWriteFeature.USE_FAST_DOUBLE_WRITER).build();
        SimpleModule doubles = new SimpleModule("doubles")
                .addSerializer(double.class, new DoubleWriter()).addSerializer(Double.class, new DoubleWriter())
                .addDeserializer(double.class, new DoubleReader())
                .addSerializer(Point.class, new PointWriter()).addDeserializer(Point.class, new PointReader());
        JsonMapper.Builder builder = JsonMapper.builder(factory)
                .disable(MapperFeature.ALLOW_COERCION_OF_SCALARS)
                .disable(DeserializationFeature.ACCEPT_FLOAT_AS_INT)
                .enable(DeserializationFeature.FAIL_ON_NULL_FOR_PRIMITIVES)
                .enable(DeserializationFeature.FAIL_ON_MISSING_CREATOR_PROPERTIES)
                .enable(DeserializationFeature.FAIL_ON_NUMBERS_FOR_ENUMS)
                .enable(DeserializationFeature.FAIL_ON_TRAILING_TOKENS)
                .addModule(new Jdk8Module()).addModule(doubles)
                .addMixIn(Speed.class, SpeedForm.class).addMixIn(TrackVertex.class, FlatForm.class);
        for (Class<?> named : List.of(BoundaryKind.class, Origin.class, Meeting.Status.class, AsideReason.class,
                Extent.class, MeetingVerdict.class, ReviewOutcome.class)) {
            builder.addMixIn(named, LabelForm.class);
        }
        return builder.build();
    }

    /** Written as an array of its components, in order. */
    @JsonFormat(shape = JsonFormat.Shape.ARRAY)
    private interface FlatForm {
    }

    /** A flat form whose query methods are no components. */
    @JsonFormat(shape = JsonFormat.Shape.ARRAY)
    @JsonIgnoreProperties({"known"})
    private interface SpeedForm {
    }

    /** Written as its word. */
    private interface LabelForm {
        @JsonValue
        String label();
    }

    private static final class DoubleWriter extends StdScalarSerializer<Double> {
        private static final long serialVersionUID = 1L;

        DoubleWriter() {
            super(Double.class);
        }

        @Override
        public void serialize(Double value, JsonGenerator to, SerializerProvider provider)
                throws IOException {
            if (value.isNaN()) {
                to.writeNull();
            } else {
                to.writeNumber(value);
            }
        }
    }

    private static final class DoubleReader extends StdScalarDeserializer<Double> {
        private static final long serialVersionUID = 1L;

        DoubleReader() {
            super(Double.class);
        }

        @Override
        public Double deserialize(JsonParser from, DeserializationContext context) throws IOException {
            if (from.currentToken() == JsonToken.VALUE_STRING && from.getText().equals("-Infinity")) {
                return Double.NEGATIVE_INFINITY;
            }
            if (from.currentToken() == null || !from.currentToken().isNumeric()) {
                return (Double) context.handleUnexpectedToken(Double.class, from);
            }
            double value = from.getDoubleValue();
            if (Double.isInfinite(value)) {
                return (Double) context.handleWeirdNumberValue(Double.class, value, "too large for a double");
            }
            return value;
        }

        @Override
        public Double getNullValue(DeserializationContext context) {
            return Double.NaN;
        }
    }

    private static final class PointWriter extends StdScalarSerializer<Point> {
        private static final long serialVersionUID = 1L;

        PointWriter() {
            super(Point.class);
        }

        @Override
        public void serialize(Point value, JsonGenerator to, SerializerProvider provider) throws IOException {
            to.writeStartArray();
            to.writeNumber(value.xKm());
            to.writeNumber(value.yKm());
            to.writeEndArray();
        }
    }

    /** Exactly two finite numbers. */
    private static final class PointReader extends StdScalarDeserializer<Point> {
        private static final long serialVersionUID = 1L;

        PointReader() {
            super(Point.class);
        }

        @Override
        public Point deserialize(JsonParser from, DeserializationContext context) throws IOException {
            if (from.currentToken() != JsonToken.START_ARRAY) {
                return (Point) context.handleUnexpectedToken(Point.class, from);
            }
            double xKm = number(from, context);
            double yKm = number(from, context);
            if (from.nextToken() != JsonToken.END_ARRAY) {
                return (Point) context.handleUnexpectedToken(Point.class, from);
            }
            return new Point(xKm, yKm);
        }

        private static double number(JsonParser from, DeserializationContext context) throws IOException {
            JsonToken token = from.nextToken();
            if (token == null || !token.isNumeric() || !Double.isFinite(from.getDoubleValue())) {
                return ((Point) context.handleUnexpectedToken(Point.class, from)).xKm();
            }
            return from.getDoubleValue();
        }
    }
}
