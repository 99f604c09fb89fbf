package spanwright.rigging;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import spanwright.plan.Place;

/** A conductor's points, and positions along them in metres from the first. */
final class Polyline {
  /** Ends this near to each other close a loop: as the field solver joins them [m]. */
  static final double CLOSED = 1e-3;

  final List<Place> points;
  private final double[] arc;

  Polyline(List<Place> points) {
    this.points = points;
    arc = new double[points.size()];
    for (int i = 1; i < arc.length; i++) {
      arc[i] = arc[i - 1] + points.get(i - 1).distance(points.get(i));
    }
  }

  Polyline reversed() {
    List<Place> back = new ArrayList<>(points);
    Collections.reverse(back);
    return new Polyline(back);
  }

  double total() {
    return arc[arc.length - 1];
  }

  Place first() {
    return points.get(0);
  }

  Place last() {
    return points.get(points.size() - 1);
  }

  /** Whether it comes back to where it began. */
  boolean isClosed() {
    return points.size() > 3 && first().distance(last()) <= CLOSED;
  }

  /** The position nearest to a place, between two positions. */
  double nearest(Place at, double from, double to) {
    double least = Double.POSITIVE_INFINITY;
    double where = from;
    for (int i = 0; i + 1 < arc.length; i++) {
      Place a = points.get(i);
      Place b = points.get(i + 1);
      double length = arc[i + 1] - arc[i];
      double dot =
          (at.x() - a.x()) * (b.x() - a.x())
              + (at.y() - a.y()) * (b.y() - a.y())
              + (at.z() - a.z()) * (b.z() - a.z());
      double share = length == 0 ? 0 : Math.max(0, Math.min(1, dot / (length * length)));
      double position = Math.max(from, Math.min(to, arc[i] + share * length));
      double away = at.distance(at(position));
      if (away < least - 1e-9) {
        least = away;
        where = position;
      }
    }
    return where;
  }

  /**
   * The bend that a rope from a place would hold: the nearest corner, where one is not much farther
   * than the nearest wire; else the nearest wire.
   */
  double heldAt(Place at, double from, double to) {
    double nearest = nearest(at, from, to);
    double least = 1.3 * at.distance(at(nearest)) + 0.3;
    double where = nearest;
    for (int i = 0; i < arc.length; i++) {
      double away = at.distance(points.get(i));
      if (arc[i] >= from && arc[i] <= to && away < least && turn(i) > Practice.BEND) {
        least = away;
        where = arc[i];
      }
    }
    return where;
  }

  /** How far the wire turns at a point [rad]; 0 at the ends of one that is not closed. */
  private double turn(int i) {
    int last = arc.length - 1;
    boolean end = i == 0 || i == last;
    if (end && !isClosed()) {
      return 0;
    }
    Place here = points.get(i);
    return turn(points.get(end ? last - 1 : i - 1), here, points.get(end ? 1 : i + 1));
  }

  private static double turn(Place a, Place b, Place c) {
    double ux = b.x() - a.x();
    double uy = b.y() - a.y();
    double uz = b.z() - a.z();
    double vx = c.x() - b.x();
    double vy = c.y() - b.y();
    double vz = c.z() - b.z();
    double size = a.distance(b) * b.distance(c);
    double dot = size == 0 ? 1 : (ux * vx + uy * vy + uz * vz) / size;
    return Math.acos(Math.max(-1, Math.min(1, dot)));
  }

  /** Whether the wire turns within a hand's breadth of a position. */
  boolean bendsNear(double position) {
    for (int i = 1; i + 1 < arc.length; i++) {
      if (Math.abs(arc[i] - position) < 0.1 && turn(i) > Practice.BEND) {
        return true;
      }
    }
    return false;
  }

  /** The place at a position. */
  Place at(double position) {
    int i = 0;
    while (i + 2 < arc.length && arc[i + 1] < position) {
      i++;
    }
    Place a = points.get(i);
    Place b = points.get(i + 1);
    double length = arc[i + 1] - arc[i];
    double share = length == 0 ? 0 : Math.max(0, Math.min(1, (position - arc[i]) / length));
    return new Place(
        a.x() + share * (b.x() - a.x()),
        a.y() + share * (b.y() - a.y()),
        a.z() + share * (b.z() - a.z()));
  }

  /** The points of a closed one from a position round to it again. */
  List<Place> from(double position) {
    List<Place> round = new ArrayList<>();
    Place start = at(position);
    round.add(start);
    int last = arc.length - 1;
    for (int pass = 0; pass < 2; pass++) {
      for (int i = pass == 0 ? 0 : 1; i <= last; i++) {
        boolean after = arc[i] > position + 1e-6;
        boolean apart = Math.abs(arc[i] - position) > 1e-6;
        if (apart && after == (pass == 0)) {
          round.add(points.get(i));
        }
      }
    }
    round.add(start);
    return round;
  }
}
