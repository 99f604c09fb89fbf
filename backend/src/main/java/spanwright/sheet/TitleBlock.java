package spanwright.sheet;

import java.util.List;
import java.util.stream.Collectors;
import spanwright.plan.Site;

/** The title block: what is drawn, of which plot, scale bar, north, legend, sheet. */
final class TitleBlock {
  static final double HEIGHT = 40;

  private static final double ROW = 19;

  private final SheetModel model;
  private final int scale;
  private final String what;
  private final boolean plan;

  TitleBlock(SheetModel model, int scale, String what, boolean plan) {
    this.model = model;
    this.scale = scale;
    this.what = what;
    this.plan = plan;
  }

  void draw(Pen pen, double x, double y, double width, int sheet, int sheets) {
    double north = plan ? x + width - 24 : x + width;
    double second = north - 30;
    double third = second - 52;
    pen.rect(x, y, width, HEIGHT, 0.5, 1, Ink.NONE);
    pen.line(x, y + ROW, north, y + ROW, 0.2, 1);
    if (plan) {
      pen.line(north, y, north, y + HEIGHT, 0.2, 1);
      north(pen, north + 12, y + 21);
    }
    pen.line(second, y, second, y + ROW, 0.2, 1);
    pen.line(third, y, third, y + ROW, 0.2, 1);
    cell(pen, x, y, third - x, what, model.head().name(), holders());
    cell(pen, third, y, second - third, "Plot", model.head().title(), "");
    cell(
        pen,
        second,
        y,
        north - second,
        "Scale at " + model.options().paper().label(),
        "1 : " + Figures.whole(scale),
        "sheet " + sheet + " of " + sheets + ", revision " + model.head().revision());
    double bar = scaleBar(pen, north - 3, y + ROW + 9.5);
    legend(pen, x + 2.5, y + ROW + 4.2, bar - 5);
    pen.text(
        x + 2.5,
        y + HEIGHT - 2,
        "Measure from the figures, not from the paper. Overhead lines: read sheet 1 before"
            + " anything is raised.",
        7.5,
        Ink.Anchor.START,
        false);
  }

  private String holders() {
    return model.attachments().stream()
        .map(HangParts.Holding::name)
        .collect(Collectors.joining("; "));
  }

  private static void cell(
      Pen pen, double x, double y, double width, String head, String big, String small) {
    pen.text(x + 2.5, y + 4, head, 7.5, Ink.Anchor.START, false, 0.75);
    double size = 12;
    List<String> lines = Setting.wrap(big, width - 5, size, true);
    while (lines.size() > (small.isEmpty() ? 2 : 1) && size > 8) {
      size -= 0.5;
      lines = Setting.wrap(big, width - 5, size, true);
    }
    double at = y + 4.6;
    for (String line : lines.subList(0, Math.min(2, lines.size()))) {
      at += size * Letters.POINT * 1.15;
      pen.text(x + 2.5, at, line, size, Ink.Anchor.START, true);
    }
    List<String> under = Setting.wrap(small, width - 5, 8, false);
    for (String line : under.subList(0, Math.min(2, under.size()))) {
      at += 3.6;
      if (at < y + ROW - 0.5) {
        pen.text(x + 2.5, at, line, 8, Ink.Anchor.START, false);
      }
    }
  }

  /** True to scale: black and white by turns, ending at the right. Gives its left edge. */
  private double scaleBar(Pen pen, double right, double y) {
    boolean feet = model.options().units() == SheetOptions.Units.FEET;
    double unit = feet ? 0.3048 : 1;
    double length = barLength(scale, unit);
    double mm = length * unit * 1000 / scale;
    double x = right - 5 - mm;
    double[] marks = {0, length / 5, 2 * length / 5, length};
    for (int i = 1; i < marks.length; i++) {
      double from = x + mm * marks[i - 1] / length;
      double wide = mm * (marks[i] - marks[i - 1]) / length;
      pen.rect(from, y, wide, 1.5, 0.2, 1, i % 2 == 1 ? 1 : 0);
    }
    for (double mark : marks) {
      boolean whole = Math.abs(mark - Math.rint(mark)) < 1e-9;
      pen.text(
          x + mm * mark / length,
          y - 1.2,
          Figures.fixed(mark, whole ? 0 : 1) + (mark == length ? feet ? " ft" : " m" : ""),
          7.5,
          Ink.Anchor.MIDDLE,
          false);
    }
    return x;
  }

