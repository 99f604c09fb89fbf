/**
 * From the wire to whoever is to be reached: bearings, hops, take-off windows, and the plain
 * vertical that placements are held against.
 *
 * <p>Units and frame: kilometres along the earth and degrees at the border (both said in the
 * names), radians inside; azimuth clockwise from true north, elevation up from the horizon;
 * e<sup>+j&omega;t</sup>.
 *
 * <p>Method: bearings and distances by the geodesics of the WGS 84 ellipsoid (Karney, Algorithms
 * for geodesics, J. Geodesy 87, 2013). Hops as straight rays to a mirror over a sphere of 6371 km,
 * for heights as a <em>range</em>, so that a target gets a window of elevations and not one angle;
 * the secant law bounds how steeply a frequency is turned back. The reference vertical carries a
 * sinusoidal current, and its far field is reflected by the soil with Fresnel's plane-wave
 * coefficients.
 *
 * <p>What it does not do: it predicts no ionosphere. It knows no hour, season or solar activity, no
 * absorption, no focusing, no ground wave and no tilted layers; it says which elevations are worth
 * having, not whether a path is open.
 *
 * <p>Front doors: {@link spanwright.path.TakeOff}, {@link spanwright.path.GreatCircle}, {@link
 * spanwright.path.ReferenceVertical}.
 */
package spanwright.path;
