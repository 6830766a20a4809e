package hemline.outflow;

/** Which number k relates the speed of a density current to its depth and density deficit: c = k √(g′h). */
public enum FrontLaw {
    /**
     * Thunderstorm outflows as observed: 0.77, where published means lie (Charba 1974, Goff 1976, Wakimoto 1982; values
     * from memory). Takes no account of the depth of the air above.
     */
    OBSERVED("observed") {
        @Override
        public double froude(double depthShare) {
            return OBSERVED_FROUDE;
        }
    },
    /** No friction, deep air above: √2 (von Kármán 1940, Bull. Am. Math. Soc. 46:615). */
    DEEP("deep") {
        @Override
        public double froude(double depthShare) {
            return Math.sqrt(2);
        }
    },
    /** No friction, air of finite depth: k² = (1−a)(2−a)/(1+a) (Benjamin 1968, J. Fluid Mech. 31:209). */
    BENJAMIN("benjamin") {
        @Override
        public double froude(double a) {
            checkShare(a);
            return Math.sqrt((1 - a) * (2 - a) / (1 + a));
        }
    },
    /** Laboratory fit: 1.19 to a = 0.075, then a^(−1/3)/2 (Huppert and Simpson 1980, J. Fluid Mech. 99:785). */
    HUPPERT_SIMPSON("huppert-simpson") {
        @Override
        public double froude(double a) {
            checkShare(a);
            return a <= 0.075 ? 1.19 : 0.5 * Math.pow(a, -1.0 / 3);
        }
    };

    /** Default k of outflows. */
    public static final double OBSERVED_FROUDE = 0.77;

    private final String label;

    FrontLaw(String label) {
        this.label = label;
    }

    /** Its name on the command line. */
    public String label() {
        return label;
    }

    /** Whether it needs the depth of the air that the current runs under. */
    public boolean needsAirDepth() {
        return this == BENJAMIN || this == HUPPERT_SIMPSON;
    }

    /** @param depthShare a = h/H, depth of the current over that of the air it runs under, above 0 to 1 */
    public abstract double froude(double depthShare);

    private static void checkShare(double a) {
        if (!(a > 0 && a <= 1)) {
            throw new IllegalArgumentException("depth over air depth must lie within 0..1, got " + a);
        }
    }
}
