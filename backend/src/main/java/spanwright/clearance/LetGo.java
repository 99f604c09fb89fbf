package spanwright.clearance;

import java.util.Arrays;

/**
 * Where wire may come when one of two holding points lets go: within its reach of the point that
 * still holds, within an angle of its old course, at or below its old shape turned about the
 * upright through that point and carried level beyond its end.
 *
 * <p>The region is one flat figure, turned: how far out against height. The figure is bounded above
 * by the old shape, outside by a polygon drawn round the circle of the reach, so that nothing of
 * the region is lost. Its distance to a point changes by no more than the point moves; along a line
 * the least distance is found by halving until no piece can hold anything nearer, and the answer is
 * the bound, never above the truth.
 */
final class LetGo {
  private static final double CORNER = Math.toRadians(4);

  /** What an answer far beyond what is required may fall short by, as a share of what is beyond. */
  private static final double FAR = 0.005;

  /** Below this way on plan the course of a span has no azimuth: it may swing all round. */
  private static final double UPRIGHT = 0.5;

  private final double px;
  private final double py;
  private final double pz;
  private final double course;
  private final double half;
  private final double reach;
  private final double[] out;
  private final double[] up;
  private final int corners;

  // The nearest of the figure to the last point asked for.
  private double nearOut;
  private double nearUp;

  /**
   * A region.
   *
   * @param shape old shape from the point that holds to the one that lets go, x, y, z in turn
   * @param reach wire and rope from the one to the end of what comes free [m]
   * @param half angle to either side of the old course [rad]
   */
  LetGo(double[] shape, double reach, double half) {
    px = shape[0];
    py = shape[1];
    pz = shape[2];
    int end = shape.length - 3;
    double dx = shape[end] - px;
    double dy = shape[end + 1] - py;
    boolean upright = Math.hypot(dx, dy) < UPRIGHT;
    course = Math.atan2(dy, dx);
    this.half = upright ? Math.PI : Math.min(Math.PI, half);
    this.reach = reach / Math.cos(CORNER / 2);
    double[] o = new double[shape.length / 3 + 60];
    double[] u = new double[o.length];
    int n = top(shape, o, u);
    n = outside(o, u, n, shape[end + 2]);
    out = Arrays.copyOf(o, n);
    up = Arrays.copyOf(u, n);
    corners = n;
  }

  /** The old shape as far out against height, rising outwards; where it doubles back, its top. */
  private int top(double[] shape, double[] o, double[] u) {
    int n = 0;
    o[n] = 0;
    u[n++] = pz;
    for (int i = 3; i < shape.length; i += 3) {
      double away = Math.hypot(shape[i] - px, shape[i + 1] - py);
      if (away > o[n - 1] + 1e-9) {
        o[n] = away;
        u[n++] = shape[i + 2];
      } else {
        u[n - 1] = Math.max(u[n - 1], shape[i + 2]);
      }
    }
    return n;
  }

  /** Level from the end of the old shape to the reach, then round and down to the foot. */
  private int outside(double[] o, double[] u, int count, double level) {
    int n = count;
    double rise = level - pz;
    double edge = Math.sqrt(Math.max(0, reach * reach - rise * rise));
    double angle = Math.atan2(rise, edge);
    if (edge > o[n - 1] + 1e-9) {
      o[n] = edge;
      u[n++] = level;
    } else {
      angle = Math.atan2(u[n - 1] - pz, o[n - 1]);
    }
    int steps = (int) Math.ceil((angle + Math.PI / 2) / CORNER);
    for (int k = 1; k <= steps; k++) {
      double a = angle - (angle + Math.PI / 2) * k / steps;
      o[n] = k == steps ? 0 : reach * Math.cos(a);
      u[n++] = pz + reach * Math.sin(a);
    }
    return n;
  }

  /** Distance from a point to the region [m]; 0 inside. */
  double distance(double x, double y, double z) {
    double dx = x - px;
    double dy = y - py;
    double away = Math.sqrt(dx * dx + dy * dy);
    double turn = away == 0 ? 0 : Math.abs(wrapped(Math.atan2(dy, dx) - course));
    double beyond = Math.max(0, turn - half);
    double along = away * Math.cos(beyond);
    double across = away * Math.sin(Math.min(beyond, Math.PI / 2));
    if (beyond > Math.PI / 2) {
      // Behind the upright the nearest is on the upright itself.
      along = 0;
      across = away;
    }
    double flat = figure(along, z);
    return Math.sqrt(across * across + flat * flat);
  }

