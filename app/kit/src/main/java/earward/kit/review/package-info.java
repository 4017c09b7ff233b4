/**
 * What is found when the solved figures are held against the checks: {@link
 * earward.kit.review.Reviewer}.
 */
@NullMarked
package earward.kit.review;

import org.jspecify.annotations.NullMarked;
