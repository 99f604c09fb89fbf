package spanwright.sheet;

import com.fasterxml.jackson.annotation.JsonIgnore;
import com.fasterxml.jackson.annotation.JsonProperty;
import java.util.List;
import spanwright.assess.Placement;
import spanwright.clearance.State;
import spanwright.plan.Catalogue;
import spanwright.plan.Plan;

/**
 * Everything a sheet says, before it is set out in any format. Lengths in metres, pulls in newtons,
 * whatever units the options ask the writers to use.
 *
 * @param format always "spanwright-sheet/1"
 * @param options it is set out with
 * @param head who, what and in what weather
 * @param overhead the lines that come before everything
 * @param wires pieces of wire to cut
 * @param feedLine the feed line to cut and how it runs
 * @param ropes ropes and guys to cut
 * @param hardware to lay out before work begins
 * @param attachments where it hangs and with what pull
 * @param sags to sight, span by span
 * @param margins how far each span is from parting
 * @param setOut every point by two tapes
 * @param sweep what the sweep at the station should find
 * @param order of work
 * @param before checks before anything is raised
 * @param after checks when all hangs
 * @param cautions for this site
 * @param notes what else was found worth saying about the placement, as sentences
 * @param alternatives what consents buy, side by side, the best first
 * @param alternativesSay what they come to, as sentences
 * @param people needed, as sentences
 * @param measures to take and write down, before and after
 * @param inspections when to look at it again
 * @param allowances what the cut lengths have been given
 * @param decides who has the last word
 * @param source what it was made from; left out of JSON
 */
public record SheetModel(
    String format,
    SheetOptions options,
    Head head,
    OverheadParts.Overhead overhead,
    List<CutParts.WirePiece> wires,
    CutParts.FeedLine feedLine,
    List<CutParts.Rope> ropes,
    List<CutParts.Item> hardware,
    List<HangParts.Holding> attachments,
    List<HangParts.Sag> sags,
    List<HangParts.Margins> margins,
    SetOutParts.SetOut setOut,
    List<WorkParts.Expected> sweep,
    List<String> order,
    List<String> before,
    List<String> after,
    List<WorkParts.Caution> cautions,
    List<String> notes,
    List<WorkParts.Alternative> alternatives,
    List<String> alternativesSay,
    List<String> people,
    List<WorkParts.Measure> measures,
    List<WorkParts.Inspection> inspections,
    List<CutParts.Allowance> allowances,
    String decides,
    @JsonIgnore Source source) {

  public SheetModel {
    wires = List.copyOf(wires);
    ropes = List.copyOf(ropes);
    hardware = List.copyOf(hardware);
    attachments = List.copyOf(attachments);
    sags = List.copyOf(sags);
    margins = List.copyOf(margins);
    sweep = List.copyOf(sweep);
    order = List.copyOf(order);
    before = List.copyOf(before);
    after = List.copyOf(after);
    cautions = List.copyOf(cautions);
    notes = List.copyOf(notes);
    alternatives = List.copyOf(alternatives);
    alternativesSay = List.copyOf(alternativesSay);
    people = List.copyOf(people);
    measures = List.copyOf(measures);
    inspections = List.copyOf(inspections);
    allowances = List.copyOf(allowances);
  }

  /** The list as it reads, part by part, every figure rounded and in the units asked for. */
  @JsonProperty
  public List<ListPart> printed() {
    return ListPart.of(this);
  }

  /** The lines at the right of the list's head, as they read. */
  @JsonProperty
  public List<String> headLines() {
    return ListPages.headLines(this);
  }

  /** What the sheet says in plain pairs, to hold a later one against; left out of no format. */
  @JsonProperty
  public List<Issued.Fact> facts() {
    return Facts.of(this);
  }

  SheetModel revised(String revision, String date, String since, List<String> changes) {
    return new SheetModel(
        format,
        options,
        head.revised(revision, date, since, changes),
        overhead,
        wires,
        feedLine,
        ropes,
        hardware,
        attachments,
        sags,
        margins,
        setOut,
        sweep,
        order,
        before,
        after,
        cautions,
        notes,
        alternatives,
        alternativesSay,
        people,
        measures,
        MeasureList.inspections(date),
        allowances,
        decides,
        source);
  }

  /**
   * What a sheet was made from.
   *
   * @param plan the survey and the brief
   * @param catalogue wires, lines, ropes, rules
   * @param placement as assessed
   */
  public record Source(Plan plan, Catalogue catalogue, Placement placement) {
    /** What is shown to people for an id of the plan. */
    String name(String id) {
      return Job.name(plan, id);
    }
  }

  /**
   * The head of the sheet.
   *
   * @param title of the plot
   * @param placement id of the placement
   * @param name "Placement 1: apex, 22.4 m of wire" without the length
   * @param shape shape word
   * @param wireLength of radiating wire in all [m]
   * @param bands names, in the order of the brief
   * @param power watts, peak envelope
   * @param state the worst of everything checked
   * @param verdict a sentence when the placement must not be rigged, or null
   * @param weather limits while working and in design, as sentences
   * @param savedAt when the plan was saved, or null
   * @param place where the plot lies, as it reads
   * @param revision letter
   * @param date when the revision was issued, or null when it has not been
   * @param since the revision it is held against, or null for the first
   * @param changes what it changes against that one, as sentences
   */
  public record Head(
      String title,
      String placement,
      String name,
      String shape,
      double wireLength,
      List<String> bands,
      double power,
      State state,
      String verdict,
      List<String> weather,
      String savedAt,
      String place,
      String revision,
      String date,
      String since,
      List<String> changes) {
    public Head {
      changes = List.copyOf(changes);
      bands = List.copyOf(bands);
      weather = List.copyOf(weather);
    }

    Head revised(String letter, String on, String from, List<String> what) {
      return new Head(
          title,
          placement,
          name,
          shape,
          wireLength,
          bands,
          power,
          state,
          verdict,
          weather,
          savedAt,
          place,
          letter,
          on,
          from,
          what);
    }
  }
}
