package spanwright.moments;

/**
 * Bessel functions J0, J1 and the two Hankel functions of orders 0 and 1 of a complex argument with
 * a non-negative real part.
 *
 * <p>Power series below |z| = {@value #BORDER}, Hankel's asymptotic series from there (Abramowitz
 * and Stegun, Handbook of Mathematical Functions, 9.1.10 and 9.2.7 to 9.2.10; its least term is
 * about e^{−2|z|}). Both are good to about 1e-11 of e^{|Im z|}.
 */
final class ComplexBessel {
  /** Least |z| for the asymptotic series. */
  static final double BORDER = 12;

  private static final int TERMS = 18;
  private static final double[][] COEFFICIENTS = {hankelTerms(0), hankelTerms(1)};

  private ComplexBessel() {}

  private static double[] hankelTerms(int order) {
    double[] a = new double[TERMS];
    a[0] = 1;
    for (int k = 1; k < TERMS; k++) {
      double odd = 2 * k - 1;
      a[k] = a[k - 1] * (4.0 * order * order - odd * odd) / (8.0 * k);
    }
    return a;
  }

  /** Writes Re J0, Im J0, Re J1, Im J1 of x + jy to out[at .. at + 3]. */
  static void regular(double x, double y, double[] out, int at) {
    double size2 = x * x + y * y;
    if (size2 < BORDER * BORDER) {
      series(x, y, out, at);
      return;
    }
    double[] second = new double[4];
    hankel(x, y, +1, out, at);
    hankel(x, y, -1, second, 0);
    for (int i = 0; i < 4; i++) {
      out[at + i] = 0.5 * (out[at + i] + second[i]);
    }
  }

  private static void series(double x, double y, double[] out, int at) {
    double ur = -0.25 * (x * x - y * y);
    double ui = -0.5 * x * y;
    double tr = 1;
    double ti = 0;
    double zeroR = 1;
    double zeroI = 0;
    double oneR = 1;
    double oneI = 0;
    for (int m = 1; m < 80; m++) {
      double scale = 1.0 / ((double) m * m);
      double nr = (tr * ur - ti * ui) * scale;
      ti = (tr * ui + ti * ur) * scale;
      tr = nr;
      zeroR += tr;
      zeroI += ti;
      oneR += tr / (m + 1);
      oneI += ti / (m + 1);
      if (Math.abs(tr) + Math.abs(ti) < 1e-18) {
        break;
      }
    }
    out[at] = zeroR;
    out[at + 1] = zeroI;
    out[at + 2] = 0.5 * (x * oneR - y * oneI);
    out[at + 3] = 0.5 * (x * oneI + y * oneR);
  }

  /**
   * Hankel functions of the first (kind +1) or second (kind −1) kind, orders 0 and 1, for |z| of at
   * least {@link #BORDER}.
   */
  static void hankel(double x, double y, int kind, double[] out, int at) {
    double size2 = x * x + y * y;
    // 1/z turned by ±j: the step of the series
    double qr = kind * y / size2;
    double qi = kind * x / size2;
    // sqrt(2/(pi z))
    double size = Math.sqrt(size2);
    double rootR = Math.sqrt(0.5 * (size + x));
    double rootI = y >= 0 ? Math.sqrt(0.5 * (size - x)) : -Math.sqrt(0.5 * (size - x));
    double factor = Math.sqrt(2 / Math.PI) / size;
    double fr = factor * rootR;
    double fi = -factor * rootI;
    double grow = Math.exp(-kind * y);
    double angle = kind * (x - Math.PI / 4);
    double er = grow * Math.cos(angle);
    double ei = grow * Math.sin(angle);
    double pr = fr * er - fi * ei;
    double pi = fr * ei + fi * er;
    for (int order = 0; order < 2; order++) {
      double[] a = COEFFICIENTS[order];
      double sr = 0;
      double si = 0;
      for (int k = TERMS - 1; k >= 0; k--) {
        double t = sr * qr - si * qi + a[k];
        si = sr * qi + si * qr;
        sr = t;
      }
      double r = pr * sr - pi * si;
      double i = pr * si + pi * sr;
      if (order == 0) {
        out[at] = r;
        out[at + 1] = i;
      } else {
        // the further turn by −kind·pi/2
        out[at + 2] = kind * i;
        out[at + 3] = -kind * r;
      }
    }
  }
}
