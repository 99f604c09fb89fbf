package spanwright.path;

import java.util.Locale;
import net.sf.geographiclib.Geodesic;
import net.sf.geographiclib.GeodesicData;
import net.sf.geographiclib.GeodesicMask;

/**
 * The way from the station to a place: the geodesic of the WGS 84 ellipsoid (Karney, Algorithms for
 * geodesics, J. Geodesy 87, 2013).
 *
 * @param bearingDegrees in which the wave leaves, clockwise from true north, 0 or more, under 360
 * @param distanceKm along the way; over 20,000 is the long way round
 * @param anyBearing true near the antipode, where every bearing leads and the one given means
 *     little
 */
public record GreatCircle(double bearingDegrees, double distanceKm, boolean anyBearing) {

  /**
   * The short way between two places.
   *
   * @param fromLatitude degrees, north positive
   * @param fromLongitude degrees, east positive
   * @param toLatitude degrees
   * @param toLongitude degrees
   */
  public static GreatCircle between(
      double fromLatitude, double fromLongitude, double toLatitude, double toLongitude) {
    requireWithin("from latitude", fromLatitude, 90);
    requireWithin("from longitude", fromLongitude, 360);
    requireWithin("to latitude", toLatitude, 90);
    requireWithin("to longitude", toLongitude, 360);
    GeodesicData line =
        Geodesic.WGS84.Inverse(
            fromLatitude,
            fromLongitude,
            toLatitude,
            toLongitude,
            GeodesicMask.DISTANCE | GeodesicMask.AZIMUTH);
    double distance = line.s12 / 1000;
    return new GreatCircle(turned(line.azi1, 0), distance, TakeOff.bearingIsAny(distance));
  }

  /**
   * The other way round: opposite bearing, and the rest of the earth's circumference on the sphere
   * that the hops use.
   */
  public GreatCircle otherWay() {
    double rest = 2 * Math.PI * Hop.EARTH_RADIUS_KM - distanceKm;
    return new GreatCircle(turned(bearingDegrees, 180), rest, anyBearing);
  }

  private static double turned(double degrees, double by) {
    double turned = (degrees + by) % 360;
    double positive = turned < 0 ? turned + 360 : turned;
    return positive >= 360 ? 0 : positive + 0.0;
  }

  private static void requireWithin(String what, double degrees, double limit) {
    if (!(Math.abs(degrees) <= limit)) {
      throw new IllegalArgumentException(
          String.format(
              Locale.ROOT,
              "The %s is %s degrees; it has to lie between -%.0f and %.0f degrees.",
              what,
              degrees,
              limit,
              limit));
    }
  }
}
