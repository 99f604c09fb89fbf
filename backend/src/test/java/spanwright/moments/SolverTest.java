package spanwright.moments;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import org.apache.commons.math3.complex.Complex;
import org.junit.jupiter.api.Test;

class SolverTest {
  private static final Ground SOIL = Ground.real(13, 0.005);
  private final Solver solver = new Solver();

  private static Vertex v(double x, double y, double z) {
    return new Vertex(x, y, z);
  }

  private static WireSpec wire(Vertex... points) {
    return WireSpec.of(List.of(points), 0.001, WireSpec.COPPER);
  }

  private static AntennaModel fed(WireSpec... wires) {
    return AntennaModel.of(List.of(wires), 0, 0.5);
  }

  private Solution solve(AntennaModel model) {
    return solver.solve(model, SOIL, 14.1, MeshAim.FULL);
  }

  private void refused(AntennaModel model, String... words) {
    ModelFault fault = assertThrows(ModelFault.class, () -> solve(model));
    for (String word : words) {
      assertTrue(fault.getMessage().contains(word), fault.getMessage());
    }
  }

  private static final WireSpec LEVEL = wire(v(-5, 0, 6), v(5, 0, 6));

  @Test
  void a_hanging_shape_needs_no_more_unknowns_than_a_bent_wire() {
    List<Vertex> points = new ArrayList<>();
    for (int i = 0; i < 60; i++) {
      double t = i / 59.0;
      points.add(v(-10 + 20 * t, 2 * t, 8 - 4 * t * (1 - t)));
    }
    Solution hung = solve(fed(WireSpec.of(points, 0.001, WireSpec.COPPER)));
    Solution straight = solve(fed(wire(v(-10, 0, 8), v(10, 2, 8))));
    assertTrue(hung.unknowns() < 1.5 * straight.unknowns(), hung.unknowns() + " unknowns");
    List<Vertex> half = new ArrayList<>();
    for (int i = 0; i < points.size(); i += 1) {
      half.add(points.get(i));
      if (i + 1 < points.size()) {
        Vertex a = points.get(i);
        Vertex b = points.get(i + 1);
        half.add(v(0.5 * (a.x() + b.x()), 0.5 * (a.y() + b.y()), 0.5 * (a.z() + b.z())));
      }
    }
    Solution finer = solve(fed(WireSpec.of(half, 0.001, WireSpec.COPPER)));
    assertTrue(hung.impedance().subtract(finer.impedance()).abs() < 0.5);
  }

  @Test
  void the_direction_a_wire_is_drawn_in_does_not_matter() {
    List<Vertex> points = List.of(v(-7, 1, 4), v(0, 0, 8), v(8, 2, 5));
    List<Vertex> back = new ArrayList<>(points);
    Collections.reverse(back);
    Complex a =
        solve(AntennaModel.of(List.of(WireSpec.of(points, 0.001, 5.8e7)), 0, 0.4)).impedance();
    Complex b =
        solve(AntennaModel.of(List.of(WireSpec.of(back, 0.001, 5.8e7)), 0, 0.6)).impedance();
    assertTrue(a.subtract(b).abs() < 1e-3 * a.abs());
  }

  @Test
  void a_wire_in_three_parts_is_the_wire_in_one() {
    Complex whole = solve(fed(wire(v(-5, 0, 6), v(-1, 0, 6), v(1, 0, 6), v(5, 0, 6)))).impedance();
    Complex parts =
        solve(
                fed(
                    wire(v(-1, 0, 6), v(1, 0, 6)),
                    wire(v(5, 0, 6), v(1, 0, 6)),
                    wire(v(-5, 0, 6), v(-1, 0, 6.0005))))
            .impedance();
    assertTrue(whole.subtract(parts).abs() < 0.5, whole + " " + parts);
  }

  @Test
  void an_end_on_another_wires_path_is_joined_there() {
    WireSpec top = wire(v(-5, 0, 6), v(5, 0, 6));
    WireSpec drop = wire(v(2, 0, 6), v(2, 0.5, 3));
    WireSpec feed = wire(v(-5, 0, 6), v(-9, 0, 6));
    Complex touching = solve(fed(feed, top, drop)).impedance();
    Complex split =
        solve(fed(feed, wire(v(-5, 0, 6), v(2, 0, 6)), wire(v(2, 0, 6), v(5, 0, 6)), drop))
            .impedance();
    assertTrue(touching.subtract(split).abs() < 1e-6 * split.abs());
  }

