package spanwright.assess;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import org.apache.commons.math3.complex.Complex;
import spanwright.clearance.State;
import spanwright.feed.FeedResult;
import spanwright.feed.Match;
import spanwright.moments.Directions;
import spanwright.moments.Peak;
import spanwright.moments.Solution;
import spanwright.path.Window;

/** Turns a solution and its way to the socket into the figures of a row. */
final class Radio {
  /** Shown for no gain at all [dBi]. */
  static final double NOTHING_DBI = -99;

  /** Figures that would be infinite are shown as this much. */
  private static final double MOST = 1e6;

  private static final double MOST_LOSS_DB = 99;

  private final double planNorth;

  Radio(double planNorth) {
    this.planNorth = planNorth;
  }

  /**
   * What a solution sends where it is wanted; it takes long, and needs no feed line.
   *
   * @param toward each look's gain, averaged as power over its window [dBi]
   * @param peak gain [dBi], azimuth and elevation on the plan [rad]; null when only the score is
   *     wanted
   * @param drawn gains of the row's drawings, then of the profile toward the peak; null without
   */
  record Far(double[] toward, Peak peak, double[] drawn) {}

  /** What is wanted for a score, and no more. */
  static Far glance(Row row, Solution solution, GroundPlane plane) {
    double[] powers = solution.powerGains(plane.seen(row.sought()));
    double[] toward = new double[row.looks().size()];
    int from = 0;
    for (int i = 0; i < toward.length; i++) {
      int count = row.looks().get(i).directions().count();
      toward[i] = decibels(mean(powers, from, count));
      from += count;
    }
    return new Far(toward, null, null);
  }

  /** All that a row shows. */
  static Far look(Row row, Solution solution, GroundPlane plane) {
    Peak peak = peak(solution, plane);
    solution.efficiency(); // a solution keeps it: found here, where several rows go on at once
    double[] drawn = null;
    if (row.middle()) {
      Directions toPeak = Directions.profile(peak.azimuth(), 0, Math.PI / 2, Rows.PROFILE);
      drawn = solution.powerGains(plane.seen(Directions.joined(List.of(row.drawn(), toPeak))));
    }
    return new Far(glance(row, solution, plane).toward(), peak, drawn);
  }

  /** The peak as it is seen on the plan, of what goes up from the horizon there. */
  private static Peak peak(Solution solution, GroundPlane plane) {
    Peak found = solution.peak();
    double[] seen = plane.onPlan(found.azimuth(), found.elevation());
    if (seen[1] >= 0) {
      return new Peak(found.dbi(), seen[0], seen[1]);
    }
    int across = 120;
    int up = 60;
    Peak best = null;
    for (int j = 0; j < up; j++) {
      double elevation = 0.5 * Math.PI * j / up;
      double[] ring = solution.powerGains(plane.seen(Directions.ring(across, elevation)));
      for (int i = 0; i < across; i++) {
        double dbi = decibels(ring[i]);
        if (best == null || dbi > best.dbi()) {
          best = new Peak(dbi, 2 * Math.PI * i / across, elevation);
        }
      }
    }
    return best;
  }

  /** A row for a document; of a mere glance one that serves for scoring only. */
  Placement.BandResult row(Row row, Solution solution, Far far, FeedResult feed) {
    Peak peak = far.peak() == null ? new Peak(NOTHING_DBI, 0, 0) : far.peak();
    Complex z = solution.impedance();
    double losses = finite(feed.lossDb(), MOST_LOSS_DB) + unitLoss(feed.matching());
    List<Placement.TargetResult> targets = new ArrayList<>();
    for (int i = 0; i < row.looks().size(); i++) {
      targets.add(target(row.looks().get(i), far.toward()[i], losses));
    }
    return new Placement.BandResult(
        row.band().name(),
        row.frequencyMHz(),
        pair(z),
        Rounded.hundredth(finite(feed.lineSwr(), MOST)),
        Rounded.thousandth(finite(feed.lossDb(), MOST_LOSS_DB)),
        pair(feed.atStation()),
        matching(feed),
        Rounded.hundredth(peak.dbi()),
        Rounded.tenth(Math.toDegrees(peak.elevation())),
        Rounded.tenth(bearing(peak.azimuth())) % 360,
        far.peak() == null ? 0 : Rounded.thousandth(solution.efficiency()),
        far.peak() == null ? null : balance(solution),
        targets,
        far.drawn() == null ? null : rose(row, far.drawn()),
        far.drawn() == null ? null : profiles(row, far.drawn(), peak));
  }

