package spanwright.sheet;

import java.util.List;

/** What is added to a finished length before it is cut. Data, so that it can be read and argued. */
final class Allowances {
  private static final String TRADE = "common practice, no source";

  /** Wire turned back through an insulator or centre piece and twisted on itself, each end [m]. */
  static final double TURN_BACK = 0.15;

  /** Share of a wire's finished length left over for trimming. */
  static final double TRIM_SHARE = 0.02;

  /** Least left over for trimming [m]. */
  static final double TRIM_LEAST = 0.20;

  /** Feed line stripped and made off, each end [m]. */
  static final double LINE_END = 0.10;

  /** Knot at an insulator, ring, bracket or weight [m]. */
  static final double KNOT = 0.50;

  /** Turns on a cleat and a tail to hold [m]. */
  static final double CLEAT = 1.50;

  /** A guy turned and hitched, each end [m]. */
  static final double GUY_END = 0.75;

  /** Rope left in the hand when an end is down on the ground [m]. */
  static final double HAND = 1.00;

  /** Farthest that two stand-offs stand apart [m]. */
  static final double STAND_OFF_EVERY = 1.00;

  /** Least that a stand-off holds a line off a wall [m]. */
  static final double STAND_OFF_LEAST = 0.10;

  private Allowances() {}

  static List<CutParts.Allowance> list() {
    return List.of(
        metres("turn back", "wire turned back, each end", TURN_BACK),
        new CutParts.Allowance(
            "trim", "wire left for trimming, share of its length", TRIM_SHARE, "share", TRADE),
        metres("least trim", "wire left for trimming, at least", TRIM_LEAST),
        metres("line end", "feed line made off, each end", LINE_END),
        metres("knot", "rope to a knot", KNOT),
        metres("cleat", "rope to a cleat", CLEAT),
        metres("guy end", "guy hitched, each end", GUY_END),
        metres("in the hand", "rope in the hand with the end on the ground", HAND),
        metres("stand-off spacing", "farthest between two stand-offs", STAND_OFF_EVERY),
        metres("stand-off reach", "feed line off a wall, at least", STAND_OFF_LEAST));
  }

  private static CutParts.Allowance metres(String id, String what, double value) {
    return new CutParts.Allowance(id, what, value, "m", TRADE);
  }
}
