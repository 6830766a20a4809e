package hemline.outflow;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;

class OutflowChecksTest {
    /** IAPWS-IF97, table 35, verification values of eq. 30: the reference itself has to be right. */
    @Test
    void theReferenceForSaturationPressureGivesItsOwnVerificationValues() {
        assertThat(OutflowChecks.if97SaturationPa(300)).isCloseTo(3536.58941, within(1e-5));
        assertThat(OutflowChecks.if97SaturationPa(500)).isCloseTo(2.63889776e6, within(5e-3));
        assertThat(OutflowChecks.if97SaturationPa(600)).isCloseTo(12.3443146e6, within(5e-2));
    }
}
