package spanwright.sheet;

import java.util.ArrayList;
import java.util.List;
import java.util.Objects;
import java.util.stream.Stream;
import spanwright.assess.Placement;
import spanwright.plan.Place;
import spanwright.plan.Point;

/** Attachments with their pulls, and the sag to sight in each span. */
final class HangingList {
  private HangingList() {}

  static List<HangParts.Holding> holdings(Job job, SetOutParts.SetOut setOut) {
    double datum = setOut.a().at().z();
    List<HangParts.Holding> rows = new ArrayList<>();
    for (int i = 0; i < job.placement.attachments().size(); i++) {
      Placement.Attachment held = job.placement.attachments().get(i);
      rows.add(
          new HangParts.Holding(
              i + 1,
              held.on(),
              job.holder(held),
              held.aboveGround(),
              held.at().z() - datum,
              held.held(),
              held.pull(),
              held.pullInWind(),
              held.pullLimit(),
              held.state(),
              method(job, held),
              held.kilograms(),
              margin(held),
              held.weightUp(),
              held.weightDown(),
              held.slackAtPulley()));
    }
    return rows;
  }

  private static Double margin(Placement.Attachment held) {
    double worst = Math.max(held.pull(), held.pullInWind());
    return held.pullLimit() == null || worst < 0.1 ? null : held.pullLimit() / worst;
  }

  /** Spans that the placement tells the strength of. */
  static List<HangParts.Margins> margins(Job job) {
    return job.placement.spans().stream()
        .filter(s -> s.strength() != null)
        .map(s -> margins(job, s))
        .toList();
  }

  private static HangParts.Margins margins(Job job, Placement.Span span) {
    Double support =
        Stream.of(span.from(), span.to())
            .map(i -> margin(job.placement.attachments().get(i)))
            .filter(Objects::nonNull)
            .min(Double::compare)
            .orElse(null);
    Placement.SpanStrength strength = span.strength();
    return new HangParts.Margins(
        name(span),
        span.tension(),
        span.greatestTension(),
        strength.weather(),
        strength.wire(),
        strength.rope(),
        strength.insulator(),
        support,
        strength.partsFirst(),
        strength.weakLink());
  }

  /** "1–2": the numbers of its ends. */
  static String name(Placement.Span span) {
    return (span.from() + 1) + "–" + (span.to() + 1);
  }

  /** How it gets up there, by what holds it. */
  private static String method(Job job, Placement.Attachment held) {
    if (job.isTree(held.on())) {
      return "throw line, from the ground";
    }
    if (job.zone(held.on()).isPresent()) {
      return "rigged on the mast before it is raised";
    }
    if (job.isBracket(held.on())) {
      return "bracket, by ladder";
    }
    return "pulley or ring, by ladder";
  }

  static List<HangParts.Sag> sags(Job job) {
    return job.placement.spans().stream()
        .filter(s -> s.points().size() >= 2)
        .map(s -> sag(job, s))
        .toList();
  }

  private static HangParts.Sag sag(Job job, Placement.Span span) {
    Place from = span.points().get(0);
    Place to = span.points().get(span.points().size() - 1);
    Point a = from.onPlan();
    Point b = to.onPlan();
    Place middle = middle(span.points());
    double bearing = a.distance(b) < 0.01 ? 0 : job.bearing(a, b);
    return new HangParts.Sag(
        name(span),
        a.distance(b),
        Math.max(0, (from.z() + to.z()) / 2 - middle.z()),
        span.sag(),
        middle.z() - job.groundAt(middle.x(), middle.y()),
        span.sagInWind(),
        span.blowOut(),
        bearing,
        job.magnetic(bearing));
  }

  /** Where a run passes half way along its chord. */
  static Place middle(List<Place> run) {
    Place from = run.get(0);
    Place to = run.get(run.size() - 1);
    double dx = to.x() - from.x();
    double dy = to.y() - from.y();
    double square = dx * dx + dy * dy;
    for (int i = 1; i < run.size() && square > 1e-6; i++) {
      Place p = run.get(i - 1);
      Place q = run.get(i);
      double s = ((p.x() - from.x()) * dx + (p.y() - from.y()) * dy) / square;
      double t = ((q.x() - from.x()) * dx + (q.y() - from.y()) * dy) / square;
      if (s <= 0.5 && t >= 0.5 && t > s) {
        double f = (0.5 - s) / (t - s);
        return new Place(
            p.x() + f * (q.x() - p.x()), p.y() + f * (q.y() - p.y()), p.z() + f * (q.z() - p.z()));
      }
    }
    return run.get(run.size() / 2);
  }
}
