package spanwright.sheet;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;
import spanwright.assess.Placement;
import spanwright.clearance.State;
import spanwright.plan.Brief;
import spanwright.plan.Place;
import spanwright.plan.Plan;
import spanwright.plan.Point;

/** Shapes other than the fixture's, very large plots, and plans that say little. */
class OddPlacementsTest {
  private static SheetModel every(Plan plan, Placement placement) {
    SheetModel model = Sheets.of(plan, Fixture.catalogue(), placement, SheetOptions.standard());
    for (String text :
        List.of(
            Sheets.toCsv(model),
            Sheets.toJson(model),
            Sheets.toSvg(model),
            Sheets.toGeoJson(model))) {
      assertFalse(text.contains("NaN") || text.contains("Infinity"));
    }
    assertTrue(Sheets.toPdf(model).length > 10_000);
    return model;
  }

  private static Placement bare(
      List<Placement.Conductor> wire,
      List<Placement.Attachment> held,
      Placement.Feed feed,
      List<Placement.Span> spans) {
    return new Placement(
        "p07",
        0,
        0,
        List.of(),
        "loop",
        wire,
        held,
        feed,
        List.of(),
        List.of(),
        spans,
        List.of(),
        List.of(),
        State.CLEAR,
        List.of(),
        null,
        null);
  }

  private static Placement.Attachment held(String on, Place at) {
    return new Placement.Attachment(on, at, at.z(), 50, 90, null, State.CLEAR, "tied", null);
  }

  @Test
  void a_loop_is_one_piece_that_comes_back_to_its_feedpoint() {
    List<Place> corners =
        List.of(
            new Place(2, 12, 8), new Place(20, 12, 8), new Place(20, 28, 8), new Place(2, 28, 8));
    List<Place> ring = new ArrayList<>(corners);
    ring.add(corners.get(0));
    List<Placement.Attachment> held = new ArrayList<>();
    List<Placement.Span> spans = new ArrayList<>();
    for (int i = 0; i < 4; i++) {
      held.add(held(i % 2 == 0 ? "ash" : "pole", corners.get(i)));
      List<Place> run = Fixture.hung(corners.get(i), corners.get((i + 1) % 4), 0.2);
      spans.add(new Placement.Span(i, (i + 1) % 4, run, 0.2, 0.3, 0.4, 17, 50));
    }
    Placement.Feed feed =
        new Placement.Feed(
            corners.get(0), "line", 12, 0, 0, List.of(corners.get(0), new Place(11, 8, 1.2)));
    SheetModel model =
        every(
            Fixture.plan(),
            bare(List.of(new Placement.Conductor(ring, "wire", 68)), held, feed, spans));
    assertEquals(1, model.wires().size());
    assertEquals("loop, feedpoint round to feedpoint", model.wires().get(0).piece());
    // 68 + 0.30 + 1.36
    assertEquals(69.66, model.wires().get(0).cut(), 1e-9);
    assertEquals("4–1", model.sags().get(3).span());
    // four spans of 68 m in all do not fit one row at any scale that fits the plot: rows of them
    assertTrue(SideInk.rows(model.source().placement(), 42).size() >= 2);
  }

  @Test
  void a_wire_fed_at_its_end_is_one_piece() {
    Placement.Feed old = Fixture.placement().feed();
    SheetModel model =
        every(
            Fixture.plan(),
            Placements.withFeed(
                Fixture.placement(),
                new Placement.Feed(old.at(), old.line(), 5, 0, 0, old.path())));
    assertEquals(1, model.wires().size());
    assertEquals("feedpoint to New mast, Back bed", model.wires().get(0).piece());
    // 5 m of line for a run of 7.69: said, not hidden
    assertTrue(model.feedLine().slack() < 0);
    assertTrue(String.join(" ", model.feedLine().notes()).contains("Do not cut"));
    assertEquals(
        1,
        model.hardware().stream()
            .filter(i -> i.what().startsWith("feed insulator"))
            .findFirst()
            .orElseThrow()
            .count());
  }

  @Test
  void two_points_straight_above_one_another_can_be_set_out() {
    Place low = new Place(9, 8.2, 3);
    List<Placement.Attachment> held = List.of(held("pole", low), held("pole", Fixture.POLE));
    Placement.Span span = new Placement.Span(0, 1, List.of(low, Fixture.POLE), 0, 0, 0, 5.5, 10);
    Placement.Feed feed = new Placement.Feed(low, "line", 6, 0, 0, List.of(low));
    SheetModel model =
        every(
            Fixture.plan(),
            bare(
                List.of(new Placement.Conductor(List.of(low, Fixture.POLE), "wire", 5.5)),
                held,
                feed,
                List.of(span)));
    assertEquals(0, model.sags().get(0).level(), 1e-12);
  }

