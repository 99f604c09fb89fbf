package spanwright.sheet;

import java.util.List;

/**
 * What is cut and what is laid out: wire, feed line, ropes, hardware. Metres and newtons unless
 * said otherwise.
 */
public final class CutParts {
  private CutParts() {}

  /**
   * A piece of wire.
   *
   * @param mark "W1"
   * @param piece from where to where
   * @param wire catalogue id
   * @param kind its name
   * @param finished length as it hangs [m]
   * @param turns number of ends turned back
   * @param turnsBack for all of them [m]
   * @param trim left for trimming [m]
   * @param cut length, to 10 mm upward [m]
   */
  public record WirePiece(
      String mark,
      String piece,
      String wire,
      String kind,
      double finished,
      int turns,
      double turnsBack,
      double trim,
      double cut) {}

  /**
   * The feed line.
   *
   * @param mark "L1"
   * @param line catalogue id
   * @param kind its name
   * @param run along its path, feedpoint to entry [m]
   * @param slack over the run [m]; negative when the line is too short
   * @param finished electrical length, feedpoint to entry [m]
   * @param madeOff for its two ends [m]
   * @param cut length, to 10 mm upward [m]
   * @param spacing of its two wires [m], or null
   * @param standOffs number
   * @param standOffReach how far they hold it off [m]
   * @param standOffsAt along the line from the entry, one for each stand-off [m]
   * @param nearestMetal name of the metal on the plan nearest to it, or null
   * @param metalDistance to it [m], or null
   * @param notes how it runs, as sentences
   */
  public record FeedLine(
      String mark,
      String line,
      String kind,
      double run,
      double slack,
      double finished,
      double madeOff,
      double cut,
      Double spacing,
      int standOffs,
      double standOffReach,
      List<Double> standOffsAt,
      String nearestMetal,
      Double metalDistance,
      List<String> notes) {
    public FeedLine {
      standOffsAt = List.copyOf(standOffsAt);
      notes = List.copyOf(notes);
    }
  }

  /**
   * A rope or guy.
   *
   * @param mark "R1" or "G1"
   * @param rope catalogue id
   * @param kind its name
   * @param from where it begins
   * @param over what it runs over, or null
   * @param to where it goes
   * @param madeOff how it is made off there
   * @param run without allowances [m]
   * @param allowance for knots, cleat and hand [m]
   * @param cut length, rounded up to 0.5 m [m]
   */
  public record Rope(
      String mark,
      String rope,
      String kind,
      String from,
      String over,
      String to,
      String madeOff,
      double run,
      double allowance,
      double cut) {}

  /**
   * Hardware.
   *
   * @param what it is
   * @param count needed
   * @param length in all where it goes by length [m], or null
   * @param spares to bring besides
   * @param note or null
   */
  public record Item(String what, int count, Double length, int spares, String note) {}

  /**
   * Length added for working.
   *
   * @param id short name
   * @param what it is for
   * @param value in the unit
   * @param unit "m" or "share"
   * @param source where it comes from
   */
  public record Allowance(String id, String what, double value, String unit, String source) {}
}
