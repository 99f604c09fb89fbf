package spanwright.moments;

import java.util.ArrayList;
import java.util.List;

/**
 * Pairs of elements that lie close together (the same one, neighbours, close parallels), and the
 * part of their coupling that does not depend on frequency: the double integrals of shapes and of
 * charges with 1/R and with R, the first two even terms of e^{−jkR}/R = 1/R − k²R/2 + … .
 *
 * <p>The inner integral is in closed form (powers along a straight line over √(v² + δ²)); the outer
 * one is Gauss's, on stretches that end where the other element's ends and its nearest point lie,
 * with the points drawn toward those ends, where the inner result has the shape of a logarithm.
 *
 * <p>R² = distance² + a² with a the greater of the two radii for elements of one straight piece or
 * with a common node (the reduced kernel); for others a = 0, since the mean of a field of line
 * sources round a wire is its value on the axis.
 */
final class StaticPairs {
  /** Elements nearer than this part of the longer one's length are close. */
  static final double CLOSE = 0.35;

  private static final double[][][] SHAPE_TAYLOR = taylor(Shapes.POWERS);
  private static final double[][][] SLOPE_TAYLOR = taylor(Shapes.SLOPE_POWERS);
  private static final int OUTER = 16;
  private static final double[] GRADED = new double[OUTER];
  private static final double[] GRADED_WEIGHT = new double[OUTER];

  static {
    GaussRule rule = GaussRule.of(OUTER);
    for (int i = 0; i < OUTER; i++) {
      double t = rule.nodes[i];
      GRADED[i] = t * t * t * (10 - 15 * t + 6 * t * t);
      GRADED_WEIGHT[i] = rule.weights[i] * 30 * t * t * (1 - t) * (1 - t);
    }
  }

  /**
   * One close pair; matrices have (order[e] + 1) rows and (order[f] + 1) columns.
   *
   * @param e the element with the lower number
   * @param f the other, or the same
   * @param radius2 squared radius in the kernel [m²]
   * @param current0 shapes with 1/R [m]
   * @param current2 shapes with R [m³]
   * @param charge0 slopes with 1/R [1/m]
   * @param charge2 slopes with R [m]
   */
  record Pair(
      int e,
      int f,
      double radius2,
      double[] current0,
      double[] current2,
      double[] charge0,
      double[] charge2) {}

  final List<Pair> pairs = new ArrayList<>();

  /** close[e] holds the elements f &gt; e that are close to e. */
  final int[][] close;

  private final Mesh mesh;
  private final double[] place = new double[2];
  private final double[] inner0 = new double[Shapes.MOST + 1];
  private final double[] inner2 = new double[Shapes.MOST + 1];
  private final double[] outerShape = new double[Shapes.MOST + 1];
  private final double[] outerSlope = new double[Shapes.MOST + 1];

  StaticPairs(Mesh mesh) {
    this.mesh = mesh;
    close = new int[mesh.elements][];
    int[] found = new int[mesh.elements];
    for (int e = 0; e < mesh.elements; e++) {
      pairs.add(work(e, e));
      int count = 0;
      for (int f = e + 1; f < mesh.elements; f++) {
        if (near(e, f)) {
          pairs.add(work(e, f));
          found[count++] = f;
        }
      }
      close[e] = java.util.Arrays.copyOf(found, count);
    }
  }

  private boolean touch(int e, int f) {
    return mesh.nodeA[e] == mesh.nodeA[f]
        || mesh.nodeA[e] == mesh.nodeB[f]
        || mesh.nodeB[e] == mesh.nodeA[f]
        || mesh.nodeB[e] == mesh.nodeB[f];
  }

  private boolean near(int e, int f) {
    double he = mesh.length[e];
    double hf = mesh.length[f];
    double dx = mesh.x[e] - mesh.x[f] + 0.5 * (he * mesh.tx[e] - hf * mesh.tx[f]);
    double dy = mesh.y[e] - mesh.y[f] + 0.5 * (he * mesh.ty[e] - hf * mesh.ty[f]);
    double dz = mesh.z[e] - mesh.z[f] + 0.5 * (he * mesh.tz[e] - hf * mesh.tz[f]);
    double limit = CLOSE * Math.max(he, hf);
    double reach = 0.5 * (he + hf) + limit;
    if (dx * dx + dy * dy + dz * dz > reach * reach) {
      return false;
    }
    return touch(e, f) || apart2(e, f) < limit * limit;
  }

