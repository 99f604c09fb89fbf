package spanwright.sheet;

import java.util.ArrayList;
import java.util.List;
import org.locationtech.jts.geom.Geometry;
import spanwright.plan.Building;
import spanwright.plan.Canopy;
import spanwright.plan.Metalwork;
import spanwright.plan.PeopleVolume;
import spanwright.plan.Plan;
import spanwright.plan.Point;
import spanwright.plan.Support;
import spanwright.plan.Tree;
import spanwright.plan.Zone;

/** Draws what was surveyed, thin: boundary, buildings, crowns, zones, metalwork, overhead lines. */
final class SurveyInk {
  static final double SMALL = 7.5;
  static final double BODY = 8;

  private final SheetModel model;
  private final Plan plan;
  private final Frame frame;
  private final Figures figures;
  private final Labels labels;
  private final Pen pen;

  SurveyInk(SheetModel model, Frame frame, Labels labels, Pen pen) {
    this.model = model;
    this.plan = model.source().plan();
    this.frame = frame;
    this.figures = new Figures(model.options().units());
    this.labels = labels;
    this.pen = pen;
  }

  void draw() {
    grid();
    OverheadInk overhead = new OverheadInk(model, frame, labels, pen);
    plan.overheadLines().forEach(overhead::corridor);
    plan.trees().forEach(this::crown);
    plan.supports().stream().filter(s -> s.canopy() != null).forEach(this::crown);
    plan.zones().forEach(this::zone);
    plan.people().forEach(this::people);
    plan.buildings().forEach(this::building);
    boundary();
    plan.metalwork().forEach(this::metal);
    plan.overheadLines().forEach(overhead::line);
    overhead.heights();
    plan.supports().forEach(this::support);
  }

  private void grid() {
    double step = gridStep();
    for (double x = Math.ceil(frame.x0() / step) * step; frame.x(x) < right(); x += step) {
      pen.line(frame.x(x), frame.top(), frame.x(x), frame.top() + frame.height(), 0.1, 0.16);
    }
    for (double y = Math.ceil(frame.y0() / step) * step; frame.y(y) > frame.top(); y += step) {
      pen.line(frame.left(), frame.y(y), right(), frame.y(y), 0.1, 0.16);
    }
  }

  /** Metres between grid lines: 12 mm of paper at least. */
  double gridStep() {
    double unit = figures.axisUnit();
    double step = 1;
    for (double next : new double[] {5, 10, 20, 50, 100, 200, 500, 1000, 5000, 20000, 100000}) {
      if (frame.mm(step * unit) < 12) {
        step = next;
      }
    }
    return step * unit;
  }

  private double right() {
    return frame.left() + frame.width();
  }

  /** A point at a share of a path and the direction there: x, y, ux, uy. */
  static double[] along(List<double[]> path, double share) {
    double whole = 0;
    for (int i = 1; i < path.size(); i++) {
      whole += Math.hypot(path.get(i)[0] - path.get(i - 1)[0], path.get(i)[1] - path.get(i - 1)[1]);
    }
    double want = share * whole;
    for (int i = 1; i < path.size(); i++) {
      double[] a = path.get(i - 1);
      double[] b = path.get(i);
      double piece = Math.hypot(b[0] - a[0], b[1] - a[1]);
      if (piece > 1e-9 && (want <= piece || i == path.size() - 1)) {
        double t = Math.min(1, want / piece);
        return new double[] {
          a[0] + t * (b[0] - a[0]),
          a[1] + t * (b[1] - a[1]),
          (b[0] - a[0]) / piece,
          (b[1] - a[1]) / piece
        };
      }
      want -= piece;
    }
    return new double[] {path.get(0)[0], path.get(0)[1], 1, 0};
  }

  private void crown(Tree tree) {
    crown(tree.at(), tree.canopy());
    double[] at = frame.at(tree.at());
    Symbols.tree(pen, at[0], at[1]);
    String text = model.source().name(tree.id()) + heights(tree.canopy());
    labels.ask(70, Labels.around(at[0], at[1], text, SMALL, false, 2));
  }

  private void crown(Support support) {
    crown(support.at(), support.canopy());
  }

  private String heights(Canopy canopy) {
    return canopy == null
        ? ""
        : ", " + figures.height(canopy.from()) + "–" + figures.height(canopy.to());
  }

