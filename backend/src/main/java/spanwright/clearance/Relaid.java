package spanwright.clearance;

import java.util.ArrayList;
import java.util.List;
import spanwright.plan.Place;
import spanwright.rigging.Layout;
import spanwright.rigging.Rigged;

/** A layout laid anew after a change. */
final class Relaid {
  private Relaid() {}

  /**
   * The layout after a change, or null where the change means nothing to it.
   *
   * @param rigged what hung before
   * @param holds the attachments after the change
   * @param leastTails shortest ropes at the first and last of them [m]
   */
  static Layout after(Change change, Rigged rigged, List<Layout.Hold> holds, double[] leastTails) {
    return isPlain(rigged)
        ? straight(change, rigged, holds, leastTails)
        : shifted(change, rigged.layout(), holds);
  }

  /** One wire from attachment to attachment in their order, with rope at its ends alone. */
  private static boolean isPlain(Rigged rigged) {
    int last = rigged.attachments().size() - 1;
    boolean plain =
        rigged.conductors().size() == 1 && !rigged.isLoop() && rigged.spans().size() == last;
    for (Rigged.Span span : rigged.spans()) {
      boolean inOrder = span.to() == span.from() + 1;
      boolean bare =
          (span.from() == 0 || span.ropeFrom() == 0) && (span.to() == last || span.ropeTo() == 0);
      plain &= inOrder && bare;
    }
    return plain;
  }

  /**
   * A loop, a wire held off by ropes, one with a return: every bend goes with the attachment it was
   * nearest to.
   */
  private static Layout shifted(Change change, Layout old, List<Layout.Hold> holds) {
    if (change.kind() == Change.Kind.SHORTEN) {
      return null;
    }
    List<Layout.Run> runs = new ArrayList<>();
    for (Layout.Run run : old.conductors()) {
      List<Place> points = new ArrayList<>();
      for (Place point : run.points()) {
        int nearest = 0;
        for (int a = 1; a < holds.size(); a++) {
          double away = old.attachments().get(a).at().distance(point);
          nearest = away < old.attachments().get(nearest).at().distance(point) ? a : nearest;
        }
        Place from = old.attachments().get(nearest).at();
        Place to = holds.get(nearest).at();
        points.add(
            new Place(
                point.x() + to.x() - from.x(),
                point.y() + to.y() - from.y(),
                point.z() + to.z() - from.z()));
      }
      String wire = change.kind() == Change.Kind.LIGHTEN ? change.other() : run.wire();
      runs.add(new Layout.Run(points, wire));
    }
    Layout.FeedChoice feed = old.feed();
    if (change.kind() == Change.Kind.FEED) {
      double total = 0;
      List<Place> points = old.conductors().get(feed.conductor()).points();
      for (int i = 0; i + 1 < points.size(); i++) {
        total += points.get(i).distance(points.get(i + 1));
      }
      double fraction = feed.fraction() + change.direction() * change.amount() / total;
      if (fraction < 0.05 || fraction > 0.95) {
        return null;
      }
      feed = new Layout.FeedChoice(feed.conductor(), fraction, feed.line(), feed.lineLength());
    }
    return new Layout(old.shape(), holds, runs, feed);
  }

  /**
   * The layout after the change: straight lines again, each leg of the wire as long as it hung and
   * the ropes taking up the rest; where the way became too short, the wire is.
   */
  private static Layout straight(
      Change change, Rigged rigged, List<Layout.Hold> holds, double[] leastTails) {
    int last = rigged.spans().size() - 1;
    double trimFirst =
        change.kind() != Change.Kind.SHORTEN || change.direction() > 0
            ? 0
            : change.direction() == 0 ? 0.5 : 1;
    double trimLast =
        change.kind() != Change.Kind.SHORTEN || change.direction() < 0
            ? 0
            : change.direction() == 0 ? 0.5 : 1;
    List<Place> points = new ArrayList<>();
    double total = 0;
    double beforeFeed = -1;
    boolean headFree = isFree(rigged, 0);
    boolean endFree = isFree(rigged, last + 1);
    for (int i = 0; i <= last; i++) {
      Rigged.Span span = rigged.spans().get(i);
      Place a = holds.get(i).at();
      Place b = holds.get(i + 1).at();
      double chord = a.distance(b);
      boolean outerFrom = i == 0 && !headFree;
      boolean outerTo = i == last && !endFree;
      double wire =
          span.wireLength()
              - (i == 0 ? trimFirst * change.amount() : 0)
              - (i == last ? trimLast * change.amount() : 0);
      double ropeFrom = outerFrom ? span.ropeFrom() + trimFirst * change.amount() : 0;
      double least = outerTo ? Math.min(leastTails[1], span.ropeTo()) : 0;
      if (outerFrom && !outerTo) {
        ropeFrom = Math.max(chord - wire, Math.min(leastTails[0], span.ropeFrom()));
      }
      double most = chord - ropeFrom - least;
      wire = outerFrom || outerTo ? Math.min(wire, most) : chord;
      if (wire < 1) {
        return null;
      }
      if (i == 0) {
        tailPoint(rigged, 0, a, points, true);
        points.add(along(a, b, ropeFrom));
      }
      points.add(i == last && outerTo ? along(a, b, ropeFrom + wire) : b);
      beforeFeed = rigged.feedLine().held() == i ? total : beforeFeed;
      total += wire;
    }
    tailPoint(rigged, last + 1, holds.get(last + 1).at(), points, false);
    Layout old = rigged.layout();
    double fraction = beforeFeed > 0 ? beforeFeed / total : forwards(rigged);
    if (change.kind() == Change.Kind.FEED) {
      fraction += change.direction() * change.amount() / total;
      if (beforeFeed > 0 || fraction < 0.05 || fraction > 0.95) {
        return null;
      }
    }
    return new Layout(
        old.shape(),
        holds,
        List.of(
            new Layout.Run(
                points,
                change.kind() == Change.Kind.LIGHTEN
                    ? change.other()
                    : old.conductors().get(0).wire())),
        new Layout.FeedChoice(0, fraction, old.feed().line(), old.feed().lineLength()));
  }

  private static double forwards(Rigged rigged) {
    double fraction = rigged.layout().feed().fraction();
    Place first = rigged.conductors().get(0).shapes().calm().get(0);
    Rigged.Span last = rigged.spans().get(rigged.spans().size() - 1);
    boolean reversed = first.equals(last.shapes().calm().get(last.wireTo()));
    return reversed ? 1 - fraction : fraction;
  }

  private static boolean isFree(Rigged rigged, int attachment) {
    return rigged.tails().stream().anyMatch(each -> each.attachment() == attachment);
  }

  private static void tailPoint(
      Rigged rigged, int attachment, Place at, List<Place> points, boolean first) {
    for (Rigged.Tail each : rigged.tails()) {
      if (each.attachment() == attachment) {
        Place low = new Place(at.x(), at.y(), at.z() - each.length());
        points.add(first ? 0 : points.size(), low);
      }
    }
  }

  private static Place along(Place a, Place b, double way) {
    double t = way / a.distance(b);
    return new Place(
        a.x() + t * (b.x() - a.x()), a.y() + t * (b.y() - a.y()), a.z() + t * (b.z() - a.z()));
  }
}
