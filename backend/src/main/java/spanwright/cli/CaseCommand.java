package spanwright.cli;

import com.fasterxml.jackson.databind.JsonNode;
import java.nio.file.Path;
import java.util.List;
import java.util.concurrent.Callable;
import java.util.function.Supplier;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import spanwright.plan.Fault;

/** What {@code solve}, {@code feed} and {@code hang} have in common: a case in, an answer out. */
abstract class CaseCommand implements Callable<Integer> {
  private final Console console;

  @Mixin Help help = new Help();

  @Parameters(paramLabel = "CASE.json", description = "The case.")
  String caseFile;

  @Option(
      names = "--out",
      paramLabel = "FILE",
      description = "Where to write the answer (default: standard output).")
  String out;

  CaseCommand(Console console) {
    this.console = console;
  }

  @Override
  public Integer call() {
    Path target = Documents.target(out);
    Path file = Documents.path(caseFile);
    Object answer = answer(file, Documents.tree(file, Documents.LONGEST_CASE));
    Documents.write(console, target, Documents.json(answer));
    return Exit.DONE;
  }

  /** The answer to a case, as a document. */
  abstract Object answer(Path file, JsonNode tree);

  /** Ends with every fault of the file, if there is any. */
  static void require(Path file, List<Fault> faults) {
    if (!faults.isEmpty()) {
      throw Failure.badInput(file, faults);
    }
  }

  /** What the reckoning itself refuses is bad input too: its sentence says what and where. */
  static <T> T reckon(Path file, Supplier<T> reckoning) {
    try {
      return reckoning.get();
    } catch (IllegalArgumentException e) {
      boolean ours =
          e.getClass() == IllegalArgumentException.class
              || e.getClass().getName().startsWith("spanwright.");
      if (!ours) {
        throw e;
      }
      throw Failure.badInput(file + ": " + e.getMessage());
    }
  }
}
