package spanwright.clearance;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Locale;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import spanwright.plan.Catalogues;
import spanwright.plan.Place;
import spanwright.plan.Plan;
import spanwright.rigging.Layout;
import spanwright.rigging.Plots;
import spanwright.rigging.Rigged;
import spanwright.rigging.Rigging;

/** The three rules for overhead lines, a line moved through each of them step by step. */
class OverheadRulesTest {
  private static final String MAST =
      """
      , { "id": "mast", "name": "Mast", "kind": "mast", "at": [30, 30], "lowest": 2, "highest": 12 }""";
  private static final Layout LEVEL =
      Plots.straight("level", 2, 0.5, Plots.hold("west", 15, 30, 9), Plots.hold("east", 45, 30, 9));

  private static Plan plan(String kind, String path, String more) {
    return Plots.bare()
        .poles(MAST)
        .with(
            "overheadLines",
            String.format(
                Locale.ROOT,
                "[ { \"id\": \"line\", \"name\": \"The line\", \"kind\": \"%s\", \"path\": %s %s } ]",
                kind,
                path,
                more))
        .plan();
  }

  private static String across(double y, double z) {
    return String.format(Locale.ROOT, "[[-20, %1$f, %2$f], [80, %1$f, %2$f]]", y, z);
  }

  private static List<Clearance> check(Plan plan, Layout layout) {
    Rigged rigged = Rigging.hang(plan, Catalogues.standard(), layout);
    return Clearances.of(plan, Catalogues.standard()).check(rigged);
  }

  private static Clearance get(List<Clearance> all, String rule) {
    return find(all, rule).orElseThrow();
  }

  private static Optional<Clearance> find(List<Clearance> all, String rule) {
    return all.stream().filter(each -> each.rule().equals(rule)).findFirst();
  }

  @Test
  void kept_distance_follows_a_line_that_comes_nearer() {
    double before = Double.POSITIVE_INFINITY;
    for (double y = 60; y >= 30; y -= 2) {
      Clearance kept = get(check(plan("telephone", across(y, 9), ""), LEVEL), "overhead-telephone");
      assertTrue(kept.distance() <= before + 1e-9);
      assertTrue(kept.distance() <= y - 30 + 1e-9, "no farther than the calm wire");
      assertEquals(0.6, kept.required());
      assertEquals(kept.distance() < 0.6 ? State.FOUL : kept.state(), kept.state());
      before = kept.distance();
    }
    assertEquals(0, before, 1e-6);
  }

  @Test
  void the_gust_brings_the_wire_nearer_than_the_calm_day_does() {
    Plan plan = plan("low-voltage", across(38, 8.5), "");
    Rigged rigged = Rigging.hang(plan, Catalogues.standard(), LEVEL);
    double out = rigged.spans().get(0).blowOut();
    Clearance kept =
        get(Clearances.of(plan, Catalogues.standard()).check(rigged), "overhead-low-voltage");
    assertTrue(out > 0.5);
    assertTrue(kept.distance() < 8 - 0.8 * out, kept.distance() + " with " + out);
    assertEquals(3.05, kept.required());
  }

  @Test
  void a_line_between_calm_and_blown_is_not_missed() {
    Plan bare = Plots.bare().poles("").plan();
    Rigged rigged = Rigging.hang(bare, Catalogues.standard(), LEVEL);
    var shapes = rigged.spans().get(0).shapes();
    int middle = shapes.calm().size() / 2;
    var calm = shapes.calm().get(middle);
    var left = shapes.left().get(middle);
    double y = 30 + (left.y() - 30) * 0.5;
    double chord = 9;
    // half way round between hanging and blown
    double r0 = chord - calm.z();
    double r1 = Math.hypot(left.y() - 30, chord - left.z());
    double angle = Math.atan2(left.y() - 30, chord - left.z()) / 2;
    double z = chord - (r0 + r1) / 2 * Math.cos(angle);
    y = 30 + (r0 + r1) / 2 * Math.sin(angle);
    Clearance kept = get(check(plan("telephone", across(y, z), ""), LEVEL), "overhead-telephone");
    assertTrue(kept.distance() < 0.02, "told " + kept.distance());
  }

