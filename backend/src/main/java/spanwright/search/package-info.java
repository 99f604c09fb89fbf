/**
 * Finds places to hang a wire on a plan, and ranks them.
 *
 * <p>Places that can hold a wire are sampled in position and height; layouts are made from them
 * (level and sloping spans, legs from a held middle); each is screened, hung and held against every
 * rule; what is allowed gets a coarse look at gain and matching, the best of that the full chain of
 * {@code assess}; the list is kept varied. What is refused is kept with its reason and cure.
 * Lengths in metres, plan frame, scores in decibels.
 *
 * <p>Deterministic for a plan, seed and effort whatever the number of threads. It does not refine
 * lengths and heights continuously, and tries no closed loops, drooping ends or inverted L. Front
 * door: {@link spanwright.search.Search}.
 */
package spanwright.search;
