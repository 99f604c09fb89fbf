package spanwright.moments;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import org.apache.commons.math3.complex.Complex;

/**
 * Solves wires over ground. Thread-safe; solutions are the same bits whatever the threads.
 *
 * <p>Share one solver, and with it one set of ground tables, among all candidates.
 */
public final class Solver {
  /** Frequencies within this ratio share a mesh. */
  private static final double SAME_MESH = 1.2;

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
    ModelCheck.model(model, ground);
    for (double frequencyMHz : frequenciesMHz) {
      ModelCheck.frequency(frequencyMHz);
    }
    double[] rising = frequenciesMHz.clone();
    java.util.Arrays.sort(rising);
    Map<Double, Solution> solved = new HashMap<>();
    int top = rising.length - 1;
    while (top >= 0) {
      double least = rising[top] / SAME_MESH;
      boolean several = top > 0 && rising[top - 1] >= least;
      PreparedModel prepared =
          new PreparedModel(model, ground, rising[top], MeshRule.of(aim), several);
      for (; top >= 0 && rising[top] >= least; top--) {
        double f = rising[top];
        solved.computeIfAbsent(f, x -> prepared.solve(x, tables.reflection(ground, x)));
      }
    }
    List<Solution> inOrder = new ArrayList<>();
    for (double frequencyMHz : frequenciesMHz) {
      inOrder.add(solved.get(frequencyMHz));
    }
    return inOrder;
  }

  /**
   * As {@link #solve}, solved again on a finer mesh to say how far refinement moves it.
   *
   * @throws ModelFault when the model cannot be solved as given
   */
  public Solution solveAndRefine(
      AntennaModel model, Ground ground, double frequencyMHz, MeshAim aim) {
    Solution solution = solve(model, ground, frequencyMHz, aim);
    // the finest has nothing beyond it: its distance from the next coarser one is more than its own
    MeshAim next = aim == MeshAim.FULL ? MeshAim.FINE : MeshAim.FULL;
    Solution other = solve(model, ground, frequencyMHz, next);
    double change =
        reflectionCoefficient(solution.impedance())
            .subtract(reflectionCoefficient(other.impedance()))
            .abs();
    double allowed = aim == MeshAim.COARSE ? 0.05 : 0.01;
    return solution.refined(change, allowed);
  }

  private static Complex reflectionCoefficient(Complex z) {
    return z.subtract(400).divide(z.add(400));
  }

  /** Solves something small until the machine runs at speed; call it once when a server starts. */
  public static void warmUp() {
    Solver solver = new Solver();
    Ground ground = Ground.real(13, 0.005);
    Directions ring = Directions.ring(72, 0.3);
    for (int i = 0; i < 150; i++) {
      double z = 6 + 0.01 * i;
      AntennaModel model =
          AntennaModel.of(
              List.of(
                  WireSpec.of(
                      List.of(
                          new Vertex(-9, 0.4, z - 2), new Vertex(0, 0, z), new Vertex(9, 1, z - 1)),
                      0.001,
                      WireSpec.COPPER)),
              0,
              0.45);
      Solution solution = solver.solve(model, ground, 14.1 + 7 * (i % 3), MeshAim.FULL);
      solution.powerGains(ring);
      solution.peak();
      solution.efficiency();
    }
  }
}