  private double apart2(int e, int f) {
    return Segments.squared(
        mesh.x[e],
        mesh.y[e],
        mesh.z[e],
        mesh.tx[e],
        mesh.ty[e],
        mesh.tz[e],
        mesh.length[e],
        mesh.x[f],
        mesh.y[f],
        mesh.z[f],
        mesh.tx[f],
        mesh.ty[f],
        mesh.tz[f],
        mesh.length[f],
        place);
  }

  /** Distance between the axes of two elements [m]. */
  double apart(int e, int f) {
    return Math.sqrt(apart2(e, f));
  }

  private Pair work(int e, int f) {
    int rows = mesh.order[e] + 1;
    int columns = mesh.order[f] + 1;
    double radius = Math.max(mesh.radius[e], mesh.radius[f]);
    boolean thick = mesh.piece[e] == mesh.piece[f] || touch(e, f);
    double radius2 = thick ? radius * radius : 0;
    Pair pair =
        new Pair(
            e,
            f,
            radius2,
            new double[rows * columns],
            new double[rows * columns],
            new double[rows * columns],
            new double[rows * columns]);
    boolean turned = mesh.length[e] > mesh.length[f];
    int outer = turned ? f : e;
    int inner = turned ? e : f;
    double[] cuts = cuts(outer, inner);
    for (int c = 1; c < cuts.length; c++) {
      for (int q = 0; q < OUTER; q++) {
        double t = cuts[c - 1] + (cuts[c] - cuts[c - 1]) * GRADED[q];
        double weight = (cuts[c] - cuts[c - 1]) * GRADED_WEIGHT[q];
        sample(pair, outer, inner, t, weight, turned);
      }
    }
    return pair;
  }

  /** Where the outer integral is cut, t rising from 0 to 1. */
  private double[] cuts(int outer, int inner) {
    double h = mesh.length[outer];
    double[] all = new double[5];
    int n = 0;
    all[n++] = 0;
    all[n++] = 1;
    if (mesh.piece[outer] != mesh.piece[inner]) {
      for (int end = 0; end < 2; end++) {
        double along = end * mesh.length[inner];
        double px = mesh.x[inner] + along * mesh.tx[inner] - mesh.x[outer];
        double py = mesh.y[inner] + along * mesh.ty[inner] - mesh.y[outer];
        double pz = mesh.z[inner] + along * mesh.tz[inner] - mesh.z[outer];
        double t = (px * mesh.tx[outer] + py * mesh.ty[outer] + pz * mesh.tz[outer]) / h;
        n = cut(all, n, t);
      }
      apart2(outer, inner);
      n = cut(all, n, place[0] / h);
    }
    double[] out = java.util.Arrays.copyOf(all, n);
    java.util.Arrays.sort(out);
    return out;
  }

  private static int cut(double[] all, int n, double t) {
    if (t < 0.03 || t > 0.97) {
      return n;
    }
    for (int i = 0; i < n; i++) {
      if (Math.abs(all[i] - t) < 0.03) {
        return n;
      }
    }
    all[n] = t;
    return n + 1;
  }

