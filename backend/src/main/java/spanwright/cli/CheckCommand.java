package spanwright.cli;

import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Parameters;

/** Says every fault of a plan. */
@Command(name = "check", description = "Validates a plan; lists every fault, not just the first.")
final class CheckCommand implements Callable<Integer> {
  private final Console console;

  @Mixin Help help = new Help();

  @Parameters(paramLabel = "PLAN.json", description = "The plan.")
  String plan;

  CheckCommand(Console console) {
    this.console = console;
  }

  @Override
  public Integer call() {
    Documents.plan(plan);
    console.out().println(plan + ": complete, no faults.");
    return Exit.DONE;
  }
}
