/** Remedies: edits that were solved and found to clear a finding. */
@NullMarked
package earward.kit.proposal;

import org.jspecify.annotations.NullMarked;
