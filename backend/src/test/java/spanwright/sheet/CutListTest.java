package spanwright.sheet;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.Test;
import spanwright.plan.Place;

/** Every length of the fixture's list, worked out again with a pencil. */
class CutListTest {
  private static final double EXACT = 1e-9;

  private final SheetModel model = Fixture.model(SheetOptions.Paper.A4, SheetOptions.Units.METRES);

  @Test
  void wire_is_cut_with_both_ends_turned_back_and_two_per_cent_to_trim() {
    // 30.20 m fed at 0.54: 16.308 and 13.892; ends 2 × 0.15; trim 2 %: 0.32616 and 0.27784
    CutParts.WirePiece w1 = model.wires().get(0);
    assertEquals("W1", w1.mark());
    assertEquals("feedpoint to Old ash", w1.piece());
    assertEquals(16.308, w1.finished(), EXACT);
    assertEquals(0.30, w1.turnsBack(), EXACT);
    assertEquals(0.32616, w1.trim(), EXACT);
    // 16.93416, up to 16.94: rounded once
    assertEquals(16.94, w1.cut(), EXACT);
    CutParts.WirePiece w2 = model.wires().get(1);
    assertEquals(13.892, w2.finished(), EXACT);
    assertEquals(0.27784, w2.trim(), EXACT);
    // 13.892 + 0.30 + 0.27784 = 14.46984, up to 14.47
    assertEquals(14.47, w2.cut(), EXACT);
    assertEquals(2, model.wires().size());
  }

  @Test
  void a_short_wire_keeps_the_least_trim() {
    assertTrue(Allowances.TRIM_SHARE * 9 < Allowances.TRIM_LEAST);
    var short9 =
        new spanwright.assess.Placement.Conductor(
            Fixture.placement().conductors().get(0).points(), "wire", 9);
    CutParts.WirePiece piece =
        Sheets.of(
                Fixture.plan(),
                Fixture.catalogue(),
                Placements.withConductors(Fixture.placement(), List.of(short9)),
                SheetOptions.standard())
            .wires()
            .get(0);
    // 4.86 + 0.30 + 0.20
    assertEquals(5.36, piece.cut(), EXACT);
  }

  @Test
  void the_feed_line_is_cut_with_its_slack_and_its_ends() {
    CutParts.FeedLine line = model.feedLine();
    // (9, 8.2, 8.5) to (9.6, 8.3, 4.0): √(0.36 + 0.01 + 20.25) = 4.5409
    // to (11, 8, 1.2): √(1.96 + 0.09 + 7.84) = 3.1448
    assertEquals(7.6857, line.run(), 1e-4);
    assertEquals(11.0 - 7.6857, line.slack(), 1e-4);
    assertEquals(11.20, line.cut(), EXACT);
    // 25 mm wide: four times that is 0.10
    assertEquals(0.10, line.standOffReach(), EXACT);
    // all 7.69 m run within half a metre of the house: one at the entry and eight
    assertEquals(9, line.standOffs());
  }

  @Test
  void a_rope_to_a_weight_is_one_rope_and_no_longer_than_its_run_and_knots() {
    // tail 1.80 + fall 4.50 = 6.30; two knots of 0.5: 7.30, up to 7.5
    CutParts.Rope r1 = rope("R1");
    assertEquals(6.30, r1.run(), EXACT);
    assertEquals(7.5, r1.cut(), EXACT);
    assertEquals("weight, 7.3 kg", r1.to());
  }

  @Test
  void halyards_are_endless_and_the_tail_is_a_rope_of_its_own() {
    // up and down 7.00: 14.00 + 0.5 + 1.5
    assertEquals(16.0, rope("R2").cut(), EXACT);
    // tail 1.60 + 2 × 0.5 = 2.60, up to 3.0
    CutParts.Rope tail = rope("R3");
    assertEquals(3.0, tail.cut(), EXACT);
    assertNull(tail.over());
    // up and down 5.80: 11.60 + 2.0 = 13.6, up to 14.0
    assertEquals(14.0, rope("R4").cut(), EXACT);
  }

