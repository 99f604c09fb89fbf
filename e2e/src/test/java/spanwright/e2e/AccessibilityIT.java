package spanwright.e2e;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.deque.html.axecore.playwright.AxeBuilder;
import com.deque.html.axecore.results.Rule;
import com.microsoft.playwright.Page;
import com.microsoft.playwright.options.ColorScheme;
import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;
import org.junit.jupiter.api.Test;

/** Each place of the page for everybody: automatic rules, contrast, narrow screens, lettering. */
class AccessibilityIT extends BrowserTest {
  private static final List<String> PLACES = List.of("survey", "brief", "placements", "sheet");
  private static final List<String> DEMOS = List.of("Corner plot", "Garden in", "Old orchard");
  private static final Set<String> GRAVE = Set.of("serious", "critical");

  /** Pairs of lettering on the plan whose turned boxes overlap by more than a hair. */
  private static final String OVERLAPS =
      "(all) => { const frame = document.querySelector(all.slice(0, -5)).getBoundingClientRect();"
          + " const texts = document.querySelectorAll(all);"
          + " const boxes = [...texts].map((text) => {"
          + " const b = text.getBBox(); const m = text.getScreenCTM(); const inset = 1;"
          + " const scale = Math.hypot(m.a, m.b);"
          + " const e = inset / scale; const tall = b.height * 0.14;"
          + " const corners = [[b.x + e, b.y + tall], [b.x + b.width - e, b.y + tall],"
          + " [b.x + b.width - e, b.y + b.height - tall], [b.x + e, b.y + b.height - tall]]"
          + " .map(([x, y]) => [m.a * x + m.c * y + m.e, m.b * x + m.d * y + m.f]);"
          + " return { words: text.textContent, corners,"
          + " shown: b.width > 0 && text.checkVisibility({ opacityProperty: true }) }; })"
          + " .filter((one) => one.shown && one.corners.some(([x, y]) => x > frame.left"
          + " && x < frame.right && y > frame.top && y < frame.bottom));"
          + " const apart = (p, q) => [p, q].some((ring) => ring.some((a, i) => {"
          + " const b = ring[(i + 1) % 4]; const n = [a[1] - b[1], b[0] - a[0]];"
          + " const on = (all) => all.map(([x, y]) => n[0] * x + n[1] * y);"
          + " const [s, t] = [on(p), on(q)];"
          + " return Math.max(...s) <= Math.min(...t) || Math.max(...t) <= Math.min(...s); }));"
          + " const found = [];"
          + " boxes.forEach((one, i) => boxes.slice(i + 1).forEach((two) => {"
          + " if (!apart(one.corners, two.corners)) found.push(`${one.words} / ${two.words}`); }));"
          + " return found; }";

  /** Regions whose content is wider than they are, and the page itself. */
  private static final String TOO_WIDE =
      "() => ['html', 'body', '#top', '#left', '#right', '#side-view', '#sheet', '#foot', '#state',"
          + " '#places'].filter((s) => { const part = document.querySelector(s);"
          + " return part && part.clientWidth > 0 && part.scrollWidth > part.clientWidth + 1; })"
          + " .map((s) => { const part = document.querySelector(s);"
          + " return `${s} ${part.scrollWidth} > ${part.clientWidth}`; })";

  @Test
  void no_place_breaks_a_grave_rule_wide_or_narrow_light_or_dark() throws IOException {
    open(1440, 900, ColorScheme.LIGHT);
    Surveyor hand = new Surveyor(page);
    hand.openPlot(DEMOS.get(0));
    hand.opened();
    hand.search();
    List<String> grave = new ArrayList<>();
    Set<String> light = new TreeSet<>();
    for (int[] size : new int[][] {{1440, 900}, {390, 844}}) {
      page.setViewportSize(size[0], size[1]);
      for (ColorScheme scheme : List.of(ColorScheme.LIGHT, ColorScheme.DARK)) {
        page.emulateMedia(new Page.EmulateMediaOptions().setColorScheme(scheme));
        for (String place : PLACES) {
          hand.go(place);
          settle(place);
          for (Rule rule : new AxeBuilder(page).analyze().getViolations()) {
            String what =
                String.format(
                    "%s %d %s: %s, %s, %s",
                    place,
                    size[0],
                    scheme,
                    rule.getImpact(),
                    rule.getId(),
                    rule.getNodes().stream().limit(3).map(node -> node.getHtml()).toList());
            (GRAVE.contains(rule.getImpact()) ? grave : light).add(what);
          }
        }
      }
    }
    light.forEach(System.out::println);
    assertEquals(List.of(), grave);
  }

