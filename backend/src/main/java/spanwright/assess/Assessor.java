package spanwright.assess;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.apache.commons.math3.complex.Complex;
import spanwright.clearance.Clearances;
import spanwright.clearance.Refusal;
import spanwright.feed.FeedResult;
import spanwright.moments.AntennaModel;
import spanwright.moments.Ground;
import spanwright.moments.GroundTables;
import spanwright.moments.MeshAim;
import spanwright.moments.ModelFault;
import spanwright.moments.Solution;
import spanwright.moments.Solver;
import spanwright.path.Window;
import spanwright.plan.Catalogue;
import spanwright.plan.GroundSurface;
import spanwright.plan.Plan;
import spanwright.rigging.Layout;
import spanwright.rigging.Rigging;

/**
 * Assesses placements on one plan: prepared once, then quick enough to follow a hand. Immutable but
 * for its tables and counts; safe for any number of threads.
 */
public final class Assessor {
  private final Plan plan;
  private final Catalogue catalogue;
  private final GroundSurface surface;
  private final Rigging rigging;
  private final Clearances clearances;
  private final Metal metal;
  private final Antennas antennas;
  private final List<Row> rows;
  private final List<Row> middleRows;
  private final Station station;
  private final Radio radio;
  private final Scoring scoring;
  private final Notes notes;
  private final Ground ground;
  private final Solver solver;
  private final Tally tally = new Tally();

  private Assessor(Plan plan, Catalogue catalogue, GroundTables tables) {
    this.plan = plan;
    this.catalogue = catalogue;
    this.surface = GroundSurface.of(plan);
    this.rigging = Rigging.of(plan, catalogue);
    this.clearances = Clearances.of(plan, catalogue);
    this.metal = Metal.of(plan, surface);
    this.antennas = new Antennas(catalogue, surface, metal);
    this.rows = Rows.of(plan);
    this.middleRows = rows.stream().filter(Row::middle).toList();
    this.station = new Station(plan, catalogue);
    this.radio = new Radio(plan.site().planNorth());
    this.scoring = new Scoring(plan.brief());
    this.notes = new Notes(plan, antennas);
    this.ground =
        Ground.real(plan.site().ground().permittivity(), plan.site().ground().conductivity());
    this.solver = new Solver(tables);
  }

  /** Prepares a plan, with ground tables of its own. */
  public static Assessor of(Plan plan, Catalogue catalogue) {
    return of(plan, catalogue, new GroundTables());
  }

  /** Prepares a plan on tables shared with others. */
  public static Assessor of(Plan plan, Catalogue catalogue, GroundTables tables) {
    return new Assessor(plan, catalogue, tables);
  }

  /** The ground under everything. */
  public GroundSurface surface() {
    return surface;
  }

  /** What stands in the way. */
  public Clearances clearances() {
    return clearances;
  }

  /** Linear systems solved so far. */
  public Tally tally() {
    return tally;
  }

  /** Catalogue id of the wire in use. */
  public String wireId() {
    return catalogue.wire(plan.brief().wire()).id();
  }

  /** Catalogue id of the feed line in use. */
  public String lineId() {
    return catalogue.line(plan.brief().line()).id();
  }

  /** What the station wants, on each band's middle frequency. */
  public List<Aim> aims() {
    List<Aim> aims = new ArrayList<>();
    for (Row row : middleRows) {
      for (Row.Look look : row.looks()) {
        Window window = look.windows().scored();
        boolean allRound = look.bearing() == null;
        aims.add(
            new Aim(
                row.bandIndex(),
                look.targetIndex(),
                row.frequencyMHz(),
                allRound ? 0 : look.bearing(),
                allRound,
                window.fromDegrees(),
                window.toDegrees(),
                row.band().weight() * look.target().weight()));
      }
    }
    return aims;
  }

  /**
   * Fills the ground tables for a range of wires, so that many threads need not wait for one.
   *
   * @param reach greatest horizontal distance [m]
   * @param highest highest wire above the ground [m]
   * @param threads to use
   */
  public void prepareTables(double reach, double highest, int threads) {
    double low = metal.isEmpty() ? 1.0 : 0.3;
    solver.tables().prepare(frequencies(rows), ground, reach, low, highest, threads);
  }

  private static double[] frequencies(List<Row> rows) {
    return rows.stream().mapToDouble(Row::frequencyMHz).toArray();
  }

