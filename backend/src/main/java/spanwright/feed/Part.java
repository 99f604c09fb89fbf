package spanwright.feed;

/**
 * A coil or capacitor with a range and a Q, in series or across. Its immittance (impedance in
 * series, admittance across) is t(1/Q &plusmn; j) with t 0 or more: plus for a coil in series and a
 * capacitor across. In this form both halves of an L obey the same equations.
 *
 * @param coil or capacitor
 * @param series or across
 * @param omega angular frequency [rad/s]
 * @param dissipation 1/Q
 * @param least henries or farads
 * @param most henries or farads
 */
record Part(
    boolean coil, boolean series, double omega, double dissipation, double least, double most) {

  static Part coil(MatchingNetwork unit, boolean series, double omega) {
    return new Part(
        true, series, omega, 1 / unit.coilQ(), unit.leastInductance(), unit.mostInductance());
  }

  static Part capacitor(MatchingNetwork unit, boolean series, double omega) {
    return new Part(
        false,
        series,
        omega,
        1 / unit.capacitorQ(),
        unit.leastCapacitance(),
        unit.mostCapacitance());
  }

  /** +1 or −1, the sign of j. */
  int sign() {
    return coil == series ? 1 : -1;
  }

  /** Whether t grows with the part's value. */
  private boolean grows() {
    return coil == series;
  }

  /** Series resistance counts in the admittance: |1/(x(1/Q + j))| and its parts. */
  private double across() {
    return series ? 1 : 1 + dissipation * dissipation;
  }

  double ofValue(double value) {
    return grows() ? omega * value / across() : 1 / (omega * value * across());
  }

  double toValue(double t) {
    return grows() ? t * across() / omega : 1 / (omega * t * across());
  }

  double lowest() {
    return ofValue(grows() ? least : most);
  }

  /** Infinite for a part across that may be 0 H, or one in series that may be 0 F. */
  double highest() {
    return ofValue(grows() ? most : least);
  }

  boolean reaches(double t) {
    return t >= lowest() * (1 - 1e-9) && t <= highest() * (1 + 1e-9);
  }

  /** The nearest t the part reaches. */
  double within(double t) {
    return Math.max(lowest(), Math.min(highest(), t));
  }

  /** How far a wanted t lies outside the range: a ratio's logarithm, 0 inside. */
  double beyond(double t) {
    double over = Math.log(t / highest());
    double under = Math.log(lowest() / t);
    return Math.max(0, Math.max(over, under));
  }

  /** Size of the immittance for t. */
  double size(double t) {
    return t * Math.sqrt(1 + dissipation * dissipation);
  }

  String named() {
    return coil ? "coil" : "capacitor";
  }

  /** "3.2 µH" or "120 pF". */
  static String shown(boolean coil, double value) {
    double number = coil ? value * 1e6 : value * 1e12;
    String form = number < 10 ? "%.2f %s" : number < 100 ? "%.1f %s" : "%.0f %s";
    return Judgement.said(form, number, coil ? "µH" : "pF");
  }
}
