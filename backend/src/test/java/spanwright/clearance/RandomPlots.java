package spanwright.clearance;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Random;
import spanwright.plan.GroundSurface;
import spanwright.plan.Plan;
import spanwright.plan.Support;
import spanwright.rigging.Layout;
import spanwright.rigging.Plots;
import spanwright.rigging.Rigging;

/** Plots with a little of everything on them, each from a seed. */
final class RandomPlots {
  private RandomPlots() {}

  private static String say(String form, Object... values) {
    return String.format(Locale.ROOT, form, values);
  }

  private static double between(Random random, double low, double high) {
    return low + (high - low) * random.nextDouble();
  }

  private static String box(double x, double y, double wide, double deep) {
    return say(
        "[[%.2f,%.2f],[%.2f,%.2f],[%.2f,%.2f],[%.2f,%.2f]]",
        x, y, x + wide, y, x + wide, y + deep, x, y + deep);
  }

  static Plan plan(Random random) {
    return Plots.plan(json(random, 2));
  }

  static String json(Random random, double guyRadius) {
    double hx = between(random, 8, 42);
    double hy = between(random, 8, 42);
    String house =
        say(
            "[{\"id\":\"house\",\"footprint\":%s,\"eaves\":4,\"ridge\":7,\"roof\":\"%s\",\"ridgeLine\":[[%.2f,%.2f],[%.2f,%.2f]]}]",
            box(hx, hy, 9, 6),
            random.nextBoolean() ? "gable" : "hip",
            hx + 2,
            hy + 3,
            hx + 7,
            hy + 3);
    String trees =
        say(
            "[{\"id\":\"birch\",\"at\":[%.2f,%.2f],\"canopy\":{\"radius\":3,\"from\":3,\"to\":11}}]",
            between(random, 10, 50), between(random, 10, 50));
    String zones =
        say(
            "[{\"id\":\"pool\",\"area\":%s,\"rule\":\"no-wire\"},{\"id\":\"drive\",\"area\":%s,\"rule\":\"headroom\",\"height\":4.5},{\"id\":\"veg\",\"area\":%s,\"rule\":\"no-mast\"}]",
            box(between(random, 5, 45), between(random, 5, 45), 6, 6),
            box(between(random, 5, 50), 2, 4, 56),
            box(between(random, 15, 45), between(random, 15, 45), 8, 8));
    String people =
        say(
            "[{\"id\":\"patio\",\"area\":%s,\"from\":0,\"to\":2.2}]",
            box(between(random, 5, 50), between(random, 5, 50), 6, 5));
    String metal =
        say(
            "[{\"id\":\"rail\",\"path\":[[%.2f,%.2f,1],[%.2f,%.2f,5]],\"radius\":0.03}]",
            between(random, 5, 55),
            between(random, 5, 55),
            between(random, 5, 55),
            between(random, 5, 55));
    Plots plots =
        Plots.bare()
            .entry(say("[%.2f, %.2f]", hx + 4, hy - 0.1))
            .poles(
                """
                , { "id": "mast", "name": "Mast", "kind": "mast", "at": [30, 14], "lowest": 2, "highest": 8 },
                  { "id": "oak", "name": "Oak", "kind": "tree", "at": [8, 48], "lowest": 3, "highest": 9, "sway": 0.4,
                    "canopy": { "radius": 2.5, "from": 3, "to": 12 } }""")
            .with(
                "mastZones",
                """
                [ { "id": "lawn", "name": "Lawn", "area": [[14,14],[48,14],[48,54],[14,54]], "highest": 8, "guyRadius": %.1f } ]"""
                    .formatted(guyRadius))
            .with("overheadLines", lines(random))
            .with("buildings", house)
            .with("trees", trees)
            .with("zones", zones)
            .with("people", people)
            .with("metalwork", metal);
    if (random.nextInt(3) > 0) {
      plots.terrain(terrain(random));
    }
    return plots.json();
  }

  private static String terrain(Random random) {
    return say(
        "[[0,0,0],[60,0,%.2f],[60,60,%.2f],[0,60,%.2f],[%.1f,%.1f,%.2f],[20,44,%.2f]]",
        between(random, 0, 4),
        between(random, -3, 3),
        between(random, 0, 3),
        between(random, 25, 40),
        between(random, 20, 40),
        between(random, -2, 2),
        between(random, -1, 1));
  }

  private static String lines(Random random) {
    String[] kinds = {"telephone", "low-voltage", "medium-voltage", "high-voltage", "unknown"};
    List<String> lines = new ArrayList<>();
    for (int i = 0; i < 3; i++) {
      double turn = between(random, 0, 6.3);
      double away = between(random, 18, 55);
      double x = 30 + away * Math.cos(turn);
      double y = 30 + away * Math.sin(turn);
      double ux = -Math.sin(turn + random.nextGaussian() / 3) * 40;
      double uy = Math.cos(turn + random.nextGaussian() / 3) * 40;
      lines.add(
          say(
              "{\"id\":\"line%d\",\"kind\":\"%s\",\"path\":[[%.2f,%.2f,%.2f],[%.2f,%.2f,%.2f],[%.2f,%.2f,%.2f]]}",
              i,
              kinds[random.nextInt(5)],
              x - ux,
              y - uy,
              between(random, 6, 12),
              x,
              y,
              between(random, 4, 10),
              x + ux,
              y + uy,
              between(random, 6, 12)));
    }
    return "[" + String.join(",", lines) + "]";
  }

  /** A layout of two or three attachments, or null where they came out too near together. */
  static Layout layout(Random random, Plan plan, Rigging rigging) {
    GroundSurface ground = GroundSurface.of(plan);
    List<Layout.Hold> holds = new ArrayList<>();
    int count = random.nextInt(3) == 0 ? 3 : 2;
    for (int i = 0; i < count; i++) {
      boolean middle = count == 3 && i == 1;
      int pick = middle ? 4 : random.nextInt(5);
      if (pick == 4) {
        double x = between(random, 14, 48);
        double y = between(random, 14, 54);
        double z = ground.heightAt(x, y) + between(random, 3, 8);
        holds.add(Plots.hold("lawn", x, y, z));
      } else {
        Support on = plan.supports().get(pick);
        double up = between(random, (on.lowest() + on.highest()) / 2, on.highest());
        holds.add(Plots.hold(on.id(), on.at().x(), on.at().y(), ground.heightAt(on.at()) + up));
      }
    }
    for (int i = 0; i + 1 < count; i++) {
      if (holds.get(i).at().distance(holds.get(i + 1).at()) < 14) {
        return null;
      }
    }
    double tail = 0.5;
    for (Layout.Hold each : holds) {
      double above = each.at().z() - ground.heightAt(each.at().x(), each.at().y());
      tail = Math.max(tail, rigging.leastTail(each.on(), above));
    }
    return Plots.straight(
        count == 3 ? "apex" : "level", tail, 0.5, holds.toArray(new Layout.Hold[0]));
  }
}
