package spanwright.search;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.util.List;
import java.util.concurrent.atomic.AtomicInteger;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;

class WorkersTest {
  private static final List<Integer> ITEMS = IntStream.range(0, 500).boxed().toList();

  @Test
  void answers_come_in_the_order_of_the_items() {
    try (Workers workers = new Workers(3, () -> false)) {
      assertEquals(
          ITEMS.stream().map(i -> i * i).toList(), workers.map(ITEMS, i -> i * i, () -> {}));
    }
  }

  @Test
  void a_cancelled_search_stops_before_the_work_is_done() {
    AtomicInteger done = new AtomicInteger();
    try (Workers workers = new Workers(2, () -> done.get() >= 10)) {
      assertThrows(
          Workers.Cancelled.class, () -> workers.map(ITEMS, i -> done.incrementAndGet(), () -> {}));
    }
    assertEquals(true, done.get() < 20);
  }

  @Test
  void a_fault_in_the_work_comes_out_as_itself() {
    try (Workers workers = new Workers(2, () -> false)) {
      assertThrows(
          IllegalArgumentException.class,
          () ->
              workers.map(
                  ITEMS,
                  i -> {
                    throw new IllegalArgumentException("no");
                  },
                  () -> {}));
    }
  }
}
