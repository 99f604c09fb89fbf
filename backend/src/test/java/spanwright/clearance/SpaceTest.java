package spanwright.clearance;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Random;
import org.junit.jupiter.api.Test;

/** Distances in space: known pairs, degenerate pairs, swapped pairs, dense sampling. */
class SpaceTest {
  private static double segments(double... v) {
    Space.Near near = new Space.Near();
    Space.segments(v, 0, 3, v, 6, 9, near);
    return near.distance();
  }

  @Test
  void the_pair_that_the_geometry_library_gets_wrong_is_right() {
    double[] v = {0, 0, 0, 1, 1, 0, 0, 2, 0, 1, 4, 0};
    assertEquals(Math.sqrt(2), segments(v), 1e-15);
    assertEquals(Math.sqrt(2), segments(0, 2, 0, 1, 4, 0, 0, 0, 0, 1, 1, 0), 1e-15);
  }

  @Test
  void parallel_touching_crossing_and_point_like_segments_have_their_distance() {
    assertEquals(2, segments(0, 0, 0, 5, 0, 0, 1, 2, 0, 9, 2, 0), 1e-15);
    assertEquals(Math.hypot(3, 2), segments(0, 0, 0, 5, 0, 0, 8, 2, 0, 9, 2, 0), 1e-15);
    assertEquals(1, segments(0, 0, 0, 5, 0, 0, 6, 0, 0, 9, 0, 0), 1e-15, "on one line");
    assertEquals(0, segments(0, 0, 0, 5, 0, 0, 2, 0, 0, 9, 0, 0), 1e-15, "overlapping");
    assertEquals(0, segments(0, 0, 0, 5, 5, 5, 5, 5, 5, 9, 0, 0), 1e-15, "end to end");
    assertEquals(0, segments(0, 0, 0, 4, 0, 0, 2, -1, 0, 2, 1, 0), 1e-15, "crossing");
    assertEquals(3, segments(0, 0, 0, 4, 0, 0, 2, -1, 3, 2, 1, 3), 1e-15, "passing over");
    assertEquals(5, segments(0, 0, 0, 0, 0, 0, 3, 4, 0, 3, 4, 0), 1e-15, "two points");
    assertEquals(1, segments(2, 1, 0, 2, 1, 0, 0, 0, 0, 9, 0, 0), 1e-15, "point and segment");
    double slim = segments(0, 0, 0, 100, 1e-9, 0, 0, 1, 0, 100, 1, 1e-9);
    assertEquals(1, slim, 1e-8, "all but parallel");
  }

  @Test
  void segments_agree_with_dense_sampling_and_when_swapped() {
    Random random = new Random(11);
    for (int i = 0; i < 3000; i++) {
      double[] v = random.doubles(12, -5, 5).toArray();
      if (i % 5 == 0) {
        // all but parallel
        for (int k = 0; k < 3; k++) {
          v[9 + k] = v[6 + k] + (v[3 + k] - v[k]) * (1 + 0.3 * random.nextDouble()) + 1e-7;
        }
      }
      double found = segments(v);
      double swapped =
          segments(v[9], v[10], v[11], v[6], v[7], v[8], v[3], v[4], v[5], v[0], v[1], v[2]);
      assertEquals(found, swapped, 1e-9);
      double sampled = sampled(v, 60);
      assertTrue(found <= sampled + 1e-12, "never farther than a pair of points");
      double step = (length(v, 0) + length(v, 6)) / 60 / 2;
      assertTrue(found >= sampled - step, found + " against " + sampled);
    }
  }

  private static double length(double[] v, int at) {
    return Math.sqrt(
        Math.pow(v[at + 3] - v[at], 2)
            + Math.pow(v[at + 4] - v[at + 1], 2)
            + Math.pow(v[at + 5] - v[at + 2], 2));
  }

  private static double sampled(double[] v, int n) {
    double least = Double.POSITIVE_INFINITY;
    for (int i = 0; i <= n; i++) {
      for (int k = 0; k <= n; k++) {
        double sum = 0;
        for (int c = 0; c < 3; c++) {
          double p = v[c] + (v[3 + c] - v[c]) * i / n;
          double q = v[6 + c] + (v[9 + c] - v[6 + c]) * k / n;
          sum += (p - q) * (p - q);
        }
        least = Math.min(least, sum);
      }
    }
    return Math.sqrt(least);
  }

  @Test
  void segment_and_triangle_agree_with_dense_sampling() {
    Random random = new Random(12);
    for (int i = 0; i < 1500; i++) {
      double[] s = random.doubles(6, -4, 4).toArray();
      double[] t = random.doubles(9, -4, 4).toArray();
      Space.Near near = new Space.Near();
      Space.segmentTriangle(s, 0, 3, t, true, near);
      Space.Near other = new Space.Near();
      Space.segmentTriangle(s, 0, 3, t, false, other);
      assertEquals(near.distance(), other.distance(), 1e-9);
      double sampled = Double.POSITIVE_INFINITY;
      int n = 40;
      for (int a = 0; a <= n; a++) {
        for (int b = 0; b <= n - a; b++) {
          double[] p = new double[3];
          for (int k = 0; k < 3; k++) {
            p[k] = t[k] + (t[3 + k] - t[k]) * a / n + (t[6 + k] - t[k]) * b / n;
          }
          Space.Near point = new Space.Near();
          Space.pointSegment(p[0], p[1], p[2], s, 0, 3, true, point);
          sampled = Math.min(sampled, point.distance());
        }
      }
      assertTrue(near.distance() <= sampled + 1e-9);
      assertTrue(near.distance() >= sampled - 14.0 / n, near.distance() + " " + sampled);
    }
  }

  @Test
  void a_piercing_segment_and_a_flat_triangle_are_seen() {
    double[] t = {0, 0, 0, 4, 0, 0, 0, 4, 0};
    Space.Near near = new Space.Near();
    Space.segmentTriangle(new double[] {1, 1, -1, 1, 1, 1}, 0, 3, t, true, near);
    assertEquals(0, near.distance(), 1e-15);
    double[] flat = {0, 0, 0, 4, 0, 0, 8, 0, 0};
    Space.Near line = new Space.Near();
    Space.segmentTriangle(new double[] {1, 2, 0, 9, 2, 0}, 0, 3, flat, true, line);
    assertEquals(2, line.distance(), 1e-15);
  }
}
