package spanwright.assess;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.Test;
import spanwright.moments.AntennaModel;
import spanwright.moments.Vertex;
import spanwright.moments.WireSpec;
import spanwright.plan.GroundSurface;
import spanwright.plan.Plan;

/** How a plan's metalwork becomes conductors. */
class MetalTest {
  private static final String RAIL =
      "{ \"id\": \"rail\", \"name\": \"Top rail\", \"path\": [[10,5,1],[20,5,1]], \"radius\": 0.02 }";

  private static Metal metal(String site, String... pieces) {
    Plan plan = Gardens.withMetal(site, String.join(",", pieces));
    return Metal.of(plan, GroundSurface.of(plan));
  }

  private static String piece(String id, String path) {
    return "{ \"id\": \"" + id + "\", \"path\": " + path + ", \"radius\": 0.01 }";
  }

  private static boolean joined(Vertex a, Vertex b) {
    return a.distanceTo(b) < AntennaModel.JOIN_DISTANCE;
  }

  private static Vertex first(WireSpec wire) {
    return wire.points().get(0);
  }

  private static Vertex last(WireSpec wire) {
    return wire.points().get(wire.points().size() - 1);
  }

  @Test
  void a_piece_touched_in_its_middle_is_parted_there_and_all_three_meet() {
    Metal metal = metal("", RAIL, piece("post", "[[14,5.01,0],[14,5.01,1.005]]"));
    assertEquals(List.of("Top rail", "Top rail", "post"), metal.names());
    List<WireSpec> wires = metal.over(GroundPlane.level(0));
    assertTrue(joined(last(wires.get(0)), first(wires.get(1))));
    assertTrue(joined(last(wires.get(0)), last(wires.get(2))));
    assertEquals(0.02, wires.get(0).radius());
    assertEquals(5e6, wires.get(2).conductivity());
  }

  @Test
  void ends_that_touch_become_one_point_and_part_nothing() {
    Metal metal = metal("", RAIL, piece("next", "[[20.015,5,1],[28,5,1]]"));
    List<WireSpec> wires = metal.over(GroundPlane.level(0));
    assertEquals(2, wires.size());
    assertTrue(joined(last(wires.get(0)), first(wires.get(1))));
  }

  @Test
  void an_end_that_touches_two_pieces_holds_all_three_together() {
    Metal metal =
        metal(
            "",
            piece("branch", "[[14,5.01,1],[14,9,1]]"),
            RAIL,
            piece("stub", "[[14,5.02,1],[14,5.02,2]]"));
    List<WireSpec> wires = metal.over(GroundPlane.level(0));
    Vertex joint = last(wires.get(1));
    assertTrue(joined(joint, first(wires.get(0))), "branch on rail");
    assertTrue(joined(joint, first(wires.get(2))), "second part of the rail");
    assertTrue(joined(joint, first(wires.get(3))), "stub on rail");
  }

  @Test
  void pieces_three_centimetres_apart_do_not_touch() {
    Metal metal = metal("", RAIL, piece("post", "[[14,5.03,0],[14,5.03,1]]"));
    assertEquals(List.of("Top rail", "post"), metal.names());
  }

  @Test
  void what_ends_on_the_ground_ends_five_centimetres_above_it() {
    WireSpec rod =
        metal("", piece("rod", "[[10,10,0],[10,10,2]]")).over(GroundPlane.level(0)).get(0);
    assertEquals(0.05, first(rod).z(), 1e-9);
    assertEquals(2, last(rod).z(), 1e-9);
  }

  @Test
  void a_stub_within_five_centimetres_of_the_ground_is_no_conductor() {
    Metal metal = metal("", piece("stub", "[[10,10,0],[10,10,0.04]]"));
    assertTrue(metal.isEmpty());
  }

  @Test
  void metal_on_ground_below_the_plane_keeps_its_order_of_heights() {
    String slope = "\"terrain\": { \"spots\": [[0,0,-3],[0,30,-3],[40,0,3],[40,30,3]] }";
    List<WireSpec> wires =
        metal(
                slope,
                piece("low", "[[1,5,0.3],[1,15,0.3]]"),
                piece("high", "[[1,5,1],[1,15,1]]"),
                piece("post", "[[2,20,0],[2,20,2]]"))
            .over(GroundPlane.level(0));
    double low = first(wires.get(0)).z();
    double high = first(wires.get(1)).z();
    assertTrue(low >= 0.05 && high > low + 0.2, low + " and " + high);
    assertTrue(last(wires.get(2)).z() > first(wires.get(2)).z() + 0.5);
  }

  @Test
  void metal_on_ground_above_the_plane_stands_higher_by_the_rise() {
    String slope = "\"terrain\": { \"spots\": [[0,0,-3],[0,30,-3],[40,0,3],[40,30,3]] }";
    WireSpec rail =
        metal(slope, piece("rail", "[[30,5,1],[30,15,1]]")).over(GroundPlane.level(0)).get(0);
    assertEquals(1 + 1.5, first(rail).z(), 1e-9);
  }
}
