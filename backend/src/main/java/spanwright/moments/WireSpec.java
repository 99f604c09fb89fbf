package spanwright.moments;

import java.util.List;

/**
 * One conductor: a round wire along straight pieces. A wire whose first and last points coincide is
 * a closed loop; ends of wires within {@value AntennaModel#JOIN_DISTANCE} m of each other are
 * joined.
 *
 * @param points where it starts, bends and ends; a hanging shape may have many
 * @param radius of the conductor [m]
 * @param conductivity [S/m]; infinite for a perfect conductor
 * @param permeability relative
 * @param sheath insulation, null when bare
 */
public record WireSpec(
    List<Vertex> points, double radius, double conductivity, double permeability, Sheath sheath) {
  /** Annealed copper at 20 °C [S/m] (IEC 60028, 1925). */
  public static final double COPPER = 5.8e7;

  public WireSpec {
    points = List.copyOf(points);
  }

  /** A bare wire of a non-magnetic metal of this conductivity [S/m]. */
  public static WireSpec of(List<Vertex> points, double radius, double conductivity) {
    return new WireSpec(points, radius, conductivity, 1, null);
  }

  /** A bare wire without loss. */
  public static WireSpec perfect(List<Vertex> points, double radius) {
    return new WireSpec(points, radius, Double.POSITIVE_INFINITY, 1, null);
  }

  /** The same wire, insulated. */
  public WireSpec withSheath(Sheath insulation) {
    return new WireSpec(points, radius, conductivity, permeability, insulation);
  }

  /** Length along the pieces [m]. */
  public double length() {
    double sum = 0;
    for (int i = 1; i < points.size(); i++) {
      sum += points.get(i - 1).distanceTo(points.get(i));
    }
    return sum;
  }
}
