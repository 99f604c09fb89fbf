package spanwright.rigging;

import java.util.HashMap;
import java.util.List;
import java.util.Map;
import spanwright.plan.BracketLine;
import spanwright.plan.Canopy;
import spanwright.plan.GroundSurface;
import spanwright.plan.MastZone;
import spanwright.plan.Plan;
import spanwright.plan.Point;
import spanwright.plan.Support;

/**
 * What an attachment can be on: a support, a bracket line or a mast zone. Exactly one is set.
 *
 * @param support or null
 * @param bracket or null
 * @param zone or null
 */
public record Holder(Support support, BracketLine bracket, MastZone zone) {
  /** Every holder of a plan by its id. */
  public static Map<String, Holder> all(Plan plan) {
    Map<String, Holder> all = new HashMap<>();
    plan.supports().forEach(each -> all.put(each.id(), new Holder(each, null, null)));
    plan.bracketLines().forEach(each -> all.put(each.id(), new Holder(null, each, null)));
    plan.mastZones().forEach(each -> all.put(each.id(), new Holder(null, null, each)));
    return Map.copyOf(all);
  }

  /** Its id. */
  public String id() {
    return support != null ? support.id() : bracket != null ? bracket.id() : zone.id();
  }

  /** Its name as people know it. */
  public String name() {
    String name = support != null ? support.name() : bracket != null ? bracket.name() : zone.name();
    return name == null || name.isBlank() ? id() : name;
  }

  /** What it may take [N], or null when not known. */
  public Double pullLimit() {
    return support != null
        ? support.pullLimit()
        : bracket != null ? bracket.pullLimit() : zone.pullLimit();
  }

  /** Whether it is a tree. */
  public boolean isTree() {
    return support != null && support.kind() == Support.Kind.TREE;
  }

  /** Whether what it holds is made fast at a wall, without a halyard. */
  public boolean isWall() {
    return bracket != null
        || support != null
            && (support.kind() == Support.Kind.WALL || support.kind() == Support.Kind.CHIMNEY);
  }

  /** Whether it is a mast or pole that already stands. */
  public boolean isStandingMast() {
    return support != null
        && (support.kind() == Support.Kind.MAST || support.kind() == Support.Kind.POLE);
  }

  /** How far it moves in the gust [m]. */
  public double sway() {
    return support == null ? 0 : support.sway();
  }

  /** Its own crown, or null. */
  public Canopy canopy() {
    return support == null ? null : support.canopy();
  }

  /** Whether a rope may go there, but no wire. */
  public boolean ropeOnly() {
    return support != null && support.ropeOnly();
  }

  /** Lowest height of an attachment above the ground there [m]. */
  public double lowest() {
    return support != null ? support.lowest() : bracket != null ? bracket.lowest() : zone.base();
  }

  /** Highest height of an attachment above the ground there [m]. */
  public double highest() {
    return support != null
        ? support.highest()
        : bracket != null ? bracket.highest() : zone.highest();
  }

  /** How far a point of the plan lies from its place [m]; 0 inside a zone. */
  public double away(Point at) {
    if (support != null) {
      return at.distance(support.at());
    }
    return bracket != null
        ? PlanShapes.toPath(bracket.path(), at, false)
        : outside(zone.area(), at);
  }

  private static double outside(List<Point> area, Point at) {
    return PlanShapes.contains(area, at.x(), at.y()) ? 0 : PlanShapes.toPath(area, at, true);
  }

  /** Height above the plan's zero of what a mast of this holder stands on [m]. */
  public double footHeight(GroundSurface ground, double x, double y) {
    return ground.heightAt(x, y) + (zone == null ? 0 : zone.base());
  }
}
