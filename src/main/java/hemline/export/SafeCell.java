package hemline.export;

/**
 * Words for a cell that no spreadsheet runs as a formula: CSV itself knows no formulas, the programs that open it do.
 * Rule of the OWASP page on CSV injection: cells that start with {@code = + - @}, tab or carriage return.
 */
final class SafeCell {
    private SafeCell() {
    }

    /** The words as they are, led by an apostrophe where a spreadsheet would take them for a formula. */
    static String text(String words) {
        String oneLine = words.replace('\r', ' ').replace('\n', ' ').replace('\t', ' ').replace('\0', ' ');
        String seen = oneLine.stripLeading();
        boolean formula = !seen.isEmpty() && "=+-@\uFF1D\uFF0B\uFF0D\uFF20".indexOf(seen.charAt(0)) >= 0;
        return formula ? "'" + oneLine : oneLine;
    }
}
