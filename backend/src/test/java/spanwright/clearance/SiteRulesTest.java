package spanwright.clearance;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import spanwright.plan.Catalogues;
import spanwright.plan.GroundSurface;
import spanwright.plan.Plan;
import spanwright.rigging.Layout;
import spanwright.rigging.Plots;
import spanwright.rigging.Rigged;
import spanwright.rigging.Rigging;
import spanwright.rigging.Roof;

/** Ground, roofs, crowns, people, zones, boundary: each rule kept and broken. */
class SiteRulesTest {
  private static final Layout LEVEL =
      Plots.straight("level", 2, 0.5, Plots.hold("west", 15, 30, 9), Plots.hold("east", 45, 30, 9));

  private static List<Clearance> check(Plan plan, Layout layout) {
    Rigged rigged = Rigging.hang(plan, Catalogues.standard(), layout);
    return Clearances.of(plan, Catalogues.standard()).check(rigged);
  }

  private static Optional<Clearance> find(List<Clearance> all, String rule) {
    return all.stream().filter(each -> each.rule().equals(rule)).findFirst();
  }

  private static Clearance get(Plan plan, Layout layout, String rule) {
    List<Clearance> all = check(plan, layout);
    return find(all, rule).orElseThrow(() -> new AssertionError(all.toString()));
  }

  @Test
  void a_bare_plot_fouls_nothing() {
    for (Clearance each : check(Plots.bare().poles("").plan(), LEVEL)) {
      assertTrue(each.state() != State.FOUL, each.toString());
    }
  }

  @Test
  void a_rule_set_wide_is_looked_for_as_wide() {
    Layout layout =
        Plots.straight(
            "level", 2, 0.5, Plots.hold("west", 15, 30, 9), Plots.hold("new", 45, 30, 9));
    Plan plan =
        Plots.bare()
            .poles("")
            .with(
                "buildings",
                """
                [ { "id": "shed", "name": "Shed", "footprint": [[25,38],[35,38],[35,44],[25,44]],
                    "eaves": 9, "ridge": 9, "roof": "flat" } ]""")
            .with(
                "mastZones",
                """
                [ { "id": "new", "name": "Bed", "area": [[40,25],[50,25],[50,35],[40,35]], "highest": 10 } ]""")
            .with(
                "zones",
                """
                [ { "id": "lawn", "name": "Lawn", "rule": "no-mast", "area": [[51.5,20],[58,20],[58,40],[51.5,40]] } ]""")
            .rules(
                "\"wind\": 20, \"ice\": 0, \"overrides\": { \"building-wire\": 12, \"zone-no-mast\": 9 }")
            .plan();
    Rigged rigged = Rigging.hang(plan, Catalogues.standard(), layout);
    Clearances clearances = Clearances.of(plan, Catalogues.standard());
    for (List<Clearance> all : List.of(clearances.check(rigged), clearances.checkClosely(rigged))) {
      Clearance shed = find(all, "building-wire").orElseThrow();
      assertEquals(State.FOUL, shed.state(), shed.toString());
      assertTrue(shed.distance() > 5, shed.toString());
      Clearance lawn = find(all, "zone-no-mast").orElseThrow();
      assertEquals(State.FOUL, lawn.state(), lawn.toString());
      assertEquals(6.5, lawn.distance(), 1e-9);
    }
  }

  @Test
  void headroom_follows_the_sloping_ground() {
    Plan level = Plots.bare().poles("").plan();
    Clearance flat = get(level, LEVEL, "headroom");
    assertEquals(9, flat.distance(), 1.5);
    assertTrue(flat.distance() < 9);
    String hill = "[[0,0,0],[60,0,0],[0,60,0],[60,60,0],[30,30,5]]";
    Plan hilly = Plots.bare().poles("").terrain(hill).plan();
    GroundSurface ground = GroundSurface.of(hilly);
    double base = ground.heightAt(15, 30);
    Layout raised =
        Plots.straight(
            "level",
            2,
            0.5,
            Plots.hold("west", 15, 30, base + 5),
            Plots.hold("east", 45, 30, base + 5));
    Clearance over = get(hilly, raised, "headroom");
    assertEquals(State.FOUL, over.state(), over.toString());
    assertEquals(30, over.at().x(), 3);
  }

