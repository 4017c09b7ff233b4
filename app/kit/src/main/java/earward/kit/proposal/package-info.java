/**
 * Edits that the program offers, solved and proven before they are: {@link
 * earward.kit.proposal.Remedies}.
 */
@NullMarked
package earward.kit.proposal;

import org.jspecify.annotations.NullMarked;