  @Test
  void on_each_demo_plot_no_labels_overlap_and_nothing_scrolls_sideways() throws IOException {
    open(1440, 900, ColorScheme.LIGHT);
    Surveyor hand = new Surveyor(page);
    List<String> faults = new ArrayList<>();
    for (String demo : DEMOS) {
      hand.go("survey");
      hand.openPlot(demo);
      hand.opened();
      hand.search();
      for (int width : new int[] {1440, 768, 390, 360}) {
        page.setViewportSize(width, width < 600 ? 800 : 900);
        for (String place : PLACES) {
          hand.go(place);
          settle(place);
          String where = demo + ", " + place + " at " + width + ": ";
          ((List<?>) page.evaluate(TOO_WIDE)).forEach(region -> faults.add(where + region));
          for (String drawing : List.of("svg.plan text", "#side-view text", "#placement text")) {
            overlapsIn(drawing).forEach(pair -> faults.add(where + pair));
          }
        }
      }
      page.setViewportSize(1440, 900);
    }
    assertEquals(List.of(), faults);
    hand.go("survey");
    // The measure itself: two labels laid upon one another are told.
    page.evaluate(
        "() => { const [one] = document.querySelectorAll('svg.plan .layer-labels text');"
            + " one.after(one.cloneNode(true)); }");
    assertFalse(overlapsIn("svg.plan text").isEmpty());
  }

  private List<?> overlapsIn(String texts) {
    return (List<?>) page.evaluate(OVERLAPS, texts);
  }

  @Test
  void every_colour_of_text_stands_out_by_four_and_a_half() throws IOException {
    for (ColorScheme scheme : List.of(ColorScheme.LIGHT, ColorScheme.DARK)) {
      open(1440, 900, scheme);
      for (String ground : List.of("paper", "field")) {
        for (String text :
            List.of("ink", "ink2", "ink3", "copper", "rope", "clear", "tight", "foul")) {
          assertStandsOut(scheme, text, ground);
        }
      }
      for (String wash :
          List.of("copper-wash", "rope-wash", "leaf-wash", "foul-wash", "ground-wash")) {
        assertStandsOut(scheme, "ink", wash);
        assertStandsOut(scheme, "ink2", wash);
        assertStandsOut(scheme, "ink3", wash);
      }
      assertStandsOut(scheme, "copper", "copper-wash");
      assertStandsOut(scheme, "rope", "rope-wash");
      assertStandsOut(scheme, "foul", "foul-wash");
    }
  }

  private void assertStandsOut(ColorScheme scheme, String text, String ground) {
    double ratio = contrast(token(text), token(ground));
    assertTrue(
        ratio >= 4.5, String.format("%s: %s on %s is %.2f to 1", scheme, text, ground, ratio));
  }

  private String token(String name) {
    return (String)
        page.evaluate(
            "name => getComputedStyle(document.documentElement).getPropertyValue(name).trim()",
            "--" + name);
  }

  /** Contrast ratio of WCAG 2.2 (relative luminance as it defines it). */
  private static double contrast(String one, String two) {
    double a = luminance(one);
    double b = luminance(two);
    return (Math.max(a, b) + 0.05) / (Math.min(a, b) + 0.05);
  }

  private static double luminance(String hex) {
    int rgb = Integer.parseInt(hex.substring(1), 16);
    return 0.2126 * linear(rgb >> 16 & 255)
        + 0.7152 * linear(rgb >> 8 & 255)
        + 0.0722 * linear(rgb & 255);
  }

  private static double linear(int value) {
    double part = value / 255.0;
    return part <= 0.04045 ? part / 12.92 : Math.pow((part + 0.055) / 1.055, 2.4);
  }

  /** Lets the page draw what its size and place ask for. */
  private void settle(String place) {
    if (place.equals("sheet")) {
      page.locator(".page.drawing img").waitFor();
    }
    page.evaluate(
        "() => new Promise((done) => setTimeout(() =>"
            + " requestAnimationFrame(() => requestAnimationFrame(done)), 250))");
  }
}
