package hemline.numerics;

import hemline.checks.CheckList;
import hemline.checks.OutsideCheck;
import hemline.checks.OutsideCheck.Basis;
import java.util.List;

/** Outside checks of fits, filters, assignment and distributions. */
public final class NumericsChecks {
    private static final double[][] ONE = {{1}};

    private NumericsChecks() {
    }

    public static List<OutsideCheck> list() {
        CheckList list = new CheckList("Numerics");
        linear(list);
        nonlinear(list);
        kalman(list);
        assignment(list);
        distributions(list);
        return list.checks();
    }

    private static void linear(CheckList list) {
        LinearFit norris = LinearFit.of(FitsTest.withOnes(FitsTest.NORRIS_X), FitsTest.NORRIS_Y);
        list.from(Basis.READ, "NIST StRD, certified")
                .check("intercept", "Norris", "-0.262323073774029", 1e-10, () -> norris.coefficients()[0])
                .check("slope", "Norris", "1.00211681802045", 1e-10, () -> norris.coefficients()[1])
                .check("standard error of the intercept", "Norris", "0.232818234301152", 1e-10,
                        () -> norris.standardError(0))
                .check("standard error of the slope", "Norris", "4.29796848199937e-4", 1e-12,
                        () -> norris.standardError(1))
                .check("residual standard deviation", "Norris", "0.884796396144373", 1e-10, norris::residualSd)
                .check("R²", "Norris", "0.999993745883712", 1e-10, norris::rSquared);
        double[][] design = new double[FitsTest.LONGLEY.length][];
        double[] y = new double[design.length];
        for (int i = 0; i < y.length; i++) {
            double[] row = FitsTest.LONGLEY[i];
            design[i] = new double[] {1, row[0], row[1], row[2], row[3], row[4], row[5]};
            y[i] = row[6];
        }
        LinearFit longley = LinearFit.of(design, y);
        list.from(Basis.READ, "NIST StRD, certified, second-hand")
                .check("intercept", "Longley", "-3482258.63459582", 0.03, () -> longley.coefficients()[0])
                .check("coefficient of the year", "Longley", "1829.15146461355", 2e-5, () -> longley.coefficients()[6]);
    }

    private static void nonlinear(CheckList list) {
        for (double[] start : new double[][] {{500, 1e-4}, {250, 5e-4}}) {
            NonlinearFit fit = NonlinearFit.of(start, FitsTest.MISRA_X.length, (b, residual, jacobian) -> {
                for (int i = 0; i < FitsTest.MISRA_X.length; i++) {
                    double decay = Math.exp(-b[1] * FitsTest.MISRA_X[i]);
                    residual[i] = b[0] * (1 - decay) - FitsTest.MISRA_Y[i];
                    jacobian[i][0] = 1 - decay;
                    jacobian[i][1] = b[0] * FitsTest.MISRA_X[i] * decay;
                }
            }).orElseThrow();
            String inputs = "Misra1a from " + start[0] + ", " + start[1];
            list.from(Basis.READ, "NIST StRD, certified")
                    .check("b1", inputs, "238.94212918", 2.4e-4, () -> fit.parameters()[0])
                    .check("b2", inputs, "5.5015643181e-4", 5.5e-10, () -> fit.parameters()[1])
                    .check("standard error of b1", inputs, "2.7070075241", 2.7e-5,
                            () -> Math.sqrt(fit.covariance()[0][0]))
                    .check("residual sum of squares", inputs, "0.12455138894", 1.2e-7, fit::sumOfSquares);
        }
    }

