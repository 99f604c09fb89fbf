package spanwright.rigging;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.Test;
import spanwright.plan.Catalogues;
import spanwright.plan.DemoPlans;
import spanwright.plan.Place;
import spanwright.plan.Plan;
import spanwright.plan.PlanReader;

/**
 * A counterweight tried in place of a loose tie, and given up because the gust would lift it, left
 * the span with a rope of no length and a pull of nothing.
 */
class WeightPutBackTest {
  @Test
  void a_tie_put_back_after_a_weight_was_tried_keeps_its_rope_and_its_pull() {
    String json =
        DemoPlans.list().stream()
            .filter(demo -> demo.name().equals("old-orchard"))
            .findFirst()
            .orElseThrow()
            .json()
            .replace("\"ice\": 0", "\"ice\": 3");
    Plan plan = PlanReader.read(json).plan();
    Layout layout =
        new Layout(
            "apex",
            List.of(
                new Layout.Hold("birch", new Place(14.0, 39.0, 9.8063)),
                new Layout.Hold("kitchen-garden", new Place(28.0819, 40.9427, 13.0567)),
                new Layout.Hold("cottage-chimney", new Place(33.4, 24.0, 9.4627))),
            List.of(
                new Layout.Run(
                    List.of(
                        new Place(17.8479, 39.5308, 10.9),
                        new Place(28.0819, 40.9427, 13.0567),
                        new Place(32.9, 25.7, 9.9)),
                    "copper-strand-2.1")),
            new Layout.FeedChoice(0, 0.4017, "open-450", null));
    Rigged rigged = Rigging.hang(plan, Catalogues.standard(), layout);
    for (Rigged.Rope rope : rigged.ropes()) {
      if (rope.what().equals("tail")) {
        double run = 0;
        List<Place> points = rope.shapes().calm();
        for (int i = 1; i < points.size(); i++) {
          run += points.get(i - 1).distance(points.get(i));
        }
        assertEquals(run, rope.length(), 0.03);
      }
    }
    rigged.spans().forEach(span -> assertTrue(span.tension() > 0, "a pull of nothing"));
  }
}
