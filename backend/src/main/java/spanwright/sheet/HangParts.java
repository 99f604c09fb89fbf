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
   * @param margin what it may take over the greater of its pulls, or null when not known
   * @param weightUp how far weather and swaying trees may lift the weight [m], or null
   * @param weightDown how far they may let it down [m], or null
   * @param slackAtPulley rope left between the wire's end and the pulley when the weight is at its
   *     lowest [m], or null
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
      Double kilograms,
      Double margin,
      Double weightUp,
      Double weightDown,
      Double slackAtPulley) {}

  /**
   * How far a span is from parting: what breaks a part, over the greatest tension on it in any
   * weather. Knots take half of a rope.
   *
   * @param span "1–2", the point numbers of its ends
   * @param set tension to rig it with, calm [N]
   * @param worst tension of its wire in any weather [N], or null when not known
   * @param weather that governs, in words, or null when not known
   * @param wire margin
   * @param rope margin of the rope with its knots, or null where none holds it
   * @param insulator margin, likewise
   * @param support the lesser margin of the points it hangs from, or null when not known
   * @param partsFirst "wire", "rope" or "insulator"
   * @param weakLink what a link let into its rope should part at [N], or null where none fits
   */
  public record Margins(
      String span,
      double set,
      Double worst,
      String weather,
      double wire,
      Double rope,
      Double insulator,
      Double support,
      String partsFirst,
      Double weakLink) {}

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
