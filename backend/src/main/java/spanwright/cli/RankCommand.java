package spanwright.cli;

import java.nio.file.Path;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;
import spanwright.plan.Catalogues;
import spanwright.plan.Plan;
import spanwright.search.Effort;
import spanwright.search.Result;
import spanwright.search.Search;

/** Searches a plan and ranks what it finds. */
@Command(name = "rank", description = "Searches a plan for places to hang a wire and ranks them.")
final class RankCommand implements Callable<Integer> {
  private static final int MOST = 100;

  private final Console console;

  @Spec CommandSpec spec;
  @Mixin Help help = new Help();

  @Parameters(paramLabel = "PLAN.json", description = "The plan.")
  String planFile;

  @Option(
      names = "--top",
      paramLabel = "N",
      defaultValue = "12",
      description = "Placements to list at most (default: ${DEFAULT-VALUE}).")
  int top;

  @Option(
      names = "--seed",
      paramLabel = "N",
      defaultValue = "1",
      description = "Shifts what is sampled; the same seed gives the same answer.")
  long seed;

  @Option(
      names = "--effort",
      paramLabel = "WORD",
      defaultValue = "normal",
      description = "quick, normal or thorough (default: ${DEFAULT-VALUE}).")
  String effort;

  @Option(
      names = "--threads",
      paramLabel = "N",
      description = "Threads to use (default: one for each processor); does not change the answer.")
  Integer threads;

  @Option(
      names = "--out",
      paramLabel = "FILE",
      description = "Where to write the result (default: standard output).")
  String out;

  @Option(names = "--progress", description = "Tell of progress even when nobody is watching.")
  boolean progress;

  RankCommand(Console console) {
    this.console = console;
  }

  @Override
  public Integer call() {
    Search.Options options = options();
    Path target = Documents.target(out);
    Plan plan = Documents.plan(planFile);
    Result result;
    try (ProgressLine line = new ProgressLine(console, progress)) {
      result = Search.run(plan, Catalogues.standard(), options, line);
    }
    Documents.write(console, target, Documents.json(result));
    if (result.placements().isEmpty()) {
      console
          .err()
          .println(
              planFile
                  + ": no placement is allowed on this plan. The result says why: "
                  + result.refusals().size()
                  + (result.refusals().size() == 1 ? " refusal" : " refusals")
                  + ", with the cure where there is one.");
      return Exit.NOTHING_FEASIBLE;
    }
    return Exit.DONE;
  }

  private Search.Options options() {
    if (top < 1 || top > MOST) {
      throw usage("--top takes 1 to " + MOST + ", not " + top + ".");
    }
    int cores = Runtime.getRuntime().availableProcessors();
    int using = threads == null ? cores : threads;
    if (using < 1 || using > 4 * cores) {
      throw usage("--threads takes 1 to " + 4 * cores + " on this machine, not " + using + ".");
    }
    Effort chosen =
        Effort.find(effort)
            .orElseThrow(() -> usage("--effort is quick, normal or thorough, not " + effort + "."));
    return new Search.Options(chosen, seed, top, using);
  }

  private ParameterException usage(String sentence) {
    return new ParameterException(spec.commandLine(), sentence);
  }
}
