package hemline.scoring;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.charset.CharacterCodingException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.time.DateTimeException;
import java.time.OffsetDateTime;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.TreeMap;
import org.apache.commons.csv.CSVFormat;
import org.apache.commons.csv.CSVParser;
import org.apache.commons.csv.CSVRecord;

/**
 * A comma-separated table with a header row, read whole: UTF-8 with or without a byte-order mark, quoting after
 * RFC 4180, empty lines ignored, cells stripped of surrounding blanks, columns in any order, names in any case.
 */
public final class TableFile {
    private static final CSVFormat FORMAT = CSVFormat.RFC4180.builder().setIgnoreEmptyLines(true)
            .setIgnoreSurroundingSpaces(true).setTrim(true).build();

    private final Path file;
    private final Map<String, Integer> columns = new TreeMap<>();
    private final List<Row> rows = new ArrayList<>();

    private TableFile(Path file) {
        this.file = file;
    }

    /**
     * @throws InputFileException when there is no such file, it is no UTF-8 text, has no header row, repeats a column,
     *                            or has a row of another length than the header
     */
    public static TableFile read(Path file) throws InputFileException {
        TableFile table = new TableFile(file);
        String text;
        try {
            text = Files.readString(file, StandardCharsets.UTF_8);
        } catch (CharacterCodingException e) {
            throw new InputFileException(file, "", "expected UTF-8 text, found other bytes", "save it as UTF-8 CSV", e);
        } catch (NoSuchFileException e) {
            throw new InputFileException(file, "", "no such file", "check the path", e);
        } catch (IOException e) {
            throw new InputFileException(file, "", "cannot be read: " + e, "check the path and its permissions", e);
        }
        try (CSVParser parser = CSVParser.parse(text.startsWith("\uFEFF") ? text.substring(1) : text, FORMAT)) {
            for (CSVRecord record : parser) {
                table.accept(record, parser.getCurrentLineNumber());
            }
        } catch (IOException | UncheckedIOException | IllegalStateException e) {
            throw new InputFileException(file, "", "is no comma-separated table: " + e.getMessage(),
                    "check its quotation marks", e);
        }
        if (table.columns.isEmpty()) {
            throw new InputFileException(file, "", "expected a header row, found nothing", "give the columns names", null);
        }
        return table;
    }

    private void accept(CSVRecord record, long line) throws InputFileException {
        if (columns.isEmpty()) {
            for (int i = 0; i < record.size(); i++) {
                String name = record.get(i).toLowerCase(Locale.ROOT);
                if (columns.put(name, i) != null) {
                    throw new InputFileException(file, "line " + line, "column " + name + " is there twice",
                            "name each column once", null);
                }
            }
        } else if (record.size() != columns.size()) {
            throw new InputFileException(file, "line " + line, "expected " + columns.size() + " cells, found "
                    + record.size(), "give every row as many cells as the header has", null);
        } else {
            rows.add(new Row(record, line));
        }
    }

    public List<Row> rows() {
        return List.copyOf(rows);
    }

    public boolean has(String column) {
        return columns.containsKey(column);
    }

    /** Names of all columns, lower case, in order of name. */
    public List<String> columnNames() {
        return List.copyOf(columns.keySet());
    }

    /** @throws InputFileException naming the first column that is not there */
    public void require(List<String> names) throws InputFileException {
        for (String name : names) {
            if (!has(name)) {
                throw new InputFileException(file, "line 1", "expected a column " + name + ", found "
                        + String.join(", ", columns.keySet()), "add the column or rename the one that holds it", null);
            }
        }
    }

    /** One row; asking for a column the table does not have gives an empty cell. */
    public final class Row {
        private final CSVRecord cells;
        private final long line;

        private Row(CSVRecord cells, long line) {
            this.cells = cells;
            this.line = line;
        }

        public String text(String column) {
            return has(column) ? cells.get(columns.get(column)) : "";
        }

        /** NaN for an empty cell. */
        public double number(String column) throws InputFileException {
            String text = text(column);
            if (text.isEmpty()) {
                return Double.NaN;
            }
            try {
                double value = Double.parseDouble(text);
                if (Double.isFinite(value)) {
                    return value;
                }
            } catch (NumberFormatException e) {
                throw problem(column, "expected a number with a decimal point, found \"" + text + "\"",
                        "write it like 12.5, or leave the cell empty if it is not known");
            }
            throw problem(column, "expected a finite number, found " + text, "leave the cell empty if it is not known");
        }

        /** A number that has to be there. */
        public double needed(String column) throws InputFileException {
            double value = number(column);
            if (Double.isNaN(value)) {
                throw problem(column, "expected a number, found an empty cell", "fill it in or drop the row");
            }
            return value;
        }

        /** ms since 1970-01-01T00:00Z of an ISO 8601 time with its zone. */
        public long timeMs(String column) throws InputFileException {
            String text = text(column);
            try {
                return OffsetDateTime.parse(text.replace(' ', 'T')).toInstant().toEpochMilli();
            } catch (DateTimeException | ArithmeticException e) {
                throw problem(column, "expected an ISO 8601 time with its zone, found \"" + text + "\"",
                        "write it like 2026-06-01T12:00:03Z");
            }
        }

        /** A problem in a cell of this row, ready to be thrown. */
        public InputFileException problem(String column, String what, String mend) {
            return new InputFileException(file, "line " + line + ", column " + column, what, mend, null);
        }
    }
}