  /** A scalloped ring with a dotted one inside. */
  private void crown(Point at, Canopy canopy) {
    if (canopy == null) {
      return;
    }
    double[] c = frame.at(at);
    double r = frame.mm(canopy.radius());
    int lobes = Math.max(8, (int) Math.round(2 * Math.PI * r / 4.2));
    List<Ink.Step> path = new ArrayList<>();
    for (int i = 0; i <= lobes; i++) {
      double a = 2 * Math.PI * i / lobes;
      double x = c[0] + 0.96 * r * Math.cos(a);
      double y = c[1] + 0.96 * r * Math.sin(a);
      if (i == 0) {
        path.add(Ink.Step.to(x, y));
        continue;
      }
      double before = 2 * Math.PI * (i - 1) / lobes;
      double out = 1.1 * r;
      double third = (a - before) / 4;
      path.add(
          new Ink.Step(
              true,
              c[0] + out * Math.cos(before + third),
              c[1] + out * Math.sin(before + third),
              c[0] + out * Math.cos(a - third),
              c[1] + out * Math.sin(a - third),
              x,
              y));
    }
    pen.shape(List.of(new Ink.Stroke(List.copyOf(path), true)), 0.25, 0.6, 0.05);
    pen.circle(c[0], c[1], 0.55 * r, 0.2, 0.5, Ink.NONE, 0.3, 1.2);
  }

  private void zone(Zone zone) {
    List<double[]> area = frame.points(zone.area());
    pen.area(area, 0.22, 0.7, Ink.NONE, 1.6, 1);
    String rule =
        switch (zone.rule()) {
          case NO_WIRE -> "no wire";
          case NO_MAST -> "no mast";
          case HEADROOM ->
              "headroom " + (zone.height() == null ? "" : figures.height(zone.height()));
        };
    label(zone.area(), model.source().name(zone.id()) + ", " + rule, 80);
  }

  private void people(PeopleVolume people) {
    pen.area(frame.points(people.area()), 0.22, 0.55, Ink.NONE, 0.3, 0.9);
    label(
        people.area(),
        model.source().name(people.id()) + ", people to " + figures.height(people.to()),
        82);
  }

  /** Lettering inside an outline, or beside it. */
  private void label(List<Point> outline, String text, int rank) {
    if (outline.size() < 3) {
      return;
    }
    Geometry seen = Hatching.area(frame.points(outline)).buffer(0).intersection(frame.window(0));
    if (seen.isEmpty()) {
      return;
    }
    var in = seen.getInteriorPoint().getCoordinate();
    var box = seen.getEnvelopeInternal();
    List<String> split = List.of(text.split(", "));
    List<Labels.Spot> spots = new ArrayList<>();
    for (double dy : new double[] {0, -4, 4, -8, 8, -12, 12}) {
      for (double dx : new double[] {0, -4, 4, -8, 8, -16, 16}) {
        double far = Math.hypot(dx, dy) / 8;
        double x = in.x + dx;
        double y = in.y + dy;
        spots.add(inside(seen, Labels.lines(x, y, List.of(text), SMALL, 0, far)));
        spots.add(inside(seen, Labels.lines(x, y, split, SMALL, 0, far + 0.3)));
        spots.add(inside(seen, Labels.lines(x, y, split, SMALL, -90, far + 0.6)));
      }
    }
    labels.ask(rank, spots);
  }

  /** A spot that reaches out of its area costs more. */
  private static Labels.Spot inside(Geometry area, Labels.Spot spot) {
    return area.covers(spot.box())
        ? spot
        : new Labels.Spot(spot.box(), spot.cost() + 6, spot.lines(), spot.paint());
  }

  private void building(Building building) {
    if (building.footprint().size() < 3) {
      return;
    }
    List<double[]> outline = frame.points(building.footprint());
    pen.area(outline, 0, Ink.NONE, 0);
    Geometry area = Hatching.area(outline).buffer(0);
    List<double[]> ridge = frame.points(building.ridgeLine());
    if (ridge.size() == 2 && building.roof() != Building.Roof.LEAN_TO) {
      area = area.difference(Labels.line(ridge).buffer(0.7));
    }
    Hatching.draw(pen, area.intersection(frame.window(2)), 1.8, true, 0.13, 0.55);
    if (building.metalRoof()) {
      Hatching.draw(pen, area.intersection(frame.window(2)), 1.8, false, 0.13, 0.55);
    }
    pen.area(outline, 0.45, 1, Ink.NONE);
    labels.avoid(area, 2);
    labels.avoid(Hatching.area(outline).getBoundary(), 2);
    if (ridge.size() == 2) {
      pen.path(ridge, 0.28, 1);
      labels.avoid(ridge, 2);
    }
    String top =
        building.ridge() > building.eaves() + 0.01
            ? ", eaves "
                + figures.height(building.eaves())
                + ", ridge "
                + figures.height(building.ridge())
            : ", " + figures.height(building.eaves());
    label(building.footprint(), model.source().name(building.id()) + top, 60);
  }

