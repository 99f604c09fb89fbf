package spanwright.moments;

/**
 * The reflected kernels of a uniform earth, by quadrature of the Sommerfeld integrals.
 *
 * <p>Source and observer are in the air. With λ the radial wave number, γ0 = √(λ² − k0²), γ1 = √(λ²
 * − εk0²), R_TE = k0²(ε − 1)/(γ0 + γ1)², R_TM = (εγ0 − γ1)/(εγ0 + γ1), w = 2(ε − 1)/((γ0 + γ1)(εγ0
 * + γ1)) and S{f} = ∫ f J0(λρ) e^{−γ0ζ} (λ/γ0) dλ, the five are GA = S{R_TE}, GP = S{−R_TM + k0²
 * w}, GZ = S{R_TM + γ0² w}, F = ∫ w λ² J1(λρ) e^{−γ0ζ} dλ and GT = S{R_TM} (Sommerfeld 1909;
 * Michalski and Mosig, Formulation of mixed-potential integral equations for layered media, IEEE
 * Trans. Antennas Propag. 45, 1997).
 *
 * <p>Path: from 0 up into the first quadrant, level above the branch points k0 and k1 and the pole
 * near k0, down to the real axis beyond Re k1, and along it until e^{−λζ} is nothing. Where ρ is
 * much greater than ζ, J0 = (H1 + H2)/2 is split there instead, and the two parts turn up and down,
 * where each decays as e^{−tρ}. Panels of 12 Gauss points, as long as the fastest factor and the
 * nearest branch point allow. Good to about 1e-9 of e^{−jk0R}/R.
 *
 * <p>All five come from one pass over a grid of ρ and ζ: exponentials depend on ζ only, Bessel
 * functions on ρ only.
 */
final class HalfSpaceKernels {
  /** Order of the kernels in an answer: GA, GP, GZ, F, GT. */
  static final int KERNELS = 5;

  private static final GaussRule RULE = GaussRule.of(12);
  private static final double DECAY = 34;
  private static final double TURN = 3;

  private final double k0;
  private final double epsR;
  private final double epsI;
  private final double k1R;
  private final double k1I;

  /**
   * Kernels of one ground at one frequency.
   *
   * @param waveNumber of free space [1/m]
   * @param epsR real part of the complex relative permittivity
   * @param epsI its imaginary part, zero or less
   */
  HalfSpaceKernels(double waveNumber, double epsR, double epsI) {
    this.k0 = waveNumber;
    this.epsR = epsR;
    this.epsI = epsI;
    double size = Math.hypot(epsR, epsI);
    k1R = waveNumber * Math.sqrt(0.5 * (size + epsR));
    k1I = -waveNumber * Math.sqrt(Math.max(0, 0.5 * (size - epsR)));
  }

  /** Kernels of this ground. */
  static HalfSpaceKernels of(Ground ground, double frequencyMHz) {
    double omega = Constants.angularFrequency(frequencyMHz);
    return new HalfSpaceKernels(
        Constants.waveNumber(frequencyMHz),
        ground.permittivity(),
        -ground.conductivity() / (omega * Constants.EPSILON0));
  }

  /**
   * Kernels at one distance.
   *
   * @return real and imaginary part of GA, GP, GZ, F, GT in turn [1/m]
   */
  double[] at(double rho, double zeta) {
    return grid(new double[] {rho}, new double[] {zeta});
  }

  /**
   * Kernels on a grid, both rising.
   *
   * @return for ρ[i], ζ[j] and kernel m the real part at ((i·nζ + j)·5 + m)·2, the imaginary next
   */
  double[] grid(double[] rhos, double[] zetas) {
    return new Pass(rhos, zetas).run();
  }

  /** One pass of the quadrature over a grid. */
  private final class Pass {
    private final double[] rhos;
    private final double[] zetas;
    private final double rhoMin;
    private final double rhoMax;
    private final double zetaMin;
    private final double zetaMax;
    private final double[] sum;
    private final double[] bessel;
    private final double[] spectral = new double[2 * KERNELS];
    private final double[] damped;

    Pass(double[] rhos, double[] zetas) {
      this.rhos = rhos;
      this.zetas = zetas;
      rhoMin = rhos[0];
      rhoMax = rhos[rhos.length - 1];
      zetaMin = zetas[0];
      zetaMax = zetas[zetas.length - 1];
      sum = new double[rhos.length * zetas.length * KERNELS * 2];
      bessel = new double[4 * rhos.length];
      damped = new double[zetas.length * KERNELS * 2];
    }

    double[] run() {
      double lift = Math.min(0.4 * k0, 5 / Math.max(rhoMax, 1e-9));
      double last = DECAY / zetaMin;
      double beyond = Math.min(1.25 * Math.max(k1R, k0), k0 + last);
      double up = Math.min(0.4 * k0, 2 * lift);
      line(0, 0, up, lift, 0);
      line(up, lift, beyond, lift, 0);
      line(beyond, lift, beyond, 0, 0);
      double turn = Math.max(beyond, ComplexBessel.BORDER / Math.max(rhoMin, 1e-9));
      if (rhoMin > TURN * zetaMax && turn < last) {
        line(beyond, 0, turn, 0, 0);
        line(turn, 0, turn, 36 / rhoMin, +1);
        line(turn, 0, turn, -36 / rhoMin, -1);
      } else if (beyond < last) {
        line(beyond, 0, last, 0, 0);
      }
      return sum;
    }

