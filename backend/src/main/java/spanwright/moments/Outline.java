package spanwright.moments;

import java.util.ArrayList;
import java.util.List;

/**
 * The wires as few straight pieces between numbered nodes: many short pieces of a hanging shape are
 * drawn together where none of its points strays by more than a tolerance, ends of wires that
 * coincide become one node, and an end that touches another wire's path makes a node there.
 */
final class Outline {
  /**
   * A straight piece.
   *
   * @param wire index
   * @param a where it starts
   * @param b where it ends
   * @param arcA arc length along the wire as given, at a [m]
   * @param arcB the same at b
   * @param nodeA number of the node at a
   * @param nodeB number of the node at b
   */
  record Piece(int wire, Vertex a, Vertex b, double arcA, double arcB, int nodeA, int nodeB) {
    double length() {
      return a.distanceTo(b);
    }
  }

  /** A place on a wire that must become a node. */
  private record Stop(double arc, Vertex at, int node) {}

  /** Drawing pieces together may shorten the wire by this part. */
  private static final double SHORTENING = 6e-4;

  final List<Piece> pieces = new ArrayList<>();

  /** Pieces that meet at each node. */
  int[] degree;

  private final AntennaModel model;
  private final double tolerance;
  private final List<Vertex> joints = new ArrayList<>();
  private int nodes;

  private Outline(AntennaModel model, double tolerance) {
    this.model = model;
    this.tolerance = tolerance;
  }

  /** The outline of a model that {@link ModelCheck} has passed. */
  static Outline of(AntennaModel model, double tolerance) {
    Outline outline = new Outline(model, tolerance);
    outline.draw();
    Crossings.refuse(outline.pieces, model);
    return outline;
  }

  private void draw() {
    List<WireSpec> wires = model.wires();
    for (WireSpec wire : wires) {
      joint(wire.points().get(0));
      joint(wire.points().get(wire.points().size() - 1));
    }
    nodes = joints.size();
    for (int w = 0; w < wires.size(); w++) {
      wire(w, wires.get(w).points());
    }
    degree = new int[nodes];
    for (Piece piece : pieces) {
      degree[piece.nodeA]++;
      degree[piece.nodeB]++;
    }
  }

  private int joint(Vertex p) {
    for (int j = 0; j < joints.size(); j++) {
      if (joints.get(j).distanceTo(p) <= AntennaModel.JOIN_DISTANCE) {
        return j;
      }
    }
    joints.add(p);
    return joints.size() - 1;
  }

  private void wire(int w, List<Vertex> points) {
    int n = points.size();
    List<Stop> path = new ArrayList<>();
    List<Integer> fixed = new ArrayList<>();
    double arc = 0;
    for (int i = 0; i < n; i++) {
      if (i > 0) {
        touching(points.get(i - 1), points.get(i), arc, path, fixed);
        arc += points.get(i - 1).distanceTo(points.get(i));
      }
      int node = findJoint(points.get(i));
      if (node >= 0) {
        fixed.add(path.size());
        path.add(new Stop(arc, joints.get(node), node));
      } else {
        path.add(new Stop(arc, points.get(i), -1));
      }
    }
    boolean[] keep = new boolean[path.size()];
    for (int f = 0; f < fixed.size(); f++) {
      keep[fixed.get(f)] = true;
      if (f > 0) {
        thin(path, fixed.get(f - 1), fixed.get(f), keep);
      }
    }
    Stop before = null;
    int nodeBefore = -1;
    for (int i = 0; i < path.size(); i++) {
      if (!keep[i]) {
        continue;
      }
      Stop here = path.get(i);
      int node = here.node >= 0 ? here.node : nodes++;
      if (before != null) {
        pieces.add(new Piece(w, before.at, here.at, before.arc, here.arc, nodeBefore, node));
      }
      before = here;
      nodeBefore = node;
    }
  }

  private int findJoint(Vertex p) {
    for (int j = 0; j < joints.size(); j++) {
      if (joints.get(j).distanceTo(p) <= AntennaModel.JOIN_DISTANCE) {
        return j;
      }
    }
    return -1;
  }

  /** Ends of wires that touch this piece between its ends become stops of it, in order. */
  private void touching(Vertex a, Vertex b, double arc, List<Stop> path, List<Integer> fixed) {
    double length = a.distanceTo(b);
    List<Stop> found = new ArrayList<>();
    for (int j = 0; j < joints.size(); j++) {
      Vertex p = joints.get(j);
      double s =
          ((p.x() - a.x()) * (b.x() - a.x())
                  + (p.y() - a.y()) * (b.y() - a.y())
                  + (p.z() - a.z()) * (b.z() - a.z()))
              / length;
      if (s <= AntennaModel.JOIN_DISTANCE || s >= length - AntennaModel.JOIN_DISTANCE) {
        continue;
      }
      double t = s / length;
      Vertex foot =
          new Vertex(
              a.x() + t * (b.x() - a.x()),
              a.y() + t * (b.y() - a.y()),
              a.z() + t * (b.z() - a.z()));
      if (foot.distanceTo(p) <= AntennaModel.JOIN_DISTANCE) {
        found.add(new Stop(arc + s, p, j));
      }
    }
    found.sort(java.util.Comparator.comparingDouble(Stop::arc));
    for (Stop stop : found) {
      fixed.add(path.size());
      path.add(stop);
    }
  }

  /**
   * Marks the points between two kept ones that must stay (Douglas and Peucker 1973), also where
   * leaving out would shorten the wire.
   */
  private void thin(List<Stop> path, int from, int to, boolean[] keep) {
    int farthest = farthest(path, from, to);
    Vertex a = path.get(from).at;
    Vertex b = path.get(to).at;
    if (farthest >= 0 && distance(path.get(farthest).at, a, b) <= tolerance) {
      farthest = -1;
    }
    double arc = path.get(to).arc - path.get(from).arc;
    if (farthest < 0 && arc - a.distanceTo(b) > SHORTENING * arc) {
      farthest = farthest(path, from, to);
    }
    // a closed wire between its one node and itself: keep something to span it
    if (farthest < 0 && a.distanceTo(b) < 1e-9 && to - from > 1) {
      farthest = (from + to) / 2;
    }
    if (farthest >= 0) {
      keep[farthest] = true;
      thin(path, from, farthest, keep);
      thin(path, farthest, to, keep);
    }
  }

  private static int farthest(List<Stop> path, int from, int to) {
    int farthest = -1;
    double most = -1;
    for (int i = from + 1; i < to; i++) {
      double off = distance(path.get(i).at, path.get(from).at, path.get(to).at);
      if (off > most) {
        most = off;
        farthest = i;
      }
    }
    return farthest;
  }

  private static double distance(Vertex p, Vertex a, Vertex b) {
    double dx = b.x() - a.x();
    double dy = b.y() - a.y();
    double dz = b.z() - a.z();
    double length2 = dx * dx + dy * dy + dz * dz;
    double t =
        length2 == 0
            ? 0
            : ((p.x() - a.x()) * dx + (p.y() - a.y()) * dy + (p.z() - a.z()) * dz) / length2;
    t = Math.max(0, Math.min(1, t));
    return p.distanceTo(new Vertex(a.x() + t * dx, a.y() + t * dy, a.z() + t * dz));
  }
}
