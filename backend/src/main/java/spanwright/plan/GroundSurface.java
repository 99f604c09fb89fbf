package spanwright.plan;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.TreeSet;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Geometry;
import org.locationtech.jts.geom.GeometryFactory;
import org.locationtech.jts.triangulate.DelaunayTriangulationBuilder;

/**
 * The ground of a plot: flat Delaunay triangles between the spot heights; outside them the height
 * of the nearest point of the triangulated area; level at zero where the plan has no terrain.
 *
 * <p>Frame: metres, x east and y north of the plan, heights above the plan's zero. Immutable and
 * safe between threads. A look-up costs a few triangles, whatever their number: they lie in the
 * cells of a square grid.
 */
public final class GroundSurface {
  /** How far, as a share of a triangle, a point may lie outside and still count as inside. */
  private static final double ROUNDING = 1e-12;

  /** Per triangle nine numbers: x, y, z of each corner in turn. */
  private final double[][] triangles;

  /** Per hull edge six numbers: x, y, z of its ends. */
  private final double[][] hull;

  private final Grid grid;

  private GroundSurface(double[][] triangles, double[][] hull) {
    this.triangles = triangles;
    this.hull = hull;
    this.grid = triangles.length == 0 ? null : new Grid(triangles);
  }

  /** The ground of a plan. */
  public static GroundSurface of(Plan plan) {
    return plan.site() == null ? level() : of(plan.site().terrain());
  }

  /** The ground through these spot heights; level when there is no terrain. */
  public static GroundSurface of(Terrain terrain) {
    return terrain == null || terrain.spots().isEmpty() ? level() : joined(terrain.spots());
  }

  /** Level ground at the plan's zero. */
  public static GroundSurface level() {
    return new GroundSurface(new double[0][], new double[0][]);
  }

  /** Whether the ground is level at the plan's zero because nothing else is known. */
  public boolean isLevel() {
    return triangles.length == 0;
  }

  /** The steepest slope there is, as rise over way on the plan; 0 where level. */
  public double steepest() {
    double most = 0;
    for (double[] t : triangles) {
      double nx = cross(t[4] - t[1], t[5] - t[2], t[7] - t[1], t[8] - t[2]);
      double ny = cross(t[5] - t[2], t[3] - t[0], t[8] - t[2], t[6] - t[0]);
      double nz = cross(t[3] - t[0], t[4] - t[1], t[6] - t[0], t[7] - t[1]);
      most = Math.max(most, Math.hypot(nx, ny) / Math.abs(nz));
    }
    return most;
  }

  /** Whether a point lies among the spot heights, and not beyond them. */
  public boolean covers(double x, double y) {
    if (triangles.length > 0) {
      for (int index : grid.near(x, y)) {
        if (covers(triangles[index], x, y)) {
          return true;
        }
      }
    }
    return false;
  }

  /** Height of the ground above the plan's zero [m]. */
  public double heightAt(double x, double y) {
    if (triangles.length == 0) {
      return 0;
    }
    for (int index : grid.near(x, y)) {
      double[] t = triangles[index];
      if (covers(t, x, y)) {
        return plane(t, x, y);
      }
    }
    return nearestOnHull(x, y);
  }

  /** Height of the ground above the plan's zero [m]. */
  public double heightAt(Point at) {
    return heightAt(at.x(), at.y());
  }

  /** A place whose z stands above the local ground, with z above the plan's zero. */
  public Place raise(Place aboveGround) {
    return new Place(
        aboveGround.x(),
        aboveGround.y(),
        aboveGround.z() + heightAt(aboveGround.x(), aboveGround.y()));
  }

  /** A path given above the ground under each of its points, with z above the plan's zero. */
  public List<Place> raise(List<Place> aboveGround) {
    return aboveGround.stream().map(this::raise).toList();
  }

