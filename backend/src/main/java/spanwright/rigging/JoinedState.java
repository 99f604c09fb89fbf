package spanwright.rigging;

import spanwright.plan.Place;

/**
 * Everything in one weather.
 *
 * @param spans as they hang
 * @param greatest tension in each span, its bends' ropes included [N]
 * @param onAttachment force of wire and rope on each attachment
 * @param ropeTension at each attachment [N]
 * @param corner bends held by ropes; null where there is none
 */
record JoinedState(
    Solved[] spans, double[] greatest, Force[] onAttachment, double[] ropeTension, Place[] corner) {
  Solved solved(int i) {
    return spans[i];
  }

  private Place first(int i) {
    return spans[i].points().get(spans[i].wireFrom());
  }

  private Place last(int i) {
    return spans[i].points().get(spans[i].wireTo());
  }

  double chord(int i) {
    return first(i).distance(last(i));
  }

  /** Level, square to a span's wire, to its left. */
  double[] side(int i) {
    double dx = last(i).x() - first(i).x();
    double dy = last(i).y() - first(i).y();
    double level = Math.hypot(dx, dy);
    return level < 0.02 * chord(i) || level < 1e-6
        ? new double[] {0, 1}
        : new double[] {-dy / level, dx / level};
  }
}
