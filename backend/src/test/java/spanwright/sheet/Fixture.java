package spanwright.sheet;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import spanwright.assess.Placement;
import spanwright.clearance.Clearance;
import spanwright.clearance.State;
import spanwright.plan.Band;
import spanwright.plan.Brief;
import spanwright.plan.Building;
import spanwright.plan.Canopy;
import spanwright.plan.Catalogue;
import spanwright.plan.Consent;
import spanwright.plan.Datum;
import spanwright.plan.Entry;
import spanwright.plan.LineKind;
import spanwright.plan.LineLengths;
import spanwright.plan.MastZone;
import spanwright.plan.Metalwork;
import spanwright.plan.OverheadLine;
import spanwright.plan.PeopleVolume;
import spanwright.plan.Place;
import spanwright.plan.Plan;
import spanwright.plan.Point;
import spanwright.plan.RopeKind;
import spanwright.plan.Rules;
import spanwright.plan.Shape;
import spanwright.plan.Site;
import spanwright.plan.Soil;
import spanwright.plan.Support;
import spanwright.plan.Target;
import spanwright.plan.Tree;
import spanwright.plan.WireKind;
import spanwright.plan.Zone;

/**
 * An invented garden and a placement in it, both made by hand so that every figure of the sheet can
 * be recomputed with a pencil. The wire is bent over the gable pole: 18 m to the ash, 14 m to a new
 * mast in the back bed.
 */
final class Fixture {
  static final Place ASH = new Place(6, 26, 7.5);
  static final Place POLE = new Place(9, 8.2, 8.5);
  static final Place MAST = new Place(19, 20, 7.0);

  private Fixture() {}

  static SheetModel model(SheetOptions.Paper paper, SheetOptions.Units units) {
    return Sheets.of(
        plan(), catalogue(), placement(), new SheetOptions(paper, units, "2026-05-14 14:58"));
  }

  static List<Point> points(double... xy) {
    List<Point> points = new ArrayList<>();
    for (int i = 0; i < xy.length; i += 2) {
      points.add(new Point(xy[i], xy[i + 1]));
    }
    return points;
  }

  static Plan plan() {
    return plan(
        "Mill Row, long garden",
        new Site(52.0, -1.5, 10, -2, new Soil(13, 0.005), null),
        List.of(new Datum("A", new Point(4, 8)), new Datum("B", new Point(14, 8))),
        lines());
  }

  static List<OverheadLine> lines() {
    return List.of(
        new OverheadLine(
            "drop",
            "Service drop",
            List.of(new Place(34, 27, 6.5), new Place(14, 3, 4.6)),
            OverheadLine.Kind.LOW_VOLTAGE,
            null,
            null,
            null),
        new OverheadLine(
            "phone",
            "Phone wire",
            List.of(new Place(-6, 14, 5.2), new Place(4, 6, 4.4)),
            OverheadLine.Kind.TELEPHONE,
            null,
            null,
            null));
  }

  static Plan plan(String title, Site site, List<Datum> datums, List<OverheadLine> lines) {
    return new Plan(
        "spanwright-plan/1",
        title,
        "",
        site,
        points(0, 0, 24, 0, 24, 30, 0, 30),
        List.of(),
        List.of(
            new Building(
                "house",
                "House",
                points(4, 2, 14, 2, 14, 8, 4, 8),
                4.8,
                7.0,
                false,
                Building.Roof.GABLE,
                points(4, 5, 14, 5)),
            new Building(
                "shed",
                "Shed",
                points(18, 24, 21, 24, 21, 27, 18, 27),
                2.2,
                2.2,
                true,
                Building.Roof.FLAT,
                List.of())),
        List.of(
            new Support(
                "ash",
                "Old ash",
                Support.Kind.TREE,
                new Point(6, 26),
                4,
                8,
                0.5,
                0.4,
                300.0,
                new Canopy(3.2, 4, 12),
                false,
                null),
            new Support(
                "pole",
                "Gable pole",
                Support.Kind.MAST,
                new Point(9, 8.2),
                6,
                8.5,
                0.2,
                0,
                null,
                null,
                false,
                null)),
        List.of(new Tree("birch", "Neighbour's birch", new Point(-2, 20), new Canopy(3, 3, 11))),
        List.of(),
        List.of(
            new MastZone(
                "bed",
                "Back bed",
                points(16, 17, 22, 17, 22, 23, 16, 23),
                0,
                9,
                2.5,
                200.0,
                List.of(new Consent(3, "none"), new Consent(9, "planning permission")))),
        lines,
        List.of(
            new Zone(
                "drive", "Drive", points(16, 0, 22, 0, 22, 7, 16, 7), Zone.Rule.HEADROOM, 5.0)),
        List.of(new PeopleVolume("patio", "Patio", points(5, 8, 12, 8, 12, 11, 5, 11), 0, 2)),
        List.of(),
        List.of(
            new Metalwork(
                "gutter",
                "Gutter",
                List.of(new Place(4, 8.1, 4.8), new Place(14, 8.1, 4.8)),
                0.03)),
        new Entry(new Point(11, 8), 1.2),
        datums,
        new Brief(
            List.of(
                new Band("40 m", List.of(7.1), 1, false),
                new Band("20 m", List.of(14.175), 1, false)),
            List.of(new Target("Far", 285.0, 5600.0, null, 1, List.of())),
            100,
            0.5,
            "wire",
            "line",
            "rope",
            LineLengths.free(),
            null,
            List.of(Shape.values()),
            1,
            new Rules(Map.of(), 25, 0),
            null));
  }

