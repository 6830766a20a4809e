package hemline.casefile;

import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.databind.DeserializationFeature;
import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.json.JsonMapper;
import com.fasterxml.jackson.databind.node.ObjectNode;
import com.fasterxml.jackson.databind.node.ValueNode;
import hemline.pipeline.Settings;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;

/** Settings as JSON: in full, or only those that differ from the defaults. */
public final class SettingsJson {
    private static final JsonMapper MAPPER = JsonMapper.builder()
            .enable(DeserializationFeature.FAIL_ON_UNKNOWN_PROPERTIES)
            .enable(DeserializationFeature.FAIL_ON_NULL_FOR_PRIMITIVES)
            .disable(DeserializationFeature.ACCEPT_FLOAT_AS_INT).build();

    private SettingsJson() {
    }

    /** All settings, in the order of their declaration. */
    public static ObjectNode toJson(Settings settings) {
        return MAPPER.valueToTree(settings);
    }

    /**
     * The defaults with what a JSON object says otherwise.
     *
     * @throws IllegalArgumentException if it names a setting that does not exist, or gives a value that is not of the
     *                                  right kind or out of bounds; the message says which and what would be right
     */
    public static Settings fromJson(JsonNode differing) {
        ObjectNode joined = toJson(Settings.defaults());
        if (!differing.isObject()) {
            throw new IllegalArgumentException("settings must be a JSON object, got " + kind(differing));
        }
        merge(joined, differing, "");
        try {
            return MAPPER.treeToValue(joined, Settings.class);
        } catch (JsonProcessingException e) {
            Throwable cause = e;
            while (cause.getCause() != null && !(cause instanceof IllegalArgumentException)) {
                cause = cause.getCause();
            }
            throw new IllegalArgumentException(cause instanceof JsonProcessingException json
                    ? json.getOriginalMessage() : cause.getMessage(), e);
        }
    }

    private static void merge(ObjectNode into, JsonNode from, String path) {
        for (Map.Entry<String, JsonNode> entry : from.properties()) {
            String name = path + entry.getKey();
            JsonNode known = into.get(entry.getKey());
            JsonNode value = entry.getValue();
            if (known == null) {
                List<String> names = new ArrayList<>();
                into.fieldNames().forEachRemaining(names::add);
                throw new IllegalArgumentException("there is no setting '" + name + "'; here are "
                        + String.join(", ", names));
            }
            if (known.isObject() && value.isObject()) {
                merge((ObjectNode) known, value, name + ".");
            } else if (known.isObject() != value.isObject() || !kind(known).equals(kind(value))) {
                throw new IllegalArgumentException("setting '" + name + "' must be " + kind(known) + ", got "
                        + (value instanceof ValueNode ? value.toString() : kind(value)));
            } else {
                into.set(entry.getKey(), value);
            }
        }
    }

    private static String kind(JsonNode node) {
        return switch (node.getNodeType()) {
            case NUMBER -> "a number";
            case STRING -> "words";
            case BOOLEAN -> "true or false";
            case OBJECT -> "an object";
            case ARRAY -> "a list";
            default -> "nothing";
        };
    }
}
