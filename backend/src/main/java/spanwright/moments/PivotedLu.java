package spanwright.moments;

/** Gaussian elimination with row pivoting: slower than L D Lᵀ, for the systems that need it. */
final class PivotedLu {
  private PivotedLu() {}

  /** Solves the system for a real right-hand side into its answer. */
  static void solve(SymmetricSystem system, double[] right) {
    int n = system.size;
    double[][] ar = new double[n][n];
    double[][] ai = new double[n][n];
    for (int i = 0; i < n; i++) {
      for (int j = 0; j <= i; j++) {
        ar[i][j] = system.re(i, j);
        ai[i][j] = system.im(i, j);
        ar[j][i] = ar[i][j];
        ai[j][i] = ai[i][j];
      }
    }
    double[] xr = right.clone();
    double[] xi = new double[n];
    for (int k = 0; k < n; k++) {
      pivot(ar, ai, xr, xi, k);
      double d2 = ar[k][k] * ar[k][k] + ai[k][k] * ai[k][k];
      for (int i = k + 1; i < n; i++) {
        double fr = (ar[i][k] * ar[k][k] + ai[i][k] * ai[k][k]) / d2;
        double fi = (ai[i][k] * ar[k][k] - ar[i][k] * ai[k][k]) / d2;
        for (int j = k + 1; j < n; j++) {
          ar[i][j] -= fr * ar[k][j] - fi * ai[k][j];
          ai[i][j] -= fr * ai[k][j] + fi * ar[k][j];
        }
        xr[i] -= fr * xr[k] - fi * xi[k];
        xi[i] -= fr * xi[k] + fi * xr[k];
      }
    }
    for (int i = n - 1; i >= 0; i--) {
      double sr = xr[i];
      double si = xi[i];
      for (int j = i + 1; j < n; j++) {
        sr -= ar[i][j] * xr[j] - ai[i][j] * xi[j];
        si -= ar[i][j] * xi[j] + ai[i][j] * xr[j];
      }
      double d2 = ar[i][i] * ar[i][i] + ai[i][i] * ai[i][i];
      xr[i] = (sr * ar[i][i] + si * ai[i][i]) / d2;
      xi[i] = (si * ar[i][i] - sr * ai[i][i]) / d2;
    }
    System.arraycopy(xr, 0, system.answerRe, 0, n);
    System.arraycopy(xi, 0, system.answerIm, 0, n);
  }

  private static void pivot(double[][] ar, double[][] ai, double[] xr, double[] xi, int k) {
    int best = k;
    double most = -1;
    for (int i = k; i < ar.length; i++) {
      double size = Math.abs(ar[i][k]) + Math.abs(ai[i][k]);
      if (size > most) {
        most = size;
        best = i;
      }
    }
    if (best != k) {
      double[] t = ar[k];
      ar[k] = ar[best];
      ar[best] = t;
      t = ai[k];
      ai[k] = ai[best];
      ai[best] = t;
      double s = xr[k];
      xr[k] = xr[best];
      xr[best] = s;
      s = xi[k];
      xi[k] = xi[best];
      xi[best] = s;
    }
  }
}
