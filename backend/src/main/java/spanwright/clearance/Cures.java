package spanwright.clearance;

import java.util.List;
import spanwright.rigging.Layout;
import spanwright.rigging.Rigged;
import spanwright.rigging.Rigging;

/** Refusals with their cures. */
final class Cures {
  Cures(
      Clearances clearances,
      Rigging rigging,
      Layout layout,
      Rigged rigged,
      List<Clearance> found) {}

  List<Refusal> refusals() {
    return List.of();
  }
}
