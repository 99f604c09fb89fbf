package spanwright.sheet;

import java.util.List;
import java.util.Locale;

/**
 * Writes the list as CSV: sections one after another, each with its name on a line, its headings,
 * its rows and an empty line. Everything the model says stands in it.
 */
final class CsvWriter {
  private final SheetModel model;
  private final CsvText csv;
  private final String unit;

  private CsvWriter(SheetModel model) {
    this.model = model;
    this.csv = new CsvText(model.options().units());
    this.unit = csv.unit();
  }

  static String write(SheetModel model) {
    return new CsvWriter(model).all();
  }

  private String all() {
    head();
    overhead();
    new CsvRig(model, csv).write();
    work();
    consents();
    csv.section("Cautions", "Text");
    model.cautions().forEach(c -> csv.row(c.text()));
    csv.row(model.decides());
    texts("Notes", model.notes());
    sweep();
    csv.section("Allowances", "What", "Value", "Unit", "Source");
    model
        .allowances()
        .forEach(a -> csv.row(a.what(), CsvText.plain(a.value(), 2), a.unit(), a.source()));
    if (model.head().since() != null) {
      csv.sentences("Changed since revision " + model.head().since(), model.head().changes());
    }
    return csv.all();
  }

  private void texts(String title, List<String> texts) {
    csv.section(title, "Text");
    texts.forEach(csv::row);
  }

  private void work() {
    texts("People", model.people());
    csv.sentences("Order of work", model.order());
    csv.sentences("Checks before", model.before());
    csv.sentences("Checks after", model.after());
    csv.section("Measure and write down", "When", "What", "Expect", "Found");
    model.measures().forEach(m -> csv.row(m.when(), m.what(), m.expect(), ""));
    csv.section("Look again", "When", "What");
    model.inspections().forEach(i -> csv.row(i.when(), i.what()));
  }

  private void consents() {
    csv.section(
        "What the consents buy",
        "Needs",
        "New masts" + unit,
        "Where",
        "Placement",
        "Shape",
        "Score (dB)",
        "This sheet");
    for (WorkParts.Alternative a : model.alternatives()) {
      csv.row(
          a.needs(),
          String.join("; ", a.mastHeights().stream().map(h -> csv.length(h)).toList()),
          String.join("; ", a.zones()),
          a.placement(),
          a.shape(),
          CsvText.plain(a.score(), 1),
          a.here() ? "yes" : "no");
    }
    model.alternativesSay().forEach(csv::row);
  }

  private void sweep() {
    csv.section(
        "Sweep", "Band", "Frequency (MHz)", "Resistance (ohm)", "Reactance (ohm)", "Line SWR");
    for (WorkParts.Expected e : model.sweep()) {
      csv.row(
          e.band(),
          CsvText.plain(e.frequency(), 4),
          CsvText.plain(e.resistance(), 1),
          CsvText.plain(e.reactance(), 1),
          CsvText.plain(e.lineSwr(), 2));
    }
  }

  private void head() {
    SheetModel.Head h = model.head();
    csv.section("Sheet", "Field", "Value");
    csv.row("Plot", h.title());
    csv.row("Placement", h.placement());
    csv.row("Shape", h.shape());
    csv.row("Wire in all" + unit, csv.length(h.wireLength()));
    csv.row("Bands", String.join("; ", h.bands()));
    csv.row("Power (W)", CsvText.plain(h.power(), 0));
    csv.row("State", h.state().name().toLowerCase(Locale.ROOT));
    if (h.verdict() != null) {
      csv.row("Verdict", h.verdict());
    }
    csv.row("Weather", String.join(" ", h.weather()));
    csv.row("Plan saved", h.savedAt() == null ? "" : h.savedAt());
    csv.row("Place", h.place());
    csv.row("Revision", h.revision());
    csv.row("Issued", h.date() == null ? "not yet" : h.date());
    if (h.since() != null) {
      csv.row("Held against revision", h.since());
    }
  }

  private void overhead() {
    csv.section(
        "Overhead lines",
        "Line",
        "Kind",
        "Lowest" + unit,
        "Highest" + unit,
        "Keep" + unit,
        "Nearest in the gust" + unit,
        "State",
        "If a wire lets go" + unit,
        "Required" + unit,
        "State",
        "If a mast falls" + unit,
        "Required" + unit,
        "State",
        "Smaller distance allowed by");
    for (OverheadParts.Line l : model.overhead().lines()) {
      csv.row(
          l.name(),
          l.kind(),
          csv.length(l.lowest()),
          csv.length(l.highest()),
          l.keep() == null ? "not computed" : csv.required(l.keep()),
          found(l.nearest()),
          state(l.nearest()),
          found(l.wireLetGo()),
          l.wireLetGo() == null ? "" : csv.required(l.wireLetGo().required()),
          state(l.wireLetGo()),
          found(l.mastFalls()),
          l.mastFalls() == null ? "" : csv.required(l.mastFalls().required()),
          state(l.mastFalls()),
          l.authority() == null ? "" : l.authority());
    }
    model.overhead().say().forEach(csv::row);
  }

  private String found(OverheadParts.Reach reach) {
    return reach == null ? "" : csv.found(reach.distance());
  }

  private static String state(OverheadParts.Reach reach) {
    return reach == null ? "" : reach.state().name().toLowerCase(Locale.ROOT);
  }
}
