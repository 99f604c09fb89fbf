package spanwright.moments;

import org.apache.commons.math3.complex.Complex;

/**
 * The current at one place of a wire for one volt (peak) across the feed gap.
 *
 * @param wire index
 * @param fraction of the wire's arc length
 * @param at where
 * @param current peak amperes, positive from the wire's first point to its last
 */
public record CurrentSample(int wire, double fraction, Vertex at, Complex current) {}
