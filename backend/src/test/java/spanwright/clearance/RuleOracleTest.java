package spanwright.clearance;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ArrayNode;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Random;
import java.util.Set;
import java.util.TreeSet;
import org.junit.jupiter.api.Test;
import spanwright.plan.Catalogue;
import spanwright.plan.Catalogues;
import spanwright.plan.Json;
import spanwright.plan.Place;
import spanwright.plan.Plan;
import spanwright.rigging.Layout;
import spanwright.rigging.Plots;
import spanwright.rigging.Rigged;
import spanwright.rigging.Rigging;

/**
 * Thousands of placements on random plots, held against {@link RuleOracle}: points strewn by the
 * rules' own words. Nothing told may be farther than a point found; what is refused is truly near;
 * turning or mirroring a plot, or hanging a wire the other way round, changes nothing; raising what
 * must be kept never turns foul into clear.
 */
class RuleOracleTest {
  /** More of them with {@code -Dspanwright.plots=5000}. */
  private static final int PLOTS = Integer.getInteger("spanwright.plots", 400);

  private static final Catalogue CATALOGUE = Catalogues.standard();

  @Test
  void what_is_told_agrees_with_points_strewn_by_the_words_of_the_rules() {
    int compared = 0;
    int refused = 0;
    int placements = 0;
    for (int seed = 0; seed < PLOTS; seed++) {
      Random random = new Random(seed);
      Plan plan = RandomPlots.plan(random);
      Rigging rigging = Rigging.of(plan, CATALOGUE);
      Clearances clearances = Clearances.of(plan, CATALOGUE);
      for (int i = 0; i < 3; i++) {
        Layout layout = RandomPlots.layout(random, plan, rigging);
        if (layout == null) {
          continue;
        }
        placements++;
        Rigged rigged = rigging.hang(layout);
        Map<String, Clearance> told = new HashMap<>();
        clearances.check(rigged).forEach(c -> told.put(c.rule() + "|" + c.to(), c));
        for (RuleOracle.Found found : new RuleOracle(plan, rigged).found()) {
          String where = "seed " + seed + " " + found + " " + layout.attachments();
          Clearance c = told.get(found.key());
          boolean foul = c != null && c.state() == State.FOUL;
          if (found.distance() < found.required() - 1e-6) {
            assertTrue(foul, where + " told " + c);
          }
          if (c != null) {
            // In the gust a wire need only keep out of a crown: what is to spare is compared.
            double spare = c.distance() - c.required();
            double most = found.distance() - found.required();
            assertTrue(spare <= most + 1e-6, where + " told " + c);
            compared++;
          }
          if (foul) {
            refused++;
            boolean near = found.distance() <= found.required() + found.rough();
            assertTrue(near, where + " refused for nothing: " + c);
          }
        }
      }
    }
    assertTrue(placements > PLOTS && refused > PLOTS, placements + " " + compared + " " + refused);
  }

  // --- symmetry

  /** Turns by quarters about the plot's middle, and mirrors west to east. */
  private record Turn(int quarters, boolean mirrored) {
    double[] of(double x, double y) {
      double u = x - 30;
      double v = y - 30;
      if (mirrored) {
        u = -u;
      }
      for (int q = 0; q < quarters; q++) {
        double w = u;
        u = -v;
        v = w;
      }
      return new double[] {u + 30, v + 30};
    }

    Place of(Place p) {
      double[] xy = of(p.x(), p.y());
      return new Place(xy[0], xy[1], p.z());
    }

    Layout of(Layout layout) {
      return new Layout(
          layout.shape(),
          layout.attachments().stream().map(h -> new Layout.Hold(h.on(), of(h.at()))).toList(),
          layout.conductors().stream()
              .map(r -> new Layout.Run(r.points().stream().map(this::of).toList(), r.wire()))
              .toList(),
          layout.feed());
    }

    /** Every list of two or three numbers is a place. */
    void turn(JsonNode node) {
      boolean numbers = node.isArray() && (node.size() == 2 || node.size() == 3);
      for (JsonNode each : node) {
        numbers &= each.isNumber();
        turn(each);
      }
      if (numbers) {
        double[] xy = of(node.get(0).doubleValue(), node.get(1).doubleValue());
        ((ArrayNode) node).set(0, Json.mapper().getNodeFactory().numberNode(xy[0]));
        ((ArrayNode) node).set(1, Json.mapper().getNodeFactory().numberNode(xy[1]));
      }
    }
  }

  private static Map<String, Double> distances(Plan plan, Layout layout) {
    Map<String, Double> all = new HashMap<>();
    Rigged rigged = Rigging.of(plan, CATALOGUE).hang(layout);
    Clearances.of(plan, CATALOGUE)
        .check(rigged)
        .forEach(c -> all.put(c.rule() + "|" + c.to(), c.distance()));
    return all;
  }

