package spanwright.clearance;

import spanwright.plan.BoundaryRule;
import spanwright.plan.Place;
import spanwright.plan.Plan;
import spanwright.rigging.RuleBook;

/**
 * The boundary as an upright wall: nothing of ours passes over an edge that does not allow it. Less
 * than nothing is how far something is beyond. A rope that sways with its own tree is not counted
 * in the gust within the reach of that sway.
 */
final class Boundary {
  private static final double ROUNDING = 1e-3;
  private static final double NEAR_OWN = 1.5;

  private final Area area;
  private final BoundaryRule.Overhang[] allows;
  private final double required;
  private final double guyRequired;

  Boundary(Plan plan, RuleBook rules) {
    area = new Area(plan.boundary());
    allows = new BoundaryRule.Overhang[plan.boundary().size()];
    java.util.Arrays.fill(allows, BoundaryRule.Overhang.NONE);
    for (BoundaryRule each : plan.boundaryRules()) {
      if (each.edge() >= 0 && each.edge() < allows.length && each.overhang() != null) {
        allows[each.edge()] = each.overhang();
      }
    }
    required = rules.value("boundary");
    guyRequired = rules.value("guy-in-plot");
  }

  void check(Strand strand, Obstacle.Scene scene, Tally tally) {
    switch (strand.part) {
      case WIRE, FEED_LINE, ROPE -> walk(strand, scene, tally.of("boundary", "boundary"));
      case GUY -> foot(strand, tally.of("guy-in-plot", "boundary"), guyRequired);
      case MAST -> foot(strand, tally.of("boundary", "boundary"), 0);
      default -> {
        // what stands upright at a support is where the support is
      }
    }
  }

  /** A guy's peg is its strand's last point, a mast's foot its first. */
  private void foot(Strand strand, Tally.Worst worst, double needed) {
    double[] p = strand.states[0];
    int end = strand.part == Strand.Part.MAST ? 0 : p.length - 3;
    double inside = inside(p[end], p[end + 1]);
    Place at = Obstacle.place(p, end);
    worst.offer(inside, needed, strand.part.word, at, edge(at));
  }

  /** How far inside the boundary a point is [m]; less than nothing outside. */
  double inside(double x, double y) {
    return -area.signed(x, y);
  }

  boolean allows(int edge, boolean rope) {
    return allows[edge] == BoundaryRule.Overhang.WIRES
        || rope && allows[edge] == BoundaryRule.Overhang.ROPES;
  }

  private void walk(Strand strand, Obstacle.Scene scene, Tally.Worst worst) {
    boolean rope = strand.part == Strand.Part.ROPE;
    for (int s = 0; s < strand.states.length; s++) {
      boolean still = strand.isStill(s);
      double[] p = strand.states[s];
      for (int i = 0; i + 3 < p.length; i += 3) {
        double allowance = strand.slack(s, i);
        boolean own = rope && !still && nearOwn(strand, scene, p, i);
        if (!own && !isDeepInside(p, i, allowance + worst.reach(required))) {
          piece(p, i, rope, allowance, strand.part.word, worst);
        }
      }
    }
  }

  /** Whether a piece is inside and farther from every edge than this. */
  private boolean isDeepInside(double[] p, int i, double than) {
    double length = Math.hypot(p[i + 3] - p[i], p[i + 4] - p[i + 1]);
    return area.toOutline(p[i], p[i + 1]) > than + length && area.contains(p[i], p[i + 1]);
  }

  private static boolean nearOwn(Strand strand, Obstacle.Scene scene, double[] p, int i) {
    for (int a : new int[] {strand.from, strand.to}) {
      double reach = NEAR_OWN + scene.holders().get(a).sway();
      Place at = scene.at().get(a);
      if (Obstacle.place(p, i).distance(at) < reach
          && Obstacle.place(p, i + 3).distance(at) < reach) {
        return true;
      }
    }
    return false;
  }

  private void piece(
      double[] p, int i, boolean rope, double allowance, String what, Tally.Worst worst) {
    double found = signed(p[i], p[i + 1], p[i + 3], p[i + 4], rope) - allowance;
    // Standing on the line is not beyond it.
    found = found < 0 && found > -ROUNDING ? 0 : found;
    if (found < worst.range(required) && found - required < worst.spare()) {
      boolean first =
          toForbidden(p[i], p[i + 1], rope) <= toForbidden(p[i + 3], p[i + 4], rope)
              == area.contains(p[i], p[i + 1]);
      Place at = Obstacle.place(p, first ? i : i + 3);
      worst.offer(found, required, what, at, edge(at));
    }
  }

  /** How far inside a piece stays of every edge it may not pass; less than nothing when beyond. */
  double signed(double ax, double ay, double bx, double by, boolean rope) {
    double least = Double.POSITIVE_INFINITY;
    boolean crossed = false;
    for (int e = 0; e < area.edges(); e++) {
      if (!allows(e, rope)) {
        crossed |= area.crosses(e, ax, ay, bx, by);
        least = Math.min(least, Math.min(area.toEdge(e, ax, ay), area.toEdge(e, bx, by)));
        // Two segments that do not cross are nearest at an end of one of them.
        least = Math.min(least, cornerTo(e, ax, ay, bx, by));
      }
    }
    double beyond = Math.max(beyond(ax, ay, rope), beyond(bx, by, rope));
    return beyond > 0 ? -beyond : crossed ? 0 : least;
  }

  private double cornerTo(int e, double ax, double ay, double bx, double by) {
    double dx = bx - ax;
    double dy = by - ay;
    double square = dx * dx + dy * dy;
    double[] at = area.corner(e);
    double t = square == 0 ? 0 : ((at[0] - ax) * dx + (at[1] - ay) * dy) / square;
    t = Math.max(0, Math.min(1, t));
    double here = Math.hypot(at[0] - ax - t * dx, at[1] - ay - t * dy);
    at = area.corner((e + 1) % area.edges());
    t = square == 0 ? 0 : ((at[0] - ax) * dx + (at[1] - ay) * dy) / square;
    t = Math.max(0, Math.min(1, t));
    return Math.min(here, Math.hypot(at[0] - ax - t * dx, at[1] - ay - t * dy));
  }

  /** How far a point lies beyond edges it may not pass; 0 inside or beyond an edge that allows. */
  private double beyond(double x, double y, boolean rope) {
    if (area.contains(x, y)) {
      return 0;
    }
    int nearest = area.nearestEdge(x, y);
    return allows(nearest, rope) ? 0 : area.toEdge(nearest, x, y);
  }

  private double toForbidden(double x, double y, boolean rope) {
    double least = Double.POSITIVE_INFINITY;
    for (int e = 0; e < area.edges(); e++) {
      if (!allows(e, rope)) {
        least = Math.min(least, area.toEdge(e, x, y));
      }
    }
    return least;
  }

  private Place edge(Place at) {
    double[] foot = area.footOnEdge(area.nearestEdge(at.x(), at.y()), at.x(), at.y());
    return new Place(foot[0], foot[1], at.z());
  }
}