    /** A straight stretch of the path; kind 0 with J, ±1 with half a Hankel function. */
    private void line(double fromR, double fromI, double toR, double toI, int kind) {
      double length = Math.hypot(toR - fromR, toI - fromI);
      if (length == 0) {
        return;
      }
      double dr = (toR - fromR) / length;
      double di = (toI - fromI) / length;
      double steady = Math.min(10 / Math.max(rhoMax, 1e-9), 6 / zetaMax);
      double done = 0;
      while (done < length) {
        double panel = Math.min(steady, reach(fromR + done * dr, fromI + done * di, dr, di));
        if (done + 1.2 * panel > length) {
          panel = length - done;
        }
        for (int n = 0; n < RULE.nodes.length; n++) {
          double at = done + panel * RULE.nodes[n];
          double weight = panel * RULE.weights[n];
          node(fromR + at * dr, fromI + at * di, weight * dr, weight * di, kind);
        }
        done += panel;
      }
    }

    /** How long a panel from here may be for its distance to the branch points. */
    private double reach(double r, double i, double dr, double di) {
      double length = 4 * k0 + Math.hypot(r, i);
      for (int turn = 0; turn < 40; turn++) {
        double mr = r + 0.5 * length * dr;
        double mi = i + 0.5 * length * di;
        double near = Math.min(Math.hypot(mr - k0, mi), Math.hypot(mr - k1R, mi - k1I));
        if (length <= 1.5 * near) {
          return length;
        }
        length *= 0.75;
      }
      return length;
    }

    private void node(double lr, double li, double wr, double wi, int kind) {
      double l2r = lr * lr - li * li;
      double l2i = 2 * lr * li;
      double[] g0 = new double[2];
      double[] g1 = new double[2];
      root(l2r - k0 * k0, l2i, g0);
      root(l2r - k0 * k0 * epsR, l2i - k0 * k0 * epsI, g1);
      spectrum(lr, li, l2r, l2i, wr, wi, g0, g1);
      for (int i = 0; i < rhos.length; i++) {
        double x = lr * rhos[i];
        double y = li * rhos[i];
        if (kind == 0) {
          ComplexBessel.regular(x, y, bessel, 4 * i);
        } else {
          ComplexBessel.hankel(x, y, kind, bessel, 4 * i);
          for (int c = 0; c < 4; c++) {
            bessel[4 * i + c] *= 0.5;
          }
        }
      }
      for (int j = 0; j < zetas.length; j++) {
        double size = Math.exp(-g0[0] * zetas[j]);
        double er = size * Math.cos(g0[1] * zetas[j]);
        double ei = -size * Math.sin(g0[1] * zetas[j]);
        for (int m = 0; m < KERNELS; m++) {
          double sr = spectral[2 * m];
          double si = spectral[2 * m + 1];
          damped[(j * KERNELS + m) * 2] = sr * er - si * ei;
          damped[(j * KERNELS + m) * 2 + 1] = sr * ei + si * er;
        }
      }
      add();
    }

    /** Spectral kernels times the measure λ/γ0 dλ (F: λ² dλ). */
    private void spectrum(
        double lr,
        double li,
        double l2r,
        double l2i,
        double wr,
        double wi,
        double[] g0,
        double[] g1) {
      double ar = g0[0] + g1[0];
      double ai = g0[1] + g1[1];
      double br = epsR * g0[0] - epsI * g0[1] + g1[0];
      double bi = epsR * g0[1] + epsI * g0[0] + g1[1];
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
      d = g0[0] * g0[0] + g0[1] * g0[1];
      double qr = (lr * g0[0] + li * g0[1]) / d;
      double qi = (li * g0[0] - lr * g0[1]) / d;
      double mr = qr * wr - qi * wi;
      double mi = qr * wi + qi * wr;
      put(0, ter, tei, mr, mi);
      put(1, k0 * k0 * cr - tmr, k0 * k0 * ci - tmi, mr, mi);
      put(2, tmr + g2r * cr - g2i * ci, tmi + g2r * ci + g2i * cr, mr, mi);
      put(3, l2r * cr - l2i * ci, l2r * ci + l2i * cr, wr, wi);
      put(4, tmr, tmi, mr, mi);
    }

    private void put(int m, double fr, double fi, double mr, double mi) {
      spectral[2 * m] = fr * mr - fi * mi;
      spectral[2 * m + 1] = fr * mi + fi * mr;
    }

    private void add() {
      int at = 0;
      for (int i = 0; i < rhos.length; i++) {
        double j0r = bessel[4 * i];
        double j0i = bessel[4 * i + 1];
        double j1r = bessel[4 * i + 2];
        double j1i = bessel[4 * i + 3];
        int from = 0;
        for (int j = 0; j < zetas.length; j++) {
          for (int m = 0; m < KERNELS; m++) {
            double br = m == 3 ? j1r : j0r;
            double bi = m == 3 ? j1i : j0i;
            double dr = damped[from];
            double di = damped[from + 1];
            sum[at] += dr * br - di * bi;
            sum[at + 1] += dr * bi + di * br;
            at += 2;
            from += 2;
          }
        }
      }
    }
  }

  /** Square root with a real part of zero or more; on the cut, the upper side. */
  private static void root(double r, double i, double[] out) {
    double size = Math.hypot(r, i);
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