  @Test
  void a_line_kept_aside_brings_the_weighted_end_down_to_the_ground() {
    // twice 7.5 m less the 6.30 there is: 8.70 + 0.5 + 1.0 = 10.2, up to 10.5
    CutParts.Rope line = rope("R5");
    assertEquals(8.70, line.run(), EXACT);
    assertEquals(10.5, line.cut(), EXACT);
    assertTrue(line.from().contains("R1"));
  }

  private CutParts.Rope rope(String mark) {
    return model.ropes().stream().filter(r -> r.mark().equals(mark)).findFirst().orElseThrow();
  }

  @Test
  void guys_are_measured_from_head_to_peg_and_rounded_up_to_half_a_metre() {
    // √(2.5² + 7²) = 7.4330; + 2 × 0.75 = 8.933, up to 9.0
    for (String mark : List.of("G1", "G2", "G3")) {
      CutParts.Rope guy =
          model.ropes().stream().filter(r -> r.mark().equals(mark)).findFirst().orElseThrow();
      assertEquals(7.433, guy.run(), 0.003);
      assertEquals(9.0, guy.cut(), EXACT);
    }
    assertEquals(8, model.ropes().size());
  }

  @Test
  void nothing_is_ever_cut_short() {
    for (double metres = 0.01; metres < 40; metres += 0.137) {
      assertTrue(Figures.upToCentimetre(metres) >= metres - 1e-7);
      assertTrue(Figures.upToCentimetre(metres) < metres + 0.01);
      assertTrue(Figures.upToHalfMetre(metres) >= metres - 1e-7);
      assertTrue(Figures.upToHalfMetre(metres) < metres + 0.5);
    }
    assertEquals(9.65, Figures.upToCentimetre(9.20 + 0.30 + 0.15), EXACT);
  }

  @Test
  void hardware_counts_follow_from_the_list() {
    assertEquals(2, count("end insulators, 100 mm"));
    assertEquals(1, count("centre piece with strain relief"));
    assertEquals(3, count("pulleys to suit the rope"));
    // a cleat for each lift that goes to no weight
    assertEquals(2, count("cleats"));
    assertEquals(3, count("guy pegs, 0.75 m"));
    assertEquals(9, count("line stand-offs"));
    assertEquals(1, count("weight, Old ash"));
    CutParts.Item rope = item("polyester, 5 mm");
    // 7.5 + 16 + 3 + 14 + 10.5 + 3 × 9
    assertEquals(78.0, rope.length(), EXACT);
    // 16.94 + 14.47
    assertEquals(31.41, item("covered copper, 1.6 mm").length(), EXACT);
  }

  private int count(String what) {
    return item(what).count();
  }

  private CutParts.Item item(String what) {
    return model.hardware().stream().filter(i -> i.what().equals(what)).findFirst().orElseThrow();
  }

  @Test
  void sag_to_sight_is_the_drop_at_mid_span() {
    HangParts.Sag first = model.sags().get(0);
    assertEquals("1–2", first.span());
    // (6, 26) to (9, 8.2): √(9 + 316.84) = 18.0510
    assertEquals(18.0510, first.level(), 1e-4);
    assertEquals(0.30, first.middle(), 1e-6);
    // (7.5 + 8.5) / 2 − 0.30
    assertEquals(7.70, first.heightMiddle(), 1e-6);
    // atan2(3, −17.8) = 170.43°, plan north 10°: 180.43°; 2° west variation adds
    assertEquals(180.43, first.bearing(), 0.01);
    assertEquals(182.43, first.magnetic(), 0.01);
  }

  @Test
  void the_middle_of_a_run_lies_half_way_along_its_chord_however_it_is_pointed() {
    Place middle =
        HangingList.middle(
            List.of(
                new Place(0, 0, 5), new Place(1, 0, 4), new Place(7, 0, 4), new Place(10, 0, 6)));
    assertEquals(5, middle.x(), EXACT);
    assertEquals(4, middle.z(), EXACT);
  }
}
