package spanwright.rigging;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import org.junit.jupiter.api.Test;
import spanwright.plan.Catalogues;
import spanwright.plan.Place;
import spanwright.plan.Plan;

/** Loops, bends on ropes, drooping ends, inverted L with return wires. */
class JoinedSpansTest {
  private static final String MORE =
      """
      , { "id": "oak", "name": "Oak", "kind": "tree", "at": [15, 50], "lowest": 3, "highest": 12,
          "sway": 0.5, "pullLimit": 400, "canopy": { "radius": 3, "from": 3, "to": 12 } },
        { "id": "north", "name": "North pole", "kind": "pole", "at": [45, 50], "lowest": 0,
          "highest": 10, "pullLimit": 400 }""";
  private static final Plan PLAN = Plots.bare().poles(MORE).plan();
  private static final Layout.Hold WEST = Plots.hold("west", 15, 30, 9);
  private static final Layout.Hold EAST = Plots.hold("east", 45, 30, 9);
  private static final Layout.Hold NORTH = Plots.hold("north", 45, 50, 9.5);
  private static final Layout.Hold OAK = Plots.hold("oak", 15, 50, 10);

  private static Place at(double x, double y, double z) {
    return new Place(x, y, z);
  }

  private static Layout layout(
      String shape, double fraction, List<Layout.Hold> holds, List<List<Place>> wires) {
    return new Layout(
        shape,
        holds,
        wires.stream().map(points -> new Layout.Run(points, null)).toList(),
        new Layout.FeedChoice(0, fraction, null, null));
  }

  private static Layout loop(double fraction) {
    return layout(
        "loop",
        fraction,
        List.of(WEST, EAST, NORTH, OAK),
        List.of(
            List.of(
                at(16, 31, 9), at(44, 31, 9), at(44, 49, 9.3), at(20, 46, 9.5), at(16, 31, 9))));
  }

  private static Rigged hang(Layout layout) {
    return Rigging.hang(PLAN, Catalogues.standard(), layout);
  }

  private static double run(List<Place> points) {
    return new Polyline(points).total();
  }

  @Test
  void a_loop_stays_closed_and_keeps_its_length() {
    Rigged rigged = hang(loop(0.1));
    assertTrue(rigged.isLoop());
    assertEquals(4, rigged.spans().size(), "the closing leg is a span of its own");
    assertEquals(3, rigged.spans().get(3).from());
    assertEquals(0, rigged.spans().get(3).to());
    List<Place> points = rigged.conductors().get(0).shapes().calm();
    assertEquals(points.get(0), points.get(points.size() - 1));
    assertTrue(points.size() <= 60);
    double length = rigged.conductors().get(0).length();
    assertEquals(length, run(points), 2e-4 * length);
    double sides = rigged.spans().stream().mapToDouble(Rigged.Span::wireLength).sum();
    assertEquals(length, sides, 1e-9);
    assertTrue(rigged.shortcomings().isEmpty(), rigged.shortcomings().toString());
    assertEquals(4, rigged.ropes().stream().filter(r -> r.what().equals("tail")).count());
  }

  @Test
  void every_leg_of_a_loop_reaches_as_far_as_its_wire_ropes_and_halyard() {
    for (Rigged.Span span : hang(loop(0.1)).spans()) {
      double own = span.ropeFrom() + span.wireLength() + span.ropeTo();
      assertTrue(span.reach(true) > own + 4 && span.reach(false) > own + 4, "halyards trail too");
    }
  }

  @Test
  void a_loop_drawn_the_other_way_round_or_from_elsewhere_hangs_the_same() {
    Layout one = loop(0.1);
    Place feed = hang(one).feedLine().feedpoint();
    List<Place> back = new ArrayList<>(one.conductors().get(0).points());
    Collections.reverse(back);
    Layout other = layout("loop", 0.9, one.attachments(), List.of(back));
    assertTrue(feed.distance(hang(other).feedLine().feedpoint()) < 1e-3);
    List<Place> turned = new ArrayList<>(one.conductors().get(0).points().subList(1, 5));
    turned.add(turned.get(0));
    double total = run(one.conductors().get(0).points());
    double fraction = (0.1 * total - 28 + total) / total;
    Rigged third = hang(layout("loop", fraction, one.attachments(), List.of(turned)));
    assertTrue(feed.distance(third.feedLine().feedpoint()) < 1e-3);
    Place start = third.conductors().get(0).shapes().calm().get(0);
    assertTrue(start.distance(at(44, 31, 9)) < 1, "it begins where it was drawn to: " + start);
  }

