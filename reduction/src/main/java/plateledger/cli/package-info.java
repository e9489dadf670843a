/**
 * The command line: arguments to calls, findings to standard error, results to files or standard output, exit statuses.
 * The only package that prints. May use all packages of the reduction.
 */
@NullMarked
package plateledger.cli;

import org.jspecify.annotations.NullMarked;
