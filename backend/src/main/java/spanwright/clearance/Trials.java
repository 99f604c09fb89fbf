package spanwright.clearance;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import java.util.function.Function;
import spanwright.plan.GroundSurface;
import spanwright.rigging.Holder;
import spanwright.rigging.Layout;
import spanwright.rigging.Rigged;
import spanwright.rigging.Rigging;

/**
 * Changes to a refused layout, tried: an end raised or lowered, a mast or bracket or feedpoint
 * moved, the wire shortened, a lighter wire, another thing to hold an end, and where no one of them
 * is enough two together. Each is hung and checked like any placement. The smallest that leaves
 * nothing foul is the cure of everything; else the smallest that mends a thing and spoils nothing
 * is the cure of that thing.
 */
final class Trials {
  private static final String LINE = Strand.Part.FEED_LINE.word;
  private static final double FINEST = 0.05;
  private static final double ENOUGH = 2;

  /** Other holds tried at most. */
  private static final int HOLDS = 10;

  /** Pairs hung at most. */
  private static final int PAIRS = 24;

  /** With more foul than this two changes are not asked for: it would be another placement. */
  private static final int MANY = 5;

  private final Clearances clearances;
  private final Rigging rigging;
  private final GroundSurface ground;
  private final Layout layout;
  private final Rigged rigged;
  private final Function<String, Holder> holder;
  private final Set<String> fouls;
  private final List<Trial> trials = new ArrayList<>();

  /**
   * Something tried.
   *
   * @param changes what, one after the other
   * @param layout after them
   * @param left what is foul after them
   */
  record Trial(List<Change> changes, Layout layout, Set<String> left) {
    double amount() {
      return changes.stream().mapToDouble(Change::amount).sum();
    }
  }

  Trials(
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
    holder = rigging::holderOf;
    fouls = fouls(rigged, found);
    if (!fouls.isEmpty()) {
      boolean line =
          found.stream().anyMatch(each -> each.state() == State.FOUL && each.what().equals(LINE));
      if (!single(line) && !anotherHold() && fouls.size() <= MANY) {
        together();
      }
    }
  }

  static Set<String> fouls(Rigged rigged, List<Clearance> found) {
    Set<String> fouls = new HashSet<>();
    for (Clearance each : found) {
      if (each.state() == State.FOUL) {
        fouls.add(each.rule() + "|" + each.to());
      }
    }
    rigged.shortcomings().forEach(each -> fouls.add(each.rule() + "|" + each.to()));
    return fouls;
  }

  // --- trying

  /** Each change alone, smallest first; true when one leaves nothing foul. */
  private boolean single(boolean line) {
    boolean pulls =
        rigged.shortcomings().stream()
            .anyMatch(each -> each.rule().endsWith("pull") || each.rule().endsWith("strength"));
    List<String> lighter =
        pulls ? rigging.lighterWires(rigged.conductors().get(0).wire()) : List.of();
    List<Holder> holders =
        layout.attachments().stream().map(each -> holder.apply(each.on())).toList();
    Set<String> open = new HashSet<>(fouls);
    for (Change change : Change.all(holders, line, lighter)) {
      Trial trial = attempt(List.of(change));
      if (trial == null) {
        continue;
      }
      trials.add(trial);
      if (trial.left().isEmpty()) {
        // Smallest first: nothing later can be a smaller cure of all there is.
        return true;
      }
      if (fouls.containsAll(trial.left())) {
        open.retainAll(trial.left());
      }
      if (open.isEmpty() && change.amount() >= ENOUGH) {
        // Each has a cure of its own; what mends all of them takes more than one change.
        return false;
      }
    }
    return false;
  }

  private boolean anotherHold() {
    for (Change change :
        Change.otherHolds(layout.attachments(), clearances.holders(), ground, HOLDS)) {
      Trial trial = attempt(List.of(change));
      if (trial != null) {
        trials.add(trial);
        if (trial.left().isEmpty()) {
          return true;
        }
      }
    }
    return false;
  }

