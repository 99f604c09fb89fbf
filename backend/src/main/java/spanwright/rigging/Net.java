package spanwright.rigging;

import org.apache.commons.math3.linear.Array2DRowRealMatrix;
import org.apache.commons.math3.linear.ArrayRealVector;
import org.apache.commons.math3.linear.CholeskyDecomposition;
import org.apache.commons.math3.linear.NonPositiveDefiniteMatrixException;

/**
 * Chains that meet at nodes: some nodes stand still, the others hang where all forces balance.
 *
 * <p>The potential of each chain is a convex function of the way between its ends, so that of the
 * whole is a convex function of the free nodes' places, with one least; a Newton iteration whose
 * steps are halved while they do not help arrives there. The stiffness of a chain is the inverse of
 * the flexibility that {@link Chain} knows. Not safe for several threads at once.
 */
final class Net {
  private static final int STEPS = 200;
  private static final double BALANCED = 1e-8;

  /** Added to each free node's stiffness, of its size, so that a slack node has one too. */
  private static final double SOFT = 1e-12;

  final double[] at;
  final double[] load;
  private final int fixed;
  private final int free;
  private final Chain[] chains;
  private final int[] begins;
  private final int[] ends;
  private final double[] residual;
  private final double[] k = new double[6];
  private final boolean[] warm;

  /**
   * A net.
   *
   * @param fixed nodes that stand still, numbered first
   * @param free nodes that hang
   * @param chains between the nodes
   * @param begins node at which each chain begins
   * @param ends node at which it ends
   */
  Net(int fixed, int free, Chain[] chains, int[] begins, int[] ends) {
    this.fixed = fixed;
    this.free = free;
    this.chains = chains;
    this.begins = begins;
    this.ends = ends;
    at = new double[3 * (fixed + free)];
    load = new double[3 * (fixed + free)];
    residual = new double[3 * free];
    warm = new boolean[chains.length];
  }

  /**
   * Finds where the free nodes hang, from where they stand in {@link #at}.
   *
   * @return the greatest force left on a node, as a share of the greatest tension
   */
  double solve() {
    double potential = look();
    double left = left();
    double[] from = new double[3 * free];
    for (int i = 0; i < STEPS && left > BALANCED; i++) {
      double[] step = step();
      if (step == null) {
        break;
      }
      System.arraycopy(at, 3 * fixed, from, 0, from.length);
      double share = Math.min(1, 2 / Math.max(1e-9, longest(step)));
      boolean better = false;
      for (int halving = 0; halving < 30 && !better; halving++) {
        for (int n = 0; n < from.length; n++) {
          at[3 * fixed + n] = from[n] + share * step[n];
        }
        double here = look();
        double leftHere = left();
        better = here < potential - 1e-13 * Math.abs(potential) || leftHere < 0.9 * left;
        if (better) {
          potential = here;
          left = leftHere;
        }
        share /= 2;
      }
      if (!better) {
        System.arraycopy(from, 0, at, 3 * fixed, from.length);
        look();
        return left();
      }
    }
    return left;
  }

  /** The straight way from end to end of a chain, of length 1. */
  double[] course(int c) {
    double dx = at[3 * ends[c]] - at[3 * begins[c]];
    double dy = at[3 * ends[c] + 1] - at[3 * begins[c] + 1];
    double dz = at[3 * ends[c] + 2] - at[3 * begins[c] + 2];
    double size = Math.max(1e-12, Math.sqrt(dx * dx + dy * dy + dz * dz));
    return new double[] {dx / size, dy / size, dz / size};
  }

  private static double longest(double[] step) {
    double most = 0;
    for (double each : step) {
      most = Math.max(most, Math.abs(each));
    }
    return most;
  }

  /** Hangs every chain between the nodes as they stand; gathers the forces and the potential. */
  private double look() {
    for (int n = 0; n < residual.length; n++) {
      residual[n] = load[3 * fixed + n];
    }
    double sum = 0;
    for (int n = 0; n < residual.length; n++) {
      sum -= load[3 * fixed + n] * at[3 * fixed + n];
    }
    for (int c = 0; c < chains.length; c++) {
      hang(c);
      Chain chain = chains[c];
      sum += chain.potential();
      for (int axis = 0; axis < 3; axis++) {
        double first = chain.start[axis];
        double last = chain.end()[axis];
        sum -= (first - last) * at[3 * ends[c] + axis];
        add(begins[c], axis, first);
        add(ends[c], axis, -last);
      }
    }
    return sum;
  }

  private void add(int node, int axis, double force) {
    if (node >= fixed) {
      residual[3 * (node - fixed) + axis] += force;
    }
  }

  private void hang(int c) {
    Chain chain = chains[c];
    double dx = at[3 * ends[c]] - at[3 * begins[c]];
    double dy = at[3 * ends[c] + 1] - at[3 * begins[c] + 1];
    double dz = at[3 * ends[c] + 2] - at[3 * begins[c] + 2];
    double chord = Math.sqrt(dx * dx + dy * dy + dz * dz);
    double gap = warm[c] ? chain.solve(dx, dy, dz) : Double.POSITIVE_INFINITY;
    if (!(gap < 1e-7 * (chord + chain.totalLength()))) {
      if (chord > 1e-9) {
        new Tightening(chain, dx, dy, dz).asLong(chain.totalLength() - chord);
      } else {
        chain.solve(dx, dy, dz);
      }
      warm[c] = true;
    }
  }

  /** The greatest force left over on a free node, as a share of the greatest tension. */
  private double left() {
    double most = 1;
    for (Chain chain : chains) {
      most = Math.max(most, chain.tensionAtStart());
    }
    double greatest = 0;
    for (double each : residual) {
      greatest = Math.max(greatest, Math.abs(each));
    }
    return greatest / most;
  }

  private double[] step() {
    int size = 3 * free;
    double[][] stiff = new double[size][size];
    for (int c = 0; c < chains.length; c++) {
      chains[c].stiffness(k);
      block(stiff, begins[c], begins[c], 1);
      block(stiff, ends[c], ends[c], 1);
      block(stiff, begins[c], ends[c], -1);
      block(stiff, ends[c], begins[c], -1);
    }
    double greatest = 0;
    for (int i = 0; i < size; i++) {
      greatest = Math.max(greatest, stiff[i][i]);
    }
    for (int i = 0; i < size; i++) {
      stiff[i][i] += SOFT * greatest;
    }
    try {
      return new CholeskyDecomposition(new Array2DRowRealMatrix(stiff, false), 1e-6, 0)
          .getSolver()
          .solve(new ArrayRealVector(residual, false))
          .toArray();
    } catch (NonPositiveDefiniteMatrixException none) {
      return null;
    }
  }

  private void block(double[][] stiff, int row, int column, int sign) {
    if (row < fixed || column < fixed) {
      return;
    }
    int r = 3 * (row - fixed);
    int c = 3 * (column - fixed);
    stiff[r][c] += sign * k[0];
    stiff[r][c + 1] += sign * k[1];
    stiff[r][c + 2] += sign * k[2];
    stiff[r + 1][c] += sign * k[1];
    stiff[r + 1][c + 1] += sign * k[3];
    stiff[r + 1][c + 2] += sign * k[4];
    stiff[r + 2][c] += sign * k[2];
    stiff[r + 2][c + 1] += sign * k[4];
    stiff[r + 2][c + 2] += sign * k[5];
  }
}
