/**
 * What is wrong or doubtful: where, what was found, what was expected, what to do. Any package may produce findings;
 * they are collected, sorted and shown, never thrown away. Uses nothing of ours.
 */
@NullMarked
package plateledger.finding;

import org.jspecify.annotations.NullMarked;
