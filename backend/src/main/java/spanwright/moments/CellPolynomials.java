package spanwright.moments;

/**
 * Polynomials over one rectangular cell, u and v in −1..1 across it: from values at Chebyshev's
 * nodes to coefficients, to powers, and onto a part of the cell.
 *
 * <p>A full set has {@value #SIDE} × {@value #SIDE} terms, u^a v^b at a·{@value #SIDE} + b. A short
 * one keeps the {@value #SHORT} terms with a + b of at most {@value #DEGREE}, in the order of
 * {@link #shortTerm}.
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

  private static final double[][] TO_CHEBYSHEV = new double[SIDE][SIDE];
  private static final double[][] TO_POWERS = new double[SIDE][SIDE];
  private static final int[] SHORT_TERMS = new int[SHORT];

  static {
    for (int i = 0; i < SIDE; i++) {
      NODES[i] = -StrictMath.cos(Math.PI * (i + 0.5) / SIDE);
      for (int k = 0; k < SIDE; k++) {
        double angle = Math.PI * k * (SIDE - i - 0.5) / SIDE;
        TO_CHEBYSHEV[k][i] = (k == 0 ? 1.0 : 2.0) / SIDE * StrictMath.cos(angle);
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
    int n = 0;
    for (int a = 0; a <= DEGREE; a++) {
      for (int b = 0; a + b <= DEGREE; b++) {
        SHORT_TERMS[n++] = a * SIDE + b;
      }
    }
  }

  private CellPolynomials() {}

  /** Place in a full set of the n-th term of a short one. */
  static int shortTerm(int n) {
    return SHORT_TERMS[n];
  }

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

  /** Root of the summed squares of the Chebyshev coefficients that a short set leaves out. */
  static double leftOut(double[] chebyshev) {
    double sum = 0;
    for (int a = 0; a < SIDE; a++) {
      for (int b = Math.max(0, DEGREE + 1 - a); b < SIDE; b++) {
        double c = chebyshev[a * SIDE + b];
        sum += c * c;
      }
    }
    return Math.sqrt(sum);
  }

  /** The powers' coefficients of a short set from Chebyshev coefficients, to out[at ..]. */
  static void shortPowers(double[] chebyshev, double[] out, int at) {
    double[] kept = new double[TERMS];
    for (int n = 0; n < SHORT; n++) {
      kept[SHORT_TERMS[n]] = chebyshev[SHORT_TERMS[n]];
    }
    double[] powers = powers(kept);
    for (int n = 0; n < SHORT; n++) {
      out[at + n] = powers[SHORT_TERMS[n]];
    }
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
