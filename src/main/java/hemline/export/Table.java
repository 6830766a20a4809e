package hemline.export;

import java.io.IOException;
import java.io.Writer;
import java.util.List;
import org.apache.commons.csv.CSVFormat;
import org.apache.commons.csv.CSVPrinter;

/**
 * A kind of table: its columns, in order, once for the CSV, the schema and the data dictionary.
 *
 * @param name    file name without ending
 * @param meaning what one row is
 * @param columns left to right
 */
record Table<R>(String name, String meaning, List<Column<R>> columns) {
    /** RFC 4180 quoting with a bare line feed, which every reader of tables takes and version control likes. */
    private static final CSVFormat FORMAT = CSVFormat.RFC4180.builder().setRecordSeparator('\n').build();

    Table {
        columns = List.copyOf(columns);
    }

    void write(Writer out, Iterable<R> rows) throws IOException {
        CSVPrinter printer = new CSVPrinter(out, FORMAT);
        printer.printRecord(columns.stream().map(Column::name));
        for (R row : rows) {
            printer.printRecord(columns.stream().map(column -> column.cell().apply(row)));
        }
        printer.flush();
    }
}
