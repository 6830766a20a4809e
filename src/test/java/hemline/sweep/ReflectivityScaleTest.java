package hemline.sweep;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;

class ReflectivityScaleTest {
    private final ReflectivityScale scale = ReflectivityScale.standard();

    /** CIE 1976 lightness of an sRGB colour (IEC 61966-2-1 primaries, D65), computed apart from the scale's OKLab. */
    private static double cieLightness(int argb) {
        double y = luminance(linear(argb >> 16 & 0xff), linear(argb >> 8 & 0xff), linear(argb & 0xff));
        return y <= 216.0 / 24389 ? y * 24389.0 / 27 : 116 * Math.cbrt(y) - 16;
    }

    private static double luminance(double red, double green, double blue) {
        return 0.2126 * red + 0.7152 * green + 0.0722 * blue;
    }

    private static double linear(int channel) {
        double c = channel / 255.0;
        return c <= 0.04045 ? c / 12.92 : Math.pow((c + 0.055) / 1.055, 2.4);
    }

    @Test
    void lightnessRisesWithEveryDecibel() {
        for (int dbz = -20; dbz < 65; dbz++) {
            assertThat(cieLightness(scale.argb(dbz + 1))).as(dbz + " dBZ").isGreaterThan(cieLightness(scale.argb(dbz)));
        }
    }

    @Test
    void lightnessStepsInTheBandOfBoundariesAreEven() {
        double mean = (cieLightness(scale.argb(30)) - cieLightness(scale.argb(-5))) / 35;
        for (int dbz = -5; dbz < 30; dbz += 5) {
            double step = (cieLightness(scale.argb(dbz + 5)) - cieLightness(scale.argb(dbz))) / 5;
            assertThat(step).as(dbz + " dBZ").isCloseTo(mean, within(0.2 * mean));
        }
        assertThat(mean).isGreaterThan(1.5);
    }

    @Test
    void theBandOfBoundariesGetsMoreLightnessADecibelThanTheRest() {
        double inside = (cieLightness(scale.argb(30)) - cieLightness(scale.argb(-5))) / 35;
        double above = (cieLightness(scale.argb(65)) - cieLightness(scale.argb(30))) / 35;
        double below = (cieLightness(scale.argb(-5)) - cieLightness(scale.argb(-20))) / 15;
        assertThat(inside).isGreaterThan(2 * above).isGreaterThan(1.5 * below);
    }

    /**
     * Full protanopia, deuteranopia and tritanopia in linear RGB after Machado, Oliveira and Fernandes (2009), IEEE
     * TVCG 15:1291 (matrices for severity 1.0, from memory).
     */
    @Test
    void orderSurvivesColourVisionDeficiency() {
        double[][][] deficiencies = {
            {{0.152286, 1.052583, -0.204868}, {0.114503, 0.786281, 0.099216}, {-0.003882, -0.048116, 1.051998}},
            {{0.367322, 0.860646, -0.227968}, {0.280085, 0.672501, 0.047413}, {-0.011820, 0.042940, 0.968881}},
            {{1.255528, -0.076749, -0.178779}, {-0.078411, 0.930809, 0.147602}, {0.004733, 0.691367, 0.303900}}};
        for (double[][] seen : deficiencies) {
            double before = -1;
            for (int dbz = -20; dbz <= 65; dbz += 5) {
                double[] rgb = {linear(scale.argb(dbz) >> 16 & 0xff), linear(scale.argb(dbz) >> 8 & 0xff),
                    linear(scale.argb(dbz) & 0xff)};
                double[] shown = new double[3];
                for (int i = 0; i < 3; i++) {
                    shown[i] = seen[i][0] * rgb[0] + seen[i][1] * rgb[1] + seen[i][2] * rgb[2];
                }
                double now = luminance(shown[0], shown[1], shown[2]);
                assertThat(now).as(dbz + " dBZ").isGreaterThan(before);
                before = now;
            }
        }
    }

    @Test
    void belowDetectionIsDarkerThanAnyEchoAndNotMeasuredIsTransparent() {
        assertThat(cieLightness(scale.argb(Field.BELOW_DETECTION))).isLessThan(cieLightness(scale.argb(-20)));
        assertThat(scale.argb(Field.BELOW_DETECTION) >>> 24).isEqualTo(255);
        assertThat(scale.argb(Field.NOT_MEASURED) >>> 24).isZero();
    }

    @Test
    void valuesBeyondTheScaleTakeItsEnds() {
        assertThat(scale.argb(-32)).isEqualTo(scale.argb(-20));
        assertThat(scale.argb(95)).isEqualTo(scale.argb(65)).isEqualTo(scale.argb(Float.POSITIVE_INFINITY));
    }

    @Test
    void coloursAreFullyOpaqueForEchoes() {
        for (int dbz = -32; dbz <= 80; dbz++) {
            assertThat(scale.argb(dbz) >>> 24).isEqualTo(255);
        }
    }
}
