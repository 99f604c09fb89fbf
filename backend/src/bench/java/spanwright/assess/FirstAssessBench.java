package spanwright.assess;

import java.util.concurrent.TimeUnit;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;
import spanwright.moments.Solver;
import spanwright.plan.Catalogues;
import spanwright.plan.Plan;

/** The very first placement after the program has started: cold tables and cold code. */
@State(Scope.Thread)
@OutputTimeUnit(TimeUnit.MILLISECONDS)
public class FirstAssessBench {
  private Plan plan;

  /** As a server does before the first page comes. */
  @Setup
  public void warm() {
    Solver.warmUp();
    plan = AssessBench.plan("corner-plot");
  }

  /** Prepares the plan and assesses. */
  @Benchmark
  @BenchmarkMode(Mode.SingleShotTime)
  public Object firstAssess() {
    return Assessor.of(plan, Catalogues.standard()).assess(AssessBench.layout(0));
  }
}
