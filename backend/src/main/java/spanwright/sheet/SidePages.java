package spanwright.sheet;

import java.util.ArrayList;
import java.util.List;
import org.locationtech.jts.geom.Polygon;
import spanwright.assess.Placement;
import spanwright.plan.GroundSurface;
import spanwright.plan.Place;

/**
 * Lays out the side views: spans that go on from each other unfolded in a row, rows one under
 * another on pages of their own, all at one scale, heights true.
 */
final class SidePages {
  private static final double CAPTION = 8;

  /** Strip under the ground for point numbers and lengths [mm]. */
  private static final double FOOT = 6.5;

  /** Rather a second page than a scale coarser than this. */
  private static final int FINE = 200;

  private final SheetModel model;
  private final Placement placement;
  private final GroundSurface ground;
  private final Figures figures;
  private final double left;
  private final double width;
  private final double room;
  private final List<List<Polygon>> lettering = new ArrayList<>();

  SidePages(SheetModel model) {
    this.model = model;
    this.placement = model.source().placement();
    this.ground = GroundSurface.of(model.source().plan());
    this.figures = new Figures(model.options().units());
    this.left = ListPages.MARGIN + DrawingPage.RULER;
    this.width = model.options().paper().width() - ListPages.MARGIN - left;
    this.room = DrawingPage.titleTop(model) - DrawingPage.TOP - 2;
  }

  /**
   * A scale, and the rows that go on each page.
   *
   * @param scale n of 1 : n
   * @param pages of rows
   */
  record Plan(int scale, List<List<List<SideInk.Leg>>> pages) {}

  /** Boxes of the lettering of each page, for whoever wants to check that none overlap. */
  List<List<Polygon>> lettering() {
    return lettering;
  }

  /** The largest scale at which all rows fit one page; rather more pages than a coarse one. */
  Plan plan() {
    Plan several = null;
    for (int scale : DrawingPage.SCALES) {
      Plan plan = packed(scale);
      if (plan == null) {
        continue;
      }
      if (plan.pages().size() <= 1 && (several == null || scale <= FINE)) {
        return plan;
      }
      several = several == null ? plan : several;
      if (scale > FINE) {
        return several;
      }
    }
    throw DrawingPage.tooLarge(model);
  }

  /** Rows on pages at a scale, or null when a span is too long or too high for it. */
  private Plan packed(int scale) {
    double longest = DrawingPage.metres(width, scale);
    List<List<List<SideInk.Leg>>> pages = new ArrayList<>();
    double used = room;
    for (List<SideInk.Leg> row : SideInk.rows(placement, longest)) {
      SideInk.Leg last = row.get(row.size() - 1);
      double height = height(row, scale) + CAPTION;
      if (height > room || last.start() + last.length() + 2 * SideInk.BEYOND > longest) {
        return null;
      }
      if (used + height > room) {
        pages.add(new ArrayList<>());
        used = 0;
      }
      pages.get(pages.size() - 1).add(row);
      used += height;
    }
    return new Plan(scale, pages);
  }

  List<Pen> draw(int firstSheet, int sheets) {
    Plan plan = plan();
    List<Pen> pens = new ArrayList<>();
    for (List<List<SideInk.Leg>> page : plan.pages()) {
      Pen pen = new Pen();
      List<Polygon> placed = new ArrayList<>();
      double taken = 0;
      for (List<SideInk.Leg> row : page) {
        taken += height(row, plan.scale()) + CAPTION;
      }
      double air = Math.min(12, (room - taken) / (page.size() + 1));
      double y = DrawingPage.TOP;
      for (List<SideInk.Leg> row : page) {
        row(pen, row, y + CAPTION, plan.scale(), placed);
        y += height(row, plan.scale()) + CAPTION + air;
      }
      lettering.add(placed);
      int sheet = firstSheet + pens.size();
      new TitleBlock(model, plan.scale(), "Side views along the wire", false)
          .draw(
              pen,
              ListPages.MARGIN,
              DrawingPage.titleTop(model),
              width + DrawingPage.RULER,
              sheet,
              sheets);
      pens.add(pen);
    }
    return pens;
  }

  private double lowest(List<SideInk.Leg> row) {
    double low = Double.POSITIVE_INFINITY;
    for (SideInk.Leg leg : row) {
      for (Place p : leg.span().points()) {
        low = Math.min(low, Math.min(p.z(), ground.heightAt(p.onPlan())));
      }
    }
    return low;
  }

  private double height(List<SideInk.Leg> row, int scale) {
    double high = Double.NEGATIVE_INFINITY;
    for (SideInk.Leg leg : row) {
      for (int end : new int[] {leg.span().from(), leg.span().to()}) {
        high = Math.max(high, placement.attachments().get(end).at().z());
      }
      for (Place p : leg.span().points()) {
        high = Math.max(high, p.z());
      }
    }
    return (high + SideInk.ABOVE - lowest(row)) * 1000 / scale + 4 + FOOT;
  }

  private void row(Pen pen, List<SideInk.Leg> legs, double top, int scale, List<Polygon> placed) {
    SideInk.Leg last = legs.get(legs.size() - 1);
    double height = height(legs, scale);
    double length = last.start() + last.length();
    double base = lowest(legs) - DrawingPage.metres(FOOT, scale);
    double x0 = length / 2 - DrawingPage.metres(width, scale) / 2;
    Frame frame = new Frame(left, top, width, height, x0, base, scale);
    Pen inside = new Pen();
    Labels labels = new Labels(frame);
    labels.block(Labels.box(left + width / 2, top + height - FOOT / 2, width, FOOT - 1.4, 0));
    new SideInk(model, frame, legs, labels, inside).draw();
    labels.settle(inside);
    placed.addAll(labels.placed());
    pen.text(left, top - 2.2, "Along the wire, points " + ends(legs), 10, Ink.Anchor.START, true);
    pen.text(
        left + width,
        top - 2.2,
        (figures.unit().equals("m") ? "metres" : "feet")
            + " from the plan's zero at the edge, above the ground at the points",
        7.5,
        Ink.Anchor.END,
        false,
        0.8);
    // heights stand outside the window
    DrawingPage.window(
        pen,
        new Frame(left - DrawingPage.RULER, top, width + DrawingPage.RULER, height, 0, 0, scale),
        inside);
  }

  /** "1–2–3". */
  private static String ends(List<SideInk.Leg> legs) {
    StringBuilder ends = new StringBuilder().append(legs.get(0).span().from() + 1);
    legs.forEach(leg -> ends.append('–').append(leg.span().to() + 1));
    return ends.toString();
  }
}
