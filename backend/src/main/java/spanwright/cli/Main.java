package spanwright.cli;

import java.io.FileDescriptor;
import java.io.FileOutputStream;
import java.io.PrintStream;
import java.nio.charset.Charset;
import java.nio.charset.StandardCharsets;

/** The program's entry. */
public final class Main {
  private Main() {}

  /** Runs one command and ends with its exit code. */
  public static void main(String[] args) {
    boolean terminal = System.console() != null;
    // A document is UTF-8 whatever the machine's own habit; a terminal has to be spoken to in its.
    Charset charset = terminal ? System.console().charset() : StandardCharsets.UTF_8;
    Console console =
        new Console(
            stream(FileDescriptor.out, charset), stream(FileDescriptor.err, charset), terminal);
    int code = Program.run(console, args);
    console.out().flush();
    System.exit(code);
  }

  private static PrintStream stream(FileDescriptor descriptor, Charset charset) {
    return new PrintStream(new FileOutputStream(descriptor), true, charset);
  }
}
