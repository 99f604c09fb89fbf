package spanwright.e2e;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStreamReader;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.TimeUnit;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/** The really started program: the runnable jar on a free port with a data folder of its own. */
final class Program implements AutoCloseable {
  private static final Pattern ADDRESS = Pattern.compile("http://[^\\s]+");

  private final Process process;
  private final String address;
  private final List<String> output = new ArrayList<>();

  private Program(Path data, String port) throws IOException {
    ProcessBuilder builder =
        new ProcessBuilder(
            Path.of(System.getProperty("java.home"), "bin", "java").toString(),
            "-Xmx512m",
            "-jar",
            System.getProperty("spanwright.jar"),
            "serve",
            "--port",
            port,
            "--data",
            data.toString());
    process = builder.redirectErrorStream(true).start();
    BufferedReader reader =
        new BufferedReader(new InputStreamReader(process.getInputStream(), StandardCharsets.UTF_8));
    String found = null;
    for (String line = reader.readLine(); line != null; line = reader.readLine()) {
      output.add(line);
      Matcher matcher = ADDRESS.matcher(line);
      if (matcher.find()) {
        found = matcher.group().replaceAll("/+$", "");
        break;
      }
    }
    if (found == null) {
      process.destroyForcibly();
      throw new IllegalStateException("the program printed no address: " + output);
    }
    address = found;
    keepReading(reader);
  }

  static Program start(Path data) throws IOException {
    return new Program(data, "0");
  }

  /** Starts on a given port: a server that comes back after a stop. */
  static Program start(Path data, int port) throws IOException {
    return new Program(data, Integer.toString(port));
  }

  /** A child whose output nobody reads blocks in the end. */
  private void keepReading(BufferedReader reader) {
    Thread thread =
        new Thread(
            () -> {
              try {
                for (String line = reader.readLine(); line != null; line = reader.readLine()) {
                  synchronized (output) {
                    output.add(line);
                  }
                }
              } catch (IOException e) {
                throw new UncheckedIOException(e);
              }
            },
            "program output");
    thread.setDaemon(true);
    thread.setUncaughtExceptionHandler((t, e) -> {});
    thread.start();
  }

  String address() {
    return address;
  }

  int port() {
    return Integer.parseInt(address.substring(address.lastIndexOf(':') + 1));
  }

  @Override
  public void close() {
    process.destroy();
    try {
      if (!process.waitFor(10, TimeUnit.SECONDS)) {
        process.destroyForcibly();
      }
    } catch (InterruptedException e) {
      Thread.currentThread().interrupt();
    }
  }
}
