package spanwright.assess;

import java.util.ArrayList;
import java.util.List;
import spanwright.clearance.Clearance;
import spanwright.clearance.State;
import spanwright.plan.Band;
import spanwright.plan.Brief;
import spanwright.plan.Target;

/**
 * The score of a placement, in decibels: the weighted mean over bands and targets of delivered gain
 * minus the reference's gain over the same window, less named deductions. It can order what is
 * allowed; what is foul is refused before it gets here.
 */
final class Scoring {
  /**
   * For a band that cannot be matched, times its share of the weight [dB]. Common practice, no
   * source.
   */
  private static final double NO_MATCH = 10;

  /** For a band that is matched with little to spare, likewise [dB]. */
  private static final double TIGHT_MATCH = 1;

  /** For each mast that must be built [dB]. */
  private static final double NEW_MAST = 0.5;

  /** For each mast that needs somebody's consent, on top [dB]. */
  private static final double CONSENT = 0.5;

  /** For each rule kept with little to spare [dB], and the most for all together. */
  private static final double TIGHT_CLEARANCE = 0.1;

  private static final double MOST_FOR_CLEARANCES = 0.5;

  private final Brief brief;

  Scoring(Brief brief) {
    this.brief = brief;
  }

  /** The mean and every deduction, signed; their points add up to the score. */
  List<Placement.ScorePart> parts(
      List<Placement.BandResult> rows, List<Placement.NewMast> masts, List<Clearance> clearances) {
    List<Placement.ScorePart> parts = new ArrayList<>();
    parts.add(new Placement.ScorePart("over the reference, mean of bands and targets", mean(rows)));
    addMatching(rows, parts);
    for (Placement.NewMast mast : masts) {
      parts.add(new Placement.ScorePart("a new mast", -NEW_MAST));
      if (mast.consent() != null && !mast.consent().equalsIgnoreCase("none")) {
        parts.add(new Placement.ScorePart("the mast needs: " + mast.consent(), -CONSENT));
      }
    }
    long tight =
        clearances.stream()
            .filter(c -> c.state() == State.TIGHT)
            .map(c -> c.rule() + " " + c.to())
            .distinct()
            .count();
    if (tight > 0) {
      parts.add(
          new Placement.ScorePart(
              tight == 1 ? "one tight clearance" : tight + " tight clearances",
              -Math.min(MOST_FOR_CLEARANCES, TIGHT_CLEARANCE * tight)));
    }
    return parts.stream()
        .map(part -> new Placement.ScorePart(part.what(), Rounded.hundredth(part.points())))
        .toList();
  }

  static double total(List<Placement.ScorePart> parts) {
    return Rounded.hundredth(parts.stream().mapToDouble(Placement.ScorePart::points).sum());
  }

  private double mean(List<Placement.BandResult> rows) {
    double sum = 0;
    double weights = 0;
    for (Band band : brief.bands()) {
      List<Placement.BandResult> own = rowsOf(band, rows);
      List<Target> targets = brief.targets().stream().filter(t -> t.countsOn(band)).toList();
      for (int t = 0; t < targets.size() && !own.isEmpty(); t++) {
        double weight = band.weight() * targets.get(t).weight();
        sum += weight * overReference(own, t);
        weights += weight;
      }
    }
    return weights == 0 ? 0 : sum / weights;
  }

  /**
   * Mean over a band's rows of what a target gets above the reference [dB]. Taken by the target's
   * place among those that count there: two may have one name.
   */
  private static double overReference(List<Placement.BandResult> rows, int target) {
    double sum = 0;
    for (Placement.BandResult row : rows) {
      Placement.TargetResult result = row.targets().get(target);
      sum += result.deliveredDbi() - result.referenceDbi();
    }
    return sum / rows.size();
  }

  private void addMatching(List<Placement.BandResult> rows, List<Placement.ScorePart> parts) {
    double all = brief.bands().stream().mapToDouble(this::weight).sum();
    for (Band band : brief.bands()) {
      List<Placement.BandResult> own = rowsOf(band, rows);
      if (band.receiveOnly() || own.isEmpty() || all == 0) {
        continue;
      }
      double share = weight(band) / all;
      addMatching(band, own, State.FOUL, share * NO_MATCH, "cannot be matched", parts);
      addMatching(band, own, State.TIGHT, share * TIGHT_MATCH, "is matched only just", parts);
    }
  }

  private static void addMatching(
      Band band,
      List<Placement.BandResult> own,
      State state,
      double price,
      String words,
      List<Placement.ScorePart> parts) {
    long count = own.stream().filter(row -> row.matching().state() == state).count();
    if (count > 0 && price > 0) {
      String where = count == own.size() ? "" : " on part of the band";
      parts.add(
          new Placement.ScorePart(band.name() + " " + words + where, -price * count / own.size()));
    }
  }

  /** A band weighs what its targets weigh on it. */
  private double weight(Band band) {
    return band.weight()
        * brief.targets().stream()
            .filter(target -> target.countsOn(band))
            .mapToDouble(Target::weight)
            .sum();
  }

  private static List<Placement.BandResult> rowsOf(Band band, List<Placement.BandResult> rows) {
    return rows.stream().filter(row -> row.name().equals(band.name())).toList();
  }
}
