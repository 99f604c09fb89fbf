package spanwright.moments;

import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;

/**
 * The aims of the meshes, on gardens that had no part in choosing them: every kind of antenna with
 * seeds of its own, against a mesh several times as fine.
 */
class MeshAimsTest {
  private static final MeshRule FINEST =
      new MeshRule(0.7, 0.012, 0.008, 0.015, 0.6, 0.5, 0.5, 0.4, 1.0 / 10000);
  private static final Ground[] GROUNDS = {
    Ground.real(3, 0.0001),
    Ground.real(13, 0.005),
    Ground.real(20, 0.03),
    Ground.real(80, 5),
    Ground.perfect(),
    Ground.none()
  };
  private static final int KINDS = 8;
  private static final int OF_EACH = 5;

  /** Gains count down to so far under the peak. */
  private static final double DEPTH_DB = 20;

  private final Solver solver = new Solver();

  @Test
  void meshes_keep_their_aims_on_gardens_they_were_not_chosen_by() {
    Directions directions = directions();
    List<Double> full = new ArrayList<>();
    List<Double> coarse = new ArrayList<>();
    for (int i = 0; i < KINDS * OF_EACH; i++) {
      Random random = new Random(90_000 + i);
      Ground ground = GROUNDS[random.nextInt(GROUNDS.length)];
      double f = 1.85 * Math.pow(28.0, random.nextDouble());
      AntennaModel model = model(i % KINDS, random);
      Solution best =
          new PreparedModel(model, ground, f, FINEST)
              .solve(f, solver.tables().reflection(ground, f));
      String what = "kind " + i % KINDS + ", number " + i + ", " + f + " MHz, " + ground;
      full.add(held(best, solver.solve(model, ground, f, MeshAim.FULL), directions, 0.01, what));
      coarse.add(
          held(best, solver.solve(model, ground, f, MeshAim.COARSE), directions, 0.05, what));
    }
    assertTrue(share(full, 0.05) >= 0.97, "full: " + full);
    assertTrue(share(coarse, 0.3) >= 0.97, "coarse: " + coarse);
  }

  /** Holds the reflection coefficient; the greatest difference of a gain [dB]. */
  private static double held(
      Solution best, Solution found, Directions directions, double allowed, String what) {
    double change =
        SolveCase.reflection(best.impedance())
            .subtract(SolveCase.reflection(found.impedance()))
            .abs();
    assertTrue(change <= allowed, () -> what + ": " + change + " over " + allowed);
    double[] one = best.powerGains(directions);
    double[] other = found.powerGains(directions);
    double floor = Arrays.stream(one).max().orElseThrow() * Math.pow(10, -DEPTH_DB / 10);
    double most = 0;
    for (int i = 0; i < one.length; i++) {
      if (one[i] > floor) {
        most = Math.max(most, Math.abs(10 * Math.log10(other[i] / one[i])));
      }
    }
    return most;
  }

  private static double share(List<Double> all, double within) {
    return (double) all.stream().filter(d -> d <= within).count() / all.size();
  }

  private static Directions directions() {
    double[] azimuths = new double[108];
    double[] elevations = new double[108];
    for (int i = 0; i < azimuths.length; i++) {
      azimuths[i] = 2 * Math.PI * (i % 12) / 12;
      elevations[i] = Math.toRadians(5 + 10 * (i / 12));
    }
    return Directions.of(azimuths, elevations);
  }

  private static AntennaModel model(int kind, Random r) {
    double half = between(r, 4, 14);
    double z = between(r, 3, 11);
    double radius = between(r, 0.0006, 0.0015);
    Vertex left = new Vertex(-half, between(r, -2, 2), between(r, 2.5, z));
    Vertex middle = new Vertex(0, 0, z);
    Vertex right = new Vertex(half * between(r, 0.6, 1), between(r, -2, 2), between(r, 2.5, z));
    return switch (kind) {
      case 0 -> fed(between(r, 0.3, 0.5), wire(radius, left, right));
      case 1 -> fed(between(r, 0.35, 0.6), wire(radius, left, middle, right));
      case 2 -> {
        Vertex turned = new Vertex(right.x(), between(r, 4, 9), right.z());
        yield fed(between(r, 0.3, 0.6), wire(radius, left, middle, right, turned));
      }
      case 3 -> {
        Vertex corner = new Vertex(half, 2 * half, z);
        Vertex far = new Vertex(-half, 1.6 * half, right.z());
        yield fed(between(r, 0.05, 0.9), wire(radius, left, right, corner, far, left));
      }
      case 4 -> {
        Vertex foot = new Vertex(left.x(), left.y(), 0.5);
        yield fed(between(r, 0.02, 0.15), wire(radius, foot, left, right));
      }
      case 5 -> {
        Vertex out = new Vertex(between(r, -3, 3), between(r, 3, 8), between(r, 2, z));
        yield fed(0.4, wire(radius, left, middle, right), wire(radius, middle, out));
      }
      case 6 -> {
        double beside = between(r, 0.4, 2);
        WireSpec gutter =
            WireSpec.of(
                List.of(new Vertex(-5, 4 + beside, 4.8), new Vertex(6, 4 + beside, 5)), 0.05, 5e6);
        yield fed(0.5, wire(radius, left, middle, right), gutter);
      }
      default -> fed(between(r, 0.4, 0.6), hanging(radius, left, right, between(r, 0.3, 1.5)));
    };
  }

  private static WireSpec hanging(double radius, Vertex a, Vertex b, double sag) {
    List<Vertex> points = new ArrayList<>();
    int n = 80;
    for (int i = 0; i <= n; i++) {
      double t = (double) i / n;
      points.add(
          new Vertex(
              a.x() + t * (b.x() - a.x()),
              a.y() + t * (b.y() - a.y()),
              a.z() + t * (b.z() - a.z()) - 4 * sag * t * (1 - t)));
    }
    return WireSpec.of(points, radius, WireSpec.COPPER);
  }

  private static WireSpec wire(double radius, Vertex... points) {
    return WireSpec.of(List.of(points), radius, WireSpec.COPPER);
  }

  private static AntennaModel fed(double fraction, WireSpec... wires) {
    return AntennaModel.of(List.of(wires), 0, fraction);
  }

  private static double between(Random random, double least, double most) {
    return least + random.nextDouble() * (most - least);
  }
}
