package spanwright.search;

import java.util.ArrayList;
import java.util.List;
import spanwright.plan.Catalogue;
import spanwright.plan.GroundSurface;
import spanwright.plan.MastZone;
import spanwright.plan.OverheadLine;
import spanwright.plan.Place;
import spanwright.plan.Plan;
import spanwright.plan.Point;

/**
 * How high a new mast may be before it could reach an overhead line in falling (the third rule of
 * the overhead lines), so that masts are proposed at a height that may pass. The rule itself is
 * held elsewhere, for every layout.
 */
final class MastLimits {
  /** Kept in hand, so that rounding does not turn a proposal foul [m]. */
  private static final double IN_HAND = 0.05;

  private record Line(List<Place> path, double kept) {}

  private final GroundSurface surface;
  private final List<Line> lines = new ArrayList<>();

  MastLimits(Plan plan, Catalogue catalogue, GroundSurface surface) {
    this.surface = surface;
    for (OverheadLine line : plan.overheadLines()) {
      if (line.kind() != OverheadLine.Kind.TELEPHONE) {
        double kept = catalogue.keptDistance(line, plan.brief().rules());
        lines.add(new Line(surface.raise(line.path()), kept));
      }
    }
  }

  /** Highest top above the ground for a mast with its foot there [m]. */
  double highest(MastZone zone, Point at) {
    double level = surface.heightAt(at.x(), at.y()) + zone.base();
    Place foot = new Place(at.x(), at.y(), level);
    double height = zone.highest() - zone.base();
    for (Line line : lines) {
      for (int i = 1; i < line.path.size(); i++) {
        Place nearest = foot.nearestOn(line.path.get(i - 1), line.path.get(i));
        height = Math.min(height, foot.distance(nearest) - line.kept - IN_HAND);
      }
    }
    return zone.base() + height;
  }
}
