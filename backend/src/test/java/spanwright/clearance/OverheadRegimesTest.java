package spanwright.clearance;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import org.junit.jupiter.api.Test;
import spanwright.plan.Catalogue;
import spanwright.plan.Catalogues;
import spanwright.plan.GroundSurface;
import spanwright.plan.Place;
import spanwright.plan.Plan;
import spanwright.rigging.Layout;
import spanwright.rigging.Plots;
import spanwright.rigging.Rigged;
import spanwright.rigging.Rigging;

/**
 * An overhead line moved a hand at a time through every regime of its three rules: what is told
 * never changes by more than the line moved, so that foul never turns into clear without passing
 * what is required; for spans, an apex, a loop with its closing leg, a wire with a drooping end, a
 * mast on a roof; on level and on sloping ground.
 */
class OverheadRegimesTest {
  private static final Catalogue CATALOGUE = Catalogues.standard();
  private static final double STEP = 0.25;
  private static final String SLOPE = "[[0,0,0],[60,0,6],[0,60,-3],[60,60,2],[31,29,4]]";

  private static Plots plot(boolean sloping) {
    Plots plots =
        Plots.bare()
            .poles(
                """
                , { "id": "ne", "kind": "pole", "at": [45, 50], "lowest": 2, "highest": 10 },
                  { "id": "nw", "kind": "mast", "at": [15, 50], "lowest": 2, "highest": 11 }""")
            .with(
                "mastZones",
                """
                [ { "id": "roof", "area": [[28,38],[32,38],[32,42],[28,42]], "base": 4, "highest": 12 } ]""");
    return sloping ? plots.terrain(SLOPE) : plots;
  }

  private static Plan with(boolean sloping, String kind, double[]... path) {
    List<String> points = new ArrayList<>();
    for (double[] p : path) {
      points.add(String.format(Locale.ROOT, "[%.4f,%.4f,%.4f]", p[0], p[1], p[2]));
    }
    return plot(sloping)
        .with(
            "overheadLines",
            "[{\"id\":\"line\",\"kind\":\"" + kind + "\",\"path\":" + points + "}]")
        .plan();
  }

  private static Layout.Hold on(GroundSurface ground, String id, double x, double y, double up) {
    return Plots.hold(id, x, y, ground.heightAt(x, y) + up);
  }

  /** One layout of each sort. */
  private static Map<String, Layout> layouts(boolean sloping) {
    GroundSurface g = GroundSurface.of(plot(sloping).plan());
    Layout.Hold w = on(g, "west", 15, 30, 9);
    Layout.Hold e = on(g, "east", 45, 30, 9);
    Layout.Hold ne = on(g, "ne", 45, 50, 9);
    Layout.Hold nw = on(g, "nw", 15, 50, 9);
    Layout.Hold roof = on(g, "roof", 30, 40, 11);
    Map<String, Layout> all = new HashMap<>();
    all.put("span", Plots.straight("level", 2, 0.5, w, e));
    all.put("to a mast", Plots.straight("level", 2, 0.5, nw, ne));
    all.put("apex", Plots.straight("apex", 2, 0.5, w, roof, e));
    Place end = e.at();
    Place droop = new Place(end.x(), end.y(), end.z() - 4);
    Place first = new Place(w.at().x() + 1, w.at().y(), w.at().z());
    all.put(
        "drooping",
        new Layout(
            "drooping",
            List.of(w, e),
            List.of(new Layout.Run(List.of(first, end, droop), null)),
            new Layout.FeedChoice(0, 0.45, null, null)));
    List<Place> ring = new ArrayList<>();
    for (Layout.Hold each : List.of(w, e, ne, nw, w)) {
      double x = each.at().x() + (each.at().x() < 30 ? 0.7 : -0.7);
      double y = each.at().y() + (each.at().y() < 40 ? 0.7 : -0.7);
      ring.add(new Place(x, y, each.at().z()));
    }
    all.put(
        "loop",
        new Layout(
            "loop",
            List.of(w, e, ne, nw),
            List.of(new Layout.Run(ring, null)),
            new Layout.FeedChoice(0, 0.15, null, null)));
    return all;
  }

  /** A way to move a line: its path after so many steps. */
  private interface Way {
    double[][] path(double moved);
  }

  private static final List<Way> WAYS =
      List.of(
          d -> new double[][] {{-20, 52 + d - 10, 9}, {80, 52 + d - 10, 8}},
          d -> new double[][] {{5, 31, 3 + d}, {55, 33, 3 + d}},
          d -> new double[][] {{46 + d, 5, 7.5}, {46 + d, 70, 7}},
          d -> new double[][] {{8 - d, 60, 8}, {8 - d, 38, 6}, {8 - d, 36, 6.5}},
          d -> new double[][] {{50 + d, 30, 2}, {50 + d, 30.5, 9}});

