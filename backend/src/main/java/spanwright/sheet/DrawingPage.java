package spanwright.sheet;

import java.util.ArrayList;
import java.util.List;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Envelope;
import org.locationtech.jts.geom.Polygon;
import spanwright.assess.Placement;
import spanwright.clearance.Clearance;
import spanwright.clearance.State;
import spanwright.plan.GroundSurface;
import spanwright.plan.Place;
import spanwright.plan.Plan;
import spanwright.plan.Point;

/** Lays out the site drawing: plan above, side view below at the same scale, title block. */
final class DrawingPage {
  /** Scales that a scale rule carries, as n of 1 : n; the last few are for very large plots. */
  static final int[] SCALES = {
    50, 75, 100, 125, 200, 250, 300, 400, 500, 1000, 2000, 2500, 5000, 10_000, 25_000, 50_000,
    100_000, 1_000_000
  };

  /** Largest denominator at which the whole boundary is shown; beyond it only where work is. */
  private static final int WHOLE = 500;

  private static final double TOP = 12;
  private static final double RULER = 7;
  private static final double CAPTION = 8;
  private static final double SIDE_FOOT = 6.5;

  private final SheetModel model;
  private final Plan plan;
  private final Placement placement;
  private final GroundSurface ground;
  private final Figures figures;
  private final double left;
  private final double width;
  private final double titleTop;
  private final List<Polygon> lettering = new ArrayList<>();
  private boolean partly;

  DrawingPage(SheetModel model) {
    this.model = model;
    this.plan = model.source().plan();
    this.placement = model.source().placement();
    this.figures = new Figures(model.options().units());
    this.ground = GroundSurface.of(plan);
    this.left = ListPages.MARGIN + RULER;
    this.width = model.options().paper().width() - ListPages.MARGIN - left;
    this.titleTop = model.options().paper().height() - ListPages.FOOT - 3 - TitleBlock.HEIGHT;
  }

  /** Boxes of all lettering that found room, for whoever wants to check that none overlap. */
  List<Polygon> lettering() {
    return lettering;
  }

  Pen draw(int sheet, int sheets) {
    Pen pen = new Pen();
    int scale = scale();
    Envelope extent = extent(partly);
    List<List<SideInk.Leg>> rows = SideInk.rows(placement, metres(width, scale));
    double sideHeight = sideHeight(scale);
    double planHeight = titleTop - TOP - RULER - 3 - rows.size() * (sideHeight + CAPTION) - 2;
    Frame frame =
        new Frame(
            left,
            TOP,
            width,
            planHeight,
            extent.centre().x - metres(width, scale) / 2,
            extent.centre().y - metres(planHeight, scale) / 2,
            scale);
    plan(pen, frame);
    double y = TOP + planHeight + RULER + 3;
    for (int i = 0; i < rows.size(); i++) {
      side(pen, rows.get(i), y + CAPTION, sideHeight, scale, i);
      y += sideHeight + CAPTION;
    }
    new TitleBlock(model, scale, partly)
        .draw(pen, ListPages.MARGIN, titleTop, width + RULER, sheet, sheets);
    return pen;
  }

  private static double metres(double mm, int scale) {
    return mm * scale / 1000;
  }

  /** The largest scale at which plan and side view fit the page. */
  int scale() {
    for (int scale : SCALES) {
      partly = scale > WHOLE;
      Envelope extent = extent(partly);
      double rows = SideInk.rows(placement, metres(width, scale)).size();
      double room = titleTop - TOP - RULER - 3 - rows * (sideHeight(scale) + CAPTION) - 2;
      boolean sideFits =
          placement.spans().stream()
              .allMatch(
                  s ->
                      s.points().size() < 2
                          || level(s) + 2 * SideInk.BEYOND <= metres(width, scale));
      if (sideFits
          && extent.getWidth() <= metres(width, scale)
          && extent.getHeight() <= metres(room, scale)) {
        return scale;
      }
    }
    throw new IllegalArgumentException(
        "The plot is too large to draw on "
            + model.options().paper().label()
            + ": it must fit at 1 : 1,000,000.");
  }

  private static double level(Placement.Span span) {
    return span.points()
        .get(0)
        .onPlan()
        .distance(span.points().get(span.points().size() - 1).onPlan());
  }

  private double lowest() {
    double low = Double.POSITIVE_INFINITY;
    for (Placement.Span span : placement.spans()) {
      for (Place p : span.points()) {
        low = Math.min(low, ground.heightAt(p.onPlan()));
      }
    }
    return Double.isFinite(low) ? low : 0;
  }

