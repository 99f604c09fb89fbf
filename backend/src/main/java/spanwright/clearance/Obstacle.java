package spanwright.clearance;

import java.util.List;
import spanwright.plan.Place;
import spanwright.rigging.Holder;

/** Something on the plan that parts of a placement must keep off. */
interface Obstacle {
  /** Its box: least x, y, z, greatest x, y, z. */
  double[] box();

  /** Offers the worst of this strand against it. */
  void check(Strand strand, Scene scene, Tally tally);

  /**
   * What a check needs to know of the placement.
   *
   * @param holders of the attachments, in order
   * @param at the attachments
   * @param entry where the feed line ends
   */
  record Scene(List<Holder> holders, List<Place> at, Place entry) {}

  /** A place of a flat polyline. */
  static Place place(double[] points, int i) {
    return new Place(points[i], points[i + 1], points[i + 2]);
  }

  /** How far a box of one piece of a strand is from another box. */
  static double gap(double[] points, int i, double[] box) {
    double sum = 0;
    for (int k = 0; k < 3; k++) {
      double low = Math.min(points[i + k], points[i + 3 + k]);
      double high = Math.max(points[i + k], points[i + 3 + k]);
      double apart = Math.max(0, Math.max(box[k] - high, low - box[k + 3]));
      sum += apart * apart;
    }
    return Math.sqrt(sum);
  }
}
