package spanwright.assess;

import java.util.ArrayList;
import java.util.List;
import spanwright.moments.Directions;
import spanwright.moments.Vertex;
import spanwright.plan.GroundSurface;
import spanwright.plan.Place;

/**
 * The plane that stands for the ground under a wire: the least-squares plane through the ground in
 * a strip under it, as wide to either side as the wire is high there, the middle weighing most. The
 * wire fixes the slope along itself, the strip that across. The field solver's level ground is this
 * plane: its frame is the plan's, tipped over by the least turn that lays the plane level.
 *
 * <p>Where the plan has no terrain the plane is level and nothing is turned at all.
 */
final class GroundPlane {
  /** Share of the strip's half width, and what ground there weighs. */
  private static final double[] ACROSS = {-1, -0.5, 0, 0.5, 1};

  private static final double[] WEIGHT = {1, 2, 3, 2, 1};

  /** What ground outside the surveyed spots weighs: only where there is nothing else to go by. */
  private static final double GUESSED = 1e-3;

  private static final double LEAST_WIDTH = 1;
  private static final double LONGEST_STEP = 1;

  private final double x;
  private final double y;
  private final double height;
  private final double slopeEast;
  private final double slopeNorth;

  /** From the plan's axes to the plane's; null where the plane is level. */
  private final double[][] turn;

  private final double departure;

  private GroundPlane(
      double x, double y, double height, double slopeEast, double slopeNorth, double departure) {
    this.x = x;
    this.y = y;
    this.height = height;
    this.slopeEast = slopeEast;
    this.slopeNorth = slopeNorth;
    this.departure = departure;
    this.turn = slopeEast == 0 && slopeNorth == 0 ? null : turn(slopeEast, slopeNorth);
  }

  /** A level plane at a height above the plan's zero [m]. */
  static GroundPlane level(double height) {
    return new GroundPlane(0, 0, height, 0, 0, 0);
  }

  /** The plane under these wires, each given along its shape. */
  static GroundPlane under(List<List<Place>> wires, GroundSurface surface) {
    if (surface.isLevel()) {
      return level(0);
    }
    List<double[]> samples = new ArrayList<>();
    for (List<Place> wire : wires) {
      for (int i = 1; i < wire.size(); i++) {
        sample(wire.get(i - 1), wire.get(i), surface, samples);
      }
    }
    return samples.isEmpty() ? level(0) : fitted(samples);
  }

  /** Ground under and beside one straight piece: x, y, height, weight of each place. */
  private static void sample(Place a, Place b, GroundSurface surface, List<double[]> samples) {
    double dx = b.x() - a.x();
    double dy = b.y() - a.y();
    double length = Math.hypot(dx, dy);
    // an upright piece weighs next to nothing, but it must stand somewhere
    double east = length > 1e-6 ? dy / length : 1;
    double north = length > 1e-6 ? -dx / length : 0;
    int steps = Math.max(1, (int) Math.ceil(length / LONGEST_STEP));
    for (int i = 0; i < steps; i++) {
      double share = (i + 0.5) / steps;
      double px = a.x() + share * dx;
      double py = a.y() + share * dy;
      double pz = a.z() + share * (b.z() - a.z());
      double width = Math.max(LEAST_WIDTH, pz - surface.heightAt(px, py));
      for (int s = 0; s < ACROSS.length; s++) {
        double gx = px + ACROSS[s] * width * east;
        double gy = py + ACROSS[s] * width * north;
        double weight =
            WEIGHT[s] * (length / steps + 1e-6) * (surface.covers(gx, gy) ? 1 : GUESSED);
        samples.add(new double[] {gx, gy, surface.heightAt(gx, gy), weight});
      }
    }
  }

