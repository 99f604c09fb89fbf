package spanwright.assess;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertSame;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import spanwright.moments.AntennaModel;
import spanwright.moments.Directions;
import spanwright.moments.Ground;
import spanwright.moments.MeshAim;
import spanwright.moments.Solution;
import spanwright.moments.Solver;
import spanwright.moments.Vertex;
import spanwright.moments.WireSpec;
import spanwright.plan.Catalogues;
import spanwright.plan.GroundSurface;
import spanwright.plan.Place;
import spanwright.plan.Plan;
import spanwright.plan.Terrain;
import spanwright.rigging.Layout;

/** The plane that stands for sloping ground. */
class GroundPlaneTest {
  private static final Ground SOIL = Ground.real(13, 0.005);

  /** Ground that rises by these slopes, surveyed at the corners of a square. */
  private static GroundSurface hillside(double east, double north) {
    List<Place> spots = new ArrayList<>();
    for (double x : new double[] {-40, 40}) {
      for (double y : new double[] {-40, 40}) {
        spots.add(new Place(x, y, 2 + east * x + north * y));
      }
    }
    return GroundSurface.of(new Terrain(spots));
  }

  private static GroundPlane under(GroundSurface surface, Place... wire) {
    return GroundPlane.under(List.of(List.of(wire)), surface);
  }

  @Test
  void a_straight_wire_gets_the_cross_slope_from_the_ground_beside_it() {
    GroundSurface surface = hillside(0.05, -0.12);
    GroundPlane along = under(surface, new Place(-9, 0, 9), new Place(9, 0, 9));
    GroundPlane across = under(surface, new Place(0, -9, 9), new Place(0, 9, 9));
    for (GroundPlane plane : List.of(along, across)) {
      assertEquals(Math.atan(0.13), plane.slope(), 1e-9);
      assertEquals(2 + 0.05 * 3 - 0.12 * 7, plane.heightAt(3, 7), 1e-9);
      assertEquals(0, plane.departure(), 1e-9);
    }
  }

  @Test
  void an_upright_wire_gets_the_slope_of_the_one_line_it_can_see() {
    GroundPlane plane = under(hillside(0.05, -0.12), new Place(3, 7, 2), new Place(3, 7, 9));
    assertEquals(2 + 0.05 * 3 - 0.12 * 7, plane.heightAt(3, 7), 1e-9);
    assertEquals(Math.atan(0.05), plane.slope(), 1e-9);
  }

  @Test
  void ground_beyond_the_surveyed_spots_counts_next_to_nothing() {
    GroundPlane edge = under(hillside(0, 0.1), new Place(-9, 39.9, 12), new Place(9, 39.9, 12));
    assertEquals(Math.atan(0.1), edge.slope(), 2e-3);
  }

  @Test
  void over_a_tilted_plane_a_wire_is_what_it_is_over_a_level_one_but_for_the_directions() {
    GroundPlane plane = under(hillside(0.1, 0.15), new Place(-9, 2, 9), new Place(8, -3, 11));
    assertTrue(plane.slope() > 0.17);
    Place foot = new Place(0, 0, plane.heightAt(0, 0));
    List<Vertex> tilted = new ArrayList<>();
    List<Vertex> level = new ArrayList<>();
    for (Place p : List.of(new Place(-9, 2, 7), new Place(1, 0, 8), new Place(8, -3, 6))) {
      level.add(new Vertex(p.x(), p.y(), p.z()));
      tilted.add(plane.over(tipped(plane, foot, p)));
    }
    Solution one = solution(level);
    Solution other = solution(tilted);
    assertEquals(one.impedance().getReal(), other.impedance().getReal(), 1e-6);
    assertEquals(one.impedance().getImaginary(), other.impedance().getImaginary(), 1e-6);
    for (double azimuth = 0.3; azimuth < 6; azimuth += 1.1) {
      double elevation = 0.2 + 0.1 * azimuth;
      double[] seen = plane.onPlan(azimuth, elevation);
      Directions there = Directions.of(new double[] {seen[0]}, new double[] {seen[1]});
      assertEquals(
          one.gain(azimuth, elevation).totalDbi(),
          other.gains(plane.seen(there)).get(0).totalDbi(),
          1e-6);
    }
  }

