package spanwright.cli;

import java.io.PrintStream;

/**
 * Where a command speaks.
 *
 * @param out results
 * @param err progress and complaints
 * @param terminal whether a person is watching
 */
record Console(PrintStream out, PrintStream err, boolean terminal) {}