  @Test
  void a_plan_that_names_nothing_is_drawn_with_its_ids() {
    Plan p = Fixture.plan();
    Brief b = p.brief();
    Brief silent =
        new Brief(
            b.bands(),
            b.targets(),
            0,
            1,
            null,
            null,
            null,
            b.lineLengths(),
            null,
            b.shapes(),
            0,
            null,
            null);
    Plan bare =
        new Plan(
            p.format(),
            null,
            null,
            p.site(),
            p.boundary(),
            null,
            List.of(),
            p.supports(),
            null,
            null,
            p.mastZones(),
            null,
            null,
            null,
            null,
            null,
            p.entry(),
            null,
            silent);
    SheetModel model = every(bare, Fixture.placement());
    assertEquals("Untitled plot", model.head().title());
    assertTrue(model.setOut().a().what().contains("corner of the boundary"));
  }

  @Test
  void a_plot_too_large_for_one_to_five_hundred_shows_where_the_work_is() {
    Plan p = Fixture.plan();
    Plan estate =
        new Plan(
            p.format(),
            "Estate",
            null,
            p.site(),
            Fixture.points(-2000, -2000, 3000, -2000, 3000, 3000, -2000, 3000),
            null,
            p.buildings(),
            p.supports(),
            p.trees(),
            null,
            p.mastZones(),
            p.overheadLines(),
            p.zones(),
            p.people(),
            null,
            p.metalwork(),
            p.entry(),
            p.datums(),
            p.brief());
    SheetModel model = every(estate, Fixture.placement());
    assertEquals(1000, new DrawingPage(model).scale());
    assertTrue(Sheets.toSvg(model).contains("part of the plot"));
  }

  @Test
  void places_up_to_a_hundred_kilometres_off_are_drawn_in_time() {
    List<Point> far = Fixture.points(0, 0, 90_000, 0, 90_000, 90_000, 0, 90_000);
    Plan p = Fixture.plan();
    Plan huge =
        new Plan(
            p.format(),
            "Huge",
            null,
            p.site(),
            far,
            null,
            p.buildings(),
            p.supports(),
            p.trees(),
            null,
            p.mastZones(),
            List.of(
                new spanwright.plan.OverheadLine(
                    "far",
                    "Far line",
                    List.of(new Place(-99_000, 14, 9), new Place(99_000, 20, 9)),
                    spanwright.plan.OverheadLine.Kind.HIGH_VOLTAGE,
                    null,
                    null,
                    null)),
            null,
            null,
            null,
            null,
            p.entry(),
            p.datums(),
            p.brief());
    long start = System.nanoTime();
    every(huge, Fixture.placement());
    assertTrue(System.nanoTime() - start < 20e9);
  }

  @Test
  void any_wire_between_any_two_supports_makes_a_whole_sheet() {
    Random random = new Random(11);
    for (int i = 0; i < 12; i++) {
      Place a =
          new Place(
              24 * random.nextDouble(), 30 * random.nextDouble(), 3 + 6 * random.nextDouble());
      Place b =
          new Place(
              24 * random.nextDouble(), 30 * random.nextDouble(), 3 + 6 * random.nextDouble());
      List<Place> run = Fixture.hung(a, b, random.nextDouble());
      double fraction = random.nextDouble();
      Placement.Feed feed =
          new Placement.Feed(
              run.get((int) (fraction * 20)),
              "line",
              20 * random.nextDouble(),
              0,
              fraction,
              List.of(run.get((int) (fraction * 20)), new Place(11, 8, 1.2)));
      SheetModel model =
          every(
              Fixture.plan(),
              bare(
                  List.of(new Placement.Conductor(run, "wire", Job.length(run))),
                  List.of(held("ash", a), held("pole", b)),
                  feed,
                  List.of(new Placement.Span(0, 1, run, 0.5, 0.6, 0.7, Job.length(run), 40))));
      double cut = model.wires().stream().mapToDouble(CutParts.WirePiece::cut).sum();
      assertTrue(cut > Job.length(run));
    }
  }
}
