package spanwright.rigging;

import java.util.Arrays;
import org.apache.commons.math3.analysis.UnivariateFunction;
import org.apache.commons.math3.analysis.solvers.AllowedSolution;
import org.apache.commons.math3.analysis.solvers.BracketingNthOrderBrentSolver;

/**
 * Brings a chain to a given pull at one end by changing a length in it; or solves it as long as it
 * is, also when it is so tight that its slack is lost in the digits of its length.
 *
 * <p>The measure of length here is the slack: what the chain, stretched by the pull, has more than
 * the chord. For a tight chain slack = ∫Q²ds / 2T², Q being the part of the loads' running sum that
 * lies across the chord, less its mean (the shear of a beam on the same chord); so 1/T² is nearly
 * straight in the slack, and a bracketed solver arrives in a few steps.
 */
final class Tightening {
  /** Below this slack for each metre of chord the beam's statics are exact to the ninth digit. */
  private static final double TIGHT = 1e-9;

  private final Chain chain;
  private final double dx;
  private final double dy;
  private final double dz;
  private final double chord;
  private final double[] unit;
  private final double[] mean = new double[3];

  Tightening(Chain chain, double dx, double dy, double dz) {
    this.chain = chain;
    this.dx = dx;
    this.dy = dy;
    this.dz = dz;
    chord = Math.sqrt(dx * dx + dy * dy + dz * dz);
    unit = new double[] {dx / chord, dy / chord, dz / chord};
  }

  /** Sets the length that can be changed so that the chain has a slack [m] under the pull. */
  interface Adjust {
    void slack(double slack);
  }

  /**
   * Changes the length until the tension at an end is the pull.
   *
   * @return the slack, or NaN when even the loosest chain pulls more than that
   */
  double toPull(double pull, boolean atEnd, Adjust adjust) {
    adjust.slack(0);
    double guess = beamEnergy() / (2 * pull * pull);
    if (guess < TIGHT * chord && isStiff()) {
      adjust.slack(guess);
      beamStart(pull, atEnd);
      return guess;
    }
    guess = Math.max(guess, 1e-12 * chord);
    double target = 1 / (pull * pull);
    guessStart(pull);
    UnivariateFunction excess =
        slack -> {
          if (slack == 0 && isStiff()) {
            return -target;
          }
          adjust.slack(slack);
          chain.solve(dx, dy, dz);
          double tension = atEnd ? chain.tensionAtEnd() : chain.tensionAtStart();
          return 1 / (tension * tension) - target;
        };
    double high = 1.02 * guess;
    double value = excess.value(high);
    double low = value > 0 ? 0.98 * guess : high;
    while (value <= 0) {
      double before = value;
      low = high;
      high *= 1.5;
      value = excess.value(high);
      if (high > 20 * chord || (value < before && high > 0.05 * chord)) {
        return Double.NaN;
      }
    }
    // Where the pull is set at the higher end the rest stretches less: the slack may be below 0.
    double down = 0.1 * guess;
    while ((low != 0 || !isStiff()) && excess.value(low) > 0) {
      high = low;
      low = isStiff() && low < 1e-3 * guess ? 0 : low - down;
      low = isStiff() ? Math.max(0, low) : low;
      down *= 2;
      if (low < -0.9 * chord) {
        return Double.NaN;
      }
    }
    double slack =
        new BracketingNthOrderBrentSolver(1e-13, 1e-16, 1e-10 * target, 5)
            .solve(100, excess, low, high, AllowedSolution.ANY_SIDE);
    excess.value(slack);
    return slack;
  }

  /**
   * Solves the chain as long as it is.
   *
   * @param slack what it has more than the chord before it stretches, known better than its length
   *     tells
   * @return false when it is too short for the chord and does not stretch
   */
  boolean asLong(double slack) {
    double energy = beamEnergy();
    if (slack < TIGHT * chord && isStiff()) {
      if (slack <= 0) {
        return false;
      }
      beamStart(Math.sqrt(energy / (2 * slack)), true);
      return true;
    }
    guessStart(tightTension(energy, slack));
    double gap = chain.solve(dx, dy, dz);
    return gap < 1e-6 * (chord + chain.totalLength());
  }