  /** The round length nearest under 52 mm of paper. */
  static double barLength(int scale, double unit) {
    double best = 1;
    for (double next = 1; next < 1e6; next *= 10) {
      for (double step : new double[] {1, 2, 5}) {
        if (next * step * unit * 1000 / scale <= 52) {
          best = next * step;
        }
      }
    }
    return best;
  }

  private void legend(Pen pen, double x, double y, double right) {
    String[] names = {
      "wire", "rope, guy", "feed line", "boundary", "overhead line", "kept distance"
    };
    double step = Math.min(33, (right - x) / 3);
    for (int i = 0; i < names.length; i++) {
      double at = x + (i % 3) * step;
      double row = y + (i / 3) * 6;
      sample(pen, i, at, row);
      pen.add(
          new Ink.Lettering(
              at + 10.5, row + 0.9, names[i], 7.5, Ink.Anchor.START, false, true, 0, 0, 1));
    }
  }

  private static void sample(Pen pen, int which, double x, double y) {
    switch (which) {
      case 0 -> pen.line(x, y, x + 9, y, 0.8, 1);
      case 1 -> pen.line(x, y, x + 9, y, 0.35, 1, 1.8, 0.9);
      case 2 -> RiggingInk.twin(pen, List.of(new double[] {x, y}, new double[] {x + 9, y}));
      case 3 -> pen.line(x, y, x + 9, y, 0.4, 1, 4, 1, 0.6, 1);
      case 4 ->
          pen.path(Symbols.zigZag(List.of(new double[] {x, y}, new double[] {x + 9, y})), 0.5, 1);
      default -> {
        List<double[]> box =
            List.of(
                new double[] {x, y - 1.3},
                new double[] {x + 9, y - 1.3},
                new double[] {x + 9, y + 1.3},
                new double[] {x, y + 1.3});
        Hatching.draw(pen, Hatching.area(box), 1.2, false, 0.1, 0.5);
        pen.area(box, 0.2, 0.85, Ink.NONE, 2, 0.9);
      }
    }
  }

  /** True north, and the compass needle dashed beside it. */
  private void north(Pen pen, double x, double y) {
    Site site = model.source().plan().site();
    double radius = 10;
    double up = Math.toRadians(-site.planNorth());
    double nx = Math.sin(up);
    double ny = -Math.cos(up);
    pen.line(x - radius * nx, y - radius * ny, x + radius * nx, y + radius * ny, 0.3, 1);
    pen.area(
        List.of(
            new double[] {x + radius * nx, y + radius * ny},
            new double[] {x + 4 * nx - 1.8 * ny, y + 4 * ny + 1.8 * nx},
            new double[] {x + 4 * nx, y + 4 * ny}),
        0.2,
        1,
        1);
    pen.area(
        List.of(
            new double[] {x + radius * nx, y + radius * ny},
            new double[] {x + 4 * nx + 1.8 * ny, y + 4 * ny - 1.8 * nx},
            new double[] {x + 4 * nx, y + 4 * ny}),
        0.2,
        1,
        0);
    pen.text(x + 13 * nx, y + 13 * ny + 1.3, "N", 10, Ink.Anchor.MIDDLE, true);
    double variation = site.magneticVariation();
    if (Math.abs(variation) >= 0.05) {
      double needle = Math.toRadians(variation - site.planNorth());
      double mx = Math.sin(needle);
      double my = -Math.cos(needle);
      pen.line(x, y, x + radius * mx, y + radius * my, 0.25, 1, 1.2, 0.8);
    }
    String text =
        Math.abs(variation) < 0.05
            ? "magnetic as true"
            : "magnetic "
                + Figures.fixed(Math.abs(variation), 1)
                + "° "
                + (variation < 0 ? "W" : "E");
    pen.add(new Ink.Lettering(x, y + 17.3, text, 7.5, Ink.Anchor.MIDDLE, false, true, 0, 0, 1));
  }
}
