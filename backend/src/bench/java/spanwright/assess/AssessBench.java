package spanwright.assess;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.concurrent.TimeUnit;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;
import spanwright.plan.Catalogues;
import spanwright.plan.Place;
import spanwright.plan.Plan;
import spanwright.plan.PlanReader;
import spanwright.rigging.Layout;

/** One placement, the whole chain: five bands of three frequencies, metalwork and all. */
@State(Scope.Thread)
@OutputTimeUnit(TimeUnit.MILLISECONDS)
public class AssessBench {
  private static final int ROUND = 40;

  private Plan plan;
  private Assessor assessor;
  private int step;

  /** Reads the plan and warms the tables. */
  @Setup
  public void prepare() {
    plan = plan("corner-plot");
    assessor = Assessor.of(plan, Catalogues.standard());
    for (int i = 0; i < ROUND; i++) {
      assessor.assess(layout(i));
    }
  }

  static Plan plan(String name) {
    return PlanReader.read(json(name)).plan();
  }

  static String json(String name) {
    String resource = "/spanwright/shared/demo/" + name + ".json";
    try (InputStream in = AssessBench.class.getResourceAsStream(resource)) {
      return new String(in.readAllBytes(), StandardCharsets.UTF_8);
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  /** A wire over a mast on the lawn; the mast goes round in a circle, as if drawn by a mouse. */
  static Layout layout(int step) {
    double turn = 2 * Math.PI * (step % ROUND) / ROUND;
    Place top = new Place(18.5 + 0.8 * Math.cos(turn), 22.5 + 0.8 * Math.sin(turn), 9);
    return new Layout(
        "apex",
        List.of(
            new Layout.Hold("garage-pole", new Place(25.15, 12, 7)),
            new Layout.Hold("back-lawn", top),
            new Layout.Hold("fence-post", new Place(11, 30.4, 4.8))),
        List.of(
            new Layout.Run(
                List.of(new Place(23.98, 13.78, 7.25), top, new Place(12.12, 29.16, 5.34)),
                "copper-strand-2.1")),
        new Layout.FeedChoice(0, 0.5, "window-400", null));
  }

  /** Tables warm, the mast moving. */
  @Benchmark
  @BenchmarkMode(Mode.SampleTime)
  public Object assess() {
    return assessor.assess(layout(step++));
  }

  /**
   * A new plot while the program has been at work for a while: nothing prepared, no table filled.
   */
  @Benchmark
  @BenchmarkMode(Mode.AverageTime)
  public Object assessOnNewPlot() {
    return Assessor.of(plan, Catalogues.standard()).assess(layout(0));
  }
}
