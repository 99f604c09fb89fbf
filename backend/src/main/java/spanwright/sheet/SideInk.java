package spanwright.sheet;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import spanwright.assess.Placement;
import spanwright.clearance.Clearance;
import spanwright.plan.GroundSurface;
import spanwright.plan.Place;
import spanwright.plan.Plan;
import spanwright.plan.Point;
import spanwright.plan.Support;

/**
 * The side view: spans unfolded one after another along the wire, heights true, at the plan's own
 * scale, with the ground and whatever stands in the plane of each span.
 */
final class SideInk {
  /** Metres shown beyond the first and last attachment. */
  static final double BEYOND = 2.5;

  /** Metres of paper's height kept over the highest attachment. */
  static final double ABOVE = 1.6;

  /**
   * A span unfolded.
   *
   * @param span as assessed
   * @param start metres along the row at its first attachment
   * @param length level [m]
   */
  record Leg(Placement.Span span, double start, double length) {
    Point from() {
      return span.points().get(0).onPlan();
    }

    Point to() {
      return span.points().get(span.points().size() - 1).onPlan();
    }

    /** Metres along the row of a place, dropped square onto the span's course. */
    double along(Point p) {
      Point a = from();
      Point b = to();
      if (length < 1e-6) {
        return start;
      }
      double s = ((p.x() - a.x()) * (b.x() - a.x()) + (p.y() - a.y()) * (b.y() - a.y())) / length;
      return start + s;
    }

    /** Metres to the side of the span's course. */
    double aside(Point p) {
      Point a = from();
      Point b = to();
      return length < 1e-6
          ? a.distance(p)
          : ((b.x() - a.x()) * (p.y() - a.y()) - (b.y() - a.y()) * (p.x() - a.x())) / length;
    }

    Point at(double along) {
      double t = length < 1e-6 ? 0 : (along - start) / length;
      return new Point(
          from().x() + t * (to().x() - from().x()), from().y() + t * (to().y() - from().y()));
    }
  }

  private final SheetModel model;
  private final Plan plan;
  private final Placement placement;
  private final GroundSurface ground;
  private final Figures figures;
  private final Frame frame;
  private final List<Leg> legs;
  private final Labels labels;
  private final Pen pen;

  SideInk(SheetModel model, Frame frame, List<Leg> legs, Labels labels, Pen pen) {
    this.model = model;
    this.plan = model.source().plan();
    this.placement = model.source().placement();
    this.ground = GroundSurface.of(plan);
    this.figures = new Figures(model.options().units());
    this.frame = frame;
    this.legs = legs;
    this.labels = labels;
    this.pen = pen;
  }

  /** Packs spans into rows no longer than asked [m], in order. */
  static List<List<Leg>> rows(Placement placement, double longest) {
    List<List<Leg>> rows = new ArrayList<>();
    List<Leg> row = new ArrayList<>();
    double at = 0;
    for (Placement.Span span : placement.spans()) {
      if (span.points().size() < 2) {
        continue;
      }
      Point a = span.points().get(0).onPlan();
      double length = a.distance(span.points().get(span.points().size() - 1).onPlan());
      boolean joined = !row.isEmpty() && row.get(row.size() - 1).span().to() == span.from();
      if (!row.isEmpty() && (!joined || at + length + 2 * BEYOND > longest)) {
        rows.add(row);
        row = new ArrayList<>();
        at = 0;
      }
      row.add(new Leg(span, at, length));
      at += length;
    }
    if (!row.isEmpty()) {
      rows.add(row);
    }
    return rows;
  }

  void draw() {
    axis();
    SideObstacles standing = new SideObstacles(model, frame, labels, pen);
    for (int i = 0; i < legs.size(); i++) {
      Leg leg = legs.get(i);
      double from = leg.start() - (i == 0 ? BEYOND : 0);
      double to = leg.start() + leg.length() + (i == legs.size() - 1 ? BEYOND : 0);
      standing.draw(leg, from, to);
      groundLine(leg, from, to);
    }
    holders();
    legs.forEach(this::ropesAndLine);
    legs.forEach(this::wire);
    levels();
  }

  private void axis() {
    double unit = figures.axisUnit();
    double step = unit * (frame.mm(5 * unit) >= 9 ? 5 : frame.mm(10 * unit) >= 9 ? 10 : 50);
    double top = frame.metres(frame.height()) + frame.y0();
    for (double z = Math.ceil(frame.y0() / step) * step; z < top; z += step) {
      double y = frame.y(z);
      pen.line(frame.left() - 1.5, y, frame.left(), y, 0.25, 1);
      pen.line(frame.left(), y, frame.left() + frame.width(), y, 0.1, 0.2);
      pen.text(frame.left() - 2.2, y + 0.9, figures.axis(z), 7, Ink.Anchor.END, false, 0.8);
    }
  }

