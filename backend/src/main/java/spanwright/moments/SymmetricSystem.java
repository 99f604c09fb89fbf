package spanwright.moments;

/**
 * A complex symmetric system, factored as L D Lᵀ without pivoting, which halves the work; the
 * answer is held against the system, and a pivoted LU takes over when the residual is not small.
 *
 * <p>Layout: re[i][j], im[i][j] for j ≤ i.
 */
final class SymmetricSystem {
  private static final double GOOD = 1e-9;

  final int size;
  final double[][] re;
  final double[][] im;

  /** The answer. */
  final double[] answerRe;

  final double[] answerIm;

  /** Greatest part of the residual over the greatest part of the right-hand side. */
  double residual;

  /** Whether the pivoted factorisation was needed. */
  boolean pivoted;

  SymmetricSystem(int size) {
    this.size = size;
    re = new double[size][];
    im = new double[size][];
    for (int i = 0; i < size; i++) {
      re[i] = new double[i + 1];
      im[i] = new double[i + 1];
    }
    answerRe = new double[size];
    answerIm = new double[size];
  }

  /** Solves for a real right-hand side; the matrix stays as it is. */
  void solve(double[] right) {
    double[][] lr = new double[size][];
    double[][] li = new double[size][];
    for (int i = 0; i < size; i++) {
      lr[i] = re[i].clone();
      li[i] = im[i].clone();
    }
    factor(lr, li);
    System.arraycopy(right, 0, answerRe, 0, size);
    java.util.Arrays.fill(answerIm, 0);
    substitute(lr, li, answerRe, answerIm);
    residual = residual(right);
    if (!(residual < GOOD)) {
      pivoted = true;
      PivotedLu.solve(this, right);
      residual = residual(right);
    }
  }

  private void factor(double[][] lr, double[][] li) {
    double[] cr = new double[size];
    double[] ci = new double[size];
    for (int k = 0; k < size; k++) {
      double dr = lr[k][k];
      double di = li[k][k];
      double d2 = dr * dr + di * di;
      double ir = dr / d2;
      double ii = -di / d2;
      for (int i = k + 1; i < size; i++) {
        cr[i] = lr[i][k];
        ci[i] = li[i][k];
      }
      for (int i = k + 1; i < size; i++) {
        double fr = cr[i] * ir - ci[i] * ii;
        double fi = cr[i] * ii + ci[i] * ir;
        lr[i][k] = fr;
        li[i][k] = fi;
        update(lr[i], li[i], cr, ci, fr, fi, k + 1, i);
      }
    }
  }

  /** Most of the time goes here: row i loses f times the pivot's column. */
  private static void update(
      double[] rr, double[] ri, double[] cr, double[] ci, double fr, double fi, int from, int to) {
    for (int j = from; j <= to; j++) {
      rr[j] -= fr * cr[j] - fi * ci[j];
      ri[j] -= fr * ci[j] + fi * cr[j];
    }
  }

  private void substitute(double[][] lr, double[][] li, double[] xr, double[] xi) {
    for (int i = 0; i < size; i++) {
      double sr = xr[i];
      double si = xi[i];
      for (int j = 0; j < i; j++) {
        sr -= lr[i][j] * xr[j] - li[i][j] * xi[j];
        si -= lr[i][j] * xi[j] + li[i][j] * xr[j];
      }
      xr[i] = sr;
      xi[i] = si;
    }
    for (int i = size - 1; i >= 0; i--) {
      double dr = lr[i][i];
      double di = li[i][i];
      double d2 = dr * dr + di * di;
      double sr = (xr[i] * dr + xi[i] * di) / d2;
      double si = (xi[i] * dr - xr[i] * di) / d2;
      xr[i] = sr;
      xi[i] = si;
    }
    for (int i = size - 1; i >= 0; i--) {
      double sr = xr[i];
      double si = xi[i];
      for (int j = 0; j < i; j++) {
        xr[j] -= lr[i][j] * sr - li[i][j] * si;
        xi[j] -= lr[i][j] * si + li[i][j] * sr;
      }
    }
  }

  private double residual(double[] right) {
    double[] rr = right.clone();
    double[] ri = new double[size];
    double most = 0;
    for (int i = 0; i < size; i++) {
      most = Math.max(most, Math.abs(right[i]));
      double sr = 0;
      double si = 0;
      double xr = answerRe[i];
      double xi = answerIm[i];
      for (int j = 0; j < i; j++) {
        double a = re[i][j];
        double b = im[i][j];
        sr += a * answerRe[j] - b * answerIm[j];
        si += a * answerIm[j] + b * answerRe[j];
        rr[j] -= a * xr - b * xi;
        ri[j] -= a * xi + b * xr;
      }
      rr[i] -= sr + re[i][i] * xr - im[i][i] * xi;
      ri[i] -= si + re[i][i] * xi + im[i][i] * xr;
    }
    double worst = 0;
    for (int i = 0; i < size; i++) {
      double part = Math.hypot(rr[i], ri[i]);
      worst = part > worst || Double.isNaN(part) ? part : worst;
    }
    return worst / most;
  }
}
