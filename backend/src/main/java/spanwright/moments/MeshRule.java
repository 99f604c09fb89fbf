package spanwright.moments;

/**
 * How elements are sized, as phase k·length, and which polynomial order an element of a given phase
 * carries. Found by refining 24 garden antennas (level, sloping, apex, bent, looped, branched,
 * beside a gutter) on eight bands until they stood still; a test holds the aims of {@link MeshAim}.
 *
 * @param longest element anywhere
 * @param feed element beside the feed
 * @param end element beside an open end
 * @param bend element beside a bend or junction
 * @param growth of the length with distance from these
 * @param linear up to this phase an element is linear
 * @param quadratic up to this phase it is quadratic, beyond it cubic
 */
record MeshRule(
    double longest,
    double feed,
    double end,
    double bend,
    double growth,
    double linear,
    double quadratic) {

  static MeshRule of(MeshAim aim) {
    return switch (aim) {
      case COARSE -> new MeshRule(2.2, 0.2, 0.4, 0.4, 1.5, 0.12, 0.5);
      case FULL -> new MeshRule(1.3, 0.04, 0.1, 0.15, 1.2, 0.04, 0.35);
      case FINE -> new MeshRule(0.8, 0.03, 0.05, 0.08, 0.6, 0.015, 0.12);
    };
  }

  int order(double phase) {
    if (phase <= linear) {
      return 1;
    }
    return phase <= quadratic ? 2 : 3;
  }
}
