package spanwright.rigging;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import spanwright.plan.Place;

/** Reads a hang out into its record. */
final class ReadOut {
  /** Pieces that wire hanging free is drawn in. */
  static final int TAIL_PARTS = 8;

  private final Hang hang;
  private final Rigging rigging;
  private final Layout layout;
  private final Course course;
  private final int count;

  ReadOut(Hang hang) {
    this.hang = hang;
    rigging = hang.rigging;
    layout = hang.layout;
    course = hang.course;
    count = course.spans().size();
  }

  Rigged rigged() {
    List<Rigged.Attachment> attachments = attachments();
    List<Force> pulls = attachments.stream().map(Rigged.Attachment::pull).toList();
    List<Rigged.Mast> masts = rigging.masts.of(layout.attachments(), hang.holders, pulls);
    List<Rigged.Rope> ropes = new ArrayList<>();
    List<Rigged.Span> spans = new ArrayList<>();
    double[] beyond = new double[attachments.size()];
    for (int a = 0; a < beyond.length; a++) {
      beyond[a] = fall(a, attachments.get(a), masts, ropes);
    }
    for (int i = 0; i < count; i++) {
      spans.add(span(i, beyond));
      tails(spans.get(i), ropes);
    }
    guys(masts, ropes);
    List<Rigged.Tail> loose = loose(spans);
    Rigged.Conductor conductor = conductor(spans, loose);
    Rigged.FeedLine feedLine = feedLine(spans, loose);
    List<String> notes = new ArrayList<>();
    Rigged rigged =
        new Rigged(
            layout,
            List.of(conductor),
            attachments,
            spans,
            loose,
            ropes,
            feedLine,
            masts,
            List.of(),
            notes);
    return new Shortcomings(hang, rigged).added();
  }

  // --- attachments

  private List<Rigged.Attachment> attachments() {
    List<Rigged.Attachment> attachments = new ArrayList<>();
    int last = layout.attachments().size() - 1;
    for (int a = 0; a <= last; a++) {
      Layout.Hold hold = layout.attachments().get(a);
      int weight = hang.weightSpan(a);
      boolean weighted = weight >= 0;
      String held = weighted ? "weight" : a == 0 || a == last ? "tied" : "centre";
      double kilograms = weighted ? hang.statics(weight).pull / Hanging.GRAVITY : 0;
      attachments.add(
          new Rigged.Attachment(
              hold.on(),
              hold.at(),
              hold.at().z() - rigging.ground.heightAt(hold.at().x(), hold.at().y()),
              held,
              weighted ? Double.valueOf(kilograms) : null,
              weighted ? hang.statics(weight).weightTravel : 0,
              hang.onAttachment(a, false),
              hang.inGust(a),
              hang.holders.get(a).pullLimit()));
    }
    return attachments;
  }

  /** The rope from an attachment down to where it is made off; what of it could run out. */
  private double fall(
      int a, Rigged.Attachment attachment, List<Rigged.Mast> masts, List<Rigged.Rope> ropes) {
    Holder holder = hang.holders.get(a);
    if (holder.isWall()) {
      return 0;
    }
    Place at = attachment.at();
    double foot = holder.footHeight(rigging.ground, at.x(), at.y());
    double height = at.z() - foot;
    boolean weighted = hang.weightSpan(a) >= 0;
    double wanted = weighted ? Practice.WEIGHT_HEIGHT : Practice.CLEAT_HEIGHT;
    double down = foot + Math.min(wanted, height / 2);
    List<Place> run = List.of(at, new Place(at.x(), at.y(), down));
    double length = at.z() - down;
    Rigged.Shapes still = still(run);
    String id = rigging.rope().id();
    if (weighted) {
      ropes.add(new Rigged.Rope("fall", a, still, length, id));
      return length;
    }
    // An endless halyard, both parts made off. Should its pulley or strop part, it comes down with
    // the wire's end, and one run of it trails beyond.
    ropes.add(new Rigged.Rope("halyard", a, still, 2 * length, id));
    return length;
  }

  private Rigged.Shapes still(List<Place> points) {
    return new Rigged.Shapes(points, points, points, rigging.isIcy() ? points : List.of());
  }

  private void guys(List<Rigged.Mast> masts, List<Rigged.Rope> ropes) {
    for (Rigged.Mast mast : masts) {
      for (Place foot : mast.guyFeet()) {
        ropes.add(
            new Rigged.Rope(
                "guy",
                mast.attachments().get(0),
                still(List.of(mast.top(), foot)),
                mast.top().distance(foot),
                rigging.rope().id()));
      }
    }
  }

  // --- spans

