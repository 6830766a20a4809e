package hemline.scoring;

import java.util.function.ToDoubleFunction;

/**
 * What is measured. Shares lie in 0 to 1; a measure without anything to measure is NaN.
 */
public enum Measure {
    RECALL("recall", "recall of detectable length", "", t -> share(
            t.sum(s -> s.detectable().allFoundKm()), t.sum(s -> s.detectable().allKm()))),
    RECALL_BELOW_4("recall_below_4_dbz", "recall, lines below 4 dBZ", "", t -> recall(t, 0)),
    RECALL_4_8("recall_4_8_dbz", "recall, lines 4 to 8 dBZ", "", t -> recall(t, 1)),
    RECALL_8_14("recall_8_14_dbz", "recall, lines 8 to 14 dBZ", "", t -> recall(t, 2)),
    RECALL_14_UP("recall_14_up_dbz", "recall, lines 14 dBZ and more", "", t -> recall(t, 3)),
    BOUNDARIES_FOUND("boundaries_found", "boundaries with half their detectable length found", "", t -> share(
            t.sumBoundaries(b -> b.detectableKm() > 0 && b.recalledKm() >= b.detectableKm() / 2 ? 1 : 0),
            t.sumBoundaries(b -> b.detectableKm() > 0 ? 1 : 0))),
    PRECISION("precision", "precision of found length", "", t -> share(
            t.sum(SceneTally::rightKm), t.sum(s -> s.rightKm() + s.falseKm()))),
    FALSE_KM_PER_SWEEP("false_km_per_sweep", "false length a sweep", "km", t -> share(
            t.sum(SceneTally::falseKm), t.sum(SceneTally::sweeps))),
    FALSE_KM_PER_NULL_SWEEP("false_km_per_null_sweep", "false length a sweep, scenes without boundaries", "km",
            t -> share(t.sumWhere(s -> s.boundaries().isEmpty(), SceneTally::falseKm),
                    t.sumWhere(s -> s.boundaries().isEmpty(), SceneTally::sweeps))),
    FOUND_PER_TRUE("found_per_true_length", "right length for each km recalled", "", t -> share(
            t.sum(SceneTally::rightKm), t.sum(s -> s.detectable().allFoundKm()))),
    POSITION_MEDIAN("position_median_km", "position error, median", "km", t -> t.positionKm.quantileAbs(0.5, t.times)),
    POSITION_90("position_p90_km", "position error, 90 %", "km", t -> t.positionKm.quantileAbs(0.9, t.times)),
    SPEED_BIAS("speed_bias_ms", "normal speed, bias", "m/s", t -> t.speedMs.bias(t.times)),
    SPEED_RMSE("speed_rmse_ms", "normal speed, RMSE", "m/s", t -> t.speedMs.rmse(t.times)),
    SPEED_RMSE_LONG("speed_rmse_4_sweeps_ms", "normal speed, RMSE, tracks of 4 sweeps and more", "m/s",
            t -> t.speedLongMs.rmse(t.times)),
    SPEED_MEDIAN("speed_median_abs_ms", "normal speed, median size of error", "m/s",
            t -> t.speedMs.quantileAbs(0.5, t.times)),
    SPEED_WITHIN_1("speed_within_1_sd", "normal speeds within 1 stated SD", "", t -> t.speedMs.shareWithin(1, t.times)),
    SPEED_WITHIN_2("speed_within_2_sd", "normal speeds within 2 stated SD", "", t -> t.speedMs.shareWithin(2, t.times)),
    SPEED_GIVEN("speed_given", "right length with a speed", "", t -> share(
            t.sumTracks(SceneTally.TrackTally::speedGivenKm), t.sumTracks(SceneTally.TrackTally::rightKm))),
    EXPANSION_BIAS("expansion_bias_ms", "expansion, bias", "m/s", t -> t.expansionMs.bias(t.times)),
    EXPANSION_RMSE("expansion_rmse_ms", "expansion, RMSE", "m/s", t -> t.expansionMs.rmse(t.times)),
    EXPANSION_MEDIAN("expansion_median_abs_ms", "expansion, median size of error", "m/s",
            t -> t.expansionMs.quantileAbs(0.5, t.times)),
    EXPANSION_WITHIN_1("expansion_within_1_sd", "expansions within 1 stated SD", "",
            t -> t.expansionMs.shareWithin(1, t.times)),
    EXPANSION_WITHIN_2("expansion_within_2_sd", "expansions within 2 stated SD", "",
            t -> t.expansionMs.shareWithin(2, t.times)),
    EXPANSION_GIVEN("expansion_given", "tracks along arcs with an expansion", "", t -> share(
            t.sumTracks(k -> k.expansionGiven() ? 1 : 0), t.sumTracks(k -> k.expansionAsked() ? 1 : 0))),
    PURITY("purity", "track length along its main boundary", "", t -> share(
            t.sumTracks(SceneTally.TrackTally::dominantKm), t.sumTracks(SceneTally.TrackTally::rightKm))),
    CONTINUITY("continuity", "boundary length in its main track", "", t -> share(
            t.sumBoundaries(SceneTally.BoundaryTally::dominantKm),
            t.sumBoundaries(SceneTally.BoundaryTally::recalledKm))),
    SWITCHES("identity_switches", "identity switches", "count", t -> t.sumBoundaries(
            SceneTally.BoundaryTally::switches)),
    SWITCH_SHARE("identity_switch_share", "identity switches for each link", "", t -> share(
            t.sumBoundaries(SceneTally.BoundaryTally::switches), t.sumBoundaries(SceneTally.BoundaryTally::links))),
    MEETING_HITS("meeting_hits", "meetings found", "count", t -> t.sum(s -> s.meetings().hits())),
    MEETING_MISSES("meeting_misses", "meetings missed", "count", t -> t.sum(s -> s.meetings().misses())),
    MEETING_FALSE("meeting_false_alarms", "meetings falsely reported", "count",
            t -> t.sum(s -> s.meetings().falseAlarms())),
    MEETING_FOUND_SHARE("meeting_found_share", "share of meetings found", "", t -> share(
            t.sum(s -> s.meetings().hits()), t.sum(s -> s.meetings().hits() + s.meetings().misses()))),
    MEETING_FALSE_SHARE("meeting_false_share", "share of reported meetings that are false", "", t -> share(
            t.sum(s -> s.meetings().falseAlarms()), t.sum(s -> s.meetings().hits() + s.meetings().falseAlarms()))),
    MEETING_PLACE("meeting_place_median_km", "meetings, median distance", "km",
            t -> t.meetingKm.quantileAbs(0.5, t.times)),
    MEETING_TIME("meeting_time_median_min", "meetings, median size of time error", "min",
            t -> t.meetingMin.quantileAbs(0.5, t.times)),
    MEETING_TIME_BIAS("meeting_time_bias_min", "meetings, time bias", "min", t -> t.meetingMin.bias(t.times)),
    MEETING_WITHIN_2("meeting_time_within_2_sd", "meeting times within 2 stated SD", "",
            t -> t.meetingMin.shareWithin(2, t.times));

    private final String key;
    private final String label;
    private final String unit;
    private final ToDoubleFunction<Totals> of;

    Measure(String key, String label, String unit, ToDoubleFunction<Totals> of) {
        this.key = key;
        this.label = label;
        this.unit = unit;
        this.of = of;
    }

    /** Its name in JSON. */
    public String key() {
        return key;
    }

    /** Its name in words. */
    public String label() {
        return label;
    }

    /** Its unit; empty for a share, {@code count} for a number of things. */
    public String unit() {
        return unit;
    }

    double of(Totals totals) {
        return of.applyAsDouble(totals);
    }

    private static double recall(Totals t, int strength) {
        return share(t.sum(s -> s.detectable().foundKm(strength)), t.sum(s -> s.detectable().totalKm(strength)));
    }

    private static double share(double part, double whole) {
        return whole == 0 ? Double.NaN : part / whole;
    }
}
