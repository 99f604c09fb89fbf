package spanwright.feed;

import org.apache.commons.math3.complex.Complex;

/**
 * A uniform line at one frequency.
 *
 * @param impedance characteristic impedance, complex [ohm]
 * @param attenuation real part of the propagation constant [Np/m]
 * @param phase its imaginary part [rad/m]
 */
public record LineConstants(Complex impedance, double attenuation, double phase) {
  /** Decibels in a neper: 20/ln 10. */
  static final double DECIBELS_PER_NEPER = 20 / Math.log(10);

  /**
   * From the primary constants, each per metre: Z0 = &radic;((R + j&omega;L)/(G + j&omega;C)) and
   * &gamma; = &radic;((R + j&omega;L)(G + j&omega;C)), the telegrapher's equations.
   *
   * @param resistance ohm/m
   * @param inductance H/m
   * @param conductance S/m
   * @param capacitance F/m
   * @param frequencyHz hertz
   */
  public static LineConstants ofPrimary(
      double resistance,
      double inductance,
      double conductance,
      double capacitance,
      double frequencyHz) {
    double omega = 2 * Math.PI * frequencyHz;
    Complex series = new Complex(resistance, omega * inductance);
    Complex shunt = new Complex(conductance, omega * capacitance);
    Complex rootSeries = series.sqrt();
    Complex rootShunt = shunt.sqrt();
    Complex gamma = rootSeries.multiply(rootShunt);
    return new LineConstants(rootSeries.divide(rootShunt), gamma.getReal(), gamma.getImaginary());
  }

  /** Matched loss of a length in metres [dB]. */
  public double matchedLossDb(double length) {
    return DECIBELS_PER_NEPER * attenuation * length;
  }
}
