package spanwright.sheet;

import java.util.List;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Geometry;
import org.locationtech.jts.geom.GeometryFactory;
import org.locationtech.jts.geom.LineString;
import org.locationtech.jts.geom.Polygon;
import spanwright.plan.Plan;
import spanwright.plan.Point;

/** Plan geometry that the sheet asks of the geometry library. */
final class Sight {
  static final GeometryFactory SHAPES = new GeometryFactory();

  /** A tape that only runs along a wall, or starts at its corner, is not stopped by it [m]. */
  private static final double SKIN = 0.05;

  /** A feed line nearer to a wall than this is led on stand-offs [m]. */
  private static final double CLIPPED = 0.5;

  private Sight() {}

  /** The outline as a polygon, closed. */
  static Polygon polygon(List<Point> outline) {
    Coordinate[] ring = new Coordinate[outline.size() + 1];
    for (int i = 0; i <= outline.size(); i++) {
      Point p = outline.get(i % outline.size());
      ring[i] = new Coordinate(p.x(), p.y());
    }
    return SHAPES.createPolygon(ring);
  }

  /** Points joined straight. */
  static LineString path(List<Point> points) {
    return SHAPES.createLineString(
        points.stream().map(p -> new Coordinate(p.x(), p.y())).toArray(Coordinate[]::new));
  }

  /** What of an outline stops a tape; empty when it has no area. */
  static Geometry core(List<Point> footprint) {
    return footprint.size() < 3 ? SHAPES.createPolygon() : polygon(footprint).buffer(-SKIN);
  }

  /** Whether an outline stands in the way of a tape. */
  static boolean blocks(List<Point> footprint, Point from, Point to) {
    Geometry core = core(footprint);
    return !core.isEmpty() && core.intersects(path(List.of(from, to)));
  }

  /** Whether a point of the plan lies on, in or close to a building, so that a line is clipped. */
  static boolean nearBuilding(Plan plan, double x, double y) {
    org.locationtech.jts.geom.Point at = SHAPES.createPoint(new Coordinate(x, y));
    return plan.buildings().stream()
        .filter(b -> b.footprint().size() >= 3)
        .anyMatch(b -> polygon(b.footprint()).distance(at) < CLIPPED);
  }
}
