package spanwright.rigging;

import java.util.ArrayList;
import java.util.List;
import org.locationtech.jts.algorithm.MinimumDiameter;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Geometry;
import org.locationtech.jts.geom.GeometryFactory;
import org.locationtech.jts.geom.Polygon;
import org.locationtech.jts.triangulate.polygon.PolygonTriangulator;
import spanwright.plan.Building;
import spanwright.plan.GroundSurface;
import spanwright.plan.Point;

/**
 * A building as a solid: everything over its footprint up to the roof.
 *
 * <p>The roof falls evenly from the ridge line to the eaves at the footprint's farthest extent: to
 * both sides for a gable, to the ends of the ridge as well for a hip, to the one side for a lean-to
 * whose ridge line is its high edge. On an outline that is no rectangle the nearer corners are so
 * taken a little high, never low. Heights stand on the highest ground under a corner. A pitched
 * roof without a ridge line gets one along the middle of its smallest rectangle; a lean-to without
 * one counts as flat at its high edge.
 */
public final class Roof {
  private static final GeometryFactory SHAPES = new GeometryFactory();

  private final Building building;
  private final double eaves;
  private final double ridge;
  private final double ox;
  private final double oy;
  private final double ux;
  private final double uy;
  private final double half;
  private final double left;
  private final double right;
  private final double back;
  private final double front;

  private Roof(Building building, double base, List<Point> line) {
    this.building = building;
    boolean sloped = line.size() >= 2 && building.roof() != Building.Roof.FLAT;
    boolean unknown = building.roof() == Building.Roof.LEAN_TO && line.size() < 2;
    ridge = base + building.ridge();
    eaves = base + (unknown ? Math.max(building.ridge(), building.eaves()) : building.eaves());
    Point a = sloped ? line.get(0) : building.footprint().get(0);
    Point b = sloped ? line.get(line.size() - 1) : building.footprint().get(1);
    double length = Math.max(1e-9, a.distance(b));
    ux = (b.x() - a.x()) / length;
    uy = (b.y() - a.y()) / length;
    ox = (a.x() + b.x()) / 2;
    oy = (a.y() + b.y()) / 2;
    half = length / 2;
    double[] reach = new double[4];
    for (Point each : building.footprint()) {
      double along = (each.x() - ox) * ux + (each.y() - oy) * uy;
      double across = (each.y() - oy) * ux - (each.x() - ox) * uy;
      reach[0] = Math.max(reach[0], across);
      reach[1] = Math.max(reach[1], -across);
      reach[2] = Math.max(reach[2], -along - half);
      reach[3] = Math.max(reach[3], along - half);
    }
    left = sloped ? reach[0] : 0;
    right = sloped ? reach[1] : 0;
    boolean hip = sloped && building.roof() == Building.Roof.HIP;
    back = hip ? reach[2] : 0;
    front = hip ? reach[3] : 0;
  }

  /** The roof of a building on this ground. */
  public static Roof of(Building building, GroundSurface ground) {
    double base = Double.NEGATIVE_INFINITY;
    for (Point each : building.footprint()) {
      base = Math.max(base, ground.heightAt(each));
    }
    List<Point> line = building.ridgeLine();
    if (line.size() < 2
        && (building.roof() == Building.Roof.GABLE || building.roof() == Building.Roof.HIP)) {
      line = middleLine(building);
    }
    return new Roof(building, base, line);
  }

  private static List<Point> middleLine(Building building) {
    Coordinate[] c =
        MinimumDiameter.getMinimumRectangle(polygon(building.footprint())).getCoordinates();
    if (c.length < 5) {
      return List.of();
    }
    boolean firstLong = c[0].distance(c[1]) >= c[1].distance(c[2]);
    Coordinate p = firstLong ? middle(c[0], c[3]) : middle(c[0], c[1]);
    Coordinate q = firstLong ? middle(c[1], c[2]) : middle(c[2], c[3]);
    if (building.roof() == Building.Roof.HIP) {
      double width = firstLong ? c[1].distance(c[2]) : c[0].distance(c[1]);
      double inset = Math.min(0.45, width / 2 / Math.max(1e-9, p.distance(q)));
      Coordinate r = between(p, q, inset);
      q = between(p, q, 1 - inset);
      p = r;
    }
    return List.of(new Point(p.x, p.y), new Point(q.x, q.y));
  }

  private static Coordinate middle(Coordinate a, Coordinate b) {
    return between(a, b, 0.5);
  }

  private static Coordinate between(Coordinate a, Coordinate b, double share) {
    return new Coordinate(a.x + share * (b.x - a.x), a.y + share * (b.y - a.y));
  }

  private static Polygon polygon(List<Point> outline) {
    Coordinate[] ring = new Coordinate[outline.size() + 1];
    for (int i = 0; i < ring.length; i++) {
      Point each = outline.get(i % outline.size());
      ring[i] = new Coordinate(each.x(), each.y());
    }
    return SHAPES.createPolygon(ring);
  }