  private Rigged.Span span(int i, double[] beyond) {
    SpanStatics statics = hang.statics(i);
    SpanStatics.Solved calm = hang.calm[i];
    SpanStatics.Solved gust = hang.gust[i];
    List<Place> iced = hang.iced[i] == null ? List.of() : hang.iced[i].points();
    Rigged.Shapes shapes =
        new Rigged.Shapes(
            calm.points(),
            gust.points(),
            hang.windy ? statics.mirrored(gust.points()) : calm.points(),
            iced);
    double greatest = Math.max(calm.greatest(), gust.greatest());
    if (hang.iced[i] != null) {
      greatest = Math.max(greatest, hang.iced[i].greatest());
    }
    return new Rigged.Span(
        i,
        i + 1,
        0,
        shapes,
        calm.wireFrom(),
        calm.wireTo(),
        statics.sag(calm.points()),
        statics.sag(gust.points()),
        statics.blowOut(gust.points()),
        course.spans().get(i).wire(),
        Math.max(0, statics.ropeFrom),
        Math.max(0, statics.ropeTo),
        beyond[i] + (i == 0 ? course.headTail() : 0),
        beyond[i + 1] + (i + 1 == count ? course.endTail() : 0),
        statics.pull,
        greatest,
        hang.materials.wireBreaking() / greatest,
        hang.materials.ropeBreaking() / greatest);
  }

  private void tails(Rigged.Span span, List<Rigged.Rope> ropes) {
    String id = rigging.rope().id();
    if (span.wireFrom() > 0) {
      ropes.add(
          new Rigged.Rope(
              "tail", span.from(), span.shapes().part(0, span.wireFrom()), span.ropeFrom(), id));
    }
    int end = span.shapes().calm().size() - 1;
    if (span.wireTo() < end) {
      ropes.add(
          new Rigged.Rope(
              "tail", span.to(), span.shapes().part(span.wireTo(), end), span.ropeTo(), id));
    }
  }

  // --- wire that hangs free

  private List<Rigged.Tail> loose(List<Rigged.Span> spans) {
    List<Rigged.Tail> tails = new ArrayList<>();
    if (course.headTail() > 1e-6) {
      boolean fed = course.feedHeld() < 0 && course.feedAt() < course.headTail();
      tails.add(tail(0, course.headTail(), hang.statics(0), fed));
    }
    if (course.endTail() > 1e-6) {
      boolean fed = course.feedHeld() < 0 && course.feedAt() > course.total() - course.endTail();
      tails.add(
          tail(layout.attachments().size() - 1, course.endTail(), hang.statics(count - 1), fed));
    }
    return tails;
  }

  /** Hangs straight down; in the gust straight along weight and push, unless the line holds it. */
  private Rigged.Tail tail(int attachment, double length, SpanStatics span, boolean fed) {
    Place at = layout.attachments().get(attachment).at();
    double weight = hang.materials.wireWeight() * Hanging.GRAVITY;
    double push =
        hang.windy && !fed
            ? hang.materials.push(hang.materials.wireDiameter(), rigging.isIcy())
            : 0;
    if (rigging.isIcy()) {
      weight =
          hang.materials.weight(hang.materials.wireWeight(), hang.materials.wireDiameter(), true);
    }
    double size = Math.hypot(weight, push);
    double sway = hang.windy ? hang.holders.get(attachment).sway() : 0;
    int parts = TAIL_PARTS;
    List<Place> calm = new ArrayList<>();
    List<List<Place>> blown = List.of(new ArrayList<>(), new ArrayList<>());
    for (int i = 0; i <= parts; i++) {
      double s = length * i / parts;
      calm.add(new Place(at.x(), at.y(), at.z() - s));
      for (int side = 0; side < 2; side++) {
        double out = (side == 0 ? 1 : -1) * (s * push / size + sway);
        blown
            .get(side)
            .add(
                new Place(
                    at.x() + out * span.sideX,
                    at.y() + out * span.sideY,
                    at.z() - s * weight / size));
      }
    }
    return new Rigged.Tail(
        attachment,
        0,
        length,
        new Rigged.Shapes(calm, blown.get(0), blown.get(1), rigging.isIcy() ? calm : List.of()));
  }

  // --- the conductor

  private Rigged.Conductor conductor(List<Rigged.Span> spans, List<Rigged.Tail> loose) {
    List<Rigged.Shapes> parts = new ArrayList<>();
    for (Rigged.Tail tail : loose) {
      if (tail.attachment() == 0 && course.headTail() > 1e-6 && parts.isEmpty()) {
        parts.add(backwards(tail.shapes()));
      }
    }
    spans.forEach(each -> parts.add(each.wire()));
    if (course.endTail() > 1e-6) {
      parts.add(loose.get(loose.size() - 1).shapes());
    }
    List<List<Place>> whole = new ArrayList<>();
    for (int state = 0; state < parts.get(0).all().size(); state++) {
      List<Place> points = new ArrayList<>();
      for (Rigged.Shapes part : parts) {
        List<Place> more = part.all().get(state);
        boolean joined =
            !points.isEmpty() && points.get(points.size() - 1).distance(more.get(0)) < 1e-6;
        points.addAll(joined ? more.subList(1, more.size()) : more);
      }
      if (course.reversed()) {
        Collections.reverse(points);
      }
      whole.add(points);
    }
    Rigged.Shapes shapes =
        new Rigged.Shapes(
            whole.get(0), whole.get(1), whole.get(2), whole.size() > 3 ? whole.get(3) : List.of());
    return new Rigged.Conductor(hang.wire.id(), course.total(), shapes);
  }

