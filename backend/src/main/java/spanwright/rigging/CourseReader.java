package spanwright.rigging;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import spanwright.plan.Place;

/** Reads a layout's points as stretches between its attachments. */
final class CourseReader {
  private final Layout layout;
  private final List<Layout.Hold> holds;
  private final Polyline[] wires;
  private final double[] totals;
  private final Place[] corners;
  private final List<Course.Stretch> spans = new ArrayList<>();

  /** Attachments of the first conductor, in order. */
  private final List<Integer> chain = new ArrayList<>();

  /** The attachment at the far end of each further conductor. */
  private final int[] farEnds;

  private boolean reversed;
  private double feedAt;
  private int feedHeld = -1;
  private int feedSpan = -1;

  CourseReader(Layout layout) {
    this.layout = layout;
    holds = layout.attachments();
    require(
        holds.size() >= 2,
        "attachments: a wire needs two places to hang; %d given. Add another.",
        holds.size());
    int count = layout.conductors().size();
    require(count >= 1, "conductors: there is none. Give the wire's points.");
    require(
        count <= 8,
        "conductors: at most 8 wires are hung together; %d given. Leave some out.",
        count);
    wires = new Polyline[count];
    totals = new double[count];
    for (int c = 0; c < count; c++) {
      wires[c] = wire(c);
      totals[c] = wires[c].total();
    }
    corners = new Place[holds.size()];
    farEnds = new int[count];
  }

  private Polyline wire(int c) {
    List<Place> points = layout.conductors().get(c).points();
    require(
        points.size() >= 2,
        "conductors[%d].points: a wire needs two points; %d given.",
        c,
        points.size());
    Polyline wire = new Polyline(points);
    require(
        wire.total() > 0.1 && wire.total() <= 10_000,
        "conductors[%d].points: the wire is %.3g m long; it must be between 0.1 m and 10 km.",
        c,
        wire.total());
    return wire;
  }

  Course read() {
    Layout.FeedChoice feed = layout.feed();
    require(feed != null, "feed: is missing. Say where the feed line joins.");
    require(
        feed.conductor() == 0,
        "feed.conductor: the fed wire is hung first. Give it as conductor 0, and 0 here.");
    require(
        feed.fraction() >= 0 && feed.fraction() <= 1,
        "feed.fraction: must lie between 0 and 1. Give the share of the wire's length.");
    farEnds();
    boolean closed = wires[0].isClosed();
    require(
        closed || !"loop".equals(layout.shape()) || shut() > Polyline.CLOSED,
        "conductors[0].points: a loop needs at least three corners, and its first point again at"
            + " the end.");
    require(
        closed || !"loop".equals(layout.shape()),
        "conductors[0].points: a loop ends where it began; its last point is %.2f m from its first."
            + " Give the first point again at the end.",
        shut());
    return closed ? loop() : open();
  }

  private double shut() {
    return wires[0].first().distance(wires[0].last());
  }

  /** Each further wire takes the attachment nearest to its far end; the first wire the others. */
  private void farEnds() {
    boolean[] taken = new boolean[holds.size()];
    for (int c = 1; c < wires.length; c++) {
      Place end = wires[c].last();
      int nearest = -1;
      for (int a = 0; a < taken.length; a++) {
        boolean nearer =
            nearest < 0 || holds.get(a).at().distance(end) < holds.get(nearest).at().distance(end);
        nearest = !taken[a] && nearer ? a : nearest;
      }
      require(nearest >= 0, "attachments: conductors[%d] has none for its far end. Add one.", c);
      taken[nearest] = true;
      farEnds[c] = nearest;
    }
    for (int a = 0; a < taken.length; a++) {
      if (!taken[a]) {
        chain.add(a);
      }
    }
    require(
        chain.size() >= 2,
        "attachments: a wire needs two places to hang; conductors[0] has %d. Add another.",
        chain.size());
  }

  private Place hold(int k) {
    return holds.get(chain.get(k)).at();
  }

  // --- a wire with two ends

