package spanwright.sheet;

import java.util.Locale;

/** Writes the parts of the CSV that are cut, hung and set out. */
final class CsvRig {
  private final SheetModel model;
  private final CsvText csv;
  private final String unit;

  CsvRig(SheetModel model, CsvText csv) {
    this.model = model;
    this.csv = csv;
    this.unit = csv.unit();
  }

  void write() {
    cuts();
    rigging();
    setOut();
  }

  private void cuts() {
    csv.section(
        "Wire",
        "Mark",
        "Piece",
        "Kind",
        "Finished" + unit,
        "Turns back" + unit,
        "Trim" + unit,
        "Cut" + unit);
    for (CutParts.WirePiece w : model.wires()) {
      csv.row(
          w.mark(),
          w.piece(),
          w.kind(),
          csv.length(w.finished()),
          csv.length(w.turnsBack()),
          csv.length(w.trim()),
          csv.required(w.cut()));
    }
    CutParts.FeedLine line = model.feedLine();
    csv.section(
        "Feed line",
        "Mark",
        "Kind",
        "Run" + unit,
        "Slack" + unit,
        "Finished" + unit,
        "Made off" + unit,
        "Cut" + unit,
        "Stand-offs",
        "Stand-offs hold off" + unit,
        "Notes");
    csv.row(
        line.mark(),
        line.kind(),
        csv.length(line.run()),
        csv.length(line.slack()),
        csv.length(line.finished()),
        csv.length(line.madeOff()),
        csv.required(line.cut()),
        String.valueOf(line.standOffs()),
        csv.required(line.standOffReach()),
        String.join(" ", line.notes()));
    csv.section("Stand-offs", "Number", "Along the line from the entry" + unit);
    for (int i = 0; i < line.standOffsAt().size(); i++) {
      csv.row(String.valueOf(i + 1), csv.length(line.standOffsAt().get(i).doubleValue()));
    }
    csv.section(
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
      csv.row(
          r.mark(),
          r.kind(),
          r.from(),
          r.over() == null ? "" : r.over(),
          r.to(),
          r.madeOff(),
          csv.length(r.run()),
          csv.length(r.allowance()),
          csv.metric() ? CsvText.plain(r.cut(), 1) : csv.figures().ropeCut(r.cut()));
    }
    csv.section("Hardware", "What", "Count", "In all" + unit, "Spares", "Note");
    for (CutParts.Item i : model.hardware()) {
      csv.row(
          i.what(),
          String.valueOf(i.count()),
          i.length() == null ? "" : csv.required(i.length()),
          String.valueOf(i.spares()),
          i.note() == null ? "" : i.note());
    }
  }

  private void rigging() {
    csv.section(
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
        "Hang (kg)",
        "Margin of the support",
        "Weight rises" + unit,
        "Weight sinks" + unit,
        "Rope left at the pulley" + unit,
        "How");
    for (HangParts.Holding h : model.attachments()) {
      csv.row(
          String.valueOf(h.point()),
          h.name(),
          csv.length(h.aboveGround()),
          csv.length(h.aboveDatum()),
          h.held(),
          CsvText.plain(h.pull(), 0),
          CsvText.plain(h.pullInWind(), 0),
          h.mayTake() == null ? "not checked" : CsvText.plain(h.mayTake(), 0),
          h.mayTake() == null ? "" : h.state().name().toLowerCase(Locale.ROOT),
          h.kilograms() == null ? "" : CsvText.plain(h.kilograms(), 1),
          CsvText.down(h.margin(), 1),
          csv.length(h.weightUp()),
          csv.length(h.weightDown()),
          h.slackAtPulley() == null ? "" : csv.found(Math.max(0, h.slackAtPulley())),
          h.method());
    }
    csv.section(
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
      csv.row(
          s.span(),
          csv.length(s.level()),
          CsvText.plain(s.bearing(), 0),
          CsvText.plain(s.magnetic(), 0),
          csv.length(s.middle()),
          csv.length(s.greatest()),
          csv.length(s.heightMiddle()),
          csv.length(s.inGust()),
          csv.length(s.blowOut()));
    }
    csv.section(
        "Margins",
        "Points",
        "Rig with (N)",
        "Worst (N)",
        "In",
        "Wire",
        "Rope with knots",
        "Insulator",
        "Support",
        "Parts first",
        "Weak link (N)");
    for (HangParts.Margins m : model.margins()) {
      csv.row(
          m.span(),
          CsvText.plain(m.set(), 0),
          m.worst() == null ? "" : CsvText.plain(Math.ceil(m.worst()), 0),
          m.weather() == null ? "" : m.weather(),
          CsvText.down(m.wire(), 1),
          CsvText.down(m.rope(), 1),
          CsvText.down(m.insulator(), 1),
          CsvText.down(m.support(), 1),
          m.partsFirst(),
          CsvText.down(m.weakLink(), 0));
    }
  }

  private void setOut() {
    SetOutParts.SetOut s = model.setOut();
    csv.section("Known points", "Letter", "What", "x (m)", "y (m)");
    SetOutParts.Known proposed = s.proposed() == null ? null : s.proposed().known();
    for (SetOutParts.Known k : new SetOutParts.Known[] {s.a(), s.b(), s.c(), proposed}) {
      if (k != null) {
        csv.row(k.letter(), k.what(), CsvText.plain(k.at().x(), 3), CsvText.plain(k.at().y(), 3));
      }
    }
    csv.section(
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
      csv.row(
          String.valueOf(m.number()),
          m.name(),
          csv.length(m.fromA()),
          csv.length(m.fromB()),
          m.side(),
          m.check() == null ? "" : csv.length(m.check()),
          CsvText.plain(m.crossing(), 0) + (m.flat() ? " flat" : ""),
          CsvText.plain(m.bearing(), 0),
          CsvText.plain(m.magnetic(), 0),
          csv.length(m.height()),
          CsvText.plain(m.at().x(), 3),
          CsvText.plain(m.at().y(), 3),
          m.blocked() == null ? "" : m.blocked(),
          m.better() == null
              ? ""
              : csv.length(m.better().fromTape())
                  + " from "
                  + m.better().from()
                  + " and "
                  + csv.length(m.better().withTape())
                  + " from "
                  + m.better().with());
    }
    s.notes().forEach(csv::row);
  }
}
