package spanwright.moments;

/**
 * Couplings of close pairs at one wave number: the static matrices, and what e^{−jkR}/R leaves when
 * 1/R − k²R/2 is taken out, which is smooth and goes through a plain Gauss rule.
 */
final class ClosePairs {
  private static final int MOST_POINTS = 6;

  /** Enough for elements of lower order, which are short. */
  private static final int FEW_POINTS = 4;

  private final Mesh mesh;
  private final double k;
  private final double[] distance = new double[MOST_POINTS * MOST_POINTS];
  private final double[] angle = new double[MOST_POINTS * MOST_POINTS];
  private final double[] restRe = new double[MOST_POINTS * MOST_POINTS];
  private final double[] restIm = new double[MOST_POINTS * MOST_POINTS];
  // folded with the shapes and slopes of the second element: [point of the first]
  private final double[] shapeRe = new double[MOST_POINTS];
  private final double[] shapeIm = new double[MOST_POINTS];
  private final double[] slopeRe = new double[MOST_POINTS];
  private final double[] slopeIm = new double[MOST_POINTS];

  ClosePairs(Mesh mesh, double k) {
    this.mesh = mesh;
    this.k = k;
  }

  /** Writes the block of a pair, in ohms. */
  void block(StaticPairs.Pair pair, double[] blockRe, double[] blockIm) {
    int e = pair.e();
    int f = pair.f();
    int points = Math.max(mesh.order[e], mesh.order[f]) > 2 ? MOST_POINTS : FEW_POINTS;
    rest(e, f, pair.radius2(), points);
    int rows = mesh.order[e] + 1;
    int columns = mesh.order[f] + 1;
    double dot = mesh.tx[e] * mesh.tx[f] + mesh.ty[e] * mesh.ty[f] + mesh.tz[e] * mesh.tz[f];
    double area = mesh.length[e] * mesh.length[f];
    double half = 0.5 * k * k;
    double factor = Constants.ETA0 / (4 * Math.PI);
    double[][] shape = Shapes.weighted(points);
    double[][] slope = Shapes.weightedSlopes(points);
    for (int b = 0; b < columns; b++) {
      fold(points, shape[b], slope[b]);
      for (int a = 0; a < rows; a++) {
        double cr = 0;
        double ci = 0;
        double pr = 0;
        double pi = 0;
        for (int p = 0; p < points; p++) {
          cr += shape[a][p] * shapeRe[p];
          ci += shape[a][p] * shapeIm[p];
          pr += slope[a][p] * slopeRe[p];
          pi += slope[a][p] * slopeIm[p];
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

  private void fold(int points, double[] shape, double[] slope) {
    for (int p = 0; p < points; p++) {
      double rr = 0;
      double ri = 0;
      double sr = 0;
      double si = 0;
      for (int q = 0; q < points; q++) {
        double re = restRe[p * points + q];
        double im = restIm[p * points + q];
        rr += shape[q] * re;
        ri += shape[q] * im;
        sr += slope[q] * re;
        si += slope[q] * im;
      }
      shapeRe[p] = rr;
      shapeIm[p] = ri;
      slopeRe[p] = sr;
      slopeIm[p] = si;
    }
  }

  /** (e^{−jkR} − 1 + (kR)²/2)/R; what cancels is far below the 1/R it is added to. */
  private void rest(int e, int f, double radius2, int points) {
    distances(e, f, radius2, points);
    int count = points * points;
    for (int i = 0; i < count; i++) {
      angle[i] = k * distance[i];
    }
    SinCos.of(angle, count, restIm, restRe);
    double half = 0.5 * k * k;
    for (int i = 0; i < count; i++) {
      restRe[i] = (restRe[i] - 1) / distance[i] + half * distance[i];
    }
    for (int i = 0; i < count; i++) {
      restIm[i] = -restIm[i] / distance[i];
    }
  }

  private void distances(int e, int f, double radius2, int points) {
    double[] node = GaussRule.of(points).nodes;
    for (int p = 0; p < points; p++) {
      double s = mesh.length[e] * node[p];
      double px = mesh.x[e] + s * mesh.tx[e] - mesh.x[f];
      double py = mesh.y[e] + s * mesh.ty[e] - mesh.y[f];
      double pz = mesh.z[e] + s * mesh.tz[e] - mesh.z[f];
      for (int q = 0; q < points; q++) {
        double t = mesh.length[f] * node[q];
        double dx = px - t * mesh.tx[f];
        double dy = py - t * mesh.ty[f];
        double dz = pz - t * mesh.tz[f];
        distance[p * points + q] = Math.sqrt(dx * dx + dy * dy + dz * dz + radius2);
      }
    }
  }
}
