package spanwright.moments;

/**
 * Sums over the nodes of a path in the plane of λ, for a grid of ρ and ζ: each node's spectral
 * kernels times e^{−γ0ζ} times a Bessel function of λρ. Nodes are gathered and added many at a
 * time, so that the loops over them run several lanes at a time.
 *
 * <p>Summed are GA, GP, GZ, F; GT is GZ + GP − GA.
 */
final class SpectralSum {
  private static final int ROOM = 96;
  private static final int SUMMED = 4;

  private final double k0;
  private final double epsR;
  private final double epsI;
  private final double[] rhos;
  private final double[] zetas;
  // gathered nodes
  private final double[] lambdaR = new double[ROOM];
  private final double[] lambdaI = new double[ROOM];
  private final double[] gammaR = new double[ROOM];
  private final double[] gammaI = new double[ROOM];
  private final double[] spectralR = new double[ROOM * SUMMED];
  private final double[] spectralI = new double[ROOM * SUMMED];
  private int count;
  private int kind;
  // of each node, then kernel, then ζ
  private final double[][] dampedR;
  private final double[][] dampedI;
  private final ComplexBessel bessel = new ComplexBessel(ROOM);
  private final double[] x = new double[ROOM];
  private final double[] y = new double[ROOM];
  private final double[] sin = new double[ROOM];
  private final double[] cos = new double[ROOM];
  // of each ρ, then kernel, then ζ
  private final double[][] sumR;
  private final double[][] sumI;
  private final double[] root = new double[2];

  SpectralSum(double k0, double epsR, double epsI, double[] rhos, double[] zetas) {
    this.k0 = k0;
    this.epsR = epsR;
    this.epsI = epsI;
    this.rhos = rhos;
    this.zetas = zetas;
    dampedR = new double[ROOM][SUMMED * zetas.length];
    dampedI = new double[ROOM][SUMMED * zetas.length];
    sumR = new double[rhos.length][SUMMED * zetas.length];
    sumI = new double[rhos.length][SUMMED * zetas.length];
  }

  /** For ρ[i], ζ[j] and kernel m the real part at ((i·nζ + j)·5 + m)·2, the imaginary next. */
  double[] kernels() {
    flush();
    int nz = zetas.length;
    double[] out = new double[rhos.length * nz * HalfSpaceKernels.KERNELS * 2];
    int at = 0;
    for (int i = 0; i < rhos.length; i++) {
      for (int j = 0; j < nz; j++) {
        for (int m = 0; m < SUMMED; m++) {
          out[at++] = sumR[i][m * nz + j];
          out[at++] = sumI[i][m * nz + j];
        }
        out[at] = out[at - 4] + out[at - 6] - out[at - 8];
        out[at + 1] = out[at - 3] + out[at - 5] - out[at - 7];
        at += 2;
      }
    }
    return out;
  }

  /** Adds a node at λ with this weight; kind 0 with J, ±1 with half a Hankel function. */
  void node(double lr, double li, double wr, double wi, int kindOfBessel) {
    if (count == ROOM) {
      flush();
    }
    kind = kindOfBessel;
    double l2r = lr * lr - li * li;
    double l2i = 2 * lr * li;
    root(l2r - k0 * k0 * epsR, l2i - k0 * k0 * epsI, root);
    double g1r = root[0];
    double g1i = root[1];
    root(l2r - k0 * k0, l2i, root);
    lambdaR[count] = lr;
    lambdaI[count] = li;
    gammaR[count] = root[0];
    gammaI[count] = root[1];
    spectrum(lr, li, l2r, l2i, wr, wi, root[0], root[1], g1r, g1i);
    count++;
  }

