package spanwright.moments;

/**
 * Gain in one direction (IEEE Std 145): relative to the power into the feedpoint. Nothing is −99.
 *
 * @param totalDbi both polarisations
 * @param horizontalDbi electric field level
 * @param verticalDbi electric field in the vertical plane through the direction
 */
public record Gain(double totalDbi, double horizontalDbi, double verticalDbi) {
  /** Shown where there is no field at all. */
  public static final double NOTHING_DBI = -99;

  /** A power ratio in dBi, never below {@link #NOTHING_DBI}. */
  public static double dbi(double ratio) {
    return ratio > 1.2589e-10 ? 10 * Math.log10(ratio) : NOTHING_DBI;
  }
}
