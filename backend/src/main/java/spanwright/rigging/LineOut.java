package spanwright.rigging;

import java.util.List;
import spanwright.plan.Place;

/** Reads the feed line's run out of a hang. */
final class LineOut {
  private final Hang hang;
  private final Rigging rigging;
  private final Course course;
  private final List<Look> looks;
  private final List<Rigged.Tail> loose;

  LineOut(Hang hang, List<Look> looks, List<Rigged.Tail> loose) {
    this.hang = hang;
    rigging = hang.rigging;
    course = hang.course;
    this.looks = looks;
    this.loose = loose;
  }

  /** A line that hangs steeper than this has no direction of its own [m]. */
  private static final double LEAST_RUN = 0.3;

  Rigged.FeedLine feedLine() {
    Rigged.Shapes at = feedpoint();
    List<Place> feet = rigging.lineRun.foot(at.calm().get(0));
    Place foot = feet.get(0);
    double led = LineRun.ledLength(feet);
    double wanted = LineRun.hangingLength(at.calm().get(0), foot);
    Double given = hang.layout.feed().lineLength();
    double hanging = given == null ? wanted : Math.min(wanted, given - led);
    hanging = Math.max(hanging, at.calm().get(0).distance(foot) * 1.002);
    double run = hanging + led;
    double length = given == null ? Math.ceil(run * 10 - 1e-6) / 10 : given;
    Look look = looks.get(nearestSpan());
    double[] across = across(at.calm().get(0), foot, look);
    Runs runs = new Runs(feet, hanging, across);
    List<Place> calm = runs.of(at.calm(), Weather.CALM, 0);
    boolean windy = hang.windy;
    boolean icy = !at.iced().isEmpty();
    List<Place> none = List.of();
    Rigged.Shapes shapes =
        new Rigged.Shapes(
            calm,
            windy ? runs.of(at.left(), Weather.GUST, 1) : calm,
            windy ? runs.of(at.right(), Weather.GUST, -1) : calm,
            icy ? runs.of(at.iced(), Weather.ICE, 0) : none,
            icy ? runs.of(at.icedLeft(), Weather.ICY_GUST, 1) : none,
            icy ? runs.of(at.icedRight(), Weather.ICY_GUST, -1) : none);
    return new Rigged.FeedLine(
        hang.line.id(),
        at.calm().get(0),
        course.feedHeld(),
        shapes,
        windy ? others(runs, at, calm) : List.of(),
        run,
        length,
        Math.max(0, length - run),
        hang.feedLoad.bare() / Hanging.GRAVITY);
  }

  /** The line blown while its feedpoint stays, and each blown to the other side. */
  private static List<Rigged.Shapes> others(Runs runs, Rigged.Shapes at, List<Place> calm) {
    return List.of(
        new Rigged.Shapes(
            calm,
            runs.of(at.calm(), Weather.GUST, 1),
            runs.of(at.calm(), Weather.GUST, -1),
            List.of()),
        new Rigged.Shapes(
            calm,
            runs.of(at.left(), Weather.GUST, -1),
            runs.of(at.right(), Weather.GUST, 1),
            List.of()));
  }

  /** Runs of the line from a feedpoint. */
  private final class Runs {
    private final List<Place> feet;
    private final double hanging;
    private final double[] across;

    Runs(List<Place> feet, double hanging, double[] across) {
      this.feet = feet;
      this.hanging = hanging;
      this.across = across;
    }

    List<Place> of(List<Place> feedpoint, Weather weather, int side) {
      Materials any = hang.materials(0);
      double push = side * any.push(hang.line.diameter(), weather);
      double weight = LineRun.weight(hang.line, any, weather.iced);
      return LineRun.hang(
              feedpoint.get(0), feet, hanging, weight, push * across[0], push * across[1])
          .points();
    }
  }

  /** The span that the feedpoint hangs in, or one that meets it. */
  private int nearestSpan() {
    if (course.feedSpan() >= 0) {
      return course.feedSpan();
    }
    boolean head = course.feedAt() < course.headTail();
    int[] held =
        course.at(
            course.feedHeld() >= 0 ? course.feedHeld() : head ? course.first() : course.last());
    return held[held.length - 1];
  }

  /**
   * The level direction square to the feed line's own run, toward the side the span is blown to:
   * the wind that carries the line farthest, while the span carries its feedpoint.
   */
  private static double[] across(Place feedpoint, Place foot, Look span) {
    double dx = foot.x() - feedpoint.x();
    double dy = foot.y() - feedpoint.y();
    double run = Math.hypot(dx, dy);
    if (run < LEAST_RUN) {
      return new double[] {span.sideX(), span.sideY()};
    }
    double turn = -dy * span.sideX() + dx * span.sideY() >= 0 ? 1 / run : -1 / run;
    return new double[] {-dy * turn, dx * turn};
  }

  /** The feedpoint in each weather, as shapes of one point. */
  private Rigged.Shapes feedpoint() {
    if (course.feedHeld() >= 0) {
      int i = nearestSpan();
      Look look = looks.get(i);
      Rigged.Shapes shapes = look.shapes();
      boolean corner = course.corners()[course.feedHeld()] != null;
      boolean first = course.spans().get(i).fromHold() == course.feedHeld();
      int wire = first ? look.calm().wireFrom() : look.calm().wireTo();
      int index = corner ? wire : first ? 0 : shapes.calm().size() - 1;
      return shapes.part(index, index);
    }
    if (course.feedSpan() >= 0) {
      Look look = looks.get(course.feedSpan());
      return look.shapes().part(look.calm().feed(), look.calm().feed());
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
