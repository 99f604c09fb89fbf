package spanwright.e2e;

import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.databind.JsonNode;
import com.microsoft.playwright.Page;
import com.microsoft.playwright.options.ColorScheme;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;

/**
 * The pictures of the guide, made by the app from the demo plots with a real search, into the
 * folder for pictures; docs/guide holds those that were looked at and kept.
 */
class GuidePicturesIT extends BrowserTest {
  private static final long MOST_BYTES = 400_000;

  @Test
  void pictures_of_placements_and_their_sheet() throws IOException {
    open(1440, 900, ColorScheme.LIGHT);
    Surveyor hand = new Surveyor(page);
    page.locator(".hint .link").last().click();
    hand.openPlot("Old orchard");
    hand.opened();
    hand.search();
    band("20 m");
    picture("placements");
    page.emulateMedia(new Page.EmulateMediaOptions().setColorScheme(ColorScheme.DARK));
    page.locator("#placements .row").nth(2).click();
    band("20 m");
    picture("placements-dark");
    page.emulateMedia(new Page.EmulateMediaOptions().setColorScheme(ColorScheme.LIGHT));
    page.locator("#placements .row").first().click();
    band("20 m");
    page.setViewportSize(390, 844);
    picture("phone");
    page.setViewportSize(1440, 900);
    hand.go("sheet");
    page.locator(".page.drawing img").waitFor();
    picture("sheet");
    page.locator(".page.drawing").evaluate("page => page.scrollIntoView({ block: 'start' })");
    picture("drawing");
  }

  @Test
  void pictures_of_surveying() throws IOException {
    open(1440, 900, ColorScheme.LIGHT);
    Surveyor hand = new Surveyor(page);
    page.locator(".hint .link").last().click();
    hand.openPlot("Corner plot");
    hand.opened();
    page.locator(".plan [data-ref='supports/walnut']").press("Enter");
    picture("survey");
    hand.go("brief");
    picture("brief");
    hand.go("survey");
    hand.newPlot();
    hand.ring("boundary", 0, 0, "24", "90", "16", "0", "24", "L");
    hand.showAll();
    hand.take("buildings");
    hand.click(2, 1);
    hand.typeSides("9", "90");
    double[] at = hand.screen(11.2, 5.6);
    page.mouse().move(at[0], at[1]);
    page.keyboard().type("6.5");
    page.evaluate("() => new Promise((done) => setTimeout(done, 600))");
    keep("drawing-a-house");
  }

  private void band(String name) {
    page.locator("#placement .band-tabs .tab", text(name)).click();
  }

  /** Takes a picture with the pointer out of the way. */
  private void picture(String name) throws IOException {
    page.mouse().move(4, 500);
    page.evaluate("() => new Promise((done) => setTimeout(done, 600))");
    keep(name);
  }

  private void keep(String name) throws IOException {
    shot(name);
    Path file = Path.of(System.getProperty("spanwright.shots"), name + ".png");
    SmallPicture.pack(file, tokens());
    long bytes = Files.size(file);
    assertTrue(bytes > 10_000 && bytes < MOST_BYTES, name + " has " + bytes + " bytes");
  }

  /** The colours of the page's style sheet in the scheme that is shown. */
  private List<String> tokens() {
    return Served.json(
            (String)
                page.evaluate(
                    "() => { const style = getComputedStyle(document.documentElement);"
                        + " return JSON.stringify(['paper', 'field', 'ink', 'ink2', 'ink3', 'rule',"
                        + " 'grid5', 'grid', 'copper', 'rope', 'clear', 'tight', 'foul', 'leaf',"
                        + " 'hatch', 'copper-wash', 'rope-wash', 'leaf-wash', 'foul-wash']"
                        + ".map((name) => style.getPropertyValue('--' + name).trim())); }"))
        .valueStream()
        .map(JsonNode::asText)
        .toList();
  }
}
