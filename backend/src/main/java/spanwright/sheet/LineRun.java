package spanwright.sheet;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.Collectors;
import spanwright.assess.Placement;
import spanwright.plan.GroundSurface;
import spanwright.plan.LineKind;
import spanwright.plan.Metalwork;
import spanwright.plan.Place;

/** The feed line: what to cut, how it runs, where it is held off, and what metal it passes. */
final class LineRun {
  /** A two-wire line keeps this many times its spacing from metal; common practice, no source. */
  static final double SPACINGS = 4;

  /** Along the line between looks at what is near [m]. */
  private static final double STEP = 0.05;

  /** The first stand-off stands this far before the entry, above the drip loop [m]. */
  private static final double BEFORE_ENTRY = 0.30;

  private final Job job;
  private final LineKind kind;
  private final List<Place> path;
  private final double run;
  private final double reach;
  private final List<Double> standOffs = new ArrayList<>();
  private String metal;
  private Double metalDistance;

  private LineRun(Job job) {
    Placement.Feed feed = job.placement.feed();
    this.job = job;
    this.kind = job.line(feed.line());
    this.path = feed.path();
    this.run = Job.length(path);
    this.reach =
        kind.balanced()
            ? Figures.upToCentimetre(Math.max(Allowances.STAND_OFF_LEAST, SPACINGS * spacing()))
            : 0;
  }

  /** Where the catalogue does not say how far apart the wires are, the line's width. */
  private double spacing() {
    return kind.spacing() == null ? kind.diameter() : kind.spacing();
  }

  static CutParts.FeedLine of(Job job) {
    LineRun line = new LineRun(job);
    line.walk();
    line.passMetal();
    return line.made();
  }

  private CutParts.FeedLine made() {
    double length = job.placement.feed().lineLength();
    double madeOff = 2 * Allowances.LINE_END;
    return new CutParts.FeedLine(
        "L1",
        kind.id(),
        kind.name(),
        run,
        length - run,
        length,
        madeOff,
        Figures.upToCentimetre(length + madeOff),
        kind.balanced() ? Double.valueOf(spacing()) : null,
        standOffs.size(),
        reach,
        standOffs,
        metal,
        metalDistance,
        notes(length - run));
  }

  /** One before the entry, one for each metre close to a building, one where it leaves it. */
  private void walk() {
    double last = Math.min(BEFORE_ENTRY, run);
    standOffs.add(last);
    double near = 0;
    for (double s = last + STEP; s < run; s += STEP) {
      Place p = fromEntry(s);
      if (Sight.nearBuilding(job.plan, p.x(), p.y())) {
        near = s;
        if (s - last >= Allowances.STAND_OFF_EVERY - 1e-9) {
          last = addStandOff(s);
        }
      } else if (near - last > BEFORE_ENTRY) {
        last = addStandOff(near);
      }
    }
    if (near - last > BEFORE_ENTRY) {
      addStandOff(near);
    }
  }

  private double addStandOff(double along) {
    double whole = Math.round(along * 100) / 100.0;
    standOffs.add(whole);
    return whole;
  }

  private Place fromEntry(double along) {
    return WireList.at(path, run - along);
  }

  private void passMetal() {
    GroundSurface ground = GroundSurface.of(job.plan);
    for (Metalwork piece : job.plan.metalwork()) {
      for (int i = 1; i < piece.path().size(); i++) {
        Place a = ground.raise(piece.path().get(i - 1));
        Place b = ground.raise(piece.path().get(i));
        for (double s = 0; s <= run; s += STEP) {
          double far = Math.max(0, distance(fromEntry(s), a, b) - piece.radius());
          if (metalDistance == null || far < metalDistance) {
            metalDistance = far;
            metal = job.name(piece.id());
          }
        }
      }
    }
  }

  private static double distance(Place p, Place a, Place b) {
    double dx = b.x() - a.x();
    double dy = b.y() - a.y();
    double dz = b.z() - a.z();
    double square = dx * dx + dy * dy + dz * dz;
    double t =
        square == 0
            ? 0
            : ((p.x() - a.x()) * dx + (p.y() - a.y()) * dy + (p.z() - a.z()) * dz) / square;
    t = Math.max(0, Math.min(1, t));
    return p.distance(new Place(a.x() + t * dx, a.y() + t * dy, a.z() + t * dz));
  }

  private List<String> notes(double slack) {
    List<String> notes = new ArrayList<>();
    notes.add(route());
    if (kind.balanced()) {
      notes.add(
          "Its wires are "
              + job.figures.sight(spacing())
              + " apart: stand-offs hold it "
              + job.figures.sayCut(reach)
              + " off walls, and no metal comes nearer than four times the spacing, "
              + job.figures.sayCut(SPACINGS * spacing())
              + ".");
      if (metalDistance != null) {
        notes.add(
            "Nearest metal on the plan: "
                + metal
                + ", "
                + job.figures.found(metalDistance)
                + (job.figures.unit().equals("m") ? " m" : "")
                + (metalDistance < SPACINGS * spacing()
                    ? ": too near. Lead the line round it."
                    : "."));
      }
    } else {
      notes.add("Clip it to the wall; bend it no tighter than ten times its thickness.");
    }
    notes.add(slackWords(slack));
    return notes;
  }

  private String route() {
    Place feed = path.get(0);
    Place entry = path.get(path.size() - 1);
    String held = standOffs.stream().map(job.figures::length).collect(Collectors.joining(", "));
    return "Runs "
        + job.figures.say(run)
        + " from the feedpoint at "
        + job.figures.sayHeight(feed.z() - job.groundAt(feed.x(), feed.y()))
        + ", bearing "
        + Figures.bearing(job.magnetic(job.bearing(feed.onPlan(), entry.onPlan())))
        + " by compass, to the entry at "
        + job.figures.sayHeight(entry.z() - job.groundAt(entry.x(), entry.y()))
        + (kind.balanced() ? ". Stand-offs" : ". Clips")
        + " along the line from the entry at: "
        + held
        + (job.figures.unit().equals("m") ? " m." : ".");
  }

  private String slackWords(double slack) {
    if (slack < -0.005) {
      return "The line is "
          + job.figures.say(-slack)
          + " shorter than its run. Do not cut: choose a longer line and assess again.";
    }
    return "Lead the slack, "
        + job.figures.say(slack)
        + ", in wide bends clear of metal; do not coil it. A drip loop hangs below the entry; the"
        + " line comes up into it.";
  }
}
