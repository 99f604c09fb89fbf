package spanwright.plan;

import com.fasterxml.jackson.annotation.JsonCreator;
import com.fasterxml.jackson.annotation.JsonValue;

/**
 * A point of the plan, in the plan frame. In JSON: {@code [x, y]}.
 *
 * @param x metres, east on the plan
 * @param y metres, north on the plan
 */
public record Point(double x, double y) {

  /** Reads the JSON form. */
  @JsonCreator(mode = JsonCreator.Mode.DELEGATING)
  public static Point of(double[] xy) {
    if (xy.length != 2) {
      throw new IllegalArgumentException("a point of the plan is [x, y]");
    }
    return new Point(xy[0], xy[1]);
  }

  /** The JSON form. */
  @JsonValue
  public double[] toArray() {
    return new double[] {x, y};
  }

  /** Level distance to another point [m]. */
  public double distance(Point other) {
    return Math.hypot(x - other.x, y - other.y);
  }
}
