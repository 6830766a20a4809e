package hemline.sweep;

/** OKLab to sRGB: Ottosson (2020), A perceptual color space for image processing; transfer curve of IEC 61966-2-1. */
final class OkLab {
    private OkLab() {
    }

    /** The opaque sRGB colour {@code 0xFFRRGGBB} of an OKLab colour, clipped to what sRGB can show. */
    static int toArgb(double lightness, double a, double b) {
        double l = cube(lightness + 0.3963377774 * a + 0.2158037573 * b);
        double m = cube(lightness - 0.1055613458 * a - 0.0638541728 * b);
        double s = cube(lightness - 0.0894841775 * a - 1.2914855480 * b);
        int red = channel(4.0767416621 * l - 3.3077115913 * m + 0.2309699292 * s);
        int green = channel(-1.2684380046 * l + 2.6097574011 * m - 0.3413193965 * s);
        int blue = channel(-0.0041960863 * l - 0.7034186147 * m + 1.7076147010 * s);
        return 0xff000000 | red << 16 | green << 8 | blue;
    }

    private static double cube(double x) {
        return x * x * x;
    }

    private static int channel(double linear) {
        double x = Math.max(0, Math.min(1, linear));
        double encoded = x <= 0.0031308 ? 12.92 * x : 1.055 * StrictMath.pow(x, 1 / 2.4) - 0.055;
        return (int) Math.round(255 * encoded);
    }
}