  @Test
  void what_is_told_never_moves_more_than_the_line_does() {
    int crossed = 0;
    for (boolean sloping : new boolean[] {false, true}) {
      Rigging rigging = Rigging.of(plot(sloping).plan(), CATALOGUE);
      for (Map.Entry<String, Layout> each : layouts(sloping).entrySet()) {
        Rigged rigged = rigging.hang(each.getValue());
        for (int way = 0; way < WAYS.size(); way++) {
          String kind = way % 2 == 0 ? "low-voltage" : "unknown";
          crossed += follow(sloping, kind, WAYS.get(way), rigged, each.getKey() + " " + way);
        }
      }
    }
    assertTrue(crossed > 30, crossed + " times from foul to allowed");
  }

  private static int follow(boolean sloping, String kind, Way way, Rigged rigged, String where) {
    Map<String, Clearance> before = new HashMap<>();
    int crossed = 0;
    double steepest = GroundSurface.of(plot(sloping).plan()).steepest();
    for (int step = 0; step <= 100; step++) {
      Plan plan = with(sloping, kind, way.path(step * STEP));
      for (Clearance now : Clearances.of(plan, CATALOGUE).check(rigged)) {
        if (!now.to().equals("line")) {
          continue;
        }
        assertEquals(now.distance() < now.required() - 1e-9, now.state() == State.FOUL);
        assertTrue(Double.isFinite(now.distance()) && now.distance() >= 0, where);
        Clearance last = before.put(now.rule(), now);
        if (last != null) {
          double moved = STEP * Math.hypot(1, steepest) + rough(now, last);
          double change = now.distance() - now.required() - last.distance() + last.required();
          assertTrue(Math.abs(change) <= moved, () -> where + " from " + last + " to " + now);
          crossed += (last.state() == State.FOUL) != (now.state() == State.FOUL) ? 1 : 0;
        }
      }
      assertTrue(before.containsKey("wire-let-go"), where);
    }
    return crossed;
  }

  /** What the method itself may be off by: by rule, and more where nothing hangs on it. */
  private static double rough(Clearance now, Clearance last) {
    double beyond =
        Math.max(0, Math.max(now.distance(), last.distance()) - Math.min(4, now.required()));
    return switch (now.rule()) {
      case "mast-let-go" -> 1e-6;
      case "wire-let-go" -> 0.006 + 0.006 * beyond;
      default -> beyond > 3.5 ? 0.6 : 0.01;
    };
  }

  @Test
  void a_loops_closing_leg_counts_when_it_lets_go() {
    Rigging rigging = Rigging.of(plot(false).plan(), CATALOGUE);
    Rigged loop = rigging.hang(layouts(false).get("loop"));
    assertTrue(loop.isLoop());
    Rigged.Span closing = loop.spans().get(loop.spans().size() - 1);
    assertEquals(0, closing.to());
    assertEquals(3, closing.from());
    // South-west of the west pole: what lets go there while the north-west mast holds lies there.
    Plan plan = with(false, "low-voltage", new double[] {11, 27.5, 6}, new double[] {19, 27.5, 6});
    Clearance told =
        Clearances.of(plan, CATALOGUE).check(loop).stream()
            .filter(c -> c.rule().equals("wire-let-go"))
            .findFirst()
            .orElseThrow();
    double[] shape = Strand.flat(closing.shapes().calm());
    LetGo region = new LetGo(shape, closing.reach(true), Math.toRadians(30));
    double[] path = {11, 27.5, 6, 19, 27.5, 6};
    double alone = region.toSegment(path, 0, 3, 3.05, Double.POSITIVE_INFINITY, new Space.Near());
    assertTrue(told.distance() <= alone + 1e-9, told + " but " + alone);
    assertEquals(State.FOUL, told.state());
  }

  @Test
  void a_drooping_end_makes_the_reach_longer() {
    Rigging rigging = Rigging.of(plot(false).plan(), CATALOGUE);
    Rigged droops = rigging.hang(layouts(false).get("drooping"));
    Rigged.Span span = droops.spans().get(0);
    double tail = droops.tails().get(0).length();
    assertTrue(tail > 3, "tail " + tail);
    assertTrue(
        span.reach(true) >= span.ropeFrom() + span.wireLength() + span.ropeTo() + tail - 1e-6,
        span.reach(true) + " with a tail of " + tail);
  }

  @Test
  void a_distance_far_away_is_a_distance_and_no_bound() {
    Rigging rigging = Rigging.of(plot(false).plan(), CATALOGUE);
    Rigged span = rigging.hang(layouts(false).get("span"));
    for (double x : new double[] {90, 150, 400, 3000}) {
      Plan plan = with(false, "low-voltage", new double[] {x, 0, 8}, new double[] {x, 60, 8});
      Clearance told =
          Clearances.of(plan, CATALOGUE).check(span).stream()
              .filter(c -> c.rule().equals("wire-let-go"))
              .findFirst()
              .orElseThrow();
      // From the west pole: its reach straight on, level with the old end at 9 m.
      double reach = span.spans().get(0).reach(true);
      double off = Math.hypot(x - 15 - reach, 0);
      assertEquals(off, told.distance(), 0.3 + 0.01 * off, "x " + x);
      assertTrue(told.distance() <= off + 1e-6);
    }
  }
}
