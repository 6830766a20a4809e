package hemline.cli;

import java.io.PrintWriter;
import java.util.ArrayList;
import java.util.List;

/** Rows of words under headings, each column as wide as it needs; the first to the left, the others to the right. */
final class TextTable {
    private static final String GAP = "  ";

    private final List<String[]> rows = new ArrayList<>();

    TextTable(String... headings) {
        rows.add(headings);
    }

    void row(String... cells) {
        if (cells.length != rows.get(0).length) {
            throw new IllegalArgumentException("a row needs " + rows.get(0).length + " cells, got " + cells.length);
        }
        rows.add(cells);
    }

    void print(PrintWriter out) {
        int[] widths = new int[rows.get(0).length];
        for (String[] row : rows) {
            for (int i = 0; i < widths.length; i++) {
                widths[i] = Math.max(widths[i], row[i].length());
            }
        }
        for (String[] row : rows) {
            StringBuilder line = new StringBuilder(GAP);
            for (int i = 0; i < widths.length; i++) {
                String pad = " ".repeat(widths[i] - row[i].length());
                line.append(i == 0 ? row[i] + pad : GAP + pad + row[i]);
            }
            out.println(line.toString().stripTrailing());
        }
    }
}
