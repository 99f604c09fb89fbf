/**
 * Currents, impedance and fields of thin wires over ground, by the method of moments.
 *
 * <p>Frame: metres, z up, the ground is the plane z = 0; azimuth clockwise from +y and elevation
 * from the horizon, both in radians; e^{+jωt}; frequencies in megahertz. Near fields are rms,
 * currents are peak amperes for one volt peak across the feed.
 *
 * <p><b>Equation.</b> The thin-wire electric-field equation in mixed-potential form, tested with
 * its own basis (Galerkin; Harrington, Field Computation by Moment Methods, 1968, ch. 4), so that
 * the matrix is complex symmetric. Ground enters by its exact half-space kernels (Sommerfeld 1909;
 * Michalski and Mosig, IEEE Trans. Antennas Propag. 45, 1997): {@code HalfSpaceKernels} works the
 * integrals out, {@code GroundTable} keeps them divided by the image's own wave, as polynomials
 * over cells, for all candidates and threads.
 *
 * <p><b>Basis.</b> Straight elements with polynomials up to the fourth order ({@code Shapes}). Few
 * elements follow the physics: up to two fifths of a wavelength in the middle of a wire, short ones
 * beside feed, ends, bends and junctions, where the charge changes quickly ({@code MeshRule}). A
 * hanging shape of many points is drawn together into straight pieces within a small part of a
 * wavelength and of its height ({@code Outline}). At a node the currents add up to nothing, so
 * bends, loops and junctions of any number of wires need nothing special.
 *
 * <p><b>Close pairs.</b> The static part of the kernel in closed form along the inner element
 * ({@code StaticPairs}); it does not depend on frequency and is kept for neighbouring frequencies.
 *
 * <p><b>Feed.</b> One volt, its field spread over the middle tenth of the gap and over no less than
 * four radii: at a point it would never converge. The gap's width sets how fine the mesh may be
 * there, and how far the feed keeps from ends and junctions.
 *
 * <p><b>Known limits.</b> Round wires thin against wavelength and length; current crowding between
 * wires closer than a few radii, steel roofs and ground connections are not modelled; insulation is
 * quasi-static; the earth is uniform and flat. Below 0.3 m the answer is that of the ideal plane,
 * and says so. Bad input throws {@link spanwright.moments.ModelFault}, whose sentence names the
 * wire.
 *
 * <p>Front door: {@link spanwright.moments.Solver}.
 */
package spanwright.moments;
