package hemline.numerics;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Random;
import org.assertj.core.data.Offset;
import org.junit.jupiter.api.Test;

class KalmanTest {
    private static final double[][] ONE = {{1}};
    private static final double H = 15099;
    private static final double Q = 1469.1;

    record Run(List<RtsSmoother.Step> steps, double logLikelihood, double firstTerm) {
    }

    static Run localLevel(double startVariance) {
        Gaussian state = new Gaussian(new double[] {0}, new double[][] {{startVariance}});
        List<RtsSmoother.Step> steps = new ArrayList<>();
        double sum = 0;
        double first = Double.NaN;
        for (int k = 0; k < NileFlow.FLOW.length; k++) {
            Gaussian predicted = k == 0 ? state : KalmanFilter.predict(state, ONE, new double[][] {{Q}});
            KalmanFilter.Update update = KalmanFilter.update(predicted, ONE, new double[][] {{H}},
                    new double[] {NileFlow.FLOW[k]});
            state = update.state();
            sum += update.logLikelihood();
            first = k == 0 ? update.logLikelihood() : first;
            steps.add(new RtsSmoother.Step(predicted, state, ONE));
        }
        return new Run(steps, sum, first);
    }

    /** The data themselves: mean 919.35, variance 28637.95 (summary of the R data set). */
    @Test
    void nileDataAreThoseOfTheDataSet() {
        double mean = Arrays.stream(NileFlow.FLOW).average().orElseThrow();
        double variance = Arrays.stream(NileFlow.FLOW).map(v -> (v - mean) * (v - mean)).sum() / 99;
        assertThat(NileFlow.FLOW).hasSize(100);
        assertThat(mean).isCloseTo(919.35, Offset.offset(1e-9));
        assertThat(variance).isCloseTo(28637.95, Offset.offset(0.01));
    }

    /**
     * Durbin and Koopman (2012), Time Series Analysis by State Space Methods, 2nd ed., section 2.2, local level model
     * of the Nile with variances 15099 and 1469.1, a1 = 0, P1 = 1e7; values as quoted in a state-space library's test.
     */
    @Test
    void nileLocalLevelIsThatOfDurbinAndKoopman() {
        Run run = localLevel(1e7);
        assertThat(run.logLikelihood()).isCloseTo(-641.5856, Offset.offset(1e-3));
        Gaussian last = run.steps().get(99).filtered();
        assertThat(last.mean()[0]).isCloseTo(798.37, Offset.offset(5e-3));
        assertThat(last.covariance()[0][0]).isCloseTo(4032.158, Offset.offset(1e-3));
    }

    /** Same source: diffuse log-likelihood −632.5456, the first observation's density being flat. */
    @Test
    void nileDiffuseLikelihoodIsThatOfDurbinAndKoopman() {
        Run run = localLevel(1e13);
        assertThat(run.logLikelihood() - run.firstTerm()).isCloseTo(-632.5456, Offset.offset(1e-3));
    }

    /** Calculated independently with a diffuse start; smoothed level in years 1, 2 and 50 and its variance. */
    @Test
    void nileSmoothedLevelIsReproduced() {
        List<Gaussian> smoothed = RtsSmoother.smooth(localLevel(1e10).steps());
        assertThat(smoothed.get(0).mean()[0]).isCloseTo(1111.668, Offset.offset(2e-3));
        assertThat(smoothed.get(1).mean()[0]).isCloseTo(1110.858, Offset.offset(2e-3));
        assertThat(smoothed.get(49).mean()[0]).isCloseTo(834.763, Offset.offset(1e-3));
        assertThat(smoothed.get(49).covariance()[0][0]).isCloseTo(2326.757, Offset.offset(1e-2));
        assertThat(smoothed.get(99).mean()[0]).isCloseTo(798.37, Offset.offset(5e-3));
    }

    /** Steady gain of the local level model with Q/H = 1: the golden ratio less one, root of the Riccati equation. */
    @Test
    void steadyGainIsTheGoldenRatio() {
        Gaussian state = new Gaussian(new double[] {0}, new double[][] {{1}});
        double gain = 0;
        for (int k = 0; k < 60; k++) {
            Gaussian predicted = KalmanFilter.predict(state, ONE, ONE);
            gain = predicted.covariance()[0][0] / (predicted.covariance()[0][0] + 1);
            state = KalmanFilter.update(predicted, ONE, ONE, new double[] {0}).state();
        }
        assertThat(gain).isCloseTo((Math.sqrt(5) - 1) / 2, Offset.offset(1e-9));
    }

    /** Kalata (1984), IEEE Trans. Aerosp. Electron. Syst. 20:174–182: gains at tracking index 1 and 0.1. */
    @Test
    void steadyAlphaBetaGainsAreKalatas() {
        double[][] expected = {{1, 0.75, 0.5}, {0.1, 0.36, 0.08}};
        for (double[] row : expected) {
            double s = row[0] * row[0];
            double[][] q = {{s / 4, s / 2}, {s / 2, s}};
            Gaussian state = new Gaussian(new double[2], new double[][] {{10, 0}, {0, 10}});
            Gaussian predicted = state;
            for (int k = 0; k < 500; k++) {
                predicted = KalmanFilter.predict(state, new double[][] {{1, 1}, {0, 1}}, q);
                state = KalmanFilter.update(predicted, new double[][] {{1, 0}}, ONE, new double[] {0}).state();
            }
            double[][] p = predicted.covariance();
            assertThat(p[0][0] / (p[0][0] + 1)).isCloseTo(row[1], Offset.offset(1e-9));
            assertThat(p[1][0] / (p[0][0] + 1)).isCloseTo(row[2], Offset.offset(1e-9));
        }
    }

