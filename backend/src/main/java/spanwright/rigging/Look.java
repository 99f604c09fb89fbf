package spanwright.rigging;

import java.util.ArrayList;
import java.util.List;
import java.util.Objects;
import java.util.function.ToDoubleFunction;
import java.util.stream.Stream;
import spanwright.plan.Place;

/**
 * A span as it was hung, in every weather.
 *
 * @param calm in still air
 * @param left in the gust from the right, seen from the span's first attachment
 * @param right in the gust from the left
 * @param ice under ice in still air, or null
 * @param iceLeft under ice in the gust that goes with it, or null
 * @param iceRight likewise
 * @param sideX level, square to the span, to its left
 * @param sideY likewise
 * @param ropeFrom length of rope at its first end [m]
 * @param ropeTo length of rope at its second end [m]
 * @param tension at the end where it is set, calm [N]
 * @param chord between what holds its wire, or its ropes [m]
 * @param slack whether it hangs as long as it is, looser than the pull wanted
 * @param lifted whether a weather would draw its counterweight up
 */
record Look(
    Solved calm,
    Solved left,
    Solved right,
    Solved ice,
    Solved iceLeft,
    Solved iceRight,
    double sideX,
    double sideY,
    double ropeFrom,
    double ropeTo,
    double tension,
    double chord,
    boolean slack,
    boolean lifted) {

  /** In the gust from either side, without ice and, where there is any, with it. */
  List<Solved> blown() {
    return Stream.of(left, right, iceLeft, iceRight).filter(Objects::nonNull).toList();
  }

  /** Greatest tension of the wire in any weather [N]. */
  double greatest() {
    return most(Solved::greatest);
  }

  /** The weather in which its wire is drawn hardest, in words. */
  String governing() {
    Solved[] each = {calm, left, right, ice, iceLeft, iceRight};
    Weather[] weathers = {
      Weather.CALM, Weather.GUST, Weather.GUST, Weather.ICE, Weather.ICY_GUST, Weather.ICY_GUST
    };
    Weather worst = Weather.CALM;
    double most = 0;
    for (int i = 0; i < each.length; i++) {
      // a weather that adds less than a thousandth is not what it is chosen by
      if (each[i] != null && each[i].greatest() > most * 1.001) {
        most = each[i].greatest();
        worst = weathers[i];
      }
    }
    return worst.words;
  }

  /** Greatest tension of a rope that holds it in any weather [N]. */
  double greatestRope() {
    return most(Solved::greatestRope);
  }

  private double most(ToDoubleFunction<Solved> of) {
    double most = 0;
    for (Solved each : new Solved[] {calm, left, right, ice, iceLeft, iceRight}) {
      most = each == null ? most : Math.max(most, of.applyAsDouble(each));
    }
    return most;
  }

  Rigged.Shapes shapes() {
    List<List<Place>> iced = new ArrayList<>();
    for (Solved each : new Solved[] {ice, iceLeft, iceRight}) {
      iced.add(each == null ? List.of() : each.points());
    }
    return new Rigged.Shapes(
        calm.points(), left.points(), right.points(), iced.get(0), iced.get(1), iced.get(2));
  }
}
