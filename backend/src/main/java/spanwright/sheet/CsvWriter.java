package spanwright.sheet;

import java.util.List;
import java.util.Locale;

/**
 * Writes the list as CSV (RFC 4180): sections one after another, each with its name on a line, its
 * headings, its rows and an empty line. Fields that hold a comma, a quote or a line break are
 * quoted; a field of words that a spreadsheet would take for a formula is given an apostrophe.
 */
final class CsvWriter {
  private final SheetModel model;
  private final Figures figures;
  private final String unit;
  private final StringBuilder out = new StringBuilder();

  private CsvWriter(SheetModel model) {
    this.model = model;
    this.figures = new Figures(model.options().units());
    this.unit = " (" + figures.unit() + ")";
  }

  static String write(SheetModel model) {
    return new CsvWriter(model).all();
  }

  private String all() {
    head();
    overhead();
    cuts();
    rigging();
    setOut();
    sentences("Order of work", model.order());
    sentences("Checks before", model.before());
    sentences("Checks after", model.after());
    section("Cautions", "Text");
    model.cautions().forEach(c -> row(c.text()));
    row(model.decides());
    section("Notes", "Text");
    model.notes().forEach(this::row);
    section("Sweep", "Band", "Frequency (MHz)", "Resistance (ohm)", "Reactance (ohm)", "Line SWR");
    for (WorkParts.Expected e : model.sweep()) {
      row(
          e.band(),
          plain(e.frequency(), 4),
          plain(e.resistance(), 1),
          plain(e.reactance(), 1),
          plain(e.lineSwr(), 2));
    }
    section("Allowances", "What", "Value", "Unit", "Source");
    model.allowances().forEach(a -> row(a.what(), plain(a.value(), 2), a.unit(), a.source()));
    if (model.head().since() != null) {
      sentences("Changed since revision " + model.head().since(), model.head().changes());
    }
    return out.toString();
  }

  private void head() {
    SheetModel.Head h = model.head();
    section("Sheet", "Field", "Value");
    row("Plot", h.title());
    row("Placement", h.placement());
    row("Shape", h.shape());
    row("Wire in all" + unit, length(h.wireLength()));
    row("Bands", String.join("; ", h.bands()));
    row("Power (W)", plain(h.power(), 0));
    row("State", h.state().name().toLowerCase(Locale.ROOT));
    if (h.verdict() != null) {
      row("Verdict", h.verdict());
    }
    row("Weather", String.join(" ", h.weather()));
    row("Plan saved", h.savedAt() == null ? "" : h.savedAt());
    row("Revision", h.revision());
    row("Issued", h.date() == null ? "not yet" : h.date());
  }

  private void overhead() {
    section(
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
      row(
          l.name(),
          l.kind(),
          length(l.lowest()),
          length(l.highest()),
          l.keep() == null ? "not computed" : required(l.keep()),
          found(l.nearest()),
          state(l.nearest()),
          found(l.wireLetGo()),
          l.wireLetGo() == null ? "" : required(l.wireLetGo().required()),
          state(l.wireLetGo()),
          found(l.mastFalls()),
          l.mastFalls() == null ? "" : required(l.mastFalls().required()),
          state(l.mastFalls()),
          l.authority() == null ? "" : l.authority());
    }
    model.overhead().say().forEach(this::row);
  }

  private String found(OverheadParts.Reach reach) {
    return reach == null
        ? ""
        : metric() ? plain(floor(reach.distance()), 2) : figures.found(reach.distance());
  }

  private static String state(OverheadParts.Reach reach) {
    return reach == null ? "" : reach.state().name().toLowerCase(Locale.ROOT);
  }

  private void cuts() {
    section(
        "Wire",
        "Mark",
        "Piece",
        "Kind",
        "Finished" + unit,
        "Turns back" + unit,
        "Trim" + unit,
        "Cut" + unit);
    for (CutParts.WirePiece w : model.wires()) {
      row(
          w.mark(),
          w.piece(),
          w.kind(),
          length(w.finished()),
          length(w.turnsBack()),
          length(w.trim()),
          required(w.cut()));
    }
    CutParts.FeedLine line = model.feedLine();
    section(
        "Feed line",
        "Mark",
        "Kind",
        "Run" + unit,
        "Slack" + unit,
        "Finished" + unit,
        "Made off" + unit,
        "Cut" + unit,
        "Stand-offs",
        "Notes");
    row(
        line.mark(),
        line.kind(),
        length(line.run()),
        length(line.slack()),
        length(line.finished()),
        length(line.madeOff()),
        required(line.cut()),
        String.valueOf(line.standOffs()),
        String.join(" ", line.notes()));
    section(
        "Rope",
        "Mark",
        "Kind",
        "From",
        "Over",
        "To",
        "Made off",
        "Run" + unit,
        "Knots and tail" + unit,
        "Cut" + unit);
    for (CutParts.Rope r : model.ropes()) {
      row(
          r.mark(),
          r.kind(),
          r.from(),
          r.over() == null ? "" : r.over(),
          r.to(),
          r.madeOff(),
          length(r.run()),
          length(r.allowance()),
          metric() ? plain(r.cut(), 1) : figures.ropeCut(r.cut()));
    }
    section("Hardware", "What", "Count", "In all" + unit, "Spares", "Note");
    for (CutParts.Item i : model.hardware()) {
      row(
          i.what(),
          String.valueOf(i.count()),
          i.length() == null ? "" : required(i.length()),
          String.valueOf(i.spares()),
          i.note() == null ? "" : i.note());
    }
  }

