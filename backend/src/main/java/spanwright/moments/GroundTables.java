package spanwright.moments;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.concurrent.atomic.AtomicInteger;
import java.util.concurrent.atomic.AtomicReference;

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
   * Tables that together stay under 128 MiB; one plot's table of one frequency is 0.1 to 0.6 MB.
   */
  public GroundTables() {
    this(128L << 20);
  }

  /**
   * Tables that together stay under so many bytes; the one unused longest goes first. Only the
   * table that is being filled may go beyond it on its own.
   */
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
   * first solutions need not wait. What is there already costs next to nothing.
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
    List<Runnable> work = new ArrayList<>();
    for (double frequencyMHz : frequenciesMHz) {
      work.addAll(table(ground, frequencyMHz).missing(reach, 2 * low, 2 * high));
    }
    if (!work.isEmpty()) {
      share(work, threads);
    }
  }

  /** Does all the work on so many threads, this one among them. */
  private static void share(List<Runnable> work, int threads) {
    AtomicInteger next = new AtomicInteger();
    AtomicReference<RuntimeException> fault = new AtomicReference<>();
    Runnable some =
        () -> {
          try {
            for (int i = next.getAndIncrement(); i < work.size(); i = next.getAndIncrement()) {
              work.get(i).run();
            }
          } catch (RuntimeException e) {
            fault.compareAndSet(null, e);
            next.set(work.size());
          }
        };
    Thread[] others = new Thread[Math.max(0, Math.min(threads, work.size()) - 1)];
    for (int i = 0; i < others.length; i++) {
      others[i] = new Thread(some, "ground-table-" + i);
      others[i].setDaemon(true);
      others[i].start();
    }
    some.run();
    for (Thread other : others) {
      try {
        other.join();
      } catch (InterruptedException e) {
        Thread.currentThread().interrupt();
        return;
      }
    }
    if (fault.get() != null) {
      throw fault.get();
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
      found = new GroundTable(ground, frequencyMHz, () -> grown(key));
      tables.put(key, found);
    }
    return found;
  }

  /** Lets go of what was unused longest, but not of what has just grown. */
  private synchronized void grown(Key key) {
    long held = bytes();
    var oldest = tables.entrySet().iterator();
    while (held > limit && oldest.hasNext()) {
      var entry = oldest.next();
      if (!entry.getKey().equals(key)) {
        held -= entry.getValue().bytes();
        oldest.remove();
      }
    }
  }
}
