package spanwright.plan;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Geometry;
import org.locationtech.jts.geom.GeometryFactory;
import org.locationtech.jts.operation.distance.DistanceOp;
import org.locationtech.jts.triangulate.DelaunayTriangulationBuilder;

class GroundSurfaceTest {
  private static final GeometryFactory MAKE = new GeometryFactory();

  private static GroundSurface ground(double[]... spots) {
    return GroundSurface.of(new Terrain(java.util.Arrays.stream(spots).map(Place::of).toList()));
  }

  @Test
  void without_terrain_the_ground_is_level_at_zero() {
    GroundSurface level = GroundSurface.of((Terrain) null);
    assertTrue(level.isLevel());
    assertEquals(0, level.heightAt(-1e5, 1e5));
    assertEquals(List.of(new Place(1, 2, 3)), level.raise(List.of(new Place(1, 2, 3))));
    assertEquals(2, level.profile(new Point(0, 0), new Point(9, 9)).size());
  }

  @Test
  void one_triangle_is_a_plane_inside_and_holds_its_rim_outside() {
    GroundSurface slope =
        ground(new double[] {0, 0, 0}, new double[] {20, 0, 1.2}, new double[] {0, 30, -0.4});
    assertEquals(0, slope.heightAt(0, 0), 1e-12);
    assertEquals(1.2, slope.heightAt(20, 0), 1e-12);
    assertEquals(0.6 - 0.1, slope.heightAt(10, 7.5), 1e-12);
    assertEquals(0.6, slope.heightAt(10, -50), 1e-12); // nearest: the side along y = 0
    assertEquals(1.2, slope.heightAt(80, -5), 1e-12); // nearest: a corner
    // nearest on the long side: foot of the perpendicular from (20, 30)
    double share = (20 * 20.0) / (20 * 20 + 30 * 30);
    assertEquals(-0.4 + share * 1.6, slope.heightAt(20, 30), 1e-12);
  }

  @Test
  void a_path_is_raised_by_the_ground_under_each_point() {
    GroundSurface slope =
        ground(new double[] {0, 0, 0}, new double[] {10, 0, 1}, new double[] {0, 10, 0});
    assertEquals(
        List.of(new Place(0, 0, 5), new Place(5, 0, 5.5)),
        slope.raise(List.of(new Place(0, 0, 5), new Place(5, 0, 5))));
  }

  @Test
  void spots_that_make_no_ground_are_a_programming_error() {
    assertThrows(
        IllegalArgumentException.class,
        () -> ground(new double[] {0, 0, 0}, new double[] {1, 1, 0}, new double[] {2, 2, 0}));
    assertThrows(
        IllegalArgumentException.class,
        () -> ground(new double[] {0, 0, 0}, new double[] {0, 0, 1}, new double[] {2, 3, 0}));
  }

  /**
   * Against the geometry library: every spot is met, the empty-circle rule holds, nothing is
   * missed.
   */
  @Test
  void many_spots_agree_with_a_plain_search_through_all_triangles() {
    Random random = new Random(3);
    for (int round = 0; round < 12; round++) {
      List<Place> spots = spots(random, 3 + random.nextInt(150), round);
      GroundSurface surface = GroundSurface.of(new Terrain(spots));
      for (Place spot : spots) {
        assertEquals(spot.z(), surface.heightAt(spot.x(), spot.y()), 1e-9);
      }
      Geometry triangles = triangles(spots);
      Geometry hull = triangles.convexHull();
      assertEquals(hull.getArea(), triangles.getArea(), 1e-9 * hull.getArea());
      for (int i = 0; i < 400; i++) {
        double x = random.nextDouble() * 140 - 20;
        double y = random.nextDouble() * 140 - 20;
        assertEquals(plain(triangles, hull, x, y), surface.heightAt(x, y), 1e-9);
      }
    }
  }

