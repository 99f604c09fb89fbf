package spanwright.rigging;

/**
 * The weathers that a wire must stand. The gust never meets the full ice: ISO 12494 and EN 50341
 * take 0.4 of the wind's pressure with it (from memory), and ice without wind and wind without ice
 * as cases of their own. The worst of all governs.
 */
enum Weather {
  /** Still air. */
  CALM(0, false, "still air"),
  /** The design gust on the bare wire. */
  GUST(1, false, "gust"),
  /** Ice in still air. */
  ICE(0, true, "ice"),
  /** Ice, and the gust with the share of its pressure that goes with it. */
  ICY_GUST(0.4, true, "ice and gust");

  /** Share of the design gust's pressure. */
  final double windShare;

  final boolean iced;

  /** As it reads. */
  final String words;

  Weather(double windShare, boolean iced, String words) {
    this.windShare = windShare;
    this.iced = iced;
    this.words = words;
  }

  boolean windy() {
    return windShare > 0;
  }
}
