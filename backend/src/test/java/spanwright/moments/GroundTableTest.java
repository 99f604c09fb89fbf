package spanwright.moments;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotSame;
import static org.junit.jupiter.api.Assertions.assertSame;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;

class GroundTableTest {
  /** From dry sand to the sea, without loss, and nearly a mirror. */
  private static final double[][] SOILS = {
    {2, 1e-5},
    {3, 1e-4},
    {5, 0.001},
    {13, 0.005},
    {20, 0.03},
    {80, 0.001},
    {80, 5},
    {1.5, 0},
    {4, 0},
    {9, 0},
    {80, 0},
    {1e4, 0},
    {1, 0.01},
    {13, 1e4},
    {13, 1e9}
  };

  /** What the tables may be off by, against an image of size one; in proportion from 128 m. */
  private static final double BOUND = 2e-4;

  @Test
  void a_table_finds_what_the_quadrature_finds_over_every_soil_and_frequency() {
    Random random = new Random(11);
    for (double[] soil : SOILS) {
      for (int f = 0; f < 3; f++) {
        compare(soil, 1.8 * Math.pow(30, random.nextDouble()), 80, 0.6, 60, 80, random);
      }
    }
  }

  @Test
  void a_table_holds_close_to_the_ground_and_far_away() {
    Random random = new Random(12);
    for (int i = 0; i < SOILS.length; i += 3) {
      double[] soil = SOILS[i];
      // waves in a lossless ground of 1e4 are too short for cells a thousand metres away
      double far = soil[0] > 100 ? 80 : 2000;
      compare(soil, 1.8 * Math.pow(30, random.nextDouble()), 12, 0.05, 200, far, random);
    }
  }

  private static void compare(
      double[] soil, double mhz, int places, double low, double span, double far, Random random) {
    Ground ground = Ground.real(soil[0], soil[1]);
    GroundTable table = new GroundTable(ground, mhz);
    HalfSpaceKernels kernels = HalfSpaceKernels.of(ground, mhz);
    double k = Constants.waveNumber(mhz);
    double[] eight = new double[Reflection.RATIOS];
    double[] all = new double[3 * Reflection.ALL];
    for (int i = 0; i < places; i++) {
      double rho = far * Math.pow(random.nextDouble(), 2);
      double zeta = low * Math.pow(span, random.nextDouble());
      ratios(table, rho, zeta, eight);
      table.ratiosAndSlopes(rho, zeta, all);
      double[] exact = kernels.at(rho, zeta);
      double r = Math.sqrt(rho * rho + zeta * zeta);
      for (int m = 0; m < HalfSpaceKernels.KERNELS; m++) {
        double re = exact[2 * m] * r;
        double im = exact[2 * m + 1] * r;
        double ratioR = re * Math.cos(k * r) - im * Math.sin(k * r);
        double ratioI = re * Math.sin(k * r) + im * Math.cos(k * r);
        double off = Math.hypot(all[2 * m] - ratioR, all[2 * m + 1] - ratioI);
        if (m < 4) {
          off = Math.max(off, Math.hypot(eight[2 * m] - ratioR, eight[2 * m + 1] - ratioI));
        }
        String where =
            "kernel " + m + " over " + soil[0] + ", " + soil[1] + " at " + mhz + " MHz, " + rho
                + " m, " + zeta + " m: " + off;
        assertTrue(off < BOUND * Math.max(1, rho / 128), where);
      }
    }
  }

  @Test
  void many_places_at_once_are_the_same_as_one_by_one() {
    GroundTable table = new GroundTable(Ground.real(13, 0.005), 14);
    Random random = new Random(4);
    for (Reflection reflection : List.of(table, Reflection.MIRROR, Reflection.NOTHING)) {
      int count = 300;
      double[] rhos = random.doubles(count, 0, 60).toArray();
      double[] zetas = random.doubles(count, 0.6, 40).toArray();
      double[][] out = new double[Reflection.RATIOS][count];
      reflection.ratios(rhos, zetas, count, out);
      double[] one = new double[Reflection.RATIOS];
      for (int i = 0; i < count; i++) {
        ratios(reflection, rhos[i], zetas[i], one);
        for (int m = 0; m < Reflection.RATIOS; m++) {
          assertEquals(one[m], out[m][i], 0);
        }
      }
    }
  }

  @Test
  void a_tables_slopes_are_those_of_its_values() {
    GroundTable table = new GroundTable(Ground.real(13, 0.005), 14);
    double[] at = new double[3 * Reflection.ALL];
    double[] up = new double[3 * Reflection.ALL];
    double step = 1e-5;
    table.ratiosAndSlopes(3.3, 5.1, at);
    table.ratiosAndSlopes(3.3 + step, 5.1, up);
    for (int m = 0; m < Reflection.ALL; m++) {
      assertEquals((up[m] - at[m]) / step, at[Reflection.ALL + m], 1e-5);
    }
    table.ratiosAndSlopes(3.3, 5.1 + step, up);
    for (int m = 0; m < Reflection.ALL; m++) {
      assertEquals((up[m] - at[m]) / step, at[2 * Reflection.ALL + m], 1e-5);
    }
  }

