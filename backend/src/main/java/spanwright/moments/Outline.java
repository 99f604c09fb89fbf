package spanwright.moments;

import java.util.ArrayList;
import java.util.List;

/**
 * The wires as few straight pieces between numbered nodes: many short pieces of a hanging shape are
 * drawn together where none of its points strays by more than a tolerance, and the places where the
 * pieces meet are set out so that each piece runs through the middle of what it stands for; ends of
 * wires that coincide become one node, and an end that touches another wire's path makes a node
 * there.
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
  private boolean thinned;

  private Outline(AntennaModel model, double tolerance) {
    this.model = model;
    this.tolerance = tolerance;
  }

  /** Wires side by side are drawn within this part of what lies between them. */
  private static final double STRAY_OF_SPACING = 0.1;

  /** The outline of a model that {@link ModelCheck} has passed. */
  static Outline of(AntennaModel model, double tolerance) {
    Outline outline = new Outline(model, tolerance);
    outline.draw();
    double apart = Crossings.refuse(outline.pieces, model, tolerance / STRAY_OF_SPACING);
    if (outline.thinned && STRAY_OF_SPACING * apart < tolerance) {
      outline = new Outline(model, STRAY_OF_SPACING * apart);
      outline.draw();
      Crossings.refuse(outline.pieces, model, 0);
    }
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
    pieces(w, path, keep);
  }

  /** Makes the pieces between the stops that are kept. */
  private void pieces(int w, List<Stop> path, boolean[] keep) {
    int count = 0;
    for (boolean kept : keep) {
      count += kept ? 1 : 0;
    }
    thinned |= count < path.size();
    int[] stops = new int[count];
    count = 0;
    for (int i = 0; i < path.size(); i++) {
      if (keep[i]) {
        stops[count++] = i;
      }
    }
    Vertex[] at = count < path.size() ? centred(path, stops) : places(path, stops);
    int nodeBefore = path.get(0).node;
    for (int i = 1; i < count; i++) {
      Stop before = path.get(stops[i - 1]);
      Stop here = path.get(stops[i]);
      int node = here.node >= 0 ? here.node : nodes++;
      pieces.add(new Piece(w, at[i - 1], at[i], before.arc, here.arc, nodeBefore, node));
      nodeBefore = node;
    }
  }

  private static Vertex[] places(List<Stop> path, int[] stops) {
    Vertex[] at = new Vertex[stops.length];
    for (int i = 0; i < stops.length; i++) {
      at[i] = path.get(stops[i]).at;
    }
    return at;
  }

  /**
   * The places of the stops, moved so that the pieces between them stray to both sides alike: a
   * chord lies all on one side of a curve, and would bring a hanging wire higher and shorter than
   * it is. A piece whose two ends are free asks each to move by its mean distance from the curve,
   * one with a single free end by twice that; a stop takes the mean of what it is asked.
   */
  private static Vertex[] centred(List<Stop> path, int[] stops) {
    Vertex[] at = places(path, stops);
    Vertex[] out = at.clone();
    int n = stops.length - 1;
    double[][] wanted = new double[n + 1][3];
    for (int c = 0; c < n; c++) {
      double[] mean = stray(path, stops[c], stops[c + 1]);
      boolean freeA = path.get(stops[c]).node < 0;
      boolean freeB = path.get(stops[c + 1]).node < 0;
      double share = freeA && freeB ? 0.5 : 1;
      for (int axis = 0; axis < 3; axis++) {
        wanted[c][axis] += share * mean[axis];
        wanted[c + 1][axis] += share * mean[axis];
      }
    }
    for (int i = 1; i < n; i++) {
      if (path.get(stops[i]).node < 0) {
        Vertex p = at[i];
        out[i] = new Vertex(p.x() + wanted[i][0], p.y() + wanted[i][1], p.z() + wanted[i][2]);
      }
    }
    return out;
  }

  /** Mean of path less chord, by arc length, between two stops. */
  private static double[] stray(List<Stop> path, int from, int to) {
    Stop a = path.get(from);
    Stop b = path.get(to);
    double span = b.arc - a.arc;
    double[] mean = new double[3];
    for (int i = from + 1; i < to; i++) {
      Stop p = path.get(i);
      double weight = 0.5 * (path.get(i + 1).arc - path.get(i - 1).arc) / span;
      double t = (p.arc - a.arc) / span;
      mean[0] += weight * (p.at.x() - a.at.x() - t * (b.at.x() - a.at.x()));
      mean[1] += weight * (p.at.y() - a.at.y() - t * (b.at.y() - a.at.y()));
      mean[2] += weight * (p.at.z() - a.at.z() - t * (b.at.z() - a.at.z()));
    }
    return mean;
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

  /** Squared distance of two pieces [m²]; writes how far along each the nearest places lie [m]. */
  static double squared(Piece p, Piece q, double[] place) {
    double lp = p.length();
    double lq = q.length();
    Vertex a = p.a();
    Vertex b = q.a();
    return Segments.squared(
        a.x(),
        a.y(),
        a.z(),
        (p.b().x() - a.x()) / lp,
        (p.b().y() - a.y()) / lp,
        (p.b().z() - a.z()) / lp,
        lp,
        b.x(),
        b.y(),
        b.z(),
        (q.b().x() - b.x()) / lq,
        (q.b().y() - b.y()) / lq,
        (q.b().z() - b.z()) / lq,
        lq,
        place);
  }
}
