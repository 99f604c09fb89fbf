package spanwright.assess;

import java.util.ArrayList;
import java.util.List;
import spanwright.moments.Directions;
import spanwright.path.ReferenceVertical;
import spanwright.path.TakeOff;
import spanwright.path.Window;
import spanwright.path.Windows;
import spanwright.plan.Band;
import spanwright.plan.Brief;
import spanwright.plan.Plan;
import spanwright.plan.Soil;
import spanwright.plan.Target;

/**
 * Works out, once for a plan, where on every frequency the gain is wanted and what the reference
 * gives there.
 */
final class Rows {
  /** Azimuths over which near-vertical cover is averaged. */
  private static final int ROUND = 12;

  /** Azimuths of a reach rose. */
  static final int ROSE = 180;

  /** Elevations of a launch profile, every two degrees from the horizon to the zenith. */
  static final int PROFILE = 46;

  private final Plan plan;
  private final Soil soil;

  private Rows(Plan plan) {
    this.plan = plan;
    this.soil = plan.site().ground();
  }

  /** A row for every frequency of every band, in the order of the brief. */
  static List<Row> of(Plan plan) {
    Rows rows = new Rows(plan);
    List<Row> all = new ArrayList<>();
    Brief brief = plan.brief();
    for (int b = 0; b < brief.bands().size(); b++) {
      Band band = brief.bands().get(b);
      int middle = band.frequencies().size() / 2;
      for (int f = 0; f < band.frequencies().size(); f++) {
        all.add(rows.row(band, b, band.frequencies().get(f), f == middle));
      }
    }
    return all;
  }

  private Row row(Band band, int bandIndex, double frequencyMHz, boolean middle) {
    List<Row.Look> looks = new ArrayList<>();
    List<Target> targets = plan.brief().targets();
    for (int t = 0; t < targets.size(); t++) {
      if (targets.get(t).countsOn(band)) {
        looks.add(look(targets.get(t), t, frequencyMHz));
      }
    }
    double elevation = roseElevation(looks);
    return new Row(
        band,
        bandIndex,
        frequencyMHz,
        middle,
        List.copyOf(looks),
        Directions.joined(looks.stream().map(Row.Look::directions).toList()),
        middle ? drawn(elevation, looks) : null,
        elevation,
        Rounded.hundredth(
            ReferenceVertical.gainDbi(
                Math.toRadians(elevation),
                frequencyMHz,
                soil.permittivity(),
                soil.conductivity())));
  }

  private Row.Look look(Target target, int index, double frequencyMHz) {
    Windows windows =
        target.isNearVertical()
            ? TakeOff.nearVertical(target.nearVerticalKm(), frequencyMHz)
            : TakeOff.toward(target.distanceKm(), frequencyMHz);
    boolean allRound = target.isNearVertical() || TakeOff.bearingIsAny(target.distanceKm());
    Window scored = windows.scored();
    Double bearing = allRound ? null : target.bearing();
    return new Row.Look(
        target,
        index,
        bearing,
        windows,
        directions(scored, bearing),
        ReferenceVertical.meanDbi(scored, frequencyMHz, soil.permittivity(), soil.conductivity()));
  }

  /** The solver's azimuths run from the plan's +y, whose true bearing is planNorth. */
  private double inPlan(double bearingDegrees) {
    return Math.toRadians(bearingDegrees - plan.site().planNorth());
  }

  private Directions directions(Window window, Double bearing) {
    double[] elevations = window.elevationsDegrees();
    int round = bearing == null ? ROUND : 1;
    double[] azimuths = new double[elevations.length * round];
    double[] ups = new double[azimuths.length];
    for (int a = 0; a < round; a++) {
      for (int e = 0; e < elevations.length; e++) {
        int i = a * elevations.length + e;
        azimuths[i] = bearing == null ? 2 * Math.PI * a / round : inPlan(bearing);
        ups[i] = Math.toRadians(elevations[e]);
      }
    }
    return Directions.of(azimuths, ups);
  }

  private Directions drawn(double roseElevation, List<Row.Look> looks) {
    List<Directions> all = new ArrayList<>();
    all.add(rose(roseElevation));
    for (Row.Look look : looks) {
      if (look.bearing() != null) {
        all.add(profile(look.bearing()));
      }
    }
    return Directions.joined(all);
  }

  private Directions profile(double bearingDegrees) {
    return Directions.profile(inPlan(bearingDegrees), 0, Math.PI / 2, PROFILE);
  }

  private Directions rose(double elevationDegrees) {
    double[] azimuths = new double[ROSE];
    double[] elevations = new double[ROSE];
    for (int i = 0; i < ROSE; i++) {
      azimuths[i] = inPlan(i * 360.0 / ROSE);
      elevations[i] = Math.toRadians(elevationDegrees);
    }
    return Directions.of(azimuths, elevations);
  }

  /**
   * The middle of the scored window of the target that weighs most on the band; 45 degrees where
   * none counts.
   */
  private static double roseElevation(List<Row.Look> looks) {
    Row.Look heaviest = null;
    for (Row.Look look : looks) {
      if (heaviest == null || look.target().weight() > heaviest.target().weight()) {
        heaviest = look;
      }
    }
    if (heaviest == null) {
      return 45;
    }
    Window window = heaviest.windows().scored();
    return Rounded.tenth((window.fromDegrees() + window.toDegrees()) / 2);
  }
}