  @Test
  void a_hung_loop_hung_again_does_not_move() {
    Layout one = loop(0.1);
    Rigged once = hang(one);
    Rigged twice =
        hang(
            layout(
                "loop", 0.1, one.attachments(), List.of(once.conductors().get(0).shapes().calm())));
    for (int i = 0; i < 4; i++) {
      assertEquals(once.spans().get(i).sag(), twice.spans().get(i).sag(), 0.02);
      assertEquals(once.spans().get(i).ropeTo(), twice.spans().get(i).ropeTo(), 0.02);
    }
  }

  @Test
  void a_loop_hangs_as_many_links_do_calm_and_in_the_gust() {
    Rigged rigged = hang(loop(0.0));
    check(rigged, -1);
    Rigged tied =
        hang(
            layout(
                "loop",
                0.0,
                List.of(WEST, EAST, NORTH),
                List.of(List.of(at(17, 31, 9), at(44, 31, 9), at(44, 48, 9.4), at(17, 31, 9)))));
    check(tied, 0);
    check(tied, 1);
  }

  /** Holds a hung loop, fed at its first corner, and its gust square to a side, against links. */
  private static void check(Rigged rigged, int square) {
    ManyLinks links = new ManyLinks();
    List<int[]> sides = links(rigged, links);
    links.hang();
    double length = 0;
    double other = 0;
    for (int i = 0; i < sides.size(); i++) {
      Rigged.Span span = rigged.spans().get(i);
      length += run(span.wire().calm());
      other += links.length(sides.get(i));
      assertEquals(links.sag(sides.get(i)), span.sag(), 0.01 * span.sag());
      Place corner = links.place(sides.get(i)[0]);
      assertTrue(corner.distance(span.wire().calm().get(0)) < 0.01, "corner " + i);
      double pull = rigged.attachments().get(i).pull().size();
      if (rigged.attachments().get(i).kilograms() == null) {
        assertEquals(links.on(i), pull, 0.01 * pull);
      }
    }
    assertEquals(other, length, 2e-4 * length);
    if (square < 0) {
      return;
    }
    Rigged.Span span = rigged.spans().get(square);
    List<Place> calm = span.wire().calm();
    Place a = calm.get(0);
    Place b = calm.get(calm.size() - 1);
    double level = Math.hypot(b.x() - a.x(), b.y() - a.y());
    double x = -(b.y() - a.y()) / level;
    double y = (b.x() - a.x()) / level;
    double push = feedPush(rigged);
    links.load(sides.get(0)[0], x * push, y * push, 0);
    links.blow(x, y);
    List<Place> blown = span.wire().left();
    assertEquals(links.sag(sides.get(square)), Solved.sag(blown), 0.02 * Solved.sag(blown));
    double out = 0;
    double ours = 0;
    for (int point : sides.get(square)) {
      Place p = links.place(point);
      out = Math.max(out, (p.x() - a.x()) * x + (p.y() - a.y()) * y);
    }
    for (Place p : blown) {
      ours = Math.max(ours, (p.x() - a.x()) * x + (p.y() - a.y()) * y);
    }
    assertEquals(out, ours, 0.02 * out);
    for (int k = 0; k < sides.size(); k++) {
      double found = rigged.attachments().get(k).pullInWind().size();
      assertTrue(found >= 0.98 * links.on(k), "the worst of all winds is no less than this one");
    }
  }

  private static double feedPush(Rigged rigged) {
    Rigged.FeedLine line = rigged.feedLine();
    double hanging = LineRun.hangingLength(line.feedpoint(), line.shapes().calm().get(14));
    return pressure() * Catalogues.standard().line(line.line()).diameter() * hanging / 2;
  }

  private static double pressure() {
    return 0.5 * 1.25 * 1.2 * 20 * 20;
  }

  private static Materials materials(Rigged rigged) {
    return Rigging.of(PLAN, Catalogues.standard())
        .materials(Catalogues.standard().wire(rigged.conductors().get(0).wire()));
  }

