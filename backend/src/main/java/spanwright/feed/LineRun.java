package spanwright.feed;

import org.apache.commons.math3.complex.Complex;

/**
 * Voltage and current along a terminated line, by the hyperbolic line equations with z from the
 * load back: V(z) = V<sub>L</sub> cosh &gamma;z + Z0 I<sub>L</sub> sinh &gamma;z, I(z) =
 * I<sub>L</sub> cosh &gamma;z + (V<sub>L</sub>/Z0) sinh &gamma;z. Everything is kept divided by
 * e<sup>&alpha;z</sup>, so that long lossy lines do not overflow.
 */
final class LineRun {
  private final double loadVoltRe;
  private final double loadVoltIm;
  private final double loadAmpRe;
  private final double loadAmpIm;

  /** Z0 I<sub>L</sub> and V<sub>L</sub>/Z0, the factors of sinh. */
  private final Complex voltRise;

  private final Complex ampRise;
  private final double alpha;
  private final double beta;
  private final double length;

  /** Reflection coefficient at the load, on the complex Z0. */
  private final Complex reflection;

  private LineRun(Complex volt, Complex amp, LineConstants constants, double length) {
    loadVoltRe = volt.getReal();
    loadVoltIm = volt.getImaginary();
    loadAmpRe = amp.getReal();
    loadAmpIm = amp.getImaginary();
    voltRise = constants.impedance().multiply(amp);
    ampRise = volt.divide(constants.impedance());
    alpha = constants.attenuation();
    beta = constants.phase();
    this.length = length;
    reflection = volt.subtract(voltRise).divide(volt.add(voltRise));
  }

  static LineRun of(Complex load, LineConstants constants, double length) {
    boolean low = load.abs() <= constants.impedance().abs();
    return low
        ? new LineRun(load, Complex.ONE, constants, length)
        : new LineRun(Complex.ONE, load.reciprocal(), constants, length);
  }

  /** Impedance at the other end [ohm]. */
  Complex input() {
    double[] end = at(length);
    return new Complex(end[0], end[1]).divide(new Complex(end[2], end[3]));
  }

  /** Power in over power into the load [dB]; infinite when the load takes none. */
  double lossDb() {
    double out = loadVoltRe * loadAmpRe + loadVoltIm * loadAmpIm;
    double in = power(at(length));
    if (out <= 0) {
      return Double.POSITIVE_INFINITY;
    }
    double loss = LineConstants.DECIBELS_PER_NEPER * alpha * length + 10 * Math.log10(in / out);
    return Math.max(0, loss); // a lossless line may round to −1e-15
  }

  /** Largest voltage along the line for a power into it [V]. */
  double peakVolts(double watts) {
    return peak(watts, 0, reflection.getArgument());
  }

  /** Largest current along the line for a power into it [A]. */
  double peakAmps(double watts) {
    return peak(watts, 2, reflection.getArgument() + Math.PI);
  }

  /**
   * Largest size of the voltage (offset 0) or current (offset 2). Without loss its maxima stand
   * where 2&beta;z = angle + 2&pi;k; loss shifts each a little, which Newton steps follow. Their
   * envelope is convex, so that the largest is at an end or among the maxima next to one.
   */
  private double peak(double watts, int offset, double angle) {
    double[] end = at(length);
    boolean takesNone = alpha == 0 && loadVoltRe * loadAmpRe + loadVoltIm * loadAmpIm <= 0;
    if (takesNone || power(end) <= 0) {
      return Double.POSITIVE_INFINITY;
    }
    double scale = Math.sqrt(2 * watts / power(end));
    double largest = Math.max(Math.hypot(end[offset], end[offset + 1]), size(0, offset));
    double period = Math.PI / beta;
    double first = angle / (2 * beta);
    first -= period * Math.floor(first / period);
    double last = first + period * Math.floor((length - first) / period);
    for (int k = 0; k < 2; k++) {
      largest = Math.max(largest, sizeNear(first + k * period, offset, angle));
      largest = Math.max(largest, sizeNear(last - k * period, offset, angle));
    }
    return scale * largest;
  }

  /** The size at a maximum, found from where it would stand without loss. */
  private double sizeNear(double lossless, int offset, double angle) {
    double near = Math.PI / (8 * beta);
    double z = lossless;
    double r = reflection.abs();
    for (int step = 0; step < 4; step++) {
      double fall = Math.exp(-2 * alpha * z);
      double turn = 2 * beta * z - angle;
      double slope = 2 * alpha * (1 - r * r * fall * fall) - 4 * beta * r * fall * Math.sin(turn);
      double bend = -8 * beta * beta * r * fall * Math.cos(turn);
      if (!(bend < 0)) {
        break;
      }
      z = Math.max(lossless - near, Math.min(lossless + near, z - slope / bend));
    }
    return size(Math.max(0, Math.min(length, z)), offset);
  }

  /** Size at z as the far end would scale it: times e^{α(z − length)} and not e^{−αz}. */
  private double size(double z, int offset) {
    double[] there = at(z);
    return Math.hypot(there[offset], there[offset + 1]) * Math.exp(alpha * (z - length));
  }

  private static double power(double[] at) {
    return at[0] * at[2] + at[1] * at[3];
  }

  /** Voltage and current at z, times e^{−αz}: [Re V, Im V, Re I, Im I]. */
  private double[] at(double z) {
    double fall = Math.exp(-2 * alpha * z);
    double cos = Math.cos(beta * z);
    double sin = Math.sin(beta * z);
    double coshRe = (1 + fall) / 2 * cos;
    double coshIm = (1 - fall) / 2 * sin;
    double sinhRe = (1 - fall) / 2 * cos;
    double sinhIm = (1 + fall) / 2 * sin;
    double vr = voltRise.getReal();
    double vi = voltRise.getImaginary();
    double ar = ampRise.getReal();
    double ai = ampRise.getImaginary();
    return new double[] {
      loadVoltRe * coshRe - loadVoltIm * coshIm + vr * sinhRe - vi * sinhIm,
      loadVoltRe * coshIm + loadVoltIm * coshRe + vr * sinhIm + vi * sinhRe,
      loadAmpRe * coshRe - loadAmpIm * coshIm + ar * sinhRe - ai * sinhIm,
      loadAmpRe * coshIm + loadAmpIm * coshRe + ar * sinhIm + ai * sinhRe
    };
  }
}
