package spanwright.published;

import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.TestFactory;

/**
 * Checks against something outside the program. A subclass names its source in its class name,
 * gives its checks once, and gets a test for each; {@link AccuracyReportTest} writes the same
 * checks into {@code docs/accuracy.md}. Subclasses are public, end in {@code Test} and have a
 * public constructor without parameters.
 */
public abstract class PublishedChecks {

  /**
   * The heading of these checks in the report; reports sort by it. Start with the part: "Field
   * solver: ...".
   */
  public abstract String heading();

  /** One or two sentences under the heading: which method, what the tolerance allows for. */
  public abstract String about();

  /** The checks, computed anew or remembered; deterministic. */
  public abstract List<Check> checks();

  @TestFactory
  Stream<DynamicTest> published() {
    return checks().stream()
        .map(
            check ->
                DynamicTest.dynamicTest(
                    check.what(),
                    () ->
                        assertTrue(
                            check.holds(),
                            () ->
                                check.what()
                                    + ": expected "
                                    + check.expected()
                                    + " "
                                    + check.tolerance()
                                    + ", found "
                                    + check.found()
                                    + " ("
                                    + check.source()
                                    + ")")));
  }
}
