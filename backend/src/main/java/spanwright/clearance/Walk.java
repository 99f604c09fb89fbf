package spanwright.clearance;

import java.util.function.DoubleSupplier;
import java.util.function.IntPredicate;

/**
 * The way every obstacle takes along a strand: position by position, piece by piece, past whatever
 * is too far off to be worse than the worst found so far.
 */
final class Walk {
  private Walk() {}

  /** What is asked of one piece. */
  interface Visit {
    /**
     * One piece that is near enough to matter.
     *
     * @param index of the position
     * @param points of the position
     * @param i offset of the piece's first point
     * @param allowance to take off a distance, for what the positions leave open [m]
     */
    void piece(int index, double[] points, int i, double allowance);
  }

  /** Every position. */
  static final IntPredicate ALL = index -> true;

  /**
   * Visits the pieces of a strand near a box.
   *
   * @param which positions to take
   * @param most how near a piece must come to matter [m]; asked anew for each piece, for it shrinks
   *     as worse places are found
   */
  static void along(
      Strand strand, double[] box, IntPredicate which, DoubleSupplier most, Visit visit) {
    for (int index = 0; index < strand.states.length; index++) {
      if (!which.test(index) || strand.isFarther(index, box, most.getAsDouble())) {
        continue;
      }
      double[] points = strand.states[index];
      for (int i = 0; i + 3 < points.length; i += 3) {
        double allowance = strand.slack(index, i);
        if (Obstacle.gap(points, i, box) - allowance <= most.getAsDouble()) {
          visit.piece(index, points, i, allowance);
        }
      }
    }
  }
}
