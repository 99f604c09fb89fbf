package spanwright.assess;

import java.util.ArrayList;
import java.util.List;
import spanwright.clearance.Clearance;
import spanwright.clearance.State;
import spanwright.plan.GroundSurface;
import spanwright.plan.Place;
import spanwright.plan.Plan;
import spanwright.rigging.Force;
import spanwright.rigging.Rigged;
import spanwright.rigging.Strength;

/** Writes what was found as an element of a result document. */
final class PlacementWriter {
  /** Share of what a support may take above which a pull is tight. Common practice, no source. */
  private static final double TIGHT_PULL = 0.9;

  private static final String EXPOSURE = "RF exposure not computed";

  private final Plan plan;
  private final GroundSurface surface;
  private final Scoring scoring;

  PlacementWriter(Plan plan, GroundSurface surface, Scoring scoring) {
    this.plan = plan;
    this.surface = surface;
    this.scoring = scoring;
  }

  Placement write(
      Hung hung,
      List<Placement.BandResult> rows,
      double lineLength,
      List<String> notes,
      Placement.Quality quality) {
    Rigged rigged = hung.rigged();
    List<Placement.NewMast> masts = masts(rigged);
    List<Placement.Attachment> attachments =
        rigged.attachments().stream().map(PlacementWriter::attachment).toList();
    List<Placement.ScorePart> parts = scoring.parts(rows, masts, hung.clearances());
    State state = hung.state();
    for (Placement.Attachment attachment : attachments) {
      state = state.worse(attachment.state());
    }
    return new Placement(
        "p00",
        0,
        Scoring.total(parts),
        parts,
        hung.layout().shape(),
        rigged.conductors().stream().map(PlacementWriter::conductor).toList(),
        attachments,
        feed(rigged, lineLength),
        hung.clearances().stream().map(PlacementWriter::rounded).toList(),
        rows,
        rigged.spans().stream().map(PlacementWriter::span).toList(),
        rigged.ropes().stream().map(PlacementWriter::rope).toList(),
        masts,
        state,
        notes,
        EXPOSURE,
        quality);
  }

  private static Placement.Conductor conductor(Rigged.Conductor conductor) {
    return new Placement.Conductor(
        rounded(conductor.shapes().calm()),
        conductor.wire(),
        Rounded.thousandth(conductor.length()));
  }

  private static Placement.Attachment attachment(Rigged.Attachment attachment) {
    double calm = size(attachment.pull());
    double gust = size(attachment.pullInWind());
    Double limit = attachment.pullLimit();
    State state = State.CLEAR;
    if (limit != null) {
      double worst = Math.max(calm, gust);
      state = worst > limit ? State.FOUL : worst > TIGHT_PULL * limit ? State.TIGHT : State.CLEAR;
    }
    return new Placement.Attachment(
        attachment.on(),
        rounded(attachment.at()),
        Rounded.thousandth(attachment.aboveGround()),
        Rounded.tenth(calm),
        Rounded.tenth(gust),
        limit,
        state,
        attachment.held(),
        attachment.kilograms() == null ? null : Rounded.hundredth(attachment.kilograms()),
        attachment.kilograms() == null ? null : Rounded.hundredth(attachment.weightUp()),
        attachment.kilograms() == null ? null : Rounded.hundredth(attachment.weightDown()),
        attachment.slackAtPulley() == null ? null : Rounded.hundredth(attachment.slackAtPulley()));
  }

  private static double size(Force force) {
    return Math.sqrt(force.x() * force.x() + force.y() * force.y() + force.z() * force.z());
  }

  private static Placement.Feed feed(Rigged rigged, double lineLength) {
    Rigged.FeedLine line = rigged.feedLine();
    return new Placement.Feed(
        rounded(line.feedpoint()),
        line.line(),
        Rounded.hundredth(lineLength),
        rigged.layout().feed().conductor(),
        rigged.layout().feed().fraction(),
        rounded(line.shapes().calm()));
  }

  private static Placement.Span span(Rigged.Span span) {
    return new Placement.Span(
        span.from(),
        span.to(),
        rounded(span.shapes().calm()),
        Rounded.thousandth(span.sag()),
        Rounded.thousandth(span.sagInWind()),
        Rounded.thousandth(span.blowOut()),
        Rounded.thousandth(span.wireLength()),
        Rounded.tenth(span.tension()),
        Rounded.tenth(span.greatestTension()),
        strength(span.strength()));
  }

  private static Placement.SpanStrength strength(Strength strength) {
    return new Placement.SpanStrength(
        Rounded.hundredth(strength.wire().margin()),
        margin(strength.rope()),
        margin(strength.insulator()),
        strength.partsFirst(),
        strength.weakLink() == null ? null : Rounded.tenth(strength.weakLink()),
        strength.weather());
  }

  private static Double margin(Strength.Part part) {
    return part == null ? null : Rounded.hundredth(part.margin());
  }

  private static Placement.RopeRun rope(Rigged.Rope rope) {
    return new Placement.RopeRun(
        rope.what(),
        rope.attachment(),
        rounded(rope.shapes().calm()),
        Rounded.thousandth(rope.length()),
        rope.rope());
  }

  static List<Placement.NewMast> masts(Rigged rigged) {
    List<Placement.NewMast> masts = new ArrayList<>();
    for (Rigged.Mast mast : rigged.masts()) {
      masts.add(
          new Placement.NewMast(
              mast.zone(),
              rounded(mast.foot()),
              rounded(mast.top()),
              Rounded.thousandth(mast.height()),
              rounded(mast.guyFeet()),
              mast.consent()));
    }
    return masts;
  }

  private static Clearance rounded(Clearance c) {
    return new Clearance(
        c.rule(),
        c.to(),
        c.what(),
        rounded(c.at()),
        rounded(c.toAt()),
        Rounded.thousandth(c.distance()),
        Rounded.thousandth(c.required()),
        c.state());
  }

  private static List<Place> rounded(List<Place> places) {
    return places.stream().map(PlacementWriter::rounded).toList();
  }

  /** To a tenth of a millimetre: below what any tape tells, above what a document should carry. */
  private static Place rounded(Place place) {
    return new Place(fine(place.x()), fine(place.y()), fine(place.z()));
  }

  private static double fine(double metres) {
    return Math.round(metres * 1e4) / 1e4 + 0.0;
  }
}