  private Course open() {
    Polyline wire = wires[0];
    int last = chain.size() - 1;
    reversed =
        hold(0).distance(wire.last()) + hold(last).distance(wire.first())
            < hold(0).distance(wire.first()) + hold(last).distance(wire.last()) - 1e-9;
    wire = reversed ? wire.reversed() : wire;
    double total = wire.total();
    feedAt = (reversed ? 1 - layout.feed().fraction() : layout.feed().fraction()) * total;
    double[] held = new double[last + 1];
    double[] rope = new double[last + 1];
    for (int k = 1; k < last; k++) {
      held[k] = middle(wire, k, rope);
      if (Math.abs(held[k] - feedAt) < 0.5) {
        held[k] = feedAt;
        feedHeld = chain.get(k);
      }
    }
    // A leg that comes back past an end's attachment is not held by it: look no farther than the
    // next attachment, or the middle of the wire where there is none.
    held[0] = end(wire, 0, 0, last > 1 ? held[1] : total / 2, rope);
    held[last] = end(wire, last, last > 1 ? held[last - 1] : total / 2, total, rope);
    for (int k = 0; k < last; k++) {
      ordered(held[k + 1] - held[k], k, k + 1);
      if (feedHeld < 0 && feedSpan < 0 && feedAt >= held[k] && feedAt <= held[k + 1]) {
        feedSpan = k;
      }
      spans.add(
          new Course.Stretch(
              0, chain.get(k), chain.get(k + 1), held[k], held[k + 1], rope[k], rope[k + 1]));
    }
    further(wire);
    return new Course(
        totals,
        reversed,
        false,
        0,
        List.copyOf(spans),
        corners,
        chain.get(0),
        chain.get(last),
        held[0],
        total - held[last],
        feedAt,
        feedHeld,
        feedSpan);
  }

  private void ordered(double wire, int from, int to) {
    require(
        wire >= 0.05,
        "attachments: no wire lies between attachments %d and %d. Give them in order along the"
            + " wire.",
        chain.get(from) + 1,
        chain.get(to) + 1);
  }

  /** Where an end attachment holds the wire, and with how much rope. */
  private double end(Polyline wire, int k, double from, double to, double[] rope) {
    Place at = hold(k);
    double end = k == 0 ? 0 : wire.total();
    double toEnd = at.distance(wire.at(end));
    double nearest = wire.nearest(at, from, to);
    double away = at.distance(wire.at(nearest));
    // A long way of wire past a point that all but touches the attachment hangs free.
    if (Math.abs(nearest - end) > 0.5 && away < Practice.HELD_WITHIN && away + 0.5 < toEnd) {
      return nearest;
    }
    double corner = wire.heldAt(at, from, to);
    Place bend = wire.at(corner);
    double loose = Math.abs(corner - end);
    boolean droops =
        loose > 0.5
            && wire.bendsNear(corner)
            && at.distance(bend) + 0.3 < toEnd
            && bend.z() - wire.at(end).z() > 0.6 * loose;
    if (droops) {
      corners[chain.get(k)] = bend;
      rope[k] = at.distance(bend);
      return corner;
    }
    rope[k] = toEnd;
    return end;
  }

  /** Where a middle attachment holds the wire, itself or by a rope. */
  private double middle(Polyline wire, int k, double[] rope) {
    Place at = hold(k);
    double nearest = wire.nearest(at, 0, wire.total());
    if (at.distance(wire.at(nearest)) <= Practice.HELD_WITHIN) {
      return nearest;
    }
    double held = wire.heldAt(at, 0, wire.total());
    Place bend = wire.at(held);
    double away = at.distance(bend);
    near(away, chain.get(k));
    corners[chain.get(k)] = bend;
    rope[k] = away;
    return held;
  }

  private void near(double away, int attachment) {
    require(
        away <= Practice.LONGEST_LIFT,
        "attachments[%d]: the wire passes %.1f m from it; a rope from there to a bend of the wire"
            + " may be %.0f m long. Bring a bend of the wire nearer.",
        attachment,
        away,
        Practice.LONGEST_LIFT);
  }

  // --- a wire without ends

