package spanwright.search;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.Test;

class WireLengthsTest {
  private final WireLengths lengths = new WireLengths(List.of(7.1, 14.175), 5);

  @Test
  void all_the_room_comes_first_rounded_down_to_a_centimetre() {
    assertEquals(17.23, lengths.in(17.2378).get(0));
  }

  @Test
  void half_waves_of_the_bands_are_among_them() {
    // half a wave of 14.175 MHz, 5 % short: 0.48 · 299.79 / 14.175 = 10.15 m
    assertTrue(
        lengths.in(17.24).stream().anyMatch(length -> Math.abs(length - 10.15) < 0.02),
        () -> lengths.in(17.24).toString());
  }

  @Test
  void none_is_longer_than_the_room_or_nearly_the_same_as_another() {
    List<Double> found = lengths.in(42);
    for (int i = 0; i < found.size(); i++) {
      assertTrue(found.get(i) <= 42);
      for (int j = 0; j < i; j++) {
        assertTrue(Math.abs(found.get(i) - found.get(j)) > 0.03 * found.get(i));
      }
    }
  }

  @Test
  void room_for_less_than_the_shortest_gives_nothing() {
    assertEquals(List.of(), lengths.in(lengths.least() - 0.1));
  }
}
