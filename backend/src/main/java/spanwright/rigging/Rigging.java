package spanwright.rigging;

import spanwright.plan.Catalogue;
import spanwright.plan.Plan;

/**
 * Hangs layouts on a plan. Prepared once for a plan; immutable and safe for any number of threads.
 */
public final class Rigging {
  private Rigging(Plan plan, Catalogue catalogue) {}

  /** Prepares a plan. */
  public static Rigging of(Plan plan, Catalogue catalogue) {
    return new Rigging(plan, catalogue);
  }

  /** Hangs one layout: {@code of(plan, catalogue).hang(layout)}. */
  public static Rigged hang(Plan plan, Catalogue catalogue, Layout layout) {
    return of(plan, catalogue).hang(layout);
  }

  /**
   * Hangs a layout, calm and in the design gust.
   *
   * @throws IllegalArgumentException with a sentence when the layout makes no sense: an unknown id,
   *     fewer than two attachments, a wire without length
   */
  public Rigged hang(Layout layout) {
    throw new UnsupportedOperationException("in work");
  }

  /**
   * The calm shape alone, for screening: as {@link #hang(Layout)}, but the blown shapes are the
   * calm ones again and pulls in wind are the calm pulls.
   */
  public Rigged hangCalm(Layout layout) {
    throw new UnsupportedOperationException("in work");
  }

  /**
   * The shortest rope between a holding point and the wire's end that keeps the end out of the
   * foliage of what holds it [m].
   *
   * @param on id of a support, bracket line or mast zone
   * @param height of the holding point above the ground there [m]
   */
  public double leastTail(String on, double height) {
    throw new UnsupportedOperationException("in work");
  }
}
