package spanwright.moments;

import java.util.concurrent.TimeUnit;
import org.apache.commons.math3.complex.Complex;
import org.apache.commons.math3.complex.ComplexField;
import org.apache.commons.math3.linear.Array2DRowFieldMatrix;
import org.apache.commons.math3.linear.ArrayFieldVector;
import org.apache.commons.math3.linear.FieldLUDecomposition;
import org.apache.commons.math3.linear.FieldVector;
import org.ejml.data.ZMatrixRMaj;
import org.ejml.dense.row.CommonOps_ZDRM;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Param;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;

/** One linear system over soil, from mesh to pattern, at three sizes; tables are warm. */
@State(Scope.Thread)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MICROSECONDS)
public class SystemBench {
  /** About how many unknowns. */
  @Param({"30", "60", "120"})
  int size;

  private double frequencyMHz;
  private AntennaModel model;
  private Pieces pieces;
  private Reflection reflection;
  private PreparedModel prepared;
  private SymmetricSystem system;
  private Solution solution;
  private final Directions ring = Directions.ring(72, 0.3);
  private Array2DRowFieldMatrix<Complex> commonsMatrix;
  private FieldVector<Complex> commonsRight;
  private ZMatrixRMaj ejmlMatrix;
  private ZMatrixRMaj ejmlRight;
  private ZMatrixRMaj ejmlAnswer;

  /** Meshes, fills the ground table, and copies the matrix for the other solvers. */
  @Setup
  public void prepare() {
    frequencyMHz = BenchModels.frequencyMHz(size);
    model = BenchModels.model(size);
    pieces = Pieces.of(model, frequencyMHz);
    reflection = new GroundTables().reflection(BenchModels.SOIL, frequencyMHz);
    prepared = preparation();
    solution = prepared.solve(frequencyMHz, reflection);
    system = pieces.fill(reflection, frequencyMHz);
    int n = system.size;
    if (n != solution.unknowns()) {
      throw new IllegalStateException("the pieces no longer mesh as PreparedModel does");
    }
    Complex[][] commons = new Complex[n][n];
    ejmlMatrix = new ZMatrixRMaj(n, n);
    ejmlRight = new ZMatrixRMaj(n, 1);
    ejmlAnswer = new ZMatrixRMaj(n, 1);
    Complex[] right = new Complex[n];
    for (int i = 0; i < n; i++) {
      for (int j = 0; j <= i; j++) {
        commons[i][j] = new Complex(system.re(i, j), system.im(i, j));
        commons[j][i] = commons[i][j];
        ejmlMatrix.set(i, j, system.re(i, j), system.im(i, j));
        ejmlMatrix.set(j, i, system.re(i, j), system.im(i, j));
      }
      right[i] = new Complex(pieces.mesh().excitation[i]);
      ejmlRight.set(i, 0, pieces.mesh().excitation[i], 0);
    }
    commonsMatrix = new Array2DRowFieldMatrix<>(ComplexField.getInstance(), commons);
    commonsRight = new ArrayFieldVector<>(ComplexField.getInstance(), right);
  }

  private PreparedModel preparation() {
    return new PreparedModel(model, BenchModels.SOIL, frequencyMHz, MeshRule.of(MeshAim.FULL));
  }

  /** Mesh, static parts and points: once for a shape and a band. */
  @Benchmark
  public Object prepareShape() {
    return preparation();
  }

  /** The matrix. */
  @Benchmark
  public Object fill() {
    return pieces.fill(reflection, frequencyMHz);
  }

  /** Factorisation, solution and its residual. */
  @Benchmark
  public Object solve() {
    system.solve(pieces.mesh().excitation);
    return system;
  }

  /** Gain in 72 directions. */
  @Benchmark
  public Object ring() {
    return solution.powerGains(ring);
  }

  /** Efficiency and peak: the whole sky. */
  @Benchmark
  public Object sky() {
    Solution fresh = solution.refined(0, 1);
    return fresh.efficiency() + fresh.peak().dbi();
  }

  /** Fill, factor, solve and pattern of a shape that is already meshed. */
  @Benchmark
  public Object together() {
    return prepared.solve(frequencyMHz, reflection).powerGains(ring);
  }

  /** The same from the wires on. */
  @Benchmark
  public Object togetherFromWires() {
    return preparation().solve(frequencyMHz, reflection).powerGains(ring);
  }

  /** The same matrix by Commons Math. */
  @Benchmark
  public Object commonsMath() {
    return new FieldLUDecomposition<>(commonsMatrix).getSolver().solve(commonsRight);
  }

  /** The same matrix by EJML. */
  @Benchmark
  public Object ejml() {
    CommonOps_ZDRM.solve(ejmlMatrix, ejmlRight, ejmlAnswer);
    return ejmlAnswer;
  }
}