    @Test
    void aSmoothedRecordIsNearerTheTruthThanTheObservationsAndItsInnovationsAreOrdinary() {
        Random random = new Random(7);
        double raw = 0;
        double smooth = 0;
        double nis = 0;
        for (int trial = 0; trial < 40; trial++) {
            double[] time = new double[20];
            double[] truth = new double[20];
            double[] seen = new double[20];
            double[] sd = new double[20];
            double speed = 10;
            for (int k = 1; k < 20; k++) {
                time[k] = time[k - 1] + 0.2 + 0.3 * random.nextDouble();
                double step = time[k] - time[k - 1];
                double kick = random.nextGaussian() * Math.sqrt(0.5 * step);
                truth[k] = truth[k - 1] + speed * step + kick * step / 2;
                speed += kick;
            }
            for (int k = 0; k < 20; k++) {
                sd[k] = 0.5;
                seen[k] = k == 9 ? Double.NaN : truth[k] + sd[k] * random.nextGaussian();
            }
            ConstantVelocity.Smoothed found = ConstantVelocity.smooth(time, seen, sd, 0.5, 10, 5);
            nis += found.meanNis() / 40;
            for (int k = 0; k < 20; k++) {
                raw += Double.isNaN(seen[k]) ? 0 : Math.pow(seen[k] - truth[k], 2);
                smooth += Math.pow(found.position(k) - truth[k], 2);
            }
        }
        assertThat(smooth).isLessThan(0.6 * raw);
        assertThat(nis).isBetween(0.75, 1.25);
    }

    @Test
    void aRecordReadBackwardGivesTheOppositeSpeed() {
        double[] time = {0, 1, 2.5, 3, 4.2};
        double[] seen = {0, 1.2, 2.2, 3.1, 4};
        double[] sd = {0.3, 0.3, 0.3, 0.3, 0.3};
        double[] backTime = new double[5];
        double[] backSeen = new double[5];
        for (int k = 0; k < 5; k++) {
            backTime[k] = 4.2 - time[4 - k];
            backSeen[k] = seen[4 - k];
        }
        ConstantVelocity.Smoothed forward = ConstantVelocity.smooth(time, seen, sd, 0.1, 0, 20);
        ConstantVelocity.Smoothed backward = ConstantVelocity.smooth(backTime, backSeen, sd, 0.1, 0, 20);
        for (int k = 0; k < 5; k++) {
            assertThat(backward.position(4 - k)).isCloseTo(forward.position(k), Offset.offset(0.02));
            assertThat(backward.speed(4 - k)).isCloseTo(-forward.speed(k), Offset.offset(0.02));
        }
    }

    @Test
    void theWrittenOutSmootherIsTheGeneralOne() {
        double[] time = {0, 1, 2.5, 3, 4.2};
        double[] seen = {0.4, 1.2, Double.NaN, 3.1, 4};
        double q = 0.3;
        Gaussian state = new Gaussian(new double[] {0.4, 2}, new double[][] {{9e4, 0}, {0, 25}});
        List<RtsSmoother.Step> steps = new ArrayList<>();
        for (int k = 0; k < 5; k++) {
            double t = k == 0 ? 0 : time[k] - time[k - 1];
            double[][] f = {{1, t}, {0, 1}};
            Gaussian predicted = k == 0 ? state : KalmanFilter.predict(state, f,
                    new double[][] {{q * t * t * t / 3, q * t * t / 2}, {q * t * t / 2, q * t}});
            state = Double.isNaN(seen[k]) ? predicted : KalmanFilter.update(predicted, new double[][] {{1, 0}},
                    new double[][] {{0.09}}, new double[] {seen[k]}).state();
            steps.add(new RtsSmoother.Step(predicted, state, f));
        }
        List<Gaussian> general = RtsSmoother.smooth(steps);
        double[] sd = {0.3, 0.3, 0.3, 0.3, 0.3};
        ConstantVelocity.Smoothed written = ConstantVelocity.smooth(time, seen, sd, q, 2, 5);
        for (int k = 0; k < 5; k++) {
            assertThat(written.position(k)).isCloseTo(general.get(k).mean()[0], Offset.offset(1e-6));
            assertThat(written.speed(k)).isCloseTo(general.get(k).mean()[1], Offset.offset(1e-6));
            assertThat(written.positionSd(k)).isCloseTo(Math.sqrt(general.get(k).covariance()[0][0]),
                    Offset.offset(1e-6));
            assertThat(written.speedSd(k)).isCloseTo(Math.sqrt(general.get(k).covariance()[1][1]),
                    Offset.offset(1e-6));
        }
    }
}
