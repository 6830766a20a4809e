package hemline.geodesy;

import hemline.geometry.Point;
import net.sf.geographiclib.Geodesic;
import net.sf.geographiclib.GeodesicData;
import net.sf.geographiclib.GeodesicMask;

/**
 * The azimuthal equidistant plane centred at the radar: ranges and azimuths from the radar are exact.
 *
 * <p>Geodesics on WGS 84 after Karney (2013), Algorithms for geodesics, J. Geodesy 87:43–55; the projection
 * is described in Snyder (1987), USGS Professional Paper 1395, chapter 25.
 *
 * @param centre the radar
 */
public record LocalPlane(GeoPoint centre) {

    public GeoPoint toGeo(Point point) {
        double rangeM = 1000 * point.lengthKm();
        GeodesicData end = Geodesic.WGS84.Direct(centre.latitudeDeg(), centre.longitudeDeg(), point.bearingDeg(),
                rangeM, GeodesicMask.LATITUDE | GeodesicMask.LONGITUDE);
        return new GeoPoint(end.lat2, end.lon2);
    }

    public Point toPlane(GeoPoint place) {
        GeodesicData line = Geodesic.WGS84.Inverse(centre.latitudeDeg(), centre.longitudeDeg(),
                place.latitudeDeg(), place.longitudeDeg(), GeodesicMask.DISTANCE | GeodesicMask.AZIMUTH);
        return Point.towards(line.azi1).times(line.s12 / 1000);
    }
}
