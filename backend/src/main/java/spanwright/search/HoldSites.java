package spanwright.search;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.SplittableRandom;
import java.util.TreeSet;
import java.util.function.ToDoubleFunction;
import org.locationtech.jts.algorithm.locate.IndexedPointInAreaLocator;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Envelope;
import org.locationtech.jts.geom.GeometryFactory;
import org.locationtech.jts.geom.Location;
import org.locationtech.jts.geom.Polygon;
import spanwright.plan.BracketLine;
import spanwright.plan.Consent;
import spanwright.plan.GroundSurface;
import spanwright.plan.MastZone;
import spanwright.plan.Plan;
import spanwright.plan.Point;
import spanwright.plan.Support;
import spanwright.plan.Zone;

/** Finds where a wire can be held: supports, places along bracket lines, places in mast zones. */
final class HoldSites {
  private static final GeometryFactory GEOMETRY = new GeometryFactory();

  /** A mast lower than this holds nothing worth hanging [m]. */
  private static final double LEAST_MAST = 2.6;

  /** Places kept at most: four times what the richest demo plot has. */
  private static final int MOST = 300;

  private final Plan plan;
  private final GroundSurface surface;
  private final Effort effort;
  private final SplittableRandom random;
  private final ToDoubleFunction<MastFoot> mastLimit;

  /** A foot of a new mast: its zone and place. */
  record MastFoot(MastZone zone, Point at) {}

  /**
   * @param mastLimit highest top above the ground that the overhead lines allow a mast with that
   *     foot [m]
   */
  private HoldSites(
      Plan plan,
      GroundSurface surface,
      Effort effort,
      long seed,
      ToDoubleFunction<MastFoot> mastLimit) {
    this.plan = plan;
    this.surface = surface;
    this.effort = effort;
    this.random = new SplittableRandom(seed);
    this.mastLimit = mastLimit;
  }

  static List<HoldSite> of(
      Plan plan,
      GroundSurface surface,
      Effort effort,
      long seed,
      ToDoubleFunction<MastFoot> mastLimit) {
    HoldSites sites = new HoldSites(plan, surface, effort, seed, mastLimit);
    List<HoldSite> all = new ArrayList<>();
    plan.supports().forEach(support -> sites.addSupport(support, all));
    plan.bracketLines().forEach(line -> sites.addBrackets(line, all));
    if (plan.brief().newMasts() > 0) {
      plan.mastZones().forEach(zone -> sites.addMasts(zone, all));
    }
    return thinned(all);
  }

  /** Every so many-th where there are more than can be paired, so that memory stays bounded. */
  private static List<HoldSite> thinned(List<HoldSite> all) {
    if (all.size() <= MOST) {
      return all;
    }
    List<HoldSite> kept = new ArrayList<>();
    for (int i = 0; i < MOST; i++) {
      kept.add(all.get((int) ((long) i * all.size() / MOST)));
    }
    return kept;
  }

  private void addSupport(Support support, List<HoldSite> all) {
    if (neverPulls(support.pullLimit())) {
      return;
    }
    boolean crowned = support.canopy() != null;
    all.add(
        new HoldSite(
            support.id(),
            support.at(),
            surface.heightAt(support.at().x(), support.at().y()),
            support.lowest(),
            support.highest(),
            spread(support.lowest(), support.highest(), List.of()),
            false,
            !support.ropeOnly(),
            crowned));
  }

  /** A limit of 0 means: never use it. */
  private static boolean neverPulls(Double pullLimit) {
    return pullLimit != null && pullLimit <= 0;
  }

  private void addBrackets(BracketLine line, List<HoldSite> all) {
    if (neverPulls(line.pullLimit())) {
      return;
    }
    double length = 0;
    for (int i = 1; i < line.path().size(); i++) {
      length += line.path().get(i).distance(line.path().get(i - 1));
    }
    int places = Math.max(2, Math.min(2 + effort.mastPlaces / 3, (int) Math.ceil(length / 1.5)));
    for (int i = 0; i < places; i++) {
      Point at = along(line.path(), length * i / (places - 1));
      all.add(
          new HoldSite(
              line.id(),
              at,
              surface.heightAt(at.x(), at.y()),
              line.lowest(),
              line.highest(),
              List.of(line.highest()),
              false,
              true,
              false));
    }
  }

  private static Point along(List<Point> path, double distance) {
    double left = distance;
    for (int i = 1; i < path.size(); i++) {
      Point a = path.get(i - 1);
      Point b = path.get(i);
      double step = a.distance(b);
      if (left <= step || i == path.size() - 1) {
        double t = step == 0 ? 0 : Math.min(1, left / step);
        return new Point(a.x() + t * (b.x() - a.x()), a.y() + t * (b.y() - a.y()));
      }
      left -= step;
    }
    return path.get(0);
  }