  @Test
  void a_line_that_growing_ice_would_let_the_wire_down_on_is_not_missed() {
    Plan bare = Plots.bare().poles("").rules("\"wind\": 10, \"ice\": 8").plan();
    Rigged rigged = Rigging.hang(bare, Catalogues.standard(), LEVEL);
    var shapes = rigged.spans().get(0).shapes();
    int middle = shapes.calm().size() / 2;
    Place calm = shapes.calm().get(middle);
    Place iced = shapes.iced().get(middle);
    Place icedLeft = shapes.icedLeft().get(middle);
    Place left = shapes.left().get(middle);
    assertTrue(calm.z() - iced.z() > 0.4, calm + " " + iced);
    for (Place[] step : new Place[][] {{calm, iced}, {iced, icedLeft}, {left, icedLeft}}) {
      double y = (step[0].y() + step[1].y()) / 2;
      double z = (step[0].z() + step[1].z()) / 2;
      String line =
          String.format(
              Locale.ROOT,
              "[ { \"id\": \"line\", \"name\": \"The line\", \"kind\": \"telephone\", \"path\": %s } ]",
              across(y, z));
      Plan plan =
          Plots.bare()
              .poles("")
              .rules("\"wind\": 10, \"ice\": 8")
              .with("overheadLines", line)
              .plan();
      Clearance kept = get(check(plan, LEVEL), "overhead-telephone");
      assertTrue(kept.distance() < 0.02, "told " + kept.distance());
    }
  }

  @Test
  void a_drooping_end_swings_on_an_arc_and_not_across_it() {
    Layout drooping =
        new Layout(
            "drooping",
            List.of(Plots.hold("west", 15, 30, 10), Plots.hold("east", 45, 30, 10)),
            List.of(
                new Layout.Run(
                    List.of(
                        new Place(17, 30, 5),
                        new Place(17, 30, 10),
                        new Place(43, 30, 10),
                        new Place(43, 30, 5)),
                    null)),
            new Layout.FeedChoice(0, 0.5, null, null));
    Rigged rigged = Rigging.hang(Plots.bare().poles("").plan(), Catalogues.standard(), drooping);
    var shapes = rigged.tails().get(0).shapes();
    int last = shapes.calm().size() - 1;
    Place top = shapes.calm().get(0);
    double length = top.z() - shapes.calm().get(last).z();
    Place blown = shapes.left().get(last);
    double way = blown.y() > 30 ? 1 : -1;
    assertTrue(way * (blown.y() - 30) > 4, "blown to " + blown);
    // Half way round, where its end comes by in a lighter wind.
    double y = 30 + way * (length * Math.sin(Math.PI / 4) + 0.2);
    double z = top.z() - length * Math.cos(Math.PI / 4);
    Clearance kept =
        get(check(plan("telephone", across(y, z), ""), drooping), "overhead-telephone");
    assertTrue(kept.distance() < 0.2, "told " + kept.distance());
  }

  @Test
  void every_line_has_its_clearance_however_far() {
    List<Clearance> all = check(plan("high-voltage", across(4000, 30), ""), LEVEL);
    Clearance kept = get(all, "overhead-high-voltage");
    assertEquals(State.CLEAR, kept.state());
    assertEquals(3970, kept.distance(), 40);
    assertTrue(find(all, "wire-let-go").isPresent());
  }

  @Test
  void a_freed_wire_is_refused_where_it_can_reach_and_allowed_beyond() {
    // Line to the east, straight on: from the west pole at x 15 reach 30 m of wire and rope, and
    // one run of the east pole's halyard, from 9 m down to its cleat at 1.5 m; 3.05 m stay beyond.
    State before = State.FOUL;
    int changes = 0;
    for (double x = 46; x < 64; x += 0.5) {
      String path = String.format(Locale.ROOT, "[[%1$f, 10, 8], [%1$f, 50, 8]]", x);
      List<Clearance> all = check(plan("medium-voltage", path, ""), LEVEL);
      Clearance free = get(all, "wire-let-go");
      State now = free.state() == State.FOUL ? State.FOUL : State.CLEAR;
      assertEquals(x < 55.5 ? State.FOUL : now, now, "x " + x);
      assertEquals(x > 56.5 ? State.CLEAR : now, now, "x " + x);
      changes += now == before ? 0 : 1;
      before = now;
    }
    assertEquals(1, changes);
  }

  @Test
  void a_freed_wire_stays_below_its_old_shape() {
    String above = "[[30, 25, %.2f], [30, 35, %.2f]]";
    for (double z = 10; z < 16; z += 0.5) {
      String path = String.format(Locale.ROOT, above, z, z);
      Clearance free = get(check(plan("low-voltage", path, ""), LEVEL), "wire-let-go");
      // The shape's top is that of its ends, 9 m, near them; 30 m is its low middle.
      boolean foul = free.state() == State.FOUL;
      assertEquals(z < 11.5 || foul, foul, "z " + z);
      assertEquals(z > 12.1 ? false : foul, foul, "z " + z);
    }
  }