  private static Double balance(Solution solution) {
    OptionalDouble balance = solution.powerBalance();
    return balance.isPresent() ? Rounded.thousandth(balance.getAsDouble()) : null;
  }

  private double bearing(double azimuth) {
    double degrees = (Math.toDegrees(azimuth) + planNorth) % 360;
    return degrees < 0 ? degrees + 360 : degrees;
  }

  private static List<Double> pair(Complex z) {
    return List.of(
        Rounded.hundredth(clamped(z.getReal())), Rounded.hundredth(clamped(z.getImaginary())));
  }

  private static double clamped(double ohm) {
    return Math.max(-1e9, Math.min(1e9, ohm));
  }

  private static double finite(double value, double most) {
    return value < most ? value : most;
  }

  private static double unitLoss(Match match) {
    return finite(match.lossDb(), MOST_LOSS_DB);
  }

  private static Placement.Matching matching(FeedResult feed) {
    Match match = feed.matching();
    Match.Settings settings = match.settings();
    State state = Station.state(feed);
    return new Placement.Matching(
        state,
        state == Station.state(match.state()) ? match.why() : feed.lineWhy(),
        Rounded.thousandth(unitLoss(match)),
        Rounded.tenth(finite(match.peakVolts(), MOST)),
        settings == null ? null : settings.inductance(),
        settings == null ? null : settings.capacitance());
  }

  private static Placement.TargetResult target(Row.Look look, double gain, double losses) {
    Window scored = look.windows().scored();
    return new Placement.TargetResult(
        look.target().name(),
        look.bearing(),
        window(scored),
        look.windows().all().stream()
            .map(
                w ->
                    new Placement.LayerWindow(
                        w.layer().label(),
                        w.hops(),
                        Rounded.tenth(w.fromDegrees()),
                        Rounded.tenth(w.toDegrees())))
            .toList(),
        Rounded.hundredth(Math.max(NOTHING_DBI, gain - losses)),
        Rounded.hundredth(look.referenceDbi()));
  }

  private static List<Double> window(Window window) {
    return List.of(Rounded.tenth(window.fromDegrees()), Rounded.tenth(window.toDegrees()));
  }

  private static Placement.Rose rose(Row row, double[] drawn) {
    List<Double> gains = decibels(drawn, 0, Rows.ROSE);
    long better = gains.stream().filter(dbi -> dbi > row.roseReferenceDbi()).count();
    return new Placement.Rose(
        row.roseElevation(),
        360.0 / Rows.ROSE,
        gains,
        row.roseReferenceDbi(),
        Rounded.thousandth((double) better / gains.size()));
  }

  private List<Placement.Profile> profiles(Row row, double[] drawn, Peak peak) {
    double step = 90.0 / (Rows.PROFILE - 1);
    int from = Rows.ROSE;
    List<Placement.Profile> profiles = new ArrayList<>();
    for (Row.Look look : row.looks()) {
      if (look.bearing() != null) {
        List<Double> gains = decibels(drawn, from, Rows.PROFILE);
        profiles.add(new Placement.Profile(look.target().name(), look.bearing(), step, gains));
        from += Rows.PROFILE;
      }
    }
    double toward = Rounded.tenth(bearing(peak.azimuth())) % 360;
    List<Double> gains = decibels(drawn, from, Rows.PROFILE);
    profiles.add(new Placement.Profile("peak", toward, step, gains));
    return profiles;
  }

  private static double mean(double[] powers, int from, int count) {
    double sum = 0;
    for (int i = from; i < from + count; i++) {
      sum += powers[i];
    }
    return sum / count;
  }

  private static double decibels(double power) {
    return power > 1e-9 ? 10 * Math.log10(power) : NOTHING_DBI;
  }

  private static List<Double> decibels(double[] powers, int from, int count) {
    List<Double> gains = new ArrayList<>(count);
    for (int i = from; i < from + count; i++) {
      gains.add(Rounded.hundredth(Math.max(NOTHING_DBI, decibels(powers[i]))));
    }
    return gains;
  }
}
