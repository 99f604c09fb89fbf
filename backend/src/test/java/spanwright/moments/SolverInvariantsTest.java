package spanwright.moments;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import java.util.concurrent.Callable;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import java.util.function.UnaryOperator;
import org.apache.commons.math3.complex.Complex;
import org.ejml.data.ZMatrixRMaj;
import org.ejml.dense.row.CommonOps_ZDRM;
import org.junit.jupiter.api.Test;

/** What must hold whatever the numbers are. */
class SolverInvariantsTest {
  private static final Ground SOIL = Ground.real(13, 0.005);
  private final Solver solver = new Solver();

  static Vertex v(double x, double y, double z) {
    return new Vertex(x, y, z);
  }

  /** An awkward antenna: sloping, bent, beside a gutter, with a branch. */
  static AntennaModel awkward(UnaryOperator<Vertex> move, double conductivity) {
    List<List<Vertex>> lines =
        List.of(
            List.of(v(-7, 1, 4), v(0, 0, 8), v(8, 2, 5)),
            List.of(v(-2, -3, 3.5), v(6, -2.5, 3.5)),
            List.of(v(8, 2, 5), v(9, 3, 4)),
            List.of(v(8, 2, 5), v(9.5, 0.5, 4.5)));
    double[] radius = {0.001, 0.04, 0.001, 0.0015};
    List<WireSpec> wires = new ArrayList<>();
    for (int i = 0; i < radius.length; i++) {
      wires.add(WireSpec.of(lines.get(i).stream().map(move).toList(), radius[i], conductivity));
    }
    return AntennaModel.of(wires, 0, 0.37);
  }

  @Test
  void turning_and_moving_the_whole_over_the_ground_changes_nothing() {
    double turn = 0.7;
    Solution plain = solver.solve(awkward(p -> p, 5.8e7), SOIL, 14.2, MeshAim.FULL);
    Solution moved =
        solver.solve(
            awkward(
                p ->
                    v(
                        120 + p.x() * Math.cos(turn) + p.y() * Math.sin(turn),
                        -45 - p.x() * Math.sin(turn) + p.y() * Math.cos(turn),
                        p.z()),
                5.8e7),
            SOIL,
            14.2,
            MeshAim.FULL);
    assertEquals(0, plain.impedance().subtract(moved.impedance()).abs(), 1e-6);
    for (double azimuth = 0; azimuth < 6; azimuth += 0.7) {
      assertEquals(
          plain.gain(azimuth, 0.4).totalDbi(), moved.gain(azimuth + turn, 0.4).totalDbi(), 1e-6);
    }
  }

  @Test
  void a_mirror_image_has_the_mirrored_pattern() {
    Solution plain = solver.solve(awkward(p -> p, 5.8e7), SOIL, 7.1, MeshAim.FULL);
    Solution mirrored =
        solver.solve(awkward(p -> v(-p.x(), p.y(), p.z()), 5.8e7), SOIL, 7.1, MeshAim.FULL);
    assertEquals(0, plain.impedance().subtract(mirrored.impedance()).abs(), 1e-6);
    assertEquals(plain.gain(1.1, 0.5).totalDbi(), mirrored.gain(-1.1, 0.5).totalDbi(), 1e-6);
  }

  @Test
  void lengths_and_wavelength_scaled_together_change_nothing() {
    AntennaModel small = awkward(p -> p, Double.POSITIVE_INFINITY);
    List<WireSpec> wires = new ArrayList<>();
    for (WireSpec wire : small.wires()) {
      wires.add(
          WireSpec.perfect(
              wire.points().stream().map(p -> v(4 * p.x(), 4 * p.y(), 4 * p.z())).toList(),
              4 * wire.radius()));
    }
    AntennaModel large = new AntennaModel(wires, 0, 0.37, 4 * AntennaModel.USUAL_GAP);
    Complex a = solver.solve(small, Ground.real(13, 0.008), 28, MeshAim.FULL).impedance();
    Complex b = solver.solve(large, Ground.real(13, 0.002), 7, MeshAim.FULL).impedance();
    assertEquals(0, a.subtract(b).abs() / a.abs(), 1e-5);
  }

