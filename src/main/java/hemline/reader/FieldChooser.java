package hemline.reader;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.Set;

/**
 * Chooses the reflectivity and the velocity among a sweep's fields: by standard name or quantity, then by known
 * names. Corrected reflectivity stands before plain, plain before total or uncorrected, horizontal before vertical.
 */
final class FieldChooser {
    /** CF standard names, those of CfRadial 2 and WMO FM 301, and ODIM_H5 quantities. */
    private static final Set<String> REFLECTIVITY = Set.of("equivalent_reflectivity_factor",
            "radar_equivalent_reflectivity_factor_h", "radar_equivalent_reflectivity_factor_v",
            "radar_equivalent_reflectivity_factor", "corrected_equivalent_reflectivity_factor",
            "attenuation_corrected_equivalent_reflectivity_factor", "dbzh", "dbzv", "dbz", "dbzhc", "dbzvc", "th", "tv");
    private static final Set<String> REFLECTIVITY_NAMES = Set.of("dbz", "dbzh", "dbzv", "dbzhc", "dbzhcc", "dbz_f",
            "dbzhc_f", "dbzh_f", "dbzvc", "th", "tv", "dbt", "dbth", "dbtv", "zh", "zv", "zhh", "zt", "dz", "cz", "uz",
            "ref", "refl", "z", "dbuz", "reflectivity", "reflectivity_h", "reflectivity_v", "reflectivity_horizontal",
            "reflectivity_vertical", "reflectivity_hh", "reflectivity_vv", "corrected_reflectivity",
            "corrected_reflectivity_horizontal", "uncorrected_reflectivity_horizontal", "total_power",
            "unfiltered_reflectivity", "uncorrected_reflectivity", "horizontal_reflectivity", "reflectivity_at_cor",
            "attenuation_corrected_reflectivity", "attenuation_corrected_reflectivity_h",
            "equivalent_reflectivity_factor");
    private static final Set<String> VELOCITY = Set.of("radial_velocity_of_scatterers_away_from_instrument",
            "radial_velocity_of_scatterers_away_from_instrument_h",
            "radial_velocity_of_scatterers_away_from_instrument_v", "radial_velocity_of_scatterers_toward_instrument",
            "corrected_radial_velocity_of_scatterers_away_from_instrument", "vradh", "vrad", "vradv", "vraddh",
            "vraddv");
    private static final Set<String> VELOCITY_NAMES = Set.of("vel", "v", "vr", "vt", "vu", "ve", "vg", "vrad", "vradh",
            "vradv", "velocity", "radial_velocity", "mean_doppler_velocity", "doppler_velocity", "velocity_h",
            "mean_doppler_velocity_h", "vel_f", "velh", "corrected_velocity", "dealiased_velocity", "vradh_f");

    private FieldChooser() {
    }

    /** The reflectivity fields, best first. */
    static List<FieldHead> reflectivities(List<FieldHead> fields) {
        List<FieldHead> found = new ArrayList<>();
        for (FieldHead field : fields) {
            if ((matches(field, REFLECTIVITY) || REFLECTIVITY_NAMES.contains(lower(field.name())))
                    && !isLinear(field)) {
                found.add(field);
            }
        }
        found.sort(Comparator.comparingInt(FieldChooser::reflectivityRank));
        return found;
    }

    /**
     * @throws UnreadableFileException if a named field is in no sweep of the file
     */
    static Optional<FieldHead> reflectivity(List<FieldHead> fields, FieldChoice choice) {
        if (choice.reflectivity().isPresent()) {
            String wanted = choice.reflectivity().get();
            return fields.stream().filter(f -> f.name().equals(wanted)).findFirst()
                    .or(() -> fields.stream().filter(f -> f.name().equalsIgnoreCase(wanted)).findFirst());
        }
        return reflectivities(fields).stream().findFirst();
    }

    /** The velocity: as measured before dealiased, so that the stated unambiguous velocity is its own. */
    static Optional<FieldHead> velocity(List<FieldHead> fields) {
        return fields.stream().filter(f -> matches(f, VELOCITY) || VELOCITY_NAMES.contains(lower(f.name())))
                .min(Comparator.comparingInt(FieldChooser::velocityRank));
    }

    /** True if a velocity counts motion toward the radar as positive. */
    static boolean isTowardRadar(FieldHead velocity) {
        return lower(velocity.quantity()).contains("toward_instrument");
    }

    private static boolean matches(FieldHead field, Set<String> quantities) {
        return quantities.contains(lower(field.quantity()));
    }

    private static boolean isLinear(FieldHead field) {
        String units = lower(field.units()).replaceAll("[\\s^*]", "");
        return units.startsWith("mm6") || lower(field.quantity()).contains("linear");
    }

    /** 0 the best; even where the quantity is named, odd where only the field's name tells it. */
    static int reflectivityRank(FieldHead field) {
        String name = lower(field.name());
        String words = name + " " + lower(field.longName()) + " " + lower(field.quantity());
        boolean vertical = name.matches("(dbz|t|z|zv|db)v(c)?|zv|.*_vv?|.*vertical.*") || words.contains("factor_v");
        boolean raw = words.contains("uncorrected") || words.contains("unfiltered") || words.contains("total")
                || name.matches("th|tv|dbth?|dbtv|zt|uz|dbuz") || words.contains("raw ");
        boolean corrected = !raw && (words.contains("correct") || words.contains("attenuation")
                || name.matches("dbz[hv]c.*|dbz_f|cz|.*_cor|.*_f"));
        int kind = vertical ? 3 : raw ? 2 : corrected ? 0 : 1;
        return 2 * kind + (matches(field, REFLECTIVITY) ? 0 : 1);
    }

    private static int velocityRank(FieldHead field) {
        String words = lower(field.name()) + " " + lower(field.quantity()) + " " + lower(field.longName());
        boolean dealiased = words.contains("corrected") || words.contains("dealias") || words.contains("unfold")
                || words.contains("vradd");
        boolean vertical = lower(field.name()).endsWith("v") && lower(field.name()).startsWith("vrad");
        return (vertical ? 4 : 0) + (dealiased ? 2 : 0) + (matches(field, VELOCITY) ? 0 : 1);
    }

    private static String lower(String text) {
        return text.toLowerCase(Locale.ROOT);
    }
}
