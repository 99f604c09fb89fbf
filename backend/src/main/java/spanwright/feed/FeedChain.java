package spanwright.feed;

import java.util.Locale;
import org.apache.commons.math3.complex.Complex;

/**
 * The way of the power from the transmitter to the feedpoint, worked out from the load back: line,
 * then matching unit. Pure and thread-safe.
 */
public final class FeedChain {
  /** What transmitters want to see [ohm]. */
  public static final double TRANSMITTER_OHM = 50;

  private static final double LARGEST_OHM = 1e12;

  private FeedChain() {}

  /**
   * One load through a line and a matching unit.
   *
   * @param load impedance at the feedpoint [ohm], resistance 0 or more; an open end is a large
   *     resistance
   * @param frequencyMHz 0.1 to 1000
   * @param line the feed line
   * @param length of the line [m], 0 to 10,000
   * @param unit the matching unit at the station, or null
   * @param power into the line, and into the unit when it is asked what its parts stand [W]
   * @throws IllegalArgumentException with a sentence when something is outside these ranges
   */
  public static FeedResult run(
      Complex load,
      double frequencyMHz,
      Line line,
      double length,
      MatchingNetwork unit,
      double power) {
    requireUsable(load);
    Wrong.unlessWithin("The frequency", frequencyMHz, 0.1, 1000, "MHz");
    Wrong.unlessWithin("The length of the feed line", length, 0, 10_000, "m");
    Wrong.unlessWithin("The power", power, 0, 1e7, "W");
    LineConstants constants = line.at(frequencyMHz);
    LineRun run = LineRun.of(load, constants, length);
    Complex atStation = run.input();
    double volts = run.peakVolts(power);
    Verdict lineState = Judgement.ofVolts(volts, line.peakVolts());
    return new FeedResult(
        swr(load, line.impedance()),
        constants.matchedLossDb(length),
        run.lossDb(),
        atStation,
        swr(atStation, TRANSMITTER_OHM),
        volts,
        run.peakAmps(power),
        lineState,
        Judgement.voltsOnLine(volts, line.peakVolts()),
        unit == null ? null : Matching.match(atStation, frequencyMHz, unit, power));
  }

  /**
   * SWR of an impedance on a real one, 1 or more; infinite for a load that takes no power.
   *
   * @param load ohm, resistance 0 or more
   * @param impedance ohm
   */
  public static double swr(Complex load, double impedance) {
    double r = load.getReal() / impedance;
    double x = load.getImaginary() / impedance;
    if (r <= 0) {
      return Double.POSITIVE_INFINITY;
    }
    double sum = Math.hypot(r + 1, x);
    double difference = Math.hypot(r - 1, x);
    // (sum + difference)/(sum − difference), with sum² − difference² = 4r
    return (sum + difference) * (sum + difference) / (4 * r);
  }

  private static void requireUsable(Complex load) {
    double size = Math.max(Math.abs(load.getReal()), Math.abs(load.getImaginary()));
    if (!(size <= LARGEST_OHM)) {
      throw new IllegalArgumentException(
          "The load is not a pair of numbers up to 1e12 ohm. Write an open end as a large"
              + " resistance, 1e9 ohm say.");
    }
    if (load.getReal() < 0) {
      throw new IllegalArgumentException(
          String.format(
              Locale.ROOT,
              "The load has a resistance of %s ohm. A feedpoint takes power, so its resistance is"
                  + " 0 ohm or more; check the sign or the solution it came from.",
              Wrong.plain(load.getReal())));
    }
  }
}