  @Test
  void two_ports_answer_each_other_alike() {
    Random random = new Random(3);
    for (int i = 0; i < 8; i++) {
      double f = 3.6 + 20 * random.nextDouble();
      AntennaModel first = awkward(p -> p, 5.8e7);
      double there = 0.2 + 0.6 * random.nextDouble();
      AntennaModel second = AntennaModel.of(first.wires(), 1, there);
      // both meshes must be the same for the matrices to be: force it through one mesh
      Mesh mesh = mesh(first, f);
      double forth = transfer(mesh, first, second, f);
      double back = transfer(mesh, second, first, f);
      assertEquals(1, forth / back, 1e-7);
    }
  }

  private static Mesh mesh(AntennaModel model, double f) {
    return Mesh.of(
        model, Outline.of(model, 0.01), MeshRule.of(MeshAim.FULL), Constants.waveNumber(f));
  }

  /** Size of the current at the second port for a volt at the first. */
  private double transfer(Mesh mesh, AntennaModel at, AntennaModel to, double f) {
    SymmetricSystem system =
        new MatrixFill(
                mesh,
                new StaticPairs(mesh),
                new SourcePoints(mesh),
                solver.tables().reflection(SOIL, f),
                Constants.waveNumber(f))
            .fields();
    system.solve(mesh.excite(at));
    double[] test = mesh.excite(to);
    double re = 0;
    double im = 0;
    for (int i = 0; i < test.length; i++) {
      re += test[i] * system.answerRe[i];
      im += test[i] * system.answerIm[i];
    }
    return Math.hypot(re, im);
  }

  @Test
  void power_balances_in_free_space_and_over_a_perfect_ground() {
    for (Ground ground : List.of(Ground.none(), Ground.perfect())) {
      for (double f : new double[] {1.85, 3.65, 7.1, 14.2, 21.2, 28.5, 50.2}) {
        Solution found = solver.solve(awkward(p -> p, 1e6), ground, f, MeshAim.FULL);
        assertEquals(1, found.powerBalance().orElseThrow(), 0.001, "at " + f + " MHz");
        assertTrue(found.wireLossShare() > 0.001 && found.efficiency() < 1);
        assertEquals(
            found.powerBalance().orElseThrow(), found.efficiency() + found.wireLossShare(), 1e-12);
      }
    }
    assertTrue(solver.solve(awkward(p -> p, 1e6), SOIL, 7, MeshAim.FULL).powerBalance().isEmpty());
  }

  @Test
  void power_flowing_out_of_a_box_over_soil_is_the_input_less_the_wires_loss() {
    Solution found = solver.solve(awkward(p -> p, 5.8e7), SOIL, 14.2, MeshAim.FULL);
    double[] low = {-13, -9, 0.4};
    double[] high = {15, 9, 13};
    GaussRule rule = GaussRule.of(14);
    double flow = 0;
    for (int axis = 0; axis < 3; axis++) {
      int u = (axis + 1) % 3;
      int w = (axis + 2) % 3;
      for (int side = 0; side < 2; side++) {
        List<Vertex> points = new ArrayList<>();
        List<Double> weights = new ArrayList<>();
        for (int cell = 0; cell < 4; cell++) {
          for (int i = 0; i < 14; i++) {
            for (int j = 0; j < 14; j++) {
              double[] p = new double[3];
              p[axis] = side == 0 ? low[axis] : high[axis];
              double du = 0.5 * (high[u] - low[u]);
              double dw = 0.5 * (high[w] - low[w]);
              p[u] = low[u] + du * (cell / 2 + rule.nodes[i]);
              p[w] = low[w] + dw * (cell % 2 + rule.nodes[j]);
              points.add(v(p[0], p[1], p[2]));
              weights.add(rule.weights[i] * rule.weights[j] * du * dw * (side == 0 ? -1 : 1));
            }
          }
        }
        List<NearField> fields = found.fields(points, 1);
        for (int i = 0; i < fields.size(); i++) {
          flow += weights.get(i) * poynting(fields.get(i), axis);
        }
      }
    }
    assertEquals(1 - found.wireLossShare(), flow, 2e-4);
  }

  private static double poynting(NearField f, int axis) {
    Complex[] e = {f.electricX(), f.electricY(), f.electricZ()};
    Complex[] h = {f.magneticX(), f.magneticY(), f.magneticZ()};
    int u = (axis + 1) % 3;
    int w = (axis + 2) % 3;
    return e[u].multiply(h[w].conjugate()).subtract(e[w].multiply(h[u].conjugate())).getReal();
  }

