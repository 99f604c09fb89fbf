package spanwright.search;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashMap;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.TreeSet;
import spanwright.assess.Assessor;
import spanwright.assess.Hung;
import spanwright.clearance.Clearance;
import spanwright.clearance.Refusal;
import spanwright.clearance.State;
import spanwright.plan.Place;
import spanwright.rigging.Layout;

/**
 * Keeps what was refused: the most promising for every idea and thing in the way, so that a reader
 * sees each obstacle once for each idea and not a thousand times. Cures are worked out at the end,
 * for those that are kept: each costs dozens of hangings.
 */
final class Refused {
  /** Refusals for the same rule and thing. */
  private static final int PER_OBSTACLE = 4;

  /** The nearest misses told when nothing at all is allowed. */
  private static final int MISSES = 3;

  /**
   * One kept.
   *
   * @param lacks what it lacks in all: metres, or shares of what is allowed
   */
  private record Kept(Hung hung, String obstacle, int fouls, double lacks) {
    boolean isNearer(Kept other) {
      return fouls < other.fouls || fouls == other.fouls && lacks < other.lacks;
    }
  }

  private final Map<String, Kept> byIdea = new LinkedHashMap<>();

  /** Offers one; call in the order of the candidates, best promise first. */
  void offer(Candidate candidate, Hung hung) {
    Set<String> fouls = new TreeSet<>();
    String first = null;
    double lacks = 0;
    for (Clearance clearance : hung.clearances()) {
      if (clearance.state() == State.FOUL) {
        first = first == null ? clearance.rule() + ":" + clearance.to() : first;
        if (fouls.add(clearance.rule() + ":" + clearance.to())) {
          lacks += clearance.required() - clearance.distance();
        }
      }
    }
    for (var shortcoming : hung.rigged().shortcomings()) {
      String what = shortcoming.rule() + ":" + shortcoming.to();
      first = first == null ? what : first;
      if (fouls.add(what)) {
        double allowed = Math.max(1, Math.abs(shortcoming.allowed()));
        lacks += Math.abs(shortcoming.found() - shortcoming.allowed()) / allowed;
      }
    }
    if (first != null) {
      Kept kept = new Kept(hung, first, fouls.size(), lacks);
      byIdea.merge(candidate.family() + "/" + first, kept, (a, b) -> b.isNearer(a) ? b : a);
    }
  }

  /**
   * The refusals of a document, with their cures: first those that least stands in the way of.
   *
   * @param misses whether nothing at all is allowed, so that the nearest are told as such
   */
  List<Refusal> list(Assessor assessor, Workers workers, int most, boolean misses) {
    List<Kept> ordered = new ArrayList<>(byIdea.values());
    ordered.sort(Comparator.comparingInt(Kept::fouls).thenComparingDouble(Kept::lacks));
    Map<String, Integer> perObstacle = new HashMap<>();
    List<Kept> chosen = new ArrayList<>();
    for (Kept kept : ordered) {
      boolean near = misses && chosen.size() < MISSES;
      boolean few = perObstacle.merge(kept.obstacle, 1, Integer::sum) <= PER_OBSTACLE;
      if (near || few && chosen.size() < most) {
        chosen.add(kept);
      }
    }
    List<Optional<Refusal>> found =
        workers.map(
            chosen,
            kept -> assessor.refuse(assessor.told(kept.hung)).stream().findFirst(),
            () -> {});
    Set<String> said = new HashSet<>();
    List<Refusal> refusals = new ArrayList<>();
    for (Optional<Refusal> refusal : found) {
      refusal
          .filter(r -> said.add(r.attachments() + r.shape() + r.rule() + r.to()))
          .map(r -> misses && refusals.size() < MISSES ? r.missing(refusals.size() + 1) : r)
          .ifPresent(r -> refusals.add(rounded(r)));
    }
    return refusals;
  }

  private static Refusal rounded(Refusal r) {
    return new Refusal(
        r.attachments(),
        r.shape(),
        r.rule(),
        r.to(),
        r.what(),
        rounded(r.at()),
        millimetres(r.distance()),
        millimetres(r.required()),
        r.reason(),
        r.cure(),
        r.cured().stream().map(hold -> new Layout.Hold(hold.on(), rounded(hold.at()))).toList(),
        r.wire().stream().map(points -> points.stream().map(Refused::rounded).toList()).toList(),
        r.after(),
        r.miss(),
        r.lacks());
  }

  private static Place rounded(Place p) {
    return new Place(millimetres(p.x()), millimetres(p.y()), millimetres(p.z()));
  }

  private static double millimetres(double metres) {
    return Math.round(metres * 1000) / 1000.0 + 0.0;
  }
}
