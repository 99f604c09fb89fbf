package spanwright.search;

import java.util.List;
import spanwright.plan.Point;

/**
 * Somewhere a wire can be held.
 *
 * @param on id of the support, bracket line or mast zone
 * @param at its place on the plan
 * @param ground height of the ground there above the plan's zero [m]
 * @param lowest lowest height for a rope, above the ground there [m]
 * @param highest highest, likewise
 * @param heights heights to try, above the ground there, highest first [m]
 * @param newMast whether a mast must be built for it
 * @param takesWire whether a wire may be held right there (a rope-only support takes none)
 * @param crowned whether it stands in a crown, so that only a rope reaches it
 */
record HoldSite(
    String on,
    Point at,
    double ground,
    double lowest,
    double highest,
    List<Double> heights,
    boolean newMast,
    boolean takesWire,
    boolean crowned) {
  HoldSite {
    heights = List.copyOf(heights);
  }

  /** Whether a rope can be fixed at a height above the plan's zero [m]. */
  boolean reaches(double z) {
    return z >= ground + lowest - 1e-9 && z <= ground + highest + 1e-9;
  }
}
