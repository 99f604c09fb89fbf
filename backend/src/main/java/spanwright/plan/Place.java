package spanwright.plan;

import com.fasterxml.jackson.annotation.JsonCreator;
import com.fasterxml.jackson.annotation.JsonValue;

/**
 * A place in space, in the plan frame. In JSON: {@code [x, y, z]}.
 *
 * @param x metres, east on the plan
 * @param y metres, north on the plan
 * @param z metres up; whether from the plan's zero or from the local ground is said where it is
 *     used
 */
public record Place(double x, double y, double z) {

  /** Reads the JSON form. */
  @JsonCreator(mode = JsonCreator.Mode.DELEGATING)
  public static Place of(double[] xyz) {
    if (xyz.length != 3) {
      throw new IllegalArgumentException("a place is [x, y, z]");
    }
    return new Place(xyz[0], xyz[1], xyz[2]);
  }

  /** The JSON form. */
  @JsonValue
  public double[] toArray() {
    return new double[] {x, y, z};
  }

  /** The point of the plan under (or over) this place. */
  public Point onPlan() {
    return new Point(x, y);
  }

  /** Straight distance to another place [m]. */
  public double distance(Place other) {
    double dx = x - other.x;
    double dy = y - other.y;
    double dz = z - other.z;
    return Math.sqrt(dx * dx + dy * dy + dz * dz);
  }

  /** The place nearest to this on the straight line from one place to another. */
  public Place nearestOn(Place a, Place b) {
    double dx = b.x - a.x;
    double dy = b.y - a.y;
    double dz = b.z - a.z;
    double square = dx * dx + dy * dy + dz * dz;
    double along = (x - a.x) * dx + (y - a.y) * dy + (z - a.z) * dz;
    double t = square == 0 ? 0 : Math.max(0, Math.min(1, along / square));
    return new Place(a.x + t * dx, a.y + t * dy, a.z + t * dz);
  }
}
