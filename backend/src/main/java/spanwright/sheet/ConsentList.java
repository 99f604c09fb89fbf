package spanwright.sheet;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import spanwright.assess.Placement;
import spanwright.clearance.State;
import spanwright.plan.Consent;
import spanwright.plan.MastZone;

/** What a consent buys: the best placement of a search for each set of consents, side by side. */
final class ConsentList {
  static final String NOTHING = "no consent";

  private ConsentList() {}

  /** Best first; empty when no mast zone of the plan speaks of a consent. */
  static List<WorkParts.Alternative> of(Job job, List<Placement> others) {
    boolean asked =
        job.plan.mastZones().stream()
            .flatMap(z -> z.consents().stream())
            .anyMatch(c -> !isNone(c.needs()));
    if (!asked) {
      return List.of();
    }
    Map<String, Placement> best = new LinkedHashMap<>();
    Stream.concat(Stream.of(job.placement), others.stream())
        .filter(p -> p.state() != State.FOUL || p == job.placement)
        .filter(p -> Double.isFinite(p.score()))
        .forEach(p -> best.merge(needs(p), p, (a, b) -> b.score() > a.score() ? b : a));
    best.put(needs(job.placement), job.placement);
    List<WorkParts.Alternative> rows = new ArrayList<>();
    best.forEach((needs, p) -> rows.add(row(job, needs, p)));
    rows.sort(Comparator.comparingDouble(WorkParts.Alternative::score).reversed());
    return rows;
  }

  private static WorkParts.Alternative row(Job job, String needs, Placement p) {
    return new WorkParts.Alternative(
        needs,
        p.masts().stream().map(Placement.NewMast::height).toList(),
        p.masts().stream().map(m -> job.name(m.zone())).distinct().toList(),
        p.id(),
        p.shape(),
        p.score(),
        p == job.placement);
  }

  /** The consents a placement's masts need, in words. */
  static String needs(Placement placement) {
    String all =
        placement.masts().stream()
            .map(Placement.NewMast::consent)
            .filter(c -> !isNone(c))
            .distinct()
            .sorted()
            .collect(Collectors.joining(" and "));
    return all.isEmpty() ? NOTHING : all;
  }

  private static boolean isNone(String needs) {
    return needs == null || needs.isBlank() || needs.strip().equalsIgnoreCase("none");
  }

  /** What the consent of this placement buys over the best without any, or why it is not known. */
  static List<String> say(Job job, List<WorkParts.Alternative> rows) {
    if (rows.isEmpty()) {
      return List.of();
    }
    List<String> say = new ArrayList<>();
    Optional<WorkParts.Alternative> free =
        rows.stream().filter(r -> r.needs().equals(NOTHING)).findFirst();
    for (WorkParts.Alternative row : rows) {
      if (row.needs().equals(NOTHING) || free.isEmpty()) {
        continue;
      }
      double more = row.score() - free.get().score();
      say.add(
          capital(masts(job, row))
              + " with "
              + row.needs()
              + (more >= 0 ? " buys " : " loses ")
              + Figures.fixed(Math.abs(more), 1)
              + " dB over "
              + masts(job, free.get())
              + " without.");
    }
    if (free.isEmpty()) {
      say.add(
          "No placement at hand does without a consent: search once more with lower masts, or none,"
              + " to see what the consent buys.");
    }
    for (MastZone zone : job.plan.mastZones()) {
      if (!zone.consents().isEmpty()) {
        say.add(job.name(zone.id()) + ": " + limits(job, zone) + ".");
      }
    }
    return say;
  }

  private static String masts(Job job, WorkParts.Alternative row) {
    return row.mastHeights().isEmpty()
        ? "no mast"
        : (row.mastHeights().size() > 1 ? "masts of " : "a mast of ")
            + row.mastHeights().stream()
                .map(job.figures::sayHeight)
                .collect(Collectors.joining(" and "));
  }

  private static String limits(Job job, MastZone zone) {
    return zone.consents().stream()
        .sorted(Comparator.comparingDouble(Consent::highest))
        .map(
            c ->
                "to "
                    + job.figures.sayHeight(c.highest())
                    + " "
                    + (isNone(c.needs()) ? "without consent" : c.needs()))
        .collect(Collectors.joining(", "));
  }

  private static String capital(String text) {
    return Character.toUpperCase(text.charAt(0)) + text.substring(1);
  }
}
