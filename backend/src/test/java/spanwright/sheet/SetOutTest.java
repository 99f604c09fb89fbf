package spanwright.sheet;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertNotNull;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;
import spanwright.plan.Datum;
import spanwright.plan.Place;
import spanwright.plan.Plan;
import spanwright.plan.Point;
import spanwright.plan.Site;
import spanwright.plan.Soil;
import spanwright.plan.Terrain;

/** Points by two tapes, worked out again by hand and set out again from the tapes. */
class SetOutTest {
  private final SetOutParts.SetOut setOut =
      Fixture.model(SheetOptions.Paper.A4, SheetOptions.Units.METRES).setOut();

  @Test
  void tapes_are_the_level_distances_from_the_datums() {
    SetOutParts.Mark ash = setOut.points().get(0);
    // ash (6, 26); A (4, 8): √(4 + 324); B (14, 8): √(64 + 324); C (18, 24): √(144 + 4)
    assertEquals(18.1108, ash.fromA(), 1e-4);
    assertEquals(19.6977, ash.fromB(), 1e-4);
    assertEquals(12.1655, ash.check(), 1e-4);
    assertEquals("left", ash.side());
    // cosine rule: (328 + 388 − 100) / (2 × 18.1108 × 19.6977) = 0.86339
    assertEquals(Math.toDegrees(Math.acos(308 / Math.sqrt(328.0 * 388))), ash.crossing(), 1e-9);
    assertFalse(ash.flat());
    // atan2(2, 18) = 6.34°, + 10° plan north; west variation of 2° adds 2°
    assertEquals(16.34, ash.bearing(), 0.01);
    assertEquals(18.34, ash.magnetic(), 0.01);
    assertEquals(7.5, ash.height(), 1e-9);
  }

  @Test
  void a_three_four_five_corner_measures_as_it_should() {
    assertEquals(
        90, SetOutList.crossing(new Place(3, 0, 0), new Place(0, 4, 0), new Place(0, 0, 0)), 1e-9);
    assertEquals(
        180,
        SetOutList.crossing(new Place(-3, 0, 0), new Place(4, 0, 0), new Place(0, 0, 0)),
        1e-9);
  }

  @Test
  void points_are_numbered_attachments_first_then_guys_then_entry() {
    List<String> names = setOut.points().stream().map(SetOutParts.Mark::name).toList();
    assertEquals(
        List.of(
            "Old ash",
            "Gable pole",
            "New mast, Back bed, foot",
            "Guy, east",
            "Guy, north",
            "Guy, south-west",
            "Entry, centre of plate"),
        names);
    for (int i = 0; i < names.size(); i++) {
      assertEquals(i + 1, setOut.points().get(i).number());
    }
  }

  @Test
  void tapes_that_cross_flat_are_marked_and_a_better_pair_is_offered() {
    SetOutParts.Mark pole = setOut.points().get(1);
    assertTrue(pole.flat());
    assertNotNull(pole.better());
    assertTrue(pole.better().crossing() >= 30 && pole.better().crossing() <= 150);
  }

  @Test
  void every_point_can_be_found_again_from_its_tapes() {
    for (SetOutParts.Mark mark : setOut.points()) {
      Place a = setOut.a().at();
      Place b = setOut.b().at();
      double base = a.onPlan().distance(b.onPlan());
      double along =
          (mark.fromA() * mark.fromA() - mark.fromB() * mark.fromB() + base * base) / (2 * base);
      double square = mark.fromA() * mark.fromA() - along * along;
      double off = Math.sqrt(Math.max(0, square)) * (mark.side().equals("right") ? -1 : 1);
      double ux = (b.x() - a.x()) / base;
      double uy = (b.y() - a.y()) / base;
      Point found = new Point(a.x() + along * ux - off * uy, a.y() + along * uy + off * ux);
      assertEquals(0, found.distance(mark.at().onPlan()), 1e-4, mark.name());
      assertEquals(mark.check(), found.distance(setOut.c().at().onPlan()), 1e-4);
    }
  }

  @Test
  void the_check_point_tells_a_point_from_its_mirror_image() {
    double off = Math.abs(setOut.c().at().y() - 8);
    assertTrue(off >= 1, "C lies on the line from A to B");
  }

  @Test
  void without_datums_corners_of_buildings_are_used_and_it_is_said() {
    SetOutParts.SetOut bare = model(List.of()).setOut();
    assertTrue(bare.a().what().contains("corner of"), bare.a().what());
    assertTrue(bare.b().what().contains("corner of"), bare.b().what());
    assertNotEquals(bare.a().at(), bare.b().at());
    assertTrue(bare.notes().get(0).contains("no datum points"), bare.notes().get(0));
  }

  @Test
  void one_datum_is_joined_by_a_corner() {
    SetOutParts.SetOut one = model(List.of(new Datum("Gatepost", new Point(0, 0)))).setOut();
    assertTrue(one.a().what().startsWith("Gatepost"));
    assertTrue(one.notes().get(0).contains("only one datum"), one.notes().get(0));
  }

  @Test
  void two_datums_on_one_spot_count_as_one() {
    SetOutParts.SetOut twin =
        model(List.of(new Datum("A", new Point(4, 8)), new Datum("B", new Point(4, 8)))).setOut();
    assertTrue(twin.a().at().onPlan().distance(twin.b().at().onPlan()) >= 1);
  }

