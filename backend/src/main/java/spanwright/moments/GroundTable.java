package spanwright.moments;

import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.atomic.AtomicLong;

/**
 * Half-space kernels of one ground at one frequency, divided by the image's e^{−jk0R}/R and kept as
 * polynomials over cells of the (ρ, ζ) plane.
 *
 * <p>The ratio takes out the singular image and the phase of the wave together: near the image it
 * tends to a constant (−(ε − 1)/(ε + 1) for a charge), far away to Fresnel's coefficients, and in
 * between it varies over its distance from the image or over 1/|k1|, whichever is less. So ζ is cut
 * at powers of two, 2^e; ρ + 2^e likewise; and each such {@link GroundBlock} into as many equal
 * cells as its own coefficients ask for. A block is worked out when first looked up; what it holds
 * depends on nothing but its place, so all threads find the same bits.
 */
final class GroundTable implements Reflection {
  private static final int LOW = -14;
  private static final int HIGH = 14;
  private static final int ACROSS = 32;
  private static final int BIAS = 1023;
  private static final int MANTISSA = 52;
  private static final int LOCKS = 64;

  /** Greatest horizontal distance [m]. */
  private static final double FARTHEST = 10_000;

  /** Allowed error of the long form, against an image of size one. */
  private static final double LONG_TOLERANCE = 4e-5;

  /** Allowed size of what the short form leaves out. */
  private static final double SHORT_TOLERANCE = 5e-5;

  /** Beyond this distance more is allowed in proportion: little is left of the image [m]. */
  private static final double NEIGHBOURHOOD = 128;

  private final HalfSpaceKernels kernels;
  private final double k0;
  // read without a lock: a block is immutable, and one that is not seen yet is asked for again
  private final GroundBlock[] blocks = new GroundBlock[1024];
  private final Object[] locks = new Object[LOCKS];
  private final AtomicLong bytes = new AtomicLong();
  private final Runnable grown;

  /** A table that nobody keeps account of. */
  GroundTable(Ground ground, double frequencyMHz) {
    this(ground, frequencyMHz, () -> {});
  }

  /**
   * A table.
   *
   * @param grown called after each block that was added, with no lock held
   */
  GroundTable(Ground ground, double frequencyMHz, Runnable grown) {
    this.grown = grown;
    kernels = HalfSpaceKernels.of(ground, frequencyMHz);
    k0 = Constants.waveNumber(frequencyMHz);
    for (int i = 0; i < LOCKS; i++) {
      locks[i] = new Object();
    }
  }

  /** Memory held by the cells [bytes]. */
  long bytes() {
    return bytes.get();
  }

  @Override
  public boolean present() {
    return true;
  }

  /** Fills every block that touches this part of the plane. */
  void fill(double rhoMax, double zetaMin, double zetaMax) {
    missing(rhoMax, zetaMin, zetaMax).forEach(Runnable::run);
  }

  /** The work still to be done on this part of the plane, one piece a block, in any order. */
  List<Runnable> missing(double rhoMax, double zetaMin, double zetaMax) {
    check(rhoMax, zetaMin);
    check(rhoMax, zetaMax);
    List<Runnable> work = new ArrayList<>();
    int top = Math.getExponent(zetaMax);
    for (int e = Math.getExponent(zetaMin); e <= top; e++) {
      double edge = Math.scalb(1.0, e);
      for (double from = edge; from <= rhoMax + edge; from *= 2) {
        double rho = from - edge;
        if (blocks[index(rho, edge)] == null) {
          work.add(() -> block(rho, edge));
        }
      }
    }
    return work;
  }

  private static void check(double rho, double zeta) {
    int e = Math.getExponent(zeta);
    if (!(zeta > 0 && e >= LOW && e <= HIGH)) {
      throw new ModelFault(
          "A wire or field point is "
              + 0.5 * zeta
              + " m above the ground, which is beyond what can be solved: move it between 0.1 mm"
              + " and 8 km.");
    }
    if (!(rho >= 0 && rho <= FARTHEST)) {
      throw new ModelFault(
          "Two wires, or a wire and a field point, are "
              + Math.round(rho)
              + " m apart, more than the 10 km over which the ground is worked out: leave out"
              + " what is so far away.");
    }
  }

