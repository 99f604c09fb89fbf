package spanwright.moments;

/**
 * The elements of a solved mesh as seen from far away. An element sends I(s) e^{jδs} summed along
 * it, s from −1 to 1 about its middle, δ half its phase length times x, and x the cosine between
 * element and direction: a power series in x with the current's moments, cut where a Chebyshev
 * polynomial of the next order would be lost in rounding (economised; Lanczos 1938). One sine and
 * cosine then serve an element, not one each of its Gauss points.
 */
final class Radiators {
  /** Highest power of x kept, and how many the series has before it is cut. */
  private static final int MOST = 16;

  private static final int SERIES = 25;

  /** What is cut off, as part of an element's whole moment. */
  private static final double CUT = 1e-9;

  /** Integral of shape a times (2t − 1)^n over t at [a][n]. */
  private static final double[][] MOMENTS = moments();

  /** Coefficients of the Chebyshev polynomials at [order][power]. */
  private static final double[][] CHEBYSHEV = chebyshev();

  final int count;

  /** Middle of an element times the wave number. */
  final double[] x;

  final double[] y;
  final double[] z;

  /** Direction of an element; the same for those in line, see {@link #piece}. */
  final double[] tx;

  final double[] ty;
  final double[] tz;
  final int[] piece;

  /** Coefficients of the powers of the cosine. */
  final double[][] re;

  final double[][] im;

  Radiators(Currents currents, double k) {
    Mesh mesh = currents.mesh;
    count = mesh.elements;
    x = new double[count];
    y = new double[count];
    z = new double[count];
    tx = mesh.tx;
    ty = mesh.ty;
    tz = mesh.tz;
    piece = mesh.piece;
    re = new double[count][];
    im = new double[count][];
    for (int e = 0; e < count; e++) {
      double half = 0.5 * mesh.length[e];
      x[e] = k * (mesh.x[e] + half * tx[e]);
      y[e] = k * (mesh.y[e] + half * ty[e]);
      z[e] = k * (mesh.z[e] + half * tz[e]);
      series(e, mesh.length[e], k * half, currents);
    }
  }

  private void series(int e, double length, double phase, Currents currents) {
    double[] seriesRe = new double[SERIES];
    double[] seriesIm = new double[SERIES];
    double factor = length;
    for (int n = 0; n < SERIES; n++) {
      double mr = 0;
      double mi = 0;
      for (int a = 0; a < currents.re[e].length; a++) {
        mr += currents.re[e][a] * MOMENTS[a][n];
        mi += currents.im[e][a] * MOMENTS[a][n];
      }
      // times j^n
      int turn = n & 3;
      seriesRe[n] = factor * (turn == 0 ? mr : turn == 1 ? -mi : turn == 2 ? -mr : mi);
      seriesIm[n] = factor * (turn == 0 ? mi : turn == 1 ? mr : turn == 2 ? -mi : -mr);
      factor *= phase / (n + 1);
    }
    int keep = kept(phase);
    economise(seriesRe, keep);
    economise(seriesIm, keep);
    re[e] = java.util.Arrays.copyOf(seriesRe, keep + 1);
    im[e] = java.util.Arrays.copyOf(seriesIm, keep + 1);
  }

  /** The least even power at which the next Chebyshev term is below the cut. */
  private static int kept(double phase) {
    double term = 2;
    for (int n = 1; n <= MOST; n++) {
      term *= 0.5 * phase / n;
      if (term < CUT && n % 2 == 1) {
        return n - 1;
      }
    }
    return MOST;
  }

  private static void economise(double[] series, int keep) {
    for (int n = SERIES - 1; n > keep; n--) {
      double times = series[n] / CHEBYSHEV[n][n];
      for (int m = n & 1; m <= n; m += 2) {
        series[m] -= times * CHEBYSHEV[n][m];
      }
    }
  }

  private static double[][] moments() {
    GaussRule rule = GaussRule.of(16);
    double[][] out = new double[Shapes.MOST + 1][SERIES];
    for (int a = 0; a <= Shapes.MOST; a++) {
      for (int q = 0; q < rule.nodes.length; q++) {
        double part = rule.weights[q] * Shapes.at(Shapes.POWERS[a], rule.nodes[q]);
        for (int n = 0; n < SERIES; n++) {
          out[a][n] += part;
          part *= 2 * rule.nodes[q] - 1;
        }
      }
    }
    return out;
  }

  private static double[][] chebyshev() {
    double[][] t = new double[SERIES][SERIES];
    t[0][0] = 1;
    t[1][1] = 1;
    for (int n = 2; n < SERIES; n++) {
      for (int m = 0; m < n; m++) {
        t[n][m + 1] += 2 * t[n - 1][m];
        t[n][m] -= t[n - 2][m];
      }
    }
    return t;
  }
}