  private void groundLine(Leg leg, double from, double to) {
    List<double[]> line = new ArrayList<>();
    int steps = Math.max(2, (int) Math.ceil((to - from) / Math.max(0.5, frame.metres(2))));
    for (int i = 0; i <= steps; i++) {
      double s = from + (to - from) * i / steps;
      line.add(new double[] {frame.x(s), frame.y(ground.heightAt(leg.at(s)))});
    }
    List<Ink.Stroke> earth = new ArrayList<>();
    for (double[] p : line) {
      earth.add(
          Pen.stroke(
              List.of(new double[] {p[0], p[1]}, new double[] {p[0] - 1.2, p[1] + 1.4}), false));
    }
    pen.shape(earth, 0.13, 0.6, Ink.NONE);
    pen.path(line, 0.5, 1);
    labels.avoid(line, 3);
  }

  /** What holds each attachment, from the ground up. */
  private void holders() {
    Leg last = legs.get(legs.size() - 1);
    legs.forEach(leg -> holder(leg, leg.span().from(), leg.start()));
    holder(last, last.span().to(), last.start() + last.length());
  }

  private void holder(Leg leg, int index, double s) {
    Placement.Attachment held = placement.attachments().get(index);
    double foot = ground.heightAt(held.at().onPlan());
    double x = frame.x(s);
    Support support =
        plan.supports().stream().filter(p -> p.id().equals(held.on())).findFirst().orElse(null);
    boolean tree = support != null && support.kind() == Support.Kind.TREE;
    boolean stands =
        support != null
            && (support.kind() == Support.Kind.MAST || support.kind() == Support.Kind.POLE);
    for (Placement.NewMast mast : placement.masts()) {
      if (!mast.zone().equals(held.on())
          || mast.foot().onPlan().distance(held.at().onPlan()) > 0.5) {
        continue;
      }
      stands = true;
      foot = mast.foot().z();
      for (Place guy : mast.guyFeet()) {
        double along = leg.along(guy.onPlan());
        pen.line(x, frame.y(mast.top().z()), frame.x(along), frame.y(guy.z()), 0.25, 1, 1.8, 0.9);
      }
    }
    if (stands) {
      pen.line(x, frame.y(foot), x, frame.y(held.at().z()), 0.7, 1);
    } else if (!tree) {
      pen.circle(x, frame.y(held.at().z()), 0.8, 0.3, 1, 0);
    }
  }

  private void ropesAndLine(Leg leg) {
    for (Placement.RopeRun rope : placement.ropes()) {
      boolean fall = rope.what().equals("fall") || rope.what().equals("halyard");
      boolean here = rope.attachment() == leg.span().from() || rope.attachment() == leg.span().to();
      if (!fall || !here || rope.points().size() < 2) {
        continue;
      }
      List<double[]> path = new ArrayList<>();
      for (Place p : rope.points()) {
        double aside = path.isEmpty() ? 0 : 0.9;
        path.add(new double[] {frame.x(leg.along(p.onPlan())) + aside, frame.y(p.z())});
      }
      pen.path(path, 0.3, 1, 1.8, 0.9);
      if (rope.what().equals("fall")) {
        double[] end = path.get(path.size() - 1);
        pen.rect(end[0] - 1, end[1], 2, 2.4, 0.3, 1, 0);
        Double kilograms = placement.attachments().get(rope.attachment()).kilograms();
        if (kilograms != null) {
          labels.ask(
              30,
              Labels.around(
                  end[0], end[1] + 1.2, Figures.kilograms(kilograms) + " kg", 7.5, true, 1.6));
        }
      }
    }
    Place feed = placement.feed().at();
    double s = leg.along(feed.onPlan());
    boolean first = s >= leg.start() - 0.3 && s < leg.start() + leg.length() - 0.3;
    boolean last = leg == legs.get(legs.size() - 1) && s <= leg.start() + leg.length() + 0.3;
    if (Math.abs(leg.aside(feed.onPlan())) < 1 && (first || last)) {
      List<double[]> path = new ArrayList<>();
      for (Place p : placement.feed().path()) {
        path.add(new double[] {frame.x(leg.along(p.onPlan())), frame.y(p.z())});
      }
      RiggingInk.twin(pen, path);
    }
  }

