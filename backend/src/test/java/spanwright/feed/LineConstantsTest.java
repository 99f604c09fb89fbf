package spanwright.feed;

import java.util.ArrayList;
import java.util.List;
import org.apache.commons.math3.complex.Complex;
import org.apache.commons.math3.util.FastMath;
import spanwright.published.Check;
import spanwright.published.PublishedChecks;

/** Line constants against printed answers and the closed formula. */
public class LineConstantsTest extends PublishedChecks {
  private static final String PAUL =
      "Paul, Analysis of Multiconductor Transmission Lines, problem 2.5, printed answer";
  private static final String BIRD = "Bird, Electrical Circuit Theory and Technology, problem ";
  private static final String ACOSH =
      "Z0 = (eta0/pi) acosh(D/d), standard result, worked out apart";
  private static final double COPPER = 5.8e7;

  @Override
  public String heading() {
    return "Feed line: constants";
  }

  @Override
  public String about() {
    return "Two-wire lines from their dimensions and lines from their primary constants. The printed"
        + " answers of Paul take ε0 as 1/36π nF/m, hence 0.2 %.";
  }

  @Override
  public List<Check> checks() {
    List<Check> checks = new ArrayList<>();
    double mil = 25.4e-6;
    TwoWire close = new TwoWire(50 * mil, 32 * mil, 1, COPPER);
    String wires = "two bare wires, radius 16 mil, 50 mil apart: ";
    add(checks, wires + "capacitance", 27.33, close.capacitance() * 1e12, 0.2, "pF/m", PAUL);
    add(checks, wires + "inductance", 0.4065, close.inductance() * 1e6, 0.2, "µH/m", PAUL);
    add(checks, wires + "impedance", 122, close.impedance(), 0.2, "ohm", PAUL);
    double[][] ratios = {
      {2, 157.9},
      {6, 297.1},
      {10, 358.9},
      {20, 442.3},
      {75, 600.9},
      {6.14, 300},
      {14.07, 400},
      {21.3, 450},
      {74.5, 600}
    };
    for (double[] row : ratios) {
      double found = new TwoWire(row[0] * 1e-3, 1e-3, 1, COPPER).impedance();
      add(checks, "impedance of two wires, D/d = " + row[0], row[1], found, 0.2, "ohm", ACOSH);
    }
    double[][] made = {{2.053, 152, 599.6}, {1.024, 25.4, 468}, {1.628, 25.4, 412}};
    for (double[] row : made) {
      double found = new TwoWire(row[1] / 1e3, row[0] / 1e3, 1, COPPER).impedance();
      String what = "impedance, " + row[0] + " mm wires " + row[1] + " mm apart";
      add(checks, what, row[2], found, 0.2, "ohm", ACOSH);
    }
    LineConstants lossless = LineConstants.ofPrimary(0, 0.5e-6, 0, 0.12e-9, 400e3);
    add(
        checks,
        "0.5 mH/km, 0.12 µF/km: impedance",
        64.55,
        lossless.impedance().getReal(),
        0.1,
        "ohm",
        BIRD + "44.8");
    add(
        checks,
        "0.5 mH/km, 0.12 µF/km: velocity",
        129.1,
        2 * Math.PI * 400e3 / lossless.phase() / 1e6,
        0.1,
        "Mm/s",
        BIRD + "44.8");
    addTelephoneLine(checks);
    addCopper(checks);
    return checks;
  }

  private static void addTelephoneLine(List<Check> checks) {
    LineConstants line = LineConstants.ofPrimary(8e-3, 3e-6, 0.25e-9, 7.5e-12, 1000);
    Complex z0 = line.impedance();
    String what = "8 ohm/km, 3 mH/km, 7500 pF/km, 0.25 µS/km at 1 kHz: ";
    String source = BIRD + "44.10";
    add(checks, what + "resistance of Z0", 646.3, z0.getReal(), 0.1, "ohm", source);
    add(checks, what + "reactance of Z0", -129.7, z0.getImaginary(), 0.1, "ohm", source);
    add(checks, what + "attenuation", 6.273, line.attenuation() * 1e6, 0.1, "mNp/km", source);
    add(checks, what + "phase", 30.424, line.phase() * 1e6, 0.1, "mrad/km", source);
  }

  /** Copper alone, dB per 100 ft: no real line loses less. */
  private static void addCopper(List<Check> checks) {
    double[] frequencies = {3.65, 7.1, 14.175, 28.5};
    double[][] rows = {
      {600, 2.053, 0.034, 0.048, 0.067, 0.095},
      {400, 1.024, 0.103, 0.143, 0.202, 0.287},
      {300, 0.644, 0.217, 0.303, 0.428, 0.608}
    };
    for (double[] row : rows) {
      double spacing = row[1] / 1e3 * FastMath.cosh(Math.PI * row[0] / 376.7303);
      TwoWire line = new TwoWire(spacing, row[1] / 1e3, 1, COPPER);
      for (int k = 0; k < 4; k++) {
        String what =
            "copper loss, "
                + (int) row[0]
                + " ohm, "
                + row[1]
                + " mm wire, "
                + frequencies[k]
                + " MHz";
        double found = line.conductorLossDbPer100m(frequencies[k]) * 0.3048;
        add(
            checks,
            what,
            row[k + 2],
            found,
            3,
            "dB/100 ft",
            "skin effect, wires taken alone, worked out apart");
      }
    }
  }

  private static void add(
      List<Check> checks,
      String what,
      double expected,
      double found,
      double percent,
      String unit,
      String source) {
    int decimals = Math.abs(expected) < 1 ? 4 : Math.abs(expected) < 100 ? 3 : 1;
    double allowed = Math.round(Math.abs(expected) * percent * 1e4) / 1e6;
    checks.add(Check.within(what, expected, found, allowed, decimals, unit, source));
  }
}
