/**
 * From the feedpoint to the transmitter's socket: the feed line and the matching unit.
 *
 * <p>Units: ohm, metres, henries, farads, watts, volts and amps at their <em>peak</em> (not rms);
 * frequencies in MHz and losses in decibels, as their names say; e<sup>+j&omega;t</sup>.
 *
 * <p>Method: the line by the exact hyperbolic line equations with complex characteristic impedance
 * and propagation constant, so that losses at high SWR are not estimated but follow from power in
 * against power out. The matching unit as a ladder of lossy coils and capacitors: every match an L
 * network can make follows from one quadratic, a T adds a search over one capacitor; settings
 * outside the unit's ranges are not taken, and the nearest ones say which part runs out.
 *
 * <p>What it does not do: no balun losses, no currents on the outside of the line, no stray
 * capacitance of the unit's parts, no change of Q with setting or frequency, one line only.
 *
 * <p>Front door: {@link spanwright.feed.FeedChain}. Beside it {@link spanwright.feed.TwoWire} gives
 * the constants of a two-wire line from its dimensions.
 */
package spanwright.feed;
