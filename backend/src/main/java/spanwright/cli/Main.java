package spanwright.cli;

/** The program's entry. */
public final class Main {
  private Main() {}

  /** Starts the program. */
  public static void main(String[] args) {
    System.exit(1);
  }
}
