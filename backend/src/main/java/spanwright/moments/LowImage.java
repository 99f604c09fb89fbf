package spanwright.moments;

/** The ground's part of the coupling of two elements that lie low for their length. */
final class LowImage {
  private static final int POINTS = 5;

  private final Mesh mesh;
  private final Reflection reflection;
  private final double k;
  private final double[] ratio = new double[Reflection.RATIOS];

  LowImage(Mesh mesh, Reflection reflection, double k) {
    this.mesh = mesh;
    this.reflection = reflection;
    this.k = k;
  }

  /** Adds it to a block [ohm], with e cut into me and f into mf stretches. */
  void add(int e, int f, int me, int mf, double[] blockRe, double[] blockIm) {
    GaussRule rule = GaussRule.of(POINTS);
    for (int i = 0; i < me * POINTS; i++) {
      double s = (i / POINTS + rule.nodes[i % POINTS]) / me;
      double ws = rule.weights[i % POINTS] / me;
      for (int j = 0; j < mf * POINTS; j++) {
        double t = (j / POINTS + rule.nodes[j % POINTS]) / mf;
        double weight = ws * rule.weights[j % POINTS] / mf;
        sample(e, f, s, t, weight, blockRe, blockIm);
      }
    }
  }

  private void sample(
      int e, int f, double s, double t, double weight, double[] blockRe, double[] blockIm) {
    double he = mesh.length[e];
    double hf = mesh.length[f];
    double dx = mesh.x[e] + s * he * mesh.tx[e] - mesh.x[f] - t * hf * mesh.tx[f];
    double dy = mesh.y[e] + s * he * mesh.ty[e] - mesh.y[f] - t * hf * mesh.ty[f];
    double zeta = mesh.z[e] + s * he * mesh.tz[e] + mesh.z[f] + t * hf * mesh.tz[f];
    double rho = Math.sqrt(dx * dx + dy * dy);
    reflection.ratios(rho, zeta, ratio);
    double cross = 0;
    if (rho > 1e-9) {
      cross =
          ((mesh.tx[e] * dx + mesh.ty[e] * dy) * mesh.tz[f]
                  - mesh.tz[e] * (mesh.tx[f] * dx + mesh.ty[f] * dy))
              / rho;
    }
    double level = mesh.tx[e] * mesh.tx[f] + mesh.ty[e] * mesh.ty[f];
    double upright = mesh.tz[e] * mesh.tz[f];
    double r = Math.sqrt(rho * rho + zeta * zeta);
    double gr = weight * Math.cos(k * r) / r;
    double gi = -weight * Math.sin(k * r) / r;
    double vr = level * ratio[0] + upright * ratio[4] + cross * ratio[6];
    double vi = level * ratio[1] + upright * ratio[5] + cross * ratio[7];
    double area = he * hf;
    double currentR = area * (vr * gr - vi * gi);
    double currentI = area * (vr * gi + vi * gr);
    double chargeR = ratio[2] * gr - ratio[3] * gi;
    double chargeI = ratio[2] * gi + ratio[3] * gr;
    double factor = Constants.ETA0 / (4 * Math.PI);
    int columns = mesh.order[f] + 1;
    for (int a = 0; a <= mesh.order[e]; a++) {
      double na = Shapes.at(Shapes.POWERS[a], s);
      double da = Shapes.at(Shapes.SLOPE_POWERS[a], s);
      for (int b = 0; b < columns; b++) {
        double nn = k * na * Shapes.at(Shapes.POWERS[b], t);
        double dd = da * Shapes.at(Shapes.SLOPE_POWERS[b], t) / k;
        blockRe[a * columns + b] += -factor * (nn * currentI - dd * chargeI);
        blockIm[a * columns + b] += factor * (nn * currentR - dd * chargeR);
      }
    }
  }
}