  /** A hung loop as links, from its lengths alone; the attachments are the first points. */
  private static List<int[]> links(Rigged rigged, ManyLinks links) {
    Materials m = materials(rigged);
    int count = rigged.attachments().size();
    rigged.attachments().forEach(each -> links.point(each.at(), true));
    int[] corner = new int[count];
    for (int a = 0; a < count; a++) {
      Rigged.Span span = rigged.spans().get(a);
      corner[a] = links.point(span.wire().calm().get(0), false);
      links.load(corner[a], 0, 0, -Practice.INSULATOR_WEIGHT * Hanging.GRAVITY);
      links.run(
          a,
          corner[a],
          6,
          span.ropeFrom(),
          m.ropeStiffness(),
          m.ropeWeight() * Hanging.GRAVITY,
          pressure() * m.ropeDiameter());
    }
    links.load(corner[0], 0, 0, -rigged.feedLine().weightOnFeedpoint() * Hanging.GRAVITY);
    List<int[]> sides = new ArrayList<>();
    for (int a = 0; a < count; a++) {
      sides.add(
          links.run(
              corner[a],
              corner[(a + 1) % count],
              40,
              rigged.spans().get(a).wireLength(),
              m.wireStiffness(),
              m.wireWeight() * Hanging.GRAVITY,
              pressure() * m.wireDiameter()));
    }
    return sides;
  }

  @Test
  void the_forces_on_the_supports_of_a_loop_carry_all_that_hangs() {
    Rigged rigged = hang(loop(0.1));
    double x = 0;
    double y = 0;
    double z = 0;
    for (Rigged.Attachment each : rigged.attachments()) {
      x += each.pull().x();
      y += each.pull().y();
      z += each.pull().z();
      z += each.kilograms() == null ? 0 : each.kilograms() * Hanging.GRAVITY;
    }
    assertEquals(0, Math.hypot(x, y), 0.01);
    Materials m = materials(rigged);
    double ropes =
        rigged.ropes().stream()
            .filter(r -> r.what().equals("tail"))
            .mapToDouble(Rigged.Rope::length)
            .sum();
    double weight =
        rigged.conductors().get(0).length() * m.wireWeight()
            + ropes * m.ropeWeight()
            + 4 * Practice.INSULATOR_WEIGHT
            + rigged.feedLine().weightOnFeedpoint();
    assertEquals(-weight * Hanging.GRAVITY, z, 0.01 * weight * Hanging.GRAVITY);
  }

  @Test
  void a_loop_at_a_tree_runs_over_a_pulley_there() {
    Rigged.Attachment oak = hang(loop(0.1)).attachments().get(3);
    assertEquals("weight", oak.held());
    assertTrue(oak.kilograms() > 0.5 && oak.weightUp() > 0.1);
    assertTrue(oak.slackAtPulley() > 0);
    double change = oak.pullInWind().size() / oak.pull().size();
    assertTrue(change < 1.25, "its weight stays whatever the gust: " + change);
  }

  @Test
  void an_inverted_l_hangs_with_its_return_wires() {
    Rigged rigged =
        hang(
            layout(
                "inverted-l",
                0,
                List.of(
                    Plots.hold("north", 45, 50, 3),
                    Plots.hold("north", 45, 50, 9.8),
                    OAK,
                    Plots.hold("east", 45, 30, 3),
                    Plots.hold("west", 15, 30, 3)),
                List.of(
                    List.of(at(45, 50, 3), at(45, 50, 9.8), at(21, 50, 10)),
                    List.of(at(45, 50, 3), at(45, 31, 3)),
                    List.of(at(45, 50, 3), at(18, 32, 3)))));
    assertEquals(3, rigged.conductors().size());
    assertEquals(0, rigged.feedLine().held());
    for (Rigged.Conductor each : rigged.conductors()) {
      assertEquals(at(45, 50, 3), each.shapes().calm().get(0), "all meet at the feedpoint");
      assertEquals(each.length(), run(each.shapes().calm()), 1e-3 * each.length());
    }
    assertEquals(4, rigged.spans().size());
    assertEquals(2, rigged.spans().get(3).conductor());
    assertTrue(rigged.shortcomings().isEmpty(), rigged.shortcomings().toString());
  }