  /**
   * The ground under a straight line on the plan: its ends and every place where the ground bends
   * beneath it, in order. Between two neighbours the ground is straight, so that the least height
   * of a straight wire above the ground is at one of them.
   */
  public List<Place> profile(Point from, Point to) {
    double dx = to.x() - from.x();
    double dy = to.y() - from.y();
    TreeSet<Double> shares = new TreeSet<>(List.of(0.0, 1.0));
    if (triangles.length > 0) {
      for (double[] t : triangles) {
        for (int c = 0; c < 9; c += 3) {
          int d = (c + 3) % 9;
          cut(from, dx, dy, t[c], t[c + 1], t[d] - t[c], t[d + 1] - t[c + 1], shares);
        }
      }
      // outside, the nearest point changes from side to corner over the perpendicular at a corner
      for (double[] e : hull) {
        double ex = e[3] - e[0];
        double ey = e[4] - e[1];
        double along = dx * ex + dy * ey;
        if (along != 0) {
          addInside(((e[0] - from.x()) * ex + (e[1] - from.y()) * ey) / along, shares);
          addInside(((e[3] - from.x()) * ex + (e[4] - from.y()) * ey) / along, shares);
        }
      }
    }
    return shares.stream()
        .map(
            share -> {
              double x = share == 1 ? to.x() : from.x() + share * dx;
              double y = share == 1 ? to.y() : from.y() + share * dy;
              return new Place(x, y, heightAt(x, y));
            })
        .toList();
  }

  /** Adds where the line meets a side (ax, ay) + s·(ux, uy), 0 ≤ s ≤ 1. */
  private static void cut(
      Point from,
      double dx,
      double dy,
      double ax,
      double ay,
      double ux,
      double uy,
      TreeSet<Double> shares) {
    double slant = cross(dx, dy, ux, uy);
    if (slant != 0) {
      double onSide = cross(ax - from.x(), ay - from.y(), dx, dy) / slant;
      if (onSide >= -ROUNDING && onSide <= 1 + ROUNDING) {
        addInside(cross(ax - from.x(), ay - from.y(), ux, uy) / slant, shares);
      }
    }
  }

  private static void addInside(double share, TreeSet<Double> shares) {
    if (share > 0 && share < 1) {
      shares.add(share);
    }
  }

  private static GroundSurface joined(List<Place> spots) {
    Map<Coordinate, Double> heights = new HashMap<>();
    List<Coordinate> sites = new ArrayList<>();
    for (Place spot : spots) {
      Coordinate site = new Coordinate(spot.x(), spot.y());
      if (heights.put(site, spot.z()) != null) {
        throw new IllegalArgumentException("two spot heights at one place");
      }
      sites.add(site);
    }
    DelaunayTriangulationBuilder builder = new DelaunayTriangulationBuilder();
    builder.setSites(sites);
    Geometry faces = builder.getTriangles(new GeometryFactory());
    List<double[]> triangles = new ArrayList<>();
    Map<List<Coordinate>, Integer> uses = new HashMap<>();
    for (int i = 0; i < faces.getNumGeometries(); i++) {
      Coordinate[] corners = faces.getGeometryN(i).getCoordinates();
      double[] t = new double[9];
      for (int c = 0; c < 3; c++) {
        t[3 * c] = corners[c].x;
        t[3 * c + 1] = corners[c].y;
        t[3 * c + 2] = heights.get(new Coordinate(corners[c].x, corners[c].y));
        uses.merge(edge(corners[c], corners[c + 1]), 1, Integer::sum);
      }
      triangles.add(t);
    }
    if (triangles.isEmpty()) {
      throw new IllegalArgumentException("the spot heights lie on one line");
    }
    return new GroundSurface(triangles.toArray(new double[0][]), rim(uses, heights));
  }

  private static List<Coordinate> edge(Coordinate a, Coordinate b) {
    Coordinate p = new Coordinate(a.x, a.y);
    Coordinate q = new Coordinate(b.x, b.y);
    return p.compareTo(q) < 0 ? List.of(p, q) : List.of(q, p);
  }

  /** Edges that bound one triangle only: the rim of the triangulated area. */
  private static double[][] rim(
      Map<List<Coordinate>, Integer> uses, Map<Coordinate, Double> heights) {
    return uses.entrySet().stream()
        .filter(use -> use.getValue() == 1)
        .map(Map.Entry::getKey)
        .sorted(
            (e, f) -> {
              int first = e.get(0).compareTo(f.get(0));
              return first != 0 ? first : e.get(1).compareTo(f.get(1));
            })
        .map(
            e ->
                new double[] {
                  e.get(0).x, e.get(0).y, heights.get(e.get(0)),
                  e.get(1).x, e.get(1).y, heights.get(e.get(1))
                })
        .toArray(double[][]::new);
  }

