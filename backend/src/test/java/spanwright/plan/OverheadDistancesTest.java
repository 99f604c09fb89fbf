package spanwright.plan;

import java.util.ArrayList;
import java.util.List;
import spanwright.published.Check;
import spanwright.published.PublishedChecks;

/** The kept distances of the rules against the codes they are taken from. */
public class OverheadDistancesTest extends PublishedChecks {
  @Override
  public String heading() {
    return "Rules: distances kept from overhead lines";
  }

  @Override
  public String about() {
    return "Defaults only: the line's owner, local code and licensed practice decide.";
  }

  @Override
  public List<Check> checks() {
    String osha = "US 29 CFR 1926.1408, table A";
    List<Check> checks = new ArrayList<>();
    add(checks, "overhead-telephone", 2, "NFPA 70, 810.13: 2 ft (0.6 m) up to 250 V");
    add(checks, "overhead-low-voltage", 10, osha + ": 10 ft up to 50 kV");
    add(checks, "overhead-medium-voltage", 10, osha + ": 10 ft up to 50 kV");
    add(checks, "overhead-high-voltage", 20, osha + ": 20 ft up to 350 kV");
    add(checks, "overhead-unknown", 20, "US 29 CFR 1926.1408: 20 ft, voltage unknown");
    checks.add(
        Check.within(
            "feed line clear of a building",
            75,
            1000 * Catalogues.standard().rule("building-feed-line").defaultValue(),
            0,
            0,
            "mm",
            "NFPA 70, 810.54: transmitting lead-in 75 mm (3 in)"));
    return checks;
  }

  private static void add(List<Check> checks, String id, double feet, String source) {
    RuleKind rule = Catalogues.standard().rule(id);
    double found = rule.defaultValue();
    // metres are rounded as the codes print them
    checks.add(Check.within(rule.name(), feet * 0.3048, found, 0.01, 2, "m", source));
  }
}
