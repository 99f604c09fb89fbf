/**
 * Runs the benchmarks and writes their figures as ratios of one run.
 *
 * <p>The benchmarks themselves stand in the packages they measure, since they reach inside. None of
 * this is in the jar or the build; the Maven profile {@code bench} compiles it.
 *
 * <p>Front door: {@link spanwright.bench.Benchmarks}.
 */
package spanwright.bench;
