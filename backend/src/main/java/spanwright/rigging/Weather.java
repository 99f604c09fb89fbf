package spanwright.rigging;

/**
 * The weathers that a wire must stand; the worst of all governs. A brief that asks for ice and a
 * gust gets both at once, in full: the safe reading. Standards let less of the wind's pressure meet
 * the ice (ISO 12494 and EN 50341: a share of about 0.4, from memory); who works by one asks for a
 * lower gust.
 */
enum Weather {
  /** Still air. */
  CALM(0, false, "still air"),
  /** The design gust on the bare wire. */
  GUST(1, false, "gust"),
  /** Ice in still air. */
  ICE(0, true, "ice"),
  /** The design gust on the iced wire. */
  ICY_GUST(1, true, "ice and gust");

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
