/** The catalogue of known part types, how their figures are fitted, and how parts are marked. */
@NullMarked
package earward.kit.parts;

import org.jspecify.annotations.NullMarked;
