/** Which parts matter: shares of the spread, and what tighter or looser tolerances would do. */
@NullMarked
package earward.study.matters;

import org.jspecify.annotations.NullMarked;
