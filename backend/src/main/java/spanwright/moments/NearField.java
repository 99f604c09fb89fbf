package spanwright.moments;

import org.apache.commons.math3.complex.Complex;

/**
 * The field at one point, as phasors of rms size, e^{+jωt}.
 *
 * @param at where
 * @param electricX V/m, and likewise y and z
 * @param magneticX A/m, and likewise y and z
 */
public record NearField(
    Vertex at,
    Complex electricX,
    Complex electricY,
    Complex electricZ,
    Complex magneticX,
    Complex magneticY,
    Complex magneticZ) {

  /** Total electric field, rms [V/m]. */
  public double electric() {
    return size(electricX, electricY, electricZ);
  }

  /** Total magnetic field, rms [A/m]. */
  public double magnetic() {
    return size(magneticX, magneticY, magneticZ);
  }

  private static double size(Complex x, Complex y, Complex z) {
    return Math.hypot(Math.hypot(x.abs(), y.abs()), z.abs());
  }
}
