package spanwright.assess;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.function.Supplier;
import java.util.stream.Stream;
import org.apache.commons.math3.complex.Complex;
import spanwright.moments.AntennaModel;
import spanwright.moments.Ground;
import spanwright.moments.MeshAim;
import spanwright.moments.ModelFault;
import spanwright.moments.Solution;
import spanwright.moments.Solver;

/**
 * Puts a model before the field solver on a plan's frequencies: in groups that share a mesh, one
 * after the other or together on all processors. The figures are the same bits either way.
 */
final class Fields {
  /** Frequencies within this ratio are solved as one group, on one mesh. */
  private static final double SAME_MESH = 1.2;

  private final Ground ground;
  private final Solver solver;
  private final Tally tally = new Tally();

  Fields(Ground ground, Solver solver) {
    this.ground = ground;
    this.solver = solver;
  }

  Tally tally() {
    return tally;
  }

  /** Fills ground tables for a range of wires. */
  void prepare(List<Row> rows, double reach, double low, double high, int threads) {
    solver.tables().prepare(frequencies(rows), ground, reach, low, high, threads);
  }

  private static double[] frequencies(List<Row> rows) {
    return rows.stream().mapToDouble(Row::frequencyMHz).toArray();
  }

  /**
   * One row solved.
   *
   * @param row it is of
   * @param solution of the model there
   * @param far what it sends where it is wanted
   * @param finer impedance on the next finer mesh, or null where that was not asked for
   */
  record Seen(Row row, Solution solution, Radio.Far far, Complex finer) {}

  /** Coarse mesh, and only what a score needs; in the order of the rows. */
  List<Seen> glance(AntennaModel model, GroundPlane plane, List<Row> rows) {
    List<Seen> seen = new ArrayList<>();
    List<Solution> solutions = solve(model, rows, MeshAim.COARSE);
    for (int i = 0; i < rows.size(); i++) {
      Radio.Far far = Radio.glance(rows.get(i), solutions.get(i), plane);
      seen.add(new Seen(rows.get(i), solutions.get(i), far, null));
    }
    return seen;
  }

  /**
   * Full mesh and all that a row shows; in the order of the rows.
   *
   * @param refine whether to solve the bands' middle frequencies on a finer mesh as well
   * @param together whether all processors may work on it
   */
  List<Seen> look(
      AntennaModel model, GroundPlane plane, List<Row> rows, boolean refine, boolean together) {
    List<List<Row>> groups = groups(rows);
    List<Supplier<List<Seen>>> tasks = new ArrayList<>();
    for (List<Row> group : groups) {
      tasks.add(() -> looked(model, plane, group));
    }
    List<Row> middles = refine ? rows.stream().filter(Row::middle).toList() : List.of();
    for (Row middle : middles) {
      tasks.add(() -> finer(model, middle));
    }
    List<List<Seen>> done = all(tasks, together);
    List<Seen> fine =
        done.subList(groups.size(), done.size()).stream().flatMap(List::stream).toList();
    return done.subList(0, groups.size()).stream()
        .flatMap(List::stream)
        .sorted(Comparator.comparingInt(seen -> rows.indexOf(seen.row)))
        .map(seen -> refined(seen, fine))
        .toList();
  }

  /**
   * One row on the finer mesh; none where only that mesh grows too large to solve, for what the
   * full one says is no worse for it.
   */
  private List<Seen> finer(AntennaModel model, Row middle) {
    try {
      Solution finer = solve(model, List.of(middle), MeshAim.FINE).get(0);
      return List.of(new Seen(middle, finer, null, finer.impedance()));
    } catch (ModelFault tooLarge) {
      return List.of();
    }
  }

  private static Seen refined(Seen seen, List<Seen> fine) {
    for (Seen finer : fine) {
      if (finer.row == seen.row) {
        return new Seen(seen.row, seen.solution, seen.far, finer.finer);
      }
    }
    return seen;
  }

  private List<Seen> looked(AntennaModel model, GroundPlane plane, List<Row> group) {
    List<Solution> solutions = solve(model, group, MeshAim.FULL);
    List<Seen> seen = new ArrayList<>();
    for (int i = 0; i < group.size(); i++) {
      Radio.Far far = Radio.look(group.get(i), solutions.get(i), plane);
      seen.add(new Seen(group.get(i), solutions.get(i), far, null));
    }
    return seen;
  }

  private List<Solution> solve(AntennaModel model, List<Row> rows, MeshAim aim) {
    List<Solution> solutions = solver.solve(model, ground, frequencies(rows), aim);
    solutions.forEach(solution -> tally.add(solution.unknowns()));
    return solutions;
  }

  /** From the highest frequency down. */
  private static List<List<Row>> groups(List<Row> rows) {
    List<Row> falling = new ArrayList<>(rows);
    falling.sort(Comparator.comparingDouble(row -> -row.frequencyMHz()));
    List<List<Row>> groups = new ArrayList<>();
    double top = Double.POSITIVE_INFINITY;
    for (Row row : falling) {
      if (row.frequencyMHz() * SAME_MESH < top) {
        top = row.frequencyMHz();
        groups.add(new ArrayList<>());
      }
      groups.get(groups.size() - 1).add(row);
    }
    return groups;
  }

  /** Answers in the order of the tasks; of several faults the first in that order is thrown. */
  private static <T> List<T> all(List<Supplier<T>> tasks, boolean together) {
    if (!together) {
      return tasks.stream().map(Supplier::get).toList();
    }
    record Outcome<T>(T answer, ModelFault fault) {}
    Stream<Outcome<T>> outcomes =
        tasks.parallelStream()
            .map(
                task -> {
                  try {
                    return new Outcome<>(task.get(), null);
                  } catch (ModelFault fault) {
                    return new Outcome<>(null, fault);
                  }
                });
    List<T> answers = new ArrayList<>();
    for (Outcome<T> outcome : outcomes.toList()) {
      if (outcome.fault != null) {
        throw outcome.fault;
      }
      answers.add(outcome.answer);
    }
    return answers;
  }
}
