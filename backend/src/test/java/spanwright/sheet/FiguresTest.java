package spanwright.sheet;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.api.Test;

class FiguresTest {
  private final Figures metres = new Figures(SheetOptions.Units.METRES);
  private final Figures feet = new Figures(SheetOptions.Units.FEET);

  @Test
  void a_distance_found_is_never_rounded_up_nor_one_required_down() {
    assertEquals("3.04", metres.found(3.0499));
    assertEquals("3.05", metres.found(3.05));
    assertEquals("3.05", metres.required(3.05));
    assertEquals("3.06", metres.required(3.0501));
    // 3.05 m is 10′ 0.079″
    assertEquals("10′ 0″", feet.found(3.05));
    assertEquals("10′ 1″", feet.required(3.05));
  }

  @Test
  void rounding_never_turns_enough_into_too_little_or_the_other_way_round() {
    assertEquals("4.45 of 3.05", metres.foundOf(4.456, 3.05));
    assertEquals("0.079 of 0.079", metres.foundOf(0.0788, 0.0788));
    assertEquals("0.08 of 0.08", metres.foundOf(0.0815, 0.0788));
    assertEquals("3.04 of 3.05", metres.foundOf(3.0499, 3.05));
    assertEquals("3.05 of 3.05", metres.foundOf(3.05, 3.05));
    assertEquals("3051 of 3050 mm", feet.foundOf(3.0515, 3.05));
    assertEquals("33′ 5″ of 33′ 0″", feet.foundOf(10.19, 10.05));
  }

  @Test
  void feet_and_inches_read_as_a_tape_does() {
    assertEquals("12′ 4″", feet.length(12 * 0.3048 + 4 * 0.0254));
    assertEquals("0′ 6½″", feet.length(0.1651));
    assertEquals("0′ ½″", feet.length(0.0127));
    assertEquals("1′ 0″", feet.length(0.3047));
    // ropes to the next foot
    assertEquals("30′ 0″", feet.ropeCut(9.0));
    assertEquals("27′ 11″", feet.height(8.5));
  }

  @Test
  void numbers_have_a_true_minus_and_never_a_minus_nought() {
    assertEquals("−0.35", Figures.fixed(-0.35, 2));
    assertEquals("0.00", Figures.fixed(-0.0004, 2));
    assertEquals("12\u2009345", Figures.fixed(12345, 0));
    assertEquals("1234", Figures.fixed(1234, 0));
  }

  @Test
  void bearings_run_from_000_to_359() {
    assertEquals("000°", Figures.bearing(359.7));
    assertEquals("045°", Figures.bearing(45.2));
    assertEquals("358°", Figures.bearing(-2));
  }

  @Test
  void impedances_carry_their_sign_in_the_middle() {
    assertEquals("35 − j410 Ω", Figures.impedance(35, -410));
    assertEquals("4.2 + j7 Ω", Figures.impedance(4.2, 7));
  }
}
