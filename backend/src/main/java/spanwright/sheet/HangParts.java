package spanwright.sheet;

import spanwright.clearance.State;

/**
 * What hangs: holding points with their pulls, spans with their sag. Metres and newtons unless said
 * otherwise.
 */
public final class HangParts {
  private HangParts() {}

  /**
   * A holding point.
   *
   * @param point its number in the set-out
   * @param on id in the plan
   * @param name shown to people
   * @param aboveGround height above the ground there [m]
   * @param aboveDatum height above the ground at the first datum [m]
   * @param held "weight", "tied" or "centre"
   * @param pull in calm air [N]
   * @param pullInWind in the design gust [N]
   * @param mayTake [N], or null when not known and so not checked
   * @param state pulls against what it may take
   * @param method how wire or rope gets up there, in words
   * @param kilograms to hang, or null
   */
  public record Holding(
      int point,
      String on,
      String name,
      double aboveGround,
      double aboveDatum,
      String held,
      double pull,
      double pullInWind,
      Double mayTake,
      State state,
      String method,
      Double kilograms) {}

  /**
   * The sag to sight in one span.
   *
   * @param span "1–2", the point numbers of its ends
   * @param level level distance between its ends [m]
   * @param middle drop below the chord half way along [m]
   * @param greatest drop anywhere [m]
   * @param heightMiddle of the run above the ground half way along [m]
   * @param inGust greatest drop in the gust [m]
   * @param blowOut sideways in the gust [m]
   * @param bearing true, first to second end [degrees]
   * @param magnetic by the compass [degrees]
   */
  public record Sag(
      String span,
      double level,
      double middle,
      double greatest,
      double heightMiddle,
      double inGust,
      double blowOut,
      double bearing,
      double magnetic) {}
}
