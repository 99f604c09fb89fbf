package spanwright.moments;

import java.util.ArrayList;
import java.util.List;

/**
 * Places the nodes along the pieces of an outline. Where the charge changes quickly (feed, open
 * ends, bends, junctions, and wherever such a place of one wire comes close to another wire) stands
 * an anchor with the length of the element beside it; lengths grow in proportion to the distance
 * from the anchors, up to the longest.
 */
final class Mesher {
  private static final int MOST_ELEMENTS = 600;
  private static final int STEPS = 48;

  /**
   * Elements are at least so many radii long. What varies along a wire within a few radii the
   * reduced kernel gets wrong, more so the finer the mesh: a third order on six radii is as far as
   * it may be asked.
   */
  private static final double LEAST_RADII = 6;

  /**
   * Beside an open end of the fed wire, where most of that charge is: a finer mesh there makes the
   * resonance lower than published solutions of the same equation have it.
   */
  private static final double FED_END_RADII = 12;

  /** And so many outer radii of insulation, whose share of the charge's field is taken as local. */
  private static final double LEAST_SHEATH_RADII = 10;

  /** The element beside the feed is at least this part of the gap. */
  private static final double LEAST_OF_GAP = 0.06;

  /** Where another wire passes so near, as phase, it is told of ends, bends and the feed. */
  private static final double BESIDE = 0.15;

  /** Bends of less than this need nothing: its cosine. */
  private static final double GENTLE = 0.985;

  /** Pieces whose cosine is greater run side by side rather than crosswise. */
  private static final double CROSSWISE = 0.9;

  /** Length of the element where wires pass crosswise, over how far apart they are. */
  private static final double CROSSING = 1.5;

  /** An element longer than this part of its distance from an anchor lies in its graded part. */
  private static final double GRADED = 0.8;

  /**
   * Where elements are to be short.
   *
   * @param arc along the piece's wire [m]
   * @param pace length of the element there [m]
   * @param growth of the length with distance
   */
  private record Anchor(double arc, double pace, double growth) {}

  /** A place with quickly changing charge; node is −1 for the feed. */
  private record Spot(Vertex at, int node, int piece, double pace) {}

  private final AntennaModel model;
  private final Outline outline;
  private final MeshRule rule;
  private final double k;
  private final double feed;
  private final double feedTotal;
  private final boolean closed;
  private final List<Spot> spots = new ArrayList<>();
  private final List<double[]> rows = new ArrayList<>();
  private final List<int[]> ids = new ArrayList<>();
  private int nodes;

  Mesher(AntennaModel model, Outline outline, MeshRule rule, double k) {
    this.model = model;
    this.outline = outline;
    this.rule = rule;
    this.k = k;
    nodes = outline.degree.length;
    WireSpec fed = model.wires().get(model.feedWire());
    feedTotal = fed.length();
    feed = model.feedFraction() * feedTotal;
    closed = ModelCheck.closed(fed);
  }

  Mesh make() {
    refuseJunction();
    findSpots();
    for (int p = 0; p < outline.pieces.size(); p++) {
      Outline.Piece piece = outline.pieces.get(p);
      List<Anchor> anchors = anchors(p, piece);
      double cut = cut(piece);
      if (Double.isNaN(cut)) {
        stretch(p, piece.arcA(), piece.arcB(), piece.nodeA(), piece.nodeB(), anchors);
      } else {
        int middle = nodes++;
        stretch(p, piece.arcA(), cut, piece.nodeA(), middle, anchors);
        stretch(p, cut, piece.arcB(), middle, piece.nodeB(), anchors);
      }
      if (rows.size() > MOST_ELEMENTS) {
        throw new ModelFault(
            "The wires are too long in wavelengths to solve: "
                + ModelCheck.name(piece.wire())
                + " takes the count of elements beyond "
                + MOST_ELEMENTS
                + ". Shorten it, leave out wires, or lower the frequency.");
      }
    }
    return new Mesh(rows, ids, nodes, model);
  }

  /** A feed where three wires meet would not say which of them it is in. */
  private void refuseJunction() {
    for (Outline.Piece piece : outline.pieces) {
      if (piece.wire() != model.feedWire()) {
        continue;
      }
      double reach = 0.5 * model.gap();
      boolean a = outline.degree[piece.nodeA()] > 2 && Math.abs(piece.arcA() - feed) < reach;
      boolean b = outline.degree[piece.nodeB()] > 2 && Math.abs(piece.arcB() - feed) < reach;
      if (a || b) {
        throw new ModelFault(
            "The feed on "
                + ModelCheck.name(model.feedWire())
                + " lies where three wires meet: move it at least "
                + reach
                + " m along the wire it is in.");
      }
    }
  }

