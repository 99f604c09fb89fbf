package spanwright.plan;

import java.util.ArrayList;
import java.util.List;

/**
 * Something wrong with a document, said so that its author can put it right.
 *
 * @param path where: {@code buildings[1].footprint}, or "line 4, column 7" when the text is not
 *     JSON, or empty for the whole document
 * @param message what is wrong, naming the thing by the name its author gave it, with what was
 *     found and allowed, and what to do
 */
public record Fault(String path, String message) {
  /** How many faults are listed before the rest are only counted. */
  public static final int LISTED = 20;

  static Fault of(String path, Wording wording, Object... parts) {
    return new Fault(path, wording.with(parts));
  }

  /** Path and message in one line. */
  public String sentence() {
    return path.isEmpty() ? message : path + ": " + message;
  }

  /** The first twenty faults, a line each, and how many more there are. */
  public static List<String> sentences(List<Fault> faults) {
    List<String> lines = new ArrayList<>();
    for (Fault fault : faults.subList(0, Math.min(LISTED, faults.size()))) {
      lines.add(fault.sentence());
    }
    int more = faults.size() - LISTED;
    if (more > 0) {
      lines.add(more == 1 ? "and 1 more fault" : "and " + more + " more faults");
    }
    return lines;
  }
}
