package spanwright.moments;

/** Shortest distance between two straight segments in space. */
final class Segments {
  private Segments() {}

  /**
   * Squared distance between the segments p + s·u (s in 0..lp) and q + t·v (t in 0..lq), u and v of
   * unit length; writes the places s and t to out (Eberly, Robust computation of distance between
   * line segments, 2018: the interior minimum, else the least over the edges).
   */
  static double squared(
      double px,
      double py,
      double pz,
      double ux,
      double uy,
      double uz,
      double lp,
      double qx,
      double qy,
      double qz,
      double vx,
      double vy,
      double vz,
      double lq,
      double[] out) {
    double wx = px - qx;
    double wy = py - qy;
    double wz = pz - qz;
    double uv = ux * vx + uy * vy + uz * vz;
    double uw = ux * wx + uy * wy + uz * wz;
    double vw = vx * wx + vy * wy + vz * wz;
    double det = 1 - uv * uv;
    double best = Double.POSITIVE_INFINITY;
    if (det > 1e-12) {
      double s = (uv * vw - uw) / det;
      double t = (vw - uv * uw) / det;
      if (s >= 0 && s <= lp && t >= 0 && t <= lq) {
        best = place(wx, wy, wz, ux, uy, uz, vx, vy, vz, s, t, best, out);
      }
    }
    best = place(wx, wy, wz, ux, uy, uz, vx, vy, vz, 0, clamp(vw, lq), best, out);
    best = place(wx, wy, wz, ux, uy, uz, vx, vy, vz, lp, clamp(vw + lp * uv, lq), best, out);
    best = place(wx, wy, wz, ux, uy, uz, vx, vy, vz, clamp(-uw, lp), 0, best, out);
    best = place(wx, wy, wz, ux, uy, uz, vx, vy, vz, clamp(lq * uv - uw, lp), lq, best, out);
    return best;
  }

  private static double clamp(double x, double most) {
    return Math.max(0, Math.min(most, x));
  }

  private static double place(
      double wx,
      double wy,
      double wz,
      double ux,
      double uy,
      double uz,
      double vx,
      double vy,
      double vz,
      double s,
      double t,
      double best,
      double[] out) {
    double x = wx + s * ux - t * vx;
    double y = wy + s * uy - t * vy;
    double z = wz + s * uz - t * vz;
    double d = x * x + y * y + z * z;
    if (d < best) {
      out[0] = s;
      out[1] = t;
      return d;
    }
    return best;
  }
}
