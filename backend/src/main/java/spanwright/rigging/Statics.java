package spanwright.rigging;

/** A way of hanging a layout's spans: pulls chosen, every weather solved. */
interface Statics {
  /** Chooses the pulls and solves every weather. */
  void hang();

  /** A span as hung. */
  Look look(int span);

  /** Force of spans, ropes and counterweight on an attachment, calm. */
  Force calm(int attachment);

  /** The worst force in any other weather. */
  Force worst(int attachment);

  /** The counterweight at an attachment, or null. */
  Counterweight weight(int attachment);

  /**
   * A counterweight.
   *
   * @param pull its weight [N]
   * @param up how far the weathers lift it [m]
   * @param down how far they let it down [m]
   * @param lifted whether a weather would draw it up altogether
   */
  record Counterweight(double pull, double up, double down, boolean lifted) {
    /** The greater of both, up positive [m]. */
    double travel() {
      return up >= down ? up : -down;
    }
  }
}