  @Test
  void loops_may_be_fed_anywhere_even_where_they_close() {
    List<Vertex> corners = List.of(v(0, 0, 7), v(5, 0, 7), v(5, 5, 7), v(0, 5, 7), v(0, 0, 7));
    List<Vertex> shifted = List.of(v(5, 0, 7), v(5, 5, 7), v(0, 5, 7), v(0, 0, 7), v(5, 0, 7));
    Complex a =
        solve(AntennaModel.of(List.of(WireSpec.of(corners, 0.001, 5.8e7)), 0, 0)).impedance();
    Complex b =
        solve(AntennaModel.of(List.of(WireSpec.of(shifted, 0.001, 5.8e7)), 0, 0.75)).impedance();
    assertTrue(a.subtract(b).abs() < 0.02 * a.abs(), a + " " + b);
  }

  @Test
  void wire_loss_follows_the_metal_and_insulation_lowers_the_reactance_zero() {
    Solution copper = solve(fed(LEVEL));
    Solution steel = solve(fed(new WireSpec(LEVEL.points(), 0.001, 5e6, 100, null)));
    assertTrue(steel.wireLossShare() > 5 * copper.wireLossShare());
    Solution sheathed = solve(fed(LEVEL.withSheath(new Sheath(0.002, 3))));
    assertTrue(sheathed.impedance().getImaginary() > copper.impedance().getImaginary() + 10);
  }

  @Test
  void internal_impedance_tends_to_direct_current_and_to_skin_effect() {
    WireSpec thin = WireSpec.of(LEVEL.points(), 1e-6, 5.8e7);
    double direct = 1 / (Math.PI * 1e-12 * 5.8e7);
    assertEquals(direct, Material.internalImpedance(thin, 0.1).getReal(), 1e-4 * direct);
    WireSpec thick = WireSpec.of(LEVEL.points(), 0.01, 5.8e7);
    double surface =
        Math.sqrt(0.5 * Constants.angularFrequency(28) * Constants.MU0 / 5.8e7)
            / (2 * Math.PI * 0.01);
    Complex z = Material.internalImpedance(thick, 28);
    assertEquals(surface, z.getReal(), 2e-3 * surface);
    assertEquals(surface, z.getImaginary(), 2e-3 * surface);
    // the two ways of working out the ratio meet
    double below = 60.0 / Math.sqrt(2);
    double f =
        below * below * 5.8e7 / (Math.PI * 1e6 * Constants.MU0 * 5.8e7 * 5.8e7 * 0.0025 * 0.0025);
    WireSpec border = WireSpec.of(LEVEL.points(), 0.0025, 5.8e7);
    double low = Material.internalImpedance(border, f * 0.99999).getReal();
    double high = Material.internalImpedance(border, f * 1.00001).getReal();
    assertEquals(low, high, 2e-5 * low);
  }

  @Test
  void refinement_is_reported_when_asked_for() {
    Solution plain = solve(fed(LEVEL));
    assertTrue(plain.refinementChange().isEmpty());
    Solution refined = solver.solveAndRefine(fed(LEVEL), SOIL, 14.1, MeshAim.FULL);
    assertTrue(refined.refinementChange().orElseThrow() < 0.01);
    assertTrue(refined.warnings().isEmpty());
    assertEquals(plain.impedance(), refined.impedance());
    assertTrue(plain.residual() < 1e-10);
  }

  @Test
  void a_thick_wire_fed_beside_a_joint_gets_the_whole_volt() {
    double radius = 0.035;
    WireSpec whole = WireSpec.perfect(List.of(v(-5, 0, 8), v(5, 0, 8)), radius);
    WireSpec left = WireSpec.perfect(List.of(v(-5, 0, 8), v(-2, 0, 8)), radius);
    WireSpec right = WireSpec.perfect(List.of(v(-2, 0, 8), v(5, 0, 8)), radius);
    Complex one = solve(AntennaModel.of(List.of(whole), 0, 0.305)).impedance();
    Complex two = solve(AntennaModel.of(List.of(left, right), 1, 0.05 / 7)).impedance();
    assertEquals(0, SolveCase.reflection(one).subtract(SolveCase.reflection(two)).abs(), 0.01);
  }

  @Test
  void currents_run_along_the_wires_and_vanish_at_open_ends() {
    Solution found = solve(fed(LEVEL));
    List<CurrentSample> samples = found.currents();
    assertEquals(0, samples.get(0).current().abs(), 1e-12);
    assertEquals(0, samples.get(samples.size() - 1).current().abs(), 1e-12);
    // the feed's volt is spread over a part of the gap, the admittance its mean current there: that
    // at the middle is not quite the same
    Complex admittance = found.impedance().reciprocal();
    assertTrue(
        samples.stream()
            .anyMatch(
                s ->
                    Math.abs(s.fraction() - 0.5) < 1e-9
                        && s.current().subtract(admittance).abs() < 5e-3 * admittance.abs()));
  }

