package spanwright.sheet;

import java.util.ArrayList;
import java.util.List;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Envelope;
import org.locationtech.jts.geom.Polygon;
import spanwright.assess.Placement;
import spanwright.clearance.Clearance;
import spanwright.clearance.State;
import spanwright.plan.Plan;
import spanwright.plan.Point;

/** Lays out the plan of the site on a page of its own, with a title block. */
final class DrawingPage {
  /** Scales that a scale rule carries, as n of 1 : n; the last few are for very large plots. */
  static final int[] SCALES = {
    50, 75, 100, 125, 150, 200, 250, 300, 400, 500, 1000, 2000, 2500, 5000, 10_000, 25_000, 50_000,
    100_000, 1_000_000
  };

  /** Largest denominator at which the whole boundary is shown; beyond it only where work is. */
  private static final int WHOLE = 500;

  static final double TOP = 12;

  /** Width kept for the figures outside a frame [mm]. */
  static final double RULER = 7;

  private final SheetModel model;
  private final Plan plan;
  private final Placement placement;
  private final Figures figures;
  private final double left;
  private final double width;
  private final List<Polygon> lettering = new ArrayList<>();
  private boolean partly;

  DrawingPage(SheetModel model) {
    this.model = model;
    this.plan = model.source().plan();
    this.placement = model.source().placement();
    this.figures = new Figures(model.options().units());
    this.left = ListPages.MARGIN + RULER;
    this.width = model.options().paper().width() - ListPages.MARGIN - left;
  }

  /** Boxes of all lettering that found room, for whoever wants to check that none overlap. */
  List<Polygon> lettering() {
    return lettering;
  }

  Pen draw(int sheet, int sheets) {
    Pen pen = new Pen();
    int scale = scale();
    Envelope extent = extent(partly);
    double height = room();
    Frame frame =
        new Frame(
            left,
            TOP,
            width,
            height,
            extent.centre().x - metres(width, scale) / 2,
            extent.centre().y - metres(height, scale) / 2,
            scale);
    plan(pen, frame);
    new TitleBlock(model, scale, partly ? "Plan, part of the plot" : "Plan", true)
        .draw(pen, ListPages.MARGIN, titleTop(model), width + RULER, sheet, sheets);
    return pen;
  }

  static double metres(double mm, int scale) {
    return mm * scale / 1000;
  }

  /** Where the title block begins [mm]. */
  static double titleTop(SheetModel model) {
    return model.options().paper().height() - ListPages.FOOT - 3 - TitleBlock.HEIGHT;
  }

  private double room() {
    return titleTop(model) - TOP - RULER - 2;
  }

  /** The largest scale at which the plan fits the page. */
  int scale() {
    for (int scale : SCALES) {
      partly = scale > WHOLE;
      Envelope extent = extent(partly);
      if (extent.getWidth() <= metres(width, scale)
          && extent.getHeight() <= metres(room(), scale)) {
        return scale;
      }
    }
    throw tooLarge(model);
  }

  static IllegalArgumentException tooLarge(SheetModel model) {
    return new IllegalArgumentException(
        "The plot is too large to draw on "
            + model.options().paper().label()
            + ": it must fit at 1 : 1,000,000.");
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
    if (model.setOut().proposed() != null) {
      add(box, model.setOut().proposed().known().at().onPlan());
    }
    for (Clearance c : placement.clearances()) {
      if (c.state() != State.CLEAR && c.toAt() != null) {
        Coordinate to = new Coordinate(c.toAt().x(), c.toAt().y());
        if (box.distance(new Envelope(to)) < 8) {
          box.expandToInclude(to);
        }
      }
    }
    box.expandBy(Math.max(1, 0.025 * Math.max(box.getWidth(), box.getHeight())));
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

  static void window(Pen pen, Frame frame, Pen inside) {
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
}
