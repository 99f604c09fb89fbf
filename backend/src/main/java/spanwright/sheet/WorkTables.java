package spanwright.sheet;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.Collectors;
import java.util.stream.IntStream;

/** Tables and lists of the work: set-out, order, checks, cautions, hardware. Millimetres. */
final class WorkTables {
  private final SheetModel model;
  private final Figures figures;

  WorkTables(SheetModel model) {
    this.model = model;
    this.figures = new Figures(model.options().units());
  }

  ListPart setOut() {
    SetOutParts.SetOut s = model.setOut();
    boolean third = s.c() != null;
    List<ListPart.Column> columns =
        new ArrayList<>(
            List.of(
                ListPart.Column.left("", 7),
                ListPart.Column.left("Point", 0),
                ListPart.Column.right("From " + s.a().letter(), 17),
                ListPart.Column.right("From " + s.b().letter(), 17),
                ListPart.Column.right("Side", 12),
                ListPart.Column.right(third ? "Check, from " + s.c().letter() : "Check", 21),
                ListPart.Column.right("Tapes cross at", 20),
                ListPart.Column.right("Compass from " + s.a().letter() + ", true / magnetic", 28),
                ListPart.Column.right("Height", 14)));
    List<List<ListPart.Cell>> rows = new ArrayList<>();
    for (SetOutParts.Mark m : s.points()) {
      rows.add(
          List.of(
              ListPart.Cell.square(m.number()),
              ListPart.Cell.of(m.name() + better(m)),
              ListPart.Cell.bold(figures.length(m.fromA())),
              ListPart.Cell.bold(figures.length(m.fromB())),
              ListPart.Cell.of(m.side()),
              ListPart.Cell.of(m.check() == null ? "–" : figures.length(m.check())),
              new ListPart.Cell(
                  Figures.degrees(m.crossing()) + (m.flat() ? " flat" : ""), m.flat(), null, false),
              ListPart.Cell.of(
                  Figures.bearing(m.bearing()) + " / " + Figures.bearing(m.magnetic())),
              ListPart.Cell.of(figures.height(m.height()))));
    }
    List<String> notes = new ArrayList<>();
    notes.add(known(s.a()) + "; " + known(s.b()) + (third ? "; " + known(s.c()) : "") + ".");
    notes.addAll(
        List.of(
            String.join(" ", s.notes())
                + " Side: walking from "
                + s.a().letter()
                + " to "
                + s.b().letter()
                + "."));
    return ListPart.table("Set-out by two tapes", columns, rows, notes);
  }

  private static String known(SetOutParts.Known known) {
    return known.letter() + ": " + known.what();
  }

  /** Behind a point's name where the tapes from A and B do not serve. */
  private String better(SetOutParts.Mark m) {
    if (!m.flat() && m.blocked() == null) {
      return "";
    }
    SetOutParts.Pair p = m.better();
    String why = m.blocked() == null ? "" : ", " + m.blocked();
    return why
        + (p == null
            ? m.onBuilding() ? "" : ": measure twice"
            : ": rather "
                + figures.length(p.fromTape())
                + " from "
                + p.from()
                + " with "
                + figures.length(p.withTape())
                + " from "
                + p.with()
                + ", at "
                + Figures.degrees(p.crossing()));
  }

  ListPart order() {
    List<ListPart.Item> items =
        IntStream.range(0, model.order().size())
            .mapToObj(
                i -> new ListPart.Item(String.valueOf(i + 1), true, false, model.order().get(i)))
            .toList();
    return ListPart.list("Order of work", items);
  }

  ListPart checks(String title, List<String> checks) {
    return ListPart.list(
        title, checks.stream().map(c -> new ListPart.Item("", true, false, c)).toList());
  }

  ListPart cautions() {
    List<ListPart.Item> items = new ArrayList<>();
    model.cautions().forEach(c -> items.add(new ListPart.Item("", false, c.pressing(), c.text())));
    items.add(new ListPart.Item("", false, false, model.decides()));
    return ListPart.list("Cautions for this site", items);
  }

  ListPart people() {
    return ListPart.list(
        "People",
        model.people().stream().map(p -> new ListPart.Item("", false, false, p)).toList());
  }