  private static Layout backwards(Layout layout) {
    List<Layout.Hold> holds = new ArrayList<>(layout.attachments());
    List<Place> points = new ArrayList<>(layout.conductors().get(0).points());
    java.util.Collections.reverse(holds);
    java.util.Collections.reverse(points);
    return new Layout(
        layout.shape(),
        holds,
        List.of(new Layout.Run(points, null)),
        new Layout.FeedChoice(0, 1 - layout.feed().fraction(), null, null));
  }

  @Test
  void turning_and_mirroring_the_plot_change_nothing() throws Exception {
    int compared = 0;
    for (int seed = 0; seed < 40; seed++) {
      Random random = new Random(seed);
      // Without guys: which way the first is set is a choice, not a distance.
      String json = RandomPlots.json(random, 0);
      Plan plan = Plots.plan(json);
      Layout layout = RandomPlots.layout(random, plan, Rigging.of(plan, CATALOGUE));
      if (layout == null) {
        continue;
      }
      Map<String, Double> before = distances(plan, layout);
      Turn turn = new Turn(seed % 4, seed % 8 < 4);
      JsonNode turned = Json.mapper().readTree(json);
      turn.turn(turned);
      Map<String, Double> after = distances(Plots.plan(turned.toString()), turn.of(layout));
      for (Map.Entry<String, Double> each : before.entrySet()) {
        Double now = after.get(each.getKey());
        boolean faint = now == null && each.getValue() > 4.5;
        String where = "seed " + seed + " " + turn + " " + each;
        assertTrue(faint || now != null, where);
        if (now != null) {
          // How deep something lies inside is told roughly; that it does, is not.
          double inside = Math.min(each.getValue(), now) < 0.05 ? 0.4 : 0.03;
          assertEquals(each.getValue(), now, inside + 0.01 * Math.abs(now), where);
          assertEquals(each.getValue() < -1e-6, now < -1e-6, where);
          compared++;
        }
      }
    }
    assertTrue(compared > 200, compared + " distances");
  }

  @Test
  void a_wire_named_from_its_other_end_is_no_other_wire() {
    for (int seed = 0; seed < 40; seed++) {
      Random random = new Random(seed);
      Plan plan = Plots.plan(RandomPlots.json(random, 0));
      Layout layout = RandomPlots.layout(random, plan, Rigging.of(plan, CATALOGUE));
      if (layout == null || layout.attachments().size() > 2) {
        continue;
      }
      Map<String, Double> one = distances(plan, layout);
      Map<String, Double> other = distances(plan, backwards(layout));
      for (Map.Entry<String, Double> each : one.entrySet()) {
        Double now = other.get(each.getKey());
        if (now != null) {
          String where = "seed " + seed + " " + each;
          // The pull is set at one end: the two hang alike, not the same.
          boolean inside = each.getValue() < 0.05 && now < 0.05;
          assertTrue(inside || Math.abs(each.getValue() - now) < 0.1 + 0.03 * now, where);
        }
      }
    }
  }

  // --- monotony

  private static final List<String> RAISED =
      List.of(
          "headroom",
          "people",
          "people-rope",
          "zone-headroom",
          "zone-no-wire",
          "building-wire",
          "building-rope",
          "building-feed-line",
          "canopy-wire",
          "canopy-end",
          "canopy-feed-line",
          "canopy-mast",
          "boundary",
          "guy-in-plot",
          "metalwork-wire",
          "overhead-telephone",
          "overhead-low-voltage",
          "overhead-medium-voltage",
          "overhead-high-voltage",
          "overhead-unknown");

  private static Set<String> fouls(Plan plan, Rigged rigged) {
    Set<String> fouls = new TreeSet<>();
    for (Clearance each : Clearances.of(plan, CATALOGUE).check(rigged)) {
      if (each.state() == State.FOUL) {
        fouls.add(each.rule() + "|" + each.to());
      }
    }
    return fouls;
  }

  @Test
  void raising_what_must_be_kept_never_turns_foul_into_clear() {
    for (int seed = 0; seed < 12; seed++) {
      Random random = new Random(seed);
      String json = RandomPlots.json(random, 2);
      Plan plan = Plots.plan(json);
      Rigging rigging = Rigging.of(plan, CATALOGUE);
      Layout layout = RandomPlots.layout(random, plan, rigging);
      if (layout == null) {
        continue;
      }
      Rigged rigged = rigging.hang(layout);
      Set<String> before = fouls(plan, rigged);
      for (String rule : RAISED) {
        double value = CATALOGUE.rule(rule).defaultValue() + 0.8;
        String raised =
            json.replace(
                "\"ice\": 0", "\"ice\": 0, \"overrides\": { \"" + rule + "\": " + value + " }");
        Set<String> after = fouls(Plots.plan(raised), rigged);
        assertTrue(after.containsAll(before), () -> rule + ": " + before + " became " + after);
      }
    }
  }
}
