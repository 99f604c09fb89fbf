/**
 * Currents, impedance and fields of thin wires over ground, by the method of moments.
 *
 * <p>Frame: metres, z up, the ground is z = 0; azimuth clockwise from +y, elevation from the
 * horizon, both radians; e^{+jωt}. Front door: {@link spanwright.moments.Solver}.
 */
package spanwright.moments;
