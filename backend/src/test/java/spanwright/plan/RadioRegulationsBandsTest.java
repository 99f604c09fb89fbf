package spanwright.plan;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import spanwright.published.Check;
import spanwright.published.PublishedChecks;

/** The bands of the catalogue against the Radio Regulations as printed in 47 CFR 97.301. */
public class RadioRegulationsBandsTest extends PublishedChecks {
  private static final String TABLE = "Radio Regulations article 5, as printed in 47 CFR 97.301";

  @Override
  public String heading() {
    return "Catalogue: bands";
  }

  @Override
  public String about() {
    return "Edges in MHz by ITU region. The national table decides.";
  }

  @Override
  public List<Check> checks() {
    List<Check> checks = new ArrayList<>();
    add(checks, "160m", edges(1.81, 1.85), edges(1.8, 2.0), edges(1.8, 2.0), TABLE);
    add(checks, "80m", edges(3.5, 3.8), edges(3.5, 4.0), edges(3.5, 3.9), TABLE);
    same(checks, "60m", edges(5.3515, 5.3665), "account of the 2015 world radio conference");
    add(checks, "40m", edges(7.0, 7.2), edges(7.0, 7.3), edges(7.0, 7.2), "a band note");
    same(checks, "30m", edges(10.1, 10.15), TABLE);
    same(checks, "20m", edges(14.0, 14.35), TABLE);
    same(checks, "17m", edges(18.068, 18.168), TABLE);
    same(checks, "15m", edges(21.0, 21.45), TABLE);
    same(checks, "12m", edges(24.89, 24.99), "Radio Regulations article 5 (from memory)");
    same(checks, "10m", edges(28.0, 29.7), "a band-plan listing");
    add(
        checks,
        "6m",
        edges(50, 52),
        edges(50, 54),
        edges(50, 54),
        "accounts of the 2019 world radio conference; 47 CFR 97.301");
    return checks;
  }

  private static List<Double> edges(double from, double to) {
    return List.of(from, to);
  }

  private static void same(List<Check> checks, String id, List<Double> edges, String source) {
    add(checks, id, edges, edges, edges, source);
  }

  private static void add(
      List<Check> checks,
      String id,
      List<Double> one,
      List<Double> two,
      List<Double> three,
      String source) {
    BandKind band =
        Catalogues.standard().bands().stream().filter(b -> b.id().equals(id)).findFirst().get();
    Map<String, List<Double>> expected = Map.of("1", one, "2", two, "3", three);
    checks.add(
        new Check(
            band.name(),
            one + " " + two + " " + three,
            band.regions().get("1") + " " + band.regions().get("2") + " " + band.regions().get("3"),
            "exact",
            band.regions().equals(expected),
            source));
  }
}
