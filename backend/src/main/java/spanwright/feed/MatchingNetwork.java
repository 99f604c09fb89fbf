package spanwright.feed;

/**
 * What a matching unit can do.
 *
 * @param kind its circuit
 * @param leastInductance henries
 * @param mostInductance henries
 * @param leastCapacitance farads; each capacitor of a T has the same range
 * @param mostCapacitance farads
 * @param coilQ quality factor of the coil, series resistance = reactance/Q
 * @param capacitorQ quality factor of each capacitor, likewise
 * @param peakVolts its parts stand; 0 when not known
 */
public record MatchingNetwork(
    Kind kind,
    double leastInductance,
    double mostInductance,
    double leastCapacitance,
    double mostCapacitance,
    double coilQ,
    double capacitorQ,
    double peakVolts) {
  /** The circuits. */
  public enum Kind {
    /** One coil, one capacitor; either may be in series, the other across either side. */
    L,
    /** Capacitor, coil to earth, capacitor. */
    T,
    /** No matching: the transmitter sees what the line shows. */
    BALUN
  }

  public MatchingNetwork {
    Wrong.unlessWithin("The voltage the matching unit stands", peakVolts, 0, 1e7, "V");
    if (kind != Kind.BALUN) {
      Wrong.unlessWithin("The matching unit's greatest inductance", mostInductance, 0, 1, "H");
      Wrong.unlessWithin(
          "The matching unit's least inductance", leastInductance, 0, mostInductance, "H");
      Wrong.unlessWithin("The matching unit's greatest capacitance", mostCapacitance, 0, 1, "F");
      Wrong.unlessWithin(
          "The matching unit's least capacitance", leastCapacitance, 0, mostCapacitance, "F");
      Wrong.unlessWithin("The matching unit's coil Q", coilQ, 1, 1e15, "");
      Wrong.unlessWithin("The matching unit's capacitor Q", capacitorQ, 1, 1e15, "");
    }
  }

  /** A balun that only joins balanced to unbalanced. */
  public static MatchingNetwork balun(double peakVolts) {
    return new MatchingNetwork(Kind.BALUN, 0, 0, 0, 0, 1, 1, peakVolts);
  }
}
