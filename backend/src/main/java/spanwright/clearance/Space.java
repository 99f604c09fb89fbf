package spanwright.clearance;

/**
 * Distances in space between points, segments and triangles, with the two places where they are
 * nearest. Every candidate offered is the distance of a real pair of points, so an answer is never
 * too near; the candidates hold the true pair, so it is never too far but for rounding. (C.
 * Ericson, <em>Real-Time Collision Detection</em>, 2005, §5.1, for the interior candidate of two
 * segments; the ends are added so that parallel and point-like segments need no case of their own.)
 */
final class Space {
  private Space() {}

  /**
   * Without the library's care for overflow, which plans of 100 km do not need: ten times faster.
   */
  static double hypot(double x, double y) {
    return Math.sqrt(x * x + y * y);
  }

  /** The nearest pair so far: its distance squared, our place a and the other place b. */
  static final class Near {
    double square = Double.POSITIVE_INFINITY;
    double ax;
    double ay;
    double az;
    double bx;
    double by;
    double bz;

    double distance() {
      return Math.sqrt(square);
    }

    void offer(double px, double py, double pz, double qx, double qy, double qz) {
      double dx = px - qx;
      double dy = py - qy;
      double dz = pz - qz;
      double s = dx * dx + dy * dy + dz * dz;
      if (s < square) {
        square = s;
        ax = px;
        ay = py;
        az = pz;
        bx = qx;
        by = qy;
        bz = qz;
      }
    }
  }

  /** Offers the nearest pair of point p and segment a–b; the point is ours. */
  static void pointSegment(
      double px, double py, double pz, double[] s, int a, int b, boolean pointIsOurs, Near near) {
    double dx = s[b] - s[a];
    double dy = s[b + 1] - s[a + 1];
    double dz = s[b + 2] - s[a + 2];
    double square = dx * dx + dy * dy + dz * dz;
    double t = 0;
    if (square > 0) {
      t = ((px - s[a]) * dx + (py - s[a + 1]) * dy + (pz - s[a + 2]) * dz) / square;
      t = Math.max(0, Math.min(1, t));
    }
    // From the nearer end, so that a long segment does not cost digits.
    double qx = t < 0.5 ? s[a] + t * dx : s[b] - (1 - t) * dx;
    double qy = t < 0.5 ? s[a + 1] + t * dy : s[b + 1] - (1 - t) * dy;
    double qz = t < 0.5 ? s[a + 2] + t * dz : s[b + 2] - (1 - t) * dz;
    if (pointIsOurs) {
      near.offer(px, py, pz, qx, qy, qz);
    } else {
      near.offer(qx, qy, qz, px, py, pz);
    }
  }

  /**
   * Offers the nearest pair of segment a–b of p (ours) and segment c–d of q.
   *
   * @param a offset of x, y, z in p; b likewise; c and d in q
   */
  static void segments(double[] p, int a, int b, double[] q, int c, int d, Near near) {
    pointSegment(p[a], p[a + 1], p[a + 2], q, c, d, true, near);
    pointSegment(p[b], p[b + 1], p[b + 2], q, c, d, true, near);
    pointSegment(q[c], q[c + 1], q[c + 2], p, a, b, false, near);
    pointSegment(q[d], q[d + 1], q[d + 2], p, a, b, false, near);
    double ux = p[b] - p[a];
    double uy = p[b + 1] - p[a + 1];
    double uz = p[b + 2] - p[a + 2];
    double vx = q[d] - q[c];
    double vy = q[d + 1] - q[c + 1];
    double vz = q[d + 2] - q[c + 2];
    double wx = p[a] - q[c];
    double wy = p[a + 1] - q[c + 1];
    double wz = p[a + 2] - q[c + 2];
    // n = u × v; the common normal meets both lines at s and t, each by a triple product.
    double nx = uy * vz - uz * vy;
    double ny = uz * vx - ux * vz;
    double nz = ux * vy - uy * vx;
    double nn = nx * nx + ny * ny + nz * nz;
    if (!(nn > 0)) {
      return;
    }
    double s =
        ((vy * wz - vz * wy) * nx + (vz * wx - vx * wz) * ny + (vx * wy - vy * wx) * nz) / nn;
    double t =
        ((uy * wz - uz * wy) * nx + (uz * wx - ux * wz) * ny + (ux * wy - uy * wx) * nz) / nn;
    if (s > 0 && s < 1 && t > 0 && t < 1) {
      near.offer(
          p[a] + s * ux,
          p[a + 1] + s * uy,
          p[a + 2] + s * uz,
          q[c] + t * vx,
          q[c + 1] + t * vy,
          q[c + 2] + t * vz);
    }
  }

