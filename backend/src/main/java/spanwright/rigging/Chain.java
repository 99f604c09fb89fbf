package spanwright.rigging;

/**
 * A hanging chain: pieces of wire and rope end to end, weights where they meet.
 *
 * <p>Layout: piece {@code i} has its unstretched length, its flexibility 1/EA and its load for each
 * unstretched metre at {@code load[3i..3i+2]}; after it comes the point force {@code
 * point[3i..3i+2]} (that of the last piece counts for nothing). With T(s) the tension as a vector
 * along the chain, T falls by the load for each metre and by each point force, and the shape is
 * dr/ds = T/|T| + T/EA. Every integral over a piece is closed (H. M. Irvine, <em>Cable
 * Structures</em>, 1981, §1.3, for a load along one axis; here the tension is split along and
 * across the piece's load, so that the load may point anywhere).
 *
 * <p>The tension at the start is where Σ∫(|T| + |T|²/2EA) ds − T·d is least; that function is
 * convex, its gradient is the gap left at the end, its second derivative the flexibility of the
 * chain: Newton steps, halved while they do not help. Not safe for several threads at once.
 */
final class Chain {
  /** Below this ratio of a piece's load to its tension, three-point Gauss is exact to 1e-14. */
  private static final double NEARLY_STRAIGHT = 0.02;

  private static final double GAUSS = Math.sqrt(0.6) / 2;
  private static final int STEPS = 200;

  final int pieces;
  final double[] length;
  final double[] flexibility;
  final double[] load;
  final double[] point;

  /** Tension at the start, the answer of {@link #solve}. */
  final double[] start = new double[3];

  // What one pass along the chain leaves behind.
  private final double[] reached = new double[3];
  private final double[] end = new double[3];
  private final double[] slope = new double[6];
  private double energy;

  private final double[] trial = new double[3];
  private final double[] step = new double[3];

  Chain(int pieces) {
    this.pieces = pieces;
    length = new double[pieces];
    flexibility = new double[pieces];
    load = new double[3 * pieces];
    point = new double[3 * pieces];
  }

  /** Sets the load of a piece [N/m]. */
  void setLoad(int piece, double x, double y, double z) {
    load[3 * piece] = x;
    load[3 * piece + 1] = y;
    load[3 * piece + 2] = z;
  }

  /** Sets the force at the far end of a piece [N]. */
  void setPoint(int piece, double x, double y, double z) {
    point[3 * piece] = x;
    point[3 * piece + 1] = y;
    point[3 * piece + 2] = z;
  }

  /** Unstretched length of the whole [m]. */
  double totalLength() {
    double sum = 0;
    for (double each : length) {
      sum += each;
    }
    return sum;
  }

  /**
   * Finds the tension at the start for which the chain ends at (dx, dy, dz) from its beginning,
   * from the guess that stands in {@link #start}.
   *
   * @return the gap left [m]; not small means that no such shape exists (too short, not elastic)
   */
  double solve(double dx, double dy, double dz) {
    double scale = Math.sqrt(dx * dx + dy * dy + dz * dz) + totalLength();
    pass(start, dx, dy, dz);
    double gap = gap(dx, dy, dz);
    double best = energy;
    for (int i = 0; i < STEPS && gap > 1e-13 * scale; i++) {
      if (!newtonStep(dx, dy, dz)) {
        break;
      }
      double share = 1;
      boolean better = false;
      for (int halving = 0; halving < 40 && !better; halving++) {
        for (int k = 0; k < 3; k++) {
          trial[k] = start[k] + share * step[k];
        }
        pass(trial, dx, dy, dz);
        double trialGap = gap(dx, dy, dz);
        better = energy < best - 1e-12 * Math.abs(best) || trialGap < 0.9 * gap;
        if (better) {
          gap = trialGap;
          best = energy;
        }
        share /= 2;
      }
      if (!better) {
        break;
      }
      System.arraycopy(trial, 0, start, 0, 3);
    }
    pass(start, dx, dy, dz);
    return gap(dx, dy, dz);
  }

  private double gap(double dx, double dy, double dz) {
    double x = reached[0] - dx;
    double y = reached[1] - dy;
    double z = reached[2] - dz;
    return Math.sqrt(x * x + y * y + z * z);
  }

  /** Solves slope · step = −gap by elimination; the matrix is symmetric and positive. */
  private boolean newtonStep(double dx, double dy, double dz) {
    double a = slope[0];
    double b = slope[1];
    double c = slope[2];
    double d = slope[3];
    double e = slope[4];
    double f = slope[5];
    double c00 = d * f - e * e;
    double c01 = c * e - b * f;
    double c02 = b * e - c * d;
    double det = a * c00 + b * c01 + c * c02;
    if (!(det > 0) || Double.isInfinite(det)) {
      return false;
    }
    double gx = dx - reached[0];
    double gy = dy - reached[1];
    double gz = dz - reached[2];
    double c11 = a * f - c * c;
    double c12 = b * c - a * e;
    double c22 = a * d - b * b;
    step[0] = (c00 * gx + c01 * gy + c02 * gz) / det;
    step[1] = (c01 * gx + c11 * gy + c12 * gz) / det;
    step[2] = (c02 * gx + c12 * gy + c22 * gz) / det;
    return Double.isFinite(step[0] + step[1] + step[2]);
  }

