package spanwright.clearance;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Locale;
import java.util.Set;
import spanwright.plan.Place;
import spanwright.rigging.Layout;
import spanwright.rigging.Rigged;

/** Refusals with their cures: what is foul, said in words, each with what {@link Trials} found. */
final class Cures {
  private final Clearances clearances;
  private final Layout layout;
  private final Rigged rigged;
  private final List<Clearance> found;
  private final Trials trials;

  Cures(Clearances clearances, Trials trials, Layout layout, Rigged rigged, List<Clearance> found) {
    this.clearances = clearances;
    this.trials = trials;
    this.layout = layout;
    this.rigged = rigged;
    this.found = found;
  }

  /** One thing that is foul. */
  private record Foul(
      String rule,
      String to,
      String what,
      Place at,
      double distance,
      double required,
      String reason,
      String known) {
    String key() {
      return rule + "|" + to;
    }
  }

  List<Refusal> refusals() {
    List<Foul> fouls = fouls();
    List<Refusal> refusals = new ArrayList<>();
    for (int i = 0; i < fouls.size(); i++) {
      List<String> lacks = new ArrayList<>();
      lacks.add(fouls.get(i).reason());
      for (Foul other : fouls) {
        if (other != fouls.get(i)) {
          lacks.add(other.reason());
        }
      }
      refusals.add(refusal(fouls.get(i), lacks));
    }
    return List.copyOf(refusals);
  }

  private List<Foul> fouls() {
    List<Foul> fouls = new ArrayList<>();
    Set<String> told = new HashSet<>();
    for (Clearance each : found) {
      if (each.state() == State.FOUL && told.add(each.rule() + "|" + each.to())) {
        fouls.add(
            new Foul(
                each.rule(),
                each.to(),
                each.what(),
                each.at(),
                each.distance(),
                each.required(),
                Sentences.reason(each, clearances.name(each.to())),
                null));
      }
    }
    for (Rigged.Shortcoming each : rigged.shortcomings()) {
      if (told.add(each.rule() + "|" + each.to())) {
        fouls.add(
            new Foul(
                each.rule(),
                each.to(),
                each.what(),
                each.at(),
                each.found(),
                each.allowed(),
                each.reason(),
                each.cure()));
      }
    }
    return fouls;
  }

  private Refusal refusal(Foul foul, List<String> lacks) {
    Trials.Trial trial = trials.best(foul.key());
    String cure;
    if (trial != null) {
      cure = trials.sentence(trial) + remaining(trial.left().size());
    } else {
      cure =
          (foul.known() == null ? "" : foul.known() + " ")
              + "Nothing tried cures it: an end raised or lowered, a mast, bracket or the feedpoint"
              + " moved, the wire shortened, another hold, or two of these together.";
    }
    List<Layout.Hold> cured =
        trial == null || trial.layout().attachments().equals(layout.attachments())
            ? List.of()
            : trial.layout().attachments();
    return new Refusal(
        layout.attachments().stream().map(Layout.Hold::on).toList(),
        layout.shape(),
        foul.rule(),
        foul.to(),
        foul.what(),
        foul.at(),
        foul.distance(),
        foul.required(),
        foul.reason(),
        cure,
        cured,
        List.of(rigged.conductors().get(0).shapes().calm()),
        trial == null ? null : trial.layout(),
        null,
        lacks);
  }

  private static String remaining(int others) {
    return switch (others) {
      case 0 -> "";
      case 1 -> " One other refusal remains.";
      default -> String.format(Locale.ROOT, " %d other refusals remain.", others);
    };
  }
}