    private static void kalman(CheckList list) {
        KalmanTest.Run run = KalmanTest.localLevel(1e7);
        KalmanTest.Run diffuse = KalmanTest.localLevel(1e13);
        list.from(Basis.READ, "Durbin and Koopman (2012), quoted in a state-space library's tests")
                .check("log-likelihood", "Nile, local level, P₁ 10⁷", "-641.5856", 1e-3, run::logLikelihood)
                .check("filtered level in 1970", "Nile", "798.37", 5e-3,
                        () -> run.steps().get(99).filtered().mean()[0])
                .check("its variance", "Nile", "4032.158", 1e-3,
                        () -> run.steps().get(99).filtered().covariance()[0][0])
                .check("diffuse log-likelihood", "Nile, first term omitted", "-632.5456", 1e-3,
                        () -> diffuse.logLikelihood() - diffuse.firstTerm());
        List<Gaussian> smoothed = RtsSmoother.smooth(KalmanTest.localLevel(1e10).steps());
        list.from(Basis.CALCULATED, "diffuse start, apart from this code")
                .check("smoothed level in 1871", "Nile", "1111.668", 2e-3, () -> smoothed.get(0).mean()[0])
                .check("smoothed level in 1920", "Nile", "834.763", 1e-3, () -> smoothed.get(49).mean()[0])
                .check("its variance in 1920", "Nile", "2326.757", 0.01, () -> smoothed.get(49).covariance()[0][0]);
        list.from(Basis.CALCULATED, "Riccati equation: the golden ratio less one")
                .check("steady gain", "local level, Q/H 1", "0.6180339887", 1e-9, NumericsChecks::steadyGain);
    }

    private static double steadyGain() {
        Gaussian state = new Gaussian(new double[] {0}, new double[][] {{1}});
        double gain = 0;
        for (int k = 0; k < 60; k++) {
            Gaussian predicted = KalmanFilter.predict(state, ONE, ONE);
            gain = predicted.covariance()[0][0] / (predicted.covariance()[0][0] + 1);
            state = KalmanFilter.update(predicted, ONE, ONE, new double[] {0}).state();
        }
        return gain;
    }

    private static void assignment(CheckList list) {
        list.from(Basis.FROM_MEMORY, "documentation of scipy.optimize.linear_sum_assignment; all pairings enumerated")
                .check("least cost", "(4 1 3)(2 0 5)(3 2 2)", "5", 1e-12,
                        () -> cost(new double[][] {{4, 1, 3}, {2, 0, 5}, {3, 2, 2}}));
        list.from(Basis.READ, "public tests of scipy; all pairings enumerated")
                .check("least cost", "(400 150 400)(400 450 600)(300 225 300)", "850", 1e-12,
                        () -> cost(new double[][] {{400, 150, 400}, {400, 450, 600}, {300, 225, 300}}))
                .check("least cost", "the same with a column (1 2 3)", "452", 1e-12,
                        () -> cost(new double[][] {{400, 150, 400, 1}, {400, 450, 600, 2}, {300, 225, 300, 3}}))
                .check("least cost", "(10 10 8)(9 8 1)(9 7 4)", "18", 1e-12,
                        () -> cost(new double[][] {{10, 10, 8}, {9, 8, 1}, {9, 7, 4}}))
                .check("least cost", "the same with a column (11 1 10)", "15", 1e-12,
                        () -> cost(new double[][] {{10, 10, 8, 11}, {9, 8, 1, 1}, {9, 7, 4, 10}}));
    }

    private static double cost(double[][] costs) {
        return Assignment.complete(costs).orElseThrow().cost();
    }

    private static void distributions(CheckList list) {
        String[] at95 = {"3.8415", "5.9915", "7.8147", "9.4877"};
        for (int df = 1; df <= 4; df++) {
            double degrees = df;
            list.from(Basis.CALCULATED, "table of chi-squared").check("χ² quantile 0.95", df + " degrees of freedom",
                    at95[df - 1], 5e-5, () -> Distributions.chiSquaredQuantile(degrees, 0.95));
        }
        String[][] student = {{"1", "12.706"}, {"2", "4.303"}, {"5", "2.571"}, {"10", "2.228"}, {"30", "2.042"}};
        for (String[] row : student) {
            list.from(Basis.READ, "table of Student's t").check("t quantile 0.975", row[0] + " degrees of freedom", row[1],
                    5e-4, () -> Distributions.studentQuantile(Integer.parseInt(row[0]), 0.975));
        }
    }
}
