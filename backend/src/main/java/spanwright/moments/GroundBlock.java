package spanwright.moments;

/**
 * One block of a {@link GroundTable}: equal cells that hold the ratios twice over.
 *
 * <p>The long form, worked out from the kernels, has {@value CellPolynomials#SIDE} Chebyshev nodes
 * each way in as many equal cells as its last coefficients ask for, and serves values with slopes.
 * The short form is the long one cut into smaller cells with {@value CellPolynomials#SHORT} terms
 * each, as many as keep what is left out small; it costs no further kernels and serves values
 * alone, which is what fills matrices.
 *
 * <p>All fields are final, so a block may be handed to other threads without a lock.
 */
final class GroundBlock {
  private static final int MOST_SPLITS = 64;

  /** Short cells along ρ and along ζ in one length unit [1/m]. */
  final double perRho;

  final double perZeta;

  /** Short cells along ρ. */
  final int across;

  /**
   * Short form: cell (ix, iy) starts at (iy·across + ix)·{@value CellPolynomials#SHORT}·8; there
   * ratio m has its terms at m·{@value CellPolynomials#SHORT}.
   */
  final double[] cells;

  private final int longAcross;
  private final double longPerRho;
  private final double longPerZeta;
  // cell, then ratio, then term
  private final double[] longCells;

  private GroundBlock(
      int longAcross, int longUp, double wide, double high, double[] longCells, ShortCells shorts) {
    this.longAcross = longAcross;
    this.longPerRho = longAcross / wide;
    this.longPerZeta = longUp / high;
    this.longCells = longCells;
    this.across = shorts.across();
    this.perRho = shorts.across() / wide;
    this.perZeta = shorts.up() / high;
    this.cells = shorts.terms();
  }

  /** Memory held [bytes]. */
  long bytes() {
    return 8L * (cells.length + longCells.length) + 120;
  }

  /**
   * Works a block out.
   *
   * @param kernels of the ground
   * @param k0 free-space wave number [1/m]
   * @param rho0 where it begins [m]
   * @param wide how long it is along ρ [m]
   * @param zeta0 where it begins [m]
   * @param high how long it is along ζ [m]
   * @param longTolerance allowed error of the long form, against an image of size one
   * @param shortTolerance allowed size of what the short form leaves out
   */
  static GroundBlock make(
      HalfSpaceKernels kernels,
      double k0,
      double rho0,
      double wide,
      double zeta0,
      double high,
      double longTolerance,
      double shortTolerance) {
    int across = 1;
    int up = 1;
    double[][] chebyshev;
    while (true) {
      chebyshev = new double[across * up * Reflection.ALL][];
      int verdict = 0;
      for (int cell = 0; cell < across * up && verdict != 3; cell++) {
        double w = wide / across;
        double h = high / up;
        verdict |=
            cell(
                kernels,
                k0,
                rho0 + w * (cell % across),
                w,
                zeta0 + h * (cell / across),
                h,
                longTolerance,
                chebyshev,
                cell * Reflection.ALL);
      }
      boolean split = false;
      if ((verdict & 1) != 0 && across < MOST_SPLITS) {
        across *= 2;
        split = true;
      }
      if ((verdict & 2) != 0 && up < MOST_SPLITS) {
        up *= 2;
        split = true;
      }
      if (!split) {
        break;
      }
    }
    double[] powers = new double[chebyshev.length * CellPolynomials.TERMS];
    for (int i = 0; i < chebyshev.length; i++) {
      System.arraycopy(
          CellPolynomials.powers(chebyshev[i]),
          0,
          powers,
          i * CellPolynomials.TERMS,
          CellPolynomials.TERMS);
    }
    return new GroundBlock(
        across, up, wide, high, powers, ShortCells.of(chebyshev, across, up, shortTolerance));
  }