  @Test
  void roofs_are_solids_with_their_slopes() {
    String houses =
        """
        [ { "id": "gable", "name": "Gable", "footprint": [[20,20],[30,20],[30,28],[20,28]], "eaves": 4, "ridge": 8, "roof": "gable", "ridgeLine": [[20,24],[30,24]] },
          { "id": "hip", "name": "Hip", "footprint": [[35,20],[47,20],[47,28],[35,28]], "eaves": 4, "ridge": 8, "roof": "hip", "ridgeLine": [[39,24],[43,24]] },
          { "id": "lean", "name": "Lean-to", "footprint": [[20,40],[30,40],[30,44],[20,44]], "eaves": 3, "ridge": 5, "roof": "lean-to", "ridgeLine": [[20,40],[30,40]] },
          { "id": "flat", "name": "Flat", "footprint": [[35,40],[40,40],[40,44],[38,44],[38,42],[35,42]], "eaves": 3, "ridge": 3, "roof": "flat" } ]""";
    Plan plan = Plots.bare().poles("").with("buildings", houses).plan();
    GroundSurface ground = GroundSurface.of(plan);
    List<Roof> roofs = plan.buildings().stream().map(each -> Roof.of(each, ground)).toList();
    assertEquals(8, roofs.get(0).heightAt(25, 24), 1e-9);
    assertEquals(6, roofs.get(0).heightAt(25, 26), 1e-9);
    assertEquals(4, roofs.get(0).heightAt(25, 28), 1e-9);
    assertEquals(8, roofs.get(1).heightAt(41, 24), 1e-9);
    assertEquals(4, roofs.get(1).heightAt(47, 24), 1e-9);
    assertEquals(6, roofs.get(1).heightAt(45, 24), 1e-9);
    assertEquals(6, roofs.get(1).heightAt(41, 26), 1e-9);
    assertEquals(5, roofs.get(2).heightAt(25, 40), 1e-9);
    assertEquals(4, roofs.get(2).heightAt(25, 42), 1e-9);
    assertEquals(3, roofs.get(3).heightAt(39, 43), 1e-9);
    // the faces lie on the heights, wherever the triangles were cut
    for (Roof roof : roofs) {
      double area = 0;
      for (double[] face : roof.faces(-1)) {
        boolean wall = face[8] == -1 || face[5] == -1 || face[2] == -1;
        for (int k = 0; k < 9 && !wall; k += 3) {
          assertEquals(roof.heightAt(face[k], face[k + 1]), face[k + 2], 1e-9);
        }
        double cross =
            (face[3] - face[0]) * (face[7] - face[1]) - (face[6] - face[0]) * (face[4] - face[1]);
        area += wall ? 0 : Math.abs(cross) / 2;
      }
      double plan2 =
          roof == roofs.get(0) ? 80 : roof == roofs.get(1) ? 96 : roof == roofs.get(2) ? 40 : 14;
      assertEquals(plan2, area, 1e-6);
    }
  }

  @Test
  void a_wire_over_a_ridge_is_measured_to_it_and_through_it_is_foul() {
    String house =
        """
        [ { "id": "house", "name": "House", "footprint": [[25,26],[35,26],[35,34],[25,34]], "eaves": 4, "ridge": %s, "roof": "gable", "ridgeLine": [[25,30],[35,30]] } ]""";
    Plan low =
        Plots.bare().poles("").entry("[30, 20]").with("buildings", house.formatted("6")).plan();
    Clearance clear = get(low, LEVEL, "building-wire");
    assertEquals(State.CLEAR, clear.state());
    assertTrue(clear.distance() > 1 && clear.distance() < 3, clear.toString());
    Plan high =
        Plots.bare().poles("").entry("[30, 20]").with("buildings", house.formatted("9.2")).plan();
    Clearance foul = get(high, LEVEL, "building-wire");
    assertEquals(State.FOUL, foul.state());
    assertTrue(foul.distance() < 0);
  }

