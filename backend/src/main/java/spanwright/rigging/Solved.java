package spanwright.rigging;

import java.util.List;
import spanwright.plan.Place;

/**
 * A span in one weather.
 *
 * @param points attachment to attachment
 * @param wireFrom index of the first point of wire
 * @param wireTo index of the last
 * @param feed index of the feedpoint, where it hangs here
 * @param onFrom force on the first attachment
 * @param onTo force on the second
 * @param greatest tension of wire, and of rope in line with it [N]
 * @param greatestRope tension of any rope that holds it, those at bends among them [N]
 */
record Solved(
    List<Place> points,
    int wireFrom,
    int wireTo,
    int feed,
    Force onFrom,
    Force onTo,
    double greatest,
    double greatestRope) {

  /** The same with other points and forces. */
  Solved with(List<Place> others, Force from, Force to) {
    return new Solved(others, wireFrom, wireTo, feed, from, to, greatest, greatestRope);
  }

  /** Greatest drop of the points below a straight line from end to end, measured upright [m]. */
  static double sag(List<Place> points) {
    Place a = points.get(0);
    Place b = points.get(points.size() - 1);
    double dx = b.x() - a.x();
    double dy = b.y() - a.y();
    double dz = b.z() - a.z();
    double level2 = dx * dx + dy * dy;
    double most = 0;
    for (Place each : points) {
      double along = (each.x() - a.x()) * dx + (each.y() - a.y()) * dy;
      double share = level2 < 1e-9 ? 0 : Math.max(0, Math.min(1, along / level2));
      double chordHeight = level2 < 1e-9 ? Math.min(0, dz) : share * dz;
      most = Math.max(most, a.z() + chordHeight - each.z());
    }
    return most;
  }

  /** Greatest shift along a level direction from where the points hung in still air [m]. */
  static double shift(List<Place> calm, List<Place> blown, double sideX, double sideY) {
    double most = 0;
    for (int i = 0; i < calm.size(); i++) {
      double off =
          (blown.get(i).x() - calm.get(i).x()) * sideX
              + (blown.get(i).y() - calm.get(i).y()) * sideY;
      most = Math.max(most, Math.abs(off));
    }
    return most;
  }
}
