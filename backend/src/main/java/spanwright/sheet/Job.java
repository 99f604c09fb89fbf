package spanwright.sheet;

import java.util.DoubleSummaryStatistics;
import java.util.List;
import java.util.Optional;
import java.util.function.Function;
import java.util.stream.Stream;
import org.locationtech.jts.geom.Coordinate;
import spanwright.assess.Placement;
import spanwright.plan.Building;
import spanwright.plan.Catalogue;
import spanwright.plan.GroundSurface;
import spanwright.plan.LineKind;
import spanwright.plan.MastZone;
import spanwright.plan.Place;
import spanwright.plan.Plan;
import spanwright.plan.Point;
import spanwright.plan.RopeKind;
import spanwright.plan.Support;
import spanwright.plan.WireKind;

/**
 * A plan, a catalogue and a placement held together, with the look-ups every part of the sheet
 * needs. Says in a sentence when they do not belong together.
 */
final class Job {
  private static final String[] WINDS = {
    "north", "north-east", "east", "south-east", "south", "south-west", "west", "north-west"
  };

  final Plan plan;
  final Catalogue catalogue;
  final Placement placement;
  final Figures figures;
  private final GroundSurface ground;

  Job(Plan plan, Catalogue catalogue, Placement placement, SheetOptions options) {
    this.plan = plan;
    this.catalogue = catalogue;
    this.placement = placement;
    this.figures = new Figures(options.units());
    this.ground = GroundSurface.of(plan);
    check();
  }

  private void check() {
    if (placement.attachments().size() < 2 || placement.conductors().isEmpty()) {
      throw new IllegalArgumentException(
          "The placement hangs nothing between two points, so there is no sheet to make of it."
              + " Assess it on this plan first.");
    }
    for (Placement.Attachment held : placement.attachments()) {
      if (find(plan, held.on()).isEmpty()) {
        throw new IllegalArgumentException(
            "The placement hangs on \""
                + held.on()
                + "\", which is not on this plan. Assess it on this plan first.");
      }
    }
  }

  /** Height of the ground above the plan's zero [m]. */
  double groundAt(double x, double y) {
    return ground.heightAt(x, y);
  }

  /** A point of the plan, put on the ground. */
  Place onGround(Point at) {
    return new Place(at.x(), at.y(), groundAt(at.x(), at.y()));
  }

  WireKind wire(String id) {
    return pick(catalogue.wires(), WireKind::id, id, "wire");
  }

  LineKind line(String id) {
    return pick(catalogue.lines(), LineKind::id, id, "feed line");
  }

  RopeKind rope(String id) {
    return pick(catalogue.ropes(), RopeKind::id, id, "rope");
  }

  private static <T> T pick(List<T> kinds, Function<T, String> id, String wanted, String what) {
    return kinds.stream()
        .filter(kind -> id.apply(kind).equals(wanted))
        .findFirst()
        .orElseThrow(
            () ->
                new IllegalArgumentException(
                    "The placement uses the "
                        + what
                        + " \""
                        + wanted
                        + "\", which the catalogue does not hold. Assess the placement again."));
  }

  Optional<Support> support(String id) {
    return plan.supports().stream().filter(s -> s.id().equals(id)).findFirst();
  }

  Optional<MastZone> zone(String id) {
    return plan.mastZones().stream().filter(z -> z.id().equals(id)).findFirst();
  }

  boolean isBracket(String id) {
    return plan.bracketLines().stream().anyMatch(b -> b.id().equals(id));
  }

  boolean isTree(String id) {
    return support(id).map(s -> s.kind() == Support.Kind.TREE).orElse(false);
  }

  /** The new mast that an attachment is on. */
  Optional<Placement.NewMast> mastOf(Placement.Attachment held) {
    return placement.masts().stream()
        .filter(m -> m.zone().equals(held.on()))
        .filter(m -> m.foot().onPlan().distance(held.at().onPlan()) < 0.5)
        .findFirst();
  }

  /** What is shown to people for an id of the plan: its name, or the id itself. */
  String name(String id) {
    return name(plan, id);
  }

