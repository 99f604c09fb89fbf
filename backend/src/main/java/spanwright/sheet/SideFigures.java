package spanwright.sheet;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import spanwright.assess.Placement;
import spanwright.clearance.Clearance;
import spanwright.plan.GroundSurface;
import spanwright.plan.Place;

/** The figures of a side view: headroom, sag, the nearest obstacle, point numbers, lengths. */
final class SideFigures {
  private final SheetModel model;
  private final Placement placement;
  private final GroundSurface ground;
  private final Figures figures;
  private final Frame frame;
  private final List<SideInk.Leg> legs;
  private final Labels labels;
  private final Pen pen;

  SideFigures(SheetModel model, Frame frame, List<SideInk.Leg> legs, Labels labels, Pen pen) {
    this.model = model;
    this.placement = model.source().placement();
    this.ground = GroundSurface.of(model.source().plan());
    this.figures = new Figures(model.options().units());
    this.frame = frame;
    this.legs = legs;
    this.labels = labels;
    this.pen = pen;
  }

  void draw() {
    for (SideInk.Leg leg : legs) {
      dimensions(leg);
      nearest(leg);
    }
    levels();
  }

  /** The distance to whatever stands nearest to this span, with its name. */
  private void nearest(SideInk.Leg leg) {
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

  private void dimensions(SideInk.Leg leg) {
    // a wire that goes straight up has neither sag nor headroom
    if (leg.length() < 0.5) {
      return;
    }
    Place middle = HangingList.middle(leg.span().points());
    double s = leg.along(middle.onPlan());
    double low = ground.heightAt(leg.at(s));
    double[] up = {frame.x(s), frame.y(middle.z())};
    double[] down = {frame.x(s), frame.y(low)};
    String headroom = figures.height(middle.z() - low);
    List<Labels.Spot> spots =
        new ArrayList<>(Dimensions.beside(up, down, headroom, 0.01, 4, -4, 8, -8));
    // where the figure does not fit into its line
    if (spots.isEmpty()) {
      spots.addAll(Dimensions.between(up, down, headroom));
    }
    labels.ask(18, spots);
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
      SideInk.Leg leg = legs.get(i);
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