  private void boundary() {
    List<double[]> corners = frame.points(plan.boundary());
    pen.area(corners, 0.4, 1, Ink.NONE, 4, 1, 0.6, 1);
    for (int i = 0; i < corners.size(); i++) {
      double[] a = corners.get(i);
      double[] b = corners.get((i + 1) % corners.size());
      pen.circle(a[0], a[1], 0.65, 0.25, 1, 0);
      labels.avoid(List.of(a, b), 1);
      double metres =
          plan.boundary().get(i).distance(plan.boundary().get((i + 1) % corners.size()));
      String text = figures.length(metres);
      double length = Math.hypot(b[0] - a[0], b[1] - a[1]);
      if (length < Letters.width(text, BODY, false, true) + 3) {
        continue;
      }
      List<Labels.Spot> spots = new ArrayList<>();
      for (double share : new double[] {0.5, 0.4, 0.6, 0.25, 0.75}) {
        for (double off : new double[] {outward() * 2.3, -outward() * 2.3}) {
          double ux = (b[0] - a[0]) / length;
          double uy = (b[1] - a[1]) / length;
          spots.add(
              Labels.text(
                  a[0] + share * (b[0] - a[0]) - uy * off,
                  a[1] + share * (b[1] - a[1]) + ux * off,
                  text,
                  BODY,
                  false,
                  Labels.along(ux, uy),
                  Math.abs(share - 0.5) * 4 + (off * outward() < 0 ? 2 : 0)));
        }
      }
      labels.ask(50, spots);
    }
  }

  /** Which side of its edges on paper lies outside the boundary: 1 or −1. */
  private double outward() {
    double twice = 0;
    List<Point> b = plan.boundary();
    for (int i = 0; i < b.size(); i++) {
      Point p = b.get(i);
      Point q = b.get((i + 1) % b.size());
      twice += p.x() * q.y() - q.x() * p.y();
    }
    return twice > 0 ? 1 : -1;
  }

  private void metal(Metalwork metal) {
    List<double[]> path = frame.places(metal.path());
    pen.path(path, 0.25, 0.8, 0.3, 0.6);
    for (int i = 1; i < path.size(); i++) {
      double[] a = path.get(i - 1);
      double[] b = path.get(i);
      int beads = (int) Math.min(400, Math.hypot(b[0] - a[0], b[1] - a[1]) / 5);
      for (int k = 0; k <= beads; k++) {
        double t = beads == 0 ? 0 : (double) k / beads;
        pen.circle(a[0] + t * (b[0] - a[0]), a[1] + t * (b[1] - a[1]), 0.35, 0, Ink.NONE, 0.8);
      }
    }
    if (!path.isEmpty()) {
      double[] middle = along(path, 0.5);
      String text = model.source().name(metal.id()) + " " + figures.height(metal.path().get(0).z());
      labels.ask(90, Labels.around(middle[0], middle[1], text, SMALL, false, 1.2));
    }
  }

  private void support(Support support) {
    double[] at = frame.at(support.at());
    switch (support.kind()) {
      case TREE -> Symbols.tree(pen, at[0], at[1]);
      case MAST -> Symbols.mast(pen, at[0], at[1], true);
      case POLE -> Symbols.pole(pen, at[0], at[1]);
      case CHIMNEY, WALL -> Symbols.wall(pen, at[0], at[1]);
      default -> Symbols.other(pen, at[0], at[1]);
    }
    boolean used =
        model.source().placement().attachments().stream()
            .anyMatch(a -> a.on().equals(support.id()));
    labels.ask(
        used ? 42 : 55,
        Labels.around(
            at[0],
            at[1],
            model.source().name(support.id()) + heights(support.canopy()),
            SMALL,
            false,
            2.2));
  }
}
