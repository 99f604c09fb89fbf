package spanwright.cli;

/** Exit codes. */
final class Exit {
  static final int DONE = 0;
  static final int COULD_NOT = 1;
  static final int BAD_USAGE = 2;
  static final int BAD_INPUT = 3;
  static final int NOTHING_FEASIBLE = 4;

  private Exit() {}
}
