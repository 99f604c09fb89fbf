package spanwright.clearance;

import java.util.ArrayList;
import java.util.List;
import spanwright.plan.Place;
import spanwright.rigging.Rigged;

/**
 * One thing of ours in every position the weather gives it.
 *
 * <p>States are polylines of the same number of points, x, y, z in turn; those of the sweep follow
 * one another from blown left over calm to blown right, in steps small enough that the surface
 * between neighbours holds everything in between but for {@link #slack}. Ice comes by degrees too:
 * what lies between calm and iced, and between either and its gust, is passed on the way. The steps
 * between calm and gust turn each point about the chord of its span, its distance from the chord
 * growing evenly.
 */
final class Strand {
  /** What it is. */
  enum Part {
    WIRE("wire"),
    ROPE("rope"),
    GUY("guy"),
    HALYARD("halyard"),
    FALL("counterweight rope"),
    FEED_LINE("feed line"),
    MAST("mast");

    final String word;

    Part(String word) {
      this.word = word;
    }
  }

  /** Steps from calm to the gust. */
  static final int STEPS = 4;

  private static final int[] NOWHERE = {};

  final Part part;
  final int from;
  final int to;
  final double[][] states;
  final int calm;
  final int sweep;
  private final double[] slack;

  /** The most that is taken off any distance for what the states leave open [m]. */
  final double mostSlack;

  final double[] box;
  private final double[][] boxes;

  /** Whether the first and last point are the ends of a conductor. */
  final boolean startIsEnd;

  final boolean endIsEnd;

  private Strand(
      Part part,
      int from,
      int to,
      double[][] states,
      int calm,
      int sweep,
      double[] slack,
      boolean startIsEnd,
      boolean endIsEnd) {
    this.part = part;
    this.from = from;
    this.to = to;
    this.states = states;
    this.calm = calm;
    this.sweep = sweep;
    this.slack = slack;
    mostSlack = java.util.Arrays.stream(slack).max().orElse(0);
    this.startIsEnd = startIsEnd;
    this.endIsEnd = endIsEnd;
    box = Space.emptyBox();
    boxes = new double[states.length][];
    for (int i = 0; i < states.length; i++) {
      boxes[i] = Space.box(states[i], 0, states[i].length / 3 - 1);
      Space.grow(box, boxes[i]);
    }
  }

  /** Something that does not move. */
  static Strand still(Part part, int attachment, List<Place> points) {
    return new Strand(
        part,
        attachment,
        attachment,
        new double[][] {flat(points)},
        0,
        1,
        new double[points.size()],
        false,
        false);
  }

  /** Every strand of a hung layout. */
  static List<Strand> of(Rigged rigged) {
    List<Strand> strands = new ArrayList<>();
    List<double[][]> sweeps = new ArrayList<>();
    for (Rigged.Span span : rigged.spans()) {
      double[] slack = new double[span.shapes().calm().size()];
      double[][] states = Sweep.of(span.shapes(), Sweep.turning(null), slack);
      sweeps.add(states);
      int points = span.shapes().calm().size();
      add(strands, Part.ROPE, span, states, 0, span.wireFrom(), slack, false, false);
      add(
          strands,
          Part.WIRE,
          span,
          states,
          span.wireFrom(),
          span.wireTo(),
          slack,
          isEnd(rigged, span, true),
          isEnd(rigged, span, false));
      add(strands, Part.ROPE, span, states, span.wireTo(), points - 1, slack, false, false);
    }
    for (Rigged.Tail tail : rigged.tails()) {
      double[] slack = new double[tail.shapes().calm().size()];
      double[][] states = Sweep.of(tail.shapes(), Sweep.SWINGING, slack);
      strands.add(
          strand(Part.WIRE, tail.attachment(), tail.attachment(), states, slack, false, true));
    }
    for (Rigged.Rope rope : rigged.ropes()) {
      switch (rope.what()) {
        case "guy" -> strands.add(still(Part.GUY, rope.attachment(), rope.shapes().calm()));
        case "halyard" -> strands.add(still(Part.HALYARD, rope.attachment(), rope.shapes().calm()));
        case "fall" -> strands.add(still(Part.FALL, rope.attachment(), rope.shapes().calm()));
        default -> {
          // tails are the ropes of the spans, taken above
        }
      }
    }
    for (Rigged.Mast mast : rigged.masts()) {
      strands.add(still(Part.MAST, mast.attachments().get(0), List.of(mast.foot(), mast.top())));
    }
    strands.add(feedLine(rigged, sweeps));
    for (Rigged.Shapes other : rigged.feedLine().others()) {
      double[] slack = new double[other.calm().size()];
      double[][] states = Sweep.of(other, Sweep.turning(null), slack);
      int at = rigged.feedLine().held();
      strands.add(strand(Part.FEED_LINE, at, at, states, slack, false, false));
    }
    return strands;
  }

