package hemline.simulation.files;

import com.fasterxml.jackson.core.JsonGenerator;
import com.fasterxml.jackson.databind.ObjectMapper;
import hemline.boundary.truth.Truth;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;

/** Writes a truth as JSON, the plain Jackson form of {@link Truth}, in UTF-8. */
public final class TruthWriter {
    private TruthWriter() {
    }

    public static void write(Path file, Truth truth) throws IOException {
        ObjectMapper mapper = new ObjectMapper();
        mapper.disable(JsonGenerator.Feature.AUTO_CLOSE_TARGET);
        Files.write(file, (mapper.writeValueAsString(truth) + "\n").getBytes(StandardCharsets.UTF_8));
    }
}
