package spanwright.store;

/** The folder cannot do what was asked; the message says what, where and what to do. */
public final class StoreTrouble extends RuntimeException {
  /** With the sentence to show. */
  public StoreTrouble(String sentence) {
    super(sentence);
  }

  /** With the sentence to show and what lies behind it. */
  public StoreTrouble(String sentence, Throwable cause) {
    super(sentence, cause);
  }
}