  private static List<Place> spots(Random random, int count, int round) {
    List<Place> spots = new ArrayList<>();
    double step = round % 3 == 0 ? 5 : 0; // every third round on a grid: corners on one circle
    for (int i = 0; i < count; i++) {
      double x = random.nextDouble() * 100;
      double y = random.nextDouble() * 100;
      Place spot =
          step == 0
              ? new Place(x, y, random.nextGaussian())
              : new Place(Math.rint(x / step) * step, Math.rint(y / step) * step, 0.02 * x);
      if (spots.stream().noneMatch(s -> s.onPlan().distance(spot.onPlan()) < 0.01)) {
        spots.add(spot);
      }
    }
    spots.add(new Place(-1, -1, 0.3));
    spots.add(new Place(101, -2, -0.3));
    spots.add(new Place(50, 103, 0.1));
    return spots;
  }

  private static Geometry triangles(List<Place> spots) {
    DelaunayTriangulationBuilder builder = new DelaunayTriangulationBuilder();
    builder.setSites(spots.stream().map(s -> new Coordinate(s.x(), s.y(), s.z())).toList());
    return builder.getTriangles(MAKE);
  }

  private static double plain(Geometry triangles, Geometry hull, double x, double y) {
    Coordinate at = new Coordinate(x, y);
    Coordinate inside =
        hull.covers(MAKE.createPoint(at))
            ? at
            : DistanceOp.nearestPoints(hull, MAKE.createPoint(at))[0];
    double least = Double.POSITIVE_INFINITY;
    double height = Double.NaN;
    for (int i = 0; i < triangles.getNumGeometries(); i++) {
      Geometry triangle = triangles.getGeometryN(i);
      double away = triangle.distance(MAKE.createPoint(inside));
      if (away < least) {
        least = away;
        Coordinate[] c = triangle.getCoordinates();
        height = org.locationtech.jts.geom.Triangle.interpolateZ(inside, c[0], c[1], c[2]);
      }
    }
    return height;
  }

  @Test
  void triangles_are_delaunay_no_spot_lies_inside_a_circle() {
    List<Place> spots = spots(new Random(9), 60, 1);
    Geometry triangles = triangles(spots);
    for (int i = 0; i < triangles.getNumGeometries(); i++) {
      Coordinate[] c = triangles.getGeometryN(i).getCoordinates();
      Coordinate centre = org.locationtech.jts.geom.Triangle.circumcentre(c[0], c[1], c[2]);
      double radius = centre.distance(c[0]);
      for (Place spot : spots) {
        double away = centre.distance(new Coordinate(spot.x(), spot.y()));
        assertTrue(away >= radius - 1e-6 * (1 + radius), "spot inside a circle");
      }
    }
  }

  @Test
  void between_two_places_of_a_profile_the_ground_is_straight() {
    Random random = new Random(5);
    GroundSurface surface = GroundSurface.of(new Terrain(spots(random, 40, 1)));
    for (int i = 0; i < 60; i++) {
      Point from = new Point(random.nextDouble() * 160 - 30, random.nextDouble() * 160 - 30);
      Point to = new Point(random.nextDouble() * 160 - 30, random.nextDouble() * 160 - 30);
      List<Place> profile = surface.profile(from, to);
      assertEquals(from, profile.get(0).onPlan());
      assertEquals(to, profile.get(profile.size() - 1).onPlan());
      for (int j = 1; j < profile.size(); j++) {
        Place a = profile.get(j - 1);
        Place b = profile.get(j);
        for (double s : new double[] {0.25, 0.5, 0.9}) {
          double x = a.x() + s * (b.x() - a.x());
          double y = a.y() + s * (b.y() - a.y());
          assertEquals(a.z() + s * (b.z() - a.z()), surface.heightAt(x, y), 1e-7);
        }
      }
    }
  }

  @Test
  void a_million_look_ups_among_five_thousand_spots_take_a_moment() {
    Random random = new Random(1);
    List<Place> spots = new ArrayList<>();
    for (int i = 0; i < 5000; i++) {
      spots.add(new Place(random.nextDouble() * 100, random.nextDouble() * 100, i % 7));
    }
    GroundSurface surface = GroundSurface.of(new Terrain(spots));
    long start = System.nanoTime();
    double sum = 0;
    for (int i = 0; i < 1_000_000; i++) {
      sum += surface.heightAt(random.nextDouble() * 100, random.nextDouble() * 100);
    }
    double seconds = (System.nanoTime() - start) / 1e9;
    assertTrue(Double.isFinite(sum));
    // 0.3 s when written; a search through all triangles would take minutes
    assertTrue(seconds < 5, "took " + seconds + " s");
  }
}
