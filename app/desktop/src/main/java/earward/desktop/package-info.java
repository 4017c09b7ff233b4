/** The Swing program: {@code Desktop} opens it. */
@NullMarked
package earward.desktop;

import org.jspecify.annotations.NullMarked;
