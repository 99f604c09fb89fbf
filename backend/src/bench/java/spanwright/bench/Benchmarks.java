package spanwright.bench;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Collection;
import java.util.List;
import java.util.Map;
import org.openjdk.jmh.profile.GCProfiler;
import org.openjdk.jmh.profile.StackProfiler;
import org.openjdk.jmh.results.RunResult;
import org.openjdk.jmh.runner.Runner;
import org.openjdk.jmh.runner.RunnerException;
import org.openjdk.jmh.runner.options.ChainedOptionsBuilder;
import org.openjdk.jmh.runner.options.OptionsBuilder;
import org.openjdk.jmh.runner.options.TimeValue;
import spanwright.moments.BenchSizes;

/**
 * Runs all benchmarks, LAPACK's zgesv before and after them, and writes {@code
 * target/performance.md}.
 *
 * <p>Arguments: {@code quick} (shorter, rougher), {@code profile} (where the time goes, by stack
 * samples), {@code allocation} (bytes per call), {@code nofma} (hardware fused multiply-add
 * switched off), {@code python=COMMAND} (a Python with NumPy and SciPy; {@code none} leaves zgesv
 * out), and anything else as a pattern for the names of the benchmarks to run.
 */
public final class Benchmarks {
  private boolean quick;
  private boolean profile;
  private boolean allocation;
  private boolean nofma;
  private String python = "python3";
  private final List<String> patterns = new ArrayList<>();

  private Benchmarks() {}

  /** Runs; see the class. */
  public static void main(String[] arguments) throws RunnerException, IOException {
    Benchmarks run = new Benchmarks();
    for (String argument : arguments) {
      run.take(argument);
    }
    run.run();
  }

  private void take(String argument) {
    switch (argument) {
      case "quick" -> quick = true;
      case "profile" -> profile = true;
      case "allocation" -> allocation = true;
      case "nofma" -> nofma = true;
      default -> {
        if (argument.startsWith("python=")) {
          python = argument.substring("python=".length());
        } else {
          patterns.add(argument);
        }
      }
    }
  }

  private void run() throws RunnerException, IOException {
    // several may run on one machine, each on its own core
    System.setProperty("jmh.ignoreLock", "true");
    Map<Integer, Integer> unknowns = BenchSizes.unknowns();
    Path script = Path.of("src", "bench", "zgesv.py");
    Zgesv before = Zgesv.measure(python, script, unknowns.values());
    Collection<RunResult> results = new Runner(options().build()).run();
    Zgesv after = Zgesv.measure(python, script, unknowns.values());
    String text = new Report(results, unknowns, before, after).text();
    Files.createDirectories(Path.of("target"));
    Files.writeString(Path.of("target", "performance.md"), text);
    System.out.println();
    System.out.print(text);
  }

  private ChainedOptionsBuilder options() {
    ChainedOptionsBuilder options =
        new OptionsBuilder()
            .forks(1)
            .warmupIterations(3)
            .warmupTime(TimeValue.milliseconds(quick ? 400 : 1000))
            .measurementIterations(quick ? 8 : 15)
            .measurementTime(TimeValue.milliseconds(quick ? 60 : 100))
            // compiled before it goes on, so that warming up needs no second core
            .jvmArgsAppend("-Xbatch")
            .shouldFailOnError(true);
    if (patterns.isEmpty()) {
      options.include("spanwright.*Bench.*");
    }
    patterns.forEach(options::include);
    if (profile) {
      options.addProfiler(StackProfiler.class, "lines=false;top=12;detailLine=false");
    }
    if (allocation) {
      options.addProfiler(GCProfiler.class);
    }
    if (nofma) {
      options.jvmArgsAppend("-Xbatch", "-XX:-UseFMA");
    }
    return options;
  }
}
