package spanwright.path;

import java.util.Locale;
import org.apache.commons.math3.complex.Complex;

/**
 * How a plane wave is reflected by level soil: Fresnel's coefficients with the complex permittivity
 * &epsilon; = &epsilon;<sub>r</sub> &minus; j&sigma;/(&omega;&epsilon;<sub>0</sub>).
 *
 * <p>With &psi; the elevation and W = &radic;(&epsilon; &minus; cos&sup2;&psi;): vertical
 * (&epsilon; sin &psi; &minus; W)/(&epsilon; sin &psi; + W), which is +1 for a perfect conductor;
 * horizontal (sin &psi; &minus; W)/(sin &psi; + W), which is &minus;1 for it. (Jordan and Balmain,
 * Electromagnetic Waves and Radiating Systems, ch. 16; from memory.) Exact in the far zone above
 * the horizon; the surface wave is not in it.
 */
public final class Fresnel {
  /** Electric constant (CODATA 2018) [F/m]. */
  static final double ELECTRIC_CONSTANT = 8.8541878128e-12;

  private final Complex permittivity;
  private final double angularFrequency;
  private final double conductivity;

  private Fresnel(Complex permittivity, double angularFrequency, double conductivity) {
    this.permittivity = permittivity;
    this.angularFrequency = angularFrequency;
    this.conductivity = conductivity;
  }

  /**
   * A soil at a frequency.
   *
   * @param frequencyMHz over 0
   * @param permittivity relative, 1 or more
   * @param conductivity S/m, 0 or more
   */
  public static Fresnel of(double frequencyMHz, double permittivity, double conductivity) {
    if (!(frequencyMHz > 0 && frequencyMHz <= 1e6)) {
      throw new IllegalArgumentException(
          said("A frequency of %s MHz reflects nothing. Give megahertz over 0.", frequencyMHz));
    }
    if (!(permittivity >= 1 && permittivity <= 1e4)) {
      throw new IllegalArgumentException(
          said("A soil's relative permittivity is 1 to 10,000, not %s.", permittivity));
    }
    if (!(conductivity >= 0 && conductivity <= 1e12)) {
      throw new IllegalArgumentException(
          said("A soil's conductivity is 0 S/m or more, not %s.", conductivity));
    }
    double omega = 2e6 * Math.PI * frequencyMHz;
    Complex complex = new Complex(permittivity, -conductivity / (omega * ELECTRIC_CONSTANT));
    return new Fresnel(complex, omega, conductivity);
  }

  /** The soil's complex relative permittivity. */
  public Complex permittivity() {
    return permittivity;
  }

  /**
   * Coefficient for vertical polarisation.
   *
   * @param elevation radians, 0 to &pi;/2
   */
  public Complex vertical(double elevation) {
    Complex up = permittivity.multiply(Math.sin(elevation));
    Complex into = into(elevation);
    return up.subtract(into).divide(up.add(into));
  }

  /**
   * Coefficient for horizontal polarisation.
   *
   * @param elevation radians, 0 to &pi;/2
   */
  public Complex horizontal(double elevation) {
    Complex into = into(elevation);
    double up = Math.sin(elevation);
    return into.negate().add(up).divide(into.add(up));
  }

  /** Elevation of the least vertical coefficient, the pseudo-Brewster angle [radians]. */
  public double pseudoBrewster() {
    double golden = (Math.sqrt(5) - 1) / 2;
    double low = 0;
    double high = Math.PI / 2;
    while (high - low > 1e-10) {
      double left = high - golden * (high - low);
      double right = low + golden * (high - low);
      if (vertical(left).abs() < vertical(right).abs()) {
        high = right;
      } else {
        low = left;
      }
    }
    return (low + high) / 2;
  }

  /** Depth at which a wave in the soil has fallen to 1/e; infinite without conductivity [m]. */
  public double skinDepth() {
    if (conductivity == 0) {
      return Double.POSITIVE_INFINITY;
    }
    double decay = -permittivity.sqrt().getImaginary() * angularFrequency / 299_792_458.0;
    return 1 / decay;
  }

  private Complex into(double elevation) {
    double cos = Math.cos(elevation);
    return permittivity.subtract(cos * cos).sqrt();
  }

  private static String said(String form, double value) {
    return String.format(Locale.ROOT, form, value);
  }
}