  @Test
  void telephone_lines_know_the_kept_distance_only() {
    Layout onMast =
        Plots.straight(
            "level", 2, 0.5, Plots.hold("west", 15, 30, 9), Plots.hold("mast", 30, 30, 9));
    List<Clearance> all = check(plan("telephone", across(34, 9), ""), onMast);
    assertTrue(find(all, "wire-let-go").isEmpty());
    assertTrue(find(all, "mast-let-go").isEmpty());
    assertTrue(find(all, "overhead-telephone").isPresent());
  }

  @Test
  void a_standing_mast_falls_its_whole_height_whatever_hangs_on_it() {
    Layout low =
        Plots.straight(
            "level", 2, 0.5, Plots.hold("west", 15, 30, 5), Plots.hold("mast", 30, 30, 5));
    for (double y = 40; y < 50; y += 0.5) {
      Clearance falls = get(check(plan("medium-voltage", across(y, 9), ""), low), "mast-let-go");
      assertEquals(12 + 3.05, falls.required(), 1e-12);
      assertEquals(Math.hypot(y - 30, 9), falls.distance(), 1e-9);
      assertEquals(falls.distance() < 15.05, falls.state() == State.FOUL);
    }
  }

  @Test
  void a_new_mast_falls_from_its_foot_on_the_roof_by_what_stands_on_it() {
    Plan plan =
        Plots.bare()
            .poles("")
            .with(
                "mastZones",
                """
                [ { "id": "roof", "name": "Roof", "area": [[28,38],[32,38],[32,42],[28,42]], "base": 6, "highest": 12 } ]""")
            .with(
                "overheadLines",
                """
                [ { "id": "line", "name": "The line", "kind": "unknown", "path": [[-20,52,9],[80,52,9]] } ]""")
            .plan();
    Layout layout =
        Plots.straight(
            "apex",
            2,
            0.5,
            Plots.hold("west", 15, 30, 9),
            Plots.hold("roof", 30, 40, 11),
            Plots.hold("east", 45, 30, 9));
    Clearance falls = get(check(plan, layout), "mast-let-go");
    assertEquals(5 + 6.1, falls.required(), 1e-9);
    assertEquals(Math.hypot(12, 3), falls.distance(), 1e-9);
  }

  @Test
  void a_rule_that_the_brief_raised_holds_above_an_authorised_figure_that_is_no_smaller() {
    String more =
        ", \"clearance\": 4.0, \"authorisedBy\": \"the operator\","
            + " \"authorisedOn\": \"2026-05-01\"";
    Plan plan =
        Plots.bare()
            .poles(MAST)
            .rules("\"wind\": 20, \"ice\": 0, \"overrides\": { \"overhead-low-voltage\": 5.0 }")
            .with(
                "overheadLines",
                "[ { \"id\": \"line\", \"kind\": \"low-voltage\", \"path\": "
                    + across(50, 8)
                    + more
                    + " } ]")
            .plan();
    assertEquals(5.0, get(check(plan, LEVEL), "overhead-low-voltage").required());
  }

  @Test
  void a_smaller_figure_counts_only_when_someone_authorised_it() {
    Clearance authorised =
        get(
            check(
                plan(
                    "low-voltage",
                    across(36, 9),
                    ", \"clearance\": 1.0, \"authorisedBy\": \"the operator\", \"authorisedOn\": \"2026-05-01\""),
                LEVEL),
            "overhead-low-voltage");
    assertEquals(1.0, authorised.required());
  }

  @Test
  void raising_what_must_be_kept_never_turns_foul_into_clear() {
    for (double y : new double[] {33, 36, 40, 46}) {
      State before = State.CLEAR;
      for (double kept = 3.05; kept < 12; kept += 0.7) {
        String more = String.format(Locale.ROOT, ", \"clearance\": %f", kept);
        State worst = State.CLEAR;
        for (Clearance each : check(plan("low-voltage", across(y, 10), more), LEVEL)) {
          worst = each.to().equals("line") ? worst.worse(each.state()) : worst;
        }
        assertTrue(worst.compareTo(before) >= 0, y + " " + kept);
        before = worst;
      }
    }
  }

  @Test
  void a_refusal_names_both_things_and_its_cure_is_checked() {
    Plan plan = plan("low-voltage", across(25.5, 9), "");
    Clearances clearances = Clearances.of(plan, Catalogues.standard());
    Rigged rigged = Rigging.hang(plan, Catalogues.standard(), LEVEL);
    List<Clearance> all = clearances.check(rigged);
    List<Refusal> refusals = clearances.refuse(LEVEL, rigged, all);
    assertNotEquals(List.of(), refusals);
    Refusal first = refusals.get(0);
    assertEquals(List.of("west", "east"), first.attachments());
    assertEquals("line", first.to());
    assertTrue(first.reason().contains("The line"), first.reason());
    assertTrue(first.cure().length() > 10);
  }
}