  private static boolean covers(double[] t, double x, double y) {
    double area = cross(t[3] - t[0], t[4] - t[1], t[6] - t[0], t[7] - t[1]);
    double a = cross(t[3] - x, t[4] - y, t[6] - x, t[7] - y) / area;
    double b = cross(t[6] - x, t[7] - y, t[0] - x, t[1] - y) / area;
    double c = cross(t[0] - x, t[1] - y, t[3] - x, t[4] - y) / area;
    return a >= -ROUNDING && b >= -ROUNDING && c >= -ROUNDING;
  }

  private static double plane(double[] t, double x, double y) {
    double ux = t[3] - t[0];
    double uy = t[4] - t[1];
    double vx = t[6] - t[0];
    double vy = t[7] - t[1];
    double area = cross(ux, uy, vx, vy);
    double b = cross(x - t[0], y - t[1], vx, vy) / area;
    double c = cross(ux, uy, x - t[0], y - t[1]) / area;
    return t[2] + b * (t[5] - t[2]) + c * (t[8] - t[2]);
  }

  private double nearestOnHull(double x, double y) {
    double least = Double.POSITIVE_INFINITY;
    double height = 0;
    for (double[] e : hull) {
      double dx = e[3] - e[0];
      double dy = e[4] - e[1];
      double along = ((x - e[0]) * dx + (y - e[1]) * dy) / (dx * dx + dy * dy);
      double share = Math.max(0, Math.min(1, along));
      double away = Math.hypot(x - e[0] - share * dx, y - e[1] - share * dy);
      if (away < least) {
        least = away;
        height = e[2] + share * (e[5] - e[2]);
      }
    }
    return height;
  }

  private static double cross(double ax, double ay, double bx, double by) {
    return ax * by - ay * bx;
  }

  /** Square cells over the triangulated area, each with the triangles whose box touches it. */
  private static final class Grid {
    private static final int[] NONE = {};
    private final double left;
    private final double bottom;
    private final double cell;
    private final int columns;
    private final int rows;
    private final int[][] contents;

    Grid(double[][] triangles) {
      double[] box = {
        Double.POSITIVE_INFINITY,
        Double.POSITIVE_INFINITY,
        Double.NEGATIVE_INFINITY,
        Double.NEGATIVE_INFINITY
      };
      for (double[] t : triangles) {
        for (int c = 0; c < 9; c += 3) {
          box[0] = Math.min(box[0], t[c]);
          box[1] = Math.min(box[1], t[c + 1]);
          box[2] = Math.max(box[2], t[c]);
          box[3] = Math.max(box[3], t[c + 1]);
        }
      }
      left = box[0];
      bottom = box[1];
      double width = box[2] - box[0];
      double depth = box[3] - box[1];
      // about one cell for each triangle, and never a long row of cells for a thin strip
      cell = Math.max(Math.sqrt(width * depth / triangles.length), Math.max(width, depth) / 1000.0);
      columns = (int) (width / cell) + 1;
      rows = (int) (depth / cell) + 1;
      contents = new int[columns * rows][];
      java.util.Arrays.fill(contents, NONE);
      for (int i = 0; i < triangles.length; i++) {
        put(i, triangles[i]);
      }
    }

    private void put(int index, double[] t) {
      int fromColumn = column(Math.min(t[0], Math.min(t[3], t[6])));
      int toColumn = column(Math.max(t[0], Math.max(t[3], t[6])));
      int fromRow = row(Math.min(t[1], Math.min(t[4], t[7])));
      int toRow = row(Math.max(t[1], Math.max(t[4], t[7])));
      for (int r = fromRow; r <= toRow; r++) {
        for (int c = fromColumn; c <= toColumn; c++) {
          int at = r * columns + c;
          int[] grown = java.util.Arrays.copyOf(contents[at], contents[at].length + 1);
          grown[grown.length - 1] = index;
          contents[at] = grown;
        }
      }
    }

    private int column(double x) {
      return Math.max(0, Math.min(columns - 1, (int) Math.floor((x - left) / cell)));
    }

    private int row(double y) {
      return Math.max(0, Math.min(rows - 1, (int) Math.floor((y - bottom) / cell)));
    }

    /** Triangles that may cover the point. */
    int[] near(double x, double y) {
      double slack = cell * ROUNDING;
      boolean inside =
          x >= left - slack
              && y >= bottom - slack
              && x <= left + columns * cell + slack
              && y <= bottom + rows * cell + slack;
      return inside ? contents[row(y) * columns + column(x)] : NONE;
    }
  }
}
