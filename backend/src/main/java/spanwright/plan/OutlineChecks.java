package spanwright.plan;

import java.util.List;
import org.locationtech.jts.algorithm.LineIntersector;
import org.locationtech.jts.algorithm.RobustLineIntersector;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.GeometryFactory;
import org.locationtech.jts.geom.Polygon;

/** Whether outlines enclose something and paths lead somewhere. Corners are counted from 1. */
final class OutlineChecks {
  /** Points nearer than this are one spot [m]. */
  static final double SPOT = 0.001;

  /** Areas below this are none [m²]. */
  private static final double NO_AREA = 0.01;

  private static final GeometryFactory MAKE = new GeometryFactory();

  private OutlineChecks() {}

  /**
   * Checks an outline.
   *
   * @param what it is called in sentences, "the outline"
   * @return whether it can be built upon
   */
  static boolean outline(Thing thing, String field, String what, List<Fault> faults) {
    List<Point> corners = thing.points(field);
    if (corners == null) {
      return false;
    }
    String at = thing.at(field);
    int count = corners.size();
    if (count < 3) {
      faults.add(Fault.of(at, Wording.FEW_CORNERS, thing.label(), what, count));
      return false;
    }
    if (together(corners.get(0), corners.get(count - 1))) {
      faults.add(Fault.of(at, Wording.CLOSED_OUTLINE, thing.label(), what));
      return false;
    }
    for (int i = 1; i < count; i++) {
      if (together(corners.get(i - 1), corners.get(i))) {
        faults.add(Fault.of(at, Wording.SAME_CORNER, thing.label(), i, i + 1, what));
        return false;
      }
    }
    return sound(thing, at, what, corners, faults);
  }

  private static boolean sound(
      Thing thing, String at, String what, List<Point> corners, List<Fault> faults) {
    Polygon polygon = polygon(corners);
    if (polygon.isValid()) {
      if (polygon.getArea() >= NO_AREA) {
        return true;
      }
      faults.add(Fault.of(at, Wording.NO_AREA, thing.label(), what));
      return false;
    }
    int[] sides = crossing(corners);
    if (sides.length == 0) {
      faults.add(Fault.of(at, Wording.NO_AREA, thing.label(), what));
    } else {
      int n = corners.size();
      faults.add(
          Fault.of(
              at,
              Wording.CROSSES_ITSELF,
              thing.label(),
              what,
              sides[0] + 1,
              (sides[0] + 1) % n + 1,
              sides[1] + 1,
              (sides[1] + 1) % n + 1));
    }
    return false;
  }

  /** The first two sides that meet where they should not; empty when none do. */
  private static int[] crossing(List<Point> corners) {
    int n = corners.size();
    LineIntersector meeting = new RobustLineIntersector();
    Coordinate[] at =
        corners.stream().map(p -> new Coordinate(p.x(), p.y())).toArray(Coordinate[]::new);
    if (polygon(corners).getArea() < NO_AREA && straight(at)) {
      return new int[0];
    }
    for (int i = 0; i < n; i++) {
      for (int j = i + 1; j < n; j++) {
        meeting.computeIntersection(at[i], at[(i + 1) % n], at[j], at[(j + 1) % n]);
        boolean neighbours = j == i + 1 || (i == 0 && j == n - 1);
        boolean allowed = neighbours && meeting.getIntersectionNum() <= 1;
        if (meeting.hasIntersection() && !allowed) {
          return new int[] {i, j};
        }
      }
    }
    return new int[0];
  }

  private static boolean straight(Coordinate[] at) {
    Coordinate far = at[0];
    for (Coordinate c : at) {
      far = c.distance(at[0]) > far.distance(at[0]) ? c : far;
    }
    double reach = far.distance(at[0]);
    for (Coordinate c : at) {
      double aside = (far.x - at[0].x) * (c.y - at[0].y) - (far.y - at[0].y) * (c.x - at[0].x);
      if (Math.abs(aside) > SPOT * reach) {
        return false;
      }
    }
    return true;
  }

  /** Checks a path in space or on the plan. */
  static void path(Thing thing, String field, List<Place> path, List<Fault> faults) {
    if (path == null) {
      return;
    }
    if (path.size() < 2) {
      faults.add(Fault.of(thing.at(field), Wording.SHORT_PATH, thing.label(), path.size()));
      return;
    }
    for (int i = 1; i < path.size(); i++) {
      if (path.get(i - 1).distance(path.get(i)) < SPOT) {
        faults.add(Fault.of(thing.at(field), Wording.SAME_POINT, thing.label(), i, i + 1));
        return;
      }
    }
  }

  static boolean together(Point a, Point b) {
    return a.distance(b) < SPOT;
  }

  static Polygon polygon(List<Point> corners) {
    Coordinate[] ring = new Coordinate[corners.size() + 1];
    for (int i = 0; i < ring.length; i++) {
      Point corner = corners.get(i % corners.size());
      ring[i] = new Coordinate(corner.x(), corner.y());
    }
    return MAKE.createPolygon(ring);
  }

  /** How far a point lies outside an outline [m]; 0 inside. */
  static double outside(Point point, Polygon outline) {
    return outline.distance(MAKE.createPoint(new Coordinate(point.x(), point.y())));
  }
}
