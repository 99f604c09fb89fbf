package spanwright.rigging;

import java.util.List;
import spanwright.plan.Point;

/** Small questions about outlines and paths of the plan. */
public final class PlanShapes {
  private PlanShapes() {}

  /** Whether a point lies inside an outline (even–odd). */
  public static boolean contains(List<Point> outline, double x, double y) {
    boolean inside = false;
    int count = outline.size();
    for (int i = 0, j = count - 1; i < count; j = i++) {
      Point a = outline.get(i);
      Point b = outline.get(j);
      if ((a.y() > y) != (b.y() > y)
          && x < (b.x() - a.x()) * (y - a.y()) / (b.y() - a.y()) + a.x()) {
        inside = !inside;
      }
    }
    return inside;
  }

  /** Distance from a point to a path, or to an outline when it is closed [m]. */
  public static double toPath(List<Point> path, Point at, boolean closed) {
    double least = Double.POSITIVE_INFINITY;
    int count = path.size();
    for (int i = 0; i < (closed ? count : count - 1); i++) {
      Point a = path.get(i);
      Point b = path.get((i + 1) % count);
      least = Math.min(least, toSegment(a.x(), a.y(), b.x(), b.y(), at.x(), at.y()));
    }
    return count == 1 ? at.distance(path.get(0)) : least;
  }

  /** Distance from (x, y) to the segment a–b [m]. */
  public static double toSegment(double ax, double ay, double bx, double by, double x, double y) {
    double dx = bx - ax;
    double dy = by - ay;
    double square = dx * dx + dy * dy;
    double along = square == 0 ? 0 : ((x - ax) * dx + (y - ay) * dy) / square;
    double share = Math.max(0, Math.min(1, along));
    double ex = x - ax - share * dx;
    double ey = y - ay - share * dy;
    return Math.sqrt(ex * ex + ey * ey);
  }
}
