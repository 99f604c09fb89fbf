package spanwright.rigging;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import spanwright.plan.Place;

/**
 * A layout read as a chain: which stretch of the wire lies between which attachments. Arc positions
 * run in metres along the wire in the order of the attachments.
 *
 * @param total finished length of the wire [m]
 * @param reversed whether the conductor's points run against the attachments
 * @param spans between neighbouring attachments
 * @param headTail length that hangs free beyond the first attachment [m]
 * @param endTail length that hangs free beyond the last attachment [m]
 * @param feedAt arc position of the feedpoint [m]
 * @param feedHeld index of the attachment that holds the feedpoint, or -1
 * @param feedSpan index of the span the feedpoint hangs in, or -1
 */
record Course(
    double total,
    boolean reversed,
    List<Stretch> spans,
    double headTail,
    double endTail,
    double feedAt,
    int feedHeld,
    int feedSpan) {

  /**
   * A stretch of wire between two attachments.
   *
   * @param from arc position [m]
   * @param to arc position [m]
   * @param ropeFrom rope at its first end as drawn [m]; 0 where the attachment holds the wire
   * @param ropeTo rope at its second end as drawn [m]
   */
  record Stretch(double from, double to, double ropeFrom, double ropeTo) {
    double wire() {
      return to - from;
    }
  }

  /** Reads a layout. */
  static Course of(Layout layout) {
    if (layout.attachments().size() < 2) {
      throw new IllegalArgumentException(
          "attachments: a wire needs two places to hang; "
              + layout.attachments().size()
              + " given. Add another.");
    }
    if (layout.conductors().size() != 1) {
      throw new IllegalArgumentException(
          "conductors: one wire is hung at a time; "
              + layout.conductors().size()
              + " given. Give a doublet as one conductor fed inside.");
    }
    List<Place> points = layout.conductors().get(0).points();
    if (points.size() < 2) {
      throw new IllegalArgumentException(
          "conductors[0].points: a wire needs two points; " + points.size() + " given.");
    }
    Place first = layout.attachments().get(0).at();
    Place last = layout.attachments().get(layout.attachments().size() - 1).at();
    Place start = points.get(0);
    Place end = points.get(points.size() - 1);
    boolean reversed =
        first.distance(end) + last.distance(start)
            < first.distance(start) + last.distance(end) - 1e-9;
    return new Reader(layout, reversed).read();
  }

  /** Walks along one layout. */
  private static final class Reader {
    private final Layout layout;
    private final boolean reversed;
    private final List<Place> points;
    private final double[] arc;
    private final double total;

    Reader(Layout layout, boolean reversed) {
      this.layout = layout;
      this.reversed = reversed;
      points = new ArrayList<>(layout.conductors().get(0).points());
      if (reversed) {
        java.util.Collections.reverse(points);
      }
      arc = new double[points.size()];
      for (int i = 1; i < arc.length; i++) {
        arc[i] = arc[i - 1] + points.get(i - 1).distance(points.get(i));
      }
      total = arc[arc.length - 1];
    }

    Course read() {
      if (!(total > 0.1) || total > 10_000) {
        throw new IllegalArgumentException(
            String.format(
                Locale.ROOT,
                "conductors[0].points: the wire is %.3g m long; it must be between 0.1 m and"
                    + " 10 km.",
                total));
      }
      double fraction = layout.feed().fraction();
      if (!(fraction >= 0 && fraction <= 1)) {
        throw new IllegalArgumentException(
            "feed.fraction: must lie between 0 and 1. Give the share of the wire's length.");
      }
      double feedAt = (reversed ? 1 - fraction : fraction) * total;
      int count = layout.attachments().size();
      double[] held = new double[count];
      double[] rope = new double[count];
      int feedHeld = -1;
      for (int i = 1; i + 1 < count; i++) {
        middle(i, held);
        if (Math.abs(held[i] - feedAt) < 0.5) {
          held[i] = feedAt;
          feedHeld = i;
        }
      }
      // A leg that comes back past an end's attachment is not held by it: look no farther than
      // the next attachment, or the middle of the wire where there is none.
      end(0, 0, count > 2 ? held[1] : total / 2, held, rope);
      end(count - 1, count > 2 ? held[count - 2] : total / 2, total, held, rope);
      return assemble(held, rope, feedAt, feedHeld);
    }

    private Course assemble(double[] held, double[] rope, double feedAt, int feedHeld) {
      List<Stretch> spans = new ArrayList<>();
      int feedSpan = -1;
      for (int i = 0; i + 1 < held.length; i++) {
        if (held[i + 1] - held[i] < 0.05) {
          throw new IllegalArgumentException(
              String.format(
                  Locale.ROOT,
                  "attachments: no wire lies between attachments %d and %d. Give them in order"
                      + " along the wire.",
                  i + 1,
                  i + 2));
        }
        spans.add(new Stretch(held[i], held[i + 1], rope[i], rope[i + 1]));
        if (feedHeld < 0 && feedSpan < 0 && feedAt >= held[i] && feedAt <= held[i + 1]) {
          feedSpan = i;
        }
      }
      return new Course(
          total,
          reversed,
          spans,
          held[0],
          total - held[held.length - 1],
          feedAt,
          feedHeld,
          feedSpan);
    }

    /** Where an end attachment holds the wire, and with how much rope. */
    private void end(int i, double from, double to, double[] held, double[] rope) {
      Place at = layout.attachments().get(i).at();
      double nearest = nearest(at, from, to);
      double away = at.distance(pointAt(nearest));
      double end = i == 0 ? 0 : total;
      double toEnd = at.distance(pointAt(end));
      // A long way of wire past a point that all but touches the attachment hangs free.
      if (Math.abs(nearest - end) > 0.5 && away < Practice.HELD_WITHIN && away + 0.5 < toEnd) {
        held[i] = nearest;
      } else {
        held[i] = end;
        rope[i] = toEnd;
      }
    }

    /** Where a middle attachment holds the wire. */
    private void middle(int i, double[] held) {
      Place at = layout.attachments().get(i).at();
      double nearest = nearest(at, 0, total);
      double away = at.distance(pointAt(nearest));
      if (away > Practice.HELD_WITHIN) {
        throw new IllegalArgumentException(
            String.format(
                Locale.ROOT,
                "attachments[%d]: the wire passes %.1f m from it; a middle attachment holds the"
                    + " wire itself. Bring a bend of the wire to it.",
                i,
                away));
      }
      held[i] = nearest;
    }

    private double nearest(Place at, double from, double to) {
      double least = Double.POSITIVE_INFINITY;
      double where = 0;
      for (int i = 0; i + 1 < points.size(); i++) {
        Place a = points.get(i);
        Place b = points.get(i + 1);
        double length = arc[i + 1] - arc[i];
        double dot =
            (at.x() - a.x()) * (b.x() - a.x())
                + (at.y() - a.y()) * (b.y() - a.y())
                + (at.z() - a.z()) * (b.z() - a.z());
        double share = length == 0 ? 0 : Math.max(0, Math.min(1, dot / (length * length)));
        double position = Math.max(from, Math.min(to, arc[i] + share * length));
        double away = at.distance(pointAt(position));
        if (away < least - 1e-9) {
          least = away;
          where = position;
        }
      }
      return where;
    }

    private Place pointAt(double position) {
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
  }
}
