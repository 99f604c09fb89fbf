package spanwright.moments;

/**
 * Bessel functions J0, J1 and Hankel functions of orders 0 and 1 of many complex arguments with
 * non-negative real parts, in loops that run several lanes at a time.
 *
 * <p>Power series below |z| = {@value #BORDER}, Hankel's asymptotic series from there (Abramowitz
 * and Stegun, Handbook of Mathematical Functions, 9.1.10 and 9.2.7 to 9.2.10; its least term is
 * about e^{−2|z|}). Both are good to about 1e-11 of e^{|Im z|}.
 */
final class ComplexBessel {
  /** Least |z| for the asymptotic series. */
  static final double BORDER = 12;

  private static final int TERMS = 18;
  private static final int MOST = 40;
  private static final double[][] ASYMPTOTIC = {hankelTerms(0), hankelTerms(1)};
  private static final double[][] POWER = {seriesTerms(0), seriesTerms(1)};

  /** J0 or H0, then J1 or H1, of each argument. */
  final double[][] re;

  final double[][] im;

  private final double[] ur;
  private final double[] ui;
  private final double[] angle;
  private final double[] sin;
  private final double[] cos;
  private final double[] frontR;
  private final double[] frontI;
  private final double[][] otherRe;
  private final double[][] otherIm;

  /** Room for so many arguments at a time. */
  ComplexBessel(int room) {
    re = new double[2][room];
    im = new double[2][room];
    ur = new double[room];
    ui = new double[room];
    angle = new double[room];
    sin = new double[room];
    cos = new double[room];
    frontR = new double[room];
    frontI = new double[room];
    otherRe = new double[2][room];
    otherIm = new double[2][room];
  }

  private static double[] hankelTerms(int order) {
    double[] a = new double[TERMS];
    a[0] = 1;
    for (int k = 1; k < TERMS; k++) {
      double odd = 2 * k - 1;
      a[k] = a[k - 1] * (4.0 * order * order - odd * odd) / (8.0 * k);
    }
    return a;
  }

  private static double[] seriesTerms(int order) {
    double[] a = new double[MOST];
    a[0] = 1;
    for (int m = 1; m < MOST; m++) {
      a[m] = a[m - 1] / (m * (double) (m + order));
    }
    return a;
  }

  /** J0 and J1 of x + jy, count of them. */
  void regular(double[] x, double[] y, int count) {
    int from = 0;
    while (from < count) {
      boolean near = near(x[from], y[from]);
      double most = 0;
      boolean real = true;
      int to = from;
      while (to < count && near(x[to], y[to]) == near) {
        most = Math.max(most, x[to] * x[to] + y[to] * y[to]);
        real &= y[to] == 0;
        to++;
      }
      if (near) {
        series(x, y, from, to, most, real);
      } else {
        far(x, y, from, to, real);
      }
      from = to;
    }
  }

  private static boolean near(double x, double y) {
    return x * x + y * y < BORDER * BORDER;
  }

  /** J = (H1 + H2)/2; of a real argument the two are conjugates. */
  private void far(double[] x, double[] y, int from, int to, boolean real) {
    hankel(x, y, from, to, +1, re, im);
    if (real) {
      for (int order = 0; order < 2; order++) {
        java.util.Arrays.fill(im[order], from, to, 0);
      }
      return;
    }
    hankel(x, y, from, to, -1, otherRe, otherIm);
    for (int order = 0; order < 2; order++) {
      mean(re[order], otherRe[order], from, to);
      mean(im[order], otherIm[order], from, to);
    }
  }

  private static void mean(double[] a, double[] b, int from, int to) {
    for (int i = from; i < to; i++) {
      a[i] = 0.5 * (a[i] + b[i]);
    }
  }

