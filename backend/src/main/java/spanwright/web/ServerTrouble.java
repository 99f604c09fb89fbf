package spanwright.web;

/** The server cannot start; the message says why and what to do. */
public final class ServerTrouble extends RuntimeException {
  ServerTrouble(String sentence, Throwable cause) {
    super(sentence, cause);
  }
}
