package hemline.export;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.io.StringReader;
import java.io.StringWriter;
import java.util.List;
import java.util.Locale;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.DoubleRange;
import net.jqwik.api.constraints.IntRange;
import org.apache.commons.csv.CSVFormat;
import org.apache.commons.csv.CSVRecord;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class CellsTest {
    private static final Table<String> ONE = new Table<>("one", "", List.of(Column.text("words", "", w -> w),
            Column.integer("length", "", String::length)));

    /** Openers of formulas after OWASP, CSV Injection (page as of 2024, from memory). */
    @ParameterizedTest
    @ValueSource(strings = {"=1+1", "+1", "-1", "@SUM(A1)", "\t=1", "\r=1", "  =cmd|' /C calc'!A0", "＝1"})
    void cellsThatWouldRunAreLedByAnApostrophe(String words) {
        assertThat(SafeCell.text(words)).startsWith("'");
    }

    @Test
    void ordinaryWordsStayAsTheyAre() {
        assertThat(SafeCell.text("Lone Hill, \"north\" 3-4")).isEqualTo("Lone Hill, \"north\" 3-4");
        assertThat(SafeCell.text("")).isEmpty();
    }

    @Property(tries = 500)
    void anyWordsComeBackAsOneSafeCell(@ForAll String words) throws IOException {
        StringWriter out = new StringWriter();
        ONE.write(out, List.of(words));
        List<CSVRecord> rows = CSVFormat.RFC4180.builder().setHeader().setSkipHeaderRecord(true).build()
                .parse(new StringReader(out.toString())).getRecords();
        assertThat(rows).hasSize(1);
        String cell = rows.get(0).get(0);
        assertThat(cell).isEqualTo(SafeCell.text(words)).doesNotContain("\n", "\r", "\t");
        assertThat(cell.stripLeading()).doesNotMatch("(?s)[=+\\-@].*");
    }

    @Property(tries = 500)
    void numbersComeBackWithinHalfTheirLastDecimal(@ForAll @DoubleRange(min = -1e6, max = 1e6) double value,
                                                   @ForAll @IntRange(max = 6) int decimals) {
        String text = Numbers.fixed(value, decimals);
        assertThat(Math.abs(Double.parseDouble(text) - value)).isLessThanOrEqualTo(0.5000001 * Math.pow(10, -decimals));
        assertThat(text).doesNotContainIgnoringCase("e").doesNotMatch("-0\\.?0*");
    }

    @Test
    void notFiniteNumbersAreEmpty() {
        assertThat(Numbers.fixed(Double.NaN, 2)).isEmpty();
        assertThat(Numbers.fixed(Double.NEGATIVE_INFINITY, 2)).isEmpty();
    }

    @Test
    void theLocaleDoesNotMatter() {
        Locale before = Locale.getDefault();
        try {
            Locale.setDefault(Locale.forLanguageTag("ar-EG-u-nu-arab"));
            assertThat(Numbers.fixed(-1234.5, 2)).isEqualTo("-1234.50");
            assertThat(Times.iso(0)).isEqualTo("1970-01-01T00:00:00.000Z");
        } finally {
            Locale.setDefault(before);
        }
    }
}
