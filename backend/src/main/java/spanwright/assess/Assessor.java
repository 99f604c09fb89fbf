package spanwright.assess;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.UnaryOperator;
import org.apache.commons.math3.complex.Complex;
import spanwright.clearance.Clearances;
import spanwright.clearance.Refusal;
import spanwright.feed.FeedResult;
import spanwright.moments.AntennaModel;
import spanwright.moments.Ground;
import spanwright.moments.GroundTables;
import spanwright.moments.ModelFault;
import spanwright.moments.Solver;
import spanwright.path.Window;
import spanwright.plan.Catalogue;
import spanwright.plan.GroundSurface;
import spanwright.plan.Plan;
import spanwright.plan.Soil;
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
  private final Fields fields;

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
    this.notes = new Notes(plan);
    Soil soil = plan.site().ground();
    this.fields =
        new Fields(Ground.real(soil.permittivity(), soil.conductivity()), new Solver(tables));
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
    return fields.tally();
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
    fields.prepare(rows, reach, low, highest, threads);
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

  /**
   * As {@link #hang}, told only what is foul or tight: enough to know whether it is allowed.
   *
   * @throws IllegalArgumentException with a sentence when the layout makes no sense
   */
  public Hung hangClosely(Layout layout) {
    var rigged = rigging.hang(layout);
    return new Hung(layout, rigged, clearances.checkClosely(rigged));
  }

  /** The same hung layout with every distance worth telling. */
  public Hung told(Hung hung) {
    return new Hung(hung.layout(), hung.rigged(), clearances.check(hung.rigged()));
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
      GroundPlane plane = antennas.plane(hung.rigged());
      AntennaModel model = antennas.of(hung.rigged(), plane, Metal.none());
      Fed quick = feed(hung, fields.glance(model, plane, middleRows));
      return Scoring.total(
          scoring.parts(quick.rows, PlacementWriter.masts(hung.rigged()), hung.clearances()));
    } catch (ModelFault fault) {
      return Double.NEGATIVE_INFINITY;
    }
  }

  /**
   * One placement, the whole chain, held against a finer mesh and all; also a foul one. Works on
   * all processors.
   *
   * @throws IllegalArgumentException with a sentence when the layout makes no sense
   */
  public Placement assess(Layout layout) {
    return assess(hang(layout), true, true);
  }

  /**
   * A hung layout, the whole chain: full mesh, every frequency, metalwork and all. Not held against
   * a finer mesh: {@link #refined} does that for what is to be shown.
   *
   * @throws Unsolvable with a sentence when the field solver cannot take it as it hangs
   */
  public Placement assess(Hung hung) {
    return assess(hung, false, false);
  }

  /**
   * The same placement as {@link #assess(Hung)} gave, held against a finer mesh on every band's
   * middle frequency.
   */
  public Placement refined(Hung hung) {
    return assess(hung, true, false);
  }

  private Placement assess(Hung hung, boolean refine, boolean together) {
    List<String> said = new ArrayList<>();
    GroundPlane plane = antennas.plane(hung.rigged());
    Solved solved = solved(hung, plane, refine, together, said);
    Fed fed = feed(hung, solved.rows);
    List<String> told = new ArrayList<>(Judgement.notes(solved.quality));
    solved.warnings.stream()
        .filter(warning -> !solved.quality.doubts().contains(warning))
        .forEach(told::add);
    told.addAll(said);
    told.addAll(clearances.notes(hung.rigged()));
    return new PlacementWriter(plan, surface, scoring)
        .write(hung, fed.rows, fed.lineLength, notes.of(hung, plane, rows, told), solved.quality);
  }

  private record Solved(List<Fields.Seen> rows, List<String> warnings, Placement.Quality quality) {}

  /**
   * With all the metalwork that the field solver can take; what it cannot is named and left out.
   *
   * @param said is told what was left out
   */
  private Solved solved(
      Hung hung, GroundPlane plane, boolean refine, boolean together, List<String> said) {
    Metal metal = antennas.metal();
    while (true) {
      Metal with = metal;
      try {
        AntennaModel model = antennas.of(hung.rigged(), plane, with);
        List<Fields.Seen> seen = fields.look(model, plane, rows, refine, together);
        UnaryOperator<String> named = sentence -> antennas.named(sentence, hung.rigged(), with);
        List<String> warnings =
            seen.stream()
                .flatMap(one -> one.solution().warnings().stream())
                .map(named)
                .distinct()
                .toList();
        return new Solved(seen, warnings, Judgement.of(seen, named));
      } catch (ModelFault fault) {
        String sentence = antennas.named(fault.getMessage(), hung.rigged(), with);
        if (with.isEmpty()) {
          throw new Unsolvable(sentence, fault);
        }
        Optional<String> piece = antennas.blamed(fault.getMessage(), hung.rigged(), with);
        said.add(piece.orElse("The metalwork") + " is not in these figures. " + sentence);
        metal = piece.isPresent() ? with.without(piece.get()) : Metal.none();
      }
    }
  }

  private record Fed(List<Placement.BandResult> rows, double lineLength) {}

  /** Down the line, whose length is chosen here where it is free, to the socket. */
  private Fed feed(Hung hung, List<Fields.Seen> seen) {
    String line = hung.layout().feed().line() == null ? lineId() : hung.layout().feed().line();
    double length = lineLength(hung, line, seen);
    List<Placement.BandResult> results = new ArrayList<>();
    for (Fields.Seen one : seen) {
      Row row = one.row();
      FeedResult fed =
          station.run(line, length, row.band(), row.frequencyMHz(), one.solution().impedance());
      results.add(radio.row(row, one.solution(), one.far(), fed));
    }
    return new Fed(results, length);
  }

  private double lineLength(Hung hung, String line, List<Fields.Seen> seen) {
    Double chosen = hung.layout().feed().lineLength();
    if (chosen != null) {
      return chosen;
    }
    List<Station.Load> loads = new ArrayList<>();
    for (Fields.Seen one : seen) {
      Row row = one.row();
      if (row.middle() && !row.band().receiveOnly()) {
        Complex z = one.solution().impedance();
        loads.add(new Station.Load(row.band(), row.frequencyMHz(), z));
      }
    }
    return station.bestLength(line, hung.rigged().feedLine().runLength(), loads);
  }
}