  /** The building under it. */
  public Building building() {
    return building;
  }

  /** Whether a point of the plan lies over the footprint. */
  public boolean covers(double x, double y) {
    return PlanShapes.contains(building.footprint(), x, y);
  }

  /** Height of the roof above the plan's zero over a point of the footprint [m]. */
  public double heightAt(double x, double y) {
    if (left + right == 0) {
      return Math.max(eaves, ridge);
    }
    double along = (x - ox) * ux + (y - oy) * uy;
    double across = (y - oy) * ux - (x - ox) * uy;
    double fall = across >= 0 ? share(across, left) : share(-across, right);
    if (building.roof() == Building.Roof.HIP) {
      double beyond = Math.abs(along) - half;
      fall = Math.max(fall, share(beyond, along >= 0 ? front : back));
    }
    return ridge - (ridge - eaves) * fall;
  }

  private static double share(double way, double whole) {
    return way <= 0 || whole <= 1e-9 ? 0 : Math.min(1, way / whole);
  }

  /** The lowest point of the roof above the plan's zero [m]. */
  public double lowest() {
    return left + right == 0 ? top() : Math.min(eaves, ridge);
  }

  /** The highest point of the roof above the plan's zero [m]. */
  public double top() {
    return Math.max(eaves, ridge);
  }

  /**
   * The outer faces as triangles, nine numbers each: roof planes, and walls down to the depth.
   *
   * @param depth height above the plan's zero that walls go down to [m]
   */
  public List<double[]> faces(double depth) {
    List<double[]> faces = new ArrayList<>();
    for (Polygon piece : pieces()) {
      Geometry triangles = PolygonTriangulator.triangulate(piece);
      for (int i = 0; i < triangles.getNumGeometries(); i++) {
        Coordinate[] c = triangles.getGeometryN(i).getCoordinates();
        faces.add(triangle(lift(c[0]), lift(c[1]), lift(c[2])));
      }
      Coordinate[] ring = piece.getExteriorRing().getCoordinates();
      for (int i = 0; i + 1 < ring.length; i++) {
        double[] a = lift(ring[i]);
        double[] b = lift(ring[i + 1]);
        double[] c = {b[0], b[1], depth};
        double[] d = {a[0], a[1], depth};
        faces.add(triangle(a, b, c));
        faces.add(triangle(a, c, d));
      }
    }
    return faces;
  }

  private double[] lift(Coordinate c) {
    return new double[] {c.x, c.y, heightAt(c.x, c.y)};
  }

  private static double[] triangle(double[] a, double[] b, double[] c) {
    return new double[] {a[0], a[1], a[2], b[0], b[1], b[2], c[0], c[1], c[2]};
  }

  /** The footprint cut where the roof changes its plane. */
  private List<Polygon> pieces() {
    List<Geometry> parts = List.of(polygon(building.footprint()));
    if (left + right > 0) {
      parts = cut(parts, 0, 0, ux, uy);
      if (building.roof() == Building.Roof.HIP) {
        for (int end = -1; end <= 1; end += 2) {
          double run = end > 0 ? front : back;
          if (run > 1e-9) {
            double px = ox + end * half * ux;
            double py = oy + end * half * uy;
            parts =
                cut(
                    parts,
                    px - ox,
                    py - oy,
                    end * ux * run - uy * left,
                    end * uy * run + ux * left);
            parts =
                cut(
                    parts,
                    px - ox,
                    py - oy,
                    end * ux * run + uy * right,
                    end * uy * run - ux * right);
          }
        }
      }
    }
    List<Polygon> pieces = new ArrayList<>();
    for (Geometry part : parts) {
      for (int i = 0; i < part.getNumGeometries(); i++) {
        if (part.getGeometryN(i) instanceof Polygon piece && piece.getArea() > 1e-9) {
          pieces.add(piece);
        }
      }
    }
    return pieces;
  }

  /** Cuts every part along the line through (ox + x, oy + y) in a direction. */
  private List<Geometry> cut(List<Geometry> parts, double x, double y, double dx, double dy) {
    double size = Math.hypot(dx, dy);
    double far = 1e4;
    double ex = dx / size * far;
    double ey = dy / size * far;
    double cx = ox + x;
    double cy = oy + y;
    Coordinate a = new Coordinate(cx - ex, cy - ey);
    Coordinate b = new Coordinate(cx + ex, cy + ey);
    Coordinate c = new Coordinate(cx + ex - ey, cy + ey + ex);
    Coordinate d = new Coordinate(cx - ex - ey, cy - ey + ex);
    Polygon side = SHAPES.createPolygon(new Coordinate[] {a, b, c, d, a});
    List<Geometry> cut = new ArrayList<>();
    for (Geometry part : parts) {
      for (int i = 0; i < part.getNumGeometries(); i++) {
        Geometry one = part.getGeometryN(i);
        cut.add(one.intersection(side));
        cut.add(one.difference(side));
      }
    }
    return cut;
  }
}
