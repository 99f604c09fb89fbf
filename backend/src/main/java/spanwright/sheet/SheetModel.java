package spanwright.sheet;

import com.fasterxml.jackson.annotation.JsonIgnore;
import java.util.List;
import spanwright.assess.Placement;
import spanwright.clearance.State;
import spanwright.plan.Catalogue;
import spanwright.plan.Place;
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
 * @param setOut every point by two tapes
 * @param sweep what the sweep at the station should find
 * @param order of work
 * @param before checks before anything is raised
 * @param after checks when all hangs
 * @param cautions for this site
 * @param notes what else was found worth saying about the placement, as sentences
 * @param allowances what the cut lengths have been given
 * @param decides who has the last word
 * @param source what it was made from; left out of JSON
 */
public record SheetModel(
    String format,
    SheetOptions options,
    Head head,
    Overhead overhead,
    List<WirePiece> wires,
    FeedLine feedLine,
    List<Rope> ropes,
    List<Item> hardware,
    List<Holding> attachments,
    List<Sag> sags,
    SetOut setOut,
    List<Expected> sweep,
    List<String> order,
    List<String> before,
    List<String> after,
    List<Caution> cautions,
    List<String> notes,
    List<Allowance> allowances,
    String decides,
    @JsonIgnore Source source) {

  public SheetModel {
    wires = List.copyOf(wires);
    ropes = List.copyOf(ropes);
    hardware = List.copyOf(hardware);
    attachments = List.copyOf(attachments);
    sags = List.copyOf(sags);
    sweep = List.copyOf(sweep);
    order = List.copyOf(order);
    before = List.copyOf(before);
    after = List.copyOf(after);
    cautions = List.copyOf(cautions);
    notes = List.copyOf(notes);
    allowances = List.copyOf(allowances);
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
   * @param revision letter
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
      String revision) {
    public Head {
      bands = List.copyOf(bands);
      weather = List.copyOf(weather);
    }
  }

  /**
   * Overhead lines, first of all.
   *
   * @param say what to read aloud before work
   * @param lines every line of the plan, power before telephone, the nearest first
   */
  public record Overhead(List<String> say, List<Line> lines) {
    public Overhead {
      say = List.copyOf(say);
      lines = List.copyOf(lines);
    }
  }

  /**
   * One overhead line.
   *
   * @param id in the plan
   * @param name shown to people
   * @param kind word of the plan format
   * @param lowest height above the ground under its points [m]
   * @param highest likewise
   * @param keep kept distance [m], or null when no check of it was made
   * @param nearest of anything of ours, calm or in the gust; null when none was made
   * @param wireLetGo if a wire lets go; null when the rule asks nothing
   * @param mastFalls if a mast falls; null when the rule asks nothing
   * @param authority who allowed a smaller distance and when, or null
   */
  public record Line(
      String id,
      String name,
      String kind,
      double lowest,
      double highest,
      Double keep,
      Reach nearest,
      Reach wireLetGo,
      Reach mastFalls,
      String authority) {}

  /**
   * A distance to an overhead line against what is required.
   *
   * @param what which part of ours
   * @param distance found [m]
   * @param required [m]
   * @param state clear, tight or foul
   */
  public record Reach(String what, double distance, double required, State state) {}

  /**
   * A piece of wire.
   *
   * @param mark "W1"
   * @param piece from where to where
   * @param wire catalogue id
   * @param kind its name
   * @param finished length as it hangs [m]
   * @param turns number of ends turned back
   * @param turnsBack for all of them [m]
   * @param trim left for trimming [m]
   * @param cut length, to 10 mm upward [m]
   */
  public record WirePiece(
      String mark,
      String piece,
      String wire,
      String kind,
      double finished,
      int turns,
      double turnsBack,
      double trim,
      double cut) {}

  /**
   * The feed line.
   *
   * @param mark "L1"
   * @param line catalogue id
   * @param kind its name
   * @param run along its path, feedpoint to entry [m]
   * @param slack over the run [m]; negative when the line is too short
   * @param finished electrical length, feedpoint to entry [m]
   * @param madeOff for its two ends [m]
   * @param cut length, to 10 mm upward [m]
   * @param standOffs number
   * @param standOffReach how far they hold it off [m]
   * @param notes how it runs, as sentences
   */
  public record FeedLine(
      String mark,
      String line,
      String kind,
      double run,
      double slack,
      double finished,
      double madeOff,
      double cut,
      int standOffs,
      double standOffReach,
      List<String> notes) {
    public FeedLine {
      notes = List.copyOf(notes);
    }
  }

  /**
   * A rope or guy.
   *
   * @param mark "R1" or "G1"
   * @param rope catalogue id
   * @param kind its name
   * @param from where it begins
   * @param over what it runs over, or null
   * @param to where it goes
   * @param madeOff how it is made off there
   * @param run without allowances [m]
   * @param allowance for knots, cleat and hand [m]
   * @param cut length, rounded up to 0.5 m [m]
   */
  public record Rope(
      String mark,
      String rope,
      String kind,
      String from,
      String over,
      String to,
      String madeOff,
      double run,
      double allowance,
      double cut) {}

  /**
   * Hardware.
   *
   * @param what it is
   * @param count needed
   * @param length in all where it goes by length [m], or null
   * @param spares to bring besides
   * @param note or null
   */
  public record Item(String what, int count, Double length, int spares, String note) {}

  /**
   * A holding point.
   *
   * @param point its number in the set-out
   * @param on id in the plan
   * @param name shown to people
   * @param aboveGround height above the ground there [m]
   * @param aboveDatum height above the ground at the first datum [m]
   * @param held "weight", "tied" or "centre"
   * @param pull in calm air [N]
   * @param pullInWind in the design gust [N]
   * @param mayTake [N], or null when not known and so not checked
   * @param state pulls against what it may take
   * @param kilograms to hang, or null
   */
  public record Holding(
      int point,
      String on,
      String name,
      double aboveGround,
      double aboveDatum,
      String held,
      double pull,
      double pullInWind,
      Double mayTake,
      State state,
      Double kilograms) {}

  /**
   * The sag to sight in one span.
   *
   * @param span "1–2", the point numbers of its ends
   * @param level level distance between its ends [m]
   * @param middle drop below the chord half way along [m]
   * @param greatest drop anywhere [m]
   * @param heightMiddle of the run above the ground half way along [m]
   * @param inGust greatest drop in the gust [m]
   * @param blowOut sideways in the gust [m]
   * @param bearing true, first to second end [degrees]
   * @param magnetic by the compass [degrees]
   */
  public record Sag(
      String span,
      double level,
      double middle,
      double greatest,
      double heightMiddle,
      double inGust,
      double blowOut,
      double bearing,
      double magnetic) {}

  /**
   * Setting out by two tapes.
   *
   * @param a first known point
   * @param b second known point
   * @param c third known point, for the check; null when the plan has none off the line A to B
   * @param points numbered from 1
   * @param notes as sentences
   */
  public record SetOut(Known a, Known b, Known c, List<Mark> points, List<String> notes) {
    public SetOut {
      points = List.copyOf(points);
      notes = List.copyOf(notes);
    }
  }

  /**
   * A known point that a tape is held at.
   *
   * @param letter on sheet and drawing
   * @param what it is, in words
   * @param at its place, z of the ground there
   */
  public record Known(String letter, String what, Place at) {}

  /**
   * A point to set out.
   *
   * @param number in its black square
   * @param name in words
   * @param at the point on the ground, z of the ground there
   * @param fromA level tape [m]
   * @param fromB level tape [m]
   * @param side of the line from A to B, walking from A: "left", "right" or "on"
   * @param check level tape from C [m], or null
   * @param crossing angle at which the two tapes cross [degrees]
   * @param flat whether that is under 30° or over 150°
   * @param blocked what stands in the way of a tape, as words, or null
   * @param better what to use instead when it is flat or blocked, or null
   * @param bearing true, from A [degrees]
   * @param magnetic by the compass, from A [degrees]
   * @param height of what is there above the ground [m]
   */
  public record Mark(
      int number,
      String name,
      Place at,
      double fromA,
      double fromB,
      String side,
      Double check,
      double crossing,
      boolean flat,
      String blocked,
      Pair better,
      double bearing,
      double magnetic,
      double height) {}

  /**
   * Two tapes that serve better than those from A and B.
   *
   * @param from first known point
   * @param fromTape level tape [m]
   * @param with second known point
   * @param withTape level tape [m]
   * @param crossing angle at which they cross [degrees]
   */
  public record Pair(String from, double fromTape, String with, double withTape, double crossing) {}

  /**
   * What a sweep at the station's end of the line should find.
   *
   * @param band name
   * @param frequency MHz
   * @param resistance ohm
   * @param reactance ohm
   * @param lineSwr at the load
   * @param match state of the match
   */
  public record Expected(
      String band,
      double frequency,
      double resistance,
      double reactance,
      double lineSwr,
      State match) {}

  /**
   * A caution.
   *
   * @param text a sentence
   * @param pressing whether it is marked
   */
  public record Caution(String text, boolean pressing) {}

  /**
   * Length added for working.
   *
   * @param id short name
   * @param what it is for
   * @param value in the unit
   * @param unit "m" or "share"
   * @param source where it comes from
   */
  public record Allowance(String id, String what, double value, String unit, String source) {}
}
