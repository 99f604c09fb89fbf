package spanwright.rigging;

/**
 * Figures of the trade that no rule of the catalogue holds. All of them: common practice, no
 * source.
 */
final class Practice {
  /** An end insulator with its shackles [kg]. */
  static final double INSULATOR_WEIGHT = 0.06;

  /** A centre piece: insulator, strain relief and the first hand of line [kg]. */
  static final double CENTRE_WEIGHT = 0.2;

  /** A small end insulator breaks at this [N]. */
  static final double INSULATOR_BREAKING = 1800;

  /** A knot leaves this share of a rope's strength. */
  static final double KNOT = 0.5;

  /** A weak link parts at this share of what the weakest of the rest holds. */
  static final double WEAK_LINK = 2.0 / 3;

  /** A weak link must hold this many times what the weather asks of it. */
  static final double LINK_MARGIN = 1.5;

  /** Calm tension is kept under this share of the wire's breaking strength. */
  static final double CALM_SHARE = 0.15;

  /** A span is drawn no tighter than to this sag, as a share of its chord. */
  static final double LEAST_SAG = 0.01;

  /** A tie that hangs looser than this share of its chord gives way to a counterweight. */
  static final double LOOSE_TIE = 0.03;

  /** Rather than hang looser than this share of its chord, a placement is refused for its pull. */
  static final double MOST_SAG = 0.12;

  /** Pulls are set so that limits are met with this share of them. */
  static final double HEADROOM = 0.98;

  /** The shortest rope between an insulator and what holds it: knot and eye [m]. */
  static final double SHORTEST_TAIL = 0.15;

  /** Height above the ground at which halyards are made off [m]. */
  static final double CLEAT_HEIGHT = 1.5;

  /** Height above the ground at which a counterweight hangs [m]. */
  static final double WEIGHT_HEIGHT = 2.0;

  /** A feed line hangs with this share more than its straight run, and with {@link #LINE_SPARE}. */
  static final double LINE_SLACK = 0.02;

  /** See {@link #LINE_SLACK} [m]. */
  static final double LINE_SPARE = 0.1;

  /** A feed line stands off the wall by this much where it comes down to its entry [m]. */
  static final double STAND_OFF = 0.3;

  /** Wire this near to an attachment is held by it; farther off there is a rope between [m]. */
  static final double HELD_WITHIN = 0.3;

  /** The longest rope from a bend of the wire to what holds it [m]. */
  static final double LONGEST_LIFT = 12;

  /** Wire is taken to turn where it is held when it turns by more than this [rad]. */
  static final double BEND = Math.toRadians(15);

  /** Ice on wires [kg/m³]: the plan format's figure. */
  static final double ICE_DENSITY = 900;

  private Practice() {}
}
