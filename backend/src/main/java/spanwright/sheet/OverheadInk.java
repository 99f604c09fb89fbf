package spanwright.sheet;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.stream.Collectors;
import org.locationtech.jts.geom.Geometry;
import org.locationtech.jts.geom.LineString;
import org.locationtech.jts.geom.Polygon;
import spanwright.plan.OverheadLine;
import spanwright.plan.Place;

/** Draws overhead lines unmistakably: zig-zag, heights, and the kept distance hatched. */
final class OverheadInk {
  private final SheetModel model;
  private final Frame frame;
  private final Figures figures;
  private final Labels labels;
  private final Pen pen;

  OverheadInk(SheetModel model, Frame frame, Labels labels, Pen pen) {
    this.model = model;
    this.frame = frame;
    this.figures = new Figures(model.options().units());
    this.labels = labels;
    this.pen = pen;
  }

  private OverheadParts.Line row(OverheadLine line) {
    return model.overhead().lines().stream()
        .filter(l -> l.id().equals(line.id()))
        .findFirst()
        .orElseThrow();
  }

  /** The kept distance on both sides, hatched. */
  void corridor(OverheadLine line) {
    Double keep = row(line).keep();
    List<double[]> path = frame.places(line.path());
    if (keep == null || path.size() < 2) {
      return;
    }
    Geometry area = Labels.line(path).buffer(Math.max(0.1, frame.mm(keep)));
    Geometry seen = area.intersection(frame.window(2));
    if (seen.isEmpty()) {
      return;
    }
    Hatching.draw(pen, seen, 1.9, false, 0.13, 0.45);
    for (int i = 0; i < area.getNumGeometries(); i++) {
      if (area.getGeometryN(i) instanceof Polygon part) {
        pen.area(Hatching.outline(part), 0.2, 0.85, Ink.NONE, 2, 0.9);
      }
    }
    String text = "keep " + figures.required(keep);
    List<Labels.Spot> spots = new ArrayList<>();
    for (List<double[]> piece : shown(path, 0)) {
      for (double share : new double[] {0.5, 0.3, 0.7, 0.15, 0.85}) {
        double[] at = SurveyInk.along(piece, share);
        double turn = Labels.along(at[2], at[3]);
        for (double side : new double[] {-1, 1}) {
          double off = side * (frame.mm(keep) + 1.9);
          spots.add(
              Labels.text(
                  at[0] - at[3] * off, at[1] + at[2] * off, text, SurveyInk.SMALL, true, turn, 1));
        }
      }
    }
    labels.ask(30, spots);
  }

  /** The line with its zig-zag and its name along it. */
  void line(OverheadLine line) {
    boolean telephone = line.kind() == OverheadLine.Kind.TELEPHONE;
    OverheadParts.Line row = row(line);
    String words = row.name() + ", " + row.kind();
    List<Labels.Spot> spots = new ArrayList<>();
    for (List<double[]> piece : shown(frame.places(line.path()), 15)) {
      List<double[]> drawn = Symbols.zigZag(piece);
      pen.path(drawn, telephone ? 1.1 : 1.5, 0);
      pen.path(drawn, telephone ? 0.25 : 0.5, 1);
      labels.avoid(piece, 6);
    }
    for (List<double[]> piece : shown(frame.places(line.path()), -2)) {
      for (double share : new double[] {0.5, 0.35, 0.65, 0.2, 0.8}) {
        double[] at = SurveyInk.along(piece, share);
        for (double off : new double[] {-3, 3, -5, 5}) {
          spots.add(
              own(
                  line,
                  Labels.text(
                      at[0] - at[3] * off,
                      at[1] + at[2] * off,
                      words,
                      SurveyInk.BODY,
                      true,
                      Labels.along(at[2], at[3]),
                      Math.abs(share - 0.5) + Math.abs(off) / 10)));
        }
      }
    }
    labels.ask(10, spots);
  }

  /** Dearer where the words would stand nearer to another line than to their own. */
  private Labels.Spot own(OverheadLine line, Labels.Spot spot) {
    double near = Labels.line(frame.places(line.path())).distance(spot.box());
    boolean taken =
        model.source().plan().overheadLines().stream()
            .filter(other -> other != line && other.path().size() > 1)
            .anyMatch(
                other -> Labels.line(frame.places(other.path())).distance(spot.box()) < near + 0.3);
    return taken ? new Labels.Spot(spot.box(), spot.cost() + 20, spot.lines(), spot.paint()) : spot;
  }

  /** Heights at the points of every line; where several meet, from the highest down. */
  void heights() {
    List<Place> points =
        model.source().plan().overheadLines().stream().flatMap(l -> l.path().stream()).toList();
    List<Place> told = new ArrayList<>();
    for (Place p : points) {
      double[] at = frame.at(p);
      if (!frame.holds(at, 0) || told.stream().anyMatch(q -> together(p, q))) {
        continue;
      }
      told.add(p);
      pen.circle(at[0], at[1], 0.75, 0.2, 1, 1);
      String text =
          points.stream()
              .filter(q -> together(p, q))
              .map(Place::z)
              .sorted(Comparator.reverseOrder())
              .map(figures::height)
              .distinct()
              .collect(Collectors.joining(" / "));
      labels.ask(12, Labels.around(at[0], at[1], text, SurveyInk.BODY, true, 1.6));
    }
  }

  private static boolean together(Place p, Place q) {
    return p.onPlan().distance(q.onPlan()) < 0.5;
  }

  /** The pieces of a path on paper that show in the window. */
  private List<List<double[]>> shown(List<double[]> path, double margin) {
    List<List<double[]>> pieces = new ArrayList<>();
    if (path.size() < 2) {
      return pieces;
    }
    Geometry cut = frame.window(margin).intersection(Labels.line(path));
    for (int i = 0; i < cut.getNumGeometries(); i++) {
      if (cut.getGeometryN(i) instanceof LineString piece && piece.getLength() > 0.2) {
        List<double[]> points = new ArrayList<>();
        for (var c : piece.getCoordinates()) {
          points.add(new double[] {c.x, c.y});
        }
        pieces.add(points);
      }
    }
    return pieces;
  }
}
