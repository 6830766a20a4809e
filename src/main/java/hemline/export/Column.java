package hemline.export;

import java.util.function.Function;
import java.util.function.ToDoubleFunction;
import java.util.function.ToLongFunction;

/**
 * One column of a table: how it is named and explained, and how its cells are made.
 *
 * @param name    header, never changed once released
 * @param type    what its cells hold
 * @param unit    in UDUNITS spelling; empty for words, times and pure counts
 * @param meaning one sentence for the data dictionary
 * @param cell    the cell of a row; empty for not available
 */
record Column<R>(String name, Type type, String unit, String meaning, Function<R, String> cell) {

    /** What a cell holds, with its name in Frictionless Table Schema 1.0. */
    enum Type {
        TEXT("string"), INTEGER("integer"), NUMBER("number"), TIME("datetime"), FLAG("boolean");

        private final String schemaName;

        Type(String schemaName) {
            this.schemaName = schemaName;
        }

        String schemaName() {
            return schemaName;
        }
    }

    static <R> Column<R> text(String name, String meaning, Function<R, String> value) {
        return new Column<>(name, Type.TEXT, "", meaning, row -> SafeCell.text(value.apply(row)));
    }

    static <R> Column<R> integer(String name, String meaning, ToLongFunction<R> value) {
        return new Column<>(name, Type.INTEGER, "", meaning, row -> Long.toString(value.applyAsLong(row)));
    }

    static <R> Column<R> number(String name, String unit, int decimals, String meaning, ToDoubleFunction<R> value) {
        return new Column<>(name, Type.NUMBER, unit, meaning, row -> Numbers.fixed(value.applyAsDouble(row), decimals));
    }

    /** @param value ms since 1970-01-01T00:00Z */
    static <R> Column<R> time(String name, String meaning, ToLongFunction<R> value) {
        return new Column<>(name, Type.TIME, "", meaning, row -> Times.iso(value.applyAsLong(row)));
    }

    static <R> Column<R> flag(String name, String meaning, Function<R, Boolean> value) {
        return new Column<>(name, Type.FLAG, "", meaning, row -> Boolean.toString(value.apply(row)));
    }
}
