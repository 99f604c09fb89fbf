package spanwright.cli;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.util.Properties;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;

/** Says which program this is. */
@Command(name = "version", description = "Prints version and build.")
final class VersionCommand implements Callable<Integer> {
  private final Console console;

  @Mixin Help help = new Help();

  VersionCommand(Console console) {
    this.console = console;
  }

  /** As the build wrote it down. */
  static String version() {
    return written().getProperty("version");
  }

  private static Properties written() {
    Properties properties = new Properties();
    try (InputStream in = Program.class.getResourceAsStream("/spanwright/version.properties")) {
      properties.load(in);
      return properties;
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  @Override
  public Integer call() {
    console
        .out()
        .println(
            "Spanwright "
                + version()
                + ", built "
                + written().getProperty("built")
                + ", running on Java "
                + Runtime.version().feature()
                + " ("
                + System.getProperty("os.name")
                + ", "
                + System.getProperty("os.arch")
                + ")");
    return Exit.DONE;
  }
}
