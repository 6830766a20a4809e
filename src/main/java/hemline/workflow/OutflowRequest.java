package hemline.workflow;

import hemline.numerics.Estimate;
import java.util.Objects;
import java.util.Optional;

/**
 * What was observed of one outflow boundary. Everything may be missing: NaN, empty or {@link Estimate#UNKNOWN}. An
 * estimate with a standard deviation of 0 counts as given without one and gets the usual one, except the speed.
 *
 * @param ahead       air ahead
 * @param behind      air behind
 * @param deficitK    density deficit in kelvin of density potential temperature
 * @param depthM      of the cold air, m
 * @param airDepthM   of the air it runs under, m; NaN for deep
 * @param riseHpa     hydrostatic pressure rise, hPa
 * @param speedMs     over the ground, m s⁻¹
 * @param windAlongMs wind ahead along the motion, m s⁻¹
 * @param law         name of the law for k
 * @param froude      k itself
 */
public record OutflowRequest(Optional<Air> ahead, Optional<Air> behind, Estimate deficitK, Estimate depthM,
                             double airDepthM, Estimate riseHpa, Estimate speedMs, Estimate windAlongMs, String law,
                             Estimate froude) {
    public OutflowRequest {
        Objects.requireNonNull(ahead);
        Objects.requireNonNull(behind);
        Objects.requireNonNull(law);
    }

    /**
     * @param temperatureC     °C
     * @param dewPointC        °C; NaN when unknown
     * @param pressureHpa      at the station, hPa
     * @param condensateGPerKg rain and cloud water carried along, g kg⁻¹
     */
    public record Air(double temperatureC, double dewPointC, double pressureHpa, double condensateGPerKg) {
    }
}