  private void rigging() {
    section(
        "Attachments",
        "Point",
        "Name",
        "Above ground there" + unit,
        "Above ground at " + model.setOut().a().letter() + unit,
        "Held",
        "Pull calm (N)",
        "Pull in gust (N)",
        "May take (N)",
        "State",
        "Hang (kg)");
    for (HangParts.Holding h : model.attachments()) {
      row(
          String.valueOf(h.point()),
          h.name(),
          length(h.aboveGround()),
          length(h.aboveDatum()),
          h.held(),
          plain(h.pull(), 0),
          plain(h.pullInWind(), 0),
          h.mayTake() == null ? "not checked" : plain(h.mayTake(), 0),
          h.mayTake() == null ? "" : h.state().name().toLowerCase(Locale.ROOT),
          h.kilograms() == null ? "" : plain(h.kilograms(), 1));
    }
    section(
        "Spans",
        "Points",
        "Level" + unit,
        "True bearing (degrees)",
        "Compass (degrees)",
        "Sag at middle" + unit,
        "Greatest sag" + unit,
        "Height at middle" + unit,
        "Sag in gust" + unit,
        "Sideways in gust" + unit);
    for (HangParts.Sag s : model.sags()) {
      row(
          s.span(),
          length(s.level()),
          plain(s.bearing(), 0),
          plain(s.magnetic(), 0),
          length(s.middle()),
          length(s.greatest()),
          length(s.heightMiddle()),
          length(s.inGust()),
          length(s.blowOut()));
    }
  }

  private void setOut() {
    SetOutParts.SetOut s = model.setOut();
    section("Known points", "Letter", "What", "x (m)", "y (m)");
    for (SetOutParts.Known k : new SetOutParts.Known[] {s.a(), s.b(), s.c()}) {
      if (k != null) {
        row(k.letter(), k.what(), plain(k.at().x(), 3), plain(k.at().y(), 3));
      }
    }
    section(
        "Set-out",
        "Point",
        "Name",
        "From " + s.a().letter() + unit,
        "From " + s.b().letter() + unit,
        "Side",
        "Check" + unit,
        "Tapes cross (degrees)",
        "True bearing from " + s.a().letter() + " (degrees)",
        "Compass (degrees)",
        "Height" + unit,
        "x (m)",
        "y (m)",
        "In the way",
        "Better");
    for (SetOutParts.Mark m : s.points()) {
      row(
          String.valueOf(m.number()),
          m.name(),
          length(m.fromA()),
          length(m.fromB()),
          m.side(),
          m.check() == null ? "" : length(m.check()),
          plain(m.crossing(), 0) + (m.flat() ? " flat" : ""),
          plain(m.bearing(), 0),
          plain(m.magnetic(), 0),
          length(m.height()),
          plain(m.at().x(), 3),
          plain(m.at().y(), 3),
          m.blocked() == null ? "" : m.blocked(),
          m.better() == null
              ? ""
              : length(m.better().fromTape())
                  + " from "
                  + m.better().from()
                  + " and "
                  + length(m.better().withTape())
                  + " from "
                  + m.better().with());
    }
    s.notes().forEach(this::row);
  }

  private void sentences(String title, List<String> sentences) {
    section(title, "Step", "Text");
    for (int i = 0; i < sentences.size(); i++) {
      row(String.valueOf(i + 1), sentences.get(i));
    }
  }

  private boolean metric() {
    return model.options().units() == SheetOptions.Units.METRES;
  }

  private String length(double metres) {
    return metric() ? plain(metres, 2) : figures.length(metres);
  }

  private String required(double metres) {
    return metric() ? plain(Figures.upToCentimetre(metres), 2) : figures.required(metres);
  }

  private static double floor(double metres) {
    return Math.floor(metres * 100 + 1e-6) / 100;
  }

  /** A number that a program reads: point, plain minus, no spaces. */
  private static String plain(double value, int decimals) {
    String text = String.format(Locale.ROOT, "%." + decimals + "f", value);
    return text.matches("-0(\\.0+)?") ? text.substring(1) : text;
  }

  private void section(String title, String... headings) {
    if (!out.isEmpty()) {
      out.append("\r\n");
    }
    row(title);
    row(headings);
  }

  private void row(String... fields) {
    for (int i = 0; i < fields.length; i++) {
      out.append(i == 0 ? "" : ",").append(field(fields[i]));
    }
    out.append("\r\n");
  }

  /** A field, made harmless to spreadsheets and quoted where it has to be. */
  static String field(String text) {
    String safe = text;
    boolean number = text.matches("-?\\d+(\\.\\d+)?");
    if (!number && !text.isEmpty() && "=+-@\t\r\n".indexOf(text.charAt(0)) >= 0) {
      safe = "'" + text;
    }
    if (safe.contains(",") || safe.contains("\"") || safe.contains("\n") || safe.contains("\r")) {
      return '"' + safe.replace("\"", "\"\"") + '"';
    }
    return safe;
  }
}
