package spanwright.assess;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.Test;
import spanwright.moments.AntennaModel;
import spanwright.moments.WireSpec;
import spanwright.plan.Catalogue;
import spanwright.plan.Catalogues;
import spanwright.plan.GroundSurface;
import spanwright.plan.Place;
import spanwright.plan.Plan;
import spanwright.rigging.Layout;
import spanwright.rigging.Rigged;
import spanwright.rigging.Rigging;

/** A hanging wire before the field solver. */
class AntennasTest {
  private static final Catalogue CATALOGUE = Catalogues.standard();
  private static final String SLOPE =
      "\"terrain\": { \"spots\": [[0,0,0],[0,30,0],[40,0,4],[40,30,4]] }";
  private static final String RAIL =
      "{ \"id\": \"rail\", \"name\": \"Top rail\", \"path\": [[10,5,1],[20,5,1]], \"radius\": 0.02 }";

  private final Plan garden = Gardens.withMetal(SLOPE, RAIL);
  private final GroundSurface surface = GroundSurface.of(garden);
  private final Antennas antennas = new Antennas(CATALOGUE, surface, Metal.of(garden, surface));
  private final Rigged rigged = Rigging.of(garden, CATALOGUE).hang(span());
  private final GroundPlane plane = antennas.plane(rigged);

  /** Wire from x = 6 to x = 26, where the ground rises from 0.6 m to 2.6 m. */
  private static Layout span() {
    return new Layout(
        "level",
        List.of(
            new Layout.Hold("west", new Place(5, 15, 9)),
            new Layout.Hold("east", new Place(35, 15, 9))),
        List.of(new Layout.Run(List.of(new Place(6, 15, 9), new Place(26, 15, 9)), null)),
        new Layout.FeedChoice(0, 0.5, null, null));
  }

  @Test
  void the_plane_is_that_of_an_evenly_sloping_garden() {
    assertEquals(1.6, plane.heightAt(16, 15), 1e-9);
    assertEquals(Math.atan(0.1), plane.slope(), 1e-9);
    assertEquals(-Math.PI / 2, plane.fallsToward(), 1e-9);
    assertEquals(0, plane.departure(), 1e-9);
  }

  @Test
  void the_wire_keeps_its_hanging_shape_and_stands_over_that_plane() {
    AntennaModel model = antennas.of(rigged, plane, Metal.none());
    List<Place> calm = rigged.conductors().get(0).shapes().calm();
    WireSpec wire = model.wires().get(0);
    assertEquals(1, model.wires().size());
    assertEquals(calm.size(), wire.points().size());
    for (int i = 0; i < calm.size(); i++) {
      Place p = calm.get(i);
      double upright = p.z() - plane.heightAt(p.x(), p.y());
      assertEquals(upright * Math.cos(plane.slope()), wire.points().get(i).z(), 1e-9);
    }
    assertEquals(length(calm), wire.length(), 1e-9);
  }

  private static double length(List<Place> path) {
    double sum = 0;
    for (int i = 1; i < path.size(); i++) {
      sum += path.get(i - 1).distance(path.get(i));
    }
    return sum;
  }

  @Test
  void metal_comes_after_the_wire_and_is_called_by_its_name() {
    AntennaModel model = antennas.of(rigged, plane, antennas.metal());
    assertEquals(2, model.wires().size());
    assertEquals(0.02, model.wires().get(1).radius());
    assertEquals(
        "The wire: too near. See Top rail.",
        antennas.named("wires[0]: too near. See wires[1].", rigged, antennas.metal()));
  }

  @Test
  void only_the_piece_that_cannot_be_solved_is_left_out_and_named() {
    String crossed = "{ \"id\": \"stay\", \"path\": [[15,4,1],[15,6,1]], \"radius\": 0.01 }";
    String apart = "{ \"id\": \"pipe\", \"path\": [[30,5,2],[34,5,2]], \"radius\": 0.01 }";
    Plan crossing = Gardens.withMetal("", String.join(",", RAIL, crossed, apart));
    Placement placement = Assessor.of(crossing, CATALOGUE).assess(span());
    List<String> said =
        placement.notes().stream().filter(n -> n.contains("not in these figures")).toList();
    assertEquals(1, said.size(), said::toString);
    assertTrue(said.get(0).startsWith("stay") || said.get(0).startsWith("Top rail"), said.get(0));
  }

  @Test
  void wire_figures_come_from_the_catalogue() {
    WireSpec wire = antennas.of(rigged, plane, Metal.none()).wires().get(0);
    var kind = CATALOGUE.wire(rigged.conductors().get(0).wire());
    assertEquals(kind.radius(), wire.radius());
    assertEquals(kind.conductivity(), wire.conductivity());
    assertEquals(kind.insulation() == null, wire.sheath() == null);
  }

  @Test
  void what_the_solver_cannot_take_is_told_of_the_wire_and_not_of_the_solvers_numbers() {
    Assessor assessor = Assessor.of(garden, CATALOGUE);
    Layout fedAtItsEnd =
        new Layout(
            "level",
            span().attachments(),
            span().conductors(),
            new Layout.FeedChoice(0, 0, null, null));
    Unsolvable refused =
        assertThrows(Unsolvable.class, () -> assessor.assess(assessor.hang(fedAtItsEnd)));
    assertTrue(refused.getMessage().contains("of the wire lies"), refused.getMessage());
    assertFalse(refused.getMessage().contains("wires["), refused.getMessage());
  }
}