  /** Figure expected, and a place to write what was found. */
  ListPart measures() {
    List<List<ListPart.Cell>> rows = new ArrayList<>();
    for (WorkParts.Measure m : model.measures()) {
      rows.add(
          List.of(
              ListPart.Cell.of(m.when()),
              ListPart.Cell.of(m.what()),
              ListPart.Cell.bold(m.expect()),
              ListPart.Cell.of("__________")));
    }
    return ListPart.table(
        "Measure and write down",
        List.of(
            ListPart.Column.left("When", 13),
            ListPart.Column.left("What", 0),
            ListPart.Column.right("Expect", 24),
            ListPart.Column.right("Found", 24)),
        rows,
        List.of());
  }

  ListPart inspections() {
    return ListPart.list(
        "Look again",
        model.inspections().stream()
            .map(i -> new ListPart.Item("", true, false, capital(i.when()) + ": " + i.what() + "."))
            .toList());
  }

  private static String capital(String text) {
    return Character.toUpperCase(text.charAt(0)) + text.substring(1);
  }

  ListPart alternatives() {
    List<List<ListPart.Cell>> rows = new ArrayList<>();
    for (WorkParts.Alternative a : model.alternatives()) {
      String masts =
          a.mastHeights().isEmpty()
              ? "none"
              : a.mastHeights().stream().map(figures::height).collect(Collectors.joining(" + "));
      String which = a.placement() + ", " + a.shape() + (a.here() ? ", this sheet" : "");
      rows.add(
          List.of(
              new ListPart.Cell(a.needs(), a.here(), null, false),
              ListPart.Cell.of(masts),
              ListPart.Cell.of(which),
              ListPart.Cell.bold((a.score() >= 0 ? "+" : "") + Figures.fixed(a.score(), 1))));
    }
    return ListPart.table(
        "What the consents buy",
        List.of(
            ListPart.Column.left("Needs", 0),
            ListPart.Column.right("New mast", 17),
            ListPart.Column.right("Placement", 30),
            ListPart.Column.right("dB", 11)),
        rows,
        model.alternativesSay());
  }

  ListPart changes() {
    String title =
        model.head().since() == null ? "Changes" : "Changed since revision " + model.head().since();
    return ListPart.list(
        title,
        model.head().changes().stream().map(c -> new ListPart.Item("", false, false, c)).toList());
  }

  ListPart notes() {
    List<ListPart.Item> items =
        model.notes().stream().map(n -> new ListPart.Item("", false, false, n)).toList();
    return ListPart.list("Notes", items);
  }

  ListPart hardware() {
    List<List<ListPart.Cell>> rows = new ArrayList<>();
    for (CutParts.Item i : model.hardware()) {
      String spares = i.spares() == 0 ? "" : " + " + i.spares();
      rows.add(
          List.of(
              ListPart.Cell.bold(
                  i.length() == null ? i.count() + spares : figures.sayCut(i.length())),
              ListPart.Cell.of(i.what() + (i.note() == null ? "" : ", " + i.note()))));
    }
    return ListPart.table(
        "Hardware, with spares",
        List.of(ListPart.Column.left("", 17), ListPart.Column.left("", 0)),
        rows,
        List.of());
  }

  ListPart sweep() {
    List<List<ListPart.Cell>> rows = new ArrayList<>();
    for (WorkParts.Expected e : model.sweep()) {
      rows.add(
          List.of(
              ListPart.Cell.of(e.band()),
              ListPart.Cell.of(Figures.fixed(e.frequency(), 3)),
              ListPart.Cell.of(Figures.impedance(e.resistance(), e.reactance())),
              ListPart.Cell.of(Figures.fixed(e.lineSwr(), e.lineSwr() < 100 ? 1 : 0)),
              e.match() == null ? ListPart.Cell.of("–") : ListPart.Cell.state("", e.match())));
    }
    return ListPart.table(
        "What the sweep should find, at the entry",
        List.of(
            ListPart.Column.left("Band", 0),
            ListPart.Column.right("MHz", 13),
            ListPart.Column.right("Impedance", 27),
            ListPart.Column.right("Line SWR", 15),
            ListPart.Column.right("Match", 18)),
        rows,
        List.of());
  }
}