  @Test
  void wire_stays_out_of_every_crown_and_its_ends_keep_more() {
    String trees =
        """
        [ { "id": "birch", "name": "Birch", "at": [30, %s], "canopy": { "radius": 3, "from": 3, "to": 12 } } ]""";
    for (double y = 30; y < 40; y += 1) {
      Plan plan = Plots.bare().poles("").with("trees", trees.formatted(y)).plan();
      Optional<Clearance> wire = find(check(plan, LEVEL), "canopy-wire");
      if (y - 30 < 3.5) {
        assertEquals(State.FOUL, wire.orElseThrow().state(), "y " + y);
      }
      if (y > 39) {
        assertTrue(wire.isEmpty() || wire.get().state() != State.FOUL, "y " + y);
      }
    }
    String oak =
        """
        , { "id": "oak", "name": "Oak", "kind": "tree", "at": [15, 50], "lowest": 3, "highest": 9, "canopy": { "radius": 3, "from": 3, "to": 12 } }""";
    Plan plan = Plots.bare().poles(oak).plan();
    double least = Rigging.of(plan, Catalogues.standard()).leastTail("oak", 8);
    assertEquals(4.6, least, 1e-9);
    Layout kept =
        Plots.straight(
            "level", least, 0.5, Plots.hold("oak", 15, 50, 8), Plots.hold("west", 15, 30, 8));
    assertTrue(check(plan, kept).stream().noneMatch(each -> each.state() == State.FOUL));
    Layout near =
        Plots.straight(
            "level", 4, 0.5, Plots.hold("oak", 15, 50, 8), Plots.hold("west", 15, 30, 8));
    assertEquals(State.FOUL, get(plan, near, "canopy-end").state());
  }

  @Test
  void zones_and_people_are_kept_out_of() {
    String zone =
        """
        [ { "id": "pool", "name": "Pool", "area": [[28,%1$s],[32,%1$s],[32,%2$s],[28,%2$s]], "rule": "no-wire" } ]""";
    assertEquals(
        State.FOUL,
        get(
                Plots.bare().poles("").with("zones", zone.formatted("29", "33")).plan(),
                LEVEL,
                "zone-no-wire")
            .state());
    Clearance away =
        get(
            Plots.bare().poles("").with("zones", zone.formatted("34", "38")).plan(),
            LEVEL,
            "zone-no-wire");
    assertTrue(away.distance() < 4 - 0.5, "the gust comes nearer: " + away);
    String drive =
        """
        [ { "id": "drive", "name": "Drive", "area": [[28,20],[32,20],[32,40],[28,40]], "rule": "headroom", "height": %s } ]""";
    Plan bar =
        Plots.bare().poles("").entry("[50, 20]").with("zones", drive.formatted("8.9")).plan();
    assertEquals(State.FOUL, get(bar, LEVEL, "zone-headroom").state());
    Plan free =
        Plots.bare().poles("").entry("[50, 20]").with("zones", drive.formatted("4.0")).plan();
    assertTrue(get(free, LEVEL, "zone-headroom").state() != State.FOUL);
    String people =
        """
        [ { "id": "balcony", "name": "Balcony", "area": [[28,29],[32,29],[32,31],[28,31]], "from": %s, "to": %s } ]""";
    assertEquals(
        State.FOUL,
        get(
                Plots.bare().poles("").with("people", people.formatted("7.5", "9.5")).plan(),
                LEVEL,
                "people")
            .state());
    Clearance below =
        get(
            Plots.bare().poles("").with("people", people.formatted("0", "6")).plan(),
            LEVEL,
            "people");
    assertTrue(below.distance() > 1 && below.distance() < 3, below.toString());
  }