  @Test
  void batches_of_directions_agree_with_one_by_one() {
    Solution found = solve(fed(LEVEL));
    Directions ring = Directions.ring(12, 0.35);
    double[] powers = found.powerGains(ring);
    for (int i = 0; i < 12; i++) {
      Gain one = found.gain(2 * Math.PI * i / 12, 0.35);
      assertEquals(one.totalDbi(), Gain.dbi(powers[i]), 1e-9);
      double sum = Math.pow(10, 0.1 * one.horizontalDbi()) + Math.pow(10, 0.1 * one.verticalDbi());
      assertEquals(one.totalDbi(), Gain.dbi(sum), 1e-6);
    }
    assertEquals(Gain.NOTHING_DBI, found.gain(1, -0.2).totalDbi());
    assertEquals(46, Directions.profile(0, 0, 1.5, 46).count());
  }

  @Test
  void doubts_are_said_in_words() {
    assertTrue(solve(fed(LEVEL)).warnings().isEmpty());
    List<String> low = solve(fed(wire(v(-5, 0, 0.2), v(5, 0, 0.2)))).warnings();
    assertTrue(low.get(0).contains("wires[0]") && low.get(0).contains("0.20 m of the ground"));
    List<String> close = solve(fed(LEVEL, wire(v(-2, 0.004, 6), v(2, 0.004, 6)))).warnings();
    assertTrue(close.get(0).contains("wires[0] and wires[1]"), close.toString());
    List<String> stubby =
        solve(fed(LEVEL, WireSpec.of(List.of(v(0, 3, 6), v(0.2, 3, 6)), 0.08, 5e6))).warnings();
    assertTrue(stubby.get(0).contains("short for its radius"), stubby.toString());
  }

  @Test
  void what_cannot_be_solved_is_refused_by_name() {
    refused(new AntennaModel(List.of(), 0, 0.5, 0.1), "no wire");
    refused(fed(LEVEL, wire(v(0, 3, -1), v(0, 5, 4))), "wires[1], point 0", "below the ground");
    refused(fed(LEVEL, wire(v(0, 3, 0), v(0, 5, 4))), "wires[1]", "at the ground", "raise");
    refused(fed(LEVEL, wire(v(0, 3, 4), v(0, 3, 4))), "wires[1]", "no length");
    refused(fed(LEVEL, wire(v(0, 3, 4))), "wires[1] has 1 points");
    refused(
        fed(LEVEL, WireSpec.of(List.of(v(0, 3, 4), v(0, 3.1, 4)), 0.06, 5e6)),
        "wires[1]",
        "longer than thick");
    refused(
        fed(LEVEL, WireSpec.of(List.of(v(0, 3, 4), v(0, 4, 4)), Double.NaN, 5e6)),
        "wires[1]",
        "radius");
    refused(fed(LEVEL, wire(v(0, Double.NaN, 4), v(0, 4, 4))), "wires[1], point 0");
    refused(fed(LEVEL, WireSpec.of(LEVEL.points(), 0.001, -1)), "wires[1]", "conductivity");
    refused(fed(LEVEL.withSheath(new Sheath(0.0005, 2))), "wires[0]", "insulation");
    refused(fed(LEVEL.withSheath(new Sheath(0.002, 0.5))), "wires[0]", "permittivity");
    refused(fed(LEVEL, wire(v(0, -3, 6), v(0, 3, 6))), "wires[0] and wires[1]", "cross");
    refused(fed(LEVEL, LEVEL), "wires[0] and wires[1]", "along each other");
    refused(
        fed(wire(v(0, 0, 6), v(10, 0, 6), v(10, 1, 6), v(5, 1, 6), v(5, -1, 6))),
        "Two parts of wires[0]");
    refused(fed(wire(v(0, 0, 6), v(10, 0, 6), v(1, 0.01, 6))), "Two parts of wires[0]", "angle");
  }

  @Test
  void a_feed_must_be_on_a_wire_and_off_its_ends() {
    refused(AntennaModel.of(List.of(LEVEL), 1, 0.5), "only 1");
    refused(AntennaModel.of(List.of(LEVEL), 0, 1.5), "between 0 and 1");
    refused(AntennaModel.of(List.of(LEVEL), 0, Double.NaN), "between 0 and 1");
    refused(AntennaModel.of(List.of(LEVEL), 0, 0), "wires[0]", "on its end");
    refused(AntennaModel.of(List.of(LEVEL), 0, 1), "wires[0]", "on its end");
    refused(new AntennaModel(List.of(LEVEL), 0, 0.5, 8), "gap");
    refused(
        AntennaModel.of(List.of(LEVEL, wire(v(0, 0, 6), v(0, 4, 6))), 0, 0.5),
        "wires[0]",
        "three wires meet");
  }

