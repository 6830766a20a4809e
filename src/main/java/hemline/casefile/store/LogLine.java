package hemline.casefile.store;

import com.fasterxml.jackson.annotation.JsonPropertyOrder;
import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.databind.JsonNode;
import hemline.casefile.edit.EditKind;
import hemline.casefile.edit.Entry;
import java.nio.ByteBuffer;
import java.nio.charset.CharacterCodingException;
import java.nio.charset.StandardCharsets;
import java.time.DateTimeException;
import java.time.Instant;

/**
 * One entry as a line of the log.
 *
 * <p>The line is a JSON object whose last member, {@code sum}, holds the first 16 hexadecimal digits of the SHA-256
 * of all that stands before it; {@code prev} repeats the sum of the line before. So a changed line, and a line taken
 * out, both show.
 *
 * @param entry what the line says
 * @param prev  sum of the line before; empty for the first
 * @param sum   its own
 */
record LogLine(Entry entry, String prev, String sum) {
    private static final int SUM_DIGITS = 16;
    private static final String BEFORE_SUM = ",\"sum\":\"";
    private static final String AFTER_SUM = "\"}";
    private static final int TAIL = BEFORE_SUM.length() + SUM_DIGITS + AFTER_SUM.length();

    /** The entry as bytes with the closing newline, to stand after a line with sum {@code prev}. */
    static Encoded encode(Entry entry, String prev) {
        Body body = new Body(entry.sequence(), Instant.ofEpochMilli(entry.timeMs()).toString(), entry.author(),
                entry.reason(), EditKind.of(entry.edit()).label(), CaseJson.MAPPER.valueToTree(entry.edit()),
                entry.before(), entry.after(), prev);
        try {
            String text = CaseJson.MAPPER.writeValueAsString(body);
            String head = text.substring(0, text.length() - 1);
            String sum = sum(head.getBytes(StandardCharsets.UTF_8));
            String line = head + BEFORE_SUM + sum + AFTER_SUM + "\n";
            return new Encoded(line.getBytes(StandardCharsets.UTF_8), sum);
        } catch (JsonProcessingException e) {
            throw new IllegalStateException("an entry could not be put into JSON: " + entry, e);
        }
    }

    /** @param line without the newline */
    static LogLine decode(byte[] line) throws DamagedLine {
        if (line.length < TAIL) {
            throw new DamagedLine("too short for an entry: " + line.length + " bytes");
        }
        if (line.length > CaseJson.LONGEST_LINE_BYTES) {
            throw new DamagedLine("too long for an entry: " + line.length + " bytes");
        }
        String tail = new String(line, line.length - TAIL, TAIL, StandardCharsets.ISO_8859_1);
        if (!tail.startsWith(BEFORE_SUM) || !tail.endsWith(AFTER_SUM)) {
            throw new DamagedLine("it does not end with a checksum");
        }
        String recorded = tail.substring(BEFORE_SUM.length(), BEFORE_SUM.length() + SUM_DIGITS);
        byte[] head = java.util.Arrays.copyOf(line, line.length - TAIL);
        String actual = sum(head);
        if (!actual.equals(recorded)) {
            throw new DamagedLine("its checksum is " + actual + ", but it says " + recorded);
        }
        return parsed(head, recorded);
    }

    private static LogLine parsed(byte[] head, String sum) throws DamagedLine {
        try {
            String text = StandardCharsets.UTF_8.newDecoder().decode(ByteBuffer.wrap(head)) + "}";
            Body body = CaseJson.MAPPER.readValue(text, Body.class);
            EditKind kind = EditKind.labelled(body.kind())
                    .orElseThrow(() -> new DamagedLine("there is no edit of kind \"" + shortened(body.kind()) + "\""));
            Entry entry = new Entry(body.seq(), Instant.parse(body.time()).toEpochMilli(), body.author(),
                    body.reason(), CaseJson.MAPPER.treeToValue(body.edit(), kind.type()), body.before(), body.after());
            return new LogLine(entry, body.prev(), sum);
        } catch (CharacterCodingException e) {
            throw new DamagedLine("it is not UTF-8 text");
        } catch (JsonProcessingException e) {
            throw new DamagedLine(shortened(e.getOriginalMessage()));
        } catch (DateTimeException | IllegalArgumentException | NullPointerException | ArithmeticException e) {
            throw new DamagedLine(shortened(String.valueOf(e.getMessage())));
        }
    }

    private static String shortened(String text) {
        String line = text.lines().findFirst().orElse("");
        return line.length() > 200 ? line.substring(0, 200) + "…" : line;
    }

    private static String sum(byte[] bytes) {
        return Sha256.of(bytes).substring(0, SUM_DIGITS);
    }

    /** A line's bytes and its sum. */
    record Encoded(byte[] bytes, String sum) {
    }

    @JsonPropertyOrder({"seq", "time", "author", "reason", "kind", "edit", "before", "after", "prev"})
    private record Body(int seq, String time, String author, String reason, String kind, JsonNode edit, String before,
                        String after, String prev) {
    }

    /** A line that is no entry; the message says what is wrong with it. */
    static final class DamagedLine extends Exception {
        private static final long serialVersionUID = 1L;

        DamagedLine(String fault) {
            super(fault);
        }
    }
}
