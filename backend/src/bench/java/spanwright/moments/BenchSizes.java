package spanwright.moments;

import java.util.Map;
import java.util.TreeMap;

/** How many unknowns the benchmarks' sizes really have. */
public final class BenchSizes {
  private BenchSizes() {}

  /** Unknowns by size asked for. */
  public static Map<Integer, Integer> unknowns() {
    Map<Integer, Integer> unknowns = new TreeMap<>();
    for (int size : BenchModels.SIZES) {
      Pieces pieces = Pieces.of(BenchModels.model(size), BenchModels.frequencyMHz(size));
      unknowns.put(size, pieces.mesh().unknowns);
    }
    return unknowns;
  }
}
