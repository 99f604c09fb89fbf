package spanwright.path;

/**
 * A part of the ionosphere that turns waves back, seen as a mirror whose height lies in a range.
 *
 * <p>Heights: F2 250 to 400 km (US Federal Standard 1037C, "F region"); E about 110 km, the height
 * that Recommendation ITU-R P.533 takes (from memory), here 100 to 120 km, and the same for
 * sporadic E. The greatest critical frequencies are round figures for a strong day at middle
 * latitudes, from memory; they only bound how steep a ray is still worth counting.
 */
public enum Layer {
  /** The daytime E layer. */
  E("E", 100, 120, 4),
  /** Sporadic E. */
  ES("Es", 100, 120, 10),
  /** The F2 layer, which carries most of what goes far. */
  F2("F2", 250, 400, 12);

  private final String label;
  private final double lowestKm;
  private final double highestKm;
  private final double criticalMHz;

  Layer(String label, double lowestKm, double highestKm, double criticalMHz) {
    this.label = label;
    this.lowestKm = lowestKm;
    this.highestKm = highestKm;
    this.criticalMHz = criticalMHz;
  }

  /** "E", "Es" or "F2". */
  public String label() {
    return label;
  }

  /** Least mirror height [km]. */
  public double lowestKm() {
    return lowestKm;
  }

  /** Greatest mirror height [km]. */
  public double highestKm() {
    return highestKm;
  }

  /** Frequency still turned back straight up on a strong day [MHz]. */
  public double criticalMHz() {
    return criticalMHz;
  }
}
