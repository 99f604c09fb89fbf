package spanwright.moments;

/**
 * How elements are sized, as phase k·length, and which polynomial order an element carries. Found
 * by refining 360 garden antennas (level, sloping, apex, bent, drooping, looped, folded, branched,
 * parallel, hung in many points, insulated, low, beside gutters) from 1.85 to 53.9 MHz over six
 * grounds until they stood still; a test holds the aims of {@link MeshAim} on others.
 *
 * <p>Tried and left: lower orders in the short elements beside feed, ends and bends (a cubic on two
 * elements does what three quadratics do), and the fourth order everywhere (two unknowns more in
 * each short element, nothing gained).
 *
 * @param longest element anywhere
 * @param feed element beside the feed
 * @param end element beside an open end
 * @param bend element beside a bend or junction
 * @param feedGrowth of the length with distance from the feed: impedance hardly feels it
 * @param endGrowth the same from an open end: the pattern feels it, by the charge put there
 * @param bendGrowth the same from a bend or junction
 * @param cubic in the part where lengths grow, up to this phase an element is cubic, beyond it of
 *     the fourth order
 * @param stray points of a hanging shape may stray from an element by this part of a wavelength
 */
record MeshRule(
    double longest,
    double feed,
    double end,
    double bend,
    double feedGrowth,
    double endGrowth,
    double bendGrowth,
    double cubic,
    double stray) {

  /** And by this part of the lowest height. */
  private static final double STRAY_OF_HEIGHT = 0.01;

  /** Far from everything the current is smooth: quadratic up to this phase. */
  private static final double CALM_QUADRATIC = 0.9;

  /** And cubic up to this one. */
  private static final double CALM_CUBIC = 1.5;

  static MeshRule of(MeshAim aim) {
    return switch (aim) {
      case COARSE -> new MeshRule(2.8, 0.15, 0.1, 0.15, 8, 3, 6, 1, 1.0 / 400);
      case FULL -> new MeshRule(2.5, 0.04, 0.025, 0.05, 2, 1.6, 2.5, 0.5, 1.0 / 1000);
      case FINE -> new MeshRule(1.4, 0.02, 0.012, 0.025, 1.6, 1, 1.2, 0.3, 1.0 / 2000);
    };
  }

  /** How far points may stray from an element [m]. */
  double tolerance(AntennaModel model, Ground ground, double waveNumber) {
    double tolerance = 2 * Math.PI / waveNumber * stray;
    if (ground.kind() != Ground.Kind.NONE) {
      for (WireSpec wire : model.wires()) {
        for (Vertex p : wire.points()) {
          tolerance = Math.min(tolerance, STRAY_OF_HEIGHT * p.z());
        }
      }
    }
    return tolerance;
  }

  /**
   * Order of an element.
   *
   * @param phase its length
   * @param graded whether it is long for its distance from feed, end, bend or junction
   */
  int order(double phase, boolean graded) {
    if (graded) {
      return phase <= cubic ? 3 : 4;
    }
    if (phase <= CALM_QUADRATIC) {
      return 2;
    }
    return phase <= CALM_CUBIC ? 3 : 4;
  }
}
