package spanwright.search;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;
import spanwright.assess.Assessor;
import spanwright.assess.Hung;
import spanwright.assess.Placement;
import spanwright.clearance.Clearance;
import spanwright.clearance.State;
import spanwright.plan.Catalogue;
import spanwright.plan.Catalogues;
import spanwright.plan.DemoPlans;
import spanwright.plan.Place;
import spanwright.plan.Plan;
import spanwright.plan.PlanReader;
import spanwright.rigging.Layout;

/** The look that a search takes at every layout sees all that the full look would refuse. */
class CloseLookTest {
  private static final Catalogue CATALOGUE = Catalogues.standard();

  @Test
  void what_is_foul_or_tight_is_the_same_however_far_one_looks() {
    Random random = new Random(20);
    int fouls = 0;
    for (DemoPlans.Demo demo : DemoPlans.list()) {
      Plan plan = PlanReader.read(demo.json()).plan();
      Assessor assessor = Assessor.of(plan, CATALOGUE);
      Result result =
          Search.run(
              plan, CATALOGUE, new Search.Options(Effort.QUICK, 1, 6, 2), new Search.Listener() {});
      for (Placement placement : result.placements()) {
        for (int i = 0; i < 12; i++) {
          Layout layout = lowered(placement, 0.4 * i * random.nextDouble());
          Hung full = assessor.hang(layout);
          Hung close = assessor.hangClosely(layout);
          assertEquals(toHeed(full), toHeed(close));
          assertEquals(full.allowed(), close.allowed());
          assertEquals(full.clearances(), assessor.told(close).clearances());
          fouls += full.allowed() ? 0 : 1;
        }
      }
    }
    assertTrue(fouls > 20, "some of them are foul: " + fouls);
  }

  private static Layout lowered(Placement placement, double by) {
    List<Layout.Hold> holds = new ArrayList<>();
    for (Placement.Attachment each : placement.attachments()) {
      Place at = each.at();
      holds.add(new Layout.Hold(each.on(), new Place(at.x(), at.y(), at.z() - by)));
    }
    return new Layout(
        placement.shape(),
        holds,
        placement.conductors().stream()
            .map(wire -> new Layout.Run(wire.points(), wire.wire()))
            .toList(),
        new Layout.FeedChoice(
            placement.feed().conductor(),
            placement.feed().fraction(),
            placement.feed().line(),
            placement.feed().lineLength()));
  }

  private static List<Clearance> toHeed(Hung hung) {
    return hung.clearances().stream().filter(c -> c.state() != State.CLEAR).toList();
  }
}
