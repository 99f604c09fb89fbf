package spanwright.web;

/** Ends a request with a problem document. */
final class ProblemException extends RuntimeException {
  private final transient Problem problem;

  ProblemException(Problem problem) {
    super(problem.detail());
    this.problem = problem;
  }

  Problem problem() {
    return problem;
  }
}
