package spanwright.moments;

import java.util.ArrayList;
import java.util.List;

/**
 * The elements: straight stretches of wire, each with polynomial shape functions, tied together at
 * nodes so that the currents into a node add up to nothing.
 *
 * <p>Arrays run over elements. Element e goes from (x, y, z)[e] by length[e] along (tx, ty, tz)[e].
 * Its shapes 0..order[e] are those of {@link Shapes}; entry i of slotShape[e], slotUnknown[e],
 * slotSign[e] says that unknown slotUnknown[e][i] holds slotSign[e][i] times shape slotShape[e][i].
 * At a node where m elements meet, each but the first has an unknown that brings current out of the
 * first and into it; where one element ends there is none.
 */
final class Mesh {
  final int elements;
  final double[] x;
  final double[] y;
  final double[] z;
  final double[] tx;
  final double[] ty;
  final double[] tz;
  final double[] length;
  final double[] radius;
  final int[] wire;
  final int[] order;

  /** Which straight piece an element is of: elements of one piece are in line. */
  final int[] piece;

  final int[] nodeA;
  final int[] nodeB;

  /** Arc length along the wire as given, at the element's ends [m]. */
  final double[] arcA;

  final double[] arcB;
  final int[][] slotShape;
  final int[][] slotUnknown;
  final double[][] slotSign;
  final int unknowns;

  /** The applied field tested with each unknown, for one volt across the feed. */
  final double[] excitation;

  private Mesh(List<double[]> rows, List<int[]> ids, int nodes, AntennaModel model) {
    elements = rows.size();
    x = column(rows, 0);
    y = column(rows, 1);
    z = column(rows, 2);
    tx = column(rows, 3);
    ty = column(rows, 4);
    tz = column(rows, 5);
    length = column(rows, 6);
    arcA = column(rows, 7);
    arcB = column(rows, 8);
    radius = column(rows, 9);
    wire = new int[elements];
    order = new int[elements];
    piece = new int[elements];
    nodeA = new int[elements];
    nodeB = new int[elements];
    for (int e = 0; e < elements; e++) {
      int[] id = ids.get(e);
      wire[e] = id[0];
      order[e] = id[1];
      piece[e] = id[2];
      nodeA[e] = id[3];
      nodeB[e] = id[4];
    }
    slotShape = new int[elements][];
    slotUnknown = new int[elements][];
    slotSign = new double[elements][];
    unknowns = tie(nodes);
    excitation = excite(model);
  }

  private static double[] column(List<double[]> rows, int c) {
    double[] out = new double[rows.size()];
    for (int i = 0; i < out.length; i++) {
      out[i] = rows.get(i)[c];
    }
    return out;
  }

  /** Numbers the unknowns. */
  private int tie(int nodes) {
    List<List<double[]>> slots = new ArrayList<>();
    int[] first = new int[nodes];
    java.util.Arrays.fill(first, -1);
    for (int e = 0; e < elements; e++) {
      slots.add(new ArrayList<>());
    }
    int count = 0;
    for (int e = 0; e < elements; e++) {
      for (int end = 0; end < 2; end++) {
        int node = end == 0 ? nodeA[e] : nodeB[e];
        double outward = end == 0 ? 1 : -1;
        if (first[node] < 0) {
          first[node] = 2 * e + end;
          continue;
        }
        int partner = first[node] / 2;
        int partnerEnd = first[node] % 2;
        slots.get(e).add(new double[] {end, count, outward});
        slots.get(partner).add(new double[] {partnerEnd, count, partnerEnd == 0 ? -1 : 1});
        count++;
      }
      for (int shape = 2; shape <= order[e]; shape++) {
        slots.get(e).add(new double[] {shape, count, 1});
        count++;
      }
    }
    for (int e = 0; e < elements; e++) {
      List<double[]> list = slots.get(e);
      int n = list.size();
      slotShape[e] = new int[n];
      slotUnknown[e] = new int[n];
      slotSign[e] = new double[n];
      for (int i = 0; i < n; i++) {
        slotShape[e][i] = (int) list.get(i)[0];
        slotUnknown[e][i] = (int) list.get(i)[1];
        slotSign[e][i] = list.get(i)[2];
      }
    }
    return count;
  }

  /**
   * One volt across the middle of the gap. The field is taken to act at a point: spread over the
   * gap's width it would also have to charge that length of wire, which no centre piece has, and
   * whose few tenths of a picofarad move only impedances of thousands of ohms.
   */
  double[] excite(AntennaModel model) {
    double[] out = new double[unknowns];
    double feed = model.feedFraction() * model.wires().get(model.feedWire()).length();
    for (int e = 0; e < elements; e++) {
      if (wire[e] == model.feedWire() && feed <= arcB[e] + 1e-12) {
        double t = Math.max(0, Math.min(1, (feed - arcA[e]) / (arcB[e] - arcA[e])));
        for (int i = 0; i < slotShape[e].length; i++) {
          out[slotUnknown[e][i]] += slotSign[e][i] * Shapes.at(Shapes.POWERS[slotShape[e][i]], t);
        }
        break;
      }
    }
    return out;
  }

