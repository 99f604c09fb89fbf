package spanwright.plan;

import java.util.ArrayList;
import java.util.List;
import spanwright.published.Check;
import spanwright.published.PublishedChecks;

/** The exposure limits of the catalogue at worked frequencies of the published tables. */
public class ExposureLimitTablesTest extends PublishedChecks {
  private static final String CFR = "47 CFR 1.1310, table 1";
  private static final String LOCAL =
      "ICNIRP 2020, Health Physics 118:483, local table, reprinted in a book";
  private static final String WHOLE =
      "ICNIRP 2020, Health Physics 118:483, whole-body table (from memory)";
  private static final String OLD = "ICNIRP 1998, Health Physics 74:494, table 7 (from memory)";

  @Override
  public String heading() {
    return "Catalogue: exposure limits";
  }

  @Override
  public String about() {
    return "Electric field [V/m] and magnetic field [A/m], rms, worked from the constants of the"
        + " tables; found by the rows of the catalogue.";
  }

  @Override
  public List<Check> checks() {
    List<Check> checks = new ArrayList<>();
    add(checks, "us-controlled", CFR, 1.9, 614, 1.63);
    add(checks, "us-controlled", CFR, 7.1, 259.4, 0.689);
    add(checks, "us-controlled", CFR, 28.5, 64.6, 0.172);
    add(checks, "us-controlled", CFR, 50.1, 61.4, 0.163);
    add(checks, "us-general", CFR, 1.9, 433.7, 1.153);
    add(checks, "us-general", CFR, 7.1, 116.1, 0.308);
    add(checks, "us-general", CFR, 28.5, 28.9, 0.0768);
    add(checks, "us-general", CFR, 50.1, 27.5, 0.073);
    add(checks, "icnirp-2020-public", WHOLE, 3.65, 121.2, 0.603);
    add(checks, "icnirp-2020-public", WHOLE, 14.175, 46.9, 0.155);
    add(checks, "icnirp-2020-public", WHOLE, 50.1, 27.7, 0.073);
    add(checks, "icnirp-2020-public-local", LOCAL, 3.65, 271.1, 1.342);
    add(checks, "icnirp-2020-public-local", LOCAL, 14.175, 104.9, 0.346);
    add(checks, "icnirp-2020-public-local", LOCAL, 50.1, 62, 0.163);
    add(checks, "icnirp-1998-public", OLD, 1.9, 63.1, 0.384);
    add(checks, "icnirp-1998-public", OLD, 7.1, 32.7, 0.103);
    add(checks, "icnirp-1998-public", OLD, 28.5, 28.0, 0.073);
    return checks;
  }

  private static void add(
      List<Check> checks, String id, String source, double f, double electric, double magnetic) {
    LimitSet set = Catalogues.standard().limitSet(id);
    LimitSet.Row row =
        set.rows().stream().filter(r -> f >= r.fromMHz() && f <= r.toMHz()).findFirst().get();
    double e = row.electric() * Math.pow(f, row.electricPower());
    double h = row.magnetic() * Math.pow(f, row.magneticPower());
    String what = set.name() + ", " + f + " MHz, ";
    // the worked figures are printed to three or four digits
    checks.add(Check.within(what + "E", electric, e, 0.1, 1, "V/m", source));
    checks.add(Check.within(what + "H", magnetic, h, 0.0006, 4, "A/m", source));
  }
}
