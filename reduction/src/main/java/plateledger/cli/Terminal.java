package plateledger.cli;

import java.io.PrintWriter;

/**
 * Where the program speaks.
 *
 * @param out results
 * @param err messages and progress
 * @param interactive true if a person watches {@code err}, so that progress may be shown
 */
public record Terminal(PrintWriter out, PrintWriter err, boolean interactive) {}