  /** One pass along the chain from a tension at its start: place reached, energy, flexibility. */
  private void pass(double[] tension, double dx, double dy, double dz) {
    java.util.Arrays.fill(reached, 0);
    java.util.Arrays.fill(slope, 0);
    System.arraycopy(tension, 0, end, 0, 3);
    energy = -(tension[0] * dx + tension[1] * dy + tension[2] * dz);
    for (int i = 0; i < pieces; i++) {
      if (length[i] > 0) {
        addPiece(i, length[i], true);
      }
      if (i < pieces - 1) {
        end[0] -= point[3 * i];
        end[1] -= point[3 * i + 1];
        end[2] -= point[3 * i + 2];
      }
    }
  }

  /** Adds the first s metres of a piece whose tension begins as {@link #end}; moves that on. */
  private void addPiece(int i, double s, boolean withSlope) {
    double px = load[3 * i];
    double py = load[3 * i + 1];
    double pz = load[3 * i + 2];
    double p = Math.sqrt(px * px + py * py + pz * pz);
    double mx = end[0] - px * s / 2;
    double my = end[1] - py * s / 2;
    double mz = end[2] - pz * s / 2;
    double middle = Math.sqrt(mx * mx + my * my + mz * mz);
    if (p * s <= NEARLY_STRAIGHT * middle || p * s < 1e-300) {
      addStraight(i, s, mx, my, mz, withSlope);
    } else {
      addCurved(i, s, p, withSlope);
    }
    addStretch(i, s, mx, my, mz, p, withSlope);
    end[0] -= px * s;
    end[1] -= py * s;
    end[2] -= pz * s;
  }

  private void addStraight(int i, double s, double mx, double my, double mz, boolean withSlope) {
    for (int node = -1; node <= 1; node++) {
      double weight = s * (node == 0 ? 8.0 : 5.0) / 18;
      double offset = node * GAUSS * s;
      double x = mx - offset * load[3 * i];
      double y = my - offset * load[3 * i + 1];
      double z = mz - offset * load[3 * i + 2];
      double size = Math.max(1e-150, Math.sqrt(x * x + y * y + z * z));
      double ux = x / size;
      double uy = y / size;
      double uz = z / size;
      reached[0] += weight * ux;
      reached[1] += weight * uy;
      reached[2] += weight * uz;
      energy += weight * size;
      if (withSlope) {
        double w = weight / size;
        slope[0] += w * (1 - ux * ux);
        slope[1] -= w * ux * uy;
        slope[2] -= w * ux * uz;
        slope[3] += w * (1 - uy * uy);
        slope[4] -= w * uy * uz;
        slope[5] += w * (1 - uz * uz);
      }
    }
  }

  private void addCurved(int i, double s, double p, boolean withSlope) {
    double ex = load[3 * i] / p;
    double ey = load[3 * i + 1] / p;
    double ez = load[3 * i + 2] / p;
    double v0 = end[0] * ex + end[1] * ey + end[2] * ez;
    double v1 = v0 - p * s;
    double hx = end[0] - v0 * ex;
    double hy = end[1] - v0 * ey;
    double hz = end[2] - v0 * ez;
    // Hanging straight down has no part across the load; the floor keeps its logarithm finite.
    double floor = 1e-14 * p * s;
    double h2 = Math.max(hx * hx + hy * hy + hz * hz, floor * floor);
    double t0 = Math.sqrt(v0 * v0 + h2);
    double t1 = Math.sqrt(v1 * v1 + h2);
    double log;
    if (v1 >= 0) {
      log = Math.log((v0 + t0) / (v1 + t1));
    } else if (v0 <= 0) {
      log = Math.log((t1 - v1) / (t0 - v0));
    } else {
      log = Math.log((v0 + t0) / h2 * (t1 - v1));
    }
    double a = log / p;
    double along = (t0 - t1) / p;
    reached[0] += hx * a + ex * along;
    reached[1] += hy * a + ey * along;
    reached[2] += hz * a + ez * along;
    energy += (v0 * t0 - v1 * t1) / (2 * p) + h2 * a / 2;
    if (withSlope) {
      double turn = (v0 / t0 - v1 / t1) / p;
      double b0 = turn / h2;
      double b1 = (1 / t1 - 1 / t0) / p;
      double b2 = a - turn;
      slope[0] += a - b0 * hx * hx - 2 * b1 * hx * ex - b2 * ex * ex;
      slope[1] -= b0 * hx * hy + b1 * (hx * ey + hy * ex) + b2 * ex * ey;
      slope[2] -= b0 * hx * hz + b1 * (hx * ez + hz * ex) + b2 * ex * ez;
      slope[3] += a - b0 * hy * hy - 2 * b1 * hy * ey - b2 * ey * ey;
      slope[4] -= b0 * hy * hz + b1 * (hy * ez + hz * ey) + b2 * ey * ez;
      slope[5] += a - b0 * hz * hz - 2 * b1 * hz * ez - b2 * ez * ez;
    }
  }

