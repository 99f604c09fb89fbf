package spanwright.rigging;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.Test;
import spanwright.plan.Catalogues;
import spanwright.plan.Place;
import spanwright.plan.Plan;

class RiggingTest {
  private static final String TREE =
      """
      , { "id": "oak", "name": "Oak", "kind": "tree", "at": [15, 50], "lowest": 3, "highest": 9,
          "sway": 0.5, "pullLimit": 250, "canopy": { "radius": 3, "from": 3, "to": 12 } },
        { "id": "frail", "name": "Frail pole", "kind": "pole", "at": [45, 50], "lowest": 2, "highest": 8, "pullLimit": 90 },
        { "id": "never", "name": "Chimney", "kind": "chimney", "at": [30, 50], "lowest": 2, "highest": 8, "pullLimit": 0 }""";

  private static final Layout.Hold WEST = Plots.hold("west", 15, 30, 9);
  private static final Layout.Hold EAST = Plots.hold("east", 45, 30, 9);

  private static Rigged hang(Plan plan, Layout layout) {
    return Rigging.hang(plan, Catalogues.standard(), layout);
  }

  @Test
  void the_wire_keeps_its_length_and_the_ropes_take_up_the_rest() {
    Rigged rigged =
        hang(Plots.bare().poles("").plan(), Plots.straight("level", 5, 0.5, WEST, EAST));
    Rigged.Span span = rigged.spans().get(0);
    assertEquals(20, rigged.conductors().get(0).length(), 1e-9);
    assertEquals(20, span.wireLength(), 1e-9);
    assertEquals(5, span.ropeFrom(), 1e-9);
    assertTrue(span.ropeTo() > 5 && span.ropeTo() < 5.5, "the sag takes rope: " + span.ropeTo());
    assertEquals(WEST.at(), span.shapes().calm().get(0));
    assertEquals(EAST.at(), span.shapes().calm().get(span.shapes().calm().size() - 1));
    assertTrue(span.sag() >= 0.01 * 30 * 0.9 && span.sag() < 0.06 * 30, "sag " + span.sag());
    assertTrue(rigged.shortcomings().isEmpty(), rigged.shortcomings().toString());
  }

  @Test
  void hanging_what_was_hung_changes_nothing() {
    Plan plan = Plots.bare().poles(TREE).plan();
    Layout first = Plots.straight("bent", 4.8, 0.45, Plots.hold("oak", 15, 50, 8), WEST, EAST);
    Rigged once = hang(plan, first);
    Layout again =
        new Layout(
            first.shape(),
            first.attachments(),
            List.of(
                new Layout.Run(
                    once.conductors().get(0).shapes().calm(), once.conductors().get(0).wire())),
            first.feed());
    Rigged twice = hang(plan, again);
    List<Place> a = once.conductors().get(0).shapes().calm();
    List<Place> b = twice.conductors().get(0).shapes().calm();
    assertEquals(a.size(), b.size());
    for (int i = 0; i < a.size(); i++) {
      assertTrue(a.get(i).distance(b.get(i)) < 0.02, i + ": " + a.get(i) + " " + b.get(i));
    }
    assertEquals(once.conductors().get(0).length(), twice.conductors().get(0).length(), 2e-3);
  }

  @Test
  void a_conductor_drawn_the_other_way_round_hangs_the_same() {
    Plan plan = Plots.bare().poles("").plan();
    Layout one = Plots.straight("off-centre", 5, 0.3, WEST, EAST);
    List<Place> back = new java.util.ArrayList<>(one.conductors().get(0).points());
    java.util.Collections.reverse(back);
    Layout other =
        new Layout(
            one.shape(),
            one.attachments(),
            List.of(new Layout.Run(back, null)),
            new Layout.FeedChoice(0, 0.7, null, null));
    Place first = hang(plan, one).feedLine().feedpoint();
    assertTrue(first.distance(hang(plan, other).feedLine().feedpoint()) < 1e-6);
  }