  static Catalogue catalogue() {
    return new Catalogue(
        List.of(
            new WireKind(
                "wire",
                "covered copper, 1.6 mm",
                0.0008,
                5.8e7,
                1,
                null,
                0.028,
                550,
                240000,
                true,
                Map.of())),
        List.of(
            new LineKind(
                "line",
                "window line, 450 Ω, 25 mm",
                450,
                0.91,
                0.1,
                0.01,
                true,
                0.06,
                0.025,
                0.025,
                5000,
                true,
                Map.of())),
        List.of(
            new RopeKind("rope", "polyester, 5 mm", 0.005, 0.02, 4000, 40000, 0.2, true, Map.of())),
        List.of(),
        List.of(),
        List.of(),
        List.of(),
        List.of());
  }

  /** From one place to another, hanging down by a parabola. */
  static List<Place> hung(Place from, Place to, double sag) {
    List<Place> run = new ArrayList<>();
    for (int i = 0; i <= 20; i++) {
      double t = i / 20.0;
      run.add(
          new Place(
              from.x() + t * (to.x() - from.x()),
              from.y() + t * (to.y() - from.y()),
              from.z() + t * (to.z() - from.z()) - 4 * sag * t * (1 - t)));
    }
    return run;
  }

  static Placement placement() {
    List<Place> toAsh = hung(POLE, ASH, 0.30);
    List<Place> toMast = hung(POLE, MAST, 0.40);
    List<Place> wire = new ArrayList<>();
    for (int i = 18; i >= 0; i--) {
      wire.add(toAsh.get(i));
    }
    for (int i = 1; i <= 18; i++) {
      wire.add(toMast.get(i));
    }
    List<Place> ashToPole = hung(ASH, POLE, 0.30);
    Place foot = new Place(19, 20, 0);
    List<Place> guyFeet =
        List.of(new Place(21.5, 20, 0), new Place(17.75, 22.17, 0), new Place(17.75, 17.83, 0));
    List<Placement.RopeRun> ropes =
        new ArrayList<>(
            List.of(
                rope("tail", 0, List.of(wire.get(0), ASH), 1.80),
                rope("fall", 0, List.of(ASH, new Place(6, 26, 3.0)), 4.50),
                rope("halyard", 1, List.of(POLE, new Place(9, 8.2, 1.5)), 14.00),
                rope("tail", 2, List.of(wire.get(wire.size() - 1), MAST), 1.60),
                rope("halyard", 2, List.of(MAST, new Place(19, 20, 1.2)), 11.60)));
    guyFeet.forEach(g -> ropes.add(rope("guy", 2, List.of(MAST, g), MAST.distance(g))));
    return new Placement(
        "p01",
        1,
        3.4,
        List.of(new Placement.ScorePart("mean", 3.4)),
        "bent",
        List.of(new Placement.Conductor(wire, "wire", 30.20)),
        List.of(
            new Placement.Attachment(
                "ash", ASH, 7.5, 71.2, 148.3, 300.0, State.CLEAR, "weight", 7.26),
            new Placement.Attachment("pole", POLE, 8.5, 41, 121, null, State.CLEAR, "centre", null),
            new Placement.Attachment("bed", MAST, 7.0, 70, 190, 200.0, State.TIGHT, "tied", null)),
        new Placement.Feed(
            new Place(9, 8.2, 8.5),
            "line",
            11.0,
            0,
            0.54,
            List.of(POLE, new Place(9.6, 8.3, 4.0), new Place(11, 8, 1.2))),
        clearances(),
        bands(),
        List.of(
            new Placement.Span(0, 1, ashToPole, 0.30, 0.42, 0.65, 16.31, 62),
            new Placement.Span(1, 2, toMast, 0.40, 0.52, 0.70, 13.89, 62)),
        ropes,
        List.of(new Placement.NewMast("bed", foot, MAST, 7.0, guyFeet, "planning permission")),
        State.TIGHT,
        List.of("This wire passes 3.5 m from the gutter."),
        "RF exposure not computed",
        null);
  }

  static List<Clearance> clearances() {
    return List.of(
        new Clearance(
            "mast-let-go",
            "drop",
            "mast let go at Back bed",
            new Place(19, 20, 0),
            new Place(25.5, 16.5, 5.6),
            10.19,
            10.05,
            State.TIGHT),
        new Clearance(
            "wire-let-go",
            "drop",
            "wire let go at Old ash",
            new Place(15, 11, 4),
            new Place(18.4, 8.3, 5.0),
            4.456,
            3.05,
            State.CLEAR),
        new Clearance(
            "overhead-low-voltage",
            "drop",
            "guy",
            new Place(21.5, 20, 0),
            new Place(26.3, 17.8, 5.7),
            7.77,
            3.05,
            State.CLEAR),
        new Clearance(
            "overhead-telephone",
            "phone",
            "feed line",
            new Place(9, 8.2, 5),
            new Place(4, 6, 4.4),
            5.49,
            0.6,
            State.CLEAR),
        new Clearance(
            "canopy-wire",
            "birch",
            "wire",
            new Place(6.2, 24.8, 7.3),
            new Place(1, 20.6, 7),
            0.55,
            0.5,
            State.TIGHT));
  }

  private static Placement.RopeRun rope(
      String what, int attachment, List<Place> points, double length) {
    return new Placement.RopeRun(what, attachment, points, length, "rope");
  }

  private static List<Placement.BandResult> bands() {
    return List.of(band("40 m", 7.1, 61, -410), band("20 m", 14.175, 2400, 870));
  }

  private static Placement.BandResult band(String name, double mhz, double r, double x) {
    return new Placement.BandResult(
        name,
        mhz,
        List.of(r, x),
        7.9,
        0.4,
        List.of(r / 3, -x / 2),
        new Placement.Matching(State.CLEAR, "in range", 0.2, 800, 1e-6, 1e-10),
        5.1,
        40,
        120,
        0.8,
        null,
        List.of(),
        null,
        List.of());
  }
}
