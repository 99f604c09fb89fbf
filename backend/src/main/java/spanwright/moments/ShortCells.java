package spanwright.moments;

/**
 * Polynomials of few terms, cut from polynomials of many: the short form of a {@link GroundBlock}.
 *
 * @param across cells along ρ
 * @param up cells along ζ
 * @param terms cell (ix, iy) starts at (iy·across + ix)·{@value CellPolynomials#SHORT}·8; there
 *     ratio m has its terms at m·{@value CellPolynomials#SHORT}
 */
record ShortCells(int across, int up, double[] terms) {
  private static final int SIZE = CellPolynomials.SHORT * Reflection.RATIOS;
  private static final int MOST_PARTS = 64;

  /**
   * Cuts each long cell into as many equal parts as keep what is left out within a tolerance.
   *
   * @param chebyshev coefficients of cell, then ratio; ten ratios a cell, of which eight are kept
   * @param longAcross long cells along ρ
   * @param longUp long cells along ζ
   * @param allowed size of what may be left out, against an image of size one
   */
  static ShortCells of(double[][] chebyshev, int longAcross, int longUp, double allowed) {
    int[] parts = firstGuess(chebyshev, allowed);
    double[] left = new double[2];
    while (true) {
      ShortCells made = cut(chebyshev, longAcross, longUp, parts, left);
      boolean full = parts[0] == MOST_PARTS && parts[1] == MOST_PARTS;
      if (full || left[0] * left[0] + left[1] * left[1] <= allowed * allowed) {
        return made;
      }
      int wider = left[0] > left[1] && parts[0] < MOST_PARTS || parts[1] == MOST_PARTS ? 0 : 1;
      parts[wider] *= 2;
    }
  }

  /** Fewest parts along ρ and ζ, if coefficients fell off by the parts' lengths alone. */
  private static int[] firstGuess(double[][] chebyshev, double allowed) {
    int[] best = {MOST_PARTS, MOST_PARTS};
    for (int across = 1; across <= MOST_PARTS; across *= 2) {
      for (int up = 1; up <= MOST_PARTS; up *= 2) {
        if (across * up < best[0] * best[1] && guess(chebyshev, across, up) <= allowed) {
          best = new int[] {across, up};
        }
      }
    }
    return best;
  }

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

  /** Cuts; left tells the size of what is left out where u, and where v, has the higher power. */
  private static ShortCells cut(
      double[][] chebyshev, int longAcross, int longUp, int[] parts, double[] left) {
    int across = longAcross * parts[0];
    int up = longUp * parts[1];
    double[] terms = new double[across * up * SIZE];
    left[0] = 0;
    left[1] = 0;
    double[] out = new double[2];
    for (int ix = 0; ix < across; ix++) {
      double[][] rx = CellPolynomials.restriction(ix % parts[0], parts[0]);
      for (int iy = 0; iy < up; iy++) {
        double[][] ry = CellPolynomials.restriction(iy % parts[1], parts[1]);
        int from = (iy / parts[1] * longAcross + ix / parts[0]) * Reflection.ALL;
        for (int m = 0; m < Reflection.RATIOS; m++) {
          double[] c = CellPolynomials.onPart(chebyshev[from + m], rx, ry);
          CellPolynomials.leftOut(c, out);
          left[0] = Math.max(left[0], out[0]);
          left[1] = Math.max(left[1], out[1]);
          CellPolynomials.shortPowers(
              c, terms, (iy * across + ix) * SIZE + m * CellPolynomials.SHORT);
        }
      }
    }
    return new ShortCells(across, up, terms);
  }
}