  private static GroundPlane fitted(List<double[]> samples) {
    double[] mean = new double[3];
    double total = 0;
    for (double[] s : samples) {
      for (int c = 0; c < 3; c++) {
        mean[c] += s[3] * s[c];
      }
      total += s[3];
    }
    for (int c = 0; c < 3; c++) {
      mean[c] /= total;
    }
    double xx = 0;
    double xy = 0;
    double yy = 0;
    double xh = 0;
    double yh = 0;
    for (double[] s : samples) {
      double dx = s[0] - mean[0];
      double dy = s[1] - mean[1];
      double dh = s[2] - mean[2];
      xx += s[3] * dx * dx;
      xy += s[3] * dx * dy;
      yy += s[3] * dy * dy;
      xh += s[3] * dx * dh;
      yh += s[3] * dy * dh;
    }
    double det = xx * yy - xy * xy;
    double spread = xx + yy;
    // under an upright wire all samples lie in one line: level across it, for want of a slope there
    boolean inLine = det <= 1e-12 * spread * spread;
    double east = straightened(inLine ? xh / spread : (yy * xh - xy * yh) / det);
    double north = straightened(inLine ? yh / spread : (xx * yh - xy * xh) / det);
    double departure = 0;
    for (double[] s : samples) {
      double there = mean[2] + east * (s[0] - mean[0]) + north * (s[1] - mean[1]);
      departure = Math.max(departure, Math.abs(s[2] - there));
    }
    return new GroundPlane(mean[0], mean[1], mean[2], east, north, departure);
  }

  /** What is only rounding is no slope. */
  private static double straightened(double slope) {
    return Math.abs(slope) < 1e-9 ? 0 : slope;
  }

  /** The turn about a level axis that brings the plane's normal upright (Rodrigues). */
  private static double[][] turn(double east, double north) {
    double size = Math.sqrt(1 + east * east + north * north);
    double nx = -east / size;
    double ny = -north / size;
    double nz = 1 / size;
    double f = 1 / (1 + nz);
    return new double[][] {
      {1 - f * nx * nx, -f * nx * ny, -nx}, {-f * nx * ny, 1 - f * ny * ny, -ny}, {nx, ny, nz}
    };
  }

  boolean isLevel() {
    return turn == null;
  }

  /** A place of the plan in the plane's frame, z its distance from the plane. */
  Vertex over(Place p) {
    if (turn == null) {
      return new Vertex(p.x(), p.y(), p.z() - height);
    }
    double[] d = {p.x() - x, p.y() - y, p.z() - height};
    return new Vertex(x + times(turn[0], d), y + times(turn[1], d), times(turn[2], d));
  }

  private static double times(double[] row, double[] d) {
    return row[0] * d[0] + row[1] * d[1] + row[2] * d[2];
  }

  /** Directions of the plan as they are seen from the plane. */
  Directions seen(Directions directions) {
    return turn == null ? directions : directions.turned(turn);
  }

  /**
   * A direction in the plane's frame as it is seen on the plan: azimuth and elevation, radians; the
   * elevation is negative where the direction goes down the slope under the horizon.
   */
  double[] onPlan(double azimuth, double elevation) {
    if (turn == null) {
      return new double[] {azimuth, elevation};
    }
    double[] d = {
      Math.sin(azimuth) * Math.cos(elevation),
      Math.cos(azimuth) * Math.cos(elevation),
      Math.sin(elevation)
    };
    double[] out = new double[3];
    for (int c = 0; c < 3; c++) {
      out[c] = turn[0][c] * d[0] + turn[1][c] * d[1] + turn[2][c] * d[2];
    }
    return new double[] {Math.atan2(out[0], out[1]), Math.asin(Math.max(-1, Math.min(1, out[2])))};
  }

  /** How high the plane stands over the horizon toward an azimuth of the plan, radians. */
  double rise(double azimuth) {
    return Math.atan(slopeEast * Math.sin(azimuth) + slopeNorth * Math.cos(azimuth));
  }

  /** Height of the plane above the plan's zero [m]. */
  double heightAt(double atX, double atY) {
    return height + slopeEast * (atX - x) + slopeNorth * (atY - y);
  }

  /** Its steepest slope, radians. */
  double slope() {
    return Math.atan(Math.hypot(slopeEast, slopeNorth));
  }

  /** Azimuth on the plan toward which it falls, radians. */
  double fallsToward() {
    return Math.atan2(-slopeEast, -slopeNorth);
  }

  /** How far the true ground departs from it in the strip, at most [m]. */
  double departure() {
    return departure;
  }
}
