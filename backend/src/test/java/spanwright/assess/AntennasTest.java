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

  private final Plan plan = Gardens.withMetal(SLOPE, RAIL);
  private final GroundSurface surface = GroundSurface.of(plan);
  private final Antennas antennas = new Antennas(CATALOGUE, surface, Metal.of(plan, surface));
  private final Rigged rigged = Rigging.of(plan, CATALOGUE).hang(span());

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
  void the_plane_lies_at_the_mean_height_of_the_ground_under_the_wire() {
    assertEquals((0.6 + 2.6) / 2, antennas.plane(rigged), 0.02);
    assertEquals(2.0, antennas.fall(rigged), 0.02);
  }

  @Test
  void the_wire_keeps_its_hanging_shape_and_stands_over_that_plane() {
    AntennaModel model = antennas.of(rigged, Metal.none());
    List<Place> calm = rigged.conductors().get(0).shapes().calm();
    WireSpec wire = model.wires().get(0);
    assertEquals(1, model.wires().size());
    assertEquals(calm.size(), wire.points().size());
    double plane = antennas.plane(rigged);
    for (int i = 0; i < calm.size(); i++) {
      assertEquals(calm.get(i).z() - plane, wire.points().get(i).z(), 1e-9);
    }
    assertTrue(wire.points().stream().anyMatch(p -> p.z() < 9 - plane - 0.05), "it sags");
  }

  @Test
  void metal_comes_after_the_wire_and_is_called_by_its_name() {
    AntennaModel model = antennas.of(rigged, antennas.metal());
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
    WireSpec wire = antennas.of(rigged, Metal.none()).wires().get(0);
    var kind = CATALOGUE.wire(rigged.conductors().get(0).wire());
    assertEquals(kind.radius(), wire.radius());
    assertEquals(kind.conductivity(), wire.conductivity());
    assertEquals(kind.insulation() == null, wire.sheath() == null);
  }

  @Test
  void what_the_solver_cannot_take_is_told_of_the_wire_and_not_of_the_solvers_numbers() {
    Assessor assessor = Assessor.of(plan, CATALOGUE);
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
