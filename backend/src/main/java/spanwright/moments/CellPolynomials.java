package spanwright.moments;

/**
 * Polynomials over one rectangular cell, u and v in −1..1 across it: from values at Chebyshev's
 * nodes to coefficients, to powers, and onto a part of the cell.
 *
 * <p>A full set has {@value #SIDE} × {@value #SIDE} terms, u^a v^b at a·{@value #SIDE} + b. A short
 * one keeps the {@value #SHORT} terms with a + b of at most {@value #DEGREE}, in the order 1, v,
 * v², v³, u, uv, uv², u², u²v, u³.
 */
final class CellPolynomials {
  /** Nodes, and coefficients, each way. */
  static final int SIDE = 6;

  /** Terms of a full set. */
  static final int TERMS = SIDE * SIDE;

  /** Total degree of a short set. */
  static final int DEGREE = 3;

  /** Terms of a short set. */
  static final int SHORT = 10;

  /** Chebyshev's nodes, rising. */
  static final double[] NODES = new double[SIDE];

  /** Weights of the values at the nodes in the polynomial's value at 1, the upper edge. */
  static final double[] EDGE = new double[SIDE];

  private static final int CACHED = 8;
  private static final double[][][][] PARTS = new double[CACHED + 1][][][];
  private static final double[][] TO_CHEBYSHEV = new double[SIDE][SIDE];
  private static final double[][] TO_POWERS = new double[SIDE][SIDE];

  static {
    for (int i = 0; i < SIDE; i++) {
      NODES[i] = -StrictMath.cos(Math.PI * (i + 0.5) / SIDE);
      for (int k = 0; k < SIDE; k++) {
        double angle = Math.PI * k * (SIDE - i - 0.5) / SIDE;
        TO_CHEBYSHEV[k][i] = (k == 0 ? 1.0 : 2.0) / SIDE * StrictMath.cos(angle);
      }
    }
    for (int i = 0; i < SIDE; i++) {
      for (int k = 0; k < SIDE; k++) {
        EDGE[i] += TO_CHEBYSHEV[k][i];
      }
    }
    double[][] t = new double[SIDE][SIDE];
    t[0][0] = 1;
    t[1][1] = 1;
    for (int k = 2; k < SIDE; k++) {
      for (int p = 0; p < SIDE; p++) {
        t[k][p] = (p > 0 ? 2 * t[k - 1][p - 1] : 0) - t[k - 2][p];
      }
    }
    for (int k = 0; k < SIDE; k++) {
      for (int p = 0; p < SIDE; p++) {
        TO_POWERS[p][k] = t[k][p];
      }
    }
    for (int parts = 1; parts <= CACHED; parts++) {
      PARTS[parts] = new double[parts][][];
      for (int i = 0; i < parts; i++) {
        PARTS[parts][i] = restrict(i, parts);
      }
    }
  }

  private CellPolynomials() {}

  /** Chebyshev coefficients from values at the nodes, value (i, j) at i·SIDE + j. */
  static double[] chebyshev(double[] values) {
    return both(TO_CHEBYSHEV, TO_CHEBYSHEV, values);
  }

  /** Coefficients of u^a v^b from Chebyshev coefficients. */
  static double[] powers(double[] chebyshev) {
    return both(TO_POWERS, TO_POWERS, chebyshev);
  }

  /**
   * What a cell's Chebyshev coefficients become on one part of it; exact.
   *
   * @param across from {@link #restriction} along u
   * @param up likewise along v
   */
  static double[] onPart(double[] chebyshev, double[][] across, double[][] up) {
    return both(across, up, chebyshev);
  }

  /** The matrix from Chebyshev coefficients to those on part i of n equal ones. */
  static double[][] restriction(int i, int n) {
    return n <= CACHED ? PARTS[n][i] : restrict(i, n);
  }

  private static double[][] restrict(int i, int n) {
    double[][] matrix = new double[SIDE][SIDE];
    double[][] atNodes = new double[SIDE][SIDE];
    for (int p = 0; p < SIDE; p++) {
      double x = -1 + (2 * i + 1 + NODES[p]) / n;
      atNodes[p][0] = 1;
      atNodes[p][1] = x;
      for (int k = 2; k < SIDE; k++) {
        atNodes[p][k] = 2 * x * atNodes[p][k - 1] - atNodes[p][k - 2];
      }
    }
    for (int m = 0; m < SIDE; m++) {
      for (int k = 0; k < SIDE; k++) {
        for (int p = 0; p < SIDE; p++) {
          matrix[m][k] += TO_CHEBYSHEV[m][p] * atNodes[p][k];
        }
      }
    }
    return matrix;
  }

  /**
   * Roots of the summed squares of the Chebyshev coefficients that a short set leaves out: of those
   * with the higher order along u, and of the others.
   */
  static void leftOut(double[] chebyshev, double[] out) {
    double alongU = 0;
    double alongV = 0;
    for (int a = 0; a < SIDE; a++) {
      for (int b = Math.max(0, DEGREE + 1 - a); b < SIDE; b++) {
        double c = chebyshev[a * SIDE + b];
        if (a > b) {
          alongU += c * c;
        } else {
          alongV += c * c;
        }
      }
    }
    out[0] = Math.sqrt(alongU);
    out[1] = Math.sqrt(alongV);
  }

  /** The powers' coefficients of a short set from Chebyshev coefficients, to out[at ..]. */
  static void shortPowers(double[] c, double[] out, int at) {
    // along v, then along u: T2 = 2x² − 1, T3 = 4x³ − 3x
    double c00 = c[0] - c[2];
    double c01 = c[1] - 3 * c[3];
    double c02 = 2 * c[2];
    double c10 = c[SIDE] - c[SIDE + 2];
    double c11 = c[SIDE + 1];
    double c12 = 2 * c[SIDE + 2];
    double c20 = c[2 * SIDE];
    double c21 = c[2 * SIDE + 1];
    double c30 = c[3 * SIDE];
    out[at] = c00 - c20;
    out[at + 1] = c01 - c21;
    out[at + 2] = c02;
    out[at + 3] = 4 * c[3];
    out[at + 4] = c10 - 3 * c30;
    out[at + 5] = c11;
    out[at + 6] = c12;
    out[at + 7] = 2 * c20;
    out[at + 8] = 2 * c21;
    out[at + 9] = 4 * c30;
  }

  /** L x Mᵀ. */
  private static double[] both(double[][] left, double[][] right, double[] x) {
    double[] half = new double[TERMS];
    double[] out = new double[TERMS];
    for (int a = 0; a < SIDE; a++) {
      for (int j = 0; j < SIDE; j++) {
        double s = 0;
        for (int i = 0; i < SIDE; i++) {
          s += left[a][i] * x[i * SIDE + j];
        }
        half[a * SIDE + j] = s;
      }
    }
    for (int a = 0; a < SIDE; a++) {
      for (int b = 0; b < SIDE; b++) {
        double s = 0;
        for (int j = 0; j < SIDE; j++) {
          s += right[b][j] * half[a * SIDE + j];
        }
        out[a * SIDE + b] = s;
      }
    }
    return out;
  }
}
