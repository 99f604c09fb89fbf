/**
 * The command line: one class for each command, and what they share.
 *
 * <p>Results go to standard output or to {@code --out}; progress and complaints to standard error;
 * the exit code says which it was (0 done, 1 could not, 2 bad usage, 3 bad input, 4 nothing
 * feasible). A complaint is a sentence that says what, where and what to do; never the name of
 * anything inside the program. Bad input is read to its end, and after twenty faults the rest are
 * counted.
 *
 * <p>The cases of {@code solve}, {@code feed} and {@code hang} are read here, strictly and with
 * bounds, and turned into the records of the package that reckons; frequencies stay in MHz up to
 * that border, angles in degrees. Nothing here reckons anything.
 *
 * <p>Front door: {@link spanwright.cli.Main}; tests use {@code Program}.
 */
package spanwright.cli;
