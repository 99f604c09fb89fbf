package spanwright.sheet;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.Collectors;
import spanwright.clearance.State;

/** Tables of what is rigged: overhead lines, cuts, attachments, spans. Millimetres. */
final class RigTables {
  private final SheetModel model;
  private final Figures figures;

  RigTables(SheetModel model) {
    this.model = model;
    this.figures = new Figures(model.options().units());
  }

  private double wide(double metric, double feet) {
    return figures.unit().equals("m") ? metric : feet;
  }

  ListPart overhead() {
    List<List<ListPart.Cell>> rows = new ArrayList<>();
    for (OverheadParts.Line line : model.overhead().lines()) {
      rows.add(
          List.of(
              ListPart.Cell.bold(line.name()),
              ListPart.Cell.of(line.kind()),
              ListPart.Cell.of(heights(line)),
              ListPart.Cell.bold(line.keep() == null ? "?" : figures.required(line.keep())),
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
    return ListPart.boxed(
        "Overhead lines first",
        List.of(
            ListPart.Column.left("Line", 0),
            ListPart.Column.left("Kind", wide(25, 24)),
            ListPart.Column.right("Height", wide(14, 23)),
            ListPart.Column.right("Keep", wide(11, 14)),
            ListPart.Column.right("Nearest, in the gust", 27),
            ListPart.Column.right("If a wire lets go", wide(29, 28)),
            ListPart.Column.right("If a mast falls", wide(38, 40))),
        rows,
        notes,
        model.overhead().say());
  }

  private String heights(OverheadParts.Line line) {
    String low = figures.height(line.lowest());
    String high = figures.height(line.highest());
    return low.equals(high) ? low : low + "–" + high;
  }

  private ListPart.Cell nearest(OverheadParts.Reach reach) {
    return reach == null
        ? ListPart.Cell.state("no figure", State.FOUL)
        : ListPart.Cell.state(figures.found(reach.distance()), reach.state());
  }

  private ListPart.Cell falls(OverheadParts.Line line, OverheadParts.Reach reach, boolean both) {
    if (!OverheadList.countsWhenThingsFall(line)) {
      return ListPart.Cell.of("not required");
    }
    if (reach == null) {
      return ListPart.Cell.of(line.nearest() == null ? "no figure" : "does not arise");
    }
    String told = figures.foundOf(reach.distance(), reach.required());
    return ListPart.Cell.state(both ? told : told.replaceFirst(" of .*", ""), reach.state());
  }

  ListPart wire() {
    List<List<ListPart.Cell>> rows = new ArrayList<>();
    for (CutParts.WirePiece w : model.wires()) {
      rows.add(
          List.of(
              ListPart.Cell.bold(w.mark()),
              ListPart.Cell.of(w.piece()),
              ListPart.Cell.of(figures.length(w.finished())),
              ListPart.Cell.of(figures.length(w.turnsBack()) + " + " + figures.length(w.trim())),
              ListPart.Cell.bold(figures.cut(w.cut()))));
    }
    CutParts.FeedLine line = model.feedLine();
    rows.add(
        List.of(
            ListPart.Cell.bold(line.mark()),
            ListPart.Cell.of("feed line, feedpoint to entry"),
            ListPart.Cell.of(figures.length(line.finished())),
            ListPart.Cell.of(figures.length(line.madeOff())),
            ListPart.Cell.bold(figures.cut(line.cut()))));
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
            + (insulated()
                ? ", and the radio figures are reckoned with its insulation on: the length that insulation takes off is in them. Do not shorten it again."
                : "."));
    notes.add(String.join(" ", line.notes()));
    return ListPart.table(
        "Wire",
        List.of(
            ListPart.Column.left("", 8.5),
            ListPart.Column.left("Piece", 0),
            ListPart.Column.right("Hangs", wide(15, 18)),
            ListPart.Column.right("Ends + trim", wide(21, 23)),
            ListPart.Column.right("Cut", wide(15, 17))),
        rows,
        notes);
  }

  private boolean insulated() {
    return model.source().catalogue().wires().stream()
        .filter(kind -> kind.insulation() != null)
        .anyMatch(kind -> model.wires().stream().anyMatch(w -> w.wire().equals(kind.id())));
  }

  ListPart rope() {
    List<List<ListPart.Cell>> rows = new ArrayList<>();
    List<CutParts.Rope> guys =
        model.ropes().stream().filter(r -> r.mark().startsWith("G")).toList();
    for (CutParts.Rope r : model.ropes()) {
      if (guys.contains(r)) {
        continue;
      }
      String way = r.from() + (r.over() == null ? "" : ", over " + r.over()) + ", to " + r.to();
      rows.add(
          List.of(
              ListPart.Cell.bold(r.mark()),
              ListPart.Cell.of(way),
              ListPart.Cell.of(figures.length(r.run())),
              ListPart.Cell.of(figures.length(r.allowance())),
              ListPart.Cell.bold(figures.ropeCut(r.cut()))));
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
    return ListPart.table(
        "Rope",
        List.of(
            ListPart.Column.left("", 11),
            ListPart.Column.left("From, over, to", 0),
            ListPart.Column.right("Run", wide(11, 15)),
            ListPart.Column.right("Knots, tail", wide(12, 14)),
            ListPart.Column.right("Cut", wide(14, 18))),
        rows,
        notes);
  }

  /** Guys cut alike from one mast share a row. */
  private void addGuys(List<List<ListPart.Cell>> rows, List<CutParts.Rope> guys) {
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
              ListPart.Cell.bold(
                  many == 1
                      ? first.mark()
                      : first.mark() + "–" + guys.get(last).mark().substring(1)),
              ListPart.Cell.of(
                  many == 1
                      ? "guy, " + first.from() + " to " + first.to()
                      : "guys, " + first.from() + " to the pegs"),
              ListPart.Cell.of(figures.length(first.run())),
              ListPart.Cell.of(figures.length(first.allowance())),
              ListPart.Cell.bold((many == 1 ? "" : many + " × ") + figures.ropeCut(first.cut()))));
      i = last + 1;
    }
  }