  /** A place so many metres east, north and up in the plane's own frame, on the plan. */
  private static Place tipped(GroundPlane plane, Place foot, Place p) {
    double size = Math.sqrt(p.x() * p.x() + p.y() * p.y() + p.z() * p.z());
    double[] seen = plane.onPlan(Math.atan2(p.x(), p.y()), Math.asin(p.z() / size));
    double level = size * Math.cos(seen[1]);
    return new Place(
        foot.x() + level * Math.sin(seen[0]),
        foot.y() + level * Math.cos(seen[0]),
        foot.z() + size * Math.sin(seen[1]));
  }

  private static Solution solution(List<Vertex> points) {
    AntennaModel model =
        AntennaModel.of(List.of(WireSpec.of(points, 0.001, WireSpec.COPPER)), 0, 0.4);
    return new Solver().solve(model, SOIL, 14.1, MeshAim.COARSE);
  }

  @Test
  void nothing_is_reckoned_into_the_slope() {
    GroundPlane plane = under(hillside(0, 0.2), new Place(-9, 0, 9), new Place(9, 0, 9));
    assertEquals(Math.atan(0.2), plane.rise(0), 1e-9);
    Solution solution =
        solution(List.of(plane.over(new Place(-9, 0, 9)), plane.over(new Place(9, 0, 9))));
    double low = Math.toRadians(8);
    Directions north = plane.seen(Directions.of(new double[] {0}, new double[] {low}));
    Directions south = plane.seen(Directions.of(new double[] {Math.PI}, new double[] {low}));
    assertEquals(-99, solution.gains(north).get(0).totalDbi());
    assertTrue(solution.gains(south).get(0).totalDbi() > 0, "downhill it is the better for it");
  }

  @Test
  void without_terrain_nothing_is_turned_at_all() {
    GroundPlane plane = under(GroundSurface.level(), new Place(-9, 0.1, 9), new Place(9, 0.3, 9.7));
    Directions ring = Directions.ring(8, 0.3);
    assertTrue(plane.isLevel());
    assertSame(ring, plane.seen(ring));
    assertEquals(new Vertex(9, 0.3, 9.7), plane.over(new Place(9, 0.3, 9.7)));
  }

  @Test
  void the_slope_is_said_in_words_with_its_true_bearing() {
    String terrain =
        "\"planNorth\": 30, \"terrain\": { \"spots\": [[0,0,0],[0,30,0],[40,0,6],[40,30,6]] }";
    String brief =
        """
        "bands": [ { "name": "20 m", "frequencies": [14.175] } ],
        "targets": [ { "name": "Uphill", "bearing": 120, "distanceKm": 8000 } ]
        """;
    Plan plan = Gardens.of(terrain, "", brief);
    Layout span =
        new Layout(
            "level",
            List.of(
                new Layout.Hold("west", new Place(5, 15, 9)),
                new Layout.Hold("east", new Place(35, 15, 13))),
            List.of(new Layout.Run(List.of(new Place(8, 15, 9), new Place(28, 15, 12)), null)),
            new Layout.FeedChoice(0, 0.5, null, null));
    Placement placement = Assessor.of(plan, Catalogues.standard()).assess(span);
    String said = String.join("\n", placement.notes());
    assertTrue(said.contains("Reckoned over ground that falls 9° toward 300°."), said);
    assertTrue(said.contains("Uphill on 20 m: the ground rises 9° that way"), said);
    assertTrue(placement.quality().sure(), said);
    assertTrue(placement.quality().bands().get(0).refinementChange() < Judgement.MOST_CHANGE);
    assertNull(
        Assessor.of(Gardens.of("", "", brief), Catalogues.standard()).assess(span).notes().stream()
            .filter(note -> note.contains("Reckoned"))
            .findAny()
            .orElse(null));
  }
}
