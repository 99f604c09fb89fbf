package spanwright.moments;

import org.apache.commons.math3.complex.Complex;

/** What a metre of wire adds to the equation by its metal and its insulation. */
final class Material {
  private Material() {}

  /**
   * Internal impedance of a round wire [ohm/m]: z = (q/(2πaσ)) I0(qa)/I1(qa), q = √(jωμσ) (Ramo,
   * Whinnery and Van Duzer, Fields and Waves in Communication Electronics, 3rd edition, §4.5, in
   * the form with modified functions). The ratio is a continued fraction in qa, which neither
   * overflows nor cancels: I1/I0 = x/(2 + x²/(4 + x²/(6 + …))) (Abramowitz and Stegun 9.1.73 with
   * an imaginary argument); thick wires take the asymptotic ratio.
   */
  static Complex internalImpedance(WireSpec wire, double frequencyMHz) {
    if (Double.isInfinite(wire.conductivity())) {
      return Complex.ZERO;
    }
    double omega = Constants.angularFrequency(frequencyMHz);
    double a = wire.radius();
    double part =
        Math.sqrt(0.5 * omega * Constants.MU0 * wire.permeability() * wire.conductivity());
    Complex q = new Complex(part, part);
    Complex x = q.multiply(a);
    return q.multiply(ratio(x)).divide(2 * Math.PI * a * wire.conductivity());
  }

  /** I0(x)/I1(x). */
  private static Complex ratio(Complex x) {
    if (x.abs() > 60) {
      // 1 + 1/(2x) + 3/(8x²) + 3/(8x³): next term 63/(128 x⁴)
      Complex r = x.reciprocal();
      Complex tail = r.multiply(0.375).add(0.375).multiply(r).add(0.5).multiply(r);
      return tail.add(1);
    }
    Complex x2 = x.multiply(x);
    int terms = 20 + (int) (2 * x.abs());
    Complex f = Complex.ZERO;
    for (int k = terms; k >= 2; k--) {
      f = x2.divide(f.add(2.0 * k));
    }
    return f.add(2).divide(x);
  }

  /**
   * Elastance that insulation adds to a metre of wire [m/F]: ln(b/a)/(2πε0)·(1/εi − 1), negative,
   * since the charge sees less air.
   */
  static double sheathElastance(WireSpec wire) {
    Sheath sheath = wire.sheath();
    if (sheath == null) {
      return 0;
    }
    return Math.log(sheath.radius() / wire.radius())
        / (2 * Math.PI * Constants.EPSILON0)
        * (1 / sheath.permittivity() - 1);
  }
}
