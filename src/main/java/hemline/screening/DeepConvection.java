package hemline.screening;

import hemline.sweep.MaskReason;

/**
 * Areas of strong echo that a disc of 1.5 km fits into: thin lines, however bright, are narrower and stay out.
 * Opening (erosion, then dilation) by running counts along range and azimuth.
 */
final class DeepConvection {
    private static final double HALF_WIDTH_M = 750;

    private DeepConvection() {
    }

    static void mark(PolarGates polar, double fromDbz, byte[] bits) {
        boolean[] strong = new boolean[polar.dbz.length];
        boolean any = false;
        for (int i = 0; i < strong.length; i++) {
            strong[i] = polar.dbz[i] >= fromDbz;
            any |= strong[i];
        }
        if (!any) {
            return;
        }
        boolean[] closed = window(polar, strong, 0.4);
        boolean[] core = window(polar, closed, 0.999);
        boolean[] area = window(polar, core, 0);
        for (int i = 0; i < area.length; i++) {
            if (area[i] && polar.dbz[i] >= fromDbz - 6) {
                bits[i] |= (byte) MaskReason.DEEP_CONVECTION.bit();
            }
        }
    }

    /** Where more than a share of the window about a gate is set: 0 dilates, nearly 1 erodes, between smooths. */
    private static boolean[] window(PolarGates polar, boolean[] set, double share) {
        int gates = polar.gates;
        int halfGates = (int) Math.max(1, Math.round(HALF_WIDTH_M / polar.sweep.gateSpacingM()));
        boolean[] along = new boolean[set.length];
        for (int r = 0; r < polar.rays; r++) {
            int row = r * gates;
            int n = 0;
            for (int g = -halfGates; g < gates; g++) {
                n += g + halfGates < gates && set[row + g + halfGates] ? 1 : 0;
                n -= g - halfGates - 1 >= 0 && set[row + g - halfGates - 1] ? 1 : 0;
                if (g >= 0) {
                    along[row + g] = n > share * (2 * halfGates + 1);
                }
            }
        }
        boolean[] result = new boolean[set.length];
        double spacing = Math.toRadians(polar.raySpacingDeg());
        for (int g = 0; g < gates; g++) {
            double range = Math.max(1000, polar.sweep.slantRangeM(g));
            int half = (int) Math.min((polar.rays - 1) / 2, Math.round(HALF_WIDTH_M / (range * spacing)));
            int n = 0;
            for (int d = -half; d <= half; d++) {
                n += along[Math.floorMod(d, polar.rays) * gates + g] ? 1 : 0;
            }
            for (int r = 0; r < polar.rays; r++) {
                result[r * gates + g] = n > share * (2 * half + 1);
                n -= along[Math.floorMod(r - half, polar.rays) * gates + g] ? 1 : 0;
                n += along[Math.floorMod(r + half + 1, polar.rays) * gates + g] ? 1 : 0;
            }
        }
        return result;
    }
}
