package spanwright.sheet;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.Collectors;
import java.util.stream.IntStream;

/** Tables and lists of the work: set-out, order, checks, cautions, hardware. Millimetres. */
final class WorkTables {
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
  WorkTables(SheetModel model, double width, double half) {
    this.model = model;
    this.figures = new Figures(model.options().units());
    this.width = width;
    this.half = half;
  }

  Flow.Block setOut() {
    SetOutParts.SetOut s = model.setOut();
    boolean third = s.c() != null;
    List<Setting.Column> columns =
        new ArrayList<>(
            List.of(
                Setting.Column.left("", 7),
                Setting.Column.left("Point", 0),
                Setting.Column.right("From " + s.a().letter(), 17),
                Setting.Column.right("From " + s.b().letter(), 17),
                Setting.Column.right("Side", 12),
                Setting.Column.right(third ? "Check, from " + s.c().letter() : "Check", 21),
                Setting.Column.right("Tapes cross at", 20),
                Setting.Column.right("Compass from " + s.a().letter() + ", true / magnetic", 28),
                Setting.Column.right("Height", 14)));
    List<List<Setting.Cell>> rows = new ArrayList<>();
    for (SetOutParts.Mark m : s.points()) {
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

  private static String known(SetOutParts.Known known) {
    return known.letter() + ": " + known.what();
  }

  private String better(SetOutParts.Mark m) {
    String why = m.blocked() != null ? m.blocked() : "tapes cross flat";
    SetOutParts.Pair p = m.better();
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

  Flow.Block order() {
    List<Setting.Item> items =
        IntStream.range(0, model.order().size())
            .mapToObj(
                i -> new Setting.Item(String.valueOf(i + 1), true, false, model.order().get(i)))
            .toList();
    return Setting.list("Order of work", items, half);
  }

  Flow.Block checks(String title, List<String> checks) {
    return Setting.list(
        title, checks.stream().map(c -> new Setting.Item("", true, false, c)).toList(), half);
  }

  Flow.Block cautions() {
    List<Setting.Item> items = new ArrayList<>();
    model.cautions().forEach(c -> items.add(new Setting.Item("", false, c.pressing(), c.text())));
    items.add(new Setting.Item("", false, false, model.decides()));
    return Setting.list("Cautions for this site", items, half);
  }

  Flow.Block notes() {
    List<Setting.Item> items =
        model.notes().stream().map(n -> new Setting.Item("", false, false, n)).toList();
    return Setting.list("Notes", items, half);
  }

  Flow.Block hardware() {
    List<List<Setting.Cell>> rows = new ArrayList<>();
    for (CutParts.Item i : model.hardware()) {
      String spares = i.spares() == 0 ? "" : " + " + i.spares();
      rows.add(
          List.of(
              Setting.Cell.bold(
                  i.length() == null ? i.count() + spares : figures.sayCut(i.length())),
              Setting.Cell.of(i.what() + (i.note() == null ? "" : ", " + i.note()))));
    }
    return Setting.table(
        "Hardware, with spares",
        List.of(Setting.Column.left("", 17), Setting.Column.left("", 0)),
        rows,
        List.of(),
        half);
  }

  Flow.Block sweep() {
    List<List<Setting.Cell>> rows = new ArrayList<>();
    for (WorkParts.Expected e : model.sweep()) {
      rows.add(
          List.of(
              Setting.Cell.of(e.band()),
              Setting.Cell.of(Figures.fixed(e.frequency(), 3)),
              Setting.Cell.of(Figures.impedance(e.resistance(), e.reactance())),
              Setting.Cell.of(Figures.fixed(e.lineSwr(), e.lineSwr() < 100 ? 1 : 0)),
              e.match() == null ? Setting.Cell.of("–") : Setting.Cell.state("", e.match())));
    }
    return Setting.table(
        "What the sweep should find, at the entry",
        List.of(
            Setting.Column.left("Band", 0),
            Setting.Column.right("MHz", 13),
            Setting.Column.right("Impedance", 27),
            Setting.Column.right("Line SWR", 15),
            Setting.Column.right("Match", 18)),
        rows,
        List.of(),
        half);
  }
}