  /** Whether a conductor ends where a span's wire does: a loop never, nor where more hangs on. */
  private static boolean isEnd(Rigged rigged, Rigged.Span span, boolean first) {
    if (span.conductor() == 0 && rigged.isLoop() || first && span.conductor() > 0) {
      return false;
    }
    int at = first ? span.from() : span.to();
    boolean goesOn =
        rigged.spans().stream()
            .anyMatch(s -> s.conductor() == span.conductor() && (first ? s.to() : s.from()) == at);
    return !goesOn && !hasTail(rigged, at);
  }

  private static boolean hasTail(Rigged rigged, int attachment) {
    return rigged.tails().stream().anyMatch(each -> each.attachment() == attachment);
  }

  private static void add(
      List<Strand> strands,
      Part part,
      Rigged.Span span,
      double[][] states,
      int from,
      int to,
      double[] slack,
      boolean startIsEnd,
      boolean endIsEnd) {
    if (to <= from) {
      return;
    }
    double[][] cut = new double[states.length][];
    for (int i = 0; i < states.length; i++) {
      cut[i] = java.util.Arrays.copyOfRange(states[i], 3 * from, 3 * to + 3);
    }
    double[] here = java.util.Arrays.copyOfRange(slack, from, to + 1);
    strands.add(strand(part, span.from(), span.to(), cut, here, startIsEnd, endIsEnd));
  }

  private static Strand strand(
      Part part, int from, int to, double[][] states, double[] slack, boolean start, boolean end) {
    int sweep = Math.min(states.length, 2 * STEPS + 1);
    boolean moves = states.length > 2;
    return new Strand(
        part, from, to, states, moves ? STEPS : 0, moves ? sweep : 1, slack, start, end);
  }

  private static Strand feedLine(Rigged rigged, List<double[][]> sweeps) {
    Rigged.FeedLine line = rigged.feedLine();
    double[][] firsts = null;
    for (int i = 0; i < sweeps.size() && firsts == null; i++) {
      int index = rigged.spans().get(i).shapes().calm().indexOf(line.feedpoint());
      if (index >= 0 && sweeps.get(i).length > 2) {
        firsts = new double[sweeps.get(i).length][];
        for (int s = 0; s < firsts.length; s++) {
          firsts[s] = java.util.Arrays.copyOfRange(sweeps.get(i)[s], 3 * index, 3 * index + 3);
        }
      }
    }
    double[] slack = new double[line.shapes().calm().size()];
    double[][] states = Sweep.of(line.shapes(), Sweep.turning(firsts), slack);
    int at = line.held() >= 0 ? line.held() : -1;
    return strand(Part.FEED_LINE, at, at, states, slack, false, false);
  }

  static double[] flat(List<Place> points) {
    double[] flat = new double[3 * points.size()];
    for (int i = 0; i < points.size(); i++) {
      flat[3 * i] = points.get(i).x();
      flat[3 * i + 1] = points.get(i).y();
      flat[3 * i + 2] = points.get(i).z();
    }
    return flat;
  }

  /** Whether a state keeps farther from a box than this, slack taken off. */
  boolean isFarther(int state, double[] from, double than) {
    double taken = state == calm || sweep == 1 ? 0 : mostSlack;
    return Space.boxes(boxes[state], from) - taken > than;
  }

  /** Whether a state is calm, or iced in calm air. */
  boolean isStill(int state) {
    return state == calm || state == sweep;
  }

  /** The states that a state goes over into, each such step told once. */
  int[] onward(int state) {
    if (state + 1 < sweep) {
      boolean ices = states.length > sweep;
      boolean blown = state == 0 && states.length > sweep + 1;
      return state == calm && ices
          ? new int[] {state + 1, sweep}
          : blown ? new int[] {state + 1, sweep + 1} : new int[] {state + 1};
    }
    if (state == sweep - 1 && sweep > 1) {
      return states.length > sweep + 2 ? new int[] {sweep + 2} : NOWHERE;
    }
    return state == sweep && states.length > sweep + 2 ? new int[] {sweep + 1, sweep + 2} : NOWHERE;
  }

  /** How much farther than a state's piece from offset i things may be [m]; 0 on a calm day. */
  double slack(int state, int i) {
    return state == calm || sweep == 1 ? 0 : Math.max(slack[i / 3], slack[i / 3 + 1]);
  }

  /** The most that {@link #slack(int, int)} can be [m]. */
  double mostSlack() {
    return mostSlack;
  }

  /** Number of points. */
  int points() {
    return states[0].length / 3;
  }
}
