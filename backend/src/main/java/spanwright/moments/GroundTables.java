package spanwright.moments;

import java.util.LinkedHashMap;
import java.util.Map;
import java.util.concurrent.atomic.AtomicInteger;

/**
 * The half-space kernels of every (frequency, soil) in use, shared by candidates and threads:
 * filled where first asked for, bounded in memory. Thread-safe; what is looked up does not depend
 * on who filled it or when.
 */
public final class GroundTables {
  private record Key(double frequencyMHz, double permittivity, double conductivity) {}

  private final long limit;
  private final Map<Key, GroundTable> tables = new LinkedHashMap<>(16, 0.75f, true);

  /**
   * Tables that together stay under 128 MiB; one plot's table of one frequency is 0.05 to 0.4 MB.
   */
  public GroundTables() {
    this(128L << 20);
  }

  /** Tables that together stay under so many bytes; the one unused longest goes first. */
  public GroundTables(long bytes) {
    this.limit = bytes;
  }

  /** Memory held by all tables [bytes]. */
  public synchronized long bytes() {
    long sum = 0;
    for (GroundTable table : tables.values()) {
      sum += table.bytes();
    }
    return sum;
  }

  /**
   * Fills the tables of these frequencies and this ground for a plot, in parallel, so that the
   * first solutions need not wait.
   *
   * @param frequenciesMHz the frequencies, those wanted first in front
   * @param ground real ground; any other needs no table
   * @param reach greatest horizontal distance between wires [m]
   * @param low lowest wire [m above ground]
   * @param high highest wire [m above ground]
   * @param threads how many threads may work, at least 1
   */
  public void prepare(
      double[] frequenciesMHz, Ground ground, double reach, double low, double high, int threads) {
    if (ground.kind() != Ground.Kind.REAL) {
      return;
    }
    if (!(low > 0 && high >= low && reach >= 0 && Double.isFinite(reach + high))) {
      throw new ModelFault(
          "Cannot prepare the ground for wires from "
              + low
              + " to "
              + high
              + " m high and "
              + reach
              + " m apart: heights must be above 0 and in order.");
    }
    AtomicInteger next = new AtomicInteger();
    Runnable work =
        () -> {
          for (int i = next.getAndIncrement();
              i < frequenciesMHz.length;
              i = next.getAndIncrement()) {
            table(ground, frequenciesMHz[i]).fill(reach, 2 * low, 2 * high);
          }
        };
    Thread[] helpers = new Thread[Math.max(0, Math.min(threads, frequenciesMHz.length) - 1)];
    for (int i = 0; i < helpers.length; i++) {
      helpers[i] = new Thread(work, "ground-table-" + i);
      helpers[i].setDaemon(true);
      helpers[i].start();
    }
    work.run();
    for (Thread helper : helpers) {
      try {
        helper.join();
      } catch (InterruptedException e) {
        Thread.currentThread().interrupt();
        return;
      }
    }
  }

  /** What reflects over this ground at this frequency. */
  Reflection reflection(Ground ground, double frequencyMHz) {
    return switch (ground.kind()) {
      case NONE -> Reflection.NOTHING;
      case PERFECT -> Reflection.MIRROR;
      case REAL -> table(ground, frequencyMHz);
    };
  }

  private synchronized GroundTable table(Ground ground, double frequencyMHz) {
    Key key = new Key(frequencyMHz, ground.permittivity(), ground.conductivity());
    GroundTable found = tables.get(key);
    if (found == null) {
      found = new GroundTable(ground, frequencyMHz);
      long held = 0;
      for (GroundTable table : tables.values()) {
        held += table.bytes();
      }
      var oldest = tables.entrySet().iterator();
      while (held > limit && oldest.hasNext()) {
        held -= oldest.next().getValue().bytes();
        oldest.remove();
      }
      tables.put(key, found);
    }
    return found;
  }
}
