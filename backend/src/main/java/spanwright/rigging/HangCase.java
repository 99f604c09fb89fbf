package spanwright.rigging;

import com.fasterxml.jackson.annotation.JsonCreator;
import com.fasterxml.jackson.annotation.JsonProperty;
import spanwright.plan.Place;

/**
 * One wire hung between two points, with or without a load on it: the case of {@code hang}.
 *
 * @param from first holding point
 * @param to second holding point, where the pull is known
 * @param wire what hangs
 * @param load a weight on the wire, or null
 * @param pull tension at {@code to} in calm air [N]
 * @param held what {@code to} is
 * @param wind level, square to the span [m/s]; null is calm
 * @param drag coefficient; null is 1.2
 * @param air density [kg/m³]; null is 1.25
 * @param spring newtons for each metre that the wire draws out of it; of a spring alone
 */
public record HangCase(
    Place from,
    Place to,
    Wire wire,
    Load load,
    Double pull,
    Held held,
    Double wind,
    Double drag,
    Double air,
    Double spring) {
  /** Drag coefficient of a round wire where a case says none. */
  public static final double DRAG = 1.2;

  /** Density of air where a case says none [kg/m³]. */
  public static final double AIR = 1.25;

  @JsonCreator
  public HangCase {
    wind = wind == null ? Double.valueOf(0) : wind;
    drag = drag == null ? Double.valueOf(DRAG) : drag;
    air = air == null ? Double.valueOf(AIR) : air;
  }

  /** A wire held by a weight or a tie. */
  public HangCase(
      Place from,
      Place to,
      Wire wire,
      Load load,
      Double pull,
      Held held,
      Double wind,
      Double drag,
      Double air) {
    this(from, to, wire, load, pull, held, wind, drag, air, null);
  }

  /**
   * What hangs.
   *
   * @param weight kg/m
   * @param diameter that the wind sees [m]
   * @param stiffness EA [N], or null for a wire that does not stretch
   */
  public record Wire(Double weight, Double diameter, Double stiffness) {}

  /**
   * A weight on the wire.
   *
   * @param fraction of the wire's length, from {@code from}
   * @param weight kg
   */
  public record Load(Double fraction, Double weight) {}

  /** How the second point holds. */
  public enum Held {
    /** Over a pulley to a counterweight: its pull stays. */
    @JsonProperty("weight")
    WEIGHT,
    /** Made fast: the wire's unstretched length stays. */
    @JsonProperty("tied")
    TIED,
    /** Over a pulley to a spring: its pull grows as the wire draws it out. */
    @JsonProperty("spring")
    SPRING
  }
}
