package spanwright.e2e;

import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.microsoft.playwright.Route;
import com.microsoft.playwright.options.ColorScheme;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.TestFactory;

/**
 * The page's own unit tests (frontend/src/test/js), run in the browser against the modules that the
 * server serves.
 */
class FrontEndUnitIT extends BrowserTest {
  private static final String FOLDER = "/src/test/js/";
  private static final Path FILES =
      Path.of(System.getProperty("spanwright.root"), "frontend", "src", "test", "js");

  @TestFactory
  Stream<DynamicTest> every_javascript_test() throws IOException {
    open(1000, 700, ColorScheme.LIGHT);
    page.route("**" + FOLDER + "**", FrontEndUnitIT::answer);
    page.navigate(program.address() + FOLDER + "index.html");
    page.waitForFunction("() => window.results !== undefined");
    @SuppressWarnings("unchecked")
    List<Map<String, Object>> results =
        (List<Map<String, Object>>) page.evaluate("() => window.results");
    assertFalse(results.isEmpty(), "no JavaScript test was found");
    return results.stream()
        .map(
            result ->
                DynamicTest.dynamicTest(
                    (String) result.get("name"),
                    () ->
                        assertTrue(
                            (Boolean) result.get("ok"),
                            () -> String.valueOf(result.get("error")))));
  }

  private static void answer(Route route) {
    String name = route.request().url().replaceAll("^.*" + FOLDER, "").replaceAll("\\?.*$", "");
    try {
      boolean index = name.equals("index.html");
      String body = index ? page() : Files.readString(FILES.resolve(name));
      route.fulfill(
          new Route.FulfillOptions()
              .setBody(body)
              .setContentType(index ? "text/html" : "text/javascript"));
    } catch (IOException e) {
      route.fulfill(new Route.FulfillOptions().setStatus(404).setBody(e.toString()));
    }
  }

  private static String page() throws IOException {
    try (Stream<Path> files = Files.list(FILES)) {
      String imports =
          files
              .map(file -> file.getFileName().toString())
              .filter(name -> name.endsWith(".js") && !name.equals("harness.js"))
              .sorted()
              .map(name -> "import './" + name + "';")
              .collect(Collectors.joining("\n"));
      return "<!doctype html><link rel='icon' href='data:,'><title>tests</title>"
          + "<script type='module'>import { run } from './harness.js';\n"
          + imports
          + "\nawait run();</script>";
    }
  }
}
