package spanwright.moments;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import org.apache.commons.math3.complex.Complex;
import spanwright.published.Check;
import spanwright.published.PublishedChecks;

/** A level half-wave wire over real ground, and waves along and off the ground. */
public class HalfWaveOverSoilTest extends PublishedChecks {
  private static final String EMF =
      "calculated for this check: induced EMF with sinusoidal current and the exact Sommerfeld"
          + " spectrum; no printed table was found";
  private final Solver solver = new Solver();

  @Override
  public String heading() {
    return "Field solver: level half-wave wire over soil";
  }

  @Override
  public String about() {
    return "What the ground adds to the impedance (3 ohm allowed, 5 ohm at 0.05 wavelengths, for"
        + " the difference between sinusoidal and real current), and gains (0.3 dB); heights in"
        + " wavelengths.";
  }

  /** εr, σ, MHz, height, dR, dX, peak dBi, dBi at 10°. */
  private static final double[][] ROWS = {
    {13, 0.005, 14.175, 0.05, -10.0, 7.8, -0.3, -13.5},
    {13, 0.005, 14.175, 0.1, -18.1, 11.6, 3.9, -8.8},
    {13, 0.005, 14.175, 0.15, -11.1, 18.5, 5.6, -6.4},
    {13, 0.005, 14.175, 0.2, -0.3, 19.7, 6.0, -4.9},
    {13, 0.005, 14.175, 0.25, 9.0, 15.1, 5.8, -3.7},
    {13, 0.005, 14.175, 0.4, 9.5, -8.4, 6.4, 0.0},
    {13, 0.005, 14.175, 0.5, -3.6, -9.9, 7.4, 2.5},
    {13, 0.005, 14.175, 1.0, -1.3, -5.4, 7.7, 6.9},
    {13, 0.005, 3.65, 0.05, -24.9, 13.5, 1.3, -12.5},
    {13, 0.005, 3.65, 0.1, -24.6, 19.8, 5.3, -8.0},
    {13, 0.005, 3.65, 0.25, 13.0, 18.1, 6.3, -3.6},
    {13, 0.005, 28.5, 0.1, -17.7, 8.9, 3.6, -9.1},
    {13, 0.005, 28.5, 0.5, -2.9, -9.7, 7.3, 2.4},
    {5, 0.001, 14.175, 0.05, 4.3, 10.9, -0.4, -12.2},
    {5, 0.001, 14.175, 0.1, -6.6, 7.0, 2.6, -8.8},
    {5, 0.001, 14.175, 0.5, -2.4, -6.4, 6.6, 2.2},
    {20, 0.0303, 7.1, 0.1, -34.4, 21.6, 6.4, -7.5},
    {20, 0.0303, 7.1, 0.3, 20.9, 10.0, 6.5, -2.6},
    {81, 5, 14.175, 0.05, -64.2, -5.2, 7.3, -7.7},
    {81, 5, 14.175, 0.25, 12.8, 29.1, 7.4, -3.8}
  };

  private Solution solve(Ground ground, double mhz, double height) {
    double w = Constants.LIGHT / mhz / 1e6;
    return solver.solve(
        AntennaModel.of(
            List.of(
                WireSpec.perfect(
                    List.of(
                        new Vertex(-0.25 * w, 0, height * w), new Vertex(0.25 * w, 0, height * w)),
                    1e-6 * w)),
            0,
            0.5),
        ground,
        mhz,
        MeshAim.FULL);
  }

  @Override
  public List<Check> checks() {
    List<Check> checks = new ArrayList<>();
    for (double[] row : ROWS) {
      Solution found = solve(Ground.real(row[0], row[1]), row[2], row[3]);
      Complex change = found.impedance().subtract(solve(Ground.none(), row[2], row[3]).impedance());
      double allowed = row[3] < 0.1 ? 5 : 3;
      String where =
          String.format(
              Locale.ROOT,
              "ground %.0f, %s S/m, %s MHz, height %s",
              row[0],
              row[1],
              row[2],
              row[3]);
      checks.add(
          new Check(
              "Change of impedance, " + where,
              String.format(Locale.ROOT, "%+.1f %+.1fj ohm", row[4], row[5]),
              String.format(
                  Locale.ROOT, "%+.1f %+.1fj ohm", change.getReal(), change.getImaginary()),
              String.format(Locale.ROOT, "±%.0f ohm", allowed),
              change.subtract(new Complex(row[4], row[5])).abs() <= allowed,
              EMF));
      checks.add(
          Check.within("Peak gain, " + where, row[6], found.peak().dbi(), 0.3, 1, "dBi", EMF));
      checks.add(
          Check.within(
              "Gain broadside at 10°, " + where,
              row[7],
              found.gain(0, Math.toRadians(10)).totalDbi(),
              0.3,
              1,
              "dBi",
              EMF));
    }
    fresnel(checks);
    return checks;
  }

  private static void fresnel(List<Check> checks) {
    // εr, σ, MHz, then size and angle of Rv at 10°, Rh at 10°, Rv at 30°, Rh at 30°
    double[][] rows = {
      {13, 0.005, 3.65, 0.2726, -98.99, 0.9453, 177.99, 0.5240, -23.95, 0.8504, 174.21},
      {13, 0.005, 14.175, 0.2173, -151.95, 0.9126, 178.70, 0.3388, -16.57, 0.7689, 176.29},
      {5, 0.001, 7.1, 0.3942, -168.22, 0.8580, 177.46, 0.1526, -40.45, 0.6448, 172.84},
      {20, 0.0303, 7.1, 0.3997, -53.36, 0.9697, 178.62, 0.7024, -16.02, 0.9152, 176.03},
      {81, 5, 14.175, 0.9023, -5.83, 0.9969, 179.82, 0.9649, -2.02, 0.9911, 179.49}
    };
    double[] out = new double[4];
    for (double[] row : rows) {
      double eps = -row[1] / (2 * Math.PI * row[2] * 1e6 * Constants.EPSILON0);
      for (int i = 0; i < 4; i++) {
        double elevation = Math.toRadians(i < 2 ? 10 : 30);
        FarField.fresnel(row[0], eps, Math.sin(elevation), Math.cos(elevation), out);
        int at = i % 2 == 0 ? 2 : 0;
        Complex want =
            new Complex(0, Math.toRadians(row[4 + 2 * i])).exp().multiply(row[3 + 2 * i]);
        double off = new Complex(out[at], out[at + 1]).subtract(want).abs();
        checks.add(
            new Check(
                String.format(
                    Locale.ROOT,
                    "Fresnel's %s at %s°, ground %.0f, %s S/m, %s MHz",
                    i % 2 == 0 ? "Rv" : "Rh",
                    i < 2 ? 10 : 30,
                    row[0],
                    row[1],
                    row[2]),
                String.format(Locale.ROOT, "%.4f at %.2f°", row[3 + 2 * i], row[4 + 2 * i]),
                String.format(
                    Locale.ROOT,
                    "%.4f at %.2f°",
                    Math.hypot(out[at], out[at + 1]),
                    Math.toDegrees(Math.atan2(out[at + 1], out[at]))),
                "±0.001 of the vector, 0.1°",
                off <= 0.001 + Math.toRadians(0.1) * row[3 + 2 * i],
                "Fresnel's formulas, calculated"));
      }
    }
  }
}
