package spanwright.assess;

/** Figures rounded for a document: no more digits than their accuracy, and never a minus zero. */
final class Rounded {
  private Rounded() {}

  static double hundredth(double value) {
    return Math.round(value * 100) / 100.0 + 0.0;
  }

  static double tenth(double value) {
    return Math.round(value * 10) / 10.0 + 0.0;
  }

  static double thousandth(double value) {
    return Math.round(value * 1000) / 1000.0 + 0.0;
  }
}
