package spanwright.moments;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import org.apache.commons.math3.complex.Complex;
import spanwright.published.Check;
import spanwright.published.PublishedChecks;

/** Half-wave wires beside their images: mutual impedance, gain and lobes over a perfect ground. */
public class CarterMutualImpedanceTest extends PublishedChecks {
  private static final double THIN = 1e-10;
  private final Solver solver = new Solver();

  @Override
  public String heading() {
    return "Field solver: perfect ground and mutual impedance";
  }

  @Override
  public String about() {
    return "A level half-wave wire at half the spacing above a perfect ground sees its image: what"
        + " the ground changes is minus the mutual impedance of two such wires. The table is for"
        + " sinusoidal current, which a wire of 1e-10 wavelength comes within 3 ohm of.";
  }

  private Solution over(Ground ground, double height) {
    double w = ThinWireTablesTest.WAVELENGTH;
    return solver.solve(
        AntennaModel.of(
            List.of(
                WireSpec.perfect(
                    List.of(
                        new Vertex(-0.25 * w, 0, height * w), new Vertex(0.25 * w, 0, height * w)),
                    THIN * w)),
            0,
            0.5),
        ground,
        ThinWireTablesTest.MHZ,
        MeshAim.FULL);
  }

  @Override
  public List<Check> checks() {
    List<Check> checks = new ArrayList<>();
    // spacing, R12, X12
    double[][] rows = {
      {0.05, 71.61, 24.25}, {0.1, 67.29, 7.53}, {0.2, 51.36, -19.16}, {0.3, 29.24, -34.41},
      {0.4, 6.21, -37.40}, {0.5, -12.52, -29.91}, {0.6, -23.30, -15.86}, {0.8, -18.48, 12.25},
      {1.0, 4.01, 17.73}, {1.5, -1.89, -12.30}, {2.0, 1.08, 9.36}
    };
    Complex alone = over(Ground.none(), 1).impedance();
    for (double[] row : rows) {
      Complex mutual = alone.subtract(over(Ground.perfect(), 0.5 * row[0]).impedance());
      checks.add(
          new Check(
              "Mutual impedance side by side, spacing " + row[0] + " wavelengths",
              String.format(Locale.ROOT, "%.1f %+.1fj ohm", row[1], row[2]),
              String.format(
                  Locale.ROOT, "%.1f %+.1fj ohm", mutual.getReal(), mutual.getImaginary()),
              "±3 ohm",
              mutual.subtract(new Complex(row[1], row[2])).abs() <= 3,
              "Carter 1932, as in Kraus and King; integral recalculated"));
    }
    double[][] gains = {{0.1, 8.8}, {0.25, 7.5}, {0.5, 8.4}, {1.0, 8.2}};
    for (double[] row : gains) {
      checks.add(
          Check.within(
              "Peak gain at " + row[0] + " wavelengths",
              row[1],
              over(Ground.perfect(), row[0]).peak().dbi(),
              0.1,
              2,
              "dBi",
              "image theory with the table above (Kraus; Balanis 8.6), calculated"));
    }
    double[][] lobes = {{0.5, 30.0}, {1.0, 14.5}, {1.5, 9.6}, {2.0, 7.2}};
    for (double[] row : lobes) {
      checks.add(
          Check.within(
              "Lowest lobe's elevation at " + row[0] + " wavelengths",
              row[1],
              lowestLobe(over(Ground.perfect(), row[0])),
              0.1,
              1,
              "°",
              "sin α = λ/4h, image theory; the formula was seen on a teaching page"));
    }
    return checks;
  }

  private static double lowestLobe(Solution solution) {
    Directions fine = Directions.profile(0, 0, Math.PI / 4, 4501);
    double[] gain = solution.powerGains(fine);
    int i = 1;
    while (gain[i + 1] > gain[i]) {
      i++;
    }
    return 45.0 * i / 4500;
  }
}
