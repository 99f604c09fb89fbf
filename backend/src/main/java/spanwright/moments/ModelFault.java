package spanwright.moments;

/**
 * The model cannot be solved as given; the message says which wire, what is wrong with it and what
 * to do.
 */
public final class ModelFault extends IllegalArgumentException {
  private static final long serialVersionUID = 1L;

  ModelFault(String message) {
    super(message);
  }
}
