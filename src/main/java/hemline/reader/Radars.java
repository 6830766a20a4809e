package hemline.reader;

import hemline.geodesy.GeoPoint;
import hemline.sweep.RadarSite;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** Which files are of the same radar: by position where both state one, else by name. */
final class Radars {
    private static final double SAME_PLACE_M = 1000;
    private static final double DEGREE_M = 111_195;

    private Radars() {
    }

    /** A radar and the surveys of its files, in the order of the inputs. */
    record Group(RadarSite first, List<FileSurvey> files) {
        boolean isCalled(String name) {
            return files.stream().flatMap(f -> f.tickets().stream())
                    .anyMatch(t -> t.site().name().equalsIgnoreCase(name.strip()));
        }

        long startMs() {
            return files.stream().flatMap(f -> f.tickets().stream()).mapToLong(SweepTicket::startMs).min()
                    .orElse(Long.MAX_VALUE);
        }

        /** The radar as its files describe it: the first name, the first position and altitude stated. */
        RadarSite site(ReadOptions options, List<String> notes) {
            List<RadarSite> sites = files.stream().flatMap(f -> f.tickets().stream()).map(SweepTicket::site).toList();
            Optional<RadarSite> placed = sites.stream().filter(s -> s.position().isPresent()).findFirst();
            String name = sites.stream().map(RadarSite::name).filter(n -> !n.equals("unknown")).findFirst()
                    .orElse("unknown");
            if (placed.isPresent()) {
                double altitude = placed.get().altitudeM();
                if (Double.isNaN(altitude) && options.position().isPresent()) {
                    altitude = options.position().get().altitudeM();
                }
                return new RadarSite(name, placed.get().position(), altitude);
            }
            if (options.position().isPresent()) {
                notes.add("the files state no position; the given one is used");
                return new RadarSite(name, Optional.of(options.position().get().place()),
                        options.position().get().altitudeM());
            }
            notes.add("the files state no position: results stay in km, without latitude and longitude; give "
                    + "--position LAT,LON,ALT");
            return new RadarSite(name, Optional.empty(), sites.isEmpty() ? Double.NaN : sites.get(0).altitudeM());
        }
    }

    static List<Group> group(List<FileSurvey> surveys) {
        List<Group> groups = new ArrayList<>();
        for (FileSurvey survey : surveys) {
            RadarSite site = survey.tickets().get(0).site();
            groups.stream().filter(g -> g.files().stream().anyMatch(f -> same(f.tickets().get(0).site(), site)))
                    .findFirst().orElseGet(() -> {
                        Group fresh = new Group(site, new ArrayList<>());
                        groups.add(fresh);
                        return fresh;
                    }).files().add(survey);
        }
        return groups;
    }

    static boolean same(RadarSite a, RadarSite b) {
        if (a.position().isPresent() && b.position().isPresent()) {
            return distanceM(a.position().get(), b.position().get()) <= SAME_PLACE_M;
        }
        return a.name().equalsIgnoreCase(b.name());
    }

    /** Distance on a sphere by the small-angle formula: good enough to tell radars apart. */
    private static double distanceM(GeoPoint a, GeoPoint b) {
        double north = a.latitudeDeg() - b.latitudeDeg();
        double east = Math.IEEEremainder(a.longitudeDeg() - b.longitudeDeg(), 360)
                * Math.cos(Math.toRadians((a.latitudeDeg() + b.latitudeDeg()) / 2));
        return DEGREE_M * Math.hypot(north, east);
    }
}