  /** The tension of a tight chain from its slack and stretch: slack + stretch·T = energy/2T². */
  private double tightTension(double energy, double slack) {
    double stretch = 0;
    for (int i = 0; i < chain.pieces; i++) {
      stretch += chain.flexibility[i] * chain.length[i];
    }
    double tension = Math.sqrt(energy / (2 * Math.max(slack, 1e-9 * chord)));
    for (int i = 0; i < 60 && stretch > 0 && tension > 0; i++) {
      double value = slack + stretch * tension - energy / (2 * tension * tension);
      double rate = stretch + energy / (tension * tension * tension);
      double next = Math.max(tension - value / rate, tension / 4);
      boolean near = Math.abs(next - tension) < 1e-3 * tension;
      tension = next;
      if (near) {
        break;
      }
    }
    return Math.max(tension, 1e-9);
  }

  private boolean isStiff() {
    for (int i = 0; i < chain.pieces; i++) {
      if (chain.flexibility[i] > 0 && chain.length[i] > 0) {
        return false;
      }
    }
    return true;
  }

  /** ∫Q²ds of the beam on the chord, pieces laid along it; leaves the mean load sum behind. */
  private double beamEnergy() {
    gatherMean();
    double[] sum = new double[3];
    double square = 0;
    for (int i = 0; i < chain.pieces; i++) {
      double s = chain.length[i];
      double middleAlong = 0;
      double loadAlong = 0;
      double all = 0;
      for (int k = 0; k < 3; k++) {
        double p = chain.load[3 * i + k];
        double middle = sum[k] + p * s / 2 - mean[k];
        all += middle * middle + p * p * s * s / 12;
        middleAlong += middle * unit[k];
        loadAlong += p * unit[k];
        sum[k] += p * s + chain.point[3 * i + k];
      }
      square += s * (all - middleAlong * middleAlong - loadAlong * loadAlong * s * s / 12);
    }
    return Math.max(0, square);
  }

  private void gatherMean() {
    Arrays.fill(mean, 0);
    double total = chain.totalLength();
    double[] sum = new double[3];
    for (int i = 0; i < chain.pieces; i++) {
      double s = chain.length[i];
      for (int k = 0; k < 3; k++) {
        mean[k] += (sum[k] + chain.load[3 * i + k] * s / 2) * s / total;
        sum[k] += chain.load[3 * i + k] * s + chain.point[3 * i + k];
      }
    }
  }

  /** A start of the given tension along the chord, with the beam's reaction across it. */
  private void guessStart(double tension) {
    double along = mean[0] * unit[0] + mean[1] * unit[1] + mean[2] * unit[2];
    for (int k = 0; k < 3; k++) {
      chain.start[k] = tension * unit[k] + mean[k] - along * unit[k];
    }
  }

  /** The start of a tight chain whose tension at an end is the pull. */
  private void beamStart(double pull, boolean atEnd) {
    double[] sum = new double[3];
    for (int i = 0; i < chain.pieces; i++) {
      boolean last = i == chain.pieces - 1;
      for (int k = 0; k < 3; k++) {
        sum[k] += chain.load[3 * i + k] * chain.length[i] + (last ? 0 : chain.point[3 * i + k]);
      }
    }
    double along = mean[0] * unit[0] + mean[1] * unit[1] + mean[2] * unit[2];
    double drop = sum[0] * unit[0] + sum[1] * unit[1] + sum[2] * unit[2];
    double axial = atEnd ? pull + drop : pull;
    for (int k = 0; k < 3; k++) {
      chain.start[k] = axial * unit[k] + mean[k] - along * unit[k];
      chain.end()[k] = chain.start[k] - sum[k];
    }
  }
}