  /** Spectral kernels times the measure λ/γ0 dλ (F: λ² dλ). */
  private void spectrum(
      double lr,
      double li,
      double l2r,
      double l2i,
      double wr,
      double wi,
      double g0r,
      double g0i,
      double g1r,
      double g1i) {
    double ar = g0r + g1r;
    double ai = g0i + g1i;
    double br = epsR * g0r - epsI * g0i + g1r;
    double bi = epsR * g0i + epsI * g0r + g1i;
    // R_TE = k0²(ε − 1)/a²
    double a2r = ar * ar - ai * ai;
    double a2i = 2 * ar * ai;
    double nr = k0 * k0 * (epsR - 1);
    double ni = k0 * k0 * epsI;
    double d = a2r * a2r + a2i * a2i;
    double ter = (nr * a2r + ni * a2i) / d;
    double tei = (ni * a2r - nr * a2i) / d;
    // w = 2(ε − 1)/(a b)
    double abr = ar * br - ai * bi;
    double abi = ar * bi + ai * br;
    d = abr * abr + abi * abi;
    double cr = 2 * ((epsR - 1) * abr + epsI * abi) / d;
    double ci = 2 * (epsI * abr - (epsR - 1) * abi) / d;
    // R_TM = λ² w − R_TE
    double tmr = l2r * cr - l2i * ci - ter;
    double tmi = l2r * ci + l2i * cr - tei;
    double g2r = l2r - k0 * k0;
    double g2i = l2i;
    // measure λ/γ0 dλ
    d = g0r * g0r + g0i * g0i;
    double qr = (lr * g0r + li * g0i) / d;
    double qi = (li * g0r - lr * g0i) / d;
    double mr = qr * wr - qi * wi;
    double mi = qr * wi + qi * wr;
    put(0, ter, tei, mr, mi);
    put(1, k0 * k0 * cr - tmr, k0 * k0 * ci - tmi, mr, mi);
    put(2, tmr + g2r * cr - g2i * ci, tmi + g2r * ci + g2i * cr, mr, mi);
    put(3, l2r * cr - l2i * ci, l2r * ci + l2i * cr, wr, wi);
  }

  private void put(int m, double fr, double fi, double mr, double mi) {
    double half = kind == 0 ? 1 : 0.5;
    spectralR[SUMMED * count + m] = half * (fr * mr - fi * mi);
    spectralI[SUMMED * count + m] = half * (fr * mi + fi * mr);
  }

  /** Adds what is gathered. */
  void flush() {
    if (count == 0) {
      return;
    }
    int nz = zetas.length;
    for (int j = 0; j < nz; j++) {
      damp(j, nz);
    }
    boolean real = kind == 0;
    for (int n = 0; n < count; n++) {
      real &= lambdaI[n] == 0;
    }
    for (int i = 0; i < rhos.length; i++) {
      for (int n = 0; n < count; n++) {
        x[n] = lambdaR[n] * rhos[i];
        y[n] = lambdaI[n] * rhos[i];
      }
      if (kind == 0) {
        bessel.regular(x, y, count);
      } else {
        bessel.hankel(x, y, count, kind);
      }
      for (int n = 0; n < count; n++) {
        if (real) {
          add(bessel.re[0][n], dampedR[n], sumR[i], 0, 3 * nz);
          add(bessel.re[0][n], dampedI[n], sumI[i], 0, 3 * nz);
          add(bessel.re[1][n], dampedR[n], sumR[i], 3 * nz, 4 * nz);
          add(bessel.re[1][n], dampedI[n], sumI[i], 3 * nz, 4 * nz);
        } else {
          add(bessel.re[0][n], bessel.im[0][n], n, i, 0, 3 * nz);
          add(bessel.re[1][n], bessel.im[1][n], n, i, 3 * nz, 4 * nz);
        }
      }
    }
    count = 0;
  }

  private void damp(int j, int nz) {
    double zeta = zetas[j];
    for (int n = 0; n < count; n++) {
      x[n] = gammaI[n] * zeta;
    }
    SinCos.of(x, count, sin, cos);
    for (int n = 0; n < count; n++) {
      double size = Math.exp(-gammaR[n] * zeta);
      double er = size * cos[n];
      double ei = -size * sin[n];
      for (int m = 0; m < SUMMED; m++) {
        double sr = spectralR[SUMMED * n + m];
        double si = spectralI[SUMMED * n + m];
        dampedR[n][m * nz + j] = sr * er - si * ei;
        dampedI[n][m * nz + j] = sr * ei + si * er;
      }
    }
  }

  private static void add(double factor, double[] from, double[] to, int low, int high) {
    for (int c = low; c < high; c++) {
      to[c] += factor * from[c];
    }
  }

  private void add(double br, double bi, int n, int i, int low, int high) {
    double[] dr = dampedR[n];
    double[] di = dampedI[n];
    double[] sr = sumR[i];
    double[] si = sumI[i];
    for (int c = low; c < high; c++) {
      sr[c] += dr[c] * br - di[c] * bi;
      si[c] += dr[c] * bi + di[c] * br;
    }
  }

  /** Square root with a real part of zero or more; on the cut, the upper side. */
  private static void root(double r, double i, double[] out) {
    double size = Math.sqrt(r * r + i * i);
    double a = Math.sqrt(0.5 * (size + Math.abs(r)));
    double b = a == 0 ? 0 : 0.5 * Math.abs(i) / a;
    if (r >= 0) {
      out[0] = a;
      out[1] = i >= 0 ? b : -b;
    } else {
      out[0] = b;
      out[1] = i >= 0 ? a : -a;
    }
  }
}
