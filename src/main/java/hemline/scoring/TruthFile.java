package hemline.scoring;

import com.fasterxml.jackson.core.JacksonException;
import com.fasterxml.jackson.databind.DeserializationFeature;
import com.fasterxml.jackson.databind.JsonMappingException;
import com.fasterxml.jackson.databind.ObjectMapper;
import com.fasterxml.jackson.databind.json.JsonMapper;
import hemline.boundary.truth.Truth;
import java.io.IOException;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;

/** Reads {@code truth.json}: the fields of {@link Truth} by their names; unknown ones are ignored. */
public final class TruthFile {
    private static final ObjectMapper JSON = JsonMapper.builder()
            .disable(DeserializationFeature.FAIL_ON_UNKNOWN_PROPERTIES)
            .enable(DeserializationFeature.FAIL_ON_NULL_FOR_PRIMITIVES)
            .enable(DeserializationFeature.FAIL_ON_MISSING_CREATOR_PROPERTIES).build();

    private TruthFile() {
    }

    /** @throws InputFileException when it is not there, no JSON, or lacks something a truth needs */
    public static Truth read(Path file) throws InputFileException {
        try {
            Truth truth = JSON.readValue(file.toFile(), Truth.class);
            if (truth.sweeps().isEmpty()) {
                throw new InputFileException(file, "sweeps", "expected at least one sweep, found none",
                        "use the truth that belongs to the loop", null);
            }
            return truth;
        } catch (JsonMappingException e) {
            throw new InputFileException(file, e.getPathReference().replaceAll("[a-z.]+\\.Truth", "Truth"),
                    "expected the fields of a truth: " + e.getOriginalMessage(),
                    "use a truth.json as a simulation writes it", e);
        } catch (JacksonException e) {
            throw new InputFileException(file, "line " + e.getLocation().getLineNr(), "is no JSON: "
                    + e.getOriginalMessage(), "use a truth.json as a simulation writes it", e);
        } catch (NoSuchFileException | java.io.FileNotFoundException e) {
            throw new InputFileException(file, "", "no such file", "check the path", e);
        } catch (IOException e) {
            throw new InputFileException(file, "", "cannot be read: " + e, "check the path and its permissions", e);
        }
    }
}