  @Test
  void the_boundary_lets_pass_what_its_edge_allows() {
    String outside =
        """
        , { "id": "pine", "name": "Pine", "kind": "other", "at": [15, 64], "lowest": 3, "highest": 9 }""";
    Layout rope =
        Plots.straight(
            "level", 6, 0.5, Plots.hold("pine", 15, 64, 8), Plots.hold("west", 15, 30, 8));
    Layout wire =
        Plots.straight(
            "level", 1, 0.5, Plots.hold("pine", 15, 64, 8), Plots.hold("west", 15, 30, 8));
    String rules = "[ { \"edge\": 2, \"overhang\": \"%s\", \"agreedBy\": \"next door\" } ]";
    Plan none = Plots.bare().poles(outside).plan();
    assertEquals(-4, get(none, rope, "boundary").distance(), 0.3);
    Plan ropes = Plots.bare().poles(outside).with("boundaryRules", rules.formatted("ropes")).plan();
    assertTrue(get(ropes, rope, "boundary").state() != State.FOUL);
    assertEquals(State.FOUL, get(ropes, wire, "boundary").state());
    Plan wires = Plots.bare().poles(outside).with("boundaryRules", rules.formatted("wires")).plan();
    assertTrue(
        find(check(wires, wire), "boundary").map(Clearance::state).orElse(State.CLEAR)
            != State.FOUL);
  }

  @Test
  void cures_remove_what_they_cure() {
    String drive =
        """
        [ { "id": "drive", "name": "Drive", "area": [[28,20],[32,20],[32,40],[28,40]], "rule": "headroom", "height": 6.5 } ]""";
    Plan plan = Plots.bare().poles("").entry("[50, 20]").with("zones", drive).plan();
    Layout low =
        Plots.straight(
            "level", 2, 0.5, Plots.hold("west", 15, 30, 6), Plots.hold("east", 45, 30, 6.5));
    Rigging rigging = Rigging.of(plan, Catalogues.standard());
    Clearances clearances = Clearances.of(plan, Catalogues.standard());
    Rigged rigged = rigging.hang(low);
    List<Refusal> refusals = clearances.refuse(low, rigged, clearances.check(rigged));
    assertEquals(1, refusals.size());
    Refusal refusal = refusals.get(0);
    assertEquals("zone-headroom", refusal.rule());
    assertTrue(refusal.cure().startsWith("Raise"), refusal.cure());
    Layout cured = Plots.straight("level", 2, 0.5, refusal.cured().get(0), refusal.cured().get(1));
    assertTrue(
        clearances.check(rigging.hang(cured)).stream()
            .noneMatch(each -> each.state() == State.FOUL));
  }

  @Test
  void screening_never_drops_what_the_full_check_allows() {
    String things =
        """
        [ { "id": "shed", "name": "Shed", "footprint": [[25,20],[31,20],[31,26],[25,26]], "eaves": 3, "ridge": 6, "roof": "gable", "ridgeLine": [[25,23],[31,23]] } ]""";
    Plan plan =
        Plots.bare()
            .poles("")
            .with("buildings", things)
            .with(
                "overheadLines",
                """
                [ { "id": "line", "name": "The line", "kind": "low-voltage", "path": [[0,58,9],[60,58,8]] } ]""")
            .with(
                "mastZones",
                """
                [ { "id": "lawn", "name": "Lawn", "area": [[5,5],[55,5],[55,55],[5,55]], "highest": 9 } ]""")
            .plan();
    Rigging rigging = Rigging.of(plan, Catalogues.standard());
    Clearances clearances = Clearances.of(plan, Catalogues.standard());
    java.util.Random random = new java.util.Random(5);
    int allowed = 0;
    int dropped = 0;
    for (int i = 0; i < 400; i++) {
      double x = 5 + 50 * random.nextDouble();
      double y = 5 + 50 * random.nextDouble();
      Layout layout =
          Plots.straight(
              "sloping",
              1,
              0.3 + 0.4 * random.nextDouble(),
              Plots.hold("west", 15, 30, 4 + 6 * random.nextDouble()),
              Plots.hold("lawn", x, y, 3 + 6 * random.nextDouble()));
      if (Math.hypot(x - 15, y - 30) < 6) {
        continue;
      }
      boolean passes = clearances.screen(layout);
      Rigged rigged = rigging.hang(layout);
      boolean fine =
          rigged.shortcomings().isEmpty()
              && clearances.check(rigged).stream().noneMatch(each -> each.state() == State.FOUL);
      assertTrue(passes || !fine, layout.toString());
      allowed += fine ? 1 : 0;
      dropped += passes ? 0 : 1;
    }
    assertTrue(allowed > 20 && dropped > 20, allowed + " allowed, " + dropped + " dropped");
  }
}
