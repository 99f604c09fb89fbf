package spanwright.feed;

import org.apache.commons.math3.complex.Complex;

/**
 * A kind of feed line. Its matched loss is conductorLoss&middot;&radic;f + dielectricLoss&middot;f
 * + fixedLoss, f in MHz: the form in which cable makers fit their tables.
 *
 * @param impedance nominal, at high frequency, real [ohm]
 * @param velocityFactor of light in vacuum, over 0 to 1
 * @param conductorLoss dB per 100 m at 1 MHz, growing with &radic;f
 * @param dielectricLoss dB per 100 m at 1 MHz, growing with f
 * @param fixedLoss dB per 100 m at whatever frequency is asked; keeps the impedance real
 * @param peakVolts the line stands; 0 when not known
 */
public record Line(
    double impedance,
    double velocityFactor,
    double conductorLoss,
    double dielectricLoss,
    double fixedLoss,
    double peakVolts) {
  private static final double LIGHT = 299_792_458.0;

  public Line {
    Wrong.unlessWithin("The line's impedance", impedance, 1, 5000, "ohm");
    Wrong.unlessWithin("The line's velocity factor", velocityFactor, 0.05, 1, "of light");
    Wrong.unlessWithin("The line's conductor loss", conductorLoss, 0, 1e4, "dB per 100 m");
    Wrong.unlessWithin("The line's dielectric loss", dielectricLoss, 0, 1e4, "dB per 100 m");
    Wrong.unlessWithin("The line's loss", fixedLoss, 0, 1e4, "dB per 100 m");
    Wrong.unlessWithin("The voltage the line stands", peakVolts, 0, 1e7, "V");
  }

  /** A line of the catalogue: its loss is computed at the frequency. */
  public static Line of(
      double impedance, double velocityFactor, double conductorLoss, double dielectricLoss) {
    return new Line(impedance, velocityFactor, conductorLoss, dielectricLoss, 0, 0);
  }

  /** A line whose matched loss is given at the frequency; its impedance is used as real. */
  public static Line ofLoss(double impedance, double velocityFactor, double lossDbPer100m) {
    return new Line(impedance, velocityFactor, 0, 0, lossDbPer100m, 0);
  }

  /** The same line with the voltage it stands, peak; 0 when not known. */
  public Line withPeakVolts(double volts) {
    return new Line(impedance, velocityFactor, conductorLoss, dielectricLoss, fixedLoss, volts);
  }

  /** Matched loss at a frequency [dB per 100 m]. */
  public double lossDbPer100m(double frequencyMHz) {
    return conductorLoss * Math.sqrt(frequencyMHz) + dielectricLoss * frequencyMHz + fixedLoss;
  }

  /**
   * The line at a frequency.
   *
   * <p>&gamma; = &alpha; + j&omega;/v with &alpha; the whole loss; the shunt admittance per metre
   * is Y = (2&alpha;<sub>d</sub> + j&beta;)/Z with the dielectric's part &alpha;<sub>d</sub> and
   * the nominal Z; Z0 = &gamma;/Y. So the series side keeps the conductor's part, and Z0 is Z(1
   * &minus; j(&alpha;<sub>c</sub> &minus; &alpha;<sub>d</sub>)/&beta;) to first order (Ramo,
   * Whinnery and Van Duzer, Fields and Waves, low-loss lines; from memory). Passive for any values.
   */
  public LineConstants at(double frequencyMHz) {
    double perMetre = 1 / (100 * LineConstants.DECIBELS_PER_NEPER);
    double conductor = (conductorLoss * Math.sqrt(frequencyMHz) + fixedLoss / 2) * perMetre;
    double dielectric = (dielectricLoss * frequencyMHz + fixedLoss / 2) * perMetre;
    double beta = 2e6 * Math.PI * frequencyMHz / (velocityFactor * LIGHT);
    double size = 4 * dielectric * dielectric + beta * beta;
    double re = (2 * dielectric * (conductor + dielectric) + beta * beta) / size;
    double im = beta * (dielectric - conductor) / size;
    return new LineConstants(
        new Complex(impedance * re, impedance * im), conductor + dielectric, beta);
  }
}