  @Test
  void soil_that_conducts_without_limit_is_the_perfect_ground() {
    Complex soil =
        solver.solve(awkward(p -> p, 5.8e7), Ground.real(1, 1e9), 14.2, MeshAim.FULL).impedance();
    Complex mirror =
        solver.solve(awkward(p -> p, 5.8e7), Ground.perfect(), 14.2, MeshAim.FULL).impedance();
    assertEquals(0, soil.subtract(mirror).abs(), 0.01);
  }

  @Test
  void soil_of_air_is_free_space() {
    Complex air =
        solver.solve(awkward(p -> p, 5.8e7), Ground.real(1, 0), 14.2, MeshAim.FULL).impedance();
    Complex none =
        solver.solve(awkward(p -> p, 5.8e7), Ground.none(), 14.2, MeshAim.FULL).impedance();
    assertEquals(0, air.subtract(none).abs(), 1e-5);
  }

  @Test
  void the_near_field_far_away_is_the_far_field() {
    Solution found = solver.solve(awkward(p -> p, 5.8e7), Ground.none(), 14.2, MeshAim.FULL);
    double distance = 2000;
    double azimuth = 0.9;
    double elevation = 0.5;
    Vertex p =
        v(
            distance * Math.sin(azimuth) * Math.cos(elevation),
            distance * Math.cos(azimuth) * Math.cos(elevation),
            distance * Math.sin(elevation));
    NearField field = found.fields(List.of(p), 100).get(0);
    double gain = Math.pow(10, 0.1 * found.gain(azimuth, elevation).totalDbi());
    double expected = Math.sqrt(Constants.ETA0 * 100 * gain / (4 * Math.PI)) / distance;
    assertEquals(expected, field.electric(), 0.01 * expected);
    assertEquals(expected / Constants.ETA0, field.magnetic(), 0.01 * expected / Constants.ETA0);
  }

  @Test
  void the_same_bits_come_from_any_thread_and_from_any_batch() throws Exception {
    double[] frequencies = {14.0, 7.05, 14.35, 14.175, 7.2};
    List<Solution> alone =
        new Solver().solve(awkward(p -> p, 5.8e7), SOIL, frequencies, MeshAim.FULL);
    Solver shared = new Solver();
    ExecutorService pool = Executors.newFixedThreadPool(4);
    try {
      List<Callable<List<Solution>>> tasks = new ArrayList<>();
      for (int i = 0; i < 8; i++) {
        tasks.add(() -> shared.solve(awkward(p -> p, 5.8e7), SOIL, frequencies, MeshAim.FULL));
      }
      for (Future<List<Solution>> future : pool.invokeAll(tasks)) {
        for (int i = 0; i < frequencies.length; i++) {
          Solution found = future.get().get(i);
          assertEquals(frequencies[i], found.frequencyMHz());
          assertEquals(alone.get(i).impedance(), found.impedance());
          assertEquals(alone.get(i).gain(1, 0.3), found.gain(1, 0.3));
          assertEquals(alone.get(i).peak(), found.peak());
        }
      }
    } finally {
      pool.shutdownNow();
    }
  }

  @Test
  void frequencies_solved_together_agree_with_each_alone() {
    double[] frequencies = {7.0, 7.1, 7.2};
    List<Solution> together = solver.solve(awkward(p -> p, 5.8e7), SOIL, frequencies, MeshAim.FULL);
    for (int i = 0; i < frequencies.length; i++) {
      Complex one =
          solver.solve(awkward(p -> p, 5.8e7), SOIL, frequencies[i], MeshAim.FULL).impedance();
      assertEquals(
          0,
          SolveCase.reflection(one)
              .subtract(SolveCase.reflection(together.get(i).impedance()))
              .abs(),
          0.002);
    }
  }

