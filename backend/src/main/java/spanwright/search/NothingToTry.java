package spanwright.search;

import java.util.ArrayList;
import java.util.EnumSet;
import java.util.List;
import java.util.Locale;
import java.util.Set;
import spanwright.clearance.Refusal;
import spanwright.plan.GroundSurface;
import spanwright.plan.Place;
import spanwright.plan.Plan;
import spanwright.plan.Point;
import spanwright.plan.Shape;

/** Says why not a single layout could be made, as the one refusal of a result. */
final class NothingToTry {
  private static final Set<Shape> SEARCHED =
      EnumSet.of(Shape.LEVEL, Shape.SLOPING, Shape.APEX, Shape.BENT, Shape.OFF_CENTRE);
  private static final String RULE = "hangs";

  private NothingToTry() {}

  static Refusal refusal(Plan plan, GroundSurface surface, double leastSpan) {
    List<String> ids = new ArrayList<>();
    List<Point> places = new ArrayList<>();
    plan.supports()
        .forEach(
            s -> {
              ids.add(s.id());
              places.add(s.at());
            });
    plan.bracketLines()
        .forEach(
            b -> {
              ids.add(b.id());
              places.addAll(b.path());
            });
    plan.mastZones()
        .forEach(
            z -> {
              ids.add(z.id());
              places.addAll(z.area());
            });
    double span = widest(places);
    Point entry = plan.entry().at();
    boolean shapes = plan.brief().shapes().stream().noneMatch(SEARCHED::contains);
    return new Refusal(
        ids,
        plan.brief().shapes().get(0).word(),
        RULE,
        "boundary",
        "wire",
        new Place(entry.x(), entry.y(), surface.heightAt(entry.x(), entry.y())),
        Math.round(span * 100) / 100.0,
        Math.round(leastSpan * 100) / 100.0,
        shapes ? ofShapes() : ofSpan(span, leastSpan),
        shapes
            ? "Allow one of those shapes in the brief."
            : "Add a support, a bracket line or a mast zone farther off, or allow a new mast.",
        List.of(),
        List.of(),
        null,
        null,
        List.of());
  }

  private static String ofShapes() {
    return "The brief allows only shapes that are not searched: level, sloping, apex, bent and"
        + " off-centre are.";
  }

  private static String ofSpan(double span, double leastSpan) {
    return String.format(
        Locale.ROOT,
        "No two places that can hold a wire leave room for one: the widest apart are %.1f m, and"
            + " %.1f m is the least for a wire with its ropes, inside the boundary and out of"
            + " crowns.",
        span,
        leastSpan);
  }

  private static double widest(List<Point> places) {
    double widest = 0;
    for (Point a : places) {
      for (Point b : places) {
        widest = Math.max(widest, a.distance(b));
      }
    }
    return widest;
  }
}
