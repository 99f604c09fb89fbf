package spanwright.e2e;

import com.microsoft.playwright.Locator;
import com.microsoft.playwright.Page;
import com.microsoft.playwright.options.WaitForSelectorState;
import java.util.List;
import java.util.regex.Pattern;

/**
 * A hand on the page that draws as a newcomer does: tools from the strip, clicks on the plan by its
 * metres, typed lengths and directions, figures in the panel.
 */
final class Surveyor {
  private static final String TO_SCREEN =
      "([x, y]) => { const plan = document.querySelector('svg.plan');"
          + " const p = new DOMPoint(x, -y).matrixTransform(plan.getScreenCTM());"
          + " return [p.x, p.y]; }";

  private static final Pattern SAVED = Pattern.compile("Saved \\d");

  private final Page page;

  Surveyor(Page page) {
    this.page = page;
    opened();
  }

  /** Waits until a plot is open and kept by the server. */
  void opened() {
    page.locator(".saved-text", new Page.LocatorOptions().setHasText(SAVED)).waitFor();
  }

  /** A plot with nothing on it, by the list of plots. */
  void newPlot() {
    page.locator(".plot-name").click();
    Locator dialog = page.locator("dialog.plots");
    dialog.locator("button", new Locator.LocatorOptions().setHasText("New plot")).first().click();
    dialog.waitFor(hidden());
    page.locator(".empty").waitFor();
  }

  /** Opens the plot of this title, a demo or one that is kept. */
  void openPlot(String title) {
    page.locator(".plot-name").click();
    Locator dialog = page.locator("dialog.plots");
    dialog.locator(".plots-open", new Locator.LocatorOptions().setHasText(title)).first().click();
    dialog.waitFor(hidden());
  }

  void take(String tool) {
    page.locator("[data-tool=" + tool + "]").click();
  }

  /**
   * Draws a ring: the first corner by a click, each further one by a typed length and direction,
   * then C closes it.
   */
  void ring(String tool, double east, double north, String... lengthsAndDirections) {
    take(tool);
    click(east, north);
    typeSides(lengthsAndDirections);
    page.keyboard().press("c");
    page.locator(".thing-figures").waitFor();
  }

  /** What a ring's or path's further points are typed as: length, Tab, direction, Enter. */
  void typeSides(String... lengthsAndDirections) {
    for (int i = 0; i < lengthsAndDirections.length; i += 2) {
      page.keyboard().type(lengthsAndDirections[i]);
      page.keyboard().press("Tab");
      page.keyboard().type(lengthsAndDirections[i + 1]);
      page.keyboard().press("Enter");
    }
  }

  /** Takes a tool and places a single thing with a click. */
  void place(String tool, double east, double north) {
    take(tool);
    click(east, north);
    page.locator(".thing-figures").waitFor();
  }

  /** Places a support of a kind, named, with the heights of its fixings. */
  void support(String kind, String name, double east, double north, String lowest, String highest) {
    take("supports");
    page.locator("#draft-kind-" + kind).check();
    click(east, north);
    figure("Name", name);
    figure("Lowest fixing", lowest);
    figure("Highest fixing", highest);
  }

  /** Types into a box of the selected thing's figures. */
  void figure(String label, String text) {
    Locator box =
        page.locator(".thing-figures")
            .getByLabel(label, new Locator.GetByLabelOptions().setExact(true));
    box.fill(text);
    box.press("Enter");
  }

  /** Shows all of the plan. */
  void showAll() {
    page.locator(".plan-buttons button").last().click();
  }

  void click(double east, double north) {
    double[] at = screen(east, north);
    page.mouse().move(at[0] - 8, at[1] - 3);
    page.mouse().move(at[0], at[1]);
    page.mouse().click(at[0], at[1]);
  }

  /** Where a place of the plan is on the screen. */
  double[] screen(double east, double north) {
    List<?> at = (List<?>) page.evaluate(TO_SCREEN, List.of(east, north));
    return new double[] {((Number) at.get(0)).doubleValue(), ((Number) at.get(1)).doubleValue()};
  }

  void go(String place) {
    page.locator("#places [data-place=" + place + "]").click();
    page.locator("body[data-place=" + place + "]").waitFor();
  }

  /** Starts a quick search and waits for its end, however long this machine takes. */
  void search() {
    go("placements");
    page.locator("[data-key=effort-quick]").check();
    page.locator("[data-key=start]").click();
    page.locator(".search-ended").waitFor(new Locator.WaitForOptions().setTimeout(300_000));
  }

  /** Waits until everything drawn has been checked and saved. */
  void settled() {
    page.locator(".next-step.ready").waitFor();
    page.locator(".saved[data-state=saved]").waitFor();
  }

  private static Locator.WaitForOptions hidden() {
    return new Locator.WaitForOptions().setState(WaitForSelectorState.HIDDEN);
  }
}
