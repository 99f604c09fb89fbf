package spanwright.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStreamReader;
import java.net.URI;
import java.net.http.HttpClient;
import java.net.http.HttpRequest;
import java.net.http.HttpResponse;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.TimeUnit;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.Timeout;
import org.junit.jupiter.api.io.TempDir;

/** The program as a process of its own: start, answer, stop. */
@Timeout(240)
class ServeTest {
  @TempDir Path temp;

  private Process start(String... args) throws IOException {
    List<String> command = new ArrayList<>();
    command.add(Path.of(System.getProperty("java.home"), "bin", "java").toString());
    command.add("-Xmx256m");
    command.add("-cp");
    command.add(System.getProperty("java.class.path"));
    command.add("spanwright.cli.Main");
    command.addAll(List.of(args));
    return new ProcessBuilder(command).redirectError(temp.resolve("err").toFile()).start();
  }

  private static String address(Process process) throws IOException {
    BufferedReader reader =
        new BufferedReader(new InputStreamReader(process.getInputStream(), StandardCharsets.UTF_8));
    Matcher found = Pattern.compile("http://\\S+").matcher(String.valueOf(reader.readLine()));
    assertTrue(found.find());
    return found.group();
  }

  private static int status(String address) throws IOException, InterruptedException {
    return HttpClient.newHttpClient()
        .send(
            HttpRequest.newBuilder(URI.create(address)).build(),
            HttpResponse.BodyHandlers.discarding())
        .statusCode();
  }

  private static void stop(Process process) throws InterruptedException {
    process.destroy();
    assertTrue(process.waitFor(60, TimeUnit.SECONDS), "did not stop");
  }

  @Test
  void it_answers_at_the_address_it_prints_and_stops_when_told() throws Exception {
    String data = temp.resolve("data").toString();
    Process first = start("serve", "--port", "0", "--data", data);
    try {
      String address = address(first);
      assertTrue(address.startsWith("http://127.0.0.1:"), address);
      assertEquals(200, status(address + "api/health"));
      Process second = start("serve", "--port", "0", "--data", data);
      assertTrue(second.waitFor(60, TimeUnit.SECONDS));
      assertEquals(1, second.exitValue());
      assertTrue(Files.readString(temp.resolve("err")).contains("is in use by another running"));
      String port = address.replaceAll(".*:(\\d+)/", "$1");
      Process third = start("serve", "--port", port, "--data", temp.resolve("other").toString());
      assertTrue(third.waitFor(60, TimeUnit.SECONDS));
      assertEquals(1, third.exitValue());
      assertTrue(Files.readString(temp.resolve("err")).contains("Port " + port + " is taken"));
    } finally {
      stop(first);
    }
    Process again = start("serve", "--port", "0", "--data", data);
    try {
      assertEquals(200, status(address(again) + "api/plans"));
    } finally {
      stop(again);
    }
    assertFalse(Files.readString(temp.resolve("err")).contains("Exception"));
  }

  @Test
  void a_plan_cut_short_by_a_killed_save_is_not_seen() throws Exception {
    Path data = Files.createDirectories(temp.resolve("data"));
    Files.writeString(data.resolve("garden-1.json"), "{\"title\":\"Whole\"}");
    Files.writeString(data.resolve("garden-1.json.tmp"), "{\"title\":\"Ha");
    Process process = start("serve", "--port", "0", "--data", data.toString());
    try {
      assertEquals(200, status(address(process) + "api/plans/garden-1"));
      assertFalse(Files.exists(data.resolve("garden-1.json.tmp")));
    } finally {
      process.destroyForcibly().waitFor();
    }
    Process again = start("serve", "--port", "0", "--data", data.toString());
    try {
      assertEquals(200, status(address(again) + "api/plans/garden-1"));
    } finally {
      stop(again);
    }
  }
}
