package spanwright.rigging;

import com.fasterxml.jackson.annotation.JsonCreator;
import com.fasterxml.jackson.annotation.JsonValue;

/**
 * A force, in the plan frame. In JSON: {@code [x, y, z]}.
 *
 * @param x newtons, east on the plan
 * @param y newtons, north on the plan
 * @param z newtons, up
 */
public record Force(double x, double y, double z) {
  /** No force. */
  public static final Force NONE = new Force(0, 0, 0);

  /** Reads the JSON form. */
  @JsonCreator(mode = JsonCreator.Mode.DELEGATING)
  public static Force of(double[] xyz) {
    if (xyz.length != 3) {
      throw new IllegalArgumentException("a force is [x, y, z]");
    }
    return new Force(xyz[0], xyz[1], xyz[2]);
  }

  /** The JSON form. */
  @JsonValue
  public double[] toArray() {
    return new double[] {x, y, z};
  }

  /** The size of it [N]. */
  public double size() {
    return Math.sqrt(x * x + y * y + z * z);
  }

  /** The sum with another. */
  public Force plus(Force other) {
    return new Force(x + other.x, y + other.y, z + other.z);
  }
}
