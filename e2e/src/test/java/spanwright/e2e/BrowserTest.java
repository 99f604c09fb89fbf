package spanwright.e2e;

import static org.junit.jupiter.api.Assertions.assertEquals;

import com.microsoft.playwright.Browser;
import com.microsoft.playwright.BrowserContext;
import com.microsoft.playwright.BrowserType;
import com.microsoft.playwright.Locator;
import com.microsoft.playwright.Page;
import com.microsoft.playwright.Playwright;
import com.microsoft.playwright.options.ColorScheme;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.io.TempDir;

/**
 * A test in a real browser against the really started program: one browser for the whole run, a
 * program and a context for each test, and no console error in any.
 */
abstract class BrowserTest {
  private static final List<String> ARGUMENTS =
      List.of(
          "--no-sandbox",
          "--disable-gpu",
          "--disable-quic",
          "--no-first-run",
          "--disable-background-networking",
          "--disable-component-update",
          "--disable-sync");

  private static Playwright playwright;
  private static Browser browser;

  @TempDir Path data;

  Program program;
  BrowserContext context;
  Page page;
  private final List<String> complaints = new ArrayList<>();

  @BeforeEach
  void startProgram() throws IOException {
    program = Program.start(data);
  }

  @AfterEach
  void nothingComplained() {
    if (context != null) {
      context.close();
    }
    program.close();
    assertEquals(List.of(), complaints, "console and page errors");
  }

  /** Opens the page at a size. */
  Page open(int width, int height, ColorScheme scheme) throws IOException {
    if (context != null) {
      context.close();
    }
    context =
        browser()
            .newContext(
                new Browser.NewContextOptions()
                    .setViewportSize(width, height)
                    .setColorScheme(scheme)
                    .setAcceptDownloads(true));
    context.setDefaultTimeout(30_000);
    page = context.newPage();
    page.onConsoleMessage(
        message -> {
          if (message.type().equals("error") && !expected(message.text())) {
            complaints.add(message.text());
          }
        });
    page.onPageError(complaints::add);
    page.navigate(program.address() + "/");
    return page;
  }

  /** Complaints a test brings about on purpose, such as a server that is gone. */
  boolean expected(String complaint) {
    return false;
  }

  /** For narrowing a locator to what holds these words. */
  static Locator.FilterOptions having(String words) {
    return new Locator.FilterOptions().setHasText(words);
  }

  /** For a locator of what holds these words. */
  static Page.LocatorOptions text(String words) {
    return new Page.LocatorOptions().setHasText(words);
  }

  void shot(String name) {
    Path folder = Path.of(System.getProperty("spanwright.shots"));
    page.screenshot(new Page.ScreenshotOptions().setPath(folder.resolve(name + ".png")));
  }

  private static synchronized Browser browser() throws IOException {
    if (browser == null) {
      String path = Files.readString(Path.of(System.getProperty("spanwright.browser"))).strip();
      Playwright.CreateOptions options = new Playwright.CreateOptions();
      BrowserType.LaunchOptions launch = new BrowserType.LaunchOptions().setArgs(ARGUMENTS);
      if (!path.isEmpty()) {
        options.setEnv(Map.of("PLAYWRIGHT_SKIP_BROWSER_DOWNLOAD", "1"));
        launch.setExecutablePath(Path.of(path));
      }
      playwright = Playwright.create(options);
      browser = playwright.chromium().launch(launch);
      Runtime.getRuntime().addShutdownHook(new Thread(playwright::close));
    }
    return browser;
  }
}
