package spanwright.search;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.List;
import org.junit.jupiter.api.Test;

class ByFamilyTest {
  private record Item(String family, double worth, int number) {}

  private static List<String> take(int most, Item... items) {
    return ByFamily.take(List.of(items), most, Item::worth, Item::family, Item::number).stream()
        .map(item -> item.family + item.number)
        .toList();
  }

  @Test
  void half_the_places_go_to_the_best_and_half_to_each_familys_best_in_turn() {
    assertEquals(
        List.of("a1", "a2", "a3", "b5"),
        take(
            4,
            new Item("a", 9, 1),
            new Item("a", 8, 2),
            new Item("a", 7, 3),
            new Item("a", 6, 4),
            new Item("b", 1, 5)));
  }

  @Test
  void ties_are_settled_by_number() {
    assertEquals(
        List.of("a1", "a2", "a3"),
        take(3, new Item("a", 1, 3), new Item("a", 1, 1), new Item("a", 1, 2)));
  }

  @Test
  void a_short_list_is_taken_whole_best_first() {
    assertEquals(List.of("b2", "a1"), take(9, new Item("a", 1, 1), new Item("b", 2, 2)));
  }
}
