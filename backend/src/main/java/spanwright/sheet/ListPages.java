package spanwright.sheet;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.Collectors;
import java.util.stream.IntStream;
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
    flow.add(overhead());
    flow.gap(GAP);
    List<Flow.Block> left = new ArrayList<>(List.of(wire()));
    List<Flow.Block> right = new ArrayList<>(List.of(rope()));
    (height(left) < height(right) ? left : right).add(sags());
    flow.pair(left, right, GUTTER, GAP);
    flow.gap(GAP);
    flow.add(attachments());
    flow.gap(GAP);
    flow.add(setOut());
    flow.gap(GAP);
    left = new ArrayList<>(List.of(order(), hardware()));
    right = new ArrayList<>(List.of(cautions()));
    for (Flow.Block block :
        List.of(
            checks("Checks before", model.before()),
            checks("Checks after", model.after()),
            sweep(),
            notes())) {
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
    double side = 62;
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

  private static Setting.Column left(String heading, double width) {
    return new Setting.Column(heading, width, false);
  }

  private static Setting.Column right(String heading, double width) {
    return new Setting.Column(heading, width, true);
  }

  private double wide(double metric, double feet) {
    return figures.unit().equals("m") ? metric : feet;
  }

  private Flow.Block overhead() {
    List<List<Setting.Cell>> rows = new ArrayList<>();
    for (SheetModel.Line line : model.overhead().lines()) {
      rows.add(
          List.of(
              Setting.Cell.bold(line.name()),
              Setting.Cell.of(line.kind()),
              Setting.Cell.of(heights(line)),
              Setting.Cell.bold(line.keep() == null ? "?" : figures.required(line.keep())),
              nearest(line.nearest()),
              falls(line, line.wireLetGo()),
              falls(line, line.mastFalls())));
    }
    List<String> notes = new ArrayList<>();
    for (SheetModel.Line line : model.overhead().lines()) {
      if (line.authority() != null) {
        notes.add(line.name() + ": smaller distance allowed by " + line.authority() + ".");
      }
    }
    return Setting.table(
        "Overhead lines first",
        List.of(
            left("Line", 0),
            left("Kind", 25),
            right("Height", wide(14, 23)),
            right("Keep", wide(11, 14)),
            right("Nearest, in the gust", 27),
            right("If a wire lets go", wide(35, 38)),
            right("If a mast falls", wide(38, 40))),
        rows,
        notes,
        width,
        true,
        model.overhead().say());
  }

  private String heights(SheetModel.Line line) {
    String low = figures.height(line.lowest());
    String high = figures.height(line.highest());
    return low.equals(high) ? low : low + "–" + high;
  }

  private Setting.Cell nearest(SheetModel.Reach reach) {
    return reach == null
        ? Setting.Cell.state("no figure", State.FOUL)
        : Setting.Cell.state(figures.found(reach.distance()), reach.state());
  }

  private Setting.Cell falls(SheetModel.Line line, SheetModel.Reach reach) {
    if (!OverheadList.countsWhenThingsFall(line)) {
      return Setting.Cell.of("not required");
    }
    if (reach == null) {
      return Setting.Cell.of(line.nearest() == null ? "no figure" : "does not arise");
    }
    return Setting.Cell.state(
        figures.found(reach.distance()) + " of " + figures.required(reach.required()),
        reach.state());
  }

  private Flow.Block wire() {
    List<List<Setting.Cell>> rows = new ArrayList<>();
    for (SheetModel.WirePiece w : model.wires()) {
      rows.add(
          List.of(
              Setting.Cell.bold(w.mark()),
              Setting.Cell.of(w.piece()),
              Setting.Cell.of(figures.length(w.finished())),
              Setting.Cell.of(figures.length(w.turnsBack()) + " + " + figures.length(w.trim())),
              Setting.Cell.bold(figures.cut(w.cut()))));
    }
    SheetModel.FeedLine line = model.feedLine();
    rows.add(
        List.of(
            Setting.Cell.bold(line.mark()),
            Setting.Cell.of("feed line, feedpoint to entry"),
            Setting.Cell.of(figures.length(line.finished())),
            Setting.Cell.of(figures.length(line.madeOff())),
            Setting.Cell.bold(figures.cut(line.cut()))));
    List<String> notes = new ArrayList<>();
    notes.add(
        "Wire: "
            + model.wires().stream()
                .map(SheetModel.WirePiece::kind)
                .distinct()
                .collect(Collectors.joining(", "))
            + ". Line: "
            + line.kind()
            + ". Lengths are those of the wire as it hangs"
            + (insulated() ? ", its insulation reckoned: do not shorten it again." : "."));
    notes.add(
        "The line's run is " + figures.say(line.run()) + ". " + String.join(" ", line.notes()));
    return Setting.table(
        "Wire",
        List.of(
            left("", 8.5),
            left("Piece", 0),
            right("Hangs", 15),
            right("Ends + trim", wide(21, 24)),
            right("Cut", 15)),
        rows,
        notes,
        half);
  }

  private boolean insulated() {
    return model.source().catalogue().wires().stream()
        .filter(kind -> kind.insulation() != null)
        .anyMatch(kind -> model.wires().stream().anyMatch(w -> w.wire().equals(kind.id())));
  }

  private Flow.Block rope() {
    List<List<Setting.Cell>> rows = new ArrayList<>();
    List<SheetModel.Rope> guys =
        model.ropes().stream().filter(r -> r.mark().startsWith("G")).toList();
    for (SheetModel.Rope r : model.ropes()) {
      if (guys.contains(r)) {
        continue;
      }
      String way =
          r.over() == null
              ? r.from() + " to " + r.to()
              : r.from() + ", " + r.over() + ", " + r.to();
      rows.add(
          List.of(
              Setting.Cell.bold(r.mark()),
              Setting.Cell.of(way),
              Setting.Cell.of(figures.length(r.run())),
              Setting.Cell.of(figures.length(r.allowance())),
              Setting.Cell.bold(figures.ropeCut(r.cut()))));
    }
    addGuys(rows, guys);
    List<String> notes = new ArrayList<>();
    String kinds =
        model.ropes().stream()
            .map(SheetModel.Rope::kind)
            .distinct()
            .collect(Collectors.joining(", "));
    if (!kinds.isEmpty()) {
      notes.add("Rope: " + kinds + ".");
    }
    notes.add(
        "Do not leave ropes longer: what lets go would reach farther. Halyards are endless, both"
            + " parts made off.");
    return Setting.table(
        "Rope",
        List.of(
            left("", 11),
            left("From, over, to", 0),
            right("Run", wide(11, 15)),
            right("Knots, tail", wide(12, 14)),
            right("Cut", wide(14, 18))),
        rows,
        notes,
        half);
  }

  /** Guys cut alike from one mast share a row. */
  private void addGuys(List<List<Setting.Cell>> rows, List<SheetModel.Rope> guys) {
    int i = 0;
    while (i < guys.size()) {
      SheetModel.Rope first = guys.get(i);
      int last = i;
      while (last + 1 < guys.size()
          && guys.get(last + 1).cut() == first.cut()
          && guys.get(last + 1).from().equals(first.from())) {
        last++;
      }
      int many = last - i + 1;
      rows.add(
          List.of(
              Setting.Cell.bold(
                  many == 1
                      ? first.mark()
                      : first.mark() + "–" + guys.get(last).mark().substring(1)),
              Setting.Cell.of(
                  many == 1
                      ? "guy, " + first.from() + " to " + first.to()
                      : "guys, " + first.from() + " to the pegs"),
              Setting.Cell.of(figures.length(first.run())),
              Setting.Cell.of(figures.length(first.allowance())),
              Setting.Cell.bold((many == 1 ? "" : many + " × ") + figures.ropeCut(first.cut()))));
      i = last + 1;
    }
  }

  private Flow.Block attachments() {
    List<List<Setting.Cell>> rows = new ArrayList<>();
    for (SheetModel.Holding h : model.attachments()) {
      rows.add(
          List.of(
              Setting.Cell.square(h.point()),
              Setting.Cell.of(h.name()),
              Setting.Cell.bold(figures.height(h.aboveGround())),
              Setting.Cell.of(figures.height(h.aboveDatum())),
              Setting.Cell.of(Figures.whole(Math.ceil(h.pull()))),
              Setting.Cell.of(Figures.whole(Math.ceil(h.pullInWind()))),
              h.mayTake() == null
                  ? Setting.Cell.bold("not checked")
                  : Setting.Cell.state(Figures.whole(h.mayTake()), h.state()),
              h.kilograms() == null
                  ? Setting.Cell.of(h.held())
                  : Setting.Cell.bold(Figures.kilograms(h.kilograms()) + " kg")));
    }
    return Setting.table(
        "Attachments, pulls, what to hang",
        List.of(
            left("", 7),
            left("Point", 0),
            right("Height there", 22),
            right("Above ground at " + model.setOut().a().letter(), 27),
            right("Calm, N", 17),
            right("Gust, N", 17),
            right("May take, N", 26),
            right("Hang", 18)),
        rows,
        List.of("Pulls are whole forces on the point. A weight swings: keep people from under it."),
        width);
  }

  private Flow.Block sags() {
    List<List<Setting.Cell>> rows = new ArrayList<>();
    for (SheetModel.Sag s : model.sags()) {
      rows.add(
          List.of(
              Setting.Cell.bold(s.span()),
              Setting.Cell.of(figures.length(s.level())),
              Setting.Cell.of(Figures.bearing(s.bearing()) + " / " + Figures.bearing(s.magnetic())),
              Setting.Cell.bold(figures.length(s.middle())),
              Setting.Cell.of(figures.height(s.heightMiddle())),
              Setting.Cell.of(figures.length(s.blowOut()))));
    }
    return Setting.table(
        "Spans, and sag to sight",
        List.of(
            left("Points", 11),
            right("Level", wide(11, 15)),
            right("Runs, true / compass", 0),
            right("Sag at middle", 13),
            right("Height there", 13),
            right("Gust, sideways", 14)),
        rows,
        List.of(),
        half);
  }

  private Flow.Block setOut() {
    SheetModel.SetOut s = model.setOut();
    boolean third = s.c() != null;
    List<Setting.Column> columns =
        new ArrayList<>(
            List.of(
                left("", 7),
                left("Point", 0),
                right("From " + s.a().letter(), 17),
                right("From " + s.b().letter(), 17),
                right("Side", 12),
                right(third ? "Check, from " + s.c().letter() : "Check", 21),
                right("Tapes cross at", 20),
                right("Compass from " + s.a().letter() + ", true / magnetic", 28),
                right("Height", 14)));
    List<List<Setting.Cell>> rows = new ArrayList<>();
    for (SheetModel.Mark m : s.points()) {
      rows.add(
          List.of(
              Setting.Cell.square(m.number()),
              Setting.Cell.of(m.name()),
              Setting.Cell.bold(figures.length(m.fromA())),
              Setting.Cell.bold(figures.length(m.fromB())),
              Setting.Cell.of(m.side()),
              Setting.Cell.of(m.check() == null ? "–" : figures.length(m.check())),
              new Setting.Cell(
                  Figures.degrees(m.crossing()) + (m.flat() ? " flat" : ""), m.flat(), null, false),
              Setting.Cell.of(Figures.bearing(m.bearing()) + " / " + Figures.bearing(m.magnetic())),
              Setting.Cell.of(figures.height(m.height()))));
    }
    List<String> notes = new ArrayList<>();
    notes.add(known(s.a()) + "; " + known(s.b()) + (third ? "; " + known(s.c()) : "") + ".");
    String better =
        s.points().stream()
            .filter(m -> m.flat() || m.blocked() != null)
            .map(this::better)
            .collect(Collectors.joining(" "));
    if (!better.isEmpty()) {
      notes.add(better);
    }
    notes.addAll(
        List.of(
            String.join(" ", s.notes())
                + " Side: walking from "
                + s.a().letter()
                + " to "
                + s.b().letter()
                + "."));
    return Setting.table("Set-out by two tapes", columns, rows, notes, width);
  }

  private static String known(SheetModel.Known known) {
    return known.letter() + ": " + known.what();
  }

  private String better(SheetModel.Mark m) {
    String why = m.blocked() != null ? m.blocked() : "tapes cross flat";
    SheetModel.Pair p = m.better();
    return "Point "
        + m.number()
        + ", "
        + why
        + (p == null
            ? "."
            : ": better "
                + figures.length(p.fromTape())
                + " from "
                + p.from()
                + " with "
                + figures.length(p.withTape())
                + " from "
                + p.with()
                + ", at "
                + Figures.degrees(p.crossing())
                + ".");
  }

  private Flow.Block order() {
    List<Setting.Item> items =
        IntStream.range(0, model.order().size())
            .mapToObj(
                i -> new Setting.Item(String.valueOf(i + 1), true, false, model.order().get(i)))
            .toList();
    return Setting.list("Order of work", items, half);
  }

  private Flow.Block checks(String title, List<String> checks) {
    return Setting.list(
        title, checks.stream().map(c -> new Setting.Item("", true, false, c)).toList(), half);
  }

  private Flow.Block cautions() {
    List<Setting.Item> items = new ArrayList<>();
    model.cautions().forEach(c -> items.add(new Setting.Item("", false, c.pressing(), c.text())));
    items.add(new Setting.Item("", false, false, model.decides()));
    return Setting.list("Cautions for this site", items, half);
  }

  private Flow.Block notes() {
    List<Setting.Item> items =
        model.notes().stream().map(n -> new Setting.Item("", false, false, n)).toList();
    return Setting.list("Notes", items, half);
  }

  private Flow.Block hardware() {
    List<List<Setting.Cell>> rows = new ArrayList<>();
    for (SheetModel.Item i : model.hardware()) {
      String spares = i.spares() == 0 ? "" : " + " + i.spares();
      rows.add(
          List.of(
              Setting.Cell.bold(
                  i.length() == null ? i.count() + spares : figures.sayCut(i.length())),
              Setting.Cell.of(i.what() + (i.note() == null ? "" : ", " + i.note()))));
    }
    return Setting.table(
        "Hardware, with spares", List.of(left("", 17), left("", 0)), rows, List.of(), half);
  }

  private Flow.Block sweep() {
    List<List<Setting.Cell>> rows = new ArrayList<>();
    for (SheetModel.Expected e : model.sweep()) {
      rows.add(
          List.of(
              Setting.Cell.of(e.band()),
              Setting.Cell.of(Figures.fixed(e.frequency(), 3)),
              Setting.Cell.of(Figures.impedance(e.resistance(), e.reactance())),
              Setting.Cell.of(Figures.fixed(e.lineSwr(), 1)),
              e.match() == null ? Setting.Cell.of("–") : Setting.Cell.state("", e.match())));
    }
    return Setting.table(
        "What the sweep should find, at the entry",
        List.of(
            left("Band", 0),
            right("MHz", 13),
            right("Impedance", 27),
            right("Line SWR", 15),
            right("Match", 18)),
        rows,
        List.of(),
        half);
  }
}
