package spanwright.assess;

import java.util.List;
import spanwright.clearance.Clearance;
import spanwright.clearance.State;
import spanwright.rigging.Layout;
import spanwright.rigging.Rigged;

/**
 * A layout hung and held against every rule.
 *
 * @param layout as chosen
 * @param rigged as it hangs
 * @param clearances every distance, tightest first
 */
public record Hung(Layout layout, Rigged rigged, List<Clearance> clearances) {
  public Hung {
    clearances = List.copyOf(clearances);
  }

  /** The worst of everything checked. */
  public State state() {
    State worst = rigged.shortcomings().isEmpty() ? State.CLEAR : State.FOUL;
    for (Clearance clearance : clearances) {
      worst = worst.worse(clearance.state());
    }
    return worst;
  }

  /** Whether nothing forbids it. */
  public boolean allowed() {
    return state() != State.FOUL;
  }
}
