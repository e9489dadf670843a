/**
 * What a reduction leaves behind: result tables, figures, the test report, and the folder they are put into whole or not
 * at all. May use everything below it but {@code watch}. Decides nothing about the physics; every number comes from
 * {@code reduce}. The one place where chart axes are made, with number formats that no locale changes.
 */
@NullMarked
package plateledger.report;

import org.jspecify.annotations.NullMarked;
