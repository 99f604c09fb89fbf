package spanwright.search;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.Collectors;
import spanwright.assess.Placement;

/** Keeps a list from holding ten copies of the same idea. */
final class Variety {
  /** Of placements on the same supports in the same shape, as many come before any other idea. */
  private static final int PER_FAMILY = 2;

  /** What is doubtful comes after everything that is sure, whatever its score. */
  static final Comparator<Placement> BEST_FIRST =
      Comparator.comparing((Placement p) -> !p.reliable())
          .thenComparing(Comparator.comparingDouble(Placement::score).reversed());

  private static final double NEAR_PLAN = 1.5;
  private static final double NEAR_HEIGHT = 0.8;
  private static final double NEAR_LENGTH = 0.1;
  private static final double NEAR_FRACTION = 0.05;

  private Variety() {}

  /**
   * The best placements in order, near copies left out, no family more than twice while others
   * wait.
   */
  static List<Placement> choose(List<Placement> bestFirst, int top) {
    List<Placement> chosen = new ArrayList<>();
    List<Placement> waiting = new ArrayList<>();
    Map<String, Integer> families = new HashMap<>();
    for (Placement placement : bestFirst) {
      if (chosen.stream().anyMatch(other -> same(placement, other))) {
        continue;
      }
      if (families.merge(family(placement), 1, Integer::sum) > PER_FAMILY) {
        waiting.add(placement);
      } else if (chosen.size() < top) {
        chosen.add(placement);
      }
    }
    for (Placement placement : waiting) {
      if (chosen.size() < top && chosen.stream().noneMatch(other -> same(placement, other))) {
        chosen.add(placement);
      }
    }
    chosen.sort(BEST_FIRST);
    return chosen;
  }

  static String family(Placement placement) {
    return placement.shape()
        + ":"
        + placement.attachments().stream()
            .map(Placement.Attachment::on)
            .collect(Collectors.joining("+"));
  }

  private static boolean same(Placement a, Placement b) {
    double la = wire(a);
    double lb = wire(b);
    return a.shape().equals(b.shape())
        && Math.abs(la - lb) < NEAR_LENGTH * Math.max(la, lb)
        && (sameWay(a, b, false) || sameWay(a, b, true));
  }

  /** Whether both hang and are fed alike, the second read from its other end when so asked. */
  private static boolean sameWay(Placement a, Placement b, boolean backwards) {
    int count = a.attachments().size();
    if (count != b.attachments().size()) {
      return false;
    }
    for (int i = 0; i < count; i++) {
      Placement.Attachment one = a.attachments().get(i);
      Placement.Attachment other = b.attachments().get(backwards ? count - 1 - i : i);
      if (!one.on().equals(other.on())
          || one.at().onPlan().distance(other.at().onPlan()) > NEAR_PLAN
          || Math.abs(one.at().z() - other.at().z()) > NEAR_HEIGHT) {
        return false;
      }
    }
    double fraction = b.feed().fraction();
    return Math.abs(a.feed().fraction() - (backwards ? 1 - fraction : fraction)) < NEAR_FRACTION;
  }

  private static double wire(Placement placement) {
    return placement.conductors().stream().mapToDouble(Placement.Conductor::length).sum();
  }
}