  @Test
  void the_linear_solution_agrees_with_another_librarys() {
    Random random = new Random(5);
    for (int n : new int[] {1, 2, 7, 30, 61}) {
      SymmetricSystem system = new SymmetricSystem(n);
      ZMatrixRMaj matrix = new ZMatrixRMaj(n, n);
      ZMatrixRMaj right = new ZMatrixRMaj(n, 1);
      double[] b = new double[n];
      for (int i = 0; i < n; i++) {
        b[i] = random.nextGaussian();
        right.set(i, 0, b[i], 0);
        for (int j = 0; j <= i; j++) {
          system.set(i, j, random.nextGaussian(), random.nextGaussian());
          matrix.set(i, j, system.re(i, j), system.im(i, j));
          matrix.set(j, i, system.re(i, j), system.im(i, j));
        }
      }
      ZMatrixRMaj x = new ZMatrixRMaj(n, 1);
      assertTrue(CommonOps_ZDRM.solve(matrix, right, x));
      system.solve(b);
      for (int i = 0; i < n; i++) {
        assertEquals(x.getReal(i, 0), system.answerRe[i], 1e-7);
        assertEquals(x.getImag(i, 0), system.answerIm[i], 1e-7);
      }
      PivotedLu.solve(system, b);
      for (int i = 0; i < n; i++) {
        assertEquals(x.getReal(i, 0), system.answerRe[i], 1e-9);
      }
    }
  }

  @Test
  void a_system_that_needs_pivots_gets_them() {
    SymmetricSystem system = new SymmetricSystem(2);
    system.set(1, 0, 1, 0);
    system.solve(new double[] {2, 3});
    assertTrue(system.pivoted);
    assertEquals(3, system.answerRe[0], 1e-15);
    assertEquals(2, system.answerRe[1], 1e-15);
    assertEquals(0, system.residual, 1e-15);
  }

  @Test
  void a_long_loop_of_two_close_wires_is_a_transmission_line() {
    double spacing = 0.1;
    double radius = 0.001;
    double length = 10;
    double z0 = Constants.ETA0 / Math.PI * acosh(0.5 * spacing / radius);
    List<Vertex> points =
        List.of(v(0, 0, 0), v(0, spacing, 0), v(length, spacing, 0), v(length, 0, 0), v(0, 0, 0));
    AntennaModel model =
        new AntennaModel(
            List.of(WireSpec.perfect(points, radius)),
            0,
            0.5 * spacing / (2 * (length + spacing)),
            0.02);
    // the two ends add a fixed piece of line, some part of the spacing: found at one frequency
    double first = solver.solve(model, Ground.none(), 2, MeshAim.FULL).impedance().getImaginary();
    double added = Math.atan(first / z0) / Constants.waveNumber(2) - length;
    assertTrue(added > 0 && added < spacing, "added " + added);
    for (double f : new double[] {4, 5.5, 10, 12}) {
      double x = solver.solve(model, Ground.none(), f, MeshAim.FULL).impedance().getImaginary();
      double expected = z0 * Math.tan(Constants.waveNumber(f) * (length + added));
      assertEquals(expected, x, 0.015 * Math.abs(expected), "at " + f + " MHz");
    }
  }

  private static double acosh(double x) {
    return Math.log(x + Math.sqrt(x * x - 1));
  }

  @Test
  void meshes_come_as_near_as_they_aim() {
    MeshRule finest = new MeshRule(0.6, 0.0, 0.01, 0.02, 0.5, 0.4, 0.4, 0.5, 1.0 / 20000);
    Directions directions = Directions.profile(0.7, 0.05, 1.5, 12);
    for (double f : new double[] {3.65, 7.1, 14.2, 21.2, 28.5}) {
      AntennaModel model = awkward(p -> p, 5.8e7);
      Solution best =
          new PreparedModel(model, SOIL, f, finest).solve(f, solver.tables().reflection(SOIL, f));
      compare(best, solver.solve(model, SOIL, f, MeshAim.FULL), directions, 0.01, 0.05);
      compare(best, solver.solve(model, SOIL, f, MeshAim.COARSE), directions, 0.05, 0.3);
    }
  }

  @Test
  void thick_fed_wires_stand_still_on_finer_meshes() {
    for (double radius : new double[] {0.005, 0.01, 0.03}) {
      AntennaModel model =
          AntennaModel.of(
              List.of(WireSpec.perfect(List.of(v(-5.1, 0, 9), v(5.1, 0, 9)), radius)), 0, 0.5);
      Solution found = solver.solveAndRefine(model, SOIL, 28.5, MeshAim.FULL);
      assertTrue(found.refinementChange().orElseThrow() < 0.012, "radius " + radius);
      assertTrue(found.trusted());
      assertTrue(found.warnings().get(0).contains("form of the feed"), found.warnings().toString());
    }
  }

