package spanwright.clearance;

/** Clear, tight or foul. */
final class Judge {
  private static final double ROUNDING = 1e-9;

  private Judge() {}

  /** What a distance is worth against what is required and the margin above it. */
  static State state(double distance, double required, double margin) {
    if (!(distance >= required - ROUNDING)) {
      return State.FOUL;
    }
    return distance < required + margin ? State.TIGHT : State.CLEAR;
  }
}
