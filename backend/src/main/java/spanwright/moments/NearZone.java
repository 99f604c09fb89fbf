package spanwright.moments;

import org.apache.commons.math3.complex.Complex;

/**
 * Electric and magnetic field at a point from solved currents: E = −jωA − ∇Φ with the kernels of
 * the matrix, H = curl A/μ0 with A in Lorenz's form (GT in place of GZ). Elements are cut into
 * stretches no longer than their distance from the point.
 */
final class NearZone {
  private static final int POINTS = 5;
  private static final int MOST_STRETCHES = 400;

  private final Currents currents;
  private final Mesh mesh;
  private final Reflection reflection;
  private final double k;
  private final double[] ratio = new double[3 * Reflection.ALL];
  private final double[] place = new double[2];

  // sums of E and H, re and im of x, y, z
  private final double[] electric = new double[6];
  private final double[] magnetic = new double[6];
  // a kernel and its slopes: value, by rho, by z of the observer
  private final double[][] kernels = new double[5][6];

  NearZone(Currents currents, Reflection reflection, double k) {
    this.currents = currents;
    this.mesh = currents.mesh;
    this.reflection = reflection;
    this.k = k;
  }

  /** Peak phasors scaled by a real factor. */
  NearField at(Vertex p, double scale) {
    java.util.Arrays.fill(electric, 0);
    java.util.Arrays.fill(magnetic, 0);
    for (int e = 0; e < mesh.elements; e++) {
      element(p, e);
    }
    return new NearField(
        p,
        new Complex(scale * electric[0], scale * electric[1]),
        new Complex(scale * electric[2], scale * electric[3]),
        new Complex(scale * electric[4], scale * electric[5]),
        new Complex(scale * magnetic[0], scale * magnetic[1]),
        new Complex(scale * magnetic[2], scale * magnetic[3]),
        new Complex(scale * magnetic[4], scale * magnetic[5]));
  }

  private void element(Vertex p, int e) {
    double h = mesh.length[e];
    double apart2 =
        Segments.squared(
            p.x(),
            p.y(),
            p.z(),
            1,
            0,
            0,
            0,
            mesh.x[e],
            mesh.y[e],
            mesh.z[e],
            mesh.tx[e],
            mesh.ty[e],
            mesh.tz[e],
            h,
            place);
    double apart = Math.max(Math.sqrt(apart2), mesh.radius[e]);
    int stretches = Math.min(MOST_STRETCHES, (int) Math.ceil(Math.max(1, 1.5 * h / apart)));
    GaussRule rule = GaussRule.of(POINTS);
    for (int i = 0; i < stretches * POINTS; i++) {
      double t = (i / POINTS + rule.nodes[i % POINTS]) / stretches;
      double weight = rule.weights[i % POINTS] / stretches;
      double ir = weight * h * Currents.at(currents.re[e], Shapes.POWERS, t);
      double ii = weight * h * Currents.at(currents.im[e], Shapes.POWERS, t);
      double sr = weight * Currents.at(currents.re[e], Shapes.SLOPE_POWERS, t);
      double si = weight * Currents.at(currents.im[e], Shapes.SLOPE_POWERS, t);
      source(p, e, t * h, ir, ii, sr, si);
    }
  }

  /** Adds the field of a current moment and of the charge that goes with its slope. */
  private void source(Vertex p, int e, double s, double ir, double ii, double sr, double si) {
    double dx = p.x() - mesh.x[e] - s * mesh.tx[e];
    double dy = p.y() - mesh.y[e] - s * mesh.ty[e];
    double z = mesh.z[e] + s * mesh.tz[e];
    double rho = Math.sqrt(dx * dx + dy * dy);
    double[] direct = new double[6];
    green(rho, p.z() - z, 1, mesh.radius[e], direct);
    for (int m = 0; m < 5; m++) {
      java.util.Arrays.fill(kernels[m], 0);
    }
    if (reflection.present()) {
      reflected(rho, p.z() + z);
    }
    for (int m = 0; m < 5; m++) {
      if (m != 3) {
        for (int c = 0; c < 6; c++) {
          kernels[m][c] += direct[c];
        }
      }
    }
    double cos = rho > 1e-9 ? dx / rho : 0;
    double sin = rho > 1e-9 ? dy / rho : 0;
    electric(e, cos, sin, ir, ii, sr, si);
    magnetic(e, cos, sin, rho, ir, ii);
  }

