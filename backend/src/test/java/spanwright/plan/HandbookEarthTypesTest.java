package spanwright.plan;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import spanwright.published.Check;
import spanwright.published.PublishedChecks;

/** The soils of the catalogue against the handbook table of earth types and Rec. ITU-R P.527. */
public class HandbookEarthTypesTest extends PublishedChecks {
  private static final String TABLE =
      "table of earth types in handbooks (Terman 1943 lineage), read on a hobby reference page";

  @Override
  public String heading() {
    return "Catalogue: soils";
  }

  @Override
  public String about() {
    return "Permittivity and conductivity [S/m], taken over as printed.";
  }

  @Override
  public List<Check> checks() {
    List<Check> checks = new ArrayList<>();
    add(checks, "rich-best", 20, 0.0303, TABLE);
    add(checks, "rich", 14, 0.01, TABLE);
    add(checks, "marsh", 12, 0.0075, TABLE);
    add(checks, "wood", 13, 0.006, TABLE);
    add(checks, "clay", 13, 0.005, TABLE);
    add(checks, "rock", 13, 0.002, TABLE + ": 12 to 14");
    add(checks, "sand", 10, 0.002, TABLE);
    add(checks, "town", 5, 0.001, TABLE);
    add(checks, "industry", 3, 0.001, TABLE);
    add(checks, "fresh-water", 80, 0.001, TABLE);
    add(checks, "salt-water", 81, 5, TABLE);
    add(checks, "itu-wet", 30, 0.01, "Rec. ITU-R P.527-3, figure 1; pair seen in P.368 data");
    add(checks, "itu-medium-dry", 15, 0.001, "Rec. ITU-R P.527-3, figure 1 (from memory)");
    add(checks, "itu-very-dry", 3, 0.0001, "Rec. ITU-R P.527-3, figure 1; pair seen in P.368 data");
    return checks;
  }

  private static void add(
      List<Check> checks, String id, double permittivity, double conductivity, String source) {
    SoilKind soil = Catalogues.standard().soil(id);
    checks.add(
        new Check(
            soil.name(),
            pair(permittivity, conductivity),
            pair(soil.permittivity(), soil.conductivity()),
            "exact",
            soil.permittivity() == permittivity && soil.conductivity() == conductivity,
            source));
  }

  private static String pair(double permittivity, double conductivity) {
    return String.format(Locale.ROOT, "%.0f, %.4f", permittivity, conductivity);
  }
}