  private static double wrapped(double angle) {
    return angle - 2 * Math.PI * Math.rint(angle / (2 * Math.PI));
  }

  /** Distance within the plane of the figure. */
  private double figure(double x, double z) {
    boolean inside = false;
    double least = Double.POSITIVE_INFINITY;
    for (int i = 0, j = corners - 1; i < corners; j = i++) {
      double ax = out[j];
      double az = up[j];
      double bx = out[i];
      double bz = up[i];
      if ((az > z) != (bz > z) && x < (bx - ax) * (z - az) / (bz - az) + ax) {
        inside = !inside;
      }
      double dx = bx - ax;
      double dz = bz - az;
      double square = dx * dx + dz * dz;
      double t = square == 0 ? 0 : ((x - ax) * dx + (z - az) * dz) / square;
      t = Math.max(0, Math.min(1, t));
      double ex = x - ax - t * dx;
      double ez = z - az - t * dz;
      double d = ex * ex + ez * ez;
      if (d < least) {
        least = d;
        nearOut = ax + t * dx;
        nearUp = az + t * dz;
      }
    }
    if (inside) {
      nearOut = x;
      nearUp = z;
      return 0;
    }
    return Math.sqrt(least);
  }

  /** The search along one line. */
  private final class Along {
    final double[] line;
    final int a;
    final int b;
    final double required;
    final double enough;
    final Space.Near near;
    double best = Double.POSITIVE_INFINITY;
    double bound = Double.POSITIVE_INFINITY;

    Along(double[] line, int a, int b, double required, double enough, Space.Near near) {
      this.line = line;
      this.a = a;
      this.b = b;
      this.required = required;
      this.enough = enough;
      this.near = near;
    }

    double at(double t) {
      double x = line[a] + t * (line[b] - line[a]);
      double y = line[a + 1] + t * (line[b + 1] - line[a + 1]);
      double z = line[a + 2] + t * (line[b + 2] - line[a + 2]);
      double d = distance(x, y, z);
      if (d < best) {
        best = d;
        double angle = Math.atan2(y - py, x - px);
        double off = wrapped(angle - course);
        double held = course + Math.max(-half, Math.min(half, off));
        near.offer(px + nearOut * Math.cos(held), py + nearOut * Math.sin(held), nearUp, x, y, z);
      }
      return d;
    }

    void search(double from, double to, double atFrom, double atTo, double length) {
      double lower = Math.max(0, (atFrom + atTo - length) / 2);
      double tolerance = 0.002 + FAR * Math.max(0, best - required);
      if (lower >= Math.min(best - tolerance, enough) || length < 1e-4) {
        bound = Math.min(bound, lower);
        return;
      }
      double middle = (from + to) / 2;
      double atMiddle = at(middle);
      if (atFrom <= atTo) {
        search(from, middle, atFrom, atMiddle, length / 2);
        search(middle, to, atMiddle, atTo, length / 2);
      } else {
        search(middle, to, atMiddle, atTo, length / 2);
        search(from, middle, atFrom, atMiddle, length / 2);
      }
    }
  }

  /**
   * A distance no greater than that from the region to a line's segment [m], within 2 mm where it
   * is near what is required and half a hundredth of what is beyond it.
   *
   * @param enough what lies farther need not be told apart [m]
   * @param near offered the nearest pair found, the region's place as ours
   */
  double toSegment(double[] line, int a, int b, double required, double enough, Space.Near near) {
    Along along = new Along(line, a, b, required, enough, near);
    double dx = line[b] - line[a];
    double dy = line[b + 1] - line[a + 1];
    double dz = line[b + 2] - line[a + 2];
    double length = Math.sqrt(dx * dx + dy * dy + dz * dz);
    double first = along.at(0);
    double last = along.at(1);
    along.search(0, 1, first, last, length);
    return Math.min(along.best, along.bound);
  }
}
