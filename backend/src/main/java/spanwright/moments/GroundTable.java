package spanwright.moments;

import java.util.concurrent.atomic.AtomicLong;
import java.util.concurrent.atomic.AtomicReferenceArray;

/**
 * Half-space kernels of one ground at one frequency, divided by the image's e^{−jk0R}/R and kept as
 * polynomials over cells of the (ρ, ζ) plane.
 *
 * <p>The ratio takes out the singular image and the phase of the wave together: near the image it
 * tends to a constant (−(ε − 1)/(ε + 1) for a charge), far away to Fresnel's coefficients, and in
 * between it varies over its distance from the image or over 1/|k1|, whichever is less. So ζ is cut
 * at powers of two, ρ at the same lengths and their doubles, and each such block into as many equal
 * cells as its own Chebyshev coefficients ask for. A block is worked out when first looked up; what
 * it holds depends on nothing but its place, so all threads find the same bits.
 *
 * <p>Layout of a block: cell (ix, iy) starts at (iy·nx + ix)·{@value #TERMS}·width; there the
 * coefficient of u^a v^b stands at (a·{@value #SIDE} + b)·width, with u, v in −1..1 across the
 * cell; width is eight (GA, GP, GZ, F as re, im) or two (GT).
 */
final class GroundTable implements Reflection {
  /** Coefficients each way. */
  static final int SIDE = 6;

  private static final int TERMS = SIDE * SIDE;
  private static final int LOW = -14;
  private static final int HIGH = 14;
  private static final int ACROSS = 32;
  private static final int MOST_SPLITS = 64;

  /** Greatest horizontal distance [m]. */
  private static final double FARTHEST = 10_000;

  /**
   * Allowed size of the last coefficients, against an image of size one; more in proportion beyond
   * 32 m, where little is left of it.
   */
  private static final double TOLERANCE = 5e-5;

  private static final double[] NODES = new double[SIDE];
  private static final double[][] TO_CHEBYSHEV = new double[SIDE][SIDE];
  private static final double[][] TO_POWERS = new double[SIDE][SIDE];

  static {
    for (int i = 0; i < SIDE; i++) {
      NODES[i] = -StrictMath.cos(Math.PI * (i + 0.5) / SIDE);
      for (int k = 0; k < SIDE; k++) {
        double angle = Math.PI * k * (SIDE - i - 0.5) / SIDE;
        TO_CHEBYSHEV[k][i] = (k == 0 ? 1.0 : 2.0) / SIDE * StrictMath.cos(angle);
      }
    }
    double[][] t = new double[SIDE][SIDE];
    t[0][0] = 1;
    t[1][1] = 1;
    for (int k = 2; k < SIDE; k++) {
      for (int p = 0; p < SIDE; p++) {
        t[k][p] = (p > 0 ? 2 * t[k - 1][p - 1] : 0) - t[k - 2][p];
      }
    }
    for (int k = 0; k < SIDE; k++) {
      for (int p = 0; p < SIDE; p++) {
        TO_POWERS[p][k] = t[k][p];
      }
    }
  }

  private final HalfSpaceKernels kernels;
  private final double k0;
  private final AtomicReferenceArray<Block> blocks =
      new AtomicReferenceArray<>((HIGH - LOW + 1) * ACROSS);
  private final AtomicLong bytes = new AtomicLong();

  GroundTable(Ground ground, double frequencyMHz) {
    kernels = HalfSpaceKernels.of(ground, frequencyMHz);
    k0 = Constants.waveNumber(frequencyMHz);
  }

  /** Memory held by the cells [bytes]. */
  long bytes() {
    return bytes.get();
  }

  @Override
  public boolean present() {
    return true;
  }

  /** One block of equal cells. */
  private record Block(
      int across,
      int up,
      double rho0,
      double cellsPerRho,
      double zeta0,
      double cellsPerZeta,
      double[] eight,
      double[] two) {}

  /** Fills every block that touches this part of the plane. */
  void fill(double rhoMax, double zetaMin, double zetaMax) {
    int top = band(zetaMax);
    for (int e = band(zetaMin); e <= top; e++) {
      double edge = Math.scalb(1.0, e);
      block(0, edge);
      for (double rho = edge; rho < rhoMax; rho *= 2) {
        block(rho, edge);
      }
    }
  }

