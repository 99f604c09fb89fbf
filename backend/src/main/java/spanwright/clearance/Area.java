package spanwright.clearance;

import java.util.Arrays;
import java.util.List;
import spanwright.plan.Point;

/** An outline of the plan, for distances and crossings. */
final class Area {
  private final double[] x;
  private final double[] y;

  Area(List<Point> outline) {
    x = outline.stream().mapToDouble(Point::x).toArray();
    y = outline.stream().mapToDouble(Point::y).toArray();
  }

  int edges() {
    return x.length;
  }

  double[] corner(int i) {
    return new double[] {x[i], y[i]};
  }

  double[] box(double low, double high) {
    return new double[] {
      Arrays.stream(x).min().orElse(0),
      Arrays.stream(y).min().orElse(0),
      low,
      Arrays.stream(x).max().orElse(0),
      Arrays.stream(y).max().orElse(0),
      high
    };
  }

  boolean contains(double px, double py) {
    boolean inside = false;
    for (int i = 0, j = x.length - 1; i < x.length; j = i++) {
      if ((y[i] > py) != (y[j] > py) && px < (x[j] - x[i]) * (py - y[i]) / (y[j] - y[i]) + x[i]) {
        inside = !inside;
      }
    }
    return inside;
  }

  double toEdge(int i, double px, double py) {
    int j = (i + 1) % x.length;
    double dx = x[j] - x[i];
    double dy = y[j] - y[i];
    double square = dx * dx + dy * dy;
    double t = square == 0 ? 0 : ((px - x[i]) * dx + (py - y[i]) * dy) / square;
    t = Math.max(0, Math.min(1, t));
    return Space.hypot(px - x[i] - t * dx, py - y[i] - t * dy);
  }

  /** The point of an edge nearest to a point. */
  double[] footOnEdge(int i, double px, double py) {
    int j = (i + 1) % x.length;
    double dx = x[j] - x[i];
    double dy = y[j] - y[i];
    double square = dx * dx + dy * dy;
    double t = square == 0 ? 0 : ((px - x[i]) * dx + (py - y[i]) * dy) / square;
    t = Math.max(0, Math.min(1, t));
    return new double[] {x[i] + t * dx, y[i] + t * dy};
  }

  int nearestEdge(double px, double py) {
    int nearest = 0;
    double least = Double.POSITIVE_INFINITY;
    for (int i = 0; i < x.length; i++) {
      double d = toEdge(i, px, py);
      if (d < least) {
        least = d;
        nearest = i;
      }
    }
    return nearest;
  }

  double toOutline(double px, double py) {
    double least = Double.POSITIVE_INFINITY;
    for (int i = 0; i < x.length; i++) {
      least = Math.min(least, toEdge(i, px, py));
    }
    return least;
  }

  /** Distance to the area on plan; inside, less than nothing by the way out. */
  double signed(double px, double py) {
    double d = toOutline(px, py);
    return contains(px, py) ? -d : d;
  }

  /** Whether an edge is crossed, or touched, by the way from one point to another. */
  boolean crosses(int i, double ax, double ay, double bx, double by) {
    int j = (i + 1) % x.length;
    double a = turn(x[i], y[i], x[j], y[j], ax, ay);
    double b = turn(x[i], y[i], x[j], y[j], bx, by);
    double c = turn(ax, ay, bx, by, x[i], y[i]);
    double d = turn(ax, ay, bx, by, x[j], y[j]);
    return a * b < 0 && c * d < 0;
  }

  private static double turn(double ax, double ay, double bx, double by, double px, double py) {
    return (bx - ax) * (py - ay) - (by - ay) * (px - ax);
  }

  /**
   * Shares, from 0 to 1 and rising, at which the way from a to b meets the outline; between two
   * neighbours it lies wholly inside or wholly outside.
   */
  double[] cuts(double ax, double ay, double bx, double by) {
    double[] cuts = new double[x.length + 2];
    int n = 1;
    for (int i = 0; i < x.length; i++) {
      int j = (i + 1) % x.length;
      double a = turn(x[i], y[i], x[j], y[j], ax, ay);
      double b = turn(x[i], y[i], x[j], y[j], bx, by);
      if (a != b && a * b <= 0) {
        double t = a / (a - b);
        cuts[n++] = Math.max(0, Math.min(1, t));
      }
    }
    cuts[n++] = 1;
    double[] kept = Arrays.copyOf(cuts, n);
    Arrays.sort(kept);
    return kept;
  }
}
