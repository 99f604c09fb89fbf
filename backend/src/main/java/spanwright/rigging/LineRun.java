package spanwright.rigging;

import java.util.ArrayList;
import java.util.List;
import spanwright.plan.GroundSurface;
import spanwright.plan.LineKind;
import spanwright.plan.Place;
import spanwright.plan.Plan;
import spanwright.plan.Point;
import spanwright.plan.Zone;

/**
 * How the feed line runs: a slack curve from the feedpoint to the entry, or, where the station's
 * own house is in the way, to a stand-off before the wall above the entry and down the wall.
 */
final class LineRun {
  private static final int PARTS = 14;

  private final Place entry;
  private final Point outward;
  private final List<Roof> roofs;
  private final GroundSurface ground;
  private final List<Zone> headrooms;

  LineRun(Plan plan, GroundSurface ground, List<Roof> roofs) {
    Point at = plan.entry().at();
    entry = new Place(at.x(), at.y(), ground.heightAt(at) + plan.entry().height());
    outward = outward(at, roofs);
    this.roofs = roofs;
    this.ground = ground;
    headrooms = plan.zones().stream().filter(each -> each.rule() == Zone.Rule.HEADROOM).toList();
  }

  Place entry() {
    return entry;
  }

  /** The way out of the wall the entry is in, or null where it is at no wall. */
  private static Point outward(Point at, List<Roof> roofs) {
    Point best = null;
    double least = 1.0;
    for (Roof roof : roofs) {
      List<Point> outline = roof.building().footprint();
      for (int i = 0; i < outline.size(); i++) {
        Point a = outline.get(i);
        Point b = outline.get((i + 1) % outline.size());
        double away = PlanShapes.toSegment(a.x(), a.y(), b.x(), b.y(), at.x(), at.y());
        double length = a.distance(b);
        if (away < least && length > 0) {
          double nx = (b.y() - a.y()) / length;
          double ny = (a.x() - b.x()) / length;
          double mx = (a.x() + b.x()) / 2;
          double my = (a.y() + b.y()) / 2;
          boolean inside = PlanShapes.contains(outline, mx + 1e-3 * nx, my + 1e-3 * ny);
          best = inside ? new Point(-nx, -ny) : new Point(nx, ny);
          least = away;
        }
      }
    }
    return best;
  }

  /** From where the line hangs down to: the entry, or stand-offs on the way to it, entry last. */
  List<Place> foot(Place feedpoint) {
    if (passes(feedpoint, entry, true)) {
      return List.of(entry);
    }
    if (outward != null) {
      double x = entry.x() + Practice.STAND_OFF * outward.x();
      double y = entry.y() + Practice.STAND_OFF * outward.y();
      double highest = entry.z();
      for (Roof roof : roofs) {
        highest = Math.max(highest, roof.top() + 2);
      }
      for (double z = entry.z(); z <= highest; z += 0.5) {
        Place standOff = new Place(x, y, z);
        if (passes(feedpoint, standOff, false)) {
          return z - entry.z() < 0.01
              ? List.of(standOff, entry)
              : List.of(standOff, new Place(x, y, entry.z()), entry);
        }
      }
    }
    return List.of(entry);
  }

  /** Whether a slack line between two places keeps off buildings, ground and zones' headroom. */
  private boolean passes(Place from, Place to, boolean endsAtWall) {
    double length = from.distance(to);
    double slack = Practice.LINE_SLACK * length + Practice.LINE_SPARE;
    double dx = to.x() - from.x();
    double dy = to.y() - from.y();
    double belly =
        Math.sqrt(3.0 / 8 * length * slack) * Math.hypot(dx, dy) / Math.max(1e-9, length);
    int steps = 30;
    for (int i = 1; i < steps; i++) {
      double t = (double) i / steps;
      double x = from.x() + t * dx;
      double y = from.y() + t * dy;
      // A steep slack line has its belly low; the parabola of a level one is taken lower for it.
      double z = from.z() + t * (to.z() - from.z()) - 4.4 * belly * t * (1 - t);
      boolean atWall = endsAtWall && (1 - t) * length < 0.5;
      if (!atWall && blocked(x, y, z)) {
        return false;
      }
    }
    return true;
  }

  private boolean blocked(double x, double y, double z) {
    for (Roof roof : roofs) {
      if (z < roof.top() + 0.15) {
        boolean over = roof.covers(x, y);
        if (over && z < roof.heightAt(x, y) + 0.15) {
          return true;
        }
        Point at = new Point(x, y);
        if (!over
            && z < roof.lowest()
            && PlanShapes.toPath(roof.building().footprint(), at, true) < 0.1) {
          return true;
        }
      }
    }
    double level = ground.heightAt(x, y);
    for (Zone each : headrooms) {
      if (z < level + each.height() + 0.1 && PlanShapes.contains(each.area(), x, y)) {
        return true;
      }
    }
    return z < level + 0.3;
  }

  /** The length of line that hangs slack from a feedpoint to a foot [m]. */
  static double hangingLength(Place feedpoint, Place foot) {
    return feedpoint.distance(foot) * (1 + Practice.LINE_SLACK) + Practice.LINE_SPARE;
  }

  /** Length along the stand-offs after the hanging part [m]. */
  static double ledLength(List<Place> feet) {
    double sum = 0;
    for (int i = 0; i + 1 < feet.size(); i++) {
      sum += feet.get(i).distance(feet.get(i + 1));
    }
    return sum;
  }

  /**
   * The hanging part, of given length, under its weight and a sideways push.
   *
   * @param weight newtons per metre
   * @param pushX newtons per metre
   * @param pushY newtons per metre
   */
  static Hung hang(
      Place feedpoint, List<Place> feet, double length, double weight, double pushX, double pushY) {
    Place foot = feet.get(0);
    Chain chain = new Chain(1);
    chain.length[0] = length;
    chain.flexibility[0] = 1e-6;
    chain.setLoad(0, pushX, pushY, -weight);
    double dx = foot.x() - feedpoint.x();
    double dy = foot.y() - feedpoint.y();
    double dz = foot.z() - feedpoint.z();
    List<Place> points = new ArrayList<>(PARTS + 1 + feet.size());
    Force pull = Force.NONE;
    if (dx * dx + dy * dy + dz * dz > 1e-6) {
      // Drawn as if the line never held a blown feedpoint back: longer where it would be taut.
      chain.length[0] = Math.max(length, 1.001 * feedpoint.distance(foot));
      new Tightening(chain, dx, dy, dz).asLong(chain.length[0] - feedpoint.distance(foot));
      double[] xyz = new double[3 * (PARTS + 1)];
      chain.sample(new int[] {PARTS}, xyz);
      for (int i = 0; i < PARTS; i++) {
        points.add(
            new Place(
                feedpoint.x() + xyz[3 * i],
                feedpoint.y() + xyz[3 * i + 1],
                feedpoint.z() + xyz[3 * i + 2]));
      }
      pull = new Force(chain.start[0], chain.start[1], chain.start[2]);
    } else {
      points.add(feedpoint);
    }
    points.addAll(feet);
    return new Hung(points, pull);
  }

  /**
   * A hung line.
   *
   * @param points feedpoint to entry
   * @param pull of the line on the feedpoint
   */
  record Hung(List<Place> points, Force pull) {}

  /** Weight of a metre of line under ice or without [N/m]. */
  static double weight(LineKind line, Materials materials, boolean iced) {
    return materials.weight(line.weight(), line.diameter(), iced);
  }
}
