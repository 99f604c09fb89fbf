package spanwright.search;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import java.util.stream.Stream;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestFactory;
import spanwright.BrokenPlans;
import spanwright.assess.Placement;
import spanwright.clearance.Clearance;
import spanwright.clearance.State;
import spanwright.plan.Catalogue;
import spanwright.plan.Catalogues;
import spanwright.plan.DemoPlans;
import spanwright.plan.Json;
import spanwright.plan.OverheadLine;
import spanwright.plan.Plan;
import spanwright.plan.PlanReader;

/** The main job on the demo plots: what the ranking promises to a reader. */
class SearchTest {
  private static final Catalogue CATALOGUE = Catalogues.standard();

  private static Search.Options quick(int threads) {
    return new Search.Options(Effort.QUICK, 1, 12, threads);
  }

  private static Plan plan(DemoPlans.Demo demo) {
    return PlanReader.read(demo.json()).plan();
  }

  private static Result search(Plan plan) {
    return Search.run(plan, CATALOGUE, quick(2), new Search.Listener() {});
  }

  @TestFactory
  Stream<DynamicTest> every_demo_plot_gets_different_placements_that_keep_their_word() {
    return DemoPlans.list().stream()
        .map(demo -> DynamicTest.dynamicTest(demo.name(), () -> keepsItsWord(plan(demo))));
  }

  private static void keepsItsWord(Plan plan) {
    Result result = search(plan);
    assertTrue(result.placements().size() >= 3, "at least three placements");
    double before = Double.POSITIVE_INFINITY;
    Set<List<Object>> ideas = new HashSet<>();
    for (Placement placement : result.placements()) {
      assertTrue(placement.score() <= before, "best first");
      before = placement.score();
      ideas.add(List.of(placement.shape(), placement.attachments().toString()));
      assertEquals(
          placement.score(),
          placement.scoreParts().stream().mapToDouble(Placement.ScorePart::points).sum(),
          0.011,
          "score parts add up");
      nothingFoul(plan, placement);
    }
    assertEquals(result.placements().size(), ideas.size(), "all different");
    assertEquals(
        result.counts().considered(),
        result.counts().refused() + result.counts().screened() + result.counts().solved());
    everyNumberFinite(Json.mapper().valueToTree(result));
  }

  private static void nothingFoul(Plan plan, Placement placement) {
    assertFalse(placement.state() == State.FOUL);
    for (Clearance clearance : placement.clearances()) {
      assertFalse(clearance.state() == State.FOUL, clearance::toString);
    }
    for (OverheadLine line : plan.overheadLines()) {
      assertTrue(
          placement.clearances().stream().anyMatch(c -> c.to().equals(line.id())),
          "a clearance to " + line.id());
    }
    for (Placement.Attachment attachment : placement.attachments()) {
      if (attachment.pullLimit() != null) {
        assertTrue(attachment.pullInWind() <= attachment.pullLimit() + 0.1);
      }
    }
  }

  private static void everyNumberFinite(JsonNode node) {
    if (node.isNumber()) {
      assertTrue(Double.isFinite(node.asDouble()));
    }
    node.forEach(SearchTest::everyNumberFinite);
  }

  @Test
  void one_thread_and_three_give_the_same_answer() {
    Plan plan = plan(DemoPlans.list().get(0));
    Result one = Search.run(plan, CATALOGUE, quick(1), new Search.Listener() {});
    Result three = Search.run(plan, CATALOGUE, quick(3), new Search.Listener() {});
    assertEquals(one.placements(), three.placements());
    assertEquals(one.refusals(), three.refusals());
    assertEquals(one.counts(), three.counts());
  }

  @Test
  void progress_only_rises_and_what_is_found_is_told() {
    List<Double> shares = new ArrayList<>();
    List<Placement> found = new ArrayList<>();
    Search.run(
        plan(DemoPlans.list().get(0)),
        CATALOGUE,
        quick(2),
        new Search.Listener() {
          @Override
          public void progress(Search.Progress progress) {
            shares.add(progress.share());
          }

          @Override
          public void found(Placement placement) {
            found.add(placement);
          }
        });
    for (int i = 1; i < shares.size(); i++) {
      assertTrue(shares.get(i) >= shares.get(i - 1), shares::toString);
    }
    assertFalse(found.isEmpty());
  }

  @Test
  void a_search_that_is_told_to_stop_stops() {
    assertThrows(
        Search.CancelledException.class,
        () ->
            Search.run(
                plan(DemoPlans.list().get(0)),
                CATALOGUE,
                quick(2),
                new Search.Listener() {
                  @Override
                  public boolean cancelled() {
                    return true;
                  }
                }));
  }

  @Test
  void a_plot_where_no_wire_may_hang_says_what_is_in_the_way() {
    String zone =
        "\"zones\": [ { \"id\": \"field\", \"area\": [[-5,-5],[30,-5],[30,25],[-5,25]],"
            + " \"rule\": \"no-wire\" } ], \"entry\"";
    Result result = search(PlanReader.read(BrokenPlans.SOUND.replace("\"entry\"", zone)).plan());
    assertTrue(result.placements().isEmpty());
    assertFalse(result.refusals().isEmpty());
    assertTrue(result.refusals().stream().allMatch(r -> r.to().equals("field")));
    assertEquals(result.counts().considered(), result.counts().refused());
  }

  @Test
  void a_short_span_is_tried_on_a_low_band_when_there_is_no_other() {
    String json =
        BrokenPlans.SOUND
            .replace("\"at\": [22,12]", "\"at\": [12,12]")
            .replace("20 m", "80 m")
            .replace("14.175", "3.65");
    Result result = search(PlanReader.read(json).plan());
    assertFalse(result.placements().isEmpty());
    assertTrue(result.placements().get(0).conductors().get(0).length() < 10);
  }
}
