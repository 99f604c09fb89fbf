package spanwright.assess;

import java.util.concurrent.atomic.LongAdder;

/**
 * Counts the linear systems that were filled and factored, for the figures of a search.
 * Thread-safe.
 */
public final class Tally {
  private final LongAdder systems = new LongAdder();
  private final LongAdder unknowns = new LongAdder();

  void add(int unknownsOfOne) {
    systems.increment();
    unknowns.add(unknownsOfOne);
  }

  /** How many systems. */
  public int systems() {
    return systems.intValue();
  }

  /** Unknowns on average. */
  public double meanUnknowns() {
    long count = systems.sum();
    return count == 0 ? 0 : Rounded.tenth((double) unknowns.sum() / count);
  }
}
