package hemline.outflow;

/**
 * Spreading of a fixed amount of dense fluid with the front condition c = k √(g′h): distance = C · amount · tⁿ, with
 * amount = (g′A)^⅓ in the plane (A volume a unit width) and (g′V)^¼ about a centre.
 *
 * <p>Box models: Huppert and Simpson (1980), J. Fluid Mech. 99:785. Similarity solutions: Hoult (1972), Annu. Rev. Fluid
 * Mech. 4:341. A steady source or the slumping stage keeps a constant speed (n = 1).
 */
public enum SpreadingLaw {
    PLANE_BOX(2.0 / 3) {
        @Override
        double constantFor(double k) {
            return Math.pow(1.5 * k, 2.0 / 3);
        }
    },
    AXISYMMETRIC_BOX(0.5) {
        @Override
        double constantFor(double k) {
            return Math.sqrt(2 * k) * Math.pow(Math.PI, -0.25);
        }
    },
    PLANE_SIMILARITY(2.0 / 3) {
        @Override
        double constantFor(double k) {
            return Math.cbrt(27 * k * k / (12 - 2 * k * k));
        }
    },
    AXISYMMETRIC_SIMILARITY(0.5) {
        @Override
        double constantFor(double k) {
            return Math.pow(16 * k * k / (Math.PI * (4 - k * k)), 0.25);
        }
    };

    private final double exponent;

    SpreadingLaw(double exponent) {
        this.exponent = exponent;
    }

    abstract double constantFor(double k);

    /** n in distance ∝ tⁿ. */
    public double exponent() {
        return exponent;
    }

    /** C for a front condition k, above 0 and below 2. */
    public double constant(double k) {
        if (!(k > 0 && k < 2)) {
            throw new IllegalArgumentException("k must lie within 0..2, got " + k);
        }
        return constantFor(k);
    }

    private boolean axisymmetric() {
        return exponent == 0.5;
    }

    /**
     * Distance of the front from the source, m.
     *
     * @param k              of the front condition
     * @param reducedGravity m s⁻²
     * @param amount         volume, m³, about a centre; volume a unit width, m², in the plane
     * @param seconds        since release
     */
    public double distanceM(double k, double reducedGravity, double amount, double seconds) {
        return constant(k) * Math.pow(reducedGravity * amount, axisymmetric() ? 0.25 : 1.0 / 3)
                * Math.pow(seconds, exponent);
    }

    /** Speed of the front, m s⁻¹: the time derivative of the distance. */
    public double speedMs(double k, double reducedGravity, double amount, double seconds) {
        return exponent * distanceM(k, reducedGravity, amount, seconds) / seconds;
    }
}