  /** The block of a place, worked out if it is not there. */
  private GroundBlock block(double rho, double zeta) {
    check(rho, zeta);
    int index = index(rho, zeta);
    GroundBlock found = blocks[index];
    if (found != null) {
      return found;
    }
    synchronized (locks[index % LOCKS]) {
      found = blocks[index];
      if (found != null) {
        return found;
      }
      double edge = Math.scalb(1.0, Math.getExponent(zeta));
      double wide = Math.scalb(1.0, Math.getExponent(rho + edge));
      double more = Math.max(1, (wide - edge) / NEIGHBOURHOOD);
      found =
          GroundBlock.make(
              kernels,
              k0,
              wide - edge,
              wide,
              edge,
              edge,
              LONG_TOLERANCE * more,
              SHORT_TOLERANCE * more);
      bytes.addAndGet(found.bytes());
      blocks[index] = found;
    }
    grown.run();
    return found;
  }

  private static int index(double rho, double zeta) {
    int e = Math.getExponent(zeta);
    return (e - LOW) * ACROSS + Math.getExponent(rho + Math.scalb(1.0, e)) - e;
  }

  @Override
  public void ratios(double[] rhos, double[] zetas, int count, double[][] out) {
    double[] out0 = out[0];
    double[] out1 = out[1];
    double[] out2 = out[2];
    double[] out3 = out[3];
    double[] out4 = out[4];
    double[] out5 = out[5];
    double[] out6 = out[6];
    double[] out7 = out[7];
    for (int i = 0; i < count; i++) {
      double rho = rhos[i];
      double zeta = zetas[i];
      long zetaBits = Double.doubleToRawLongBits(zeta) >>> MANTISSA;
      double edge = Double.longBitsToDouble(zetaBits << MANTISSA);
      double past = rho + edge;
      long pastBits = Double.doubleToRawLongBits(past) >>> MANTISSA;
      int index = (int) ((zetaBits - (BIAS + LOW)) * ACROSS + (pastBits - zetaBits));
      GroundBlock b = rho <= FARTHEST && index >>> 10 == 0 ? blocks[index] : null;
      if (b == null) {
        b = block(rho, zeta);
      }
      double x = (past - Double.longBitsToDouble(pastBits << MANTISSA)) * b.perRho;
      double y = (zeta - edge) * b.perZeta;
      int ix = (int) x;
      int iy = (int) y;
      double u = 2 * (x - ix) - 1;
      double v = 2 * (y - iy) - 1;
      double[] c = b.cells;
      int at = (iy * b.across + ix) * (CellPolynomials.SHORT * RATIOS);
      out0[i] = cubic(c, at, u, v);
      out1[i] = cubic(c, at + CellPolynomials.SHORT, u, v);
      out2[i] = cubic(c, at + 2 * CellPolynomials.SHORT, u, v);
      out3[i] = cubic(c, at + 3 * CellPolynomials.SHORT, u, v);
      out4[i] = cubic(c, at + 4 * CellPolynomials.SHORT, u, v);
      out5[i] = cubic(c, at + 5 * CellPolynomials.SHORT, u, v);
      out6[i] = cubic(c, at + 6 * CellPolynomials.SHORT, u, v);
      out7[i] = cubic(c, at + 7 * CellPolynomials.SHORT, u, v);
    }
  }

  /** The ten terms of a short set. */
  private static double cubic(double[] c, int p, double u, double v) {
    return c[p]
        + v * (c[p + 1] + v * (c[p + 2] + v * c[p + 3]))
        + u
            * (c[p + 4]
                + v * (c[p + 5] + v * c[p + 6])
                + u * (c[p + 7] + v * c[p + 8] + u * c[p + 9]));
  }

  @Override
  public void ratiosAndSlopes(double rho, double zeta, double[] out) {
    GroundBlock b = block(rho, zeta);
    double edge = Math.scalb(1.0, Math.getExponent(zeta));
    double past = rho + edge;
    b.ratiosAndSlopes(past - Math.scalb(1.0, Math.getExponent(past)), zeta - edge, out);
  }
}
