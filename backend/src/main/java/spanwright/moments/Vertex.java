package spanwright.moments;

/**
 * A point in the solver's frame: the ground, if there is one, is the plane z = 0.
 *
 * @param x metres, east
 * @param y metres, north
 * @param z metres, up
 */
public record Vertex(double x, double y, double z) {

  /** Distance to another point [m]. */
  public double distanceTo(Vertex other) {
    double dx = x - other.x;
    double dy = y - other.y;
    double dz = z - other.z;
    return Math.sqrt(dx * dx + dy * dy + dz * dz);
  }
}
