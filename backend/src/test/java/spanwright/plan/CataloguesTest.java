package spanwright.plan;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import org.junit.jupiter.api.Test;

class CataloguesTest {
  private final Catalogue catalogue = Catalogues.standard();
  private final JsonNode json = Json.mapper().valueToTree(catalogue);

  @Test
  void each_catalogue_is_written_with_exactly_one_default() {
    for (String part : List.of("wires", "lines", "ropes", "matchingUnits", "soils", "limits")) {
      int defaults = 0;
      for (JsonNode kind : json.path(part)) {
        defaults += kind.has("default") ? 1 : 0;
        assertTrue(!kind.has("default") || kind.path("default").asBoolean(), part);
        assertFalse(kind.has("isDefault"), part);
      }
      assertEquals(1, defaults, part);
    }
  }

  @Test
  void there_is_enough_to_choose_from() {
    assertTrue(catalogue.wires().size() >= 8);
    assertTrue(catalogue.lines().size() >= 6);
    assertTrue(catalogue.ropes().size() >= 4);
    assertTrue(catalogue.matchingUnits().size() >= 4);
    assertEquals(11, catalogue.bands().size());
  }

  @Test
  void ids_are_unique_within_each_catalogue() {
    for (JsonNode part : json) {
      Set<String> ids = new HashSet<>();
      part.forEach(kind -> assertTrue(ids.add(kind.path("id").asText()), kind.toString()));
    }
  }

  @Test
  void each_value_stands_beside_its_source() {
    Set<String> plain = Set.of("id", "name", "default", "sources", "balanced", "permeability");
    for (String part :
        List.of("wires", "lines", "ropes", "matchingUnits", "soils", "bands", "limits")) {
      for (JsonNode kind : json.path(part)) {
        List<String> lacking = new ArrayList<>();
        for (Map.Entry<String, JsonNode> field : kind.properties()) {
          boolean sourced = kind.path("sources").path(field.getKey()).asText().length() > 3;
          if (!plain.contains(field.getKey()) && !sourced) {
            lacking.add(field.getKey());
          }
        }
        assertEquals(List.of(), lacking, kind.path("id").asText());
      }
    }
    catalogue.rules().forEach(rule -> assertTrue(rule.source().length() > 3, rule.id()));
  }

  @Test
  void wires_hang_together_weight_strength_and_stretch() {
    for (WireKind wire : catalogue.wires()) {
      double area = Math.PI * wire.radius() * wire.radius();
      double stress = wire.breaking() / area;
      assertTrue(stress > 150e6 && stress < 1600e6, wire.id() + " " + stress);
      double density = wire.weight() / area;
      assertTrue(density > 2000 && density < 12_500, wire.id() + " " + density);
      double stretch = wire.breaking() / wire.stiffness();
      assertTrue(stretch > 0.001 && stretch < 0.04, wire.id() + " " + stretch);
      assertTrue(wire.conductivity() <= 5.9e7 && wire.conductivity() >= 1e6, wire.id());
      assertTrue(
          wire.insulation() == null || wire.insulation().radius() > wire.radius(), wire.id());
    }
  }

  @Test
  void lines_lose_no_less_than_their_copper() {
    for (LineKind line : catalogue.lines()) {
      assertTrue(line.conductorLoss() > 0.05 && line.conductorLoss() < 5, line.id());
      assertTrue(line.velocityFactor() > 0.6 && line.velocityFactor() < 1, line.id());
      assertTrue(line.weight() > 0 && line.diameter() > 0, line.id());
    }
  }

  @Test
  void a_clearance_of_a_line_counts_below_the_default_only_when_authorised() {
    assertEquals(3.05, kept(null, null, null, Map.of()));
    assertEquals(3.05, kept(1.0, null, null, Map.of()));
    assertEquals(1.0, kept(1.0, "the network", "2026-05-01", Map.of()));
    assertEquals(5.0, kept(5.0, null, null, Map.of()));
    assertEquals(6.0, kept(5.0, null, null, Map.of("overhead-low-voltage", 6.0)));
    assertEquals(6.0, kept(5.0, "the network", "2026-05-01", Map.of("overhead-low-voltage", 6.0)));
  }

  private double kept(Double clearance, String by, String on, Map<String, Double> overrides) {
    OverheadLine line =
        new OverheadLine("l", "L", List.of(), OverheadLine.Kind.LOW_VOLTAGE, clearance, by, on);
    return catalogue.keptDistance(line, new Rules(overrides, 25, 0));
  }

  @Test
  void overhead_rules_can_be_raised_but_never_lowered() {
    for (OverheadLine.Kind kind : OverheadLine.Kind.values()) {
      RuleKind rule = catalogue.overheadRule(kind);
      assertEquals(rule.defaultValue(), rule.least(), rule.id());
    }
    assertEquals(2.0, catalogue.rule("headroom").least());
    assertFalse(catalogue.rule("wire-let-go").mayChange());
    assertFalse(catalogue.rule("mast-let-go").mayChange());
  }

  @Test
  void looking_up_finds_by_id_and_the_default_without() {
    assertEquals("copper-2.05", catalogue.wire("copper-2.05").id());
    assertTrue(catalogue.wire(null).isDefault());
    assertTrue(catalogue.line(null).isDefault());
    assertTrue(catalogue.rope(null).isDefault());
    assertTrue(catalogue.soil(null).isDefault());
    assertEquals(
        catalogue.matchingUnit((String) null).unit(),
        catalogue.matchingUnit((MatchingChoice) null));
    assertThrows(IllegalArgumentException.class, () -> catalogue.wire("string"));
    assertThrows(IllegalArgumentException.class, () -> catalogue.rule("none"));
  }

  @Test
  void limits_meet_where_their_rows_meet() {
    for (LimitSet set : catalogue.limits()) {
      for (int i = 1; i < set.rows().size(); i++) {
        LimitSet.Row below = set.rows().get(i - 1);
        LimitSet.Row above = set.rows().get(i);
        assertEquals(below.toMHz(), above.fromMHz(), set.id());
        double f = above.fromMHz();
        double electric = below.electric() * Math.pow(f, below.electricPower());
        // published tables round: they meet within a tenth
        assertEquals(
            1, electric / (above.electric() * Math.pow(f, above.electricPower())), 0.1, set.id());
      }
    }
  }
}
