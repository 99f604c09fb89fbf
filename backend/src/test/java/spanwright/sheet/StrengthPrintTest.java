package spanwright.sheet;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import spanwright.assess.Placement;
import spanwright.clearance.State;
import spanwright.plan.Place;

/** What the rigging knows of strength, travel, free ends and return wires, on the list. */
class StrengthPrintTest {
  private static SheetModel model(Placement placement) {
    return Sheets.of(Fixture.plan(), Fixture.catalogue(), placement, SheetOptions.standard());
  }

  /** The fixture with margins, and a weight that moves. */
  private static Placement strong() {
    Placement p = Fixture.placement();
    List<Placement.Span> spans = new ArrayList<>();
    for (Placement.Span s : p.spans()) {
      spans.add(
          new Placement.Span(
              s.from(),
              s.to(),
              s.points(),
              s.sag(),
              s.sagInWind(),
              s.blowOut(),
              s.wireLength(),
              s.tension(),
              150.2,
              new Placement.SpanStrength(2.99, 7.46, 6.71, "wire", 260.9, "ice and gust")));
    }
    List<Placement.Attachment> held = new ArrayList<>(p.attachments());
    Placement.Attachment a = held.get(0);
    held.set(
        0,
        new Placement.Attachment(
            a.on(),
            a.at(),
            a.aboveGround(),
            100,
            150,
            400.0,
            State.CLEAR,
            "weight",
            10.0,
            0.31,
            0.42,
            0.659));
    return Placements.withSpans(Placements.withAttachments(p, held), spans);
  }

  @Test
  void margins_are_rounded_down_and_say_what_parts_first_in_what_weather() {
    ListPart part = new RigTables(model(strong())).margins();
    List<String> first = part.rows().get(0).stream().map(ListPart.Cell::text).toList();
    // worst 150.2 N is told as 151; wire 2.99 as 2.9; support 400 over 150 as 2.6
    assertEquals("151", first.get(2));
    assertEquals(
        List.of("ice and gust", "2.9", "7.4", "6.7", "2.6", "wire", "260"), first.subList(3, 10));
    assertTrue(model(strong()).hardware().stream().anyMatch(i -> i.what().contains("at 260 N")));
  }

  @Test
  void a_placement_without_margins_prints_no_table_of_them() {
    SheetModel model = model(Fixture.placement());
    assertTrue(model.margins().isEmpty());
    assertTrue(new RigTables(model).margins().isEmpty());
  }

  @Test
  void a_weight_says_how_far_it_moves_and_what_rope_is_left() {
    String notes = String.join(" ", new RigTables(model(strong())).attachments().notes());
    assertTrue(
        notes.contains("Point 1: the weight rises up to 0.31\u00a0m and sinks up to 0.42\u00a0m"),
        notes);
    assertTrue(notes.contains("0.65\u00a0m of rope is left"), notes);
  }

  @Test
  void a_free_end_is_told_on_its_wire_and_its_rope_is_tied_before_it() {
    Placement p = Fixture.placement();
    Placement.Conductor c = p.conductors().get(0);
    List<Place> points = new ArrayList<>(c.points());
    Place end = points.get(points.size() - 1);
    points.add(new Place(end.x(), end.y(), end.z() - 1.5));
    SheetModel model =
        model(
            Placements.withConductors(
                p, List.of(new Placement.Conductor(points, c.wire(), c.length() + 1.5))));
    String piece = model.wires().get(1).piece();
    assertTrue(piece.endsWith("its last 1.50\u00a0m hanging free"), piece);
    assertTrue(
        model.ropes().stream().anyMatch(r -> r.from().contains("1.50\u00a0m from its end")),
        model.ropes().toString());
  }

  @Test
  void a_wire_from_the_feedpoint_that_is_not_fed_is_a_return_wire() {
    Placement p = Fixture.placement();
    Place feed = p.feed().at();
    List<Placement.Conductor> wires = new ArrayList<>(p.conductors());
    // drawn towards the feedpoint: its far end is the first
    wires.add(
        new Placement.Conductor(List.of(Fixture.MAST, feed), p.conductors().get(0).wire(), 9));
    CutParts.WirePiece last = model(Placements.withConductors(p, wires)).wires().get(2);
    assertEquals("return wire, feedpoint to New mast, Back bed, not earthed", last.piece());
  }
}