  @Test
  void a_tree_gets_a_counterweight_and_its_pull_is_the_whole_of_it() {
    Plan plan = Plots.bare().poles(TREE).plan();
    Rigged rigged =
        hang(plan, Plots.straight("level", 4.8, 0.5, WEST, Plots.hold("oak", 15, 50, 8)));
    Rigged.Attachment oak = rigged.attachments().get(1);
    assertEquals("weight", oak.held());
    assertEquals(rigged.spans().get(0).tension(), oak.kilograms() * Hanging.GRAVITY, 1e-9);
    double most = rigged.spans().get(0).tension() * Math.sqrt(2);
    assertEquals(most, oak.pull().size(), 0.2 * most);
    assertTrue(oak.pullInWind().size() <= 250);
    assertTrue(rigged.spans().get(0).freeTo() > 4, "its rope down to the weight would run out");
  }

  @Test
  void a_frail_support_is_not_pulled_beyond_what_it_may_take() {
    Plan plan = Plots.bare().poles(TREE).plan();
    Rigged rigged =
        hang(plan, Plots.straight("sloping", 3, 0.5, EAST, Plots.hold("frail", 45, 50, 8)));
    Rigged.Attachment frail = rigged.attachments().get(1);
    assertTrue(frail.pull().size() <= 90, "calm " + frail.pull().size());
    assertTrue(frail.pullInWind().size() <= 90, "gust " + frail.pullInWind().size());
    assertTrue(rigged.shortcomings().isEmpty(), rigged.shortcomings().toString());
  }

  @Test
  void nothing_hangs_on_what_must_never_be_used() {
    Plan plan = Plots.bare().poles(TREE).plan();
    Rigged rigged =
        hang(plan, Plots.straight("level", 1, 0.5, WEST, Plots.hold("never", 30, 50, 8)));
    assertTrue(
        rigged.shortcomings().stream()
            .anyMatch(each -> each.rule().equals("support-pull") && each.to().equals("never")));
  }

  @Test
  void pulls_on_all_attachments_add_up_to_what_hangs() {
    Plan plan = Plots.bare().poles(TREE).plan();
    Rigged rigged = hang(plan, Plots.straight("level", 5, 0.5, WEST, EAST));
    Force sum = Force.NONE;
    for (Rigged.Attachment each : rigged.attachments()) {
      sum = sum.plus(each.pull());
    }
    var catalogue = Catalogues.standard();
    double wire =
        catalogue.wires().stream().filter(each -> each.isDefault()).findFirst().get().weight() * 20;
    var rope = catalogue.ropes().stream().filter(each -> each.isDefault()).findFirst().get();
    double ropes =
        rope.weight() * (rigged.spans().get(0).ropeFrom() + rigged.spans().get(0).ropeTo());
    double hung =
        wire + ropes + 2 * Practice.INSULATOR_WEIGHT + rigged.feedLine().weightOnFeedpoint();
    assertEquals(0, Math.hypot(sum.x(), sum.y()), 1e-5);
    // The lengths are as they hang, a few parts in a thousand longer than what weighs.
    assertEquals(-hung * Hanging.GRAVITY, sum.z(), 0.004 * hung * Hanging.GRAVITY);
  }

  @Test
  void a_gust_blows_out_both_ways_and_ice_hangs_lower() {
    Layout layout = Plots.straight("level", 5, 0.5, WEST, EAST);
    Rigged rigged = hang(Plots.bare().poles("").rules("\"wind\": 25, \"ice\": 8").plan(), layout);
    Rigged.Span span = rigged.spans().get(0);
    int middle = span.shapes().calm().size() / 2;
    double left = span.shapes().left().get(middle).y() - 30;
    double right = span.shapes().right().get(middle).y() - 30;
    assertEquals(left, -right, 1e-9);
    assertTrue(left > 0.3, "blown to the left of west to east: " + left);
    assertTrue(span.shapes().iced().get(middle).z() < span.shapes().calm().get(middle).z() - 0.02);
    Rigged calm = Rigging.of(Plots.bare().poles("").plan(), Catalogues.standard()).hangCalm(layout);
    assertEquals(calm.spans().get(0).shapes().calm(), calm.spans().get(0).shapes().left());
  }