  private Course loop() {
    Polyline wire = wires[0];
    reversed = runsBack(wire);
    wire = reversed ? wire.reversed() : wire;
    double total = wire.total();
    int count = chain.size();
    double[] drawn = new double[count];
    double[] rope = new double[count];
    for (int k = 0; k < count; k++) {
      drawn[k] = wire.heldAt(hold(k), 0, total);
      Place corner = wire.at(drawn[k]);
      rope[k] = hold(k).distance(corner);
      near(rope[k], chain.get(k));
      corners[chain.get(k)] = corner;
    }
    double origin = drawn[0];
    double[] held = new double[count + 1];
    for (int k = 1; k < count; k++) {
      held[k] = round(drawn[k] - origin, total);
      ordered(held[k] - held[k - 1], k - 1, k);
    }
    held[count] = total;
    ordered(total - held[count - 1], count - 1, 0);
    double fraction = layout.feed().fraction();
    feedAt = round((reversed ? 1 - fraction : fraction) * total - origin, total);
    feed(held, total);
    for (int k = 0; k < count; k++) {
      int next = (k + 1) % count;
      spans.add(
          new Course.Stretch(
              0, chain.get(k), chain.get(next), held[k], held[k + 1], rope[k], rope[next]));
    }
    further(wire);
    return new Course(
        totals,
        reversed,
        true,
        round(total - origin, total),
        List.copyOf(spans),
        corners,
        chain.get(0),
        chain.get(0),
        0,
        0,
        feedAt,
        feedHeld,
        feedSpan);
  }

  private void feed(double[] held, double total) {
    for (int k = 0; k + 1 < held.length; k++) {
      double off = Math.abs(feedAt - held[k]);
      if (Math.min(off, total - off) < 0.5) {
        feedHeld = chain.get(k);
        return;
      }
    }
    for (int k = 0; k + 1 < held.length; k++) {
      if (feedAt >= held[k] && feedAt <= held[k + 1]) {
        feedSpan = k;
      }
    }
  }

  /** Whether the loop's points run against the order of its attachments. */
  private boolean runsBack(Polyline wire) {
    int count = chain.size();
    if (count < 3) {
      return false;
    }
    double total = wire.total();
    double[] at = new double[count];
    for (int k = 0; k < count; k++) {
      at[k] = wire.heldAt(hold(k), 0, total);
    }
    double forth = 0;
    double back = 0;
    for (int k = 0; k < count; k++) {
      double step = at[(k + 1) % count] - at[k];
      forth += round(step, total);
      back += round(-step, total);
    }
    return back < forth - 1e-9;
  }

  private static double round(double position, double total) {
    double within = position - total * Math.floor(position / total);
    return within >= total - 1e-9 ? 0 : within;
  }

  // --- further wires

  /** Further wires begin where the feedpoint is held, and end at one attachment each. */
  private void further(Polyline first) {
    for (int c = 1; c < wires.length; c++) {
      Place feedpoint = first.at(feedAt);
      double away = wires[c].first().distance(feedpoint);
      require(
          feedHeld >= 0 || isEnd(),
          "conductors[%d]: a return wire begins at a feedpoint that an attachment holds. Hold the"
              + " feedpoint, or draw one return wire as part of conductor 0, fed inside.",
          c);
      require(
          away < 0.5,
          "conductors[%d].points: a return wire begins at the feedpoint; this one begins %.2f m"
              + " from it. Start it there.",
          c,
          away);
      double rope = holds.get(farEnds[c]).at().distance(wires[c].last());
      spans.add(new Course.Stretch(c, feedHeld, farEnds[c], 0, totals[c], 0, rope));
    }
  }

  /** A feedpoint at an end that comes up to its attachment is held there. */
  private boolean isEnd() {
    for (int k : new int[] {0, spans.size() - 1}) {
      Course.Stretch stretch = spans.get(k);
      boolean head = k == 0 && feedAt < 0.5 && stretch.ropeFrom() <= Practice.HELD_WITHIN;
      boolean tail =
          stretch.to() - feedAt < 0.5 && feedAt > 0.5 && stretch.ropeTo() <= Practice.HELD_WITHIN;
      if (head || tail) {
        feedHeld = head ? stretch.fromHold() : stretch.toHold();
        feedSpan = -1;
        return true;
      }
    }
    return false;
  }

  static void require(boolean holds, String sentence, Object... values) {
    if (!holds) {
      throw new IllegalArgumentException(String.format(Locale.ROOT, sentence, values));
    }
  }
}
