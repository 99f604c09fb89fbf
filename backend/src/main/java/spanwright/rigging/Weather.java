package spanwright.rigging;

/**
 * The weathers that a wire must stand. The gust never meets the full ice: ISO 12494 and EN 50341
 * take 0.4 of the wind's pressure with it (from memory), and ice without wind and wind without ice
 * as cases of their own. The worst of all governs.
 */
enum Weather {
  /** Still air. */
  CALM(0, false),
  /** The design gust on the bare wire. */
  GUST(1, false),
  /** Ice in still air. */
  ICE(0, true),
  /** Ice, and the gust with the share of its pressure that goes with it. */
  ICY_GUST(0.4, true);

  /** Share of the design gust's pressure. */
  final double windShare;

  final boolean iced;

  Weather(double windShare, boolean iced) {
    this.windShare = windShare;
    this.iced = iced;
  }

  boolean windy() {
    return windShare > 0;
  }
}
