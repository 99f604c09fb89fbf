package spanwright.feed;

/**
 * Constants of a two-wire line from its dimensions, wires equal and round.
 *
 * <p>Z0 = &eta;/(&pi;&radic;&epsilon;)&middot;acosh(D/d), exact for perfect wires in one dielectric
 * (Paul, Analysis of Multiconductor Transmission Lines). Conductor loss from the skin-effect
 * resistance of both wires as if each were alone, 2 R<sub>s</sub>/(&pi;d); close spacing crowds the
 * current and costs more: by &radic;(1 &minus; (d/D)&sup2;), which is included.
 *
 * @param spacing D, between the wires' axes [m]
 * @param diameter d, of each wire [m], under the spacing
 * @param permittivity relative, of what the field runs in, effective
 * @param conductivity of the wires [S/m]
 */
public record TwoWire(double spacing, double diameter, double permittivity, double conductivity) {
  /** Impedance of free space (CODATA 2018) [ohm]. */
  private static final double FREE_SPACE = 376.730313668;

  private static final double LIGHT = 299_792_458.0;
  private static final double MAGNETIC_CONSTANT = 4e-7 * Math.PI;

  public TwoWire {
    Wrong.unlessWithin("The wires' diameter", diameter, 1e-6, 1, "m");
    Wrong.unlessWithin("The wires' spacing", spacing, diameter * 1.000001, 100, "m");
    Wrong.unlessWithin("The relative permittivity", permittivity, 1, 100, "");
    Wrong.unlessWithin("The wires' conductivity", conductivity, 1e3, 1e12, "S/m");
  }

  /** Characteristic impedance without loss [ohm]. */
  public double impedance() {
    return FREE_SPACE / (Math.PI * Math.sqrt(permittivity)) * acoshOfRatio();
  }

  /** Capacitance [F/m]. */
  public double capacitance() {
    return Math.PI * permittivity / (FREE_SPACE * LIGHT) / acoshOfRatio();
  }

  /** External inductance [H/m]. */
  public double inductance() {
    return FREE_SPACE / (LIGHT * Math.PI) * acoshOfRatio();
  }

  /**
   * Series resistance of both wires at a frequency where the skin is thin against the wire [ohm/m].
   */
  public double resistance(double frequencyMHz) {
    double skin = Math.sqrt(Math.PI * frequencyMHz * 1e6 * MAGNETIC_CONSTANT / conductivity);
    double ratio = diameter / spacing;
    return 2 * skin / (Math.PI * diameter) / Math.sqrt(1 - ratio * ratio);
  }

  /** The conductors' part of the matched loss, grows with &radic;f [dB per 100 m]. */
  public double conductorLossDbPer100m(double frequencyMHz) {
    return 100 * LineConstants.DECIBELS_PER_NEPER * resistance(frequencyMHz) / (2 * impedance());
  }

  private double acoshOfRatio() {
    double ratio = spacing / diameter;
    return Math.log(ratio + Math.sqrt(ratio * ratio - 1));
  }
}
