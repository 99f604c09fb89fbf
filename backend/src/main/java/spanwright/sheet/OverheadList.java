package spanwright.sheet;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import spanwright.clearance.Clearance;
import spanwright.clearance.State;
import spanwright.plan.OverheadLine;
import spanwright.plan.Place;

/** The overhead lines of the plan with what the placement keeps from each: first on every sheet. */
final class OverheadList {
  /** How a clearance to an overhead line comes about. */
  enum Regime {
    AS_IT_HANGS,
    WIRE_LETS_GO,
    MAST_FALLS
  }

  private OverheadList() {}

  static OverheadParts.Overhead of(Job job) {
    if (job.plan.overheadLines().isEmpty()) {
      return new OverheadParts.Overhead(
          List.of(
              "No overhead line is on the plan: look again on site, up and to every side, before"
                  + " anything is raised. Treat every line you find as live, and stop until it is"
                  + " on the plan."),
          List.of());
    }
    List<OverheadParts.Line> lines = new ArrayList<>();
    for (OverheadLine line : job.plan.overheadLines()) {
      lines.add(line(job, line));
    }
    lines.sort(
        Comparator.comparing((OverheadParts.Line l) -> !countsWhenThingsFall(l))
            .thenComparingDouble(
                l -> l.nearest() == null ? Double.NEGATIVE_INFINITY : l.nearest().distance()));
    return new OverheadParts.Overhead(
        List.of(
            "Treat every line as live. Check these distances on site, by eye and by laser from the"
                + " ground, never by a pole or a rope, before anything is raised. The line's owner"
                + " and the local code decide."),
        lines);
  }

  private static OverheadParts.Line line(Job job, OverheadLine line) {
    OverheadParts.Reach nearest = worst(job, line.id(), Regime.AS_IT_HANGS);
    return new OverheadParts.Line(
        line.id(),
        job.name(line.id()),
        kind(line),
        line.path().stream().mapToDouble(Place::z).min().orElse(0),
        line.path().stream().mapToDouble(Place::z).max().orElse(0),
        nearest != null ? Double.valueOf(nearest.required()) : line.clearance(),
        nearest,
        worst(job, line.id(), Regime.WIRE_LETS_GO),
        worst(job, line.id(), Regime.MAST_FALLS),
        authority(line));
  }

  private static String authority(OverheadLine line) {
    if (line.authorisedBy() == null || line.authorisedOn() == null) {
      return null;
    }
    return line.authorisedBy() + ", " + line.authorisedOn();
  }

  /** The word of the plan format. */
  static String kind(OverheadLine line) {
    return line.kind().name().toLowerCase(Locale.ROOT).replace('_', '-');
  }

  /** The rule of a clearance tells how it comes about. */
  static Regime regime(Clearance clearance) {
    return switch (clearance.rule()) {
      case "wire-let-go" -> Regime.WIRE_LETS_GO;
      case "mast-let-go" -> Regime.MAST_FALLS;
      default -> Regime.AS_IT_HANGS;
    };
  }

  private static OverheadParts.Reach worst(Job job, String line, Regime regime) {
    return job.placement.clearances().stream()
        .filter(c -> c.to().equals(line) && regime(c) == regime)
        .max(
            Comparator.comparing(Clearance::state)
                .thenComparingDouble(c -> c.required() - c.distance()))
        .map(c -> new OverheadParts.Reach(c.what(), c.distance(), c.required(), c.state()))
        .orElse(null);
  }

  /** Whether a line is asked about when wires and masts let go. */
  static boolean countsWhenThingsFall(OverheadParts.Line line) {
    return !line.kind().equals("telephone");
  }

  /** The worst state of a line over the three rules. */
  static State state(OverheadParts.Line line) {
    State state = State.CLEAR;
    for (OverheadParts.Reach reach :
        new OverheadParts.Reach[] {line.nearest(), line.wireLetGo(), line.mastFalls()}) {
      state = reach == null ? state : state.worse(reach.state());
    }
    return line.nearest() == null ? State.FOUL : state;
  }
}
