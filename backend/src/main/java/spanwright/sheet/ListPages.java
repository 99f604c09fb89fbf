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
  private final double width;
  private final double half;

  private ListPages(SheetModel model) {
    this.model = model;
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
    RigTables rig = new RigTables(model);
    WorkTables work = new WorkTables(model);
    flow.add(wide(rig.overhead()));
    flow.gap(GAP);
    List<Flow.Block> left = new ArrayList<>(List.of(narrow(rig.wire())));
    List<Flow.Block> right = new ArrayList<>(List.of(narrow(rig.rope())));
    (height(left) < height(right) ? left : right).add(narrow(rig.sags()));
    flow.pair(left, right, GUTTER, GAP);
    flow.gap(GAP);
    flow.add(wide(rig.attachments()));
    flow.gap(GAP);
    if (!rig.margins().isEmpty()) {
      flow.add(wide(rig.margins()));
      flow.gap(GAP);
    }
    flow.add(wide(work.setOut()));
    flow.gap(GAP);
    left = new ArrayList<>(List.of(narrow(work.people()), narrow(work.order())));
    right = new ArrayList<>(List.of(narrow(work.cautions())));
    for (ListPart part :
        List.of(
            work.hardware(),
            work.alternatives(),
            work.checks("Checks before", model.before()),
            work.checks("Checks after", model.after()),
            work.inspections(),
            work.sweep(),
            work.notes())) {
      if (part.isEmpty()) {
        continue;
      }
      (height(left) < height(right) ? left : right).add(narrow(part));
    }
    flow.pair(left, right, GUTTER, GAP);
    flow.gap(GAP);
    flow.add(wide(work.measures()));
    if (!work.changes().isEmpty()) {
      flow.gap(GAP);
      flow.add(wide(work.changes()));
    }
    List<Pen> pages = flow.pages();
    for (int i = 1; i < pages.size(); i++) {
      runningHead(pages.get(i));
    }
    return pages;
  }

  private Flow.Block wide(ListPart part) {
    return Setting.block(part, width);
  }

  private Flow.Block narrow(ListPart part) {
    return Setting.block(part, half);
  }

  /** What stands at the right of the head, as it reads. */
  static List<String> headLines(SheetModel model) {
    SheetModel.Head head = model.head();
    Figures figures = new Figures(model.options().units());
    List<String> lines = new ArrayList<>();
    lines.add(head.name() + ", " + figures.say(head.wireLength()) + " of wire");
    lines.add(
        "Revision "
            + head.revision()
            + (head.date() == null ? ", not yet issued" : ", " + head.date())
            + (head.savedAt() == null ? "" : "; plan as saved " + head.savedAt()));
    lines.add("Place: " + head.place());
    lines.add(String.join(", ", head.bands()) + "; " + Figures.whole(head.power()) + " W");
    lines.add(
        (figures.unit().equals("m") ? "Metres." : "Feet and inches.")
            + " Heights above ground at that spot.");
    return lines;
  }

  private static double height(List<Flow.Block> blocks) {
    return blocks.stream().mapToDouble(b -> b.height() + GAP).sum();
  }

  private double head(Pen pen) {
    SheetModel.Head head = model.head();
    double side = 72;
    List<String> right = new ArrayList<>();
    for (String line : headLines(model)) {
      right.addAll(Setting.wrap(line, side, Setting.TEXT, right.isEmpty()));
    }
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
    if (head.since() != null) {
      under.add(
          "What revision "
              + head.revision()
              + " changes against "
              + head.since()
              + " stands at the end of the list.");
    }
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
