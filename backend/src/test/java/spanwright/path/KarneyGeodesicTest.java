package spanwright.path;

import java.util.ArrayList;
import java.util.List;
import spanwright.published.Check;
import spanwright.published.PublishedChecks;

/** Bearings and distances against published geodesics. */
public class KarneyGeodesicTest extends PublishedChecks {
  private static final String EXAMPLE = "Karney, geodesic documentation, example";
  private static final String FLINDERS =
      "Geoscience Australia, Vincenty test line Flinders Peak to Buninyong";
  private static final String TEST_SET = "Karney, GeographicLib geodesic test set";

  @Override
  public String heading() {
    return "Path: great circles";
  }

  @Override
  public String about() {
    return "Geodesics of the WGS 84 ellipsoid through our own front door, in kilometres and degrees.";
  }

  @Override
  public List<Check> checks() {
    List<Check> checks = new ArrayList<>();
    add(checks, -41.32, 174.81, 40.96, -5.50, 19_959.67926735, 161.067669986, 1e-6, EXAMPLE);
    double bearing = 306 + 52 / 60.0 + 5.37 / 3600;
    add(
        checks,
        -37.951033417,
        144.424867889,
        -37.652821139,
        143.926495528,
        54.972271,
        bearing,
        1e-6,
        FLINDERS);
    add(
        checks,
        35.60777,
        -139.44815,
        -11.17491,
        -69.95921,
        8935.2445604818,
        111.098748429560,
        1e-8,
        TEST_SET);
    add(
        checks,
        55.52454,
        106.05087,
        77.03196,
        197.18234,
        4105.0861713924,
        22.020059880983,
        1e-8,
        TEST_SET);
    add(
        checks,
        -21.97856,
        142.59065,
        41.84138,
        98.56635,
        8394.3288946577,
        360 - 32.444568764332,
        1e-8,
        TEST_SET);
    add(
        checks,
        -66.99028,
        112.2363,
        -12.70631,
        285.90344,
        11_150.3442312080,
        173.734912408784,
        1e-8,
        TEST_SET);
    add(
        checks,
        -17.42761,
        173.34268,
        -15.84784,
        5.93557,
        16_076.6031631181,
        360 - 159.033557661193,
        1e-8,
        TEST_SET);
    return checks;
  }

  private static void add(
      List<Check> checks,
      double fromLatitude,
      double fromLongitude,
      double toLatitude,
      double toLongitude,
      double distanceKm,
      double bearingDegrees,
      double kilometres,
      String source) {
    GreatCircle found = GreatCircle.between(fromLatitude, fromLongitude, toLatitude, toLongitude);
    String pair = fromLatitude + ", " + fromLongitude + " to " + toLatitude + ", " + toLongitude;
    checks.add(
        Check.within(
            "distance " + pair, distanceKm, found.distanceKm(), kilometres, 6, "km", source));
    checks.add(
        Check.within(
            "bearing " + pair,
            bearingDegrees,
            found.bearingDegrees(),
            source.equals(FLINDERS) ? 3e-6 : 1e-8,
            8,
            "°",
            source));
  }
}