  private void addMasts(MastZone zone, List<HoldSite> all) {
    if (neverPulls(zone.pullLimit())) {
      return;
    }
    double lowest = zone.base() + LEAST_MAST;
    List<Point> places = placesIn(zone);
    boolean any = false;
    for (Point at : places) {
      double top = Math.min(zone.highest(), mastLimit.applyAsDouble(new MastFoot(zone, at)));
      if (top >= lowest) {
        List<Double> steps =
            zone.consents().stream().map(Consent::highest).filter(h -> h > lowest).toList();
        all.add(mast(zone, at, top, spread(lowest, top, steps)));
        any = true;
      }
    }
    if (!any && zone.highest() >= lowest && !places.isEmpty()) {
      // An overhead line is too near for any mast here: one is proposed so that it is refused
      // aloud.
      all.add(mast(zone, places.get(0), zone.highest(), List.of(zone.highest())));
    }
  }

  private HoldSite mast(MastZone zone, Point at, double top, List<Double> heights) {
    double ground = surface.heightAt(at.x(), at.y());
    double lowest = zone.base() + LEAST_MAST;
    return new HoldSite(zone.id(), at, ground, lowest, top, heights, true, true, false);
  }

  /** The highest height, every consent step below it, and as many between as the effort allows. */
  private List<Double> spread(double lowest, double highest, List<Double> steps) {
    TreeSet<Double> heights = new TreeSet<>(Collections.reverseOrder());
    heights.add(highest);
    steps.stream().filter(step -> step < highest - 0.2).forEach(heights::add);
    for (int i = 1; i <= effort.heights && highest - lowest > 0.8; i++) {
      double height = highest - (highest - lowest) * i / (effort.heights + 1.0);
      if (heights.stream().allMatch(other -> Math.abs(other - height) > 0.4)) {
        heights.add(height);
      }
    }
    return List.copyOf(heights);
  }

  /**
   * Places spread over a zone: corners first (they make the longest spans), then points of a grid
   * shifted by the seed.
   */
  private List<Point> placesIn(MastZone zone) {
    Polygon area = polygon(zone.area());
    List<Polygon> forbidden =
        plan.zones().stream()
            .filter(z -> z.rule() == Zone.Rule.NO_MAST)
            .map(z -> polygon(z.area()))
            .toList();
    IndexedPointInAreaLocator inside = new IndexedPointInAreaLocator(area);
    List<Point> places = new ArrayList<>();
    Coordinate middle = area.getInteriorPoint().getCoordinate();
    for (Point corner : zone.area()) {
      double d = Math.hypot(middle.x - corner.x(), middle.y - corner.y());
      double pull = d == 0 ? 0 : Math.min(0.1 / d, 0.5);
      offer(
          new Point(
              corner.x() + pull * (middle.x - corner.x()),
              corner.y() + pull * (middle.y - corner.y())),
          inside,
          forbidden,
          places);
    }
    Envelope box = area.getEnvelopeInternal();
    double step = Math.max(0.5, Math.sqrt(area.getArea() / Math.max(1, effort.mastPlaces)));
    double shiftX = step * random.nextDouble();
    double shiftY = step * random.nextDouble();
    for (double x = box.getMinX() + shiftX; x < box.getMaxX(); x += step) {
      for (double y = box.getMinY() + shiftY; y < box.getMaxY(); y += step) {
        offer(new Point(x, y), inside, forbidden, places);
      }
    }
    return places;
  }

  private static void offer(
      Point at, IndexedPointInAreaLocator inside, List<Polygon> forbidden, List<Point> places) {
    Coordinate c = new Coordinate(at.x(), at.y());
    boolean free =
        inside.locate(c) == Location.INTERIOR
            && forbidden.stream().noneMatch(area -> area.intersects(GEOMETRY.createPoint(c)))
            && places.stream().noneMatch(other -> other.distance(at) < 0.6);
    if (free) {
      places.add(at);
    }
  }

  private static Polygon polygon(List<Point> corners) {
    Coordinate[] ring = new Coordinate[corners.size() + 1];
    for (int i = 0; i < corners.size(); i++) {
      ring[i] = new Coordinate(corners.get(i).x(), corners.get(i).y());
    }
    ring[corners.size()] = ring[0];
    return GEOMETRY.createPolygon(ring);
  }
}
