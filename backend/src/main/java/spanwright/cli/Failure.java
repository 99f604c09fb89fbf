package spanwright.cli;

import java.nio.file.Path;
import java.util.List;
import spanwright.plan.Fault;

/** Ends a command with lines on standard error and an exit code. */
final class Failure extends RuntimeException {
  private final transient List<String> lines;
  private final int code;

  private Failure(int code, List<String> lines) {
    super(lines.get(0));
    this.code = code;
    this.lines = lines;
  }

  static Failure couldNot(String sentence) {
    return new Failure(Exit.COULD_NOT, List.of(sentence));
  }

  static Failure badInput(String sentence) {
    return new Failure(Exit.BAD_INPUT, List.of(sentence));
  }

  /** Every fault of a file, the twenty first ones in words. */
  static Failure badInput(Path file, List<Fault> faults) {
    return new Failure(
        Exit.BAD_INPUT, Fault.sentences(faults).stream().map(line -> file + ": " + line).toList());
  }

  int code() {
    return code;
  }

  List<String> lines() {
    return lines;
  }
}
