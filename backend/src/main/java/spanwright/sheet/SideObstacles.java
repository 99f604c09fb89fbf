package spanwright.sheet;

import java.util.ArrayList;
import java.util.List;
import spanwright.plan.Building;
import spanwright.plan.Canopy;
import spanwright.plan.GroundSurface;
import spanwright.plan.OverheadLine;
import spanwright.plan.Place;
import spanwright.plan.Plan;
import spanwright.plan.Point;
import spanwright.rigging.Roof;

/** Draws what stands in the plane of a span: crowns, buildings, overhead lines that cross it. */
final class SideObstacles {
  private final SheetModel model;
  private final Plan plan;
  private final GroundSurface ground;
  private final Figures figures;
  private final Frame frame;
  private final Labels labels;
  private final Pen pen;

  SideObstacles(SheetModel model, Frame frame, Labels labels, Pen pen) {
    this.model = model;
    this.plan = model.source().plan();
    this.ground = GroundSurface.of(plan);
    this.figures = new Figures(model.options().units());
    this.frame = frame;
    this.labels = labels;
    this.pen = pen;
  }

  /** Everything in the plane of a span, between two places along its row. */
  void draw(SideInk.Leg leg, double from, double to) {
    plan.trees().forEach(t -> crown(leg, t.at(), t.canopy(), from, to));
    plan.supports().forEach(s -> crown(leg, s.at(), s.canopy(), from, to));
    plan.buildings().forEach(b -> building(leg, b, from, to));
    plan.overheadLines().forEach(l -> overhead(leg, l, from, to));
  }

  /** A crown cut by the plane is solid, one within two metres of it dashed. */
  private void crown(SideInk.Leg leg, Point at, Canopy canopy, double from, double to) {
    if (canopy == null) {
      return;
    }
    double s = leg.along(at);
    double aside = Math.abs(leg.aside(at));
    double near = aside - canopy.radius();
    if (near > 2 || s < from - canopy.radius() || s > to + canopy.radius()) {
      return;
    }
    double half =
        near < 0
            ? Math.sqrt(canopy.radius() * canopy.radius() - aside * aside)
            : canopy.radius() * 0.8;
    double base = ground.heightAt(at);
    double middle = base + (canopy.from() + canopy.to()) / 2;
    double tall = frame.mm(canopy.to() - canopy.from()) / 2;
    Ink.Stroke round = Pen.round(frame.x(s), frame.y(middle), frame.mm(half), tall);
    if (near < 0) {
      pen.shape(List.of(round), 0.25, 0.6, 0.06);
      double foot = frame.y(base);
      double crown = frame.y(base + canopy.from());
      pen.line(frame.x(s) - 0.4, foot, frame.x(s) - 0.4, crown, 0.2, 0.6);
      pen.line(frame.x(s) + 0.4, foot, frame.x(s) + 0.4, crown, 0.2, 0.6);
    } else {
      pen.shape(List.of(round), 0.2, 0.55, Ink.NONE, 1.2, 0.8);
    }
  }

  private void building(SideInk.Leg leg, Building building, double from, double to) {
    if (building.footprint().size() < 3) {
      return;
    }
    Roof roof = Roof.of(building, ground);
    List<double[]> run = new ArrayList<>();
    double step = Math.max(0.05, (to - from) / 1500);
    for (double s = from; s <= to + step / 2; s += step) {
      Point at = leg.at(s);
      if (roof.covers(at.x(), at.y())) {
        run.add(new double[] {s, roof.heightAt(at.x(), at.y())});
      } else if (!run.isEmpty()) {
        section(leg, building, run);
        run.clear();
      }
    }
    if (!run.isEmpty()) {
      section(leg, building, run);
    }
  }

  private void section(SideInk.Leg leg, Building building, List<double[]> run) {
    List<double[]> outline = new ArrayList<>();
    double first = run.get(0)[0];
    double last = run.get(run.size() - 1)[0];
    if (last - first < 0.06) {
      return;
    }
    outline.add(new double[] {frame.x(first), frame.y(ground.heightAt(leg.at(first)))});
    for (double[] p : run) {
      outline.add(new double[] {frame.x(p[0]), frame.y(p[1])});
    }
    outline.add(new double[] {frame.x(last), frame.y(ground.heightAt(leg.at(last)))});
    pen.area(outline, 0, Ink.NONE, 0);
    Hatching.draw(pen, Hatching.area(outline).buffer(0), 1.8, true, 0.13, 0.55);
    pen.area(outline, 0.4, 1, Ink.NONE);
    double x = frame.x((first + last) / 2);
    double y = frame.y(ground.heightAt(leg.at((first + last) / 2)) + building.eaves() / 2);
    labels.ask(
        60,
        List.of(
            Labels.text(x, y, model.source().name(building.id()), SurveyInk.SMALL, false, 0, 0),
            Labels.text(
                x, y - 3.5, model.source().name(building.id()), SurveyInk.SMALL, false, 0, 1),
            Labels.text(
                x, y + 3.5, model.source().name(building.id()), SurveyInk.SMALL, false, 0, 1)));
  }

  /** Where an overhead line passes through the plane of a span, with its kept distance. */
  private void overhead(SideInk.Leg leg, OverheadLine line, double from, double to) {
    Double keep =
        model.overhead().lines().stream()
            .filter(l -> l.id().equals(line.id()))
            .findFirst()
            .map(OverheadParts.Line::keep)
            .orElse(null);
    for (int i = 1; i < line.path().size(); i++) {
      Place p = ground.raise(line.path().get(i - 1));
      Place q = ground.raise(line.path().get(i));
      double a = leg.aside(p.onPlan());
      double b = leg.aside(q.onPlan());
      if (leg.length() < 1e-6 || (a > 0) == (b > 0)) {
        continue;
      }
      double t = a / (a - b);
      double s = leg.along(p.onPlan()) * (1 - t) + leg.along(q.onPlan()) * t;
      double z = p.z() * (1 - t) + q.z() * t;
      if (s < from || s > to) {
        continue;
      }
      double x = frame.x(s);
      double y = frame.y(z);
      if (keep != null) {
        pen.circle(x, y, frame.mm(keep), 0.2, 0.85, Ink.NONE, 2, 0.9);
      }
      pen.path(
          List.of(
              new double[] {x - 0.9, y - 1.7},
              new double[] {x + 0.7, y - 0.5},
              new double[] {x - 0.7, y + 0.5},
              new double[] {x + 0.9, y + 1.7}),
          0.5,
          1);
      String text =
          model.source().name(line.id()) + " " + figures.height(z - ground.heightAt(leg.at(s)));
      labels.ask(10, Labels.around(x, y, text, SurveyInk.BODY, true, 1.8));
    }
  }
}
