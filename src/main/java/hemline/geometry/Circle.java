package hemline.geometry;

/**
 * A circle fitted to points.
 *
 * @param centre     km
 * @param radiusKm   km
 * @param rmsKm      root mean square distance of the points from it, km
 * @param covariance of (centre x, centre y, radius), km²; empty where the fit gives none
 */
public record Circle(Point centre, double radiusKm, double rmsKm, double[][] covariance) {

    /** Distance of a point from the circle, km, positive outside. */
    public double offsetKm(Point point) {
        return point.distanceKm(centre) - radiusKm;
    }

    /**
     * Variance of the fitted radius for points spread evenly over an arc:
     * {@code Var R = (s²/n) c₂ / (c₂ − c₁²)}, {@code c₁ = sin A / A}, {@code c₂ = 1/2 + sin 2A / (4A)},
     * from the Fisher information of the model {@code ρ = δR + δx cos φ + δy sin φ}.
     *
     * @param radialSd  standard deviation of a point across the arc
     * @param points    number of independent points
     * @param arcDeg    whole angle of the arc, degrees in (0, 360]
     * @return in the square of the unit of {@code radialSd}
     */
    public static double radiusVariance(double radialSd, int points, double arcDeg) {
        if (!(arcDeg > 0 && arcDeg <= 360) || points < 3) {
            throw new IllegalArgumentException("need an arc within 0..360 degrees and 3 points, got " + arcDeg
                    + " and " + points);
        }
        double half = Math.toRadians(arcDeg / 2);
        double c1 = Math.sin(half) / half;
        double c2 = 0.5 + Math.sin(2 * half) / (4 * half);
        return radialSd * radialSd / points * c2 / (c2 - c1 * c1);
    }
}
