package spanwright.bench;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Collection;
import java.util.List;
import java.util.Map;
import org.openjdk.jmh.profile.GCProfiler;
import org.openjdk.jmh.profile.JavaFlightRecorderProfiler;
import org.openjdk.jmh.results.RunResult;
import org.openjdk.jmh.runner.NoBenchmarksException;
import org.openjdk.jmh.runner.Runner;
import org.openjdk.jmh.runner.RunnerException;
import org.openjdk.jmh.runner.options.ChainedOptionsBuilder;
import org.openjdk.jmh.runner.options.OptionsBuilder;
import org.openjdk.jmh.runner.options.TimeValue;
import spanwright.assess.TenBands;
import spanwright.moments.BenchSizes;

/**
 * Runs all benchmarks, LAPACK's zgesv before and after them, and writes {@code
 * target/performance.md}.
 *
 * <p>Arguments: {@code quick} (shorter, rougher), {@code profile} (where the time goes, by samples
 * of the stack), {@code allocation} (bytes per call), {@code nofma} (hardware fused multiply-add
 * switched off), {@code memory} (no timing: what ten bands take), {@code search} (thorough searches
 * of the demo plots instead, on one thread), {@code python=COMMAND} (a Python with NumPy and SciPy;
 * {@code none} leaves zgesv out), and anything else as a pattern for the names of the benchmarks to
 * run.
 */
public final class Benchmarks {
  private static final Path PROFILES = Path.of("target", "profiles");
  private static final Path SCRIPT = Path.of("src", "bench", "zgesv.py");
  private static final String NO_FMA = "-XX:-UseFMA";

  private boolean search;
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
    if (List.of(arguments).contains("memory")) {
      System.out.print(TenBands.memory());
      return;
    }
    for (String argument : arguments) {
      run.take(argument);
    }
    if (run.search) {
      run.search();
    } else {
      run.run();
    }
  }

  private void take(String argument) {
    switch (argument) {
      case "search" -> search = true;
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

  private void search() throws IOException {
    Profiles.forget(PROFILES);
    System.out.print(Searches.text(python, SCRIPT, profile ? PROFILES : null));
    if (profile) {
      System.out.print(Profiles.text(PROFILES));
    }
  }

  private void run() throws RunnerException, IOException {
    // several may run on one machine, each on its own core
    System.setProperty("jmh.ignoreLock", "true");
    Map<Integer, Integer> unknowns = BenchSizes.unknowns();
    Profiles.forget(PROFILES);
    Zgesv before = Zgesv.measure(python, SCRIPT, unknowns.values());
    Collection<RunResult> results = new ArrayList<>();
    results.addAll(results(steady()));
    results.addAll(results(chain()));
    results.addAll(results(first()));
    Zgesv after = Zgesv.measure(python, SCRIPT, unknowns.values());
    String text = new Report(results, unknowns, before, after).text();
    if (profile) {
      text += Profiles.text(PROFILES);
    }
    Files.createDirectories(Path.of("target"));
    Files.writeString(Path.of("target", "performance.md"), text);
    System.out.println();
    System.out.print(text);
  }

  /** The parts: short calls. */
  private ChainedOptionsBuilder steady() {
    int each = profile ? 400 : quick ? 60 : 100;
    return warmed(options().exclude("AssessBench"), quick ? 400 : 1000)
        .measurementIterations(quick ? 8 : 15)
        .measurementTime(TimeValue.milliseconds(each));
  }

  /** The whole chain: more code to compile, and enough calls for a percentile. */
  private ChainedOptionsBuilder chain() {
    return warmed(options().exclude("\\.(?!Assess)\\w+Bench\\."), quick ? 1500 : 3000)
        .measurementIterations(quick ? 4 : 10)
        .measurementTime(TimeValue.milliseconds(1000));
  }

  private ChainedOptionsBuilder warmed(ChainedOptionsBuilder options, int milliseconds) {
    options
        .forks(1)
        .warmupIterations(3)
        .warmupTime(TimeValue.milliseconds(milliseconds))
        // compiled before it goes on, so that warming up needs no second core
        .jvmArgsAppend(nofma ? NO_FMA : "-Xbatch", "-Xbatch");
    if (profile) {
      options.addProfiler(JavaFlightRecorderProfiler.class, "configName=profile;dir=" + PROFILES);
    }
    if (allocation) {
      options.addProfiler(GCProfiler.class);
    }
    return options;
  }

  /** Each in a machine of its own, just started. */
  private ChainedOptionsBuilder first() {
    ChainedOptionsBuilder options =
        options().exclude("\\.(?!First)\\w+Bench\\.").forks(quick ? 1 : 3);
    if (nofma) {
      options.jvmArgsAppend(NO_FMA);
    }
    return options;
  }

  private static Collection<RunResult> results(ChainedOptionsBuilder options)
      throws RunnerException {
    try {
      return new Runner(options.build()).run();
    } catch (NoBenchmarksException none) {
      return List.of();
    }
  }

  private ChainedOptionsBuilder options() {
    ChainedOptionsBuilder options = new OptionsBuilder().shouldFailOnError(true);
    if (patterns.isEmpty()) {
      options.include("spanwright.*Bench.*");
    }
    patterns.forEach(options::include);
    return options;
  }
}
