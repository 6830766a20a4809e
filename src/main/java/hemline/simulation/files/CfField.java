package hemline.simulation.files;

import hemline.simulation.radar.Packing;
import hemline.sweep.Field;
import hemline.sweep.Sweep;
import java.util.ArrayList;
import java.util.List;

/**
 * A field of a CfRadial file and its attributes. {@code _Undetect}, which FM 301 (WMO-No. 306, volume I.3) defines beside
 * {@code _FillValue}, keeps "nothing detected" apart from "not measured".
 *
 * @param standardName name after the CF standard name table
 */
record CfField(Field field, Packing packing, String longName, String standardName) {
    static final int BYTE_SHIFT = 128;

    static List<CfField> of(Sweep sweep, Packing reflectivity, Packing velocity) {
        List<CfField> fields = new ArrayList<>();
        fields.add(new CfField(sweep.reflectivity(), reflectivity, "equivalent reflectivity factor",
                "equivalent_reflectivity_factor"));
        sweep.velocity().ifPresent(v -> fields.add(new CfField(v, velocity, "radial velocity, positive away",
                "radial_velocity_of_scatterers_away_from_instrument")));
        return fields;
    }

    String name() {
        return field.name();
    }

    double scale() {
        return packing.scale();
    }

    double offset() {
        return packing.offset() + (packing.isByte() ? BYTE_SHIFT * packing.scale() : 0);
    }

    /** A stored number in the field's own type. */
    Number stored(int number) {
        if (packing.isByte()) {
            return (byte) (number - BYTE_SHIFT);
        }
        return (short) number;
    }
}
