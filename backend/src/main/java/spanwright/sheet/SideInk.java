package spanwright.sheet;

import java.util.ArrayList;
import java.util.List;
import spanwright.assess.Placement;
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

  /** A place of a run this near to a wire is on it [m]. */
  private static final double ON_WIRE = 0.06;

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
    new SideFigures(model, frame, legs, labels, pen).draw();
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
      run.add(at(leg, p));
    }
    pen.path(run, 0.35, 1, 1.8, 0.9);
    heavy(leg);
    placement.conductors().forEach(c -> freeEnds(leg, c.points()));
    labels.avoid(run, 8);
    Place feed = placement.feed().at();
    double s = leg.along(feed.onPlan());
    boolean here = leg.span().points().stream().anyMatch(p -> p.distance(feed) < 0.6);
    if (here && s > leg.start() - 0.3 && s < leg.start() + leg.length() + 0.3) {
      pen.rect(frame.x(s) - 1, frame.y(feed.z()) - 1, 2, 2, 0.4, 0, 1);
    }
  }

  private double[] at(Leg leg, Place p) {
    return new double[] {frame.x(leg.along(p.onPlan())), frame.y(p.z())};
  }

  /** What of a span's run is wire: the rest of it is rope. */
  private void heavy(Leg leg) {
    List<double[]> wire = new ArrayList<>();
    for (Place p : leg.span().points()) {
      if (placement.conductors().stream().anyMatch(c -> on(c.points(), p))) {
        wire.add(at(leg, p));
      } else {
        pen.path(wire, 0.8, 1);
        wire = new ArrayList<>();
      }
    }
    pen.path(wire, 0.8, 1);
  }

  /** Whether a place lies on a wire, which is told at most by sixty points. */
  private static boolean on(List<Place> wire, Place p) {
    for (int i = 1; i < wire.size(); i++) {
      Place a = wire.get(i - 1);
      Place b = wire.get(i);
      double dx = b.x() - a.x();
      double dy = b.y() - a.y();
      double dz = b.z() - a.z();
      double square = dx * dx + dy * dy + dz * dz;
      double t = (p.x() - a.x()) * dx + (p.y() - a.y()) * dy + (p.z() - a.z()) * dz;
      double share = square < 1e-12 ? 0 : Math.max(0, Math.min(1, t / square));
      Place foot = new Place(a.x() + share * dx, a.y() + share * dy, a.z() + share * dz);
      if (foot.distance(p) < ON_WIRE) {
        return true;
      }
    }
    return false;
  }

  /** Wire that hangs down beyond what holds it. */
  private void freeEnds(Leg leg, List<Place> wire) {
    for (List<Place> run : List.of(wire, WireList.back(wire))) {
      double free = WireList.free(run);
      Place top = WireList.at(run, Job.length(run) - free);
      if (free > 0 && on(leg.span().points(), top)) {
        List<double[]> down = new ArrayList<>();
        WireList.part(run, 1 - free / Job.length(run), 1).forEach(p -> down.add(at(leg, p)));
        pen.path(down, 0.8, 1);
        labels.avoid(down, 8);
      }
    }
  }
}