  /**
   * Works out one cell's Chebyshev coefficients, and holds them against the values along the edges,
   * which had no part in them: last coefficients alone may be small by chance.
   *
   * @return 1 when ρ, 2 when ζ, 3 when both need shorter cells, else 0
   */
  private static int cell(
      HalfSpaceKernels kernels,
      double k0,
      double rho0,
      double wide,
      double zeta0,
      double high,
      double allowed,
      double[][] chebyshev,
      int start) {
    int side = CellPolynomials.SIDE;
    int more = side + 2;
    double[] rhos = new double[more];
    double[] zetas = new double[more];
    for (int i = 0; i < more; i++) {
      double node = i == 0 ? -1 : i > side ? 1 : CellPolynomials.NODES[i - 1];
      rhos[i] = rho0 + 0.5 * wide * (1 + node);
      zetas[i] = zeta0 + 0.5 * high * (1 + node);
    }
    double[] values = kernels.grid(rhos, zetas, HalfSpaceKernels.Care.TABLE);
    double[] back = turnedBack(k0, rhos, zetas);
    double offRho = 0;
    double offZeta = 0;
    for (int m = 0; m < Reflection.ALL; m++) {
      double[] ratio = ratio(values, back, m);
      double[] fitted = new double[CellPolynomials.TERMS];
      for (int i = 0; i < side; i++) {
        System.arraycopy(ratio, (i + 1) * more + 1, fitted, i * side, side);
      }
      double[] c = CellPolynomials.chebyshev(fitted);
      chebyshev[start + m] = c;
      for (int i = 0; i < side; i++) {
        offRho = larger(offRho, c[(side - 1) * side + i], c[(side - 2) * side + i] / 12);
        offZeta = larger(offZeta, c[i * side + side - 1], c[i * side + side - 2] / 12);
        int row = i + 1;
        offRho = larger(offRho, missed(ratio, row, more, -1), missed(ratio, row, more, 1));
        offZeta =
            larger(offZeta, missed(ratio, row * more, 1, -1), missed(ratio, row * more, 1, 1));
      }
    }
    return (offRho > allowed ? 1 : 0) | (offZeta > allowed ? 2 : 0);
  }

  /** R e^{jk0R} of each place, re and im in turn: kernels times this are ratios. */
  private static double[] turnedBack(double k0, double[] rhos, double[] zetas) {
    double[] back = new double[2 * rhos.length * zetas.length];
    int at = 0;
    for (double rho : rhos) {
      for (double zeta : zetas) {
        double r = Math.sqrt(rho * rho + zeta * zeta);
        back[at++] = r * Math.cos(k0 * r);
        back[at++] = r * Math.sin(k0 * r);
      }
    }
    return back;
  }

  /** Component m of the ratios, in their order, from what the kernels' grid gives. */
  private static double[] ratio(double[] values, double[] back, int m) {
    double[] ratio = new double[back.length / 2];
    for (int n = 0; n < ratio.length; n++) {
      // grid order GA, GP, GZ, F, GT is the order here
      int at = (n * HalfSpaceKernels.KERNELS + m / 2) * 2;
      double re = values[at];
      double im = values[at + 1];
      double cos = back[2 * n];
      double sin = back[2 * n + 1];
      ratio[n] = m % 2 == 0 ? re * cos - im * sin : re * sin + im * cos;
    }
    return ratio;
  }

  /**
   * By how much a line of nodes misses its lower (-1) or upper (1) edge, in values from a place.
   */
  private static double missed(double[] values, int from, int step, int edge) {
    int side = CellPolynomials.SIDE;
    double off = values[from + (edge < 0 ? 0 : side + 1) * step];
    for (int n = 0; n < side; n++) {
      double weight = CellPolynomials.EDGE[edge < 0 ? side - 1 - n : n];
      off -= weight * values[from + (n + 1) * step];
    }
    return off;
  }

  private static double larger(double a, double b, double c) {
    return Math.max(a, Math.max(Math.abs(b), Math.abs(c)));
  }

  /**
   * Ratios and slopes by the long form, as {@link Reflection#ratiosAndSlopes} has them.
   *
   * @param pastRho distance from where the block begins [m]
   * @param pastZeta likewise along ζ [m]
   */
  void ratiosAndSlopes(double pastRho, double pastZeta, double[] out) {
    double x = pastRho * longPerRho;
    double y = pastZeta * longPerZeta;
    int ix = (int) x;
    int iy = (int) y;
    double u = 2 * (x - ix) - 1;
    double v = 2 * (y - iy) - 1;
    int side = CellPolynomials.SIDE;
    int at = (iy * longAcross + ix) * Reflection.ALL * CellPolynomials.TERMS;
    for (int m = 0; m < Reflection.ALL; m++, at += CellPolynomials.TERMS) {
      double value = 0;
      double byU = 0;
      double byV = 0;
      for (int i = side - 1; i >= 0; i--) {
        double row = 0;
        double slope = 0;
        for (int j = side - 1; j >= 0; j--) {
          slope = slope * v + row;
          row = row * v + longCells[at + i * side + j];
        }
        byU = byU * u + value;
        value = value * u + row;
        byV = byV * u + slope;
      }
      out[m] = value;
      out[Reflection.ALL + m] = 2 * byU * longPerRho;
      out[2 * Reflection.ALL + m] = 2 * byV * longPerZeta;
    }
  }
}