  @Test
  void a_middle_attachment_takes_the_feed_line_and_both_legs() {
    Plan plan =
        Plots.bare()
            .poles("")
            .with(
                "mastZones",
                """
                [ { "id": "bed", "name": "Bed", "area": [[25,35],[35,35],[35,45],[25,45]], "highest": 9, "guyRadius": 3,
                    "consents": [ { "highest": 3, "needs": "none" }, { "highest": 9, "needs": "permission" } ] } ]""")
            .plan();
    Layout apex = Plots.straight("apex", 2, 0.5, WEST, Plots.hold("bed", 30, 40, 8.5), EAST);
    Rigged rigged = hang(plan, apex);
    assertEquals(1, rigged.feedLine().held());
    assertEquals("centre", rigged.attachments().get(1).held());
    assertEquals(1, rigged.masts().size());
    Rigged.Mast mast = rigged.masts().get(0);
    assertEquals(8.5, mast.height(), 1e-9);
    assertEquals("permission", mast.consent());
    assertEquals(3, mast.guyFeet().size());
    assertTrue(rigged.conductors().get(0).shapes().calm().size() <= 60);
    assertTrue(rigged.attachments().get(1).pull().z() < -0.3 * Hanging.GRAVITY);
  }

  @Test
  void wire_beyond_the_last_attachment_hangs_down() {
    Plan plan = Plots.bare().poles("").plan();
    Layout drooping =
        new Layout(
            "drooping",
            List.of(WEST, EAST),
            List.of(
                new Layout.Run(
                    List.of(
                        new Place(15, 30, 6),
                        new Place(15, 30, 9),
                        new Place(45, 30, 9),
                        new Place(45, 30, 5)),
                    null)),
            new Layout.FeedChoice(0, 0.5, null, null));
    Rigged rigged = hang(plan, drooping);
    assertEquals(2, rigged.tails().size());
    assertEquals(37, rigged.conductors().get(0).length(), 1e-9);
    List<Place> calm = rigged.conductors().get(0).shapes().calm();
    assertEquals(6, calm.get(0).z(), 1e-6);
    assertEquals(5, calm.get(calm.size() - 1).z(), 1e-6);
    assertTrue(calm.size() <= 60);
  }

  @Test
  void the_feed_line_goes_round_the_eaves_of_its_own_house() {
    Plan plan =
        Plots.bare()
            .poles("")
            .entry("[30, 16]")
            .with(
                "buildings",
                """
                [ { "id": "house", "name": "House", "footprint": [[24,16],[36,16],[36,24],[24,24]], "eaves": 5, "ridge": 7,
                    "roof": "gable", "ridgeLine": [[24,20],[36,20]] } ]""")
            .plan();
    Rigged rigged = hang(plan, Plots.straight("level", 5, 0.5, WEST, EAST));
    Roof roof = Roof.of(plan.buildings().get(0), spanwright.plan.GroundSurface.of(plan));
    List<Place> run = rigged.feedLine().shapes().calm();
    for (Place each : run.subList(0, run.size() - 1)) {
      boolean inside =
          roof.covers(each.x(), each.y()) && each.z() < roof.heightAt(each.x(), each.y());
      assertFalse(inside, each.toString());
    }
    assertEquals(new Place(30, 16, 1.5), run.get(run.size() - 1));
    assertTrue(rigged.feedLine().length() >= rigged.feedLine().runLength());
  }

  @Test
  void what_makes_no_sense_is_told_in_a_sentence() {
    Plan plan = Plots.bare().poles("").plan();
    says(plan, "no support", Plots.straight("level", 1, 0.5, WEST, Plots.hold("moon", 1, 1, 9)));
    says(plan, "fraction", Plots.straight("level", 1, 1.5, WEST, EAST));
    Layout one = Plots.straight("level", 1, 0.5, WEST, EAST);
    says(plan, "two places", new Layout("level", List.of(WEST), one.conductors(), one.feed()));
    says(plan, "there is none", new Layout("level", one.attachments(), List.of(), one.feed()));
    says(
        plan,
        "no wire \"gold\"",
        new Layout(
            "level",
            one.attachments(),
            List.of(new Layout.Run(one.conductors().get(0).points(), "gold")),
            one.feed()));
  }

  private static void says(Plan plan, String part, Layout layout) {
    String message =
        assertThrows(IllegalArgumentException.class, () -> hang(plan, layout)).getMessage();
    assertTrue(message.contains(part), message);
  }
}
