package spanwright.moments;

import java.util.List;

/**
 * Solves wires over ground. Thread-safe; solutions are the same bits whatever the threads.
 *
 * <p>Share one solver, and with it one set of ground tables, among all candidates.
 */
public final class Solver {
  private final GroundTables tables;

  /** A solver with tables of its own. */
  public Solver() {
    this(new GroundTables());
  }

  /** A solver on shared tables. */
  public Solver(GroundTables tables) {
    this.tables = tables;
  }

  /** The ground tables in use. */
  public GroundTables tables() {
    return tables;
  }

  /**
   * Solves at one frequency.
   *
   * @throws ModelFault when the model cannot be solved as given
   */
  public Solution solve(AntennaModel model, Ground ground, double frequencyMHz, MeshAim aim) {
    return solve(model, ground, new double[] {frequencyMHz}, aim).get(0);
  }

  /**
   * Solves at several frequencies, in their order; geometry is worked out once for frequencies that
   * lie near each other.
   *
   * @throws ModelFault when the model cannot be solved as given
   */
  public List<Solution> solve(
      AntennaModel model, Ground ground, double[] frequenciesMHz, MeshAim aim) {
    throw new UnsupportedOperationException("not yet");
  }

  /** As {@link #solve}, solved again on a finer mesh to say how far refinement moves it. */
  public Solution solveAndRefine(
      AntennaModel model, Ground ground, double frequencyMHz, MeshAim aim) {
    throw new UnsupportedOperationException("not yet");
  }

  /** Solves something small until the machine runs at speed; call it once when a server starts. */
  public static void warmUp() {}
}
