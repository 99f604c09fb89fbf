package spanwright.e2e;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.microsoft.playwright.Locator;
import com.microsoft.playwright.options.ColorScheme;
import java.io.IOException;
import org.junit.jupiter.api.Test;

/** An overhead line across the only span: everything is refused, with its reason and its cure. */
class OverheadLineIT extends BrowserTest {

  @Test
  void a_line_across_the_only_span_refuses_it_until_the_line_is_gone() throws IOException {
    open(1440, 900, ColorScheme.LIGHT);
    Surveyor hand = new Surveyor(page);
    hand.newPlot();
    hand.ring("boundary", 0, 0, "20", "90", "12", "0", "20", "L");
    hand.showAll();
    hand.support("mast", "West mast", 2, 6, "3", "7");
    hand.support("mast", "East mast", 18, 6, "3", "7");
    hand.place("entry", 18, 2);
    drawLine(hand);
    hand.settled();
    assertTrue(
        page.locator(".ledger-table tr")
            .filter(having("Overhead lines"))
            .innerText()
            .contains("1"));

    hand.search();
    assertEquals(0, page.locator("#placements .row").count());
    String said = page.locator("#placements").innerText();
    assertTrue(said.contains("No placement is allowed on this plot as it stands"), said);
    checkRefusals();
    hand.go("sheet");
    page.locator(".sheet-none").waitFor();

    hand.go("survey");
    page.locator(".plan [data-ref='overheadLines/overhead-line-1']").press("Enter");
    page.keyboard().press("Delete");
    hand.settled();
    hand.go("placements");
    page.locator("#placements .stale").waitFor();
    page.locator("[data-key=again]").click();
    page.locator("[data-key=start]").click();
    page.locator("#placements .row").first().waitFor(patient());
    page.locator(".search-ended").waitFor(patient());
    assertTrue(page.locator("#placements .row").count() > 0);
  }

  private void drawLine(Surveyor hand) {
    hand.take("overheadLines");
    hand.click(10, -1);
    hand.click(10, 13);
    page.keyboard().press("c");
    page.locator(".thing-figures").waitFor();
    hand.figure("Name", "Line over the lawn");
    page.locator("#figure-kind").selectOption("low-voltage");
    for (String point : new String[] {"0", "1"}) {
      Locator height = page.locator("#wall-" + point + "-height");
      height.fill("6.4");
      height.press("Enter");
    }
    page.locator(".thing-figures").getByText("Done").click();
  }

  private void checkRefusals() {
    Locator first = page.locator("#refusals li").first();
    String words = first.innerText();
    assertTrue(words.contains("West mast") && words.contains("East mast"), words);
    assertTrue(words.contains("Line over the lawn"), words);
    assertTrue(words.contains("3.05"), words);
    assertTrue(words.contains("Cure: "), words);
    first.locator("button.plain").click();
    page.locator(".plan .ghost.shown").waitFor();
    page.locator("#refusals li.shown").first().waitFor();
    assertEquals(1, page.locator("#refusals li.shown").count());
    for (String one : page.locator("#refusals li").allInnerTexts()) {
      assertTrue(one.contains("Cure: "), one);
    }
  }

  private static Locator.WaitForOptions patient() {
    return new Locator.WaitForOptions().setTimeout(300_000);
  }
}