  private void addStretch(
      int i, double s, double mx, double my, double mz, double p, boolean withSlope) {
    double stretch = flexibility[i] * s;
    if (stretch == 0) {
      return;
    }
    reached[0] += stretch * mx;
    reached[1] += stretch * my;
    reached[2] += stretch * mz;
    energy += stretch / 2 * (mx * mx + my * my + mz * mz + p * p * s * s / 12);
    if (withSlope) {
      slope[0] += stretch;
      slope[3] += stretch;
      slope[5] += stretch;
    }
  }

  /**
   * The shape after {@link #solve}: points along the chain from its beginning.
   *
   * @param parts into how many equal parts each piece is cut; 0 leaves only its end
   * @param into x, y, z of each point, beginning with 0, 0, 0
   * @return the number of points
   */
  int sample(int[] parts, double[] into) {
    System.arraycopy(start, 0, end, 0, 3);
    java.util.Arrays.fill(reached, 0);
    int count = 0;
    into[count++] = 0;
    into[count++] = 0;
    into[count++] = 0;
    for (int i = 0; i < pieces; i++) {
      for (int k = 0; k < parts[i]; k++) {
        addPiece(i, length[i] / parts[i], false);
        into[count++] = reached[0];
        into[count++] = reached[1];
        into[count++] = reached[2];
      }
      if (i < pieces - 1) {
        end[0] -= point[3 * i];
        end[1] -= point[3 * i + 1];
        end[2] -= point[3 * i + 2];
      }
    }
    return count / 3;
  }

  /**
   * The potential of the loads and the stretch, after {@link #solve}: as a function of the way from
   * end to end its slope is the tension at the start.
   */
  double potential() {
    return -energy;
  }

  /**
   * How fast the tension at the start grows with the way from end to end, after {@link #solve}: xx,
   * xy, xz, yy, yz, zz [N/m].
   */
  void stiffness(double[] into) {
    double c00 = slope[3] * slope[5] - slope[4] * slope[4];
    double c01 = slope[2] * slope[4] - slope[1] * slope[5];
    double c02 = slope[1] * slope[4] - slope[2] * slope[3];
    double det = slope[0] * c00 + slope[1] * c01 + slope[2] * c02;
    into[0] = c00 / det;
    into[1] = c01 / det;
    into[2] = c02 / det;
    into[3] = (slope[0] * slope[5] - slope[2] * slope[2]) / det;
    into[4] = (slope[1] * slope[2] - slope[0] * slope[4]) / det;
    into[5] = (slope[0] * slope[3] - slope[1] * slope[1]) / det;
  }

  /** Tension at the beginning [N]. */
  double tensionAtStart() {
    return Math.sqrt(start[0] * start[0] + start[1] * start[1] + start[2] * start[2]);
  }

  /** Tension at the end, after {@link #solve} or {@link #sample}: a vector along the chain. */
  double[] end() {
    return end;
  }

  /** Size of the tension at the end [N]. */
  double tensionAtEnd() {
    return Math.sqrt(end[0] * end[0] + end[1] * end[1] + end[2] * end[2]);
  }

  /** Length as it hangs, stretched, after {@link #solve} [m]. */
  double stretchedLength() {
    double sum = 0;
    double x = start[0];
    double y = start[1];
    double z = start[2];
    for (int i = 0; i < pieces; i++) {
      int cuts = flexibility[i] == 0 || length[i] == 0 ? 0 : 32;
      double s = length[i] / 32;
      for (int k = 0; k < cuts; k++) {
        double at = (k + 0.5) * s;
        double tx = x - load[3 * i] * at;
        double ty = y - load[3 * i + 1] * at;
        double tz = z - load[3 * i + 2] * at;
        sum += s * flexibility[i] * Math.sqrt(tx * tx + ty * ty + tz * tz);
      }
      x -= load[3 * i] * length[i] + point[3 * i];
      y -= load[3 * i + 1] * length[i] + point[3 * i + 1];
      z -= load[3 * i + 2] * length[i] + point[3 * i + 2];
      sum += length[i];
    }
    return sum;
  }

  /** Greatest tension anywhere [N]: it lies at an end of some piece, for tension is convex. */
  double greatestTension() {
    double most = 0;
    double x = start[0];
    double y = start[1];
    double z = start[2];
    for (int i = 0; i < pieces; i++) {
      most = Math.max(most, Math.sqrt(x * x + y * y + z * z));
      x -= load[3 * i] * length[i];
      y -= load[3 * i + 1] * length[i];
      z -= load[3 * i + 2] * length[i];
      most = Math.max(most, Math.sqrt(x * x + y * y + z * z));
      x -= point[3 * i];
      y -= point[3 * i + 1];
      z -= point[3 * i + 2];
    }
    return most;
  }
}
