package hemline.cli;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class OutflowCommandTest {

    /**
     * c = k √(g′h) with a deficit of 5 K at 300 K, 1 km deep, k 0.77: 9.84 m s⁻¹ by hand with g 9.80665; its uncertainty
     * 32 % from 20 % in k, 30 % in the deficit and 40 % in the depth.
     */
    @Test
    void speedByTheoryComesWithItsUncertainty() {
        Invocation told = Invocation.of("outflow", "--deficit", "5", "--depth", "1000");
        assertThat(told.exitCode()).isZero();
        assertThat(told.out()).containsPattern("speed by theory .* 9\\.8 \\+- 3\\.2  m s-1");
    }

    @Test
    void observedAndTheoreticalSpeedAreComparedInStandardDeviations() {
        Invocation told = Invocation.of("outflow", "--temperature", "30,26.5", "--dew-point", "18,17", "--pressure", "985",
                "--depth", "1300", "--speed", "8.6+-0.5");
        assertThat(told.exitCode()).isZero();
        assertThat(told.out()).containsPattern("observed 8\\.6 \\+- 0\\.5 m/s, theory .* standard deviations");
    }

    @ParameterizedTest
    @ValueSource(strings = {"outflow", "outflow --deficit five", "outflow --deficit 5+-1+-1", "outflow --deficit 5+--1",
        "outflow --temperature 30,25", "outflow --deficit 5 --law newton", "outflow --depth -4",
        "outflow --temperature 30,25 --pressure 98500", "outflow --temperature 30,25,20 --pressure 985"})
    void wrongObservationsAreOneLineAndExitCodeTwo(String line) {
        Invocation wrong = Invocation.of(line.split(" "));
        assertThat(wrong.exitCode()).isEqualTo(2);
        assertThat(wrong.out()).isEmpty();
        assertThat(wrong.err().lines()).hasSize(1);
    }
}
