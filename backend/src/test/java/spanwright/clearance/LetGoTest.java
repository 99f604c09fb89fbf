package spanwright.clearance;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Random;
import org.junit.jupiter.api.Test;

/** The region of a freed wire against points strewn through it by the words of the rule alone. */
class LetGoTest {
  private static final double HALF = Math.toRadians(30);

  /** A point of the region by the rule's own words, from three numbers between 0 and 1. */
  private static double[] point(double[] shape, double reach, double a, double b, double c) {
    int end = shape.length - 3;
    double course = Math.atan2(shape[end + 1] - shape[1], shape[end] - shape[0]);
    double azimuth = course + (2 * a - 1) * HALF;
    double out = reach * b;
    double top = shape[end + 2];
    for (int i = 0; i + 3 < shape.length; i += 3) {
      double p = Math.hypot(shape[i] - shape[0], shape[i + 1] - shape[1]);
      double q = Math.hypot(shape[i + 3] - shape[0], shape[i + 4] - shape[1]);
      if (out >= p && out <= q) {
        double t = (out - p) / (q - p);
        top = shape[i + 2] + t * (shape[i + 5] - shape[i + 2]);
        break;
      }
    }
    double drop = Math.sqrt(Math.max(0, reach * reach - out * out));
    double z = Math.min(top, shape[2] + drop);
    double low = shape[2] - drop;
    if (z < low) {
      return null;
    }
    return new double[] {
      shape[0] + out * Math.cos(azimuth), shape[1] + out * Math.sin(azimuth), low + c * (z - low)
    };
  }

  private static double[] sagging(Random random) {
    double span = 8 + 15 * random.nextDouble();
    double turn = random.nextDouble() * 6.3;
    double rise = 6 * random.nextDouble() - 3;
    double sag = 2 * random.nextDouble();
    int n = 12;
    double[] shape = new double[3 * n + 3];
    for (int i = 0; i <= n; i++) {
      double t = (double) i / n;
      shape[3 * i] = 3 + t * span * Math.cos(turn);
      shape[3 * i + 1] = -2 + t * span * Math.sin(turn);
      shape[3 * i + 2] = 9 + t * rise - 4 * sag * t * (1 - t);
    }
    return shape;
  }

  private static double straight(double[] shape) {
    double sum = 0;
    for (int i = 0; i + 3 < shape.length; i += 3) {
      double dx = shape[i + 3] - shape[i];
      double dy = shape[i + 4] - shape[i + 1];
      double dz = shape[i + 5] - shape[i + 2];
      sum += Math.sqrt(dx * dx + dy * dy + dz * dz);
    }
    return sum;
  }

  @Test
  void no_point_of_the_region_is_nearer_to_a_line_than_the_distance_told() {
    Random random = new Random(21);
    for (int round = 0; round < 60; round++) {
      double[] shape = sagging(random);
      double reach = straight(shape) + 4 * random.nextDouble();
      LetGo region = new LetGo(shape, reach, HALF);
      double[] line = new double[6];
      for (int k = 0; k < 6; k++) {
        line[k] = k % 3 == 2 ? 3 + 12 * random.nextDouble() : 60 * random.nextDouble() - 30;
      }
      Space.Near told = new Space.Near();
      double found = region.toSegment(line, 0, 3, 3.05, Double.POSITIVE_INFINITY, told);
      double sampled = Double.POSITIVE_INFINITY;
      int n = 36;
      for (int a = 0; a <= n; a++) {
        for (int b = 0; b <= 2 * n; b++) {
          for (int c = 0; c <= n; c++) {
            double[] p = point(shape, reach, (double) a / n, b / (2.0 * n), (double) c / n);
            if (p != null) {
              Space.Near near = new Space.Near();
              Space.pointSegment(p[0], p[1], p[2], line, 0, 3, true, near);
              sampled = Math.min(sampled, near.distance());
            }
          }
        }
      }
      assertTrue(found <= sampled + 1e-9, round + ": told " + found + ", a point is at " + sampled);
      double grid = 1.0 + 0.05 * Math.max(0, sampled - 3.05);
      assertTrue(found >= sampled - grid, round + ": told " + found + ", none nearer " + sampled);
    }
  }

  @Test
  void a_line_moved_away_step_by_step_is_told_every_step() {
    double[] shape = {0, 0, 8, 10, 0, 7.6, 20, 0, 8};
    LetGo region = new LetGo(shape, 22, HALF);
    // straight on, beyond the reach: the level top of the region ends at 22 m
    for (double x = 10; x < 40; x += 0.5) {
      double[] line = {x, -5, 7.5, x, 5, 7.5};
      double found = region.toSegment(line, 0, 3, 3, Double.POSITIVE_INFINITY, new Space.Near());
      assertEquals(Math.max(0, x - 22), found, 0.02 + 0.04 * Math.max(0, x - 25), "x " + x);
    }
    // above: the old shape turned is the ceiling
    for (double z = 7; z < 20; z += 0.5) {
      double[] line = {19.9, -3, z, 19.9, 3, z};
      double found = region.toSegment(line, 0, 3, 3, Double.POSITIVE_INFINITY, new Space.Near());
      assertEquals(Math.max(0, z - 8), found, 0.02 + 0.04 * Math.max(0, z - 11), "z " + z);
    }
    // to the side: beyond 30 degrees
    for (double turn = 0; turn <= 120; turn += 5) {
      double angle = Math.toRadians(turn);
      double x = 15 * Math.cos(angle);
      double y = 15 * Math.sin(angle);
      double[] line = {x, y, 5, x, y, 5.1};
      double found = region.toSegment(line, 0, 3, 3, Double.POSITIVE_INFINITY, new Space.Near());
      double expected = turn <= 30 ? 0 : turn >= 120 ? 15 : 15 * Math.sin(angle - HALF);
      assertEquals(expected, found, 0.05 + 0.04 * Math.max(0, expected - 3), "turn " + turn);
    }
    // behind the point that holds
    double[] behind = {-4, 0, 5, -4, 0.1, 5};
    assertEquals(
        4, region.toSegment(behind, 0, 3, 3, Double.POSITIVE_INFINITY, new Space.Near()), 0.06);
  }

  @Test
  void an_upright_course_swings_all_round() {
    double[] shape = {0, 0, 9, 0.1, 0, 3};
    LetGo region = new LetGo(shape, 6.2, HALF);
    assertEquals(0, region.distance(-0.7, -0.7, 2.9), 1e-9);
    assertTrue(region.distance(-2, -2, 9.5) > 0);
  }
}
