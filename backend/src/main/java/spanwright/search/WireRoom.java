package spanwright.search;

import java.util.ArrayList;
import java.util.List;
import org.locationtech.jts.algorithm.Distance;
import org.locationtech.jts.algorithm.locate.IndexedPointInAreaLocator;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.GeometryFactory;
import org.locationtech.jts.geom.Location;
import org.locationtech.jts.geom.Polygon;
import spanwright.plan.BoundaryRule;
import spanwright.plan.Canopy;
import spanwright.plan.GroundSurface;
import spanwright.plan.Place;
import spanwright.plan.Plan;
import spanwright.plan.Point;
import spanwright.plan.Zone;

/**
 * Which part of a straight chord between two holding points may be wire. The rest becomes rope.
 * Only a proposal: every layout is still checked against every rule, so a generous answer costs
 * time and a mean one costs a candidate, never safety.
 */
final class WireRoom {
  /** Rope and insulator between a bare holding point and the wire [m]. */
  static final double LEAST_TAIL = 0.6;

  private static final double STEP = 0.2;
  private static final double WIRE_FROM_LEAVES = 0.6;
  private static final double END_FROM_LEAVES = 1.55;

  private record Crown(double x, double y, double radius, double from, double to) {}

  private final Plan plan;
  private final IndexedPointInAreaLocator inside;
  private final List<IndexedPointInAreaLocator> noWire;
  private final List<Crown> crowns;

  /** Metres along the chord between which wire may be. */
  record Room(double from, double to) {
    double length() {
      return to - from;
    }
  }

  WireRoom(Plan plan, GroundSurface surface) {
    this.plan = plan;
    inside = locator(plan.boundary());
    noWire =
        plan.zones().stream()
            .filter(zone -> zone.rule() == Zone.Rule.NO_WIRE)
            .map(zone -> locator(zone.area()))
            .toList();
    crowns = new ArrayList<>();
    plan.supports().forEach(s -> addCrown(s.at(), s.canopy(), surface));
    plan.trees().forEach(t -> addCrown(t.at(), t.canopy(), surface));
  }

  private void addCrown(Point at, Canopy canopy, GroundSurface surface) {
    if (canopy != null) {
      double ground = surface.heightAt(at.x(), at.y());
      crowns.add(
          new Crown(at.x(), at.y(), canopy.radius(), ground + canopy.from(), ground + canopy.to()));
    }
  }

  private static IndexedPointInAreaLocator locator(List<Point> corners) {
    Coordinate[] ring = new Coordinate[corners.size() + 1];
    for (int i = 0; i < corners.size(); i++) {
      ring[i] = new Coordinate(corners.get(i).x(), corners.get(i).y());
    }
    ring[corners.size()] = ring[0];
    Polygon area = new GeometryFactory().createPolygon(ring);
    return new IndexedPointInAreaLocator(area);
  }

  /** The longest stretch of the chord where wire may be; of no length when there is none. */
  Room along(Place a, Place b, double tailA, double tailB) {
    double length = a.distance(b);
    int steps = Math.max(2, (int) Math.ceil(length / STEP));
    double bestFrom = 0;
    double bestTo = 0;
    double from = -1;
    for (int i = 0; i <= steps; i++) {
      double s = length * i / steps;
      boolean free = s >= tailA && s <= length - tailB && wireMayBe(a, b, s / length);
      if (free && from < 0) {
        from = s;
      }
      if (from >= 0 && (!free || i == steps)) {
        double to = free ? s : length * (i - 1) / steps;
        if (to - from > bestTo - bestFrom) {
          bestFrom = from;
          bestTo = to;
        }
        from = -1;
      }
    }
    return clearOfLeaves(a, b, length, bestFrom, bestTo);
  }

  /** Ends stay further from leaves than the wire between them: draws them in. */
  private Room clearOfLeaves(Place a, Place b, double length, double from, double to) {
    double left = from;
    double right = to;
    while (left < right && inLeaves(a, b, left / length, END_FROM_LEAVES)) {
      left += STEP;
    }
    while (right > left && inLeaves(a, b, right / length, END_FROM_LEAVES)) {
      right -= STEP;
    }
    return new Room(left, Math.max(left, right));
  }

  private boolean wireMayBe(Place a, Place b, double t) {
    Coordinate at = new Coordinate(a.x() + t * (b.x() - a.x()), a.y() + t * (b.y() - a.y()));
    if (inside.locate(at) == Location.EXTERIOR && !mayHangOver(at)) {
      return false;
    }
    for (IndexedPointInAreaLocator zone : noWire) {
      if (zone.locate(at) != Location.EXTERIOR) {
        return false;
      }
    }
    return !inLeaves(a, b, t, WIRE_FROM_LEAVES);
  }

  /** Whether the boundary edge next to a place outside lets wire over. */
  private boolean mayHangOver(Coordinate at) {
    int nearest = -1;
    double least = Double.POSITIVE_INFINITY;
    List<Point> corners = plan.boundary();
    for (int i = 0; i < corners.size(); i++) {
      Point a = corners.get(i);
      Point b = corners.get((i + 1) % corners.size());
      double away =
          Distance.pointToSegment(at, new Coordinate(a.x(), a.y()), new Coordinate(b.x(), b.y()));
      if (away < least) {
        least = away;
        nearest = i;
      }
    }
    int edge = nearest;
    return plan.boundaryRules().stream()
        .anyMatch(r -> r.edge() == edge && r.overhang() == BoundaryRule.Overhang.WIRES);
  }

  private boolean inLeaves(Place a, Place b, double t, double margin) {
    double x = a.x() + t * (b.x() - a.x());
    double y = a.y() + t * (b.y() - a.y());
    double z = a.z() + t * (b.z() - a.z());
    for (Crown crown : crowns) {
      double reach = crown.radius + margin;
      double dx = x - crown.x;
      double dy = y - crown.y;
      if (z > crown.from - margin && z < crown.to + margin && dx * dx + dy * dy < reach * reach) {
        return true;
      }
    }
    return false;
  }
}
