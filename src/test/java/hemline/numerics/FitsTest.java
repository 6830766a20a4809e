package hemline.numerics;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import org.assertj.core.data.Offset;
import org.assertj.core.data.Percentage;
import org.junit.jupiter.api.Test;

/** Fits against certified values of the NIST Statistical Reference Datasets (StRD). */
class FitsTest {
    static final double[] NORRIS_X = {
        0.2, 337.4, 118.2, 884.6, 10.1, 226.5, 666.3, 996.3, 448.6, 777.0, 558.2, 0.4,
        0.6, 775.5, 666.9, 338.0, 447.5, 11.6, 556.0, 228.1, 995.8, 887.6, 120.2, 0.3,
        0.3, 556.8, 339.1, 887.2, 999.0, 779.0, 11.1, 118.3, 229.2, 669.1, 448.9, 0.5
    };
    static final double[] NORRIS_Y = {
        0.1, 338.8, 118.1, 888.0, 9.2, 228.1, 668.5, 998.5, 449.1, 778.9, 559.2, 0.3,
        0.1, 778.1, 668.8, 339.3, 448.9, 10.8, 557.7, 228.3, 998.0, 888.8, 119.6, 0.3,
        0.6, 557.6, 339.3, 888.0, 998.5, 778.9, 10.2, 117.6, 228.9, 668.4, 449.2, 0.2
    };
    static final double[] MISRA_X = {
        77.6, 114.9, 141.1, 190.8, 239.9, 289.0, 332.8, 378.4, 434.8, 477.3, 536.8, 593.1,
        689.1, 760.0
    };
    static final double[] MISRA_Y = {
        10.07, 14.73, 17.94, 23.93, 29.61, 35.18, 40.02, 44.82, 50.76, 55.05, 61.01, 66.40,
        75.47, 81.78
    };
    /** Columns: deflator, national product, unemployed, armed forces, population, year; then total employment. */
    static final double[][] LONGLEY = {
        {83.0, 234289, 2356, 1590, 107608, 1947, 60323}, {88.5, 259426, 2325, 1456, 108632, 1948, 61122},
        {88.2, 258054, 3682, 1616, 109773, 1949, 60171}, {89.5, 284599, 3351, 1650, 110929, 1950, 61187},
        {96.2, 328975, 2099, 3099, 112075, 1951, 63221}, {98.1, 346999, 1932, 3594, 113270, 1952, 63639},
        {99.0, 365385, 1870, 3547, 115094, 1953, 64989}, {100.0, 363112, 3578, 3350, 116219, 1954, 63761},
        {101.2, 397469, 2904, 3048, 117388, 1955, 66019}, {104.6, 419180, 2822, 2857, 118734, 1956, 67857},
        {108.4, 442769, 2936, 2798, 120445, 1957, 68169}, {110.8, 444546, 4681, 2637, 121950, 1958, 66513},
        {112.6, 482704, 3813, 2552, 123366, 1959, 68655}, {114.2, 502601, 3931, 2514, 125368, 1960, 69564},
        {115.7, 518173, 4806, 2572, 127852, 1961, 69331}, {116.9, 554894, 4007, 2827, 130081, 1962, 70551}
    };

    static double[][] withOnes(double[] x) {
        double[][] design = new double[x.length][];
        for (int i = 0; i < x.length; i++) {
            design[i] = new double[] {1, x[i]};
        }
        return design;
    }

    /** NIST StRD, Norris, linear, lower difficulty: certified coefficients, deviations, residual sd, R². */
    @Test
    void norrisLineIsReproduced() {
        LinearFit fit = LinearFit.of(withOnes(NORRIS_X), NORRIS_Y);
        assertThat(fit.coefficients()[0]).isCloseTo(-0.262323073774029, Percentage.withPercentage(1e-8));
        assertThat(fit.coefficients()[1]).isCloseTo(1.00211681802045, Percentage.withPercentage(1e-8));
        assertThat(fit.standardError(0)).isCloseTo(0.232818234301152, Percentage.withPercentage(1e-8));
        assertThat(fit.standardError(1)).isCloseTo(4.29796848199937e-4, Percentage.withPercentage(1e-8));
        assertThat(fit.residualSd()).isCloseTo(0.884796396144373, Percentage.withPercentage(1e-8));
        assertThat(fit.rSquared()).isCloseTo(0.999993745883712, Percentage.withPercentage(1e-8));
    }

