package spanwright.search;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;

/**
 * Lengths of wire worth trying in the room there is: all of it, half waves of the wanted bands, and
 * some between.
 */
final class WireLengths {
  private static final double LIGHT = 299.792458; // metres times MHz
  private static final double NEARLY_SAME = 0.035;

  /** On a plot with no room for more, wire of this length is worth a look on any band [m]. */
  private static final double LONGEST_LEAST = 4;

  private final List<Double> bandCentresMHz;
  private final int count;
  private final double least;

  WireLengths(List<Double> bandCentresMHz, int count) {
    this.bandCentresMHz = List.copyOf(bandCentresMHz);
    this.count = count;
    double highest = bandCentresMHz.stream().mapToDouble(f -> f).max().orElse(14);
    this.least = Math.max(2.5, Math.min(LONGEST_LEAST, 0.3 * LIGHT / highest));
  }

  /** The shortest wire worth hanging [m]. */
  double least() {
    return least;
  }

  /** Longest first. Rounded down to centimetres, as a crew would cut. */
  List<Double> in(double room) {
    List<Double> lengths = new ArrayList<>();
    if (room < least) {
      return lengths;
    }
    lengths.add(floor(room));
    List<Double> wanted = new ArrayList<>();
    for (double f : bandCentresMHz) {
      double half = 0.48 * LIGHT / f;
      for (int n = 1; n * half < room; n++) {
        wanted.add(n * half);
      }
      wanted.add(1.27 * LIGHT / f);
      wanted.add(0.88 * LIGHT / f);
    }
    wanted.removeIf(length -> length < least || length > room);
    wanted.sort(Comparator.reverseOrder());
    for (double length : wanted) {
      if (lengths.size() < count
          && lengths.stream().noneMatch(l -> Math.abs(l - length) < NEARLY_SAME * l)) {
        lengths.add(floor(length));
      }
    }
    return lengths;
  }

  private static double floor(double metres) {
    return Math.floor(metres * 100 + 1e-6) / 100;
  }
}
