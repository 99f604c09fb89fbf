package spanwright.assess;

import java.util.ArrayList;
import java.util.List;
import org.apache.commons.math3.complex.Complex;
import spanwright.clearance.State;
import spanwright.feed.FeedChain;
import spanwright.feed.FeedResult;
import spanwright.feed.Line;
import spanwright.feed.MatchingNetwork;
import spanwright.feed.Verdict;
import spanwright.plan.Band;
import spanwright.plan.Catalogue;
import spanwright.plan.LineLengths;
import spanwright.plan.Plan;

/** From the feedpoint to the transmitter's socket: the line, its length, the matching unit. */
final class Station {
  /** Lengths are proposed this far apart [m], and this far beyond the shortest. */
  private static final double STEP = 0.5;

  private static final double MOST_EXTRA = 6;

  /**
   * What a band without a match is worth, and one with little to spare, when lengths are weighed
   * [dB].
   */
  private static final double FOUL_COSTS = 10;

  private static final double TIGHT_COSTS = 1;

  private final Plan plan;
  private final Catalogue catalogue;
  private final MatchingNetwork unit;

  Station(Plan plan, Catalogue catalogue) {
    this.plan = plan;
    this.catalogue = catalogue;
    this.unit = FeedParts.network(catalogue.matchingUnit(plan.brief().matching()));
  }

  /**
   * A load that a line length is chosen for.
   *
   * @param band it is on
   * @param frequencyMHz of the load
   * @param impedance ohm
   */
  record Load(Band band, double frequencyMHz, Complex impedance) {}

  /** The way to the socket of a band; one that is only heard carries no power. */
  FeedResult run(String lineId, double length, Band band, double frequencyMHz, Complex load) {
    double power = band.receiveOnly() ? 0 : plan.brief().power();
    Line line = FeedParts.line(catalogue.line(lineId));
    return FeedChain.run(passive(load), frequencyMHz, line, length, unit, power);
  }

  /** A feedpoint takes power; rounding may not say otherwise. */
  private static Complex passive(Complex load) {
    return load.getReal() > 0 ? load : new Complex(1e-6, load.getImaginary());
  }

  /**
   * The length that serves the loads best of those that reach: least loss, matched wherever it can
   * be; the shorter of equals.
   */
  double bestLength(String lineId, double shortest, List<Load> loads) {
    double best = shortest;
    double least = Double.POSITIVE_INFINITY;
    for (double length : lengths(shortest)) {
      double cost = 0;
      for (Load load : loads) {
        if (cost >= least) {
          break; // every band adds to it
        }
        FeedResult result = run(lineId, length, load.band(), load.frequencyMHz(), load.impedance());
        cost += load.band().weight() * cost(result);
      }
      if (cost < least - 1e-6) {
        least = cost;
        best = length;
      }
    }
    return best;
  }

  private static double cost(FeedResult result) {
    return Math.min(60, result.lossDb())
        + Math.min(60, result.matching().lossDb())
        + switch (state(result)) {
          case CLEAR -> 0;
          case TIGHT -> TIGHT_COSTS;
          case FOUL -> FOUL_COSTS;
        };
  }

  private List<Double> lengths(double shortest) {
    LineLengths atHand = plan.brief().lineLengths();
    List<Double> lengths = new ArrayList<>();
    if (!atHand.isFree()) {
      atHand.lengths().stream().filter(length -> length >= shortest - 1e-9).forEach(lengths::add);
    } else {
      double first = Math.ceil(shortest * 10 - 1e-9) / 10;
      for (double extra = 0; extra <= MOST_EXTRA + 1e-9; extra += STEP) {
        lengths.add(Math.round((first + extra) * 10) / 10.0);
      }
    }
    return lengths.isEmpty() ? List.of(shortest) : lengths;
  }

  /** The worse of what the matching unit makes of the load and what the volts do to the line. */
  static State state(FeedResult result) {
    return state(result.matching().state()).worse(state(result.lineState()));
  }

  static State state(Verdict verdict) {
    return switch (verdict) {
      case CLEAR -> State.CLEAR;
      case TIGHT -> State.TIGHT;
      case FOUL -> State.FOUL;
    };
  }
}