  private void series(double[] x, double[] y, int from, int to, double most, boolean real) {
    int last = 3;
    double term = 1;
    for (int m = 1; m < MOST - 1 && (term > 1e-17 || m < 3); m++) {
      term *= 0.25 * most / ((double) m * m);
      last = m + 1;
    }
    for (int i = from; i < to; i++) {
      ur[i] = -0.25 * (x[i] * x[i] - y[i] * y[i]);
      ui[i] = -0.5 * x[i] * y[i];
    }
    for (int order = 0; order < 2; order++) {
      double[] r = re[order];
      double[] s = im[order];
      java.util.Arrays.fill(r, from, to, POWER[order][last]);
      java.util.Arrays.fill(s, from, to, 0);
      for (int m = last - 1; m >= 0; m--) {
        if (real) {
          step(r, ur, POWER[order][m], from, to);
        } else {
          step(r, s, ur, ui, POWER[order][m], from, to);
        }
      }
    }
    double[] r = re[1];
    double[] s = im[1];
    for (int i = from; i < to; i++) {
      double a = 0.5 * (x[i] * r[i] - y[i] * s[i]);
      s[i] = 0.5 * (x[i] * s[i] + y[i] * r[i]);
      r[i] = a;
    }
  }

  /** One step of Horner's rule with real arguments. */
  private static void step(double[] r, double[] u, double c, int from, int to) {
    for (int i = from; i < to; i++) {
      r[i] = r[i] * u[i] + c;
    }
  }

  /** One step of Horner's rule. */
  private static void step(
      double[] r, double[] s, double[] u, double[] v, double c, int from, int to) {
    for (int i = from; i < to; i++) {
      double a = r[i] * u[i] - s[i] * v[i] + c;
      s[i] = r[i] * v[i] + s[i] * u[i];
      r[i] = a;
    }
  }

  /**
   * Hankel functions of the first (kind +1) or second (kind −1) kind of x + jy, for |z| of at least
   * {@link #BORDER}.
   */
  void hankel(double[] x, double[] y, int count, int kind) {
    hankel(x, y, 0, count, kind, re, im);
  }

  private void hankel(
      double[] x, double[] y, int from, int to, int kind, double[][] outR, double[][] outI) {
    front(x, y, from, to, kind);
    for (int i = from; i < to; i++) {
      // 1/z turned by ±j: the step of the series
      double size2 = x[i] * x[i] + y[i] * y[i];
      ur[i] = kind * y[i] / size2;
      ui[i] = kind * x[i] / size2;
    }
    for (int order = 0; order < 2; order++) {
      double[] r = outR[order];
      double[] s = outI[order];
      double[] a = ASYMPTOTIC[order];
      java.util.Arrays.fill(r, from, to, a[TERMS - 1]);
      java.util.Arrays.fill(s, from, to, 0);
      for (int k = TERMS - 2; k >= 0; k--) {
        step(r, s, ur, ui, a[k], from, to);
      }
      for (int i = from; i < to; i++) {
        double t = frontR[i] * r[i] - frontI[i] * s[i];
        s[i] = frontR[i] * s[i] + frontI[i] * r[i];
        r[i] = t;
      }
    }
    // the further turn by −kind·pi/2
    double[] r = outR[1];
    double[] s = outI[1];
    for (int i = from; i < to; i++) {
      double t = r[i];
      r[i] = kind * s[i];
      s[i] = -kind * t;
    }
  }

  /** sqrt(2/(pi z)) e^{±j(z − pi/4)}. */
  private void front(double[] x, double[] y, int from, int to, int kind) {
    int count = to - from;
    for (int i = 0; i < count; i++) {
      angle[i] = kind * (x[from + i] - Math.PI / 4);
    }
    SinCos.of(angle, count, sin, cos);
    double scale = Math.sqrt(2 / Math.PI);
    for (int i = from; i < to; i++) {
      double size = Math.sqrt(x[i] * x[i] + y[i] * y[i]);
      double rootR = Math.sqrt(0.5 * (size + x[i]));
      // (size − x)(size + x) = y²
      double rootI = 0.5 * y[i] / rootR;
      double factor = scale / size;
      double grow = y[i] == 0 ? factor : factor * Math.exp(-kind * y[i]);
      double er = grow * cos[i - from];
      double ei = grow * sin[i - from];
      frontR[i] = rootR * er + rootI * ei;
      frontI[i] = rootR * ei - rootI * er;
    }
  }
}