  private void sample(Pair pair, int outer, int inner, double t, double weight, boolean turned) {
    double ho = mesh.length[outer];
    double hi = mesh.length[inner];
    double dx = mesh.x[outer] + t * ho * mesh.tx[outer] - mesh.x[inner];
    double dy = mesh.y[outer] + t * ho * mesh.ty[outer] - mesh.y[inner];
    double dz = mesh.z[outer] + t * ho * mesh.tz[outer] - mesh.z[inner];
    double along = dx * mesh.tx[inner] + dy * mesh.ty[inner] + dz * mesh.tz[inner];
    double off2;
    if (mesh.piece[outer] == mesh.piece[inner]) {
      off2 = pair.radius2;
    } else {
      double ox = dx - along * mesh.tx[inner];
      double oy = dy - along * mesh.ty[inner];
      double oz = dz - along * mesh.tz[inner];
      off2 = ox * ox + oy * oy + oz * oz + pair.radius2;
    }
    double tau = along / hi;
    powers(tau, Math.max(off2 / (hi * hi), 1e-20), Math.max(1, mesh.order[inner]));
    int mo = mesh.order[outer];
    int mi = mesh.order[inner];
    int columns = turned ? mo + 1 : mi + 1;
    for (int a = 0; a <= mo; a++) {
      outerShape[a] = weight * Shapes.at(Shapes.POWERS[a], t);
      outerSlope[a] = weight * Shapes.at(Shapes.SLOPE_POWERS[a], t);
    }
    for (int b = 0; b <= mi; b++) {
      double shape0 = 0;
      double shape2 = 0;
      double slope0 = 0;
      double slope2 = 0;
      int degree = Math.max(1, b);
      for (int m = 0; m <= degree; m++) {
        double c = horner(SHAPE_TAYLOR[b][m], degree - m, tau);
        shape0 += c * inner0[m];
        shape2 += c * inner2[m];
      }
      for (int m = 0; m < degree; m++) {
        double c = horner(SLOPE_TAYLOR[b][m], degree - 1 - m, tau);
        slope0 += c * inner0[m];
        slope2 += c * inner2[m];
      }
      shape0 *= ho;
      shape2 *= ho * hi * hi;
      slope0 /= hi;
      slope2 *= hi;
      for (int a = 0; a <= mo; a++) {
        int at = turned ? b * columns + a : a * columns + b;
        pair.current0[at] += outerShape[a] * shape0;
        pair.current2[at] += outerShape[a] * shape2;
        pair.charge0[at] += outerSlope[a] * slope0;
        pair.charge2[at] += outerSlope[a] * slope2;
      }
    }
  }

  private static double horner(double[] p, int degree, double tau) {
    double sum = p[degree];
    for (int n = degree - 1; n >= 0; n--) {
      sum = sum * tau + p[n];
    }
    return sum;
  }

  /** For each polynomial and m, the m-th derivative over m! as a polynomial. */
  private static double[][][] taylor(double[][] polynomials) {
    double[][][] out = new double[polynomials.length][][];
    for (int b = 0; b < polynomials.length; b++) {
      double[] p = polynomials[b];
      out[b] = new double[p.length][];
      for (int m = 0; m < p.length; m++) {
        out[b][m] = new double[p.length - m];
        for (int n = m; n < p.length; n++) {
          double choose = 1;
          for (int i = 0; i < m; i++) {
            choose = choose * (n - i) / (i + 1);
          }
          out[b][m][n - m] = choose * p[n];
        }
      }
    }
    return out;
  }

  /** Integrals of v^m/r and v^m·r over v = −tau .. 1 − tau, r = √(v² + delta²). */
  private void powers(double tau, double delta2, int most) {
    double v0 = -tau;
    double v1 = 1 - tau;
    double r0 = Math.sqrt(v0 * v0 + delta2);
    double r1 = Math.sqrt(v1 * v1 + delta2);
    // ln((v1 + r1)/(v0 + r0)), from the side where nothing cancels
    double log =
        v0 + v1 >= 0
            ? Math.log((v1 + r1) / (v0 >= 0 ? v0 + r0 : delta2 / (r0 - v0)))
            : Math.log((r0 - v0) / (v1 <= 0 ? r1 - v1 : delta2 / (r1 + v1)));
    double c0 = r0 * r0 * r0;
    double c1 = r1 * r1 * r1;
    inner0[0] = log;
    inner0[1] = r1 - r0;
    inner2[0] = 0.5 * (v1 * r1 - v0 * r0 + delta2 * log);
    inner2[1] = (c1 - c0) / 3;
    double p0 = v0;
    double p1 = v1;
    for (int m = 2; m <= most; m++) {
      inner0[m] = (p1 * r1 - p0 * r0 - (m - 1) * delta2 * inner0[m - 2]) / m;
      inner2[m] = (p1 * c1 - p0 * c0 - (m - 1) * delta2 * inner2[m - 2]) / (m + 2);
      p0 *= v0;
      p1 *= v1;
    }
  }
}
