package hemline.viewer.viewmodel;

import java.util.Comparator;
import java.util.Optional;
import java.util.function.Function;
import java.util.function.ToDoubleFunction;

/**
 * One column of a ledger table.
 *
 * @param title   short, with no unit
 * @param unit    empty where there is none
 * @param tooltip what it is, in a sentence
 * @param text    the cell's text
 * @param value   the number it sorts by, NaN for none; empty for a column of text
 * @param <R>     the row
 */
public record LedgerColumn<R>(String title, String unit, String tooltip, Function<R, String> text,
                              Optional<ToDoubleFunction<R>> value) {

    static <R> LedgerColumn<R> text(String title, String tooltip, Function<R, String> text) {
        return new LedgerColumn<>(title, "", tooltip, text, Optional.empty());
    }

    static <R> LedgerColumn<R> number(String title, String unit, String tooltip, int decimals,
                                      ToDoubleFunction<R> value) {
        return of(title, unit, tooltip, value, row -> Words.number(value.applyAsDouble(row), decimals));
    }

    static <R> LedgerColumn<R> of(String title, String unit, String tooltip, ToDoubleFunction<R> value,
                                  Function<R, String> text) {
        return new LedgerColumn<>(title, unit, tooltip, text, Optional.of(value));
    }

    public boolean numeric() {
        return value.isPresent();
    }

    /** Title and unit for a header line. */
    public String heading() {
        return unit.isEmpty() ? title : title + " (" + unit + ")";
    }

    /** How rows sort; rows without a value come last whichever way. */
    public Comparator<R> order(boolean descending) {
        if (value.isEmpty()) {
            Comparator<R> byText = Comparator.comparing(text);
            return descending ? byText.reversed() : byText;
        }
        ToDoubleFunction<R> number = value.get();
        Comparator<R> missingLast = Comparator.comparing(row -> Double.isNaN(number.applyAsDouble(row)));
        Comparator<R> byNumber = Comparator.comparingDouble(number);
        return missingLast.thenComparing(descending ? byNumber.reversed() : byNumber);
    }
}