  /**
   * Offers the nearest pair of segment a–b of p and the triangle of nine numbers.
   *
   * @param segmentIsOurs otherwise the triangle is ours
   */
  static void segmentTriangle(
      double[] p, int a, int b, double[] t, boolean segmentIsOurs, Near near) {
    if (segmentIsOurs) {
      segments(p, a, b, t, 0, 3, near);
      segments(p, a, b, t, 3, 6, near);
      segments(p, a, b, t, 6, 0, near);
    } else {
      segments(t, 0, 3, p, a, b, near);
      segments(t, 3, 6, p, a, b, near);
      segments(t, 6, 0, p, a, b, near);
    }
    double ux = t[3] - t[0];
    double uy = t[4] - t[1];
    double uz = t[5] - t[2];
    double vx = t[6] - t[0];
    double vy = t[7] - t[1];
    double vz = t[8] - t[2];
    double nx = uy * vz - uz * vy;
    double ny = uz * vx - ux * vz;
    double nz = ux * vy - uy * vx;
    double nn = nx * nx + ny * ny + nz * nz;
    if (!(nn > 0)) {
      return;
    }
    double ha = (p[a] - t[0]) * nx + (p[a + 1] - t[1]) * ny + (p[a + 2] - t[2]) * nz;
    double hb = (p[b] - t[0]) * nx + (p[b + 1] - t[1]) * ny + (p[b + 2] - t[2]) * nz;
    onTriangle(p[a], p[a + 1], p[a + 2], ha / nn, t, nx, ny, nz, nn, segmentIsOurs, near);
    onTriangle(p[b], p[b + 1], p[b + 2], hb / nn, t, nx, ny, nz, nn, segmentIsOurs, near);
    if (ha * hb < 0) {
      double share = ha / (ha - hb);
      onTriangle(
          p[a] + share * (p[b] - p[a]),
          p[a + 1] + share * (p[b + 1] - p[a + 1]),
          p[a + 2] + share * (p[b + 2] - p[a + 2]),
          0,
          t,
          nx,
          ny,
          nz,
          nn,
          segmentIsOurs,
          near);
    }
  }

  /** Offers point x and its foot on the triangle's plane, where that lies in the triangle. */
  private static void onTriangle(
      double x,
      double y,
      double z,
      double height,
      double[] t,
      double nx,
      double ny,
      double nz,
      double nn,
      boolean pointIsOurs,
      Near near) {
    double fx = x - height * nx;
    double fy = y - height * ny;
    double fz = z - height * nz;
    for (int i = 0; i < 9; i += 3) {
      int j = (i + 3) % 9;
      double ex = t[j] - t[i];
      double ey = t[j + 1] - t[i + 1];
      double ez = t[j + 2] - t[i + 2];
      double px = fx - t[i];
      double py = fy - t[i + 1];
      double pz = fz - t[i + 2];
      double side = (ey * pz - ez * py) * nx + (ez * px - ex * pz) * ny + (ex * py - ey * px) * nz;
      if (side < 0) {
        return;
      }
    }
    if (pointIsOurs) {
      near.offer(x, y, z, fx, fy, fz);
    } else {
      near.offer(fx, fy, fz, x, y, z);
    }
  }

  /** Distance between two boxes [m], each least x, y, z then greatest. */
  static double boxes(double[] a, double[] b) {
    double sum = 0;
    for (int k = 0; k < 3; k++) {
      double gap = Math.max(0, Math.max(a[k] - b[k + 3], b[k] - a[k + 3]));
      sum += gap * gap;
    }
    return Math.sqrt(sum);
  }

  /** The box of points x, y, z from one to another, both included. */
  static double[] box(double[] points, int from, int to) {
    double[] box = emptyBox();
    for (int i = 3 * from; i <= 3 * to; i += 3) {
      for (int k = 0; k < 3; k++) {
        box[k] = Math.min(box[k], points[i + k]);
        box[k + 3] = Math.max(box[k + 3], points[i + k]);
      }
    }
    return box;
  }

  static double[] emptyBox() {
    return new double[] {
      Double.POSITIVE_INFINITY,
      Double.POSITIVE_INFINITY,
      Double.POSITIVE_INFINITY,
      Double.NEGATIVE_INFINITY,
      Double.NEGATIVE_INFINITY,
      Double.NEGATIVE_INFINITY
    };
  }

  static void grow(double[] box, double[] by) {
    for (int k = 0; k < 3; k++) {
      box[k] = Math.min(box[k], by[k]);
      box[k + 3] = Math.max(box[k + 3], by[k + 3]);
    }
  }
}