  private void wire(Leg leg) {
    List<double[]> run = new ArrayList<>();
    for (Place p : leg.span().points()) {
      run.add(new double[] {frame.x(leg.along(p.onPlan())), frame.y(p.z())});
    }
    pen.path(run, 0.35, 1, 1.8, 0.9);
    for (Placement.Conductor conductor : placement.conductors()) {
      List<double[]> wire = new ArrayList<>();
      for (Place p : conductor.points()) {
        double s = leg.along(p.onPlan());
        boolean on =
            Math.abs(leg.aside(p.onPlan())) < 0.6
                && s > leg.start() - 0.3
                && s < leg.start() + leg.length() + 0.3;
        if (on) {
          wire.add(new double[] {frame.x(s), frame.y(p.z())});
        }
      }
      pen.path(wire, 0.8, 1);
    }
    labels.avoid(run, 8);
    Place feed = placement.feed().at();
    double s = leg.along(feed.onPlan());
    if (Math.abs(leg.aside(feed.onPlan())) < 0.6
        && s > leg.start() - 0.3
        && s < leg.start() + leg.length() + 0.3) {
      pen.rect(frame.x(s) - 1, frame.y(feed.z()) - 1, 2, 2, 0.4, 0, 1);
    }
    dimensions(leg, run);
    nearest(leg);
  }

  /** The distance to whatever stands nearest to this span, with its name. */
  private void nearest(Leg leg) {
    placement.clearances().stream()
        .filter(c -> c.at() != null && c.toAt() != null && !c.to().equals("boundary"))
        .filter(c -> OverheadList.regime(c) == OverheadList.Regime.AS_IT_HANGS)
        .filter(c -> c.what() != null && c.what().startsWith("wire"))
        .filter(c -> Math.abs(leg.aside(c.at().onPlan())) < 2)
        .filter(c -> leg.along(c.at().onPlan()) >= leg.start() - 0.5)
        .filter(c -> leg.along(c.at().onPlan()) <= leg.start() + leg.length() + 0.5)
        .min(Comparator.comparingDouble(Clearance::distance))
        .ifPresent(
            c ->
                labels.ask(
                    24,
                    Dimensions.between(
                        new double[] {frame.x(leg.along(c.at().onPlan())), frame.y(c.at().z())},
                        new double[] {frame.x(leg.along(c.toAt().onPlan())), frame.y(c.toAt().z())},
                        figures.found(c.distance()) + " to " + model.source().name(c.to()))));
  }

  private void dimensions(Leg leg, List<double[]> run) {
    Place middle = HangingList.middle(leg.span().points());
    double s = leg.along(middle.onPlan());
    double low = ground.heightAt(leg.at(s));
    double[] up = {frame.x(s), frame.y(middle.z())};
    double[] down = {frame.x(s), frame.y(low)};
    labels.ask(
        22, Dimensions.beside(up, down, figures.height(middle.z() - low), 0.01, 4, -4, 8, -8));
    model.sags().stream()
        .filter(g -> g.span().equals((leg.span().from() + 1) + "–" + (leg.span().to() + 1)))
        .findFirst()
        .ifPresent(
            g ->
                labels.ask(
                    20,
                    Labels.around(
                        up[0],
                        up[1],
                        "sag " + figures.length(g.middle()),
                        SurveyInk.BODY,
                        true,
                        2)));
  }

  /** Point numbers, heights and level distances along the ground. */
  private void levels() {
    double y = frame.top() + frame.height() - 2.4;
    List<double[]> ends = new ArrayList<>();
    for (int i = 0; i < legs.size(); i++) {
      Leg leg = legs.get(i);
      if (i == 0) {
        ends.add(new double[] {leg.start(), leg.span().from()});
      }
      ends.add(new double[] {leg.start() + leg.length(), leg.span().to()});
      double a = frame.x(leg.start()) + 2.6;
      double b = frame.x(leg.start() + leg.length()) - 2.6;
      String text = figures.length(leg.length());
      if (b - a > Letters.width(text, 8, true, true) + 4) {
        pen.line(a, y, b, y, 0.2, 1);
        pen.add(
            new Ink.Lettering(
                (a + b) / 2, y + 1, text, 8, Ink.Anchor.MIDDLE, true, true, 0, 0.8, 1));
      }
    }
    double last = Double.NEGATIVE_INFINITY;
    for (double[] end : ends) {
      Placement.Attachment held = placement.attachments().get((int) end[1]);
      double x = Math.max(frame.x(end[0]), last + 4.6);
      Symbols.number(pen, x, y, String.valueOf((int) end[1] + 1));
      last = x;
      labels.ask(
          5,
          Labels.around(
              frame.x(end[0]),
              frame.y(held.at().z()),
              figures.height(held.aboveGround()),
              9,
              true,
              1.4));
    }
  }
}