  private double feedPace() {
    return Math.max(rule.feed() / k, LEAST_OF_GAP * model.gap());
  }

  /** Where the feed cuts a piece in two, or NaN. */
  private double cut(Outline.Piece piece) {
    double clear = Math.min(0.02 * (piece.arcB() - piece.arcA()), 0.25 * feedPace());
    return piece.wire() == model.feedWire()
            && feed > piece.arcA() + clear
            && feed < piece.arcB() - clear
        ? feed
        : Double.NaN;
  }

  private void findSpots() {
    if (outline.pieces.size() < 2) {
      return;
    }
    boolean[] seen = new boolean[outline.degree.length];
    for (int p = 0; p < outline.pieces.size(); p++) {
      Outline.Piece piece = outline.pieces.get(p);
      for (int end = 0; end < 2; end++) {
        int node = end == 0 ? piece.nodeA() : piece.nodeB();
        double pace = pace(piece, p, node);
        if (!seen[node] && pace < rule.longest() / k) {
          seen[node] = true;
          spots.add(new Spot(end == 0 ? piece.a() : piece.b(), node, p, pace));
        }
      }
      double cut = cut(piece);
      if (!Double.isNaN(cut)) {
        spots.add(new Spot(along(piece, cut), -1, p, feedPace()));
      }
    }
  }

  private static Vertex along(Outline.Piece piece, double arc) {
    double t = (arc - piece.arcA()) / (piece.arcB() - piece.arcA());
    Vertex a = piece.a();
    Vertex b = piece.b();
    return new Vertex(
        a.x() + t * (b.x() - a.x()), a.y() + t * (b.y() - a.y()), a.z() + t * (b.z() - a.z()));
  }

  private List<Anchor> anchors(int p, Outline.Piece piece) {
    List<Anchor> anchors = new ArrayList<>();
    anchors.add(new Anchor(piece.arcA(), pace(piece, p, piece.nodeA()), growth(piece.nodeA())));
    anchors.add(new Anchor(piece.arcB(), pace(piece, p, piece.nodeB()), growth(piece.nodeB())));
    if (piece.wire() == model.feedWire()) {
      anchors.add(new Anchor(feed, feedPace(), rule.feedGrowth()));
      if (closed) {
        anchors.add(new Anchor(feed + feedTotal, feedPace(), rule.feedGrowth()));
        anchors.add(new Anchor(feed - feedTotal, feedPace(), rule.feedGrowth()));
      }
    }
    double reach = BESIDE / k;
    for (Spot spot : spots) {
      if (spot.piece == p || spot.node == piece.nodeA() || spot.node == piece.nodeB()) {
        continue;
      }
      double length = piece.length();
      Vertex a = piece.a();
      Vertex b = piece.b();
      double t =
          ((spot.at.x() - a.x()) * (b.x() - a.x())
                  + (spot.at.y() - a.y()) * (b.y() - a.y())
                  + (spot.at.z() - a.z()) * (b.z() - a.z()))
              / (length * length);
      if (t < 0 || t > 1) {
        continue;
      }
      double arc = piece.arcA() + t * (piece.arcB() - piece.arcA());
      double apart = along(piece, arc).distanceTo(spot.at);
      if (apart < reach) {
        anchors.add(new Anchor(arc, Math.max(spot.pace, apart), rule.bendGrowth()));
      }
    }
    addCrossings(p, piece, reach, anchors);
    return anchors;
  }

  /** Where another piece passes by crosswise, charge gathers on both: short elements there too. */
  private void addCrossings(int p, Outline.Piece piece, double reach, List<Anchor> anchors) {
    double[] place = new double[2];
    for (int q = 0; q < outline.pieces.size(); q++) {
      Outline.Piece other = outline.pieces.get(q);
      boolean joined =
          other.nodeA() == piece.nodeA()
              || other.nodeA() == piece.nodeB()
              || other.nodeB() == piece.nodeA()
              || other.nodeB() == piece.nodeB();
      if (q == p || joined || Math.abs(cosine(piece, other)) > CROSSWISE) {
        continue;
      }
      double apart = Math.sqrt(Outline.squared(piece, other, place));
      double at = place[0] / piece.length();
      double beyond = place[1] / other.length();
      if (apart < reach && at > 0 && at < 1 && beyond > 0 && beyond < 1) {
        double arc = piece.arcA() + at * (piece.arcB() - piece.arcA());
        anchors.add(new Anchor(arc, Math.max(CROSSING * apart, rule.end() / k), rule.bendGrowth()));
      }
    }
  }

