package hemline.boundary;

/**
 * What speaks for a found boundary being real; each term is kept so that a user can check the decision.
 *
 * @param logExpectedFalse log₁₀ of the number of lines at least as good expected by chance in the whole loop
 * @param strength         mean evidence along the line, standard deviations of the background
 * @param lineDb           median reflectivity over the brighter side, dB
 * @param stepDb           median reflectivity ahead less behind, dB
 * @param roughnessDb      root mean square of the line's reflectivity about its smooth course, dB
 * @param undetectShare    share of the line below the detection level, 0 to 1
 * @param nearRainShare    share of the line within 8 km of deep convection, 0 to 1
 */
public record Evidence(double logExpectedFalse, double strength, double lineDb, double stepDb, double roughnessDb,
                       double undetectShare, double nearRainShare) {
}
