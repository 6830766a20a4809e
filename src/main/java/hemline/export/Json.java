package hemline.export;

import com.fasterxml.jackson.core.JsonGenerator;
import com.fasterxml.jackson.core.util.DefaultIndenter;
import com.fasterxml.jackson.core.util.DefaultPrettyPrinter;
import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import com.fasterxml.jackson.databind.ObjectWriter;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.io.IOException;
import java.io.OutputStream;
import java.nio.charset.StandardCharsets;

/** JSON as this project writes it: UTF-8, two spaces, bare line feeds, numbers that are not finite left null. */
final class Json {
    private static final ObjectMapper MAPPER = new ObjectMapper();
    private static final ObjectWriter PRETTY = MAPPER.writer(new DefaultPrettyPrinter()
            .withObjectIndenter(new DefaultIndenter("  ", "\n")).withArrayIndenter(new DefaultIndenter("  ", "\n")));

    private Json() {
    }

    static ObjectNode object() {
        return MAPPER.createObjectNode();
    }

    static void putNumber(ObjectNode node, String name, double value, int decimals) {
        if (Double.isFinite(value)) {
            node.put(name, Numbers.rounded(value, decimals));
        } else {
            node.putNull(name);
        }
    }

    static void write(JsonNode node, OutputStream out) throws IOException {
        out.write(PRETTY.writeValueAsString(node).getBytes(StandardCharsets.UTF_8));
        out.write('\n');
    }

    /** A generator of compact JSON for long files; the caller closes it. */
    static JsonGenerator compact(OutputStream out) throws IOException {
        return MAPPER.getFactory().createGenerator(out).disable(JsonGenerator.Feature.AUTO_CLOSE_TARGET);
    }
}
