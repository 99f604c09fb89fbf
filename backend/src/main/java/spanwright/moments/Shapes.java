package spanwright.moments;

/**
 * The shape functions of an element, on t = 0..1 along it: the two hats 1 − t and t, then the
 * integrals of the Legendre polynomials P1, P2 and P3, which are zero at both ends (Szabó and
 * Babuška, Finite Element Analysis, 1991, §2.5). Their slopes, the charges, are therefore ±1, P1,
 * P2, P3: each further one brings what the others lack.
 */
final class Shapes {
  /** Highest polynomial order. */
  static final int MOST = 4;

  /** Coefficient of t^m in shape a at [a][m]. */
  static final double[][] POWERS = {
    {1, -1, 0, 0, 0},
    {0, 1, 0, 0, 0},
    {0, -1, 1, 0, 0},
    {0, 1, -3, 2, 0},
    {0, -1, 6, -10, 5}
  };

  /** Coefficient of t^m in the slope of shape a at [a][m]. */
  static final double[][] SLOPE_POWERS = slopes(POWERS);

  /** Integral of shape a times shape b over t at [a][b]. */
  static final double[][] MASS = products(POWERS);

  /** Integral of slope a times slope b over t at [a][b]. */
  static final double[][] STIFFNESS = products(SLOPE_POWERS);

  private static final int MOST_POINTS = 16;
  private static final double[][][] VALUES = new double[MOST_POINTS + 1][][];
  private static final double[][][] SLOPES = new double[MOST_POINTS + 1][][];

  static {
    for (int n = 1; n <= MOST_POINTS; n++) {
      VALUES[n] = table(POWERS, n);
      SLOPES[n] = table(SLOPE_POWERS, n);
    }
  }

  private Shapes() {}

  private static double[][] slopes(double[][] powers) {
    double[][] out = new double[powers.length][powers.length];
    for (int a = 0; a < powers.length; a++) {
      for (int m = 1; m < powers[a].length; m++) {
        out[a][m - 1] = m * powers[a][m];
      }
    }
    return out;
  }

  private static double[][] products(double[][] powers) {
    double[][] out = new double[powers.length][powers.length];
    for (int a = 0; a < powers.length; a++) {
      for (int b = 0; b < powers.length; b++) {
        for (int m = 0; m < powers[a].length; m++) {
          for (int n = 0; n < powers[b].length; n++) {
            out[a][b] += powers[a][m] * powers[b][n] / (m + n + 1);
          }
        }
      }
    }
    return out;
  }

  private static double[][] table(double[][] powers, int points) {
    GaussRule rule = GaussRule.of(points);
    double[][] out = new double[powers.length][points];
    for (int a = 0; a < powers.length; a++) {
      for (int q = 0; q < points; q++) {
        out[a][q] = at(powers[a], rule.nodes[q]) * rule.weights[q];
      }
    }
    return out;
  }

  /** Shape a times the weight of Gauss point q at [a][q], for so many points. */
  static double[][] weighted(int points) {
    return VALUES[points];
  }

  /** Slope of shape a times the weight of Gauss point q at [a][q]. */
  static double[][] weightedSlopes(int points) {
    return SLOPES[points];
  }

  /** A polynomial's value. */
  static double at(double[] powers, double t) {
    double sum = 0;
    for (int m = powers.length - 1; m >= 0; m--) {
      sum = sum * t + powers[m];
    }
    return sum;
  }
}