  @Test
  void a_building_in_the_way_of_a_tape_is_named() {
    // from (4, 0) and (20, 0), in front of the house, to the entry behind it
    SetOutParts.SetOut front =
        model(List.of(new Datum("A", new Point(4, 0)), new Datum("B", new Point(20, 0)))).setOut();
    SetOutParts.Mark pole = front.points().get(1);
    assertTrue(pole.blocked().contains("from A by House"), pole.blocked());
    assertNotNull(pole.better());
    assertNull(setOut.points().get(0).blocked());
  }

  @Test
  void what_stands_on_a_building_is_said_to_and_asks_for_no_datum() {
    List<spanwright.assess.Placement.Attachment> held =
        new java.util.ArrayList<>(Fixture.placement().attachments());
    held.set(
        1,
        new spanwright.assess.Placement.Attachment(
            held.get(1).on(),
            new Place(9, 5, 8.5),
            8.5,
            50,
            90,
            null,
            spanwright.clearance.State.CLEAR,
            "tied",
            null));
    SetOutParts.SetOut roof =
        Sheets.of(
                Fixture.plan(),
                Fixture.catalogue(),
                Placements.withAttachments(Fixture.placement(), held),
                SheetOptions.standard())
            .setOut();
    assertEquals("on House", roof.points().get(1).blocked());
    assertTrue(String.join(" ", roof.notes()).contains("found from its walls"));
  }

  @Test
  void where_no_known_points_serve_a_new_datum_is_found_inside_the_plot_and_off_buildings() {
    // a thin plot whose corners all lie on the line of the wire's foot: tapes to it cross flat
    Plan p = Fixture.plan();
    Plan plan =
        new Plan(
            p.format(),
            "Strip",
            "",
            p.site(),
            Fixture.points(0, 0, 60, 0, 60, 2.4, 0, 2.4),
            List.of(),
            List.of(),
            p.supports(),
            List.of(),
            List.of(),
            p.mastZones(),
            List.of(),
            List.of(),
            List.of(),
            List.of(),
            List.of(),
            p.entry(),
            List.of(new Datum("A", new Point(1, 0.4)), new Datum("B", new Point(59, 0.4))),
            p.brief());
    Place middle = new Place(30, 1.2, 7);
    List<spanwright.assess.Placement.Attachment> held =
        new java.util.ArrayList<>(Fixture.placement().attachments());
    held.set(
        0,
        new spanwright.assess.Placement.Attachment(
            held.get(0).on(),
            middle,
            7,
            50,
            90,
            null,
            spanwright.clearance.State.CLEAR,
            "tied",
            null));
    SheetModel model =
        Sheets.of(
            plan,
            Fixture.catalogue(),
            Placements.withAttachments(Fixture.placement(), held),
            SheetOptions.standard());
    SetOutParts.Mark mark = model.setOut().points().get(0);
    assertTrue(mark.flat());
    SetOutParts.Proposed proposed = model.setOut().proposed();
    assertNotNull(proposed, "a new datum");
    Place at = proposed.known().at();
    assertTrue(at.x() > 0.29 && at.x() < 59.71 && at.y() > 0.29 && at.y() < 2.11, at.toString());
    assertTrue(proposed.side().equals("on") || !SetOutList.isFlat(proposed.fixed().crossing()));
    assertEquals(proposed.known().letter(), mark.better().from());
    assertFalse(SetOutList.isFlat(mark.better().crossing()));
    assertEquals(at.onPlan().distance(middle.onPlan()), mark.better().fromTape(), 1e-9);
    String notes = String.join(" ", model.setOut().notes());
    assertTrue(notes.contains("Drive a new datum " + proposed.known().letter()), notes);
  }

  @Test
  void heights_are_told_from_the_ground_there_and_from_the_ground_at_the_first_datum() {
    Terrain slope =
        new Terrain(List.of(new Place(-50, -50, 0), new Place(50, -50, 0), new Place(0, 60, 5.5)));
    Plan plan =
        Fixture.plan(
            "Slope",
            new Site(null, null, 0, 0, new Soil(13, 0.005), slope),
            List.of(new Datum("A", new Point(4, 8)), new Datum("B", new Point(14, 8))),
            List.of());
    SheetModel model =
        Sheets.of(plan, Fixture.catalogue(), Fixture.placement(), SheetOptions.standard());
    // the ground rises by 0.05 for each metre north of y = −50: 2.9 m at A
    assertEquals(7.5 - 2.9, model.attachments().get(0).aboveDatum(), 1e-6);
    assertEquals(7.5, model.attachments().get(0).aboveGround(), 1e-9);
  }

  @Test
  void any_two_known_points_give_finite_figures() {
    Random random = new Random(7);
    for (int i = 0; i < 40; i++) {
      Datum a = new Datum("A", new Point(24 * random.nextDouble(), 30 * random.nextDouble()));
      Datum b = new Datum("B", new Point(24 * random.nextDouble(), 30 * random.nextDouble()));
      for (SetOutParts.Mark mark : model(List.of(a, b)).setOut().points()) {
        assertTrue(Double.isFinite(mark.fromA() + mark.fromB() + mark.crossing()));
        assertTrue(mark.crossing() >= 0 && mark.crossing() <= 180);
        assertTrue(mark.bearing() >= 0 && mark.bearing() < 360);
      }
    }
  }

  private static SheetModel model(List<Datum> datums) {
    Plan plan = Fixture.plan("Plot", Fixture.plan().site(), datums, Fixture.lines());
    return Sheets.of(plan, Fixture.catalogue(), Fixture.placement(), SheetOptions.standard());
  }
}
