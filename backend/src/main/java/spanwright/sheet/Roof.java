package spanwright.sheet;

import java.util.List;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Geometry;
import spanwright.plan.Building;
import spanwright.plan.Point;

/**
 * The height of a roof above the local ground, for the picture of a section only: distances to
 * buildings are reckoned elsewhere.
 */
final class Roof {
  private final Building building;
  private final Geometry outline;
  private final Geometry edge;

  Roof(Building building) {
    this.building = building;
    this.outline = Sight.polygon(building.footprint()).buffer(0);
    this.edge = outline.getBoundary();
  }

  boolean covers(Point at) {
    return outline.covers(point(at));
  }

  private static Geometry point(Point at) {
    return Sight.SHAPES.createPoint(new Coordinate(at.x(), at.y()));
  }

  /** Metres above the ground. */
  double heightAt(Point at) {
    double rise = building.ridge() - building.eaves();
    if (building.roof() == Building.Roof.FLAT || rise <= 0 || building.ridgeLine().size() < 2) {
      return building.roof() == Building.Roof.FLAT ? building.eaves() : building.ridge();
    }
    double off = signed(at);
    if (building.roof() == Building.Roof.HIP) {
      double toRidge = Sight.path(building.ridgeLine()).distance(point(at));
      double toEaves = edge.distance(point(at));
      double whole = toRidge + toEaves;
      return building.eaves() + (whole < 1e-9 ? rise : rise * toEaves / whole);
    }
    // from the ridge down to the corner farthest from it on the same side
    double far = 0;
    for (Point corner : building.footprint()) {
      double c = signed(corner);
      if (c * off >= 0) {
        far = Math.max(far, Math.abs(c));
      }
    }
    return building.ridge() - (far < 1e-9 ? 0 : rise * Math.min(1, Math.abs(off) / far));
  }

  /** Metres to the left of the ridge line. */
  private double signed(Point at) {
    List<Point> ridge = building.ridgeLine();
    double dx = ridge.get(1).x() - ridge.get(0).x();
    double dy = ridge.get(1).y() - ridge.get(0).y();
    double length = Math.hypot(dx, dy);
    if (length < 1e-9) {
      return at.distance(ridge.get(0));
    }
    return (dx * (at.y() - ridge.get(0).y()) - dy * (at.x() - ridge.get(0).x())) / length;
  }
}