  @Test
  void frequencies_and_sizes_have_limits() {
    for (double f : new double[] {0, -3, 0.09, 61, 14.1e6, Double.NaN}) {
      ModelFault fault =
          assertThrows(ModelFault.class, () -> solver.solve(fed(LEVEL), SOIL, f, MeshAim.FULL));
      assertTrue(fault.getMessage().contains("MHz"));
    }
    List<Vertex> many = new ArrayList<>();
    for (int i = 0; i < 100_000; i++) {
      many.add(v(0.01 * i, Math.sin(i), 6));
    }
    refused(fed(WireSpec.of(many, 0.001, 5.8e7)), "points in all");
    refused(fed(wire(v(-50_000, 0, 6), v(50_000, 0, 6))), "wires[0]", "too long");
    assertThrows(ModelFault.class, () -> Ground.real(0.5, 0));
    assertThrows(ModelFault.class, () -> Ground.real(5, Double.NaN));
    Solution found = solve(fed(LEVEL));
    assertThrows(ModelFault.class, () -> found.fields(List.of(v(0, 0, -1)), 100));
    assertThrows(ModelFault.class, () -> found.fields(List.of(v(0, 0, 1)), Double.NaN));
  }

  @Test
  void extremes_within_the_limits_give_numbers() {
    for (double f : new double[] {0.1, 1.8, 60}) {
      for (Ground ground : List.of(Ground.none(), Ground.perfect(), SOIL, Ground.real(81, 5))) {
        Solution found = solver.solve(fed(LEVEL), ground, f, MeshAim.COARSE);
        assertFalse(found.impedance().isNaN());
        assertTrue(found.efficiency() > 0 && found.efficiency() < 1.001, f + " " + ground);
        assertTrue(Double.isFinite(found.peak().dbi()));
        NearField field = found.fields(List.of(v(0, 0, 6), v(5, 0, 6), v(1, 1, 0.01)), 100).get(0);
        assertTrue(Double.isFinite(field.electric() + field.magnetic()));
      }
    }
  }

  @Test
  void fast_sines_are_sines() {
    double[] angle = new double[500];
    double[] sin = new double[500];
    double[] cos = new double[500];
    for (int i = 0; i < 500; i++) {
      angle[i] = (i - 250) * 3.7;
    }
    double[] given = angle.clone();
    SinCos.of(angle, 500, sin, cos);
    for (int i = 0; i < 500; i++) {
      assertEquals(Math.sin(given[i]), sin[i], 3e-13);
      assertEquals(Math.cos(given[i]), cos[i], 3e-13);
    }
  }

  @Test
  void segments_find_their_shortest_distance() {
    java.util.Random random = new java.util.Random(9);
    double[] at = new double[2];
    for (int n = 0; n < 300; n++) {
      Vertex p = v(random.nextGaussian(), random.nextGaussian(), random.nextGaussian());
      Vertex q = v(random.nextGaussian(), random.nextGaussian(), random.nextGaussian());
      Vertex u = unit(random);
      Vertex w = n % 5 == 0 ? u : unit(random);
      double lp = 2 * random.nextDouble();
      double lq = 2 * random.nextDouble();
      double d2 =
          Segments.squared(
              p.x(), p.y(), p.z(), u.x(), u.y(), u.z(), lp, q.x(), q.y(), q.z(), w.x(), w.y(),
              w.z(), lq, at);
      double least = Double.MAX_VALUE;
      for (int i = 0; i <= 60; i++) {
        for (int j = 0; j <= 60; j++) {
          least = Math.min(least, along(p, u, lp * i / 60).distanceTo(along(q, w, lq * j / 60)));
        }
      }
      assertTrue(Math.sqrt(d2) <= least + 1e-12 && Math.sqrt(d2) > least - 0.05);
      assertEquals(Math.sqrt(d2), along(p, u, at[0]).distanceTo(along(q, w, at[1])), 1e-12);
    }
  }

  private static Vertex unit(java.util.Random random) {
    Vertex g = v(random.nextGaussian(), random.nextGaussian(), random.nextGaussian());
    double length = g.distanceTo(v(0, 0, 0));
    return v(g.x() / length, g.y() / length, g.z() / length);
  }

  private static Vertex along(Vertex p, Vertex u, double s) {
    return v(p.x() + s * u.x(), p.y() + s * u.y(), p.z() + s * u.z());
  }

  @Test
  void warming_up_ends() {
    Solver.warmUp();
  }
}
