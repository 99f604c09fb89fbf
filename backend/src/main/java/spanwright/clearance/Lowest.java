package spanwright.clearance;

import java.util.List;
import spanwright.plan.GroundSurface;
import spanwright.plan.Place;
import spanwright.plan.Point;

/**
 * The least height of a straight piece above the ground. Where the ground bends the least lies over
 * a bend or at an end of the piece: first sampled, with what can hide between two samples taken
 * off; only where that could be worse than the worst so far is it worked out bend by bend.
 */
final class Lowest {
  private static final double STEP = 0.25;

  private final GroundSurface ground;
  private final double steepest;

  Lowest(GroundSurface ground) {
    this.ground = ground;
    steepest = ground.steepest();
  }

  /**
   * Offers the lowest height along a piece between two shares of it.
   *
   * @param p points, x, y, z in turn
   * @param i offset of the piece's first point
   */
  void offer(
      double[] p,
      int i,
      double from,
      double to,
      double allowance,
      double required,
      String what,
      Tally.Worst worst) {
    if (ground.isLevel()) {
      at(p, i, from, allowance, required, what, worst);
      at(p, i, to, allowance, required, what, worst);
      return;
    }
    double dx = p[i + 3] - p[i];
    double dy = p[i + 4] - p[i + 1];
    double way = Math.hypot(dx, dy) * (to - from);
    int steps = Math.max(1, (int) Math.ceil(way / STEP));
    double rise = Math.abs(p[i + 5] - p[i + 2]) * (to - from);
    double hidden = (steepest * way + rise) / steps / 2;
    double least = Double.POSITIVE_INFINITY;
    for (int k = 0; k <= steps; k++) {
      double t = from + (to - from) * k / steps;
      double base = ground.heightAt(p[i] + t * dx, p[i + 1] + t * dy);
      least = Math.min(least, p[i + 2] + t * (p[i + 5] - p[i + 2]) - base);
    }
    if (least - hidden - allowance - required >= worst.spare()) {
      return;
    }
    Point a = new Point(p[i] + from * dx, p[i + 1] + from * dy);
    Point b = new Point(p[i] + to * dx, p[i + 1] + to * dy);
    List<Place> bends = way < 1e-9 ? List.of() : ground.profile(a, b);
    for (Place bend : bends) {
      double share = Math.hypot(bend.x() - a.x(), bend.y() - a.y()) / way;
      at(p, i, from + share * (to - from), allowance, required, what, worst);
    }
    at(p, i, from, allowance, required, what, worst);
    at(p, i, to, allowance, required, what, worst);
  }

  private void at(
      double[] p,
      int i,
      double t,
      double allowance,
      double required,
      String what,
      Tally.Worst worst) {
    double x = p[i] + t * (p[i + 3] - p[i]);
    double y = p[i + 1] + t * (p[i + 4] - p[i + 1]);
    double z = p[i + 2] + t * (p[i + 5] - p[i + 2]);
    double base = ground.heightAt(x, y);
    double height = z - base - allowance;
    if (height - required < worst.spare()) {
      worst.offer(height, required, what, new Place(x, y, z), new Place(x, y, base));
    }
  }
}
