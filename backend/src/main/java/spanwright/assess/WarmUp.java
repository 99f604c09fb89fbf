package spanwright.assess;

import java.util.List;
import spanwright.moments.Solver;
import spanwright.plan.Catalogues;
import spanwright.plan.DemoPlans;
import spanwright.plan.Place;
import spanwright.plan.Plan;
import spanwright.plan.PlanReader;
import spanwright.plan.Shape;
import spanwright.plan.Support;
import spanwright.rigging.Layout;

/** Brings a fresh Java machine to speed before somebody waits for it. */
public final class WarmUp {
  /** Assessments until nothing gets much faster any more. */
  private static final int TIMES = 30;

  private WarmUp() {}

  /** Assesses a wire on a demo plot again and again; call it once when a server starts. */
  public static void run() {
    Solver.warmUp();
    Plan plan = PlanReader.read(DemoPlans.list().get(0).json()).plan();
    Assessor assessor = Assessor.of(plan, Catalogues.standard());
    Layout.Hold one = top(assessor, plan.supports().get(0));
    Layout.Hold other = top(assessor, plan.supports().get(1));
    List<Place> ends =
        List.of(between(one.at(), other.at(), 0.1), between(one.at(), other.at(), 0.9));
    Layout layout =
        new Layout(
            Shape.LEVEL.word(),
            List.of(one, other),
            List.of(new Layout.Run(ends, assessor.wireId())),
            new Layout.FeedChoice(0, 0.5, null, null));
    for (int i = 0; i < TIMES; i++) {
      assessor.assess(layout);
    }
  }

  private static Layout.Hold top(Assessor assessor, Support support) {
    Place top = new Place(support.at().x(), support.at().y(), support.highest());
    return new Layout.Hold(support.id(), assessor.surface().raise(top));
  }

  private static Place between(Place a, Place b, double share) {
    return new Place(
        a.x() + share * (b.x() - a.x()),
        a.y() + share * (b.y() - a.y()),
        a.z() + share * (b.z() - a.z()));
  }
}
