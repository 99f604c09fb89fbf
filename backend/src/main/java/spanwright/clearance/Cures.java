package spanwright.clearance;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Locale;
import java.util.Set;
import spanwright.plan.GroundSurface;
import spanwright.plan.Place;
import spanwright.rigging.Holder;
import spanwright.rigging.Layout;
import spanwright.rigging.Rigged;
import spanwright.rigging.Rigging;

/**
 * Refusals with their cures. A cure is found by trying: an end raised or lowered, a mast or bracket
 * or feedpoint moved, the wire shortened, a lighter wire; each is hung and checked like any
 * placement. The smallest that leaves nothing foul is the cure; where there is none, the smallest
 * that at least mends this and spoils nothing else, and the cure says that others remain.
 */
final class Cures {
  private static final String LINE = Strand.Part.FEED_LINE.word;
  private static final double FINEST = 0.05;
  private static final double ENOUGH = 2;

  private final Clearances clearances;
  private final Rigging rigging;
  private final GroundSurface ground;
  private final Layout layout;
  private final Rigged rigged;
  private final List<Clearance> found;
  private final List<Holder> holders = new ArrayList<>();
  private final Set<String> fouls;
  private final List<Trial> trials = new ArrayList<>();

  Cures(
      Clearances clearances,
      Rigging rigging,
      GroundSurface ground,
      Layout layout,
      Rigged rigged,
      List<Clearance> found) {
    this.clearances = clearances;
    this.rigging = rigging;
    this.ground = ground;
    this.layout = layout;
    this.rigged = rigged;
    this.found = found;
    rigged.attachments().forEach(each -> holders.add(rigging.holderOf(each.on())));
    fouls = fouls(rigged, found);
  }

  /**
   * A change tried.
   *
   * @param change what
   * @param holds the attachments after it
   * @param left what is foul after it
   */
  private record Trial(Change change, List<Layout.Hold> holds, Set<String> left) {}

  private static Set<String> fouls(Rigged rigged, List<Clearance> found) {
    Set<String> fouls = new HashSet<>();
    for (Clearance each : found) {
      if (each.state() == State.FOUL) {
        fouls.add(each.rule() + "|" + each.to());
      }
    }
    rigged.shortcomings().forEach(each -> fouls.add(each.rule() + "|" + each.to()));
    return fouls;
  }

  List<Refusal> refusals() {
    List<Refusal> refusals = new ArrayList<>();
    if (fouls.isEmpty()) {
      return refusals;
    }
    tryAll();
    Set<String> told = new HashSet<>();
    for (Clearance each : found) {
      if (each.state() == State.FOUL && told.add(each.rule() + "|" + each.to())) {
        refusals.add(
            refusal(
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
        refusals.add(
            refusal(
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
    return List.copyOf(refusals);
  }

  // --- trying

  private void tryAll() {
    boolean pulls =
        rigged.shortcomings().stream()
            .anyMatch(each -> each.rule().endsWith("pull") || each.rule().endsWith("strength"));
    List<String> lighter =
        pulls ? rigging.lighterWires(rigged.conductors().get(0).wire()) : List.of();
    Set<String> open = new HashSet<>(fouls);
    boolean line =
        found.stream().anyMatch(each -> each.state() == State.FOUL && each.what().equals(LINE));
    for (Change change : Change.all(holders, line, lighter)) {
      Trial trial = attempt(change);
      if (trial == null) {
        continue;
      }
      trials.add(trial);
      if (trial.left().isEmpty()) {
        // Smallest first: nothing later can be a smaller cure of all there is.
        break;
      }
      if (fouls.containsAll(trial.left())) {
        open.retainAll(trial.left());
      }
      if (open.isEmpty() && change.amount() >= ENOUGH) {
        // Each has a cure of its own; one for all of them would be a different placement.
        break;
      }
    }
  }

  private Trial attempt(Change change) {
    List<Layout.Hold> holds = change.holds(layout.attachments(), holders, ground);
    Layout changed = holds == null ? null : change.layout(rigged, holds, leastTails());
    if (changed == null) {
      return null;
    }
    try {
      Rigged hung = rigging.hang(changed);
      return new Trial(change, holds, fouls(hung, clearances.check(hung)));
    } catch (IllegalArgumentException cannotHang) {
      // A change that leaves nothing to hang is no cure.
      return null;
    }
  }

  private double[] leastTails() {
    int last = holders.size() - 1;
    return new double[] {
      rigging.leastTail(holders.get(0).id(), rigged.attachments().get(0).aboveGround()),
      rigging.leastTail(holders.get(last).id(), rigged.attachments().get(last).aboveGround())
    };
  }

  private Trial best(String foul) {
    Trial best = null;
    for (Trial each : trials) {
      boolean mends = !each.left().contains(foul) && fouls.containsAll(each.left());
      if (mends && each.left().isEmpty()) {
        return finest(each, foul);
      }
      if (mends && best == null) {
        best = each;
      }
    }
    return best == null ? null : finest(best, foul);
  }

  /** Halves the way back to the last step that did not do, then rounds up and looks once more. */
  private Trial finest(Trial trial, String foul) {
    if (trial.change().kind() == Change.Kind.LIGHTEN) {
      return trial;
    }
    double low = 0;
    for (Trial each : trials) {
      boolean smaller = each.change().amount() < trial.change().amount();
      if (smaller && each.change().isOneOf(trial.change())) {
        low = Math.max(low, each.change().amount());
      }
    }
    Trial kept = trial;
    double high = trial.change().amount();
    while (high - low > FINEST * 1.5) {
      double middle = Math.ceil((low + high) / 2 / FINEST - 1e-9) * FINEST;
      if (middle >= high - 1e-9) {
        break;
      }
      Trial between = attempt(trial.change().by(middle));
      boolean mends =
          between != null
              && !between.left().contains(foul)
              && (trial.left().isEmpty()
                  ? between.left().isEmpty()
                  : fouls.containsAll(between.left()));
      if (mends) {
        kept = between;
        high = middle;
      } else {
        low = middle;
      }
    }
    return kept;
  }

  // --- telling

  private Refusal refusal(
      String rule,
      String to,
      String what,
      Place at,
      double distance,
      double required,
      String reason,
      String known) {
    Trial trial = best(rule + "|" + to);
    String cure;
    List<Layout.Hold> cured = List.of();
    if (trial != null) {
      cure = trial.change().sentence(trial.holds(), holders, ground);
      if (!trial.left().isEmpty()) {
        cure += String.format(Locale.ROOT, " %d other refusals remain.", trial.left().size());
        cure = cure.replace(" 1 other refusals remain.", " One other refusal remains.");
      }
      cured = trial.holds().equals(layout.attachments()) ? List.of() : trial.holds();
    } else if (known != null) {
      cure = known;
    } else {
      cure =
          "Nothing tried cures it: an end raised or lowered, a mast, bracket or the feedpoint"
              + " moved, the wire shortened.";
    }
    return new Refusal(
        layout.attachments().stream().map(Layout.Hold::on).toList(),
        layout.shape(),
        rule,
        to,
        what,
        at,
        distance,
        required,
        reason,
        cure,
        cured,
        List.of(rigged.conductors().get(0).shapes().calm()));
  }
}
