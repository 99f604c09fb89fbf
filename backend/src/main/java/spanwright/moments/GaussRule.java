package spanwright.moments;

/** Gauss-Legendre rules on [0, 1], by Newton's iteration on the Legendre polynomial; remembered. */
final class GaussRule {
  private static final int MOST = 64;
  private static final GaussRule[] RULES = new GaussRule[MOST + 1];

  static {
    for (int n = 1; n <= MOST; n++) {
      RULES[n] = new GaussRule(n);
    }
  }

  final double[] nodes;
  final double[] weights;

  private GaussRule(int n) {
    nodes = new double[n];
    weights = new double[n];
    for (int i = 0; i < n; i++) {
      double x = -StrictMath.cos(Math.PI * (i + 0.75) / (n + 0.5));
      double slope = 1;
      for (int turn = 0; turn < 60; turn++) {
        double before = 1;
        double value = x;
        for (int k = 2; k <= n; k++) {
          double next = ((2 * k - 1) * x * value - (k - 1) * before) / k;
          before = value;
          value = next;
        }
        slope = n * (x * value - before) / (x * x - 1);
        double step = value / slope;
        x -= step;
        if (Math.abs(step) < 1e-16) {
          break;
        }
      }
      nodes[i] = 0.5 * (1 + x);
      weights[i] = 1 / ((1 - x * x) * slope * slope);
    }
  }

  /** The rule with this many points, 1 to 64. */
  static GaussRule of(int points) {
    return RULES[points];
  }
}