  private static int band(double zeta) {
    int e = Math.getExponent(zeta);
    if (e < LOW || e > HIGH) {
      throw new ModelFault(
          "A wire or field point is "
              + 0.5 * zeta
              + " m above the ground, which is beyond what can be solved: move it between 0.1 mm"
              + " and 8 km.");
    }
    return e;
  }

  private Block block(double rho, double zeta) {
    int e = band(zeta);
    int k = rho < Math.scalb(1.0, e) ? 0 : Math.getExponent(rho) - e + 1;
    if (rho > FARTHEST) {
      throw new ModelFault(
          "Two wires, or a wire and a field point, are "
              + Math.round(rho)
              + " m apart, more than the 10 km over which the ground is worked out: leave out"
              + " what is so far away.");
    }
    int index = (e - LOW) * ACROSS + k;
    Block found = blocks.get(index);
    if (found == null) {
      Block made = make(e, k);
      if (blocks.compareAndSet(index, null, made)) {
        bytes.addAndGet(8L * (made.eight.length + made.two.length));
      }
      found = blocks.get(index);
    }
    return found;
  }

  private Block make(int e, int k) {
    double zeta0 = Math.scalb(1.0, e);
    double rho0 = k == 0 ? 0 : Math.scalb(1.0, e + k - 1);
    double wide = k == 0 ? zeta0 : rho0;
    int across = 1;
    int up = 1;
    while (true) {
      double[] cells = new double[across * up * TERMS * ALL];
      int verdict = 0;
      for (int iy = 0; iy < up; iy++) {
        for (int ix = 0; ix < across; ix++) {
          verdict |=
              cell(
                  rho0 + wide * ix / across,
                  wide / across,
                  zeta0 + zeta0 * iy / up,
                  zeta0 / up,
                  cells,
                  (iy * across + ix) * TERMS * ALL);
        }
        if (verdict == 3) {
          break;
        }
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
        return pack(across, up, rho0, across / wide, zeta0, up / zeta0, cells);
      }
    }
  }

  private static Block pack(
      int across, int up, double rho0, double perRho, double zeta0, double perZeta, double[] all) {
    int terms = all.length / ALL;
    double[] eight = new double[terms * RATIOS];
    double[] two = new double[terms * 2];
    for (int i = 0; i < terms; i++) {
      System.arraycopy(all, i * ALL, eight, i * RATIOS, RATIOS);
      System.arraycopy(all, i * ALL + RATIOS, two, 2 * i, 2);
    }
    return new Block(across, up, rho0, perRho, zeta0, perZeta, eight, two);
  }

  /**
   * Works out one cell.
   *
   * @return 1 when ρ, 2 when ζ, 3 when both need shorter cells, else 0
   */
  private int cell(double rho0, double wide, double zeta0, double high, double[] cells, int start) {
    double[] rhos = new double[SIDE];
    double[] zetas = new double[SIDE];
    for (int i = 0; i < SIDE; i++) {
      rhos[i] = rho0 + 0.5 * wide * (1 + NODES[i]);
      zetas[i] = zeta0 + 0.5 * high * (1 + NODES[i]);
    }
    double[] values = kernels.grid(rhos, zetas);
    double[] ratio = new double[TERMS];
    double lastRho = 0;
    double lastZeta = 0;
    for (int m = 0; m < ALL; m++) {
      for (int i = 0; i < SIDE; i++) {
        for (int j = 0; j < SIDE; j++) {
          double r = Math.sqrt(rhos[i] * rhos[i] + zetas[j] * zetas[j]);
          double cos = r * Math.cos(k0 * r);
          double sin = r * Math.sin(k0 * r);
          // grid order GA, GP, GZ, F, GT is the order here
          int at = ((i * SIDE + j) * HalfSpaceKernels.KERNELS + m / 2) * 2;
          double re = values[at];
          double im = values[at + 1];
          ratio[i * SIDE + j] = m % 2 == 0 ? re * cos - im * sin : re * sin + im * cos;
        }
      }
      double[] c = both(TO_CHEBYSHEV, ratio);
      for (int i = 0; i < SIDE; i++) {
        lastRho = Math.max(lastRho, Math.abs(c[(SIDE - 1) * SIDE + i]));
        lastZeta = Math.max(lastZeta, Math.abs(c[i * SIDE + SIDE - 1]));
      }
      double[] p = both(TO_POWERS, c);
      for (int i = 0; i < TERMS; i++) {
        cells[start + i * ALL + m] = p[i];
      }
    }
    double allowed = TOLERANCE * Math.max(1, rho0 / 32);
    return (lastRho > allowed ? 1 : 0) | (lastZeta > allowed ? 2 : 0);
  }