  private double sideHeight(int scale) {
    double high = Double.NEGATIVE_INFINITY;
    for (Placement.Attachment held : placement.attachments()) {
      high = Math.max(high, held.at().z());
    }
    return (high + SideInk.ABOVE - lowest()) * 1000 / scale + 4 + SIDE_FOOT;
  }

  /** What the plan must show: the plot with some air, or only where there is work. */
  private Envelope extent(boolean workOnly) {
    Envelope box = new Envelope();
    if (!workOnly) {
      plan.boundary().forEach(p -> add(box, p));
    }
    placement.attachments().forEach(a -> add(box, a.at().onPlan()));
    placement.conductors().forEach(c -> c.points().forEach(p -> add(box, p.onPlan())));
    placement.feed().path().forEach(p -> add(box, p.onPlan()));
    placement.masts().forEach(m -> m.guyFeet().forEach(p -> add(box, p.onPlan())));
    model.setOut().points().forEach(m -> add(box, m.at().onPlan()));
    add(box, model.setOut().a().at().onPlan());
    add(box, model.setOut().b().at().onPlan());
    if (model.setOut().c() != null) {
      add(box, model.setOut().c().at().onPlan());
    }
    for (Clearance c : placement.clearances()) {
      if (c.state() != State.CLEAR && c.toAt() != null) {
        Coordinate to = new Coordinate(c.toAt().x(), c.toAt().y());
        if (box.distance(new Envelope(to)) < 8) {
          box.expandToInclude(to);
        }
      }
    }
    box.expandBy(Math.max(1, 0.04 * Math.max(box.getWidth(), box.getHeight())));
    return box;
  }

  private static void add(Envelope box, Point p) {
    box.expandToInclude(p.x(), p.y());
  }

  private void plan(Pen pen, Frame frame) {
    Pen inside = new Pen();
    Labels labels = new Labels(frame);
    SurveyInk survey = new SurveyInk(model, frame, labels, inside);
    survey.draw();
    new RiggingInk(model, frame, labels, inside).draw();
    labels.settle(inside);
    lettering.addAll(labels.placed());
    window(pen, frame, inside);
    pen.rect(frame.left(), frame.top(), frame.width(), frame.height(), 0.5, 1, Ink.NONE);
    rulers(pen, frame, survey.gridStep());
  }

  private static void window(Pen pen, Frame frame, Pen inside) {
    pen.add(
        new Ink.Window(frame.left(), frame.top(), frame.width(), frame.height(), inside.inks()));
  }

  /** Coordinates of the plan, outside the frame on the left and at the foot, in its units. */
  private void rulers(Pen pen, Frame frame, double step) {
    double foot = frame.top() + frame.height();
    for (double x = Math.ceil(frame.x0() / step) * step;
        frame.x(x) <= frame.left() + frame.width();
        x += step) {
      pen.line(frame.x(x), foot, frame.x(x), foot + 1.2, 0.25, 1);
      pen.text(frame.x(x), foot + 3.8, figures.axis(x), 7, Ink.Anchor.MIDDLE, false, 0.8);
    }
    for (double y = Math.ceil(frame.y0() / step) * step; frame.y(y) >= frame.top(); y += step) {
      pen.line(frame.left() - 1.2, frame.y(y), frame.left(), frame.y(y), 0.25, 1);
      pen.text(
          frame.left() - 1.8, frame.y(y) + 0.9, figures.axis(y), 7, Ink.Anchor.END, false, 0.8);
    }
  }

  private void side(
      Pen pen, List<SideInk.Leg> legs, double top, double height, int scale, int row) {
    SideInk.Leg last = legs.get(legs.size() - 1);
    double length = last.start() + last.length();
    double base = lowest() - metres(SIDE_FOOT, scale);
    Frame frame =
        new Frame(left, top, width, height, length / 2 - metres(width, scale) / 2, base, scale);
    Pen inside = new Pen();
    Labels labels = new Labels(frame);
    labels.block(
        Labels.box(left + width / 2, top + height - SIDE_FOOT / 2, width, SIDE_FOOT - 1.4, 0));
    new SideInk(model, frame, legs, labels, inside).draw();
    labels.settle(inside);
    lettering.addAll(labels.placed());
    pen.text(
        left,
        top - 2.2,
        row == 0 ? "Along the wire" : "Along the wire, continued",
        10,
        Ink.Anchor.START,
        true);
    pen.text(
        left + width,
        top - 2.2,
        "1 : "
            + Figures.whole(scale)
            + ", heights true, "
            + (figures.unit().equals("m") ? "metres" : "feet")
            + " from the plan's zero at the edge,"
            + " above the ground at the points",
        7.5,
        Ink.Anchor.END,
        false,
        0.8);
    // heights stand outside the window
    window(pen, new Frame(left - RULER, top, width + RULER, height, 0, 0, scale), inside);
  }
}
