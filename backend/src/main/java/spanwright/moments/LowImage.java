package spanwright.moments;

/**
 * The ground's part of the coupling of two elements that lie low for their length: both are halved,
 * the longer first, until every pair of stretches is short against its distance by the image.
 */
final class LowImage {
  private static final int POINTS = 4;

  /** A stretch may be so long against the distance. */
  private static final double SHORT = 1.0;

  /** Halvings of one element, at most. */
  private static final double SHORTEST = 1.0 / 256;

  private final Mesh mesh;
  private final Reflection reflection;
  private final double k;
  private final double[] rho = new double[POINTS * POINTS];
  private final double[] zeta = new double[POINTS * POINTS];
  private final double[] angle = new double[POINTS * POINTS];
  private final double[] distance = new double[POINTS * POINTS];
  private final double[] sin = new double[POINTS * POINTS];
  private final double[] cos = new double[POINTS * POINTS];
  private final double[] cross = new double[POINTS * POINTS];
  private final double[][] ratio = new double[Reflection.RATIOS][POINTS * POINTS];
  private final double[][] shapeE = new double[POINTS][Shapes.MOST + 1];
  private final double[][] slopeE = new double[POINTS][Shapes.MOST + 1];
  private final double[][] shapeF = new double[POINTS][Shapes.MOST + 1];
  private final double[][] slopeF = new double[POINTS][Shapes.MOST + 1];

  LowImage(Mesh mesh, Reflection reflection, double k) {
    this.mesh = mesh;
    this.reflection = reflection;
    this.k = k;
  }

  /** Adds it to a block [ohm]. */
  void add(int e, int f, double[] blockRe, double[] blockIm) {
    stretch(e, f, 0, 1, 0, 1, blockRe, blockIm);
  }

  private void stretch(
      int e, int f, double s, double ds, double t, double dt, double[] blockRe, double[] blockIm) {
    double he = ds * mesh.length[e];
    double hf = dt * mesh.length[f];
    double longer = Math.max(he, hf);
    double apart = apart(e, f, s + 0.5 * ds, t + 0.5 * dt, he, hf);
    boolean first = he >= hf;
    if (longer <= SHORT * apart || (first ? ds : dt) <= SHORTEST) {
      sample(e, f, s, ds, t, dt, blockRe, blockIm);
    } else if (first) {
      stretch(e, f, s, 0.5 * ds, t, dt, blockRe, blockIm);
      stretch(e, f, s + 0.5 * ds, 0.5 * ds, t, dt, blockRe, blockIm);
    } else {
      stretch(e, f, s, ds, t, 0.5 * dt, blockRe, blockIm);
      stretch(e, f, s, ds, t + 0.5 * dt, 0.5 * dt, blockRe, blockIm);
    }
  }

  /** Least distance of a stretch from the image of another, or a little less [m]. */
  private double apart(int e, int f, double s, double t, double he, double hf) {
    double ze = mesh.z[e] + s * mesh.length[e] * mesh.tz[e];
    double zf = mesh.z[f] + t * mesh.length[f] * mesh.tz[f];
    double height = ze + zf - 0.5 * (he * Math.abs(mesh.tz[e]) + hf * Math.abs(mesh.tz[f]));
    double dx =
        mesh.x[e] - mesh.x[f] + s * mesh.length[e] * mesh.tx[e] - t * mesh.length[f] * mesh.tx[f];
    double dy =
        mesh.y[e] - mesh.y[f] + s * mesh.length[e] * mesh.ty[e] - t * mesh.length[f] * mesh.ty[f];
    double level = Math.max(0, Math.hypot(dx, dy) - 0.5 * (he + hf));
    return Math.hypot(level, height);
  }

  private void sample(
      int e, int f, double s, double ds, double t, double dt, double[] blockRe, double[] blockIm) {
    places(e, f, s, ds, t, dt);
    int count = POINTS * POINTS;
    SinCos.of(angle, count, sin, cos);
    reflection.ratios(rho, zeta, count, ratio);
    shapes(mesh.order[e], s, ds, shapeE, slopeE);
    shapes(mesh.order[f], t, dt, shapeF, slopeF);
    double[] weight = GaussRule.of(POINTS).weights;
    double level = mesh.tx[e] * mesh.tx[f] + mesh.ty[e] * mesh.ty[f];
    double upright = mesh.tz[e] * mesh.tz[f];
    double area = ds * dt;
    double factor = Constants.ETA0 / (4 * Math.PI);
    double current = factor * k * area * mesh.length[e] * mesh.length[f];
    double charge = factor / k * area;
    int rows = mesh.order[e] + 1;
    int columns = mesh.order[f] + 1;
    for (int i = 0; i < count; i++) {
      int p = i / POINTS;
      int q = i % POINTS;
      double w = weight[p] * weight[q] / distance[i];
      double gr = w * cos[i];
      double gi = -w * sin[i];
      double vr = level * ratio[0][i] + upright * ratio[4][i] + cross[i] * ratio[6][i];
      double vi = level * ratio[1][i] + upright * ratio[5][i] + cross[i] * ratio[7][i];
      double cr = current * (vr * gr - vi * gi);
      double ci = current * (vr * gi + vi * gr);
      double pr = charge * (ratio[2][i] * gr - ratio[3][i] * gi);
      double pi = charge * (ratio[2][i] * gi + ratio[3][i] * gr);
      for (int a = 0; a < rows; a++) {
        double na = shapeE[p][a];
        double da = slopeE[p][a];
        for (int b = 0; b < columns; b++) {
          double nn = na * shapeF[q][b];
          double dd = da * slopeF[q][b];
          blockRe[a * columns + b] += dd * pi - nn * ci;
          blockIm[a * columns + b] += nn * cr - dd * pr;
        }
      }
    }
  }

  private void places(int e, int f, double s, double ds, double t, double dt) {
    double[] node = GaussRule.of(POINTS).nodes;
    for (int i = 0; i < POINTS * POINTS; i++) {
      double u = (s + ds * node[i / POINTS]) * mesh.length[e];
      double v = (t + dt * node[i % POINTS]) * mesh.length[f];
      double dx = mesh.x[e] + u * mesh.tx[e] - mesh.x[f] - v * mesh.tx[f];
      double dy = mesh.y[e] + u * mesh.ty[e] - mesh.y[f] - v * mesh.ty[f];
      zeta[i] = mesh.z[e] + u * mesh.tz[e] + mesh.z[f] + v * mesh.tz[f];
      rho[i] = Math.sqrt(dx * dx + dy * dy);
      distance[i] = Math.sqrt(rho[i] * rho[i] + zeta[i] * zeta[i]);
      angle[i] = k * distance[i];
      double turn =
          (mesh.tx[e] * dx + mesh.ty[e] * dy) * mesh.tz[f]
              - mesh.tz[e] * (mesh.tx[f] * dx + mesh.ty[f] * dy);
      cross[i] = rho[i] > 1e-9 ? turn / rho[i] : 0;
    }
  }

  private static void shapes(int order, double s, double ds, double[][] shape, double[][] slope) {
    double[] node = GaussRule.of(POINTS).nodes;
    for (int p = 0; p < POINTS; p++) {
      double at = s + ds * node[p];
      for (int a = 0; a <= order; a++) {
        shape[p][a] = Shapes.at(Shapes.POWERS[a], at);
        slope[p][a] = Shapes.at(Shapes.SLOPE_POWERS[a], at);
      }
    }
  }
}