  /** e^{−jkR}/R and its slopes by rho and by the observer's height. */
  private void green(double rho, double up, double sign, double radius, double[] out) {
    double r2 = rho * rho + up * up;
    double r = Math.sqrt(Math.max(r2, radius * radius));
    double gr = Math.cos(k * r) / r;
    double gi = -Math.sin(k * r) / r;
    // dg/dR = −(jk + 1/R) g
    double dr = -gr / r + k * gi;
    double di = -gi / r - k * gr;
    out[0] = gr;
    out[1] = gi;
    out[2] = dr * rho / r;
    out[3] = di * rho / r;
    out[4] = sign * dr * up / r;
    out[5] = sign * di * up / r;
  }

  private void reflected(double rho, double zeta) {
    double[] image = new double[6];
    green(rho, zeta, 1, 0, image);
    reflection.ratiosAndSlopes(rho, zeta, ratio);
    for (int m = 0; m < 5; m++) {
      double vr = ratio[2 * m];
      double vi = ratio[2 * m + 1];
      for (int c = 0; c < 3; c++) {
        kernels[m][2 * c] = image[2 * c] * vr - image[2 * c + 1] * vi;
        kernels[m][2 * c + 1] = image[2 * c] * vi + image[2 * c + 1] * vr;
        if (c > 0) {
          double wr = ratio[c * Reflection.ALL + 2 * m];
          double wi = ratio[c * Reflection.ALL + 2 * m + 1];
          kernels[m][2 * c] += image[0] * wr - image[1] * wi;
          kernels[m][2 * c + 1] += image[0] * wi + image[1] * wr;
        }
      }
    }
  }

  private void electric(int e, double cos, double sin, double ir, double ii, double sr, double si) {
    double[] ga = kernels[0];
    double[] gp = kernels[1];
    double[] gz = kernels[2];
    double[] f = kernels[3];
    double level = mesh.tx[e] * cos + mesh.ty[e] * sin;
    // A over mu0/4pi, per unit current, re and im
    double factor = Constants.ETA0 / (4 * Math.PI);
    for (int part = 0; part < 2; part++) {
      double ax = mesh.tx[e] * ga[part] + mesh.tz[e] * cos * f[part];
      double ay = mesh.ty[e] * ga[part] + mesh.tz[e] * sin * f[part];
      double az = mesh.tz[e] * gz[part] - level * f[part];
      // −jωA = −jk(η/4π)(…): times the current; −∇Φ: charge is j/ω times the slope
      double cr = part == 0 ? ii : ir;
      double ci = part == 0 ? -ir : ii;
      add(electric, factor * k * cr, factor * k * ci, ax, ay, az);
      double gr = part == 0 ? si : sr;
      double gi = part == 0 ? -sr : si;
      add(
          electric,
          factor / k * gr,
          factor / k * gi,
          cos * gp[2 + part],
          sin * gp[2 + part],
          gp[4 + part]);
    }
  }

  private void magnetic(int e, double cos, double sin, double rho, double ir, double ii) {
    double[] ga = kernels[0];
    double[] f = kernels[3];
    double[] gt = kernels[4];
    double tx = mesh.tx[e];
    double ty = mesh.ty[e];
    double tz = mesh.tz[e];
    double level = tx * cos + ty * sin;
    double across = -tx * sin + ty * cos;
    for (int part = 0; part < 2; part++) {
      double spread = rho > 1e-9 ? f[part] / rho : f[2 + part];
      // slopes of A: x-component by y and z, and so on; d(rho)/dx = cos, d(cos)/dx = sin²/rho
      double azByRho = tz * gt[2 + part] - level * f[2 + part];
      // turning about the source: d(level)/d(phi) = across
      double azByPhi = -across * spread;
      double azX = azByRho * cos - azByPhi * sin;
      double azY = azByRho * sin + azByPhi * cos;
      double axZ = tx * ga[4 + part];
      double ayZ = ty * ga[4 + part];
      double ayX = ty * ga[2 + part] * cos;
      double axY = tx * ga[2 + part] * sin;
      double hx = azY - ayZ;
      double hy = axZ - azX;
      double hz = ayX - axY;
      double cr = part == 0 ? ir : -ii;
      double ci = part == 0 ? ii : ir;
      add(magnetic, cr / (4 * Math.PI), ci / (4 * Math.PI), hx, hy, hz);
    }
  }

  private static void add(double[] sum, double re, double im, double x, double y, double z) {
    sum[0] += re * x;
    sum[1] += im * x;
    sum[2] += re * y;
    sum[3] += im * y;
    sum[4] += re * z;
    sum[5] += im * z;
  }
}
