package hemline.scoring;

import java.util.List;

/**
 * How good forecasts of meetings were.
 *
 * @param leads       by lead time, rising
 * @param reliability by stated probability, rising
 * @param brier       mean squared difference of probability and outcome (Brier 1950, Mon. Weather Rev. 78:1); NaN for
 *                    none
 */
public record ForecastScore(List<Lead> leads, List<Reliability> reliability, double brier) {
    public ForecastScore {
        leads = List.copyOf(leads);
        reliability = List.copyOf(reliability);
    }

    /**
     * One class of lead times. An opportunity is a detectable meeting that lies this far ahead of a forecast.
     *
     * @param minutes       middle of the class
     * @param opportunities pairs of a forecast and a detectable meeting
     * @param hits          of these foreseen with a probability of at least a half
     * @param falseAlarms   meetings foreseen with that probability that did not come
     * @param placeMedianKm of the hits, km; NaN for none
     * @param timeMedianMin median size of the time error of the hits, minutes; NaN for none
     * @param timeBiasMin   mean of foreseen less true time, minutes; NaN for none
     * @param withinTwoSd   share of the hits whose time error is within two stated standard deviations; NaN for none
     */
    public record Lead(double minutes, int opportunities, int hits, int falseAlarms, double placeMedianKm,
                       double timeMedianMin, double timeBiasMin, double withinTwoSd) {
    }

    /**
     * One class of stated probabilities.
     *
     * @param from      least probability
     * @param to        greatest, left out but in the last class
     * @param forecasts meetings foreseen with one of these
     * @param stated    mean of their probabilities; NaN for none
     * @param came      share of them that came; NaN for none
     */
    public record Reliability(double from, double to, int forecasts, double stated, double came) {
    }
}
