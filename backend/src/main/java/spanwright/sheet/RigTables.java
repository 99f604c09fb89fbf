package spanwright.sheet;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.Collectors;
import spanwright.clearance.State;

/** Tables of what is rigged: overhead lines, cuts, attachments, spans. Millimetres. */
final class RigTables {
  private final SheetModel model;
  private final Figures figures;
  private final double width;
  private final double half;

  /**
   * Begins.
   *
   * @param model what to say
   * @param width of the page between its margins
   * @param half of a column
   */
  RigTables(SheetModel model, double width, double half) {
    this.model = model;
    this.figures = new Figures(model.options().units());
    this.width = width;
    this.half = half;
  }

  private double wide(double metric, double feet) {
    return figures.unit().equals("m") ? metric : feet;
  }

  Flow.Block overhead() {
    List<List<Setting.Cell>> rows = new ArrayList<>();
    for (OverheadParts.Line line : model.overhead().lines()) {
      rows.add(
          List.of(
              Setting.Cell.bold(line.name()),
              Setting.Cell.of(line.kind()),
              Setting.Cell.of(heights(line)),
              Setting.Cell.bold(line.keep() == null ? "?" : figures.required(line.keep())),
              nearest(line.nearest()),
              falls(line, line.wireLetGo(), false),
              falls(line, line.mastFalls(), true)));
    }
    List<String> notes = new ArrayList<>();
    for (OverheadParts.Line line : model.overhead().lines()) {
      if (line.authority() != null) {
        notes.add(line.name() + ": smaller distance allowed by " + line.authority() + ".");
      }
    }
    return Setting.table(
        "Overhead lines first",
        List.of(
            Setting.Column.left("Line", 0),
            Setting.Column.left("Kind", wide(25, 24)),
            Setting.Column.right("Height", wide(14, 23)),
            Setting.Column.right("Keep", wide(11, 14)),
            Setting.Column.right("Nearest, in the gust", 27),
            Setting.Column.right("If a wire lets go", wide(29, 28)),
            Setting.Column.right("If a mast falls", wide(38, 40))),
        rows,
        notes,
        width,
        true,
        model.overhead().say());
  }

  private String heights(OverheadParts.Line line) {
    String low = figures.height(line.lowest());
    String high = figures.height(line.highest());
    return low.equals(high) ? low : low + "–" + high;
  }

  private Setting.Cell nearest(OverheadParts.Reach reach) {
    return reach == null
        ? Setting.Cell.state("no figure", State.FOUL)
        : Setting.Cell.state(figures.found(reach.distance()), reach.state());
  }

  private Setting.Cell falls(OverheadParts.Line line, OverheadParts.Reach reach, boolean both) {
    if (!OverheadList.countsWhenThingsFall(line)) {
      return Setting.Cell.of("not required");
    }
    if (reach == null) {
      return Setting.Cell.of(line.nearest() == null ? "no figure" : "does not arise");
    }
    String told = figures.foundOf(reach.distance(), reach.required());
    return Setting.Cell.state(both ? told : told.replaceFirst(" of .*", ""), reach.state());
  }

  Flow.Block wire() {
    List<List<Setting.Cell>> rows = new ArrayList<>();
    for (CutParts.WirePiece w : model.wires()) {
      rows.add(
          List.of(
              Setting.Cell.bold(w.mark()),
              Setting.Cell.of(w.piece()),
              Setting.Cell.of(figures.length(w.finished())),
              Setting.Cell.of(figures.length(w.turnsBack()) + " + " + figures.length(w.trim())),
              Setting.Cell.bold(figures.cut(w.cut()))));
    }
    CutParts.FeedLine line = model.feedLine();
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
                .map(CutParts.WirePiece::kind)
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
            Setting.Column.left("", 8.5),
            Setting.Column.left("Piece", 0),
            Setting.Column.right("Hangs", 15),
            Setting.Column.right("Ends + trim", wide(21, 24)),
            Setting.Column.right("Cut", 15)),
        rows,
        notes,
        half);
  }

  private boolean insulated() {
    return model.source().catalogue().wires().stream()
        .filter(kind -> kind.insulation() != null)
        .anyMatch(kind -> model.wires().stream().anyMatch(w -> w.wire().equals(kind.id())));
  }

  Flow.Block rope() {
    List<List<Setting.Cell>> rows = new ArrayList<>();
    List<CutParts.Rope> guys =
        model.ropes().stream().filter(r -> r.mark().startsWith("G")).toList();
    for (CutParts.Rope r : model.ropes()) {
      if (guys.contains(r)) {
        continue;
      }
      String way = r.from() + (r.over() == null ? "" : ", over " + r.over()) + ", to " + r.to();
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
            .map(CutParts.Rope::kind)
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
            Setting.Column.left("", 11),
            Setting.Column.left("From, over, to", 0),
            Setting.Column.right("Run", wide(11, 15)),
            Setting.Column.right("Knots, tail", wide(12, 14)),
            Setting.Column.right("Cut", wide(14, 18))),
        rows,
        notes,
        half);
  }

  /** Guys cut alike from one mast share a row. */
  private void addGuys(List<List<Setting.Cell>> rows, List<CutParts.Rope> guys) {
    int i = 0;
    while (i < guys.size()) {
      CutParts.Rope first = guys.get(i);
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

  Flow.Block attachments() {
    List<List<Setting.Cell>> rows = new ArrayList<>();
    for (HangParts.Holding h : model.attachments()) {
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
            Setting.Column.left("", 7),
            Setting.Column.left("Point", 0),
            Setting.Column.right("Height there", 22),
            Setting.Column.right("Above ground at " + model.setOut().a().letter(), 27),
            Setting.Column.right("Calm, N", 17),
            Setting.Column.right("Gust, N", 17),
            Setting.Column.right("May take, N", 26),
            Setting.Column.right("Hang", 18)),
        rows,
        List.of("Pulls are whole forces on the point. A weight swings: keep people from under it."),
        width);
  }

  Flow.Block sags() {
    List<List<Setting.Cell>> rows = new ArrayList<>();
    for (HangParts.Sag s : model.sags()) {
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
            Setting.Column.left("Points", 11),
            Setting.Column.right("Level", wide(11, 15)),
            Setting.Column.right("Runs, true / compass", 0),
            Setting.Column.right("Sag at middle", 13),
            Setting.Column.right("Height there", 13),
            Setting.Column.right("Gust, sideways", 14)),
        rows,
        List.of(),
        half);
  }
}