  /** Makes the mesh of an outline for a wave number [1/m]. */
  static Mesh of(AntennaModel model, Outline outline, MeshRule rule, double waveNumber) {
    return new Mesher(model, outline, rule, waveNumber).make();
  }

  /** Places the nodes. */
  private static final class Mesher {
    private static final int MOST_ELEMENTS = 600;
    private static final int STEPS = 48;

    /** Elements are at least so many radii long. */
    private static final double LEAST_RADII = 3;

    private final AntennaModel model;
    private final Outline outline;
    private final MeshRule rule;
    private final double k;
    private final List<double[]> rows = new ArrayList<>();
    private final List<int[]> ids = new ArrayList<>();
    private int nodes;

    Mesher(AntennaModel model, Outline outline, MeshRule rule, double k) {
      this.model = model;
      this.outline = outline;
      this.rule = rule;
      this.k = k;
      nodes = outline.degree.length;
    }

    Mesh make() {
      double total = model.wires().get(model.feedWire()).length();
      double feed = model.feedFraction() * total;
      refuseJunction(feed);
      boolean closed = ModelCheck.closed(model.wires().get(model.feedWire()));
      for (int p = 0; p < outline.pieces.size(); p++) {
        Outline.Piece piece = outline.pieces.get(p);
        List<double[]> anchors = new ArrayList<>();
        anchors.add(new double[] {piece.arcA(), pace(piece, p, piece.nodeA())});
        anchors.add(new double[] {piece.arcB(), pace(piece, p, piece.nodeB())});
        double cut = Double.NaN;
        if (piece.wire() == model.feedWire()) {
          double pace = Math.max(rule.feed() / k, 0.5 * model.gap());
          anchors.add(new double[] {feed, pace});
          if (closed) {
            anchors.add(new double[] {feed + total, pace});
            anchors.add(new double[] {feed - total, pace});
          }
          double clear = 0.02 * (piece.arcB() - piece.arcA());
          if (feed > piece.arcA() + clear && feed < piece.arcB() - clear) {
            cut = feed;
          }
        }
        if (Double.isNaN(cut)) {
          stretch(p, piece, piece.arcA(), piece.arcB(), piece.nodeA(), piece.nodeB(), anchors);
        } else {
          int middle = nodes++;
          stretch(p, piece, piece.arcA(), cut, piece.nodeA(), middle, anchors);
          stretch(p, piece, cut, piece.arcB(), middle, piece.nodeB(), anchors);
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
    private void refuseJunction(double feed) {
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

    /** Length of the element beside a node. */
    private double pace(Outline.Piece piece, int index, int node) {
      if (outline.degree[node] == 1) {
        // the charge at an open end crowds into a few radii: thick wires need shorter ends
        double thickness = k * model.wires().get(piece.wire()).radius();
        return rule.end() / k / (1 + thickness / 0.004);
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
          if (cos > 0.985 && radii > 0.8 && radii < 1.25) {
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
        int index,
        Outline.Piece piece,
        double from,
        double to,
        int nodeFrom,
        int nodeTo,
        List<double[]> anchors) {
      double[] sum = new double[STEPS + 1];
      for (int i = 0; i < STEPS; i++) {
        double at = from + (to - from) * (i + 0.5) / STEPS;
        sum[i + 1] = sum[i] + (to - from) / STEPS / size(piece, at, anchors);
      }
      double least = LEAST_RADII * model.wires().get(piece.wire()).radius();
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
        element(index, piece, arc, next, node, nodeNext);
        arc = next;
        node = nodeNext;
      }
    }

    private double size(Outline.Piece piece, double at, List<double[]> anchors) {
      double size = rule.longest() / k;
      for (double[] anchor : anchors) {
        size = Math.min(size, anchor[1] + rule.growth() * Math.abs(at - anchor[0]));
      }
      return Math.max(size, LEAST_RADII * model.wires().get(piece.wire()).radius());
    }

    private void element(
        int index, Outline.Piece piece, double arcA, double arcB, int nodeA, int nodeB) {
      double span = piece.arcB() - piece.arcA();
      double t = (arcA - piece.arcA()) / span;
      Vertex a = piece.a();
      Vertex b = piece.b();
      double whole = piece.length();
      double length = whole * (arcB - arcA) / span;
      rows.add(
          new double[] {
            a.x() + t * (b.x() - a.x()),
            a.y() + t * (b.y() - a.y()),
            a.z() + t * (b.z() - a.z()),
            (b.x() - a.x()) / whole,
            (b.y() - a.y()) / whole,
            (b.z() - a.z()) / whole,
            length,
            arcA,
            arcB,
            model.wires().get(piece.wire()).radius()
          });
      ids.add(new int[] {piece.wire(), rule.order(k * length), index, nodeA, nodeB});
    }
  }
}
