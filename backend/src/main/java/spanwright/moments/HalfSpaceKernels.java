package spanwright.moments;

/**
 * The reflected kernels of a uniform earth, by quadrature of the Sommerfeld integrals.
 *
 * <p>Source and observer are in the air. With λ the radial wave number, γ0 = √(λ² − k0²), γ1 = √(λ²
 * − εk0²), R_TE = k0²(ε − 1)/(γ0 + γ1)², R_TM = (εγ0 − γ1)/(εγ0 + γ1), w = 2(ε − 1)/((γ0 + γ1)(εγ0
 * + γ1)) and S{f} = ∫ f J0(λρ) e^{−γ0ζ} (λ/γ0) dλ, the five are GA = S{R_TE}, GP = S{−R_TM + k0²
 * w}, GZ = S{R_TM + γ0² w}, F = ∫ w λ² J1(λρ) e^{−γ0ζ} dλ and GT = S{R_TM} (Sommerfeld 1909;
 * Michalski and Mosig, Formulation of mixed-potential integral equations for layered media, IEEE
 * Trans. Antennas Propag. 45, 1997). As λ² w = R_TE + R_TM, GT = GZ + GP − GA.
 *
 * <p>Path: from 0 up into the first quadrant, level above the branch points k0 and k1 and the pole
 * near k0, down to the real axis beyond Re k1, and along it until e^{−λζ} is nothing. Where ρ is
 * much greater than ζ, J0 = (H1 + H2)/2 is split there instead, and the two parts turn up and down,
 * where each decays as e^{−tρ}. Panels of 12 Gauss points, as long as the fastest factor and the
 * nearest branch point allow. Good to about 1e-9 of e^{−jk0R}/R, or 1e-7 with longer panels and
 * earlier ends ({@link Care#TABLE}).
 *
 * <p>All come from one pass over a grid of ρ and ζ: exponentials depend on ζ only, Bessel functions
 * on ρ only. {@link SpectralSum} adds the nodes up, many at a time.
 */
final class HalfSpaceKernels {
  /** Order of the kernels in an answer: GA, GP, GZ, F, GT. */
  static final int KERNELS = 5;

  /** How carefully to integrate. */
  enum Care {
    /** Good to 1e-9 of the image. */
    FULL(34, 10, 6, 1.5),
    /** Good to 1e-7 of the image. */
    TABLE(18, 12, 8, 1.75);

    /** Decay in nepers after which nothing is left. */
    private final double decay;

    /** Longest panel, as phase of the Bessel functions. */
    private final double phase;

    /** Longest panel, as decay of the exponential. */
    private final double fall;

    /** Longest panel, over the distance from its middle to a branch point. */
    private final double branch;

    Care(double decay, double phase, double fall, double branch) {
      this.decay = decay;
      this.phase = phase;
      this.fall = fall;
      this.branch = branch;
    }
  }

  private static final GaussRule RULE = GaussRule.of(12);
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
   * Kernels at one distance, with full care.
   *
   * @return real and imaginary part of GA, GP, GZ, F, GT in turn [1/m]
   */
  double[] at(double rho, double zeta) {
    return grid(new double[] {rho}, new double[] {zeta}, Care.FULL);
  }

  /**
   * Kernels on a grid, both rising.
   *
   * @return for ρ[i], ζ[j] and kernel m the real part at ((i·nζ + j)·5 + m)·2, the imaginary next
   */
  double[] grid(double[] rhos, double[] zetas, Care care) {
    return new Path(rhos, zetas, care).run();
  }

  /** The path of one pass over a grid. */
  private final class Path {
    private final Care care;
    private final double rhoMin;
    private final double rhoMax;
    private final double zetaMin;
    private final double zetaMax;
    private final SpectralSum sum;

    Path(double[] rhos, double[] zetas, Care care) {
      this.care = care;
      rhoMin = rhos[0];
      rhoMax = rhos[rhos.length - 1];
      zetaMin = zetas[0];
      zetaMax = zetas[zetas.length - 1];
      sum = new SpectralSum(k0, epsR, epsI, rhos, zetas);
    }

    double[] run() {
      double lift = Math.min(0.4 * k0, 5 / Math.max(rhoMax, 1e-9));
      double last = care.decay / zetaMin;
      double beyond = Math.min(1.25 * Math.max(k1R, k0), k0 + last);
      double up = Math.min(0.4 * k0, 2 * lift);
      line(0, 0, up, lift, 0);
      line(up, lift, beyond, lift, 0);
      line(beyond, lift, beyond, 0, 0);
      double turn = Math.max(beyond, ComplexBessel.BORDER / Math.max(rhoMin, 1e-9));
      if (rhoMin > TURN * zetaMax && turn < last) {
        line(beyond, 0, turn, 0, 0);
        line(turn, 0, turn, (care.decay + 2) / rhoMin, +1);
        line(turn, 0, turn, -(care.decay + 2) / rhoMin, -1);
      } else if (beyond < last) {
        line(beyond, 0, last, 0, 0);
      }
      return sum.kernels();
    }

    /** A straight stretch of the path; kind 0 with J, ±1 with half a Hankel function. */
    private void line(double fromR, double fromI, double toR, double toI, int kind) {
      double dr = toR - fromR;
      double di = toI - fromI;
      double length = Math.sqrt(dr * dr + di * di);
      if (length == 0) {
        return;
      }
      dr /= length;
      di /= length;
      double steady = Math.min(care.phase / Math.max(rhoMax, 1e-9), care.fall / zetaMax);
      double done = 0;
      while (done < length) {
        double panel = Math.min(steady, reach(fromR + done * dr, fromI + done * di, dr, di));
        if (done + 1.2 * panel > length) {
          panel = length - done;
        }
        for (int n = 0; n < RULE.nodes.length; n++) {
          double at = done + panel * RULE.nodes[n];
          double weight = panel * RULE.weights[n];
          sum.node(fromR + at * dr, fromI + at * di, weight * dr, weight * di, kind);
        }
        done += panel;
      }
      sum.flush();
    }

    /** How long a panel from here may be for its distance to the branch points. */
    private double reach(double r, double i, double dr, double di) {
      double length = 4 * k0 + Math.sqrt(r * r + i * i);
      for (int turn = 0; turn < 40; turn++) {
        double mr = r + 0.5 * length * dr;
        double mi = i + 0.5 * length * di;
        double zero = (mr - k0) * (mr - k0) + mi * mi;
        double one = (mr - k1R) * (mr - k1R) + (mi - k1I) * (mi - k1I);
        if (length * length <= care.branch * care.branch * Math.min(zero, one)) {
          return length;
        }
        length *= 0.75;
      }
      return length;
    }
  }
}
