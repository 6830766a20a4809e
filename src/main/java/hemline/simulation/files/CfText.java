package hemline.simulation.files;

import hemline.sweep.Sweep;
import java.util.LinkedHashMap;
import java.util.Map;

/** Words and names that both CfRadial writers share: Dixon, CfRadial data file format version 1.4. */
final class CfText {
    static final String MODE = "azimuth_surveillance";
    static final String INVENTED = "Invented data: no such radar, place or weather exists.";

    private CfText() {
    }

    static Map<String, String> globals(Sweep sweep) {
        Map<String, String> globals = new LinkedHashMap<>();
        globals.put("Conventions", "CF-1.7 CF/Radial instrument_parameters");
        globals.put("version", "1.4");
        globals.put("title", "Invented radar sweep");
        globals.put("institution", "none");
        globals.put("references", "none");
        globals.put("source", "hemline simulate");
        globals.put("history", sweep.source());
        globals.put("comment", INVENTED);
        globals.put("instrument_name", sweep.site().name());
        globals.put("site_name", sweep.site().name());
        globals.put("platform_is_mobile", "false");
        globals.put("n_gates_vary", "false");
        return globals;
    }

    static Map<String, String> timeAttributes(long originMs) {
        Map<String, String> attributes = new LinkedHashMap<>();
        attributes.put("standard_name", "time");
        attributes.put("long_name", "time of the ray's centre");
        attributes.put("units", "seconds since " + ScanOrder.iso(originMs));
        attributes.put("calendar", "gregorian");
        return attributes;
    }

    static Map<String, String> rangeAttributes() {
        Map<String, String> attributes = new LinkedHashMap<>();
        attributes.put("standard_name", "projection_range_coordinate");
        attributes.put("long_name", "range to the centre of the gate");
        attributes.put("units", "meters");
        attributes.put("axis", "radial_range_coordinate");
        attributes.put("spacing_is_constant", "true");
        return attributes;
    }

    static Map<String, String> plain(String longName, String units) {
        Map<String, String> attributes = new LinkedHashMap<>();
        attributes.put("long_name", longName);
        attributes.put("units", units);
        return attributes;
    }
}
