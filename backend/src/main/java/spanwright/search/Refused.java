package spanwright.search;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import spanwright.assess.Assessor;
import spanwright.assess.Hung;
import spanwright.clearance.Clearance;
import spanwright.clearance.Refusal;
import spanwright.clearance.State;

/**
 * Keeps what was refused: the most promising for every pair of holding points and thing in the way,
 * so that a reader sees each obstacle once for each idea and not a thousand times. Cures are worked
 * out at the end, for those that are kept.
 */
final class Refused {
  /** Refusals in a document. */
  static final int MOST = 40;

  /** Refusals for the same rule and thing. */
  private static final int PER_OBSTACLE = 4;

  private record Kept(Candidate candidate, Hung hung) {}

  private final Map<String, Kept> byIdea = new LinkedHashMap<>();

  /** Offers one; call in the order of the candidates, best promise first. */
  void offer(Candidate candidate, Hung hung) {
    String idea = candidate.family() + "/" + obstacle(hung);
    byIdea.putIfAbsent(idea, new Kept(candidate, hung));
  }

  private static String obstacle(Hung hung) {
    for (Clearance clearance : hung.clearances()) {
      if (clearance.state() == State.FOUL) {
        return clearance.rule() + ":" + clearance.to();
      }
    }
    return hung.rigged().shortcomings().isEmpty()
        ? ""
        : hung.rigged().shortcomings().get(0).rule()
            + ":"
            + hung.rigged().shortcomings().get(0).to();
  }

  /** The refusals of a document, with their cures. */
  List<Refusal> list(Assessor assessor) {
    List<Refusal> refusals = new ArrayList<>();
    Map<String, Integer> perObstacle = new LinkedHashMap<>();
    Set<String> said = new HashSet<>();
    for (Map.Entry<String, Kept> entry : byIdea.entrySet()) {
      String obstacle = obstacle(entry.getValue().hung);
      if (refusals.size() >= MOST || perObstacle.merge(obstacle, 1, Integer::sum) > PER_OBSTACLE) {
        continue;
      }
      for (Refusal refusal : assessor.refuse(entry.getValue().hung)) {
        boolean first = said.add(refusal.attachments() + refusal.rule() + refusal.to());
        if (first && refusals.size() < MOST) {
          refusals.add(refusal);
          break;
        }
      }
    }
    return refusals;
  }
}
