package spanwright.moments;

/** All of separate-solver-cases.json, on the 'full' mesh. */
public final class SeparateSolverCasesTest extends IndependentSolverCasesTest {

  @Override
  String resource() {
    return "separate-solver-cases.json";
  }

  @Override
  String source() {
    return "own separate Galerkin solver with triangle functions and direct Sommerfeld quadrature,"
        + " kept outside the program";
  }

  @Override
  public String heading() {
    return "Field solver: whole antennas by a second solver of our own";
  }

  @Override
  public String about() {
    return super.about()
        + " The second solver shares no code with this one: hundreds of triangle functions, other"
        + " quadratures, extrapolated in segment length; its feed is a single point between pieces"
        + " of 0.05 m.";
  }
}
