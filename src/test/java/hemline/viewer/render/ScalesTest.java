package hemline.viewer.render;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import hemline.sweep.Field;
import hemline.sweep.MaskReason;
import hemline.sweep.ReflectivityScale;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;

class ScalesTest {
    /** CIE 1976 lightness of an sRGB colour (IEC 61966-2-1 transfer, D65 luminance weights). */
    private static double lightness(int argb) {
        double y = 0.2126729 * linear(argb >> 16 & 0xff) + 0.7151522 * linear(argb >> 8 & 0xff)
                + 0.0721750 * linear(argb & 0xff);
        return y > 216.0 / 24389 ? 116 * Math.cbrt(y) - 16 : y * 24389 / 27;
    }

    private static double linear(int byteValue) {
        double v = byteValue / 255.0;
        return v <= 0.04045 ? v / 12.92 : Math.pow((v + 0.055) / 1.055, 2.4);
    }

    @Test
    void theLightnessFormulaKnowsBlackWhiteAndMidGrey() {
        assertThat(lightness(0xff000000)).isCloseTo(0, within(1e-9));
        assertThat(lightness(0xffffffff)).isCloseTo(100, within(0.001));
        // sRGB 119 is the usual mid grey: L* 50.0.
        assertThat(lightness(0xff777777)).isCloseTo(50.03, within(0.05));
    }

    @Test
    void bothArmsOfTheVelocityScaleGetLighterWithSpeed() {
        for (int sign : new int[] {-1, 1}) {
            double before = lightness(VelocityScale.argb(0));
            for (double v = 1; v <= VelocityScale.LARGEST_MS; v++) {
                double now = lightness(VelocityScale.argb(sign * v));
                assertThat(now).as("at " + sign * v).isGreaterThan(before);
                before = now;
            }
        }
    }

    @Test
    void towardIsBlueAndAwayIsNot() {
        for (double v = 5; v <= 32; v++) {
            int toward = VelocityScale.argb(-v);
            int away = VelocityScale.argb(v);
            assertThat((toward & 0xff) - (toward >> 16 & 0xff)).as("blue less red toward").isGreaterThan(15);
            assertThat((away >> 16 & 0xff) - (away & 0xff)).as("red less blue away").isGreaterThan(15);
        }
    }

    /** Pairs that a dichromat's eye must still tell apart differ by at least 4 in lightness or plainly in blue. */
    @Test
    void reasonsDifferInMoreThanHue() {
        List<Integer> colours = new ArrayList<>();
        for (MaskReason reason : MaskReason.values()) {
            int colour = ReasonColours.argb(reason);
            for (int other : colours) {
                double lighter = Math.abs(lightness(colour) - lightness(other));
                int bluer = Math.abs((colour & 0xff) - (other & 0xff));
                assertThat(lighter > 4 || bluer > 60).as(reason.name()).isTrue();
            }
            colours.add(colour);
        }
    }

    @Test
    void everyReflectivityFindsItsColourWithinHalfALevel() {
        int[] palette = Palette.of(hemline.viewer.viewmodel.PlaneField.MEASURED).argb();
        for (float dbz = -31.5f; dbz < 94; dbz += 0.5f) {
            assertThat(palette[Palette.reflectivityLevel(dbz)]).isEqualTo(ReflectivityScale.standard().argb(dbz));
        }
        assertThat(palette[Palette.reflectivityLevel(Field.BELOW_DETECTION)])
                .isEqualTo(ReflectivityScale.BELOW_DETECTION_ARGB);
        assertThat(palette[Palette.reflectivityLevel(Field.NOT_MEASURED)]).isZero();
        assertThat(palette[Palette.reflectivityLevel(500)]).isEqualTo(ReflectivityScale.standard().argb(70));
    }

    @Test
    void velocityLevelsAreWithinAQuarterOfAMetreASecond() {
        int[] palette = Palette.of(hemline.viewer.viewmodel.PlaneField.VELOCITY).argb();
        for (float v = -31; v <= 31; v += 0.3f) {
            assertThat(lightness(palette[Palette.velocityLevel(v)])).isCloseTo(lightness(VelocityScale.argb(v)),
                    within(1.2));
        }
        assertThat(palette[Palette.velocityLevel(Float.NaN)]).isZero();
    }

    @Test
    void everyReasonBitFindsItsColour() {
        int[] palette = Palette.of(hemline.viewer.viewmodel.PlaneField.REMOVED).argb();
        for (MaskReason reason : MaskReason.values()) {
            assertThat(palette[Palette.removedLevel(12, reason.bit())]).isEqualTo(ReasonColours.argb(reason));
        }
    }
}
