package spanwright.path;

import org.apache.commons.math3.complex.Complex;

/**
 * The plain vertical that placements are held against: a quarter-wave wire standing on a perfect
 * ground screen, its far field reflected by the soil beyond.
 *
 * <p>Sinusoidal current I(z) = I<sub>0</sub> cos kz, z from 0 to &lambda;/4; input resistance half
 * of the half-wave dipole's 73.079 ohm, all of it radiated or taken by the soil's reflection. With
 * u = sin &psi; and F(u) = (e<sup>j&pi;u/2</sup> &minus; ju)/(1 &minus; u&sup2;), the field is cos
 * &psi; (F(u) + R<sub>v</sub> F(&minus;u)): the wire itself and its reflection (the space wave of
 * Recommendation ITU-R BS.705, from memory). A real screen of radials loses a little more.
 */
public final class ReferenceVertical {
  /** What stands for no field at all [dBi]. */
  public static final double NOTHING_DBI = -99;

  /** Half of the half-wave dipole by induced EMF (Orfanidis, Electromagnetic Waves) [ohm]. */
  static final double RESISTANCE = 73.0790 / 2;

  /** Impedance of free space (CODATA 2018) [ohm]. */
  private static final double FREE_SPACE = 376.730313668;

  private ReferenceVertical() {}

  /**
   * Gain over real soil.
   *
   * @param elevation radians, 0 to &pi;/2
   * @param frequencyMHz over 0
   * @param permittivity relative
   * @param conductivity S/m
   * @return dBi, not under {@link #NOTHING_DBI}
   */
  public static double gainDbi(
      double elevation, double frequencyMHz, double permittivity, double conductivity) {
    Fresnel soil = Fresnel.of(frequencyMHz, permittivity, conductivity);
    return decibels(power(elevation, soil.vertical(requireElevation(elevation))));
  }

  /** Gain over a perfect conductor without end, dBi; 5.16 at the horizon. */
  public static double perfectGainDbi(double elevation) {
    return decibels(power(requireElevation(elevation), Complex.ONE));
  }

  /**
   * Mean over a take-off window, taken as power.
   *
   * @param window elevations
   * @param frequencyMHz over 0
   * @param permittivity relative
   * @param conductivity S/m
   * @return dBi
   */
  public static double meanDbi(
      Window window, double frequencyMHz, double permittivity, double conductivity) {
    Fresnel soil = Fresnel.of(frequencyMHz, permittivity, conductivity);
    double sum = 0;
    double[] elevations = window.elevationsDegrees();
    for (double degrees : elevations) {
      double elevation = Math.toRadians(degrees);
      sum += power(elevation, soil.vertical(elevation));
    }
    return decibels(sum / elevations.length);
  }

  private static double power(double elevation, Complex reflection) {
    double u = Math.sin(elevation);
    double cos = Math.cos(elevation);
    if (cos < 1e-6) {
      return 0; // straight up, where F stays finite and the cosine takes all
    }
    // cos ψ F(u): real part cos(πu/2), imaginary part sin(πu/2) − u, over cos ψ
    double re = Math.cos(Math.PI * u / 2) / cos;
    double im = (Math.sin(Math.PI * u / 2) - u) / cos;
    Complex field = new Complex(re, im).add(reflection.multiply(new Complex(re, -im)));
    double size = field.abs();
    return FREE_SPACE * size * size / (4 * Math.PI * RESISTANCE);
  }

  private static double decibels(double power) {
    return power > 0 ? Math.max(NOTHING_DBI, 10 * Math.log10(power)) : NOTHING_DBI;
  }

  private static double requireElevation(double elevation) {
    if (!(elevation >= 0 && elevation <= Math.PI / 2 + 1e-12)) {
      throw new IllegalArgumentException(
          "An elevation of " + elevation + " rad is outside 0 to half pi: look above the horizon.");
    }
    return elevation;
  }
}