  @Test
  void hanging_wires_side_by_side_keep_their_spacing() {
    List<WireSpec> wires = new ArrayList<>();
    for (int w = 0; w < 2; w++) {
      List<Vertex> points = new ArrayList<>();
      int n = 40 + 17 * w;
      for (int i = 0; i <= n; i++) {
        double t = (double) i / n;
        points.add(v(-20 + 40 * t, 0.05 * w, 9 - 6 * t * (1 - t)));
      }
      wires.add(WireSpec.of(points, 0.001, 5.8e7));
    }
    AntennaModel model = AntennaModel.of(wires, 0, 0.5);
    Outline coarse = Outline.of(model, 0.2);
    Outline fine = Outline.of(model, 0.001);
    assertTrue(coarse.pieces.size() < fine.pieces.size());
    Complex a = solver.solve(model, SOIL, 1.85, MeshAim.COARSE).impedance();
    Complex b = solver.solve(model, SOIL, 1.85, MeshAim.FINE).impedance();
    assertEquals(0, SolveCase.reflection(a).subtract(SolveCase.reflection(b)).abs(), 0.02);
  }

  @Test
  void the_shares_of_power_add_up_and_what_fails_is_not_trusted() {
    Solution soil = solver.solve(awkward(p -> p, 5.8e7), SOIL, 7.1, MeshAim.FULL);
    assertEquals(1, soil.efficiency() + soil.wireLossShare() + soil.groundLossShare(), 1e-12);
    assertTrue(soil.groundLossShare() > 0.1 && soil.trusted());
    Solution free = solver.solve(awkward(p -> p, 5.8e7), Ground.none(), 7.1, MeshAim.FULL);
    assertEquals(0, free.groundLossShare());
    AntennaModel stub =
        AntennaModel.of(List.of(WireSpec.perfect(List.of(v(0, 0, 5), v(1, 0, 5)), 0.001)), 0, 0.5);
    Solution lost = solver.solve(stub, SOIL, 1.8, MeshAim.FULL);
    assertFalse(lost.trusted());
    assertTrue(lost.warnings().containsAll(lost.failings()));
    assertFalse(soil.refined(0.2, 0.01).trusted());
    assertTrue(soil.refined(0.02, 0.01).trusted());
    assertFalse(Doubts.ofPower(1.02, true).isEmpty());
    assertTrue(Doubts.ofPower(0.6, true).isEmpty());
    assertFalse(Doubts.ofPower(0.98, false).isEmpty());
  }

  private static void compare(
      Solution best, Solution found, Directions directions, double coefficient, double decibels) {
    assertEquals(
        0,
        SolveCase.reflection(best.impedance())
            .subtract(SolveCase.reflection(found.impedance()))
            .abs(),
        coefficient);
    for (int i = 0; i < directions.count(); i++) {
      assertEquals(
          best.gains(directions).get(i).totalDbi(),
          found.gains(directions).get(i).totalDbi(),
          decibels);
    }
  }

  @Test
  void the_peak_is_not_below_any_sampled_gain() {
    for (Ground ground : List.of(SOIL, Ground.none())) {
      for (double f : new double[] {3.65, 14.2, 28.5, 50.2}) {
        Solution found = solver.solve(awkward(p -> p, 5.8e7), ground, f, MeshAim.COARSE);
        double low = ground.kind() == Ground.Kind.NONE ? -0.5 * Math.PI : 0;
        double most = 0;
        for (int i = 0; i < 180; i++) {
          for (double gain :
              found.powerGains(Directions.profile(i * Math.PI / 90, low, 0.5 * Math.PI, 120))) {
            most = Math.max(most, gain);
          }
        }
        Peak peak = found.peak();
        assertTrue(peak.dbi() > Gain.dbi(most) - 0.005, "at " + f + " MHz");
        assertEquals(peak.dbi(), found.gain(peak.azimuth(), peak.elevation()).totalDbi(), 1e-6);
      }
    }
  }
}
