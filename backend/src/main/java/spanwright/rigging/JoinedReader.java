package spanwright.rigging;

import java.util.ArrayList;
import java.util.List;
import spanwright.plan.Place;

/** Reads the state of a net out. */
final class JoinedReader {
  private final JoinedModel model;
  private final Hang hang;
  private final Course course;

  JoinedReader(JoinedModel model) {
    this.model = model;
    hang = model.hang;
    course = model.course;
  }

  JoinedState state() {
    int spans = model.shells.length;
    List<List<Place>> ropes = new ArrayList<>();
    Force[] on = new Force[model.holds];
    double[] ropeTension = new double[model.holds];
    Place[] corner = new Place[model.holds];
    for (int a = 0; a < model.holds; a++) {
      on[a] = Force.NONE;
      ropes.add(List.of());
      if (model.node[a] >= model.holds) {
        int c = spans + model.node[a] - model.holds;
        ropes.set(a, sample(c, a, new int[] {4}));
        on[a] = forceAtStart(c);
        ropeTension[a] = model.chains[c].tensionAtStart();
        corner[a] = ropes.get(a).get(4);
      }
    }
    Solved[] solved = new Solved[spans];
    double[] greatest = new double[spans];
    for (int i = 0; i < spans; i++) {
      Course.Stretch each = course.spans().get(i);
      solved[i] = solved(i, ropes.get(each.fromHold()), ropes.get(each.toHold()));
      greatest[i] = Math.max(solved[i].greatest(), solved[i].greatestRope());
      for (int a : new int[] {each.fromHold(), each.toHold()}) {
        if (model.node[a] < model.holds) {
          boolean start = each.fromHold() == a;
          on[a] = on[a].plus(start ? solved[i].onFrom() : solved[i].onTo());
          ropeTension[a] =
              start ? model.chains[i].tensionAtStart() : model.chains[i].tensionAtEnd();
        }
      }
    }
    return new JoinedState(solved, greatest, on, ropeTension, corner);
  }

  /** Greatest tension of the rope at an attachment, a bend's own or that in line with the wire. */
  private double ropeTension(int a, int i) {
    return model
        .chains[
        model.node[a] >= model.holds ? model.shells.length + model.node[a] - model.holds : i]
        .greatestTension();
  }

  private Force forceAtStart(int c) {
    return new Force(model.chains[c].start[0], model.chains[c].start[1], model.chains[c].start[2]);
  }

  private List<Place> sample(int c, int from, int[] parts) {
    int sum = 1;
    for (int each : parts) {
      sum += each;
    }
    double[] xyz = new double[3 * sum];
    int count = model.chains[c].sample(parts, xyz);
    List<Place> points = new ArrayList<>(count);
    for (int i = 0; i < count; i++) {
      points.add(
          new Place(
              model.net.at[3 * from] + xyz[3 * i],
              model.net.at[3 * from + 1] + xyz[3 * i + 1],
              model.net.at[3 * from + 2] + xyz[3 * i + 2]));
    }
    return points;
  }

  private Solved solved(int i, List<Place> ropeFrom, List<Place> ropeTo) {
    Course.Stretch each = course.spans().get(i);
    Chain chain = model.chains[i];
    SpanStatics.Make make = model.shells[i].make;
    int[] parts =
        SpanStatics.cut(
            hang.wireParts(i), make.wire(), make.wireAfter(), chain.length[0], chain.length[3]);
    List<Place> own = sample(i, model.node[each.fromHold()], parts);
    int end = 3 * model.node[each.toHold()];
    own.set(
        own.size() - 1, new Place(model.net.at[end], model.net.at[end + 1], model.net.at[end + 2]));
    List<Place> points = new ArrayList<>();
    points.addAll(ropeFrom.isEmpty() ? List.of() : ropeFrom.subList(0, ropeFrom.size() - 1));
    int before = points.size();
    points.addAll(own);
    int after = points.size();
    for (int k = ropeTo.size() - 2; k >= 0; k--) {
      points.add(ropeTo.get(k));
    }
    double[] last = chain.end();
    return new Solved(
        points,
        before + parts[0],
        after - 1 - parts[3],
        before + parts[0] + parts[1],
        forceAtStart(i),
        new Force(-last[0], -last[1], -last[2]),
        chain.greatestTension(),
        Math.max(ropeTension(each.fromHold(), i), ropeTension(each.toHold(), i)));
  }
}
