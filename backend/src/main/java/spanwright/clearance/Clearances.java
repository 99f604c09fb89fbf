package spanwright.clearance;

import java.util.List;
import spanwright.plan.Catalogue;
import spanwright.plan.Plan;
import spanwright.rigging.Layout;
import spanwright.rigging.Rigged;

/**
 * What stands in the way on a plan. Prepared once for a plan; immutable and safe for any number of
 * threads.
 */
public final class Clearances {
  private Clearances(Plan plan, Catalogue catalogue) {}

  /** Prepares a plan: solids, crowns, zones, lines, boundary. */
  public static Clearances of(Plan plan, Catalogue catalogue) {
    return new Clearances(plan, catalogue);
  }

  /**
   * Every distance of a hung layout held against its rule, tightest first: foul, then tight, then
   * clear. Each overhead line has one at least, however far.
   */
  public List<Clearance> check(Rigged rigged) {
    throw new UnsupportedOperationException("in work");
  }

  /**
   * A cheap look at a layout before it is hung. False means it fouls something by so much that no
   * sag, wind or small shift would change it; true promises nothing.
   */
  public boolean screen(Layout layout) {
    throw new UnsupportedOperationException("in work");
  }

  /**
   * A refusal for each thing that is foul and each shortcoming of the rigging, with the smallest
   * change that cures it, found by calculation and checked again. Empty when nothing is foul.
   */
  public List<Refusal> refuse(Layout layout, Rigged rigged, List<Clearance> clearances) {
    throw new UnsupportedOperationException("in work");
  }
}