  private double growth(int node) {
    return outline.degree[node] == 1 ? rule.endGrowth() : rule.bendGrowth();
  }

  /** Length of the element beside a node. */
  private double pace(Outline.Piece piece, int index, int node) {
    if (outline.degree[node] == 1) {
      // the charge at an open end crowds into a few radii: thick wires need shorter ends
      double thickness = k * model.wires().get(piece.wire()).radius();
      double pace = rule.end() / k / (1 + thickness / 0.004);
      boolean fed = piece.wire() == model.feedWire();
      return fed ? Math.max(FED_END_RADII * model.wires().get(piece.wire()).radius(), pace) : pace;
    }
    if (outline.degree[node] > 2) {
      return rule.bend() / k;
    }
    for (int q = 0; q < outline.pieces.size(); q++) {
      Outline.Piece other = outline.pieces.get(q);
      if (q != index && (other.nodeA() == node || other.nodeB() == node)) {
        double cos = Math.abs(cosine(piece, other));
        double radii =
            model.wires().get(piece.wire()).radius() / model.wires().get(other.wire()).radius();
        if (cos > GENTLE && radii > 0.8 && radii < 1.25) {
          return rule.longest() / k;
        }
      }
    }
    return rule.bend() / k;
  }

  private static double cosine(Outline.Piece p, Outline.Piece q) {
    return ((p.b().x() - p.a().x()) * (q.b().x() - q.a().x())
            + (p.b().y() - p.a().y()) * (q.b().y() - q.a().y())
            + (p.b().z() - p.a().z()) * (q.b().z() - q.a().z()))
        / (p.length() * q.length());
  }

  /** Elements from arc to arc of a piece, their lengths following the anchors. */
  private void stretch(
      int index, double from, double to, int nodeFrom, int nodeTo, List<Anchor> anchors) {
    Outline.Piece piece = outline.pieces.get(index);
    double least = least(piece);
    double[] sum = new double[STEPS + 1];
    for (int i = 0; i < STEPS; i++) {
      double at = from + (to - from) * (i + 0.5) / STEPS;
      sum[i + 1] = sum[i] + (to - from) / STEPS / Math.max(least, size(at, anchors));
    }
    int count = (int) Math.min(Math.ceil(sum[STEPS] - 0.05), Math.floor((to - from) / least));
    count = Math.max(1, count);
    int node = nodeFrom;
    double arc = from;
    int step = 0;
    for (int i = 1; i <= count; i++) {
      double next = to;
      int nodeNext = nodeTo;
      if (i < count) {
        double want = sum[STEPS] * i / count;
        while (sum[step + 1] < want) {
          step++;
        }
        double part = (want - sum[step]) / (sum[step + 1] - sum[step]);
        next = from + (to - from) * (step + part) / STEPS;
        nodeNext = nodes++;
      }
      element(index, arc, next, node, nodeNext, graded(arc, next, anchors));
      arc = next;
      node = nodeNext;
    }
  }

  private double size(double at, List<Anchor> anchors) {
    double size = rule.longest() / k;
    for (Anchor anchor : anchors) {
      size = Math.min(size, anchor.pace + anchor.growth * Math.abs(at - anchor.arc));
    }
    return size;
  }

  private double least(Outline.Piece piece) {
    WireSpec wire = model.wires().get(piece.wire());
    return wire.sheath() == null
        ? LEAST_RADII * wire.radius()
        : LEAST_SHEATH_RADII * wire.sheath().radius();
  }

  /** Whether an element is long for its distance from where the charge changes quickly. */
  private boolean graded(double from, double to, List<Anchor> anchors) {
    double middle = 0.5 * (from + to);
    for (Anchor anchor : anchors) {
      if (anchor.pace < 0.7 * rule.longest() / k
          && to - from > GRADED * Math.abs(middle - anchor.arc)) {
        return true;
      }
    }
    return false;
  }

  private void element(int index, double arcA, double arcB, int nodeA, int nodeB, boolean graded) {
    Outline.Piece piece = outline.pieces.get(index);
    Vertex a = piece.a();
    Vertex b = piece.b();
    Vertex at = along(piece, arcA);
    double whole = piece.length();
    double length = whole * (arcB - arcA) / (piece.arcB() - piece.arcA());
    rows.add(
        new double[] {
          at.x(),
          at.y(),
          at.z(),
          (b.x() - a.x()) / whole,
          (b.y() - a.y()) / whole,
          (b.z() - a.z()) / whole,
          length,
          arcA,
          arcB,
          model.wires().get(piece.wire()).radius()
        });
    ids.add(new int[] {piece.wire(), rule.order(k * length, graded), index, nodeA, nodeB});
  }
}
