package spanwright.path;

import java.util.ArrayList;
import java.util.List;
import spanwright.published.Check;
import spanwright.published.PublishedChecks;

/** Hop geometry against the closed formula of the recommendations and published limits. */
public class OneHopElevationTest extends PublishedChecks {
  private static final String FORMULA =
      "elevation of a hop, formula of Rec. ITU-R P.533 and P.1240 (formula from memory), worked"
          + " out apart";
  private static final String STANDARD = "US Federal Standard 1037C";
  private static final double[][] ELEVATIONS = {
    {500, 110, 22.44}, {500, 300, 48.41}, {1000, 110, 10.05}, {1000, 200, 19.24},
    {1000, 300, 28.12}, {1500, 110, 4.89}, {2000, 110, 1.71}, {2000, 300, 11.81},
    {2500, 300, 7.53}, {3000, 250, 2.50}, {3000, 300, 4.26}, {3000, 350, 5.99},
    {3000, 400, 7.69}, {3500, 300, 1.58}, {4000, 300, -0.72}
  };
  private static final double[] HEIGHTS = {100, 110, 120, 250, 300, 350, 400};
  private static final double[][] LONGEST = {
    {0, 2243, 2351, 2454, 3513, 3836, 4130, 4402},
    {3, 1672, 1776, 1875, 2907, 3225, 3515, 3783},
    {5, 1389, 1486, 1579, 2568, 2877, 3160, 3423},
    {10, 927, 1004, 1079, 1918, 2193, 2448, 2688}
  };

  @Override
  public String heading() {
    return "Path: one hop";
  }

  @Override
  public String about() {
    return "Straight rays to a mirror over a sphere of 6371 km. The formula's values allow their"
        + " printed digits; the published reaches are round figures.";
  }

  @Override
  public List<Check> checks() {
    List<Check> checks = new ArrayList<>();
    for (double[] row : ELEVATIONS) {
      double found = Math.toDegrees(Hop.elevation(row[0], row[1]));
      String what = String.format("elevation, hop of %.0f km, mirror at %.0f km", row[0], row[1]);
      checks.add(Check.within(what, row[2], found, 0.01, 2, "°", FORMULA));
    }
    for (double[] row : LONGEST) {
      for (int k = 0; k < HEIGHTS.length; k++) {
        double found = Hop.rangeKm(Math.toRadians(row[0]), HEIGHTS[k]);
        String what = String.format("reach at %.0f°, mirror at %.0f km", row[0], HEIGHTS[k]);
        checks.add(Check.within(what, row[k + 1], found, 0.6, 0, "km", FORMULA));
      }
    }
    double least = Math.toRadians(TakeOff.LEAST_DEGREES);
    checks.add(
        Check.within(
            "longest F2 hop counted",
            4000,
            Hop.rangeKm(least, Layer.F2.highestKm()),
            400,
            0,
            "km",
            STANDARD + ", F region (about 4000 km)"));
    checks.add(
        Check.within(
            "reach of sporadic E at the horizon",
            2400,
            Hop.rangeKm(0, Layer.ES.highestKm()),
            240,
            0,
            "km",
            STANDARD + ", sporadic E (up to 2400 km)"));
    checks.add(
        Check.within(
            "longest E hop counted, mirror at 110 km",
            2000,
            Hop.rangeKm(least, 110),
            200,
            0,
            "km",
            "CCIR practice (about 2000 km), from memory"));
    return checks;
  }
}
