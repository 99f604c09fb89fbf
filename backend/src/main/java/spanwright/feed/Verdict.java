package spanwright.feed;

/** What becomes of something checked, worst last. */
public enum Verdict {
  /** Good. */
  CLEAR,
  /** Works, but inside the margin. */
  TIGHT,
  /** Does not work. */
  FOUL;

  /** The worse of two. */
  public Verdict worse(Verdict other) {
    return compareTo(other) >= 0 ? this : other;
  }
}
