package spanwright.clearance;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Random;
import java.util.Set;
import org.junit.jupiter.api.Test;
import spanwright.plan.Catalogue;
import spanwright.plan.Catalogues;
import spanwright.plan.GroundSurface;
import spanwright.plan.Plan;
import spanwright.rigging.Holder;
import spanwright.rigging.Layout;
import spanwright.rigging.Plots;
import spanwright.rigging.Rigged;
import spanwright.rigging.Rigging;

/** Cures, applied: each removes its refusal, and all of them when it says nothing of others. */
class CuresTest {
  private static final Catalogue CATALOGUE = Catalogues.standard();

  private record Found(Rigging rigging, Clearances clearances, List<Refusal> refusals) {}

  private static Found refuse(Plan plan, Layout layout) {
    Rigging rigging = Rigging.of(plan, CATALOGUE);
    Clearances clearances = Clearances.of(plan, CATALOGUE);
    Rigged rigged = rigging.hang(layout);
    return new Found(
        rigging, clearances, clearances.refuse(layout, rigged, clearances.check(rigged)));
  }

  /** What is foul after a cure. */
  private static Set<String> left(Found found, Refusal refusal) {
    Rigged again = found.rigging().hang(refusal.after());
    return Trials.fouls(again, found.clearances().check(again));
  }

  private static void hold(Found found, Refusal refusal) {
    if (refusal.after() == null) {
      assertTrue(refusal.cure().contains("Nothing tried cures it"), refusal.cure());
      assertEquals(List.of(), refusal.cured());
      return;
    }
    Set<String> left = left(found, refusal);
    assertFalse(left.contains(refusal.rule() + "|" + refusal.to()), refusal.cure());
    boolean others = refusal.cure().contains(" remain");
    assertEquals(others, !left.isEmpty(), refusal.cure() + " leaves " + left);
    assertEquals(refusal.reason(), refusal.lacks().get(0));
  }

  @Test
  void every_cure_applied_removes_its_refusal() {
    int cured = 0;
    int paired = 0;
    for (int seed = 0; seed < 9; seed++) {
      Random random = new Random(seed);
      Plan plan = RandomPlots.plan(random);
      Layout layout = RandomPlots.layout(random, plan, Rigging.of(plan, CATALOGUE));
      if (layout == null) {
        continue;
      }
      Found found = refuse(plan, layout);
      for (Refusal refusal : found.refusals()) {
        hold(found, refusal);
        cured += refusal.after() != null ? 1 : 0;
        paired += refusal.cure().contains(", and ") ? 1 : 0;
      }
    }
    assertTrue(cured > 4, cured + " cured, " + paired + " by two changes");
  }

  private static Plan walled(String people) {
    String drive =
        """
        [ { "id": "drive", "name": "Drive", "area": [[28,20],[32,20],[32,40],[28,40]], "rule": "headroom", "height": 6.5 } ]""";
    Plots plots = Plots.bare().poles("").entry("[50, 20]").with("zones", drive);
    return (people.isEmpty() ? plots : plots.with("people", people)).plan();
  }

  private static final Layout LOW =
      Plots.straight("level", 2, 0.5, Plots.hold("west", 15, 30, 6), Plots.hold("east", 45, 30, 6));

  @Test
  void the_smallest_change_is_told_to_the_hand() {
    Found found = refuse(walled(""), LOW);
    Refusal refusal = found.refusals().get(0);
    assertEquals("zone-headroom", refusal.rule());
    hold(found, refusal);
    // A hand less does not do.
    double raised = refusal.after().attachments().get(0).at().z();
    double other = refusal.after().attachments().get(1).at().z();
    double less = 0.1;
    Layout almost =
        Plots.straight(
            "level",
            2,
            0.5,
            Plots.hold("west", 15, 30, raised > 6 ? raised - less : raised),
            Plots.hold("east", 45, 30, other > 6 ? other - less : other));
    Rigged hung = found.rigging().hang(almost);
    assertFalse(Trials.fouls(hung, found.clearances().check(hung)).isEmpty());
  }

  @Test
  void a_move_within_a_zone_or_along_a_wall_falls_away_once_another_hold_took_the_end_off_it() {
    String pole =
        """
        [ { "id": "west", "kind": "other", "at": [15, 30], "lowest": 2, "highest": 10 },
          { "id": "east", "kind": "other", "at": [45, 30], "lowest": 2, "highest": 10 } ]""";
    Plan plan = Plots.bare().with("supports", pole).plan();
    GroundSurface level = GroundSurface.of(plan);
    List<Layout.Hold> holds = List.of(Plots.hold("west", 15, 30, 8), Plots.hold("east", 45, 30, 8));
    for (Change.Kind kind : List.of(Change.Kind.MOVE, Change.Kind.SLIDE)) {
      Change change = new Change(kind, 1, 1, 0.5, null);
      assertNull(change.holds(holds, Holder.all(plan)::get, level), kind.toString());
    }
  }

  @Test
  void nothing_cures_it_is_said_where_nothing_does() {
    String everywhere =
        """
        [ { "id": "court", "name": "Court", "area": [[1,1],[59,1],[59,59],[1,59]], "from": 0, "to": 20 } ]""";
    Found found = refuse(walled(everywhere), LOW);
    Refusal people =
        found.refusals().stream().filter(r -> r.rule().equals("people")).findFirst().orElseThrow();
    assertNull(people.after());
    assertTrue(people.cure().contains("Nothing tried cures it"), people.cure());
    assertEquals(found.refusals().size(), people.lacks().size());
  }
}
