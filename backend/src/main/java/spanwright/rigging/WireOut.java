package spanwright.rigging;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import spanwright.plan.Place;

/** Reads the wires out of a hang: free ends, and each conductor from end to end. */
final class WireOut {
  /** Points nearer than this are one for the field solver [m]. */
  private static final double JOINED = 2e-3;

  private final Hang hang;
  private final Course course;
  private final List<Look> looks;
  private final List<Rigged.Span> spans;

  WireOut(Hang hang, List<Look> looks, List<Rigged.Span> spans) {
    this.hang = hang;
    course = hang.course;
    this.looks = looks;
    this.spans = spans;
  }

  // --- wire that hangs free

  List<Rigged.Tail> tails() {
    List<Rigged.Tail> tails = new ArrayList<>();
    if (course.headTail() > 1e-6) {
      boolean fed = course.feedHeld() < 0 && course.feedAt() < course.headTail();
      tails.add(tail(course.first(), course.headTail(), true, fed));
    }
    if (course.endTail() > 1e-6) {
      boolean fed = course.feedHeld() < 0 && course.feedAt() > course.total() - course.endTail();
      tails.add(tail(course.last(), course.endTail(), false, fed));
    }
    return tails;
  }

  /** Hangs straight down; in the wind straight along weight and push, unless the line holds it. */
  private Rigged.Tail tail(int attachment, double length, boolean head, boolean fed) {
    int span = course.at(attachment)[0];
    Look look = looks.get(span);
    int index = head ? look.calm().wireFrom() : look.calm().wireTo();
    if (course.corners()[attachment] == null) {
      index = head ? 0 : look.calm().points().size() - 1;
    }
    List<List<Place>> drawn = new ArrayList<>();
    Solved[] states = {
      look.calm(), look.left(), look.right(), look.ice(), look.iceLeft(), look.iceRight()
    };
    Weather[] weathers = {
      Weather.CALM, Weather.GUST, Weather.GUST, Weather.ICE, Weather.ICY_GUST, Weather.ICY_GUST
    };
    int[] sides = {0, 1, -1, 0, 1, -1};
    for (int k = 0; k < states.length; k++) {
      double side = fed || !hang.windy ? 0 : sides[k];
      drawn.add(
          states[k] == null
              ? List.of()
              : free(states[k].points().get(index), length, weathers[k], look, side));
    }
    return new Rigged.Tail(
        attachment,
        0,
        length,
        new Rigged.Shapes(
            drawn.get(0), drawn.get(1), drawn.get(2), drawn.get(3), drawn.get(4), drawn.get(5)));
  }

  private List<Place> free(Place from, double length, Weather weather, Look look, double side) {
    Materials materials = hang.materials(0);
    double weight = hang.tailWeight(weather);
    double push = side * materials.push(materials.wireDiameter(), weather);
    double size = Math.hypot(weight, push);
    List<Place> points = new ArrayList<>();
    for (int i = 0; i <= ReadOut.TAIL_PARTS; i++) {
      double s = length * i / ReadOut.TAIL_PARTS / size;
      points.add(
          new Place(
              from.x() + s * push * look.sideX(),
              from.y() + s * push * look.sideY(),
              from.z() - s * weight));
    }
    return points;
  }

  // --- the conductors

  List<Rigged.Conductor> conductors(List<Rigged.Tail> loose) {
    List<Rigged.Conductor> conductors = new ArrayList<>();
    for (int c = 0; c < course.totals().length; c++) {
      conductors.add(conductor(c, loose));
    }
    return conductors;
  }

  private Rigged.Conductor conductor(int c, List<Rigged.Tail> loose) {
    List<Rigged.Shapes> parts = new ArrayList<>();
    if (c == 0 && course.headTail() > 1e-6) {
      parts.add(backwards(loose.get(0).shapes()));
    }
    spans.stream().filter(each -> each.conductor() == c).forEach(each -> parts.add(each.wire()));
    if (c == 0 && course.endTail() > 1e-6) {
      parts.add(loose.get(loose.size() - 1).shapes());
    }
    List<List<Place>> whole = new ArrayList<>();
    for (int state = 0; state < 6; state++) {
      whole.add(state < parts.get(0).all().size() ? joined(c, parts, state) : List.of());
    }
    Rigged.Shapes shapes =
        new Rigged.Shapes(
            whole.get(0), whole.get(1), whole.get(2), whole.get(3), whole.get(4), whole.get(5));
    return new Rigged.Conductor(hang.wire(c).id(), course.totals()[c], shapes);
  }

  private List<Place> joined(int c, List<Rigged.Shapes> parts, int state) {
    List<Place> points = new ArrayList<>();
    for (Rigged.Shapes part : parts) {
      List<Place> more = part.all().get(state);
      boolean joined =
          !points.isEmpty()
              && (points.get(points.size() - 1).distance(more.get(0)) < JOINED || course.loop());
      points.addAll(joined ? more.subList(1, more.size()) : more);
    }
    if (c > 0) {
      return points;
    }
    if (course.loop()) {
      return turned(points);
    }
    if (course.reversed()) {
      Collections.reverse(points);
    }
    return points;
  }

  /** A loop's points, from where its first point was drawn, the way round it was drawn. */
  private List<Place> turned(List<Place> points) {
    points.set(points.size() - 1, points.get(0));
    Polyline round = new Polyline(points);
    double share = course.loopStart() / course.total();
    List<Place> turned = new ArrayList<>();
    if (share < 1e-6 || share > 1 - 1e-6) {
      turned.addAll(points);
    } else {
      turned.addAll(round.from(share * round.total()));
    }
    if (course.reversed()) {
      Collections.reverse(turned);
    }
    return turned;
  }

  private static Rigged.Shapes backwards(Rigged.Shapes shapes) {
    return new Rigged.Shapes(
        back(shapes.calm()),
        back(shapes.left()),
        back(shapes.right()),
        back(shapes.iced()),
        back(shapes.icedLeft()),
        back(shapes.icedRight()));
  }

  private static List<Place> back(List<Place> points) {
    List<Place> other = new ArrayList<>(points);
    Collections.reverse(other);
    return other;
  }
}
