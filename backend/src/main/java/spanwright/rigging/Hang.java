package spanwright.rigging;

import java.util.ArrayList;
import java.util.List;
import spanwright.plan.LineKind;
import spanwright.plan.Place;
import spanwright.plan.WireKind;

/** The work on one layout: it is read, its loads are gathered, its spans are hung and read out. */
final class Hang {
  private static final double G = Hanging.GRAVITY;

  /** Points of a conductor, its first and the free wire's apart. */
  private static final int POINTS = 57;

  final Rigging rigging;
  final Layout layout;
  final Course course;
  final LineKind line;
  final List<Holder> holders = new ArrayList<>();
  final boolean windy;
  private final List<Materials> materials = new ArrayList<>();
  private final List<WireKind> wires = new ArrayList<>();
  private final int[] stretches;
  Statics statics;
  FeedLoad feedLoad = FeedLoad.NONE;

  Hang(Rigging rigging, Layout given, boolean windy) {
    this.rigging = rigging;
    this.windy = windy;
    layout = withoutRepeat(given);
    course = Course.of(layout);
    layout.attachments().forEach(each -> holders.add(rigging.holder(each.on())));
    for (Layout.Run each : layout.conductors()) {
      wires.add(rigging.wire(each.wire()));
      materials.add(rigging.materials(wires.get(wires.size() - 1)));
    }
    line = rigging.line(layout.feed().line());
    stretches = new int[layout.conductors().size()];
    for (Course.Stretch each : course.spans()) {
      stretches[each.conductor()]++;
      CourseReader.require(
          at(each.fromHold()).distance(at(each.toHold())) >= 0.3,
          "attachments: %d and %d are less than 0.3 m apart. Move one.",
          each.fromHold() + 1,
          each.toHold() + 1);
    }
  }

  /** A loop may be given with its first attachment again as its last. */
  private static Layout withoutRepeat(Layout given) {
    int last = given.attachments().size() - 1;
    if (last < 2 || given.conductors().isEmpty() || given.conductors().get(0).points().size() < 3) {
      return given;
    }
    Layout.Hold first = given.attachments().get(0);
    Layout.Hold again = given.attachments().get(last);
    boolean repeats = first.on().equals(again.on()) && first.at().distance(again.at()) < 0.01;
    return repeats && new Polyline(given.conductors().get(0).points()).isClosed()
        ? new Layout(
            given.shape(), given.attachments().subList(0, last), given.conductors(), given.feed())
        : given;
  }

  Rigged rigged() {
    estimateLine();
    statics = course.hangsTogether() ? new JoinedSpans(this) : new SeparateSpans(this);
    statics.hang();
    return new ReadOut(this).rigged();
  }

  Place at(int attachment) {
    return layout.attachments().get(attachment).at();
  }

  Materials materials(int conductor) {
    return materials.get(conductor);
  }

  WireKind wire(int conductor) {
    return wires.get(conductor);
  }

  /** Every weather but still air that this layout is hung in. */
  List<Weather> weathers() {
    return !windy
        ? List.of()
        : rigging.isIcy()
            ? List.of(Weather.GUST, Weather.ICE, Weather.ICY_GUST)
            : List.of(Weather.GUST);
  }

  /** Into how many parts the wire of a span is drawn. */
  int wireParts(int span) {
    int conductor = course.spans().get(span).conductor();
    int loose = (course.headTail() > 1e-6 ? 1 : 0) + (course.endTail() > 1e-6 ? 1 : 0);
    int room = POINTS - (conductor == 0 ? ReadOut.TAIL_PARTS * loose : 0);
    return Math.max(6, Math.min(28, room / stretches[conductor]));
  }

  /** What the wire and rope of a span may carry in any weather, with headroom [N]. */
  double allowed(int span) {
    Materials here = materials(course.spans().get(span).conductor());
    return Practice.HEADROOM
        * Math.min(
            rigging.rules.value("wire-strength") * here.wireBreaking(),
            rigging.rules.value("rope-strength") * here.ropeWorking());
  }

  /** Weight of free wire and of a held feedpoint that hangs on an attachment itself. */
  Force hungOn(int attachment, Weather weather) {
    if (course.corners()[attachment] != null) {
      return Force.NONE;
    }
    double hung = tailLength(attachment) * tailWeight(weather);
    if (course.feedHeld() == attachment || feedsTail(attachment)) {
      hung += feedLoad.weight(weather);
    }
    return new Force(0, 0, -hung);
  }

  /** Whether the feedpoint hangs in the free wire at an attachment. */
  boolean feedsTail(int attachment) {
    if (course.feedHeld() >= 0 || course.feedSpan() >= 0) {
      return false;
    }
    return attachment == (course.feedAt() < course.headTail() ? course.first() : course.last());
  }

  /** Length of wire that hangs free where an attachment, or its rope, holds the wire [m]. */
  double tailLength(int attachment) {
    return (attachment == course.first() ? course.headTail() : 0)
        + (attachment == course.last() ? course.endTail() : 0);
  }

  /** Weight of a metre of the first wire [N]. */
  double tailWeight(Weather weather) {
    Materials first = materials(0);
    return first.weight(first.wireWeight(), first.wireDiameter(), weather.iced);
  }

  // --- the feed line's load

  /** What the feed line will put on the feedpoint, from where that will be, near enough. */
  private void estimateLine() {
    Place near = feedEstimate();
    List<Place> feet = rigging.lineRun.foot(near);
    double length = LineRun.hangingLength(near, feet.get(0));
    Materials any = materials(0);
    double weight = LineRun.weight(line, any, false);
    LineRun.Hung hung = LineRun.hang(near, feet, length, weight, 0, 0);
    double share = Math.max(0, -hung.pull().z()) / weight;
    feedLoad =
        new FeedLoad(
            share * weight + Practice.CENTRE_WEIGHT * G,
            share * LineRun.weight(line, any, true) + Practice.CENTRE_WEIGHT * G,
            any.push(line.diameter(), false) * length / 2,
            any.push(line.diameter(), true) * length / 2);
  }

  private Place held(int attachment) {
    Place corner = course.corners()[attachment];
    return corner == null ? at(attachment) : corner;
  }

  private Place feedEstimate() {
    if (course.feedHeld() >= 0) {
      return held(course.feedHeld());
    }
    if (course.feedSpan() < 0) {
      boolean head = course.feedAt() < course.headTail();
      Place hold = held(head ? course.first() : course.last());
      double end = course.total() - course.endTail();
      double down = head ? course.headTail() - course.feedAt() : course.feedAt() - end;
      return new Place(hold.x(), hold.y(), hold.z() - down);
    }
    Course.Stretch stretch = course.spans().get(course.feedSpan());
    boolean cornerFrom = course.corners()[stretch.fromHold()] != null;
    Place a = held(stretch.fromHold());
    Place b = held(stretch.toHold());
    double chord = Math.max(1e-6, a.distance(b));
    double along = (cornerFrom ? 0 : stretch.ropeFrom()) + course.feedAt() - stretch.from();
    double t = Math.min(1, along / chord);
    return new Place(
        a.x() + t * (b.x() - a.x()),
        a.y() + t * (b.y() - a.y()),
        a.z() + t * (b.z() - a.z()) - 0.02 * chord);
  }
}
