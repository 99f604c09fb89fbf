package spanwright.assess;

/**
 * The field solver cannot take a layout as it hangs; the message says what of the wire or of the
 * plan's metalwork is in the way and what to do.
 */
public final class Unsolvable extends IllegalArgumentException {
  private static final long serialVersionUID = 1L;

  Unsolvable(String sentence, Throwable cause) {
    super(sentence, cause);
  }
}
