package spanwright.rigging;

import java.util.ArrayList;
import java.util.List;
import spanwright.plan.Place;

/** The net of {@link JoinedSpans}: its chains, its loads, and what a solve leaves, read out. */
final class JoinedModel {
  private static final double G = Hanging.GRAVITY;

  /** A rope of no length is given this much, so that it has a stiffness [m]. */
  private static final double LEAST = 1e-3;

  /** Ropes are let out no farther than this [m]. */
  private static final double FARTHEST = 30;

  final List<Integer> adjustable = new ArrayList<>();
  final double leastOut;
  final double mostOut;

  final Hang hang;
  final Course course;
  final int holds;
  final int[] node;
  final Chain[] chains;
  final Net net;
  final SpanStatics[] shells;
  private final double[] drawnRope;
  private final double[] rope;
  private final double[] stretch;
  private double[] keptAt;
  private double[][] keptLength;
  private double[][] keptStart;

  JoinedModel(Hang hang) {
    this.hang = hang;
    course = hang.course;
    holds = hang.holders.size();
    int spans = course.spans().size();
    node = new int[holds];
    int corners = 0;
    for (int a = 0; a < holds; a++) {
      node[a] = course.corners()[a] == null ? a : holds + corners++;
    }
    chains = new Chain[spans + corners];
    int[] begins = new int[chains.length];
    int[] ends = new int[chains.length];
    drawnRope = new double[holds];
    for (int i = 0; i < spans; i++) {
      Course.Stretch each = course.spans().get(i);
      chains[i] = new Chain(4);
      begins[i] = node[each.fromHold()];
      ends[i] = node[each.toHold()];
      drawnRope[each.fromHold()] = Math.max(drawnRope[each.fromHold()], each.ropeFrom());
      drawnRope[each.toHold()] = Math.max(drawnRope[each.toHold()], each.ropeTo());
    }
    for (int a = 0; a < holds; a++) {
      if (node[a] >= holds) {
        int c = spans + node[a] - holds;
        chains[c] = new Chain(1);
        begins[c] = a;
        ends[c] = node[a];
      }
    }
    net = new Net(holds, corners, chains, begins, ends);
    shells = new SpanStatics[spans];
    for (int i = 0; i < spans; i++) {
      shells[i] = shell(course.spans().get(i), i);
    }
    rope = drawnRope.clone();
    stretch = new double[chains.length];
    chooseAdjustable();
    double least = Double.POSITIVE_INFINITY;
    for (int a : adjustable) {
      least = Math.min(least, drawnRope[a] - leastRope(a));
    }
    leastOut = -least;
    mostOut = FARTHEST;
    flexibilities();
  }

  /** A wire's ends are drawn in by their ropes, a loop by all of its ropes. */
  private void chooseAdjustable() {
    for (int pass = 0; pass < 2 && adjustable.isEmpty(); pass++) {
      for (int a = 0; a < holds; a++) {
        boolean corner = node[a] >= holds;
        boolean end = course.isOuter(a) && drawnRope[a] > 0.01;
        if (course.loop() || pass == 1 ? corner : end) {
          adjustable.add(a);
        }
      }
    }
  }

  private SpanStatics shell(Course.Stretch stretch, int i) {
    boolean fed = course.feedSpan() == i;
    double before = fed ? course.feedAt() - stretch.from() : stretch.wire();
    boolean ropeFrom = node[stretch.fromHold()] < holds;
    boolean ropeTo = node[stretch.toHold()] < holds;
    return new SpanStatics(
        new SpanStatics.Make(
            drawn(stretch.fromHold()),
            drawn(stretch.toHold()),
            0,
            0,
            before,
            stretch.wire() - before,
            ropeFrom ? stretch.ropeFrom() : 0,
            ropeTo ? stretch.ropeTo() : 0,
            ropeFrom && stretch.ropeFrom() > 0,
            ropeTo && stretch.ropeTo() > 0,
            fed),
        hang.materials(stretch.conductor()),
        true,
        false);
  }

  private Place drawn(int a) {
    return node[a] < holds ? hang.at(a) : course.corners()[a];
  }

  SpanStatics shell(int i) {
    shells[i].setFeedLoad(hang.feedLoad);
    return shells[i];
  }

  /** Wire and rope of a stretch over the way between what holds it, as drawn. */
  double drawnSlack(int i) {
    SpanStatics.Make make = shells[i].make;
    double length = make.ropeFrom() + make.wire() + make.wireAfter() + make.ropeTo();
    return length / Math.max(1e-9, shells[i].chordLength);
  }

