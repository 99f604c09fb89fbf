package spanwright.assess;

import com.fasterxml.jackson.annotation.JsonInclude;
import java.util.List;
import spanwright.clearance.Clearance;
import spanwright.clearance.State;
import spanwright.plan.Place;

/**
 * One way to hang a wire on a plan, assessed: an element of {@code placements} in a result
 * document. Places are in the plan frame with z above the plan's zero.
 *
 * @param id "p01"
 * @param rank from 1; 0 when not ranked
 * @param score decibels over the reference
 * @param scoreParts adding up to the score
 * @param shape shape word
 * @param conductors radiating wire
 * @param attachments in order along the wire
 * @param feed feedpoint and line
 * @param clearances every distance checked, tightest first
 * @param bands a row for each frequency
 * @param spans one between each two neighbouring attachments
 * @param ropes every rope
 * @param masts to be built
 * @param state the worst of everything checked
 * @param notes warnings and facts worth saying, as sentences
 * @param exposure always "RF exposure not computed" until it is
 * @param quality how sure the radio figures are; null in documents older than it
 */
public record Placement(
    String id,
    int rank,
    double score,
    List<ScorePart> scoreParts,
    String shape,
    List<Conductor> conductors,
    List<Attachment> attachments,
    Feed feed,
    List<Clearance> clearances,
    List<BandResult> bands,
    List<Span> spans,
    List<RopeRun> ropes,
    List<NewMast> masts,
    State state,
    List<String> notes,
    String exposure,
    Quality quality) {

  public Placement {
    scoreParts = List.copyOf(scoreParts);
    conductors = List.copyOf(conductors);
    attachments = List.copyOf(attachments);
    clearances = List.copyOf(clearances);
    bands = List.copyOf(bands);
    spans = List.copyOf(spans);
    ropes = List.copyOf(ropes);
    masts = List.copyOf(masts);
    notes = List.copyOf(notes);
  }

  /** The same placement at its place in a list. */
  public Placement ranked(int newRank) {
    return new Placement(
        String.format(java.util.Locale.ROOT, "p%02d", newRank),
        newRank,
        score,
        scoreParts,
        shape,
        conductors,
        attachments,
        feed,
        clearances,
        bands,
        spans,
        ropes,
        masts,
        state,
        notes,
        exposure,
        quality);
  }

  /** Whether nothing is known that forbids relying on the radio figures. */
  public boolean reliable() {
    return quality == null || quality.sure();
  }

  /**
   * How sure the radio figures are.
   *
   * @param sure whether they may be relied on; what is not sure is never ranked as good
   * @param doubts why not, as sentences; empty when sure
   * @param bands what was measured on each band's middle frequency
   */
  public record Quality(boolean sure, List<String> doubts, List<BandQuality> bands) {
    public Quality {
      doubts = List.copyOf(doubts);
      bands = List.copyOf(bands);
    }
  }

  /**
   * The field solver's own measures at one frequency.
   *
   * @param name of the band
   * @param frequency MHz
   * @param refinementChange how far a finer mesh moves the reflection coefficient on 400 ohm; null
   *     while it was not tried
   * @param residual of the linear system, over its excitation
   */
  public record BandQuality(
      String name, double frequency, Double refinementChange, double residual) {
    BandQuality refined(double change) {
      return new BandQuality(name, frequency, change, residual);
    }
  }

  /**
   * The mean or a named deduction.
   *
   * @param what in words
   * @param points decibels, signed
   */
  public record ScorePart(String what, double points) {}

  /**
   * A radiating conductor.
   *
   * @param points along the hanging shape, at most 60
   * @param wire catalogue id
   * @param length finished length [m]
   */
  public record Conductor(List<Place> points, String wire, double length) {}

  /**
   * A holding point.
   *
   * @param on id of the support, bracket line or mast zone
   * @param at the point on it
   * @param aboveGround height above the ground there [m]
   * @param pull whole force on it in calm air [N]
   * @param pullInWind whole force on it in the design gust [N]
   * @param pullLimit what it may take [N], or null when not known
   * @param state the pulls against the limit; clear when not known
   * @param held "weight", "tied" or "centre"
   * @param kilograms to hang there, or null when it is not a weight
   * @param weightUp how far the weather and swaying trees may lift the weight [m], or null
   * @param weightDown how far they may let it down [m], or null
   * @param slackAtPulley rope left between the wire's end and the pulley when the weight is at its
   *     lowest [m], or null
   */
  public record Attachment(
      String on,
      Place at,
      double aboveGround,
      double pull,
      double pullInWind,
      Double pullLimit,
      State state,
      String held,
      Double kilograms,
      Double weightUp,
      Double weightDown,
      Double slackAtPulley) {
    /** A holding point without a counterweight's travel. */
    public Attachment(
        String on,
        Place at,
        double aboveGround,
        double pull,
        double pullInWind,
        Double pullLimit,
        State state,
        String held,
        Double kilograms) {
      this(
          on,
          at,
          aboveGround,
          pull,
          pullInWind,
          pullLimit,
          state,
          held,
          kilograms,
          null,
          null,
          null);
    }
  }

  /**
   * Feedpoint and feed line.
   *
   * @param at the feedpoint
   * @param line catalogue id
   * @param lineLength metres, from feedpoint to entry with slack
   * @param conductor index of the conductor
   * @param fraction share of its length from its first point
   * @param path the line's run from feedpoint to entry
   */
  public record Feed(
      Place at, String line, double lineLength, int conductor, double fraction, List<Place> path) {}

  /**
   * What hangs between two neighbouring attachments: rope, wire, rope.
   *
   * @param from index of the first attachment
   * @param to index of the second
   * @param points of the whole run, calm
   * @param sag greatest drop below the straight chord, calm [m]
   * @param sagInWind likewise in the gust [m]
   * @param blowOut greatest sideways shift in the gust [m]
   * @param wireLength finished length of the wire in it [m]
   * @param tension at the end where it is set, calm [N]: the pull to rig it with
   * @param greatestTension of its wire in any weather [N], or null when not known
   * @param strength margins, or null when not known
   */
  public record Span(
      int from,
      int to,
      List<Place> points,
      double sag,
      double sagInWind,
      double blowOut,
      double wireLength,
      double tension,
      Double greatestTension,
      SpanStrength strength) {
    /** A span without its margins. */
    public Span(
        int from,
        int to,
        List<Place> points,
        double sag,
        double sagInWind,
        double blowOut,
        double wireLength,
        double tension) {
      this(from, to, points, sag, sagInWind, blowOut, wireLength, tension, null, null);
    }
  }

  /**
   * How far a span is from parting: what each part breaks at, over the greatest tension on it in
   * any weather. Half of a rope's strength goes to its knots.
   *
   * @param wire margin of the wire
   * @param rope margin of the rope, or null where none holds the span
   * @param insulator margin of the end insulators, likewise
   * @param partsFirst "wire", "rope" or "insulator"
   * @param weakLink what a link let into the rope should part at [N], or null where none fits
   * @param weather in which its wire is drawn hardest: "still air", "gust", "ice" or "ice and
   *     gust"; null in documents older than it
   */
  public record SpanStrength(
      double wire,
      Double rope,
      Double insulator,
      String partsFirst,
      Double weakLink,
      String weather) {}

  /**
   * A rope.
   *
   * @param what "tail" between wire and attachment, "halyard" down to where it is made off, "guy"
   * @param attachment index of the attachment it belongs to
   * @param points its run
   * @param length along the run [m], without allowances
   * @param rope catalogue id
   */
  public record RopeRun(
      String what, int attachment, List<Place> points, double length, String rope) {}

  /**
   * A mast to be built.
   *
   * @param zone id of the mast zone
   * @param foot where it stands
   * @param top its head
   * @param height from foot to head [m]
   * @param guyFeet where its guys are made off, empty when it has none
   * @param consent what it needs in words, or null when nothing is said
   */
  public record NewMast(
      String zone, Place foot, Place top, double height, List<Place> guyFeet, String consent) {}

  /**
   * Radio figures at one frequency.
   *
   * @param name of the band
   * @param frequency MHz
   * @param impedance at the feedpoint, [R, X] ohm
   * @param lineSwr at the load end
   * @param lineLossDb power into the line over power into the load
   * @param atStation impedance at the foot of the line, [R, X] ohm
   * @param matching what the matching unit makes of it
   * @param peakGainDbi relative to the power into the feedpoint
   * @param peakElevation degrees up
   * @param peakAzimuth degrees clockwise from true north
   * @param efficiency radiated over input power
   * @param powerBalance as in a solve result, or null over real ground
   * @param targets those that count on the band
   * @param rose reach rose, on the band's middle frequency only, else null
   * @param profiles launch profiles, likewise
   */
  public record BandResult(
      String name,
      double frequency,
      List<Double> impedance,
      double lineSwr,
      double lineLossDb,
      List<Double> atStation,
      Matching matching,
      double peakGainDbi,
      double peakElevation,
      double peakAzimuth,
      double efficiency,
      @JsonInclude(JsonInclude.Include.ALWAYS) Double powerBalance,
      List<TargetResult> targets,
      Rose rose,
      List<Profile> profiles) {}

  /**
   * What the matching unit makes of the load at the station.
   *
   * @param state clear, tight or foul: the worse of the unit's and of what the line's volts make it
   * @param why the reason in words
   * @param lossDb in the unit
   * @param peakVolts on its parts at full power
   * @param inductance set [H], or null
   * @param capacitance set [F], or null
   */
  public record Matching(
      State state,
      String why,
      double lossDb,
      double peakVolts,
      Double inductance,
      Double capacitance) {}

  /**
   * How one target is served.
   *
   * @param name of the target
   * @param bearing degrees from true north, or null for near-vertical cover
   * @param window the scored take-off window, [from, to] degrees
   * @param windows every window
   * @param deliveredDbi averaged as power over the window, all losses taken
   * @param referenceDbi the reference vertical over the same window
   */
  public record TargetResult(
      String name,
      Double bearing,
      List<Double> window,
      List<LayerWindow> windows,
      double deliveredDbi,
      double referenceDbi) {}

  /**
   * A take-off window by one layer.
   *
   * @param layer "E", "Es" or "F2"
   * @param hops number
   * @param from degrees up
   * @param to degrees up
   */
  public record LayerWindow(String layer, int hops, double from, double to) {}

  /**
   * Gain all round at one elevation, before line loss.
   *
   * @param elevation degrees up
   * @param step degrees of azimuth between values
   * @param dbi from true north clockwise
   * @param referenceDbi the reference vertical at that elevation
   * @param betterShare share of azimuths where the placement betters it
   */
  public record Rose(
      double elevation, double step, List<Double> dbi, double referenceDbi, double betterShare) {}

  /**
   * Gain from horizon to zenith in one direction, before line loss.
   *
   * @param name of the target, or "peak"
   * @param azimuth degrees from true north
   * @param step degrees of elevation between values
   * @param dbi from the horizon up
   */
  public record Profile(String name, double azimuth, double step, List<Double> dbi) {}
}
