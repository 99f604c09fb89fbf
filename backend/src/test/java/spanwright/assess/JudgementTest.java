package spanwright.assess;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.apache.commons.math3.complex.Complex;
import org.junit.jupiter.api.Test;
import spanwright.moments.AntennaModel;
import spanwright.moments.Ground;
import spanwright.moments.MeshAim;
import spanwright.moments.Solution;
import spanwright.moments.Solver;
import spanwright.moments.Vertex;
import spanwright.moments.WireSpec;
import spanwright.plan.Plan;

/** When figures are called doubtful. */
class JudgementTest {
  private final Plan plan = Gardens.of("", "", Gardens.ONE_BAND);
  private final List<Row> rows = Rows.of(plan);
  private final Solution solution =
      new Solver()
          .solve(
              AntennaModel.of(
                  List.of(
                      WireSpec.of(
                          List.of(new Vertex(0, 0, 8), new Vertex(10, 0, 8)), 0.001, 5.8e7)),
                  0,
                  0.5),
              Ground.perfect(),
              14.175,
              MeshAim.COARSE);

  /** Judged where the finer mesh moves the reflection coefficient on 400 ohm by so much. */
  private Placement.Quality moved(double by) {
    Complex z = solution.impedance();
    Complex reflection = z.subtract(400).divide(z.add(400)).add(by);
    Complex finer = reflection.add(1).divide(Complex.ONE.subtract(reflection)).multiply(400);
    Fields.Seen seen = new Fields.Seen(rows.get(1), solution, null, finer);
    return Judgement.of(List.of(seen), sentence -> sentence);
  }

  @Test
  void a_finer_mesh_may_move_the_reflection_coefficient_by_a_hundredth() {
    Placement.Quality good = moved(0.0099);
    assertTrue(good.sure());
    assertEquals(0.0099, good.bands().get(0).refinementChange(), 1e-6);
    assertEquals(14.175, good.bands().get(0).frequency());
    assertTrue(Judgement.notes(good).isEmpty());
  }

  @Test
  void more_is_doubtful_and_said_in_words_with_the_band() {
    Placement.Quality doubtful = moved(0.0102);
    assertFalse(doubtful.sure());
    String note = Judgement.notes(doubtful).get(0);
    assertTrue(note.startsWith("The radio figures are not to be relied on. On 20 m"), note);
    assertTrue(note.contains("by 0.0102"), note);
  }

  @Test
  void what_was_not_tried_on_a_finer_mesh_says_so_by_its_absence() {
    Fields.Seen seen = new Fields.Seen(rows.get(1), solution, null, null);
    Placement.Quality quality = Judgement.of(List.of(seen), sentence -> sentence);
    assertNull(quality.bands().get(0).refinementChange());
    assertTrue(quality.sure());
    assertTrue(quality.bands().get(0).residual() < 1e-9);
  }
}
