package spanwright.search;

import spanwright.rigging.Layout;

/**
 * A layout worth checking.
 *
 * @param layout as it would be chosen
 * @param newMasts how many masts it needs built
 * @param promise a rough estimate of its worth, for ordering work only [dB]
 * @param family what makes it the same idea as another: shape and what it hangs on
 * @param number in the order of making; settles every tie
 */
record Candidate(Layout layout, int newMasts, double promise, String family, int number) {}
