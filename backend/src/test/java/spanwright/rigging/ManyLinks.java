package spanwright.rigging;

import java.util.ArrayList;
import java.util.List;
import spanwright.plan.Place;

/**
 * Statics done another way: wire and rope as many small springs between points, brought to rest by
 * letting them swing and stopping them whenever they move fastest (dynamic relaxation). Knows
 * nothing of catenaries.
 */
final class ManyLinks {
  private final List<double[]> at = new ArrayList<>();
  private final List<double[]> load = new ArrayList<>();
  private final List<Boolean> fixed = new ArrayList<>();
  private final List<int[]> links = new ArrayList<>();
  private final List<double[]> kinds = new ArrayList<>();

  /** Adds a point. */
  int point(Place place, boolean isFixed) {
    at.add(new double[] {place.x(), place.y(), place.z()});
    load.add(new double[3]);
    fixed.add(isFixed);
    return at.size() - 1;
  }

  void load(int point, double x, double y, double z) {
    load.get(point)[0] += x;
    load.get(point)[1] += y;
    load.get(point)[2] += z;
  }

  /**
   * Adds a run of links between two points; returns the points along it, both included.
   *
   * @param length as it hangs in still air [m]
   * @param stiffness EA [N]
   * @param weight for each metre [N/m]
   * @param push of the wind on each metre that it meets square [N/m]
   */
  int[] run(
      int from, int to, int parts, double length, double stiffness, double weight, double push) {
    int[] points = new int[parts + 1];
    points[0] = from;
    points[parts] = to;
    double[] a = at.get(from);
    double[] b = at.get(to);
    for (int i = 1; i < parts; i++) {
      double t = (double) i / parts;
      points[i] =
          point(
              new Place(
                  a[0] + t * (b[0] - a[0]),
                  a[1] + t * (b[1] - a[1]),
                  a[2] + t * (b[2] - a[2]) - 0.2 * t * (1 - t)),
              false);
    }
    double each = length / parts;
    for (int i = 0; i < parts; i++) {
      links.add(new int[] {points[i], points[i + 1]});
      kinds.add(new double[] {each, stiffness, push, each});
      load(points[i], 0, 0, -each * weight / 2);
      load(points[i + 1], 0, 0, -each * weight / 2);
    }
    return points;
  }

  /** Comes to rest in still air, every run as long as it was said to hang. */
  void hang() {
    for (int pass = 0; pass < 10; pass++) {
      relax();
      for (int i = 0; i < links.size(); i++) {
        double[] kind = kinds.get(i);
        kind[0] = kind[3] / (1 + tension(i) / kind[1]);
      }
    }
    relax();
  }

  /** Moves a point that stands still. */
  void move(int point, double x, double y) {
    at.get(point)[0] += x;
    at.get(point)[1] += y;
  }

  /** Blows it, each link with the part of the wind that meets it square, and lets it rest. */
  void blow(double x, double y) {
    for (int i = 0; i < links.size(); i++) {
      double[] u = unit(at.get(links.get(i)[0]), at.get(links.get(i)[1]));
      double along = x * u[0] + y * u[1];
      double[] across = {x - along * u[0], y - along * u[1], -along * u[2]};
      double size =
          Math.sqrt(across[0] * across[0] + across[1] * across[1] + across[2] * across[2]);
      double half = kinds.get(i)[3] * kinds.get(i)[2] * size / 2;
      for (int end : links.get(i)) {
        load(end, half * across[0], half * across[1], half * across[2]);
      }
    }
    relax();
  }

  private static double[] unit(double[] a, double[] b) {
    double x = b[0] - a[0];
    double y = b[1] - a[1];
    double z = b[2] - a[2];
    double size = Math.sqrt(x * x + y * y + z * z);
    return new double[] {x / size, y / size, z / size};
  }

  private void relax() {
    int count = at.size();
    double[][] speed = new double[count][3];
    double[][] force = new double[count][3];
    double[] mass = new double[count];
    for (int i = 0; i < links.size(); i++) {
      double stiff = kinds.get(i)[1] / kinds.get(i)[0];
      mass[links.get(i)[0]] += stiff;
      mass[links.get(i)[1]] += stiff;
    }
    double before = 0;
    for (int step = 0; step < 400_000; step++) {
      double left = forces(force);
      if (left < 2e-4 && step > 10) {
        return;
      }
      double energy = 0;
      for (int i = 0; i < count; i++) {
        for (int k = 0; k < 3 && !fixed.get(i); k++) {
          speed[i][k] += force[i][k] / mass[i];
          energy += mass[i] * speed[i][k] * speed[i][k];
        }
      }
      if (energy < before) {
        for (double[] each : speed) {
          java.util.Arrays.fill(each, 0);
        }
        energy = 0;
      }
      before = energy;
      for (int i = 0; i < count; i++) {
        for (int k = 0; k < 3; k++) {
          at.get(i)[k] += speed[i][k];
        }
      }
    }
    throw new IllegalStateException("it does not come to rest");
  }

  private double forces(double[][] force) {
    for (int i = 0; i < force.length; i++) {
      System.arraycopy(load.get(i), 0, force[i], 0, 3);
    }
    for (int i = 0; i < links.size(); i++) {
      int a = links.get(i)[0];
      int b = links.get(i)[1];
      double tension = tension(i);
      double[] u = unit(at.get(a), at.get(b));
      for (int k = 0; k < 3; k++) {
        force[a][k] += tension * u[k];
        force[b][k] -= tension * u[k];
      }
    }
    double most = 0;
    for (int i = 0; i < force.length; i++) {
      for (int k = 0; k < 3 && !fixed.get(i); k++) {
        most = Math.max(most, Math.abs(force[i][k]));
      }
    }
    return most;
  }

  private double tension(int link) {
    double[] a = at.get(links.get(link)[0]);
    double[] b = at.get(links.get(link)[1]);
    double length = Math.hypot(Math.hypot(b[0] - a[0], b[1] - a[1]), b[2] - a[2]);
    return Math.max(0, kinds.get(link)[1] * (length / kinds.get(link)[0] - 1));
  }

  /** Whole force of the links and loads on a point that stands still [N]. */
  double on(int point) {
    double[][] force = new double[at.size()][3];
    forces(force);
    double[] own = force[point];
    return Math.hypot(Math.hypot(own[0], own[1]), own[2]);
  }

  Place place(int point) {
    double[] p = at.get(point);
    return new Place(p[0], p[1], p[2]);
  }

  double length(int[] points) {
    double sum = 0;
    for (int i = 1; i < points.length; i++) {
      sum += place(points[i - 1]).distance(place(points[i]));
    }
    return sum;
  }

  double sag(int[] points) {
    List<Place> places = new ArrayList<>();
    for (int each : points) {
      places.add(place(each));
    }
    return Solved.sag(places);
  }
}
