package spanwright.moments;

/**
 * The ground's answer to a source, as the ratio of each reflected kernel to the image's free-space
 * kernel g_im = e^{−jk0R}/R. Ratios are smooth where the kernels themselves oscillate or grow.
 */
interface Reflection {
  /** Ratios in an answer: GA, GP, GZ, F, real and imaginary in turn. */
  int RATIOS = 8;

  /** Ratios in an answer with slopes: GA, GP, GZ, F, GT. */
  int ALL = 10;

  /** Whether there is any reflection. */
  boolean present();

  /**
   * The ratios GA, GP, GZ, F (re, im in turn) of many places: out[m][i] is the m-th for rhos[i],
   * zetas[i].
   *
   * @param rhos horizontal distances [m]
   * @param zetas sums of the heights [m]
   * @param count how many
   * @param out eight rows of at least so many values
   */
  void ratios(double[] rhos, double[] zetas, int count, double[][] out);

  /**
   * The ratios GA, GP, GZ, F, GT (re, im in turn), then their derivatives by ρ, then by ζ.
   *
   * @param rho horizontal distance [m]
   * @param zeta sum of the heights [m]
   * @param out thirty values
   */
  void ratiosAndSlopes(double rho, double zeta, double[] out);

  /** No ground. */
  Reflection NOTHING = new Constant(false, 0);

  /** The perfect mirror: images of horizontal current and of charge turn round. */
  Reflection MIRROR = new Constant(true, 1);

  /** Ratios that are the same everywhere. */
  record Constant(boolean present, double size) implements Reflection {
    @Override
    public void ratios(double[] rhos, double[] zetas, int count, double[][] out) {
      for (int m = 0; m < RATIOS; m++) {
        java.util.Arrays.fill(out[m], 0, count, of(m));
      }
    }

    private double of(int m) {
      return m == 0 || m == 2 ? -size : m == 4 ? size : 0;
    }

    @Override
    public void ratiosAndSlopes(double rho, double zeta, double[] out) {
      java.util.Arrays.fill(out, 0, 3 * ALL, 0);
      for (int m = 0; m < RATIOS; m++) {
        out[m] = of(m);
      }
      out[8] = size;
    }
  }
}
