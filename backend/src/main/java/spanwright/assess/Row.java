package spanwright.assess;

import java.util.List;
import spanwright.moments.Directions;
import spanwright.path.Windows;
import spanwright.plan.Band;
import spanwright.plan.Target;

/**
 * One frequency of one band with everything about it that no placement changes.
 *
 * @param band of the brief
 * @param bandIndex in the brief
 * @param frequencyMHz of the row
 * @param middle whether it is the band's middle frequency
 * @param looks one for each target that counts on the band
 * @param sought directions of all looks' windows, one look after the other
 * @param drawn directions of the reach rose and then of each look's profile; on the middle
 *     frequency only, else null
 * @param roseElevation degrees up
 * @param roseReferenceDbi the reference at that elevation
 */
record Row(
    Band band,
    int bandIndex,
    double frequencyMHz,
    boolean middle,
    List<Look> looks,
    Directions sought,
    Directions drawn,
    double roseElevation,
    double roseReferenceDbi) {

  /**
   * One target as the field solver sees it.
   *
   * @param target of the brief
   * @param targetIndex in the brief
   * @param bearing degrees from true north, or null when every azimuth counts alike
   * @param windows take-off windows
   * @param directions the scored window's directions in the solver's frame
   * @param referenceDbi of the reference vertical, averaged over the same window
   */
  record Look(
      Target target,
      int targetIndex,
      Double bearing,
      Windows windows,
      Directions directions,
      double referenceDbi) {}
}
