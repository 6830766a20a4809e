package hemline.casefile.store;

import com.fasterxml.jackson.annotation.JsonPropertyOrder;
import com.fasterxml.jackson.core.JsonGenerator;
import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.core.util.DefaultIndenter;
import com.fasterxml.jackson.core.util.DefaultPrettyPrinter;
import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.List;

/**
 * {@code case.json}: what the case was made from and which files hold its result. Renaming it into place is what
 * makes a new result count.
 *
 * @param format   always {@value #FORMAT}
 * @param version  of the form of the case; a later one is refused
 * @param program  version of the program that made the result
 * @param settings of the run
 * @param sources  what it read, in order of time
 * @param found    the files of the result
 */
@JsonPropertyOrder({"format", "version", "program", "settings", "sources", "found"})
record Manifest(String format, int version, String program, ObjectNode settings, List<SourceFile> sources,
                List<SourceFile> found) {
    static final String FORMAT = "hemline-case";
    static final int VERSION = 1;

    Manifest {
        if (!format.equals(FORMAT)) {
            throw new IllegalArgumentException("format is \"" + format + "\", not \"" + FORMAT + "\"");
        }
        if (version < 1 || version > VERSION) {
            throw new IllegalArgumentException("it has version " + version + "; this program knows up to " + VERSION);
        }
        sources = List.copyOf(sources);
        found = List.copyOf(found);
        for (SourceFile file : found) {
            if (!FoundText.NAMES.contains(file.path())) {
                throw new IllegalArgumentException("it names an unknown result file, " + file.path());
            }
        }
        if (found.size() != FoundText.NAMES.size() || found.stream().distinct().count() != found.size()) {
            throw new IllegalArgumentException("it must name " + FoundText.NAMES + " once each");
        }
    }

    Manifest(String program, ObjectNode settings, List<SourceFile> sources, List<SourceFile> found) {
        this(FORMAT, VERSION, program, settings.deepCopy(), sources, found);
    }

    @Override
    public ObjectNode settings() {
        return settings.deepCopy();
    }

    byte[] toBytes() {
        DefaultPrettyPrinter lines = new DefaultPrettyPrinter()
                .withObjectIndenter(new DefaultIndenter("  ", "\n")).withArrayIndenter(new DefaultIndenter("  ", "\n"));
        try {
            String text = CaseJson.MAPPER.writer(lines).with(JsonGenerator.Feature.WRITE_BIGDECIMAL_AS_PLAIN)
                    .writeValueAsString(this);
            return (text + "\n").getBytes(StandardCharsets.UTF_8);
        } catch (JsonProcessingException e) {
            throw new IllegalStateException("a case could not be put into JSON", e);
        }
    }

    static Manifest of(Path file, byte[] bytes) throws CaseFileException {
        try {
            JsonNode tree = CaseJson.MAPPER.readTree(bytes);
            if (tree.path("version").asInt(0) > VERSION && tree.path("format").asText().equals(FORMAT)) {
                throw new CaseFileException(file, 0, "it has version " + tree.path("version").asInt()
                        + ", but this program knows up to version " + VERSION, "Open it with a newer program");
            }
            if (!tree.isObject()) {
                throw new CaseFileException(file, 0, "it is not the head of a case: a JSON object is due",
                        "Restore it from a copy of the case");
            }
            return CaseJson.MAPPER.treeToValue(tree, Manifest.class);
        } catch (CaseFileException e) {
            throw e;
        } catch (IOException e) {
            String fault = e instanceof JsonProcessingException json ? json.getOriginalMessage() : e.getMessage();
            int line = e instanceof JsonProcessingException json && json.getLocation() != null
                    ? Math.max(0, json.getLocation().getLineNr()) : 0;
            throw new CaseFileException(file, line, "it is not the head of a case: " + fault,
                    "Restore it from a copy of the case", e);
        }
    }
}
