package spanwright.sheet;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.function.Consumer;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Geometry;
import org.locationtech.jts.geom.Polygon;

/**
 * Finds room for lettering: each label offers the spots it could take, the greater ones choose
 * first, and one that finds no free spot is left out. No two labels that were placed overlap.
 */
final class Labels {
  /** Air between two labels [mm]. */
  private static final double AIR = 0.4;

  /**
   * A spot that a label could take.
   *
   * @param box it would cover
   * @param cost the less the better
   * @param lines drawn with it, which had better not strike through other lettering
   * @param paint draws it there
   */
  record Spot(Polygon box, double cost, List<Geometry> lines, Consumer<Pen> paint) {
    Spot(Polygon box, double cost, Consumer<Pen> paint) {
      this(box, cost, List.of(), paint);
    }
  }

  /** A line that lettering had better not cover, and how much that matters. */
  private record Avoided(Geometry line, double cost) {}

  /** What it costs to strike a line through lettering, or to letter over such a line. */
  private static final double STRUCK = 7;

  /** A label that asks for room. */
  private record Asked(int rank, double limit, List<Spot> spots) {}

  private final Frame frame;
  private final List<Polygon> taken = new ArrayList<>();
  private final List<Polygon> placed = new ArrayList<>();
  private final List<Avoided> avoided = new ArrayList<>();
  private final List<Asked> asked = new ArrayList<>();

  Labels(Frame frame) {
    this.frame = frame;
  }

  /** Boxes of all that found room, for whoever wants to check that none overlap. */
  List<Polygon> placed() {
    return List.copyOf(placed);
  }

  /** Lettering had better not cover this line. */
  void avoid(List<double[]> line, double cost) {
    if (line.size() > 1) {
      avoided.add(new Avoided(line(line), cost));
    }
  }

  /** Lettering had better not stand on this area. */
  void avoid(Geometry area, double cost) {
    avoided.add(new Avoided(area, cost));
  }

  /** A line on paper. */
  static Geometry line(List<double[]> points) {
    return Sight.SHAPES.createLineString(
        points.stream().map(p -> new Coordinate(p[0], p[1])).toArray(Coordinate[]::new));
  }

  /** Nothing may be placed here. */
  void block(Polygon box) {
    taken.add(box);
  }

  /** Asks for room; lower ranks choose first. */
  void ask(int rank, List<Spot> spots) {
    asked.add(new Asked(rank, Double.POSITIVE_INFINITY, spots));
  }

  /** Asks for room, but rather gives way than take a spot that costs more than a limit. */
  void ask(int rank, double limit, List<Spot> spots) {
    asked.add(new Asked(rank, limit, spots));
  }

  /** Gives room to all who asked and draws them. */
  void settle(Pen pen) {
    List<Asked> order = new ArrayList<>(asked);
    order.sort(Comparator.comparingInt(Asked::rank));
    asked.clear();
    for (Asked label : order) {
      Spot best = null;
      double least = label.limit();
      for (Spot spot : label.spots()) {
        double cost = cost(spot, least);
        if (cost < least) {
          least = cost;
          best = spot;
        }
      }
      if (best != null) {
        taken.add(best.box());
        placed.add(best.box());
        best.lines().forEach(line -> avoided.add(new Avoided(line, STRUCK)));
        best.paint().accept(pen);
      }
    }
  }

  private double cost(Spot spot, double least) {
    if (spot.cost() >= least || !inside(spot.box())) {
      return Double.POSITIVE_INFINITY;
    }
    for (Polygon other : taken) {
      if (other.getEnvelopeInternal().distance(spot.box().getEnvelopeInternal()) <= AIR
          && other.distance(spot.box()) < AIR) {
        return Double.POSITIVE_INFINITY;
      }
    }
    double cost = spot.cost();
    for (Geometry line : spot.lines()) {
      for (Polygon other : taken) {
        cost += line.intersects(other) ? STRUCK : 0;
      }
    }
    for (Avoided a : avoided) {
      if (a.line().getEnvelopeInternal().intersects(spot.box().getEnvelopeInternal())
          && a.line().intersects(spot.box())) {
        cost += a.cost();
      }
    }
    return cost;
  }

  private boolean inside(Polygon box) {
    for (Coordinate c : box.getCoordinates()) {
      if (!frame.holds(new double[] {c.x, c.y}, 0.6)) {
        return false;
      }
    }
    return true;
  }

