package spanwright.moments;

import java.util.concurrent.TimeUnit;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Param;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.State;

/** The ground table of one frequency for a garden's wires. */
@State(Scope.Thread)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MILLISECONDS)
public class TableBench {
  /** Megahertz. */
  @Param({"3.65", "14.15", "28.5"})
  double frequencyMHz;

  /** Wires 1 to 10 m high, up to 30 m apart, one thread. */
  @Benchmark
  public Object tableBuild() {
    GroundTables tables = new GroundTables();
    tables.prepare(new double[] {frequencyMHz}, BenchModels.SOIL, 30, 1, 10, 1);
    return tables;
  }
}