    /** NIST StRD, Longley, linear, higher difficulty: certified intercept and year coefficient. */
    @Test
    void longleyRegressionIsReproduced() {
        double[][] design = new double[LONGLEY.length][];
        double[] y = new double[LONGLEY.length];
        for (int i = 0; i < y.length; i++) {
            design[i] = new double[] {1, LONGLEY[i][0], LONGLEY[i][1], LONGLEY[i][2], LONGLEY[i][3], LONGLEY[i][4],
                LONGLEY[i][5]};
            y[i] = LONGLEY[i][6];
        }
        LinearFit fit = LinearFit.of(design, y);
        assertThat(fit.coefficients()[0]).isCloseTo(-3482258.63459582, Percentage.withPercentage(1e-6));
        assertThat(fit.coefficients()[6]).isCloseTo(1829.15146461355, Percentage.withPercentage(1e-6));
    }

    /** NIST StRD, Misra1a, y = b1 (1 − exp(−b2 x)), from both certified starts. */
    @Test
    void misraCurveIsReproducedFromBothStarts() {
        for (double[] start : new double[][] {{500, 1e-4}, {250, 5e-4}}) {
            NonlinearFit fit = NonlinearFit.of(start, MISRA_X.length, (b, residual, jacobian) -> {
                for (int i = 0; i < MISRA_X.length; i++) {
                    double decay = Math.exp(-b[1] * MISRA_X[i]);
                    residual[i] = b[0] * (1 - decay) - MISRA_Y[i];
                    jacobian[i][0] = 1 - decay;
                    jacobian[i][1] = b[0] * MISRA_X[i] * decay;
                }
            }).orElseThrow();
            assertThat(fit.parameters()[0]).isCloseTo(238.94212918, Percentage.withPercentage(1e-4));
            assertThat(fit.parameters()[1]).isCloseTo(5.5015643181e-4, Percentage.withPercentage(1e-4));
            assertThat(Math.sqrt(fit.covariance()[0][0])).isCloseTo(2.7070075241, Percentage.withPercentage(1e-3));
            assertThat(Math.sqrt(fit.covariance()[1][1])).isCloseTo(7.2668688436e-6, Percentage.withPercentage(1e-3));
            assertThat(fit.sumOfSquares()).isCloseTo(0.12455138894, Percentage.withPercentage(1e-6));
        }
    }

    @Test
    void normalEquationsAgreeWithTheFitByQr() {
        NormalEquations equations = new NormalEquations(2);
        for (int i = 0; i < NORRIS_X.length; i++) {
            equations.add(new double[] {1, NORRIS_X[i] / 100}, NORRIS_Y[i], 1);
        }
        double[] solved = new double[2];
        assertThat(equations.solve(solved, null)).isTrue();
        assertThat(solved[0]).isCloseTo(-0.262323073774029, Offset.offset(1e-9));
        assertThat(solved[1] / 100).isCloseTo(1.00211681802045, Offset.offset(1e-11));
    }

    @Test
    void undeterminedUnknownsAreToldNotInvented() {
        NormalEquations equations = new NormalEquations(2);
        equations.add(new double[] {1, 1}, 3, 1);
        equations.add(new double[] {2, 2}, 6, 1);
        assertThat(equations.solve(new double[2], null)).isFalse();
        assertThatThrownBy(() -> LinearFit.of(new double[][] {{1, 1}, {2, 2}, {3, 3}}, new double[] {1, 2, 3}))
                .isInstanceOf(IllegalArgumentException.class).hasMessageContaining("depend");
    }

    /** Standard tables of chi-squared and Student's t, to the printed digits. */
    @Test
    void quantilesAreThoseOfTheTables() {
        double[] chi95 = {3.8415, 5.9915, 7.8147, 9.4877};
        double[] chi99 = {6.6349, 9.2103, 11.3449, 13.2767};
        for (int df = 1; df <= 4; df++) {
            assertThat(Distributions.chiSquaredQuantile(df, 0.95)).isCloseTo(chi95[df - 1], Offset.offset(5e-5));
            assertThat(Distributions.chiSquaredQuantile(df, 0.99)).isCloseTo(chi99[df - 1], Offset.offset(5e-5));
        }
        int[] df = {1, 2, 3, 5, 10, 20, 30};
        double[] student = {12.706, 4.303, 3.182, 2.571, 2.228, 2.086, 2.042};
        for (int i = 0; i < df.length; i++) {
            assertThat(Distributions.studentQuantile(df[i], 0.975)).isCloseTo(student[i], Offset.offset(5e-4));
        }
    }

    @Test
    void theMedianAndSpreadIgnoreAWildValue() {
        assertThat(Robust.median(new double[] {3, 1, 2, 1e9, Double.NaN})).isEqualTo(2.5);
        assertThat(Robust.spread(new double[] {-1, 0, 1, -1, 1, 0, 1e9})).isCloseTo(1.4826, Offset.offset(1e-4));
        assertThat(Robust.median(new double[0])).isNaN();
    }
}