  /**
   * Hangs a layout and holds it against every rule.
   *
   * @throws IllegalArgumentException with a sentence when the layout makes no sense
   */
  public Hung hang(Layout layout) {
    var rigged = rigging.hang(layout);
    return new Hung(layout, rigged, clearances.check(rigged));
  }

  /** Why a hung layout is not allowed, with cures; empty when it is. */
  public List<Refusal> refuse(Hung hung) {
    return clearances.refuse(hung.layout(), hung.rigged(), hung.clearances());
  }

  /**
   * A quick score: coarse mesh, band centres, metalwork left out. Only for choosing what to assess
   * in full.
   *
   * @return decibels; minus infinity when the field solver refuses the shape
   */
  public double coarseScore(Hung hung) {
    try {
      List<Placement.BandResult> quick =
          rowsOf(hung, middleRows, Metal.none(), MeshAim.COARSE, false).rows();
      return Scoring.total(
          scoring.parts(quick, PlacementWriter.masts(hung.rigged()), hung.clearances()));
    } catch (ModelFault fault) {
      return Double.NEGATIVE_INFINITY;
    }
  }

  /**
   * One placement, the whole chain; also a foul one.
   *
   * @throws IllegalArgumentException with a sentence when the layout makes no sense
   */
  public Placement assess(Layout layout) {
    return assess(hang(layout));
  }

  /**
   * A hung layout, the whole chain: full mesh, every frequency, metalwork and all.
   *
   * @throws Unsolvable with a sentence when the field solver cannot take it as it hangs
   */
  public Placement assess(Hung hung) {
    List<String> doubts = new ArrayList<>();
    Solved solved = solveInFull(hung, doubts);
    doubts.addAll(0, solved.warnings);
    return new PlacementWriter(plan, surface, scoring)
        .write(hung, solved.rows, solved.lineLength, notes.of(hung, rows, doubts));
  }

  private record Solved(
      List<Placement.BandResult> rows, double lineLength, List<String> warnings) {}

  /**
   * With all the metalwork that the field solver can take; what it cannot is named and left out.
   */
  private Solved solveInFull(Hung hung, List<String> doubts) {
    Metal with = antennas.metal();
    while (true) {
      try {
        return rowsOf(hung, rows, with, MeshAim.FULL, true);
      } catch (ModelFault fault) {
        String sentence = antennas.named(fault.getMessage(), hung.rigged(), with);
        if (with.isEmpty()) {
          throw new Unsolvable(sentence, fault);
        }
        Optional<String> piece = antennas.blamed(fault.getMessage(), hung.rigged(), with);
        doubts.add(piece.orElse("The metalwork") + " is not in these figures. " + sentence);
        with = piece.isPresent() ? with.without(piece.get()) : Metal.none();
      }
    }
  }

  private Solved rowsOf(Hung hung, List<Row> wanted, Metal with, MeshAim aim, boolean full) {
    AntennaModel model = antennas.of(hung.rigged(), with);
    List<Solution> solutions = solver.solve(model, ground, frequencies(wanted), aim);
    solutions.forEach(solution -> tally.add(solution.unknowns()));
    String line = hung.layout().feed().line() == null ? lineId() : hung.layout().feed().line();
    double length = lineLength(hung, line, wanted, solutions);
    List<Placement.BandResult> results = new ArrayList<>();
    List<String> warnings = new ArrayList<>();
    for (int i = 0; i < wanted.size(); i++) {
      Row row = wanted.get(i);
      Solution solution = solutions.get(i);
      FeedResult feed =
          station.run(line, length, row.band(), row.frequencyMHz(), solution.impedance());
      results.add(radio.row(row, solution, feed, full));
      for (String warning : solution.warnings()) {
        String named = antennas.named(warning, hung.rigged(), with);
        if (full && !warnings.contains(named)) {
          warnings.add(named);
        }
      }
    }
    return new Solved(results, length, warnings);
  }

  private double lineLength(Hung hung, String line, List<Row> wanted, List<Solution> solutions) {
    Double chosen = hung.layout().feed().lineLength();
    if (chosen != null) {
      return chosen;
    }
    List<Station.Load> loads = new ArrayList<>();
    for (int i = 0; i < wanted.size(); i++) {
      Row row = wanted.get(i);
      if (row.middle() && !row.band().receiveOnly()) {
        Complex z = solutions.get(i).impedance();
        loads.add(new Station.Load(row.band(), row.frequencyMHz(), z));
      }
    }
    return station.bestLength(line, hung.rigged().feedLine().runLength(), loads);
  }
}