  @Test
  void a_bend_held_off_a_tree_by_a_rope_hangs_with_both_of_its_legs() {
    Rigged rigged =
        hang(
            layout(
                "inverted-l",
                0,
                List.of(Plots.hold("north", 45, 50, 3), OAK, WEST),
                List.of(List.of(at(44.8, 50, 3), at(20, 49, 9.6), at(16, 32, 9)))));
    Rigged.Span leg = rigged.spans().get(0);
    Rigged.Span top = rigged.spans().get(1);
    Place bend = leg.wire().calm().get(leg.wire().calm().size() - 1);
    assertTrue(bend.distance(top.wire().calm().get(0)) < 1e-9, "one bend, not two");
    assertEquals(5.1, OAK.at().distance(bend), 0.3);
    assertTrue(rigged.attachments().get(0).pullInWind().size() < 400, "the tree may sway");
  }

  @Test
  void ends_droop_from_ropes_and_weigh_on_them() {
    Rigged rigged =
        hang(
            layout(
                "drooping",
                0.5,
                List.of(Plots.hold("oak", 15, 50, 11), NORTH),
                List.of(List.of(at(20, 50, 6), at(20, 50, 11), at(43, 50, 9.5), at(43, 50, 5)))));
    assertEquals(2, rigged.tails().size());
    for (Rigged.Tail tail : rigged.tails()) {
      Place top = tail.shapes().calm().get(0);
      Place foot = tail.shapes().calm().get(tail.shapes().calm().size() - 1);
      assertEquals(tail.length(), top.z() - foot.z(), 1e-9);
    }
    assertEquals(32.549, rigged.conductors().get(0).length(), 1e-3);
    assertTrue(rigged.spans().get(0).reach(true) > 23 + 4.5 + 2 + 5, "the free wire counts");
    assertFalse(rigged.isLoop());
  }

  @Test
  void what_cannot_be_a_loop_is_told_in_a_sentence() {
    List<Layout.Hold> three = List.of(WEST, EAST, NORTH);
    says(
        "at least three corners",
        layout(
            "loop",
            0,
            List.of(WEST, EAST),
            List.of(List.of(at(17, 30, 9), at(43, 30, 9), at(17, 30, 9)))));
    says(
        "ends where it began",
        layout(
            "loop",
            0,
            three,
            List.of(List.of(at(17, 31, 9), at(44, 31, 9), at(44, 48, 9), at(17, 32, 9)))));
    List<Place> small = List.of(at(17, 31, 9), at(25, 31, 9), at(25, 35, 9), at(17, 31, 9));
    says("the wire passes", layout("loop", 0, three, List.of(small)));
    says(
        "no support",
        layout(
            "loop",
            0,
            List.of(WEST, EAST, Plots.hold("moon", 45, 50, 9)),
            List.of(List.of(at(17, 31, 9), at(44, 31, 9), at(44, 48, 9), at(17, 31, 9)))));
    says(
        "begins at the feedpoint",
        layout(
            "inverted-l",
            0,
            List.of(Plots.hold("north", 45, 50, 3), NORTH, OAK, WEST),
            List.of(
                List.of(at(45, 50, 3), at(45, 50, 9.5), at(21, 50, 10)),
                List.of(at(40, 45, 3), at(18, 32, 9)))));
  }

  private static void says(String part, Layout layout) {
    String message = assertThrows(IllegalArgumentException.class, () -> hang(layout)).getMessage();
    assertTrue(message.contains(part), message);
  }

  @Test
  void any_loop_answers_in_numbers() {
    java.util.Random random = new java.util.Random(5);
    for (int i = 0; i < 60; i++) {
      List<Place> points = new ArrayList<>();
      List<Layout.Hold> holds = List.of(WEST, EAST, NORTH, OAK);
      for (Layout.Hold each : holds) {
        double in = 0.02 + 0.25 * random.nextDouble();
        points.add(
            at(
                each.at().x() + in * (30 - each.at().x()),
                each.at().y() + in * (40 - each.at().y()),
                each.at().z() - 2 * random.nextDouble()));
      }
      points.add(points.get(0));
      Rigged rigged = hang(layout("loop", random.nextDouble(), holds, List.of(points)));
      for (Rigged.Span span : rigged.spans()) {
        double sum = span.sag() + span.sagInWind() + span.blowOut() + span.greatestTension();
        assertTrue(Double.isFinite(sum + span.ropeFrom()), "loop " + i);
        assertTrue(span.sag() < 8 && span.blowOut() < 20, "loop " + i + ": " + span.sag());
      }
      double length = rigged.conductors().get(0).length();
      assertEquals(length, run(rigged.conductors().get(0).shapes().calm()), 1e-3 * length);
    }
  }
}