  /** M x Mᵀ. */
  private static double[] both(double[][] matrix, double[] x) {
    double[] half = new double[TERMS];
    double[] out = new double[TERMS];
    for (int a = 0; a < SIDE; a++) {
      for (int j = 0; j < SIDE; j++) {
        double s = 0;
        for (int i = 0; i < SIDE; i++) {
          s += matrix[a][i] * x[i * SIDE + j];
        }
        half[a * SIDE + j] = s;
      }
    }
    for (int a = 0; a < SIDE; a++) {
      for (int b = 0; b < SIDE; b++) {
        double s = 0;
        for (int j = 0; j < SIDE; j++) {
          s += matrix[b][j] * half[a * SIDE + j];
        }
        out[a * SIDE + b] = s;
      }
    }
    return out;
  }

  @Override
  public void ratios(double rho, double zeta, double[] out) {
    Block b = block(rho, zeta);
    double x = (rho - b.rho0) * b.cellsPerRho;
    double y = (zeta - b.zeta0) * b.cellsPerZeta;
    int ix = Math.min((int) x, b.across - 1);
    int iy = Math.min((int) y, b.up - 1);
    double u = 2 * (x - ix) - 1;
    double v = 2 * (y - iy) - 1;
    double[] c = b.eight;
    int at = (iy * b.across + ix) * TERMS * RATIOS;
    double v2 = v * v;
    double v3 = v2 * v;
    double v4 = v2 * v2;
    double v5 = v4 * v;
    for (int m = 0; m < RATIOS; m++) {
      out[m] = 0;
    }
    for (int a = SIDE - 1; a >= 0; a--) {
      int row = at + a * SIDE * RATIOS;
      for (int m = 0; m < RATIOS; m++) {
        out[m] =
            out[m] * u
                + (c[row + m]
                    + v * c[row + RATIOS + m]
                    + v2 * c[row + 2 * RATIOS + m]
                    + v3 * c[row + 3 * RATIOS + m]
                    + v4 * c[row + 4 * RATIOS + m]
                    + v5 * c[row + 5 * RATIOS + m]);
      }
    }
  }

  @Override
  public void ratiosAndSlopes(double rho, double zeta, double[] out) {
    Block b = block(rho, zeta);
    double x = (rho - b.rho0) * b.cellsPerRho;
    double y = (zeta - b.zeta0) * b.cellsPerZeta;
    int ix = Math.min((int) x, b.across - 1);
    int iy = Math.min((int) y, b.up - 1);
    double u = 2 * (x - ix) - 1;
    double v = 2 * (y - iy) - 1;
    int cell = (iy * b.across + ix) * TERMS;
    for (int m = 0; m < ALL; m++) {
      double value = 0;
      double byU = 0;
      double byV = 0;
      for (int i = SIDE - 1; i >= 0; i--) {
        double row = 0;
        double slope = 0;
        for (int j = SIDE - 1; j >= 0; j--) {
          int term = cell + i * SIDE + j;
          double c = m < RATIOS ? b.eight[term * RATIOS + m] : b.two[term * 2 + m - RATIOS];
          slope = slope * v + row;
          row = row * v + c;
        }
        byU = byU * u + value;
        value = value * u + row;
        byV = byV * u + slope;
      }
      out[m] = value;
      out[ALL + m] = 2 * byU * b.cellsPerRho;
      out[2 * ALL + m] = 2 * byV * b.cellsPerZeta;
    }
  }
}
