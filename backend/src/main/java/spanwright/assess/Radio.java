package spanwright.assess;

import java.util.ArrayList;
import java.util.List;
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
   * @param withDrawings whether the rose and profiles are wanted
   */
  Placement.BandResult row(Row row, Solution solution, FeedResult feed, boolean withDrawings) {
    Peak peak = solution.peak();
    Complex z = solution.impedance();
    double losses = finite(feed.lossDb(), MOST_LOSS_DB) + unitLoss(feed.matching());
    List<Placement.TargetResult> targets =
        row.looks().stream().map(look -> target(look, solution, losses)).toList();
    boolean drawn = withDrawings && row.middle();
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
        Rounded.thousandth(solution.efficiency()),
        solution.powerBalance().isPresent()
            ? Rounded.thousandth(solution.powerBalance().getAsDouble())
            : null,
        targets,
        drawn ? rose(row, solution) : null,
        drawn ? profiles(row, solution, peak) : null);
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

  private static Placement.TargetResult target(Row.Look look, Solution solution, double losses) {
    double gain = decibels(mean(solution.powerGains(look.directions())));
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

  private static Placement.Rose rose(Row row, Solution solution) {
    List<Double> gains = decibels(solution.powerGains(row.rose()));
    long better = gains.stream().filter(dbi -> dbi > row.roseReferenceDbi()).count();
    return new Placement.Rose(
        row.roseElevation(),
        360.0 / Rows.ROSE,
        gains,
        row.roseReferenceDbi(),
        Rounded.thousandth((double) better / gains.size()));
  }

  private List<Placement.Profile> profiles(Row row, Solution solution, Peak peak) {
    double step = 90.0 / (Rows.PROFILE - 1);
    List<Placement.Profile> profiles = new ArrayList<>();
    for (Row.Look look : row.looks()) {
      if (look.bearing() != null) {
        profiles.add(
            new Placement.Profile(
                look.target().name(),
                look.bearing(),
                step,
                decibels(solution.powerGains(look.profile()))));
      }
    }
    Directions toPeak = Directions.profile(peak.azimuth(), 0, Math.PI / 2, Rows.PROFILE);
    profiles.add(
        new Placement.Profile(
            "peak",
            Rounded.tenth(bearing(peak.azimuth())) % 360,
            step,
            decibels(solution.powerGains(toPeak))));
    return profiles;
  }

  private static double mean(double[] powers) {
    double sum = 0;
    for (double power : powers) {
      sum += power;
    }
    return sum / powers.length;
  }

  private static double decibels(double power) {
    return power > 1e-9 ? 10 * Math.log10(power) : NOTHING_DBI;
  }

  private static List<Double> decibels(double[] powers) {
    List<Double> gains = new ArrayList<>(powers.length);
    for (double power : powers) {
      gains.add(Rounded.hundredth(Math.max(NOTHING_DBI, decibels(power))));
    }
    return gains;
  }
}
