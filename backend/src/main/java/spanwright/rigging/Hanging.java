package spanwright.rigging;

/** One wire between two points, exactly: calm and in wind. */
public final class Hanging {
  private Hanging() {}

  /**
   * Hangs a wire.
   *
   * @throws IllegalArgumentException with a sentence that says what, where and what to do
   */
  public static HangAnswer solve(HangCase hangCase) {
    throw new UnsupportedOperationException("in work");
  }
}
