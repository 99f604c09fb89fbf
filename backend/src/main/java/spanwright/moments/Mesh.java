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

  Mesh(List<double[]> rows, List<int[]> ids, int nodes, AntennaModel model) {
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

  /** The part of the gap, at its middle, over which the field is spread. */
  private static final double FIELD = 0.1;

  /** And no less than so many radii: the thin-wire equation knows nothing shorter. */
  private static final double FIELD_RADII = 4;

  private static final int FIELD_POINTS = 4;

  /**
   * One volt across the feed. The field is spread evenly over the middle tenth of the gap: all at
   * one point, the charge on the two edges, and with it the susceptance, would grow for ever as the
   * mesh gets finer, the faster the thicker the wire; over the whole gap, the field would have to
   * do without the charge of that length of wire.
   */
  double[] excite(AntennaModel model) {
    double[] out = new double[unknowns];
    WireSpec fed = model.wires().get(model.feedWire());
    double total = fed.length();
    double feed = model.feedFraction() * total;
    // beyond the wire's ends there is nothing to put the field on, and some of the volt would be
    // lost
    double room = ModelCheck.closed(fed) ? total : 2 * Math.min(feed, total - feed);
    double width = Math.min(room, Math.max(FIELD * model.gap(), FIELD_RADII * fed.radius()));
    spread(model.feedWire(), feed, width, out);
    if (ModelCheck.closed(fed)) {
      spread(model.feedWire(), feed + total, width, out);
      spread(model.feedWire(), feed - total, width, out);
    }
    return out;
  }

  /** Adds the mean of each unknown's current over a stretch of a wire, by arc length. */
  private void spread(int fedWire, double middle, double width, double[] out) {
    GaussRule rule = GaussRule.of(FIELD_POINTS);
    for (int e = 0; e < elements; e++) {
      double from = Math.max(arcA[e], middle - 0.5 * width);
      double to = Math.min(arcB[e], middle + 0.5 * width);
      if (wire[e] != fedWire || to <= from) {
        continue;
      }
      for (int q = 0; q < FIELD_POINTS; q++) {
        double t = (from + (to - from) * rule.nodes[q] - arcA[e]) / (arcB[e] - arcA[e]);
        double weight = rule.weights[q] * (to - from) / width;
        for (int i = 0; i < slotShape[e].length; i++) {
          double shape = Shapes.at(Shapes.POWERS[slotShape[e][i]], t);
          out[slotUnknown[e][i]] += weight * slotSign[e][i] * shape;
        }
      }
    }
  }

  /** Makes the mesh of an outline for a wave number [1/m]. */
  static Mesh of(AntennaModel model, Outline outline, MeshRule rule, double waveNumber) {
    return new Mesher(model, outline, rule, waveNumber).make();
  }
}
