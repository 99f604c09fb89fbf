package spanwright.moments;

/** The rows a fill works on, kept by a thread from one fill to the next. */
final class FillWork {
  private static final ThreadLocal<FillWork> MINE = ThreadLocal.withInitial(FillWork::new);

  /** Systems above this size are not kept. */
  private static final int MOST_KEPT = 500;

  final Sightlines.Row row = new Sightlines.Row();
  final RatioRows.Work ratios = new RatioRows.Work();
  double[] angle = new double[0];
  double[] currentRe = new double[0];
  double[] currentIm = new double[0];
  double[] chargeRe = new double[0];
  double[] chargeIm = new double[0];
  double[] imageRe = new double[0];
  double[] imageIm = new double[0];

  /** Rows folded with the shapes of the first element: [shape][point]. */
  final double[][] foldedCurrentRe = new double[Shapes.MOST + 1][0];

  final double[][] foldedCurrentIm = new double[Shapes.MOST + 1][0];
  final double[][] foldedChargeRe = new double[Shapes.MOST + 1][0];
  final double[][] foldedChargeIm = new double[Shapes.MOST + 1][0];

  /** One pair's block: [a·columns + b]. */
  final double[] blockRe = new double[(Shapes.MOST + 1) * (Shapes.MOST + 1)];

  final double[] blockIm = new double[(Shapes.MOST + 1) * (Shapes.MOST + 1)];

  private SymmetricSystem system = new SymmetricSystem(0);

  /** This thread's. */
  static FillWork mine() {
    return MINE.get();
  }

  /** An empty system, in what the last one of this thread held. */
  SymmetricSystem system(int unknowns) {
    if (unknowns > MOST_KEPT) {
      MINE.remove();
      return new SymmetricSystem(unknowns);
    }
    system.reset(unknowns);
    return system;
  }

  void size(int pairs, int columns) {
    if (angle.length < pairs) {
      angle = new double[pairs];
      currentRe = new double[pairs];
      currentIm = new double[pairs];
      chargeRe = new double[pairs];
      chargeIm = new double[pairs];
      imageRe = new double[pairs];
      imageIm = new double[pairs];
    }
    if (foldedCurrentRe[0].length < columns) {
      for (int a = 0; a <= Shapes.MOST; a++) {
        foldedCurrentRe[a] = new double[columns];
        foldedCurrentIm[a] = new double[columns];
        foldedChargeRe[a] = new double[columns];
        foldedChargeIm[a] = new double[columns];
      }
    }
  }
}
