package hemline.workflow;

import com.fasterxml.jackson.core.JacksonException;
import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import hemline.casefile.SettingsJson;
import hemline.pipeline.Settings;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;

/** Reads a user's settings file: a JSON object of what differs from the defaults, or a {@code run.json} that has one. */
final class SettingsFile {
    private static final long MOST_BYTES = 64L << 20;

    private SettingsFile() {
    }

    static Settings read(Path file) throws UserProblem {
        try {
            if (Files.size(file) > MOST_BYTES) {
                throw problem(file, "is too large for settings", null);
            }
            JsonNode root = new ObjectMapper().readTree(Files.readAllBytes(file));
            boolean run = root.path("program").asText().equals("hemline") && root.has("settings");
            return SettingsJson.fromJson(run ? root.get("settings") : root);
        } catch (JacksonException e) {
            throw problem(file, "is no JSON: line " + (e.getLocation() == null ? 1 : e.getLocation().getLineNr()) + ", "
                    + e.getOriginalMessage().replaceAll("\\s+", " "), e);
        } catch (IllegalArgumentException e) {
            throw problem(file, e.getMessage(), e);
        } catch (IOException e) {
            throw problem(file, Files.exists(file) ? "cannot be read" : "there is no such file", e);
        }
    }

    private static UserProblem problem(Path file, String what, Exception cause) {
        return new UserProblem(UserProblem.Kind.USAGE, file + ": " + what
                + "; give a JSON object of settings as found in run.json", cause);
    }
}
