package spanwright.path;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import org.apache.commons.math3.complex.Complex;
import spanwright.published.Check;
import spanwright.published.PublishedChecks;

/** Fresnel's coefficients over the usual soils. */
public class FresnelReflectionTest extends PublishedChecks {
  private static final String SOURCE =
      "Fresnel's coefficients, complex permittivity as Rec. ITU-R P.527 has it, worked out apart";

  /** Permittivity, conductivity, MHz, pseudo-Brewster angle, least |Rv|. */
  private static final double[][] BREWSTER = {
    {13, 0.005, 3.65, 10.83, 0.270},
    {13, 0.005, 7.1, 13.31, 0.186},
    {13, 0.005, 14.175, 14.78, 0.106},
    {13, 0.005, 28.5, 15.31, 0.055},
    {5, 0.001, 7.1, 23.09, 0.098},
    {20, 0.0303, 7.1, 6.44, 0.338},
    {30, 0.01, 14.175, 9.95, 0.097},
    {81, 5, 14.175, 0.72, 0.410},
    {3, 0, 7.1, 30.00, 0}
  };

  /** In the same order: |Rv|, angle, |Rh|, angle at 10°, then at 30°. */
  private static final double[][] COEFFICIENTS = {
    {0.2726, -98.99, 0.9453, 177.99, 0.5240, -23.95, 0.8504, 174.21},
    {0.2324, -128.60, 0.9265, 178.12, 0.4116, -23.12, 0.8027, 174.61},
    {0.2173, -151.95, 0.9126, 178.70, 0.3388, -16.57, 0.7689, 176.29},
    {0.2130, -165.70, 0.9069, 179.28, 0.3108, -9.41, 0.7553, 177.94},
    {0.3942, -168.22, 0.8580, 177.46, 0.1526, -40.45, 0.6448, 172.84},
    {0.3997, -53.36, 0.9697, 178.62, 0.7024, -16.02, 0.9152, 176.03},
    {0.0973, -88.56, 0.9414, 179.28, 0.4943, -8.70, 0.8405, 177.92},
    {0.9023, -5.83, 0.9969, 179.82, 0.9649, -2.02, 0.9911, 179.49}
  };

  @Override
  public String heading() {
    return "Path: reflection by the soil";
  }

  @Override
  public String about() {
    return "Convention: +1 vertical and −1 horizontal for a perfect conductor. Tolerances are the"
        + " printed digits.";
  }

  @Override
  public List<Check> checks() {
    List<Check> checks = new ArrayList<>();
    for (int k = 0; k < BREWSTER.length; k++) {
      double[] row = BREWSTER[k];
      Fresnel soil = Fresnel.of(row[2], row[0], row[1]);
      String where =
          String.format(Locale.ROOT, " over %.0f, %.4g S/m at %.5g MHz", row[0], row[1], row[2]);
      double angle = soil.pseudoBrewster();
      checks.add(
          Check.within(
              "pseudo-Brewster angle" + where,
              row[3],
              Math.toDegrees(angle),
              0.01,
              2,
              "°",
              SOURCE));
      checks.add(
          Check.within(
              "least vertical coefficient" + where,
              row[4],
              soil.vertical(angle).abs(),
              0.001,
              3,
              "",
              SOURCE));
      if (k < COEFFICIENTS.length) {
        add(checks, soil, where, 10, COEFFICIENTS[k], 0);
        add(checks, soil, where, 30, COEFFICIENTS[k], 4);
      }
    }
    double[] depths = {4.80, 4.19, 3.93, 3.86};
    for (int k = 0; k < depths.length; k++) {
      double mhz = BREWSTER[k][2];
      double found = Fresnel.of(mhz, 13, 0.005).skinDepth();
      String what = "skin depth in 13, 0.005 S/m at " + mhz + " MHz";
      checks.add(Check.within(what, depths[k], found, 0.02, 2, "m", SOURCE));
    }
    return checks;
  }

  private static void add(
      List<Check> checks, Fresnel soil, String where, double degrees, double[] row, int at) {
    double elevation = Math.toRadians(degrees);
    Complex[] found = {soil.vertical(elevation), soil.horizontal(elevation)};
    String[] names = {"vertical", "horizontal"};
    for (int k = 0; k < 2; k++) {
      String what = names[k] + " at " + (int) degrees + "°" + where;
      checks.add(
          Check.within(what + ", size", row[at + 2 * k], found[k].abs(), 1e-4, 4, "", SOURCE));
      checks.add(
          Check.within(
              what + ", phase",
              row[at + 2 * k + 1],
              Math.toDegrees(found[k].getArgument()),
              0.01,
              2,
              "°",
              SOURCE));
    }
  }
}
