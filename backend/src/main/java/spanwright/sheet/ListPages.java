package spanwright.sheet;

import java.util.ArrayList;
import java.util.List;
import spanwright.clearance.State;

/** Sets the rigging list out on pages: overhead lines in the only box, then everything else. */
final class ListPages {
  static final double MARGIN = 16;
  static final double TOP = 13;
  static final double FOOT = 12;
  private static final double GUTTER = 7;
  private static final double GAP = 3.2;

  private final SheetModel model;
  private final Figures figures;
  private final double width;
  private final double half;

  private ListPages(SheetModel model) {
    this.model = model;
    this.figures = new Figures(model.options().units());
    this.width = model.options().paper().width() - 2 * MARGIN;
    this.half = (width - GUTTER) / 2;
  }

  static List<Pen> of(SheetModel model) {
    return new ListPages(model).set();
  }

  private List<Pen> set() {
    Pen head = new Pen();
    double top = head(head);
    double bottom = model.options().paper().height() - FOOT - 6;
    Flow flow = new Flow(MARGIN, width, top, TOP + 9, bottom);
    flow.pages().get(0).addAll(head.inks());
    RigTables rig = new RigTables(model, width, half);
    WorkTables work = new WorkTables(model, width, half);
    flow.add(rig.overhead());
    flow.gap(GAP);
    List<Flow.Block> left = new ArrayList<>(List.of(rig.wire()));
    List<Flow.Block> right = new ArrayList<>(List.of(rig.rope()));
    (height(left) < height(right) ? left : right).add(rig.sags());
    flow.pair(left, right, GUTTER, GAP);
    flow.gap(GAP);
    flow.add(rig.attachments());
    flow.gap(GAP);
    flow.add(work.setOut());
    flow.gap(GAP);
    left = new ArrayList<>(List.of(work.order(), work.hardware()));
    right = new ArrayList<>(List.of(work.cautions()));
    for (Flow.Block block :
        List.of(
            work.checks("Checks before", model.before()),
            work.checks("Checks after", model.after()),
            work.sweep(),
            work.notes())) {
      if (block.strips().isEmpty()) {
        continue;
      }
      (height(left) < height(right) ? left : right).add(block);
    }
    flow.pair(left, right, GUTTER, GAP);
    List<Pen> pages = flow.pages();
    for (int i = 1; i < pages.size(); i++) {
      runningHead(pages.get(i));
    }
    return pages;
  }

  private static double height(List<Flow.Block> blocks) {
    return blocks.stream().mapToDouble(b -> b.height() + GAP).sum();
  }

  private double head(Pen pen) {
    SheetModel.Head head = model.head();
    double side = 72;
    List<String> right = new ArrayList<>();
    right.add(head.name() + ", " + figures.say(head.wireLength()) + " of wire");
    right.addAll(
        Setting.wrap(
            String.join(", ", head.bands()) + "; " + Figures.whole(head.power()) + " W",
            side,
            Setting.TEXT,
            false));
    right.add(
        (figures.unit().equals("m") ? "Metres." : "Feet and inches.")
            + " Heights above ground at that spot.");
    double size = 21;
    List<String> title = Setting.wrap(head.title(), width - side - 6, size, true);
    while (title.size() > 2 && size > 11) {
      size -= 2;
      title = Setting.wrap(head.title(), width - side - 6, size, true);
    }
    double y = TOP + 3.2;
    pen.text(MARGIN, y, "Rigging list", Setting.TEXT, Ink.Anchor.START, false);
    for (String line : title.subList(0, Math.min(4, title.size()))) {
      y += size * Letters.POINT * 1.08;
      pen.text(MARGIN, y, line, size, Ink.Anchor.START, true);
    }
    double at = TOP + 3.2;
    for (int i = 0; i < right.size(); i++) {
      pen.text(MARGIN + width, at, right.get(i), Setting.TEXT, Ink.Anchor.END, i == 0);
      at += 4.2;
    }
    y = Math.max(y + 3.2, at - 1.5);
    pen.line(MARGIN, y, MARGIN + width, y, 0.6, 1);
    y += 1.2;
    List<String> under = new ArrayList<>(head.weather());
    if (head.verdict() != null) {
      Symbols.state(pen, MARGIN + 1.6, y + 2.5, 3, State.FOUL);
      pen.text(MARGIN + 5, y + 3.6, head.verdict(), 11, Ink.Anchor.START, true);
      y += 5.5;
    }
    for (String line : Setting.wrap(String.join(" ", under), width, Setting.TEXT, false)) {
      pen.text(MARGIN, y + 3.3, line, Setting.TEXT, Ink.Anchor.START, false);
      y += 4.1;
    }
    return y + 2;
  }

  private void runningHead(Pen pen) {
    pen.text(
        MARGIN,
        TOP + 3.2,
        Setting.wrap(model.head().title(), width - 60, Setting.TEXT, true).get(0),
        Setting.TEXT,
        Ink.Anchor.START,
        true);
    pen.text(
        MARGIN + width,
        TOP + 3.2,
        model.head().name() + ", rigging list",
        Setting.TEXT,
        Ink.Anchor.END,
        false);
    pen.line(MARGIN, TOP + 5, MARGIN + width, TOP + 5, 0.6, 1);
  }
}
