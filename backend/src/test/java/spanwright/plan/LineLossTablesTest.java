package spanwright.plan;

import java.util.ArrayList;
import java.util.List;
import spanwright.published.Check;
import spanwright.published.PublishedChecks;

/** The matched loss of the catalogue's feed lines against printed figures and the copper floor. */
public class LineLossTablesTest extends PublishedChecks {
  private static final double METRES_PER_100_FEET = 30.48;
  private static final String LICENCE = "licence-manual correction table";
  private static final String LIST = "compiled cable list";
  private static final String FLOOR = "copper floor: 8.686·R/(2·Z0), R = 2·Rs/(π·d), calculated";

  @Override
  public String heading() {
    return "Catalogue: feed lines";
  }

  @Override
  public String about() {
    return "Matched loss in dB per 100 ft, k1·√f + k2·f. Coaxial figures within the 10 to 15 % by"
        + " which lists differ; two-wire lines are held to the loss of their copper alone, which"
        + " they may pass by their small dielectric term (handbook figures for 450-ohm window"
        + " line lie below that floor and are not used).";
  }

  @Override
  public List<Check> checks() {
    List<Check> checks = new ArrayList<>();
    coax(checks, "coax-50-5mm", 30, 2.47, 0.1, LICENCE);
    coax(checks, "coax-50-5mm", 150, 5.63, 0.1, LICENCE);
    coax(checks, "coax-50-5mm", 10, 1.5, 0.15, LIST);
    coax(checks, "coax-50-6mm-foam", 30, 1.96, 0.1, LICENCE);
    coax(checks, "coax-50-6mm-foam", 150, 4.53, 0.1, LICENCE);
    coax(checks, "coax-50-10mm", 30, 1.08, 0.1, LICENCE);
    coax(checks, "coax-50-10mm", 150, 2.53, 0.1, LICENCE);
    coax(checks, "coax-75-6mm", 10, 1.1, 0.15, LIST);
    coax(checks, "coax-50-3mm", 10, 3.3, 0.15, LIST);
    double[] frequencies = {3.65, 7.1, 14.175, 28.5};
    floor(checks, "open-600", frequencies, 0.034, 0.048, 0.067, 0.095);
    floor(checks, "window-400", frequencies, 0.103, 0.143, 0.202, 0.287);
    floor(checks, "ribbon-300", frequencies, 0.217, 0.303, 0.428, 0.608);
    return checks;
  }

  private static double loss(LineKind line, double f) {
    double per100m = line.conductorLoss() * Math.sqrt(f) + line.dielectricLoss() * f;
    return per100m * METRES_PER_100_FEET / 100;
  }

  private static void coax(
      List<Check> checks, String id, double f, double printed, double share, String source) {
    LineKind line = Catalogues.standard().line(id);
    String what = line.name() + ", " + f + " MHz";
    double allowed = Math.round(share * printed * 1000) / 1000.0;
    checks.add(Check.within(what, printed, loss(line, f), allowed, 2, "dB/100 ft", source));
  }

  private static void floor(List<Check> checks, String id, double[] f, double... printed) {
    LineKind line = Catalogues.standard().line(id);
    for (int i = 0; i < f.length; i++) {
      String what = line.name() + ", copper alone, " + f[i] + " MHz";
      double copper = line.conductorLoss() * Math.sqrt(f[i]) * METRES_PER_100_FEET / 100;
      double allowed = Math.round(0.03 * printed[i] * 10000) / 10000.0;
      checks.add(Check.within(what, printed[i], copper, allowed, 3, "dB/100 ft", FLOOR));
    }
  }
}