  /** Whether a rope holds the wire there, so that a counterweight may draw it. */
  boolean hasRope(int a) {
    return drawnRope[a] > 0.01 && (node[a] >= holds || course.isOuter(a));
  }

  double leastRope(int a) {
    return Math.min(drawnRope[a], Practice.SHORTEST_TAIL);
  }

  double rope(int a) {
    return rope[a];
  }

  /** Rope at an attachment's end of a span [m]: a bend's own, or that at the end of the wire. */
  double ropeAt(int a, int i) {
    Course.Stretch each = course.spans().get(i);
    boolean has = node[a] >= holds || (each.fromHold() == a ? each.ropeFrom() : each.ropeTo()) > 0;
    return has ? Math.max(0, rope[a]) : 0;
  }

  // --- setting up

  private void flexibilities() {
    for (int c = 0; c < chains.length; c++) {
      boolean span = c < shells.length;
      Materials materials = hang.materials(span ? course.spans().get(c).conductor() : 0);
      if (span) {
        chains[c].flexibility[0] = 1 / materials.ropeStiffness();
        chains[c].flexibility[1] = 1 / materials.wireStiffness();
        chains[c].flexibility[2] = 1 / materials.wireStiffness();
        chains[c].flexibility[3] = 1 / materials.ropeStiffness();
      } else {
        chains[c].flexibility[0] = 1 / materials.ropeStiffness();
      }
    }
  }

  /** Sets every node where it is drawn. */
  void begin() {
    for (int a = 0; a < holds; a++) {
      place(a, hang.at(a), 0, 0);
      if (node[a] >= holds) {
        place(node[a], course.corners()[a], 0, -0.01);
      }
    }
    loads(Weather.CALM, new double[] {0, 0});
  }

  private void place(int n, Place at, double aside, double up) {
    net.at[3 * n] = at.x() + aside;
    net.at[3 * n + 1] = at.y();
    net.at[3 * n + 2] = at.z() + up;
  }

  /** Takes wire and ropes as drawn to be stretched by a tension, or by their own where NaN. */
  void stretchBy(double tension) {
    for (int c = 0; c < chains.length; c++) {
      stretch[c] =
          Double.isNaN(tension)
              ? (chains[c].tensionAtStart() + chains[c].tensionAtEnd()) / 2
              : tension;
    }
  }

  /** Greatest share of its length by which a wire's stretch differs from that taken. */
  double stretchedOtherwise() {
    double most = 0;
    for (int c = 0; c < shells.length; c++) {
      double tension = (chains[c].tensionAtStart() + chains[c].tensionAtEnd()) / 2;
      most = Math.max(most, Math.abs(tension - stretch[c]) * chains[c].flexibility[1]);
    }
    return most;
  }

  private void lengths() {
    for (int i = 0; i < shells.length; i++) {
      Course.Stretch each = course.spans().get(i);
      SpanStatics.Make make = shells[i].make;
      Chain chain = chains[i];
      double wire = 1 + stretch[i] * chain.flexibility[1];
      double ropes = 1 + stretch[i] * chain.flexibility[0];
      chain.length[0] = make.ropeFrom() > 0 ? rope[each.fromHold()] / ropes : 0;
      chain.length[1] = make.wire() / wire;
      chain.length[2] = make.wireAfter() / wire;
      chain.length[3] = make.ropeTo() > 0 ? rope[each.toHold()] / ropes : 0;
    }
    for (int a = 0; a < holds; a++) {
      if (node[a] >= holds) {
        int c = shells.length + node[a] - holds;
        double length = rope[a] / (1 + stretch[c] * chains[c].flexibility[0]);
        chains[c].length[0] = Math.max(LEAST, length);
      }
    }
  }

  private void loads(Weather weather, double[] wind) {
    java.util.Arrays.fill(net.load, 0);
    double insulator = -Practice.INSULATOR_WEIGHT * G;
    for (int i = 0; i < shells.length; i++) {
      Materials materials = hang.materials(course.spans().get(i).conductor());
      SpanStatics.Make make = shells[i].make;
      for (int piece = 0; piece < 4; piece++) {
        piece(i, piece, materials, piece == 0 || piece == 3, weather, wind);
      }
      chains[i].setPoint(0, 0, 0, make.insulatorFrom() ? insulator : 0);
      chains[i].setPoint(2, 0, 0, make.insulatorTo() ? insulator : 0);
      if (make.fed()) {
        double push = hang.feedLoad.push(weather);
        chains[i].setPoint(1, push * wind[0], push * wind[1], -hang.feedLoad.weight(weather));
      }
    }
    for (int a = 0; a < holds; a++) {
      if (node[a] >= holds) {
        piece(shells.length + node[a] - holds, 0, hang.materials(0), true, weather, wind);
        corner(a, weather, wind);
      }
    }
  }