  @Test
  void the_same_bits_come_whoever_fills_a_table_and_in_whatever_order() throws Exception {
    Ground ground = Ground.real(5, 0.001);
    Random random = new Random(9);
    int count = 400;
    double[] rhos = random.doubles(count, 0, 50).toArray();
    double[] zetas = random.doubles(count, 1, 30).toArray();
    double[][] alone = new double[count][3 * Reflection.ALL + Reflection.RATIOS];
    GroundTable table = new GroundTable(ground, 21.2);
    for (int i = 0; i < count; i++) {
      look(table, rhos[i], zetas[i], alone[i]);
    }
    GroundTables shared = new GroundTables();
    List<Thread> threads = new ArrayList<>();
    double[][][] found = new double[4][count][3 * Reflection.ALL + Reflection.RATIOS];
    for (int t = 0; t < found.length; t++) {
      List<Integer> order = new ArrayList<>();
      for (int i = 0; i < count; i++) {
        order.add(i);
      }
      Collections.shuffle(order, new Random(t));
      double[][] mine = found[t];
      threads.add(
          new Thread(
              () -> {
                Reflection reflection = shared.reflection(ground, 21.2);
                order.forEach(i -> look(reflection, rhos[i], zetas[i], mine[i]));
              }));
    }
    threads.forEach(Thread::start);
    shared.prepare(new double[] {21.2}, ground, 50, 0.5, 15, 2);
    for (Thread thread : threads) {
      thread.join();
    }
    for (double[][] one : found) {
      for (int i = 0; i < count; i++) {
        assertArrayEquals(alone[i], one[i], 0);
      }
    }
  }

  /** One place on its own. */
  private static void ratios(Reflection reflection, double rho, double zeta, double[] out) {
    double[][] rows = new double[Reflection.RATIOS][1];
    reflection.ratios(new double[] {rho}, new double[] {zeta}, 1, rows);
    for (int m = 0; m < rows.length; m++) {
      out[m] = rows[m][0];
    }
  }

  private static void look(Reflection reflection, double rho, double zeta, double[] out) {
    double[] eight = new double[Reflection.RATIOS];
    ratios(reflection, rho, zeta, eight);
    reflection.ratiosAndSlopes(rho, zeta, out);
    System.arraycopy(eight, 0, out, 3 * Reflection.ALL, eight.length);
  }

  @Test
  void the_bands_of_a_large_plot_stay_small() {
    GroundTables tables = new GroundTables();
    double[] frequencies = {1.85, 3.7, 7.1, 10.1, 14.2, 18.1, 21.2, 24.9, 28.5, 50.2};
    tables.prepare(frequencies, Ground.real(9, 0), 100, 0.5, 15, 2);
    assertTrue(tables.bytes() < 10L << 20, "bytes " + tables.bytes());
  }

  @Test
  void tables_stay_within_their_memory_and_the_one_in_use_is_kept() {
    long limit = 600_000;
    GroundTables tables = new GroundTables(limit);
    Ground ground = Ground.real(13, 0.005);
    Reflection kept = tables.reflection(ground, 3);
    Reflection left = tables.reflection(ground, 2);
    for (int i = 1; i < 12; i++) {
      assertSame(kept, tables.reflection(ground, 3));
      tables.prepare(new double[] {3 + i}, ground, 40, 3, 12, 2);
      assertTrue(tables.bytes() <= limit, "bytes " + tables.bytes());
    }
    assertNotSame(left, tables.reflection(ground, 2));
    // one that was let go still answers
    double[] out = new double[Reflection.RATIOS];
    ratios(left, 5, 9, out);
    double[] again = new double[Reflection.RATIOS];
    ratios(tables.reflection(ground, 2), 5, 9, again);
    assertArrayEquals(again, out, 0);
  }

  @Test
  void what_is_out_of_reach_is_refused_in_words() {
    GroundTables tables = new GroundTables();
    Ground ground = Ground.real(13, 0.005);
    Reflection table = tables.reflection(ground, 14);
    double[] out = new double[3 * Reflection.ALL];
    double[][] places = {
      {10_001, 5}, {1e9, 5}, {1e300, 1e-4}, {Double.NaN, 5}, {-1, 5}, {Double.POSITIVE_INFINITY, 5}
    };
    for (double[] p : places) {
      String said =
          assertThrows(ModelFault.class, () -> ratios(table, p[0], p[1], out)).getMessage();
      assertTrue(said.contains("10 km"), said);
      assertThrows(ModelFault.class, () -> table.ratiosAndSlopes(p[0], p[1], out));
    }
    for (double zeta : new double[] {0, -3, 1e-6, 1e5, 4e4, 1e300, Double.NaN}) {
      String said = assertThrows(ModelFault.class, () -> ratios(table, 4, zeta, out)).getMessage();
      assertTrue(said.contains("above the ground"), said);
    }
    double[] one = {3};
    assertThrows(ModelFault.class, () -> tables.prepare(one, ground, 40, 0, 12, 2));
    assertThrows(ModelFault.class, () -> tables.prepare(one, ground, 20_000, 1, 12, 2));
  }
}