  ListPart attachments() {
    List<List<ListPart.Cell>> rows = new ArrayList<>();
    for (HangParts.Holding h : model.attachments()) {
      rows.add(
          List.of(
              ListPart.Cell.square(h.point()),
              ListPart.Cell.of(h.name() + "; " + h.method()),
              ListPart.Cell.bold(figures.height(h.aboveGround())),
              ListPart.Cell.of(figures.height(h.aboveDatum())),
              ListPart.Cell.of(Figures.whole(Math.ceil(h.pull()))),
              ListPart.Cell.of(Figures.whole(Math.ceil(h.pullInWind()))),
              h.mayTake() == null
                  ? ListPart.Cell.bold("not checked")
                  : ListPart.Cell.state(Figures.whole(h.mayTake()), h.state()),
              h.kilograms() == null
                  ? ListPart.Cell.of(h.held())
                  : ListPart.Cell.bold(
                      Figures.kilograms(h.kilograms())
                          + " kg, "
                          + Figures.newtons(h.kilograms())
                          + " N")));
    }
    List<String> notes = new ArrayList<>();
    notes.add("Pulls are whole forces on the point. A weight swings: keep people from under it.");
    notes.addAll(travel());
    return ListPart.table(
        "Attachments, pulls, what to hang",
        List.of(
            ListPart.Column.left("", 7),
            ListPart.Column.left("Point", 0),
            ListPart.Column.right("Height there", 19),
            ListPart.Column.right("Above ground at " + model.setOut().a().letter(), 27),
            ListPart.Column.right("Calm, N", 17),
            ListPart.Column.right("Gust, N", 17),
            ListPart.Column.right("May take, N", 26),
            ListPart.Column.right("Hang", 24)),
        rows,
        notes);
  }

  /** Margins are rounded down: 1.96 is not 2. */
  private static ListPart.Cell margin(Double margin) {
    return ListPart.Cell.of(
        margin == null ? "–" : Figures.fixed(Math.floor(margin * 10 + 1e-6) / 10, 1));
  }

  ListPart margins() {
    List<List<ListPart.Cell>> rows = new ArrayList<>();
    for (HangParts.Margins m : model.margins()) {
      rows.add(
          List.of(
              ListPart.Cell.bold(m.span()),
              ListPart.Cell.bold(Figures.whole(m.set())),
              ListPart.Cell.of(m.worst() == null ? "–" : Figures.whole(Math.ceil(m.worst()))),
              ListPart.Cell.of(m.weather() == null ? "–" : m.weather()),
              margin(m.wire()),
              margin(m.rope()),
              margin(m.insulator()),
              margin(m.support()),
              ListPart.Cell.of(m.partsFirst()),
              ListPart.Cell.of(
                  m.weakLink() == null ? "none fits" : Figures.whole(Math.floor(m.weakLink())))));
    }
    return ListPart.table(
        "How far from parting",
        List.of(
            ListPart.Column.left("Span", 13),
            ListPart.Column.right("Rig with, N", 17),
            ListPart.Column.right("Worst, N", 17),
            ListPart.Column.right("in", 0),
            ListPart.Column.right("Wire", 14),
            ListPart.Column.right("Rope, knotted", 22),
            ListPart.Column.right("Insulator", 18),
            ListPart.Column.right("Support", 18),
            ListPart.Column.right("Parts first", 20),
            ListPart.Column.right("Weak link, N", 20)),
        rows,
        rows.isEmpty()
            ? List.of()
            : List.of(
                "Times the greatest tension in any weather; a support's against what it may take,"
                    + " not what breaks it. A weak link in a span's rope parts before all else."));
  }

  /** How a weight moves, and whether its rope has room for it. */
  private List<String> travel() {
    List<String> say = new ArrayList<>();
    for (HangParts.Holding h : model.attachments()) {
      if (h.kilograms() == null || h.weightUp() == null || h.weightDown() == null) {
        continue;
      }
      say.add(
          "Point "
              + h.point()
              + ": the weight rises up to "
              + figures.say(h.weightUp())
              + " and sinks up to "
              + figures.say(h.weightDown())
              + " in wind and sway"
              + (h.slackAtPulley() == null
                  ? "."
                  : "; at its lowest "
                      + figures.sayFound(Math.max(0, h.slackAtPulley()))
                      + " of rope is left between wire and pulley."));
    }
    return say;
  }

  ListPart sags() {
    List<List<ListPart.Cell>> rows = new ArrayList<>();
    for (HangParts.Sag s : model.sags()) {
      rows.add(
          List.of(
              ListPart.Cell.bold(s.span()),
              ListPart.Cell.of(figures.length(s.level())),
              ListPart.Cell.of(
                  Figures.bearing(s.bearing()) + " / " + Figures.bearing(s.magnetic())),
              ListPart.Cell.bold(figures.sight(s.middle())),
              ListPart.Cell.of(figures.height(s.heightMiddle())),
              ListPart.Cell.of(figures.length(s.blowOut()))));
    }
    return ListPart.table(
        "Spans, and sag to sight",
        List.of(
            ListPart.Column.left("Points", 11),
            ListPart.Column.right("Level", wide(11, 15)),
            ListPart.Column.right("Runs, true / compass", 0),
            ListPart.Column.right("Sag at middle", wide(16, 13)),
            ListPart.Column.right("Height there", 13),
            ListPart.Column.right("Gust, sideways", 14)),
        rows,
        List.of());
  }
}