  /** Two changes that between them mend everything, the smallest together first. */
  private void together() {
    List<Trial> parts = new ArrayList<>();
    for (Trial each : trials) {
      Change change = each.changes().get(0);
      boolean known =
          parts.stream()
              .anyMatch(
                  p -> p.changes().get(0).isOneOf(change) && each.left().containsAll(p.left()));
      if (!known && !each.left().containsAll(fouls) && each.left().size() <= fouls.size()) {
        parts.add(each);
      }
    }
    List<List<Change>> pairs = new ArrayList<>();
    for (int i = 0; i < parts.size(); i++) {
      for (int k = i + 1; k < parts.size(); k++) {
        Change a = parts.get(i).changes().get(0);
        Change b = parts.get(k).changes().get(0);
        Set<String> both = new HashSet<>(parts.get(i).left());
        both.retainAll(parts.get(k).left());
        if (both.isEmpty() && !a.isOneOf(b)) {
          // Another hold first: what is measured from it comes after.
          pairs.add(b.isScaled() ? List.of(a, b) : List.of(b, a));
        }
      }
    }
    pairs.sort(Comparator.comparingDouble(p -> p.get(0).amount() + p.get(1).amount()));
    for (List<Change> pair : pairs.subList(0, Math.min(PAIRS, pairs.size()))) {
      Trial trial = attempt(pair);
      if (trial != null && trial.left().isEmpty()) {
        trials.add(trial);
        return;
      }
    }
  }

  private Trial attempt(List<Change> changes) {
    Layout now = layout;
    Rigged hung = rigged;
    try {
      for (Change change : changes) {
        List<Layout.Hold> holds = change.holds(now.attachments(), holder, ground);
        now = holds == null ? null : Relaid.after(change, hung, holds, leastTails(holds));
        if (now == null) {
          return null;
        }
        boolean whole = changes.size() > 1 || change.kind() == Change.Kind.HOLD;
        boolean last = change == changes.get(changes.size() - 1);
        if (whole && last && !clearances.screen(now)) {
          return null; // only a cure of everything is asked for, and this is none
        }
        hung = rigging.hang(now);
      }
      return new Trial(List.copyOf(changes), now, fouls(hung, clearances.check(hung)));
    } catch (IllegalArgumentException cannotHang) {
      // A change that leaves nothing to hang is no cure.
      return null;
    }
  }

  private double[] leastTails(List<Layout.Hold> holds) {
    return new double[] {leastTail(holds.get(0)), leastTail(holds.get(holds.size() - 1))};
  }

  private double leastTail(Layout.Hold hold) {
    double above = hold.at().z() - ground.heightAt(hold.at().x(), hold.at().y());
    return rigging.leastTail(hold.on(), above);
  }

  // --- choosing

  /** What cures one foul thing, everything with it if that can be; or null. */
  Trial best(String foul) {
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

  /** Each change of a trial made as small as still does. */
  private Trial finest(Trial trial, String foul) {
    Trial kept = trial;
    for (int i = 0; i < trial.changes().size(); i++) {
      if (trial.changes().get(i).isScaled()) {
        kept = finest(kept, i, foul);
      }
    }
    return kept;
  }

  /** Halves the way back to the last step that did not do, then rounds up and looks once more. */
  private Trial finest(Trial trial, int index, String foul) {
    Change change = trial.changes().get(index);
    double low = 0;
    for (Trial each : trials) {
      Change other = each.changes().get(0);
      boolean smaller = other.amount() < change.amount();
      if (trial.changes().size() == 1 && smaller && other.isOneOf(change)) {
        low = Math.max(low, other.amount());
      }
    }
    Trial kept = trial;
    double high = change.amount();
    while (high - low > FINEST * 1.5) {
      double middle = Math.ceil((low + high) / 2 / FINEST - 1e-9) * FINEST;
      if (middle >= high - 1e-9) {
        break;
      }
      List<Change> changes = new ArrayList<>(trial.changes());
      changes.set(index, change.by(middle));
      Trial between = attempt(changes);
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

  /** What was tried, as an order. */
  String sentence(Trial trial) {
    StringBuilder words = new StringBuilder();
    for (Change change : trial.changes()) {
      String order = change.sentence(trial.layout().attachments(), holder, ground);
      if (words.length() > 0) {
        words.setLength(words.length() - 1);
        words.append(", and ");
        order = Character.toLowerCase(order.charAt(0)) + order.substring(1);
      }
      words.append(order);
    }
    return words.toString();
  }
}
