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
  private static final int[] STEPS = {1, 2, 4, 8, 16, 32, MOST_SPLITS};

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
      int longAcross,
      int longUp,
      double wide,
      double high,
      double[] longCells,
      int across,
      int up,
      double[] cells) {
    this.longAcross = longAcross;
    this.longPerRho = longAcross / wide;
    this.longPerZeta = longUp / high;
    this.longCells = longCells;
    this.across = across;
    this.perRho = across / wide;
    this.perZeta = up / high;
    this.cells = cells;
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
   * @param longTolerance allowed last coefficients of the long form, against an image of size one
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
    int[] parts = parts(chebyshev, shortTolerance);
    double[] shorts = shortCells(chebyshev, across, up, parts[0], parts[1]);
    return new GroundBlock(
        across, up, wide, high, powers, across * parts[0], up * parts[1], shorts);
  }

  /**
   * Works out one cell's Chebyshev coefficients.
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
    double[] rhos = new double[side];
    double[] zetas = new double[side];
    for (int i = 0; i < side; i++) {
      rhos[i] = rho0 + 0.5 * wide * (1 + CellPolynomials.NODES[i]);
      zetas[i] = zeta0 + 0.5 * high * (1 + CellPolynomials.NODES[i]);
    }
    double[] values = kernels.grid(rhos, zetas);
    double[] back = new double[2 * CellPolynomials.TERMS];
    for (int i = 0; i < side; i++) {
      for (int j = 0; j < side; j++) {
        double r = Math.sqrt(rhos[i] * rhos[i] + zetas[j] * zetas[j]);
        back[2 * (i * side + j)] = r * StrictMath.cos(k0 * r);
        back[2 * (i * side + j) + 1] = r * StrictMath.sin(k0 * r);
      }
    }
    double lastRho = 0;
    double lastZeta = 0;
    double[] ratio = new double[CellPolynomials.TERMS];
    for (int m = 0; m < Reflection.ALL; m++) {
      for (int n = 0; n < CellPolynomials.TERMS; n++) {
        // grid order GA, GP, GZ, F, GT is the order here
        int at = (n * HalfSpaceKernels.KERNELS + m / 2) * 2;
        double re = values[at];
        double im = values[at + 1];
        double cos = back[2 * n];
        double sin = back[2 * n + 1];
        ratio[n] = m % 2 == 0 ? re * cos - im * sin : re * sin + im * cos;
      }
      double[] c = CellPolynomials.chebyshev(ratio);
      chebyshev[start + m] = c;
      for (int i = 0; i < side; i++) {
        lastRho = Math.max(lastRho, Math.abs(c[(side - 1) * side + i]));
        lastZeta = Math.max(lastZeta, Math.abs(c[i * side + side - 1]));
      }
    }
    return (lastRho > allowed ? 1 : 0) | (lastZeta > allowed ? 2 : 0);
  }

  /** Into how many parts, along ρ and ζ, long cells are cut for the short form. */
  private static int[] parts(double[][] chebyshev, double allowed) {
    for (int total = 1; total < MOST_SPLITS * MOST_SPLITS; total *= 2) {
      int[] best = null;
      double least = allowed;
      for (int across : STEPS) {
        int up = total / across;
        if (up == 0 || up > MOST_SPLITS) {
          continue;
        }
        if (guess(chebyshev, across, up) > 4 * allowed) {
          continue;
        }
        double left = leftOut(chebyshev, across, up, least);
        if (left <= least) {
          least = left;
          best = new int[] {across, up};
        }
      }
      if (best != null) {
        return best;
      }
    }
    return new int[] {MOST_SPLITS, MOST_SPLITS};
  }

  /** What is left out if coefficients fall off by the parts' lengths alone: a first idea. */
  private static double guess(double[][] chebyshev, int across, int up) {
    double worst = 0;
    for (int i = 0; i < chebyshev.length; i++) {
      if (i % Reflection.ALL >= Reflection.RATIOS) {
        continue;
      }
      double sum = 0;
      double sa = 1;
      for (int a = 0; a < CellPolynomials.SIDE; a++) {
        double sb = sa;
        for (int b = 0; b < CellPolynomials.SIDE; b++) {
          if (a + b > CellPolynomials.DEGREE) {
            double c = sb * chebyshev[i][a * CellPolynomials.SIDE + b];
            sum += c * c;
          }
          sb /= up;
        }
        sa /= across;
      }
      worst = Math.max(worst, sum);
    }
    return Math.sqrt(worst);
  }

  /** What the short form leaves out at worst, or more than the limit as soon as that is passed. */
  private static double leftOut(double[][] chebyshev, int across, int up, double limit) {
    double worst = 0;
    for (int px = 0; px < across; px++) {
      double[][] rx = CellPolynomials.restriction(px, across);
      for (int py = 0; py < up; py++) {
        double[][] ry = CellPolynomials.restriction(py, up);
        for (int i = 0; i < chebyshev.length; i++) {
          if (i % Reflection.ALL < Reflection.RATIOS) {
            worst =
                Math.max(
                    worst, CellPolynomials.leftOut(CellPolynomials.onPart(chebyshev[i], rx, ry)));
            if (worst > limit) {
              return worst;
            }
          }
        }
      }
    }
    return worst;
  }

  private static double[] shortCells(
      double[][] chebyshev, int longAcross, int longUp, int partsAcross, int partsUp) {
    int across = longAcross * partsAcross;
    int up = longUp * partsUp;
    int size = CellPolynomials.SHORT * Reflection.RATIOS;
    double[] cells = new double[across * up * size];
    for (int ix = 0; ix < across; ix++) {
      double[][] rx = CellPolynomials.restriction(ix % partsAcross, partsAcross);
      for (int iy = 0; iy < up; iy++) {
        double[][] ry = CellPolynomials.restriction(iy % partsUp, partsUp);
        int from = (iy / partsUp * longAcross + ix / partsAcross) * Reflection.ALL;
        for (int m = 0; m < Reflection.RATIOS; m++) {
          CellPolynomials.shortPowers(
              CellPolynomials.onPart(chebyshev[from + m], rx, ry),
              cells,
              (iy * across + ix) * size + m * CellPolynomials.SHORT);
        }
      }
    }
    return cells;
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