  /** A box about a middle, turned by degrees clockwise. */
  static Polygon box(double x, double y, double width, double height, double turn) {
    double cos = Math.cos(Math.toRadians(turn));
    double sin = Math.sin(Math.toRadians(turn));
    Coordinate[] ring = new Coordinate[5];
    double[][] corners = {{-0.5, -0.5}, {0.5, -0.5}, {0.5, 0.5}, {-0.5, 0.5}, {-0.5, -0.5}};
    for (int i = 0; i < 5; i++) {
      double dx = corners[i][0] * width;
      double dy = corners[i][1] * height;
      ring[i] = new Coordinate(x + dx * cos - dy * sin, y + dx * sin + dy * cos);
    }
    return Sight.SHAPES.createPolygon(ring);
  }

  /** A line of narrow lettering about a middle. */
  static Spot text(
      double x, double y, String words, double points, boolean bold, double turn, double cost) {
    String text = Letters.printable(words);
    double width = Letters.width(text, points, bold, true) * (bold ? 1.06 : 1);
    double size = points * Letters.POINT;
    double down = Math.toRadians(turn);
    // the foot of the letters lies under the middle by half the height of a capital
    double footX = x - Math.sin(down) * 0.36 * size;
    double footY = y + Math.cos(down) * 0.36 * size;
    Ink.Lettering lettering =
        new Ink.Lettering(footX, footY, text, points, Ink.Anchor.MIDDLE, bold, true, turn, 0.45, 1);
    return new Spot(box(x, y, width + 0.6, size * 0.95, turn), cost, pen -> pen.add(lettering));
  }

  /** Lines of narrow lettering, one under another, about a middle. */
  static Spot lines(
      double x, double y, List<String> lines, double points, double turn, double cost) {
    double step = points * Letters.POINT * 1.12;
    double down = Math.toRadians(turn);
    List<Spot> each = new ArrayList<>();
    double width = 0;
    for (int i = 0; i < lines.size(); i++) {
      double off = (i - (lines.size() - 1) / 2.0) * step;
      double lx = x - Math.sin(down) * off;
      double ly = y + Math.cos(down) * off;
      each.add(text(lx, ly, lines.get(i), points, false, turn, 0));
      String printed = Letters.printable(lines.get(i));
      width = Math.max(width, Letters.width(printed, points, false, true));
    }
    return new Spot(
        box(x, y, width + 0.6, step * lines.size(), turn),
        cost,
        pen -> each.forEach(spot -> spot.paint().accept(pen)));
  }

  /** Spots for a line of lettering round a point. */
  static List<Spot> around(
      double x, double y, String words, double points, boolean bold, double gap) {
    double width = Letters.width(Letters.printable(words), points, bold, true);
    double height = points * Letters.POINT;
    List<Spot> spots = new ArrayList<>();
    for (int ring = 0; ring < 4; ring++) {
      double out = gap + ring * 2.2;
      double sideways = out + width / 2;
      double upward = out + height / 2;
      double[][] ways = {
        {1, 0}, {-1, 0}, {0, -1}, {0, 1}, {0.8, -0.8}, {0.8, 0.8}, {-0.8, -0.8}, {-0.8, 0.8}
      };
      for (int i = 0; i < ways.length; i++) {
        spots.add(
            text(
                x + ways[i][0] * sideways,
                y + ways[i][1] * upward,
                words,
                points,
                bold,
                0,
                ring * 3 + i * 0.2));
      }
    }
    return spots;
  }

  /** Spots for a point number round its point, with a leader from farther off. */
  static List<Spot> number(double x, double y, int number) {
    List<Spot> spots = new ArrayList<>();
    for (double out : new double[] {4.4, 6, 8.5, 12, 16, 22, 30}) {
      for (int i = 0; i < 16; i++) {
        double angle = Math.PI * (i + 0.5) / 8;
        double cx = x + out * Math.sin(angle);
        double cy = y - out * Math.cos(angle);
        boolean leader = out > 5;
        spots.add(
            new Spot(
                box(cx, cy, number > 99 ? 6 : 4.4, 4.4, 0),
                out,
                leader
                    ? List.of(line(List.of(new double[] {x, y}, new double[] {cx, cy})))
                    : List.of(),
                pen -> {
                  if (leader) {
                    pen.line(x, y, cx, cy, 0.18, 1);
                  }
                  Symbols.number(pen, cx, cy, String.valueOf(number));
                }));
      }
    }
    return spots;
  }

  /** Degrees clockwise that set lettering along a line, never upside down. */
  static double along(double dx, double dy) {
    double turn = Math.toDegrees(Math.atan2(dy, dx));
    if (turn > 90) {
      turn -= 180;
    } else if (turn <= -90) {
      turn += 180;
    }
    return turn;
  }
}
