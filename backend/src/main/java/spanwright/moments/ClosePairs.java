package spanwright.moments;

/**
 * Couplings of close pairs at one wave number: the static matrices, and what e^{−jkR}/R leaves when
 * 1/R − k²R/2 is taken out, which is smooth and goes through a plain Gauss rule.
 */
final class ClosePairs {
  private static final int POINTS = 6;

  private final Mesh mesh;
  private final double k;
  private final double[] restRe = new double[POINTS * POINTS];
  private final double[] restIm = new double[POINTS * POINTS];

  ClosePairs(Mesh mesh, double k) {
    this.mesh = mesh;
    this.k = k;
  }

  /** Writes the block of a pair, in ohms. */
  void block(StaticPairs.Pair pair, double[] blockRe, double[] blockIm) {
    int e = pair.e();
    int f = pair.f();
    rest(e, f, pair.radius2());
    int rows = mesh.order[e] + 1;
    int columns = mesh.order[f] + 1;
    double dot = mesh.tx[e] * mesh.tx[f] + mesh.ty[e] * mesh.ty[f] + mesh.tz[e] * mesh.tz[f];
    double area = mesh.length[e] * mesh.length[f];
    double half = 0.5 * k * k;
    double factor = Constants.ETA0 / (4 * Math.PI);
    double[][] shape = Shapes.weighted(POINTS);
    double[][] slope = Shapes.weightedSlopes(POINTS);
    for (int a = 0; a < rows; a++) {
      for (int b = 0; b < columns; b++) {
        double cr = 0;
        double ci = 0;
        double pr = 0;
        double pi = 0;
        for (int p = 0; p < POINTS; p++) {
          double rr = 0;
          double ri = 0;
          double sr = 0;
          double si = 0;
          for (int q = 0; q < POINTS; q++) {
            double re = restRe[p * POINTS + q];
            double im = restIm[p * POINTS + q];
            rr += shape[b][q] * re;
            ri += shape[b][q] * im;
            sr += slope[b][q] * re;
            si += slope[b][q] * im;
          }
          cr += shape[a][p] * rr;
          ci += shape[a][p] * ri;
          pr += slope[a][p] * sr;
          pi += slope[a][p] * si;
        }
        int at = a * columns + b;
        cr = dot * (area * cr + pair.current0()[at] - half * pair.current2()[at]);
        ci = dot * area * ci;
        pr += pair.charge0()[at] - half * pair.charge2()[at];
        blockRe[at] = -factor * (k * ci - pi / k);
        blockIm[at] = factor * (k * cr - pr / k);
      }
    }
  }

  private void rest(int e, int f, double radius2) {
    double[] node = GaussRule.of(POINTS).nodes;
    for (int p = 0; p < POINTS; p++) {
      double s = mesh.length[e] * node[p];
      double px = mesh.x[e] + s * mesh.tx[e] - mesh.x[f];
      double py = mesh.y[e] + s * mesh.ty[e] - mesh.y[f];
      double pz = mesh.z[e] + s * mesh.tz[e] - mesh.z[f];
      for (int q = 0; q < POINTS; q++) {
        double t = mesh.length[f] * node[q];
        double dx = px - t * mesh.tx[f];
        double dy = py - t * mesh.ty[f];
        double dz = pz - t * mesh.tz[f];
        double r = Math.sqrt(dx * dx + dy * dy + dz * dz + radius2);
        double x = k * r;
        double x2 = x * x;
        int at = p * POINTS + q;
        if (x < 0.7) {
          // k·(x³/24 − x⁵/720 + …) and −k·(1 − x²/6 + …)
          restRe[at] =
              k * x * x2 * (1.0 / 24 - x2 * (1.0 / 720 - x2 * (1.0 / 40320 - x2 / 3628800)));
          restIm[at] =
              -k * (1 - x2 * (1.0 / 6 - x2 * (1.0 / 120 - x2 * (1.0 / 5040 - x2 / 362880))));
        } else {
          restRe[at] = (Math.cos(x) - 1 + 0.5 * x2) / r;
          restIm[at] = -Math.sin(x) / r;
        }
      }
    }
  }
}
