package spanwright.rigging;

import java.util.List;
import spanwright.plan.Place;

/**
 * How a wire hangs: the answer of {@code hang}. Pulls are forces of the wire on its holding points.
 *
 * @param calm in still air
 * @param inWind in the wind of the case
 */
public record HangAnswer(Calm calm, InWind inWind) {
  /**
   * In still air.
   *
   * @param points along the wire
   * @param length of the wire as it hangs, stretched [m]
   * @param sag greatest drop below the straight chord, measured vertically [m]
   * @param pullFrom force on {@code from}
   * @param pullTo force on {@code to}
   */
  public record Calm(List<Place> points, double length, double sag, Force pullFrom, Force pullTo) {
    public Calm {
      points = List.copyOf(points);
    }
  }

  /**
   * In the wind.
   *
   * @param points along the wire
   * @param length of the wire as it hangs, stretched [m]
   * @param sag greatest drop below the straight chord, measured vertically [m]
   * @param blowOut greatest sideways shift [m]
   * @param pullFrom force on {@code from}
   * @param pullTo force on {@code to}
   */
  public record InWind(
      List<Place> points, double length, double sag, double blowOut, Force pullFrom, Force pullTo) {
    public InWind {
      points = List.copyOf(points);
    }
  }
}
