package spanwright.moments;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import org.apache.commons.math3.complex.Complex;
import spanwright.published.Check;
import spanwright.published.PublishedChecks;

/** All of solve-cases.json, on the 'full' mesh. */
public class IndependentSolverCasesTest extends PublishedChecks {
  private static final double WEAKEST_DB = 20;

  /** The file of cases, beside this class. */
  String resource() {
    return "solve-cases.json";
  }

  /** Where its values come from. */
  String source() {
    return "an independent Galerkin mixed-potential solver, extrapolated to zero segment length"
        + " (solve-cases.json; no publication)";
  }

  @Override
  public String heading() {
    return "Field solver: whole antennas";
  }

  @Override
  public String about() {
    return "Reflection coefficient on 400 ohm within 0.02 beyond the stated uncertainty, gains"
        + " (total, horizontal, vertical) within 0.15 dB down to 20 dB below the peak, peak within"
        + " 0.1 dB, efficiency within 0.01, near fields within 3 %.";
  }

  @Override
  public List<Check> checks() {
    Solver solver = new Solver();
    List<Check> checks = new ArrayList<>();
    for (SolveCase one : SolveCase.all(resource())) {
      Solution found = solver.solve(one.model(), one.ground(), one.frequencyMHz(), MeshAim.FULL);
      impedance(one, found, checks);
      gains(one, found, checks);
      checks.add(
          Check.within(
              one.id() + ": peak gain",
              one.expected().get("peak").get("dbi").asDouble(),
              found.peak().dbi(),
              0.1,
              2,
              "dBi",
              source()));
      checks.add(
          Check.within(
              one.id() + ": efficiency",
              one.expected().get("efficiency").asDouble(),
              found.efficiency(),
              0.01,
              3,
              "",
              source()));
      if (one.asked().has("fieldPoints")) {
        fields(one, found, checks);
      }
    }
    return checks;
  }

  private void impedance(SolveCase one, Solution found, List<Check> checks) {
    Complex z = one.impedance();
    Complex expected = SolveCase.reflection(z);
    double stated = SolveCase.reflection(z.add(one.uncertainty())).subtract(expected).abs();
    double off = SolveCase.reflection(found.impedance()).subtract(expected).abs();
    checks.add(
        new Check(
            one.id() + ": impedance",
            ohms(z),
            String.format(Locale.ROOT, "%s, coefficient off by %.3f", ohms(found.impedance()), off),
            String.format(Locale.ROOT, "coefficient (400 ohm) within %.4f", 0.02 + stated),
            off <= 0.02 + stated,
            source()));
  }

  private static String ohms(Complex z) {
    return String.format(Locale.ROOT, "%.1f %+.1fj ohm", z.getReal(), z.getImaginary());
  }

  private void gains(SolveCase one, Solution found, List<Check> checks) {
    double floor = one.expected().get("peak").get("dbi").asDouble() - WEAKEST_DB;
    double worst = 0;
    int compared = 0;
    int i = 0;
    for (JsonNode direction : one.asked().get("directions")) {
      JsonNode gain = one.expected().get("gains").get(i++);
      Gain g =
          found.gain(
              Math.toRadians(direction.get("azimuth").asDouble()),
              Math.toRadians(direction.get("elevation").asDouble()));
      double[] want = {
        gain.get("totalDbi").asDouble(),
        gain.get("horizontalDbi").asDouble(),
        gain.get("verticalDbi").asDouble()
      };
      double[] have = {g.totalDbi(), g.horizontalDbi(), g.verticalDbi()};
      for (int p = 0; p < 3; p++) {
        if (want[p] > floor) {
          worst = Math.max(worst, Math.abs(want[p] - have[p]));
          compared++;
        }
      }
    }
    checks.add(
        new Check(
            one.id() + ": " + compared + " gains",
            "as listed",
            String.format(Locale.ROOT, "at most %.2f dB off", worst),
            "±0.15 dB",
            worst <= 0.15 && compared > 0,
            source()));
  }

  private void fields(SolveCase one, Solution found, List<Check> checks) {
    List<NearField> fields =
        found.fields(
            SolveCase.points(one.asked().get("fieldPoints")), one.asked().get("power").asDouble());
    double worst = 0;
    for (int i = 0; i < fields.size(); i++) {
      JsonNode want = one.expected().get("fields").get(i);
      double e = fields.get(i).electric() / want.get("electric").asDouble() - 1;
      double h = fields.get(i).magnetic() / want.get("magnetic").asDouble() - 1;
      worst = Math.max(worst, Math.max(Math.abs(e), Math.abs(h)));
    }
    checks.add(
        new Check(
            one.id() + ": " + fields.size() + " points, electric and magnetic field",
            "as listed",
            String.format(Locale.ROOT, "at most %.1f %% off", 100 * worst),
            "±3 %",
            worst <= 0.03 && !fields.isEmpty(),
            source()));
  }
}
