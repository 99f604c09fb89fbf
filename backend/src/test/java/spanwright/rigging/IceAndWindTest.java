package spanwright.rigging;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import spanwright.plan.Catalogues;
import spanwright.plan.Place;
import spanwright.plan.RopeKind;
import spanwright.plan.WireKind;

/** Ice, gust, and ice with its part of the gust; margins; catalogues with holes. */
class IceAndWindTest {
  private static final Layout.Hold WEST = Plots.hold("west", 15, 30, 9);
  private static final Layout.Hold EAST = Plots.hold("east", 45, 30, 9);

  private static Rigged hang(double wind, double ice) {
    return Rigging.hang(
        Plots.bare().poles("").rules("\"wind\": " + wind + ", \"ice\": " + ice).plan(),
        Catalogues.standard(),
        Plots.straight("level", 5, 0.5, WEST, EAST));
  }

  @Test
  void the_gust_blows_the_bare_wire_and_less_of_it_the_iced_one() {
    Rigged rigged = hang(25, 6);
    Rigged.Shapes shapes = rigged.spans().get(0).shapes();
    assertEquals(6, shapes.all().size());
    double bare = shift(shapes.calm(), shapes.left());
    double iced = shift(shapes.calm(), shapes.icedLeft());
    assertTrue(bare > 0.1 && iced > 0.05, bare + " " + iced);
    assertTrue(swing(shapes.icedLeft()) < swing(shapes.left()), "heavier, and blown less");
    assertEquals(iced, -shift(shapes.calm(), shapes.icedRight()), 1e-9);
    assertEquals(0, shift(shapes.calm(), shapes.iced()), 1e-9);
    Rigged dry = hang(25, 0);
    assertTrue(dry.spans().get(0).shapes().iced().isEmpty());
  }

  /** Sideways shift of the middle over its drop. */
  private static double swing(List<Place> points) {
    Place middle = points.get(points.size() / 2);
    return Math.abs(middle.y() - 30) / (9 - middle.z());
  }

  private static double shift(List<Place> calm, List<Place> blown) {
    int middle = calm.size() / 2;
    return blown.get(middle).y() - calm.get(middle).y();
  }

  @Test
  void the_worst_weather_governs() {
    double none = hang(25, 0).attachments().get(0).pullInWind().size();
    double some = hang(25, 3).attachments().get(0).pullInWind().size();
    double ice = hang(0, 3).attachments().get(0).pullInWind().size();
    assertTrue(some >= ice - 1e-6, some + " " + ice);
    assertTrue(none > 0 && some > 0);
    Rigged heavy = hang(10, 12);
    for (Rigged.Span span : heavy.spans()) {
      assertTrue(span.strength().wire().margin() >= 2 - 1e-6, "let out until the wire holds");
    }
  }

  @Test
  void the_weakest_part_is_named_and_a_link_goes_before_it() {
    Strength strength = hang(25, 0).spans().get(0).strength();
    double least =
        Math.min(
            strength.wire().margin(),
            Math.min(strength.rope().margin(), strength.insulator().margin()));
    double named =
        switch (strength.partsFirst()) {
          case "wire" -> strength.wire().margin();
          case "rope" -> strength.rope().margin();
          default -> strength.insulator().margin();
        };
    assertEquals(least, named, 1e-12);
    assertEquals(
        Catalogues.standard().ropes().stream()
                .filter(RopeKind::isDefault)
                .findFirst()
                .orElseThrow()
                .breaking()
            / 2,
        strength.rope().holds(),
        1e-9,
        "knots take half");
    assertTrue(strength.weakLink() < strength.wire().holds());
    assertTrue(strength.weakLink() > 1.5 * strength.wire().worst());
    assertTrue(strength.wire().calmMargin() > strength.wire().margin());
  }

  @Test
  void a_catalogue_with_holes_is_told_in_a_sentence() {
    WireKind wire = Catalogues.standard().wires().get(0);
    List<RopeKind> ropes = new ArrayList<>();
    ropes.add(new RopeKind("r", "r", 0.006, 0.02, 0, 1e5, 0.15, true, null));
    ropes.add(new RopeKind("r", "r", 0.006, 0.02, Double.NaN, 1e5, 0.15, true, null));
    for (RopeKind rope : ropes) {
      String message =
          assertThrows(IllegalArgumentException.class, () -> Materials.of(wire, rope, 25, 0))
              .getMessage();
      assertTrue(message.contains("the rope \"r\" has no breaking strength"), message);
    }
    RopeKind good = new RopeKind("r", "r", 0.006, 0.02, 4000, 1e5, 0.15, true, null);
    for (double wind : new double[] {500, -1, Double.NaN}) {
      String message =
          assertThrows(IllegalArgumentException.class, () -> Materials.of(wire, good, wind, 0))
              .getMessage();
      assertTrue(message.contains("brief.rules.wind"), message);
    }
    String message =
        assertThrows(IllegalArgumentException.class, () -> Materials.of(wire, good, 25, 900))
            .getMessage();
    assertTrue(message.contains("brief.rules.ice"), message);
  }

  @Test
  void several_supports_hold_one_wire_over_many_spans() {
    Layout.Hold middle = Plots.hold("east", 45, 30, 9);
    String more =
        ", { \"id\": \"far\", \"name\": \"Far\", \"kind\": \"pole\", \"at\": [58, 40], \"lowest\":"
            + " 2, \"highest\": 10 }, { \"id\": \"farther\", \"name\": \"Farther\", \"kind\":"
            + " \"pole\", \"at\": [50, 58], \"lowest\": 2, \"highest\": 10 }";
    Rigged rigged =
        Rigging.hang(
            Plots.bare().poles(more).plan(),
            Catalogues.standard(),
            Plots.straight(
                "bent",
                2,
                0.3,
                WEST,
                middle,
                Plots.hold("far", 58, 40, 7),
                Plots.hold("farther", 50, 58, 9)));
    assertEquals(3, rigged.spans().size());
    for (int i = 0; i < 3; i++) {
      assertEquals(i, rigged.spans().get(i).from());
      assertEquals(i + 1, rigged.spans().get(i).to());
      assertTrue(rigged.spans().get(i).sag() > 0);
    }
    assertEquals("centre", rigged.attachments().get(2).held());
    assertTrue(rigged.shortcomings().isEmpty(), rigged.shortcomings().toString());
  }
}
