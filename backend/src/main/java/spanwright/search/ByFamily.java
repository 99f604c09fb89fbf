package spanwright.search;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.function.Function;
import java.util.function.ToDoubleFunction;

/** Takes from a long list so that what is best comes first and no one idea takes all the places. */
final class ByFamily {
  private ByFamily() {}

  /**
   * Half the places go to the best whatever their family, half to each family's best in turn.
   *
   * @param number settles ties
   */
  static <T> List<T> take(
      List<T> all,
      int most,
      ToDoubleFunction<T> worth,
      Function<T, String> family,
      ToDoubleFunction<T> number) {
    List<T> ordered = new ArrayList<>(all);
    ordered.sort(
        Comparator.comparingDouble((T item) -> -worth.applyAsDouble(item))
            .thenComparingDouble(number));
    if (ordered.size() <= most) {
      return ordered;
    }
    List<T> chosen = new ArrayList<>(ordered.subList(0, most / 2));
    List<T> rest = ordered.subList(most / 2, ordered.size());
    for (List<T> round : rounds(rest, family)) {
      for (T item : round) {
        if (chosen.size() < most) {
          chosen.add(item);
        }
      }
    }
    return chosen;
  }

  /** First each family's best, then each one's second, and so on. */
  static <T> List<List<T>> rounds(List<T> ordered, Function<T, String> family) {
    Map<String, Integer> taken = new HashMap<>();
    List<List<T>> rounds = new ArrayList<>();
    for (T item : ordered) {
      int round = taken.merge(family.apply(item), 1, Integer::sum) - 1;
      while (rounds.size() <= round) {
        rounds.add(new ArrayList<>());
      }
      rounds.get(round).add(item);
    }
    return rounds;
  }
}
