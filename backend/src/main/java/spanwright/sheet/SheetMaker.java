package spanwright.sheet;

import java.util.ArrayList;
import java.util.List;
import spanwright.assess.Placement;
import spanwright.clearance.State;
import spanwright.plan.Band;
import spanwright.plan.Catalogue;
import spanwright.plan.Plan;

/** Puts the parts of the model together. */
final class SheetMaker {
  private static final String FORMAT = "spanwright-sheet/1";

  /** Wind in which ropes can still be handled; common practice, no source [m/s]. */
  private static final int WORKING_WIND = 5;

  private static final String DECIDES =
      "The line's owner, the local code and licensed practice decide; this sheet does not.";

  private SheetMaker() {}

  static SheetModel make(
      Plan plan,
      Catalogue catalogue,
      Placement placement,
      SheetOptions options,
      List<Placement> others) {
    Job job = new Job(plan, catalogue, placement, options);
    OverheadParts.Overhead overhead = OverheadList.of(job);
    SetOutParts.SetOut setOut = SetOutList.of(job);
    List<CutParts.WirePiece> wires = WireList.of(job);
    CutParts.FeedLine line = LineRun.of(job);
    List<CutParts.Rope> ropes = RopeList.of(job);
    List<HangParts.Sag> sags = HangingList.sags(job);
    WorkOrder work = new WorkOrder(job, setOut, ropes, sags);
    List<WorkParts.Alternative> alternatives = ConsentList.of(job, others);
    MeasureList measures = new MeasureList(job, overhead, setOut, sags);
    return new SheetModel(
        FORMAT,
        options,
        head(job, options),
        overhead,
        wires,
        line,
        ropes,
        HardwareList.of(job, wires, line, ropes),
        HangingList.holdings(job, setOut),
        sags,
        HangingList.margins(job),
        setOut,
        sweep(job),
        work.steps(),
        work.before(),
        work.after(),
        CautionList.of(job, overhead),
        placement.notes(),
        alternatives,
        ConsentList.say(job, alternatives),
        work.people(),
        measures.list(),
        MeasureList.inspections(options.date()),
        Allowances.list(),
        DECIDES,
        new SheetModel.Source(plan, catalogue, placement));
  }

  private static SheetModel.Head head(Job job, SheetOptions options) {
    Placement placement = job.placement;
    String number = placement.rank() > 0 ? "Placement " + placement.rank() : "Placement";
    double gust = job.plan.brief().rules() == null ? 25 : job.plan.brief().rules().wind();
    double ice = job.plan.brief().rules() == null ? 0 : job.plan.brief().rules().ice();
    List<String> weather = new ArrayList<>();
    weather.add(
        "Work only in wind ≤ " + WORKING_WIND + " m/s, dry, by daylight, with no thunder about.");
    weather.add(
        "Hangs to a gust of "
            + Figures.whole(gust)
            + " m/s"
            + (ice > 0 ? " and " + Figures.whole(ice) + " mm of ice." : "; ice not reckoned."));
    return new SheetModel.Head(
        job.plan.title() == null || job.plan.title().isBlank() ? "Untitled plot" : job.plan.title(),
        placement.id(),
        number + ": " + placement.shape(),
        placement.shape(),
        placement.conductors().stream().mapToDouble(Placement.Conductor::length).sum(),
        job.plan.brief().bands().stream().map(Band::name).toList(),
        job.plan.brief().power(),
        placement.state(),
        placement.state() == State.FOUL
            ? "Foul: this placement breaks a rule. Do not rig it."
            : null,
        weather,
        options.savedAt(),
        place(job.plan),
        options.revision(),
        options.date(),
        null,
        List.of());
  }

  private static List<WorkParts.Expected> sweep(Job job) {
    return job.placement.bands().stream()
        .filter(b -> b.atStation() != null && b.atStation().size() == 2)
        .map(
            b ->
                new WorkParts.Expected(
                    b.name(),
                    b.frequency(),
                    b.atStation().get(0),
                    b.atStation().get(1),
                    b.lineSwr(),
                    b.matching() == null ? null : b.matching().state()))
        .toList();
  }

  /** Coordinates to about a metre, or that there are none. */
  private static String place(Plan plan) {
    Double latitude = plan.site().latitude();
    Double longitude = plan.site().longitude();
    if (latitude == null || longitude == null) {
      return "no coordinates in the survey";
    }
    return Figures.fixed(Math.abs(latitude), 5)
        + "° "
        + (latitude < 0 ? "S" : "N")
        + ", "
        + Figures.fixed(Math.abs(longitude), 5)
        + "° "
        + (longitude < 0 ? "W" : "E");
  }
}
