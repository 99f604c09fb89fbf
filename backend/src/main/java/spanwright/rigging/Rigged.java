package spanwright.rigging;

import java.util.List;
import spanwright.plan.Place;

/**
 * A layout as it hangs: every shape, pull, rope and mast that follows from it. Places have z above
 * the plan's zero.
 *
 * @param layout what was hung
 * @param conductors radiating wire, in the order of the layout
 * @param attachments in the order of the layout
 * @param spans one between each two neighbouring attachments
 * @param tails wire that hangs free beyond a last attachment; mostly empty
 * @param ropes every rope
 * @param feedLine from the feedpoint to the entry
 * @param masts to be built
 * @param shortcomings what does not hold, each with its cure; empty when all is well
 * @param notes facts worth saying, as sentences
 */
public record Rigged(
    Layout layout,
    List<Conductor> conductors,
    List<Attachment> attachments,
    List<Span> spans,
    List<Tail> tails,
    List<Rope> ropes,
    FeedLine feedLine,
    List<Mast> masts,
    List<Shortcoming> shortcomings,
    List<String> notes) {
  public Rigged {
    conductors = List.copyOf(conductors);
    attachments = List.copyOf(attachments);
    spans = List.copyOf(spans);
    tails = List.copyOf(tails);
    ropes = List.copyOf(ropes);
    masts = List.copyOf(masts);
    shortcomings = List.copyOf(shortcomings);
    notes = List.copyOf(notes);
  }

  /** Whether the first conductor comes back to where it began: its last span closes it. */
  public boolean isLoop() {
    return spans.stream()
        .filter(each -> each.conductor() == 0)
        .reduce((first, last) -> last)
        .map(last -> spans.size() > 1 && last.to() == spans.get(0).from())
        .orElse(false);
  }

  /**
   * One thing in its calm shape and as the weather moves it: the same number of points in each, the
   * n-th of one becoming the n-th of another.
   *
   * @param calm in still air
   * @param left in the design gust blowing to the left of the span, seen from its first attachment
   * @param right in the gust blowing to the right
   * @param iced under ice without wind; empty where no ice is asked for
   * @param icedLeft under ice, in the gust that goes with ice, blowing to the left; likewise empty
   * @param icedRight the same gust blowing to the right; likewise empty
   */
  public record Shapes(
      List<Place> calm,
      List<Place> left,
      List<Place> right,
      List<Place> iced,
      List<Place> icedLeft,
      List<Place> icedRight) {
    public Shapes {
      calm = List.copyOf(calm);
      left = List.copyOf(left);
      right = List.copyOf(right);
      iced = List.copyOf(iced);
      icedLeft = List.copyOf(icedLeft);
      icedRight = List.copyOf(icedRight);
    }

    /** Shapes of which ice in the wind is not drawn. */
    public Shapes(List<Place> calm, List<Place> left, List<Place> right, List<Place> iced) {
      this(calm, left, right, iced, List.of(), List.of());
    }

    /** The part from one point to another, both included, in every shape. */
    public Shapes part(int from, int to) {
      return new Shapes(
          calm.subList(from, to + 1),
          left.subList(from, to + 1),
          right.subList(from, to + 1),
          cut(iced, from, to),
          cut(icedLeft, from, to),
          cut(icedRight, from, to));
    }

    private static List<Place> cut(List<Place> points, int from, int to) {
      return points.isEmpty() ? points : points.subList(from, to + 1);
    }

    /** The shapes that the weather makes of it, calm first. */
    public List<List<Place>> all() {
      if (iced.isEmpty()) {
        return List.of(calm, left, right);
      }
      return icedLeft.isEmpty()
          ? List.of(calm, left, right, iced)
          : List.of(calm, left, right, iced, icedLeft, icedRight);
    }
  }

  /**
   * A radiating conductor.
   *
   * @param wire catalogue id
   * @param length finished length, as it hangs [m]
   * @param shapes at most 60 points
   */
  public record Conductor(String wire, double length, Shapes shapes) {}

  /**
   * A holding point.
   *
   * @param on id of the support, bracket line or mast zone
   * @param at the point on it
   * @param aboveGround height above the ground there [m]
   * @param held "weight" over a pulley to a counterweight, "tied", or "centre" where the wire
   *     passes or the feedpoint hangs
   * @param kilograms to hang there, or null when it is not a weight
   * @param weightTravel how far the counterweight moves between calm and gust [m], up positive; 0
   *     when it is none
   * @param weightUp how far the weather and swaying trees may lift the counterweight [m]; 0 when it
   *     is none
   * @param weightDown how far they may let it down [m]
   * @param slackAtPulley rope left between the wire's end and the pulley when the weight is at its
   *     lowest [m], or null when it is no weight
   * @param pull whole force on it in calm air: spans, line, and the counterweight's own pull on its
   *     pulley
   * @param pullInWind whole force on it in the worse gust
   * @param pullLimit what it may take [N], or null when not known
   */
  public record Attachment(
      String on,
      Place at,
      double aboveGround,
      String held,
      Double kilograms,
      double weightTravel,
      double weightUp,
      double weightDown,
      Double slackAtPulley,
      Force pull,
      Force pullInWind,
      Double pullLimit) {}

  /**
   * What hangs between two neighbouring attachments: rope, wire, rope.
   *
   * @param from index of the first attachment
   * @param to index of the second
   * @param conductor index of the conductor in it
   * @param shapes of the whole run, attachment to attachment
   * @param wireFrom index in the shapes of the first point of wire
   * @param wireTo index in the shapes of the last point of wire
   * @param sag greatest drop below the straight chord, calm [m]
   * @param sagInWind likewise in the worse gust [m]
   * @param blowOut greatest sideways shift in the gust [m]
   * @param wireLength finished length of the wire in it, as it hangs [m]
   * @param ropeFrom length of rope at its first end [m]
   * @param ropeTo length of rope at its second end [m]
   * @param freeFrom rope beyond the first attachment that would come free with it [m]
   * @param freeTo rope beyond the second attachment that would come free with it [m]
   * @param tension at the end where it is set, calm [N]
   * @param greatestTension of its wire in any weather [N]
   * @param strength how far it is from parting
   */
  public record Span(
      int from,
      int to,
      int conductor,
      Shapes shapes,
      int wireFrom,
      int wireTo,
      double sag,
      double sagInWind,
      double blowOut,
      double wireLength,
      double ropeFrom,
      double ropeTo,
      double freeFrom,
      double freeTo,
      double tension,
      double greatestTension,
      Strength strength) {
    /** The wire of it, without the ropes. */
    public Shapes wire() {
      return shapes.part(wireFrom, wireTo);
    }

    /** Rope, wire, rope: what would hang from the one point if the other let go [m]. */
    public double reach(boolean fromFirst) {
      return ropeFrom + wireLength + ropeTo + (fromFirst ? freeTo : freeFrom);
    }
  }

  /**
   * Wire that hangs free beyond a last attachment.
   *
   * @param attachment index of the attachment it hangs from
   * @param conductor index of the conductor
   * @param length metres
   * @param shapes from the attachment to the free end
   */
  public record Tail(int attachment, int conductor, double length, Shapes shapes) {}

  /**
   * A rope.
   *
   * @param what "tail" between wire and attachment, "halyard" to where it is made off, "fall" from
   *     a pulley to its counterweight, "guy" of a new mast
   * @param attachment index of the attachment it belongs to
   * @param shapes its run
   * @param length along the run [m], without allowances
   * @param rope catalogue id
   */
  public record Rope(String what, int attachment, Shapes shapes, double length, String rope) {}

  /**
   * The feed line.
   *
   * @param line catalogue id
   * @param feedpoint where it joins
   * @param held index of the attachment that holds the feedpoint, or -1 when it hangs in a span
   * @param shapes its run from the feedpoint to the entry
   * @param others the same run under winds that move line and feedpoint otherwise: the line blown
   *     while the feedpoint stays, and each blown to the other side; empty without wind
   * @param runLength along that run, slack included [m]
   * @param length as chosen, or the run's length when it was left open [m]
   * @param stowed what of it is led to and fro on stand-offs near the entry [m]
   * @param weightOnFeedpoint that bears on the feedpoint, centre piece included [kg]
   */
  public record FeedLine(
      String line,
      Place feedpoint,
      int held,
      Shapes shapes,
      List<Shapes> others,
      double runLength,
      double length,
      double stowed,
      double weightOnFeedpoint) {
    public FeedLine {
      others = List.copyOf(others);
    }
  }

  /**
   * A mast to be built.
   *
   * @param zone id of the mast zone
   * @param foot where it stands
   * @param top its head: the highest attachment on it
   * @param height from foot to head [m]
   * @param guyFeet where its guys are made off, empty when it has none
   * @param consent what it needs in words, or null when nothing is said
   * @param attachments indices of the attachments on it
   */
  public record Mast(
      String zone,
      Place foot,
      Place top,
      double height,
      List<Place> guyFeet,
      String consent,
      List<Integer> attachments) {
    public Mast {
      guyFeet = List.copyOf(guyFeet);
      attachments = List.copyOf(attachments);
    }
  }

  /**
   * Something that does not hold.
   *
   * @param rule id in the rule catalogue
   * @param to id of the thing it is held against
   * @param what which part of ours, in words
   * @param at the place
   * @param found value, in the rule's unit
   * @param allowed value
   * @param reason as a sentence
   * @param cure as a sentence, or null when nothing cures it
   */
  public record Shortcoming(
      String rule,
      String to,
      String what,
      Place at,
      double found,
      double allowed,
      String reason,
      String cure) {}
}
