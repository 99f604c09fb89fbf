package spanwright.bench;

import java.util.Collection;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.results.BenchmarkResult;
import org.openjdk.jmh.results.Result;
import org.openjdk.jmh.results.RunResult;
import org.openjdk.jmh.util.Statistics;

/** The figures of one run as Markdown: times, and ratios to zgesv at the same size. */
final class Report {
  private static final Map<String, String> NAMES = new LinkedHashMap<>();

  static {
    NAMES.put("prepareShape", "mesh and static parts, once a shape and band");
    NAMES.put("fill", "matrix fill");
    NAMES.put("solve", "factor, solve, residual");
    NAMES.put("ring", "pattern, 72 directions");
    NAMES.put("sky", "efficiency and peak");
    NAMES.put("together", "**fill + factor + solve + pattern**");
    NAMES.put("togetherFromWires", "the same with its mesh");
    NAMES.put("ejml", "EJML on the same matrix");
    NAMES.put("commonsMath", "Commons Math on the same matrix");
  }

  private final Collection<RunResult> results;
  private final Map<Integer, Integer> unknowns;
  private final Zgesv before;
  private final Zgesv after;

  Report(Collection<RunResult> results, Map<Integer, Integer> unknowns, Zgesv before, Zgesv after) {
    this.results = results;
    this.unknowns = unknowns;
    this.before = before;
    this.after = after;
  }

  String text() {
    StringBuilder text = new StringBuilder();
    systems(text);
    others(text);
    return text.toString();
  }

  private void systems(StringBuilder text) {
    text.append("| µs (× zgesv) |");
    unknowns.values().forEach(n -> text.append(" ").append(n).append(" unknowns |"));
    text.append("\n| --- |").append(" ---: |".repeat(unknowns.size())).append("\n| zgesv |");
    unknowns.values().forEach(n -> text.append(format(" %.1f |", Zgesv.of(before, after, n))));
    text.append('\n');
    for (Map.Entry<String, String> row : NAMES.entrySet()) {
      if (results.stream().noneMatch(r -> isOf(r, row.getKey(), null))) {
        continue;
      }
      text.append("| ").append(row.getValue()).append(" |");
      for (Map.Entry<Integer, Integer> size : unknowns.entrySet()) {
        double time = best(row.getKey(), size.getKey());
        double ratio = time / Zgesv.of(before, after, size.getValue());
        text.append(format(ratio < 100 ? " %.1f (%.2f) |" : " %.1f (%.0f) |", time, ratio));
      }
      text.append('\n');
    }
    text.append('\n');
  }

  private static boolean isOf(RunResult result, String name, Integer size) {
    String benchmark = result.getParams().getBenchmark();
    return benchmark.endsWith("SystemBench." + name)
        && (size == null || result.getParams().getParam("size").equals(size.toString()));
  }

  private double best(String name, int size) {
    return results.stream()
        .filter(r -> isOf(r, name, size))
        .mapToDouble(Report::best)
        .findFirst()
        .orElse(Double.NaN);
  }

  /** The quickest iteration's mean: what else the machine does only ever adds. */
  private static double best(RunResult result) {
    return result.getBenchmarkResults().stream()
        .flatMap((BenchmarkResult fork) -> fork.getIterationResults().stream())
        .mapToDouble(iteration -> iteration.getPrimaryResult().getScore())
        .min()
        .orElse(Double.NaN);
  }

  private void others(StringBuilder text) {
    List<RunResult> rest =
        results.stream().filter(r -> !r.getParams().getBenchmark().contains("System")).toList();
    if (rest.isEmpty()) {
      return;
    }
    text.append("| | time | 95th percentile | unit |\n| --- | ---: | ---: | --- |\n");
    for (RunResult result : rest) {
      String name = result.getParams().getBenchmark();
      StringBuilder with = new StringBuilder(name.substring(name.lastIndexOf('.') + 1));
      for (String key : result.getParams().getParamsKeys()) {
        with.append(' ').append(result.getParams().getParam(key));
      }
      Result<?> primary = result.getPrimaryResult();
      Statistics all = primary.getStatistics();
      boolean sampled = result.getParams().getMode() == Mode.SampleTime;
      boolean once = result.getParams().getMode() == Mode.SingleShotTime;
      double middle = sampled || once ? all.getPercentile(50) : best(result);
      String high = sampled ? format("%.1f", all.getPercentile(95)) : "";
      text.append(format("| %s | %.2f | %s | %s |\n", with, middle, high, primary.getScoreUnit()));
    }
  }

  private static String format(String pattern, Object... values) {
    return String.format(Locale.ROOT, pattern, values);
  }
}