  private void corner(int a, Weather weather, double[] wind) {
    int n = 3 * node[a];
    double weight = Practice.INSULATOR_WEIGHT * G;
    double push = 0;
    if (course.feedHeld() == a || hang.feedsTail(a)) {
      weight += hang.feedLoad.weight(weather);
      push += hang.feedLoad.push(weather);
    }
    double tail = hang.tailLength(a);
    Materials materials = hang.materials(0);
    weight += tail * hang.tailWeight(weather);
    push += tail * materials.push(materials.wireDiameter(), weather);
    net.load[n] += push * wind[0];
    net.load[n + 1] += push * wind[1];
    net.load[n + 2] -= weight;
  }

  /** Weight of a piece, and the push of the part of the wind that meets it square. */
  private void piece(
      int c, int piece, Materials materials, boolean isRope, Weather weather, double[] wind) {
    double diameter = isRope ? materials.ropeDiameter() : materials.wireDiameter();
    double kilograms = isRope ? materials.ropeWeight() : materials.wireWeight();
    double weight = materials.weight(kilograms, diameter, weather.iced);
    if (!weather.windy()) {
      chains[c].setLoad(piece, 0, 0, -weight);
      return;
    }
    double[] t = net.course(c);
    double along = wind[0] * t[0] + wind[1] * t[1];
    double x = wind[0] - along * t[0];
    double y = wind[1] - along * t[1];
    double z = -along * t[2];
    double push = materials.push(diameter, weather) * Math.sqrt(x * x + y * y + z * z);
    chains[c].setLoad(piece, push * x, push * y, push * z - weight);
  }

  // --- solving

  /**
   * Hangs it calm with the ropes let out so far.
   *
   * @return the greatest tension of any wire [N]
   */
  double calm(double out) {
    for (int a : adjustable) {
      rope[a] = Math.max(leastRope(a), drawnRope[a] + out);
    }
    lengths();
    net.solve();
    keep();
    double most = 0;
    for (int i = 0; i < shells.length; i++) {
      most = Math.max(most, chains[i].greatestTension());
    }
    return most;
  }

  private void keep() {
    keptAt = net.at.clone();
    keptLength = new double[chains.length][];
    keptStart = new double[chains.length][];
    for (int c = 0; c < chains.length; c++) {
      keptLength[c] = chains[c].length.clone();
      keptStart[c] = chains[c].start.clone();
    }
  }

  /** Back to the calm shape. */
  void restore() {
    System.arraycopy(keptAt, 0, net.at, 0, keptAt.length);
    for (int c = 0; c < chains.length; c++) {
      System.arraycopy(keptLength[c], 0, chains[c].length, 0, keptLength[c].length);
      System.arraycopy(keptStart[c], 0, chains[c].start, 0, 3);
    }
    loads(Weather.CALM, new double[] {0, 0});
  }

  /** Blows it from the calm shape, every length kept; swaying supports move along. */
  void blow(Weather weather, double[] wind) {
    loads(weather, wind);
    for (int a = 0; a < holds && weather.windy(); a++) {
      double sway = hang.holders.get(a).sway();
      net.at[3 * a] += sway * wind[0];
      net.at[3 * a + 1] += sway * wind[1];
    }
    net.solve();
  }

  /**
   * Gives a rope another length and hangs it again.
   *
   * @return the tension of that rope at its attachment [N]
   */
  double run(int a, double length) {
    int c = chainOf(a);
    Chain chain = chains[c];
    int piece = c >= shells.length || course.spans().get(c).fromHold() == a ? 0 : 3;
    double stretched = 1 + stretch[c] * chain.flexibility[piece];
    chain.length[piece] = Math.max(LEAST, length / stretched);
    net.solve();
    return piece == 0 ? chain.tensionAtStart() : chain.tensionAtEnd();
  }

  /** The chain with an attachment's rope in it. */
  private int chainOf(int a) {
    return node[a] >= holds ? shells.length + node[a] - holds : course.at(a)[0];
  }
}
