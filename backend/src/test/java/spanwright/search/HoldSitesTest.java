package spanwright.search;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Locale;
import org.junit.jupiter.api.Test;
import spanwright.BrokenPlans;
import spanwright.plan.Catalogues;
import spanwright.plan.GroundSurface;
import spanwright.plan.Plan;
import spanwright.plan.PlanReader;

/** Where a wire can be held. */
class HoldSitesTest {
  private static Plan plan(String lists) {
    String json =
        BrokenPlans.SOUND
            .replace("\"entry\"", lists + ", \"entry\"")
            .replace("\"brief\": {", "\"brief\": { \"newMasts\": 1,");
    PlanReader.Outcome outcome = PlanReader.read(json);
    if (outcome.plan() == null) {
      throw new IllegalStateException(outcome.faults().toString());
    }
    return outcome.plan();
  }

  private static List<HoldSite> sites(Plan plan, Effort effort) {
    GroundSurface ground = GroundSurface.of(plan);
    MastLimits limits = new MastLimits(plan, Catalogues.standard(), ground);
    return HoldSites.of(plan, ground, effort, 1, foot -> limits.highest(foot.zone(), foot.at()));
  }

  private static String bed(String id, double x, double y, String more) {
    return String.format(
        Locale.ROOT,
        "{ \"id\": \"%s\", \"area\": [[%5$.1f,%3$.1f],[%2$.1f,%3$.1f],[%2$.1f,%4$.1f]], \"highest\": 6"
            + more
            + " }",
        id,
        x + 1,
        y,
        y + 1,
        x);
  }

  @Test
  void what_may_take_no_pull_holds_nothing() {
    String lists =
        "\"bracketLines\": [ { \"id\": \"eaves\", \"path\": [[1,6],[7,6]], \"lowest\": 3.8,"
            + " \"highest\": 4, \"pullLimit\": 0 } ], \"mastZones\": ["
            + bed("bed", 10, 10, ", \"pullLimit\": 0")
            + "]";
    assertEquals(
        List.of("west", "east"),
        sites(plan(lists), Effort.NORMAL).stream().map(HoldSite::on).toList());
  }

  @Test
  void a_zone_where_any_mast_could_fall_on_a_line_offers_one_so_that_it_is_refused_aloud() {
    String line =
        ", \"overheadLines\": [ { \"id\": \"grid\", \"path\": [[-5,11,5],[30,11,5]],"
            + " \"kind\": \"medium-voltage\" } ]";
    String zone = "\"mastZones\": [" + bed("bed", 10, 10, "") + "]";
    assertTrue(sites(plan(zone), Effort.NORMAL).size() > 4);
    List<HoldSite> near = sites(plan(zone + line), Effort.NORMAL);
    assertEquals(List.of("west", "east", "bed"), near.stream().map(HoldSite::on).toList());
    assertEquals(List.of(6.0), near.get(2).heights());
  }

  @Test
  void a_plan_with_hundreds_of_zones_is_thinned() {
    StringBuilder zones = new StringBuilder();
    for (int i = 0; i < 150; i++) {
      zones.append(i == 0 ? "" : ",").append(bed("bed" + i, 0.1 + i % 20, 7 + i / 20, ""));
    }
    List<HoldSite> sites = sites(plan("\"mastZones\": [" + zones + "]"), Effort.THOROUGH);
    assertEquals(300, sites.size());
    assertEquals("west", sites.get(0).on());
    assertTrue(sites.stream().anyMatch(site -> site.on().equals("bed149")));
  }
}