  private static Rigged.Shapes backwards(Rigged.Shapes shapes) {
    return new Rigged.Shapes(
        back(shapes.calm()), back(shapes.left()), back(shapes.right()), back(shapes.iced()));
  }

  private static List<Place> back(List<Place> points) {
    List<Place> other = new ArrayList<>(points);
    Collections.reverse(other);
    return other;
  }

  // --- the feed line

  /** A line that hangs steeper than this has no direction of its own [m]. */
  private static final double LEAST_RUN = 0.3;

  private Rigged.FeedLine feedLine(List<Rigged.Span> spans, List<Rigged.Tail> loose) {
    Rigged.Shapes at = feedpoint(spans, loose);
    List<Place> feet = rigging.lineRun.foot(at.calm().get(0));
    Place foot = feet.get(0);
    double led = LineRun.ledLength(feet);
    double wanted = LineRun.hangingLength(at.calm().get(0), foot);
    Double given = layout.feed().lineLength();
    double hanging = given == null ? wanted : Math.min(wanted, given - led);
    hanging = Math.max(hanging, at.calm().get(0).distance(foot) * 1.002);
    double run = hanging + led;
    double length = given == null ? Math.ceil(run * 10 - 1e-6) / 10 : given;
    int side = Math.min(Math.max(0, Math.max(course.feedSpan(), course.feedHeld())), count - 1);
    SpanStatics span = hang.statics(side);
    double weight = LineRun.weight(hang.line, hang.materials, false);
    double iced = LineRun.weight(hang.line, hang.materials, true);
    double push = hang.materials.push(hang.line.diameter(), rigging.isIcy());
    List<Place> calm = LineRun.hang(at.calm().get(0), feet, hanging, weight, 0, 0).points();
    List<Place> left = calm;
    List<Place> right = calm;
    List<Rigged.Shapes> others = new ArrayList<>();
    if (hang.windy) {
      double[] across = across(at.calm().get(0), foot, span);
      double px = push * across[0];
      double py = push * across[1];
      double heavy = rigging.isIcy() ? iced : weight;
      left = LineRun.hang(at.left().get(0), feet, hanging, heavy, px, py).points();
      right = LineRun.hang(at.right().get(0), feet, hanging, heavy, -px, -py).points();
      Place still = at.calm().get(0);
      others.add(
          new Rigged.Shapes(
              calm,
              LineRun.hang(still, feet, hanging, heavy, px, py).points(),
              LineRun.hang(still, feet, hanging, heavy, -px, -py).points(),
              List.of()));
      others.add(
          new Rigged.Shapes(
              calm,
              LineRun.hang(at.left().get(0), feet, hanging, heavy, -px, -py).points(),
              LineRun.hang(at.right().get(0), feet, hanging, heavy, px, py).points(),
              List.of()));
    }
    List<Place> frozen =
        at.iced().isEmpty()
            ? List.of()
            : LineRun.hang(at.iced().get(0), feet, hanging, iced, 0, 0).points();
    return new Rigged.FeedLine(
        hang.line.id(),
        at.calm().get(0),
        course.feedHeld(),
        new Rigged.Shapes(calm, left, right, frozen),
        others,
        run,
        length,
        Math.max(0, length - run),
        hang.feedWeight() / Hanging.GRAVITY);
  }

  /**
   * The level direction square to the feed line's own run, toward the side the span is blown to:
   * the wind that carries the line farthest, while the span carries its feedpoint.
   */
  private static double[] across(Place feedpoint, Place foot, SpanStatics span) {
    double dx = foot.x() - feedpoint.x();
    double dy = foot.y() - feedpoint.y();
    double run = Math.hypot(dx, dy);
    if (run < LEAST_RUN) {
      return new double[] {span.sideX, span.sideY};
    }
    double turn = -dy * span.sideX + dx * span.sideY >= 0 ? 1 / run : -1 / run;
    return new double[] {-dy * turn, dx * turn};
  }

  /** The feedpoint in each state, as shapes of one point. */
  private Rigged.Shapes feedpoint(List<Rigged.Span> spans, List<Rigged.Tail> loose) {
    if (course.feedHeld() >= 0) {
      int i = Math.min(course.feedHeld(), count - 1);
      int index = course.feedHeld() == i ? 0 : spans.get(i).shapes().calm().size() - 1;
      return spans.get(i).shapes().part(index, index);
    }
    if (course.feedSpan() >= 0) {
      int index = hang.calm[course.feedSpan()].feed();
      return spans.get(course.feedSpan()).shapes().part(index, index);
    }
    boolean head = course.feedAt() < course.headTail();
    Rigged.Tail tail = head ? loose.get(0) : loose.get(loose.size() - 1);
    double down =
        head
            ? course.headTail() - course.feedAt()
            : course.feedAt() - course.total() + tail.length();
    int points = tail.shapes().calm().size() - 1;
    int index = (int) Math.round(points * Math.min(1, down / tail.length()));
    return tail.shapes().part(index, index);
  }
}
