package spanwright.moments;

import java.util.Random;
import java.util.concurrent.TimeUnit;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OperationsPerInvocation;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;

/** What the fill is made of, per point of a row. */
@State(Scope.Thread)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.NANOSECONDS)
public class KernelBench {
  private static final int ROW = 128;

  private final double[] distance = new double[ROW];
  private final double[] rho = new double[ROW];
  private final double[] zeta = new double[ROW];
  private final double[] angle = new double[ROW];
  private final double[] sin = new double[ROW];
  private final double[] cos = new double[ROW];
  private final double[] re = new double[ROW];
  private final double[] im = new double[ROW];
  private final double[][] ratios = new double[Reflection.RATIOS][ROW];
  private Reflection reflection;
  private double k;

  /** A row of points under a garden's wire. */
  @Setup
  public void prepare() {
    Random random = new Random(4);
    k = Constants.waveNumber(14.15);
    reflection = new GroundTables().reflection(BenchModels.SOIL, 14.15);
    for (int i = 0; i < ROW; i++) {
      rho[i] = 30 * random.nextDouble();
      zeta[i] = 2 + 18 * random.nextDouble();
      distance[i] = Math.hypot(rho[i], zeta[i]);
    }
  }

  /** e^{−jkR}/R, as the fill does it. */
  @Benchmark
  @OperationsPerInvocation(ROW)
  public Object kernelRow() {
    for (int i = 0; i < ROW; i++) {
      angle[i] = k * distance[i];
    }
    SinCos.of(angle, ROW, sin, cos);
    for (int i = 0; i < ROW; i++) {
      re[i] = cos[i] / distance[i];
    }
    for (int i = 0; i < ROW; i++) {
      im[i] = -sin[i] / distance[i];
    }
    return im;
  }

  /** The same with the library's sine and cosine. */
  @Benchmark
  @OperationsPerInvocation(ROW)
  public Object kernelRowByLibrary() {
    for (int i = 0; i < ROW; i++) {
      re[i] = Math.cos(k * distance[i]) / distance[i];
      im[i] = -Math.sin(k * distance[i]) / distance[i];
    }
    return im;
  }

  /** One lookup of the ground. */
  @Benchmark
  @OperationsPerInvocation(ROW)
  public Object tableLookup() {
    reflection.ratios(rho, zeta, ROW, ratios);
    return ratios;
  }
}