  static String name(Plan plan, String id) {
    return find(plan, id).map(n -> n.isBlank() ? id : n).orElse(id);
  }

  private static Optional<String> find(Plan plan, String id) {
    return Stream.of(
            plan.supports().stream().map(s -> new String[] {s.id(), s.name()}),
            plan.bracketLines().stream().map(s -> new String[] {s.id(), s.name()}),
            plan.mastZones().stream().map(s -> new String[] {s.id(), s.name()}),
            plan.overheadLines().stream().map(s -> new String[] {s.id(), s.name()}),
            plan.buildings().stream().map(s -> new String[] {s.id(), s.name()}),
            plan.trees().stream().map(s -> new String[] {s.id(), s.name()}),
            plan.zones().stream().map(s -> new String[] {s.id(), s.name()}),
            plan.people().stream().map(s -> new String[] {s.id(), s.name()}),
            plan.noise().stream().map(s -> new String[] {s.id(), s.name()}),
            plan.metalwork().stream().map(s -> new String[] {s.id(), s.name()}))
        .flatMap(s -> s)
        .filter(pair -> pair[0].equals(id))
        .map(pair -> pair[1] == null ? pair[0] : pair[1])
        .findFirst();
  }

  /** The name of an attachment as the rigger calls it. */
  String holder(Placement.Attachment held) {
    String name = name(held.on());
    if (zone(held.on()).isEmpty()) {
      return name;
    }
    return mastOf(held).map(this::mastName).orElse("New mast") + ", " + name;
  }

  /** "New mast", numbered when there are several. */
  String mastName(Placement.NewMast mast) {
    int number = placement.masts().indexOf(mast) + 1;
    return placement.masts().size() > 1 ? "New mast " + number : "New mast";
  }

  /** True bearing from one point to another [degrees, 0 to 360]. */
  double bearing(Point from, Point to) {
    double onPlan = Math.toDegrees(Math.atan2(to.x() - from.x(), to.y() - from.y()));
    return turn(onPlan + plan.site().planNorth());
  }

  /** A true bearing as the compass shows it [degrees]. */
  double magnetic(double trueBearing) {
    return turn(trueBearing - plan.site().magneticVariation());
  }

  private static double turn(double degrees) {
    double turned = degrees % 360;
    return turned < 0 ? turned + 360 : turned;
  }

  /** One of eight winds in words. */
  static String wind(double trueBearing) {
    return WINDS[(int) Math.floorMod(Math.round(trueBearing / 45), 8L)];
  }

  /** The wind in which a corner of an outline lies, seen from the outline's middle. */
  String cornerWind(List<Point> outline, Point corner) {
    DoubleSummaryStatistics x = outline.stream().mapToDouble(Point::x).summaryStatistics();
    DoubleSummaryStatistics y = outline.stream().mapToDouble(Point::y).summaryStatistics();
    // as if the outline were square, so that the corners of a long house are named alike
    double right = (corner.x() - (x.getMin() + x.getMax()) / 2) / (x.getMax() - x.getMin());
    double up = (corner.y() - (y.getMin() + y.getMax()) / 2) / (y.getMax() - y.getMin());
    return wind(bearing(new Point(0, 0), new Point(right, up)));
  }

  /** The building that a point of the plan stands on, or null. */
  Building under(Point at) {
    var point = Sight.SHAPES.createPoint(new Coordinate(at.x(), at.y()));
    return plan.buildings().stream()
        .filter(b -> Sight.core(b.footprint()).covers(point))
        .findFirst()
        .orElse(null);
  }

  /** A building that stands between two points of the plan, or null. */
  Building between(Point from, Point to) {
    return plan.buildings().stream()
        .filter(b -> Sight.blocks(b.footprint(), from, to))
        .findFirst()
        .orElse(null);
  }

  /** Length of a run of places [m]. */
  static double length(List<Place> run) {
    double sum = 0;
    for (int i = 1; i < run.size(); i++) {
      sum += run.get(i - 1).distance(run.get(i));
    }
    return sum;
  }
}
