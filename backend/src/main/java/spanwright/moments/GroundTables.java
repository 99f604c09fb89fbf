package spanwright.moments;

/**
 * The half-space kernels of every (frequency, soil) in use, shared by candidates and threads:
 * filled where first asked for, bounded in memory. Thread-safe.
 */
public final class GroundTables {

  /** Tables that together stay under 256 MiB. */
  public GroundTables() {
    this(256L << 20);
  }

  /** Tables that together stay under so many bytes; the one unused longest goes first. */
  public GroundTables(long bytes) {}

  /**
   * Fills the tables of these frequencies and this ground for a plot, in parallel, so that the
   * first solutions need not wait.
   *
   * @param frequenciesMHz the frequencies
   * @param ground real ground; any other needs no table
   * @param reach greatest horizontal distance between wires [m]
   * @param low lowest wire [m above ground]
   * @param high highest wire [m above ground]
   * @param threads how many threads may work
   */
  public void prepare(
      double[] frequenciesMHz, Ground ground, double reach, double low, double high, int threads) {}
}
