package hemline.viewer.viewmodel;

import static org.assertj.core.api.Assertions.assertThat;

import hemline.boundary.Speed;
import org.junit.jupiter.api.Test;

class WordsTest {
    @Test
    void numbersHaveATrueMinusAndNoNegativeZero() {
        assertThat(Words.number(-3.25, 1)).isEqualTo("\u22123.3");
        assertThat(Words.number(-0.04, 1)).isEqualTo("0.0");
        assertThat(Words.number(Double.NaN, 1)).isEqualTo("\u2013");
        assertThat(Words.number(Double.NEGATIVE_INFINITY, 1)).isEqualTo("\u2013");
    }

    @Test
    void bearingsHaveThreeDigitsAndNeverRead360() {
        assertThat(Words.bearing(4.6)).isEqualTo("005\u00b0");
        assertThat(Words.bearing(359.7)).isEqualTo("000\u00b0");
    }

    @Test
    void aSpeedShowsTwoStandardDeviations() {
        assertThat(Words.speed(new Speed(12.34, 0.6))).isEqualTo("12.3 \u00b1 1.2 m s\u207b\u00b9");
        assertThat(Words.speed(Speed.UNKNOWN)).isEqualTo("\u2013");
    }

    @Test
    void timesAreUtc() {
        assertThat(Words.clock(0)).isEqualTo("00:00:00");
        assertThat(Words.date(86_399_999L)).isEqualTo("1970-01-01");
        assertThat(Words.localClock(0, java.time.ZoneId.of("America/Chicago"))).isEqualTo("18:00:00 America/Chicago");
    }

    @Test
    void spansUseTheirLargestUnits() {
        assertThat(Words.span(59_999)).isEqualTo("59 s");
        assertThat(Words.span(-61_000)).isEqualTo("1 min");
        assertThat(Words.span(7_500_000)).isEqualTo("2 h 05 min");
        assertThat(Words.span(200L * 86_400_000)).isEqualTo("200 days");
    }

    @Test
    void hemispheresAreLetters() {
        assertThat(Words.latitude(-12.5)).isEqualTo("12.5000\u00b0 S");
        assertThat(Words.longitude(-101.25)).isEqualTo("101.2500\u00b0 W");
    }
}
